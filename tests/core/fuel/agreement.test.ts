import fc from "fast-check";
import { agreement } from "../../../src/core/fuel/agreement";
import { gaussLegendre, integrate } from "../../../src/core/numeric/gauss-legendre";
import { normal } from "../../../src/core/statistics/distributions";
import { criticalRange } from "../../../src/data/precision";
import { refusedWith } from "../refused";

const judge = (results: readonly number[], repeatability = 120) => agreement(results, repeatability, criticalRange.multiples);

describe("the rule, r = 120 J/g", () => {
  test("two that agree", () => {
    expect(judge([28000, 28120])).toEqual({
      count: 2,
      mean: 28060,
      range: 120,
      allowed: 120,
      agrees: true,
      verdict: "agree",
      report: 28060,
      reportedAs: "mean of 2",
    });
  });

  test("two that do not", () => {
    const found = judge([28000, 28130]);
    expect(found.verdict).toBe("make a third run: the difference 130 J/g is above 120 J/g");
    expect([found.report, found.reportedAs]).toEqual([undefined, "none yet"]);
  });

  test("three: 1.2 r = 144 J/g", () => {
    expect(judge([28000, 28130, 28144])).toMatchObject({ verdict: "agree", report: (28000 + 28130 + 28144) / 3, reportedAs: "mean of 3" });
    expect(judge([28000, 28130, 28145])).toMatchObject({
      verdict: "make a fourth run: the range 145 J/g is above 144 J/g",
      reportedAs: "none yet",
    });
  });

  test("four: 1.3 r = 156 J/g, else the median", () => {
    expect(judge([28000, 28130, 28145, 28156])).toMatchObject({ verdict: "agree", report: 28107.75, reportedAs: "mean of 4" });
    expect(judge([28200, 28130, 28000, 28150])).toMatchObject({
      mean: 28120,
      verdict: "take the median and look for the cause: the range 200 J/g is above 156 J/g",
      report: 28140,
      reportedAs: "median of 4",
    });
  });

  test("a difference of decimals that equals the limit agrees", () => {
    expect(28.26 - 28.13 > 0.13).toBe(true); // what a double makes of it
    expect(judge([28.13, 28.26], 0.13).agrees).toBe(true);
    expect(judge([28.13, 28.2601], 0.13).agrees).toBe(false);
  });

  test("the order of the results does not matter, and what is reported lies among them", () => {
    const results = fc.array(fc.integer({ min: 27900, max: 28200 }), { minLength: 2, maxLength: 4 });
    fc.assert(
      fc.property(results, fc.integer({ min: 1, max: 300 }), (list, repeatability) => {
        const found = judge(list, repeatability);
        const turned = judge([...list].reverse(), repeatability);
        expect(turned.verdict).toBe(found.verdict);
        expect(found.agrees).toBe(Math.max(...list) - Math.min(...list) <= found.allowed + 1e-6);
        expect(found.report === undefined).toBe(!found.agrees && list.length < 4);
        if (found.report !== undefined) {
          expect(found.report).toBeGreaterThanOrEqual(Math.min(...list));
          expect(found.report).toBeLessThanOrEqual(Math.max(...list));
        }
      }),
    );
  });
});

/**
 * Probability that the range of n standard normal values is at most w:
 * n ∫ φ(x) (Φ(x + w) − Φ(x))ⁿ⁻¹ dx, x being the lowest of them.
 */
function rangeWithin(w: number, n: number): number {
  const { lower, density } = normal(0, 1);
  return n * integrate((x) => density(x) * (lower(x + w) - lower(x)) ** (n - 1), -9, 9, gaussLegendre(40), 8);
}

/** The range that n standard normal values keep in 95 % of cases, by bisection. */
function criticalRangeOf(n: number): number {
  let [low, high] = [0, 10];
  for (let step = 0; step < 60; step++) {
    const middle = (low + high) / 2;
    if (rangeWithin(middle, n) < 0.95) low = middle;
    else high = middle;
  }
  return low;
}

describe("the factors f(n) and the multiples of r", () => {
  test("two results: the difference of two normal values has the standard deviation √2, so f(2) = 1.959964 √2", () => {
    expect(criticalRangeOf(2)).toBeCloseTo(1.959963985 * Math.SQRT2, 8);
  });

  // 95 % points of the range, two decimals in tables of the studentized range for infinite degrees of freedom: 2.77, 3.31, 3.63.
  test.each([
    [2, 2.77],
    [3, 3.31],
    [4, 3.63],
  ])("%d results: %d, printed to one decimal as the factor of the data", (n, printed) => {
    const factor = criticalRangeOf(n);
    expect(Math.abs(factor - printed)).toBeLessThan(0.005);
    expect(criticalRange.factors[n - 2]).toBe(Number(factor.toFixed(1)));
  });

  test("multiples are the ratios of the factors, to one decimal", () => {
    const [first] = criticalRange.factors;
    expect(criticalRange.multiples).toEqual(criticalRange.factors.map((factor) => Number((factor / first!).toFixed(1))));
  });
});

test("refusals", () => {
  expect(refusedWith(() => judge([28000]))).toBe("input: Agreement needs at least 2 results of a sample, not 1");
  expect(refusedWith(() => judge([1, 2, 3, 4, 5]))).toBe("input: Agreement is described for 2, 3 or 4 results of a sample, not 5");
  expect(refusedWith(() => judge([28000, 28100], 0))).toBe("range: The repeatability 0 is not above 0");
  expect(refusedWith(() => judge([28000, NaN]))).toBe("range: The mean of the values is not a finite number");
});
