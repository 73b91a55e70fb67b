/**
 * A gas of fixed amount and composition in a fixed volume, v = V/n:
 *
 *   P = P(T, v) of the ideal gas or of a cubic equation of state,   U = n (U of the ideal gas + u residual),   C = n (Cv + cv residual)
 *
 * The ideal parts come with the gas constant of their fit (capacity.ts), P with the exact one. A pure gas of a cubic equation may be liquid
 * and vapour side by side, or liquid that fills the vessel; the state says so. T in K, V in m³, n in mol, P in Pa, U in J.
 */
import type { Capacity } from "../capacity/capacity";
import { explainTemperature } from "../capacity/range";
import { GAS_CONSTANT } from "../constants";
import { root } from "../numeric/root";
import type { CubicGas } from "../realgas/cubic-gas";
import { criticalVolume, cubicSaturation, LOWEST_REDUCED } from "../realgas/saturation";
import { type CubicState, cubicState, type GasPhase, idealPressure } from "../realgas/state";
import { printed, refuseRange } from "../refusal";
import type { Content, ContentState } from "./types";

export interface GasState extends ContentState {
  readonly phase: GasPhase | "ideal gas";
  /** P V/(n R T). */
  readonly compressibility: number;
  /** (∂U/∂T) at constant volume, J/K. */
  readonly heatCapacity: number;
  /** Vapour pressure by the equation of a pure gas below its critical temperature, Pa. */
  readonly vapourPressure?: number;
  /** Share of the amount that is vapour; only where there are two phases. */
  readonly vapourFraction?: number;
}

const IDEAL = { phase: "ideal gas", residualEnergy: 0, residualCv: 0 } as const;
const NOTHING = { energy: NaN, heatCapacity: NaN } as const;
/** Nearer to the critical temperature than this share, the end of two phases is taken as the critical point. */
const NEAR_CRITICAL = 1e-7;

export class GasContent implements Content<GasState> {
  readonly from: number;
  readonly to: number;
  readonly fromLabel: string;
  readonly toLabel: string;
  readonly molarVolume: number;
  private end: number | "none" | undefined;

  /** Without `gas` the ideal gas. Refuses an amount or a volume that is not above 0. */
  constructor(
    readonly capacity: Capacity,
    readonly amount: number,
    readonly volume: number,
    readonly gas?: CubicGas,
  ) {
    if (!(amount > 0 && amount < Infinity)) refuseRange(`Amount ${printed(amount)} mol is not above 0 mol`);
    if (!(volume > 0 && volume < Infinity)) refuseRange(`Volume ${printed(volume)} m3 is not above 0 m3`);
    ({ from: this.from, to: this.to, fromLabel: this.fromLabel, toLabel: this.toLabel } = capacity);
    this.molarVolume = volume / amount;
    const { parts = [], criticalTemperature = 0, form } = gas ?? {};
    // A pure gas has no state where its equation tells no vapour pressure.
    if (parts.length !== 1 || this.from >= LOWEST_REDUCED * criticalTemperature) return;
    this.from = LOWEST_REDUCED * criticalTemperature;
    this.fromLabel = `${form!.title} for ${parts[0]!.critical.species}`;
  }

  /** Refuses a temperature outside the range of the heat capacity, and what the equation of state cannot say. */
  at(temperature: number): GasState {
    const { amount, molarVolume } = this;
    const energy = this.capacity.energy(temperature);
    if (!Number.isFinite(energy)) throw explainTemperature(this.capacity, temperature);
    const real: CubicState | (typeof IDEAL & { readonly pressure: number; vapourPressure?: number; vapourFraction?: number }) = this.gas
      ? cubicState(this.gas, temperature, molarVolume)
      : { ...IDEAL, pressure: idealPressure(temperature, molarVolume) };
    return {
      temperature,
      pressure: real.pressure,
      energy: amount * (energy + real.residualEnergy),
      phase: real.phase,
      compressibility: (real.pressure * molarVolume) / (GAS_CONSTANT * temperature),
      heatCapacity: amount * (this.capacity.cv(temperature) + real.residualCv),
      vapourPressure: real.vapourPressure,
      vapourFraction: real.vapourFraction,
    };
  }

  /**
   * Energy, J, and heat capacity, J/K, on the way of a search: a mixture is taken as one phase, whether it is one is asked of the answer.
   * NaN outside the range of the heat capacity.
   */
  trial(temperature: number): { energy: number; heatCapacity: number } {
    const { amount, molarVolume, gas, capacity } = this;
    if (gas === undefined || gas.parts.length === 1) return Number.isFinite(capacity.energy(temperature)) ? this.at(temperature) : NOTHING;
    return {
      energy: amount * (capacity.energy(temperature) + gas.residualEnergy(temperature, molarVolume)),
      heatCapacity: amount * (capacity.cv(temperature) + gas.residualCv(temperature, molarVolume)),
    };
  }

  /** The temperature, K, up to which a pure gas is liquid and vapour in this volume; undefined if it never is. */
  get twoPhasesUpTo(): number | undefined {
    this.end ??= this.gas?.parts.length === 1 ? (endOfTwoPhases(this.gas, this.molarVolume, this.from) ?? "none") : "none";
    return this.end === "none" ? undefined : this.end;
  }

  get kinks(): readonly number[] {
    const end = this.twoPhasesUpTo;
    return end === undefined || end <= this.from || end >= this.to ? [] : [end];
  }
}

/** Where the overall volume equals that of the saturated vapour (thin) or of the saturated liquid (dense). */
function endOfTwoPhases(gas: CubicGas, volume: number, from: number): number | undefined {
  const low = Math.max(from, LOWEST_REDUCED * gas.criticalTemperature);
  const high = gas.criticalTemperature * (1 - NEAR_CRITICAL);
  if (low >= high) return undefined;
  const isThin = volume > criticalVolume(gas);
  const excess = (temperature: number) => {
    const { liquid, vapour } = cubicSaturation(gas, temperature)!;
    return isThin ? Math.log(vapour / volume) : Math.log(volume / liquid);
  };
  if (excess(low) <= 0) return undefined;
  return excess(high) >= 0
    ? gas.criticalTemperature
    : root(excess, low, high, { what: "The end of two phases", unit: " K", tolerance: 1e-9 });
}
