/**
 * Quantities of the fuel laboratory, in the units a laboratory writes: a plain number is in that unit, a text carries its own.
 * A plain number that only makes sense in another unit is refused with the text that would say it.
 */
import { printed, Refusal, refuse } from "../core/refusal";
import { dimensionOf, fromBase, intervalFromBase, intervalToBase, parseQuantity, parseUnit, requireDimension, toBase } from "../core/units";
import { quoted } from "./arguments";
import type { Cell } from "./cell";

/** A laboratory quantity: its name in sentences, the unit of plain numbers, an example text, and what is impossible or implausible. */
export interface Measured {
  readonly name: string;
  readonly unit: string;
  readonly example: string;
  /** A difference: °C and °F count as intervals. */
  readonly interval?: boolean;
  /** "positive": above zero; "zero": zero or above; left out: any sign. */
  readonly least?: "positive" | "zero";
  /** Plain numbers above this are refused: they were written in another unit. */
  readonly plainAbove?: number;
  /** Plain numbers below this are refused, zero apart where zero is allowed. */
  readonly plainBelow?: number;
  /** What to say instead, after "say": `"30 atm"`. */
  readonly say?: string;
}

export const OXYGEN_PRESSURE: Measured = {
  name: "Oxygen pressure",
  unit: "MPa",
  example: '"30 atm"',
  least: "positive",
  plainAbove: 6,
  say: '"30 atm" or "30 bar"',
};
export const VESSEL_VOLUME: Measured = {
  name: "Vessel volume",
  unit: "mL",
  example: '"0.34 L"',
  least: "positive",
  plainBelow: 5,
  say: '"0.34 L"',
};
export const SAMPLE_MASS: Measured = {
  name: "Sample mass",
  unit: "g",
  example: '"1.0012 g"',
  least: "positive",
  plainAbove: 50,
  say: '"1001.2 mg"',
};
export const WATER_MASS: Measured = {
  name: "Mass of water in the vessel",
  unit: "g",
  example: '"1 g"',
  least: "zero",
  plainAbove: 50,
  say: '"1000 mg"',
};
export const TEMPERATURE_CELSIUS: Measured = { name: "Temperature", unit: "°C", example: '"298.15 K"' };
export const RISE: Measured = {
  name: "Corrected rise",
  unit: "K",
  example: '"4.5 °F"',
  interval: true,
  least: "positive",
  plainAbove: 15,
  say: "the rise, not the final temperature",
};
export const EQUIVALENT: Measured = {
  name: "Energy equivalent",
  unit: "J/K",
  example: '"10.2 kJ/K"',
  least: "positive",
  plainBelow: 50,
  say: '"10.2 kJ/K"',
};
export const SPECIFIC_ENERGY: Measured = {
  name: "Specific energy",
  unit: "J/g",
  example: '"26.434 MJ/kg"',
  least: "positive",
  plainBelow: 100,
  say: '"26.434 MJ/kg"',
};
export const MOLAR_HEAT: Measured = {
  name: "Molar heat",
  unit: "J/mol",
  example: '"59.7 kJ/mol"',
  least: "positive",
  plainBelow: 1000,
  say: '"59.7 kJ/mol"',
};
export const HEAT_RELEASED: Measured = { name: "Heat", unit: "J", example: '"0.2 kJ"', least: "zero" };
export const DENSITY: Measured = {
  name: "Density",
  unit: "g/cm3",
  example: '"1320 kg/m3"',
  least: "positive",
  plainAbove: 25,
  say: '"1320 kg/m3"',
};
export const TITRANT: Measured = { name: "Volume of titrant", unit: "mL", example: '"9.0 mL"', least: "zero" };
export const CONCENTRATION: Measured = {
  name: "Concentration",
  unit: "mol/L",
  example: '"0.1 mol/L"',
  least: "positive",
  plainAbove: 20,
  say: '"100 mmol/L"',
};

