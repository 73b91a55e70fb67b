/** What the search offers: species of the library and its named mixtures. Pure. */
import { allMixtures, allSpecies, searchSpecies, type SpeciesEntry } from "../data/library";
import { phaseWord } from "./words";

export interface Candidate {
  /** As typed in a cell. */
  readonly text: string;
  readonly name: string;
  /** Empty for a mixture. */
  readonly formula: string;
  /** gas, liquid, solid or mixture */
  readonly kind: string;
}

/** Best first; everything for an empty query. A mixture whose name or synonym starts with the query stands before the species. */
export function candidatesFor(query: string): readonly Candidate[] {
  const typed = query.trim().toLowerCase();
  const mixtures = allMixtures().filter(({ name, synonyms }) => [name, ...synonyms].some((word) => word.toLowerCase().startsWith(typed)));
  const species = searchSpecies(query, allSpecies().length);
  return [...(typed === "" ? [] : mixtures.map(ofMixture)), ...species.map(ofSpecies), ...(typed === "" ? mixtures.map(ofMixture) : [])];
}

function ofMixture({ name }: { readonly name: string }): Candidate {
  return { text: name, name, formula: "", kind: "mixture" };
}

function ofSpecies({ key, name, formula, phase }: SpeciesEntry): Candidate {
  return { text: key, name, formula, kind: phaseWord(phase) };
}
