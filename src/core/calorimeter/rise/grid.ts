/**
 * The three periods of a run on its time axis, and what the formulas need of the times alone: it serves every run with these times.
 *   fore-period   readings up to firing, τ ≤ τi
 *   main period   τi to τf
 *   after-period  readings from its end on, τ ≥ τf
 * A reading that stands at τi belongs to the fore-period and is t_i; one at τf belongs to the after-period and is t_f.
 *
 * Each reading has one weight, because each belongs to one sum:
 *   fore, after   (τk − τ̄)/Σ(τ − τ̄)²      Σ weight · t = drift rate g, least squares, K/min
 *   between       (τk+1 − τk−1)/2/(τf − τi)  Σ weight · t = mean temperature t_m, trapezoids over the actual intervals, °C
 */
import { refuse, refuseRange } from "../../refusal";

/** Times closer than this count as the same, min: clock readings of a few years in minutes keep 1e-8. */
export const SAME_TIME = 1e-6;

/** Fewer readings than this give no straight line with a residual. */
export const LEAST_READINGS = 3;

export interface Grid {
  /** min, the first `count` count. */
  readonly times: Float64Array;
  readonly count: number;
  /** τi and τf, min. */
  readonly fire: number;
  readonly end: number;
  /** τf − τi, min. */
  readonly duration: number;
  /** Index of the last reading of the fore-period and of the first one of the after-period. */
  readonly lastFore: number;
  readonly firstAfter: number;
  /** Whether a reading stands at τi, at τf; if not, the fitted line gives the temperature there. */
  readonly readAtFire: boolean;
  readonly readAtEnd: boolean;
  /** Mean times of the two periods, min, and sums of squared distances from them, min². */
  readonly foreTime: number;
  readonly afterTime: number;
  readonly foreSpread: number;
  readonly afterSpread: number;
  readonly weights: Float64Array;
  /** Weights of t_i and t_f in the mean of the main period. */
  readonly fireWeight: number;
  readonly endWeight: number;
}

/**
 * The grid of `count` times (min, ascending), the firing time and the end of the main period (min).
 * Refuses a firing time or an end outside the record, an end that is not after firing, and fewer than 3 readings before or after.
 */
export function gridOf(times: Float64Array, count: number, fire: number, end: number): Grid {
  const lastFore = lastForeOf(times, count, fire);
  requireInside(times, count, end, "End of the main period");
  if (end <= fire + SAME_TIME) refuseRange(`End of the main period ${minutes(end)} is not after firing at ${minutes(fire)}`);
  const firstAfter = firstAtOrAfter(times, count, end);
  requireReadings(count - firstAfter, `The after-period, from ${minutes(end)} on,`);
  const weights = new Float64Array(count);
  const fore = centred(times, 0, lastFore, weights);
  const after = centred(times, firstAfter, count - 1, weights);
  const { fireWeight, endWeight } = trapezoids(times, lastFore, firstAfter, fire, end, weights);
  return {
    times,
    count,
    fire,
    end,
    duration: end - fire,
    lastFore,
    firstAfter,
    readAtFire: Math.abs(times[lastFore]! - fire) <= SAME_TIME,
    readAtEnd: Math.abs(times[firstAfter]! - end) <= SAME_TIME,
    foreTime: fore.mean,
    foreSpread: fore.spread,
    afterTime: after.mean,
    afterSpread: after.spread,
    weights,
    fireWeight,
    endWeight,
  };
}

/** Index of the last reading up to firing. Refuses a firing time outside the record, and fewer than 3 readings up to it. */
export function lastForeOf(times: Float64Array, count: number, fire: number): number {
  requireInside(times, count, fire, "Firing time");
  const readings = firstAtOrAfter(times, count, fire + 2 * SAME_TIME);
  requireReadings(readings, `The fore-period, up to firing at ${minutes(fire)},`);
  return readings - 1;
}

/** Index of the first reading at or after a time; `count` if there is none. */
export function firstAtOrAfter(times: Float64Array, count: number, time: number): number {
  let index = 0;
  while (index < count && times[index]! < time - SAME_TIME) index++;
  return index;
}

/** A time in a sentence: twelve digits, because a clock in minutes has many. */
export function minutes(time: number): string {
  return `${Number(time.toPrecision(12))} min`;
}

function requireInside(times: Float64Array, count: number, time: number, name: string): void {
  if (count === 0) refuse("There are no readings");
  const [first, last] = [times[0]!, times[count - 1]!];
  if (time >= first - SAME_TIME && time <= last + SAME_TIME) return;
  refuseRange(`${name} ${minutes(time)} is outside the record, ${minutes(first)} to ${minutes(last)}`);
}

function requireReadings(found: number, period: string): void {
  if (found >= LEAST_READINGS) return;
  refuseRange(`${period} holds ${found} ${found === 1 ? "reading" : "readings"}; at least ${LEAST_READINGS} are needed`);
}

/** Weights of the slope of a least-squares line over the readings `from` to `to`, both included. */
function centred(times: Float64Array, from: number, to: number, weights: Float64Array): { mean: number; spread: number } {
  let sum = 0;
  for (let k = from; k <= to; k++) sum += times[k]! - times[from]!;
  const mean = times[from]! + sum / (to - from + 1);
  let spread = 0;
  for (let k = from; k <= to; k++) spread += (times[k]! - mean) ** 2;
  for (let k = from; k <= to; k++) weights[k] = (times[k]! - mean) / spread;
  return { mean, spread };
}

/** Weights of the readings between in the mean of the main period. */
function trapezoids(times: Float64Array, lastFore: number, firstAfter: number, fire: number, end: number, weights: Float64Array) {
  const at = (k: number) => (k === lastFore ? fire : k === firstAfter ? end : times[k]!);
  const twice = 2 * (end - fire);
  for (let k = lastFore + 1; k < firstAfter; k++) weights[k] = (at(k + 1) - at(k - 1)) / twice;
  return { fireWeight: (at(lastFore + 1) - fire) / twice, endWeight: (end - at(firstAfter - 1)) / twice };
}
