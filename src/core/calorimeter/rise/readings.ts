/**
 * What no run may hold: times that do not ascend, and a reading that was plainly mistyped. A mistyped reading stands beyond both of its
 * neighbours on the same side by more than 5 % of the span of all readings (and by more than 20 steps of their resolution): a calorimeter
 * cannot do that, its temperature climbs once and then drifts.
 */
import { printed, refuse } from "../../refusal";
import { minutes } from "./grid";
import { resolutionOf } from "./resolution";

const SHARE_OF_SPAN = 0.05;
const STEPS_OF_RESOLUTION = 20;

/** Refuses equal times and times out of order; `count` times in min. */
export function requireAscending(times: Float64Array, count: number): void {
  for (let k = 1; k < count; k++) {
    const [before, here] = [times[k - 1]!, times[k]!];
    if (here > before) continue;
    if (here === before) refuse(`Time ${minutes(here)} stands in row ${k} and again in row ${k + 1}: every reading needs its own time`);
    refuse(`Time ${minutes(here)} in row ${k + 1} comes after ${minutes(before)} in row ${k}: times must ascend`);
  }
}

/** Refuses a run with a mistyped reading; `count` temperatures in °C. */
export function requireNoMistyped(temperatures: Float64Array, count: number): void {
  let lowest = temperatures[0]!;
  let highest = lowest;
  for (let k = 1; k < count; k++) {
    const here = temperatures[k]!;
    if (here < lowest) lowest = here;
    if (here > highest) highest = here;
  }
  const limit = SHARE_OF_SPAN * (highest - lowest);
  let worst = 0;
  let excess = limit;
  for (let k = 1; k < count - 1; k++) {
    const step = temperatures[k]! - temperatures[k - 1]!;
    // Few steps are that large: the rest is asked of those only.
    if (step <= excess && step >= -excess) continue;
    const back = temperatures[k]! - temperatures[k + 1]!;
    const least = Math.min(Math.abs(step), Math.abs(back));
    if (step > 0 !== back > 0 || least <= excess) continue;
    worst = k;
    excess = least;
  }
  if (worst === 0 || excess <= STEPS_OF_RESOLUTION * resolutionOf(temperatures, count)) return;
  const side = temperatures[worst]! > temperatures[worst - 1]! ? "above" : "below";
  refuse(
    `Temperature ${printed(temperatures[worst]!)} in row ${worst + 1} stands ${Number(excess.toPrecision(3))} K ${side} both neighbours: check the reading`,
  );
}
