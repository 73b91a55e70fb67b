/**
 * Quantities of the fuel laboratory, in the units a laboratory writes: a plain number is in that unit, a text carries its own.
 * A plain number that only makes sense in another unit is refused with the text that would say it.
 */
import { printed, Refusal, refuse } from "../core/refusal";
import {
  dimensionOf,
  fromBase,
  intervalFromBase,
  intervalToBase,
  parseQuantity,
  parseUnit,
  type Quantity,
  requireDimension,
  toBase,
} from "../core/units";
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
  /** Plain numbers above this limit are refused: they were written in one of these units, or are what the advice says. */
  readonly above?: PlainLimit;
  /** Plain numbers below this limit, or the first of several rising ones, are refused; zero apart where zero is allowed. */
  readonly below?: PlainLimit | readonly PlainLimit[];
}

/** A limit of plain numbers in the quantity's unit, with the way out: units in which the same number makes sense, or words after a colon. */
export interface PlainLimit {
  readonly limit: number;
  readonly units?: readonly string[];
  readonly advice?: string;
}

export const OXYGEN_PRESSURE: Measured = {
  name: "Oxygen pressure",
  unit: "MPa",
  example: '"30 atm"',
  least: "positive",
  above: { limit: 6, units: ["atm", "bar"] },
};
export const VESSEL_VOLUME: Measured = {
  name: "Vessel volume",
  unit: "mL",
  example: '"0.34 L"',
  least: "positive",
  below: { limit: 5, units: ["L"] },
};
export const SAMPLE_MASS: Measured = {
  name: "Sample mass",
  unit: "g",
  example: '"1.0012 g"',
  least: "positive",
  above: { limit: 50, units: ["mg"] },
};
export const WATER_MASS: Measured = {
  name: "Mass of water in the vessel",
  unit: "g",
  example: '"1 g"',
  least: "zero",
  above: { limit: 50, units: ["mg"] },
};
/** Temperature of a reaction in a calorimeter. */
export const REACTION_TEMPERATURE: Measured = {
  name: "Temperature",
  unit: "°C",
  example: '"298.15 K"',
  above: { limit: 100, units: ["K"] },
};
export const TEMPERATURE_CELSIUS: Measured = { name: "Temperature", unit: "°C", example: '"298.15 K"' };
export const RISE: Measured = {
  name: "Corrected rise",
  unit: "K",
  example: '"4.5 °F"',
  interval: true,
  least: "positive",
  above: { limit: 15, advice: "give the rise, not the final temperature" },
};
export const EQUIVALENT: Measured = {
  name: "Energy equivalent",
  unit: "J/K",
  example: '"10.2 kJ/K"',
  least: "positive",
  below: { limit: 50, units: ["kJ/K"] },
};
export const SPECIFIC_ENERGY: Measured = {
  name: "Specific energy",
  unit: "J/g",
  example: '"26.434 MJ/kg"',
  least: "positive",
  below: { limit: 100, units: ["MJ/kg"] },
  above: { limit: 150_000, units: ["J/kg"] },
};
export const MOLAR_HEAT: Measured = {
  name: "Molar heat",
  unit: "J/mol",
  example: '"59.7 kJ/mol"',
  least: "positive",
  below: { limit: 1000, units: ["kJ/mol"] },
  above: { limit: 1e6, units: ["J/kmol"] },
};
export const HEAT_RELEASED: Measured = { name: "Heat", unit: "J", example: '"0.2 kJ"', least: "zero" };
export const DENSITY: Measured = {
  name: "Density",
  unit: "g/cm3",
  example: '"1320 kg/m3"',
  least: "positive",
  above: { limit: 25, units: ["kg/m3"] },
};
export const AIR_DENSITY: Measured = {
  ...DENSITY,
  name: "Density of the air",
  example: '"1.2 kg/m3"',
  above: { limit: 0.1, units: ["kg/m3"] },
};
export const TITRANT: Measured = {
  name: "Volume of titrant",
  unit: "mL",
  example: '"9.0 mL"',
  least: "zero",
  above: { limit: 200, units: ["uL"] },
};
export const CONCENTRATION: Measured = {
  name: "Concentration",
  unit: "mol/L",
  example: '"0.1 mol/L"',
  least: "positive",
  above: { limit: 20, units: ["mmol/L"] },
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

function plainNumber(value: number, { name, unit, above, below }: Measured): number {
  if (above && value > above.limit)
    throw new Refusal("range", `${name} ${printed(value)} ${unit} is above ${above.limit} ${unit}: ${wayOut(value, above)}`);
  const under = value > 0 && [below ?? []].flat().find(({ limit }) => value < limit);
  if (under) throw new Refusal("range", `${name} ${printed(value)} ${unit} is below ${under.limit} ${unit}: ${wayOut(value, under)}`);
  return value;
}

function wayOut(value: number, { units = [], advice }: PlainLimit): string {
  return advice ?? `say ${units.map((unit) => `"${printed(value)} ${unit}"`).join(" or ")}`;
}

function fromText(cell: Cell | undefined, measured: Measured): number {
  const { name, unit, example, interval } = measured;
  const text = typeof cell === "string" ? cell.trim() : cell;
  if (text === undefined || text === null || text === "")
    return refuse(`${name} is missing: give a number in ${unit}, or a text such as ${example}`);
  if (typeof text !== "string") return refuse(`${name} is ${quoted(cell)}: give a number in ${unit}, or a text such as ${example}`);
  const { value, unit: typed } = quantityOf(text, measured);
  requireDimension(typed, dimensionOf(unit), `${name} "${text}"`);
  const plain = parseUnit(unit);
  if (typed.scale === plain.scale && typed.offset === plain.offset) return value;
  return interval ? intervalFromBase(intervalToBase(value, typed), plain) : fromBase(toBase(value, typed), plain);
}

const NUMBER = /^[+-]?(?:\d+\.?\d*|\.\d+)(?:e[+-]?\d+)?$/i;
const WITH_COMMA = /^([+-]?\d+),(\d+)$/;

/** A text as a quantity; the refusal of one that cannot be read names the argument. */
export function quantityOf(text: string, { name, unit, example }: Pick<Measured, "name" | "unit" | "example">): Quantity {
  const cure = `give a number in ${unit}, or a text such as ${example}`;
  const comma = WITH_COMMA.exec(text);
  if (comma) refuse(`${name} is the text "${text}" with a decimal comma: give the number ${comma[1]}.${comma[2]}`);
  if (NUMBER.test(text)) refuse(`${name} is the text "${text}", not a number: ${cure}`);
  if (!/^[+\-\u2212\u2013]?\s*[.\d]/.test(text)) refuse(`${name} is the text "${text}": ${cure}`);
  try {
    return parseQuantity(text);
  } catch (thrown) {
    throw thrown instanceof Refusal ? new Refusal(thrown.kind, `${name}: ${thrown.message}`) : thrown;
  }
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
  if (number !== undefined) return Number(number);
  const comma = /^\s*(\d+),(\d+)\s*%?\s*$/.exec(text);
  if (comma) refuse(`${name} is the text "${text}" with a decimal comma: say "${comma[1]}.${comma[2]} %"`);
  return refuse(`${name} is the text "${text}": give per cent, such as 8 or "8 %"`);
}

const BEYOND = "beyond limits";

/** The last argument of functions with stated limits: true for the words "beyond limits". */
export function readBeyond(cell: Cell | undefined): boolean {
  if (cell === undefined || cell === null || cell === 0 || cell === false) return false;
  if (typeof cell === "string" && cell.trim() === "") return false;
  if (typeof cell === "string" && cell.trim().toLowerCase() === BEYOND) return true;
  return refuse(`The last argument is ${quoted(cell)}; the only words it takes are "${BEYOND}"`);
}
