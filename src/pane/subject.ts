/**
 * What the pane is about at the moment: one species with its sets, or one mixture with its parts. Pure: reads the library only.
 */
import { capacityOf } from "../core/capacity";
import type { Phase } from "../core/species/types";
import { findSpecies, namedMixture, recordsOf, sourceOf, type SetRecord, type SpeciesEntry } from "../data/library";
import { partsOfText } from "../functions/composition";
import { FIRST_CHOICE } from "../functions/set";
import { substanceOf } from "../functions/substance";
import type { Source } from "./points";

export interface SubjectPart {
  readonly species: string;
  readonly fraction: number;
  /** Set its values come from. */
  readonly set: string;
}

export interface Subject {
  /** As it stands in a formula: `N2`, `air`, `0.79 N2 + 0.21 O2`. */
  readonly text: string;
  readonly title: string;
  /** Empty for a mixture. */
  readonly formula: string;
  readonly phase: Phase;
  /** g/mol */
  readonly molarMass: number;
  /** Other names that find it. */
  readonly synonyms: readonly string[];
  /** Its records, the library's first choice first; empty for a mixture. */
  readonly records: readonly SetRecord[];
  /** Curves of the chart, first choice first. */
  readonly sources: readonly Source[];
  /** Parts of a mixture; empty for a species. */
  readonly parts: readonly SubjectPart[];
  /** Where the composition of a named mixture comes from. */
  readonly composition: string;
}

/** A species or a mixture by what was typed; throws the library's Refusal, with the nearest names, for anything else. */
export function subjectOf(text: string): Subject {
  const typed = text.trim();
  return partsOfText(typed) ? subjectOfMixture(typed) : subjectOfSpecies(findSpecies(typed));
}

function subjectOfSpecies(entry: SpeciesEntry): Subject {
  const records = recordsOf(entry.key);
  return {
    text: entry.key,
    title: entry.name,
    formula: entry.formula,
    phase: entry.phase,
    molarMass: entry.molarMass,
    synonyms: entry.synonyms.filter((synonym) => synonym !== entry.key && synonym !== entry.name && synonym !== entry.formula),
    records,
    sources: records.map((record) => ({ set: record.set, capacity: capacityOf(record) })),
    parts: [],
    composition: "",
  };
}

function subjectOfMixture(text: string): Subject {
  const substance = substanceOf({ texts: [[text]] }, text, FIRST_CHOICE);
  const named = namedMixture(text);
  return {
    text,
    title: named?.name ?? "mixture",
    formula: "",
    phase: substance.capacity.phase,
    molarMass: substance.molarMass * 1000,
    synonyms: [],
    records: [],
    sources: [{ set: "first choices", capacity: substance.capacity }],
    parts: substance.parts.map(({ species, fraction, fit }) => ({ species, fraction, set: fit.set })),
    composition: named ? sourceOf(named.source).citation : "",
  };
}
