/** What the house knows of a workbook file: cells, names and tables, without styles. The bytes stay in the package; see package.ts. */

/** An error value of a cell; the message is known only for cells just calculated. */
export interface BookError {
  readonly error: string;
  readonly message?: string;
}

export type BookValue = number | string | boolean | null | BookError;

export interface BookCell {
  /** 0-based. */
  readonly row: number;
  /** 0-based. */
  readonly column: number;
  /** Formula as the file holds it, without `=`; shared formulas are already written out for their own cell. */
  readonly formula?: string;
  /** Range that an array formula (legacy or dynamic) fills, for its first cell: `B2:B10`. */
  readonly array?: string;
  /** True for a dynamic array (cell metadata `cm`). */
  readonly dynamic?: boolean;
  /** Value held by the file. */
  readonly value: BookValue;
  /** Address of the array formula that filled this cell; the value is its result and no input. */
  readonly filledBy?: string;
  /** Set where the file computes the cell in a way that is not read here (a data table, a formula that cannot be parsed): one sentence. No `formula` then; the cached value stays and dependants may be out of date. */
  readonly unread?: string;
}

export interface BookSheet {
  readonly name: string;
  /** By address in capitals without `$`: `B12`. */
  readonly cells: ReadonlyMap<string, BookCell>;
  /** Number of rows and columns in use. */
  readonly rows: number;
  readonly columns: number;
  /** 0-based rows that are hidden, by hand or by a filter; left out if there are none. */
  readonly hiddenRows?: ReadonlySet<number>;
}

export interface DefinedName {
  readonly name: string;
  /** Formula without `=`. */
  readonly formula: string;
  /** Sheet to which the name is local. */
  readonly sheet?: string;
}

export interface BookTable {
  readonly name: string;
  readonly sheet: string;
  /** Whole range with header and totals row. */
  readonly range: string;
  readonly columns: readonly string[];
  readonly headerRow: boolean;
  readonly totalsRow: boolean;
}

export interface Workbook {
  readonly sheets: readonly BookSheet[];
  readonly names: readonly DefinedName[];
  readonly tables: readonly BookTable[];
  readonly date1904: boolean;
  /** What the reader met and does not read yet, one sentence each; reported to the user, never dropped from the file. */
  readonly notes: readonly string[];
}

/** New content of one cell, for patching the package. */
export interface CellChange {
  readonly sheet: string;
  /** `B12` */
  readonly address: string;
  /** Value to store. */
  readonly value: BookValue;
  /** Left out: the formula of the file stays as it is, to the byte. null: the cell becomes a plain value. Text (no `=`): new formula, in the file's dialect. */
  readonly formula?: string | null;
  /** Range filled by the formula when it spills: `B2:B10`. Left out: as in the file, or a plain formula if the formula is new. Spilled cells are changes of their own. */
  readonly array?: string;
  /** For a new formula with `array`: false makes it a legacy array formula; a dynamic array otherwise. */
  readonly dynamic?: boolean;
}
