/** Condensed phases: which are there, how much of them, and nothing outside its range. */
import { atPressure, atVolume, isobaric, rigid } from "../../../src/core/equilibrium/states";
import { systemOf } from "../../../src/core/equilibrium/system";
import type { Equilibrium } from "../../../src/core/equilibrium/types";
import { saturationPressure } from "../../../src/core/water/saturation";
import { saturation } from "../../../src/data/saturation";
import { candidate, feedOf, named, systemOfNames } from "./candidates";

const WATER = "H2O H2 O2 H2O(l) H2O(cr)";
const water = systemOfNames(WATER);
const steam = feedOf({ H2O: 1 });

/** Amounts by name, without what is not there. */
const amountsOf = (keys: string, state: Equilibrium) =>
  Object.fromEntries(
    keys
      .split(" ")
      .map((key, j) => [key, state.amounts[j]!] as const)
      .filter(([, amount]) => amount > 1e-9),
  );

describe("water", () => {
  // The pressure over liquid and ice of nasa-2002 with an ideal vapour against the saturation pressure of the water releases. The vapour
  // of the tables is not ideal: at 350 K its fugacity is 0.8 % below its pressure, and beyond 373 K this grows. Below 320 K what is left,
  // 0.3 %, is the set's own: an error of 0.003 RT in the Gibbs energies.
  test.each([
    [220, 0.3],
    [250, 0.3],
    [273, 0.2],
    [273.16, 0.2],
    [280, 0.2],
    [298.15, 0.2],
    [320, 0.4],
    [350, 0.9],
    [373, 1.6],
  ])("liquid or ice and vapour stand at the saturation pressure: %d K, to %d %%", (temperature, percent) => {
    const pressure = saturationPressure(temperature, saturation);
    const room = (0.5 * 8.314 * temperature) / pressure;
    const state = atVolume(water, steam, temperature, room);
    expect(100 * Math.abs(state.pressure / pressure - 1)).toBeLessThan(percent);
    const condensed = temperature < 273.15 ? "H2O(cr)" : "H2O(l)";
    const amounts = amountsOf(WATER, state);
    expect(Object.keys(amounts)).toEqual(["H2O", condensed]);
    expect(amounts[condensed]).toBeCloseTo(0.5, 1);
  });

  test("at a pressure it is all vapour or all condensed: no gas, no volume", () => {
    const boiled = atPressure(water, steam, 373.3, 1e5);
    expect(amountsOf(WATER, boiled)).toEqual({ H2O: expect.closeTo(1, 7) });
    for (const [temperature, name] of [
      [373.1, "H2O(l)"],
      [273.15, "H2O(l)"],
      [273.14, "H2O(cr)"],
    ] as const) {
      const state = atPressure(water, steam, temperature, 1e5);
      expect(amountsOf(WATER, state)).toEqual({ [name]: 1 });
      expect([state.gas, state.volume, state.pressure]).toEqual([0, 0, 1e5]);
      expect(state.energy).toBe(candidate(name).capacity.energy(temperature));
      expect(state.logAmounts[0]).toBe(-Infinity);
    }
  });

  test("condensed completely it is found by its enthalpy too, and vapour above it", () => {
    const ice = candidate("H2O(cr)").capacity;
    const cold = isobaric(water, steam, ice.enthalpy(250), 1e5);
    expect(cold.temperature).toBeCloseTo(250, 9);
    expect(cold.volume).toBe(0);
    const vapour = isobaric(water, steam, candidate("H2O").capacity.enthalpy(500), 1e5);
    expect(vapour.temperature).toBeCloseTo(500, 4);
  });

  test("a little nitrogen keeps a gas above liquid water at any pressure", () => {
    const system = systemOfNames(`${WATER} N2`);
    for (const nitrogen of [1e-3, 1e-12, 1e-20]) {
      const state = atPressure(system, feedOf({ H2O: 1, N2: nitrogen }), 300, 1e9);
      expect(state.amounts[5]).toBeCloseTo(nitrogen, 12);
      expect(state.gas / nitrogen).toBeCloseTo(1, 5);
      expect(state.pressure / 1e9).toBeCloseTo(1, 12);
    }
  });

  test("outside its range a phase is left out, and named", () => {
    const names = (temperature: number) => atVolume(water, steam, temperature, 1).leftOut;
    expect(names(250)).toEqual(["H2O(l)"]);
    expect(names(273.15)).toEqual([]);
    expect(names(300)).toEqual(["H2O(cr)"]);
    expect(names(600.1)).toEqual(["H2O(l)", "H2O(cr)"]);
    // Liquid water of the set ends at 600 K: beyond, there is vapour under pressures at which there is liquid.
    expect(atPressure(water, steam, 600, 1.3e7).gas).toBe(0);
    expect(atPressure(water, steam, 600.1, 1.3e7).gas).toBeCloseTo(1, 9);
    // What cannot form from the feed is not said to be left out.
    expect(atVolume(systemOfNames(`${WATER} C(gr) CO2`), steam, 250, 1).leftOut).toEqual(["H2O(l)"]);
  });
});

