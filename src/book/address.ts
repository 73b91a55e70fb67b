/** Cell addresses (`B12`) and ranges (`B2:B10`) as 0-based rows and columns and back. */
import { refuse } from "../core/refusal";

export interface Place {
  readonly row: number;
  readonly column: number;
}

export interface Area {
  readonly top: number;
  readonly left: number;
  readonly bottom: number;
  readonly right: number;
}

/** Rows and columns of a sheet. */
export const ROWS = 1_048_576;
export const COLUMNS = 16_384;

/** `B12` or `$B$12` -> place; undefined for anything else. */
export function placeOf(address: string): Place | undefined {
  const match = /^\$?([A-Za-z]{1,3})\$?([1-9][0-9]{0,6})$/.exec(address);
  if (!match) return undefined;
  const column = columnIndex(match[1] as string);
  const row = Number(match[2]) - 1;
  return column < COLUMNS && row < ROWS ? { row, column } : undefined;
}

/** As placeOf, but refuses what is no address. */
export function requirePlace(address: string): Place {
  return placeOf(address) ?? refuse(`"${address}" is not a cell address such as B12`);
}

/** `B2:B10` or a single address -> area; undefined for anything else. Corners may stand in any order. */
export function areaOf(range: string): Area | undefined {
  const [first, second, third] = range.split(":");
  const from = placeOf(first ?? "");
  const to = second === undefined ? from : placeOf(second);
  if (!from || !to || third !== undefined) return undefined;
  return {
    top: Math.min(from.row, to.row),
    left: Math.min(from.column, to.column),
    bottom: Math.max(from.row, to.row),
    right: Math.max(from.column, to.column),
  };
}

/** As areaOf, but refuses what is no range. */
export function requireArea(range: string): Area {
  return areaOf(range) ?? refuse(`"${range}" is not a range of cells such as B2:B10`);
}

/** `AB` -> 27. */
export function columnIndex(letters: string): number {
  let index = 0;
  for (let i = 0; i < letters.length; i++) index = index * 26 + (letters.charCodeAt(i) & 31);
  return index - 1;
}

const letterCache: string[] = [];

/** 27 -> `AB`. */
export function columnLetters(column: number): string {
  const known = letterCache[column];
  if (known !== undefined) return known;
  const last = String.fromCharCode(65 + (column % 26));
  return (letterCache[column] = column < 26 ? last : columnLetters(Math.floor(column / 26) - 1) + last);
}

export const addressOf = (row: number, column: number): string => columnLetters(column) + (row + 1);

/** `B2:B10`; a single cell is written as its address alone. */
export function rangeOf({ top, left, bottom, right }: Area): string {
  const first = addressOf(top, left);
  return top === bottom && left === right ? first : `${first}:${addressOf(bottom, right)}`;
}

export const inside = (area: Area, row: number, column: number): boolean =>
  row >= area.top && row <= area.bottom && column >= area.left && column <= area.right;
