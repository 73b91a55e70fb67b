/**
 * Second virial coefficient of a gas, and the virial equation of state cut off after it:
 *
 *   B = a − b exp(c/T)        P = (R T/v)(1 + B/v)
 *
 * a and b in cm³/mol and c in K as printed; T in K, v and B in m³/mol, P in Pa. What is cut off, C/v² and more, is small in thin gas only
 * and makes the pressure too low. Half the critical density is where common practice stops (from memory); there the cubic equations put it
 * at up to 12 % of the pressure. Here the end is a fifth of the critical density and |B| a tenth of v, where they put it below 2.5 %.
 */
import { GAS_CONSTANT } from "../constants";
import { printed, refuseRange } from "../refusal";

/** Constants of B = a − b exp(c/T) of one gas, as printed. */
export interface SecondVirialConstants {
  /** As sentences name the gas. */
  readonly species: string;
  /** cm³/mol. */
  readonly a: number;
  /** cm³/mol. */
  readonly b: number;
  /** K. */
  readonly c: number;
  /** Range of the fit, K. */
  readonly from: number;
  readonly to: number;
}

const CUBIC_CENTIMETRE = 1e-6;

/** B, m³/mol, at a temperature in K; refused outside the range of the constants. */
export function secondVirial(temperature: number, { species, a, b, c, from, to }: SecondVirialConstants): number {
  if (!(temperature >= from && temperature <= to))
    refuseRange(
      `Temperature ${printed(temperature)} K is outside ${from} K to ${to} K, where the second virial coefficient of ${species} is known`,
    );
  return CUBIC_CENTIMETRE * (a - b * Math.exp(c / temperature));
}

/** The smallest molar volume, in critical volumes and in |B|. */
const CRITICAL_VOLUMES = 5;
const CORRECTIONS = 10;

/** The smallest molar volume, m³/mol, at which the equation is used: five times the critical volume (m³/mol), and ten times |B|. */
export function leastVirialVolume(temperature: number, constants: SecondVirialConstants, criticalVolume: number): number {
  return Math.max(CRITICAL_VOLUMES * criticalVolume, CORRECTIONS * Math.abs(secondVirial(temperature, constants)));
}

/**
 * Pressure, Pa, at a temperature in K and a molar volume in m³/mol. Refused outside the range of the constants and at denser gas than the
 * equation holds for.
 */
export function virialPressure(temperature: number, volume: number, constants: SecondVirialConstants, criticalVolume: number): number {
  const least = leastVirialVolume(temperature, constants, criticalVolume);
  if (!(volume >= least && volume < Infinity))
    refuseRange(
      `Molar volume ${printed(volume)} m3/mol of ${constants.species} at ${printed(temperature)} K is not at least ${printed(least)} m3/mol, five critical volumes and ten times |B|: the virial equation with B alone holds for thinner gas only`,
    );
  return ((GAS_CONSTANT * temperature) / volume) * (1 + secondVirial(temperature, constants) / volume);
}
