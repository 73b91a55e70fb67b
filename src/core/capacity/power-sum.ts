import { REFERENCE_TEMPERATURE } from "../constants";
import type { SpeciesFit } from "../species/types";
import { CurveCapacity, type Curves } from "./curves";
import type { PowerInterval, PowerTerm } from "./power";
import { headOf } from "./printed";

/**
 * The power form with exponents a Laurent polynomial cannot hold (−0.5, 5, …):
 *
 *   H = Σ a T^(n+1)/(n+1), a ln T where n = −1;   S = Σ a T^n/n, a ln T where n = 0
 *
 * H and S run through the joints without a step; the values at 298.15 K, where 298.15 K lies in the range, fix their zeros.
 */
export function powerSum(intervals: readonly PowerInterval[], fit: SpeciesFit): CurveCapacity {
  const from = intervals[0]!.from;
  const to = intervals[intervals.length - 1]!.to;
  const reaches = REFERENCE_TEMPERATURE >= from && REFERENCE_TEMPERATURE <= to;
  const zero = reaches ? REFERENCE_TEMPERATURE : from;
  const enthalpy = runningIntegral(intervals, enthalpyTerm);
  const entropy = runningIntegral(intervals, entropyTerm);
  const enthalpyShift = (reaches ? (fit.formationEnthalpy ?? 0) : 0) - enthalpy(zero);
  const hasEntropy = reaches && fit.entropy298 !== null;
  const entropyShift = hasEntropy ? fit.entropy298! - entropy(zero) : NaN;
  const curves: Curves = {
    cp: (t) => sum(at(intervals, t).terms, t, (term) => term.coefficient * t ** term.exponent),
    enthalpy: (t) => enthalpy(t) + enthalpyShift,
    entropy: (t) => entropy(t) + entropyShift,
  };
  const onFormationScale = (fit.onFormationScale ?? true) && reaches && fit.formationEnthalpy !== null;
  return new CurveCapacity(
    headOf(fit, onFormationScale, hasEntropy),
    from,
    to,
    intervals.slice(1).map((interval) => interval.from),
    curves,
  );
}

type Antiderivative = (term: PowerTerm, temperature: number) => number;

function enthalpyTerm({ exponent, coefficient }: PowerTerm, t: number): number {
  return exponent === -1 ? coefficient * Math.log(t) : (coefficient * t ** (exponent + 1)) / (exponent + 1);
}

function entropyTerm({ exponent, coefficient }: PowerTerm, t: number): number {
  return exponent === 0 ? coefficient * Math.log(t) : (coefficient * t ** exponent) / exponent;
}

/** An antiderivative that is continuous over the joints. */
function runningIntegral(intervals: readonly PowerInterval[], antiderivative: Antiderivative): (temperature: number) => number {
  const constants: number[] = [0];
  for (let k = 1; k < intervals.length; k++) {
    const joint = intervals[k]!.from;
    const jump = sum(intervals[k - 1]!.terms, joint, antiderivative) - sum(intervals[k]!.terms, joint, antiderivative);
    constants.push(constants[k - 1]! + jump);
  }
  return (t) => {
    const k = indexAt(intervals, t);
    return sum(intervals[k]!.terms, t, antiderivative) + constants[k]!;
  };
}

function sum(terms: readonly PowerTerm[], t: number, value: Antiderivative): number {
  let total = 0;
  for (const term of terms) total += value(term, t);
  return total;
}

function at(intervals: readonly PowerInterval[], t: number): PowerInterval {
  return intervals[indexAt(intervals, t)]!;
}

/** The interval that ends at a joint holds the joint. */
function indexAt(intervals: readonly PowerInterval[], t: number): number {
  let k = 0;
  while (k < intervals.length - 1 && t > intervals[k]!.to) k++;
  return k;
}
