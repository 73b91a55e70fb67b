import { capacityOf, type Capacity } from "../../src/core/capacity";
import { type Segment, segmentsOf } from "../../src/core/capacity/segments";
import { PiecewiseCapacity } from "../../src/core/capacity/piecewise";
import { allSets, recordOf, type SetRecord } from "../../src/data/library";

export interface LawCase {
  readonly name: string;
  readonly record: SetRecord;
  readonly capacity: Capacity;
}

/** Every species of every set of the library. */
export const everyCase: readonly (readonly [string, LawCase])[] = allSets().flatMap((set) =>
  set.species.map((species) => {
    const record = recordOf(species, set.id);
    return [`${species} of ${set.id}`, { name: `${species} of ${set.id}`, record, capacity: capacityOf(record) }] as const;
  }),
);

/** Temperatures of a capacity: its limits, both sides of its joints, 298.15 K, and points spread by ratio, none nearer to a joint than 1e-3 of it. */
export function temperaturesOf({ from, to, joints }: Capacity): number[] {
  const spread = Array.from({ length: 25 }, (_, k) => from * (to / from) ** ((k + 0.5) / 25));
  const beside = joints.flatMap((joint) => [joint * 0.998, joint * 1.002]);
  const all = [from * 1.001, to * 0.999, 298.15, ...spread, ...beside];
  return all.filter((t) => t >= from && t <= to && joints.every((joint) => Math.abs(t / joint - 1) > 1e-3));
}

/**
 * Size of the numbers whose rounding counts in H and U at a temperature, J/mol: for a polynomial the terms of its integral, which may be
 * a thousand times their sum, otherwise the values themselves.
 */
export function sizeOfTerms(capacity: Capacity, temperature: number): number {
  if (!(capacity instanceof PiecewiseCapacity)) return Math.abs(capacity.enthalpy(temperature)) + 300 * temperature;
  const interval = capacity.intervals.find(({ to }) => temperature <= to)!;
  const terms = interval.cp.map((c, k) => Math.abs(c * temperature ** (k - 1) * (k === 1 ? Math.log(temperature) : 1)));
  return terms.reduce((sum, term) => sum + term, Math.abs(interval.enthalpyConstant));
}

/** The intervals of a capacity over which nothing steps. */
export function intervalsOf(capacity: Capacity): readonly Segment[] {
  return segmentsOf(capacity);
}
