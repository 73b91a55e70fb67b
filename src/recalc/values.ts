import type { BookValue } from "../book/workbook";
import { isErrorCode } from "./errors";
import { isTable, type EngineResult, type EngineValue } from "./library";

/** A value of the engine as a cell of a workbook holds it; null is a blank. */
export function bookValue(cell: EngineValue | undefined): BookValue {
  const value = cell?.value ?? null;
  if (isErrorCode(value)) return cell?.message ? { error: value, message: String(cell.message) } : { error: value };
  if (typeof value === "number")
    return Number.isFinite(value) ? value + 0 : { error: "#NUM!", message: `The result ${value} is not a number a cell can hold` };
  return typeof value === "string" || typeof value === "boolean" ? value : null;
}

/** A result row by row; a single value is one row of one. */
export function bookRows(result: EngineResult): BookValue[][] {
  if (!isTable(result)) return [[bookValue(result)]];
  const rows = result[0]?.length ?? 0;
  return Array.from({ length: rows }, (_, row) => result.map((column) => bookValue(column[row])));
}
