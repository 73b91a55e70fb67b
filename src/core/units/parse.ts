/** Unit text to Unit, remembered. */
import { CELSIUS_ZERO } from "../constants";
import { Refusal, refuse } from "../refusal";
import { gaugeSentence, gaugeStem, withoutAbsolute } from "./ambiguous";
import { BoundedMap } from "./bounded";
import { exactSize } from "./exact";
import { insideExpression } from "./grammar";
import { toRatio } from "./ratio";
import { plainSpelling } from "./spelling";
import type { Unit } from "./types";

/** Longer texts are not units; refusing them early keeps the memory small. */
const longestText = 100;

const remembered = new BoundedMap<Unit | Refusal>(2000);

/** The two scales whose zero is not at absolute zero, by their name inside mathjs: the reading at 273.15 K. Exact by definition. */
const icePoints: Readonly<Record<string, number>> = { degC: 0, degF: 32 };

/**
 * Reads a unit such as `"kJ/(kg K)"`, `"°C"`, `"J mol-1 K-1"`, `"%"` or `"1"`. Alone, °C and °F are points on their scale; in a compound
 * unit they are intervals. Throws a Refusal of kind "input" with the way out: misspelt, ambiguous (`cal`, `Btu`), gauge, `J/mol K`.
 */
export function parseUnit(text: string): Unit {
  const found = unitOrRefusal(text);
  if (found instanceof Refusal) throw found;
  return found;
}

/** Whether `parseUnit` would read the text; it costs no exception. */
export function isUnit(text: string): boolean {
  return !(unitOrRefusal(text) instanceof Refusal);
}

/** The absolute unit inside a gauge unit as typed: `"bar"` for `"barg"`, `"bar(g)"`, `"bar gauge"`; undefined for any other text. */
export function absoluteOfGauge(text: string): string | undefined {
  return text.length > longestText ? undefined : gaugeStem(plainSpelling(text));
}

/** Canonical dimension of a unit text, such as `kg m^2 s^-2` for `"kJ"`. Throws what `parseUnit` throws. */
export function dimensionOf(text: string): string {
  return parseUnit(text).dimension;
}

function unitOrRefusal(text: string): Unit | Refusal {
  return remembered.get(text) ?? read(text);
}

function read(text: string): Unit | Refusal {
  if (text.length > longestText) return new Refusal("input", `"${text.slice(0, 40)}…" is not a unit: it has ${text.length} characters`);
  let found: Unit | Refusal;
  try {
    found = Object.freeze(newUnit(text.trim()));
  } catch (refusal) {
    if (!(refusal instanceof Refusal)) throw refusal;
    found = refusal;
  }
  remembered.set(text, found);
  return found;
}

function newUnit(typed: string): Unit {
  const plain = withoutAbsolute(plainSpelling(typed));
  if (plain === "") refuse("The unit is empty; say 1 for a pure number");
  if (plain === "1" || plain === "-") return { text: typed, dimension: "1", scale: 1, numerator: 1, denominator: 1, zero: 0, offset: 0 };
  const stem = gaugeStem(plain);
  if (stem !== undefined) refuse(gaugeSentence(typed, stem));
  const expression = insideExpression(plain, typed);
  const { numerator, denominator, dimension } = exactSize(expression);
  const ratio = toRatio(numerator, denominator);
  if (!(ratio.scale > 0 && ratio.scale < Infinity)) refuse(`"${typed}" is a unit beyond the range of numbers`);
  const zero = icePoints[expression.replace(/[()* ]/g, "")];
  return { text: typed, dimension, ...ratio, zero: zero ?? 0, offset: zero === undefined ? 0 : CELSIUS_ZERO };
}
