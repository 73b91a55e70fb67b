/**
 * Element counts of a plain formula, to find a species whatever the order of its atoms: `H3N` and `NH3` are one.
 * Groups may nest: `(CH3)3CH`, `Ca(OH)2`. What is not a formula gives undefined, because a name may be meant.
 */
import { atomicWeights } from "./elements";

/** Hill's order: carbon, hydrogen, then by alphabet; without carbon all by alphabet. */
function inHillOrder(counts: ReadonlyMap<string, number>): string {
  const rank = (symbol: string): string => (counts.has("C") && symbol === "C" ? "0" : counts.has("C") && symbol === "H" ? "1" : `2${symbol}`);
  return [...counts.keys()]
    .sort((a, b) => (rank(a) < rank(b) ? -1 : 1))
    .map((symbol) => symbol + (counts.get(symbol) === 1 ? "" : counts.get(symbol)))
    .join("");
}

const TOKEN = /([A-Z][a-z]?)(\d*)|(\()|\)(\d*)/y;

/** Element counts of the formula in Hill's order, such as `H3N` for `NH3`; undefined if the text is not a formula. */
export function hillOf(text: string): string | undefined {
  const stack: Map<string, number>[] = [new Map()];
  TOKEN.lastIndex = 0;
  while (TOKEN.lastIndex < text.length) {
    const token = TOKEN.exec(text);
    if (token === null) return undefined;
    const [, symbol, count, opening, groupCount] = token;
    if (opening !== undefined) stack.push(new Map());
    else if (symbol !== undefined) {
      if (!atomicWeights.has(symbol)) return undefined;
      add(stack[stack.length - 1]!, symbol, count === "" ? 1 : Number(count));
    } else {
      const group = stack.pop()!;
      const outer = stack[stack.length - 1];
      if (outer === undefined) return undefined;
      for (const [inner, number] of group) add(outer, inner, number * (groupCount === "" ? 1 : Number(groupCount)));
    }
  }
  const counts = stack[0]!;
  return stack.length === 1 && counts.size > 0 ? inHillOrder(counts) : undefined;
}

function add(counts: Map<string, number>, symbol: string, number: number): void {
  counts.set(symbol, (counts.get(symbol) ?? 0) + number);
}

/** Molar mass, g/mol, of a flat formula of known elements. */
export function massOf(formula: string): number {
  let mass = 0;
  for (const [, symbol, count] of formula.matchAll(/([A-Z][a-z]?)(\d*)/g)) mass += atomicWeights.get(symbol!)! * Number(count || 1);
  return mass;
}
