/**
 * A gas of fixed composition by a cubic equation of state: Peng and Robinson (1976), Soave (1972), see form.ts.
 *
 * One-fluid van der Waals mixing:  b = Σ x b_i,   a = Σ Σ x_i x_j √(a_i a_j) (1 − k_ij)
 * √a_i = p_i − q_i √T is a straight line in √T, so that the mixture has three numbers of its own and costs what one gas costs:
 *
 *   a(T) = A0 − 2 A1 √T + A2 T
 *
 * Residuals, the difference to the ideal gas at the same T and v, follow from P by integration over v with
 * L = ln((v + d1 b)/(v + d2 b))/((d1 − d2) b):
 *
 *   u = (T a′ − a) L = (A1 √T − A0) L      cv = T a″ L = A1 L/(2 √T)      s = R ln(1 − b/v) + a′ L
 *
 * Above T = (p_i/q_i)² the root of α is negative; its square is taken, as the equation is written: the attraction, almost gone, grows again.
 * T in K, v in m³/mol, P in Pa, J/mol, J/(mol K). Methods give NaN where v is not above b.
 */
import { GAS_CONSTANT } from "../constants";
import { refuse, refuseRange } from "../refusal";
import type { CriticalPoint, CubicForm, CubicPart } from "./form";
import { logarithmOf, logFugacityOf, pressureByVolumeOf, pressureOf } from "./one-fluid";

const R = GAS_CONSTANT;

/** What one gas brings into the sums. */
interface Share {
  readonly fraction: number;
  readonly b: number;
  readonly p: number;
  readonly q: number;
}

/** 1 − k_ij, row by row. */
type Factors = readonly (readonly number[])[];

export class CubicGas {
  /** Volume of the molecules, m³/mol. */
  readonly b: number;
  /** The highest critical temperature of the parts, K: of a pure gas its own. */
  readonly criticalTemperature: number;
  /** Temperature, K, at which the attraction of the first part to lose it is 0. */
  readonly attractionEnds: number;
  private readonly shares: readonly Share[];
  private readonly factors: Factors;
  private readonly a0: number;
  private readonly a1: number;
  private readonly a2: number;

  /**
   * `binary(i, j)` is k_ij of two parts. Refuses fractions that are negative or do not add up to 1 within 1e-6, and critical constants
   * that are not above 0.
   */
  constructor(
    readonly form: CubicForm,
    readonly parts: readonly CubicPart[],
    binary: (i: number, j: number) => number = () => 0,
    of?: CubicGas,
  ) {
    requireFractions(parts);
    this.shares = of ? parts.map(({ fraction }, i) => ({ ...of.shares[i]!, fraction })) : parts.map((part) => shareOf(form, part));
    this.factors = of?.factors ?? parts.map((_, i) => parts.map((__, j) => (i === j ? 1 : 1 - binary(i, j))));
    let [b, a0, a1, a2] = [0, 0, 0, 0];
    this.shares.forEach((one, i) => {
      b += one.fraction * one.b;
      this.shares.forEach((other, j) => {
        const weight = one.fraction * other.fraction * this.factors[i]![j]!;
        a0 += weight * one.p * other.p;
        a1 += (weight * (one.p * other.q + one.q * other.p)) / 2;
        a2 += weight * one.q * other.q;
      });
    });
    [this.b, this.a0, this.a1, this.a2] = [b, a0, a1, a2];
    this.criticalTemperature = of?.criticalTemperature ?? Math.max(...parts.map(({ critical }) => critical.temperature));
    this.attractionEnds = of?.attractionEnds ?? Math.min(...this.shares.map(({ p, q }) => (q > 0 ? (p / q) ** 2 : Infinity)));
  }

  /** a(T), J m³/mol². */
  attraction(temperature: number): number {
    return this.a0 - 2 * this.a1 * Math.sqrt(temperature) + this.a2 * temperature;
  }

  pressure(temperature: number, volume: number): number {
    return pressureOf(this.form, this.attraction(temperature), this.b, temperature, volume);
  }

  /** (∂P/∂v) at constant T, Pa mol/m³. */
  pressureByVolume(temperature: number, volume: number): number {
    return pressureByVolumeOf(this.form, this.attraction(temperature), this.b, temperature, volume);
  }

  /** (∂P/∂T) at constant v, Pa/K. */
  pressureByTemperature(temperature: number, volume: number): number {
    if (!(volume > this.b)) return NaN;
    const { d1, d2 } = this.form;
    const quadratic = (volume + d1 * this.b) * (volume + d2 * this.b);
    return R / (volume - this.b) - this.attractionSlope(temperature) / quadratic;
  }

  /** Mean of P between two volumes at T, Pa: ∫ P dv over their distance, written so that no digit is lost where they are close. */
  pressureBetween(temperature: number, dense: number, thin: number): number {
    return this.meanBetween(R * temperature, this.attraction(temperature), dense, thin);
  }

  /** Mean of ∂P/∂T between two volumes at T, Pa/K: Δs/Δv. */
  pressureByTemperatureBetween(temperature: number, dense: number, thin: number): number {
    return this.meanBetween(R, this.attractionSlope(temperature), dense, thin);
  }

  /** Residual internal energy at T and v, J/mol. */
  residualEnergy(temperature: number, volume: number): number {
    return (this.a1 * Math.sqrt(temperature) - this.a0) * this.logarithm(volume);
  }

