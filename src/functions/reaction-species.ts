/**
 * What a term of an equation names, for balancing: any formula with its charge, or a name of the library (`carbon dioxide`).
 * No thermodynamic data are needed.
 */
import { balance, type BalancedEquation, type Participant } from "../core/reaction/balance";
import { type Equation, parseEquation, sideText } from "../core/reaction/equation";
import { Refusal, refuse } from "../core/refusal";
import { type Formula, hill, parseFormula } from "../core/species/formula";
import { findSpecies, namedMixture, type SpeciesEntry } from "../data/library";
import { speciesOfKey } from "../data/species";
import { refuseUnclearCharge } from "./reaction-charges";

/** The species of a term with its atoms. Refuses what is neither a formula nor a name of the library. */
export function participantOf(text: string): Participant {
  refuseMixture(text);
  refuseUnclearCharge(text);
  const formula = speciesOfKey(text) ? undefined : formulaOf(text);
  if (formula) return { species: text, identity: identityOfFormula(formula), counts: formula.counts, charge: formula.charge };
  const entry = namedSpecies(text);
  return { species: text, identity: identityOfEntry(entry), counts: parseFormula(entry.formula).counts, charge: 0 };
}

/** An equation is of species: a named mixture such as air has no formula. */
export function refuseMixture(text: string): void {
  if (namedMixture(text)) refuse(`"${text}" is a mixture; an equation names single species, such as "O2 + 3.76 N2" for air`);
}

/** The formula of a text, or undefined if it is not one. */
export function formulaOf(text: string): Formula | undefined {
  try {
    return parseFormula(text);
  } catch (thrown) {
    if (thrown instanceof Refusal) return undefined;
    throw thrown;
  }
}

/** A name of the library. Of a text that looks like a formula the refusal says what is wrong with the formula. */
function namedSpecies(text: string): SpeciesEntry {
  try {
    return findSpecies(text);
  } catch (thrown) {
    if (thrown instanceof Refusal && thrown.kind === "absent" && /[A-Z[({]/.test(text[0]!) && !/\s/.test(text)) parseFormula(text);
    throw thrown;
  }
}

/** The gas and a formula without phase are one; solids of every kind are one, unless the library tells them apart by name. */
function identityOfFormula(formula: Formula): string {
  const { phase, suffix } = formula;
  const ending = phase === "g" ? undefined : (phase ?? suffix);
  return hill(formula) + (ending === undefined ? "" : `(${ending})`);
}

function identityOfEntry({ key, formula, phase }: SpeciesEntry): string {
  const plain = phase === "g" ? formula : `${formula}(${phase})`;
  try {
    return findSpecies(plain).key === key ? identityOfFormula(parseFormula(plain)) : key;
  } catch (thrown) {
    if (thrown instanceof Refusal) return key;
    throw thrown;
  }
}

/** The equation balanced, `2 H2 + O2 = 2 H2O`; coefficients that were written do not count. */
export function balancedText(text: string): string {
  const equation = parseEquation(text);
  return textOf(balance(participants(equation.left), participants(equation.right)));
}

function participants(terms: Equation["left"]): Participant[] {
  return terms.map(({ species }) => participantOf(species));
}

/** A balanced equation as text. */
export function textOf({ left, right }: BalancedEquation): string {
  return `${sideText(left)} = ${sideText(right)}`;
}
