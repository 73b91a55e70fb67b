/** Where the sets of a species disagree beyond what their grades allow, in sentences. The judgement is the library's; pure. */
import { disagreement, type Disagreement } from "../functions/disagreement";
import { shown } from "./numbers";
import type { Subject } from "./subject";

export interface Notice {
  /** Against the first choice: what the user of a default should know. */
  readonly first: readonly string[];
  /** Between the other sets. */
  readonly others: readonly string[];
}

/** Sentences for the notice above the sets; both lists empty if the sets agree, and for a mixture. */
export function noticeOf({ text, records }: Subject): Notice {
  const preferred = records[0]?.set;
  const found = preferred === undefined ? [] : disagreement(text);
  const sentences = (mine: boolean) => found.filter(({ setA }) => (setA === preferred) === mine).map(sentenceOf);
  return { first: sentences(true), others: sentences(false) };
}

/** `Cp at 3000 K: srd69-shomate lies 11 % below nasa-2002; their grades allow 1.4 %.` */
export function sentenceOf(one: Disagreement): string {
  const { property, temperature, setA, setB, difference } = one;
  const what = property === "Cp" ? `Cp at ${shown(temperature)} K` : property;
  const { gap, allowed } = sizes(one);
  return `${what}: ${setB} lies ${gap} ${difference > 0 ? "above" : "below"} ${setA}; their grades allow ${allowed}.`;
}

function sizes({ property, percent, difference, allowed }: Disagreement): { gap: string; allowed: string } {
  if (property === "H(298.15 K)") return { gap: `${two(difference / 1000)}\u00a0kJ/mol`, allowed: `${two(allowed / 1000)}\u00a0kJ/mol` };
  if (property === "Cp" && percent !== null)
    return { gap: `${two(percent)}\u00a0%`, allowed: `${two((allowed * percent) / difference)}\u00a0%` };
  return { gap: `${two(difference)}\u00a0J/(mol K)`, allowed: `${two(allowed)}\u00a0J/(mol K)` };
}

/** The size in two significant digits. */
function two(value: number): string {
  return shown(Math.abs(value), 2);
}
