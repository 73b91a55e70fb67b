/** Arbitrary-precision decimals for the tests, independent of the exact fractions of the product. */
import { all, create, type BigNumber } from "mathjs";

const math = create(all!, { number: "BigNumber", precision: 80 });

/** A decimal number or a ratio of two, as an 80-digit number. */
export function decimal(text: string): BigNumber {
  const [above, below] = text.split("/");
  const value = math.bignumber(above);
  return below === undefined ? value : value.div(math.bignumber(below));
}

/** How far a double lies from the exact value, in units of the last place of the double. */
export function ulpsApart(value: number, exact: BigNumber): number {
  return Math.abs(exactly(value).minus(exact).toNumber()) / lastPlace(value);
}

/** A double as the binary fraction it is: the shortest text that identifies it would be another number. */
function exactly(value: number): BigNumber {
  return math.bignumber(value.toPrecision(100));
}

/** The distance from a positive double to the next larger one. */
export function lastPlace(value: number): number {
  const bits = new BigInt64Array(new Float64Array([Math.abs(value)]).buffer);
  const next = new Float64Array(new BigInt64Array([bits[0]! + 1n]).buffer)[0]!;
  return next - Math.abs(value);
}
