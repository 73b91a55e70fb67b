/**
 * What the rise lacks because heat still came after the end of the main period. A release that goes on as m e^(−s/λ) from there is missing
 * in every reading after it, and the readings carry it into θ: Σ ∂θ/∂t_k · m e^(−s_k/λ). Three estimates of m and λ; the largest counts:
 *   response  λ = τ63, m = (t_f − t_i) e^(−L/τ63): a single exponential; where nothing rises at first, both without that time
 *   late      the late time constant of the main period (late.ts)
 *   bend      the bend of the readings after the release (bend.ts): its best λ is told, its longest λ enters the uncertainty
 */
import { leftAt } from "./bend";
import type { Drifts } from "./drifts";
import type { Evidence } from "./evidence";
import type { Grid } from "./grid";

export interface Unfinished {
  /** By how much the rise is too low, K: the best estimate, and what must be allowed for. */
  readonly best: number;
  readonly most: number;
  /** Whose the best estimate is. */
  readonly by: "response" | "late" | "bend";
}

/** What a rise with this gradient lacks. */
export function unfinishedRelease(grid: Grid, { start, end }: Drifts, gradient: Float64Array, evidence: Evidence): Unfinished {
  const lack = (left: number, constant: number) => {
    let sum = 0;
    for (let k = grid.firstAfter; k < grid.count; k++) sum += gradient[k]! * left * Math.exp((grid.end - grid.times[k]!) / constant);
    return Math.abs(sum);
  };
  const { response, late, bend, quiet } = evidence;
  const found: Unfinished[] = [{ best: 0, most: 0, by: "response" }];
  const add = (by: Unfinished["by"], best: number, most = best) => found.push({ by, best, most });
  if (response !== undefined) {
    const constant = response - quiet;
    add("response", lack((end - start) * Math.exp((quiet - grid.duration) / constant), constant));
  }
  if (late !== undefined) add("late", lack(late.left, late.constant));
  if (bend !== undefined) {
    const [best, most] = [bend.best, bend.longest].map((tail) => lack(leftAt(tail, grid.end), tail.constant));
    add("bend", best!, most);
  }
  const { best, by } = found.reduce((larger, each) => (each.best > larger.best ? each : larger));
  return { best, by, most: Math.max(...found.map((each) => each.most)) };
}
