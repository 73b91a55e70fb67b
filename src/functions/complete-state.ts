/** Complete combustion in the closed vessel, with the products from the set: the estimate without dissociation. */
import type { Capacity } from "../core/capacity/capacity";
import { completeProducts, completeRigid, type CompleteState, requireLean } from "../core/equilibrium/complete";
import type { Reactant } from "../core/equilibrium/types";
import { type FormationSpecies, formationSpecies } from "./formation-species";
import type { SetChoice } from "./set";
import { capacityOfFit } from "./substance";

/** What tables and notes say of complete products. */
export const COMPLETE_WORDS = "estimate without dissociation; not a bound";

export interface CompleteCombustion extends CompleteState {
  /** mol of each product. */
  readonly products: readonly { readonly candidate: FormationSpecies; readonly amount: number }[];
  /** Which set was used where the one asked for does not hold a product. */
  readonly notes: readonly string[];
  /** The products as far as their fits go, if values beyond were asked for. */
  readonly fitted: readonly Capacity[];
}

/**
 * The state that complete products reach. ratio: equivalence ratio, at most 1. energy: U of the reactants at the start, J. volume: m³.
 * Refuses a ratio above 1, elements without complete products, and an energy beyond the range of the products.
 */
export function completeCombustion(
  reactants: readonly Reactant[],
  ratio: number,
  energy: number,
  volume: number,
  set: SetChoice,
): CompleteCombustion {
  requireLean(ratio);
  const products = completeProducts(reactants).map(({ name, amount }) => ({ candidate: formationSpecies(name, set), amount }));
  const notes = products.flatMap(({ candidate }) => candidate.note ?? []);
  const fitted = set.extrapolate ? products.map(({ candidate }) => capacityOfFit(candidate.fit)) : [];
  return { ...completeRigid(products, energy, volume), products, notes, fitted };
}
