/**
 * ∂θ/∂t_k of every reading, by the chain rule through the sums of drifts.ts: the way both for the propagation of reading errors and for
 * any pattern of errors in the readings. With L = τf − τi, D = t_mf − t_mi, G = (g_i − g_f)/D and c = t_mf − t_m:
 *   Regnault-Pfaundler  θ = t_f − t_i − L (g_f + G c)
 *   Dickinson           θ = t_f − t_i − g_i (τx − τi) − g_f (τf − τx), with the shift of τx
 *   adiabatic           θ = t_f − t_i − L g_s
 */
import { splitOf } from "./dickinson";
import type { Drifts } from "./drifts";
import type { Grid } from "./grid";
import type { Method } from "./methods";
import { coolingConstant } from "./regnault-pfaundler";
import { shareOf } from "./rise";

/** ∂θ/∂ of the sums of a run. */
type Sensitivities = { -readonly [Sum in keyof Drifts]: number };

/** ∂θ/∂t_k, K/K, one for each reading. */
export function gradientOf(grid: Grid, temperatures: Float64Array, drifts: Drifts, method: Method): Float64Array {
  const gradient = new Float64Array(grid.count);
  if (method === "regnault-pfaundler") distribute(grid, ofRegnaultPfaundler(grid, drifts), gradient);
  else if (method === "adiabatic") distribute(grid, ofAdiabatic(grid), gradient);
  else distribute(grid, ofDickinson(grid, temperatures, drifts, shareOf(method), gradient), gradient);
  return gradient;
}

function ofRegnaultPfaundler({ duration }: Grid, drifts: Drifts): Sensitivities {
  const constant = coolingConstant(drifts);
  const rise = drifts.meanAfter - drifts.meanBefore;
  const above = drifts.meanAfter - drifts.meanMain;
  return {
    start: -1,
    end: 1,
    before: (-duration * above) / rise,
    after: -duration * (1 - above / rise),
    meanBefore: (-duration * constant * above) / rise,
    meanAfter: -duration * constant * (1 - above / rise),
    meanMain: duration * constant,
  };
}

function ofAdiabatic({ duration, foreSpread, afterSpread }: Grid): Sensitivities {
  const both = foreSpread + afterSpread;
  const [before, after] = [(-duration * foreSpread) / both, (-duration * afterSpread) / both];
  return { start: -1, end: 1, before, after, meanBefore: 0, meanAfter: 0, meanMain: 0 };
}

/** τx moves with t_i, t_f and the two readings that it lies between; the readings get their part at once. */
function ofDickinson(grid: Grid, temperatures: Float64Array, drifts: Drifts, share: number, gradient: Float64Array): Sensitivities {
  const { time, right } = splitOf(grid, temperatures, drifts, share);
  const isFirst = right === grid.lastFore + 1;
  const isLast = right === grid.firstAfter;
  const [from, low] = isFirst ? [grid.fire, drifts.start] : [grid.times[right - 1]!, temperatures[right - 1]!];
  const [to, high] = isLast ? [grid.end, drifts.end] : [grid.times[right]!, temperatures[right]!];
  const part = (time - from) / (to - from);
  const perKelvin = ((drifts.after - drifts.before) * (to - from)) / (high - low);
  const sensitivities: Sensitivities = {
    start: -1 + perKelvin * (1 - share),
    end: 1 + perKelvin * share,
    before: grid.fire - time,
    after: time - grid.end,
    meanBefore: 0,
    meanAfter: 0,
    meanMain: 0,
  };
  if (isFirst) sensitivities.start -= perKelvin * (1 - part);
  else gradient[right - 1]! -= perKelvin * (1 - part);
  if (isLast) sensitivities.end -= perKelvin * part;
  else gradient[right]! -= perKelvin * part;
  return sensitivities;
}

/** From the sums to the readings they are made of. */
function distribute(grid: Grid, of: Sensitivities, gradient: Float64Array): void {
  const { count, lastFore, firstAfter, weights, fireWeight, endWeight } = grid;
  for (let k = lastFore + 1; k < firstAfter; k++) gradient[k]! += of.meanMain * weights[k]!;
  const start = of.start + of.meanMain * fireWeight;
  const end = of.end + of.meanMain * endWeight;
  const [before, meanBefore] = grid.readAtFire
    ? [of.before, of.meanBefore]
    : [of.before + start * (grid.fire - grid.foreTime), of.meanBefore + start];
  const [after, meanAfter] = grid.readAtEnd ? [of.after, of.meanAfter] : [of.after + end * (grid.end - grid.afterTime), of.meanAfter + end];
  for (let k = 0; k <= lastFore; k++) gradient[k]! += before * weights[k]! + meanBefore / (lastFore + 1);
  for (let k = firstAfter; k < count; k++) gradient[k]! += after * weights[k]! + meanAfter / (count - firstAfter);
  if (grid.readAtFire) gradient[lastFore]! += start;
  if (grid.readAtEnd) gradient[firstAfter]! += end;
}
