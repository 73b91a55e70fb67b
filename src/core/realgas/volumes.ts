/**
 * Volumes of a cubic equation at a temperature and pressure. With A = a P/(R T)² and B = b P/(R T), Z = P v/(R T) solves
 *
 *   Z³ + ((d1 + d2 − 1) B − 1) Z² + (A + d1 d2 B² − (d1 + d2) B (B + 1)) Z − (A B + d1 d2 B² (B + 1)) = 0
 *
 * by Cardano's formulas for the largest root, or the only one, and the quadratic equation that is left for the others: at low pressure they
 * are some 1e-8 and less, of which formulas that add to 1/3 leave no digit. Then Newton's method on P(T, v), which brings every digit.
 */
import { GAS_CONSTANT } from "../constants";
import { refuse, printed } from "../refusal";
import type { CubicGas } from "./cubic-gas";
import type { CubicForm } from "./form";
import { logFugacityOf, pressureByVolumeOf, pressureOf } from "./one-fluid";

const R = GAS_CONSTANT;

/** The smallest and the largest volume at T in K and P in Pa, m³/mol: the same where there is only one. */
export interface Volumes {
  readonly dense: number;
  readonly thin: number;
}

export function volumesAt(gas: CubicGas, temperature: number, pressure: number): Volumes {
  return volumesOf(gas.form, gas.attraction(temperature), gas.b, temperature, pressure);
}

/** The volume with the smaller Gibbs energy: the one a pure gas has. */
export function stableVolume(gas: CubicGas, temperature: number, pressure: number): number {
  return stableVolumeOf(gas.form, gas.attraction(temperature), gas.b, temperature, pressure);
}

/** The same of one fluid with a, J m³/mol², at T and b, m³/mol. */
export function stableVolumeOf(form: CubicForm, a: number, b: number, temperature: number, pressure: number): number {
  const { dense, thin } = volumesOf(form, a, b, temperature, pressure);
  if (dense === thin) return thin;
  const log = (volume: number) => logFugacityOf(form, a, b, temperature, volume, pressure);
  return log(thin) <= log(dense) ? thin : dense;
}

export function volumesOf(form: CubicForm, a: number, b: number, temperature: number, pressure: number): Volumes {
  const scale = (R * temperature) / pressure;
  let [least, most] = [Infinity, -Infinity];
  for (const z of compressibilities(form, a, b, temperature, pressure)) {
    if (!(z * scale > b)) continue;
    if (z < least) least = z;
    if (z > most) most = z;
  }
  if (least === Infinity) return refuse(`No volume was found at ${printed(temperature)} K and ${printed(pressure)} Pa`);
  const thin = polished(form, a, b, temperature, pressure, most * scale);
  return { thin, dense: least === most ? thin : polished(form, a, b, temperature, pressure, least * scale) };
}

/** Real roots Z of the cubic, in any order. */
function compressibilities(form: CubicForm, attraction: number, size: number, temperature: number, pressure: number): number[] {
  const { d1, d2 } = form;
  const a = (attraction * pressure) / (R * temperature) ** 2;
  const b = (size * pressure) / (R * temperature);
  const c2 = (d1 + d2 - 1) * b - 1;
  const c1 = a + d1 * d2 * b * b - (d1 + d2) * b * (b + 1);
  const c0 = -(a * b + d1 * d2 * b * b * (b + 1));
  const first = largestRoot(c2, c1, c0);
  const product = -c0 / first;
  // −c2 − Z1 would be the difference of two numbers near 1
  const sum = (c1 - product) / first;
  const discriminant = sum * sum - 4 * product;
  if (!(discriminant >= 0)) return [first];
  const second = (sum + (sum < 0 ? -1 : 1) * Math.sqrt(discriminant)) / 2;
  return [first, second, product / second];
}

/** The largest real root of Z³ + c2 Z² + c1 Z + c0, or the only one, to some 1e-15. */
function largestRoot(c2: number, c1: number, c0: number): number {
  const shift = -c2 / 3;
  const p = c1 - (c2 * c2) / 3;
  const q = (2 * c2 ** 3) / 27 - (c2 * c1) / 3 + c0;
  const discriminant = (q / 2) ** 2 + (p / 3) ** 3;
  if (discriminant > 0 || p === 0) {
    const u = Math.cbrt(-q / 2 - Math.sign(q || 1) * Math.sqrt(discriminant));
    return shift + u - (u === 0 ? 0 : p / (3 * u));
  }
  const radius = 2 * Math.sqrt(-p / 3);
  const angle = Math.acos(Math.max(-1, Math.min(1, (-q / 2) * (-3 / p) ** 1.5)));
  return shift + radius * Math.cos(angle / 3);
}

/** Newton on P(T, v) from a root of the cubic; where the curve is flat the root is kept as it is. */
function polished(form: CubicForm, a: number, b: number, temperature: number, pressure: number, start: number): number {
  let volume = start;
  for (let step = 0; step < 8; step++) {
    const change = (pressure - pressureOf(form, a, b, temperature, volume)) / pressureByVolumeOf(form, a, b, temperature, volume);
    if (!(Math.abs(change) < 0.1 * (volume - b))) return volume;
    volume += change;
    if (Math.abs(change) <= 4 * Number.EPSILON * volume) return volume;
  }
  return volume;
}
