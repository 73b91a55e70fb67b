/** What an equilibrium is: the composition of least Helmholtz (T and V held) or Gibbs energy (T and P held); and how it follows T and V. */
import fc from "fast-check";
import { GAS_CONSTANT } from "../../src/core/constants";
import { integerNullSpace } from "../../src/core/numeric/null-space";
import { Solver } from "../../src/core/equilibrium/solver";
import { atPressure, atVolume } from "../../src/core/equilibrium/states";
import { totalsOf } from "../../src/core/equilibrium/system";
import type { Candidate, Equilibrium } from "../../src/core/equilibrium/types";
import { place, problem, type Problem, written } from "./equilibrium-support";

/** All reactions among the species, as whole coefficients; none changes an atom. */
function reactionsOf(list: readonly Candidate[]): number[][] {
  const elements = [...new Set(list.flatMap(({ counts }) => [...counts.keys()]))];
  const rows = elements.map((element) => list.map(({ counts }) => BigInt(counts.get(element) ?? 0)));
  return integerNullSpace(rows, list.length).map((vector) => vector.map(Number));
}

/**
 * Change of A/RT (volume held) or G/RT (pressure held) from amounts n to n + d, mol. Of a gas n (g + ln(n RT / V p°) − 1), or
 * n (g + ln(n P / N p°)); of a condensed phase n g. Written with ln(1 + d/n), as the change is small beside the terms.
 */
function change(list: readonly Candidate[], state: Equilibrium, d: readonly number[], held: "volume" | "pressure"): number {
  const { temperature, volume, pressure, amounts, logAmounts, gas } = state;
  let total = 0;
  let gasChange = 0;
  for (const [j, { capacity, fitGasConstant }] of list.entries()) {
    if (d[j] === 0) continue;
    const g = (capacity.enthalpy(temperature) / temperature - capacity.entropy(temperature)) / fitGasConstant;
    const n = amounts[j]!;
    if (capacity.phase !== "g") total += d[j]! * g;
    else {
      gasChange += d[j]!;
      const concentration = held === "volume" ? (GAS_CONSTANT * temperature) / volume : pressure / gas;
      const potential = g + Math.log(concentration / capacity.standardPressure);
      // (n + d) ln(n + d) − n ln n
      const mixing = n > 1e-290 ? d[j]! * logAmounts[j]! + (n + d[j]!) * Math.log1p(d[j]! / n) : d[j]! * Math.log(d[j]!);
      total += d[j]! * potential + mixing;
    }
  }
  if (held === "volume") return total - gasChange;
  return total - (gas + gasChange) * Math.log1p(gasChange / gas);
}

/** The species that can be there and have a value, the most abundant first, with the amounts of a state. */
function movable({ list, temperature }: Problem, state: Equilibrium): { list: Candidate[]; state: Equilibrium } {
  const there = list
    .map((_, j) => j)
    .filter((j) => {
      const { phase, from, to } = list[j]!.capacity;
      return phase === "g" ? state.logAmounts[j]! > -Infinity : temperature >= from && temperature <= to;
    })
    .sort((a, b) => state.logAmounts[b]! - state.logAmounts[a]!);
  const pick = (values: Float64Array) => Float64Array.from(there, (j) => values[j]!);
  return { list: there.map((j) => list[j]!), state: { ...state, amounts: pick(state.amounts), logAmounts: pick(state.logAmounts) } };
}

/** How far a reaction can go before it uses up a species, mol; forwards or backwards. */
const roomOf = (reaction: readonly number[], amounts: Float64Array) =>
  Math.min(...reaction.map((coefficient, j) => (coefficient < 0 ? amounts[j]! / -coefficient : Infinity)));

