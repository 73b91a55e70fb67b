/**
 * Energy, enthalpy and heat capacity of a reaction per mole of the equation as written, at one temperature T in K:
 *   ΔrU = Σ ν U(T)   ΔrH = Σ ν H(T)   ΔrCv = Σ ν Cv(T)   ν = products − reactants
 * Ideal gases: U = H − RT and Cv = Cp − R, each with the R of its fit, so ΔrH − ΔrU = Σ ν R T over the gases. Solids and liquids: U = H,
 * the product pV neglected; solids: Cv = Cp taken. H and U hold the enthalpies of formation.
 * A species with as much of it on both sides takes no part.
 */
import type { Capacity } from "../capacity/capacity";
import { explainTemperature } from "../capacity/range";
import { refuse } from "../refusal";

/** A species of a reaction. */
export interface ReactionPart {
  /** As sentences name it. */
  readonly name: string;
  /** Amount on the left and on the right, mol per mole of equation. */
  readonly left: number;
  readonly right: number;
  readonly capacity: Capacity;
  /** Published uncertainty of the enthalpy of formation, J/mol; 0 for an element in its reference state; left out if none is published. */
  readonly uncertainty?: number;
}

/** ΔrU, J/mol. Refuses a temperature outside the range that the species share, and a species without formation enthalpy. */
export function energyOfReaction(parts: readonly ReactionPart[], temperature: number): number {
  requireFormation(parts);
  return change(parts, temperature, (capacity) => capacity.energy(temperature));
}

/** ΔrH, J/mol. Refuses as `energyOfReaction`. */
export function enthalpyOfReaction(parts: readonly ReactionPart[], temperature: number): number {
  requireFormation(parts);
  return change(parts, temperature, (capacity) => capacity.enthalpy(temperature));
}

/** ΔrCv, J/(mol K). Refuses a temperature outside the range that the species share, and liquids. */
export function cvOfReaction(parts: readonly ReactionPart[], temperature: number): number {
  const liquid = reacting(parts).find(({ capacity }) => capacity.phase === "l");
  if (liquid) refuse(`${liquid.name} is liquid, and the Cv of a liquid is not its Cp: the change of Cv of this reaction is not known`);
  return change(parts, temperature, (capacity) => capacity.cv(temperature));
}

/** Gas formed less gas consumed, Δn, mol per mole of equation. */
export function gasChange(parts: readonly ReactionPart[]): number {
  return gasOf(parts, "right") - gasOf(parts, "left");
}

/** Gas on one side, mol per mole of equation. */
export function gasOf(parts: readonly ReactionPart[], side: "left" | "right"): number {
  return parts.filter(({ capacity }) => capacity.phase === "g").reduce((sum, part) => sum + part[side], 0);
}

/** Species with more of them on one side than on the other. */
export function reacting<Part extends ReactionPart>(parts: readonly Part[]): readonly Part[] {
  return parts.filter(({ left, right }) => left !== right);
}

/** The capacity whose range ends first on the side of the temperature, K, if the temperature is outside it; undefined if all hold. */
export function limiting(parts: readonly ReactionPart[], temperature: number): Capacity | undefined {
  const capacities = parts.map(({ capacity }) => capacity);
  const below = capacities.filter(({ from }) => !(temperature >= from)).sort((a, b) => b.from - a.from);
  const above = capacities.filter(({ to }) => temperature > to).sort((a, b) => a.to - b.to);
  return below[0] ?? above[0];
}

/** Uncertainty of ΔrH and ΔrU that comes from the enthalpies of formation. */
export interface FormationUncertainty {
  /** √Σ(ν u)², J/mol, over the species with a published value, taken as independent. */
  readonly value: number;
  /** Species without a published value, which are not in it. */
  readonly unknown: readonly string[];
}

/** Uncertainty from the enthalpies of formation, for the net amounts of the reaction. */
export function formationUncertainty(parts: readonly ReactionPart[]): FormationUncertainty {
  const taking = reacting(parts);
  const squares = taking.reduce((sum, { left, right, uncertainty = 0 }) => sum + ((right - left) * uncertainty) ** 2, 0);
  return { value: Math.sqrt(squares), unknown: taking.filter(({ uncertainty }) => uncertainty === undefined).map(({ name }) => name) };
}

/** Refuses species whose fit has no enthalpy of formation. */
export function requireFormation(parts: readonly ReactionPart[]): void {
  const lacking = reacting(parts).find(({ capacity }) => !capacity.onFormationScale);
  if (lacking) refuse(`No formation enthalpy is known in ${lacking.capacity.toLabel}; it is needed for the energy of a reaction`);
}

function change(parts: readonly ReactionPart[], temperature: number, of: (capacity: Capacity) => number): number {
  const taking = reacting(parts);
  const limit = limiting(taking, temperature);
  if (limit) throw explainTemperature(limit, temperature);
  return taking.reduce((sum, { left, right, capacity }) => sum + (right - left) * of(capacity), 0);
}
