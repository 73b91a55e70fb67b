import entries from "./handbook.json";

/**
 * The help of every worksheet function, in the order of the families. It is read once, by the build, from the doc comments
 * in src/functions and written to handbook.json; help pages, argument help, examples and their tests all read it from here.
 */

/** How an argument takes a range: `value` broadcasts cell by cell, `list` is consumed whole, `block` is a table of a known layout. */
export type ParameterKind = "value" | "list" | "block";

export interface HandbookParameter {
  /** As written in the function book, for example `relative_humidity`. */
  readonly name: string;
  readonly description: string;
  /** Unit of a plain number, `-` for numbers without dimension and for text. */
  readonly unit: string;
  readonly kind: ParameterKind;
  readonly optional: boolean;
}

export interface HandbookExample {
  /** As typed in a cell, without `=`. */
  readonly formula: string;
  /** A number, `~ 21.27` (agrees after rounding to the printed digits), `"text"`, `TRUE`, `{1,2;3,4}` or `#VALUE! sentence`. */
  readonly result: string;
}

export interface HandbookEntry {
  /** `CV.AT`; for ever. */
  readonly id: string;
  /** As typed in a cell: `STILL.CV.AT`. */
  readonly name: string;
  /** File in src/functions: `properties`. */
  readonly family: string;
  readonly description: string;
  readonly parameters: readonly HandbookParameter[];
  readonly result: { readonly description: string; readonly unit: string };
  /** Keys of src/data/sources.json. */
  readonly sources: readonly string[];
}

/** What help page and tests read besides; the add-in's bundle leaves it out. */
export interface PromisedEntry extends HandbookEntry {
  readonly examples: readonly HandbookExample[];
  /** Labels of a table's lines in their order, those of the warnings apart; absent where the function gives no such table. */
  readonly lines?: readonly string[];
}

export const handbook: readonly HandbookEntry[] = entries as readonly HandbookEntry[];

const byId = new Map(handbook.map((entry) => [entry.id, entry]));

/** The help of one function, by its id (`CV.AT`) or by its name in a cell (`STILL.CV.AT`), in any case of letters. */
export function helpOf(idOrName: string): HandbookEntry | undefined {
  return byId.get(idOrName.toUpperCase().replace(/^STILL\./, ""));
}
