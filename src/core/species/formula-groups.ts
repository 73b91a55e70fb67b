import { refuse } from "../refusal";
import { isElement } from "./elements";

/** A full stop before water is a hydrate; every other full stop is a decimal sign, as in CH1.686O0.843. */
const WATER_AFTER_STOP = /\.(\d+(?:\.\d+)?|)H2O$/;

const CLOSING: Readonly<Record<string, string>> = { "(": ")", "[": "]", "{": "}" };

/** Counts the atoms of a formula without charge and phase. `written` is what the user typed, for the refusals. */
export function countAtoms(text: string, written: string): Map<string, number> {
  const counts = new Map<string, number>();
  const parts = (text.includes("·") ? text : text.replace(WATER_AFTER_STOP, "·$1H2O")).split("·");
  parts.forEach((part, index) => {
    const leading = index === 0 ? "" : /^\d*\.?\d*/.exec(part)![0];
    const factor = leading === "" ? 1 : countOf(leading, written);
    if (part.length === leading.length) refuse(`A part of "${written}" beside the dot is empty`);
    add(counts, countGroups(part.slice(leading.length), written), factor);
  });
  return counts;
}

interface OpenGroup {
  readonly bracket: string;
  readonly counts: Map<string, number>;
}

/** One part between dots: elements, brackets and their counts, read from left to right. */
function countGroups(part: string, written: string): Map<string, number> {
  const open: OpenGroup[] = [{ bracket: "", counts: new Map() }];
  const token = /([A-Z][a-z]*)(\d*\.?\d*)|([([{])|([)\]}])(\d*\.?\d*)|(.)/gu;
  for (const [, symbol, count, opening, closing, groupCount, other] of part.matchAll(token)) {
    if (other !== undefined) refuse(`The character "${other}" in "${written}" does not belong in a formula`);
    const group = open[open.length - 1]!;
    if (opening !== undefined) open.push({ bracket: opening, counts: new Map() });
    else if (closing !== undefined) closeGroup(open, closing, countOf(groupCount!, written), written);
    else addElement(group.counts, symbol!, countOf(count!, written), written);
  }
  const last = open[open.length - 1]!;
  if (last.bracket !== "") refuse(`The bracket "${last.bracket}" in "${written}" is not closed`);
  return last.counts;
}

function closeGroup(open: OpenGroup[], closing: string, factor: number, written: string): void {
  const group = open[open.length - 1]!;
  if (CLOSING[group.bracket] !== closing) refuse(`The bracket "${closing}" in "${written}" closes nothing`);
  if (group.counts.size === 0) refuse(`A bracket in "${written}" is empty`);
  open.pop();
  add(open[open.length - 1]!.counts, group.counts, factor);
}

function addElement(counts: Map<string, number>, symbol: string, count: number, written: string): void {
  if (!isElement(symbol)) refuse(`"${symbol}" in "${written}" is not the symbol of an element`);
  counts.set(symbol, (counts.get(symbol) ?? 0) + count);
}

function add(to: Map<string, number>, from: ReadonlyMap<string, number>, factor: number): void {
  for (const [symbol, count] of from) to.set(symbol, (to.get(symbol) ?? 0) + factor * count);
}

/** A count as written; nothing is 1. */
function countOf(digits: string, written: string): number {
  if (digits === "") return 1;
  const count = Number(digits);
  if (!(count > 0 && count < 1e6)) refuse(`The count ${digits} in "${written}" is not a number above 0`);
  return count;
}
