import { add, addDouble, type DoubleDouble, logarithm, multiply, reciprocal, timesDouble } from "../numeric/double-double";
import { integralRow, type LaurentInterval, valueAt, valueRow } from "./laurent";

/** What `integralAt` gives, with its sums carried to 32 digits and rounded once. */
export function carefulIntegralAt(rows: Float64Array, at: number, temperature: number): number {
  let sum: DoubleDouble = [rows[at + 6]!, 0];
  for (let k = 5; k >= 2; k--) sum = addDouble(timesDouble(sum, temperature), rows[at + k]!);
  sum = addDouble(timesDouble(sum, temperature), rows[at + 7]!);
  sum = add(sum, timesDouble(reciprocal(temperature), rows[at]!));
  return add(sum, timesDouble(logarithm(temperature), rows[at + 1]!))[0];
}

/** What `entropyAt` gives, with its sums carried to 32 digits and rounded once. */
export function carefulEntropyAt(rows: Float64Array, at: number, temperature: number): number {
  let sum: DoubleDouble = [rows[at + 6]!, 0];
  for (let k = 5; k >= 3; k--) sum = addDouble(timesDouble(sum, temperature), rows[at + k]!);
  sum = addDouble(timesDouble(sum, temperature), rows[at + 7]!);
  const inverse = reciprocal(temperature);
  sum = add(sum, multiply(addDouble(timesDouble(inverse, rows[at]!), rows[at + 1]!), inverse));
  return add(sum, timesDouble(logarithm(temperature), rows[at + 2]!))[0];
}

/** An interval whose energy rounding blurs by more than this, K, is evaluated with care: ten times less than the inverse promises. */
const LARGEST_BLUR = 1e-10;

/**
 * Whether the terms of H and U are so much larger than their sum that the rounding of doubles would blur the temperature of an energy by
 * more than 1e-10 K; S, whose terms are theirs by temperature, is blurred alike, and with it a saturation pressure. So it is in the hottest intervals of the nine-term fits and in liquid water, where terms of 1e8 J/mol cancel.
 */
export function cancels(interval: LaurentInterval, gasConstant: number): boolean {
  const integral = integralRow(interval, gasConstant);
  const value = Float64Array.from(valueRow(interval.cp, gasConstant));
  return [interval.from, Math.sqrt(interval.from * interval.to), interval.to].some((t) => {
    const terms = integral.map((coefficient, k) => coefficient * (k === 1 ? Math.log(t) : k === 7 ? 1 : t ** (k - 1)));
    const size = terms.reduce((sum, term) => sum + Math.abs(term), 0);
    return Number.EPSILON * size > LARGEST_BLUR * Math.abs(valueAt(value, 0, t));
  });
}
