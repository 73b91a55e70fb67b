/**
 * What goes into an equilibrium and what comes out.
 * Ideal gas and pure condensed phases, at chemical equilibrium; amounts in mol, energies in J, K, Pa, m³.
 */
import type { Capacity } from "../capacity/capacity";

/** A species that may be there: its atoms and its thermodynamic functions, on the formation scale and with entropy. */
export interface Candidate {
  /** As tables name it: `CO2`, `H2O(l)`. */
  readonly name: string;
  /** Atoms of each element. */
  readonly counts: ReadonlyMap<string, number>;
  readonly capacity: Capacity;
}

/** A substance that is put in: its counts may be broken (`CH0.8O0.1`), and of its capacity only U or H at the start is used. */
export interface Reactant extends Candidate {
  /** mol, 0 or more. */
  readonly amount: number;
}
