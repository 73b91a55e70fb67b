/**
 * The argument `model`: how P, V and T of a gas hang together. `ideal`, or a cubic equation with the critical constants of the library.
 * Left out, the ideal gas serves where Peng-Robinson and Soave both differ from it by less than 1 % at every state asked for; elsewhere the
 * call is refused with both pressures, because the ideal gas mostly errs on the dangerous side. Two equations, because one alone agrees by
 * chance where its own error hides the difference: nitrogen of 150 bar at 300 K by Peng-Robinson.
 */
import { CubicGas } from "../core/realgas/cubic-gas";
import { cubicState, idealPressure } from "../core/realgas/state";
import { printed, Refusal, refuse, refuseAbsent, refuseRange } from "../core/refusal";
import { saturationPressure } from "../core/water/saturation";
import { criticalOf, pairOf, type PairParameter, type UsableConstants } from "../data/critical";
import { type CubicEquation, cubicEquations } from "../data/cubic-equations";
import { findSpecies } from "../data/library";
import { saturation } from "../data/saturation";
import { readText } from "./arguments";
import { BoundedCache } from "./cache";
import type { Cell } from "./cell";
import type { Substance } from "./substance";

/** A gas by a cubic equation, with where its figures come from. */
export interface RealGas {
  readonly equation: CubicEquation;
  readonly gas: CubicGas;
  readonly constants: readonly UsableConstants[];
  readonly pairs: readonly PairParameter[];
}

/** What was chosen for a call: `named` by the user, or the ideal gas because it is close enough. */
export type Model = { readonly kind: "ideal"; readonly named: boolean } | { readonly kind: "real"; readonly real: RealGas };

const IDEAL = "ideal";
/** Difference of the ideal gas from each equation up to which the model may be left out. */
export const CLOSE_ENOUGH = 0.01;

const ids = [IDEAL, ...cubicEquations.map(({ id }) => id)];
/** The equation of which binary parameters are printed; with the others it judges the ideal gas, and it is the one that is named first. */
const FIRST = cubicEquations[0]!;

/** The word of the cell: `ideal` or the id of an equation; undefined if left out. */
export function readModel(cell: Cell | undefined): string | undefined {
  const text = readText(cell, "model");
  if (text === undefined) return undefined;
  const word = wordOf(text);
  return ids.find((id) => id === word) ?? refuse(`The model "${text}" is not one of ${ids.join(", ")}`);
}

/** Refuses the word of a model that stands in the place of the unit, one to the left of it. */
export function requireNoModel(unit: Cell | undefined): void {
  if (typeof unit !== "string" || !ids.includes(wordOf(unit))) return;
  refuse(`"${unit.trim()}" is a model; the unit comes first, the model after it`);
}

function wordOf(text: string): string {
  return text
    .trim()
    .toLowerCase()
    .replace(/[\s_]+/g, "-");
}

/** A state of which the pressure counts: K and m³/mol; `words` say in a sentence why it counts, where that is not plain. */
export interface Place {
  readonly temperature: number;
  readonly volume: number;
  readonly words?: string;
}

/** The equation a word names; undefined for `ideal` and for a model left out. Refuses (absent) species without critical constants. */
export function namedModel(substance: Substance, word: string | undefined): Model | undefined {
  if (word === undefined) return undefined;
  if (word === IDEAL) return { kind: IDEAL, named: true };
  return {
    kind: "real",
    real: realGasOf(
      substance,
      cubicEquations.find(({ id }) => id === word)!,
    ),
  };
}

/** The ideal gas for a model left out, if it is close enough to every equation at every place; else refused with both pressures. */
export function idealIfClose(substance: Substance, places: readonly Place[]): Model {
  const judges = judgesOf(substance);
  for (const place of places) for (const judge of judges) requireClose(judge, substance, place);
  return { kind: IDEAL, named: false };
}

function judgesOf(substance: Substance): readonly RealGas[] {
  try {
    return cubicEquations.map((equation) => realGasOf(substance, equation));
  } catch (thrown) {
    if (thrown instanceof Refusal && thrown.kind === "absent")
      return refuseAbsent(`${thrown.message}: whether the ideal gas holds cannot be judged; name the model, "ideal"`);
    throw thrown;
  }
}

