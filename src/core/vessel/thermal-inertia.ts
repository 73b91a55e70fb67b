/**
 * Thermal inertia of a vessel, φ = 1 + C_wall/C_contents: a reaction whose heat also warms the wall rises φ times less than it would
 * adiabatically. And the highest temperature of a synthesis reaction after a failure of cooling, MTSR = T + X φ ΔT, with the accumulated
 * share X of the reactants and the rise ΔT seen in a vessel of inertia φ (φ = 1: the adiabatic rise itself). Vaporisation is ignored.
 */
import { printed, refuseRange } from "../refusal";
import type { HeatStore } from "./types";
import { capacityAt } from "./wall";

/** φ at a temperature, K. Refuses a temperature outside the range of either, and contents without heat capacity. */
export function thermalInertia(contents: HeatStore, wall: HeatStore, temperature: number): number {
  const capacity = capacityAt(contents, temperature);
  if (!(capacity > 0)) refuseRange(`The heat capacity of the contents, ${printed(capacity)} J/K, is not above 0 J/K`);
  return 1 + capacityAt(wall, temperature) / capacity;
}

export interface Accumulated {
  /** Process temperature, K. */
  readonly temperature: number;
  /** Rise for all the reactants, K. */
  readonly rise: number;
  /** Share of the reactants that has not reacted yet, 0 to 1. */
  readonly accumulation: number;
  /** Thermal inertia of the vessel in which the rise was seen, 1 or above. */
  readonly phi: number;
}

/** MTSR, K. Refuses a share outside 0 to 1, and an inertia below 1. */
export function highestSynthesisTemperature({ temperature, rise, accumulation, phi }: Accumulated): number {
  if (!(rise >= 0)) refuseRange(`Adiabatic rise ${printed(rise)} K is negative`);
  if (!(accumulation >= 0 && accumulation <= 1)) refuseRange(`Accumulation ${printed(accumulation)} is not between 0 and 1`);
  if (!(phi >= 1)) refuseRange(`Thermal inertia phi ${printed(phi)} is below 1, its value without a wall`);
  return temperature + accumulation * phi * rise;
}