  /** Residual Cv at T and v, J/(mol K). */
  residualCv(temperature: number, volume: number): number {
    return (this.a1 / (2 * Math.sqrt(temperature))) * this.logarithm(volume);
  }

  /** Residual entropy at T and v, J/(mol K). At T and P it is larger by R ln Z. */
  residualEntropy(temperature: number, volume: number): number {
    return R * Math.log1p(-this.b / volume) + this.attractionSlope(temperature) * this.logarithm(volume);
  }

  /** Second virial coefficient of the equation, b − a/(R T), m³/mol. */
  secondVirial(temperature: number): number {
    return this.b - this.attraction(temperature) / (R * temperature);
  }

  /**
   * ln φ of the whole, from G of the residuals at T and P: for a pure gas that of its fugacity. The pressure, Pa, is given where it is
   * known: that of a liquid at low pressure, computed from its volume, would be what rounding leaves.
   */
  logFugacity(temperature: number, volume: number, pressure = this.pressure(temperature, volume)): number {
    return logFugacityOf(this.form, this.attraction(temperature), this.b, temperature, volume, pressure);
  }

  /** ln φ_i of every part at T and v, with the pressure, Pa, where it is known. */
  logFugacities(temperature: number, volume: number, pressure = this.pressure(temperature, volume)): number[] {
    const z = (pressure * volume) / (R * temperature);
    const root = Math.sqrt(temperature);
    const strengths = this.shares.map(({ p, q }) => p - q * root);
    const attraction = this.attraction(temperature) * this.logarithm(volume);
    const packing = -Math.log(z) - Math.log1p(-this.b / volume);
    return this.shares.map(({ b }, i) => {
      const cross = this.shares.reduce((sum, { fraction }, j) => sum + fraction * strengths[j]! * this.factors[i]![j]!, 0);
      const pull = 2 * strengths[i]! * cross * this.logarithm(volume) - (attraction * b) / this.b;
      return (b / this.b) * (z - 1) + packing - pull / (R * temperature);
    });
  }

  compressibility(temperature: number, volume: number): number {
    return (this.pressure(temperature, volume) * volume) / (R * temperature);
  }

  /** b of every part, m³/mol, and a_ij of every pair at T, J m³/mol². */
  pairs(temperature: number): { readonly sizes: readonly number[]; readonly pulls: readonly (readonly number[])[] } {
    const strengths = this.shares.map(({ p, q }) => p - q * Math.sqrt(temperature));
    return {
      sizes: this.shares.map(({ b }) => b),
      pulls: strengths.map((one, i) => strengths.map((other, j) => one * other * this.factors[i]![j]!)),
    };
  }

  /** The same gases in another composition; a part of 0 may stand in it as a trace. */
  withFractions(fractions: readonly number[]): CubicGas {
    const parts = this.parts.map(({ critical }, i) => ({ critical, fraction: fractions[i]! }));
    return new CubicGas(this.form, parts, undefined, this);
  }

  /** Mean over v of push/(v − b) − pull/((v + d1 b)(v + d2 b)). */
  private meanBetween(push: number, pull: number, dense: number, thin: number): number {
    const { b } = this;
    const { d1, d2 } = this.form;
    const width = (d1 - d2) * b;
    const difference = thin - dense;
    const logarithm = Math.log1p((-width * difference) / ((thin + d2 * b) * (dense + d1 * b))) / width;
    return (push * Math.log1p(difference / (dense - b)) + pull * logarithm) / difference;
  }

  private attractionSlope(temperature: number): number {
    return this.a2 - this.a1 / Math.sqrt(temperature);
  }

  /** L, mol/m³. */
  private logarithm(volume: number): number {
    return logarithmOf(this.form, this.b, volume);
  }
}

function shareOf(form: CubicForm, { fraction, critical }: CubicPart): Share {
  const { temperature, pressure, acentric } = critical;
  requireCritical(critical);
  const [m0, m1, m2] = form.m as [number, number, number];
  const m = m0 + (m1 + m2 * acentric) * acentric;
  const root = Math.sqrt(form.omegaA / pressure) * R * temperature;
  return { fraction, b: (form.omegaB * R * temperature) / pressure, p: root * (1 + m), q: (root * m) / Math.sqrt(temperature) };
}

function requireFractions(parts: readonly CubicPart[]): void {
  let sum = 0;
  for (const { fraction, critical } of parts) {
    if (!(fraction >= 0)) refuse(`The mole fraction of ${critical.species} is ${fraction}; fractions are not negative`);
    sum += fraction;
  }
  if (!(Math.abs(sum - 1) <= 1e-6)) refuse(`The mole fractions of the gas add up to ${sum}, not to 1`);
}

function requireCritical({ species, temperature, pressure, acentric }: CriticalPoint): void {
  if (!(temperature > 0 && temperature < Infinity))
    refuseRange(`The critical temperature of ${species}, ${temperature} K, is not above 0 K`);
  if (!(pressure > 0 && pressure < Infinity)) refuseRange(`The critical pressure of ${species}, ${pressure} Pa, is not above 0 Pa`);
  if (!Number.isFinite(acentric)) refuseRange(`The acentric factor of ${species}, ${acentric}, is not a number`);
}