test("no small move of the composition lowers the Helmholtz or the Gibbs energy", () => {
  let moves = 0;
  const weight = place.map((part) => 0.01 + 0.49 * part);
  fc.assert(
    fc.property(problem, fc.array(weight, { minLength: 8, maxLength: 8 }), (one, weights) => {
      const whole = atPressure(one.system, one.feed, one.temperature, one.pressure);
      if (whole.gas === 0) return;
      const { list, state } = movable(one, whole);
      const ways = reactionsOf(list)
        .flatMap((forwards) => [forwards, forwards.map((coefficient) => -coefficient)])
        .map((way) => ({ way, room: roomOf(way, state.amounts) }))
        .filter(({ room }) => room > 1e-200);
      const mixed = list.map((_, j) => ways.reduce((sum, { way, room }, k) => sum + (way[j]! * room * weights[k % 8]!) / ways.length, 0));
      const single = ways.map(({ way, room }, k) => way.map((coefficient) => coefficient * room * weights[k % 8]!));
      for (const move of ways.length > 2 ? [mixed, ...single] : single) {
        moves++;
        for (const held of ["volume", "pressure"] as const)
          if (!(change(list, state, move, held) > 0))
            throw new Error(`${written(one)}, ${held} held: ${list.map(({ name }, j) => `${move[j]} ${name}`).join(" ")}`);
      }
    }),
    { numRuns: 300 },
  );
  expect(moves).toBeGreaterThan(1000);
});

/** Slope of a quantity from four values around it, spaced by `step`: error of the fourth order. */
const slopeOf = ([a, b, c, d]: readonly number[], step: number): number => (a! - 8 * b! + 8 * c! - d!) / (12 * step);

const STEP = 1e-4;

test("energy, enthalpy and amount of gas follow temperature and volume as the slopes say", () => {
  let tried = 0;
  fc.assert(
    fc.property(problem, fc.constantFrom("temperature", "volume"), (one, along) => {
      const { system, feed, temperature, pressure } = one;
      const { gas, volume } = atPressure(system, feed, temperature, pressure);
      const solver = new Solver(system, totalsOf(system, feed));
      const inside = temperature * (1 - 3 * STEP) > system.from && temperature * (1 + 3 * STEP) < system.to;
      if (gas === 0 || !inside) return;
      solver.settle(temperature, volume);
      const { present } = solver;
      const slopes = solver.slopes(along);
      const points = [-2, -1, 1, 2].map((steps) => {
        const factor = Math.exp(steps * STEP);
        solver.settle(along === "temperature" ? temperature * factor : temperature, along === "volume" ? volume * factor : volume);
        return { gas: solver.gas, energy: solver.energy, enthalpy: solver.enthalpy, present: solver.present };
      });
      if (points.some((point) => point.present.join() !== present.join())) return; // a phase comes or goes: there is a bend
      tried++;
      const scales = { gas, energy: gas * GAS_CONSTANT * temperature, enthalpy: gas * GAS_CONSTANT * temperature };
      for (const what of ["gas", "energy", "enthalpy"] as const) {
        const values = points.map((point) => point[what]);
        // 1e-8 of fourth order (an exponent of up to 1000 for each unit of ln T, to the fourth power, times 1e-16), and the rounding.
        const allowed = 1e-6 * (Math.abs(slopes[what]) + scales[what]) + (1e-14 * Math.abs(values[0]!)) / STEP;
        const difference = Math.abs(slopeOf(values, STEP) - slopes[what]);
        if (!(difference < allowed)) throw new Error(`${written(one)}, ${what} by ${along}: off by ${difference}, allowed ${allowed}`);
      }
    }),
    { numRuns: 400 },
  );
  expect(tried).toBeGreaterThan(200);
});

test("pressure falls with volume, energy rises with temperature", () => {
  fc.assert(
    fc.property(problem, place, place, (one, first, second) => {
      const { system, feed, temperature, pressure } = one;
      const { gas, volume } = atPressure(system, feed, temperature, pressure);
      if (gas === 0 || Math.abs(first - second) < 1e-6) return;
      const [low, high] = [Math.min(first, second), Math.max(first, second)];
      const [narrow, wide] = [low, high].map((part) => atVolume(system, feed, temperature, volume * 100 ** part));
      // Over a pure condensed phase the pressure stays as it is, to its rounding.
      expect(wide!.pressure / narrow!.pressure).toBeLessThan(1 + 1e-12);
      const { from, to } = system;
      const [cold, hot] = [low, high].map((part) => atVolume(system, feed, Math.min(to, from + (to - from) * part), volume));
      // Where a phase of the set ends, its Gibbs energy meets that of the next only nearly: 3e-4 RT of what changes phase is the most it falls.
      const condensed = one.list.some(({ capacity }) => capacity.phase !== "g");
      expect(hot!.energy - cold!.energy).toBeGreaterThan(condensed ? -1e-3 * hot!.gas * GAS_CONSTANT * temperature : 0);
    }),
    { numRuns: 300 },
  );
});
