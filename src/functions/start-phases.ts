/**
 * Vapours and condensed matter that cannot be as an equilibrium takes them.
 *   before   p = x P of a vapour above its saturation pressure at T0: it stands there as vapour, with the energy of vapour
 *   after    solids and liquids have no volume: much of them in a given volume leaves less room to the gas than is counted
 */
import type { Candidate, Equilibrium, Reactant } from "../core/equilibrium/types";
import { printed } from "../core/refusal";
import { molarMass } from "../core/species/formula";
import { saturationPressure } from "../core/water/saturation";
import { atomicWeights } from "../data/library";
import { saturation } from "../data/saturation";
import { keyOf } from "./gas-model";
import { exceededVapourPressure } from "./gas-phase";

/** As humid air at its saturation is written, with rounded digits. */
const ROUNDING = 1.01;
const LOWEST = 190;

/** Vapours above their saturation among the gases that are put in, at T0 in K and their pressure in Pa: a sentence each. */
export function vapourNotes(reactants: readonly Reactant[], temperature: number, pressure: number): string[] {
  const gases = reactants.filter(({ capacity, amount }) => capacity.phase === "g" && amount > 0);
  return [...waterNotes(gases, temperature, pressure), ...otherNotes(gases, temperature, pressure)];
}

/** Vapours other than water, by Peng-Robinson: fuels that are liquid in part. */
function otherNotes(gases: readonly Reactant[], temperature: number, pressure: number): string[] {
  const total = amountOf(gases);
  return gases
    .filter((gas) => !isWater(gas))
    .flatMap(({ name, amount }) => {
      const partial = (amount / total) * pressure;
      const limit = exceededVapourPressure(keyOf(name), temperature, partial);
      if (limit === undefined) return [];
      return `${name} put in as vapour has the partial pressure ${printed(partial)} Pa, above its vapour pressure at ${printed(temperature)} K, about ${printed(limit)} Pa: it would be liquid in part, and is counted with the energy of vapour`;
    });
}

function waterNotes(gases: readonly Reactant[], temperature: number, pressure: number): string[] {
  if (temperature < LOWEST || temperature > saturation.criticalTemperature) return [];
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
