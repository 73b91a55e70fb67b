/** Arguments of the fuel family: bases, elements, conditions, and the composition of a dry sample. */
import type { Basis, BasisFigures } from "../core/fuel/basis";
import { waterShares } from "../core/fuel/dry";
import { looksLikeFractions } from "../core/fuel/fractions";
import type { Condition } from "../core/fuel/net-constants";
import type { DrySample } from "../core/fuel/net-value";
import { printed, refuse, refuseRange } from "../core/refusal";
import { atomicWeights } from "../data/library";
import { readNumber, readText } from "./arguments";
import type { Cell } from "./cell";
import { DENSITY, type Measured, readMeasured, readPercent, SPECIFIC_ENERGY } from "./laboratory";

const GROSS_DRY: Measured = { ...SPECIFIC_ENERGY, name: "Gross value, dry" };
/** Density of a liquid fuel. */
export const LIQUID_DENSITY: Measured = {
  ...DENSITY,
  name: "Density of the liquid",
  example: '"845 kg/m3"',
  above: { limit: 2, units: ["kg/m3"] },
};
export const GROSS_LIQUID: Measured = { ...SPECIFIC_ENERGY, name: "Gross value", example: '"45.7 MJ/kg"' };
const BASIS_ENERGY: Measured = { name: "Value", unit: "J/g", example: '"28 MJ/kg"', least: "zero" };

const BASES: Readonly<Record<string, Basis>> = {
  ad: "ad",
  "as analysed": "ad",
  "as analyzed": "ad",
  "air dried": "ad",
  d: "d",
  dry: "d",
  ar: "ar",
  "as received": "ar",
  daf: "daf",
  "dry ash free": "daf",
};

/** Small letters, one space for hyphens, commas and spaces. */
function folded(text: string): string {
  return text
    .toLowerCase()
    .replace(/[\s,_-]+/g, " ")
    .trim();
}

/** A basis: ad, d, ar, daf, or its words. `name` is the argument's. */
export function readBasis(cell: Cell | undefined, name: string): Basis {
  const text = readText(cell, `basis ${name}`) ?? refuse(`The basis "${name}" is missing: give ad, d, ar or daf`);
  return (
    BASES[folded(text)] ??
    refuse(`The basis ${name} is "${text}"; the bases are ad (as analysed), d (dry), ar (as received) and daf (dry ash-free)`)
  );
}

/** A value to be put on another basis, and whether it is known to be per cent: a number as it is, "6.1 %", or a specific energy in J/g. */
export function readBasisValue(cell: Cell | undefined): { readonly value: number; readonly percent: boolean } {
  if (typeof cell === "string" && /%\s*$/.test(cell)) return { value: readPercent(cell, "Value"), percent: true };
  if (cell === undefined || cell === null) return refuse('Value is missing: give a number, or a text such as "28 MJ/kg" or "6.1 %"');
  return { value: typeof cell === "number" ? readNumber(cell, "Value") : readMeasured(cell, BASIS_ENERGY), percent: false };
}

/** Moistures and ash, each read only when the way between the bases asks for it. */
export function basisFigures([moistureAd, moistureAr, ash]: readonly (Cell | undefined)[]): BasisFigures {
  return {
    get moistureAsAnalysed() {
      return percentIfGiven(moistureAd, "Moisture as analysed");
    },
    get moistureAsReceived() {
      return percentIfGiven(moistureAr, "Moisture as received");
    },
    get ashDry() {
      return percentIfGiven(ash, "Ash of the dry sample");
    },
  };
}

function percentIfGiven(cell: Cell | undefined, name: string): number | undefined {
  return cell === undefined || cell === null ? undefined : readPercent(cell, name);
}

interface Element {
  readonly name: string;
  /** Its share in water. */
  readonly share: number;
}

const SHARES = waterShares(atomicWeights.get("H")!, atomicWeights.get("O")!);

const ELEMENTS: Readonly<Record<string, Element>> = {
  h: { name: "Hydrogen", share: SHARES.hydrogen },
  o: { name: "Oxygen", share: SHARES.oxygen },
  c: { name: "Carbon", share: 0 },
  n: { name: "Nitrogen", share: 0 },
  s: { name: "Sulfur", share: 0 },
  cl: { name: "Chlorine", share: 0 },
  f: { name: "Fluorine", share: 0 },
  ash: { name: "Ash", share: 0 },
};

/** What a content is of: a symbol, a name, or ash. */
export function readElement(cell: Cell | undefined): Element {
  const text =
    readText(cell, "element") ?? refuse('The element is missing: give "H", "O", or what else the value is of, such as "C" or "ash"');
  const wanted = text.toLowerCase();
  return (
    ELEMENTS[wanted] ??
    Object.values(ELEMENTS).find(({ name }) => name.toLowerCase() === wanted) ??
    refuse(`The element "${text}" is not one of H, O, C, N, S, Cl, F, ash`)
  );
}

const CONDITIONS: readonly Condition[] = ["constant-pressure", "constant-volume"];

/** The condition of a net value; constant pressure if left out. */
export function readCondition(cell: Cell | undefined): Condition {
  const text = readText(cell, "condition");
  if (text === undefined) return "constant-pressure";
  return (
    CONDITIONS.find((condition) => folded(condition) === folded(text)) ??
    refuse(`The condition "${text}" is not "constant-pressure" or "constant-volume"`)
  );
}

/** The dry sample of four cells: gross value, hydrogen, oxygen, nitrogen. At constant volume oxygen and nitrogen may be left out. */
export function readDrySample([gross, ...contents]: readonly (Cell | undefined)[], condition: Condition): DrySample {
  const [hydrogen, oxygen, nitrogen] = contents;
  const unused = condition === "constant-volume";
  const other = (cell: Cell | undefined, name: string) => (unused ? (percentIfGiven(cell, name) ?? 0) : readPercent(cell, name));
  return {
    gross: readMeasured(gross, GROSS_DRY),
    hydrogen: readPercent(hydrogen, "Hydrogen, dry"),
    oxygen: other(oxygen, "Oxygen, dry"),
    nitrogen: other(nitrogen, "Nitrogen, dry"),
  };
}

/** A content and its symbol, for the sentence about fractions. */
export type Content = readonly [symbol: string, percent: number];

/** Refuses plain numbers that look like fractions. Hydrogen written with its sign, "0.2 %", is taken at its word. */
export function requirePercentages(hydrogenCell: Cell | undefined, hydrogen: number, others: readonly Content[]): void {
  if (typeof hydrogenCell === "string") return;
  const percents = others.map(([, percent]) => percent);
  if (!looksLikeFractions(hydrogen, percents)) return;
  const list = [["H", hydrogen] as const, ...others].map(([symbol, percent]) => `${symbol} ${printed(percent)} %`).join(", ");
  refuseRange(`${list}: looks like fractions; percent expected (if it is per cent, write the hydrogen as "${printed(hydrogen)} %")`);
}

/** Hydrogen of a liquid fuel, per cent. Refuses a plain number below 1 as a fraction. */
export function readLiquidHydrogen(cell: Cell): number {
  const hydrogen = readPercent(cell, "Hydrogen");
  if (typeof cell === "number" && hydrogen > 0 && hydrogen < 1)
    refuseRange(`Hydrogen ${printed(hydrogen)} % looks like a fraction; percent expected, such as 13.3`);
  return hydrogen;
}
