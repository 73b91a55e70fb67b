import { fromCol, parseA1Ref, toCol } from "@borgar/fx/xlsx";
import { fail } from "./problem";

/** Part of a sheet, 0-based and inclusive. A whole column has no top and bottom, a whole row no left and right. */
export interface Reference {
  readonly sheet: string;
  readonly top: number | null;
  readonly left: number | null;
  readonly bottom: number | null;
  readonly right: number | null;
  /** Which of them carry a `$`. */
  readonly fixed: { readonly top: boolean; readonly left: boolean; readonly bottom: boolean; readonly right: boolean };
}

/** A reference with all four sides. */
export interface Area {
  readonly sheet: string;
  readonly top: number;
  readonly left: number;
  readonly bottom: number;
  readonly right: number;
}

/** Reads `$B$2:C9`, `A:A`, `'My sheet'!A1`; an empty sheet means the formula's own. */
export function readReference(text: string): Reference {
  const read = parseA1Ref(text);
  if (!read || !("range" in read) || !read.range) return fail("unsupported", `The reference ${text} is not understood`);
  const { workbookName, sheetName } = read as { workbookName?: string; sheetName?: string };
  if (workbookName) fail("unsupported", `The reference ${text} points into another workbook`);
  if (sheetName?.includes(":")) fail("unsupported", `The reference ${text} spans several sheets`);
  const { top, left, bottom, right, $top, $left, $bottom, $right, trim } = read.range as Record<string, unknown>;
  if (trim) fail("unsupported", `The trimmed reference ${text} is not supported`);
  return {
    sheet: sheetName ?? "",
    top: side(top),
    left: side(left),
    bottom: side(bottom),
    right: side(right),
    fixed: { top: !!$top, left: !!$left, bottom: !!$bottom, right: !!$right },
  };
}

/** Prints a reference; the sheet is named unless it is empty. */
export function printReference(reference: Reference): string {
  const { top, left, bottom, right, fixed } = reference;
  const row = (index: number, dollar: boolean) => `${dollar ? "$" : ""}${index + 1}`;
  const column = (index: number, dollar: boolean) => `${dollar ? "$" : ""}${columnName(index)}`;
  const start = (left === null ? "" : column(left, fixed.left)) + (top === null ? "" : row(top, fixed.top));
  const end = (right === null ? "" : column(right, fixed.right)) + (bottom === null ? "" : row(bottom, fixed.bottom));
  const single = top !== null && left !== null && top === bottom && left === right && start === end;
  return sheetPrefix(reference.sheet) + (single ? start : `${start}:${end}`);
}

/** `B12` of 0-based row and column. */
export function addressOf(row: number, column: number): string {
  return `${columnName(column)}${row + 1}`;
}

/** The letters of a 0-based column. */
export function columnName(index: number): string {
  return toCol(index);
}

/** The 0-based row and column of `B12`. */
export function cellOf(address: string): { row: number; column: number } {
  const match = /^\$?([A-Z]+)\$?(\d+)$/i.exec(address);
  if (!match) return fail("syntax", `${address} is not a cell address`);
  return { row: Number(match[2]) - 1, column: fromCol(match[1]!) };
}

/** The area of `B2:C9` or `B2` (no sheet in the text) on the given sheet. */
export function areaOf(range: string, sheet: string): Area {
  const [first, last = first] = range.split(":");
  const from = cellOf(first!);
  const to = cellOf(last!);
  return { sheet, top: from.row, left: from.column, bottom: to.row, right: to.column };
}

/** A reference to an area, every side fixed. */
export function fixedReference(area: Area): Reference {
  return { ...area, fixed: { top: true, left: true, bottom: true, right: true } };
}

const plainSheet = /^[A-Za-z_][A-Za-z0-9_]*$/;
const readsAsAddress = /^(?:[A-Z]{1,3}\d+|R\d*C\d*|R|C|TRUE|FALSE)$/i;

function sheetPrefix(sheet: string): string {
  if (sheet === "") return "";
  return plainSheet.test(sheet) && !readsAsAddress.test(sheet) ? `${sheet}!` : `'${sheet.replaceAll("'", "''")}'!`;
}

function side(value: unknown): number | null {
  return typeof value === "number" ? value : null;
}
