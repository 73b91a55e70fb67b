/**
 * Where the formulation of water holds: from the triple point to 1273 K, to 1000 MPa, in the fluid alone. Nothing is extrapolated.
 */
import { printed, refuseRange } from "../refusal";
import type { FormulationConstants } from "./formulation-constants";
import { melting } from "./melting";

/** 0.01 °C is 273.15999999999997 K in double precision, and still the triple point. */
const LAST_DIGITS = 1e-9;

/** True below the lowest temperature, K, by more than the rounding of its last digits. */
export function isBelow({ from }: FormulationConstants, temperature: number): boolean {
  return temperature < from - LAST_DIGITS;
}

/** Refuses a temperature, K, outside the limits. */
export function requireTemperature(constants: FormulationConstants, temperature: number): void {
  const { from, to } = constants;
  if (!isBelow(constants, temperature) && temperature <= to) return;
  const place =
    temperature > to ? `above ${to} K, the upper limit of IAPWS-95` : `below ${from} K, the triple point and the lower limit of IAPWS-95`;
  refuseRange(`Temperature ${Number(temperature.toPrecision(10))} K is ${place}`);
}

/** Far above any density, kg/m³, that the highest pressure reaches; beyond it the terms of the formulation soon overflow. */
const CROWDED = 1e4;

/** Refuses a density, kg/m³, that is not above 0, and one that no pressure within the limits gives. */
export function requireDensity({ highestPressure }: FormulationConstants, density: number): void {
  if (!(density > 0)) refuseRange(`Density ${density} kg/m3 is not above 0 kg/m3`);
  if (density > CROWDED)
    refuseRange(`Density ${density} kg/m3 would need far more than ${megapascal(highestPressure)}, the limit of IAPWS-95`);
}

/** Refuses a pressure, Pa, above the limit or above the melting pressure; `subject` begins the sentence: `Pressure 2000 MPa at 300 K is`. */
export function requirePressure(constants: FormulationConstants, temperature: number, pressure: number, subject: string): void {
  const { highestPressure } = constants;
  if (pressure > highestPressure)
    refuseRange(`${subject} ${megapascal(pressure)}, above ${megapascal(highestPressure)}, the limit of IAPWS-95`);
  const frozen = melting(constants.melting, temperature);
  if (frozen && pressure > frozen.pressure) {
    refuseRange(`${subject} ${megapascal(pressure)}, above ${megapascal(frozen.pressure)}, where water freezes to ice ${frozen.ice}`);
  }
}

export function megapascal(pressure: number): string {
  return `${printed(pressure / 1e6)} MPa`;
}
