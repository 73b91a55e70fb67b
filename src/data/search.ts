/** Search for the pane: what a user types, letter by letter, to a short list of species, best first. */
import { hillOf } from "./composition";
import { fold, foldCase } from "./fold";
import { editDistance } from "./nearest";
import { recordsOf } from "./sets";
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

interface Fit {
  /** 0 best. */
  readonly rank: number;
  /** Length of the shortest text that begins with the query. */
  readonly length: number;
}

/** How well a row fits; undefined if it does not fit at all. */
function fitOf(row: Row, query: string, formula: string | undefined): Fit | undefined {
  const fit = (rank: number, texts: readonly string[] = []): Fit => ({ rank, length: Math.min(...texts.map((text) => text.length)) });
  if (row.key === query) return fit(0);
  if (row.texts.includes(query)) return fit(1);
  if (formula !== undefined && row.entry.formula === formula) return fit(2);
  const [own, synonyms] = [row.texts.slice(0, 2), row.texts.slice(2)].map((texts) => texts.filter((text) => text.startsWith(query)));
  if (own!.length > 0) return fit(3, own);
  if (synonyms!.length > 0) return fit(4, synonyms);
  if (row.words.some((word) => word.startsWith(query))) return fit(5);
  if (query.length > 1 && row.texts.some((text) => text.includes(query))) return fit(6);
  const slips = query.length < 4 ? 0 : query.length < 8 ? 1 : 2;
  return slips > 0 && row.texts.some((text) => editDistance(query, text, slips) <= slips) ? fit(7) : undefined;
}

/** Species that fit the query (key, name, synonym, formula, beginnings, small slips), best first; all of them for an empty query. */
export function searchSpecies(query: string, limit = 20): readonly SpeciesEntry[] {
  const folded = foldCase(query);
  if (folded === "") return allSpecies().slice(0, limit);
  const formula = hillOf(fold(query));
  return (
    rows
      .flatMap((row, order) => {
        const fit = fitOf(row, folded, formula);
        return fit ? [{ entry: row.entry, order, sets: recordsOf(row.entry.key).length, ...fit }] : [];
      })
      // Among equals, what more sources have measured comes first (methane before methyl), then the shorter name.
      .sort((a, b) => a.rank - b.rank || b.sets - a.sets || (a.length === b.length ? a.order - b.order : a.length - b.length))
      .slice(0, limit)
      .map((found) => found.entry)
  );
}
