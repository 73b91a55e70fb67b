/**
 * Which condensed phases are there, at fixed temperature and volume: a phase that is left out may not be stable against the gas
 * (its Gibbs energy not below that of its elements in the gas), and one that is there may not have a negative amount. The least stable
 * assumption is changed until none is left: phases are added and taken away one at a time, and every change lowers the Helmholtz energy.
 */
import { refuse } from "../refusal";
import type { Balances } from "./balances";
import type { System } from "./system";

/** A phase is added if its activity exceeds 1 by more than this. */
const SUPERSATURATED = 1e-12;
/** A phase is taken away below this share of the largest amount of its elements, negative. */
const NEGATIVE = 1e-15;
const CHANGES = 60;

/**
 * Balances the gas with the condensed phases that are stable; gives those that are there. `eligible`: condensed species that have a value
 * at this temperature and can form.
 */
export function settlePhases(
  system: System,
  balances: Balances,
  potentials: Float64Array,
  eligible: readonly number[],
  start: readonly number[],
  solve: (present: readonly number[]) => void,
): readonly number[] {
  let present = start.filter((species) => eligible.includes(species));
  for (let change = 0; change < CHANGES; change++) {
    solve(present);
    const { members, condensed } = balances.basis;
    present = members.slice(0, condensed);
    const vanished = mostNegative(balances);
    if (vanished >= 0) present = present.filter((species) => species !== vanished);
    else {
      const forming = mostSupersaturated(system, balances, potentials, eligible, present);
      if (forming < 0) return present;
      present = [...present, forming];
    }
  }
  return refuse(`The condensed phases (${eligible.map((j) => system.species[j]!.name).join(", ")}) did not settle in ${CHANGES} changes`);
}

function mostNegative(balances: Balances): number {
  const { members, condensed, totals } = balances.basis;
  let found = -1;
  let least = 0;
  for (let k = 0; k < condensed; k++) {
    const amount = balances.condensedAmount(k);
    if (amount < least - NEGATIVE * Math.abs(totals[k]!)) [found, least] = [members[k]!, amount];
  }
  return found;
}

/** The absent phase whose ln of activity is the highest above 0, or −1. */
function mostSupersaturated(
  system: System,
  balances: Balances,
  potentials: Float64Array,
  eligible: readonly number[],
  present: readonly number[],
): number {
  const { members, condensed, shares } = balances.basis;
  let found = -1;
  let most = SUPERSATURATED;
  for (const species of eligible) {
    if (present.includes(species)) continue;
    let activity = -potentials[species]!;
    for (let k = 0; k < members.length; k++) {
      const share = shares[species * members.length + k]!;
      if (share !== 0) activity += share * (potentials[members[k]!]! + (k < condensed ? 0 : balances.logs[members[k]!]!));
    }
    if (activity > most) [found, most] = [species, activity];
  }
  return found;
}
