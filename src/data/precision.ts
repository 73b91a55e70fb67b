/** Precision limits of methods, and the critical ranges of repeated results, as printed. Not part of library.ts. */
import { refuseAbsent } from "../core/refusal";
import { foldCase } from "./fold";
import table from "./precision.json";

/** Precision of one method, in the unit it prints. */
export interface PrecisionLimit {
  readonly id: string;
  readonly title: string;
  /** The value and basis the limit is meant for. */
  readonly what: string;
  readonly unit: string;
  /** r: two results of one laboratory differ by more in about 5 % of cases. */
  readonly repeatability: number;
  /** R: the same between laboratories. */
  readonly reproducibility?: number;
  readonly source: string;
  readonly fromMemory: boolean;
  readonly note?: string;
}

const limits: readonly PrecisionLimit[] = table.limits;

/** Every method. */
export function allPrecision(): readonly PrecisionLimit[] {
  return limits;
}

/** The limits of a method by its id; case and hyphens do not matter. Refuses (absent) what is not there, naming the ids. */
export function precisionOf(text: string): PrecisionLimit {
  const wanted = foldCase(text);
  const found = limits.find(({ id }) => foldCase(id) === wanted);
  return (
    found ?? refuseAbsent(`"${text.trim()}" is not a method of the precision table; it holds ${limits.map(({ id }) => id).join(", ")}`)
  );
}

/** How a result is rounded, by its unit. */
export const rounding = table.rounding;

/** Multiples of the repeatability limit that the range of two, three and four results may reach, with the factors they come from. */
export const criticalRange: {
  readonly factors: readonly number[];
  readonly multiples: readonly [number, number, number];
  readonly source: string;
} = {
  ...table.criticalRange,
  multiples: table.criticalRange.multiples as [number, number, number],
};
