/**
 * Which species may be there after a reaction: the argument `products` of BURN, `species` of EQUILIBRIUM.
 *   left out, "equilibrium"   every species of the set that the elements allow, gases and condensed; without a set those of nasa-2002
 *   "complete"                CO2, H2O, SO2, N2 and what is left over (BURN only)
 *   a list                    a text such as "CO2 CO H2O N2" (commas where a name holds a blank), or a range of species
 * A coefficient block serves its own species; the others are those of nasa-2002, or of a list the library's first choice.
 * A set or a list is made into a table of atoms once; the result depends on the arguments alone.
 */
import type { Candidate } from "../core/equilibrium/types";
import { systemOf, type System } from "../core/equilibrium/system";
import type { Capacity } from "../core/capacity/capacity";
import { Refusal, refuse, refuseAbsent } from "../core/refusal";
import { hill, parseFormula } from "../core/species/formula";
import type { SpeciesFit } from "../core/species/types";
import { recordOf, setOfId } from "../data/library";
import type { FurtherProduct } from "../data/further-products";
import { absentProducts } from "./absent-products";
import { quoted, readText } from "./arguments";
import { BoundedCache } from "./cache";
import { Block, Cell, isTextLeftOut, plain } from "./cell";
import { isSingle } from "./broadcast";
import { candidateOfFit, formationSpecies } from "./formation-species";
import { listOf } from "./lists";
import { FIRST_CHOICE, isSetId, type SetChoice } from "./set";
import { capacityOfFit, fitOf, matchingFit } from "./substance";

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
  /** Elements without an atom of their own among the species, if nobody chose these by name. */
  readonly withoutAtoms: readonly string[];
  /** Species that may form and are not among them, if nobody chose these by name. */
  readonly absent: readonly FurtherProduct[];
  /** The gases as far as their fits go, if values beyond were asked for. */
  readonly fitted: readonly Capacity[];
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

/** Refuses a word of the argument products where one species is expected. */
export function refuseProductWord(text: string): void {
  if (wordOf(text) !== undefined) refuse(`"${text}" says which products there are; the species comes first, the products after it`);
}

function refuseSpecies(cell: Cell): never {
  return refuse(`The list of species holds ${quoted(cell)}; each is a text such as "CO2"`);
}

/** The choice of one cell. */
export function productsOf(cell: Cell | undefined): ProductChoice {
  const text = readText(cell, "list of species");
  if (text === undefined) return EVERYTHING;
  if (isSetId(text)) refuse(`"${text}" is a set id; the species come first, the set after them`);
  return wordOf(text) ?? listOfSpecies(text.split(BETWEEN.test(text) ? BETWEEN : /\s+/));
}

/** A comma or semicolon between species, not one inside brackets as in Al2O3(cr,alpha). */
const BETWEEN = /[,;](?![^()]*\))/;

function listOfSpecies(texts: readonly string[]): ProductChoice {
  const listed = texts.map((text) => text.trim()).filter((text) => text !== "");
  if (listed.some((text) => wordOf(text) !== undefined)) refuse(`"equilibrium" and "complete" stand alone, not in a list of species`);
  return { key: `list:${JSON.stringify(listed)}`, kind: "equilibrium", listed };
}

const systems = new BoundedCache<ProductSystem>(300);

/**
 * The species of the choice that the elements allow. Noble gases that are put in are there in any case: a list need not name them.
 * Refuses an element that none of them holds, a listed species that the set lacks, and a listed species without formation value or entropy.
 */
export function productSystem({ key, listed }: ProductChoice, set: SetChoice, elements: ReadonlySet<string>): ProductSystem {
  const present = [...elements].sort();
  return systems.at(`${key}|${set.key}|${present.join(" ")}`, () => {
    const offered = listed ? listedFits(listed, set) : fitsOf(set);
    const fits = offered.filter((fit) => holdsOnly(fit, elements));
    const others = listed ? offered.filter((fit) => !fits.includes(fit)).map(({ species }) => species) : [];
    const kept = listed ? fits : fits.filter(isUsable);
    if (!listed) requireMainProducts(kept, elements, set);
    const inert = listed ? NOBLE_GASES.filter((gas) => elements.has(gas) && !fits.some(({ species }) => species === gas)) : [];
    const candidates = [...kept.map((fit) => candidateOfFit(fit, set)), ...inert.map((gas) => formationSpecies(gas, set))];
    const foreign = others.length === 0 ? "" : `, without ${others.join(", ")}, of elements that are not put in`;
    const label = [labelOf(listed, set, kept.length), ...inert].join(" and ") + foreign;
    requireElements(candidates, present, label, listed);
    return {
      system: systemOf(candidates),
      candidates,
      label,
      passedOver: fits.filter((fit) => !kept.includes(fit)).map(({ species }) => species),
      withoutAtoms: listed ? [] : present.filter((element) => !candidates.some((candidate) => isAtom(candidate, element))),
      absent: listed ? [] : absentProducts(candidates, elements),
      fitted: set.extrapolate ? kept.filter(({ phase }) => phase === "g").map(capacityOfFit) : [],
    };
  });
}

