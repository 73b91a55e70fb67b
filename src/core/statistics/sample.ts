/**
 * Mean and standard deviation of a sample.
 *
 *   x̄ = Σ x / n,   s = √(Σ (x − x̄)² / (n − 1)),   standard deviation of the mean = s / √n
 *
 * Two passes with compensated sums; the second takes out what the rounding of the mean leaves (T. F. Chan, G. H. Golub,
 * R. J. LeVeque, Amer. Statist. 37 (1983) 242, from memory), and scales by the largest deviation so that no square overflows.
 */
import { compensatedSum } from "../numeric/compensated-sum";
import { refuse, refuseRange } from "../refusal";

/** A sample in the unit of its values. */
export interface Sample {
  readonly count: number;
  readonly mean: number;
  /** Of a single value, with n − 1. */
  readonly deviation: number;
  readonly deviationOfMean: number;
}

/** Mean and deviations of two or more values. Refuses fewer, and what is not finite. */
export function sampleOf(values: readonly number[]): Sample {
  const count = values.length;
  if (count < 2) refuse(`A standard deviation needs at least 2 values, not ${count}`);
  const mean = meanOf(values);
  const deviation = rootSum(values.map((value) => value - mean)) / Math.sqrt(count - 1);
  if (!Number.isFinite(deviation)) refuseRange("The values are too far apart for a standard deviation in double precision");
  return { count, mean, deviation, deviationOfMean: deviation / Math.sqrt(count) };
}

/** Mean of one or more values. Refuses none, and what is not finite. */
export function meanOf(values: readonly number[]): number {
  if (values.length === 0) refuse("A mean needs at least 1 value");
  const first = compensatedSum(values) / values.length;
  const mean = first + compensatedSum(values.map((value) => value - first)) / values.length;
  return Number.isFinite(mean) ? mean : refuseRange("The mean of the values is not a finite number");
}

/** The least and the largest of one or more values, however many they are. */
export function extremes(values: readonly number[]): readonly [least: number, largest: number] {
  return values.reduce(([least, largest], value) => [Math.min(least, value), Math.max(largest, value)], [Infinity, -Infinity]);
}

/** √(Σ d² − (Σ d)²/n): the second term is what the rounding of the mean left. */
function rootSum(deviations: readonly number[]): number {
  const [, largest] = extremes(deviations.map(Math.abs));
  if (largest === 0) return 0;
  const scaled = deviations.map((deviation) => deviation / largest);
  const squares = compensatedSum(scaled.map((part) => part * part));
  return largest * Math.sqrt(squares - compensatedSum(scaled) ** 2 / deviations.length);
}
