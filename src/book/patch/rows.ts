/** Where the rows and cells of a sheet stand in its XML text. */
import { refuse } from "../../core/refusal";
import { columnIndex } from "../address";
import { attributesOf, closingTag, localName, nextTag, type Tag } from "../xml/lexer";

export interface SheetLayout {
  readonly text: string;
  /** Prefix of the sheet's own elements with its colon, or nothing. */
  readonly prefix: string;
  /** `<dimension>`, where there is one. */
  readonly dimension: Tag | undefined;
  readonly data: Tag;
  /** Start of `</sheetData>`; the end of the tag if it is empty. */
  readonly dataEnd: number;
  readonly rows: readonly RowPlace[];
}

export interface RowPlace {
  /** 0-based. */
  readonly row: number;
  readonly tag: Tag;
  /** Start of `</row>`; the end of the tag if it is empty. */
  readonly innerEnd: number;
  readonly end: number;
}

export interface CellPlace {
  /** 0-based. */
  readonly column: number;
  readonly start: number;
  readonly end: number;
}

/** Finds the rows of a sheet. */
export function layoutOf(text: string): SheetLayout {
  const root = nextTag(text, 0) ?? refuse("A sheet part is empty");
  let dimension: Tag | undefined;
  for (let tag = nextTag(text, root.end); tag; tag = nextTag(text, closingTag(text, tag).end)) {
    if (localName(tag.name) === "dimension") dimension = tag;
    if (localName(tag.name) !== "sheetData") continue;
    const prefix = tag.name.slice(0, tag.name.indexOf(":") + 1);
    return { text, prefix, dimension, data: tag, ...rowsOf(text, tag, prefix) };
  }
  return refuse("A sheet part holds no sheet data");
}

function rowsOf(text: string, data: Tag, prefix: string): { rows: RowPlace[]; dataEnd: number } {
  const rows: RowPlace[] = [];
  if (data.kind === "empty") return { rows, dataEnd: data.end };
  let last = -1;
  for (let tag = nextTag(text, data.end); tag;) {
    if (tag.kind === "close") return { rows, dataEnd: tag.start };
    const close = closingTag(text, tag);
    if (tag.name === `${prefix}row`) {
      const number = attributesOf(text.slice(tag.start, tag.end)).find(({ name }) => name === "r")?.value;
      last = number === undefined ? last + 1 : Number(number) - 1;
      rows.push({ row: last, tag, innerEnd: tag.kind === "empty" ? tag.end : close.start, end: close.end });
    }
    tag = nextTag(text, close.end);
  }
  return refuse("A sheet part breaks off within its rows");
}

/** Index of the first row at or behind `row`; rows stand in ascending order. */
export function rowIndex({ rows }: SheetLayout, row: number): number {
  let low = 0;
  let high = rows.length;
  while (low < high) {
    const middle = (low + high) >> 1;
    if ((rows[middle] as RowPlace).row < row) low = middle + 1;
    else high = middle;
  }
  return low;
}

/** Cells of one row in file order. */
export function cellsOf(layout: SheetLayout, place: RowPlace): CellPlace[] {
  const cells: CellPlace[] = [];
  if (place.tag.kind === "empty") return cells;
  const { text, prefix } = layout;
  let column = -1;
  for (let tag = nextTag(text, place.tag.end, place.innerEnd); tag;) {
    const close = closingTag(text, tag);
    if (tag.name === `${prefix}c`) {
      const letters = addressLetters(text.slice(tag.start, tag.end));
      column = letters === undefined ? column + 1 : columnIndex(letters);
      cells.push({ column, start: tag.start, end: close.end });
    }
    tag = nextTag(text, close.end, place.innerEnd);
  }
  return cells;
}

function addressLetters(tagText: string): string | undefined {
  // Nearly every writer puts the address first; reading all attributes of every cell would take twice as long.
  const quick = /^<\S+\s+r="([A-Za-z]+)\d+"/.exec(tagText)?.[1];
  return (
    quick ??
    attributesOf(tagText)
      .find(({ name }) => name === "r")
      ?.value.replace(/\d+$/, "")
  );
}
