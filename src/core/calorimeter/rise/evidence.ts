/** What a run tells besides the sums of its formulas: the scatter of its readings, how its heat came, and whether the firing time fits. */
import { type Line, straightLine } from "../../statistics/line";
import { type Bend, bendBehind } from "./bend";
import type { Drifts } from "./drifts";
import { hiddenStart, quietTime } from "./firing";
import type { Grid } from "./grid";
import { type LateRelease, lateRelease } from "./late";
import { resolutionOf } from "./resolution";
import { responseTime } from "./response";

export interface Evidence {
  readonly fore: Line;
  readonly after: Line;
  /** Resolution of the readings, K; 0 if finer than 1e-6. */
  readonly resolution: number;
  /** 63 % time, min; undefined if the main period holds no reading. */
  readonly response: number | undefined;
  /** How the last of the heat came; undefined if the readings do not show it. */
  readonly late: LateRelease | undefined;
  /** Heat that bends the readings after the release; undefined if they do not bend significantly. */
  readonly bend: Bend | undefined;
  /** Time after firing in which nothing rises, and by which the rise seems to have begun before it, min; 0 if not worth a word. */
  readonly quiet: number;
  readonly hidden: number;
}

export function evidenceOf(grid: Grid, temperatures: Float64Array, drifts: Drifts): Evidence {
  const { times, count, fire, lastFore, firstAfter } = grid;
  const line = (from: number, to: number) =>
    straightLine(Array.from(times.subarray(from, to)), Array.from(temperatures.subarray(from, to)));
  const [fore, after, resolution] = [line(0, lastFore + 1), line(firstAfter, count), resolutionOf(temperatures, count)];
  const scatter = pooledScatter(fore, after, resolution);
  const holds = holdsReadings(grid);
  const response = holds ? responseTime(times, temperatures, [lastFore + 1, firstAfter], fire, [drifts.start, drifts.end]) : undefined;
  const hidden = hiddenStart(grid, temperatures, fore, after, scatter);
  return {
    fore,
    after,
    resolution,
    response,
    late: holds ? lateRelease(grid, temperatures, drifts, scatter) : undefined,
    bend: bendBehind(grid, temperatures, drifts, response && response + hidden, { fore, resolution }),
    quiet: quietTime(times, temperatures, [lastFore + 1, firstAfter], fire, fore, drifts.end - drifts.start),
    hidden,
  };
}

/** Whether readings stand between firing and the end of the main period. */
export function holdsReadings({ lastFore, firstAfter }: Grid): boolean {
  return firstAfter > lastFore + 1;
}

/** Pooled scatter about two lines, K, not below resolution/√12. */
export function pooledScatter(fore: Line, after: Line, resolution: number): number {
  const squares = fore.residual ** 2 * fore.degrees + after.residual ** 2 * after.degrees;
  return Math.max(Math.sqrt(squares / (fore.degrees + after.degrees)), resolution / Math.sqrt(12));
}
