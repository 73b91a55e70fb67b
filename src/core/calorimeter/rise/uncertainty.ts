/**
 * Standard uncertainty of the corrected rise from what the run itself shows (law of propagation, GUM). u² is the sum of the squares of
 * these parts, but trapezoid, unfinished and curvature are first added: they are no chance errors, and the first two pull the same way.
 *   readings    s √Σ(∂θ/∂t_k)², s the pooled scatter about the two drift lines, not below resolution/√12; ν = n − 4 (adiabatic n − 3)
 *   trapezoid   the whole estimated error of the mean temperature of the main period, because it is not corrected
 *   unfinished  what the release still has to give at the end of the main period and after it, by the 63 % time, by the late time constant
 *               or by a significant bend of the readings after the release, whichever does more (unfinished.ts)
 *   curvature   the drifts bend, d²t/dτ² = −G g, and a straight line does not: what −G g (τ − τ̄)²/2 in the readings of a period does to θ,
 *               without its value at τi or τf, which is real; it counts where no reading stands there or the readings are uneven
 *   method      Dickinson: the whole difference from Regnault-Pfaundler
 *   unequal     adiabatic, if the two drifts differ significantly: half their difference over the main period
 * Coverage 95 %: Student's t with ν_eff = u⁴/(u_readings⁴/ν) (Welch-Satterthwaite; the other parts count as known).
 * Not in it: calibration of the thermometer, stirring and evaporation that change during the run, the single-body model itself, and heat
 * that comes so slowly that the record does not show its bend.
 */
import { studentT } from "../../statistics/distributions";
import { upperQuantile } from "../../statistics/special";
import { riseBy } from "./rise";
import type { Drifts } from "./drifts";
import type { Evidence } from "./evidence";
import { gradientOf } from "./gradient";
import type { Grid } from "./grid";
import type { Method } from "./methods";
import { coolingConstant, trapezoidError } from "./regnault-pfaundler";
import { type Unfinished, unfinishedRelease } from "./unfinished";

/** All in K but the degrees of freedom and the coverage factor. */
export interface RiseUncertainty {
  readonly readings: number;
  readonly trapezoid: number;
  readonly unfinished: number;
  /** The best estimate of it and whose that is; `unfinished` is what must be allowed for. */
  readonly stillToCome: Pick<Unfinished, "best" | "by">;
  readonly curvature: number;
  readonly method: number;
  readonly unequal: number;
  readonly standard: number;
  readonly degrees: number;
  readonly factor: number;
  readonly expanded: number;
}

const TAIL = 0.025;
/** Beyond this, Student's t differs from the normal distribution by less than 0.02 %. */
const MOST_DEGREES = 1e4;

/** Standard uncertainty of θ by a method, its parts, and the expanded uncertainty of 95 %. */
export function riseUncertainty(
  grid: Grid,
  temperatures: Float64Array,
  drifts: Drifts,
  method: Method,
  evidence: Evidence,
): RiseUncertainty {
  const gradient = gradientOf(grid, temperatures, drifts, method);
  const unequal = method === "adiabatic" && driftsDiffer(evidence) ? (grid.duration * Math.abs(drifts.after - drifts.before)) / 2 : 0;
  const { scatter, degrees } = scatterOf(grid, drifts, evidence, method === "adiabatic" && unequal === 0);
  const readings = scatter * Math.sqrt(gradient.reduce((sum, each) => sum + each * each, 0));
  const trapezoid = method === "adiabatic" ? 0 : trapezoidError(grid, temperatures, drifts);
  const { most: unfinished, ...stillToCome } = unfinishedRelease(grid, drifts, gradient, evidence);
  const other = method.startsWith("dickinson")
    ? Math.abs(riseBy(grid, temperatures, drifts, method) - riseBy(grid, temperatures, drifts, "regnault-pfaundler"))
    : 0;
  const curvature = method === "adiabatic" ? 0 : Math.abs(bentDrifts(grid, drifts, gradient));
  const standard = Math.hypot(readings, trapezoid + unfinished + curvature, other, unequal);
  const effective = readings === 0 ? MOST_DEGREES : Math.min(MOST_DEGREES, degrees * (standard / readings) ** 4);
  const factor = upperQuantile(studentT(effective, true), TAIL);
  return {
    readings,
    trapezoid,
    unfinished,
    stillToCome,
    curvature,
    method: other,
    unequal,
    standard,
    degrees: effective,
    factor,
    expanded: factor * standard,
  };
}

/** Pooled scatter of a reading, K: about two lines, or about two parallel ones. */
function scatterOf(
  { foreSpread, afterSpread }: Grid,
  { before, after }: Drifts,
  { fore, after: line, resolution }: Evidence,
  parallel: boolean,
) {
  const apart = parallel ? ((after - before) ** 2 * foreSpread * afterSpread) / (foreSpread + afterSpread) : 0;
  const degrees = fore.degrees + line.degrees + (parallel ? 1 : 0);
  const squares = fore.residual ** 2 * fore.degrees + line.residual ** 2 * line.degrees + apart;
  return { scatter: Math.max(Math.sqrt(squares / degrees), resolution / Math.sqrt(12)), degrees };
}

/** Do the drifts before and after differ by more than twice the standard uncertainty of their difference? */
export function driftsDiffer({ fore, after }: Evidence): boolean {
  return Math.abs(after.slope - fore.slope) > 2 * Math.hypot(fore.slopeError, after.slopeError);
}

/** What the bend of the two drifts does to θ, K. */
function bentDrifts(grid: Grid, drifts: Drifts, gradient: Float64Array): number {
  const constant = coolingConstant(drifts);
  const bend = (drift: number, time: number, mean: number) => (-constant * drift * (time - mean) ** 2) / 2;
  let shift = bend(drifts.before, grid.fire, grid.foreTime) - bend(drifts.after, grid.end, grid.afterTime);
  for (let k = 0; k <= grid.lastFore; k++) shift += gradient[k]! * bend(drifts.before, grid.times[k]!, grid.foreTime);
  for (let k = grid.firstAfter; k < grid.count; k++) shift += gradient[k]! * bend(drifts.after, grid.times[k]!, grid.afterTime);
  return shift;
}
