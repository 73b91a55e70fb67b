/**
 * Dickinson's correction: each drift is carried to the time τx at which a share x of the raw rise is done,
 *   θ = t_f − t_i − g_i (τx − τi) − g_f (τf − τx),   t(τx) = t_i + x (t_f − t_i)
 * with x = 0.60 in routine methods and 0.63 (1 − 1/e) in the original derivation (Bull. Bur. Stand. 11 (1915) 189; from memory).
 * τx is the first crossing, linear between readings: that interpolation is part of the definition, and moves θ by 0.01 % at 1 min.
 */
import type { Drifts } from "./drifts";
import type { Grid } from "./grid";

/** τx, min, and the index of the reading behind it; `firstAfter` stands for the end of the main period. */
export interface Split {
  readonly time: number;
  readonly right: number;
}

/** Where a share of the raw rise is done. */
export function splitOf(grid: Grid, temperatures: Float64Array, { start, end }: Drifts, share: number): Split {
  const { times, lastFore, firstAfter } = grid;
  const target = start + share * (end - start);
  let time = grid.fire;
  let temperature = start;
  let right = lastFore + 1;
  while (right < firstAfter && temperatures[right]! < target) {
    time = times[right]!;
    temperature = temperatures[right]!;
    right++;
  }
  const nextTime = right === firstAfter ? grid.end : times[right]!;
  const nextTemperature = right === firstAfter ? end : temperatures[right]!;
  return { time: time + ((target - temperature) / (nextTemperature - temperature)) * (nextTime - time), right };
}

/** θ, K, with the drifts meeting at `time`. */
export function dickinson(grid: Grid, { start, end, before, after }: Drifts, time: number): number {
  return end - start - before * (time - grid.fire) - after * (grid.end - time);
}

/** Both drifts for half of the main period each: an old cross-check, not a reporting method (0.8 % low in a usual run). K. */
export function meanRate(grid: Grid, drifts: Drifts): number {
  return dickinson(grid, drifts, (grid.fire + grid.end) / 2);
}
