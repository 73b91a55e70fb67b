import type * as OSpreadsheet from "@odoo/o-spreadsheet";

/**
 * The spreadsheet library, as the page's global or as loaded by Node. Only this folder and the page know its name;
 * what is used of it beyond its declared types is listed here, so that a new version can be checked against one file.
 */
export type EngineLibrary = typeof OSpreadsheet;

/** One value inside the engine. An error is a text such as `#N/A` with the sentence in `message`. */
export interface EngineValue {
  value: unknown;
  message?: string;
  /** Where the value stands, if it was read from a cell. */
  position?: { sheetId: string; row: number; col: number };
}

/** An argument: left out, a value, or a table, column by column. */
export type EngineArgument = undefined | EngineValue | readonly (readonly EngineValue[])[];

/** A result: a value or a table, column by column. */
export type EngineResult = EngineValue | EngineValue[][];

export interface EngineParameter {
  name: string;
  description: string;
  type: string[];
  acceptErrors?: boolean;
  acceptMatrix?: boolean;
  acceptMatrixOnly?: boolean;
  optional?: boolean;
  repeating?: boolean;
  default?: boolean;
}

/** What `this` offers inside a function. */
export interface EngineCall {
  __originCellPosition?: { sheetId: string; row: number; col: number };
  locale: unknown;
}

export interface EngineFunction {
  description: string;
  category?: string;
  args: EngineParameter[];
  compute: (this: EngineCall, ...args: never[]) => unknown;
  isExported?: boolean;
  hidden?: boolean;
  minArgRequired?: number;
  maxArgPossible?: number;
}

/** The functions a formula may call, by name in capitals. */
export interface EngineFunctions {
  content: Record<string, EngineFunction>;
  replace(name: string, description: EngineFunction): unknown;
}

export function engineFunctions(library: EngineLibrary): EngineFunctions {
  return library.registries.functionRegistry as unknown as EngineFunctions;
}

/** A known function, by canonical name; a name such as `constructor` finds nothing. */
export function engineFunction(library: EngineLibrary, name: string): EngineFunction | undefined {
  const { content } = engineFunctions(library);
  return Object.prototype.hasOwnProperty.call(content, name) ? content[name] : undefined;
}

/** A table as the engine holds it is an array of columns. */
export function isTable(argument: EngineArgument | EngineResult): argument is EngineValue[][] {
  return Array.isArray(argument);
}
