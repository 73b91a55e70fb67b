/** What is held does not matter, nor does the order, the size or the spelling of a feed. */
import fc from "fast-check";
import { GAS_CONSTANT } from "../../src/core/constants";
import { atPressure, atVolume, isobaric, rigid } from "../../src/core/equilibrium/states";
import { systemOf } from "../../src/core/equilibrium/system";
import type { Equilibrium } from "../../src/core/equilibrium/types";
import { candidatesOf, feedOf } from "../core/equilibrium/candidates";
import { place, problem, type Problem, written } from "./equilibrium-support";

/** Runs a property over feeds and says which feed it failed for. */
function forFeeds(numRuns: number, check: (one: Problem, state: Equilibrium) => void): void {
  let tried = 0;
  fc.assert(
    fc.property(problem, (one) => {
      try {
        const state = atPressure(one.system, one.feed, one.temperature, one.pressure);
        if (state.gas === 0) return; // Nothing to hold a volume with; tests/core/equilibrium/phases.test.ts has these.
        tried++;
        check(one, state);
      } catch (thrown) {
        throw new Error(`${written(one)}: ${String(thrown)}`);
      }
    }),
    { numRuns },
  );
  expect(tried).toBeGreaterThan(0.9 * numRuns);
}

/** Another state of the same species: the amounts handed round, at another temperature and pressure. */
const elsewhere = fc.record({ turn: fc.nat(4), temperature: place, pressure: place });

/** The largest difference of an amount, relative to itself, over all that are no rounding of the feed. */
function differenceOf(one: Equilibrium, other: Equilibrium): number {
  return Math.max(0, ...one.logAmounts.map((log, j) => (log === other.logAmounts[j] ? 0 : Math.abs(log - other.logAmounts[j]!))));
}

const near = (value: number, wanted: number) => Math.abs(value / wanted - 1);
/**
 * A search ends within an error of its last step's square, 1e-18; what is left is the rounding of energies. Gases leave 1e-13; the fit of
 * liquid water has terms of 1e9 J/mol that cancel, whose rounding (in the printed coefficients times R) is 1e-7 J/mol, and beside Cp T of
 * 2e4 J/mol 5e-12.
 */
const HELD = 2e-11;
/** ln n is a difference of potentials of up to 2000 (200 K), whose rounding is 2e-13 each. */
const ROUNDING = 5e-12;

/**
 * True near the end of the range of a condensed species. There the Gibbs energies of a set meet only nearly (ice and water at 273.15 K to
 * 3e-4 RT), so that on warming a little vapour may condense as the phase changes: the energy falls by a hair, and two temperatures some
 * mK apart have it. Either is right.
 */
const atTransition = ({ list, temperature }: Problem) =>
  list.some(({ capacity }) => capacity.phase !== "g" && [capacity.from, capacity.to].some((end) => near(temperature, end) < 1e-4));

test("one state, whatever two quantities are held", () =>
  forFeeds(500, (one, state) => {
    const { system, feed, temperature, pressure } = one;
    const held = atVolume(system, feed, temperature, state.volume);
    expect(near(held.pressure, pressure)).toBeLessThan(HELD);
    expect(differenceOf(held, state)).toBeLessThan(ROUNDING);
    if (atTransition(one)) return;
    const closed = rigid(system, feed, state.energy, state.volume);
    expect(near(closed.temperature, temperature)).toBeLessThan(HELD);
    expect(near(closed.pressure, pressure)).toBeLessThan(HELD);
    const open = isobaric(system, feed, state.enthalpy, pressure);
    expect(near(open.temperature, temperature)).toBeLessThan(HELD);
    expect(near(open.volume, state.volume)).toBeLessThan(HELD);
    const again = atVolume(system, feed, closed.temperature, closed.volume);
    expect(differenceOf(again, closed)).toBeLessThan(ROUNDING);
    expect(near(again.pressure, closed.pressure)).toBeLessThan(HELD);
  }));

test("twice the feed in twice the room is twice the amounts", () =>
  forFeeds(300, ({ system, feed, temperature, pressure }, state) => {
    const twice = atVolume(
      system,
      feed.map((each) => ({ ...each, amount: 2 * each.amount })),
      temperature,
      2 * state.volume,
    );
    const halved = { ...twice, logAmounts: twice.logAmounts.map((log) => log - Math.LN2) };
    expect(differenceOf(halved, state)).toBeLessThan(ROUNDING);
    expect(near(twice.pressure, pressure)).toBeLessThan(HELD);
    expect(near(twice.energy, 2 * state.energy)).toBeLessThan(HELD);
  }));

