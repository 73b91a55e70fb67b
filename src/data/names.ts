/**
 * From what a user writes to the one species meant. In this order, the first that answers wins:
 *   1  words with several meanings (`C`, `S`, `water`): refused, naming the meanings
 *   2  key, name or synonym as written
 *   3  the same without regard to case, unless the text as written is the formula of something else (`Co` is not `CO`)
 *   4  any of these with a phase: `N2(g)`, `Fe(s)`, `liquid benzene`
 *   5  a formula in any order of atoms; without a phase the gas, if the library has it; isomers are refused, naming them
 * What remains is refused as absent, with the nearest names.
 */
import { Refusal, refuse, refuseAbsent } from "../core/refusal";
import type { Phase } from "../core/species/types";
import { hillOf } from "./composition";
import { fold, foldCase } from "./fold";
import meanings from "./meanings.json";
import { type Candidate, nearest } from "./nearest";
import { allSpecies, type SpeciesEntry, speciesOfKey } from "./species";

interface Meaning {
  readonly texts: readonly string[];
  readonly meanings: readonly string[];
  readonly note?: string;
}

const exact = new Map<string, SpeciesEntry>();
const anyCase = new Map<string, SpeciesEntry[]>();
const byFormula = new Map<string, SpeciesEntry[]>();
const formulaInAnyCase = new Map<string, string>();
const severalMeanings = new Map<string, Meaning>();
const candidates: Candidate<SpeciesEntry>[] = [];

function append(map: Map<string, SpeciesEntry[]>, text: string, entry: SpeciesEntry): void {
  const list = map.get(text) ?? [];
  if (!list.includes(entry)) list.push(entry);
  map.set(text, list);
}

for (const entry of allSpecies()) {
  for (const text of [entry.key, entry.name, ...entry.synonyms]) {
    if (!exact.has(fold(text))) exact.set(fold(text), entry);
    append(anyCase, foldCase(text), entry);
    candidates.push({ text: foldCase(text), thing: entry });
  }
  const hill = hillOf(entry.formula)!;
  append(byFormula, hill, entry);
  formulaInAnyCase.set(hill.toLowerCase(), hill);
}
for (const meaning of meanings as readonly Meaning[]) for (const text of meaning.texts) severalMeanings.set(foldCase(text), meaning);

const PHASES: Readonly<Record<string, Phase>> = {
  g: "g",
  gas: "g",
  gaseous: "g",
  vapour: "g",
  l: "l",
  liq: "l",
  liquid: "l",
  s: "cr",
  cr: "cr",
  solid: "cr",
  crystal: "cr",
};

/** `N2(g)`, `water, liquid` and `solid iron` taken apart into the substance and the phase. */
function phaseApart(text: string): { base: string; phase: Phase } | undefined {
  const bracketed = /^(.+)\(\s*([A-Za-z]+)\s*\)$/.exec(text);
  const leading = /^(liquid|gaseous|solid)\s+(.+)$/i.exec(text);
  const trailing = /^(.+?),?\s+(gas|vapou?r|liquid|solid)$/i.exec(text);
  const [base, word] = bracketed
    ? [bracketed[1]!, bracketed[2]!]
    : leading
      ? [leading[2]!, leading[1]!]
      : trailing
        ? [trailing[1]!, trailing[2]!]
        : [];
  const phase = word === undefined ? undefined : PHASES[foldCase(word)];
  return base === undefined || phase === undefined ? undefined : { base: base.trim(), phase };
}

function described(entry: SpeciesEntry): string {
  return entry.key === entry.name ? entry.key : `${entry.key} (${entry.name})`;
}

function refuseSeveral(text: string, entries: readonly SpeciesEntry[], note?: string): never {
  const list = entries.map(described).join(" or ");
  if (note !== undefined) refuse(`"${text}" stands for several substances; ${note}; the library holds ${list}: write its name`);
  refuse(`"${text}" stands for several species: write ${list}`);
}

function meaningOf(text: string): Meaning | undefined {
  return severalMeanings.get(foldCase(text));
}

/** The same for a formula in any order of atoms, once no name has answered. */
function meaningOfFormula(text: string): Meaning | undefined {
  const formula = hillOf(fold(text));
  return formula === undefined ? undefined : meaningOf(formula);
}

function entriesOf(keys: readonly string[]): SpeciesEntry[] {
  return keys.map((key) => speciesOfKey(key)!);
}

