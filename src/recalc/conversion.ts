import { CellError } from "../functions/cell";
import type { WorksheetFunction } from "../functions/registry";
import { isErrorCode } from "./errors";
import { isTable, type EngineArgument, type EngineResult, type EngineValue } from "./library";

/**
 * Between the engine's cells and those of a worksheet function. The engine keeps tables column by column and errors as texts;
 * a worksheet function takes and gives blocks row by row, with CellError for an error. Nothing may be lost on the way: a result
 * that is no rectangle of finite numbers, texts, booleans and errors would become 0 or a dead cell inside the engine, so it
 * becomes an error that says so.
 */
export function engineCompute(name: string, compute: WorksheetFunction): (...args: EngineArgument[]) => EngineResult {
  return (...args) => {
    try {
      return fromBlock(name, compute(...args.map(toBlock)));
    } catch (reason) {
      return fault(name, `stopped: ${wordsOf(reason)}`);
    }
  };
}

/** A block row by row; undefined for an argument left out. */
export function toBlock(argument: EngineArgument): unknown[][] | undefined {
  if (argument === undefined) return undefined;
  if (!isTable(argument)) return [[toCell(argument as EngineValue)]];
  const columns = argument.length;
  const rows = argument[0]?.length ?? 0;
  const block: unknown[][] = [];
  for (let row = 0; row < rows; row++) {
    const cells: unknown[] = new Array(columns);
    for (let column = 0; column < columns; column++) cells[column] = toCell(argument[column]![row]);
    block.push(cells);
  }
  return block;
}

function toCell(cell: EngineValue | undefined): unknown {
  const value = cell?.value ?? null;
  return isErrorCode(value) ? new CellError(value, cell!.message ?? "") : value;
}

function fromBlock(name: string, block: unknown): EngineResult {
  const rows = Array.isArray(block) ? block.length : 0;
  const columns = rows > 0 && Array.isArray((block as unknown[])[0]) ? (block as unknown[][])[0]!.length : 0;
  if (rows === 0 || columns === 0) return fault(name, "gave no cells");
  const table = block as unknown[][];
  if (table.some((row) => !Array.isArray(row) || row.length !== columns)) return fault(name, "gave rows of different lengths");
  if (rows === 1 && columns === 1) return fromCell(name, table[0]![0]);
  return Array.from({ length: columns }, (_, column) => table.map((row) => fromCell(name, row[column])));
}

function fromCell(name: string, cell: unknown): EngineValue {
  if (typeof cell === "number") return Number.isFinite(cell) ? { value: cell } : fault(name, `gave ${cell}`);
  if (typeof cell === "string" || typeof cell === "boolean") return { value: cell };
  if (cell instanceof CellError) return { value: isErrorCode(cell.code) ? cell.code : "#VALUE!", message: cell.message };
  return fault(name, `gave ${cell === null ? "null" : typeof cell} instead of a cell`);
}

/** An error of ours, not of the user: said as such. */
function fault(name: string, what: string): EngineValue {
  return { value: "#VALUE!", message: `${name} ${what}. This is a fault in the function, not in its input` };
}

function wordsOf(reason: unknown): string {
  if (reason instanceof Error || (typeof reason === "object" && reason !== null && "message" in reason))
    return String((reason as Error).message);
  return String(reason);
}
