/**
 * Every worksheet function by its id (`CV.AT`). Imports nothing, so that a function which calls others by name
 * can look them up without an import cycle. Filled by functions/index.ts.
 *
 * A worksheet function takes blocks of cells row by row (`undefined` for an argument left out, null for a blank cell,
 * a CellError for a cell that holds an error) and gives a rectangular block: numbers, texts, booleans, CellErrors.
 * It is synchronous, never throws, and never gives NaN, an infinity, null or undefined.
 */
export type WorksheetFunction = (...blocks: any[]) => any[][];

export const registry = new Map<string, WorksheetFunction>();
