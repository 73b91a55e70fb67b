/**
 * An equation with its numbers: each species found in the library or in the user's own coefficients, the equation checked to be balanced
 * as written. A species may stand on both sides (surplus oxygen, inert nitrogen).
 */
import { type Counted, imbalances } from "../core/reaction/atoms";
import { balance } from "../core/reaction/balance";
import { type Equation, equationText, parseEquation, type Term } from "../core/reaction/equation";
import { limiting, type ReactionPart } from "../core/reaction/reaction";
import { printed, Refusal, refuse, refuseAbsent } from "../core/refusal";
import { parseFormula } from "../core/species/formula";
import type { SpeciesFit } from "../core/species/types";
import { quoted } from "./arguments";
import { BoundedCache } from "./cache";
import type { Cell } from "./cell";
import { formationCapacity } from "./formation-species";
import { outside } from "./property";
import type { ChosenFit, ReactionSets } from "./reaction-sets";
import { formulaOf, refuseMixture, textOf } from "./reaction-species";
import { type FitUncertainty, fitUncertainty } from "./reaction-uncertainty";

/** A part with the fit its numbers come from. */
export interface FittedPart extends ReactionPart {
  readonly fit: SpeciesFit;
  readonly published: FitUncertainty;
}

export interface Reaction {
  /** The equation as understood, `CH4 + 2 O2 = CO2 + 2 H2O`. */
  readonly text: string;
  readonly parts: readonly FittedPart[];
}

const known = new BoundedCache<BoundedCache<Reaction>>(100);

/** The reaction of a cell with the sets chosen. */
export function reactionOf(cell: Cell | undefined, sets: ReactionSets): Reaction {
  const text = equationCell(cell);
  return known.at(sets.key, () => new BoundedCache<Reaction>(500)).at(text, () => read(text, sets));
}

/** The text of an equation in a cell. */
export function equationCell(cell: Cell | undefined): string {
  if (typeof cell === "string") return cell.trim();
  if (cell === undefined || cell === null) return refuse('The equation is missing: give a text such as "CH4 + 2 O2 = CO2 + 2 H2O"');
  return refuse(`The equation is ${quoted(cell)}; give a text such as "CH4 + 2 O2 = CO2 + 2 H2O"`);
}

/** Refuses a temperature outside the range that the parts share, with the reminder of °C where the number would fit. */
export function requireInside(parts: readonly ReactionPart[], temperature: number): void {
  const limit = limiting(parts, temperature);
  if (limit) throw outside(limit, temperature);
}

interface FittedTerm extends Term, ChosenFit {
  readonly counts: ReadonlyMap<string, number>;
}

function read(text: string, sets: ReactionSets): Reaction {
  const equation = parseEquation(text);
  const fitted = ({ coefficient, species }: Term): FittedTerm => {
    const chosen = fitOfTerm(species, sets);
    return { coefficient, species, ...chosen, counts: parseFormula(chosen.fit.formula).counts };
  };
  const [left, right] = [equation.left.map(fitted), equation.right.map(fitted)];
  requireBalanced(equation, left, right);
  return { text: equationText(equation), parts: partsOf(left, right) };
}

function fitOfTerm(species: string, sets: ReactionSets): ChosenFit {
  const formula = formulaOf(species);
  if (formula && formula.charge !== 0)
    refuseAbsent(`${species} carries a charge, and the library has no energies of ions and electrons; REACTION.BALANCE balances them`);
  if (formula?.suffix?.startsWith("aq")) refuseAbsent(`${species} is in solution, and the library has no energies of solutions`);
  refuseMixture(species);
  return sets.of(species);
}

/** Refuses an equation that does not conserve its atoms as written; if numbers can mend it, the sentence ends with them. */
function requireBalanced(equation: Equation, left: readonly FittedTerm[], right: readonly FittedTerm[]): void {
  const counted = (terms: readonly FittedTerm[]): Counted[] => terms.map(({ coefficient, counts }) => ({ coefficient, counts, charge: 0 }));
  const found = imbalances(counted(left), counted(right));
  if (found.length === 0) return;
  const atoms = found.map(({ what, left: here, right: there }) => `${what} ${printed(here)} on the left, ${printed(there)} on the right`);
  refuse(`"${equationText(equation)}" is not balanced: ${atoms.join("; ")}${mended(left, right)}`);
}

function mended(left: readonly FittedTerm[], right: readonly FittedTerm[]): string {
  const participants = (terms: readonly FittedTerm[]) =>
    terms.map(({ species, fit, counts }) => ({ species, identity: fit.species, counts, charge: 0 }));
  try {
    return `; balanced it is ${textOf(balance(participants(left), participants(right)))}`;
  } catch (thrown) {
    if (thrown instanceof Refusal) return "";
    throw thrown;
  }
}

/** One part for each species, however often and on whichever side it stands. */
function partsOf(left: readonly FittedTerm[], right: readonly FittedTerm[]): FittedPart[] {
  const species = new Map([...left, ...right].map((term) => [term.fit.species, term]));
  const amount = (terms: readonly FittedTerm[], key: string) =>
    terms.filter(({ fit }) => fit.species === key).reduce((sum, { coefficient }) => sum + coefficient, 0);
  return [...species].map(([key, { fit, extrapolate }]) => {
    const published = fitUncertainty(fit);
    return {
      name: key,
      left: amount(left, key),
      right: amount(right, key),
      capacity: formationCapacity(fit, extrapolate),
      uncertainty: published.joules,
      fit,
      published,
    };
  });
}
