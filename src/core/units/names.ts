/** From a spelling to the name inside mathjs: the exact spelling first, then an obvious slip of case, then a refusal with the nearest names. */
import { refuse } from "../refusal";
import { ambiguity, gaugeSentence, gaugeStem } from "./ambiguous";
import { nearest } from "./nearest";
import { unitRows } from "./table";

interface Names {
  /** Every accepted spelling, prefix included, to its name inside mathjs. */
  readonly inside: ReadonlyMap<string, string>;
  /** Lower case to the accepted spellings that differ from it by case alone. */
  readonly folded: ReadonlyMap<string, readonly string[]>;
}

let names: Names | undefined;

function collect(): Names {
  const inside = new Map<string, string>();
  for (const row of unitRows) {
    const prefixes = ["", ...(row.prefixes?.split(" ") ?? [])];
    // mathjs spells micro with a letter u.
    for (const spelling of row.spellings)
      for (const prefix of prefixes) inside.set(prefix + spelling, prefix.replace("μ", "u") + row.inside);
  }
  for (const spelling of [...inside.keys()]) if (spelling.startsWith("μ")) inside.set(`u${spelling.slice(1)}`, inside.get(spelling)!);
  const folded = new Map<string, string[]>();
  for (const spelling of inside.keys()) {
    const key = spelling.toLowerCase();
    folded.set(key, [...(folded.get(key) ?? []), spelling]);
  }
  return { inside, folded };
}

/** Every spelling that is accepted exactly, prefixes included. */
export function acceptedSpellings(): readonly string[] {
  names ??= collect();
  return [...names.inside.keys()];
}

/** The name inside mathjs of one unit name in plain spelling, such as `kcal_th`. Throws a Refusal, speaking of `whole`, the text as typed. */
export function insideName(name: string, whole: string): string {
  names ??= collect();
  const exact = names.inside.get(name);
  if (exact !== undefined) return exact;
  const slip = caseSlip(name, names);
  if (slip !== undefined) return names.inside.get(slip)!;
  return refuseName(name, whole, names);
}

/**
 * A slip of case is forgiven if one accepted spelling alone is meant. Single letters (t, T), and names whose slip would
 * exchange the prefixes m and M, are never forgiven.
 */
function caseSlip(name: string, { folded }: Names): string | undefined {
  const meant = folded.get(name.toLowerCase());
  if (meant?.length !== 1 || name.length < 2) return undefined;
  const spelling = meant[0]!;
  const first = name.charAt(0);
  return first.toLowerCase() === "m" && first !== spelling.charAt(0) ? undefined : spelling;
}

function refuseName(name: string, whole: string, { inside }: Names): never {
  const quoted = name === whole ? `"${name}"` : `"${name}" in "${whole}"`;
  const gauged = gaugeStem(name);
  if (gauged !== undefined) refuse(gaugeSentence(whole, gauged));
  const why = ambiguity(name);
  if (why !== undefined) refuse(`${quoted} ${why}`);
  const near = nearest(name, inside.keys());
  refuse(`${quoted} is not a unit Stillwall knows${near.length === 0 ? "" : `; nearest: ${near.join(", ")}`}`);
}
