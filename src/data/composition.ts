/** What a formula says of itself: atoms in one order, so that `H3N` and `NH3` are one, and the molar mass. */
import { Refusal } from "../core/refusal";
import { type Formula, hill, molarMass, parseFormula } from "../core/species/formula";
import { atomicWeights } from "./elements";

/** The formula in Hill's order, such as `H3N` for `NH3`; undefined for a name, and for a formula with a phase. */
export function hillOf(text: string): string | undefined {
  const formula = formulaOf(text);
  return formula === undefined || formula.suffix !== undefined ? undefined : hill(formula);
}

function formulaOf(text: string): Formula | undefined {
  try {
    return parseFormula(text);
  } catch (refusal) {
    if (refusal instanceof Refusal) return undefined;
    throw refusal;
  }
}

/** Molar mass, g/mol, from the one table of atomic weights. */
export function massOf(formula: string): number {
  return molarMass(parseFormula(formula), atomicWeights);
}

/** Number of atoms in one molecule. */
export function atomsOf(formula: string): number {
  return [...parseFormula(formula).counts.values()].reduce((sum, count) => sum + count, 0);
}
