/** The cells a formula fills: in the file before, and after the calculation. */
import { addressOf, areaOf, rangeOf, type Area } from "../../book/address";
import type { BookCell, BookError, BookSheet, BookValue } from "../../book/workbook";
import type { CellOutcome } from "../../recalc/outcome";

export interface FilledCell {
  readonly address: string;
  readonly old: BookValue;
  readonly fresh: BookValue;
}

export interface Block {
  /** First cell first. Cells that are filled no longer are here too, with an empty fresh value. */
  readonly cells: readonly FilledCell[];
  /** Range now filled, if the formula is an array formula and the range is not that of the file. */
  readonly resized?: Area;
}

/** Compares what a formula filled with what it fills now. */
export function blockOf(sheet: BookSheet, cell: BookCell, outcome: CellOutcome): Block {
  const old = cell.array === undefined ? undefined : areaOf(cell.array);
  if (!old) return { cells: [{ address: outcome.address, old: cell.value, fresh: outcome.value }] };
  const result = outcome.spill ?? [[outcome.value]];
  const obstacle = cell.dynamic ? obstacleIn(sheet, outcome.address, sized(old, result)) : undefined;
  const rows = obstacle ? [[obstacle]] : result;
  const fresh = cell.dynamic ? sized(old, rows) : old;
  const cells: FilledCell[] = [];
  const bottom = Math.max(old.bottom, fresh.bottom);
  const right = Math.max(old.right, fresh.right);
  for (let row = old.top; row <= bottom; row++) {
    for (let column = old.left; column <= right; column++) {
      const inOld = row <= old.bottom && column <= old.right;
      const inFresh = row <= fresh.bottom && column <= fresh.right;
      if (!inOld && !inFresh) continue;
      const address = addressOf(row, column);
      const value = inFresh ? valueAt(rows, row - old.top, column - old.left) : null;
      cells.push({ address, old: sheet.cells.get(address)?.value ?? null, fresh: value });
    }
  }
  const same = fresh.bottom === old.bottom && fresh.right === old.right;
  return { cells, ...(same ? {} : { resized: fresh }) };
}

/** A dynamic array fills as many cells as its result has. */
function sized({ top, left }: Area, rows: readonly (readonly BookValue[])[]): Area {
  return { top, left, bottom: top + Math.max(rows.length, 1) - 1, right: left + Math.max(rows[0]?.length ?? 1, 1) - 1 };
}

/** A result must not cover what somebody typed: the error of a range that is not free, if it is not. */
function obstacleIn(sheet: BookSheet, anchor: string, area: Area): BookError | undefined {
  for (let row = area.top; row <= area.bottom; row++) {
    for (let column = area.left; column <= area.right; column++) {
      const address = addressOf(row, column);
      const cell = address === anchor ? undefined : sheet.cells.get(address);
      if (cell && cell.filledBy !== anchor)
        return { error: "#SPILL!", message: `The result needs the cells ${rangeOf(area)}, but ${address} is not empty` };
    }
  }
  return undefined;
}

/** An array formula of the old kind keeps its range: a single row, column or value is repeated, what is missing is #N/A. */
function valueAt(rows: readonly (readonly BookValue[])[], row: number, column: number): BookValue {
  const cells = rows.length === 1 ? rows[0] : rows[row];
  if (!cells) return { error: "#N/A" };
  return (cells.length === 1 ? cells[0] : cells[column]) ?? (cells.length > column ? null : { error: "#N/A" });
}
