/**
 * Heat that still comes in the after-period bends it more than Newton's law does. Once the drift line and Newton's bend are taken off,
 *   y(τ) = t(τ) + G g_f x²/2 = a + b x − m e^(−(τ − τ0)/λ),  x = τ − τ̄ of the readings from τ0 on
 * The bend is judged by the coefficient c of x² (made free of a and b) against its own standard error, one-sided, Student's t of 99 %:
 * only a bend downwards tells of heat (so a Newton's bend upwards, of a drift that falls, is not taken off). The scatter is that about the bent line and about the fore-line, not below resolution/√12. Nor is
 * it a bend if c L²/4, its height over the length L of the readings, is within their resolution, because rounding is no chance scatter,
 * or if m is below 1e-5 of the rise.
 * m and λ are least squares, λ on a scale from L/16 to 3 L/2. Readings tell little of a λ near L or above, and the longer it is the more
 * heat the same bend means: the longest λ whose squares are within one variance of the least is given beside the best. A release much
 * slower than the record looks like a straight drift and cannot be seen at all.
 */
import { studentT } from "../../statistics/distributions";
import type { Line } from "../../statistics/line";
import { upperQuantile } from "../../statistics/special";
import type { Drifts } from "./drifts";
import { firstAtOrAfter, type Grid } from "./grid";
import { LEAST_FOR_HALVES } from "./halves";
import { coolingConstant } from "./regnault-pfaundler";

/** Multiples of the 63 % time after which no bend is that of the release itself: of an exponential 6e-6 is left. */
const RELEASE_GONE = 12;
const LEVEL = 0.01;
/** Share of the rise. */
const NOTHING = 1e-5;
const SHORTEST = 1 / 16;
const LONGEST = 1.5;
/** Eight to the factor of two. */
const FINENESS = 2 ** (1 / 8);

/** A release that goes on: m and λ, and τ0, the time at which m is still to come. */
export interface Tail {
  /** m, K. */
  readonly left: number;
  /** λ, min. */
  readonly constant: number;
  /** τ0, min. */
  readonly time: number;
}

/** Three tails that fit the bend: with the best λ, with the longest within one variance of it, and with the shortest within nine. */
export interface Bend {
  readonly best: Tail;
  readonly longest: Tail;
  readonly shortest: Tail;
}

/** What is known of the scatter besides: the fore-line, and the resolution of the readings, K. */
export interface Scatter {
  readonly fore: Line;
  readonly resolution: number;
}

/** What a tail still has to give at a time, K. */
export function leftAt({ left, constant, time }: Tail, when: number): number {
  return left * Math.exp((time - when) / constant);
}

/**
 * The bend of all readings behind a release of this 63 % time (min), whether the main period ends before or after them; of those of the
 * after-period if the release is not known or too few readings lie behind it.
 */
export function bendBehind(
  grid: Grid,
  temperatures: Float64Array,
  drifts: Drifts,
  response: number | undefined,
  scatter: Scatter,
  level = LEVEL,
): Bend | undefined {
  const { times, count, fire, firstAfter } = grid;
  const gone = response === undefined ? firstAfter : firstAtOrAfter(times, count, fire + RELEASE_GONE * response);
  return bendFrom(grid, temperatures, drifts, count - gone < LEAST_FOR_HALVES ? firstAfter : gone, scatter, level);
}

