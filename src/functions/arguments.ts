/** Reading single arguments: quantities in their plain unit or as text with a unit, texts, and the words for what is missing. */
import { Refusal, refuse } from "../core/refusal";
import { beginsWithNumber, dimensionOf, parseQuantity, requireDimension, toBase } from "../core/units";
import type { Cell } from "./cell";

/** What an argument expects: its name in sentences, and an example text with a unit of its dimension. */
export interface Expected {
  readonly name: string;
  /** Unit of plain numbers; always the SI base unit of its dimension in the families of this file's callers. */
  readonly unit: string;
  readonly example: string;
}

export const TEMPERATURE: Expected = { name: "Temperature", unit: "K", example: '"25 °C"' };
export const FROM: Expected = { name: "Temperature from", unit: "K", example: '"25 °C"' };
export const TO: Expected = { name: "Temperature to", unit: "K", example: '"25 °C"' };
export const PRESSURE: Expected = { name: "Pressure", unit: "Pa", example: '"2.5 bar"' };
export const VOLUME: Expected = { name: "Volume", unit: "m3", example: '"0.34 L"' };
export const HEAT: Expected = { name: "Heat", unit: "J", example: '"12 kJ"' };

/** How a refused cell is quoted: numbers as they are, text in quotation marks. */
export function quoted(cell: Cell | undefined): string {
  if (cell === undefined || cell === null) return "blank";
  return typeof cell === "string" ? `"${cell}"` : String(cell).toUpperCase();
}

/** A quantity in SI base units: a plain number is taken in the plain unit, a text must carry a unit of the same dimension. */
export function readQuantity(cell: Cell | undefined, expected: Expected): number {
  if (typeof cell === "number") return checkedNumber(cell, expected);
  if (cell === undefined || cell === null)
    return refuse(`${expected.name} is missing: give a number in ${expected.unit}, or a text such as ${expected.example}`);
  if (typeof cell !== "string")
    return refuse(`${expected.name} is ${quoted(cell)}: give a number in ${expected.unit}, or a text such as ${expected.example}`);
  if (isBareNumber(cell)) {
    return refuse(
      `${expected.name} is the text "${cell}", not a number: give a number in ${expected.unit}, or a text with a unit such as ${expected.example}`,
    );
  }
  if (!beginsWithNumber(cell)) refuse(`"${cell.trim()}" does not begin with a number; write a quantity as ${expected.example}`);
  const { value, unit } = parseQuantity(cell);
  requireDimension(unit, dimensionOf(expected.unit), `${expected.name} "${cell}"`);
  return checkedNumber(toBase(value, unit), expected);
}

function checkedNumber(value: number, { name, unit }: Expected): number {
  return Number.isFinite(value) ? value : refuse(`${name} is not a finite number in ${unit}`);
}

function isBareNumber(text: string): boolean {
  return text.trim() !== "" && Number.isFinite(Number(text.replace(",", ".")));
}

/** A temperature in K, above absolute zero. */
export function readTemperature(cell: Cell | undefined, expected: Expected = TEMPERATURE): number {
  const value = readQuantity(cell, expected);
  if (value > 0) return value;
  throw new Refusal("range", `${expected.name} ${Number(value.toPrecision(10))} K is not above absolute zero, 0 K`);
}

/** A pressure in Pa, above vacuum. */
export function readPressure(cell: Cell | undefined, expected: Expected = PRESSURE): number {
  const value = readQuantity(cell, expected);
  if (value > 0) return value;
  throw new Refusal(
    "range",
    `${expected.name} ${Number(value.toPrecision(10))} Pa is not above 0 Pa; pressures are absolute (see UNITS.ABSOLUTE for gauge readings)`,
  );
}

/** A volume in m³, above 0. */
export function readVolume(cell: Cell | undefined, expected: Expected = VOLUME): number {
  const value = readQuantity(cell, expected);
  if (value > 0) return value;
  throw new Refusal("range", `${expected.name} ${Number(value.toPrecision(10))} m3 is not above 0 m3`);
}

/** An optional text argument: undefined if left out (0 counts as left out, because older Excel sends 0 for a blank cell). */
export function readText(cell: Cell | undefined, name: string): string | undefined {
  if (cell === undefined || cell === null || cell === 0) return undefined;
  if (typeof cell === "string") return cell.trim() === "" ? undefined : cell.trim();
  return refuse(`The ${name} is ${quoted(cell)}; a text is expected`);
}

/** A plain number without unit. */
export function readNumber(cell: Cell | undefined, name: string): number {
  if (typeof cell === "number" && Number.isFinite(cell)) return cell;
  if (cell === undefined || cell === null) return refuse(`${name} is missing: give a number`);
  return refuse(`${name} is ${typeof cell === "string" ? `the text "${cell}"` : quoted(cell)}; a number is expected`);
}

/** A fraction: a number, or a text in percent such as "79 %". */
export function readFraction(cell: Cell | undefined, name: string): number {
  if (typeof cell === "string" && /%\s*$/.test(cell)) {
    const percent = Number(cell.replace(/%\s*$/, "").trim());
    return Number.isFinite(percent)
      ? percent / 100
      : refuse(`${name} is the text "${cell}"; a number or a percentage such as "79 %" is expected`);
  }
  return readNumber(cell, name);
}
