/**
 * The XML of one sheet with some cells changed. Only the elements of those cells are rewritten; cells and rows that are
 * missing are put in at their place. Everything else stays to the byte.
 */
import { addressOf, areaOf, rangeOf, type Area } from "../address";
import { xmlAttribute } from "../xml/escape";
import { attribute, withAttributes } from "../xml/lexer";
import { editedCell, type CellEdit, type CellWriter } from "./cell";
import { cellsOf, rowIndex, type CellPlace, type RowPlace, type SheetLayout } from "./rows";
import { Splice } from "./splice";
import { storedValue } from "./value";

/** Edits by 0-based row and column. */
export type SheetEdits = ReadonlyMap<number, ReadonlyMap<number, CellEdit>>;

/** The text of the sheet part after the edits. */
export function patchedSheet(layout: SheetLayout, edits: SheetEdits): string {
  const splice = new Splice(layout.text);
  const writer: CellWriter = { prefix: layout.prefix, stored: (value, computed) => storedValue(value, computed, layout.prefix) };
  const placed = new Map(layout.rows.map((row, index) => [row.row, index]));
  const added: string[][] = layout.rows.map(() => []);
  const atStart: string[] = [];
  for (const row of [...edits.keys()].sort((a, b) => a - b)) {
    const index = placed.get(row);
    const cells = edits.get(row) as ReadonlyMap<number, CellEdit>;
    if (index !== undefined) patchRow(splice, layout, layout.rows[index] as RowPlace, cells, writer);
    else {
      const text = newRow(row, cells, writer);
      if (text !== "") (added[rowIndex(layout, row) - 1] ?? atStart).push(text);
    }
  }
  added.forEach(
    (rows, index) =>
      rows.length && splice.replace((layout.rows[index] as RowPlace).end, (layout.rows[index] as RowPlace).end, rows.join("")),
  );
  insertFirstRows(splice, layout, atStart.join(""));
  widenDimension(splice, layout, edits);
  return splice.result();
}

function insertFirstRows(splice: Splice, { data, text, prefix }: SheetLayout, rows: string): void {
  if (rows === "") return;
  if (data.kind === "open") return splice.replace(data.end, data.end, rows);
  const open = text.slice(data.start, data.end).replace(/\s*\/>$/, ">");
  splice.replace(data.start, data.end, `${open}${rows}</${prefix}sheetData>`);
}

function patchRow(splice: Splice, layout: SheetLayout, place: RowPlace, edits: ReadonlyMap<number, CellEdit>, writer: CellWriter): void {
  const { text, prefix } = layout;
  const cells = cellsOf(layout, place);
  const byColumn = new Map(cells.map((cell) => [cell.column, cell]));
  const added: number[] = [];
  for (const column of [...edits.keys()].sort((a, b) => a - b)) {
    const edit = edits.get(column) as CellEdit;
    const cell = byColumn.get(column);
    if (!cell) {
      if (!isNothing(edit)) added.push(column);
      continue;
    }
    const old = text.slice(cell.start, cell.end);
    const edited = editedCell(old, edit, writer);
    if (edited !== old) splice.replace(cell.start, cell.end, edited);
  }
  if (added.length === 0) return;
  const texts = added.map((column) => ({ column, text: newCell(place.row, column, edits.get(column) as CellEdit, writer) }));
  const tag = text.slice(place.tag.start, place.tag.end);
  const head = widenedSpans(tag, added);
  if (place.tag.kind === "empty") {
    splice.replace(
      place.tag.start,
      place.tag.end,
      `${head.replace(/\s*\/>$/, ">")}${texts.map((cell) => cell.text).join("")}</${prefix}row>`,
    );
    return;
  }
  if (head !== tag) splice.replace(place.tag.start, place.tag.end, head);
  let next = 0;
  let at = place.tag.end;
  for (const cell of texts) {
    // Both lists ascend: the new cell goes behind the last one in front of it.
    for (; next < cells.length && (cells[next] as CellPlace).column < cell.column; next++) at = (cells[next] as CellPlace).end;
    splice.replace(at, at, cell.text);
  }
}

const isNothing = (edit: CellEdit): boolean => (edit.value ?? null) === null && !edit.formula;

function newCell(row: number, column: number, edit: CellEdit, writer: CellWriter): string {
  return editedCell(`<${writer.prefix}c r="${addressOf(row, column)}"/>`, edit, writer);
}

function newRow(row: number, edits: ReadonlyMap<number, CellEdit>, writer: CellWriter): string {
  const columns = [...edits.keys()].filter((column) => !isNothing(edits.get(column) as CellEdit)).sort((a, b) => a - b);
  if (columns.length === 0) return "";
  const cells = columns.map((column) => newCell(row, column, edits.get(column) as CellEdit, writer)).join("");
  return `<${writer.prefix}row r="${row + 1}">${cells}</${writer.prefix}row>`;
}

/** `spans` tells readers which columns of a row to expect. */
function widenedSpans(tag: string, columns: readonly number[]): string {
  const match = /^(\d+):(\d+)$/.exec(attribute(tag, "spans") ?? "");
  if (!match) return tag;
  const first = Math.min(Number(match[1]), ...columns.map((column) => column + 1));
  const last = Math.max(Number(match[2]), ...columns.map((column) => column + 1));
  return withAttributes(tag, { spans: `${first}:${last}` });
}

function widenDimension(splice: Splice, { dimension, text }: SheetLayout, edits: SheetEdits): void {
  const tag = dimension && text.slice(dimension.start, dimension.end);
  const old = areaOf((tag && attribute(tag, "ref")) ?? "");
  if (!dimension || !tag || !old) return;
  let area: Area = old;
  for (const [row, cells] of edits) {
    for (const [column, edit] of cells) {
      if (isNothing(edit)) continue;
      area = {
        top: Math.min(area.top, row),
        left: Math.min(area.left, column),
        bottom: Math.max(area.bottom, row),
        right: Math.max(area.right, column),
      };
    }
  }
  const widened = withAttributes(tag, { ref: xmlAttribute(rangeOf(area)) });
  if (rangeOf(area) !== rangeOf(old)) splice.replace(dimension.start, dimension.end, widened);
}
