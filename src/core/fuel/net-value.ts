/**
 * Net value, and gross value at constant pressure, from the gross value at constant volume of the dry sample (J/g, 25 °C).
 *
 *   net           q_M = (q − k_H H − k_O O − k_N N)(1 − M/100) − k_M M
 *   gross, const. pressure   q_p = q + k_H H − k_O O − k_N N
 *
 * H, O, N of the dry sample, its own moisture left out, and M, the moisture of the sample that is reported, in per cent by mass;
 * k in J/g per per cent, from net-constants.ts or as a method prints them. At constant volume k_O = k_N = 0. M = 0 gives the dry net value;
 * above some 88 % moisture in wood the net value is negative, and that is real.
 */
import { printed, refuseRange } from "../refusal";
import type { GrossPressureConstants, NetConstants } from "./net-constants";

/** Gross value at constant volume, J/g, and contents of the dry sample, per cent. */
export interface DrySample {
  readonly gross: number;
  readonly hydrogen: number;
  readonly oxygen: number;
  readonly nitrogen: number;
}

/** No fuel gives more: hydrogen, the highest, 142 kJ/g. J/g. */
const HIGHEST_GROSS = 150_000;
/** Methane, the fuel richest in hydrogen beside hydrogen itself, has 25.13 %. */
const HIGHEST_HYDROGEN = 26;

/** Net value of the sample at its moisture (per cent), J/g. Refuses an impossible sample or a moisture outside 0 to 100 %. */
export function netValue(sample: DrySample, moisture: number, constants: NetConstants): number {
  requirePossible(sample);
  requirePercent("Moisture", moisture);
  const { gross, hydrogen, oxygen, nitrogen } = sample;
  const dry = gross - constants.hydrogen * hydrogen - constants.oxygen * oxygen - constants.nitrogen * nitrogen;
  if (!(dry > 0)) {
    refuseRange(
      `The net value of the dry sample would be ${printed(dry)} J/g: a gross value of ${printed(gross)} J/g does not go with ${printed(hydrogen)} % hydrogen`,
    );
  }
  return dry * (1 - 0.01 * moisture) - constants.moisture * moisture;
}

/** Gross value at constant pressure of the dry sample, J/g. Refuses an impossible sample. */
export function grossAtConstantPressure(sample: DrySample, constants: GrossPressureConstants): number {
  requirePossible(sample);
  const { gross, hydrogen, oxygen, nitrogen } = sample;
  return gross + constants.hydrogen * hydrogen - constants.oxygen * oxygen - constants.nitrogen * nitrogen;
}

/** Refuses a gross value no fuel has, and contents that are not per cent, are above methane's hydrogen, or add up to more than 100 %. */
export function requirePossible({ gross, hydrogen, oxygen, nitrogen }: DrySample): void {
  requireGross(gross);
  requirePercent("Hydrogen", hydrogen);
  requirePercent("Oxygen", oxygen);
  requirePercent("Nitrogen", nitrogen);
  requireHydrogen(hydrogen);
  const sum = hydrogen + oxygen + nitrogen;
  if (sum > 100 * (1 + 1e-12)) refuseRange(`Hydrogen, oxygen and nitrogen add up to ${printed(sum)} %, above 100 %`);
}

/** Refuses a gross value (J/g) that is not above 0, or above what hydrogen gives. */
export function requireGross(gross: number): void {
  if (!(gross > 0)) refuseRange(`Gross value ${printed(gross)} J/g is not above 0 J/g`);
  if (gross > HIGHEST_GROSS) {
    refuseRange(`Gross value ${printed(gross)} J/g is above ${HIGHEST_GROSS} J/g; hydrogen, the highest of fuels, gives 142000 J/g`);
  }
}

/** Refuses more hydrogen (per cent) than methane has. */
export function requireHydrogen(hydrogen: number): void {
  if (hydrogen > HIGHEST_HYDROGEN) {
    refuseRange(`Hydrogen ${printed(hydrogen)} % is above ${HIGHEST_HYDROGEN} %; methane, the richest in hydrogen, has 25.1 %`);
  }
}

function requirePercent(name: string, value: number): void {
  if (!(value >= 0 && value <= 100)) refuseRange(`${name} ${printed(value)} % is not between 0 % and 100 %`);
}
