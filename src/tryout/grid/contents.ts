/** What the cells of the grid hold now: formula or literal as the engine keeps it, and the calculated value. */
import type { BookValue } from "../../book/workbook";
import { addressOf, rangeOf } from "../../book/address";
import { spreadZoneOf } from "../../recalc/spread-zone";
import type { Model } from "./engine";
import type { SheetNaming } from "./sheet-names";

export interface GridCell {
  /** As the engine keeps it, formula with `=`; empty for a cell that only has a look. */
  readonly content: string;
  /** True if the content is a formula that the engine understands. */
  readonly formula: boolean;
  readonly value: BookValue;
  /** Number format of the cell, as a date or a percentage typed in gets it. */
  readonly format?: string;
  /** Range that the formula fills, if it is more than its own cell. */
  readonly spill?: string;
  /** Values of that range row by row. */
  readonly spilled?: readonly (readonly BookValue[])[];
}

/** The cells with contents of one sheet, by address. */
export type SheetContents = ReadonlyMap<string, GridCell>;

/** The workbook by sheet name, in the order of the tabs; `naming` gives the name wanted for a sheet of the grid. */
export function contentsOf(model: Model, naming: SheetNaming = (name) => name): Map<string, SheetContents> {
  const all = new Map<string, SheetContents>();
  for (const sheetId of model.getters.getSheetIds()) all.set(naming(model.getters.getSheetName(sheetId)), sheetContents(model, sheetId));
  return all;
}

function sheetContents(model: Model, sheetId: string): SheetContents {
  const cells = new Map<string, GridCell>();
  for (const cell of model.getters.getCells(sheetId)) {
    const position = model.getters.getCellPosition(cell.id);
    const content = cell.isFormula ? cell.compiledFormula.toFormulaString(model.getters) : cell.content;
    if (content === "") continue;
    cells.set(addressOf(position.row, position.col), {
      content,
      formula: cell.isFormula && !cell.compiledFormula.isBadExpression,
      ...(cell.format ? { format: cell.format } : {}),
      value: valueAt(model, sheetId, position.col, position.row),
      ...spillOf(model, sheetId, position.col, position.row),
    });
  }
  return cells;
}

/** The calculated value of a cell; an empty cell is null. */
export function valueAt(model: Model, sheetId: string, col: number, row: number): BookValue {
  const cell = model.getters.getEvaluatedCell({ sheetId, col, row });
  if (cell.type === "error") return { error: String(cell.value), ...(cell.message ? { message: String(cell.message) } : {}) };
  return cell.value;
}

function spillOf(model: Model, sheetId: string, col: number, row: number): Pick<GridCell, "spill" | "spilled"> {
  const zone = spreadZoneOf(model.getters, { sheetId, col, row });
  if (!zone) return {};
  if (zone.left !== col || zone.top !== row) return {};
  const spilled: BookValue[][] = [];
  for (let r = zone.top; r <= zone.bottom; r++) {
    const values: BookValue[] = [];
    for (let c = zone.left; c <= zone.right; c++) values.push(valueAt(model, sheetId, c, r));
    spilled.push(values);
  }
  return { spill: rangeOf(zone), spilled };
}

/** Number formats of all cells by sheet name and address. */
export function formatsOf(model: Model, naming: SheetNaming): Map<string, Map<string, string>> {
  const all = new Map<string, Map<string, string>>();
  for (const sheetId of model.getters.getSheetIds()) {
    const formats = new Map<string, string>();
    for (const cell of model.getters.getCells(sheetId)) {
      if (!cell.format) continue;
      const { col, row } = model.getters.getCellPosition(cell.id);
      formats.set(addressOf(row, col), cell.format);
    }
    all.set(naming(model.getters.getSheetName(sheetId)), formats);
  }
  return all;
}
