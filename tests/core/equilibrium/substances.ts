/** Substances for the tests of balances: from the set nasa-2002, or of atoms alone. */
import { fixedEnergy } from "../../../src/core/capacity/fixed-energy";
import { capacityOf } from "../../../src/core/capacity";
import type { Reactant } from "../../../src/core/equilibrium/types";
import { parseFormula } from "../../../src/core/species/formula";
import { findSpecies, recordOf } from "../../../src/data/library";

/** An amount of a species with its nasa-2002 fit. */
export function species(text: string, amount = 1): Reactant {
  const record = recordOf(findSpecies(text).key, "nasa-2002");
  return { name: record.species, counts: parseFormula(record.formula).counts, capacity: capacityOf(record), amount };
}

/** An amount of atoms without a heat capacity. */
export function atoms(formula: string, amount = 1): Reactant {
  return { name: formula, counts: parseFormula(formula).counts, capacity: fixedEnergy(0, "g", formula), amount };
}

/** O2 + 3.76 N2, in moles. */
export const simpleAir: readonly Reactant[] = [species("O2"), species("N2", 3.76)];

/** "1 CH4 + 2 O2", every digit. */
export function written(parts: readonly { readonly name: string; readonly amount: number }[]): string {
  return parts.map(({ name, amount }) => `${amount} ${name}`).join(" + ");
}
