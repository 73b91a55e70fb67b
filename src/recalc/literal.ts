import type { BookValue } from "../book/workbook";

/** The engine reads a number with at most this exponent as a number when it is typed. */
const largestTyped = 1e307;
const smallestTyped = 1e-307;

/** A value as the content of an engine's cell: a text goes with an apostrophe, or `1/2` and `TRUE` would become something else. */
export function cellContent(value: BookValue): string | undefined {
  if (value === null) return undefined;
  if (typeof value === "string") return `'${value}`;
  if (typeof value === "boolean") return value ? "TRUE" : "FALSE";
  if (typeof value === "object") return value.error;
  const size = Math.abs(value);
  return size > largestTyped || (size > 0 && size < smallestTyped) ? `=${value}` : String(value);
}
