/**
 * Grubbs' test for the readings of a drift line (F. E. Grubbs, Technometrics 11 (1969) 1; for lines R. E. Lund, Technometrics 17 (1975) 473;
 * both from memory). Each residual e_k is divided by its own standard deviation,
 *   r_k = e_k / (s √(1 − h_k)),  h_k = 1/n + (τk − τ̄)²/Σ(τ − τ̄)²
 * and the largest |r| is an outlier above √((n − 2) t²/(n − 3 + t²)), t the upper quantile of Student's t of n − 3 degrees of freedom
 * at α/(2n), α = 1 %. A residual that does not matter (below a limit such as 0.01 % of the rise) is none.
 */
import { studentT } from "../../statistics/distributions";
import type { Line } from "../../statistics/line";
import { upperQuantile } from "../../statistics/special";

const LEVEL = 0.01;

export interface Outlier {
  /** Index of the reading. */
  readonly index: number;
  /** Its residual, K. */
  readonly residual: number;
  /** r and its critical value. */
  readonly statistic: number;
  readonly critical: number;
}

/**
 * The outlying reading among `from` to `to` (both included) of a fitted line; undefined if there is none, if its residual is
 * negligible (K), or of fewer than 4 readings.
 */
export function outlierOf(
  times: Float64Array,
  temperatures: Float64Array,
  [from, to]: readonly [number, number],
  line: Line,
  negligible: number,
): Outlier | undefined {
  const count = to - from + 1;
  if (count < 4 || line.residual === 0) return undefined;
  const spread = (line.residual / line.slopeError) ** 2;
  const mean = times.subarray(from, to + 1).reduce((sum, time) => sum + time, 0) / count;
  let [index, statistic, residual] = [from, 0, 0];
  for (let k = from; k <= to; k++) {
    const off = temperatures[k]! - line.intercept - line.slope * times[k]!;
    const studentized = Math.abs(off) / (line.residual * Math.sqrt(1 - 1 / count - (times[k]! - mean) ** 2 / spread));
    if (studentized > statistic) [index, statistic, residual] = [k, studentized, off];
  }
  const critical = criticalOf(count);
  return statistic > critical && Math.abs(residual) > negligible ? { index, residual, statistic, critical } : undefined;
}

/** Critical values by the number of readings: many runs of a call have the same. */
const criticals = new Map<number, number>();

function criticalOf(count: number): number {
  const known = criticals.get(count);
  if (known !== undefined) return known;
  const square = upperQuantile(studentT(count - 3), LEVEL / (2 * count)) ** 2;
  const critical = Math.sqrt(((count - 2) * square) / (count - 3 + square));
  criticals.set(count, critical);
  return critical;
}
