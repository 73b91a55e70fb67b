/**
 * The methods by which the temperature rise of a calorimeter run is corrected for what the jacket and the stirrer did meanwhile.
 *   regnault-pfaundler  cooling constant from the drifts before and after; mean temperature of the main period by trapezoids (default)
 *   dickinson           each drift is carried to the time at which 0.60 of the rise is done (routine methods)
 *   dickinson-63        the same with 0.63 (the original derivation has 1 − 1/e)
 *   adiabatic           the jacket follows; one small drift, common to both periods
 * Formulas and the shares 0.60 and 0.63 from memory of the coal and liquid-fuel standards.
 */
import { refuse } from "../../refusal";

export const METHODS = ["regnault-pfaundler", "dickinson", "dickinson-63", "adiabatic"] as const;

export type Method = (typeof METHODS)[number];

/** Share of the raw rise at which the two drifts meet. */
export const DICKINSON_SHARE = 0.6;
export const ORIGINAL_SHARE = 0.63;

/** The method of a name in any case. Refuses an unknown one with the list. */
export function methodOf(name: string): Method {
  const folded = name
    .trim()
    .toLowerCase()
    .replace(/[\s_\u2010-\u2015]+/g, "-");
  return METHODS.find((method) => method === folded) ?? refuse(`The method "${name}" is not one of ${METHODS.join(", ")}`);
}
