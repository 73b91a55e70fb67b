import type { Phase } from "../species/types";

/**
 * The one face of every heat capacity, whatever published form stands behind it, and of every compiled mixture.
 *
 *   Cp, Cv  J/(mol K)     S  J/(mol K) at the standard pressure
 *   H, U    J/mol; with formation if `onFormationScale`, else up to a constant
 *
 * Gases: Cv = Cp − R, U = H − RT, with the R of the fit. Condensed: Cv = Cp taken, U = H.
 * Every method gives NaN outside [from, to] (and for NaN): loops stay bare, and the caller who shows a number to a person
 * asks `explainTemperature` for the sentence. No method extrapolates.
 */
export interface Capacity {
  readonly phase: Phase;
  /** Lower limit of validity, K. */
  readonly from: number;
  /** Upper limit of validity, K. */
  readonly to: number;
  /** Who sets the lower limit: `gri-1999 for CO2`. */
  readonly fromLabel: string;
  /** Who sets the upper limit. */
  readonly toLabel: string;
  /** Joints between intervals, K, inside (from, to). */
  readonly joints: readonly number[];
  /** Pressure to which the entropy belongs, Pa. */
  readonly standardPressure: number;
  /** True if H and U include the enthalpy of formation. */
  readonly onFormationScale: boolean;
  /** True if S is known. */
  readonly hasEntropy: boolean;
  /** Gas constant inside U = H − RT, J/(mol K): R of the fit for a gas, 0 for condensed species. */
  readonly gasConstant: number;
  cp(temperature: number): number;
  cv(temperature: number): number;
  enthalpy(temperature: number): number;
  energy(temperature: number): number;
  entropy(temperature: number): number;
  /** Cv over many temperatures: out[i] = cv(temperatures[i]), bit for bit what `cv` gives. */
  cvInto(temperatures: Float64Array, out: Float64Array): void;
}
