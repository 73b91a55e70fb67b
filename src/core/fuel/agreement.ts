/**
 * Agreement of two to four results of one sample under repeatability conditions (ISO 5725-6, clause 5, from memory).
 *
 *   two results     difference ≤ r        → their mean; else a third run
 *   three results   range ≤ m₃ r          → their mean; else a fourth run
 *   four results    range ≤ m₄ r          → their mean; else the median (mean of the two in the middle), and a look for the cause
 *
 * r is the repeatability limit, f(2) σr; m₃ = f(3)/f(2) and m₄ = f(4)/f(2), where f(n) is the 95 % quantile of the range of n results
 * of standard deviation 1. Values, r and results in one unit, J/g.
 */
import { printed, refuse, refuseRange } from "../refusal";
import { isAbove, printedAbove } from "../statistics/above";
import { meanOf } from "../statistics/sample";

/** What the results say. `report` is absent until they agree or the fourth is in. */
export interface Agreement {
  readonly count: number;
  readonly mean: number;
  readonly range: number;
  /** The largest range at which this number of results agrees. */
  readonly allowed: number;
  readonly agrees: boolean;
  /** What to do, in words. */
  readonly verdict: string;
  readonly report?: number;
  /** How the value to report was formed. */
  readonly reportedAs: string;
}

/**
 * Judges the results of one sample. `multiples`: the allowed range of two, three and four results over r, such as [1, 1.2, 1.3].
 * Refuses fewer than two or more than four results, and a repeatability that is not above zero.
 */
export function agreement(results: readonly number[], repeatability: number, multiples: readonly [number, number, number]): Agreement {
  const count = results.length;
  if (count < 2) refuse(`Agreement needs at least 2 results of a sample, not ${count}`);
  if (count > 4) refuse(`Agreement is described for 2, 3 or 4 results of a sample, not ${count}`);
  if (!(repeatability > 0 && repeatability < Infinity)) refuseRange(`The repeatability ${printed(repeatability)} is not above 0`);
  const sorted = [...results].sort((a, b) => a - b);
  const [least, most] = [sorted[0]!, sorted[count - 1]!];
  const [range, allowed] = [most - least, multiples[count - 2]! * repeatability];
  const agrees = !isAbove(range, allowed, Math.max(Math.abs(least), Math.abs(most)));
  const known = { count, mean: meanOf(results), range, allowed, agrees };
  if (agrees) return { ...known, verdict: "agree", report: known.mean, reportedAs: `mean of ${count}` };
  const excess = `the ${count === 2 ? "difference" : "range"} ${printedAbove(range, allowed, 6)} J/g is above ${printed(allowed)} J/g`;
  if (count < 4) return { ...known, verdict: `make a ${count === 2 ? "third" : "fourth"} run: ${excess}`, reportedAs: "none yet" };
  const median = meanOf(sorted.slice(1, 3));
  return { ...known, verdict: `take the median and look for the cause: ${excess}`, report: median, reportedAs: "median of 4" };
}
