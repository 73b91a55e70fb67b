/** What a series of runs is read from: a list of values of one kind, their rises, the limit and the reference. */
import type { Run } from "../core/calorimeter/series";
import { printed, Refusal, refuse } from "../core/refusal";
import { parseQuantity } from "../core/units";
import { quoted, readNumber } from "./arguments";
import type { Cell } from "./cell";
import { readMeasured, readPercent, RISE } from "./laboratory";

/** The kind of values in a list: plain numbers, or texts that all convert to one unit. */
export interface Kind {
  /** As typed in the first text; undefined for plain numbers. */
  readonly unit?: string;
}

/** The runs of a list; blank cells are skipped, and a run keeps its place in the list as its number. */
export function readRuns(values: readonly Cell[], rises: readonly Cell[] | undefined): { runs: Run[]; kind: Kind } {
  if (rises && rises.length !== values.length)
    refuse(`Equivalents: ${values.length}, rises: ${rises.length}; give as many of one as of the other`);
  const places = values.flatMap((cell, index) => (cell === null ? [] : [index]));
  if (places.length === 0) refuse("The equivalents are missing: all cells are blank");
  const kind = kindOf(values[places[0]!]!, `Run ${places[0]! + 1}`);
  const runs = places.map((index) => {
    const name = `Run ${index + 1}`;
    const rise = rises?.[index] ?? null;
    return {
      number: index + 1,
      value: readValue(values[index]!, kind, name),
      rise: rise === null ? undefined : readMeasured(rise, { ...RISE, name: `${name}: corrected rise` }),
    };
  });
  return { runs, kind };
}

function kindOf(cell: Cell, name: string): Kind {
  if (typeof cell === "number") return {};
  if (typeof cell !== "string") return refuse(`${name} is ${quoted(cell)}: give a number, or a text with a unit such as "10.2 kJ/K"`);
  if (Number.isFinite(Number(cell.replace(",", "."))))
    refuse(`${name} is the text "${cell}", not a number: give a number, or a text with a unit such as "10.2 kJ/K"`);
  const { unit } = parseQuantity(cell);
  if (unit.offset !== 0) refuse(`${name}, "${cell}", is a point on a temperature scale; it has no relative deviation`);
  return { unit: unit.text };
}

/** A positive value of the kind, in its unit. */
export function readValue(cell: Cell, { unit }: Kind, name: string): number {
  if (unit !== undefined && typeof cell === "number")
    refuse(`${name} is the plain number ${printed(cell)}, but the first run is a text in ${unit}: give all with a unit, or none`);
  if (unit !== undefined) return readMeasured(cell, { name, unit, example: `"1 ${unit}"`, least: "positive" });
  if (typeof cell === "string") refuse(`${name} is the text "${cell}", but the first run is a plain number: give all with a unit, or none`);
  const value = readNumber(cell, name);
  return value > 0 ? value : refusePositive(value, name);
}

function refusePositive(value: number, name: string): never {
  throw new Refusal("range", `${name}, ${printed(value)}, is not above 0`);
}

const HIGHEST_LIMIT = 5;
const LOWEST_PLAIN_LIMIT = 0.01;

/** A limit of the relative standard deviation in per cent: above 0 %, at most 5 %. A cell formatted as per cent holds a fraction. */
export function readLimit(cell: Cell): number {
  const name = "Limit of the relative standard deviation";
  const limit = readPercent(cell, name);
  if (!(limit > 0 && limit <= HIGHEST_LIMIT))
    throw new Refusal("range", `${name} ${printed(limit)} % is not above 0 % and at most ${HIGHEST_LIMIT} %`);
  if (typeof cell === "number" && limit < LOWEST_PLAIN_LIMIT)
    throw new Refusal("range", `${name} ${printed(limit)} % looks like a fraction; per cent is expected: say 0.2 or "0.2 %"`);
  return limit;
}
