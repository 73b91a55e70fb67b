import { parseStructRef } from "@borgar/fx/xlsx";
import type { BookTable } from "../workbook";
import { fail } from "./problem";
import { areaOf, type Area } from "./references";

/** Place of the formula that holds a structured reference. */
export interface Place {
  readonly sheet: string;
  readonly row: number;
  readonly column: number;
}

/**
 * The area that `Table[Column]`, `Table[@Column]`, `Table[[#Headers],[A]:[B]]` … stands for.
 * Without a table name it is the table around the formula.
 * @returns undefined for a part that is not there: totals of a table without them, the row of a formula outside the table
 */
export function structuredArea(text: string, tables: readonly BookTable[], place?: Place): Area | undefined {
  const read = parseStructRef(text) as { table?: string; columns: string[]; sections: string[] } | undefined;
  if (!read) return fail("unsupported", `The table reference ${text} is not understood`);
  const table = read.table ? tableNamed(read.table, tables) : tableAround(text, tables, place);
  const rows = rowsOf(table, read.sections, place);
  return rows && { ...columnsOf(table, read.columns), ...rows };
}

/** The data of a table, which is what its bare name stands for. */
export function tableData(table: BookTable): Area | undefined {
  const rows = rowsOf(table, [], undefined);
  return rows && { ...areaOf(table.range, table.sheet), ...rows };
}

function tableNamed(name: string, tables: readonly BookTable[]): BookTable {
  const wanted = name.toUpperCase();
  return tables.find((table) => table.name.toUpperCase() === wanted) ?? fail("unknown", `There is no table ${name}`);
}

function tableAround(text: string, tables: readonly BookTable[], place?: Place): BookTable {
  const around = tables.find((table) => {
    const area = areaOf(table.range, table.sheet);
    const inside = place && place.row >= area.top && place.row <= area.bottom && place.column >= area.left && place.column <= area.right;
    return inside && place.sheet.toUpperCase() === table.sheet.toUpperCase();
  });
  return around ?? fail("unknown", `${text} names no table and stands in none`);
}

function rowsOf(table: BookTable, sections: readonly string[], place?: Place): { top: number; bottom: number } | undefined {
  const whole = areaOf(table.range, table.sheet);
  const first = whole.top + (table.headerRow ? 1 : 0);
  const last = whole.bottom - (table.totalsRow ? 1 : 0);
  if (sections.includes("this row")) {
    if (!place) return fail("unsupported", "A reference to the table's own row needs a place in a sheet");
    return place.row >= first && place.row <= last ? { top: place.row, bottom: place.row } : undefined;
  }
  const parts: [boolean, number, number][] = [
    [sections.includes("headers") || sections.includes("all"), whole.top, first - 1],
    [sections.length === 0 || sections.includes("data") || sections.includes("all"), first, last],
    [sections.includes("totals") || sections.includes("all"), last + 1, whole.bottom],
  ];
  const meant = parts.filter(([asked, from, to]) => asked && from <= to);
  return meant.length === 0 ? undefined : { top: meant[0]![1], bottom: meant.at(-1)![2] };
}

function columnsOf(table: BookTable, columns: readonly string[]): Area {
  const whole = areaOf(table.range, table.sheet);
  const positions = columns.map((column) => whole.left + columnIndex(table, column));
  return positions.length === 0 ? whole : { ...whole, left: Math.min(...positions), right: Math.max(...positions) };
}

function columnIndex(table: BookTable, column: string): number {
  const wanted = column.toUpperCase();
  const index = table.columns.findIndex((name) => name.toUpperCase() === wanted);
  return index >= 0 ? index : fail("unknown", `Table ${table.name} has no column ${column}`);
}
