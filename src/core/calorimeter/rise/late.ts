/**
 * How the last of the heat comes: vessel, sample holder and water do not warm with one time constant, and the slowest of them decides
 * when the main period may end. What is still to come at a time τ is the after-period's curve carried back, less the reading,
 *   r(τ) = t_mf + g_f x − G g_f (x² − Σx²/n)/2 − t(τ),  x = τ − τ̄ of the after-period
 * (the line, bent as Newton's law bends it). The late time constant is the time in which r falls from a level to 1/e of that level. Two
 * levels are tried, and the one that leaves more to come counts: 1 % of the rise, which an after-period that begins too early hardly
 * touches, and 0.2 %, which shows a slower part; both not below 8 e times the scatter. A level above 5 % says nothing about the end.
 * Between readings ln r is taken as linear.
 */
import type { Drifts } from "./drifts";
import type { Grid } from "./grid";
import { coolingConstant } from "./regnault-pfaundler";

const SCATTERS = 8 * Math.E;
const LEVELS = [0.01, 0.002];
const HIGHEST_LEVEL = 0.05;

export interface LateRelease {
  /** Late time constant, min. */
  readonly constant: number;
  /** What it leaves to come at the end of the main period, K. */
  readonly left: number;
}

/** The late release of a run whose readings scatter by `scatter` (K); undefined if the main period does not show it. */
export function lateRelease(grid: Grid, temperatures: Float64Array, drifts: Drifts, scatter: number): LateRelease | undefined {
  const rise = drifts.end - drifts.start;
  let most: LateRelease | undefined;
  for (const share of LEVELS) {
    const level = Math.max(SCATTERS * scatter, share * rise);
    const found = level > HIGHEST_LEVEL * rise ? undefined : releaseFrom(grid, temperatures, drifts, level);
    if (found && !(most && most.left >= found.left)) most = found;
  }
  return most;
}

function releaseFrom(grid: Grid, temperatures: Float64Array, drifts: Drifts, level: number): LateRelease | undefined {
  const high = timeOfLevel(grid, temperatures, drifts, level);
  const low = timeOfLevel(grid, temperatures, drifts, level / Math.E);
  if (high === undefined || low === undefined) return undefined;
  const constant = low - high;
  return { constant, left: (level / Math.E) * Math.exp((low - grid.end) / constant) };
}

/** When r first falls below a level, min; undefined if it does not before the end of the main period. */
function timeOfLevel(grid: Grid, temperatures: Float64Array, drifts: Drifts, level: number): number | undefined {
  const { times, lastFore, firstAfter, afterTime, afterSpread, count } = grid;
  const bend = (coolingConstant(drifts) * drifts.after) / 2;
  const square = afterSpread / (count - firstAfter);
  let time = grid.fire;
  let left = drifts.end - drifts.start;
  for (let k = lastFore + 1; k < firstAfter; k++) {
    const x = times[k]! - afterTime;
    const here = drifts.meanAfter + drifts.after * x - bend * (x * x - square) - temperatures[k]!;
    if (here <= level) return time + share(left, here, level) * (times[k]! - time);
    time = times[k]!;
    left = here;
  }
  return undefined;
}

/** How far between two readings the level is reached. What is no longer above nothing has no logarithm: then linear. */
function share(before: number, here: number, level: number): number {
  return here > 0 ? Math.log(before / level) / Math.log(before / here) : (before - level) / (before - here);
}
