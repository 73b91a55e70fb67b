import fc from "fast-check";
import { type Run, seriesOf, type SeriesLimits } from "../../../src/core/calorimeter/series";
import { findingsOf, verdictOf } from "../../../src/core/calorimeter/series-findings";
import { refusedWith } from "../refused";

const LIMITS: SeriesLimits = {
  relativeDeviation: 0.2,
  leastRuns: 5,
  referenceDeviation: 0.15,
  stragglerLevel: 0.05,
  outlierLevel: 0.01,
  trendLevel: 0.05,
};

function runs(values: readonly number[], rises: readonly number[] = []): Run[] {
  return values.map((value, index) => ({ number: index + 1, value, rise: rises[index] }));
}

function verdict(values: readonly number[], rises: readonly number[] = [], reference?: number): string {
  const series = seriesOf(runs(values, rises), LIMITS, reference);
  return verdictOf(series, findingsOf(series, LIMITS));
}

const GOOD = [10686, 10692, 10680, 10690, 10682];

describe("statistics, by hand", () => {
  // Deviations from 10686: 0, 6, −6, 4, −4; their squares add up to 104, so s² = 26.
  const series = seriesOf(runs(GOOD, [2.5, 2.51, 2.49, 2.52, 2.48]), LIMITS, 10680);

  test("mean, deviations and range", () => {
    expect(series.mean).toBe(10686);
    expect(series.deviation).toBeCloseTo(Math.sqrt(26), 12);
    expect(series.deviationOfMean).toBeCloseTo(Math.sqrt(26 / 5), 12);
    expect(series.relativeDeviation).toBeCloseTo((100 * Math.sqrt(26)) / 10686, 12);
    expect(series.relativeRange).toBeCloseTo(1200 / 10686, 12);
  });

  test("Grubbs: the first of the two farthest, 6/√26", () => {
    expect(series.outlier!.run.number).toBe(2);
    expect(series.outlier!.statistic).toBeCloseTo(6 / Math.sqrt(26), 12);
  });

  // Order −2 … 2: Σ x y = −6 + 4 − 8 = −10 over Σ x² = 10.
  test("slope with the order", () => {
    expect(series.order!.slope).toBeCloseTo(-1, 12);
    expect(series.order!.test!.t).toBeCloseTo(-1 / Math.sqrt((104 - 10) / 3 / 10), 10);
    expect(series.order!.isTrend).toBe(false);
  });

  // Rises about 2.5: 0, 0.01, −0.01, 0.02, −0.02: Σ x y = 0.28 over Σ x² = 0.001.
  test("slope with the rise", () => {
    expect(series.rise!.slope).toBeCloseTo(280, 8);
    expect(series.rises).toEqual([2.48, 2.52]);
    expect(series.rise!.test!.t).toBeCloseTo(280 / Math.sqrt((104 - 0.28 * 280) / 3 / 0.001), 8);
  });

  test("distance from the reference", () => {
    expect(series.reference!.difference).toBe(6);
    expect(series.reference!.percent).toBeCloseTo(600 / 10680, 12);
    expect(series.reference!.test!.t).toBeCloseTo(6 / Math.sqrt(26 / 5), 12);
  });

  test("a factor on all values changes no relative number and no test", () => {
    const values = fc
      .array(fc.integer({ min: 9000, max: 11000 }), { minLength: 3, maxLength: 12 })
      .filter((list) => new Set(list).size > 1);
    fc.assert(
      fc.property(values, fc.constantFrom(0.001, 4.184, 2.326), (list, factor) => {
        const before = seriesOf(runs(list), LIMITS, 10000);
        const scaled = seriesOf(runs(list.map((value) => factor * value)), LIMITS, factor * 10000);
        expect(scaled.relativeDeviation).toBeCloseTo(before.relativeDeviation, 9);
        expect(scaled.relativeRange).toBeCloseTo(before.relativeRange, 9);
        expect(scaled.outlier!.statistic).toBeCloseTo(before.outlier!.statistic, 9);
        expect(scaled.reference!.percent).toBeCloseTo(before.reference!.percent, 9);
        expect(scaled.order!.isTrend).toBe(before.order!.isTrend);
      }),
    );
  });

  test("the numbers of the runs are the order: a gap of the list counts", () => {
    const gap = [...runs([1, 2]), { number: 9, value: 9 }];
    expect(seriesOf(gap, LIMITS).order!.slope).toBeCloseTo(1, 12);
  });
});

describe("what cannot be tested is absent", () => {
  test("two runs", () => {
    const series = seriesOf(runs([10686, 10690], [2.5, 2.6]), LIMITS);
    expect([series.outlier, series.order, series.rise, series.reference]).toEqual([undefined, undefined, undefined, undefined]);
    expect(series.rises).toEqual([2.5, 2.6]);
  });

  test.each([
    ["equal", new Array<number>(5).fill(10686)],
    ["equal but for rounding", [0.3, 0.1 + 0.2, 0.3, 0.3, 0.3]],
  ])("values %s: no outlier, no trend", (_, values) => {
    const series = seriesOf(runs(values, [2.1, 2.2, 2.3, 2.4, 2.6]), LIMITS);
    expect(series.outlier).toBeUndefined();
    expect([series.order!.isTrend, series.rise!.isTrend]).toEqual([false, false]);
    expect(verdict(values)).toBe("accept: mean of 5 runs");
  });

  test("rises that are all equal", () => expect(seriesOf(runs(GOOD, [2, 2, 2, 2, 2]), LIMITS).rise).toBeUndefined());
});

