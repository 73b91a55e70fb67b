/** The trailing unit argument: chooses the unit of the result, molar or by mass. */
import { refuse } from "../core/refusal";
import { dimensionOf, fromBase, parseUnit } from "../core/units";
import { BoundedCache } from "./cache";
import { isSetId } from "./set";

/** A molar quantity and the same by mass, by their SI units. */
export interface Kind {
  readonly molar: string;
  readonly byMass: string;
  readonly words: string;
}

export const HEAT_CAPACITY: Kind = { molar: "J/(mol K)", byMass: "J/(kg K)", words: 'a heat capacity such as "J/(mol K)" or "kJ/(kg K)"' };
export const ENERGY: Kind = { molar: "J/mol", byMass: "J/kg", words: 'an energy by amount or mass such as "kJ/mol" or "kJ/kg"' };

interface Reading {
  readonly scale: number;
  readonly byMass: boolean;
}

const readings = new BoundedCache<Reading>(500);

/** Refuses a set id in the unit's place. */
function requireUnitText(text: string): void {
  if (isSetId(text)) refuse(`"${text}" is a set id; the unit comes first, the set after it`);
}

function readingOf(text: string, kind: Kind): Reading {
  return readings.at(`${kind.molar}|${text}`, () => {
    requireUnitText(text);
    const unit = parseUnit(text);
    if (unit.dimension === dimensionOf(kind.molar)) return { scale: unit.scale, byMass: false };
    if (unit.dimension === dimensionOf(kind.byMass)) return { scale: unit.scale, byMass: true };
    return refuse(`The unit "${text}" does not fit this result; give ${kind.words}`);
  });
}

/** What a molar SI value is divided by to reach the unit; 1 if the unit is left out. */
export function molarDivisor(text: string | undefined, kind: Kind, molarMass: number): number {
  if (text === undefined) return 1;
  const { scale, byMass } = readingOf(text, kind);
  return byMass ? molarMass * scale : scale;
}

/** What an SI value by mass is divided by to reach the unit, by mass or molar; 1 if the unit is left out. Molar mass in kg/mol. */
export function massDivisor(text: string | undefined, kind: Kind, molarMass: number): number {
  if (text === undefined) return 1;
  const { scale, byMass } = readingOf(text, kind);
  return byMass ? scale : scale / molarMass;
}

/** An SI value in the unit of the text, which must have the dimension of the SI unit; unchanged if the unit is left out. */
export function inUnit(value: number, text: string | undefined, si: string, words: string): number {
  if (text === undefined) return value;
  requireUnitText(text);
  const unit = parseUnit(text);
  if (unit.dimension !== dimensionOf(si)) return refuse(`The unit "${text}" does not fit this result; give ${words}`);
  return fromBase(value, unit);
}
