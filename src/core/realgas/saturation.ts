/**
 * Liquid and vapour of a pure substance by its equation of state: equal pressure and equal fugacity (Maxwell's construction).
 * ln φ of the vapour less ln φ of the liquid rises with ln P by Z(vapour) − Z(liquid); Newton's method in ln P between the pressures of the
 * two spinodals, where ∂P/∂v = 0. The slope of the vapour pressure follows from Clapeyron, dP/dT = Δs/Δv.
 */
import { GAS_CONSTANT } from "../constants";
import { newtonInBracket, root } from "../numeric/root";
import { refuseRange } from "../refusal";
import type { CubicGas } from "./cubic-gas";
import { volumesAt } from "./volumes";

export interface CubicSaturation {
  readonly temperature: number;
  /** Vapour pressure, Pa. */
  readonly pressure: number;
  /** Molar volumes, m³/mol. */
  readonly liquid: number;
  readonly vapour: number;
  /** dP/dT, Pa/K. */
  readonly slope: number;
}

/** Below this share of the critical temperature a vapour pressure of the equation means nothing any more. */
export const LOWEST_REDUCED = 0.3;
/** Closer to the critical temperature than this share, liquid and vapour cannot be told apart in double precision. */
const NEAREST_REDUCED = 1e-9;

/**
 * Saturation of a pure gas at T in K; undefined at and above the critical temperature.
 * Refuses temperatures below 0.3 Tc.
 */
export function cubicSaturation(gas: CubicGas, temperature: number): CubicSaturation | undefined {
  const critical = gas.criticalTemperature;
  if (temperature >= critical * (1 - NEAREST_REDUCED)) return undefined;
  if (!(temperature >= LOWEST_REDUCED * critical)) {
    const { species } = gas.parts[0]!.critical;
    refuseRange(
      `Temperature ${temperature} K is below ${LOWEST_REDUCED} of the critical temperature of ${species}, ${critical} K, from where ${gas.form.title} tells a vapour pressure`,
    );
  }
  const pressure = Math.exp(logVapourPressure(gas, temperature));
  const { dense: liquid, thin: vapour } = volumesAt(gas, temperature, pressure);
  return { temperature, pressure, liquid, vapour, slope: gas.pressureByTemperatureBetween(temperature, liquid, vapour) };
}

function logVapourPressure(gas: CubicGas, temperature: number): number {
  return fromEstimate(gas, temperature) ?? betweenSpinodals(gas, temperature);
}

/** Newton's method from the estimate, to the last digit; undefined if it meets a pressure at which there is one volume only. */
function fromEstimate(gas: CubicGas, temperature: number): number | undefined {
  let logP = estimate(gas, temperature);
  let before = Infinity;
  for (let step = 0; step < 20; step++) {
    const { value, slope } = difference(gas, temperature, logP);
    if (Number.isNaN(slope)) return undefined;
    const change = -value / slope;
    logP += change;
    const length = Math.abs(change);
    if (length < 1e-11 && (length <= 1e-15 || length >= before / 2)) return logP;
    before = length;
  }
  return undefined;
}

function betweenSpinodals(gas: CubicGas, temperature: number): number {
  const { low, high } = spinodalPressures(gas, temperature);
  const top = Math.log(high);
  let bottom = low > 0 ? Math.log(low) : Math.min(top - 1, wilson(gas, temperature) - 1);
  while (low <= 0 && difference(gas, temperature, bottom).value > 0) bottom -= 5;
  return newtonInBracket((logP) => difference(gas, temperature, logP), bottom, top, wilson(gas, temperature), {
    tolerance: 1e-14,
    what: `The vapour pressure of ${gas.parts[0]!.critical.species}`,
  });
}

/**
 * ln φ of the vapour less that of the liquid at a pressure between the spinodals, and its slope over ln P. The difference is that of two
 * areas, (P − mean of P) (v'' − v')/(R T), which keeps its digits where the two phases are almost one.
 */
function difference(gas: CubicGas, temperature: number, logP: number): { value: number; slope: number } {
  const pressure = Math.exp(logP);
  const { dense, thin } = volumesAt(gas, temperature, pressure);
  // At a spinodal two of the three roots fall together, and rounding may leave one: which side it is tells where the answer lies.
  if (dense === thin) return { value: thin > criticalVolume(gas) ? -1 : 1, slope: NaN };
  const width = (thin - dense) / (GAS_CONSTANT * temperature);
  return { value: (pressure - gas.pressureBetween(temperature, dense, thin)) * width, slope: pressure * width };
}

/** ln of the estimate of Wilson (1968), Pa: the start of the search. */
function wilson(gas: CubicGas, temperature: number): number {
  const { critical } = gas.parts[0]!;
  return Math.log(critical.pressure) + 5.373 * (1 + critical.acentric) * (1 - critical.temperature / temperature);
}

/**
 * ln P that is right at the critical point with its slope, which is that of P at the critical volume, and as Wilson's where T/Tc is 0.7 and
 * below.
 */
function estimate(gas: CubicGas, temperature: number): number {
  const { critical } = gas.parts[0]!;
  const reduced = temperature / critical.temperature;
  const steepness = gas.pressureByTemperature(critical.temperature, criticalVolume(gas)) * (critical.temperature / critical.pressure);
  const [end, middle] = [steepness, 5.373 * (1 + critical.acentric)];
  return Math.log(critical.pressure) + (middle + (end - middle) * Math.max(0, (reduced - 0.7) / 0.3)) * (1 - 1 / reduced);
}

/** The least pressure of a liquid and the highest of a vapour at T, Pa. */
function spinodalPressures(gas: CubicGas, temperature: number): { low: number; high: number } {
  const slope = (volume: number) => gas.pressureByVolume(temperature, volume);
  const middle = criticalVolume(gas);
  let thin = 2 * middle;
  while (slope(thin) > 0) thin *= 2;
  // the slope over ln v has no huge values near b, so that the search is short
  const dense = gas.b * (1 + 1e-9);
  const liquid = Math.exp(root((x) => slope(Math.exp(x)) * Math.exp(x), Math.log(dense), Math.log(middle)));
  const vapour = Math.exp(root((x) => slope(Math.exp(x)) * Math.exp(x), Math.log(middle), Math.log(thin)));
  return { low: gas.pressure(temperature, liquid), high: gas.pressure(temperature, vapour) };
}

/** The critical volume of the equation, m³/mol: Zc R Tc/Pc, with Zc = (1 − (d1 + d2 − 1) Ωb)/3. */
export function criticalVolume({ form, parts }: CubicGas): number {
  const { temperature, pressure } = parts[0]!.critical;
  return (((1 - (form.d1 + form.d2 - 1) * form.omegaB) / 3) * GAS_CONSTANT * temperature) / pressure;
}
