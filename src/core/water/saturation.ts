/**
 * Saturation pressure of ordinary water, over the liquid and over ice.
 *
 * Liquid (IAPWS SR1-86(1992), eq. 1), 273.16 K to 647.096 K, with τ = 1 − T/Tc:
 *   ln(p/pc) = (Tc/T)(a1 τ + a2 τ^1.5 + a3 τ^3 + a4 τ^3.5 + a5 τ^4 + a6 τ^7.5)
 * Ice Ih (IAPWS R14-08(2011), eq. 6), 190 K to 273.16 K (the equation holds to 50 K), with θ = T/Tt:
 *   ln(p/pt) = θ^−1 (a1 θ^b1 + a2 θ^b2 + a3 θ^b3)
 */
import { Refusal } from "../refusal";

export interface SaturationConstants {
  readonly criticalTemperature: number;
  readonly criticalPressure: number;
  readonly tripleTemperature: number;
  readonly triplePressure: number;
  readonly liquid: readonly { readonly a: number; readonly exponent: number }[];
  readonly ice: readonly { readonly a: number; readonly exponent: number }[];
}

const LOWEST = 190;

/** Saturation pressure, Pa, at a temperature in K; refused outside 190 K to the critical point. */
export function saturationPressure(temperature: number, constants: SaturationConstants): number {
  if (!(temperature >= LOWEST && temperature <= constants.criticalTemperature)) {
    throw new Refusal(
      "range",
      `Temperature ${temperature} K is outside ${LOWEST} K to ${constants.criticalTemperature} K, where the saturation pressure of water is known`,
    );
  }
  return temperature < constants.tripleTemperature ? overIce(temperature, constants) : overLiquid(temperature, constants);
}

function overLiquid(temperature: number, { criticalTemperature, criticalPressure, liquid }: SaturationConstants): number {
  const tau = 1 - temperature / criticalTemperature;
  const sum = liquid.reduce((added, { a, exponent }) => added + a * tau ** exponent, 0);
  return criticalPressure * Math.exp((criticalTemperature / temperature) * sum);
}

function overIce(temperature: number, { tripleTemperature, triplePressure, ice }: SaturationConstants): number {
  const theta = temperature / tripleTemperature;
  const sum = ice.reduce((added, { a, exponent }) => added + a * theta ** exponent, 0);
  return triplePressure * Math.exp(sum / theta);
}
