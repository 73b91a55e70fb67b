/**
 * The tables of EQUILIBRIUM: a feed at temperature and volume, temperature and pressure, or with its energy or enthalpy held.
 * The family file holds the worksheet functions; here is what they show.
 */
import { GAS_CONSTANT } from "../core/constants";
import { atPressure, atVolume, isobaric, rigid } from "../core/equilibrium/states";
import type { System } from "../core/equilibrium/system";
import type { Candidate, Equilibrium, Reactant } from "../core/equilibrium/types";
import { printed, Refusal } from "../core/refusal";
import { type Expected, PRESSURE, readPressure, readQuantity, readTemperature, TEMPERATURE } from "./arguments";
import type { Named } from "./broadcast";
import { idealNotes } from "./burnt";
import { Block, Cell, cells } from "./cell";
import { elementsOf, productArgument, productsOf, productSystem, type ProductSystem } from "./products";
import { cautionsAt, feedOf, type Inlet, inletArgument, requireEnergies } from "./reactants";
import { blockChoice, setOf } from "./set";
import { line, type Line, type Report, SEE_NOTE, table } from "./table";

const VOLUME: Expected = { name: "Volume", unit: "m3", example: '"0.34 L"' };
const T0: Expected = { name: "Temperature T0", unit: "K", example: '"25 °C"' };

/** Species below this share of everything are named together in an upright table. */
const TRACE = 1e-9;

/** What two functions of the family hold, and how: each reads its two cells and gives the state. */
export interface Held {
  /** Names of the two arguments after the feed, for the sentence about shapes. */
  readonly names: readonly [string, string];
  state(put: Put, first: Cell | undefined, second: Cell | undefined): Found;
}

/** What is put in, and what may form of it. */
interface Put {
  readonly system: System;
  readonly reactants: readonly Reactant[];
  /** A state before this one in the same call. */
  readonly near: Equilibrium | undefined;
}

interface Found {
  readonly equilibrium: Equilibrium;
  /** Start, K, where there is one. */
  readonly start?: number;
  /** Lines on the state before. */
  readonly before: readonly Line[];
}

export const AT_VOLUME: Held = {
  names: ["temperature", "volume"],
  state({ system, reactants, near }, first, second) {
    return { equilibrium: atVolume(system, reactants, readTemperature(first, TEMPERATURE), readVolume(second), near), before: [] };
  },
};

export const AT_PRESSURE: Held = {
  names: ["temperature", "pressure"],
  state({ system, reactants, near }, first, second) {
    return {
      equilibrium: atPressure(system, reactants, readTemperature(first, TEMPERATURE), readPressure(second, PRESSURE), near),
      before: [],
    };
  },
};

export const RIGID: Held = {
  names: ["T0", "volume"],
  state({ system, reactants, near }, first, second) {
    const start = readStart(first, reactants);
    const volume = readVolume(second);
    const before = [
      line("pressure before", (gasOf(reactants) * GAS_CONSTANT * start) / volume, "Pa", "of the gases put in, at T0; absolute"),
    ];
    return { equilibrium: rigid(system, reactants, totalOf(reactants, "energy", start), volume, near), start, before };
  },
};

export const ISOBARIC: Held = {
  names: ["T0", "pressure"],
  state({ system, reactants, near }, first, second) {
    const start = readStart(first, reactants);
    const pressure = readPressure(second, PRESSURE);
    const before = [line("volume before", (gasOf(reactants) * GAS_CONSTANT * start) / pressure, "m3", "of the gases put in, at T0")];
    return { equilibrium: isobaric(system, reactants, totalOf(reactants, "enthalpy", start), pressure, near), start, before };
  },
};

function readVolume(cell: Cell | undefined): number {
  const volume = readQuantity(cell, VOLUME);
  if (volume > 0) return volume;
  throw new Refusal("range", `Volume ${printed(volume)} m3 is not above 0 m3`);
}

function readStart(cell: Cell | undefined, reactants: readonly Reactant[]): number {
  const start = readTemperature(cell, T0);
  requireEnergies(reactants, start);
  return start;
}

function gasOf(reactants: readonly Reactant[]): number {
  return reactants.reduce((sum, { amount, capacity }) => sum + (capacity.phase === "g" ? amount : 0), 0);
}

function totalOf(reactants: readonly Reactant[], what: "energy" | "enthalpy", temperature: number): number {
  return reactants.reduce((sum, { amount, capacity }) => sum + (amount > 0 ? amount * capacity[what](temperature) : 0), 0);
}

