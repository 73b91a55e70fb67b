/**
 * Straight line y = intercept + slope · x by least squares, with its standard errors.
 *
 *   slope = Σ (x − x̄)(y − ȳ) / Σ (x − x̄)²,   intercept = ȳ − slope · x̄,   s² = Σ (y − intercept − slope x)² / (n − 2)
 *   s(slope) = s / √Sxx,   s(intercept) = s √(1/n + x̄²/Sxx)
 *
 * Everything is summed about the means, with compensation. Proved against NIST StRD (data set Norris).
 */
import { compensatedSum } from "../numeric/compensated-sum";
import { refuse, refuseRange } from "../refusal";
import { meanOf } from "./sample";

export interface Line {
  readonly slope: number;
  readonly intercept: number;
  /** Standard errors. */
  readonly slopeError: number;
  readonly interceptError: number;
  /** Standard deviation of the residuals, with n − 2. */
  readonly residual: number;
  /** n − 2. */
  readonly degrees: number;
}

/** The line through three or more points. Refuses lists of different lengths, fewer points, and x that are all equal. */
export function straightLine(x: readonly number[], y: readonly number[]): Line {
  const count = x.length;
  if (y.length !== count) refuse(`A line needs as many y as x: there are ${count} x and ${y.length} y`);
  if (count < 3) refuse(`A line with standard errors needs at least 3 points, not ${count}`);
  const [meanX, meanY] = [meanOf(x), meanOf(y)];
  const [aboutX, aboutY] = [about(x, meanX), about(y, meanY)];
  const spread = sumOfProducts(aboutX, aboutX);
  if (spread === 0) refuse(`A line has no slope: all ${count} values of x are ${x[0]}`);
  const slope = sumOfProducts(aboutX, aboutY) / spread;
  const residuals = aboutY.map((value, index) => value - slope * aboutX[index]!);
  const degrees = count - 2;
  const residual = Math.sqrt(sumOfProducts(residuals, residuals) / degrees);
  const line = {
    slope,
    intercept: meanY - slope * meanX,
    slopeError: residual / Math.sqrt(spread),
    interceptError: residual * Math.sqrt(1 / count + meanX ** 2 / spread),
    residual,
    degrees,
  };
  return Object.values(line).every(Number.isFinite) ? line : refuseRange("The line through these points is beyond double precision");
}

/** Distances from the mean, freed of what its rounding left: far from the origin that would be a scatter of its own. */
function about(values: readonly number[], mean: number): number[] {
  const distances = values.map((value) => value - mean);
  const left = meanOf(distances);
  return distances.map((distance) => distance - left);
}

function sumOfProducts(a: readonly number[], b: readonly number[]): number {
  return compensatedSum(a.map((value, index) => value * b[index]!));
}
