/** Every row of critical constants, second sources included: to compare tables. Not part of library.ts, and of no worksheet function. */
import { type CriticalConstants, firstCritical } from "./critical";
import table from "./critical-further.json";

/**
 * Which source wins for a species, and stands in critical.json: those with an acentric factor first, and among them those a user can cite. The handbook table without
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
const further = (table.constants as readonly (Omit<CriticalConstants, "pressure"> & { pressure: number | null })[]).filter(
  (row): row is CriticalConstants => row.pressure !== null,
);

/** Every row of every source that has a critical pressure. */
export function allCritical(): readonly CriticalConstants[] {
  return [...firstCritical(), ...further];
}

/** The rows of a species, the library's first choice first; empty if it has none. */
export function criticalRowsOf(species: string): readonly CriticalConstants[] {
  const standing = (row: CriticalConstants): number => (row.acentric === null ? 100 : 0) + ORDER.indexOf(row.source);
  return allCritical()
    .filter((row) => row.species === species)
    .sort((a, b) => standing(a) - standing(b));
}
