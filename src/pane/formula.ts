/** From what is typed into the argument fields to the text of a worksheet formula. Pure. */

export type Argument =
  | { readonly kind: "omitted" }
  | { readonly kind: "number"; readonly value: number }
  | { readonly kind: "text"; readonly value: string }
  /** An array constant, rows of one width. */
  | { readonly kind: "array"; readonly rows: readonly (readonly (number | string)[])[] }
  /** A cell, range or defined name; its value is known to the sheet only. */
  | { readonly kind: "reference"; readonly text: string };

export const OMITTED: Argument = { kind: "omitted" };

const NUMBER = /^[+-]?(?:\d+\.?\d*|\.\d+)(?:[eE][+-]?\d+)?$/;
const CELL = String.raw`\$?([A-Za-z]{1,3})\$?([1-9]\d{0,6})`;
const SHEET = String.raw`(?:'(?:[^'\[\]:*?/\\]|'')+'|[\p{L}_][\p{L}\p{N}_.]*)!`;
const REFERENCE = new RegExp(`^=?((?:${SHEET})?${CELL}(?::${CELL})?#?)$`, "u");
/** A defined name; it needs its `=`, because without it `ambient` is text. */
const NAME = /^=([\p{L}_][\p{L}\p{N}_.]*)$/u;
const LAST_COLUMN = 16384;
const LAST_ROW = 1048576;

/**
 * Reads one field: nothing, a plain number, a cell or range (`B2`, `Sheet2!$B$2:$B$9`), a defined name (`=ambient`),
 * else text such as `25 °C`.
 * Only for arguments that are quantities: a species like `N2` looks like a cell and is written with `textArgument`.
 */
export function readArgument(typed: string): Argument {
  const text = typed.trim();
  if (text === "") return OMITTED;
  if (NUMBER.test(text) && Number.isFinite(Number(text))) return { kind: "number", value: Number(text) };
  const match = REFERENCE.exec(text);
  if (match && cellsOf(match).every(exists)) return { kind: "reference", text: inCapitals(match[1] ?? "") };
  const name = NAME.exec(text)?.[1];
  return name === undefined ? { kind: "text", value: text } : { kind: "reference", text: name };
}

/** A text argument, left out if empty. */
export function textArgument(typed: string): Argument {
  const value = typed.trim();
  return value === "" ? OMITTED : { kind: "text", value };
}

/** The formula as typed into a cell: `=STILL.CV.AT("N2",500,,"gri-1999")`. Arguments left out at the end are dropped with their commas. */
export function writeFormula(id: string, args: readonly Argument[]): string {
  let count = args.length;
  while (count > 0 && args[count - 1]?.kind === "omitted") count -= 1;
  return `=STILL.${id}(${args.slice(0, count).map(writeArgument).join(",")})`;
}

/** True if one of the arguments is, or covers, the cell at `address`: the formula would then feed on itself. */
export function refersTo(args: readonly Argument[], address: string): boolean {
  const target = placeOf(address);
  if (!target) return false;
  return args.some((argument) => {
    const place = argument.kind === "reference" ? placeOf(argument.text) : undefined;
    if (!place || (place.sheet !== "" && target.sheet !== "" && place.sheet !== target.sheet)) return false;
    return place.left <= target.left && target.left <= place.right && place.top <= target.top && target.top <= place.bottom;
  });
}

function writeArgument(argument: Argument): string {
  switch (argument.kind) {
    case "omitted":
      return "";
    case "number":
    case "text":
      return writeValue(argument.value);
    case "array":
      return `{${argument.rows.map((row) => row.map(writeValue).join(",")).join(";")}}`;
    case "reference":
      return argument.text;
  }
}

function writeValue(value: number | string): string {
  return typeof value === "number" ? String(value).replace("e", "E") : `"${value.replaceAll('"', '""')}"`;
}

interface Place {
  readonly sheet: string;
  readonly left: number;
  readonly top: number;
  readonly right: number;
  readonly bottom: number;
}

function placeOf(text: string): Place | undefined {
  const match = REFERENCE.exec(text.trim());
  if (!match) return undefined;
  const cells = cellsOf(match);
  const first = cells[0];
  const last = cells[cells.length - 1];
  if (!first || !last) return undefined;
  const bang = text.lastIndexOf("!");
  const sheet = bang < 0 ? "" : text.slice(0, bang).replace(/^=/, "").replace(/^'|'$/g, "").replaceAll("''", "'").toLowerCase();
  return {
    sheet,
    left: Math.min(first.column, last.column),
    right: Math.max(first.column, last.column),
    top: Math.min(first.row, last.row),
    bottom: Math.max(first.row, last.row),
  };
}

interface Cell {
  readonly column: number;
  readonly row: number;
}

function cellsOf(match: RegExpExecArray): Cell[] {
  const cells = [cell(match[2], match[3])];
  if (match[4] !== undefined) cells.push(cell(match[4], match[5]));
  return cells;
}

function cell(letters = "", row = ""): Cell {
  const column = [...letters.toUpperCase()].reduce((sum, letter) => sum * 26 + letter.charCodeAt(0) - 64, 0);
  return { column, row: Number(row) };
}

function exists({ column, row }: Cell): boolean {
  return column <= LAST_COLUMN && row <= LAST_ROW;
}

function inCapitals(reference: string): string {
  const bang = reference.lastIndexOf("!");
  return reference.slice(0, bang + 1) + reference.slice(bang + 1).toUpperCase();
}
