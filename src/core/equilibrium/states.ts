/**
 * Equilibrium held at temperature and volume, temperature and pressure, energy and volume, or enthalpy and pressure.
 *
 * Pressure rises as the volume falls and energy and enthalpy rise with temperature, at equilibrium too, so each search has one answer:
 * Newton's method with the slopes of the equilibrium, inside a bracket that shrinks.
 *
 * `start`, in each: an equilibrium of the same system not far away, as the one before in a sweep. It saves steps; the answer is the same but
 * for its last digits.
 */
import { GAS_CONSTANT } from "../constants";
import { printed, refuse, refuseRange } from "../refusal";
import { Solver } from "./solver";
import { type System, totalsOf } from "./system";
import type { Equilibrium, Reactant } from "./types";

/** Above this |ln Q − ln K|, or this difference of an element, an answer is refused. */
const LARGEST_RESIDUAL = 1e-9;
const STEPS = 100;
/** A last step of this relative length leaves an error of some ten times its square. */
const LAST_STEP = 2e-8;
/** With the bend known from a state this near (relative), and no stronger than this (relative), the error is of the step times its square. */
const LAST_BENT_STEP = 2e-6;
const NEAR = 0.01;
const STRONGEST_BEND = 30;
/** A gas below this mole fraction does not count in the energy. */
const TRACE = 1e-4;
/** Where the search for a temperature begins if nothing is known, K. */
const USUAL_TEMPERATURE = 2000;
/** A gas in less than this share of its largest possible volume is no gas phase. */
const VANISHED = 1e-12;

/** At a temperature, K, and a volume of the gas, m³. */
export function atVolume(
  system: System,
  reactants: readonly Reactant[],
  temperature: number,
  volume: number,
  start?: Equilibrium,
): Equilibrium {
  requirePositive(volume, "volume", "m3");
  const solver = new Solver(system, totalsOf(system, reactants), start);
  solver.settle(temperature, volume);
  return stateOf(solver);
}

/** At a temperature, K, and a pressure, Pa. Contents that condense completely have no gas and no volume. */
export function atPressure(
  system: System,
  reactants: readonly Reactant[],
  temperature: number,
  pressure: number,
  start?: Equilibrium,
): Equilibrium {
  requirePositive(pressure, "pressure", "Pa");
  const solver = new Solver(system, totalsOf(system, reactants), start);
  settleAtPressure(solver, temperature, pressure);
  return stateOf(solver);
}

/** With energy, J (U of everything, with formation), and volume of the gas, m³, held. */
export function rigid(system: System, reactants: readonly Reactant[], energy: number, volume: number, start?: Equilibrium): Equilibrium {
  requirePositive(volume, "volume", "m3");
  const solver = new Solver(system, totalsOf(system, reactants), start);
  settleAtTotal(solver, start?.temperature ?? USUAL_TEMPERATURE, energy, "energy", (temperature) => {
    solver.settle(temperature, volume);
    return { value: solver.energy, slope: solver.slopes("temperature").energy };
  });
  return stateOf(solver);
}

/** With enthalpy, J (H of everything, with formation), and pressure, Pa, held. */
export function isobaric(
  system: System,
  reactants: readonly Reactant[],
  enthalpy: number,
  pressure: number,
  start?: Equilibrium,
): Equilibrium {
  requirePositive(pressure, "pressure", "Pa");
  const solver = new Solver(system, totalsOf(system, reactants), start);
  settleAtTotal(solver, start?.temperature ?? USUAL_TEMPERATURE, enthalpy, "enthalpy", (temperature) => {
    settleAtPressure(solver, temperature, pressure);
    if (solver.gas === 0) return { value: solver.enthalpy, slope: temperature * solver.heatCapacity };
    const warmer = solver.slopes("temperature");
    const wider = solver.slopes("volume");
    const expansion = (1 + warmer.gas / solver.gas) / (1 - wider.gas / solver.gas);
    return { value: solver.enthalpy, slope: warmer.enthalpy + expansion * wider.enthalpy };
  });
  return stateOf(solver);
}

function requirePositive(value: number, name: string, unit: string): void {
  if (!(value > 0 && value < Infinity)) refuseRange(`The ${name} ${printed(value)} ${unit} is not above 0 ${unit}`);
}

