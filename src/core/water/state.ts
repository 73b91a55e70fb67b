/**
 * The stable state of water at a temperature and an overall density. Between the saturated densities there are two phases, the vapour with the
 * mass fraction x = (v − v')/(v'' − v') (lever rule, v = 1/ρ), and each extensive property is the sum of its two parts. At constant overall
 * density both phases change with temperature along the saturation line, so that with dp/dT of that line
 *   cv = Σ x_i [cv_i + T/(ρ_i² (∂p/∂ρ)_i) ((∂p/∂T)_i − dp/dT)²]
 */
import { printed, refuseRange } from "../refusal";
import { requireDensity, requirePressure, requireTemperature } from "./limits";
import type { FormulationConstants } from "./formulation-constants";
import type { SaturatedDensities } from "./saturated-densities";
import type { WaterPhase, WaterSaturation, WaterState } from "./types";

/** What a state is made of. */
export interface Fluid {
  readonly constants: FormulationConstants;
  /** Pressure at the critical point, Pa. */
  readonly criticalPressure: number;
  single(temperature: number, density: number): WaterPhase;
  saturation(temperature: number): WaterSaturation;
  /** Densities within 1 % of those of saturation, below the critical temperature. */
  estimate(temperature: number): SaturatedDensities;
}

/** An estimate of a saturated density farther off than this leaves no doubt about the phase. */
const DOUBT = 0.02;

/** The state at a temperature, K, and overall density, kg/m³. Refuses what lies outside the limits or freezes. */
export function stateOf(fluid: Fluid, temperature: number, density: number): WaterState {
  const { constants } = fluid;
  requireTemperature(constants, temperature);
  requireDensity(constants, density);
  const side = sideOf(fluid, temperature, density);
  if (side === "between") return twoPhases(fluid.saturation(temperature), density);
  const phase = fluid.single(temperature, density);
  requirePressure(constants, temperature, phase.pressure, `Density ${printed(density)} kg/m3 at ${printed(temperature)} K would need`);
  if (!(phase.cv < Infinity))
    refuseRange(`The heat capacity of water has no finite value at the critical point, ${temperature} K and ${density} kg/m3`);
  const { pressure, energy, entropy, cv } = phase;
  const isSupercritical = temperature >= constants.criticalTemperature && pressure >= fluid.criticalPressure;
  return { phase: isSupercritical ? "supercritical" : side, temperature, density, pressure, energy, entropy, cv };
}

/** Which phase a density belongs to; above the critical temperature all is vapour here. */
function sideOf(fluid: Fluid, temperature: number, density: number): "liquid" | "vapour" | "between" {
  if (temperature >= fluid.constants.criticalTemperature) return "vapour";
  const near = fluid.estimate(temperature);
  if (density > near.liquid * (1 + DOUBT)) return "liquid";
  if (density < near.vapour * (1 - DOUBT)) return "vapour";
  const { liquid, vapour } = fluid.saturation(temperature);
  if (density >= liquid.density) return "liquid";
  return density <= vapour.density ? "vapour" : "between";
}

function twoPhases({ temperature, pressure, liquid, vapour, slope }: WaterSaturation, density: number): WaterState {
  const [v, vLiquid, vVapour] = [1 / density, 1 / liquid.density, 1 / vapour.density];
  const vapourFraction = (v - vLiquid) / (vVapour - vLiquid);
  const together = (of: (phase: WaterPhase) => number) => vapourFraction * of(vapour) + (1 - vapourFraction) * of(liquid);
  return {
    phase: "two-phase",
    temperature,
    density,
    pressure,
    energy: together(({ energy }) => energy),
    entropy: together(({ entropy }) => entropy),
    cv: together((phase) => alongSaturation(phase, slope)),
    vapourFraction,
  };
}

/** What one phase adds to cv, J/(kg K). */
function alongSaturation({ temperature, density, cv, pressureByDensity, pressureByTemperature }: WaterPhase, slope: number): number {
  return cv + (temperature * ((pressureByTemperature - slope) / density) ** 2) / pressureByDensity;
}
