import type { BookTable, DefinedName, Workbook } from "../workbook";
import type { FunctionNames } from "./function-names";

/** What a formula may refer to besides cells: the functions of the add-in, and the sheets, names and tables of its workbook. */
export interface BookContext {
  readonly functions: FunctionNames;
  readonly tables: readonly BookTable[];
  /** Name of a sheet as the workbook spells it; undefined if there is none. */
  sheetNamed(name: string): string | undefined;
  /** Names of the sheets from one to another, in the workbook's order. */
  sheetsBetween(first: string, last: string): readonly string[];
  /** A name local to the sheet if there is one, else the workbook's. */
  nameFor(name: string, sheet: string): DefinedName | undefined;
  /** Rows and columns in use, of the sheet that uses most; undefined where there are no cells to bound a whole column. */
  readonly used?: { readonly rows: number; readonly columns: number };
}

/** No workbook at all: a formula on its own. Any sheet name is taken as it comes. */
export function noBook(functions: FunctionNames): BookContext {
  return { functions, tables: [], sheetNamed: (name) => name, sheetsBetween: () => [], nameFor: () => undefined };
}

/** Look-ups of one workbook, case ignored as Excel does. */
export function bookContext(workbook: Workbook, functions: FunctionNames): BookContext {
  const order = workbook.sheets.map((sheet) => sheet.name);
  const sheets = new Map(order.map((name) => [name.toUpperCase(), name]));
  const names = new Map(workbook.names.map((name) => [nameKey(name.name, name.sheet), name]));
  return {
    functions,
    tables: workbook.tables,
    sheetNamed: (name) => sheets.get(name.toUpperCase()),
    sheetsBetween: (first, last) => between(order, first, last),
    nameFor: (name, sheet) => names.get(nameKey(name, sheet)) ?? names.get(nameKey(name)),
    used: {
      rows: Math.max(1, ...workbook.sheets.map((sheet) => sheet.rows)),
      columns: Math.max(1, ...workbook.sheets.map((sheet) => sheet.columns)),
    },
  };
}

function nameKey(name: string, sheet = ""): string {
  return `${sheet.toUpperCase()}!${name.toUpperCase()}`;
}

function between(order: readonly string[], first: string, last: string): readonly string[] {
  const position = (name: string) => order.findIndex((sheet) => sheet.toUpperCase() === name.toUpperCase());
  const [from, to] = [position(first), position(last)];
  return from < 0 || to < 0 ? [] : order.slice(Math.min(from, to), Math.max(from, to) + 1);
}
