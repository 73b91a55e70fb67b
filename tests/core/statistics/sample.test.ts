import fc from "fast-check";
import { extremes, meanOf, sampleOf } from "../../../src/core/statistics/sample";
import { refusedWith } from "../refused";

/** NIST StRD, univariate sets NumAcc1 to NumAcc4 (from memory): a middle value, then 500 times a pair about it. */
function pairs(middle: number, low: number, high: number): number[] {
  return [middle, ...Array.from({ length: 1000 }, (_, index) => (index % 2 === 0 ? low : high))];
}

describe("mean and standard deviation", () => {
  test("NumAcc1: certified 10000002 and 1, exact", () => {
    expect(sampleOf([10000001, 10000003, 10000002])).toEqual({ count: 3, mean: 10000002, deviation: 1, deviationOfMean: 1 / Math.sqrt(3) });
  });

  // Digits of the data that a double cannot hold: 1000000.1 to 6e-11 of 0.1, 10000000.1 to 9e-10 of 0.1.
  test.each([
    ["NumAcc2", 1.2, [1.1, 1.3], 1e-14],
    ["NumAcc3", 1000000.2, [1000000.1, 1000000.3], 1e-9],
    ["NumAcc4", 10000000.2, [10000000.1, 10000000.3], 1e-8],
  ] as const)("%s: certified mean in the middle, deviation 0.1", (_, middle, [low, high], tolerance) => {
    const { mean, deviation } = sampleOf(pairs(middle, low, high));
    expect(Math.abs(mean / middle - 1)).toBeLessThan(3e-16);
    expect(Math.abs(deviation / 0.1 - 1)).toBeLessThan(tolerance);
  });

  test("equal values do not scatter, to the last bit", () => {
    fc.assert(
      fc.property(fc.double({ min: -1e300, max: 1e300, noNaN: true }), fc.integer({ min: 2, max: 9 }), (value, count) => {
        const sample = sampleOf(new Array<number>(count).fill(value));
        expect(sample.mean).toBe(value + 0); // a sum of negative zeros is 0
        expect(sample.deviation).toBe(0);
      }),
    );
  });

  test("shift and scale: x → a + b x carries the mean along and the deviation by |b|", () => {
    const values = fc.array(fc.integer({ min: -1000, max: 1000 }), { minLength: 2, maxLength: 30 });
    fc.assert(
      fc.property(values, fc.integer({ min: -1000, max: 1000 }), fc.constantFrom(-4, 0.5, 8), (list, a, b) => {
        const [before, after] = [sampleOf(list), sampleOf(list.map((value) => a + b * value))];
        expect(after.mean).toBeCloseTo(a + b * before.mean, 9);
        expect(after.deviation).toBeCloseTo(Math.abs(b) * before.deviation, 9);
      }),
    );
  });

  // The mean, 10^16 + 1, is not a double: distances from what is left of it, 0 and 2, need the correction by their own mean.
  test("a mean that a double cannot hold", () => expect(sampleOf([1e16, 1e16 + 2]).deviation).toBeCloseTo(Math.SQRT2, 14));

  test("squares do not overflow", () => expect(sampleOf([1e200, 3e200]).deviation / (Math.SQRT2 * 1e200)).toBeCloseTo(1, 14));

  test("the extremes of a million values", () => {
    expect(extremes(Array.from({ length: 1_000_000 }, (_, index) => index % 1000))).toEqual([0, 999]);
  });

  test("refusals", () => {
    expect(refusedWith(() => sampleOf([1]))).toBe("input: A standard deviation needs at least 2 values, not 1");
    expect(refusedWith(() => meanOf([]))).toBe("input: A mean needs at least 1 value");
    expect(refusedWith(() => sampleOf([1, NaN]))).toBe("range: The mean of the values is not a finite number");
    expect(refusedWith(() => sampleOf([1.7e308, 1.7e308]))).toBe("range: The mean of the values is not a finite number");
    expect(refusedWith(() => sampleOf([1.7e308, -1.7e308, 0]))).toBe(
      "range: The values are too far apart for a standard deviation in double precision",
    );
  });
});
