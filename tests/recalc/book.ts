import { cellOf } from "../../src/book/formula";
import type { BookCell, BookTable, BookValue, DefinedName, Workbook } from "../../src/book/workbook";

/** A cell of a workbook made up for a test: a value, or a formula (with `=`) and the value the file holds for it. */
export type MadeCell =
  BookValue | { unread: string; value: BookValue } | { formula: string; value?: BookValue; array?: string; dynamic?: boolean };

export interface MadeBook {
  readonly sheets: Readonly<Record<string, Readonly<Record<string, MadeCell>>>>;
  readonly names?: readonly DefinedName[];
  readonly tables?: readonly BookTable[];
  readonly date1904?: boolean;
}

/** A workbook as the reader of files would give it. A text that starts with `=` is a formula without a cached value. */
export function book({ sheets, names = [], tables = [], date1904 = false }: MadeBook): Workbook {
  const made = Object.entries(sheets).map(([name, cells]) => {
    const entries = Object.entries(cells).map(([address, cell]): [string, BookCell] => [address, bookCell(address, cell)]);
    const places = entries.map(([, cell]) => cell);
    return {
      name,
      cells: new Map(entries),
      rows: 1 + places.reduce((most, cell) => Math.max(most, cell.row), 0),
      columns: 1 + places.reduce((most, cell) => Math.max(most, cell.column), 0),
    };
  });
  return { sheets: made, names, tables, date1904, notes: [] };
}

function bookCell(address: string, cell: MadeCell): BookCell {
  const place = cellOf(address);
  if (typeof cell === "string" && cell.startsWith("=")) return { ...place, formula: cell.slice(1), value: null };
  if (typeof cell === "object" && cell !== null && "formula" in cell) {
    const { formula, value = null, array, dynamic } = cell;
    return { ...place, formula: formula.slice(1), value, array, dynamic };
  }
  if (typeof cell === "object" && cell !== null && "unread" in cell) return { ...place, ...cell };
  return { ...place, value: cell };
}
