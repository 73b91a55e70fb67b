/**
 * The sums over the readings of one run from which every method takes its rise (symbols of the standards):
 *   before, after          g_i, g_f: drift rates by least squares, K/min, positive when rising
 *   meanBefore, meanAfter  t_mi, t_mf: arithmetic means of the readings of the periods, °C
 *   start, end             t_i, t_f: the reading at firing and at the end of the main period; where none stands, the fitted line, °C
 *   meanMain               t_m: mean temperature of the main period, trapezoids, °C
 */
import { printed, refuseRange } from "../../refusal";
import type { Grid } from "./grid";

export interface Drifts {
  readonly before: number;
  readonly after: number;
  readonly meanBefore: number;
  readonly meanAfter: number;
  readonly start: number;
  readonly end: number;
  readonly meanMain: number;
}

/** The sums of a run, temperatures in °C. Refuses a run that is not warmer after firing than before. */
export function driftsOf(grid: Grid, temperatures: Float64Array): Drifts {
  const { count, lastFore, firstAfter, weights } = grid;
  // Both periods are summed from their first reading: equal readings then drift by nothing at all.
  const [firstBefore, firstBehind] = [temperatures[0]!, temperatures[firstAfter]!];
  let before = 0;
  let sumBefore = 0;
  for (let k = 0; k <= lastFore; k++) {
    const here = temperatures[k]! - firstBefore;
    before += weights[k]! * here;
    sumBefore += here;
  }
  let main = 0;
  for (let k = lastFore + 1; k < firstAfter; k++) main += weights[k]! * temperatures[k]!;
  let after = 0;
  let sumAfter = 0;
  for (let k = firstAfter; k < count; k++) {
    const here = temperatures[k]! - firstBehind;
    after += weights[k]! * here;
    sumAfter += here;
  }
  const meanBefore = firstBefore + sumBefore / (lastFore + 1);
  const meanAfter = firstBehind + sumAfter / (count - firstAfter);
  const start = grid.readAtFire ? temperatures[lastFore]! : meanBefore + before * (grid.fire - grid.foreTime);
  const end = grid.readAtEnd ? temperatures[firstAfter]! : meanAfter + after * (grid.end - grid.afterTime);
  if (!(end > start && meanAfter > meanBefore)) refuseFlat(start, end, meanBefore, meanAfter);
  return { before, after, meanBefore, meanAfter, start, end, meanMain: main + grid.fireWeight * start + grid.endWeight * end };
}

function refuseFlat(start: number, end: number, meanBefore: number, meanAfter: number): never {
  const words =
    end > start
      ? `its mean is ${printed(meanBefore)} °C before and ${printed(meanAfter)} °C after`
      : `it is ${printed(start)} °C at firing and ${printed(end)} °C at the end of the main period`;
  return refuseRange(`The temperature does not rise after firing: ${words}; check the firing time and the order of the columns`);
}
