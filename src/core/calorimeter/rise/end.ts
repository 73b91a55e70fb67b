/**
 * The end of the main period where the user gives none. It is the first reading that lies at least ten times the 63 % time after firing
 * (of an exponential release less than 0.005 % is then still to come) and at which the last of the heat, carried on with the late time
 * constant of the run or by a significant bend of the readings that follow, is less than 0.01 % of the rise. From it at least five readings
 * over at least five minutes remain, whose first and second half have slopes that agree within 0.0005 K/min or twice the standard
 * uncertainty of their difference, whichever is greater. Where no reading is behind a bend by its best time constant, the first that is so
 * by the shortest one that its readings allow is taken: only a tail beyond doubt makes a record useless.
 *
 * 63 % time: response.ts, on the way from t_i to the highest reading. Late time constant: late.ts. Bend: bend.ts. Standard uncertainty: from
 * the scatter about the fore-line and about the two halves together, not below the resolution of the readings / √12.
 */
import { refuse } from "../../refusal";
import { straightLine } from "../../statistics/line";
import { bendBehind, bendFrom, leftAt, type Scatter } from "./bend";
import { type Drifts, driftsOf } from "./drifts";
import { quietSentence, quietTime } from "./firing";
import { firstAtOrAfter, type Grid, gridOf, lastForeOf, minutes, SAME_TIME } from "./grid";
import { halvesOf, LEAST_FOR_HALVES } from "./halves";
import { lateRelease } from "./late";
import { resolutionOf } from "./resolution";
import { responseTime } from "./response";

/** Multiples of the 63 % time after which the release counts as done. */
export const RELEASE_TIMES = 10;
/** Difference of slopes that counts as none, K/min (steady-drift criterion of the coal standards, from memory). */
export const STEADY = 0.0005;
const UNCERTAINTIES = 2;
/** Share of the rise that may still come. */
const MOST_LEFT = 0.0001;
/** Level of a bend for which a record is refused rather than used. */
const BEYOND_DOUBT = 0.0001;
/** What remains behind the end, min. */
const LEAST_AFTER = 5;

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
  const resolution = resolutionOf(temperatures, count);
  const latest = times[count - 1]! - LEAST_AFTER + SAME_TIME;
  let possible: number | undefined;
  for (let at = firstAtOrAfter(times, count, earliest); at <= count - LEAST_FOR_HALVES && times[at]! <= latest; at++) {
    const { difference, leverage, squares, degrees } = halvesOf(times, temperatures, at, count - 1);
    const found = Math.sqrt((squares + fore.residual ** 2 * fore.degrees) / (degrees + fore.degrees));
    const scatter = Math.max(found, resolution / Math.sqrt(12));
    if (Math.abs(difference) > Math.max(STEADY, UNCERTAINTIES * leverage * scatter)) continue;
    const grid = gridOf(times, count, fire, times[at]!);
    const drifts = driftsOf(grid, temperatures);
    const most = MOST_LEFT * (drifts.end - drifts.start);
    if ((lateRelease(grid, temperatures, drifts, scatter)?.left ?? 0) > most) continue;
    const left = leftByBend(grid, temperatures, drifts, response, { fore, resolution });
    if (left.best <= most) return grid.end;
    if (left.least <= most) possible ??= grid.end;
  }
  if (possible !== undefined) return possible;
  const quiet = quietTime(times, temperatures, [lastFore + 1, count], fire, fore, top - start);
  return refuse(
    `No end of the main period is found: no reading from ${minutes(Number(earliest.toPrecision(4)))} on lies behind the last of the heat and is ` +
      `followed by a steady drift of at least ${LEAST_FOR_HALVES} readings over ${LEAST_AFTER} min to the end of the record; ` +
      (quiet > 0 ? quietSentence(quiet) : "record longer, or give the end"),
  );
}

/**
 * What a bend lets come at the end, K, by its best and by its shortest λ: that of all readings behind the release, where it is beyond
 * doubt; else that of the readings behind the end.
 */
function leftByBend(grid: Grid, temperatures: Float64Array, drifts: Drifts, response: number, scatter: Scatter) {
  const bend =
    bendBehind(grid, temperatures, drifts, response, scatter, BEYOND_DOUBT) ??
    bendFrom(grid, temperatures, drifts, grid.firstAfter, scatter);
  if (bend === undefined) return { best: 0, least: 0 };
  const [best, shortest] = [leftAt(bend.best, grid.end), leftAt(bend.shortest, grid.end)];
  return { best, least: Math.min(best, shortest) };
}