function requireClose({ gas, equation }: RealGas, { label }: Substance, { temperature, volume, words }: Place): void {
  const ideal = idealPressure(temperature, volume);
  const name = 'name the model: "peng-robinson", "soave" or "ideal"';
  let real: number;
  try {
    const { phase, pressure } = cubicState(gas, temperature, volume);
    if (phase === "two-phase" || phase === "liquid")
      refuseRange(
        `At ${printed(temperature)} K ${label} would be liquid in part, vapour pressure ${printed(pressure)} Pa by ${equation.title}`,
      );
    real = pressure;
  } catch (thrown) {
    if (!(thrown instanceof Refusal)) throw thrown;
    // no other model would hold water that condenses
    if (/^At .*\bH2O would condense/.test(thrown.message)) throw new Refusal(thrown.kind, `${thrown.message}${BESIDE_GAS}`);
    throw new Refusal(thrown.kind, `${thrown.message}; the ideal gas would give ${printed(ideal)} Pa; ${name}`);
  }
  const difference = real / ideal - 1;
  if (Math.abs(difference) < CLOSE_ENOUGH) return;
  const size = `${Number(Math.abs(100 * difference).toPrecision(2))} %`;
  throw new Refusal(
    "range",
    `For ${label} at ${printed(temperature)} K${words ? `, ${words},` : ""} the ideal gas gives ${printed(ideal)} Pa, ${equation.title} ${printed(real)} Pa (${size} ${difference > 0 ? "more" : "less"}): ${name}`,
  );
}

const made = new WeakMap<Substance, Map<string, RealGas>>();

/** The substance by a cubic equation. Refuses what is not a gas, and (absent) species without Tc, pc and acentric factor, naming them. */
export function realGasOf(substance: Substance, equation: CubicEquation): RealGas {
  let held = made.get(substance);
  if (!held) made.set(substance, (held = new Map()));
  const found = held.get(equation.id);
  if (found) return found;
  const real = build(substance, equation);
  held.set(equation.id, real);
  return real;
}

function build({ parts }: Substance, equation: CubicEquation): RealGas {
  const keys = parts.map(({ species }) => keyOf(species));
  const constants = keys.map(criticalOf);
  const missing = parts.filter((_, i) => constants[i] === undefined).map(({ species }) => species);
  if (missing.length > 0) refuseAbsent(`The library has no critical constants with an acentric factor for ${missing.join(", ")}`);
  const pairs = equation === FIRST ? pairsOf(keys) : [];
  const gas = new CubicGas(
    equation,
    constants.map((row, i) => ({ fraction: parts[i]!.fraction, critical: criticalPoint(row!, parts[i]!.species) })),
    (i, j) => pairs.find(({ pair }) => pair.includes(keys[i]!) && pair.includes(keys[j]!))?.kij ?? 0,
  );
  return { equation, gas, constants: constants.map((row) => row!), pairs };
}

/** Key of water as a gas. */
export const WATER = "H2O";
/** Where water that condenses belongs. */
export const BESIDE_GAS = "; WATER.SEALED holds water with a gas over it";

function criticalPoint({ species: key, temperature, pressure, acentric }: UsableConstants, species: string) {
  const point = { species, temperature, pressure: pressure * 1e6, acentric };
  return key === WATER ? { ...point, vapourPressure: waterVapourPressure } : point;
}

/** Over liquid water and over ice; below 190 K its value at 190 K, which no gas holds either. */
function waterVapourPressure(temperature: number): number {
  return saturationPressure(Math.min(Math.max(temperature, 190), saturation.criticalTemperature), saturation);
}

/** Parameters are printed for the equation of Peng and Robinson only. */
function pairsOf(keys: readonly string[]): PairParameter[] {
  return keys.flatMap((one, i) => keys.slice(i + 1).flatMap((other) => pairOf(one, other) ?? []));
}

/** The library's key of a species, or of a coefficient block the name as it is written there. */
export function keyOf(species: string): string {
  return knownKeys.at(species, () => findKey(species));
}

const knownKeys = new BoundedCache<string>(500);

function findKey(species: string): string {
  try {
    return findSpecies(species).key;
  } catch (thrown) {
    if (thrown instanceof Refusal) return species;
    throw thrown;
  }
}
