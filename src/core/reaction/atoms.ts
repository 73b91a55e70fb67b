/**
 * Whether an equation conserves atoms and charge as written: for each element Σ ν a on the left and on the right.
 * Coefficients are decimal numbers here, such as 0.333333 for 1/3.
 */

/** A term with the atoms and the charge of its species. */
export interface Counted {
  readonly coefficient: number;
  readonly counts: ReadonlyMap<string, number>;
  readonly charge: number;
}

/** An element, or `charge`, that is not conserved. */
export interface Imbalance {
  readonly what: string;
  readonly left: number;
  readonly right: number;
}

/** What may be missing of an element, as a share of its atoms on both sides together. */
const TOLERANCE = 1e-6;

/** The elements whose atoms differ by more than a millionth of those on both sides, and the charge; empty if the equation balances. */
export function imbalances(left: readonly Counted[], right: readonly Counted[]): readonly Imbalance[] {
  const elements = [...new Set([...left, ...right].flatMap(({ counts }) => [...counts.keys()]))];
  const atoms = elements.map((what) => compared(what, left, right, ({ counts }) => counts.get(what) ?? 0));
  const charge = compared("charge", left, right, (term) => term.charge);
  return [...atoms, charge]
    .filter(({ differs }) => differs)
    .map(({ what, left: here, right: there }) => ({ what, left: here, right: there }));
}

function compared(
  what: string,
  left: readonly Counted[],
  right: readonly Counted[],
  of: (term: Counted) => number,
): Imbalance & { differs: boolean } {
  const sum = (side: readonly Counted[], size: (value: number) => number) =>
    side.reduce((total, term) => total + term.coefficient * size(of(term)), 0);
  const [here, there] = [sum(left, (value) => value), sum(right, (value) => value)];
  const all = sum(left, Math.abs) + sum(right, Math.abs);
  return { what, left: here, right: there, differs: Math.abs(here - there) > TOLERANCE * all };
}
