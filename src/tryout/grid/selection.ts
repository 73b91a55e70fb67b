/** The selected cell of the grid: where it is and what the status line says of it. */
import { addressOf } from "../../book/address";
import type { CellView } from "../statusline";
import type { Model } from "./engine";

export function toXc({ col, row }: { col: number; row: number }): string {
  return addressOf(row, col);
}

export function selectedCell(model: Model): CellView {
  const position = model.getters.getActivePosition();
  const cell = model.getters.getEvaluatedCell(position);
  const message = cell.type === "error" ? String(cell.message ?? "") : "";
  return { address: toXc(position), value: cell.value, message, origin: originOf(model, position, cell) };
}

/** The cell an error came from, with its sheet if that is another. */
function originOf(model: Model, here: { sheetId: string; col: number; row: number }, cell: unknown): string | undefined {
  const origin = (cell as { errorOriginPosition?: { sheetId: string; col: number; row: number } }).errorOriginPosition;
  if (!origin || (origin.sheetId === here.sheetId && origin.col === here.col && origin.row === here.row)) return undefined;
  return origin.sheetId === here.sheetId ? toXc(origin) : `${model.getters.getSheetName(origin.sheetId)}!${toXc(origin)}`;
}
