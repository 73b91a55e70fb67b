/**
 * Liquid and vapour of a pure substance by its equation of state: equal pressure and equal fugacity (Maxwell's construction).
 * ln φ of the vapour less ln φ of the liquid rises with ln P by Z(vapour) − Z(liquid); Newton's method in ln P from an
 * estimate that lies between the pressures of the two spinodals. The slope of the vapour pressure follows from Clapeyron, dP/dT = Δs/Δv.
 */
import { GAS_CONSTANT } from "../constants";
import { refuse, refuseRange } from "../refusal";
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
/** Enough by far: four to six are taken. */
const STEPS = 20;

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

/** Newton's method in ln P, to the last digit: until a change is small and no smaller than half the one before. */
function logVapourPressure(gas: CubicGas, temperature: number): number {
  let logP = estimate(gas, temperature);
  let before = Infinity;
  for (let step = 0; step < STEPS; step++) {
    const change = -difference(gas, temperature, logP);
    logP += change;
    const length = Math.abs(change);
    if (length < 1e-11 && (length <= 1e-15 || length >= before / 2)) return logP;
    before = length;
  }
  return refuse(`The vapour pressure of ${gas.parts[0]!.critical.species} at ${temperature} K was not found in ${STEPS} steps`);
}

/**
 * ln φ of the vapour less that of the liquid, divided by its slope over ln P: a step of Newton. The difference is that of two areas,
 * (P − mean of P) (v'' − v')/(R T), which keeps its digits where the two phases are almost one. NaN where there is one volume only.
 */
function difference(gas: CubicGas, temperature: number, logP: number): number {
  const pressure = Math.exp(logP);
  const { dense, thin } = volumesAt(gas, temperature, pressure);
  return dense === thin ? NaN : 1 - gas.pressureBetween(temperature, dense, thin) / pressure;
}

/**
 * ln P to start from: right at the critical point with its slope, which is that of P at the critical volume, and where T/Tc is 0.7 and
 * below the estimate of Wilson (1968), ln(P/Pc) = 5.373 (1 + ω) (1 − Tc/T).
 */
function estimate(gas: CubicGas, temperature: number): number {
  const { critical } = gas.parts[0]!;
  const reduced = temperature / critical.temperature;
  const steepness = gas.pressureByTemperature(critical.temperature, criticalVolume(gas)) * (critical.temperature / critical.pressure);
  const [end, middle] = [steepness, 5.373 * (1 + critical.acentric)];
  return Math.log(critical.pressure) + (middle + (end - middle) * Math.max(0, (reduced - 0.7) / 0.3)) * (1 - 1 / reduced);
}

/** The critical volume of the equation, m³/mol: Zc R Tc/Pc, with Zc = (1 − (d1 + d2 − 1) Ωb)/3. */
export function criticalVolume({ form, parts }: CubicGas): number {
  const { temperature, pressure } = parts[0]!.critical;
  return (((1 - (form.d1 + form.d2 - 1) * form.omegaB) / 3) * GAS_CONSTANT * temperature) / pressure;
}
