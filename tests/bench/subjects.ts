/** What is measured on: real coefficients of the library, and temperatures as a column of a worksheet holds them. */
import { capacityOf, type Capacity } from "../../src/core/capacity";
import { compileMixture } from "../../src/core/mixture/compile";
import type { SpeciesFit } from "../../src/core/species/types";
import { recordOf } from "../../src/data/library";

export const COUNT = 100_000;

export const nitrogen: SpeciesFit = recordOf("N2", "nasa-2002");

/** Ten gases of a combustion product, mole fractions of our own making that add up to 1. */
const shares: Readonly<Record<string, number>> = {
  N2: 0.7,
  CO2: 0.09,
  H2O: 0.12,
  O2: 0.04,
  CO: 0.02,
  H2: 0.01,
  NO: 0.005,
  OH: 0.005,
  Ar: 0.009,
  CH4: 0.001,
};

export function tenGases(): Capacity {
  return compileMixture(
    Object.entries(shares).map(([species, amount]) => ({ capacity: capacityOf(recordOf(species, "nasa-2002")), amount })),
  );
}

/** Rising temperatures through both intervals of the fit, 300 to 3000 K. */
export function rising(count = COUNT): Float64Array {
  return Float64Array.from({ length: count }, (_, i) => 300 + (2700 * i) / count);
}

/** The same temperatures in an order that changes interval at almost every step; the same order in every run. */
export function shuffled(count = COUNT): Float64Array {
  const temperatures = rising(count);
  let state = 12345;
  for (let i = count - 1; i > 0; i--) {
    state = (Math.imul(state, 1664525) + 1013904223) >>> 0;
    const j = state % (i + 1);
    [temperatures[i], temperatures[j]] = [temperatures[j]!, temperatures[i]!];
  }
  return temperatures;
}

/** Coefficients of Cv, J/(mol K), in rising powers from T^-2 to T^4, and the upper limit of each interval. */
export interface BareInterval {
  readonly to: number;
  readonly c: readonly number[];
}

/** The fit of the nine-term form as a person would write it down for a loop of his own. */
export function bareIntervals(fit: SpeciesFit): BareInterval[] {
  return fit.intervals.map(({ to, coefficients }) => ({
    to,
    c: coefficients.slice(0, 7).map((a, k) => fit.gasConstant * a! - (k === 2 ? fit.gasConstant : 0)),
  }));
}