/** The quantity of a cell in its laboratory unit. Refuses what is missing, not a quantity of its kind, impossible or implausible. */
export function readMeasured(cell: Cell | undefined, measured: Measured): number {
  const value = typeof cell === "number" ? plainNumber(cell, measured) : fromText(cell, measured);
  return possible(value, measured);
}

/** As `readMeasured`; the other value if the cell was left out. */
export function readMeasuredOr<Other>(cell: Cell | undefined, measured: Measured, other: Other): number | Other {
  return cell === undefined || cell === null ? other : readMeasured(cell, measured);
}

function plainNumber(value: number, { name, unit, plainAbove = Infinity, plainBelow = -Infinity, say }: Measured): number {
  if (value > plainAbove) throw new Refusal("range", `${name} ${printed(value)} ${unit} is above ${plainAbove} ${unit}: say ${say}`);
  if (value > 0 && value < plainBelow)
    throw new Refusal("range", `${name} ${printed(value)} ${unit} is below ${plainBelow} ${unit}: say ${say}`);
  return value;
}

function fromText(cell: Cell | undefined, { name, unit, example, interval }: Measured): number {
  const cure = `give a number in ${unit}, or a text such as ${example}`;
  if (cell === undefined || cell === null) return refuse(`${name} is missing: ${cure}`);
  if (typeof cell !== "string") return refuse(`${name} is ${quoted(cell)}: ${cure}`);
  if (cell.trim() !== "" && Number.isFinite(Number(cell.replace(",", "."))))
    return refuse(`${name} is the text "${cell}", not a number: ${cure}`);
  const { value, unit: typed } = parseQuantity(cell);
  requireDimension(typed, dimensionOf(unit), `${name} "${cell}"`);
  const plain = parseUnit(unit);
  if (typed.scale === plain.scale && typed.offset === plain.offset) return value;
  return interval ? intervalFromBase(intervalToBase(value, typed), plain) : fromBase(toBase(value, typed), plain);
}

function possible(value: number, { name, unit, least }: Measured): number {
  if (!Number.isFinite(value)) return refuse(`${name} is not a finite number in ${unit}`);
  if (least === "positive" && !(value > 0)) throw new Refusal("range", `${name} ${printed(value)} ${unit} is not above 0 ${unit}`);
  if (least === "zero" && value < 0) throw new Refusal("range", `${name} ${printed(value)} ${unit} is negative`);
  return value;
}

/** A percentage from 0 to 100: the number of per cent, or a text such as "8 %". `name` begins a sentence. */
export function readPercent(cell: Cell | undefined, name: string): number {
  const value = typeof cell === "string" ? percentOfText(cell, name) : cell;
  if (value === undefined || value === null) return refuse(`${name} is missing: give per cent, such as 8 or "8 %"`);
  if (typeof value !== "number") return refuse(`${name} is ${quoted(value)}: give per cent, such as 8 or "8 %"`);
  if (!(value >= 0 && value <= 100)) throw new Refusal("range", `${name} ${printed(value)} % is not between 0 % and 100 %`);
  return value;
}

function percentOfText(text: string, name: string): number {
  const number = /^\s*([+-]?(?:\d+\.?\d*|\.\d+)(?:e[+-]?\d+)?)\s*%\s*$/i.exec(text)?.[1];
  return number === undefined ? refuse(`${name} is the text "${text}": give per cent, such as 8 or "8 %"`) : Number(number);
}

const BEYOND = "beyond limits";

/** The last argument of functions with stated limits: true for the words "beyond limits". */
export function readBeyond(cell: Cell | undefined): boolean {
  if (cell === undefined || cell === null || cell === 0 || cell === false) return false;
  if (typeof cell === "string" && cell.trim().toLowerCase() === BEYOND) return true;
  return refuse(`The last argument is ${quoted(cell)}; the only words it takes are "${BEYOND}"`);
}