/** Steps 2 and 3: the species of a key, name or synonym. */
function named(text: string): SpeciesEntry | undefined {
  const asWritten = exact.get(fold(text));
  if (asWritten !== undefined) return asWritten;
  const formula = hillOf(fold(text));
  const found = (anyCase.get(foldCase(text)) ?? []).filter((entry) => formula === undefined || formula === entry.formula);
  if (found.length > 1) refuseSeveral(text, found);
  return found[0];
}

/** Step 5 without the preference for the gas: everything of this formula. */
function ofFormula(text: string): readonly SpeciesEntry[] {
  const folded = fold(text);
  const hill = hillOf(folded) ?? (folded === folded.toLowerCase() ? formulaInAnyCase.get(folded) : undefined);
  return hill === undefined ? [] : (byFormula.get(hill) ?? []);
}

/** One species of several of one formula: the only one, the only gas, or the gas whose key is the plain formula. */
function oneOf(text: string, entries: readonly SpeciesEntry[]): SpeciesEntry | undefined {
  const gases = entries.filter((entry) => entry.phase === "g");
  const eligible = gases.length > 0 ? gases : entries;
  if (eligible.length < 2) return eligible[0];
  return eligible.find((entry) => entry.key === entry.formula) ?? refuseSeveral(text, eligible);
}

/** Step 4: the substance in the phase asked for. A condensed phase is found through the formula, if that names one substance. */
function inPhase(text: string, base: string, phase: Phase): SpeciesEntry | undefined {
  const meaning = meaningOf(base);
  const entry = meaning === undefined ? named(base) : undefined;
  if (entry?.phase === phase) return entry;
  const family =
    meaning !== undefined ? entriesOf(meaning.meanings) : entry !== undefined ? byFormula.get(hillOf(entry.formula)!)! : ofFormula(base);
  if (meaning === undefined && phase !== "g" && family.filter((one) => one.phase === "g").length > 1) return undefined;
  const fitting = family.filter((one) => one.phase === phase);
  return phase === "g" ? oneOf(text, fitting) : fitting.length > 1 ? refuseSeveral(text, fitting) : fitting[0];
}

/** A text longer than any name is shown and compared by its beginning. */
const LONGEST_NAME = 60;

function refuseMissing(written: string): never {
  const text = written.length > LONGEST_NAME ? `${written.slice(0, LONGEST_NAME)}…` : written;
  const list = nearest(foldCase(text), candidates).map(({ text: known, thing }) =>
    [thing.key, thing.name].some((own) => foldCase(own) === known) ? thing.key : `${thing.key} (${known})`,
  );
  refuseAbsent(`"${text}" is not in the library; nearest: ${list.join(", ")}`);
}

function resolve(text: string): SpeciesEntry {
  refuseMeanings(text, meaningOf(text));
  const apart = phaseApart(text);
  const entry = named(text) ?? (apart && inPhase(text, apart.base, apart.phase));
  if (entry !== undefined) return entry;
  refuseMeanings(text, meaningOfFormula(text));
  return oneOf(text, ofFormula(text)) ?? refuseMissing(text);
}

function refuseMeanings(text: string, meaning: Meaning | undefined): void {
  if (meaning !== undefined) refuseSeveral(text, entriesOf(meaning.meanings), meaning.note);
}

const REMEMBERED = 4096;
const answers = new Map<string, SpeciesEntry | Refusal>();

function resolved(text: string): SpeciesEntry | Refusal {
  try {
    return resolve(text);
  } catch (refusal) {
    if (refusal instanceof Refusal) return refusal;
    throw refusal;
  }
}

/**
 * The species a text stands for: key, name, synonym or formula, with or without a phase.
 * Refuses (input) an empty text and a text with several meanings, naming them; refuses (absent) what the library does not hold,
 * naming the three nearest.
 */
export function findSpecies(text: string): SpeciesEntry {
  const known = answers.get(text);
  if (known !== undefined) {
    if (known instanceof Refusal) throw known;
    return known;
  }
  const trimmed = text.trim();
  if (trimmed === "") refuse("The name of the species is empty");
  const answer = resolved(trimmed);
  if (answers.size >= REMEMBERED) answers.clear();
  answers.set(text, answer);
  if (answer instanceof Refusal) throw answer;
  return answer;
}
