/**
 * The gas over the water, oxygen with a mole fraction x of carbon dioxide, at 298.15 K:
 *   p V = n R T (1 − μ p),   μ = μ(O2) (1 + 3.21 x (1 + 1.33 x))
 *   U(p) − U(0) = −n p · 6.59 J/(mol atm) (1 + 1.69 x (1 + x))
 * Washburn 1933, as used by Hubbard, Scott and Waddington 1956 (figures from memory; they arrive as arguments). Nitrogen counts as oxygen.
 *
 * Water vapour at saturation under the pressure of the gas, mol in each mL: the ideal-gas amount times
 *   exp[(v_w + B_m − 2 Σ y_j B_jw) p / RT] / (1 − μ p),   B_m = −μ R T
 * v_w molar volume of the liquid, B_jw second virial coefficients of the pairs; the pressure of the liquid and the attraction of the gas
 * raise it by some 9 % in oxygen of 3 MPa. Pressures in MPa, volumes in mL, so that p V is in J.
 */
import { GAS_CONSTANT, REFERENCE_TEMPERATURE } from "../../constants";
import { ATMOSPHERE, type GasFigures, type WaterFigures } from "./constants";

/** RT at 298.15 K, J/mol. */
export const THERMAL_ENERGY = GAS_CONSTANT * REFERENCE_TEMPERATURE;

/** μ, 1/MPa. */
function pressureFactor(fraction: number, gas: GasFigures): number {
  return (gas.pressureFactor * (1 + gas.pressureLinear * fraction * (1 + gas.pressureQuadratic * fraction))) / ATMOSPHERE;
}

/** Amount of gas, mol, at a pressure in MPa, in a volume in mL. */
export function gasAmount(pressure: number, volume: number, fraction: number, gas: GasFigures): number {
  return (pressure * volume) / (THERMAL_ENERGY * (1 - pressureFactor(fraction, gas) * pressure));
}

/** Pressure, MPa, of an amount in mol in a volume in mL; the inverse of `gasAmount`. */
export function gasPressure(amount: number, volume: number, fraction: number, gas: GasFigures): number {
  const ideal = amount * THERMAL_ENERGY;
  return ideal / (volume + pressureFactor(fraction, gas) * ideal);
}

/** Energy of the gas less that of the same gas at no pressure, J; negative. */
export function gasEnergy(amount: number, pressure: number, fraction: number, gas: GasFigures): number {
  return (-gas.energy * (1 + gas.energyLinear * fraction * (1 + fraction)) * amount * pressure) / ATMOSPHERE;
}

/** Water vapour at saturation under the gas, mol in each mL. */
export function vapourDensity(pressure: number, fraction: number, gas: GasFigures, water: WaterFigures): number {
  const factor = pressureFactor(fraction, gas);
  const pairs = (1 - fraction) * water.virialOxygen + fraction * water.virialCarbonDioxide;
  const exponent = ((water.molarMass / water.density - 2 * pairs) * pressure) / THERMAL_ENERGY - factor * pressure;
  return ((water.vapourPressure / THERMAL_ENERGY) * Math.exp(exponent)) / (1 - factor * pressure);
}
