import type { SpeciesFit } from "../species/types";
import type { PrintedInterval } from "./laurent";
import { constantOf, numbersOf } from "./printed";

/**
 * Seven-term form of the older NASA reports and of the combustion mechanisms:
 *
 *   Cp/R = a1 + a2 T + a3 T² + a4 T³ + a5 T⁴
 *   H/RT = a1 + a2 T/2 + a3 T²/3 + a4 T³/4 + a5 T⁴/5 + a6/T
 *   S/R  = a1 ln T + a2 T + a3 T²/2 + a4 T³/3 + a5 T⁴/4 + a7
 *
 * Coefficients as printed: a1 … a7; R is that of the fit. a6 and a7 may be left out.
 */
export function sevenTerm(fit: SpeciesFit): PrintedInterval[] {
  const scale = fit.gasConstant * fit.unitFactor;
  return fit.intervals.map((interval, index) => ({
    from: interval.from,
    to: interval.to,
    cp: [0, 0, ...numbersOf(fit, index, 5, 7).map((a) => a * scale)],
    enthalpyConstant: constantOf(interval.coefficients[5], scale),
    entropyConstant: constantOf(interval.coefficients[6], scale),
  }));
}
