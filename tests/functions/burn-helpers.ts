/** What the tests of BURN and EQUILIBRIUM share: the simple air of textbooks, the ten species of their flames, and tables read by label. */
import type { CellError } from "../../src/functions/cell";
import cases from "../cases/equilibrium.json";
import { call } from "./helpers";

export type Table = readonly (readonly (number | string | boolean | CellError)[])[];

/** Air as textbooks burn in it, in moles. */
export const SIMPLE_AIR = "O2 + 3.76 N2";
export const TEN = "CO2 CO H2O H2 O2 N2 OH NO H O";
/** R of CODATA 2018, exact. */
export const R = 8.31446261815324;
export const ATMOSPHERE = 101325;

/** The value of a line of an upright table. */
export function valueOf(table: Table, label: string): number {
  const row = table.find(([name]) => name === label);
  if (row && typeof row[1] === "number") return row[1];
  throw new Error(`no number "${label}" in ${table.map((cells) => cells.map(String).join(" | ")).join("\n")}`);
}

/** The text of a line: its value, or its note where it says so. */
export function textOf(table: Table, label: string): string {
  const row = table.find(([name]) => name === label);
  return String(row?.[1] === "see note" ? row[3] : row?.[1]);
}

/** The sentences of the warnings of an upright table. */
export function warningsOf(table: Table): string[] {
  return table.filter(([label]) => label === "warning").map((row) => String(row[3]));
}

/** A column of a sweep by its heading, without it. */
export function columnOf(table: Table, heading: string): (number | string | boolean | CellError | undefined)[] {
  const place = table[0]!.indexOf(heading);
  if (place < 0) throw new Error(`no column "${heading}" in ${table[0]!.join(" | ")}`);
  return table.slice(1).map((row) => row[place]);
}

/** Labels of an upright table in order. */
export function labelsOf(table: Table): string[] {
  return table.map(([label]) => String(label));
}

/** BURN of a fuel in simple air at 25 °C and 1 atm unless more is said. */
export function burnt(fuel: unknown, oxidant: unknown = SIMPLE_AIR, ratio: unknown = 1, ...others: unknown[]): Table {
  const [start, pressure, products, set] = others;
  return call("BURN", fuel, oxidant, ratio, start ?? 298.15, pressure ?? "1 atm", products, set);
}

/** Difference relative to the wanted value. */
export function relative(value: number, wanted: number): number {
  return Math.abs(value / wanted - 1);
}

/** The sentence of the error that a call gives in its first cell. */
export function sentenceOf(table: Table): string {
  const cell = table[0]![0] as CellError;
  return typeof cell === "object" ? `${cell.code} ${cell.message}` : `not refused: ${String(cell)}`;
}

/** The fits of the flames computed elsewhere, as rows of a coefficient block; R of CODATA, formation and entropy from the constants. */
export const fitsInCells: readonly (readonly (number | string | null)[])[] = Object.entries(cases.fits).flatMap(([name, { low, high }]) => [
  ["Cp", "g", name, "seven-term", 200, 1000, null, null, null, null, ...low],
  ["Cp", "g", name, "seven-term", 1000, 5000, null, null, null, null, ...high],
]);
