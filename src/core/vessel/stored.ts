/**
 * Energy stored in a compressed ideal gas of constant γ, J, by four definitions; P absolute pressure and V volume of the vessel, Pa the
 * pressure of the surroundings, r = P/Pa:
 *   Brode                     (P − Pa) V/(γ − 1)                    heat that raises the pressure from Pa at constant volume
 *   isentropic expansion      P V/(γ − 1) [1 − r^(−(γ−1)/γ)]        loss of internal energy on expansion to Pa; all the work done
 *   less work on the air      the same − Pa (V2 − V), V2 = V r^(1/γ)
 *   isothermal bound          P V ln r                              work of expansion at constant temperature; needs heat from outside
 */
import { printed, refuseRange } from "../refusal";

export interface CompressedGas {
  /** Absolute, Pa. */
  readonly pressure: number;
  /** m³. */
  readonly volume: number;
  readonly gamma: number;
  /** Pa. */
  readonly ambient: number;
}

export interface StoredEnergy {
  readonly brode: number;
  readonly isentropic: number;
  readonly useful: number;
  readonly isothermal: number;
}

/** The four energies, J. Refuses a pressure not above the surroundings, a volume not above 0 and γ not above 1. */
export function storedEnergy({ pressure, volume, gamma, ambient }: CompressedGas): StoredEnergy {
  if (!(ambient > 0)) refuseRange(`Ambient pressure ${printed(ambient)} Pa is not above 0 Pa`);
  if (!(pressure > ambient))
    refuseRange(`Pressure ${printed(pressure)} Pa is not above the ambient pressure, ${printed(ambient)} Pa; pressures are absolute`);
  if (!(volume > 0)) refuseRange(`Volume ${printed(volume)} m3 is not above 0 m3`);
  if (!(gamma > 1 && gamma < Infinity)) refuseRange(`Gamma ${printed(gamma)} is not above 1`);
  const logarithm = Math.log1p((pressure - ambient) / ambient);
  const isentropic = ((pressure * volume) / (gamma - 1)) * -Math.expm1((-(gamma - 1) / gamma) * logarithm);
  return {
    brode: ((pressure - ambient) * volume) / (gamma - 1),
    isentropic,
    useful: isentropic - ambient * volume * Math.expm1(logarithm / gamma),
    isothermal: pressure * volume * logarithm,
  };
}
