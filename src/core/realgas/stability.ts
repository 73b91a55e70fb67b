/**
 * Whether a gas mixture stays one phase: the test of the tangent plane (Michelsen, Fluid Phase Equilibria 9 (1982) 1).
 * A trial phase of amounts W, at the T and P of the mixture z, would form if
 *
 *   tm(W) = 1 + Σ W_i (ln W_i + ln φ_i(W) − ln z_i − ln φ_i(z) − 1) < 0
 *
 * W follows by successive substitution from a liquid-like, a vapour-like and a nearly pure start. A negative value at any step is a proof.
 * Every few steps the change is stretched, or halved where it swings, by what the ratio of two changes tells of those that would follow
 * (the method of the dominant eigenvalue, Orbach and Crowe, Can. J. Chem. Eng. 49 (1971) 509, from memory).
 */
import { GAS_CONSTANT } from "../constants";
import { refuse } from "../refusal";
import { CubicGas } from "./cubic-gas";
import type { CriticalPoint } from "./form";
import { criticalVolume } from "./saturation";
import { TrialPhase } from "./trial-phase";
import { volumesAt } from "./volumes";

/** A negative value of less than this is rounding. */
const ROUNDING = 1e-9;
const STEPS = 1000;
const ENOUGH = 1e-9;
/** A trial whose ln W are this close to ln z, and come closer, ends at the mixture itself. */
const SAME = 1e-3;
/** Every so many steps the change is stretched, at most by so much; where that does not lead to the end, every one of the later steps. */
const STRETCHED = 4;
const FURTHEST = 20;
const LATER = 60;
/** A stretched change of ln W is at most this. */
const WIDEST = 2;
/** Out of a mixture denser than this, in volumes of its molecules (about its critical volume), a light gas may part too. */
const DENSE = 4;
/** A gas so thin that Σ z P/P(vapour, Wilson) stays below this, and Z so near 1, is no liquid in part. */
const THIN = 0.2;
const NEARLY_IDEAL = 0.03;
/** Below this share of the critical temperature the estimate of Wilson is too high by more than that leaves room for. */
const ESTIMATED_FROM = 0.5;
/** As humid air at its saturation is written, with rounded digits. */
const SATURATED = 1.01;

/**
 * The part of known vapour pressure that would condense out of the mixture at T in K and v in m³/mol, if there is one: of it the equation
 * does not judge, its fugacity is compared with that of its own liquid.
 */
export function condensing(gas: CubicGas, temperature: number, volume: number): CriticalPoint | undefined {
  if (gas.parts.every(({ critical }) => critical.vapourPressure === undefined)) return undefined;
  const pressure = gas.pressure(temperature, volume);
  if (!(pressure > 0)) return undefined;
  const fugacities = gas.logFugacities(temperature, volume);
  return gas.parts.find((_, i) => condenses(gas, i, temperature, pressure, fugacities[i]!))?.critical;
}

/** True if another phase would form out of the mixture at T in K and v in m³/mol: it is then not one phase, whatever P(T, v) says. */
export function splits(gas: CubicGas, temperature: number, volume: number): boolean {
  const pressure = gas.pressure(temperature, volume);
  if (!(pressure > 0) || !(gas.pressureByVolume(temperature, volume) < 0)) return true;
  if (temperature >= gas.criticalTemperature) return false;
  const fugacities = gas.logFugacities(temperature, volume);
  if (gas.parts.some((_, i) => condenses(gas, i, temperature, pressure, fugacities[i]!))) return true;
  if (isThin(gas, temperature, pressure, volume)) return false;
  const mixture = mixtureAt(gas, temperature, pressure, fugacities);
  return startsOf(gas, temperature, pressure, volume).some((start) => forms(mixture, start));
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
  if (gas.parts.some(({ critical }) => temperature < ESTIMATED_FROM * critical.temperature)) return false;
  return gas.parts.reduce((sum, { fraction, critical }) => sum + (fraction * pressure) / wilson(critical, temperature), 0) < THIN;
}

/** Vapour pressure by the estimate of Wilson (1968), Pa; above the critical temperature its continuation. */
function wilson({ pressure, acentric, temperature: critical }: CriticalPoint, temperature: number): number {
  return pressure * Math.exp(5.373 * (1 + acentric) * (1 - critical / temperature));
}