/** Upright table, or one row for each of a column of states. */
export function equilibriumCells(held: Held, feed: Block, first: Block, second: Block, species?: Block, set?: Block): Block {
  return cells(() => {
    const inlet = inletArgument(feed, "feed");
    const products = productArgument(species);
    const whole = blockChoice(set);
    const named: readonly Named[] = [
      ["feed", inlet.texts],
      [held.names[0], first],
      [held.names[1], second],
      ["species", products.texts],
      ["set", whole ? undefined : set],
    ];
    const sweep = named.some(([, block]) => (block?.length ?? 1) > 1);
    let before: { readonly system: System; readonly equilibrium: Equilibrium } | undefined;
    return table(named, ([feedCell, firstCell, secondCell, speciesCell, setCell]) => {
      const choice = whole ?? setOf(setCell);
      const put = feedOf(feedCell, inlet.composition, choice);
      const wanted = products.whole ?? productsOf(speciesCell);
      if (wanted.kind === "complete")
        throw new Refusal("input", "Complete products are an estimate of BURN; an equilibrium takes a list of species, or none for all");
      const chosen = productSystem(wanted, choice, elementsOf(put.reactants));
      const near = before?.system === chosen.system ? before.equilibrium : undefined;
      const found = held.state({ system: chosen.system, reactants: put.reactants, near }, firstCell, secondCell);
      if (sweep) before = { system: chosen.system, equilibrium: found.equilibrium };
      return report(put, chosen, found, sweep);
    });
  });
}

function report(
  put: Inlet,
  { candidates, label, passedOver }: ProductSystem,
  { equilibrium, start, before }: Found,
  sweep: boolean,
): Report {
  const { temperature, pressure, volume, gas, energy, enthalpy, leftOut } = equilibrium;
  const gone = leftOut.length === 0 ? "" : `left out, as they have no value at ${printed(temperature)} K: ${leftOut.join(", ")}`;
  return {
    lines: [
      ...before,
      line("temperature", temperature, "K"),
      line("pressure", pressure, "Pa", gas === 0 ? "as given: everything condenses, no gas is left" : "absolute"),
      line("volume", volume, "m3", "of the gas; solids and liquids have none"),
      line("amount of gas", gas, "mol"),
      line("energy U", energy, "J", "of everything, with enthalpies of formation at 298.15 K"),
      line("enthalpy H", enthalpy, "J", "of everything; H = U + pV of the gas"),
      ...speciesLines(candidates, equilibrium, sweep),
      line("species", label, "", gone),
      line("mass-action residual", equilibrium.massAction, "", "largest |ln Q − ln K| over all species"),
      line("element residual", equilibrium.elements, "", "largest relative difference of an element"),
      line("assumptions", SEE_NOTE, "", "ideal gas and pure condensed phases at chemical equilibrium; rates are not considered"),
      line("caution", SEE_NOTE, "", CAUTION),
    ],
    warnings: [
      ...(start === undefined ? [] : [...put.notes, ...cautionsAt(put, start)]),
      ...(passedOver.length === 0 ? [] : [`Without enthalpy of formation or entropy, and so passed over: ${passedOver.join(", ")}`]),
      ...idealNotes(pressure),
    ],
  };
}

const CAUTION = "not a design or relief calculation; the vessel's own rating, local codes and licensed practice govern";

function speciesLines(candidates: readonly Candidate[], { amounts, gas }: Equilibrium, sweep: boolean): Line[] {
  const whole = amounts.reduce((sum, amount) => sum + amount, 0);
  const all = candidates.map(({ name, capacity }, j) => ({ name, isGas: capacity.phase === "g", amount: amounts[j]! }));
  const sorted = all.sort((a, b) => b.amount - a.amount);
  const shown = sweep ? sorted : sorted.filter(({ amount }) => amount >= TRACE * whole);
  const lines = shown.map(({ name, isGas, amount }) =>
    line(name, amount, "mol", isGas ? `mole fraction ${printed(amount / gas)}` : "condensed"),
  );
  const traces = sorted.filter(({ amount, isGas }) => isGas && amount < TRACE * whole).map(({ name }) => name);
  if (sweep || traces.length === 0) return lines;
  return [...lines, line("traces", SEE_NOTE, "", `below ${TRACE} of everything: ${traces.join(", ")}`)];
}
