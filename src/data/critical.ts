/** Critical constants, second virial coefficients and binary parameters of the Peng-Robinson equation. Not part of library.ts. */
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
export interface VirialConstants {
  readonly species: string;
  readonly a: number;
  readonly b: number;
  readonly c: number;
  readonly from: number;
  readonly to: number;
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

/**
 * Which source wins for a species: those with an acentric factor first, and among them those a user can cite. The handbook table without
 * a confirmed title stands after the book it agrees with.
 */
const ORDER = [
  "poling-2001",
  "ogst-2021",
  "critical-table-a",
  "from-memory",
  "moran-a1",
  "cengel-a1",
  "libretexts-a9",
  "felder-b1",
  "koretsky-a1",
];

/** Iodine has a row without a critical pressure; no equation of state can use it. */
const rows = (table.constants as readonly (Omit<CriticalConstants, "pressure"> & { pressure: number | null })[]).filter(
  (row): row is CriticalConstants => row.pressure !== null,
);
const virials: readonly VirialConstants[] = table.virial;
const pairs: readonly PairParameter[] = table.pengRobinsonPairs;

/** Every row of every source that has a critical pressure. */
export function allCritical(): readonly CriticalConstants[] {
  return rows;
}

/** The rows of a species, the library's first choice first; empty if it has none. */
export function criticalOf(species: string): readonly CriticalConstants[] {
  const standing = (row: CriticalConstants): number => (row.acentric === null ? 100 : 0) + ORDER.indexOf(row.source);
  return rows.filter((row) => row.species === species).sort((a, b) => standing(a) - standing(b));
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
