/** A table (list object) of a sheet: its name, range and column names, for structured references. */
import { fromCellText } from "../xml/escape";
import { walkXml } from "../xml/walk";
import type { BookTable } from "../workbook";

/** Reads one table part; undefined if it names no range. */
export function readTable(text: string, part: string, sheet: string): BookTable | undefined {
  let table: Omit<BookTable, "columns"> | undefined;
  const columns: string[] = [];
  walkXml(text, part, {
    open(name, attributes) {
      if (name === "tableColumn") columns.push(fromCellText(attributes.name ?? ""));
      if (name !== "table" || attributes.ref === undefined) return;
      table = {
        name: attributes.displayName ?? attributes.name ?? "",
        sheet,
        range: attributes.ref,
        headerRow: attributes.headerRowCount !== "0",
        totalsRow: Number(attributes.totalsRowCount ?? 0) > 0,
      };
    },
  });
  return table && { ...table, columns };
}
