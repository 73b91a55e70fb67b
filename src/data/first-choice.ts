/**
 * Which record of a species is used when the user names no set. Fixed, so that a cell's value never depends on anything else:
 *   1  nasa-2002, the evaluated set in the public domain
 *   2  the better grade (A, B, C)
 *   3  a fit that covers 298.15 K, so that formation values and heats from 25 °C are inside its range
 *   4  the wider range of temperature
 *   5  the set published later, then the id by alphabet
 * `first-choice.json` lists the exceptions with their reasons. Molecular constants (no formation values) and textbook polynomials
 * come last whatever their grade.
 */
import { REFERENCE_TEMPERATURE } from "../core/constants";
import exceptions from "./first-choice.json";
import type { SetRecord } from "./records";
import { sourceOf } from "./sources";

/** The exception for a species: its first choice and why, or undefined. */
export function exceptionFor(speciesKey: string): { readonly set: string; readonly reason: string } | undefined {
  return (exceptions as Readonly<Record<string, { set: string; reason: string }>>)[speciesKey];
}

function rangeOf(record: SetRecord): readonly [number, number] {
  return record.range ?? [record.intervals[0]!.from, record.intervals[record.intervals.length - 1]!.to];
}

function standing(record: SetRecord): readonly number[] {
  const [from, to] = rangeOf(record);
  return [
    record.set === exceptionFor(record.species)?.set ? 0 : 1,
    record.form === "molecular" ? 2 : record.form === "power" ? 1 : 0,
    record.set === "nasa-2002" ? 0 : 1,
    "ABC".indexOf(record.grade),
    from <= REFERENCE_TEMPERATURE && to >= REFERENCE_TEMPERATURE ? 0 : 1,
    from - to,
    -(sourceOf(record.source).year ?? 0),
  ];
}

function compare(a: SetRecord, b: SetRecord): number {
  const [left, right] = [standing(a), standing(b)];
  for (let i = 0; i < left.length; i++) if (left[i] !== right[i]) return left[i]! - right[i]!;
  return a.set < b.set ? -1 : 1;
}

/** The records of one species, the first choice first. */
export function inOrderOfChoice(records: readonly SetRecord[]): readonly SetRecord[] {
  return [...records].sort(compare);
}
