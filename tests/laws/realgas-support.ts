/**
 * The cubic equations once more, written as in the papers and without a closed integral, for laws to compare with; derivatives by
 * extrapolated differences; gases and mixtures to try.
 */
import fc from "fast-check";
import { GAS_CONSTANT } from "../../src/core/constants";
import { gaussLegendre, integrate } from "../../src/core/numeric/gauss-legendre";
import type { CubicGas } from "../../src/core/realgas/cubic-gas";
import { pairOf } from "../../src/data/critical";
import { EQUATIONS, mixtureOf } from "../core/realgas/gases";

const R = GAS_CONSTANT;
const QUADRATURE = gaussLegendre(48);

/** P, Pa, with a and b summed pair by pair: a_ij = √(a_i a_j) (1 − k_ij). */
export function pressureAsWritten(gas: CubicGas, temperature: number, volume: number): number {
  const { form, parts } = gas;
  const of = parts.map(({ fraction, critical }) => {
    const { temperature: tc, pressure: pc, acentric: w } = critical;
    const m = form.m[0]! + form.m[1]! * w + form.m[2]! * w ** 2;
    const root = 1 + m * (1 - Math.sqrt(temperature / tc));
    return {
      fraction,
      name: critical.species,
      b: (form.omegaB * R * tc) / pc,
      rootA: Math.sqrt((form.omegaA * (R * tc) ** 2) / pc) * root,
    };
  });
  const b = of.reduce((sum, one) => sum + one.fraction * one.b, 0);
  let a = 0;
  for (const one of of)
    for (const other of of) {
      const k = one === other ? 0 : (pairOf(one.name, other.name)?.kij ?? 0);
      a += one.fraction * other.fraction * one.rootA * other.rootA * (1 - k);
    }
  return (R * temperature) / (volume - b) - a / ((volume + form.d1 * b) * (volume + form.d2 * b));
}

/** ∫ f dv from v to infinity, in density x = 1/v: f must fall with x² at least. */
export function outward(f: (volume: number) => number, volume: number): number {
  return integrate((x) => f(1 / x) / (x * x), 0, 1 / volume, QUADRATURE);
}

/** Residual Helmholtz energy, J/mol, at T and v: ∫ (P − R T/v) dv to infinity, of the pressure as written. */
export function helmholtzByQuadrature(gas: CubicGas, temperature: number, volume: number): number {
  return outward((v) => pressureAsWritten(gas, temperature, v) - (R * temperature) / v, volume);
}

/** f′(x): central differences with the steps h, h/2, h/4, h/8, extrapolated to 0. */
export function derivative(f: (x: number) => number, x: number, h: number): number {
  return extrapolated((step) => (f(x + step) - f(x - step)) / (2 * step), h);
}

/** f″(x), likewise. */
export function secondDerivative(f: (x: number) => number, x: number, h: number): number {
  const middle = f(x);
  return extrapolated((step) => (f(x + step) - 2 * middle + f(x - step)) / (step * step), h);
}

function extrapolated(difference: (step: number) => number, h: number): number {
  let row = [1, 2, 4, 8].map((share) => difference(h / share));
  for (let power = 4; row.length > 1; power *= 4) row = row.slice(1).map((finer, i) => finer + (finer - row[i]!) / (power - 1));
  return row[0]!;
}

const NAMES = ["N2", "O2", "CO2", "CO", "CH4", "C2H6", "C3H8", "n-C4H10", "H2", "H2S", "NH3", "H2O", "Ar", "n-C7H16"] as const;

/** Amounts by name; every part counts, but one may be a trace. */
export const fractionsOf = (least: number, most: number): fc.Arbitrary<Record<string, number>> =>
  fc.uniqueArray(fc.constantFrom(...NAMES), { minLength: least, maxLength: most }).chain((names) =>
    fc.tuple(...names.map(() => fc.double({ min: 0.001, max: 1, noNaN: true }))).map((amounts) => {
      const total = amounts.reduce((sum, amount) => sum + amount, 0);
      return Object.fromEntries(names.map((name, i) => [name, amounts[i]! / total]));
    }),
  );

/** A pure gas or a mixture of up to `most`, by either equation. */
export const gasOf = (least: number, most: number): fc.Arbitrary<CubicGas> =>
  fc.tuple(fractionsOf(least, most), fc.constantFrom(...EQUATIONS)).map(([fractions, equation]) => mixtureOf(fractions, equation));

export const temperature = fc.double({ min: 150, max: 1500, noNaN: true });
/** v/b, by its logarithm from 1.25, a liquid, to 1000, a thin gas. */
export const looseness = fc.double({ min: Math.log(1.25), max: Math.log(1000), noNaN: true }).map(Math.exp);