describe("carbon", () => {
  const keys = "CO CO2 H2 H2O CH4 O2 N2 C(gr)";
  const system = systemOfNames(keys);

  test("comes out of rich mixtures and not of lean ones", () => {
    const carbonAt = (oxygen: number) => atPressure(system, feedOf({ CH4: 1, O2: oxygen, N2: 3.76 * oxygen }), 1200, 1e5).amounts[7]!;
    expect(carbonAt(0.3)).toBeGreaterThan(0.35);
    expect(carbonAt(0.3)).toBeLessThan(0.45);
    expect(carbonAt(0.6)).toBe(0);
    expect(carbonAt(2)).toBe(0);
  });

  test("graphite, CO and CO2: the Boudouard pressure ratio p(CO)²/p(CO2) is K of the set at every pressure", () => {
    const list = named("CO CO2 C(gr)");
    const g = list.map(({ capacity }) => (capacity.enthalpy(1000) / 1000 - capacity.entropy(1000)) / 8.31451);
    for (const pressure of [1e3, 1e5, 1e7]) {
      const state = atPressure(systemOf(list), feedOf({ CO: 1, CO2: 0.1 }), 1000, pressure);
      const [co, co2] = [0, 1].map((j) => ((state.amounts[j]! / state.gas) * pressure) / 1e5);
      if (state.amounts[2] === 0) expect((co! * co!) / co2!).toBeLessThan(Math.exp(g[1]! + g[2]! - 2 * g[0]!));
      else expect(Math.log((co! * co!) / co2!)).toBeCloseTo(g[1]! + g[2]! - 2 * g[0]!, 11);
      expect(state.amounts[2]! > 0).toBe(pressure >= 1e5);
    }
  });

  test("alone it is all graphite; in a vacuum its vapour is a trace", () => {
    const alone = systemOfNames("C(gr) C(g)");
    expect(atPressure(alone, feedOf({ "C(gr)": 1 }), 300, 1e5).gas).toBe(0);
    const state = rigid(alone, feedOf({ "C(gr)": 1 }), candidate("C(gr)").capacity.energy(900), 1);
    expect(state.temperature).toBeCloseTo(900, 6);
    expect(state.gas).toBeLessThan(1e-25);
  });
});

describe("sulfur", () => {
  const keys = "SO2 H2S H2O H2 O2 S(g) S(a) S(b) S(L)";
  const system = systemOfNames(keys);

  // At 368.3 K and 388.36 K, where one range of the set ends and the next begins, both have a value: one is taken, never both.
  test.each([
    [300, ["S(a)"]],
    [368.29, ["S(a)"]],
    [368.3, ["S(a)", "S(b)"]],
    [368.31, ["S(b)"]],
    [388.36, ["S(b)", "S(L)"]],
    [388.37, ["S(L)"]],
    [1500, ["S(L)"]],
  ])("at %d K: %j", (temperature, allowed) => {
    const state = atVolume(system, feedOf({ "S(g)": 1, O2: 0.1, H2: 0.1 }), temperature, 0.01);
    const condensed = Object.keys(amountsOf(keys, state)).filter((name) => ["S(a)", "S(b)", "S(L)"].includes(name));
    expect(condensed).toHaveLength(1);
    expect(allowed).toContain(condensed[0]);
  });
});

test("exactly at saturation the amount condensed is nothing, and grows from there", () => {
  const pair = systemOfNames("H2O H2O(l)");
  const [vapour, liquid] = named("H2O H2O(l)").map(({ capacity }) => (capacity.enthalpy(350) / 350 - capacity.entropy(350)) / 8.31451);
  const saturated = (8.31446261815324 * 350) / (1e5 * Math.exp(liquid! - vapour!));
  for (const surplus of [1e-6, 1e-9, 1e-13, 1e-15, 0, -1e-15, -1e-9]) {
    const state = atVolume(pair, steam, 350, saturated * (1 - surplus));
    expect(Math.abs(state.amounts[1]! - Math.max(0, surplus))).toBeLessThan(1e-12);
    expect(state.amounts[0]! + state.amounts[1]!).toBeCloseTo(1, 14);
  }
  // Reached from where there is liquid, it is gone as soon as its amount would be negative, and comes back from where there is none.
  const [wet, dry] = [0.9, 1.1].map((part) => atVolume(pair, steam, 350, saturated * part));
  expect(wet!.amounts[1]).toBeCloseTo(0.1, 12);
  for (const surplus of [1e-4, 1e-8, 0, -1e-8, -1e-4, -0.5])
    for (const start of [wet, dry]) {
      const state = atVolume(pair, steam, 350, saturated * (1 - surplus), start);
      expect(Math.abs(state.amounts[1]! - Math.max(0, surplus))).toBeLessThan(1e-12);
    }
});
