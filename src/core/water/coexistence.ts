/**
 * Liquid and vapour in equilibrium: equal pressure and equal Gibbs energy at one temperature.
 *
 * With f the Helmholtz energy and v = 1/ρ, both conditions made linear in the two densities give first the pressure (Maxwell's equal areas)
 *   p = (f' − f'') / (v'' − v')         and then each density     ρ + (p − p(ρ)) / (∂p/∂ρ)
 * which is Newton's method in two unknowns. The pressure has the square of the error of the densities.
 */
import { refuse } from "../refusal";
import type { SaturatedDensities } from "./saturated-densities";
import type { WaterPhase, WaterSaturation } from "./types";

/** The last step, as a part of the width ρ' − ρ'' for the liquid and of ρ'' (if less) for the vapour: the error left is its square. */
const SMALL = 2e-7;
/** Steps allowed; five are needed at the most. */
const STEPS = 12;

type Single = (temperature: number, density: number) => WaterPhase;

/** The saturation at a temperature, K, from densities near it. Refuses if the two densities run together or do not settle. */
export function coexistence(single: Single, temperature: number, start: SaturatedDensities): WaterSaturation {
  let { liquid, vapour } = start;
  for (let step = 0; step < STEPS; step++) {
    const [below, above] = [single(temperature, vapour), single(temperature, liquid)];
    const pressure = equalAreas(above, below);
    const [changeLiquid, changeVapour] = [toPressure(above, pressure), toPressure(below, pressure)];
    liquid += changeLiquid;
    vapour += changeVapour;
    const width = liquid - vapour;
    if (!(width > 0 && vapour > 0)) break;
    if (Math.abs(changeLiquid) <= SMALL * width && Math.abs(changeVapour) <= SMALL * Math.min(width, vapour)) {
      const [l, v] = [single(temperature, liquid), single(temperature, vapour)];
      return saturationOf(l, v, equalAreas(l, v));
    }
  }
  return refuse(`The saturation of water at ${temperature} K was not found`);
}

/** Both phases with their common pressure; its slope by Clapeyron, (s'' − s')/(v'' − v'), unless another is known. */
export function saturationOf(
  liquid: WaterPhase,
  vapour: WaterPhase,
  pressure: number,
  slope = (vapour.entropy - liquid.entropy) / (1 / vapour.density - 1 / liquid.density),
): WaterSaturation {
  return { temperature: liquid.temperature, pressure, liquid: atPressure(liquid, pressure), vapour: atPressure(vapour, pressure), slope };
}

/** The phase with the pressure of saturation in the place of its own, which in a cold liquid is a small difference of large parts. */
function atPressure(phase: WaterPhase, pressure: number): WaterPhase {
  const change = (pressure - phase.pressure) / phase.density;
  return { ...phase, pressure, enthalpy: phase.enthalpy + change, gibbs: phase.gibbs + change };
}

function equalAreas(liquid: WaterPhase, vapour: WaterPhase): number {
  return (helmholtzEnergy(liquid) - helmholtzEnergy(vapour)) / (1 / vapour.density - 1 / liquid.density);
}

function helmholtzEnergy({ gibbs, pressure, density }: WaterPhase): number {
  return gibbs - pressure / density;
}

function toPressure({ pressure, pressureByDensity }: WaterPhase, wanted: number): number {
  return (wanted - pressure) / pressureByDensity;
}
