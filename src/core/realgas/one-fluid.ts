/**
 * A cubic equation with its two numbers, a (J m³/mol²) at the temperature and b (m³/mol), of a gas or of a mixture taken as one fluid:
 *
 *   P = R T/(v − b) − a/((v + d1 b)(v + d2 b))
 *   ln φ = Z − 1 − ln Z − ln(1 − b/v) − a L/(R T),   L = ln((v + d1 b)/(v + d2 b))/((d1 − d2) b)
 *
 * T in K, v in m³/mol, P in Pa. NaN where v is not above b.
 */
import { GAS_CONSTANT } from "../constants";
import type { CubicForm } from "./form";

const R = GAS_CONSTANT;

export function pressureOf({ d1, d2 }: CubicForm, a: number, b: number, temperature: number, volume: number): number {
  if (!(volume > b)) return NaN;
  return (R * temperature) / (volume - b) - a / ((volume + d1 * b) * (volume + d2 * b));
}

/** (∂P/∂v) at constant T, Pa mol/m³. */
export function pressureByVolumeOf({ d1, d2 }: CubicForm, a: number, b: number, temperature: number, volume: number): number {
  if (!(volume > b)) return NaN;
  const quadratic = (volume + d1 * b) * (volume + d2 * b);
  const slope = 2 * volume + (d1 + d2) * b;
  return (-R * temperature) / (volume - b) ** 2 + (a * slope) / quadratic ** 2;
}

/** L, mol/m³. */
export function logarithmOf({ d1, d2 }: CubicForm, b: number, volume: number): number {
  if (!(volume > b)) return NaN;
  const width = (d1 - d2) * b;
  return Math.log1p(width / (volume + d2 * b)) / width;
}

/** ln φ of the whole at T, v and the P that belongs to them. */
export function logFugacityOf(form: CubicForm, a: number, b: number, temperature: number, volume: number, pressure: number): number {
  const z = (pressure * volume) / (R * temperature);
  return z - 1 - Math.log(z) - Math.log1p(-b / volume) - (a * logarithmOf(form, b, volume)) / (R * temperature);
}
