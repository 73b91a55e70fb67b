/**
 * What goes into an equilibrium and what comes out.
 * Ideal gas and pure condensed phases, at chemical equilibrium; amounts in mol, energies in J, K, Pa, m³.
 */
import type { Capacity } from "../capacity/capacity";

/** A substance as an equilibrium sees it: its atoms and its thermodynamic functions, on the formation scale. */
export interface Substance {
  /** As tables name it: `CO2`, `H2O(l)`. */
  readonly name: string;
  /** Atoms of each element. */
  readonly counts: ReadonlyMap<string, number>;
  readonly capacity: Capacity;
}

/** A substance that is put in: its counts may be broken (`CH0.8O0.1`), and of its capacity only U or H at the start is used. */
export interface Reactant extends Substance {
  /** mol, 0 or more. */
  readonly amount: number;
}

/** A species that may be there at equilibrium: whole counts, and an entropy. */
export interface Candidate extends Substance {
  /** Gas constant its fit was made with, J/(mol K): G/RT is formed with it, also for condensed species. */
  readonly fitGasConstant: number;
}

/** An equilibrium state. Species stand in the order of the candidates. */
export interface Equilibrium {
  /** K. */
  readonly temperature: number;
  /** Pa. */
  readonly pressure: number;
  /** m³, of the gas; condensed phases have none. */
  readonly volume: number;
  /** mol of each candidate. */
  readonly amounts: Float64Array;
  /** ln of the amounts, right for traces far below the smallest double; −∞ for a species that cannot form or is left out. */
  readonly logAmounts: Float64Array;
  /** Amount of gas, mol. */
  readonly gas: number;
  /** U of everything, with formation, J. */
  readonly energy: number;
  /** H of everything, with formation, J. */
  readonly enthalpy: number;
  /** Largest |ln Q − ln K| over all species, recomputed from the amounts. */
  readonly massAction: number;
  /** Largest difference of an element, relative to what was put in. */
  readonly elements: number;
  /** Condensed species of the candidates that have no value at this temperature. */
  readonly leftOut: readonly string[];
  /** How often the functions of all species were evaluated, and how many steps the balances took. */
  readonly evaluations: number;
  readonly iterations: number;
}
