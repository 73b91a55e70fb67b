/** How well an answer obeys its own laws, worked out in another way than it was found. */
import type { DoubleDouble } from "../numeric/double-double";
import type { Balances } from "./balances";
import type { System } from "./system";

/** Smaller amounts have lost digits or have become 0; their logarithm is kept beside them. */
const LEAST_EXACT = 1e-290;

/** Largest |ln Q − ln K|: every gas against the potentials of the elements, which follow from the basis. */
export function massActionError(system: System, balances: Balances, potentials: Float64Array, possible: readonly boolean[]): number {
  const elements = system.elements.length;
  const amounts = balances.gasAmounts();
  const ofElements = elementPotentials(balances, potentials, elements);
  let largest = 0;
  for (let j = 0; j < system.gases; j++) {
    if (!possible[j]) continue;
    let difference = potentials[j]! + (amounts[j]! > LEAST_EXACT ? Math.log(amounts[j]!) : balances.logs[j]!);
    for (let i = 0; i < elements; i++) difference -= system.atoms[j * elements + i]! * ofElements[i]!;
    largest = Math.max(largest, Math.abs(difference));
  }
  return largest;
}

function elementPotentials({ basis, logs }: Balances, potentials: Float64Array, elements: number): Float64Array {
  const { members, condensed, fromElements } = basis;
  const ofElements = new Float64Array(elements);
  for (const [k, member] of members.entries()) {
    const potential = potentials[member]! + (k < condensed ? 0 : logs[member]!);
    for (let i = 0; i < elements; i++) ofElements[i] = ofElements[i]! + fromElements[k * elements + i]! * potential;
  }
  return ofElements;
}

/** Largest difference of an element in the amounts of all species, relative to what was put in. */
export function elementError({ elements, atoms }: System, totals: readonly DoubleDouble[], amounts: Float64Array): number {
  let largest = 0;
  for (const [i, [total]] of totals.entries()) {
    if (total === 0) continue;
    let difference = -total;
    for (let j = 0; j < amounts.length; j++) difference += atoms[j * elements.length + i]! * amounts[j]!;
    largest = Math.max(largest, Math.abs(difference) / total);
  }
  return largest;
}
