/** One species only, sixty of several sets, traces beside masses, both ends of the range, rooms of 1e-9 and 1e9 m³. */
import { GAS_CONSTANT } from "../../../src/core/constants";
import { atPressure, atVolume, isobaric, rigid } from "../../../src/core/equilibrium/states";
import { systemOf } from "../../../src/core/equilibrium/system";
import type { Candidate, Equilibrium, Reactant } from "../../../src/core/equilibrium/types";
import { elementDifference, massAction } from "../../laws/equilibrium-support";
import { candidatesOf, enthalpyOf, energyOf, feedOf, jointRange, named } from "./candidates";

/** The laws, worked out again. */
function expectLaws(list: readonly Candidate[], feed: readonly Reactant[], state: Equilibrium): void {
  expect(elementDifference(list, feed, state.amounts)).toBeLessThan(5e-14);
  if (state.gas === 0) return;
  const { present, absent } = massAction(list, state);
  expect(present).toBeLessThan(1e-11);
  expect(absent).toBeLessThan(1e-11);
  expect((state.pressure * state.volume) / (state.gas * GAS_CONSTANT * state.temperature)).toBeCloseTo(1, 13);
}

test("one species that cannot change: nitrogen, or a noble gas, is warmed as its heat capacity says", () => {
  for (const [key, amount] of [
    ["N2", 1],
    ["Ar", 1e-30],
    ["He", 1e6],
  ] as const) {
    const list = named(key);
    const feed = feedOf({ [key]: amount });
    const closed = rigid(systemOf(list), feed, amount * list[0]!.capacity.energy(700), 0.01);
    expect(closed.temperature).toBeCloseTo(700, 9);
    expect(closed.amounts[0]! / amount).toBeCloseTo(1, 13);
    expect(isobaric(systemOf(list), feed, amount * list[0]!.capacity.enthalpy(700), 1e5).temperature).toBeCloseTo(700, 9);
  }
});

test("gases that cannot react keep their amounts to the last digits", () => {
  const list = named("Ar He Ne N2");
  const amounts = { Ar: 1e-30, He: 1, Ne: 1e-12, N2: 1e6 };
  const state = atPressure(systemOf(list), feedOf(amounts), 3000, 1e5);
  Object.values(amounts).forEach((amount, j) => expect(state.amounts[j]! / amount).toBeCloseTo(1, 12));
});

test.each([1e-12, 1e-25])("%d of CO beside CO2, with nothing to react with, is not lost", (trace) => {
  const state = atVolume(systemOf(named("CO2 CO")), feedOf({ CO2: 1, CO: trace }), 3000, 1);
  // What stands beside 1 mol of CO2 has 32 digits in the totals.
  expect(state.amounts[1]! / trace).toBeCloseTo(1, 6);
});

const nasa = candidatesOf("nasa-2002", "C H O N", "all phases");

describe("C, H, O and N at both ends of the range, in the narrowest and the widest room", () => {
  const feeds: readonly Record<string, number>[] = [
    { CH4: 1, O2: 2, N2: 7.52 },
    { CH4: 1, O2: 1 },
    { CH4: 1e6, O2: 1e-12 },
    { CH4: 1e-30, O2: 1e-30 },
    { O2: 1e6, H2: 1e-12, "C(gr)": 1e-16 },
  ];
  const { from, to } = jointRange(nasa);

  test.each(feeds)("%j", (amounts) => {
    const feed = feedOf(amounts);
    const elements = new Set(feed.flatMap(({ counts }) => [...counts.keys()]));
    const list = nasa.filter(({ counts }) => [...counts.keys()].every((element) => elements.has(element)));
    const system = systemOf(list);
    for (const temperature of [from, to]) {
      for (const volume of [1e-9, 1e9]) expectLaws(list, feed, atVolume(system, feed, temperature, volume));
      for (const pressure of [1e-6, 1, 1e9]) {
        const state = atPressure(system, feed, temperature, pressure);
        expectLaws(list, feed, state);
        expect(state.pressure / pressure).toBeCloseTo(1, 12);
      }
    }
  });
});

test("cold and exactly stoichiometric: amounts far below the smallest double keep their logarithms", () => {
  const state = atPressure(systemOf(nasa), feedOf({ CH4: 1, O2: 2, N2: 7.52 }), 200, 1e5);
  const butane = nasa.findIndex(({ name }) => name === "i-C4H10");
  expect(state.amounts[butane]).toBe(0);
  expect(state.logAmounts[butane]).toBeLessThan(-750);
  expect(state.logAmounts[butane]).toBeGreaterThan(-5000);
});

describe("75 species of two sets and nine elements", () => {
  const all = [...candidatesOf("gri-1999", "C H O N Ar", "gases"), ...candidatesOf("nasa-2002", "C H O N S Cl F He", "all phases")];
  const list = all.filter(({ name }, j) => all.findIndex((each) => each.name === name) === j);
  const feed = feedOf({ CH4: 1, O2: 1.5, N2: 3, H2S: 0.1, HCl: 0.3, HF: 0.01, Ar: 0.1, He: 1e-12 }, list);
  const system = systemOf(list);

  test("at temperatures and pressures", () => {
    expect(list).toHaveLength(75);
    expect(system.elements).toHaveLength(9);
    for (const temperature of [300, 1000, 3000])
      for (const pressure of [1, 1e5, 1e9]) expectLaws(list, feed, atPressure(system, feed, temperature, pressure));
  });

  test("a flame, closed and open", () => {
    const volume = (6.01 * GAS_CONSTANT * 300) / 101325;
    const closed = rigid(system, feed, energyOf(feed, 300), volume);
    const open = isobaric(system, feed, enthalpyOf(feed, 300), 101325);
    for (const state of [closed, open]) expectLaws(list, feed, state);
    expect(closed.energy / energyOf(feed, 300)).toBeCloseTo(1, 11);
    expect(open.enthalpy / enthalpyOf(feed, 300)).toBeCloseTo(1, 11);
    expect(closed.temperature).toBeGreaterThan(open.temperature + 200);
  });
});

test("a flame in the narrowest and the widest room, and under the highest and the lowest pressure", () => {
  const feed = feedOf({ CH4: 1, O2: 2, N2: 7.52 });
  const system = systemOf(nasa);
  const temperatures = [1e-9, 1e-3, 1, 1e9].map((volume) => {
    const state = rigid(system, feed, energyOf(feed, 298.15), volume);
    expectLaws(nasa, feed, state);
    return state.temperature;
  });
  // The wider the room, the more is dissociated and the colder it is.
  expect([...temperatures].sort((a, b) => b - a)).toEqual(temperatures);
  for (const pressure of [1e-9, 1e12]) expectLaws(nasa, feed, isobaric(system, feed, enthalpyOf(feed, 298.15), pressure));
});
