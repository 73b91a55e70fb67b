/**
 * The tables of EQUILIBRIUM: a feed at temperature and volume, temperature and pressure, or with its energy or enthalpy held.
 * The family file holds the worksheet functions; here is what they show.
 */
import { GAS_CONSTANT } from "../core/constants";
import { atPressure, atVolume, isobaric, rigid } from "../core/equilibrium/states";
import type { System } from "../core/equilibrium/system";
import type { Candidate, Equilibrium, Reactant } from "../core/equilibrium/types";
import { printed, Refusal } from "../core/refusal";
import { type Expected, PRESSURE, readPressure, readTemperature, readVolume, TEMPERATURE } from "./arguments";
import type { Named } from "./broadcast";
import { idealNotes } from "./burnt";
import { Block, Cell, cells } from "./cell";
import { productNotes } from "./product-notes";
import { elementsOf, productArgument, productsOf, productSystem, type ProductSystem } from "./products";
import { outside } from "./property";
import { cautionsAt, feedOf, type Inlet, inletArgument, requireEnergies } from "./reactants";
import { blockChoice, setOf } from "./set";
import { speciesLines } from "./species-lines";
import { roomNotes, vapourNotes } from "./start-phases";
import { line, type Line, type Report, SEE_NOTE, table } from "./table";

const T0: Expected = { name: "Temperature T0", unit: "K", example: '"25 °C"' };

/** What two functions of the family hold, and how: each reads its two cells and gives the state. */
export interface Held {
  /** Names of the two arguments after the feed, for the sentence about shapes. */
  readonly names: readonly [string, string];
  readonly held: Parameters<typeof productNotes>[2];
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
  /** What is odd about the two cells, each a sentence. */
  readonly notes: readonly string[];
}

export const AT_VOLUME: Held = {
  names: ["temperature", "volume"],
  held: "temperature and volume",
  state({ system, reactants, near }, first, second) {
    const equilibrium = atVolume(system, reactants, readInside(first, system), readVolume(second), near);
    return { equilibrium, before: [], notes: volumeNotes(second, equilibrium.pressure) };
  },
};

export const AT_PRESSURE: Held = {
  names: ["temperature", "pressure"],
  held: "temperature and pressure",
  state({ system, reactants, near }, first, second) {
    const pressure = readPressure(second, PRESSURE);
    // the pressure that was given, without the last digit of the search
    const equilibrium = { ...atPressure(system, reactants, readInside(first, system), pressure, near), pressure };
    return { equilibrium, before: [], notes: pressureNotes(second) };
  },
};

export const RIGID: Held = {
  names: ["T0", "volume"],
  held: "energy and volume",
  state({ system, reactants, near }, first, second) {
    const start = readStart(first, reactants);
    const volume = readVolume(second);
    const pressure = (gasOf(reactants) * GAS_CONSTANT * start) / volume;
    const before = [line("pressure before", pressure, "Pa", "of the gases put in, at T0; absolute")];
    const equilibrium = rigid(system, reactants, totalOf(reactants, "energy", start), volume, near);
    const odd = pressure > 0 ? [...volumeNotes(second, pressure), ...vapourNotes(reactants, start, pressure)] : [];
    return { equilibrium, start, before, notes: odd };
  },
};

export const ISOBARIC: Held = {
  names: ["T0", "pressure"],
  held: "enthalpy and pressure",
  state({ system, reactants, near }, first, second) {
    const start = readStart(first, reactants);
    const pressure = readPressure(second, PRESSURE);
    const before = [line("volume before", (gasOf(reactants) * GAS_CONSTANT * start) / pressure, "m3", "of the gases put in, at T0")];
    const equilibrium = { ...isobaric(system, reactants, totalOf(reactants, "enthalpy", start), pressure, near), pressure };
    return { equilibrium, start, before, notes: [...pressureNotes(second), ...vapourNotes(reactants, start, pressure)] };
  },
};

/** A temperature inside the joint range of the gases; outside, the refusal reminds of the unit. */
function readInside(cell: Cell | undefined, { species, gases }: System): number {
  const temperature = readTemperature(cell, TEMPERATURE);
  const capacities = species.slice(0, gases).map(({ capacity }) => capacity);
  const [from, to] = [Math.max(...capacities.map((each) => each.from)), Math.min(...capacities.map((each) => each.to))];
  if (temperature < from)
    throw outside(
      capacities.find((each) => each.from === from)!,
      temperature,
    );
  if (temperature > to)
    throw outside(
      capacities.find((each) => each.to === to)!,
      temperature,
    );
  return temperature;
}

/** Plain numbers that lead to less, Pa, were often written in another unit: a volume in L gives a thousandth of the pressure. */
const LOW_IN_VOLUME = 1e4;
const LOW_PRESSURE = 1000;

function volumeNotes(cell: Cell | undefined, pressure: number): string[] {
  if (typeof cell !== "number" || pressure >= LOW_IN_VOLUME) return [];
  return [`${printed(pressure)} Pa in ${printed(cell)} m3 is little: a plain volume is in m3; for litres write "${printed(cell)} L"`];
}

/** A plain pressure, Pa, so low that another unit was meant. */
export function pressureNotes(cell: Cell | undefined): string[] {
  if (typeof cell !== "number" || cell >= LOW_PRESSURE) return [];
  return [`${printed(cell)} Pa is near vacuum: a plain pressure is in Pa; for another unit write "${printed(cell)} bar"`];
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
      return report(put, chosen, found, held.held, sweep || wanted.listed !== undefined);
    });
  });
}

function report(
  put: Inlet,
  chosen: ProductSystem,
  { equilibrium, start, before, notes }: Found,
  held: Held["held"],
  fixed: boolean,
): Report {
  const { candidates, label } = chosen;
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
      ...linesOfSpecies(candidates, equilibrium, fixed),
      line("species", label, "", gone),
      line("mass-action residual", equilibrium.massAction, "", "largest |ln Q − ln K| over all species"),
      line("element residual", equilibrium.elements, "", "largest relative difference of an element"),
      line("assumptions", SEE_NOTE, "", "ideal gas and pure condensed phases at chemical equilibrium; rates are not considered"),
      line("caution", SEE_NOTE, "", CAUTION),
    ],
    warnings: [
      ...(start === undefined ? [] : [...put.notes, ...cautionsAt(put, start)]),
      ...productNotes(chosen, equilibrium, held),
      ...notes,
      ...(held === "temperature and volume" || held === "energy and volume" ? roomNotes(candidates, equilibrium) : []),
      ...idealNotes(pressure, temperature),
    ],
  };
}

const CAUTION = "not a design or relief calculation; the vessel's own rating, local codes and licensed practice govern";

function linesOfSpecies(candidates: readonly Candidate[], { amounts, gas, leftOut }: Equilibrium, fixed: boolean): Line[] {
  const whole = amounts.reduce((sum, amount) => sum + amount, 0);
  const all = candidates.map(({ name, capacity }, j) => ({
    name,
    amount: amounts[j]!,
    fraction: amounts[j]! / whole,
    condensed: capacity.phase !== "g",
  }));
  const there = all.filter(({ name }) => !leftOut.includes(name));
  const lineOf = ({ name, amount, condensed }: (typeof all)[number]) => {
    const note = condensed ? "condensed" : gas > 0 ? `mole fraction ${printed(amount / gas)}` : "no gas is left";
    return line(name, amount, "mol", note);
  };
  return speciesLines(there, fixed, lineOf, { of: "everything", way: "list the species to see them all" });
}
