/**
 * From the printed layout of `sets/*.json` to the fits the core evaluates. Nothing is converted but the calorie of a unit:
 * coefficients stay as printed, and the core multiplies by `unitFactor` where it evaluates.
 */
import type { Form, Interval, MolecularConstants, Phase, SpeciesFit } from "../core/species/types";
import type { Grade } from "./sources";
import { speciesOfKey } from "./species";

/** A record of the library: the fit, its printed reference, and how far to trust it. */
export interface SetRecord extends SpeciesFit {
  /** The reference the source prints for this species. */
  readonly reference: string;
  readonly grade: Grade;
  /** Notes for the user; shown wherever the citation is shown. */
  readonly flags: readonly string[];
  /** Key in sources.json. */
  readonly source: string;
  /** Where the formation value comes from: printed in the source, evaluated from the fit, or zero by definition. */
  readonly formationFrom: "listed" | "fit" | "definition" | null;
}

/** One species as sets/*.json print it: an interval is [from, to, coefficients…]. */
export interface PrintedRecord {
  readonly phase: string;
  readonly unit?: string;
  readonly reference: string;
  readonly formation?: number | null;
  readonly formationFrom?: "fit" | "definition";
  /** True where H is only relative to 298.15 K. */
  readonly relative?: boolean;
  readonly standardPressure?: number;
  readonly exponents?: readonly number[];
  readonly celsius?: boolean;
  readonly grade: string;
  readonly flags?: readonly string[];
  readonly source?: string;
  readonly intervals?: readonly (readonly (number | null)[])[];
  readonly range?: readonly [number, number];
  readonly molecular?: MolecularConstants;
  /** Measured difference of Cp: the set compared with, then percent at the temperatures of DEVIATION_AT inside both ranges (null outside). */
  readonly deviation?: readonly [set: string, ...percent: (number | null)[]];
}

/** Temperatures of the measured differences, K. */
export const DEVIATION_AT = [300, 500, 1000, 1500] as const;

/** A whole set as its file prints it. */
export interface PrintedSet {
  readonly id: string;
  readonly title: string;
  readonly source: string;
  readonly form: string;
  readonly unit: string;
  readonly gasConstant: number;
  readonly standardPressure: number;
  /** What holds for the whole set: standard pressure, ranges. */
  readonly note?: string;
  readonly species: Readonly<Record<string, PrintedRecord>>;
}

/** What one printed unit is in J/(mol K); the dimensionless Cp/R is 1, because the form multiplies by its own R. */
const UNIT_FACTORS: Readonly<Record<string, number>> = { "J/(mol K)": 1, "cal_th/(mol K)": 4.184, "Cp/R, dimensionless": 1, "1/cm": 1 };

function intervalOf(row: readonly (number | null)[]): Interval {
  return { from: row[0]!, to: row[1]!, coefficients: row.slice(2) };
}

/** The measured difference in words: "Cp differs from nasa-2002 by -0.03 % at 300 K, …". */
function deviationFlag([set, ...percent]: NonNullable<PrintedRecord["deviation"]>): string {
  const list = percent.flatMap((value, i) => (value === null ? [] : [`${value} % at ${DEVIATION_AT[i]} K`]));
  return `Cp differs from ${set} by ${list.join(", ")}`;
}

function flagsOf(printed: PrintedRecord): readonly string[] {
  return [...(printed.flags ?? []), ...(printed.deviation === undefined ? [] : [deviationFlag(printed.deviation)])];
}

/** The record of one species in a set. */
export function recordFrom(set: PrintedSet, key: string, printed: PrintedRecord): SetRecord {
  const entry = speciesOfKey(key)!;
  return {
    species: key,
    formula: entry.formula,
    phase: printed.phase as Phase,
    set: set.id,
    form: set.form as Form,
    quantity: "Cp",
    unitFactor: UNIT_FACTORS[printed.unit ?? set.unit]!,
    celsius: printed.celsius,
    exponents: printed.exponents,
    gasConstant: set.gasConstant,
    standardPressure: printed.standardPressure ?? set.standardPressure,
    intervals: (printed.intervals ?? []).map(intervalOf),
    molecular: printed.molecular,
    range: printed.range,
    molarMass: entry.molarMass,
    formationEnthalpy: printed.formation ?? null,
    entropy298: null,
    onFormationScale: !(printed.relative ?? (set.form === "power" || set.form === "molecular")),
    reference: printed.reference,
    grade: printed.grade as Grade,
    flags: flagsOf(printed),
    source: printed.source ?? set.source,
    formationFrom: printed.formation == null ? null : (printed.formationFrom ?? "listed"),
  };
}
