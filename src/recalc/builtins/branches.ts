/**
 * IF and IFS over arrays, cell by cell: a condition that is an error is the error of its own cell, not of the whole array. The engine's own
 * give one error for everything. Single conditions stay with the engine. IF without its third argument is FALSE, where the engine says 0.
 */
import { isErrorCode } from "../errors";
import { engineFunctions, type EngineArgument, type EngineCall, type EngineLibrary, type EngineValue, isTable } from "../library";
import { asResult } from "./declare";

export function mendBranches(library: EngineLibrary): void {
  const functions = engineFunctions(library);
  for (const name of ["IF", "IFS"]) {
    const known = functions.content[name]!;
    const compute = known.compute as unknown as (this: EngineCall, ...args: EngineArgument[]) => unknown;
    functions.replace(name, {
      ...known,
      compute: function (this: EngineCall, ...given: EngineArgument[]) {
        const args = name === "IF" && given.length === 2 ? [...given, { value: false }] : given;
        const conditions = name === "IF" ? args.slice(0, 1) : args.filter((_, place) => place % 2 === 0);
        if (!conditions.some(hasSeveral)) return compute.apply(this, args);
        return overCells(args, (cells) => asResult(compute.apply(this, cells)) as EngineValue);
      } as never,
    });
  }
}

function hasSeveral(argument: EngineArgument): boolean {
  return isTable(argument) && (argument.length > 1 || (argument[0]?.length ?? 0) > 1);
}

/** A table, column by column, of what each place gives; what a place throws, an error of the engine, stands in that place. */
function overCells(args: readonly EngineArgument[], each: (cells: EngineArgument[]) => EngineValue): EngineValue[][] {
  const tables = args.filter(isTable);
  const width = Math.max(...tables.map((table) => table.length));
  const height = Math.max(...tables.map((table) => table[0]?.length ?? 0));
  return Array.from({ length: width }, (_, column) =>
    Array.from({ length: height }, (_, row) => guarded(() => each(args.map((argument) => cellOf(argument, column, row))))),
  );
}

/** The cell of an argument that belongs to a place: a single row or column is repeated, elsewhere there is none. */
function cellOf(argument: EngineArgument, column: number, row: number): EngineArgument {
  if (!isTable(argument)) return argument;
  const inColumn = argument[argument.length === 1 ? 0 : column];
  return inColumn?.[inColumn.length === 1 ? 0 : row] ?? { value: "#N/A", message: "The arrays differ in size" };
}

function guarded(compute: () => EngineValue): EngineValue {
  try {
    const outcome = compute();
    return isTable(outcome as never) ? (outcome as unknown as EngineValue[][])[0]![0]! : outcome;
  } catch (reason) {
    const { value, message } = (reason ?? {}) as EngineValue;
    if (!isErrorCode(value)) throw reason;
    return { value, message: String(message ?? "") };
  }
}
