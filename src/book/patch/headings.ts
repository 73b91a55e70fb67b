/**
 * Headings of tables. Excel keeps the name of a table column twice, in the cell and in the table part, and calls a file
 * damaged in which they differ; so a changed heading changes both. A heading is a text, not empty, and its table has it once.
 */
import { refuse } from "../../core/refusal";
import { addressOf, areaOf, placeOf } from "../address";
import type { Package } from "../container/package";
import { readTable } from "../read/table";
import { readWorkbook } from "../read/workbook";
import type { BookTable, CellChange } from "../workbook";
import { speltText, xmlAttribute } from "../xml/escape";
import { closingTag, elements, localName, nextTag, withAttributes } from "../xml/lexer";
import type { PartStore } from "./parts";
import { Splice } from "./splice";
import { storedNumber } from "./value";

/** The changes of one sheet as they are to be written, headings as texts; the table parts are brought in line. */
export function withHeadings(store: PartStore, sheet: string, sheetPart: string, changes: readonly CellChange[]): readonly CellChange[] {
  let result = changes;
  for (const { role, target } of store.pkg.relations(sheetPart)) {
    const part = role === "table" ? store.pkg.find(target) : undefined;
    const table = part === undefined ? undefined : readTable(store.text(part), part, sheet);
    if (part !== undefined && table?.headerRow) result = withHeadingsOf(store, part, table, result);
  }
  return result;
}

function withHeadingsOf(store: PartStore, part: string, table: BookTable, changes: readonly CellChange[]): readonly CellChange[] {
  const area = areaOf(table.range);
  if (!area) return changes;
  const names = [...table.columns];
  const result = changes.map((change) => {
    const place = placeOf(change.address);
    if (place?.row !== area.top || place.column < area.left || place.column > area.right) return change;
    const text = headingText(change);
    names[place.column - area.left] = text;
    return { sheet: change.sheet, address: change.address, value: text, formula: null };
  });
  const renamed = table.columns.filter((name, index) => names[index] !== name);
  if (renamed.length === 0) return result;
  refuseDoubles(table, names, area.top, area.left);
  refuseReferences(store.pkg, table, renamed);
  store.set(part, renamedColumns(store.text(part), names));
  return result;
}

function headingText({ address, value }: CellChange): string {
  const text = typeof value === "number" ? storedNumber(value) : typeof value === "boolean" ? String(value).toUpperCase() : value;
  if (typeof text !== "string" || text === "") return refuse(`The cell ${address} is the heading of a table column and needs a text`);
  return text;
}

function refuseDoubles(table: BookTable, names: readonly string[], row: number, left: number): void {
  const seen = new Set<string>();
  names.forEach((name, index) => {
    if (seen.has(name.toLowerCase()))
      refuse(`The table ${table.name} would have two columns "${name}", the second at ${addressOf(row, left + index)}`);
    seen.add(name.toLowerCase());
  });
}

/** A formula that names a column by its old heading would be lost in Excel, and it is not ours to rewrite. */
function refuseReferences(pkg: Package, table: BookTable, renamed: readonly string[]): void {
  const { sheets, names } = readWorkbook(pkg);
  const formulas = [
    ...names.map(({ formula }) => formula),
    ...sheets.flatMap(({ cells }) => Array.from(cells.values(), ({ formula }) => formula ?? "")),
  ];
  for (const name of renamed) {
    const spelt = `[${name.replace(/['[\]#]/g, "'$&")}]`.toLowerCase();
    const user = formulas.find((formula) => formula.toLowerCase().includes(spelt));
    if (user !== undefined) refuse(`The heading "${name}" of the table ${table.name} cannot change: the formula ${user} uses it`);
  }
}

function renamedColumns(text: string, names: readonly string[]): string {
  const splice = new Splice(text);
  const root = nextTag(text, 0);
  for (const { tag, close } of root ? elements(text, root.end, closingTag(text, root).start) : []) {
    if (localName(tag.name) !== "tableColumns") continue;
    let index = 0;
    for (const { tag: column } of elements(text, tag.end, close.start)) {
      const head = text.slice(column.start, column.end);
      splice.replace(column.start, column.end, withAttributes(head, { name: attributeText(names[index++] ?? "") }));
    }
  }
  return splice.result();
}

/** Line ends in a column name are spelt in the part: attributes would lose them. */
const attributeText = (name: string): string => xmlAttribute(speltText(name).replace(/\n/g, "_x000a_"));
