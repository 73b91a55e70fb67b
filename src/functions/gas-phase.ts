/**
 * What a gas may not be when it is taken for one: liquid in part, or in all.
 *   pure gas of a cubic equation   below Tc between the volumes of its saturated phases, or denser than its liquid
 *   ideal gas                      a part whose pressure x P is above its vapour pressure: water from IAPWS SR1-86, others from Peng-Robinson
 */
import { root } from "../core/numeric/root";
import { CubicGas } from "../core/realgas/cubic-gas";
import { cubicSaturation, LOWEST_REDUCED } from "../core/realgas/saturation";
import type { CubicState } from "../core/realgas/state";
import { printed, Refusal, refuse } from "../core/refusal";
import { saturationPressure } from "../core/water/saturation";
import { criticalOf, type UsableConstants } from "../data/critical";
import { cubicEquations } from "../data/cubic-equations";
import { saturation } from "../data/saturation";
import { BESIDE_GAS, keyOf, WATER } from "./gas-model";
import type { Substance } from "./substance";

/** As humid air at its saturation is written, with rounded digits. */
const ROUNDING = 1.01;
/** Down to here, K, the vapour pressure of water over ice is told. */
const COLDEST_ICE = 190;
/** What a vapour pressure of Peng-Robinson may err by (common practice). */
const UNSURE = 1.05;

/** Refuses solids and liquids, which the equations of state of gases do not hold for. */
export function requireGases({ parts }: Substance): void {
  const condensed = parts.find(({ fit }) => fit.phase !== "g");
  if (condensed === undefined) return;
  const other = condensed.fit.formula === WATER ? "for water use WATER.SEALED" : "for a vessel full of liquid use VESSEL.LIQUIDFULL";
  refuse(`${condensed.species} is ${condensed.fit.phase === "l" ? "a liquid" : "a solid"}, and this function takes gases; ${other}`);
}

/** Refuses a state of a pure gas that one number cannot tell: two phases, or liquid that fills the volume. */
export function requireOnePhase(substance: Substance, state: Pick<CubicState, "phase" | "vapourPressure">, temperature: number): void {
  if (state.phase === "two-phase")
    throw new Refusal(
      "range",
      `At ${printed(temperature)} K ${substance.label} at this density is liquid beside vapour, vapour pressure ${printed(state.vapourPressure!)} Pa; ${elsewhere(substance, "VESSEL.REACH shows both")}`,
    );
  requireNoLiquid(substance, state, temperature);
}

/** Refuses a liquid that fills the volume; `from` is the temperature, K, from which it does, if it is known. */
export function requireNoLiquid(substance: Substance, { phase }: Pick<CubicState, "phase">, temperature: number, from?: number): void {
  if (phase !== "liquid") return;
  const since = from === undefined ? "" : ` (from about ${printed(from)} K)`;
  throw new Refusal(
    "range",
    `At ${printed(temperature)} K ${substance.label} at this density is liquid that fills the volume${since} by a cubic equation, which tells volumes of liquid to 5 to 10 % only (polar ones worse), and not at all its pressure, which rises steeply with temperature; ${elsewhere(substance, "see VESSEL.LIQUIDFULL")}`,
  );
}

/**
 * Refuses a pressure above the vapour pressure of a pure gas by its equation, for a liquid is not filled by pressure, and temperatures below
 * 0.3 of the critical one, where it tells none.
 */
export function requireVapour(substance: Substance, gas: CubicGas, temperature: number, pressure: number): void {
  if (gas.parts.length > 1) return;
  const saturated = cubicSaturation(gas, temperature);
  if (saturated === undefined || pressure <= saturated.pressure) return;
  throw new Refusal(
    "range",
    `At ${printed(temperature)} K and ${printed(pressure)} Pa ${substance.label} is liquid: its vapour pressure is ${printed(saturated.pressure)} Pa by ${gas.form.title}; give the amount instead of the pressure, and ${elsewhere(substance, "VESSEL.REACH shows liquid and vapour")}`,
  );
}

