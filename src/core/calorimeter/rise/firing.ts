/**
 * Was the run fired when the firing time says?
 *   too early  the readings after firing stay on the fore-line, within 1 % of the rise, for half a minute or more: a release with a time
 *              constant below 50 min does not
 *   too late   firing lies between two readings, and the rise r still to come at the next two, carried back as an exponential
 *              r = A e^(−s/λ) to the whole rise A, puts the start of the rise 0.2 min or more before it. Where the readings hide the
 *              start, θ loses about G (δ − λ (1 − e^(−δ/λ))) of itself: 0.07 % for δ = λ = 0.9 min
 * A reading that stands at the firing time shows by itself whether the rise had begun (quiet.ts).
 */
import { printed } from "../../refusal";
import type { Line } from "../../statistics/line";
import { type Grid, SAME_TIME } from "./grid";

const NOTHING = 0.01;
/** min */
const LONG_QUIET = 0.5;
const LONG_HIDDEN = 0.2;
/** What is still to come is well above the scatter of the readings. */
const SCATTERS = 20;

/** Time after firing in which nothing rises, min: half a minute or more, or 0. Asked of the readings `from` to before `to`. */
export function quietTime(
  times: Float64Array,
  temperatures: Float64Array,
  [from, to]: readonly [number, number],
  fire: number,
  fore: Line,
  rise: number,
): number {
  let quiet = 0;
  for (let k = from; k < to && temperatures[k]! - onLine(fore, times[k]!) < NOTHING * rise; k++) quiet = times[k]! - fire;
  return quiet > LONG_QUIET - SAME_TIME ? quiet : 0;
}

/** The cause in words. */
export function quietSentence(quiet: number): string {
  return `nothing rises in the first ${printed(quiet)} min after firing: check the firing time`;
}

/** Time by which the rise began before firing, min: 0.2 min or more, not before the last reading of the fore-period; or 0. */
export function hiddenStart(grid: Grid, temperatures: Float64Array, fore: Line, after: Line, scatter: number): number {
  const { times, fire, lastFore, firstAfter } = grid;
  const [one, two] = [lastFore + 1, lastFore + 2];
  if (two >= firstAfter) return 0;
  const toCome = (k: number) => onLine(after, times[k]!) - temperatures[k]!;
  if (!(toCome(two) > SCATTERS * scatter && toCome(one) > toCome(two))) return 0;
  const constant = (times[two]! - times[one]!) / Math.log(toCome(one) / toCome(two));
  const whole = onLine(after, fire) - onLine(fore, fire);
  const began = times[one]! - constant * Math.log(whole / toCome(one));
  const hidden = fire - Math.max(began, times[lastFore]!);
  return hidden > LONG_HIDDEN ? hidden : 0;
}

function onLine({ intercept, slope }: Line, time: number): number {
  return intercept + slope * time;
}
