/**
 * Grubbs' test for a single outlier on either side (F. E. Grubbs, Technometrics 11 (1969) 1, from memory; ISO 5725-2, from memory).
 *
 *   G = max |x − x̄| / s,   critical value  (n − 1)/√n · √(t² / (n − 2 + t²))
 *
 * with t the upper quantile of Student's t of n − 2 degrees of freedom at α/(2n). Above the critical value at 5 % a value is called a
 * straggler, at 1 % an outlier. G cannot exceed (n − 1)/√n, so three values hardly ever show an outlier.
 */
import { refuse, refuseRange } from "../refusal";
import { studentT } from "./distributions";
import { extremes, sampleOf } from "./sample";
import { upperQuantile } from "./special";

/** The value farthest from the mean. */
export interface Farthest {
  /** Place in the list, from 0; the first of two that are equally far. */
  readonly index: number;
  /** G. */
  readonly statistic: number;
}

/** G of a sample and the value it belongs to. Refuses fewer than 3 values, and values that are all equal. */
export function grubbsStatistic(values: readonly number[]): Farthest {
  if (values.length < 3) refuse(`Grubbs' test needs at least 3 values, not ${values.length}`);
  const { mean, deviation } = sampleOf(values);
  if (deviation === 0) refuse("Grubbs' test has no meaning for values that are all equal");
  const distances = values.map((value) => Math.abs(value - mean));
  const largest = extremes(distances)[1];
  return { index: distances.indexOf(largest), statistic: largest / deviation };
}

/** Critical value of G for n values at a level such as 0.05, both sides together. Refuses n below 3 and levels outside 0 to 1. */
export function grubbsCritical(count: number, level: number): number {
  if (!(count >= 3)) refuse(`Grubbs' test needs at least 3 values, not ${count}`);
  if (!(level > 0 && level < 1)) refuseRange(`The level ${level} of Grubbs' test is not between 0 and 1`);
  const square = upperQuantile(studentT(count - 2), level / (2 * count)) ** 2;
  return ((count - 1) / Math.sqrt(count)) * Math.sqrt(square / (count - 2 + square));
}
