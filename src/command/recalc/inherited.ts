/** Which doubtful errors came in from a cell that itself holds the error and is going to be written so. */
import { addressOf, type Area } from "../../book/address";
import type { BookCell, Workbook } from "../../book/workbook";
import { isError } from "../../book/differ";

export interface SheetArea extends Area {
  readonly sheet: string;
}

/** Ranges a formula cell reads; empty where they cannot be told. */
export type Reads = (sheet: string, cell: BookCell) => readonly SheetArea[];

/** The errors one formula gives, cell by cell of the range it fills. */
export interface Standing {
  readonly sheet: string;
  readonly address: string;
  readonly cells: readonly { readonly address: string; readonly error: string | undefined }[];
  /** True if the error may be this program's own fault and is not believed without a cause. */
  readonly doubtful: boolean;
}

/** Reading more cells than this in search of causes would take minutes; what is not found by then counts as not inherited. */
const MOST_CELLS_READ = 50_000_000;

const keyOf = (sheet: string, address: string) => `${sheet}!${address}`;

/** Keys `Sheet!B2` of the doubtful formulas whose error is inherited. */
export function inheritedErrors(workbook: Workbook, standings: readonly Standing[], reads: Reads): Set<string> {
  const doubtful = standings.filter((standing) => standing.doubtful);
  if (doubtful.length === 0) return new Set();
  const certain = certainErrors(workbook, standings);
  const inDoubt = new Map(doubtful.flatMap(errorsOf));
  const readers = new Map<string, Standing[]>();
  const open: Standing[] = [];
  for (const { standing, key } of readings(workbook, doubtful, reads)) {
    const gives = (error: string | undefined) => error !== undefined && standing.cells.some((cell) => cell.error === error);
    if (gives(certain.get(key))) open.push(standing);
    else if (gives(inDoubt.get(key)))
      readers
        .set(key, readers.get(key) ?? [])
        .get(key)
        ?.push(standing);
  }
  return spread(open, readers);
}

const errorsOf = ({ sheet, cells }: Standing): [string, string][] =>
  cells.flatMap(({ address, error }): [string, string][] => (error === undefined ? [] : [[keyOf(sheet, address), error]]));

/** Every pair of a doubtful formula and a cell it reads. */
function* readings(workbook: Workbook, doubtful: readonly Standing[], reads: Reads): Generator<{ standing: Standing; key: string }> {
  const sheets = new Map(workbook.sheets.map((sheet) => [sheet.name, sheet]));
  let left = MOST_CELLS_READ;
  for (const standing of doubtful) {
    const cell = sheets.get(standing.sheet)?.cells.get(standing.address);
    for (const area of cell ? reads(standing.sheet, cell) : []) {
      const sheet = sheets.get(area.sheet);
      for (const address of sheet ? addressesIn(area, sheet.rows, sheet.columns) : []) {
        if (left-- <= 0) return;
        yield { standing, key: keyOf(area.sheet, address) };
      }
    }
  }
}

/** Follows the errors from cell to reader until no more formulas are reached. */
function spread(open: Standing[], readers: ReadonlyMap<string, readonly Standing[]>): Set<string> {
  const inherited = new Set<string>();
  for (let standing = open.pop(); standing; standing = open.pop()) {
    const key = keyOf(standing.sheet, standing.address);
    if (inherited.has(key)) continue;
    inherited.add(key);
    for (const [place] of errorsOf(standing)) for (const reader of readers.get(place) ?? []) open.push(reader);
  }
  return inherited;
}

/** Errors that stand in the written file whatever becomes of the doubtful ones. */
function certainErrors(workbook: Workbook, standings: readonly Standing[]): Map<string, string> {
  const errors = new Map<string, string>();
  for (const sheet of workbook.sheets) {
    for (const [address, { value }] of sheet.cells) if (isError(value)) errors.set(keyOf(sheet.name, address), value.error);
  }
  for (const { sheet, cells, doubtful } of standings) {
    for (const { address, error } of doubtful ? [] : cells) {
      if (error === undefined) errors.delete(keyOf(sheet, address));
      else errors.set(keyOf(sheet, address), error);
    }
  }
  return errors;
}

function* addressesIn(area: Area, rows: number, columns: number): Generator<string> {
  for (let row = area.top; row <= Math.min(area.bottom, rows - 1); row++) {
    for (let column = area.left; column <= Math.min(area.right, columns - 1); column++) yield addressOf(row, column);
  }
}
