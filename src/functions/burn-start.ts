/**
 * The start of a combustion in a closed vessel: fuel and oxidant in the proportion that is asked for, at T0 and P0.
 *   V = n R T0 / P0 over the gases put in   U = Σ n U(T0) over everything   n mol for one mole of fuel, U J/mol with formation
 * A number that only makes sense in another unit or as another ratio is refused, or stands in the warnings.
 */
import { GAS_CONSTANT } from "../core/constants";
import { proportion } from "../core/equilibrium/oxygen";
import type { Reactant } from "../core/equilibrium/types";
import { printed, refuse, refuseRange } from "../core/refusal";
import { type Expected, quoted, readPressure, readTemperature } from "./arguments";
import type { Cell } from "./cell";
import { cautionsAt, type Inlet, requireEnergies } from "./reactants";
import { vapourNotes } from "./start-phases";

const T0: Expected = { name: "Temperature T0", unit: "K", example: '"25 °C"' };
const P0: Expected = { name: "Pressure P0", unit: "Pa", example: '"1 atm"' };

/** What was put in. */
export interface BurnStart {
  readonly fuel: Inlet;
  readonly oxidant: Inlet;
  readonly ratio: number;
  /** K, Pa. */
  readonly temperature: number;
  readonly pressure: number;
  /** Fuel and oxidant, mol for one mole of fuel. */
  readonly reactants: readonly Reactant[];
  /** Gas among them, mol, and its volume, m³. */
  readonly gas: number;
  readonly volume: number;
  /** U, J. */
  readonly energy: number;
}

/** Richer than this nothing burns; a ratio written in per cent lies above it. */
const RICHEST = 50;

/** The equivalence ratio of a cell; whether it is above 0 the core decides. */
export function readRatio(cell: Cell | undefined): number {
  if (cell === undefined || cell === null)
    return refuse("The equivalence ratio is missing: give a number, 1 where the oxygen just suffices, above 1 for rich mixtures");
  if (typeof cell !== "number" || !Number.isFinite(cell))
    return refuse(`The equivalence ratio is ${quoted(cell)}; a number is expected, 1 where the oxygen just suffices`);
  if (cell > RICHEST)
    refuseRange(
      `Equivalence ratio ${printed(cell)} is above ${RICHEST}, richer than anything that burns: it is 1, not 100, where the oxygen just suffices; for other feeds use EQUILIBRIUM.RIGID`,
    );
  return cell;
}

export function readStartTemperature(cell: Cell | undefined): number {
  return readTemperature(cell, T0);
}

/** Plain numbers below this, Pa, were written in another unit; as a text with its unit any pressure is taken. */
const LEAST_PLAIN = 1000;

export function readStartPressure(cell: Cell | undefined): number {
  const pressure = readPressure(cell, P0);
  if (typeof cell !== "number" || pressure >= LEAST_PLAIN) return pressure;
  const units = [pressure < 0.5 ? "MPa" : "bar", "kPa", "Pa"].map((unit) => `"${printed(pressure)} ${unit}"`);
  return refuseRange(`Pressure P0 ${printed(pressure)} Pa is below ${LEAST_PLAIN} Pa: say ${units.join(" or ")}`);
}

/** What is put in. Refuses a proportion that cannot be, a start at which something has no energy, and contents without a gas. */
export function startOf(fuel: Inlet, oxidant: Inlet, ratio: number, temperature: number, pressure: number): BurnStart {
  const reactants = proportion(fuel.reactants, oxidant.reactants, ratio);
  requireEnergies(reactants, temperature);
  const gas = reactants.reduce((sum, { amount, capacity }) => sum + (capacity.phase === "g" ? amount : 0), 0);
  if (!(gas > 0)) refuse("Nothing that is put in is a gas, so that P0 has no meaning: give an oxidant that is a gas");
  const energy = reactants.reduce((sum, { amount, capacity }) => sum + amount * capacity.energy(temperature), 0);
  return { fuel, oxidant, ratio, temperature, pressure, reactants, gas, volume: (gas * GAS_CONSTANT * temperature) / pressure, energy };
}

/** Ratios between which fuels are known to burn, roughly; beyond them a content of fuel was often written for the ratio. */
const LEAN = 0.1;
const RICH = 5;

/** What is odd about a start, each a sentence. */
export function startNotes({ fuel, oxidant, temperature, pressure, ratio, reactants }: BurnStart): string[] {
  const inlets = [fuel, oxidant];
  return [
    ...inlets.flatMap(({ notes }) => notes),
    ...inlets.flatMap((inlet) => cautionsAt(inlet, temperature)),
    ...vapourNotes(reactants, temperature, pressure),
    ...ratioNotes(ratio),
  ];
}

function ratioNotes(ratio: number): string[] {
  if (ratio >= LEAN && ratio <= RICH) return [];
  return [
    `Equivalence ratio ${printed(ratio)} is very ${ratio < LEAN ? "lean" : "rich"}: it is fuel to oxidant divided by the same where the oxygen just suffices, not the content of fuel`,
  ];
}
