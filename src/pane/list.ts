/** Arguments that take whole lists: a range of cells, one value, or numbers and texts in braces as Excel writes them. Pure. */
import { readArgument, textArgument, type Argument } from "./formula";

type Row = (number | string)[];

/** One cell of an array constant with the separator behind it. */
const NEXT = /\s*("(?:[^"]|"")*"|[^",;{}]+?)\s*([,;]|$)/y;

/** Reads a field of a list: as a quantity, and `{22.1;22.2}` or `{"28.1 MJ/kg",28120}` as an array constant. */
export function readList(typed: string): Argument {
  const inner = /^=?\s*\{(.*)\}$/s.exec(typed.trim())?.[1];
  const rows = inner === undefined ? undefined : readRows(inner);
  return rows ? { kind: "array", rows } : readArgument(typed);
}

/**
 * Reads a field for a formula or another text that may look like a cell: CH4 is methane, a cell needs its equals sign, a range its colon.
 */
export function readText(typed: string): Argument {
  const text = typed.trim();
  if (text.startsWith("{")) return readList(text);
  return /^=|[:!]/.test(text) ? readArgument(text) : textArgument(text);
}

/** Rows of one width, or undefined if the text is no array constant. */
function readRows(inner: string): Row[] | undefined {
  const rows: Row[] = [[]];
  NEXT.lastIndex = 0;
  for (let open = true; open;) {
    const [, cell = "", separator = ""] = NEXT.exec(inner) ?? [];
    const value = cellOf(cell);
    if (value === undefined) return undefined;
    rows[rows.length - 1]?.push(value);
    if (separator === ";") rows.push([]);
    open = separator !== "";
  }
  return rows.every((row) => row.length === rows[0]?.length) ? rows : undefined;
}

function cellOf(text: string): number | string | undefined {
  if (text.startsWith('"')) return text.slice(1, -1).replaceAll('""', '"');
  const argument = readArgument(text);
  return argument.kind === "number" ? argument.value : undefined;
}
