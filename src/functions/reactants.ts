/**
 * What is burned or put in: the arguments fuel, oxidant and feed become reactants.
 *   fuel, oxidant   a species, a named mixture, a mixture in mole fractions, a text in moles (`O2 + 3.76 N2`), a fuel text of BURN.FUEL,
 *                   or a range species | mole fraction [| set]
 *   feed            a text in moles, `1 CH4 + 2 O2 + 7.52 N2`, or a range species | mol [| set]
 * Texts repeat down a column, so what they mean is kept in a bounded cache; the result depends on the arguments alone.
 */
import type { Capacity } from "../core/capacity/capacity";
import { REFERENCE_TEMPERATURE } from "../core/constants";
import type { Reactant } from "../core/equilibrium/types";
import { explainTemperature } from "../core/capacity/range";
import { printed, Refusal, refuse, refuseRange } from "../core/refusal";
import { findSpecies, recordOf } from "../data/library";
import { quoted } from "./arguments";
import { BoundedCache } from "./cache";
import { type Block, type Cell, isLeftOut, plain } from "./cell";
import { countsMoles, isComposition, molesOfText, type Part, partsOfRange, partsOfText, requireFractions, total } from "./composition";
import { type FormationSpecies, formationSpecies, heldNotes } from "./formation-species";
import { grossFuelReactant, grossFuelWarnings, isGrossFuel, readGrossFuel } from "./fuel-text";
import { extrapolationNotes } from "./product-notes";
import { valueAt } from "./property";
import { type SetChoice, setOf } from "./set";
import { capacityOfFit, matchingFit } from "./substance";

/** What an argument puts in. */
export interface Inlet {
  /** Names it in caches: argument, text or cells, and set. */
  readonly key: string;
  /** As sentences name it. */
  readonly label: string;
  /** Amounts are mole fractions; moles for a feed, and for an oxidant written in moles. */
  readonly reactants: readonly Reactant[];
  /** Sentences: which set was used where the one asked for does not hold a species, what was held, what is odd. */
  readonly notes: readonly string[];
  /** True: the energy of a reactant is known at 25 °C only. */
  readonly fixedEnergy: boolean;
  /** The gases as far as their fits go, if values beyond were asked for. */
  readonly fitted: readonly Capacity[];
  /** The sentence for a start more than 5 K from 25 °C, if the energy is fixed; `cautionsAt` decides. */
  readonly caution?: string;
}

/** An argument before its set is known: a block of texts, or one composition. */
export interface InletArgument {
  readonly texts?: Block;
  readonly composition?: Block;
}

type Role = "fuel" | "oxidant" | "feed";

const EXAMPLES: Readonly<Record<Role, string>> = {
  fuel: 'a species such as "CH4", a mixture, a text of BURN.FUEL, or a range of species and mole fractions',
  oxidant: '"air", "O2", a mixture, or a range of species and mole fractions',
  feed: 'a text in mol such as "1 CH4 + 2 O2 + 7.52 N2", or a range of species and mol',
};

const inlets = new BoundedCache<Inlet>(2000);

/** Tells a composition range, one inlet, from one or many texts, which spread. Refuses an argument that was left out. */
export function inletArgument(block: Block | undefined, role: Role): InletArgument {
  if (block === undefined || isLeftOut(block) || block.every((row) => row.every((cell) => plain(cell) === null)))
    return refuse(`The ${role} is missing: give ${EXAMPLES[role]}`);
  const texts: Block = block;
  if (isComposition(block)) return { composition: block };
  for (const [row, [, amount]] of texts.entries()) refuseUnit(amount, row + 1, role);
  return { texts };
}

/** Amounts beside species are plain numbers; a mass or a number typed as text would make the range one of many texts. */
function refuseUnit(amount: unknown, row: number, role: Role): void {
  const text = plain(amount);
  if (typeof text !== "string" || !/^[\d.]+(?:e[+-]?\d+)?\s*(?:[munk]?mol|[mk]?g|m?l|m3)?$/i.test(text.trim())) return;
  refuse(
    `Row ${row} of the ${role} has the text "${text}" beside the species: amounts are plain numbers, ${role === "feed" ? "in mol" : "mole fractions"}`,
  );
}

/** The fuel that a cell means, or the composition if there is one; mole fractions. */
export function fuelOf(cell: Cell | undefined, composition: Block | undefined, set: SetChoice): Inlet {
  return inletOf("fuel", cell, composition, set);
}

/** The oxidant; mole fractions, or the moles as written (`O2 + 3.76 N2`). */
export function oxidantOf(cell: Cell | undefined, composition: Block | undefined, set: SetChoice): Inlet {
  return inletOf("oxidant", cell, composition, set);
}

/** The feed; mol. */
export function feedOf(cell: Cell | undefined, composition: Block | undefined, set: SetChoice): Inlet {
  return inletOf("feed", cell, composition, set);
}

function inletOf(role: Role, cell: Cell | undefined, composition: Block | undefined, set: SetChoice): Inlet {
  const what = composition ? `cells:${JSON.stringify(composition)}` : textOf(role, cell);
  const key = `${role}|${what}|${set.key}`;
  return inlets.at(key, () =>
    withWayOut(role, () =>
      composition ? made(key, `the ${role}`, partsOfBlock(role, composition), set) : made(key, what, partsOf(role, what, set), set),
    ),
  );
}

/** A fuel that the library lacks can still be burned, and an oxidant may be mixed. */
const WAYS_OUT: Readonly<Record<Role, string>> = {
  fuel: "; or give the fuel by its gross value through BURN.FUEL",
  oxidant: '; or give a mixture such as "0.21 O2 + 0.79 N2", or one of MIX.HUMIDAIR',
  feed: "",
};

