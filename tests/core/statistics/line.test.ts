import fc from "fast-check";
import { significance } from "../../../src/core/statistics/significance";
import { straightLine } from "../../../src/core/statistics/line";
import { refusedWith } from "../refused";
import norris from "./norris.json";

describe("straight line", () => {
  // NIST StRD, set Norris, certified to 15 digits. The data are decimals that doubles round; and the last bit of the slope times the
  // mean x, 430, moves the intercept, -0.26, by 2e-13 of itself.
  test("certified values", () => {
    const line = straightLine(norris.x, norris.y);
    for (const [name, value] of Object.entries(norris.certified)) {
      const tolerance = name === "intercept" ? 2e-13 : 2e-14;
      expect([name, Math.abs(line[name as keyof typeof line] / value - 1) < tolerance]).toEqual([name, true]);
    }
  });

  test("the exact line of the data as doubles hold them", () => {
    const { slope, intercept } = straightLine(norris.x, norris.y);
    expect(Math.abs(slope / norris.ofDoubles.slope - 1)).toBeLessThan(1e-15);
    expect(Math.abs(intercept / norris.ofDoubles.intercept - 1)).toBeLessThan(2e-13);
  });

  test("by hand: (1, 1), (2, 2), (3, 4)", () => {
    const line = straightLine([1, 2, 3], [1, 2, 4]);
    expect(line.slope).toBeCloseTo(1.5, 14);
    expect(line.intercept).toBeCloseTo(-2 / 3, 14);
    expect(line.residual).toBeCloseTo(Math.sqrt(1 / 6), 14); // residuals 1/6, −1/3, 1/6
    expect(line.slopeError).toBeCloseTo(Math.sqrt(1 / 12), 14);
    expect(line.interceptError).toBeCloseTo(Math.sqrt((1 / 6) * (1 / 3 + 4 / 2)), 14);
    expect(line.degrees).toBe(1);
  });

  test("points on a line give it back without scatter, far from the origin too", () => {
    const whole = fc.integer({ min: -100, max: 100 });
    fc.assert(
      fc.property(whole, whole, fc.uniqueArray(whole, { minLength: 3, maxLength: 12 }), fc.constantFrom(0, 1e9), (a, b, x, origin) => {
        const far = x.map((value) => origin + value);
        const line = straightLine(
          far,
          x.map((value) => a + b * value),
        );
        expect(line.slope).toBeCloseTo(b, 9);
        expect(line.residual).toBeLessThan(1e-9);
      }),
    );
  });

  test("refusals", () => {
    expect(refusedWith(() => straightLine([1, 2, 3], [1, 2]))).toBe("input: A line needs as many y as x: there are 3 x and 2 y");
    expect(refusedWith(() => straightLine([1, 2], [1, 2]))).toBe("input: A line with standard errors needs at least 3 points, not 2");
    expect(refusedWith(() => straightLine([2, 2, 2], [1, 2, 3]))).toBe("input: A line has no slope: all 3 values of x are 2");
    expect(refusedWith(() => straightLine([1e200, 2e200, 4e200], [1, 2, 3]))).toBe(
      "range: The line through these points is beyond double precision",
    );
  });
});

describe("t test", () => {
  // Two-sided 5 % points of Student's t, any handbook table (three decimals).
  test.each([
    [1, 12.706],
    [3, 3.182],
    [4, 2.776],
    [10, 2.228],
  ])("%d degrees of freedom: %d has p = 0.05", (degrees, t) => {
    expect(significance(t, 1, degrees)!.p).toBeCloseTo(0.05, 4);
    expect(significance(-2 * t, 2, degrees)).toEqual({ t: -t, p: significance(t, 1, degrees)!.p });
  });

  test("no difference has p = 1; without scatter there is no test", () => {
    expect(significance(0, 1, 4)).toEqual({ t: 0, p: 1 });
    expect(significance(1, 0, 4)).toBeUndefined();
  });

  test("refusals", () => {
    expect(refusedWith(() => significance(1, 1, 0))).toBe("input: A t test needs at least 1 degree of freedom, not 0");
    expect(refusedWith(() => significance(1, -1, 3))).toBe("input: The standard error -1 of a t test is negative or not a number");
  });
});
