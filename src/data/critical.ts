/** Critical constants, second virial coefficients and binary parameters of the Peng-Robinson equation. Not part of library.ts. */
import type { SecondVirialConstants } from "../core/realgas/virial";
import table from "./critical.json";

/** Critical constants of one species in one source. */
export interface CriticalConstants {
  /** Species key; a refrigerant or another substance outside the library by its own name. */
  readonly species: string;
  /** Critical temperature, K. */
  readonly temperature: number;
  /** Critical pressure, MPa. */
  readonly pressure: number;
  /** Acentric factor; null if the source gives none. */
  readonly acentric: number | null;
  /** Critical volume, cm³/mol. */
  readonly volume?: number;
  /** Pressure as printed, where the source prints atmospheres. */
  readonly printedAtm?: number;
  /** Key in sources.json. */
  readonly source: string;
  readonly fromMemory?: boolean;
  readonly note?: string;
}

/** Second virial coefficient B = a − b exp(c/T), cm³/mol, T in K. */
export interface VirialConstants extends SecondVirialConstants {
  readonly source: string;
}

/** Binary parameter of the Peng-Robinson equation of 1976 with one-fluid van der Waals mixing. */
export interface PairParameter {
  readonly pair: readonly string[];
  readonly kij: number;
  readonly source: string;
  readonly fromMemory?: boolean;
  readonly note?: string;
}

/** Critical constants with an acentric factor: what an equation of state needs. */
export type UsableConstants = CriticalConstants & { readonly acentric: number };

const rows = new Map((table.constants as readonly UsableConstants[]).map((row) => [row.species, row]));
const virials: readonly VirialConstants[] = table.virial;
const pairs: readonly PairParameter[] = table.pengRobinsonPairs;

/** The constants of a species in the library's first choice of source; undefined if no source has an acentric factor for it. */
export function criticalOf(species: string): UsableConstants | undefined {
  return rows.get(species);
}

/** All first choices. */
export function firstCritical(): readonly UsableConstants[] {
  return [...rows.values()];
}

/** The second virial coefficient of a species, or undefined. */
export function virialOf(species: string): VirialConstants | undefined {
  return virials.find((row) => row.species === species);
}

/** Every binary parameter. */
export function allPairs(): readonly PairParameter[] {
  return pairs;
}

/** The binary parameter of two species in either order; where a pair is listed twice, the one for the gas-rich phase, listed first. */
export function pairOf(one: string, other: string): PairParameter | undefined {
  return pairs.find(({ pair }) => (pair[0] === one && pair[1] === other) || (pair[0] === other && pair[1] === one));
}
