/** Every set of the library, and which record of a species is its first choice. */
import { refuseAbsent } from "../core/refusal";
import type { Form } from "../core/species/types";
import { inOrderOfChoice } from "./first-choice";
import { type PrintedSet, recordFrom, type SetRecord } from "./records";
import aramco2013 from "./sets/aramco-2013.json";
import aramco2016 from "./sets/aramco-2016.json";
import aramco2018 from "./sets/aramco-2018.json";
import c3mech2022 from "./sets/c3mech-2022.json";
import felderB2 from "./sets/felder-b2.json";
import gri1999 from "./sets/gri-1999.json";
import hashemi2016 from "./sets/hashemi-2016.json";
import hychem2018 from "./sets/hychem-2018.json";
import jetsurf2010 from "./sets/jetsurf-2010.json";
import molecular from "./sets/molecular.json";
import nasa2002 from "./sets/nasa-2002.json";
import sarathy2012 from "./sets/sarathy-2012.json";
import srd69Shomate from "./sets/srd69-shomate.json";
import usc2007 from "./sets/usc-2007.json";

/** A set without its records. */
export interface SetEntry {
  readonly id: string;
  readonly title: string;
  /** Key in sources.json. */
  readonly source: string;
  readonly form: Form;
  /** Unit of the printed coefficients. */
  readonly unit: string;
  /** Gas constant of the fit, J/(mol K). */
  readonly gasConstant: number;
  /** Standard pressure of the entropies, Pa; a record may have its own. */
  readonly standardPressure: number;
  /** What holds for the whole set: standard pressure, ranges. */
  readonly note?: string;
  /** Keys of the species it holds. */
  readonly species: readonly string[];
}

const printedSets = [
  nasa2002,
  gri1999,
  srd69Shomate,
  aramco2013,
  aramco2016,
  aramco2018,
  c3mech2022,
  hashemi2016,
  hychem2018,
  jetsurf2010,
  sarathy2012,
  usc2007,
  felderB2,
  molecular,
] as unknown as readonly PrintedSet[];

const setEntries: readonly SetEntry[] = printedSets.map(({ species, form, ...head }) => ({
  ...head,
  form: form as Form,
  species: Object.keys(species),
}));
const records = new Map<string, readonly SetRecord[]>();

/** Every set of the library. */
export function allSets(): readonly SetEntry[] {
  return setEntries;
}

/** The set of an id, or undefined. */
export function setOfId(id: string): SetEntry | undefined {
  return setEntries.find((set) => set.id === id);
}

/** Every record of a species, the library's first choice first. Refuses (absent) a key the library does not have. */
export function recordsOf(speciesKey: string): readonly SetRecord[] {
  const known = records.get(speciesKey);
  if (known !== undefined) return known;
  const found = printedSets.filter((set) => speciesKey in set.species).map((set) => recordFrom(set, speciesKey, set.species[speciesKey]!));
  if (found.length === 0) refuseAbsent(`"${speciesKey}" is not in the library`);
  const ordered = inOrderOfChoice(found);
  records.set(speciesKey, ordered);
  return ordered;
}

/** The record of a species in one set. Refuses (absent) an unknown set, naming the sets; and a set without the species, naming those that have it. */
export function recordOf(speciesKey: string, setId: string): SetRecord {
  const all = recordsOf(speciesKey);
  const found = all.find((record) => record.set === setId);
  if (found !== undefined) return found;
  const having = all.map((record) => record.set).join(", ");
  if (setOfId(setId) === undefined) refuseAbsent(`"${setId}" is not a set of the library; sets for ${speciesKey}: ${having}`);
  refuseAbsent(`Set ${setId} does not hold ${speciesKey}; sets that do: ${having}`);
}
