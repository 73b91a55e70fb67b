import fc from "fast-check";
import {
  add,
  addDouble,
  type DoubleDouble,
  exponential,
  logarithm,
  multiply,
  reciprocal,
  timesDouble,
} from "../../../src/core/numeric/double-double";

/** A double as an exact fraction: integer × 2^−shift. */
const SHIFT = 400n;
const exact = (x: number): bigint => {
  const view = new DataView(new ArrayBuffer(8));
  view.setFloat64(0, Math.abs(x));
  const bits = view.getBigUint64(0);
  const exponent = bits >> 52n;
  const mantissa = exponent === 0n ? bits : (bits & 0xfffffffffffffn) | 0x10000000000000n;
  const shifted = (mantissa << SHIFT) >> (1075n - (exponent === 0n ? 1n : exponent));
  return x < 0 ? -shifted : shifted;
};
const exactPair = ([high, low]: DoubleDouble) => exact(high) + exact(low);
const ONE = 1n << SHIFT;
/** |a − b| in units of |b| × 1e-30. */
const off = (a: bigint, b: bigint) => Number(((a > b ? a - b : b - a) * 10n ** 30n) / (b < 0n ? -b : b === 0n ? ONE : b));

const number = fc.double({ min: 1e-20, max: 1e20, noNaN: true });

describe("double-double arithmetic against exact fractions", () => {
  test("sum and product", () =>
    fc.assert(
      fc.property(number, number, number, (a, b, c) => {
        const pair = timesDouble([a, 0], b);
        expect(off(exactPair(pair), (exact(a) * exact(b)) >> SHIFT)).toBeLessThan(100);
        expect(off(exactPair(addDouble(pair, c)), exactPair(pair) + exact(c))).toBeLessThan(100);
        expect(off(exactPair(add(pair, [c, 0])), exactPair(pair) + exact(c))).toBeLessThan(100);
        expect(off(exactPair(multiply(pair, [c, 0])), (exactPair(pair) * exact(c)) >> SHIFT)).toBeLessThan(100);
      }),
    ));

  test("what a double loses in a difference", () => {
    const big = timesDouble([1e10, 0], 1 / 3);
    const difference = addDouble(addDouble(big, 1e-7), -big[0]);
    expect(difference[0]).toBeCloseTo(1e-7 + big[1], 22);
  });

  test("reciprocal", () =>
    fc.assert(
      fc.property(fc.double({ min: 1e-6, max: 1e6, noNaN: true }), (x) =>
        expect(off(exactPair(reciprocal(x)), (ONE * ONE) / exact(x))).toBeLessThan(100),
      ),
    ));
});

describe("exponential and logarithm", () => {
  // e and ln 10 to 32 digits (from memory; the identities below do not need them).
  const decimal = (digits: string) => (BigInt(digits.replace(".", "")) << SHIFT) / 10n ** BigInt(digits.split(".")[1]!.length);

  test("e", () => expect(off(exactPair(exponential(1)), decimal("2.71828182845904523536028747135266"))).toBeLessThan(100));
  test("ln 10", () => expect(off(exactPair(logarithm(10)), decimal("2.30258509299404568401799145468436"))).toBeLessThan(100));

  test("e^x e^−x is 1", () =>
    fc.assert(
      fc.property(fc.double({ min: -50, max: 50, noNaN: true }), (x) => {
        const product = multiply(exponential(x), exponential(-x));
        expect(Math.abs(product[0] - 1 + product[1])).toBeLessThan(1e-27);
      }),
    ));

  test("ln 2a − ln a is ln 2, to 28 digits", () =>
    fc.assert(
      fc.property(fc.double({ min: 100, max: 20000, noNaN: true }), (a) => {
        const [high, low] = logarithm(a);
        const difference = add(logarithm(2 * a), [-high, -low]);
        expect(off(exactPair(difference), decimal("0.69314718055994530941723212145818"))).toBeLessThan(1000);
      }),
    ));
});
