/** From a workbook file to the grid's data: contents from our own reader through the translator, looks from the grid's reader. */
import { bookContext } from "../../book/formula";
import { addressOf, areaOf } from "../../book/address";
import type { BookSheet, BookValue, Workbook } from "../../book/workbook";
import type { Engine } from "../../recalc/engine";
import { cellContent } from "../../recalc/literal";
import { planCells, type PlannedCell } from "../../recalc/plan";
import type { GridData, GridSheet } from "./data";
import { gridName } from "./sheet-names";

const DATA_VERSION = "19.3.2";
/** Free rows and columns beyond the contents, so that there is room to type. */
const SPARE_ROWS = 50;
const SPARE_COLUMNS = 6;
const LEAST_ROWS = 100;
const LEAST_COLUMNS = 20;

export interface OpenedGrid {
  readonly data: GridData;
  /** Contents handed to the grid, by sheet and address: what differs from it later was edited. */
  readonly contents: ReadonlyMap<string, ReadonlyMap<string, string>>;
  readonly planned: readonly PlannedCell[];
  /** Formulas that are not calculated here and keep the value of the file; one sentence each. */
  readonly kept: readonly string[];
}

export function gridOf(workbook: Workbook, looks: GridData | undefined, engine: Engine): OpenedGrid {
  const planned = planCells(workbook, bookContext(workbook, engine.functions), engine, { volatile: true, sheetName: gridName });
  const contents = new Map(workbook.sheets.map((sheet) => [sheet.name, literals(sheet)]));
  const kept: string[] = [];
  for (const cell of planned) place(cell, contents.get(cell.sheet) as Map<string, string>, kept);
  const sheets = workbook.sheets.map((sheet) => {
    const look = looks?.sheets.find((candidate) => candidate.name === sheet.name);
    return gridSheet(sheet, contents.get(sheet.name) as Map<string, string>, look);
  });
  const { styles, formats, borders } = looks ?? {};
  return { data: { version: DATA_VERSION, sheets, styles, formats, borders, namedRanges: namedRanges(workbook) }, contents, planned, kept };
}

function gridSheet(sheet: BookSheet, contents: ReadonlyMap<string, string>, looks: GridSheet | undefined): GridSheet {
  return {
    ...looks,
    id: gridName(sheet.name),
    name: gridName(sheet.name),
    colNumber: Math.max(LEAST_COLUMNS, sheet.columns + SPARE_COLUMNS, looks?.colNumber ?? 0),
    rowNumber: Math.max(LEAST_ROWS, sheet.rows + SPARE_ROWS, looks?.rowNumber ?? 0),
    cells: Object.fromEntries(contents),
    figures: [],
    tables: [],
  };
}

/** All values of a sheet; formulas then take the place of theirs. */
function literals(sheet: BookSheet): Map<string, string> {
  const contents = new Map<string, string>();
  for (const [address, { value }] of sheet.cells) {
    const content = literal(value);
    if (content !== undefined) contents.set(address, content);
  }
  return contents;
}

/** A formula that is calculated takes its cell, and the cells it fills are its own: left in place they would stand in its way. */
function place({ sheet, address, text, kept, fills }: PlannedCell, contents: Map<string, string>, notes: string[]): void {
  if (text === undefined) {
    if (typeof kept === "object") notes.push(`${sheet}!${address} keeps the value of the file: ${kept.message}.`);
    return;
  }
  for (let row = fills.top; row <= fills.bottom; row++) {
    for (let column = fills.left; column <= fills.right; column++) contents.delete(addressOf(row, column));
  }
  contents.set(address, text);
}

/** A value as the engine keeps it. A plain word needs no apostrophe, which would only be in the way when it is edited. */
export function literal(value: BookValue): string | undefined {
  if (value === "") return undefined;
  return typeof value === "string" && /^\p{L}/u.test(value) && !/^(true|false)$/i.test(value) ? value : cellContent(value);
}

/** Names of plain ranges, for the grid's name box and its completion; others are resolved by the translator alone. */
function namedRanges({ names, sheets }: Workbook): Record<string, string> {
  const ranges: Record<string, string> = {};
  for (const { name, formula, sheet } of names) {
    const mark = formula.lastIndexOf("!");
    const tab = formula.slice(0, Math.max(mark, 0)).replace(/^'|'$/g, "").replaceAll("''", "'");
    if (sheet === undefined && sheets.some((known) => known.name === tab) && isArea(formula.slice(mark + 1)))
      ranges[name] = `'${gridName(tab)}'!${formula.slice(mark + 1)}`;
  }
  return ranges;
}

function isArea(text: string): boolean {
  return /^\$?[A-Z]{1,3}\$?\d+(:\$?[A-Z]{1,3}\$?\d+)?$/.test(text) && areaOf(text.replaceAll("$", "")) !== undefined;
}
