/**
 * When a recalculated value takes the place of the one in the file, as the command does it: a Stillwall number that differs at all, a number
 * of a built-in function that differs by more than rounding, a change of type. A built-in that newly fails keeps the value of the file: the
 * fault may lie in this program's version of the function.
 */
import { storedError } from "../../book/patch/value";
import type { BookValue } from "../../book/workbook";

/** Two programs may add in another order. */
const BUILT_IN_TOLERANCE = 1e-14;

export function differs(before: BookValue, after: BookValue, formula: string): boolean {
  const stillwall = /_xldudf_still_|still\./i.test(formula);
  if (isError(after)) return isError(before) ? storedError(before.error) !== storedError(after.error) : stillwall || before === null;
  if (typeof before !== "number" || typeof after !== "number") return before !== after;
  if (stillwall) return before !== after;
  return Math.abs(before - after) > BUILT_IN_TOLERANCE * Math.max(Math.abs(before), Math.abs(after));
}

function isError(value: BookValue): value is { readonly error: string } {
  return typeof value === "object" && value !== null;
}
