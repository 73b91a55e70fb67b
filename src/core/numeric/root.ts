import { printed, refuse } from "../refusal";

export interface RootOptions {
  /** Half width of the last bracket that is good enough; default 0: to the last digit the function can tell apart. */
  readonly tolerance?: number;
  /** Evaluations allowed; default 200, far above what bisection alone needs. */
  readonly iterations?: number;
  /** What is sought, for the refusal, default "The root". */
  readonly what?: string;
  /** Unit of x in the refusal, with a leading space: " K". */
  readonly unit?: string;
}

/**
 * Root of a continuous function between two points where its signs differ, by Brent's method (Brent, Algorithms for Minimization without
 * Derivatives, 1973, chapter 4): inverse quadratic steps that can never leave the bracket, bisection where they are slow.
 *
 * Refuses, with the bracket, ends of equal sign, a value that is not a number, and more evaluations than allowed.
 */
export function root(f: (x: number) => number, low: number, high: number, options: RootOptions = {}): number {
  const { tolerance = 0, iterations = 200, what = "The root", unit = "" } = options;
  const between = (from: number, to: number) => `between ${printed(Math.min(from, to))}${unit} and ${printed(Math.max(from, to))}${unit}`;
  const value = (x: number) => {
    const y = f(x);
    if (Number.isNaN(y)) refuse(`${what} was not found: the equation has no value at ${printed(x)}${unit}`);
    return y;
  };
  // b is the best point, a the one on the other side of the root, c the best before b.
  let a = low;
  let b = high;
  let fa = value(a);
  let fb = value(b);
  if (fa === 0) return a;
  if (fb === 0) return b;
  if (fa > 0 === fb > 0) refuse(`${what} does not lie ${between(low, high)}`);
  let c = a;
  let fc = fa;
  let step = b - a;
  let stepBefore = step;
  for (let evaluation = 2; evaluation < iterations; evaluation++) {
    if (fb > 0 === fc > 0) {
      c = a;
      fc = fa;
      step = stepBefore = b - a;
    }
    if (Math.abs(fc) < Math.abs(fb)) {
      [a, b, c] = [b, c, b];
      [fa, fb, fc] = [fb, fc, fb];
    }
    const enough = 2 * Number.EPSILON * Math.abs(b) + tolerance / 2;
    const half = (c - b) / 2;
    if (Math.abs(half) <= enough || fb === 0) return b;
    const proposed = interpolate(a, b, c, fa, fb, fc, half, stepBefore, enough);
    stepBefore = proposed === undefined ? half : step;
    step = proposed ?? half;
    a = b;
    fa = fb;
    b += Math.abs(step) > enough ? step : half > 0 ? enough : -enough;
    fb = value(b);
  }
  return refuse(`${what} was not found in ${iterations} steps; it lies ${between(b, c)}`);
}

/** Brent's interpolated step from b, or undefined where bisection is the better choice. */
function interpolate(
  a: number,
  b: number,
  c: number,
  fa: number,
  fb: number,
  fc: number,
  half: number,
  stepBefore: number,
  enough: number,
): number | undefined {
  if (Math.abs(stepBefore) < enough || Math.abs(fa) <= Math.abs(fb)) return undefined;
  const s = fb / fa;
  let p: number;
  let q: number;
  if (a === c) {
    p = 2 * half * s;
    q = 1 - s;
  } else {
    const r = fb / fc;
    const t = fa / fc;
    p = s * (2 * half * t * (t - r) - (b - a) * (r - 1));
    q = (t - 1) * (r - 1) * (s - 1);
  }
  if (p > 0) q = -q;
  else p = -p;
  return 2 * p < Math.min(3 * half * q - Math.abs(enough * q), Math.abs(stepBefore * q)) ? p / q : undefined;
}

/** A function and its slope at one point. */
export interface ValueAndSlope {
  readonly value: number;
  readonly slope: number;
}

/**
 * Root of a rising function with known slope by Newton's method inside a shrinking bracket: a step that would leave the bracket, or that
 * is more than half the step before it, is replaced by bisection. The function must be at most 0 at `low` and at least 0 at `high`.
 *
 * Ends after a Newton step no longer than `tolerance`; that step is still taken, so the error is of the order of its square.
 * The result never lies outside [low, high].
 *
 * Refuses, with the last bracket, after `iterations` evaluations (default 100) or at a value that is not a number.
 */
export function newtonInBracket(
  f: (x: number) => ValueAndSlope,
  low: number,
  high: number,
  start: number,
  options: RootOptions = {},
): number {
  const { tolerance = 0, iterations = 100, what = "The root", unit = "" } = options;
  let below = low;
  let above = high;
  let x = start > low && start < high ? start : (low + high) / 2;
  let stepBefore = high - low;
  for (let evaluation = 0; evaluation < iterations; evaluation++) {
    const { value, slope } = f(x);
    if (Number.isNaN(value)) break;
    if (value === 0) return x;
    if (value < 0) below = x;
    else above = x;
    const step = -value / slope;
    if (Math.abs(step) <= tolerance) return Math.min(Math.max(x + step, low), high);
    const usable = x + step > below && x + step < above && Math.abs(step) <= stepBefore / 2;
    const next = usable ? x + step : (below + above) / 2;
    if (next === below || next === above) return next;
    stepBefore = Math.abs(next - x);
    x = next;
  }
  return refuse(`${what} was not found in ${iterations} steps; it lies between ${printed(below)}${unit} and ${printed(above)}${unit}`);
}