describe("verdict", () => {
  test("accept", () => expect(verdict(GOOD)).toBe("accept: mean of 5 runs"));

  test("too few", () => expect(verdict([10686, 10692, 10680, 10690])).toBe("make more runs: 4 of at least 5"));

  // s = √(4 · 25² / 4) = 25 about 10000.
  test("too much scatter", () => {
    expect(verdict([10025, 9975, 10000, 9975, 10025])).toBe("repeat: the relative standard deviation 0.25 % is above the limit 0.2 %");
  });

  // s = √(4 · 20² / 4) = 20 is 0.2 % of 10000.
  test("exactly on the limit", () => {
    expect(verdict([10020, 9980, 10000, 9980, 10020])).toBe("accept: mean of 5 runs");
    expect(seriesOf(runs([10020, 9980, 10000, 9980, 10020]), LIMITS).relativeDeviation).toBeCloseTo(0.2, 14);
  });

  test("an outlier is named, not dropped", () => {
    const values = [10686, 10687, 10720, 10686, 10687];
    expect(verdict(values)).toBe("check run 3 (Grubbs, 1 %): look for the cause");
    expect(seriesOf(runs(values), LIMITS).mean).toBeCloseTo(10693.2, 9);
    expect(findingsOf(seriesOf(runs(values), LIMITS), LIMITS)[0]!.sentence).toBe(
      "Run 3, 10720, is an outlier (Grubbs, 1 %): look for the cause; without one make a further run, and if the series still fails discard all of it (common practice, from memory)",
    );
  });

  // The outlier explains the scatter, so it is named first.
  test("an outlier that makes the scatter", () => {
    expect(verdict([10000, 10001, 10100, 10000, 10001])).toBe(
      "check run 3 (Grubbs, 1 %): look for the cause; repeat: the relative standard deviation 0.44 % is above the limit 0.2 %",
    );
  });

  // Deviations from 10694.2: −8.2, −2.2, 25.8, −10.2, −5.2; s² = 868.8/4; G = 25.8/14.738 lies between 1.715 and 1.764.
  test("a straggler stays", () => {
    const values = [10686, 10692, 10720, 10684, 10689];
    expect(seriesOf(runs(values), LIMITS).outlier!.statistic).toBeCloseTo(1.7506, 4);
    expect(verdict(values)).toBe("accept: mean of 5 runs; run 3 is a straggler (Grubbs, 5 %)");
  });

  // Σ x y = 4.4, Σ x² = 0.172, Σ y² = 114: slope 25.58 with a standard error of 1.67.
  test("dependence on the rise", () => {
    expect(verdict([10692, 10690, 10680, 10687, 10681], [2.6, 2.5, 2.1, 2.4, 2.2])).toBe(
      "accept: mean of 5 runs; the value depends on the rise (t = 15): use it only within 2.1 K to 2.6 K",
    );
    expect(verdict([10601, 10606, 10603, 10602, 10605], [2.1, 2.6, 2.3, 2.2, 2.5])).toContain(
      "the value depends on the rise (without scatter)",
    );
  });

  test("drift with the order", () => {
    expect(verdict([10680, 10683, 10684, 10688, 10690])).toBe("the values drift with the order of the runs (t = 11): look for the cause");
    // t = 3.3 of 3 degrees, 4.5 %: told, and in the way of nothing.
    expect(verdict([10680, 10684, 10683, 10688, 10687])).toMatch(/^accept: mean of 5 runs; the values drift with the order/);
  });

  // Naphthalene burnt as if its mean were right: 18 300 J/g against the accepted 40 191 J/g.
  test("far from the reference, the gravest first", () => {
    expect(verdict([18290, 18310, 18300], [], 40191)).toBe("the mean lies 54 % below the reference value; make more runs: 3 of at least 5");
    expect(verdict([10025, 9975, 10000, 9975, 10025], [], 9980)).toBe(
      "the mean lies 0.2 % above the reference value; repeat: the relative standard deviation 0.25 % is above the limit 0.2 %",
    );
    expect(verdict(GOOD, [], 10680)).toBe("accept: mean of 5 runs");
  });

  test("accepted exactly when no finding is grave, and never without a sentence for each finding", () => {
    const values = fc.array(fc.integer({ min: 10600, max: 10700 }), { minLength: 2, maxLength: 8 });
    fc.assert(
      fc.property(values, fc.constantFrom(undefined, 10650, 10700), (list, reference) => {
        const series = seriesOf(runs(list), LIMITS, reference);
        const findings = findingsOf(series, LIMITS);
        const accepts =
          series.count >= 5 &&
          series.relativeDeviation <= 0.2 &&
          !(series.outlier && series.outlier.statistic > series.outlier.outlier) &&
          !(reference !== undefined && Math.abs(series.mean / reference - 1) > 0.0015);
        expect(verdictOf(series, findings).startsWith("accept")).toBe(accepts);
        for (const { sentence } of findings) expect(sentence).toMatch(/^[A-Z].{20,}[^.]$/);
      }),
    );
  });
});

test("refusals", () => {
  expect(refusedWith(() => seriesOf(runs([10686]), LIMITS))).toBe("input: A series needs at least 2 runs, not 1");
  expect(refusedWith(() => seriesOf(runs([10686, 0]), LIMITS))).toBe("range: The value of run 2, 0, is not above 0");
  expect(refusedWith(() => seriesOf(runs([10686, 10690]), LIMITS, -1))).toBe("range: The reference value, -1, is not above 0");
  expect(refusedWith(() => seriesOf(runs([1, 2, 3], [2.1, 2.2]), LIMITS))).toBe(
    "input: Run 3 has a value but no rise: give the rise of every run, or none",
  );
});