/** Species as typed: the set's, or of a coefficient block its own and the library's others. A single word that is none may be a slip. */
function listedFits(listed: readonly string[], set: SetChoice): readonly SpeciesFit[] {
  try {
    return listed.map((text) => (set.fits ? (matchingFit(text, set.fits) ?? fitOf(text, FIRST_CHOICE)) : fitOf(text, set)));
  } catch (thrown) {
    if (!(thrown instanceof Refusal) || !/ is not in the library/.test(thrown.message)) throw thrown;
    throw new Refusal("absent", thrown.message + wayOut(listed));
  }
}

function wayOut(listed: readonly string[]): string {
  if (listed.length === 1) return '; or write "equilibrium", in BURN also "complete", or a list such as "CO2 CO H2O N2"';
  return listed.some((text) => /\s/.test(text)) ? "; one species stands in each cell, or between commas" : "";
}

const NOBLE_GASES = ["He", "Ne", "Ar", "Kr", "Xe"];

function fitsOf({ id, fits }: SetChoice): readonly SpeciesFit[] {
  const set = id ?? USUAL_SET;
  const library = setOfId(set)!.species.map((species) => recordOf(species, set));
  if (fits === undefined) return library;
  const own = fits.filter(isUsable);
  return [...library.filter(({ species }) => matchingFit(species, own) === undefined), ...fits];
}

function holdsOnly({ formula }: SpeciesFit, elements: ReadonlySet<string>): boolean {
  const { counts, charge } = parseFormula(formula);
  return charge === 0 && [...counts.keys()].every((element) => elements.has(element));
}

function isUsable(fit: SpeciesFit): boolean {
  const { onFormationScale, hasEntropy } = capacityOfFit(fit);
  return onFormationScale && hasEntropy;
}

function isAtom({ counts, capacity }: Candidate, element: string): boolean {
  return capacity.phase === "g" && counts.size === 1 && counts.get(element) === 1;
}

function labelOf(listed: readonly string[] | undefined, set: SetChoice, count: number): string {
  const many = `${count} species`;
  if (listed && set.fits) return `${many} of the list, from the coefficient block and the library's first choice`;
  if (listed) return set.id === undefined ? `${many} of the list, each from the library's first choice` : `${many} of the list, ${set.id}`;
  return `${many} of ${set.id ?? USUAL_SET}${set.fits ? " and the coefficient block" : ""}`;
}

/** What hot gas mostly is. A set that lacks one of these gives an equilibrium among the rest, far from the truth. */
const MAIN_PRODUCTS = ["CO2", "CO", "H2O", "H2", "O2", "N2", "SO2", "HF", "HCl", "HBr", "HI"];

function requireMainProducts(fits: readonly SpeciesFit[], elements: ReadonlySet<string>, set: SetChoice): void {
  const held = new Set(fits.map(({ formula, phase }) => `${hill(parseFormula(formula))}(${phase})`));
  const needed = MAIN_PRODUCTS.filter((name) => [...parseFormula(name).counts.keys()].every((element) => elements.has(element)));
  const missing = needed.filter((name) => !held.has(`${hill(parseFormula(name))}(g)`));
  if (missing.length === 0) return;
  const used = set.id ?? USUAL_SET;
  const way = used === USUAL_SET ? "give a coefficient block with it" : `leave the set out for ${USUAL_SET}`;
  refuseAbsent(
    `Set ${used} has no enthalpy of formation with entropy for ${missing.join(", ")}, which may form here: ${way}, or give the species as a list`,
  );
}

function requireElements(
  candidates: readonly Candidate[],
  elements: readonly string[],
  label: string,
  listed: readonly string[] | undefined,
): void {
  const missing = elements.filter((element) => !candidates.some(({ counts }) => counts.has(element)));
  if (missing.length === 0) return;
  const brought = `What is put in holds ${missing.join(", ")}`;
  if (listed) refuse(`${brought}, and no species of the list (${listed.join(", ")}) does: add species that hold ${missing.join(", ")}`);
  refuseAbsent(
    `${brought}, and of ${missing.join(", ")} there is nothing among the ${label}: give another set, or the species as a list such as "CO2 H2O N2"`,
  );
}

/** Elements of what is put in. */
export function elementsOf(reactants: readonly { readonly counts: ReadonlyMap<string, number>; readonly amount: number }[]): Set<string> {
  return new Set(reactants.flatMap(({ counts, amount }) => (amount > 0 ? [...counts.keys()] : [])));
}
