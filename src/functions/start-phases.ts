/**
 * Water and condensed matter that cannot be as an equilibrium takes them.
 *   before   p(H2O) = x(H2O) P above the saturation pressure at T0: it stands there as vapour, with the energy of vapour
 *   after    solids and liquids have no volume: much of them in a given volume leaves less room to the gas than is counted
 */
import type { Candidate, Equilibrium, Reactant } from "../core/equilibrium/types";
import { printed } from "../core/refusal";
import { molarMass } from "../core/species/formula";
import { saturationPressure } from "../core/water/saturation";
import { atomicWeights } from "../data/library";
import { saturation } from "../data/saturation";

/** As humid air at its saturation is written, with rounded digits. */
const ROUNDING = 1.01;
const LOWEST = 190;

/** Vapour of water above its saturation among the gases that are put in, at T0 in K and their pressure in Pa: one sentence. */
export function vapourNotes(reactants: readonly Reactant[], temperature: number, pressure: number): string[] {
  if (temperature < LOWEST || temperature > saturation.criticalTemperature) return [];
  const gases = reactants.filter(({ capacity }) => capacity.phase === "g");
  const share = amountOf(gases.filter(isWater)) / amountOf(gases);
  const limit = saturationPressure(temperature, saturation);
  if (!(share * pressure > ROUNDING * limit)) return [];
  const over = temperature < saturation.tripleTemperature ? "ice" : "liquid water";
  return [
    `H2O put in as vapour has the partial pressure ${printed(share * pressure)} Pa, above the saturation pressure over ${over} at ${printed(temperature)} K, ${printed(limit)} Pa: it would condense, and is counted with the energy of vapour`,
  ];
}

function amountOf(reactants: readonly Reactant[]): number {
  return reactants.reduce((sum, { amount }) => sum + amount, 0);
}

function isWater({ counts }: Reactant): boolean {
  return counts.size === 2 && counts.get("H") === 2 && counts.get("O") === 1;
}

/** Solids and liquids in the volume, kg/m³, from which their room, some per cent, is worth a sentence. */
const DENSE = 20;

/** Condensed species that take up room in a given volume: one sentence. */
export function roomNotes(candidates: readonly Candidate[], { amounts, volume }: Equilibrium): string[] {
  const mass = candidates.reduce(
    (sum, { counts, capacity }, j) =>
      sum + (capacity.phase === "g" || amounts[j] === 0 ? 0 : (amounts[j]! * molarMass({ counts, charge: 0 }, atomicWeights)) / 1000),
    0,
  );
  if (!(mass > DENSE * volume)) return [];
  return [
    `Solids and liquids of ${printed(mass)} kg in ${printed(volume)} m3 leave less room to the gas than is counted: the pressure comes out too low, and a vessel full of liquid is far above it`,
  ];
}
