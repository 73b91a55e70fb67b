/**
 * Regnault-Pfaundler correction (from memory of the annex of ISO 1928; the formulas follow from Newton's law dt/dτ = G (t∞ − t)):
 *   G = (g_i − g_f)/(t_mf − t_mi)         cooling constant, 1/min
 *   t∞ = t_mi + g_i/G                     convergence temperature: jacket and stirring, °C
 *   Δt_ex = (τf − τi)[g_f + G (t_mf − t_m)]
 *   θ = t_f − t_i − Δt_ex
 */
import type { Drifts } from "./drifts";
import type { Grid } from "./grid";

/** Share of the first step that old tables of one-minute readings add to its trapezoid, because the curve is convex there. */
const FIRST_STEP_SHARE = 1 / 9;

/** G, 1/min. */
export function coolingConstant({ before, after, meanBefore, meanAfter }: Drifts): number {
  return (before - after) / (meanAfter - meanBefore);
}

/** t∞, °C; undefined if the drifts are equal, because the run then does not determine it. */
export function convergenceTemperature(drifts: Drifts): number | undefined {
  const constant = coolingConstant(drifts);
  return constant === 0 ? undefined : drifts.meanBefore + drifts.before / constant;
}

/** θ, K. */
export function regnaultPfaundler({ duration }: Grid, drifts: Drifts): number {
  return drifts.end - drifts.start - duration * (drifts.after + coolingConstant(drifts) * (drifts.meanAfter - drifts.meanMain));
}

/** What the first-interval refinement adds to θ, K: a ninth of the first step times its length goes to the integral. */
export function firstIntervalRefinement(grid: Grid, temperatures: Float64Array, drifts: Drifts): number {
  const { times, fire, end, lastFore, firstAfter } = grid;
  const next = lastFore + 1;
  const step = next === firstAfter ? drifts.end - drifts.start : temperatures[next]! - drifts.start;
  const length = (next === firstAfter ? end : times[next]!) - fire;
  return coolingConstant(drifts) * step * length * FIRST_STEP_SHARE;
}

/**
 * How far the trapezoids may be off, K: G times a third of what the integral changes when every second reading between is left out
 * (the error of a trapezoid goes with the square of its width).
 */
export function trapezoidError(grid: Grid, temperatures: Float64Array, drifts: Drifts): number {
  const { times, fire, end, duration, lastFore, firstAfter } = grid;
  let coarse = 0;
  let time = fire;
  let temperature = drifts.start;
  for (let k = lastFore + 2; k < firstAfter; k += 2) {
    coarse += ((temperature + temperatures[k]!) * (times[k]! - time)) / 2;
    time = times[k]!;
    temperature = temperatures[k]!;
  }
  coarse += ((temperature + drifts.end) * (end - time)) / 2;
  return Math.abs(coolingConstant(drifts) * (drifts.meanMain * duration - coarse)) / 3;
}