function withWayOut(role: Role, make: () => Inlet): Inlet {
  try {
    return make();
  } catch (thrown) {
    if (!(thrown instanceof Refusal) || !/ is not in the library/.test(thrown.message)) throw thrown;
    throw new Refusal("absent", `${thrown.message}${slipIn(thrown.message) ?? WAYS_OUT[role]}`);
  }
}

/** What may be wrong with the writing of a text that was taken for a species. */
function slipIn(message: string): string | undefined {
  const written = /^"([^"]*)" is not in the library/.exec(message)?.[1] ?? "";
  if (/^\d+,\d+\s/.test(written)) return `; a decimal comma is not read: write ${written.replace(",", ".")}`;
  if (/^(?:\d+\/\d|[½⅓⅔¼¾⅛])/.test(written)) return "; amounts are decimal numbers, such as 0.5 O2";
  if (/\S\+\S/.test(written)) return "; a plus sign between species has a blank on both sides";
  return undefined;
}

function textOf(role: Role, cell: Cell | undefined): string {
  if (typeof cell === "string") return cell.trim();
  return refuse(`The ${role} is ${quoted(cell)}; give ${EXAMPLES[role]}`);
}

function partsOfBlock(role: Role, composition: Block): readonly Part[] {
  const parts = partsOfRange(composition);
  if (role !== "feed") requireFractions(parts);
  return parts;
}

function partsOf(role: Role, text: string, set: SetChoice): readonly Part[] {
  if (role === "feed") return molesOfText(withoutUnits(text));
  if (set.fits && matchingFit(text, set.fits)) return [{ species: text, amount: 1 }];
  if (countsMoles(text)) return role === "fuel" ? shares(molesOfText(text)) : molesOfText(text);
  const parts = partsOfText(text) ?? [{ species: text, amount: 1 }];
  requireFractions(parts);
  return parts;
}

/** Refuses `60 g CH4`: a feed counts moles. */
function withoutUnits(text: string): string {
  const unit = /(?:^|\+)\s*[\d.]+(?:e[+-]?\d+)?\s*((?:[munk]?mol|[mk]?g|m?L|m3)\s)/.exec(text)?.[1];
  if (unit !== undefined)
    refuse(`The feed "${text}" gives an amount in ${unit.trim()}: write moles without a unit, such as "1 CH4 + 2 O2"`);
  return text;
}

function shares(parts: readonly Part[]): readonly Part[] {
  const sum = total(parts);
  return parts.map((part) => ({ ...part, amount: part.amount / sum }));
}

function made(key: string, label: string, parts: readonly Part[], set: SetChoice): Inlet {
  const each = parts.map((part) => reactantOf(part, set));
  const fixed = each.filter(({ fixed }) => fixed).map(({ reactant }) => reactant.name);
  return {
    key,
    label,
    reactants: each.map(({ reactant }) => reactant),
    notes: [...new Set(each.flatMap(({ notes }) => notes)), ...heldNotes(each.flatMap(({ species }) => species ?? []))],
    fixedEnergy: fixed.length > 0,
    fitted: set.extrapolate ? each.flatMap(({ species }) => (species ? capacityOfFit(species.fit) : [])) : [],
    ...(fixed.length === 0
      ? {}
      : { caution: `The energy of ${fixed.join(", ")} is known at 25 °C only: its heat between 25 °C and the start is not counted` }),
  };
}

interface Put {
  readonly reactant: Reactant;
  readonly notes: readonly string[];
  readonly fixed: boolean;
  readonly species?: FormationSpecies;
}

function reactantOf({ species: text, amount, set: own }: Part, set: SetChoice): Put {
  if (isGrossFuel(text)) {
    const fuel = readGrossFuel(text);
    return { reactant: { ...grossFuelReactant(fuel), amount }, notes: grossFuelWarnings(fuel), fixed: true };
  }
  const species = own === undefined ? formationSpecies(text, set) : ownSpecies(text, own, set);
  const { name, counts, capacity, note } = species;
  return { reactant: { name, counts, capacity, amount }, notes: note === undefined ? [] : [note], fixed: false, species };
}

/** A set that stands beside its species must hold it. */
function ownSpecies(text: string, id: string, set: SetChoice): FormationSpecies {
  const choice = { ...setOf(id), extrapolate: set.extrapolate };
  if (choice.id !== undefined) recordOf(findSpecies(text).key, choice.id);
  return formationSpecies(text, choice);
}

/** A fit that begins this little above the start, K, misses an ordinary room, and its gas may be carried down to it. */
const ROOM = 30;

/** Refuses a start at which a reactant has no energy, naming it and its range, and the way out where a fit just misses it. */
export function requireEnergies(reactants: readonly Reactant[], temperature: number): void {
  for (const { capacity } of reactants) {
    const { phase, from } = capacity;
    if (phase === "g" && temperature < from && from - temperature <= ROOM)
      refuseRange(
        `${explainTemperature(capacity, temperature).message}; "${capacity.fromLabel.split(" for ")[0]}; extrapolate", or "extrapolate" alone, as the set holds the heat capacity below it`,
      );
    valueAt(capacity, temperature, (of) => of.energy(temperature));
  }
}

/** How far from 25 °C an energy known at 25 °C alone passes without a word, K: some 10 J for each gram of a solid fuel. */
const NEAR = 5;

/** The cautions of an inlet for a start at this temperature, K: energies known at 25 °C alone, fits carried beyond their range. */
export function cautionsAt({ caution, fitted }: Inlet, temperature: number): string[] {
  const beyond = extrapolationNotes(fitted, temperature);
  if (caution === undefined || Math.abs(temperature - REFERENCE_TEMPERATURE) <= NEAR) return beyond;
  return [`${caution}; the start is at ${printed(temperature)} K`, ...beyond];
}
