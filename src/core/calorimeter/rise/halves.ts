/** Is a drift steady? The slopes of the first and of the second half of a period are compared; an odd reading in the middle is in both. */
import { straightLine } from "../../statistics/line";

export interface Halves {
  /** Slope of the second half less that of the first, K/min. */
  readonly difference: number;
  /** √(1/Sxx + 1/Sxx): times the scatter of a reading (K) it is the standard uncertainty of the difference. */
  readonly leverage: number;
  /** Squared residuals about the two lines, K², and their degrees of freedom. */
  readonly squares: number;
  readonly degrees: number;
}

/** Fewest readings of which each half still has a line with a residual. */
export const LEAST_FOR_HALVES = 5;

/** The halves of the readings `from` to `to`, both included: at least 5. */
export function halvesOf(times: Float64Array, temperatures: Float64Array, from: number, to: number): Halves {
  const size = Math.ceil((to - from + 1) / 2);
  const [first, second] = [from, to - size + 1].map((at) => {
    const line = straightLine(Array.from(times.subarray(at, at + size)), Array.from(temperatures.subarray(at, at + size)));
    const spread = squaresAboutMean(times.subarray(at, at + size));
    return { ...line, spread };
  });
  return {
    difference: second!.slope - first!.slope,
    leverage: Math.sqrt(1 / first!.spread + 1 / second!.spread),
    squares: first!.residual ** 2 * first!.degrees + second!.residual ** 2 * second!.degrees,
    degrees: first!.degrees + second!.degrees,
  };
}

function squaresAboutMean(values: Float64Array): number {
  const mean = values.reduce((sum, value) => sum + value, 0) / values.length;
  return values.reduce((sum, value) => sum + (value - mean) ** 2, 0);
}
