/**
 * One property of a substance over a column of temperatures: the path that CV.AT and its relatives share.
 * A single substance, unit and set are understood once; then the column is a bare loop over numbers.
 * Whatever is not a plain number inside the range takes the careful path, cell by cell, with the same arithmetic.
 */
import type { Capacity } from "../core/capacity/capacity";
import { explainTemperature } from "../core/capacity/range";
import { CELSIUS_ZERO } from "../core/constants";
import { Refusal } from "../core/refusal";
import { readTemperature, readText, TEMPERATURE } from "./arguments";
import { commonShape, isSingle, spread } from "./broadcast";
import { Block, Cell, cells } from "./cell";
import { Kind, molarDivisor } from "./result-unit";
import { blockChoice, setOf, SetChoice } from "./set";
import { Substance, substanceArgument, SubstanceArgument, substanceOf } from "./substance";

/** What to compute, in SI, molar. `check` refuses substances that do not have the property. */
export interface Property {
  readonly at: (capacity: Capacity, temperature: number) => number;
  readonly kind: Kind;
  readonly check?: (substance: Substance) => void;
}

type Evaluate = (temperature: number) => number;

/** The value at one temperature in SI, or the refusal that names the range. */
export function valueAt(capacity: Capacity, temperature: number, at: Property["at"]): number {
  const value = at(capacity, temperature);
  if (Number.isFinite(value)) return value;
  throw outside(capacity, temperature);
}

/** From here on, K, a number is a day's temperature in kelvin, often one that was written in °C: no reminder of the unit. */
const ORDINARY_FROM = CELSIUS_ZERO - 50;

/** The refusal of a temperature outside the range; it reminds of the unit if the number would fit in °C. */
export function outside(capacity: Capacity, temperature: number): Refusal {
  const refusal = explainTemperature(capacity, temperature);
  const celsius = temperature + CELSIUS_ZERO;
  if (temperature >= ORDINARY_FROM || !(celsius >= capacity.from && celsius <= capacity.to)) return refusal;
  return new Refusal(refusal.kind, `${refusal.message}; for degrees Celsius write "${Number(temperature.toPrecision(6))} °C"`);
}

/** The worksheet function of a property: broadcasts substance, temperature, unit and set. */
export function property(what: Property, substance: Block, temperature: Block, unit?: Block, set?: Block): Block {
  const quick = quickEvaluate(what, substance, unit, set);
  if (quick) {
    const single = isSingle(temperature) ? quickTemperature(temperature?.[0]?.[0]) : undefined;
    if (single !== undefined) {
      const value = quick(single);
      if (Number.isFinite(value)) return [[value]];
    }
  }
  return cells(() => {
    const argument = substanceArgument(substance);
    const choice = blockChoice(set);
    const careful = (cellsOf: (Cell | undefined)[]) => carefulCell(what, argument, choice, cellsOf);
    const named = [
      ["substance", argument.texts],
      ["temperature", temperature],
      ["unit", unit],
      ["set", choice ? undefined : set],
    ] as const;
    const evaluate = isOneState(argument.texts, unit, choice ? undefined : set)
      ? preparedOnce(what, argument, choice, unit, set)
      : undefined;
    if (!evaluate || isSingle(temperature)) return spread(named, careful);
    commonShape(named);
    return column(evaluate, temperature, careful, [argument.texts?.[0]?.[0], unit?.[0]?.[0], choice ? undefined : set?.[0]?.[0]]);
  });
}

/** A cell that is plainly a temperature, as number or text, in K; undefined for all others, which the careful path words. */
function quickTemperature(cell: unknown): number | undefined {
  if (typeof cell === "number") return cell > 0 ? cell : undefined;
  if (typeof cell !== "string") return undefined;
  try {
    return readTemperature(cell, TEMPERATURE);
  } catch {
    return undefined;
  }
}

function isOneState(...blocks: (Block | undefined)[]): boolean {
  return blocks.every(isSingle);
}

/** The evaluation for a column, or undefined if it has to be refused cell by cell. */
function preparedOnce(
  what: Property,
  argument: SubstanceArgument,
  choice: SetChoice | undefined,
  unit?: Block,
  set?: Block,
): Evaluate | undefined {
  try {
    const found = substanceOf(argument, argument.texts?.[0]?.[0], choice ?? setOf(set?.[0]?.[0]));
    return evaluation(what, found, readText(unit?.[0]?.[0], "unit"));
  } catch {
    return undefined;
  }
}

function evaluation(what: Property, substance: Substance, unit: string | undefined): Evaluate {
  what.check?.(substance);
  const { capacity } = substance;
  const divisor = molarDivisor(unit, what.kind, substance.molarMass);
  const { at } = what;
  return divisor === 1 ? (temperature) => at(capacity, temperature) : (temperature) => at(capacity, temperature) / divisor;
}

function column(
  evaluate: Evaluate,
  temperature: Block,
  careful: (cells: (Cell | undefined)[]) => Cell,
  [substance, unit, set]: Cell[],
): Block {
  const block: Block = new Array(temperature.length);
  for (let row = 0; row < temperature.length; row++) {
    const source = temperature[row]!;
    const target: Cell[] = new Array(source.length);
    for (let index = 0; index < source.length; index++) {
      const cell: unknown = source[index];
      const value = evaluate(quickTemperature(cell) ?? NaN);
      target[index] =
        value - value === 0
          ? value
          : spread(
              [
                ["", [[substance]]],
                ["", [[cell]]],
                ["", [[unit]]],
                ["", [[set]]],
              ],
              careful,
            )[0]![0];
    }
    block[row] = target;
  }
  return block;
}

function carefulCell(
  what: Property,
  argument: SubstanceArgument,
  choice: SetChoice | undefined,
  [text, temperature, unit, set]: (Cell | undefined)[],
): Cell {
  const substance = substanceOf(argument, text, choice ?? setOf(set));
  what.check?.(substance);
  const divisor = molarDivisor(readText(unit, "unit"), what.kind, substance.molarMass);
  const value = valueAt(substance.capacity, readTemperature(temperature, TEMPERATURE), what.at);
  return divisor === 1 ? value : value / divisor;
}

interface Remembered {
  unit: unknown;
  set: unknown;
  evaluate: Evaluate;
}

/** The evaluations met last, by substance text, for each property: a column of single-cell formulas names the same few again and again. */
const remembered = new WeakMap<Property, Map<string, Remembered>>();

function quickEvaluate(what: Property, substance: Block, unit?: Block, set?: Block): Evaluate | undefined {
  const text: unknown = substance?.length === 1 && substance[0]!.length === 1 ? substance[0]![0] : undefined;
  if (typeof text !== "string" || (unit && !isSingle(unit)) || (set && !isSingle(set))) return undefined;
  const [unitText, setText]: unknown[] = [unit?.[0]?.[0], set?.[0]?.[0]];
  let byText = remembered.get(what);
  if (!byText) remembered.set(what, (byText = new Map()));
  const held = byText.get(text);
  if (held && held.unit === unitText && held.set === setText) return held.evaluate;
  const evaluate = preparedOnce(what, { texts: substance }, undefined, unit, set);
  if (evaluate && byText.size >= 500) byText.clear();
  if (evaluate) byText.set(text, { unit: unitText, set: setText, evaluate });
  return evaluate;
}
