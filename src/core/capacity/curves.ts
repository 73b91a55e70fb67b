import { refuse } from "../refusal";
import type { Phase } from "../species/types";
import type { Capacity } from "./capacity";
import type { CapacityHead } from "./piecewise";

/** Three curves of temperature (K), each valid for every T > 0 that the capacity admits. */
export interface Curves {
  /** J/(mol K). */
  cp(temperature: number): number;
  /** J/mol. */
  enthalpy(temperature: number): number;
  /** J/(mol K); NaN where not known. */
  entropy(temperature: number): number;
}

/**
 * A capacity that is not a Laurent polynomial: the molecular form, odd exponents, and mixtures that hold one of these.
 * Slower than the compiled form, with the same face.
 */
export class CurveCapacity implements Capacity {
  readonly phase: Phase;
  readonly fromLabel: string;
  readonly toLabel: string;
  readonly standardPressure: number;
  readonly onFormationScale: boolean;
  readonly hasEntropy: boolean;
  readonly gasConstant: number;

  constructor(
    head: CapacityHead,
    readonly from: number,
    readonly to: number,
    readonly joints: readonly number[],
    private readonly curves: Curves,
  ) {
    this.phase = head.phase;
    this.fromLabel = head.fromLabel;
    this.toLabel = head.toLabel;
    this.standardPressure = head.standardPressure;
    this.onFormationScale = head.onFormationScale;
    this.hasEntropy = head.hasEntropy;
    this.gasConstant = head.gasConstant;
  }

  cp(temperature: number): number {
    return this.holds(temperature) ? this.curves.cp(temperature) : NaN;
  }

  cv(temperature: number): number {
    return this.holds(temperature) ? this.curves.cp(temperature) - this.gasConstant : NaN;
  }

  enthalpy(temperature: number): number {
    return this.holds(temperature) ? this.curves.enthalpy(temperature) : NaN;
  }

  energy(temperature: number): number {
    return this.holds(temperature) ? this.curves.enthalpy(temperature) - this.gasConstant * temperature : NaN;
  }

  entropy(temperature: number): number {
    return this.hasEntropy && this.holds(temperature) ? this.curves.entropy(temperature) : NaN;
  }

  cvInto(temperatures: Float64Array, out: Float64Array): void {
    if (out.length < temperatures.length) refuse(`${temperatures.length} temperatures do not fit into ${out.length} places`);
    for (let i = 0; i < temperatures.length; i++) out[i] = this.cv(temperatures[i]!);
  }

  private holds(temperature: number): boolean {
    return temperature >= this.from && temperature <= this.to;
  }
}
