import { refuse } from "../refusal";
import type { SpeciesFit } from "../species/types";
import { anchored } from "./anchor";
import type { Capacity } from "./capacity";
import { CONSTANT_TERM, type PrintedInterval } from "./laurent";
import { molecular } from "./molecular/molecular";
import { nineTerm } from "./nine-term";
import { PiecewiseCapacity } from "./piecewise";
import { asLaurent, type PowerInterval, powerTerms } from "./power";
import { powerSum } from "./power-sum";
import { checkFit, headOf, labelOf } from "./printed";
import { sevenTerm } from "./seven-term";
import { shomate } from "./shomate";

export type { Capacity } from "./capacity";

/**
 * The heat capacity of one published fit, whatever its form, behind the one face of `Capacity`.
 *
 * In a Cv block of a gas the printed polynomial is Cv; Cp is Cv + R. Integration constants printed in such a block are not used,
 * because it is not said whether they belong to U or H: its zero is the formation enthalpy and the entropy at 298.15 K.
 *
 * Refuses a fit that cannot be evaluated: intervals that do not join, blank or too many coefficients, an unknown form.
 */
export function capacityOf(fit: SpeciesFit): Capacity {
  checkFit(fit);
  if (fit.form === "molecular") return molecular(fit);
  if (fit.form === "power") return power(fit);
  return polynomial(printedIntervals(fit), fit);
}

function printedIntervals(fit: SpeciesFit): PrintedInterval[] {
  switch (fit.form) {
    case "nine-term":
      return nineTerm(fit);
    case "seven-term":
      return sevenTerm(fit);
    case "shomate":
      return shomate(fit);
    default:
      return refuse(`"${fit.form}" of ${labelOf(fit)} is not a form; the forms are nine-term, seven-term, shomate, power, molecular`);
  }
}

function power(fit: SpeciesFit): Capacity {
  const intervals = powerTerms(fit);
  const laurent = asLaurent(intervals);
  return laurent === undefined
    ? powerSum(
        intervals.map((interval) => powerFromCv(interval, fit)),
        fit,
      )
    : polynomial(laurent, fit);
}

function polynomial(printed: readonly PrintedInterval[], fit: SpeciesFit): Capacity {
  const { intervals, onFormationScale, hasEntropy } = anchored(
    fit.quantity === "Cv" ? printed.map((interval) => fromCv(interval, fit)) : printed,
    fit,
  );
  return new PiecewiseCapacity(headOf(fit, onFormationScale, hasEntropy), intervals);
}

/** R of the fit for a gas; condensed species have Cp = Cv. */
function differenceOf(fit: SpeciesFit): number {
  return fit.phase === "g" ? fit.gasConstant : 0;
}

function fromCv(interval: PrintedInterval, fit: SpeciesFit): PrintedInterval {
  const cp = interval.cp.map((coefficient, k) => (k === CONSTANT_TERM ? coefficient + differenceOf(fit) : coefficient));
  return { ...interval, cp, enthalpyConstant: null, entropyConstant: null };
}

function powerFromCv(interval: PowerInterval, fit: SpeciesFit): PowerInterval {
  if (fit.quantity !== "Cv") return interval;
  return { ...interval, terms: [...interval.terms, { exponent: 0, coefficient: differenceOf(fit) }] };
}
