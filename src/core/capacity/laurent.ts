/**
 * The compiled form of every published polynomial: on one interval
 *
 *   Cp(T) = Σ c[k] T^k,  k = −2 … 4                                     J/(mol K)
 *   H(T)  = −c[−2]/T + c[−1] ln T + Σ c[k] T^(k+1)/(k+1)  (k ≥ 0) + enthalpyConstant       J/mol
 *   S(T)  = −c[−2]/(2T²) − c[−1]/T + c[0] ln T + Σ c[k] T^k/k (k ≥ 1) + entropyConstant    J/(mol K)
 *
 * Nine-term, seven-term, Shomate and power fits with whole exponents between −2 and 4 all become this, so one evaluator serves them
 * and a mixture of them is a sum of coefficient vectors.
 */

/** Number of coefficients of Cp: T⁻² T⁻¹ 1 T T² T³ T⁴. */
export const TERMS = 7;
/** Place of T⁰ among them. */
export const CONSTANT_TERM = 2;

export interface LaurentInterval {
  /** Lower limit, K; the interval holds temperatures above it (the first interval holds it too). */
  readonly from: number;
  /** Upper limit, K; belongs to this interval. */
  readonly to: number;
  /** Seven coefficients of Cp in J/(mol K^(k+1)), from T⁻² to T⁴. */
  readonly cp: readonly number[];
  /** Integration constant of H, J/mol. */
  readonly enthalpyConstant: number;
  /** Integration constant of S, J/(mol K); NaN where S is not known. */
  readonly entropyConstant: number;
}

/** As a form gives it: a constant the source does not print is null, and `anchored` finds it from values at 298.15 K. */
export interface PrintedInterval {
  readonly from: number;
  readonly to: number;
  readonly cp: readonly number[];
  readonly enthalpyConstant: number | null;
  readonly entropyConstant: number | null;
}

/** Row of Cp (or, R taken away, of Cv) for `valueAt`. */
export function valueRow(cp: readonly number[], gasConstant: number): number[] {
  return cp.map((coefficient, k) => (k === CONSTANT_TERM ? coefficient - gasConstant : coefficient));
}

/** Row of H (or of U, R taken away) for `integralAt`: −c[−2], c[−1], c[0], c[1]/2 … c[4]/5, constant. */
export function integralRow(interval: LaurentInterval, gasConstant: number): number[] {
  const c = valueRow(interval.cp, gasConstant);
  return [-c[0]!, c[1]!, c[2]!, c[3]! / 2, c[4]! / 3, c[5]! / 4, c[6]! / 5, interval.enthalpyConstant];
}

/** Row of S for `entropyAt`: −c[−2]/2, −c[−1], c[0], c[1], c[2]/2 … c[4]/4, constant. */
export function entropyRow(interval: LaurentInterval): number[] {
  const c = interval.cp;
  return [-c[0]! / 2, -c[1]!, c[2]!, c[3]!, c[4]! / 2, c[5]! / 3, c[6]! / 4, interval.entropyConstant];
}

/** Length of a row of H, U or S: seven terms and the constant. */
export const INTEGRAL_TERMS = TERMS + 1;

/** Σ c[k] T^k of the row that begins at `at`. `cvInto` repeats this expression, operation for operation. */
export function valueAt(rows: Float64Array, at: number, temperature: number): number {
  const t = temperature;
  const polynomial = (((rows[at + 6]! * t + rows[at + 5]!) * t + rows[at + 4]!) * t + rows[at + 3]!) * t + rows[at + 2]!;
  if (rows[at] === 0 && rows[at + 1] === 0) return polynomial;
  const inverse = 1 / t;
  return polynomial + (rows[at]! * inverse + rows[at + 1]!) * inverse;
}

/** ∫ Σ c[k] T^k dT + constant of the row that begins at `at`. The logarithm is taken only where the source has a term in 1/T. */
export function integralAt(rows: Float64Array, at: number, temperature: number): number {
  const t = temperature;
  const polynomial = ((((rows[at + 6]! * t + rows[at + 5]!) * t + rows[at + 4]!) * t + rows[at + 3]!) * t + rows[at + 2]!) * t;
  const logarithmic = rows[at + 1]!;
  const sum = rows[at]! / t + polynomial + rows[at + 7]!;
  return logarithmic === 0 ? sum : sum + logarithmic * Math.log(t);
}

/** ∫ (Σ c[k] T^k)/T dT + constant of the row that begins at `at`. */
export function entropyAt(rows: Float64Array, at: number, temperature: number): number {
  const t = temperature;
  const inverse = 1 / t;
  const polynomial = (((rows[at + 6]! * t + rows[at + 5]!) * t + rows[at + 4]!) * t + rows[at + 3]!) * t;
  return rows[at + 2]! * Math.log(t) + polynomial + (rows[at]! * inverse + rows[at + 1]!) * inverse + rows[at + 7]!;
}
