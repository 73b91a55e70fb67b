import { addressOf, type Area } from "../book/formula";
import type { Workbook } from "../book/workbook";
import type { Engine } from "./engine";
import { cellContent } from "./literal";
import { inOrder, type EnginePosition } from "./order";
import type { PlannedCell } from "./plan";

/** Layout of the engine's own files that the data below follow. */
const layout = "19.3.2";

/** Free rows and columns beyond the data, for results that spill further than they did. */
const roomToSpill = { rows: 20000, columns: 500 };

type Model = InstanceType<Engine["library"]["Model"]>;

/** The names of the sheets, which INDIRECT needs; only one with an apostrophe, which the engine cannot read, gets another. */
export function internalSheetNames(workbook: Workbook): (name: string) => string {
  const own = workbook.sheets.map(({ name }) => name);
  const free = (index: number): string => (own.includes(`SHEET_${index}`) ? free(index + own.length) : `SHEET_${index}`);
  const names = new Map(own.map((name, index) => [name.toUpperCase(), name.includes("'") ? free(index + 1) : name]));
  return (name) => names.get(name.toUpperCase()) ?? name;
}

/** Builds the engine's model: calculated cells as formulas in the given order, every other cell with the value of the file. */
export function buildModel(
  engine: Engine,
  workbook: Workbook,
  calculated: readonly PlannedCell[],
  sheetName: (name: string) => string,
): Model {
  const data = { version: layout, sheets: sheetData(workbook, calculated, sheetName) };
  const order = calculated.map(({ sheet, cell }): EnginePosition => ({ sheetId: sheetName(sheet), row: cell.row, col: cell.column }));
  return inOrder(order, () => new engine.library.Model(data));
}

function sheetData(workbook: Workbook, calculated: readonly PlannedCell[], sheetName: (name: string) => string) {
  const contents = new Map(workbook.sheets.map((sheet) => [sheet.name, valuesOf(sheet)]));
  for (const { sheet, fills } of calculated) eachAddress(fills, (address) => contents.get(sheet)!.delete(address));
  for (const { sheet, address, text } of calculated) contents.get(sheet)!.set(address, text!);
  const size = sizeOf(workbook, calculated);
  return workbook.sheets.map(({ name }) => ({
    ...{ id: sheetName(name), name: sheetName(name), ...size },
    cells: Object.fromEntries(contents.get(name)!),
    ...{ styles: {}, formats: {}, borders: {}, merges: [], figures: [], cols: {}, rows: {} },
    ...{ conditionalFormats: [], dataValidationRules: [], tables: [], isVisible: true },
  }));
}

function valuesOf({ cells }: Workbook["sheets"][number]): Map<string, string> {
  const contents = new Map<string, string>();
  for (const [address, { value }] of cells) {
    const content = cellContent(value);
    if (content !== undefined) contents.set(address, content);
  }
  return contents;
}

/** All sheets alike, so that two whole columns of different sheets have as many rows. */
function sizeOf(workbook: Workbook, calculated: readonly PlannedCell[]): { rowNumber: number; colNumber: number } {
  let rows = Math.max(1, ...workbook.sheets.map((sheet) => sheet.rows));
  let columns = Math.max(1, ...workbook.sheets.map((sheet) => sheet.columns));
  for (const { reads, fills } of calculated) {
    for (const { bottom, right } of [...reads, fills]) {
      if (bottom < Infinity) rows = Math.max(rows, bottom + 1);
      if (right < Infinity) columns = Math.max(columns, right + 1);
    }
  }
  const spills = calculated.some(({ cell }) => cell.dynamic);
  return { rowNumber: rows + (spills ? roomToSpill.rows : 1), colNumber: columns + (spills ? roomToSpill.columns : 1) };
}

function eachAddress({ top, left, bottom, right }: Area, visit: (address: string) => void): void {
  for (let row = top; row <= bottom; row++) for (let column = left; column <= right; column++) visit(addressOf(row, column));
}
