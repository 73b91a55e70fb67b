import type { BookValue } from "../book/workbook";
import type { EngineValue } from "./library";
import type { PlannedCell } from "./plan";
import { type SpreadingGetters, spreadZoneOf } from "./spread-zone";
import { bookValue } from "./values";

/** What a cell came to, with the cells it filled if there are several. */
export interface CellResult {
  readonly value: BookValue;
  readonly spill?: readonly (readonly BookValue[])[];
}

/** The part of the engine's model that is read. */
export interface ReadableModel {
  readonly getters: SpreadingGetters & {
    getEvaluatedCell(position: { sheetId: string; row: number; col: number }): EngineValue;
  };
}

/** Reads a calculated cell from the model. */
export function readResult(model: unknown, { sheet, cell }: PlannedCell, sheetName: (name: string) => string): CellResult {
  const { getters } = model as ReadableModel;
  const sheetId = sheetName(sheet);
  const at = (row: number, col: number) => bookValue(getters.getEvaluatedCell({ sheetId, row, col }));
  const value = at(cell.row, cell.column);
  const zone = spreadZoneOf(getters, { sheetId, row: cell.row, col: cell.column });
  if (!zone) return { value };
  const spill: BookValue[][] = [];
  for (let row = zone.top; row <= zone.bottom; row++) {
    const values: BookValue[] = [];
    for (let column = zone.left; column <= zone.right; column++) values.push(at(row, column));
    spill.push(values);
  }
  return { value, spill };
}
