import type { SpeciesFit } from "../species/types";
import { CONSTANT_TERM, type PrintedInterval } from "./laurent";
import { numbersOf } from "./printed";

/** The form counts temperature in thousands of kelvin: t = T/1000. */
const KILO = 1000;

/**
 * Shomate form of the NIST fits to the JANAF tables (SRD 69), t = T/1000:
 *
 *   Cp = A + B t + C t² + D t³ + E/t²                                   J/(mol K)
 *   H  = A t + B t²/2 + C t³/3 + D t⁴/4 − E/t + F                       kJ/mol
 *   S  = A ln t + B t + C t²/2 + D t³/3 − E/(2t²) + G                   J/(mol K)
 *
 * Coefficients as printed: A … H. F holds the enthalpy of formation; H, printed beside it, is the formation enthalpy itself and turns
 * the sum into H(T) − H(298.15), so it is not used here. Where the source prints calories, `unitFactor` is 4.184.
 * F and G may be left out.
 */
export function shomate(fit: SpeciesFit): PrintedInterval[] {
  const unit = fit.unitFactor;
  return fit.intervals.map((interval, index) => {
    const [a, b, c, d, e] = numbersOf(fit, index, 5, 8) as [number, number, number, number, number];
    const f = interval.coefficients[5] ?? null;
    const g = interval.coefficients[6] ?? null;
    const cp = [e * KILO ** 2, 0, a, b / KILO, c / KILO ** 2, d / KILO ** 3, 0].map((coefficient) => coefficient * unit);
    return {
      from: interval.from,
      to: interval.to,
      cp,
      enthalpyConstant: f === null ? null : f * KILO * unit,
      // A ln t = A ln T − A ln 1000
      entropyConstant: g === null ? null : g * unit - cp[CONSTANT_TERM]! * Math.log(KILO),
    };
  });
}
