/**
 * Whether a formula typed on the page must be stored as an array formula. A plain formula in a file holds one value: Excel would reduce a
 * range in it to the cell of the same row. Where that would change the formula, or where it calls a Stillwall function (Excel stores those so
 * itself), it is stored as a dynamic array.
 */
import { inNamespace, noBook, toEngine, type FunctionNames } from "../../book/formula";
import { takesRange } from "../../recalc/parameters";
import { library } from "./engine";

/** A place that no range of a formula crosses by accident. */
const ANYWHERE = { sheet: "", row: 1048575, column: 16383 };

export function isArrayFormula(engineText: string, functions: FunctionNames): boolean {
  const book = noBook(functions);
  const whole = toEngine(engineText, book, { place: ANYWHERE });
  if (whole.calls.some(({ name }) => inNamespace(name))) return true;
  return whole.text !== toEngine(engineText, book, { place: ANYWHERE, single: takesRange(library) }).text;
}
