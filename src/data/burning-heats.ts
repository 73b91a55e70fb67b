/** Heats of fuse wires, cotton and combustion aids, with their sources. */
import type { BurningKind, Measure } from "../core/calorimeter/burning-heat";
import table from "./burning-heats.json";

export interface BurningEntry extends BurningKind {
  /** Other names, in small letters. */
  readonly names: readonly string[];
  readonly source: string;
  readonly fromMemory: boolean;
  readonly note?: string;
}

export const burningKinds: readonly BurningEntry[] = table.map((entry) => ({ ...entry, plain: entry.plain as Measure }));

/** The entry of a name such as "cotton" or "nichrome"; undefined if there is none. */
export function burningKindOf(name: string): BurningEntry | undefined {
  const wanted = folded(name);
  return burningKinds.find(({ kind, names }) => [kind, ...names].some((each) => folded(each) === wanted));
}

/** Small letters; hyphens, dashes and spaces are one. */
function folded(name: string): string {
  return name
    .trim()
    .toLowerCase()
    .replace(/[\s_\-\u2010-\u2015]+/g, " ");
}
