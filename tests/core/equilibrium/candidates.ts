/** Candidates of an equilibrium from the sets of the library, for tests. */
import { capacityOf } from "../../../src/core/capacity";
import type { Candidate, Reactant } from "../../../src/core/equilibrium/types";
import { type System, systemOf } from "../../../src/core/equilibrium/system";
import { parseFormula } from "../../../src/core/species/formula";
import { recordOf, type SetRecord, setOfId } from "../../../src/data/library";

export function candidateOf(record: SetRecord): Candidate {
  return {
    name: record.species,
    counts: parseFormula(record.formula).counts,
    capacity: capacityOf(record),
    fitGasConstant: record.gasConstant,
  };
}

/** `CO2`, `H2O(l)` of a set. */
export function candidate(key: string, set = "nasa-2002"): Candidate {
  return candidateOf(recordOf(key, set));
}

/** Several, named in one text. */
export function named(keys: string, set = "nasa-2002"): Candidate[] {
  return keys.split(" ").map((key) => candidate(key, set));
}

/** Every species of a set whose atoms are all among these elements, neutral, with or without condensed ones. */
export function candidatesOf(set: string, elements: string, phases: "gases" | "all phases"): Candidate[] {
  const allowed = new Set(elements.split(" "));
  return setOfId(set)!
    .species.map((key) => candidateOf(recordOf(key, set)))
    .filter(({ counts, capacity }) => [...counts.keys()].every((element) => allowed.has(element)) && fits(capacity.phase, phases))
    .filter(({ capacity }) => capacity.onFormationScale && capacity.hasEntropy);
}

function fits(phase: string, phases: "gases" | "all phases"): boolean {
  return phases === "all phases" || phase === "g";
}

/** `{ CH4: 1, O2: 2 }` as reactants, from among the candidates or else from nasa-2002. */
export function feedOf(amounts: Readonly<Record<string, number>>, from: readonly Candidate[] = []): Reactant[] {
  return Object.entries(amounts).map(([key, amount]) => ({ ...(from.find(({ name }) => name === key) ?? candidate(key)), amount }));
}

/** U of what is put in, J, at a temperature, K. */
export function energyOf(feed: readonly Reactant[], temperature: number): number {
  return feed.reduce((sum, { capacity, amount }) => sum + amount * capacity.energy(temperature), 0);
}

/** H of what is put in, J. */
export function enthalpyOf(feed: readonly Reactant[], temperature: number): number {
  return feed.reduce((sum, { capacity, amount }) => sum + amount * capacity.enthalpy(temperature), 0);
}

export function systemOfNames(keys: string, set = "nasa-2002"): System {
  return systemOf(named(keys, set));
}

/** Joint range of the gases among them, K. */
export function jointRange(candidates: readonly Candidate[]): { from: number; to: number } {
  const gases = candidates.filter(({ capacity }) => capacity.phase === "g");
  return {
    from: Math.max(...gases.map(({ capacity }) => capacity.from)),
    to: Math.min(...gases.map(({ capacity }) => capacity.to)),
  };
}
