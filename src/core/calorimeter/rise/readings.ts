/**
 * What no run may hold: times that do not ascend, and a reading that was plainly mistyped. A mistyped reading stands beyond both of its
 * neighbours on the same side (the first and the last reading: beyond the two next to it) by more than 5 % of the span of all readings,
 * and by more than 20 steps of their resolution: a calorimeter cannot do that, its temperature climbs once and then drifts.
 */
import { printed, refuse } from "../../refusal";
import { LEAST_READINGS, minutes } from "./grid";
import { resolutionOf } from "./resolution";

const SHARE_OF_SPAN = 0.05;
const STEPS_OF_RESOLUTION = 20;

/** Refuses equal times and times out of order; `count` times in min. */
export function requireAscending(times: Float64Array, count: number): void {
  for (let k = 1; k < count; k++) {
    const [before, here] = [times[k - 1]!, times[k]!];
    if (here > before) continue;
    if (here === before)
      refuse(`Time ${minutes(here)} stands in row ${k} and again in row ${k + 1} of the readings: every reading needs its own time`);
    refuse(`Time ${minutes(here)} in row ${k + 1} of the readings comes after ${minutes(before)} in row ${k}: times must ascend`);
  }
}

/** Refuses a run with a mistyped reading; `count` temperatures in °C. Too short records are left to the refusal that says so. */
export function requireNoMistyped(temperatures: Float64Array, count: number): void {
  if (count < 2 * LEAST_READINGS) return;
  let lowest = temperatures[0]!;
  let highest = lowest;
  for (let k = 1; k < count; k++) {
    const here = temperatures[k]!;
    if (here < lowest) lowest = here;
    if (here > highest) highest = here;
  }
  const limit = SHARE_OF_SPAN * (highest - lowest);
  let worst = -1;
  let excess = limit;
  for (let k = 0; k < count; k++) {
    const step = k === 0 ? Infinity : temperatures[k]! - temperatures[k - 1]!;
    // Few steps are that large: the rest is asked of those, and of both ends.
    if (step <= excess && step >= -excess && k < count - 1) continue;
    const beyond = beyondNeighbours(temperatures, count, k);
    if (beyond > excess) {
      worst = k;
      excess = beyond;
    }
  }
  if (worst >= 0 && excess > STEPS_OF_RESOLUTION * resolutionOf(temperatures, count)) refuseReading(temperatures, count, worst, excess);
}

/** How far a reading stands beyond both of its neighbours, K; 0 if it stands between them. */
function beyondNeighbours(temperatures: Float64Array, count: number, at: number): number {
  const here = temperatures[at]!;
  const one = here - temperatures[at === 0 ? 1 : at - 1]!;
  const other = here - temperatures[at === 0 ? 2 : at === count - 1 ? at - 2 : at + 1]!;
  return one > 0 === other > 0 ? Math.min(Math.abs(one), Math.abs(other)) : 0;
}

function refuseReading(temperatures: Float64Array, count: number, at: number, excess: number): never {
  const isEnd = at === 0 || at === count - 1;
  const side = temperatures[at]! > temperatures[at === 0 ? 1 : at - 1]! ? "above" : "below";
  return refuse(
    `Temperature ${printed(temperatures[at]!)} in row ${at + 1} of the readings stands ${Number(excess.toPrecision(3))} K ${side} ` +
      `${isEnd ? "the two readings next to it" : "both neighbours"}: check the reading`,
  );
}
