/**
 * Where the sets of one species differ by more than their stated accuracy. Two sets disagree if the difference exceeds the root of the
 * sum of the squares of what their grades promise; this is worth more to a user than a fifth digit.
 */
import { capacityOf } from "../core/capacity";
import type { Capacity } from "../core/capacity/capacity";
import { GAS_CONSTANT, REFERENCE_TEMPERATURE, STANDARD_PRESSURE } from "../core/constants";
import { ACCURACY, recordsOf, type SetRecord } from "../data/library";

/** Temperatures at which Cp is compared, K. */
const COMPARED_AT = [300, 400, 500, 700, 1000, 1500, 2000, 2500, 3000] as const;

/** One disagreement between two sets: for Cp the temperature where it is worst. */
export interface Disagreement {
  readonly temperature: number;
  readonly property: "Cp" | "H(298.15 K)" | "S(298.15 K)";
  /** The set the library prefers of the two. */
  readonly setA: string;
  readonly setB: string;
  /** B minus A: J/(mol K) for Cp and S, J/mol for H. */
  readonly difference: number;
  /** The same in percent of A; null where A is zero. */
  readonly percent: number | null;
  /** What the two grades allow, in the unit of `difference`. */
  readonly allowed: number;
}

interface Side {
  readonly record: SetRecord;
  readonly capacity: Capacity;
}

const known = new Map<string, readonly Disagreement[]>();

/** Every disagreement between the sets of a species, the library's first choice always as set A. Refuses (absent) an unknown key. */
export function disagreement(speciesKey: string): readonly Disagreement[] {
  const remembered = known.get(speciesKey);
  if (remembered !== undefined) return remembered;
  const sides = recordsOf(speciesKey).map((record) => ({ record, capacity: capacityOf(record) }));
  const found = sides
    .flatMap((a, i) => sides.slice(i + 1).flatMap((b) => [heatCapacity(a, b), enthalpy(a, b), entropy(a, b)]))
    .filter((one) => one !== undefined);
  known.set(speciesKey, found);
  return found;
}

function together(a: number, b: number): number {
  return Math.hypot(a, b);
}

function heatCapacity(a: Side, b: Side): Disagreement | undefined {
  const percentAllowed = together(ACCURACY[a.record.grade].cp, ACCURACY[b.record.grade].cp);
  let worst: Disagreement | undefined;
  for (const temperature of COMPARED_AT) {
    const one = a.capacity.cp(temperature);
    const difference = b.capacity.cp(temperature) - one;
    const percent = (100 * difference) / one;
    if (!(Math.abs(percent) > percentAllowed) || Math.abs(percent) <= Math.abs(worst?.percent ?? 0)) continue;
    worst = { temperature, property: "Cp", ...sets(a, b), difference, percent, allowed: (percentAllowed / 100) * one };
  }
  return worst;
}

function enthalpy(a: Side, b: Side): Disagreement | undefined {
  if (!a.capacity.onFormationScale || !b.capacity.onFormationScale) return undefined;
  const allowed = 1000 * together(ACCURACY[a.record.grade].enthalpy, ACCURACY[b.record.grade].enthalpy);
  return beyond("H(298.15 K)", a, b, enthalpyAtReference(a.capacity), enthalpyAtReference(b.capacity), allowed);
}

function entropy(a: Side, b: Side): Disagreement | undefined {
  if (!a.capacity.hasEntropy || !b.capacity.hasEntropy) return undefined;
  const allowed = together(ACCURACY[a.record.grade].entropy, ACCURACY[b.record.grade].entropy);
  return beyond("S(298.15 K)", a, b, entropyAtReference(a), entropyAtReference(b), allowed);
}

function beyond(
  property: Disagreement["property"],
  a: Side,
  b: Side,
  one: number,
  other: number,
  allowed: number,
): Disagreement | undefined {
  const difference = other - one;
  if (!(Math.abs(difference) > allowed)) return undefined;
  const percent = one === 0 ? null : (100 * difference) / Math.abs(one);
  return { temperature: REFERENCE_TEMPERATURE, property, ...sets(a, b), difference, percent, allowed };
}

function sets(a: Side, b: Side): { setA: string; setB: string } {
  return { setA: a.record.set, setB: b.record.set };
}

/** The end of the range next to 298.15 K: many tables begin at 300 K. */
function nearReference(capacity: Capacity): number {
  return Math.min(Math.max(REFERENCE_TEMPERATURE, capacity.from), capacity.to);
}

/** H at 298.15 K; from 2 K or less away Cp is held, else it is not known (NaN). */
function enthalpyAtReference(capacity: Capacity): number {
  const gap = REFERENCE_TEMPERATURE - nearReference(capacity);
  return Math.abs(gap) > 2 ? NaN : capacity.enthalpy(nearReference(capacity)) + gap * capacity.cp(nearReference(capacity));
}

/** S at 298.15 K and 1 bar, from 2 K or less away as for H. */
function entropyAtReference({ capacity, record }: Side): number {
  const near = nearReference(capacity);
  if (Math.abs(near - REFERENCE_TEMPERATURE) > 2) return NaN;
  const toOneBar = record.phase === "g" ? GAS_CONSTANT * Math.log(record.standardPressure / STANDARD_PRESSURE) : 0;
  return capacity.entropy(near) + capacity.cp(near) * Math.log(REFERENCE_TEMPERATURE / near) + toOneBar;
}
