/**
 * Density of the stable phase of water at a temperature and pressure: p(ρ) = p by Newton's method inside a bracket. Along an isotherm p rises
 * with ρ in every stable phase: from 0 to the saturated vapour, from the saturated liquid on, and everywhere above the critical temperature.
 */
import { newtonInBracket } from "../numeric/root";
import { printed, refuse, refuseRange } from "../refusal";
import { megapascal, requirePressure, requireTemperature } from "./limits";
import type { Fluid } from "./state";

/** Above every density of the liquid that the limits allow, kg/m³. */
const DENSEST = 1400;
/** Last Newton step as a part of the density sought, or of less; the error left is its square, close to the critical point its size. */
const STEP = 1e-10;
/** A pressure this near to that of saturation may be of either phase: rounding of a pressure that came from `saturation`. */
const EQUAL = 1e-10;

/**
 * Density, kg/m³, at a temperature, K, and absolute pressure, Pa. `phase` is asked for at the saturation pressure alone, where both are stable;
 * elsewhere a phase that is not the stable one is refused, as is what lies outside the limits or freezes.
 */
export function densityOf(fluid: Fluid, temperature: number, pressure: number, phase?: "liquid" | "vapour"): number {
  const { constants } = fluid;
  requireTemperature(constants, temperature);
  const where = `Pressure ${megapascal(pressure)} at ${printed(temperature)} K`;
  if (!(pressure > 0)) refuseRange(`Pressure ${pressure} Pa is not above 0 Pa`);
  requirePressure(constants, temperature, pressure, `The pressure at ${printed(temperature)} K is`);
  const ideal = pressure / (constants.gasConstant * temperature);
  const solve = (low: number, high: number, start: number, least = start) =>
    newtonInBracket(
      (density) => {
        const { pressure: found, pressureByDensity } = fluid.single(temperature, density);
        return { value: found - pressure, slope: pressureByDensity };
      },
      low,
      high,
      start,
      { tolerance: STEP * least, what: "The density of water", unit: " kg/m3" },
    );
  if (temperature >= constants.criticalTemperature) return solve(0, DENSEST, Math.min(ideal, DENSEST / 2));
  const saturation = fluid.saturation(temperature);
  if (Math.abs(pressure - saturation.pressure) <= EQUAL * saturation.pressure) {
    return phase ? saturation[phase].density : refuse(`${where} is the saturation pressure: say whether liquid or vapour is meant`);
  }
  const stable = pressure > saturation.pressure ? "liquid" : "vapour";
  if (phase && phase !== stable)
    refuseRange(`${where} is ${stable}, not ${phase}: the saturation pressure is ${megapascal(saturation.pressure)}`);
  if (stable === "vapour") return solve(0, saturation.vapour.density, ideal);
  const { density, pressureByDensity } = saturation.liquid;
  return solve(density, DENSEST, density + (pressure - saturation.pressure) / pressureByDensity, density);
}