/** The bend of the readings from index `from` on; undefined if they do not bend significantly, or are fewer than 5. */
export function bendFrom(
  grid: Grid,
  temperatures: Float64Array,
  drifts: Drifts,
  from: number,
  { fore, resolution }: Scatter,
  level = LEVEL,
): Bend | undefined {
  if (grid.count - from < LEAST_FOR_HALVES) return undefined;
  const { x, y, offLine } = offLineFrom(grid, temperatures, drifts, from);
  const length = x[x.length - 1]! - x[0]!;
  const bend = fitted(offLine(x.map((here) => here * here)), y);
  const scatter = scatterOf(y, bend, { fore, resolution });
  const certain = Math.max((criticalOf(scatter.degrees, level) * scatter.kelvin) / Math.sqrt(bend.spread), (4 * resolution) / length ** 2);
  if (!(-bend.coefficient > certain)) return undefined;
  const fits = scaleOf(length)
    .map((constant) => ({ constant, ...fitted(offLine(x.map((here) => Math.exp((x[0]! - here) / constant))), y) }))
    .filter(({ coefficient }) => coefficient < 0);
  if (fits.length === 0) return undefined;
  const most = fits.reduce((reduction, fit) => Math.max(reduction, fit.reduction), 0);
  const within = (variances: number) => fits.filter(({ reduction }) => most - reduction <= variances * scatter.kelvin ** 2);
  const tail = ({ coefficient, constant }: { coefficient: number; constant: number }) => ({
    left: -coefficient,
    constant,
    time: grid.times[from]!,
  });
  const near = within(1);
  const [best, longest, shortest] = [tail(within(0)[0]!), tail(near[near.length - 1]!), tail(within(9)[0]!)];
  return best.left > NOTHING * (drifts.end - drifts.start) ? { best, longest, shortest } : undefined;
}

/** Readings without their line and Newton's bend, and the way to take a line off any values beside them. */
function offLineFrom({ times, count }: Grid, temperatures: Float64Array, drifts: Drifts, from: number) {
  const mean = times.subarray(from, count).reduce((sum, time) => sum + time, 0) / (count - from);
  const x = times.slice(from, count).map((time) => time - mean);
  const newton = Math.max(0, coolingConstant(drifts) * drifts.after);
  const spread = sumOfProducts(x, x);
  const offLine = (values: Float64Array) => residuals(x, spread, values);
  return { x, y: offLine(x.map((here, k) => temperatures[from + k]! - temperatures[from]! + (newton * here * here) / 2)), offLine };
}

/** Scatter of a reading about a fitted shape and about the fore-line, K. */
function scatterOf(y: Float64Array, { reduction }: Fit, { fore, resolution }: Scatter) {
  const squares = Math.max(0, sumOfProducts(y, y) - reduction) + fore.residual ** 2 * fore.degrees;
  const degrees = y.length - 3 + fore.degrees;
  return { kelvin: Math.max(Math.sqrt(squares / degrees), resolution / Math.sqrt(12)), degrees };
}

interface Fit {
  readonly coefficient: number;
  /** Squares of what is fitted. */
  readonly spread: number;
  /** By how much the fit lowers the squares of the readings. */
  readonly reduction: number;
}

function fitted(shape: Float64Array, y: Float64Array): Fit {
  const spread = sumOfProducts(shape, shape);
  const product = sumOfProducts(shape, y);
  return { coefficient: product / spread, spread, reduction: product ** 2 / spread };
}

function scaleOf(length: number): number[] {
  const steps = Math.floor(Math.log(LONGEST / SHORTEST) / Math.log(FINENESS));
  return Array.from({ length: steps + 1 }, (_, k) => length * LONGEST * FINENESS ** (k - steps));
}

/** What a straight line leaves of values at distances x from their mean. */
function residuals(x: Float64Array, spread: number, values: Float64Array): Float64Array {
  const mean = values.reduce((sum, value) => sum + value, 0) / values.length;
  const slope = sumOfProducts(x, values) / spread;
  return values.map((value, k) => value - mean - slope * x[k]!);
}

function sumOfProducts(a: Float64Array, b: Float64Array): number {
  let sum = 0;
  for (let k = 0; k < a.length; k++) sum += a[k]! * b[k]!;
  return sum;
}

/** Critical values by degrees of freedom and level: many runs of a call have the same. */
const criticals = new Map<string, number>();

function criticalOf(degrees: number, level: number): number {
  const key = `${degrees} ${level}`;
  const known = criticals.get(key);
  if (known !== undefined) return known;
  const critical = upperQuantile(studentT(degrees), level);
  criticals.set(key, critical);
  return critical;
}
