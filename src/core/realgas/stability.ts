/**
 * Whether a gas mixture stays one phase: the test of the tangent plane (Michelsen, Fluid Phase Equilibria 9 (1982) 1).
 * A trial phase of amounts W, at the T and P of the mixture z, would form if
 *
 *   tm(W) = 1 + Σ W_i (ln W_i + ln φ_i(W) − ln z_i − ln φ_i(z) − 1) < 0
 *
 * W follows by successive substitution from a liquid-like, a vapour-like and a nearly pure start. A negative value at any step is a proof.
 */
import { GAS_CONSTANT } from "../constants";
import { refuse } from "../refusal";
import { CubicGas } from "./cubic-gas";
import type { CriticalPoint } from "./form";
import { criticalVolume } from "./saturation";
import { stableVolume, volumesAt } from "./volumes";

/** A negative value of less than this is rounding. */
const ROUNDING = 1e-9;
const STEPS = 1000;
const ENOUGH = 1e-9;
/** A trial whose ln W are this close to ln z, and come closer, ends at the mixture itself. */
const SAME = 1e-3;
/** A gas so thin that Σ z P/P(vapour, Wilson) stays below this, and Z so near 1, is no liquid in part. */
const THIN = 0.2;
const NEARLY_IDEAL = 0.03;
/** As humid air at its saturation is written, with rounded digits. */
const SATURATED = 1.01;

/**
 * True if another phase would form out of the mixture at T in K and v in m³/mol: it is then not one phase, whatever P(T, v) says.
 * Of a part whose vapour pressure is known the equation does not judge: its fugacity is compared with that of its own liquid.
 */
export function splits(gas: CubicGas, temperature: number, volume: number): boolean {
  const pressure = gas.pressure(temperature, volume);
  if (!(pressure > 0) || !(gas.pressureByVolume(temperature, volume) < 0)) return true;
  if (temperature >= gas.criticalTemperature) return false;
  const fugacities = gas.logFugacities(temperature, volume);
  if (gas.parts.some((_, i) => condenses(gas, i, temperature, pressure, fugacities[i]!))) return true;
  if (isThin(gas, temperature, pressure, volume)) return false;
  const own = fugacities.map((log, i) => log + Math.log(gas.parts[i]!.fraction));
  return startsOf(gas, temperature, pressure).some((start) => forms(gas, temperature, pressure, own, start));
}

/** Whether a part of known vapour pressure Ps is above it: x φ P > Ps φ(Ps) exp(v (P − Ps)/(R T)), v of its liquid. */
function condenses(gas: CubicGas, i: number, temperature: number, pressure: number, logFugacity: number): boolean {
  const { critical, fraction } = gas.parts[i]!;
  if (critical.vapourPressure === undefined || temperature >= critical.temperature) return false;
  const saturated = critical.vapourPressure(temperature);
  const pure = new CubicGas(gas.form, [{ fraction: 1, critical }]);
  const { thin } = volumesAt(pure, temperature, saturated);
  const { dense } = volumesAt(pure, temperature, pressure);
  const lifted = dense < criticalVolume(pure) ? (dense * (pressure - saturated)) / (GAS_CONSTANT * temperature) : 0;
  const limit = Math.log(saturated) + pure.logFugacity(temperature, thin, saturated) + lifted;
  return Math.log((fraction * pressure) / SATURATED) + logFugacity > limit;
}

function isThin(gas: CubicGas, temperature: number, pressure: number, volume: number): boolean {
  if (Math.abs(gas.compressibility(temperature, volume) - 1) > NEARLY_IDEAL) return false;
  return gas.parts.reduce((sum, { fraction, critical }) => sum + (fraction * pressure) / wilson(critical, temperature), 0) < THIN;
}

/** Vapour pressure by the estimate of Wilson (1968), Pa; above the critical temperature its continuation. */
function wilson({ pressure, acentric, temperature: critical }: CriticalPoint, temperature: number): number {
  return pressure * Math.exp(5.373 * (1 + acentric) * (1 - critical / temperature));
}

/** Trial amounts to start from: liquid-like and vapour-like by the estimate of Wilson, and each part that could condense nearly pure. */
function startsOf(gas: CubicGas, temperature: number, pressure: number): number[][] {
  const fractions = gas.parts.map(({ fraction }) => fraction);
  const volatility = gas.parts.map(({ critical }) => wilson(critical, temperature) / pressure);
  const heavy = gas.parts.flatMap(({ critical }, i) =>
    critical.temperature > temperature && critical.vapourPressure === undefined ? [i] : [],
  );
  return [
    fractions.map((z, i) => z / volatility[i]!),
    fractions.map((z, i) => z * volatility[i]!),
    ...heavy.map((pure) => fractions.map((_, i) => (i === pure ? 0.999 : 0.001 / fractions.length))),
  ];
}

function forms(gas: CubicGas, temperature: number, pressure: number, own: readonly number[], start: readonly number[]): boolean {
  let logs = start.map((amount) => Math.log(amount));
  let away = Infinity;
  for (let step = 0; step < STEPS; step++) {
    const amounts = logs.map(Math.exp);
    const total = amounts.reduce((sum, amount) => sum + amount, 0);
    const trial = gas.withFractions(amounts.map((amount) => amount / total));
    const fugacities = trial.logFugacities(temperature, stableVolume(trial, temperature, pressure), pressure);
    const distance = 1 + amounts.reduce((sum, amount, i) => sum + amount * (logs[i]! + fugacities[i]! - own[i]! - 1), 0);
    if (distance < -ROUNDING) return !isLiquidOfKnown(trial);
    const next = fugacities.map((log, i) => own[i]! - log);
    const moved = largest(next, (log, i) => log - logs[i]!);
    const nearer = largest(next, (log, i) => log - Math.log(gas.parts[i]!.fraction));
    if (moved < ENOUGH || (nearer < SAME && nearer < away)) return false;
    [logs, away] = [next, nearer];
  }
  return refuse(`Whether the mixture splits into two phases at ${temperature} K and ${pressure} Pa was not found in ${STEPS} steps`);
}

/** A trial that is mostly parts of known vapour pressure: the equation is not asked about it. */
function isLiquidOfKnown({ parts }: CubicGas): boolean {
  return parts.reduce((sum, { fraction, critical }) => sum + (critical.vapourPressure ? fraction : 0), 0) > 0.5;
}

function largest(values: readonly number[], difference: (value: number, i: number) => number): number {
  return values.reduce((most, value, i) => Math.max(most, Math.abs(difference(value, i))), 0);
}
