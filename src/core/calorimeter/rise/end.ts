/**
 * The end of the main period where the user gives none. It is the first reading that lies at least ten times the 63 % time after firing
 * (of an exponential release less than 0.005 % is then still to come) and at which the last of the heat, carried on with the late time
 * constant of the run, is less than 0.01 % of the rise. From it at least five readings remain, whose first and second half have slopes
 * that agree within 0.0005 K/min or twice the standard uncertainty of their difference, whichever is greater.
 *
 * 63 % time: response.ts, on the way from t_i to the highest reading. Late time constant: late.ts. Standard uncertainty: from the scatter
 * about the fore-line and about the two halves together, not below the resolution of the readings / √12.
 */
import { refuse } from "../../refusal";
import { straightLine } from "../../statistics/line";
import { driftsOf } from "./drifts";
import { firstAtOrAfter, gridOf, lastForeOf, minutes, SAME_TIME } from "./grid";
import { halvesOf, LEAST_FOR_HALVES } from "./halves";
import { lateRelease } from "./late";
import { resolutionOf } from "./resolution";
import { responseTime } from "./response";

/** Multiples of the 63 % time after which the release counts as done. */
export const RELEASE_TIMES = 10;
/** Difference of slopes that counts as none, K/min (steady-drift criterion of the coal standards, from memory). */
export const STEADY = 0.0005;
const UNCERTAINTIES = 2;
/** Share of the rise that may still come by the late time constant. */
const MOST_LEFT = 0.0001;

/** The end of the main period, min, by the rule above. Refuses a record in which no reading fulfils it. */
export function endOf(times: Float64Array, temperatures: Float64Array, count: number, fire: number): number {
  const lastFore = lastForeOf(times, count, fire);
  const fore = straightLine(Array.from(times.subarray(0, lastFore + 1)), Array.from(temperatures.subarray(0, lastFore + 1)));
  const read = Math.abs(times[lastFore]! - fire) <= SAME_TIME;
  const start = read ? temperatures[lastFore]! : fore.intercept + fore.slope * fire;
  const top = temperatures.subarray(lastFore, count).reduce((highest, here) => Math.max(highest, here));
  if (!(top > start)) refuse("The temperature does not rise after firing: check the firing time and the order of the columns");
  const response = responseTime(times, temperatures, [lastFore + 1, count - 1], fire, [start, top])!;
  const earliest = fire + RELEASE_TIMES * response;
  const least = resolutionOf(temperatures, count) / Math.sqrt(12);
  for (let at = firstAtOrAfter(times, count, earliest); at <= count - LEAST_FOR_HALVES; at++) {
    const { difference, leverage, squares, degrees } = halvesOf(times, temperatures, at, count - 1);
    const found = Math.sqrt((squares + fore.residual ** 2 * fore.degrees) / (degrees + fore.degrees));
    const scatter = Math.max(found, least);
    if (Math.abs(difference) > Math.max(STEADY, UNCERTAINTIES * leverage * scatter)) continue;
    const grid = gridOf(times, count, fire, times[at]!);
    const drifts = driftsOf(grid, temperatures);
    const left = lateRelease(grid, temperatures, drifts, scatter)?.left ?? 0;
    if (left <= MOST_LEFT * (drifts.end - drifts.start)) return grid.end;
  }
  return refuse(
    `No end of the main period is found: no reading from ${minutes(Number(earliest.toPrecision(4)))} on lies behind the last of the heat and is followed by ` +
      `a steady drift of at least ${LEAST_FOR_HALVES} readings to the end of the record; record longer, or give the end`,
  );
}
