import { capacityOf } from "../../src/core/capacity";
import type { Capacity } from "../../src/core/capacity/capacity";
import { allSets, recordOf, type SetRecord } from "../../src/data/library";

/** One record of the library with its capacity, under a name for the title of a test. */
export interface Case {
  readonly name: string;
  readonly record: SetRecord;
  readonly capacity: Capacity;
}

/** Every record of every set. */
export const everyRecord: readonly Case[] = allSets().flatMap((set) =>
  set.species.map((species) => {
    const record = recordOf(species, set.id);
    return { name: `${species} of ${set.id}`, record, capacity: capacityOf(record) };
  }),
);

/** [name, case] pairs for test.each. */
export function titled(cases: readonly Case[]): (readonly [string, Case])[] {
  return cases.map((one) => [one.name, one] as const);
}
