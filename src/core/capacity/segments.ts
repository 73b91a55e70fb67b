import { newtonInBracket } from "../numeric/root";
import { printed, refuse } from "../refusal";
import type { Capacity } from "./capacity";

/**
 * A Newton step shorter than this, K, ends a search. The step is still taken; the error left is its square times Cv'/2Cv, which is below
 * 0.1 per kelvin for every substance: below 1e-11 K.
 */
const LAST_STEP = 1e-5;

/** Newton halves the bracket at worst; 100 evaluations are more than the digits of a double need. */
const ITERATIONS = 100;

/** The energy over one interval between joints, where it rises without a step. */
export interface Segment {
  /** Lower limit, K; from the second segment on the joint itself belongs to the segment before. */
  readonly from: number;
  /** Upper limit, K. */
  readonly to: number;
  /** Energy just above `from`, J/mol. */
  readonly low: number;
  /** Energy at `to`, J/mol. */
  readonly high: number;
}

/** Splits a capacity at its joints. Refuses one whose energy does not rise over an interval: its inverse is not a function. */
export function segmentsOf(capacity: Capacity): Segment[] {
  const limits = [capacity.from, ...capacity.joints, capacity.to];
  return limits.slice(1).map((to, k) => {
    const from = limits[k]!;
    const low = capacity.energy(k === 0 ? from : justAbove(from));
    const high = capacity.energy(to);
    if (!(high > low))
      refuse(`The energy of ${capacity.toLabel} does not rise from ${from} K to ${to} K, so no temperature belongs to an energy`);
    return { from, to, low, high };
  });
}

export function reaches(segment: Segment, energy: number): boolean {
  return energy >= segment.low && energy <= segment.high;
}

/**
 * Temperature in a segment that reaches this energy, J/mol, by Newton's method in the bracket of the segment. It begins at `start`, K, or
 * where a straight line between the ends of the segment has the energy.
 */
export function solveInSegment(capacity: Capacity, segment: Segment, energy: number, start?: number): number {
  const { from, to, low, high } = segment;
  if (energy === low) return from;
  if (energy === high) return to;
  const f = (t: number) => ({ value: capacity.energy(t) - energy, slope: capacity.cv(t) });
  const what = `The temperature of ${printed(energy)} J/mol for ${capacity.toLabel}`;
  return newtonInBracket(f, from, to, start ?? from + ((energy - low) / (high - low)) * (to - from), {
    tolerance: LAST_STEP,
    iterations: ITERATIONS,
    what,
    unit: " K",
  });
}

/** The next double after a positive temperature, or the one after that. */
function justAbove(temperature: number): number {
  return temperature * (1 + Number.EPSILON);
}
