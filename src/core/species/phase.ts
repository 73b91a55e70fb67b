import { refuse } from "../refusal";
import type { Phase } from "./types";

/** What each suffix means; (aq) is a solution and has no phase of its own here. */
const PHASES: ReadonlyMap<string, Phase | undefined> = new Map<string, Phase | undefined>([
  ["g", "g"],
  ["l", "l"],
  ["cr", "cr"],
  ["s", "cr"],
  ["c", "cr"],
  ["gr", "cr"],
  ["aq", undefined],
]);

export interface Phased {
  /** The text before the suffix. */
  readonly rest: string;
  readonly phase?: Phase;
  /** The suffix as written, without brackets. */
  readonly suffix?: string;
}

/**
 * Takes a phase suffix off the end: `H2O(l)`, `C(gr)`, `SO4^2-(aq)`, `Al2O3(cr,alpha)`. A bracket with a capital letter is a group of atoms.
 * Refuses a suffix that is not known.
 */
export function takePhase(text: string): Phased {
  const match = /^(.*)\(([a-z]+)((?:,[^()]*)?)\)$/.exec(text);
  if (!match) return { rest: text };
  const [, rest = "", symbol = "", detail = ""] = match;
  if (!PHASES.has(symbol)) refuse(`(${symbol}) in "${text}" is not a phase; the phases are (g) (l) (s) (cr) (gr) (aq)`);
  const phase = PHASES.get(symbol);
  return { rest: rest.trim(), suffix: symbol + detail, ...(phase === undefined ? {} : { phase }) };
}
