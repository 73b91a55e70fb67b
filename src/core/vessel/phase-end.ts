/**
 * Where water that is heated in a closed room stops being liquid and vapour: the root of ρ_sat(T) V(T) = m, with the saturated liquid where the
 * overall density is above the critical one, so that the liquid grows until it fills the room, and the saturated vapour where it is below.
 * K, kg/m³, m³, kg.
 */
import { root } from "../numeric/root";
import type { WaterFormulation } from "../water/formulation";

/**
 * Where the two phases end. `full`: the liquid has grown to fill the vessel. `dew`: the last liquid evaporates. Both are at the same place
 * with or without a gas, but `full` is then where the water alone would fill it: the gas is squeezed from there on. `always`: contents
 * that are liquid-full or without liquid at every temperature from the triple point on.
 */
export interface PhaseEnd {
  readonly kind: "full" | "dew" | "always full" | "always vapour";
  /** K; undefined for `always`. */
  readonly temperature?: number;
}

/** Near the temperature of the densest liquid, K: below it water that is heated shrinks. */
const DENSEST = 277.13;

/** Of a mass, kg, in a room that may grow with the temperature, m³. */
export function phaseEndOf(water: WaterFormulation, mass: number, volumeAt: (temperature: number) => number): PhaseEnd {
  const { from, criticalTemperature, criticalDensity } = water.constants;
  const dense = mass > criticalDensity * volumeAt(criticalTemperature);
  const low = dense ? DENSEST : from;
  const excess = (temperature: number) => {
    const { liquid, vapour } = water.saturation(temperature);
    return Math.log(((dense ? liquid.density : vapour.density) * volumeAt(temperature)) / mass);
  };
  const atLow = excess(low);
  if (dense ? atLow <= 0 : atLow >= 0) return { kind: dense ? "always full" : "always vapour" };
  const temperature = root(excess, low, criticalTemperature, { what: "The temperature at which one phase is left", unit: " K" });
  return { kind: dense ? "full" : "dew", temperature };
}
