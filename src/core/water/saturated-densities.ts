/**
 * Densities at saturation by the auxiliary equations IAPWS SR1-86(1992), eqs. 2 and 3, with θ = 1 − T/Tc, 273.16 K to Tc:
 *   liquid  ρ/ρc = 1 + Σ b θ^(e/3)         vapour  ln(ρ/ρc) = Σ c θ^(e/6)
 * They lie within 0.02 % of the formulation up to 550 K, within 0.2 % up to 646 K and within 1 % up to Tc: starts, and a quick test of the phase.
 */
import type { FormulationConstants } from "./formulation-constants";
import { Powers } from "./powers";

/** kg/m³. */
export interface SaturatedDensities {
  readonly liquid: number;
  readonly vapour: number;
}

/** A sum of coefficients times powers, the powers by products. */
class PowerSeries {
  private readonly powers: Powers;
  private readonly coefficients: readonly number[];

  constructor(terms: readonly (readonly number[])[]) {
    this.powers = new Powers(terms.map(([, exponent]) => exponent!));
    this.coefficients = terms.map(([coefficient]) => coefficient!);
  }

  at(x: number): number {
    const powers = this.powers.of(x);
    let sum = 0;
    for (let k = 0; k < powers.length; k++) sum += this.coefficients[k]! * powers[k]!;
    return sum;
  }
}

export class AuxiliaryDensities {
  private readonly liquid: PowerSeries;
  private readonly vapour: PowerSeries;

  constructor(private readonly constants: FormulationConstants) {
    this.liquid = new PowerSeries(constants.saturatedLiquid);
    this.vapour = new PowerSeries(constants.saturatedVapour);
  }

  /** At a temperature, K, from the triple point to below the critical one. */
  at(temperature: number): SaturatedDensities {
    const { criticalTemperature, criticalDensity } = this.constants;
    const third = Math.cbrt(1 - temperature / criticalTemperature);
    return {
      liquid: criticalDensity * (1 + this.liquid.at(third)),
      vapour: criticalDensity * Math.exp(this.vapour.at(Math.sqrt(third))),
    };
  }
}