/**
 * Trial amounts to start from: liquid-like and vapour-like by the estimate of Wilson, and each part that could condense nearly pure; out of
 * a dense mixture every part.
 */
function startsOf(gas: CubicGas, temperature: number, pressure: number, volume: number): number[][] {
  const fractions = gas.parts.map(({ fraction }) => fraction);
  const volatility = gas.parts.map(({ critical }) => wilson(critical, temperature) / pressure);
  const isDense = volume < DENSE * gas.b;
  const apart = gas.parts.flatMap(({ critical }, i) =>
    (isDense || critical.temperature > temperature) && critical.vapourPressure === undefined ? [i] : [],
  );
  return [
    fractions.map((z, i) => z / volatility[i]!),
    fractions.map((z, i) => z * volatility[i]!),
    ...apart.map((pure) => fractions.map((_, i) => (i === pure ? 0.999 : 0.001 / fractions.length))),
  ];
}

/** The mixture that is asked about, its parts that are there. */
interface Mixture {
  readonly temperature: number;
  readonly pressure: number;
  readonly trial: TrialPhase;
  /** ln z_i and ln z_i + ln φ_i(z). */
  readonly logFractions: readonly number[];
  readonly own: readonly number[];
  /** 1 for a part whose vapour pressure is known. */
  readonly known: readonly number[];
  readonly present: readonly number[];
}

function mixtureAt(gas: CubicGas, temperature: number, pressure: number, fugacities: readonly number[]): Mixture {
  const present = gas.parts.flatMap(({ fraction }, i) => (fraction > 0 ? [i] : []));
  const { sizes, pulls } = gas.pairs(temperature);
  const of = <T>(values: readonly T[]) => present.map((i) => values[i]!);
  const logFractions = present.map((i) => Math.log(gas.parts[i]!.fraction));
  return {
    temperature,
    pressure,
    trial: new TrialPhase(gas.form, temperature, pressure, of(sizes), of(pulls).map(of)),
    logFractions,
    own: of(fugacities).map((log, i) => log + logFractions[i]!),
    known: present.map((i) => (gas.parts[i]!.critical.vapourPressure ? 1 : 0)),
    present,
  };
}

function forms({ temperature, pressure, trial, logFractions, own, known, present }: Mixture, start: readonly number[]): boolean {
  const logs = present.map((i) => Math.log(start[i]!));
  const [fractions, fugacities, changes] = [[...logs], [...logs], logs.map(() => 0)];
  let [away, stretch, distance] = [Infinity, 1, 1];
  for (let step = 1; step <= STEPS; step++) {
    const amounts = logs.map(Math.exp);
    const total = sumOf(amounts);
    amounts.forEach((amount, i) => (fractions[i] = amount / total));
    trial.logFugacities(fractions, fugacities);
    let [moved, nearer, along, before] = [0, 0, 0, 0];
    distance = 1;
    for (let i = 0; i < logs.length; i++) {
      const change = own[i]! - fugacities[i]! - logs[i]!;
      distance -= amounts[i]! * (change + 1);
      moved = Math.max(moved, Math.abs(change));
      nearer = Math.max(nearer, Math.abs(logs[i]! + change - logFractions[i]!));
      along += change * changes[i]!;
      before += changes[i]! ** 2;
      changes[i] = change;
    }
    // A trial that is mostly parts of known vapour pressure: the equation is not asked about it.
    if (distance < -ROUNDING) return sumOf(fractions.map((fraction, i) => fraction * known[i]!)) <= 0.5;
    if (moved < ENOUGH || (nearer < SAME && nearer < away)) return false;
    away = nearer;
    if (step % STRETCHED === 0 || step > LATER) stretch = along < before ? Math.min(FURTHEST, stretch / (1 - along / before)) : FURTHEST;
    else stretch = 1;
    if (stretch > 1) stretch = Math.max(1, Math.min(stretch, WIDEST / moved));
    for (let i = 0; i < logs.length; i++) logs[i] = logs[i]! + stretch * changes[i]!;
  }
  // Still on the way, but along a floor: the mixture is at the very limit of its stability.
  if (distance < ROUNDING) return false;
  return refuse(`Whether the mixture splits into two phases at ${temperature} K and ${pressure} Pa was not found in ${STEPS} steps`);
}

function sumOf(values: readonly number[]): number {
  return values.reduce((sum, value) => sum + value, 0);
}