/** Finds ln V: ln(N R T / V P) falls by 1 − d ln N / d ln V for each unit of it. */
function settleAtPressure(solver: Solver, temperature: number, pressure: number): void {
  solver.requireTemperature(temperature);
  const atoms = solver.totals.reduce((sum, [total]) => sum + total, 0);
  const most = Math.log((atoms * GAS_CONSTANT * temperature) / pressure);
  let high = most;
  let low = -Infinity;
  let position = solver.volume > 0 ? Math.min(Math.log(solver.volume), most) : most - Math.LN2;
  for (let step = 0; step < STEPS; step++) {
    solver.settle(temperature, Math.exp(position));
    const excess = Math.log(solver.pressure / pressure);
    if (excess > 0) low = position;
    else high = position;
    const slope = 1 - solver.slopes("volume").gas / solver.gas;
    const move = excess / slope;
    if (Math.abs(move) < LAST_STEP) {
      solver.settle(temperature, Math.exp(position + move));
      return;
    }
    if (position < most + Math.log(VANISHED) && solver.balances.canCondense) return solver.condense(pressure);
    const next = position + Math.max(-3, Math.min(3, Number.isNaN(move) ? -3 : move));
    position = next > low && next < high ? next : low === -Infinity ? position - 3 : (low + high) / 2;
  }
  refuse(`The volume at ${printed(temperature)} K and ${printed(pressure)} Pa was not found in ${STEPS} steps`);
}

interface Total {
  readonly value: number;
  /** By ln T. */
  readonly slope: number;
}

/** The temperature at which a total of the contents, J, reaches a value: Newton's method in T inside the joint range of the gases. */
function settleAtTotal(solver: Solver, near: number, wanted: number, name: string, settle: (temperature: number) => Total): void {
  if (!Number.isFinite(wanted)) refuse(`The ${name} of the contents is not a finite number`);
  let low = solver.system.from;
  let high = solver.system.to;
  let temperature = Math.min(Math.max(near, low), high);
  let [before, beforeThat] = [Infinity, Infinity];
  let last: Rate | undefined;
  for (let step = 0; step < STEPS; step++) {
    const { value, slope } = settle(temperature);
    const excess = value - wanted;
    const rate = { temperature, rate: slope / temperature };
    const move = -excess / rate.rate;
    const end = lastMove(move, rate, last);
    if (end !== undefined) {
      settle(Math.min(Math.max(temperature + end, solver.system.from), solver.system.to));
      return;
    }
    last = rate;
    if (excess > 0) high = temperature;
    else low = temperature;
    if (low >= solver.system.to || high <= solver.system.from) refuseReach(solver, wanted, value, name, temperature);
    if (high - low < 1e-10 * high) refuseStep(solver, wanted, name, high);
    // Where the slope changes with a phase, steps can leap to and fro: they must halve every second time, or the bracket is halved.
    const next = nextTemperature(solver, temperature, move, low, high);
    const slow = Math.abs(next - temperature) > beforeThat / 2 && low > solver.system.from && high < solver.system.to;
    [before, beforeThat] = [Math.abs(next - temperature), before];
    temperature = slow ? (low + high) / 2 : next;
  }
  refuse(`The temperature at which the ${name} is ${printed(wanted)} J was not found in ${STEPS} steps`);
}

/** How a total rises at a temperature, J/K. */
interface Rate {
  readonly temperature: number;
  readonly rate: number;
}

/**
 * The step that ends the search, K, or undefined if it is too long for one: a short step of Newton, or a longer one bent as the rate has
 * changed since the temperature before (second order). A rate that changed too much for its distance tells of a phase that came or went.
 */
function lastMove(move: number, { temperature, rate }: Rate, last: Rate | undefined): number | undefined {
  const share = Math.abs(move) / temperature;
  if (share < LAST_STEP) return move;
  if (last === undefined || !(share < LAST_BENT_STEP)) return undefined;
  const distance = Math.abs(last.temperature - temperature) / temperature;
  const bend = (rate - last.rate) / (temperature - last.temperature) / (2 * rate);
  return distance < NEAR && Math.abs(bend) * temperature < STRONGEST_BEND ? move - bend * move * move : undefined;
}

