import { cellsOf, FunctionError, rowsOf, tableOf, type Declarations, type Reader } from "./declare";
import { isErrorCode } from "../errors";
import type { EngineArgument, EngineValue } from "../library";
import { first } from "./samples";

/** Dynamic-array functions as Excel has them; the engine's FILTER, SORT and CONCAT take their arguments otherwise. */
export function registerArrays(declare: Declarations): void {
  declare.tables("FILTER", "array, include, [if_empty]", (read, array, include, ifEmpty) => filtered(array, include, ifEmpty, read));
  declare.tables("SORT", "array, [sort_index], [sort_order], [by_column]", (read, array, index, order, byColumn) => {
    const rows = oriented(array, truth(byColumn, read));
    const keys = index === undefined ? [1] : cellsOf(index).map((cell) => read.number(cell));
    const orders = order === undefined ? [1] : cellsOf(order).map((cell) => read.number(cell));
    const columns = keys.map((key) => rows.map((row) => row[key - 1] ?? outside(`There is no column ${key} to sort by`)));
    return restored(sortedBy(rows, columns, orders), truth(byColumn, read));
  });
  declare.tables("SORTBY", "array, by_array_and_order…", (read, array, ...rest) => {
    const across = rowsOf(rest[0]).length === 1 && rowsOf(array).length !== 1;
    const rows = oriented(array, across);
    const columns = rest.filter((_, index) => index % 2 === 0).map(cellsOf);
    const orders = rest.filter((_, index) => index % 2 === 1).map((order) => (order === undefined ? 1 : read.number(first(order))));
    if (columns.some((column) => column.length !== rows.length))
      throw new FunctionError("#VALUE!", "The ranges to sort by do not have the size of the array");
    return restored(sortedBy(rows, columns, orders), across);
  });
  declare.tables("XMATCH", "value, array, [match_mode], [search_mode]", (read, value, array, mode, direction) => {
    const wanted = first(value) as EngineValue;
    if (isErrorCode(wanted.value)) return wanted;
    const found = position(
      wanted.value,
      cellsOf(array),
      mode === undefined ? 0 : read.number(first(mode)),
      direction !== undefined && read.number(first(direction)) < 0,
    );
    return found >= 0 ? found + 1 : { value: "#N/A", message: `${String(wanted.value)} is not in the array` };
  });
  declare.tables("CONCAT", "text…", (read, ...args) =>
    args
      .flatMap(cellsOf)
      .map((cell) => read.text(checked(cell)))
      .join(""),
  );
}

function filtered(array: EngineArgument, include: EngineArgument, ifEmpty: EngineArgument, read: Reader): EngineValue | EngineValue[][] {
  const across = rowsOf(include).length === 1 && rowsOf(array).length !== 1;
  const rows = oriented(array, across);
  const conditions = cellsOf(include);
  if (conditions.length !== rows.length)
    throw new FunctionError("#VALUE!", `The condition has ${conditions.length} cells for ${rows.length} rows`);
  const kept = rows.filter((_, index) => truth(checked(conditions[index]!), read));
  if (kept.length > 0) return restored(kept, across);
  if (ifEmpty === undefined) throw new FunctionError("#CALC!", "Nothing meets the condition");
  return tableOf(rowsOf(ifEmpty));
}

function oriented(array: EngineArgument, byColumn: boolean): EngineValue[][] {
  const rows = rowsOf(array);
  return byColumn ? turned(rows) : rows;
}

function restored(rows: readonly EngineValue[][], byColumn: boolean): EngineValue[][] {
  return tableOf(byColumn ? turned(rows) : rows);
}

function turned(rows: readonly (readonly EngineValue[])[]): EngineValue[][] {
  return (rows[0] ?? []).map((_, column) => rows.map((row) => row[column]!));
}

function sortedBy(
  rows: readonly EngineValue[][],
  columns: readonly (readonly EngineValue[])[],
  orders: readonly number[],
): EngineValue[][] {
  const order = rows
    .map((_, index) => index)
    .sort((a, b) => {
      for (const [at, column] of columns.entries()) {
        const difference = compare(column[a]!.value, column[b]!.value, orders[at] ?? orders.at(-1) ?? 1);
        if (difference !== 0) return difference;
      }
      return a - b;
    });
  return order.map((index) => rows[index]!);
}

/** Numbers before texts before truth values before errors; blanks last in either order. */
export function compare(a: unknown, b: unknown, order: number): number {
  const blanks = Number(a === null || a === undefined) - Number(b === null || b === undefined);
  if (blanks !== 0 || a === null || a === undefined) return blanks;
  const kinds = kind(a) - kind(b);
  const plain =
    kinds !== 0 ? kinds : typeof a === "string" ? a.localeCompare(String(b), "en", { sensitivity: "accent" }) : Number(a) - Number(b);
  return order < 0 ? -plain : plain;
}

function kind(value: unknown): number {
  if (isErrorCode(value)) return 3;
  return typeof value === "number" ? 0 : typeof value === "string" ? 1 : 2;
}

/** Position of an exact match, else of the next smaller (−1) or larger (1), or by wildcards (2). */
function position(wanted: unknown, cells: readonly EngineValue[], mode: number, backwards: boolean): number {
  const places = cells.map((_, index) => index);
  if (backwards) places.reverse();
  const pattern = mode === 2 && typeof wanted === "string" ? wildcard(wanted) : undefined;
  const exact = places.find((index) => (pattern ? pattern.test(String(cells[index]!.value ?? "")) : same(cells[index]!.value, wanted)));
  if (exact !== undefined || mode === 0 || mode === 2) return exact ?? -1;
  let best = -1;
  for (const index of places) {
    const { value } = cells[index]!;
    if (value === null || kind(value) !== kind(wanted) || compare(value, wanted, 1) * mode < 0) continue;
    if (best < 0 || compare(value, cells[best]!.value, 1) * mode < 0) best = index;
  }
  return best;
}

function same(a: unknown, b: unknown): boolean {
  return a !== null && a !== undefined && kind(a) === kind(b) && compare(a, b, 1) === 0;
}

function wildcard(text: string): RegExp {
  const source = text.replace(/~([*?~])|([*?])|([.+^${}()|[\]\\])/g, (_all, plain?: string, wild?: string, special?: string) =>
    plain ? `\\${plain}` : wild ? (wild === "*" ? ".*" : ".") : `\\${special}`,
  );
  return new RegExp(`^${source}$`, "is");
}

function truth(argument: EngineArgument, read: Reader): boolean {
  if (argument === undefined) return false;
  const { value } = first(argument) as EngineValue;
  if (typeof value === "boolean") return value;
  return value !== null && value !== "" && read.number(argument) !== 0;
}

function checked(cell: EngineValue): EngineValue {
  if (isErrorCode(cell.value)) throw new FunctionError(cell.value, cell.message ?? "");
  return cell;
}

function outside(message: string): never {
  throw new FunctionError("#VALUE!", message);
}
