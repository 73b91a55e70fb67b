/**
 * The species of a balance of energy between different substances: each needs its enthalpy of formation, and each may come from another
 * set. The set asked for is used for every species it holds, the library's first choice for the others, and that is said.
 */
import { REFERENCE_TEMPERATURE } from "../core/constants";
import { extrapolated } from "../core/capacity/range";
import type { Capacity } from "../core/capacity/capacity";
import { reachingReference } from "../core/capacity/reference";
import type { Candidate } from "../core/equilibrium/types";
import { Refusal, refuse, refuseAbsent } from "../core/refusal";
import { parseFormula } from "../core/species/formula";
import type { SpeciesFit } from "../core/species/types";
import { findSpecies, recordsOf } from "../data/library";
import { readText } from "./arguments";
import type { Cell } from "./cell";
import type { SetChoice } from "./set";
import { capacityOfFit, matchingFit } from "./substance";

/** A species on the formation scale. */
export interface FormationSpecies extends Candidate {
  /** The fit behind it. */
  readonly fit: SpeciesFit;
  /** Why another set than the one asked for was used. */
  readonly note?: string;
}

/** The key of the species that a cell names; a formula that the library does not hold stands for itself, as a coefficient block names it. */
export function speciesName(cell: Cell | undefined): string {
  const text = readText(cell, "species") ?? refuse('The species is missing: give a text such as "NO"');
  try {
    return findSpecies(text).key;
  } catch (thrown) {
    if (thrown instanceof Refusal && thrown.kind === "input") throw thrown;
    return text;
  }
}

interface Chosen {
  readonly fit: SpeciesFit;
  readonly note?: string;
}

/**
 * The species that a text means, from the set or, where the set does not hold it, from the library's first choice.
 * Refuses a text that is no species, and a fit without enthalpy of formation, naming the sets that have one.
 */
export function formationSpecies(text: string, set: SetChoice): FormationSpecies {
  const { fit, note } = chosenFit(text, set);
  return { ...candidateOfFit(fit, set), fit, note };
}

/** A fit as a species at equilibrium; beyond its range only if the set says so. */
export function candidateOfFit(fit: SpeciesFit, set: SetChoice): Candidate {
  const capacity = formationCapacity(fit, set.extrapolate);
  return { name: fit.species, counts: parseFormula(fit.formula).counts, capacity, fitGasConstant: fit.gasConstant };
}

/** The capacity of a fit in a balance of energy: carried down to 298.15 K where it begins just above, or beyond its range if asked for. */
export function formationCapacity(fit: SpeciesFit, extrapolate: boolean): Capacity {
  return extrapolate ? extendedOf(fit) : reachingOf(fit);
}

function chosenFit(text: string, set: SetChoice): Chosen {
  if (set.fits) {
    const own = matchingFit(text, set.fits);
    if (own) return { fit: hasFormation(own) ? own : refuseWithout(`The coefficient block gives ${own.species}`, []) };
    const fit = firstChoice(text);
    return { fit, note: `The coefficient block has no row for ${fit.species}: ${fit.set} is used` };
  }
  const held = set.id === undefined ? undefined : recordsOf(findSpecies(text).key).find((record) => record.set === set.id);
  if (held)
    return { fit: hasFormation(held) ? held : refuseWithout(`Set ${held.set} gives ${held.species}`, setsWithFormation(held.species)) };
  const fit = firstChoice(text);
  return set.id === undefined ? { fit } : { fit, note: `Set ${set.id} does not hold ${fit.species}: ${fit.set} is used` };
}

function firstChoice(text: string): SpeciesFit {
  const { key } = findSpecies(text);
  return recordsOf(key).find(hasFormation) ?? refuseWithout(`The library gives ${key}`, []);
}

function setsWithFormation(key: string): readonly string[] {
  return recordsOf(key)
    .filter(hasFormation)
    .map(({ set }) => set);
}

function refuseWithout(beginning: string, sets: readonly string[]): never {
  const wayOut =
    sets.length > 0
      ? `sets that do: ${sets.join(", ")}`
      : "give a coefficient block with it, or a fuel by its gross value through BURN.FUEL";
  return refuseAbsent(`${beginning} no enthalpy of formation, without which nothing can burn or react; ${wayOut}`);
}

function hasFormation(fit: SpeciesFit): boolean {
  return capacityOfFit(fit).onFormationScale;
}

/** Each made once: what is put in twice is recognised by its capacity. */
const reaching = new WeakMap<SpeciesFit, Capacity>();
const extended = new WeakMap<SpeciesFit, Capacity>();

function reachingOf(fit: SpeciesFit): Capacity {
  return held(reaching, fit, reachingReference);
}

/** Beyond its range only a gas is extrapolated; a solid or liquid keeps its range, which may end at a change of phase. */
function extendedOf(fit: SpeciesFit): Capacity {
  return held(extended, fit, (capacity) => (capacity.phase === "g" ? extrapolated(capacity) : capacity));
}

function held(made: WeakMap<SpeciesFit, Capacity>, fit: SpeciesFit, make: (capacity: Capacity) => Capacity): Capacity {
  const known = made.get(fit);
  if (known) return known;
  const capacity = make(capacityOfFit(fit));
  made.set(fit, capacity);
  return capacity;
}

/** One sentence for each set whose fits begin a little above 298.15 K and are carried down to it. */
export function heldNotes(species: readonly Pick<FormationSpecies, "fit" | "capacity" | "name">[]): string[] {
  const bySet = new Map<string, string[]>();
  for (const { fit, capacity, name } of species) {
    const begins = fit.intervals[0]?.from ?? 0;
    if (capacity.from !== REFERENCE_TEMPERATURE || begins <= REFERENCE_TEMPERATURE) continue;
    const start = `${fit.set}|${begins}`;
    bySet.set(start, [...(bySet.get(start) ?? []), name]);
  }
  return [...bySet].map(([start, names]) => {
    const [set, begins] = start.split("|");
    return `${set} for ${names.join(", ")} begins at ${begins} K; from there down to 298.15 K the heat capacity at ${begins} K is held`;
  });
}