test("the order of species and of reactants does not matter", () =>
  forFeeds(300, ({ list, feed, temperature, pressure }, state) => {
    const order = list.map((_, j) => j).sort((a, b) => ((7919 * a) % 101) - ((7919 * b) % 101));
    const shuffled = atPressure(systemOf(order.map((j) => list[j]!)), [...feed].reverse(), temperature, pressure);
    const sorted = new Float64Array(list.length);
    order.forEach((j, place) => (sorted[j] = shuffled.logAmounts[place]!));
    expect(differenceOf({ ...shuffled, logAmounts: sorted }, state)).toBeLessThan(ROUNDING);
  }));

test("the state a search starts from, near or far, does not matter", () => {
  fc.assert(
    fc.property(problem, elsewhere, ({ system, feed, temperature, pressure }, other) => {
      const turned = feed.map((each, k) => ({ ...each, amount: feed[(k + other.turn) % feed.length]!.amount }));
      const start = atPressure(system, turned, system.from + (system.to - system.from) * other.temperature, 10 ** (9 * other.pressure));
      const state = atPressure(system, feed, temperature, pressure);
      const again = atPressure(system, feed, temperature, pressure, start);
      expect(differenceOf(again, state)).toBeLessThan(ROUNDING);
      expect(again.leftOut).toEqual(state.leftOut);
      if (state.gas === 0) return;
      expect(near(again.volume, state.volume)).toBeLessThan(HELD);
      expect(differenceOf(atVolume(system, feed, temperature, state.volume, start), state)).toBeLessThan(ROUNDING);
      // Held by energy it may end at the other of two temperatures with one energy (see above), but with that energy.
      const scale = Math.abs(state.energy) + state.gas * GAS_CONSTANT * temperature;
      expect(Math.abs(rigid(system, feed, state.energy, state.volume, start).energy - state.energy) / scale).toBeLessThan(1e-11);
      expect(Math.abs(isobaric(system, feed, state.enthalpy, pressure, start).enthalpy - state.enthalpy) / scale).toBeLessThan(1e-11);
    }),
    { numRuns: 400 },
  );
});

test("a state without gas may start a search too", () => {
  const system = systemOf(candidatesOf("nasa-2002", "H O", "all phases"));
  const water = feedOf({ H2O: 1 });
  const start = atPressure(system, water, 300, 1e5);
  expect(start.gas).toBe(0);
  for (const temperature of [280, 400, 3000]) {
    const state = atPressure(system, water, temperature, 1e5);
    expect(differenceOf(atPressure(system, water, temperature, 1e5, start), state)).toBeLessThan(ROUNDING);
  }
});

const rewritten: readonly [Record<string, number>, Record<string, number>][] = [
  [
    { CH4: 1, O2: 2 },
    { CO2: 1, H2O: 2 },
  ],
  [{ CO: 2, O2: 1 }, { CO2: 2 }],
  [{ N2: 1, H2: 3 }, { NH3: 2 }],
  [
    { C2H6: 1, N2O: 1 },
    { "C(gr)": 2, H2: 3, N2: 1, O2: 0.5 },
  ],
  [
    { NO: 2, H2O: 1 },
    { N2: 1, O2: 1, "H2O(l)": 1 },
  ],
  [
    { C3H8: 1, O2: 5, N2: 18.75 },
    { CO2: 3, "H2O(l)": 2, H2O: 2, N2: 18.75 },
  ],
];

test("a feed may be written in other species of the same atoms", () => {
  const list = candidatesOf("nasa-2002", "C H O N", "all phases");
  const of = (record: Record<string, number>) => {
    const elements = new Set(feedOf(record).flatMap(({ counts }) => [...counts.keys()]));
    return systemOf(list.filter(({ counts }) => [...counts.keys()].every((element) => elements.has(element))));
  };
  fc.assert(
    fc.property(
      fc.constantFrom(...rewritten),
      place.map((part) => 200 + 5300 * part),
      place.map((part) => 9 * part),
      ([one, other], t, power) => {
        const state = atPressure(of(one), feedOf(one), t, 10 ** power);
        const again = atPressure(of(one), feedOf(other), t, 10 ** power);
        // The atoms are the same to the last of 32 digits, and nothing else of the feed is used.
        expect(again).toEqual(state);
      },
    ),
    { numRuns: 300 },
  );
});