/**
 * The next temperature: at most half as far again; an end of the range that was not tried yet where the step leads beyond it; else the
 * middle of the bracket.
 */
function nextTemperature(solver: Solver, temperature: number, move: number, low: number, high: number): number {
  const next = temperature + Math.max(-temperature / 2, Math.min(temperature / 2, move));
  if (next > low && next < high) return next;
  if (next >= high && high === solver.system.to) return high;
  if (next <= low && low === solver.system.from) return low;
  return (low + high) / 2;
}

function refuseReach(solver: Solver, wanted: number, value: number, name: string, temperature: number): never {
  const [side, limit] = temperature >= solver.system.to ? ["above", "upper"] : ["below", "lower"];
  const gases = solver.system.species.slice(0, solver.system.gases);
  const limiting = gases.find(({ capacity }) =>
    side === "above" ? capacity.to === solver.system.to : capacity.from === solver.system.from,
  )!;
  const label = side === "above" ? limiting.capacity.toLabel : limiting.capacity.fromLabel;
  refuseRange(
    `The ${name} of the contents, ${printed(wanted)} J, leads ${side} ${temperature} K, the ${limit} limit of ${label}, where it would be ${printed(value)} J${side === "above" ? fartherRange(solver) : ""}`,
  );
}

/** What a list without the gases whose fits end first would reach, if there is hardly anything of them. */
function fartherRange({ system: { species, gases, to }, balances, gas }: Solver): string {
  const all = species.slice(0, gases);
  const first = all.flatMap(({ capacity }, j) => (capacity.to === to ? [j] : []));
  const next = Math.min(...all.filter(({ capacity }) => capacity.to > to).map(({ capacity }) => capacity.to));
  if (next === Infinity || first.some((j) => balances.gasAmounts()[j]! > TRACE * gas)) return "";
  return `; a list of species without ${first.map((j) => species[j]!.name).join(", ")} reaches ${next} K`;
}

function refuseStep(solver: Solver, wanted: number, name: string, temperature: number): never {
  const phases = solver.system.species
    .slice(solver.system.gases)
    .filter(({ capacity }) => Math.abs(capacity.to - temperature) < 1e-3 || Math.abs(capacity.from - temperature) < 1e-3)
    .map((species) => species.name);
  const where =
    phases.length === 0
      ? "a condensed phase comes or goes"
      : `${phases.join(" and ")} ${phases.length > 1 ? "have their limits" : "has its limit"}`;
  refuseRange(
    `The ${name} of the contents, ${printed(wanted)} J, lies in a step at ${printed(temperature)} K, where ${where}; no single temperature has it`,
  );
}

function stateOf(solver: Solver): Equilibrium {
  const { system, balances } = solver;
  const count = system.species.length;
  const sorted = new Float64Array(count);
  sorted.set(balances.gasAmounts());
  const { members, condensed } = balances.basis;
  for (let k = 0; k < condensed; k++) sorted[members[k]!] = Math.max(0, balances.condensedAmount(k));
  const amounts = new Float64Array(count);
  const logAmounts = new Float64Array(count);
  for (let j = 0; j < count; j++) {
    amounts[system.places[j]!] = sorted[j]!;
    logAmounts[system.places[j]!] = j < system.gases ? balances.logs[j]! : Math.log(sorted[j]!);
  }
  const massAction = solver.massAction();
  const elements = solver.elementError(sorted);
  if (!(massAction <= LARGEST_RESIDUAL && elements <= LARGEST_RESIDUAL))
    refuse(
      `The equilibrium at ${printed(solver.temperature)} K misses its own laws: mass action by ${massAction.toExponential(1)}, elements by ${elements.toExponential(1)}; above ${LARGEST_RESIDUAL} it is not given`,
    );
  return {
    temperature: solver.temperature,
    pressure: solver.pressure,
    volume: solver.volume,
    amounts,
    logAmounts,
    gas: solver.gas,
    energy: solver.energy,
    enthalpy: solver.enthalpy,
    massAction,
    elements,
    leftOut: solver.leftOut.map((j) => system.species[j]!.name),
    evaluations: solver.evaluations,
    iterations: balances.iterations,
  };
}
