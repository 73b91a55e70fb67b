/**
 * Adiabatic run: the jacket follows the vessel, and one small drift g_s (stirring) is common to both periods,
 *   θ = t_f − t_i − g_s (τf − τi)
 * g_s is the slope of two parallel least-squares lines, pooled over the fore- and the after-period (from memory of the coal standards).
 */
import type { Drifts } from "./drifts";
import type { Grid } from "./grid";

/** g_s, K/min. */
export function commonDrift({ foreSpread, afterSpread }: Grid, { before, after }: Drifts): number {
  return (foreSpread * before + afterSpread * after) / (foreSpread + afterSpread);
}

/** θ, K. */
export function adiabatic(grid: Grid, drifts: Drifts): number {
  return drifts.end - drifts.start - commonDrift(grid, drifts) * grid.duration;
}
