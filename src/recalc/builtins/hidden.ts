import { errorFunction, fillFunction } from "../../book/formula";
import {
  engineFunctions,
  isTable,
  type EngineArgument,
  type EngineCall,
  type EngineLibrary,
  type EngineParameter,
  type EngineResult,
  type EngineValue,
} from "../library";

/** Functions that stand for what the engine's formula language lacks; the translator prints them, nobody types them. */
export function registerHidden(library: EngineLibrary): void {
  const add = (name: string, args: EngineParameter[], compute: (this: EngineCall, ...args: never[]) => unknown) =>
    engineFunctions(library).replace(name, { description: "", args, compute, hidden: true });
  add(errorFunction, [parameter("code")], (code: EngineValue) => ({ value: code.value }));
  add("SINGLE", [parameter("value", true)], single as never);
  add(fillFunction, [parameter("value", true), parameter("rows"), parameter("columns")], filled as never);
}

function parameter(name: string, table = false): EngineParameter {
  return { name, description: "", type: table ? ["ANY", "RANGE"] : ["ANY"], acceptErrors: true, ...(table && { acceptMatrix: true }) };
}

/** `@`: of a range the cell in the formula's own row or column, of an array its first value. */
function single(this: EngineCall, argument: EngineArgument): EngineValue {
  if (argument === undefined) return { value: null };
  if (!isTable(argument)) return argument as EngineValue;
  const first = argument[0]?.[0];
  const origin = this.__originCellPosition;
  if (!first?.position || !origin || (argument.length === 1 && argument[0]!.length === 1)) return first ?? { value: null };
  const across = argument[origin.col - first.position.col];
  const down = argument[0]![origin.row - first.position.row];
  const found = argument.length === 1 ? down : argument[0]!.length === 1 ? across?.[0] : undefined;
  return found ?? { value: "#VALUE!", message: "The range has no cell in the row or column of this formula" };
}

/** An array formula of the old kind: its range is filled with the result, repeated if it is one row or column, #N/A where it is too small. */
function filled(argument: EngineArgument, rows: EngineValue, columns: EngineValue): EngineResult {
  const table = isTable(argument) ? argument : [[(argument as EngineValue | undefined) ?? { value: null }]];
  const width = table.length;
  const height = table[0]?.length ?? 0;
  const outside: EngineValue = { value: "#N/A", message: "The array formula fills more cells than it has results" };
  const cell = (column: number, row: number) =>
    table[width === 1 ? 0 : column]?.[height === 1 ? 0 : row] ?? (column < width && row < height ? { value: null } : outside);
  return Array.from({ length: Number(columns.value) }, (_, column) =>
    Array.from({ length: Number(rows.value) }, (_row, row) => cell(column, row)),
  );
}
