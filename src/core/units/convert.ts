/**
 * Values to and from the SI base of their dimension: J/(mol K), Pa, m3, mol, kg, J, s, K.
 * With n / d the exact size of the unit, base = (value − zero) n / d + offset: one rounding where n or d is 1.
 * 77 °F is 298.15 K to the last bit, because 77 − 32 = 45 and 45 × 5 / 9 = 25 are exact; other readings come within one unit
 * of the last place of the kelvins.
 */
import type { Unit } from "./types";

/** A value in the unit to the SI base; `25` in °C gives 298.15. */
export function toBase(value: number, unit: Unit): number {
  return ((value - unit.zero) * unit.numerator) / unit.denominator + unit.offset;
}

/** A value in the SI base to the unit; 298.15 gives 25 in °C. */
export function fromBase(value: number, unit: Unit): number {
  return ((value - unit.offset) * unit.denominator) / unit.numerator + unit.zero;
}

/** A difference in the unit to the SI base: a rise of 9 °F is 5 K. */
export function intervalToBase(difference: number, unit: Unit): number {
  return (difference * unit.numerator) / unit.denominator;
}

/** A difference in the SI base to the unit. */
export function intervalFromBase(difference: number, unit: Unit): number {
  return (difference * unit.denominator) / unit.numerator;
}
