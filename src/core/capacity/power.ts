import { CELSIUS_ZERO } from "../constants";
import { refuse } from "../refusal";
import type { SpeciesFit } from "../species/types";
import { CONSTANT_TERM, type PrintedInterval, TERMS } from "./laurent";
import { labelOf, numbersOf } from "./printed";

/** One interval as a sum of powers: Cp = Σ coefficient · T^exponent, T in K, J/(mol K). */
export interface PowerInterval {
  readonly from: number;
  readonly to: number;
  readonly terms: readonly PowerTerm[];
}

export interface PowerTerm {
  readonly exponent: number;
  readonly coefficient: number;
}

/** Highest exponent taken in °C: the expansion to kelvin loses digits beyond it. */
const MOST_CELSIUS_EXPONENT = 6;

/**
 * Power form of textbooks and of Kelley's and Berman's equations: Cp = Σ a[i] T^n[i] with any exponents, such as 0, 1, −2 or 0, −0.5, −2.
 * The exponents are `fit.exponents`, or 0, 1, 2, … if left out. If the temperature of the source is in °C, whole exponents from 0 up are
 * expanded to kelvin by the binomial theorem; a negative or broken power of a Celsius temperature has no closed entropy and is refused.
 */
export function powerTerms(fit: SpeciesFit): PowerInterval[] {
  return fit.intervals.map((interval, index) => {
    const exponents = fit.exponents ?? interval.coefficients.map((_, place) => place);
    if (exponents.length === 0) refuse(`${labelOf(fit)} has no exponents`);
    const coefficients = numbersOf(fit, index, exponents.length, exponents.length);
    const terms = coefficients.map((coefficient, place) => ({ exponent: exponents[place]!, coefficient: coefficient * fit.unitFactor }));
    const wrong = exponents.find((exponent) => !Number.isFinite(exponent) || Math.abs(exponent) > 12);
    if (wrong !== undefined) refuse(`The exponent ${wrong} of ${labelOf(fit)} is not between -12 and 12`);
    return { from: interval.from, to: interval.to, terms: fit.celsius ? inKelvin(terms, fit) : terms };
  });
}

/** (T − T0)^n = Σ binomial(n, k) T^k (−T0)^(n−k), T0 = 273.15 K. */
function inKelvin(terms: readonly PowerTerm[], fit: SpeciesFit): PowerTerm[] {
  const coefficients: number[] = [];
  for (const { exponent, coefficient } of terms) {
    if (!Number.isInteger(exponent) || exponent < 0 || exponent > MOST_CELSIUS_EXPONENT)
      refuse(
        `The exponent ${exponent} of ${labelOf(fit)} cannot be used with a temperature in °C; whole exponents from 0 to ${MOST_CELSIUS_EXPONENT} can`,
      );
    let binomial = 1;
    for (let k = exponent; k >= 0; k--) {
      coefficients[k] = (coefficients[k] ?? 0) + coefficient * binomial * (-CELSIUS_ZERO) ** (exponent - k);
      binomial = (binomial * k) / (exponent - k + 1);
    }
  }
  return Array.from(coefficients, (coefficient, exponent) => ({ exponent, coefficient: coefficient ?? 0 }));
}

/** The same intervals as Laurent polynomials, if every exponent is whole and between −2 and 4; else undefined. */
export function asLaurent(intervals: readonly PowerInterval[]): PrintedInterval[] | undefined {
  const fits = (term: PowerTerm) =>
    Number.isInteger(term.exponent + CONSTANT_TERM) && term.exponent >= -CONSTANT_TERM && term.exponent < TERMS - CONSTANT_TERM;
  if (!intervals.every((interval) => interval.terms.every(fits))) return undefined;
  return intervals.map(({ from, to, terms }) => {
    const cp = new Array<number>(TERMS).fill(0);
    for (const { exponent, coefficient } of terms) cp[exponent + CONSTANT_TERM] = cp[exponent + CONSTANT_TERM]! + coefficient;
    return { from, to, cp, enthalpyConstant: null, entropyConstant: null };
  });
}
