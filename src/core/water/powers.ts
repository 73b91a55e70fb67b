/**
 * Powers of one number to a fixed list of exponents, all multiples of 1/8, by products and square roots alone: as exact as `Math.pow`, equal in
 * every engine, and cheaper where the exponents lie close together.
 */
import { refuse } from "../refusal";

/** Powers are counted in eighths. */
const EIGHTHS = 8;
/** x, √x, ⁴√x and ⁸√x: where every list begins. */
const ROOTS = 4;

export class Powers {
  private readonly values: Float64Array;
  private readonly result: Float64Array;
  /** Where the two powers stand whose product is the next one. */
  private readonly first: Int32Array;
  private readonly second: Int32Array;
  /** Where the result is found, and whether as its inverse. */
  private readonly places: readonly { readonly place: number; readonly isInverse: boolean }[];

  /** Refuses exponents that are not multiples of 1/8. */
  constructor(exponents: readonly number[]) {
    const wanted = exponents.map((exponent) => exponent * EIGHTHS);
    if (!wanted.every(Number.isInteger)) refuse(`An exponent is not a multiple of 1/8: ${exponents.join(", ")}`);
    const known = [8, 4, 2, 1];
    const products: (readonly [number, number])[] = [];
    const reach = (count: number): void => {
      if (known.includes(count)) return;
      const partner = known.find((one) => known.includes(count - one));
      const largest = partner ?? Math.max(...known.filter((one) => one < count));
      reach(count - largest);
      products.push([known.indexOf(largest), known.indexOf(count - largest)]);
      known.push(count);
    };
    const sizes = [...new Set(wanted.map(Math.abs))].filter((count) => count > 0).sort((a, b) => a - b);
    for (const size of sizes) reach(size);
    this.first = Int32Array.from(products, ([one]) => one);
    this.second = Int32Array.from(products, ([, other]) => other);
    this.places = wanted.map((count) => ({ place: known.indexOf(Math.abs(count)), isInverse: count < 0 }));
    this.values = new Float64Array(known.length);
    this.result = new Float64Array(exponents.length);
  }

  /** The powers of a number above 0, in the order of the exponents; the array is used again in the next call. */
  of(x: number): Float64Array {
    const { values, first, second, places, result } = this;
    values[0] = x;
    for (let k = 1; k < ROOTS; k++) values[k] = Math.sqrt(values[k - 1]!);
    for (let k = 0; k < first.length; k++) values[ROOTS + k] = values[first[k]!]! * values[second[k]!]!;
    for (let k = 0; k < places.length; k++) {
      const { place, isInverse } = places[k]!;
      const value = place < 0 ? 1 : values[place]!;
      result[k] = isInverse ? 1 / value : value;
    }
    return result;
  }
}
