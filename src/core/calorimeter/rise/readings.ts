/**
 * What no run may hold: times that do not ascend, and a reading that was plainly mistyped. A mistyped reading stands beyond both of its
 * neighbours on the same side (the first and the last reading: beyond the two next to it) by more than 5 % of the span of all readings,
 * and by more than 20 steps of their resolution: a calorimeter cannot do that, its temperature climbs once and then drifts.
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
  let worst = -1;
  let excess = limit;
  for (let k = 1; k < count; k++) {
    const step = temperatures[k]! - temperatures[k - 1]!;
    // Few steps are that large: the rest is asked of those only.
    if (step <= limit && step >= -limit) continue;
    for (let at = k - 1; at <= k; at++) {
      const beyond = beyondNeighbours(temperatures, count, at);
      if (beyond > excess) [worst, excess] = [at, beyond];
    }
  }
  if (worst < 0 || excess <= STEPS_OF_RESOLUTION * resolutionOf(temperatures, count)) return;
  const [one] = neighboursOf(worst, count);
  refuse(
    `Temperature ${printed(temperatures[worst]!)} in row ${worst + 1} stands ${Number(excess.toPrecision(3))} K ` +
      `${temperatures[worst]! > temperatures[one]! ? "above" : "below"} ${worst === 0 || worst === count - 1 ? "the next two readings" : "both neighbours"}: check the reading`,
  );
}

/** How far a reading stands beyond both of its neighbours, K; 0 if it stands between them. */
function beyondNeighbours(temperatures: Float64Array, count: number, at: number): number {
  const [one, other] = neighboursOf(at, count).map((index) => temperatures[at]! - temperatures[index]!);
  return one! > 0 === other! > 0 ? Math.min(Math.abs(one!), Math.abs(other!)) : 0;
}

function neighboursOf(at: number, count: number): [number, number] {
  if (at === 0) return [1, Math.min(2, count - 1)];
  return at === count - 1 ? [at - 1, Math.max(0, at - 2)] : [at - 1, at + 1];
}
