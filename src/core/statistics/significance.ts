/**
 * Student's t test of an estimate against an expected value.
 *
 *   t = (estimate − expected) / standard error,   p = P(|t'| > |t|) for t' of Student's distribution
 *
 * p is the probability of a difference at least as large, on either side, if the expected value is true. Used for a mean against a
 * reference (standard error s/√n, n − 1 degrees of freedom) and for a slope against zero (n − 2).
 */
import { refuse } from "../refusal";
import { studentT } from "./distributions";

export interface Significance {
  readonly t: number;
  /** Two-sided. */
  readonly p: number;
}

/**
 * t and p; undefined where the standard error is zero, because without scatter there is nothing to compare with. Refuses degrees of
 * freedom below 1 and a negative error.
 */
export function significance(difference: number, standardError: number, degrees: number): Significance | undefined {
  if (!(degrees >= 1)) refuse(`A t test needs at least 1 degree of freedom, not ${degrees}`);
  if (!(standardError >= 0)) refuse(`The standard error ${standardError} of a t test is negative or not a number`);
  if (standardError === 0) return undefined;
  const t = difference / standardError;
  return { t, p: Math.min(1, 2 * studentT(degrees).upper(Math.abs(t))) };
}
