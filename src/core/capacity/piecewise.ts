import type { Phase } from "../species/types";
import { refuse } from "../refusal";
import type { Capacity } from "./capacity";
import { cancels, carefulEntropyAt, carefulIntegralAt } from "./careful";
import { type CvRun, runPolynomial, runWithInversePowers } from "./cv-run";
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
  /** Lower limit, upper limits of the intervals, infinity: a temperature between limits[k − 1] and limits[k] uses row k. */
  private readonly limits: Float64Array;
  /** Coefficients, one row for each interval, between two rows of NaN for temperatures below and above the range. */
  private readonly cpRows: Float64Array;
  private readonly cvRows: Float64Array;
  private readonly enthalpyRows: Float64Array;
  private readonly energyRows: Float64Array;
  private readonly entropyRows: Float64Array;
  /** 1 for rows whose H, U and S are summed with 32 digits because nearly everything in them cancels. */
  private readonly careful: Uint8Array;
  private readonly run: CvRun;

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
    this.limits = Float64Array.from([this.from, ...intervals.map((interval) => interval.to), Infinity]);
    this.cpRows = fenced(intervals.map((interval) => valueRow(interval.cp, 0)));
    this.cvRows = fenced(intervals.map((interval) => valueRow(interval.cp, head.gasConstant)));
    this.enthalpyRows = fenced(intervals.map((interval) => integralRow(interval, 0)));
    this.energyRows = fenced(intervals.map((interval) => integralRow(interval, head.gasConstant)));
    this.entropyRows = fenced(intervals.map(entropyRow));
    this.careful = Uint8Array.from([0, ...intervals.map((interval) => (cancels(interval, head.gasConstant) ? 1 : 0)), 0]);
    this.run = intervals.some((interval) => interval.cp[0] !== 0 || interval.cp[1] !== 0) ? runWithInversePowers : runPolynomial;
  }

  cp(temperature: number): number {
    return valueAt(this.cpRows, this.rowOf(temperature) * TERMS, temperature);
  }

  cv(temperature: number): number {
    return valueAt(this.cvRows, this.rowOf(temperature) * TERMS, temperature);
  }

  enthalpy(temperature: number): number {
    const row = this.rowOf(temperature);
    const at = row * INTEGRAL_TERMS;
    return this.careful[row] === 1 ? carefulIntegralAt(this.enthalpyRows, at, temperature) : integralAt(this.enthalpyRows, at, temperature);
  }

  energy(temperature: number): number {
    const row = this.rowOf(temperature);
    const at = row * INTEGRAL_TERMS;
    return this.careful[row] === 1 ? carefulIntegralAt(this.energyRows, at, temperature) : integralAt(this.energyRows, at, temperature);
  }

  entropy(temperature: number): number {
    const row = this.rowOf(temperature);
    const at = row * INTEGRAL_TERMS;
    return this.careful[row] === 1 ? carefulEntropyAt(this.entropyRows, at, temperature) : entropyAt(this.entropyRows, at, temperature);
  }

  cvInto(temperatures: Float64Array, out: Float64Array): void {
    if (out.length < temperatures.length) refuse(`${temperatures.length} temperatures do not fit into ${out.length} places`);
    let done = 0;
    while (done < temperatures.length) {
      const row = this.rowOf(temperatures[done]!);
      const inside = row > 0 && row < this.limits.length - 1;
      if (!inside) out[done++] = NaN;
      else done = this.run(temperatures, out, done, this.above(row), this.limits[row]!, this.cvRows, row * TERMS);
    }
  }

  /** What the temperatures of a row lie above, K; the first row holds its own lower limit, so for it that is the double just below. */
  private above(row: number): number {
    return row === 1 ? this.from * (1 - Number.EPSILON / 2) : this.limits[row - 1]!;
  }

  /** Row of a temperature; the rows of NaN, the first and the last, take what lies outside the range and what is not a number. */
  private rowOf(temperature: number): number {
    const limits = this.limits;
    let row = temperature >= limits[0]! ? 1 : 0;
    while (temperature > limits[row]!) row++;
    return row;
  }
}

/** The rows end to end, with a row of NaN before and after them. */
function fenced(rows: readonly (readonly number[])[]): Float64Array {
  const fence = rows[0]!.map(() => NaN);
  return Float64Array.from([fence, ...rows, fence].flat());
}
