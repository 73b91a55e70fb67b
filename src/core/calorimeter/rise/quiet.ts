/**
 * In a drift period nothing but the drift may happen. A step from one reading to the next of more than 10 % of the rise, and of more than
 * three steps of the resolution, is the rise itself: the firing time is too late, or the end of the main period too early.
 */
import { printed, refuse } from "../../refusal";
import type { Drifts } from "./drifts";
import { type Grid, minutes } from "./grid";
import { resolutionOf } from "./resolution";

const SHARE_OF_RISE = 0.1;
const STEPS_OF_RESOLUTION = 3;

/** Refuses a run whose rise reaches into a drift period. */
export function requireQuietDrifts(grid: Grid, temperatures: Float64Array, { meanBefore, meanAfter }: Drifts): void {
  const { count, lastFore, firstAfter } = grid;
  const limit = SHARE_OF_RISE * (meanAfter - meanBefore);
  for (let k = 1; k <= lastFore; k++) if (isStep(temperatures, k, limit)) refuseStep(grid, temperatures, k);
  for (let k = firstAfter + 1; k < count; k++) if (isStep(temperatures, k, limit)) refuseStep(grid, temperatures, k);
}

function isStep(temperatures: Float64Array, k: number, limit: number): boolean {
  const step = temperatures[k]! - temperatures[k - 1]!;
  return step > limit || step < -limit;
}

function refuseStep({ count, lastFore, fire, end }: Grid, temperatures: Float64Array, k: number): void {
  const step = temperatures[k]! - temperatures[k - 1]!;
  if (Math.abs(step) <= STEPS_OF_RESOLUTION * resolutionOf(temperatures, count)) return;
  const [period, cure] =
    k <= lastFore
      ? [`before firing at ${minutes(fire)}`, "check the firing time"]
      : [`after the main period, which ends at ${minutes(end)}`, "check its end"];
  refuse(
    `Temperature changes by ${printed(Number(step.toPrecision(3)))} K from row ${k} to row ${k + 1} of the readings, ${period}: ${cure}`,
  );
}
