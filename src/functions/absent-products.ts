/**
 * Species that would form and are not among those of an equilibrium: without SO3 sulfur dioxide never goes on to it, without S2 and S8
 * sulfur never boils, without CF4 fluorine stays free. Which of them can be there is told from the atoms of the state and its temperature;
 *   oxygen that complete combustion takes up = 2 C + H/2 + 2 S, of the hydrogen only what halogens leave
 */
import type { Candidate, Equilibrium } from "../core/equilibrium/types";
import { printed, Refusal } from "../core/refusal";
import { hill, parseFormula } from "../core/species/formula";
import { type FurtherProduct, furtherProducts } from "../data/further-products";
import { findSpecies, recordsOf } from "../data/library";
import { capacityOfFit } from "./substance";

/** Those that the elements allow and that are not among the candidates. */
export function absentProducts(candidates: readonly Candidate[], elements: ReadonlySet<string>): readonly FurtherProduct[] {
  return furtherProducts.filter(({ species }) => {
    const { counts, phase = "g" } = parseFormula(species);
    if (![...counts.keys()].every((element) => elements.has(element))) return false;
    const name = hill({ counts, charge: 0 });
    return !candidates.some((candidate) => candidate.capacity.phase === phase && hill({ counts: candidate.counts, charge: 0 }) === name);
  });
}

/** An element with a smaller share of the atoms moves a state by less than its fits are good for. */
const LEAST_SHARE = 0.002;

/** One sentence with those that would be there in this state; none if there are none. */
export function absentNotes(
  absent: readonly FurtherProduct[],
  candidates: readonly Candidate[],
  { amounts, temperature }: Equilibrium,
): string[] {
  if (absent.length === 0) return [];
  const atoms = atomsOf(candidates, amounts);
  const all = [...atoms.values()].reduce((sum, count) => sum + count, 0);
  const forming = absent.filter(
    ({ element, from, to, when }) =>
      temperature >= from && temperature <= to && (atoms.get(element) ?? 0) >= LEAST_SHARE * all && holds(when, atoms),
  );
  if (forming.length === 0) return [];
  const names = forming.map(({ species }) => species);
  const elsewhere = names.filter(isElsewhere);
  const way = elsewhere.length === 0 ? "" : `; a list of species, without a set, can hold ${elsewhere.join(", ")}`;
  return [
    `Not among the species, though they can form at ${printed(temperature)} K: ${names.join(", ")}; the composition and what follows from it are without them${way}`,
  ];
}

function atomsOf(candidates: readonly Candidate[], amounts: Float64Array): ReadonlyMap<string, number> {
  const atoms = new Map<string, number>();
  for (const [j, { counts }] of candidates.entries())
    for (const [element, count] of counts) atoms.set(element, (atoms.get(element) ?? 0) + count * amounts[j]!);
  return atoms;
}

const HALOGENS = ["F", "Cl", "Br", "I"];

/** A state at the border counts on both sides. */
const BORDER = 0.01;

function holds(when: FurtherProduct["when"], atoms: ReadonlyMap<string, number>): boolean {
  const of = (element: string) => atoms.get(element) ?? 0;
  const halogens = HALOGENS.reduce((sum, element) => sum + of(element), 0);
  const needed = 2 * of("C") + Math.max(0, of("H") - halogens) / 2 + 2 * of("S");
  if (when === "lean") return of("O") >= (1 - BORDER) * needed;
  if (when === "rich") return of("O") <= (1 + BORDER) * needed;
  if (when === "sooting") return of("O") <= (1 + BORDER) * of("C");
  if (when === "halogen") return halogens > of("H");
  return true;
}

/** True if the library holds the species with enthalpy of formation and entropy, in some set. */
function isElsewhere(species: string): boolean {
  try {
    return recordsOf(findSpecies(species).key).some((fit) => {
      const { onFormationScale, hasEntropy } = capacityOfFit(fit);
      return onFormationScale && hasEntropy;
    });
  } catch (thrown) {
    if (thrown instanceof Refusal) return false;
    throw thrown;
  }
}
