/**
 * The fallback of the balances: they are solved for a part of the potentials and the part is raised to the whole, each solution starting
 * the next (continuation in the Gibbs function). With no part at all every species would be as likely as any other.
 */
import type { DoubleDouble } from "../numeric/double-double";
import type { Balances } from "./balances";

const FIRST_PART = 1 / 16;
const LEAST_PART = 1 / 4096;

/** Gives the part of the potentials that was reached: 1 if the balances are solved. */
export function fadeIn(
  balances: Balances,
  potentials: Float64Array,
  present: readonly number[],
  possible: readonly boolean[],
  totals: readonly DoubleDouble[],
): number {
  const begin = Math.log(Math.max(...totals.map(([total]) => total))) - Math.LN10;
  balances.logs.forEach((_, j) => (balances.logs[j] = possible[j] ? begin : -Infinity));
  const kept = new Float64Array(balances.logs.length);
  let reached = 0;
  let part = FIRST_PART;
  while (reached < 1 && part >= LEAST_PART) {
    kept.set(balances.logs);
    const next = Math.min(1, reached + part);
    const scaled = next === 1 ? potentials : potentials.map((potential) => next * potential);
    if (balances.solve(scaled, present)) {
      reached = next;
      part *= 2;
    } else {
      balances.logs.set(kept);
      part /= 2;
    }
  }
  return reached;
}
