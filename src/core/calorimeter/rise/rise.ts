/** The corrected temperature rise θ of a calorimeter run by one of the methods. */
import { printed, refuse, refuseRange } from "../../refusal";
import { adiabatic } from "./adiabatic";
import { dickinson, splitOf } from "./dickinson";
import { Drifts, driftsOf } from "./drifts";
import type { Grid } from "./grid";
import { DICKINSON_SHARE, Method, ORIGINAL_SHARE } from "./methods";
import { requireQuietDrifts } from "./quiet";
import { regnaultPfaundler } from "./regnault-pfaundler";

/**
 * θ, K, of the temperatures (°C) read at the times of the grid.
 * Refuses a run without a rise, one whose rise reaches into a drift period, and a main period without readings where the method needs them.
 */
export function correctedRise(grid: Grid, temperatures: Float64Array, method: Method): number {
  const drifts = driftsOf(grid, temperatures);
  requireQuietDrifts(grid, temperatures, drifts);
  const rise = riseBy(grid, temperatures, drifts, method);
  return rise > 0 ? rise : refuseRange(`The corrected rise is ${printed(rise)} K, not above 0 K: check the firing time and the drifts`);
}

/** θ, K, from the sums of the run. Only the adiabatic method does without readings in the main period. */
export function riseBy(grid: Grid, temperatures: Float64Array, drifts: Drifts, method: Method): number {
  if (method === "adiabatic") return adiabatic(grid, drifts);
  if (grid.firstAfter === grid.lastFore + 1) refuse("The main period holds no reading between firing and its end");
  if (method === "regnault-pfaundler") return regnaultPfaundler(grid, drifts);
  return dickinson(grid, drifts, splitOf(grid, temperatures, drifts, shareOf(method)).time);
}

/** Share of Dickinson's method; 0.60 for the others, which quote his split for comparison. */
export function shareOf(method: Method): number {
  return method === "dickinson-63" ? ORIGINAL_SHARE : DICKINSON_SHARE;
}
