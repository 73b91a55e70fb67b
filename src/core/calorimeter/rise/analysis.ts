/** Everything that one run tells: the rise by the chosen method with its uncertainty, the other methods beside it, and the evidence. */
import { dickinson, meanRate, splitOf } from "./dickinson";
import { Drifts, driftsOf } from "./drifts";
import { type Evidence, evidenceOf, holdsReadings } from "./evidence";
import type { Grid } from "./grid";
import { DICKINSON_SHARE, Method, ORIGINAL_SHARE } from "./methods";
import { coolingConstant, convergenceTemperature, firstIntervalRefinement, regnaultPfaundler } from "./regnault-pfaundler";
import { correctedRise, shareOf } from "./rise";
import { adiabatic } from "./adiabatic";
import { riseUncertainty, RiseUncertainty } from "./uncertainty";

/** The rise by every method, K; undefined where a main period without readings does not give it. */
export interface Comparison {
  readonly regnaultPfaundler: number | undefined;
  /** With the first-interval refinement. */
  readonly refined: number | undefined;
  readonly dickinson: number | undefined;
  readonly dickinson63: number | undefined;
  readonly adiabatic: number;
  readonly meanRate: number;
}

export interface RiseAnalysis extends Evidence {
  readonly grid: Grid;
  readonly temperatures: Float64Array;
  readonly drifts: Drifts;
  readonly method: Method;
  /** θ, K. */
  readonly rise: number;
  /** t_f − t_i, K. */
  readonly raw: number;
  readonly uncertainty: RiseUncertainty;
  /** G, 1/min. */
  readonly constant: number;
  /** t∞, °C. */
  readonly convergence: number | undefined;
  /** Time from firing to the split of Dickinson's method, min, and its share of the rise. */
  readonly split: number | undefined;
  readonly share: number;
  readonly comparison: Comparison;
}

/** Analyses the temperatures (°C) of one run. Refuses what `correctedRise` refuses. */
export function analyse(grid: Grid, temperatures: Float64Array, method: Method): RiseAnalysis {
  const rise = correctedRise(grid, temperatures, method);
  const drifts = driftsOf(grid, temperatures);
  const evidence = evidenceOf(grid, temperatures, drifts);
  const share = shareOf(method);
  return {
    ...evidence,
    grid,
    temperatures,
    drifts,
    method,
    rise,
    raw: drifts.end - drifts.start,
    uncertainty: riseUncertainty(grid, temperatures, drifts, method, evidence),
    constant: coolingConstant(drifts),
    convergence: convergenceTemperature(drifts),
    split: holdsReadings(grid) ? splitOf(grid, temperatures, drifts, share).time - grid.fire : undefined,
    share,
    comparison: comparisonOf(grid, temperatures, drifts),
  };
}

function comparisonOf(grid: Grid, temperatures: Float64Array, drifts: Drifts): Comparison {
  const known = { adiabatic: adiabatic(grid, drifts), meanRate: meanRate(grid, drifts) };
  if (!holdsReadings(grid))
    return { ...known, regnaultPfaundler: undefined, refined: undefined, dickinson: undefined, dickinson63: undefined };
  const main = regnaultPfaundler(grid, drifts);
  return {
    ...known,
    regnaultPfaundler: main,
    refined: main + firstIntervalRefinement(grid, temperatures, drifts),
    dickinson: dickinson(grid, drifts, splitOf(grid, temperatures, drifts, DICKINSON_SHARE).time),
    dickinson63: dickinson(grid, drifts, splitOf(grid, temperatures, drifts, ORIGINAL_SHARE).time),
  };
}
