/** Search for the pane: what a user types, letter by letter, to a short list of species, best first. */
import { hillOf } from "./composition";
import { fold, foldCase } from "./fold";
import { editDistance } from "./nearest";
import { allSpecies, type SpeciesEntry } from "./species";

interface Row {
  readonly entry: SpeciesEntry;
  readonly key: string;
  readonly texts: readonly string[];
  readonly words: readonly string[];
}

const rows: readonly Row[] = allSpecies().map((entry) => {
  const texts = [entry.key, entry.name, ...entry.synonyms];
  const words = texts.flatMap((text) => text.split(/[\s,()-]+/)).filter((word) => word.length > 1);
  return { entry, key: foldCase(entry.key), texts: texts.map(foldCase), words: words.map(foldCase) };
});

/** How well a row fits, 0 best; undefined if it does not fit at all. */
function rank(row: Row, query: string, formula: string | undefined): number | undefined {
  if (row.key === query) return 0;
  if (row.texts.includes(query)) return 1;
  if (formula !== undefined && row.entry.formula === formula) return 2;
  if (row.key.startsWith(query)) return 3;
  if (row.texts.some((text) => text.startsWith(query))) return 4;
  if (row.words.some((word) => word.startsWith(query))) return 5;
  if (query.length > 1 && row.texts.some((text) => text.includes(query))) return 6;
  const slips = query.length < 4 ? 0 : query.length < 8 ? 1 : 2;
  return slips > 0 && row.texts.some((text) => editDistance(query, text, slips) <= slips) ? 7 : undefined;
}

/** Species that fit the query (key, name, synonym, formula, beginnings, small slips), best first; all of them for an empty query. */
export function searchSpecies(query: string, limit = 20): readonly SpeciesEntry[] {
  const folded = foldCase(query);
  if (folded === "") return allSpecies().slice(0, limit);
  const formula = hillOf(fold(query));
  return rows
    .map((row, order) => ({ entry: row.entry, rank: rank(row, folded, formula), order }))
    .filter((found) => found.rank !== undefined)
    .sort((a, b) => a.rank! - b.rank! || a.order - b.order)
    .slice(0, limit)
    .map((found) => found.entry);
}
