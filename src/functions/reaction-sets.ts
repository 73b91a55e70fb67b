/**
 * The set argument of a reaction, whose species may each need a set of their own:
 *   a set id, "id; extrapolate" or "; extrapolate"   for every species; solids and liquids are never extrapolated
 *   a range of two columns, species | set id         for those species, the library's first choice for the others
 *   a coefficient block                              for the species in it, the library's first choice for the others
 */
import { Refusal, refuse } from "../core/refusal";
import type { SpeciesFit } from "../core/species/types";
import { findSpecies } from "../data/library";
import { quoted } from "./arguments";
import { BoundedCache } from "./cache";
import { Block, Cell, CellError, isTextLeftOut, plain } from "./cell";
import { blockChoice, FIRST_CHOICE, isSetId, setOf, type SetChoice } from "./set";
import { fitOf } from "./substance";

/** The fit of a species, and whether it may be carried beyond its range. */
export interface ChosenFit {
  readonly fit: SpeciesFit;
  readonly extrapolate: boolean;
}

export interface ReactionSets {
  /** Names the choice in caches. */
  readonly key: string;
  readonly of: (species: string) => ChosenFit;
}

const tables = new BoundedCache<ReactionSets>(100);

/** The choice for every state, if the argument is a range that is read whole; undefined if it is a set id, or a list of them. */
export function wholeSets(block: Block | undefined): ReactionSets | undefined {
  const own = blockChoice(block);
  if (own) return { key: own.key, of: (species) => ofBlock(species, own) };
  if (block === undefined || isTextLeftOut(block) || !isSpeciesTable(block)) return undefined;
  return tables.at(JSON.stringify(block), () => fromTable(block));
}

/** The choice of one cell. */
export function setsOf(cell: Cell | undefined): ReactionSets {
  const choice = setOf(cell);
  return { key: choice.key, of: (species) => chosen(species, choice) };
}

function chosen(species: string, choice: SetChoice): ChosenFit {
  return { fit: fitOf(species, choice), extrapolate: choice.extrapolate };
}

function ofBlock(species: string, own: SetChoice): ChosenFit {
  try {
    return chosen(species, own);
  } catch (thrown) {
    if (thrown instanceof Refusal && thrown.kind === "absent") return chosen(species, FIRST_CHOICE);
    throw thrown;
  }
}

/** Two columns of texts with no set id in the first: a list of set ids to spread has them in every column. */
function isSpeciesTable(block: Block): boolean {
  if (block[0]!.length !== 2) return false;
  return block.some(([species]) => !isBlank(plain(species))) && !block.some(([species]) => typeof species === "string" && isSetId(species));
}

function isBlank(cell: Cell): boolean {
  return cell === null || cell === 0;
}

function fromTable(block: Block): ReactionSets {
  const choices = new Map<string, SetChoice>();
  block.forEach((row, index) => {
    const [species, set] = row.map(plain) as [Cell, Cell];
    for (const cell of [species, set]) if (cell instanceof CellError) throw cell;
    if ((isBlank(species) && isBlank(set)) || isHeading(species, set)) return;
    const { key } = findSpecies(typeof species === "string" ? species : refuseSpecies(species, index + 1));
    if (choices.has(key)) refuse(`Row ${index + 1} of the sets names ${key} once more; give one set for each species`);
    choices.set(key, setOf(set));
  });
  const of = (species: string) => chosen(species, choices.get(findSpecies(species).key) ?? FIRST_CHOICE);
  return { key: `table:${JSON.stringify(block)}`, of };
}

function isHeading(species: Cell, set: Cell): boolean {
  return [species, set].map((cell) => String(cell).trim().toLowerCase()).join("|") === "species|set";
}

function refuseSpecies(cell: Cell, row: number): never {
  return refuse(`Row ${row} of the sets has ${quoted(cell)} where a species is expected`);
}
