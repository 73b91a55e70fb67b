import fc from "fast-check";
import { grubbsCritical, grubbsStatistic } from "../../../src/core/statistics/grubbs";
import { refusedWith } from "../refused";

/** Critical values of Grubbs' test for one outlier on either side, n, 5 %, 1 % (ISO 5725-2, table of critical values, from memory). */
// prettier-ignore
const PRINTED: readonly (readonly [number, number, number])[] = [
  [3, 1.155, 1.155], [4, 1.481, 1.496], [5, 1.715, 1.764], [6, 1.887, 1.973], [7, 2.020, 2.139], [8, 2.126, 2.274], [9, 2.215, 2.387],
  [10, 2.290, 2.482], [11, 2.355, 2.564], [12, 2.412, 2.636], [13, 2.462, 2.699], [14, 2.507, 2.755], [15, 2.549, 2.806],
  [16, 2.585, 2.852], [17, 2.620, 2.894], [18, 2.651, 2.932], [19, 2.681, 2.968], [20, 2.709, 3.001], [25, 2.822, 3.135],
  [30, 2.908, 3.236], [40, 3.036, 3.381],
];

describe("critical values", () => {
  // One unit of the last printed digit: the printed table is rounded unevenly there (n = 8: 2.1266 stands as 2.126).
  test.each(PRINTED)("n = %d: %d at 5 %%, %d at 1 %%", (count, five, one) => {
    expect(Math.abs(grubbsCritical(count, 0.05) - five)).toBeLessThan(0.001);
    expect(Math.abs(grubbsCritical(count, 0.01) - one)).toBeLessThan(0.001);
  });

  // Exact for three values: G = (2/√3) cos φ with φ even between 0 and π/6 for points on a circle of samples.
  test("three values: closed form", () => {
    for (const level of [0.1, 0.05, 0.01]) {
      expect(grubbsCritical(3, level)).toBeCloseTo((2 / Math.sqrt(3)) * Math.cos((level * Math.PI) / 6), 12);
    }
  });

  // 20 000 normal samples: the share above the critical value is the level within 4 standard deviations of a binomial count.
  test.each([
    [5, 0.05],
    [5, 0.01],
    [10, 0.05],
  ])("samples of %d exceed it in a share of %d", (count, level) => {
    const trials = 20000;
    const critical = grubbsCritical(count, level);
    const draw = generator(count * 1000 + 1);
    let above = 0;
    for (let trial = 0; trial < trials; trial++) {
      // Normal deviates from even ones: G. E. P. Box, M. E. Muller, Ann. Math. Statist. 29 (1958) 610.
      const values = Array.from({ length: count }, () => Math.sqrt(-2 * Math.log(draw())) * Math.cos(2 * Math.PI * draw()));
      if (grubbsStatistic(values).statistic > critical) above++;
    }
    expect(Math.abs(above / trials - level)).toBeLessThan(4 * Math.sqrt((level * (1 - level)) / trials));
  });
});

/** Numbers between 0 and 1 from a linear congruence (Park and Miller), the same in every run. */
function generator(seed: number): () => number {
  let state = seed;
  return () => (state = (state * 48271) % 2147483647) / 2147483647;
}

describe("statistic", () => {
  test("by hand: 1, 2, 3, 4, 10 has mean 4, s² = 12.5, and 10 lies 6/√12.5 away", () => {
    const { index, statistic } = grubbsStatistic([1, 2, 3, 4, 10]);
    expect(index).toBe(4);
    expect(statistic).toBeCloseTo(6 / Math.sqrt(12.5), 14);
  });

  test("never exceeds (n − 1)/√n, and reaches it where all but one are equal", () => {
    const values = fc.array(fc.integer({ min: 0, max: 50 }), { minLength: 3, maxLength: 12 }).filter((list) => new Set(list).size > 1);
    fc.assert(
      fc.property(values, (list) => {
        const bound = (list.length - 1) / Math.sqrt(list.length);
        expect(grubbsStatistic(list).statistic).toBeLessThanOrEqual(bound * (1 + 1e-14));
        expect(grubbsCritical(list.length, 0.01)).toBeLessThan(bound);
      }),
    );
    expect(grubbsStatistic([7, 7, 8, 7, 7])).toEqual({ index: 2, statistic: expect.closeTo(4 / Math.sqrt(5), 14) as number });
  });

  test("refusals", () => {
    expect(refusedWith(() => grubbsStatistic([1, 2]))).toBe("input: Grubbs' test needs at least 3 values, not 2");
    expect(refusedWith(() => grubbsStatistic([2, 2, 2]))).toBe("input: Grubbs' test has no meaning for values that are all equal");
    expect(refusedWith(() => grubbsCritical(2, 0.05))).toBe("input: Grubbs' test needs at least 3 values, not 2");
    expect(refusedWith(() => grubbsCritical(5, 5))).toBe("range: The level 5 of Grubbs' test is not between 0 and 1");
  });
});
