import type { Phase } from "../core/species/types";
import { massOf } from "./composition";
import table from "./species.json";

/** One substance in one phase. */
export interface SpeciesEntry {
  /** The library's own spelling, unique: `N2`, `H2O(l)`, `toluene`. */
  readonly key: string;
  readonly name: string;
  /** Chemical formula without the phase, in Hill's order. */
  readonly formula: string;
  readonly phase: Phase;
  /** Other names, trade names and other spellings. */
  readonly synonyms: readonly string[];
  /** Molar mass, g/mol, from the one table of atomic weights. */
  readonly molarMass: number;
  /** True for a linear molecule of three or more atoms. */
  readonly linear?: boolean;
}

const entries: readonly SpeciesEntry[] = table.map((row) => ({ ...row, phase: row.phase as Phase, molarMass: massOf(row.formula) }));
const byKey: ReadonlyMap<string, SpeciesEntry> = new Map(entries.map((entry) => [entry.key, entry]));

/** Every species of the library: stable gases first, then solids and liquids, then radicals and atoms. */
export function allSpecies(): readonly SpeciesEntry[] {
  return entries;
}

/** The entry of exactly this key, or undefined. */
export function speciesOfKey(key: string): SpeciesEntry | undefined {
  return byKey.get(key);
}
