/**
 * Net value at constant pressure of a liquid hydrocarbon fuel from its gross value at constant volume (J/g, 25 °C).
 *
 *   q_net = q − k_H H                  H hydrogen in per cent by mass, k_H in J/g per per cent (212.2 as ASTM D240 prints it)
 *   q_net = a + b q                    aviation fuels of unknown hydrogen; a in J/g
 *
 * Water, oxygen and nitrogen are neglected: a blend that holds them goes through net-value.ts. By volume: q_net ρ, with ρ in g/cm³ it is
 * J/mL, the same number as kJ/L.
 */
import { printed, refuseRange } from "../refusal";
import { requireGross, requireHydrogen } from "./net-value";

/** The straight line between gross and net of aviation fuels, and the gross values it is meant for, J/g. */
export interface AviationLine {
  readonly intercept: number;
  readonly slope: number;
  readonly from: number;
  readonly to: number;
}

/** Liquid hydrocarbon fuels hold more, per cent. */
const LOWEST_HYDROGEN = 5;

/** Net value at constant pressure, J/g. Refuses hydrogen below 5 % (no liquid hydrocarbon fuel) and above methane's. */
export function netOfLiquid(gross: number, hydrogen: number, constant: number): number {
  requireGross(gross);
  requireHydrogen(hydrogen);
  if (!(hydrogen >= LOWEST_HYDROGEN)) {
    refuseRange(
      `Hydrogen ${printed(hydrogen)} % is below ${LOWEST_HYDROGEN} %, which hydrocarbon liquids exceed; for other fuels use FUEL.NET`,
    );
  }
  return gross - constant * hydrogen;
}

/** Estimate of the net value of an aviation fuel, J/g. Refuses gross values outside the span of those fuels. */
export function netOfAviationFuel(gross: number, { intercept, slope, from, to }: AviationLine): number {
  if (!(gross >= from && gross <= to)) {
    refuseRange(
      `Gross value ${printed(gross)} J/g is outside ${from} to ${to} J/g, the aviation fuels of the estimate without hydrogen: give the hydrogen`,
    );
  }
  return intercept + slope * gross;
}

/** A value by mass (J/g) by volume: J/mL at a density in g/cm³. Refuses a density that is not above 0. */
export function byVolume(value: number, density: number): number {
  if (!(density > 0)) refuseRange(`Density ${printed(density)} g/cm3 is not above 0 g/cm3`);
  return value * density;
}
