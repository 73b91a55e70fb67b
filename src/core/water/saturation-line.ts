/**
 * The saturation of water from the triple point to the critical point, by the formulation alone.
 *
 * Up to 0.01 K below Tc Newton's method starts from the auxiliary equations, from there to 0.002 K from the critical law of near-critical.ts;
 * it settles in at most 4 steps from either, with the last phases 10 evaluations of the formulation. Within 0.002 K of Tc the free energies of the phases
 * differ in their last digits only; there densities and pressure are those of the critical law: densities within 0.6 % of ρ' − ρ'' (itself
 * below 15 kg/m³), pressure within 2e-12, the cv of both phases together within 0.4 %. At Tc both phases have the critical density.
 */
import { coexistence, saturationOf } from "./coexistence";
import type { FormulationConstants } from "./formulation-constants";
import { type CriticalLaw, criticalLaw, type Solved } from "./near-critical";
import { AuxiliaryDensities, type SaturatedDensities } from "./saturated-densities";
import type { WaterPhase, WaterSaturation } from "./types";

/** Distances from Tc, K: where the critical law takes over as the start, and where it takes over altogether. */
const NEAR = 0.01;
const NEAREST = 0.002;
/** Saturations remembered; then all are forgotten. */
const REMEMBERED = 512;

export class SaturationLine {
  private readonly auxiliary: AuxiliaryDensities;
  private readonly law: CriticalLaw;
  private readonly held = new Map<number, WaterSaturation>();

  constructor(
    private readonly single: (temperature: number, density: number) => WaterPhase,
    private readonly constants: FormulationConstants,
  ) {
    const { criticalTemperature, criticalDensity } = constants;
    this.auxiliary = new AuxiliaryDensities(constants);
    const first = criticalTemperature - NEAR;
    const far = this.solved(first, this.auxiliary.at(first));
    const half = (Math.sqrt(NEAREST / NEAR) * (far.liquid - far.vapour)) / 2;
    const near = this.solved(criticalTemperature - NEAREST, { liquid: criticalDensity + half, vapour: criticalDensity - half });
    this.law = criticalLaw(constants, far, near);
  }

  private solved(temperature: number, start: SaturatedDensities): Solved {
    const { liquid, vapour, pressure } = coexistence(this.single, temperature, start);
    const middle = this.single(temperature, this.constants.criticalDensity);
    return { temperature, liquid: liquid.density, vapour: vapour.density, offset: pressure - middle.pressure };
  }

  /** Densities near those of saturation, kg/m³, at a temperature below Tc: within 1 %. */
  estimate(temperature: number): SaturatedDensities {
    return this.constants.criticalTemperature - temperature < NEAR ? this.law.densities(temperature) : this.auxiliary.at(temperature);
  }

  /** The saturation at a temperature, K, inside the limits; no test of them. */
  at(temperature: number): WaterSaturation {
    const found = this.held.get(temperature);
    if (found) return found;
    const made =
      this.constants.criticalTemperature - temperature < NEAREST
        ? this.byLaw(temperature)
        : coexistence(this.single, temperature, this.estimate(temperature));
    if (this.held.size >= REMEMBERED) this.held.clear();
    this.held.set(temperature, made);
    return made;
  }

  private byLaw(temperature: number): WaterSaturation {
    const { single, law } = this;
    const middle = single(temperature, this.constants.criticalDensity);
    const { liquid, vapour } = law.densities(temperature);
    return saturationOf(
      single(temperature, liquid),
      single(temperature, vapour),
      middle.pressure + law.offset(temperature),
      middle.pressureByTemperature + law.offsetSlope(temperature),
    );
  }
}
