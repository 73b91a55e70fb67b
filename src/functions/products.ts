/**
 * Which species may be there after a reaction: the argument `products` of BURN, `species` of EQUILIBRIUM.
 *   left out, "equilibrium"   every species of the set that the elements allow, gases and condensed; without a set those of nasa-2002
 *   "complete"                CO2, H2O, SO2, N2 and what is left over (BURN only)
 *   a list                    a text such as "CO2 CO H2O N2" (commas where a name holds a blank), or a range of species
 * A set or a list is made into a table of atoms once; the result depends on the arguments alone.
 */
import type { Candidate } from "../core/equilibrium/types";
import { systemOf, type System } from "../core/equilibrium/system";
import { refuse, refuseAbsent } from "../core/refusal";
import { parseFormula } from "../core/species/formula";
import type { SpeciesFit } from "../core/species/types";
import { recordOf, setOfId } from "../data/library";
import { quoted, readText } from "./arguments";
import { BoundedCache } from "./cache";
import { Block, Cell, isTextLeftOut, plain } from "./cell";
import { isSingle } from "./broadcast";
import { candidateOfFit } from "./formation-species";
import { listOf } from "./lists";
import { isSetId, type SetChoice } from "./set";
import { fitOf } from "./substance";

/** Set of the species at equilibrium if none is named. */
export const USUAL_SET = "nasa-2002";

export interface ProductChoice {
  /** Names the choice in caches. */
  readonly key: string;
  /** "complete" is an estimate without dissociation. */
  readonly kind: "equilibrium" | "complete";
  /** Species as typed; left out: all of the set. */
  readonly listed?: readonly string[];
}

/** The species that may be there, as a table of atoms, and what was said on the way. */
export interface ProductSystem {
  readonly system: System;
  /** In the order in which results give them. */
  readonly candidates: readonly Candidate[];
  /** `31 species of nasa-2002`. */
  readonly label: string;
  /** Names of those passed over: without formation value or entropy. */
  readonly passedOver: readonly string[];
}

const EVERYTHING: ProductChoice = { key: "equilibrium", kind: "equilibrium" };
const COMPLETE: ProductChoice = { key: "complete", kind: "complete" };

/** An argument before it is spread: a range of species is one choice for all states. */
export interface ProductArgument {
  readonly texts?: Block;
  readonly whole?: ProductChoice;
}

/** Tells a range of species, one list for all states, from one word or text, or a range of the words "equilibrium" and "complete". */
export function productArgument(block: Block | undefined): ProductArgument {
  if (block === undefined || isTextLeftOut(block)) return { whole: EVERYTHING };
  if (isSingle(block) || block.flat().every((cell) => wordOf(plain(cell)) !== undefined)) return { texts: block };
  const listed = listOf(block, "species").filter((cell) => cell !== null);
  return { whole: listOfSpecies(listed.map((cell) => (typeof cell === "string" ? cell.trim() : refuseSpecies(cell)))) };
}

function wordOf(cell: Cell | undefined): ProductChoice | undefined {
  if (typeof cell !== "string") return undefined;
  const word = cell.trim().toLowerCase();
  return word === "equilibrium" ? EVERYTHING : word === "complete" ? COMPLETE : undefined;
}

function refuseSpecies(cell: Cell): never {
  return refuse(`The list of species holds ${quoted(cell)}; each is a text such as "CO2"`);
}

/** The choice of one cell. */
export function productsOf(cell: Cell | undefined): ProductChoice {
  const text = readText(cell, "list of species");
  if (text === undefined) return EVERYTHING;
  if (isSetId(text)) refuse(`"${text}" is a set id; the species come first, the set after them`);
  return wordOf(text) ?? listOfSpecies(text.includes(",") || text.includes(";") ? text.split(/[,;]/) : text.split(/\s+/));
}

function listOfSpecies(texts: readonly string[]): ProductChoice {
  const listed = texts.map((text) => text.trim()).filter((text) => text !== "");
  if (listed.some((text) => wordOf(text) !== undefined)) refuse(`"equilibrium" and "complete" stand alone, not in a list of species`);
  return { key: `list:${JSON.stringify(listed)}`, kind: "equilibrium", listed };
}

const systems = new BoundedCache<ProductSystem>(300);

/**
 * The species of the choice that the elements allow.
 * Refuses an element that none of them holds, a listed species that the set lacks, and a set without entropies.
 */
export function productSystem({ key, listed }: ProductChoice, set: SetChoice, elements: ReadonlySet<string>): ProductSystem {
  const present = [...elements].sort();
  return systems.at(`${key}|${set.key}|${present.join(" ")}`, () => {
    const fits = (listed ? listed.map((text) => fitOf(text, set)) : fitsOf(set)).filter((fit) => holdsOnly(fit, elements));
    const usable = fits.map((fit) => candidateOfFit(fit, set)).filter((candidate) => listed !== undefined || isUsable(candidate));
    const passedOver = listed ? [] : fits.filter((_, i) => !isUsable(candidateOfFit(fits[i]!, set))).map(({ species }) => species);
    const label = labelOf(listed, set, usable.length);
    requireElements(usable, present, label);
    return { system: systemOf(usable), candidates: usable, label, passedOver };
  });
}

function fitsOf(set: SetChoice): readonly SpeciesFit[] {
  if (set.fits) return set.fits;
  const id = set.id ?? USUAL_SET;
  return setOfId(id)!.species.map((species) => recordOf(species, id));
}

function holdsOnly({ formula }: SpeciesFit, elements: ReadonlySet<string>): boolean {
  const { counts, charge } = parseFormula(formula);
  return charge === 0 && [...counts.keys()].every((element) => elements.has(element));
}

function isUsable({ capacity }: Candidate): boolean {
  return capacity.onFormationScale && capacity.hasEntropy;
}

function labelOf(listed: readonly string[] | undefined, set: SetChoice, count: number): string {
  const many = `${count} species`;
  if (set.fits) return `${many} of the coefficient block`;
  if (listed) return set.id === undefined ? `${many} of the list, each from the library's first choice` : `${many} of the list, ${set.id}`;
  return `${many} of ${set.id ?? USUAL_SET}`;
}

function requireElements(candidates: readonly Candidate[], elements: readonly string[], label: string): void {
  const missing = elements.filter((element) => !candidates.some(({ counts }) => counts.has(element)));
  if (missing.length === 0) return;
  refuseAbsent(
    `What is put in holds ${missing.join(", ")}, and none of the ${label} does: give another set, or the species as a list such as "CO2 H2O N2"`,
  );
}

/** Elements of what is put in. */
export function elementsOf(reactants: readonly { readonly counts: ReadonlyMap<string, number>; readonly amount: number }[]): Set<string> {
  return new Set(reactants.flatMap(({ counts, amount }) => (amount > 0 ? [...counts.keys()] : [])));
}