function elsewhere({ parts }: Substance, other: string): string {
  return parts.length === 1 && keyOf(parts[0]!.species) === WATER ? "for water use the WATER functions" : other;
}

/** The vapour pressure, Pa, that a gas of the library has exceeded by its partial pressure at T in K; undefined if it has not. */
export function exceededVapourPressure(key: string, temperature: number, partial: number): number | undefined {
  const limit = vapourPressure(key, temperature, partial);
  return limit !== undefined && partial > limit * (key === WATER ? ROUNDING : UNSURE) ? limit : undefined;
}

/** A part of an ideal gas that would condense at T in K and P in Pa: one sentence, or undefined. */
export function condensation({ parts }: Substance, temperature: number, pressure: number): string | undefined {
  for (const { species, fraction } of parts) {
    const own = fraction * pressure;
    const key = keyOf(species);
    const most = coldVapourPressure(key, temperature);
    const limit = most !== undefined && own > most ? most : exceededVapourPressure(key, temperature, own);
    if (limit === undefined) continue;
    const size = `${limit === most ? "less than" : "about"} ${printed(limit)} Pa`;
    return `${species} would condense: at ${printed(temperature)} K its pressure of ${printed(own)} Pa is above its vapour pressure, ${size}${key === WATER ? BESIDE_GAS : ""}`;
  }
  return undefined;
}

/** Vapour pressure, Pa; undefined where nothing is known or it is far away. */
function vapourPressure(key: string, temperature: number, own: number): number | undefined {
  if (key === WATER) {
    if (temperature >= saturation.criticalTemperature || temperature < COLDEST_ICE) return undefined;
    return saturationPressure(temperature, saturation);
  }
  const row = criticalOf(key);
  if (row === undefined || temperature >= row.temperature) return undefined;
  const estimate = row.pressure * 1e6 * Math.exp(5.373 * (1 + row.acentric) * (1 - row.temperature / temperature));
  if (own < estimate / 2 || temperature < LOWEST_REDUCED * row.temperature) return undefined;
  return cubicSaturation(pureGas(row), temperature)?.pressure;
}

/** What the vapour pressure, Pa, stays below where it is too cold to be told; undefined where it is told, or nothing is known. */
function coldVapourPressure(key: string, temperature: number): number | undefined {
  if (key === WATER) return temperature < COLDEST_ICE ? saturationPressure(COLDEST_ICE, saturation) : undefined;
  const row = criticalOf(key);
  if (row === undefined || temperature >= LOWEST_REDUCED * row.temperature) return undefined;
  return cubicSaturation(pureGas(row), LOWEST_REDUCED * row.temperature)?.pressure;
}

const ATMOSPHERE = 101325;

/**
 * Temperature, K, at which the gas of a key boils under 1 atm; undefined if nothing is known, or it does so below 0.3 of its critical
 * temperature.
 */
export function boilingPoint(key: string): number | undefined {
  const row = criticalOf(key);
  if (row === undefined) return undefined;
  const pressure = (temperature: number) =>
    key === WATER ? saturationPressure(temperature, saturation) : cubicSaturation(pureGas(row), temperature)!.pressure;
  const excess = (temperature: number) => Math.log(pressure(temperature) / ATMOSPHERE);
  const [low, high] = [LOWEST_REDUCED * row.temperature, 0.99 * row.temperature];
  if (!(excess(low) < 0 && excess(high) > 0)) return undefined;
  return root(excess, low, high, { tolerance: 1e-9, what: "The boiling point", unit: " K" });
}

const pure = new WeakMap<UsableConstants, CubicGas>();

function pureGas(row: UsableConstants): CubicGas {
  const held = pure.get(row);
  if (held) return held;
  const critical = { species: row.species, temperature: row.temperature, pressure: row.pressure * 1e6, acentric: row.acentric };
  const gas = new CubicGas(cubicEquations[0]!, [{ fraction: 1, critical }]);
  pure.set(row, gas);
  return gas;
}
