import type { SpeciesFit } from "../species/types";
import type { PrintedInterval } from "./laurent";
import { constantOf, numbersOf } from "./printed";

/**
 * Nine-term form of McBride, Zehe and Gordon (NASA/TP-2002-211556, equations 4.9 to 4.11):
 *
 *   Cp/R  = a1 T⁻² + a2 T⁻¹ + a3 + a4 T + a5 T² + a6 T³ + a7 T⁴
 *   H/RT  = −a1 T⁻² + a2 T⁻¹ ln T + a3 + a4 T/2 + a5 T²/3 + a6 T³/4 + a7 T⁴/5 + b1/T
 *   S/R   = −a1 T⁻²/2 − a2 T⁻¹ + a3 ln T + a4 T + a5 T²/2 + a6 T³/3 + a7 T⁴/4 + b2
 *
 * Coefficients as printed: a1 … a7, b1, b2; R is that of the fit. b1 and b2 may be left out.
 */
export function nineTerm(fit: SpeciesFit): PrintedInterval[] {
  const scale = fit.gasConstant * fit.unitFactor;
  return fit.intervals.map((interval, index) => ({
    from: interval.from,
    to: interval.to,
    cp: numbersOf(fit, index, 7, 9).map((a) => a * scale),
    enthalpyConstant: constantOf(interval.coefficients[7], scale),
    entropyConstant: constantOf(interval.coefficients[8], scale),
  }));
}
