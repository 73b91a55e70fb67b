/** Calls a worksheet function as a host does: blocks of cells in, block of cells out. */
import "../../src/functions";
import { CellError } from "../../src/functions/cell";
import { registry } from "../../src/functions/registry";

type Given = unknown;

/** Wraps a single value as a block; leaves blocks and left-out arguments alone. */
function block(value: Given): unknown {
  return value === undefined || Array.isArray(value) ? value : [[value]];
}

/** The whole block a function gives. */
export function call(id: string, ...values: Given[]): (number | string | boolean | CellError)[][] {
  const worksheetFunction = registry.get(id);
  if (!worksheetFunction) throw new Error(`no function ${id}`);
  return worksheetFunction(...values.map(block));
}

/** The single number a function gives. */
export function number(id: string, ...values: Given[]): number {
  const cell = call(id, ...values)[0]![0];
  if (typeof cell === "number") return cell;
  throw new Error(`${id} gave ${cell instanceof CellError ? `${cell.code} ${cell.message}` : String(cell)}`);
}

/** The error of a refused call, as `#CODE! sentence`. */
export function refusal(id: string, ...values: Given[]): string {
  const cell = call(id, ...values)[0]![0];
  return cell instanceof CellError ? `${cell.code} ${cell.message}` : `not refused: ${String(cell)}`;
}
