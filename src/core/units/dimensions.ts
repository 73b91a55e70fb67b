/** Names of the dimensions that matter here, for refusals a person can act on. */
import { refuse } from "../refusal";
import { parseUnit } from "./parse";
import type { Unit } from "./types";

/** Canonical dimensions by name. */
export const dimensions = {
  number: "1",
  temperature: "K",
  pressure: "kg m^-1 s^-2",
  volume: "m^3",
  amount: "mol",
  mass: "kg",
  time: "s",
  length: "m",
  area: "m^2",
  energy: "kg m^2 s^-2",
  power: "kg m^2 s^-3",
  molarEnergy: "kg m^2 s^-2 mol^-1",
  specificEnergy: "m^2 s^-2",
  molarHeatCapacity: "kg m^2 s^-2 K^-1 mol^-1",
  specificHeatCapacity: "m^2 s^-2 K^-1",
  heatCapacity: "kg m^2 s^-2 K^-1",
  heatLoss: "kg m^2 s^-3 K^-1",
  density: "kg m^-3",
  specificVolume: "kg^-1 m^3",
  molarVolume: "m^3 mol^-1",
  concentration: "m^-3 mol",
  molarMass: "kg mol^-1",
  molality: "kg^-1 mol",
  expansion: "K^-1",
  compressibility: "kg^-1 m s^2",
  thermalPressure: "kg m^-1 s^-2 K^-1",
  heatingRate: "s^-1 K",
  pressureRate: "kg m^-1 s^-3",
  energyPerLength: "kg m s^-2",
} as const;

/** What a person calls each dimension, with its article, and a unit to offer. */
const said: Readonly<Record<string, readonly [name: string, unit: string]>> = {
  [dimensions.number]: ["a pure number", "1"],
  [dimensions.temperature]: ["a temperature", "K"],
  [dimensions.pressure]: ["a pressure", "bar"],
  [dimensions.volume]: ["a volume", "L"],
  [dimensions.amount]: ["an amount of substance", "mol"],
  [dimensions.mass]: ["a mass", "g"],
  [dimensions.time]: ["a time", "s"],
  [dimensions.length]: ["a length", "cm"],
  [dimensions.area]: ["an area", "m2"],
  [dimensions.energy]: ["an energy", "kJ"],
  [dimensions.power]: ["a power", "W"],
  [dimensions.molarEnergy]: ["a molar energy", "kJ/mol"],
  [dimensions.specificEnergy]: ["a specific energy", "J/g"],
  [dimensions.molarHeatCapacity]: ["a molar heat capacity", "J/(mol K)"],
  [dimensions.specificHeatCapacity]: ["a specific heat capacity", "J/(g K)"],
  [dimensions.heatCapacity]: ["a heat capacity", "J/K"],
  [dimensions.heatLoss]: ["a heat loss per kelvin", "W/K"],
  [dimensions.density]: ["a density", "kg/m3"],
  [dimensions.specificVolume]: ["a specific volume", "m3/kg"],
  [dimensions.molarVolume]: ["a molar volume", "cm3/mol"],
  [dimensions.concentration]: ["a concentration", "mol/L"],
  [dimensions.molarMass]: ["a molar mass", "g/mol"],
  [dimensions.molality]: ["a molality", "mol/kg"],
  [dimensions.expansion]: ["an expansion coefficient", "1/K"],
  [dimensions.compressibility]: ["a compressibility", "1/MPa"],
  [dimensions.thermalPressure]: ["a pressure per kelvin", "bar/K"],
  [dimensions.heatingRate]: ["a heating rate", "K/min"],
  [dimensions.pressureRate]: ["a rate of pressure rise", "bar/s"],
  [dimensions.energyPerLength]: ["an energy per length or a force", "J/cm"],
};

/** A person's name of a dimension with its article: `a pressure`; dimensions without a common name are spelt out. */
export function nameOfDimension(dimension: string): string {
  return said[dimension]?.[0] ?? `a quantity in ${dimension}`;
}

function nameWithUnit(dimension: string): string {
  const known = said[dimension];
  if (known === undefined) return nameOfDimension(dimension);
  return dimension === dimensions.number ? known[0] : `${known[0]} such as ${known[1]}`;
}

/**
 * Throws a Refusal unless the unit has the dimension, or one of the dimensions, asked for:
 * `2 bar is a pressure; an energy such as kJ is expected`. `what` is the text that holds the unit, as typed.
 */
export function requireDimension(unit: Unit, dimension: string | readonly string[], what: string): void {
  if (unit.dimension === dimension) return;
  const allowed = typeof dimension === "string" ? [dimension] : dimension;
  if (allowed.includes(unit.dimension)) return;
  refuse(`${what} is ${nameOfDimension(unit.dimension)}; ${allowed.map(nameWithUnit).join(" or ")} is expected`);
}

/** A unit text of the dimension asked for: parse and require in one step. Throws a Refusal. */
export function parseUnitOf(text: string, dimension: string | readonly string[]): Unit {
  const unit = parseUnit(text);
  requireDimension(unit, dimension, `"${text}"`);
  return unit;
}
