import type { Phase } from "../species/types";
import { refuse } from "../refusal";
import type { Capacity } from "./capacity";
import { entropyAt, entropyRow, INTEGRAL_TERMS, integralAt, integralRow, type LaurentInterval, TERMS, valueAt, valueRow } from "./laurent";

/** What a capacity is besides its numbers. */
export interface CapacityHead {
  readonly phase: Phase;
  readonly fromLabel: string;
  readonly toLabel: string;
  readonly standardPressure: number;
  readonly onFormationScale: boolean;
  readonly hasEntropy: boolean;
  /** R of the fit for a gas, 0 for condensed species, J/(mol K). */
  readonly gasConstant: number;
}

/**
 * A capacity made of Laurent polynomials on adjoining intervals: every published fit but the molecular form and odd exponents, and every
 * mixture of such fits.
 *
 * At a joint the interval that ends there is used. Published fits meet at their joints within the printed digits, so tables cannot show
 * which side was taken; at a listed transition it is the low-temperature form, heated up to the transition and not yet through it.
 *
 * Cv has coefficients of its own, with R already taken away, so that Cv costs what Cp costs.
 */
export class PiecewiseCapacity implements Capacity {
  readonly phase: Phase;
  readonly from: number;
  readonly to: number;
  readonly fromLabel: string;
  readonly toLabel: string;
  readonly joints: readonly number[];
  readonly standardPressure: number;
  readonly onFormationScale: boolean;
  readonly hasEntropy: boolean;
  readonly gasConstant: number;
  /** Upper limits of the intervals, K, rising. */
  private readonly ends: Float64Array;
  private readonly cpRows: Float64Array;
  private readonly cvRows: Float64Array;
  private readonly enthalpyRows: Float64Array;
  private readonly energyRows: Float64Array;
  private readonly entropyRows: Float64Array;
  private readonly hasInversePowers: boolean;

  /** Takes adjoining intervals in rising order (checked by whoever reads them in). */
  constructor(
    head: CapacityHead,
    readonly intervals: readonly LaurentInterval[],
  ) {
    const last = intervals.length - 1;
    this.phase = head.phase;
    this.from = intervals[0]!.from;
    this.to = intervals[last]!.to;
    this.fromLabel = head.fromLabel;
    this.toLabel = head.toLabel;
    this.joints = intervals.slice(0, last).map((interval) => interval.to);
    this.standardPressure = head.standardPressure;
    this.onFormationScale = head.onFormationScale;
    this.hasEntropy = head.hasEntropy;
    this.gasConstant = head.gasConstant;
    this.ends = Float64Array.from(intervals, (interval) => interval.to);
    this.cpRows = Float64Array.from(intervals.flatMap((interval) => valueRow(interval.cp, 0)));
    this.cvRows = Float64Array.from(intervals.flatMap((interval) => valueRow(interval.cp, head.gasConstant)));
    this.enthalpyRows = Float64Array.from(intervals.flatMap((interval) => integralRow(interval, 0)));
    this.energyRows = Float64Array.from(intervals.flatMap((interval) => integralRow(interval, head.gasConstant)));
    this.entropyRows = Float64Array.from(intervals.flatMap(entropyRow));
    this.hasInversePowers = intervals.some((interval) => interval.cp[0] !== 0 || interval.cp[1] !== 0);
  }

  cp(temperature: number): number {
    return this.holds(temperature) ? valueAt(this.cpRows, this.intervalAt(temperature) * TERMS, temperature) : NaN;
  }

  cv(temperature: number): number {
    return this.holds(temperature) ? valueAt(this.cvRows, this.intervalAt(temperature) * TERMS, temperature) : NaN;
  }

  enthalpy(temperature: number): number {
    return this.holds(temperature) ? integralAt(this.enthalpyRows, this.intervalAt(temperature) * INTEGRAL_TERMS, temperature) : NaN;
  }

  energy(temperature: number): number {
    return this.holds(temperature) ? integralAt(this.energyRows, this.intervalAt(temperature) * INTEGRAL_TERMS, temperature) : NaN;
  }

  entropy(temperature: number): number {
    return this.holds(temperature) ? entropyAt(this.entropyRows, this.intervalAt(temperature) * INTEGRAL_TERMS, temperature) : NaN;
  }

  /**
   * The bare loop. The coefficients of one interval stay in registers for as long as the temperatures stay inside it, and a fit without
   * inverse powers never divides. Both bodies repeat `valueAt`, operation for operation, so that a range and a cell give the same bits.
   */
  cvInto(temperatures: Float64Array, out: Float64Array): void {
    if (out.length < temperatures.length) refuse(`${temperatures.length} temperatures do not fit into ${out.length} places`);
    if (this.hasInversePowers) this.cvWithInversePowers(temperatures, out);
    else this.cvPolynomial(temperatures, out);
  }

  private cvPolynomial(temperatures: Float64Array, out: Float64Array): void {
    const rows = this.cvRows;
    let above = Infinity;
    let upTo = -Infinity;
    let c0 = 0,
      c1 = 0,
      c2 = 0,
      c3 = 0,
      c4 = 0;
    for (let i = 0; i < temperatures.length; i++) {
      const t = temperatures[i]!;
      if (!(t > above && t <= upTo)) {
        if (!this.holds(t)) {
          out[i] = NaN;
          continue;
        }
        const interval = this.intervalAt(t);
        const at = interval * TERMS;
        above = this.exclusiveLower(interval);
        upTo = this.ends[interval]!;
        c0 = rows[at + 2]!;
        c1 = rows[at + 3]!;
        c2 = rows[at + 4]!;
        c3 = rows[at + 5]!;
        c4 = rows[at + 6]!;
      }
      out[i] = (((c4 * t + c3) * t + c2) * t + c1) * t + c0;
    }
  }

  private cvWithInversePowers(temperatures: Float64Array, out: Float64Array): void {
    const rows = this.cvRows;
    let above = Infinity;
    let upTo = -Infinity;
    let m2 = 0,
      m1 = 0,
      c0 = 0,
      c1 = 0,
      c2 = 0,
      c3 = 0,
      c4 = 0;
    for (let i = 0; i < temperatures.length; i++) {
      const t = temperatures[i]!;
      if (!(t > above && t <= upTo)) {
        if (!this.holds(t)) {
          out[i] = NaN;
          continue;
        }
        const interval = this.intervalAt(t);
        const at = interval * TERMS;
        above = this.exclusiveLower(interval);
        upTo = this.ends[interval]!;
        m2 = rows[at]!;
        m1 = rows[at + 1]!;
        c0 = rows[at + 2]!;
        c1 = rows[at + 3]!;
        c2 = rows[at + 4]!;
        c3 = rows[at + 5]!;
        c4 = rows[at + 6]!;
      }
      const inverse = 1 / t;
      out[i] = (((c4 * t + c3) * t + c2) * t + c1) * t + c0 + (m2 * inverse + m1) * inverse;
    }
  }

  private holds(temperature: number): boolean {
    return temperature >= this.from && temperature <= this.to;
  }

  /** Number of the interval that holds a temperature inside [from, to]. */
  private intervalAt(temperature: number): number {
    const ends = this.ends;
    const last = ends.length - 1;
    let interval = 0;
    while (interval < last && temperature > ends[interval]!) interval++;
    return interval;
  }

  /** The loops test `t > above`; the first interval, which holds its own lower limit, is only ever left through the full test. */
  private exclusiveLower(interval: number): number {
    return interval === 0 ? this.from : this.ends[interval - 1]!;
  }
}
