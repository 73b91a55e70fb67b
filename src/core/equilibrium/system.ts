/**
 * The species that may be there, sorted into gases and condensed, and their atoms as a table of whole numbers.
 */
import { refuse } from "../refusal";
import { add, type DoubleDouble, timesDouble } from "../numeric/double-double";
import type { Candidate, Reactant } from "./types";

export interface System {
  /** Gases first, then condensed species. */
  readonly species: readonly Candidate[];
  /** Number of gases. */
  readonly gases: number;
  /** Joint range of the gases, K. */
  readonly from: number;
  readonly to: number;
  /** Place of each species among the candidates as they were given. */
  readonly places: Int32Array;
  /** In the order of the alphabet. */
  readonly elements: readonly string[];
  /** Atoms, species × elements, row by row. */
  readonly atoms: Float64Array;
}

/** Most species and elements of one problem: far above what libraries hold for a feed; more is a slip. */
const MOST_SPECIES = 400;
const MOST_ELEMENTS = 20;

/**
 * The table of the candidates. Refuses none, two of one name, broken counts, charges are not asked for, a capacity without formation
 * values or without entropy, and candidates without a gas.
 */
export function systemOf(candidates: readonly Candidate[]): System {
  if (candidates.length === 0) refuse("The list of species is empty: an equilibrium needs at least one gas");
  if (candidates.length > MOST_SPECIES) refuse(`The list has ${candidates.length} species; at most ${MOST_SPECIES} are taken`);
  const names = new Set<string>();
  for (const candidate of candidates) {
    checkCandidate(candidate);
    if (names.has(candidate.name)) refuse(`The list of species names ${candidate.name} twice`);
    names.add(candidate.name);
  }
  const order = candidates.map((_, place) => place).sort((a, b) => rank(candidates[a]!) - rank(candidates[b]!) || a - b);
  const species = order.map((place) => candidates[place]!);
  const gases = species.filter(({ capacity }) => capacity.phase === "g").length;
  if (gases === 0) refuse(`The list of species (${[...names].join(", ")}) holds no gas: an equilibrium here has a gas phase`);
  const elements = [...new Set(species.flatMap(({ counts }) => [...counts.keys()]))].sort();
  if (elements.length > MOST_ELEMENTS) refuse(`The species hold ${elements.length} elements; at most ${MOST_ELEMENTS} are taken`);
  const atoms = Float64Array.from(species.flatMap(({ counts }) => elements.map((element) => counts.get(element) ?? 0)));
  const capacities = species.slice(0, gases).map(({ capacity }) => capacity);
  const from = Math.max(...capacities.map((capacity) => capacity.from));
  const to = Math.min(...capacities.map((capacity) => capacity.to));
  return { species, gases, from, to, places: Int32Array.from(order), elements, atoms };
}

function rank({ capacity }: Candidate): number {
  return capacity.phase === "g" ? 0 : 1;
}

function checkCandidate({ name, counts, capacity }: Candidate): void {
  if (counts.size === 0) refuse(`${name} holds no atoms and cannot take part in an equilibrium`);
  for (const [element, count] of counts)
    if (!Number.isInteger(count) || count <= 0)
      refuse(`${name} holds ${count} atoms of ${element}; a species at equilibrium has whole numbers`);
  if (!capacity.onFormationScale) refuse(`${capacity.toLabel} has no enthalpy of formation, which an equilibrium needs`);
  if (!capacity.hasEntropy) refuse(`${capacity.toLabel} has no entropy, which an equilibrium needs`);
}

/**
 * Atoms of each element that the reactants bring, mol, in the order of the system, with 32 digits: an exactly stoichiometric feed stays so.
 * Refuses a negative or unprintable amount, an element that no species of the system can take up, and a feed of nothing.
 */
export function totalsOf(system: System, reactants: readonly Reactant[]): DoubleDouble[] {
  const totals: DoubleDouble[] = system.elements.map(() => [0, 0]);
  for (const { name, counts, amount } of reactants) {
    if (!(amount >= 0 && amount < Infinity)) refuse(`The amount ${amount} of ${name} is not a number from 0 up`);
    if (amount === 0) continue;
    for (const [element, count] of counts) {
      const place = system.elements.indexOf(element);
      if (place < 0) refuse(`${name} brings ${element}, and none of the species at equilibrium holds ${element}`);
      totals[place] = add(totals[place]!, timesDouble([count, 0], amount));
    }
  }
  if (totals.every(([high]) => high === 0)) refuse("There is nothing in the feed: every amount is 0");
  return totals;
}
