/**
 * Water and steam by IAPWS-95 (IAPWS R6-95(2018); Wagner, W., Pruß, A., J. Phys. Chem. Ref. Data 31 (2002) 387), from 273.16 K, the triple point,
 * to 1273 K and to 1000 MPa. Energy and entropy are 0 for the liquid at the triple point.
 */
import { densityOf } from "./density";
import type { FormulationConstants } from "./formulation-constants";
import { Helmholtz } from "./helmholtz";
import { requireTemperature } from "./limits";
import { phaseOf } from "./phase";
import { refuseRange } from "../refusal";
import { SaturationLine } from "./saturation-line";
import type { SaturatedDensities } from "./saturated-densities";
import { type Fluid, stateOf } from "./state";
import type { WaterPhase, WaterSaturation, WaterState } from "./types";

/** Built once from the coefficients; states are functions of temperature, K, and density, kg/m³. */
export class WaterFormulation implements Fluid {
  /** Pressure of the formulation at the critical temperature and density, Pa. */
  readonly criticalPressure: number;
  private readonly helmholtz: Helmholtz;
  private readonly line: SaturationLine;

  constructor(readonly constants: FormulationConstants) {
    this.helmholtz = new Helmholtz(constants);
    this.criticalPressure = this.single(constants.criticalTemperature, constants.criticalDensity).pressure;
    this.line = new SaturationLine((temperature, density) => this.single(temperature, density), constants);
  }

  /** One phase at a temperature, K, and density, kg/m³, both above 0: no test of limits, nor whether it is stable. */
  single(temperature: number, density: number): WaterPhase {
    return phaseOf(this.helmholtz, this.constants, temperature, density);
  }

  /** Liquid and vapour in equilibrium at a temperature, K, from 273.16 K to the critical 647.096 K; refused outside. */
  saturation(temperature: number): WaterSaturation {
    requireTemperature(this.constants, temperature);
    const { criticalTemperature } = this.constants;
    if (temperature > criticalTemperature) {
      refuseRange(
        `Temperature ${Number(temperature.toPrecision(10))} K is above ${criticalTemperature} K, the critical point: water has no saturation there`,
      );
    }
    return this.line.at(temperature);
  }

  /** Densities within 1 % of those of saturation, kg/m³, at a temperature from 273.16 K to below the critical one; a start, not a result. */
  estimate(temperature: number): SaturatedDensities {
    return this.line.estimate(temperature);
  }

  /**
   * The stable state at a temperature, K, and overall density, kg/m³: two phases between the saturated densities, one phase elsewhere. From the
   * critical temperature up it is called supercritical at the critical pressure and above, vapour below.
   * Refuses temperatures outside 273.16 K to 1273 K, densities that would need more than 1000 MPa, and what freezes.
   */
  state(temperature: number, density: number): WaterState {
    return stateOf(this, temperature, density);
  }

  /**
   * Density, kg/m³, of the stable phase at a temperature, K, and absolute pressure, Pa. At the saturation pressure both are stable, and the phase
   * must be named; a phase that is not stable is refused.
   */
  density(temperature: number, pressure: number, phase?: "liquid" | "vapour"): number {
    return densityOf(this, temperature, pressure, phase);
  }
}
