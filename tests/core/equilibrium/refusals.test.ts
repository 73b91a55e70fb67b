/** What an equilibrium says no to, each with its whole sentence. */
import { fixedEnergy } from "../../../src/core/capacity/fixed-energy";
import { atPressure, atVolume, isobaric, rigid } from "../../../src/core/equilibrium/states";
import { systemOf } from "../../../src/core/equilibrium/system";
import type { Candidate, Reactant } from "../../../src/core/equilibrium/types";
import { refusedWith } from "../refused";
import { candidate, energyOf, feedOf, named, systemOfNames } from "./candidates";

const listRefused = (candidates: readonly Candidate[]) => refusedWith(() => systemOf(candidates));
const water = candidate("H2O");

describe("the list of species", () => {
  test("is not empty", () => expect(listRefused([])).toBe("input: The list of species is empty: an equilibrium needs at least one gas"));

  test("holds a gas", () =>
    expect(listRefused(named("H2O(l) C(gr)"))).toBe(
      "input: The list of species (H2O(l), C(gr)) holds no gas: an equilibrium here has a gas phase",
    ));

  test("names a species once", () => expect(listRefused([water, water])).toBe("input: The list of species names H2O twice"));

  test("has whole atoms", () => {
    expect(listRefused([{ ...water, name: "coal", counts: new Map([["H", 0.8]]) }])).toBe(
      "input: coal holds 0.8 atoms of H; a species at equilibrium has whole numbers",
    );
    expect(listRefused([{ ...water, counts: new Map([["H", -2]]) }])).toBe(
      "input: H2O holds -2 atoms of H; a species at equilibrium has whole numbers",
    );
    expect(listRefused([{ ...water, counts: new Map() }])).toBe("input: H2O holds no atoms and cannot take part in an equilibrium");
  });

  test("knows the enthalpy and the entropy of each", () => {
    expect(listRefused([{ ...water, capacity: fixedEnergy(-241826, "g", "block for H2O") }])).toBe(
      "input: block for H2O has no entropy, which an equilibrium needs",
    );
    const relative = Object.create(water.capacity, { onFormationScale: { value: false } }) as typeof water.capacity;
    expect(listRefused([{ ...water, capacity: relative }])).toBe(
      "input: nasa-2002 for H2O has no enthalpy of formation, which an equilibrium needs",
    );
  });

  test("is not endless", () => {
    const many = (count: number, element: (k: number) => string) =>
      Array.from({ length: count }, (_, k) => ({ ...water, name: `species ${k}`, counts: new Map([[element(k), 1]]) }));
    expect(listRefused(many(401, () => "H"))).toBe("input: The list has 401 species; at most 400 are taken");
    expect(listRefused(many(21, (k) => `E${k}`))).toBe("input: The species hold 21 elements; at most 20 are taken");
    expect(systemOf(many(400, (k) => `E${k % 20}`)).species).toHaveLength(400);
  });
});

const burnt = systemOfNames("CO2 CO H2O H2 O2 N2");
const refusedAt = (feed: readonly Reactant[], temperature = 1500) => refusedWith(() => atVolume(burnt, feed, temperature, 1));

describe("the feed", () => {
  test.each([-1, NaN, Infinity])("has no amount of %d", (amount) =>
    expect(refusedAt([{ ...water, amount }])).toBe(`input: The amount ${amount} of H2O is not a number from 0 up`),
  );

  test("is something", () => {
    expect(refusedAt([])).toBe("input: There is nothing in the feed: every amount is 0");
    expect(refusedAt([{ ...water, amount: 0 }])).toBe("input: There is nothing in the feed: every amount is 0");
  });

  test("brings no element that no species holds; one of amount 0 does not matter", () => {
    expect(refusedAt(feedOf({ CH4: 1, O2: 2, Ar: 0.1 }))).toBe("input: Ar brings Ar, and none of the species at equilibrium holds Ar");
    expect(atVolume(burnt, feedOf({ CH4: 1, O2: 2, Ar: 0 }), 1500, 1).gas).toBeGreaterThan(3);
  });

  test("can be made up of the species", () =>
    expect(refusedAt(feedOf({ CH4: 1 }))).toBe(
      "input: The atoms put in (C, H) cannot be made up of CO2, CO, H2O, H2, O2, N2 alone: add species to the list",
    ));

  test("forms a gas", () =>
    expect(refusedWith(() => atVolume(systemOfNames("O2 C(gr)"), feedOf({ "C(gr)": 1 }), 1500, 1))).toBe(
      "input: None of the gases (O2) can form from the feed: an equilibrium here has a gas phase",
    ));

  test("may have broken counts: a fuel is not a species at equilibrium", () => {
    const coal = { name: "coal", counts: new Map([["C", 1], ["H", 0.8], ["O", 0.1]]), capacity: water.capacity, amount: 1 }; // prettier-ignore
    const state = atVolume(burnt, [coal, ...feedOf({ O2: 1.15 })], 1500, 1);
    expect(state.amounts[0]! + state.amounts[1]!).toBeCloseTo(1, 12);
    expect(state.amounts[2]! + state.amounts[3]!).toBeCloseTo(0.4, 12);
  });
});

describe("temperature, pressure and volume", () => {
  const feed = feedOf({ CH4: 1, O2: 2 });

  test("outside the range that the gases share the gas is named", () => {
    expect(refusedAt(feed, 199)).toBe("range: Temperature 199 K is below 200 K, the lower limit of nasa-2002 for CO2");
    const withWater = systemOfNames("CO2 H2O");
    expect(refusedWith(() => atPressure(withWater, feedOf({ CO2: 1, H2O: 1 }), 7000, 1e5))).toBe(
      "range: Temperature 7000 K is above 6000 K, the upper limit of nasa-2002 for H2O",
    );
    expect(refusedAt(feed, NaN)).toBe("input: The temperature is not a number");
    expect(refusedAt(feed, -5)).toBe("input: Temperature -5 K is not above absolute zero (0 K)");
  });

  test.each([0, -1, NaN, Infinity])("%d is no pressure and no volume", (value) => {
    const pressure = `range: The pressure ${value} Pa is not above 0 Pa`;
    const volume = `range: The volume ${value} m3 is not above 0 m3`;
    expect(refusedWith(() => atPressure(burnt, feed, 1500, value))).toBe(pressure);
    expect(refusedWith(() => isobaric(burnt, feed, -1e5, value))).toBe(pressure);
    expect(refusedWith(() => atVolume(burnt, feed, 1500, value))).toBe(volume);
    expect(refusedWith(() => rigid(burnt, feed, -1e5, value))).toBe(volume);
  });
});

describe("energy and enthalpy", () => {
  const system = systemOfNames("H2O H2 O2 H2O(l) H2O(cr)");
  const feed = feedOf({ H2O: 1 });

  test("beyond the range", () => {
    const most = Number(atVolume(system, feed, 6000, 0.01).energy.toPrecision(6));
    expect(refusedWith(() => rigid(system, feed, 1e7, 0.01))).toBe(
      `range: The energy of the contents, 10000000 J, leads above 6000 K, the upper limit of nasa-2002 for H2O, where it would be ${most} J`,
    );
    // Everything is ice there.
    const least = Number(candidate("H2O(cr)").capacity.enthalpy(200).toPrecision(6));
    expect(refusedWith(() => isobaric(system, feed, -3e5, 1e5))).toBe(
      `range: The enthalpy of the contents, -300000 J, leads below 200 K, the lower limit of nasa-2002 for H2O, where it would be ${least} J`,
    );
  });

  test.each([NaN, Infinity, -Infinity])("%d is none", (value) => {
    expect(refusedWith(() => rigid(system, feed, value, 1))).toBe("input: The energy of the contents is not a finite number");
    expect(refusedWith(() => isobaric(system, feed, value, 1e5))).toBe("input: The enthalpy of the contents is not a finite number");
  });

  test("inside a step no temperature has it: melting, and boiling under a pressure", () => {
    const melting = energyOf(feedOf({ "H2O(cr)": 0.5, "H2O(l)": 0.5 }), 273.15);
    expect(refusedWith(() => isobaric(system, feed, melting, 1e5))).toBe(
      `range: The enthalpy of the contents, ${Number(melting.toPrecision(6))} J, lies in a step at 273.15 K, where H2O(l) and H2O(cr) have their limits; no single temperature has it`,
    );
    expect(refusedWith(() => rigid(system, feed, melting, 1e-4))).toBe(
      `range: The energy of the contents, ${Number(melting.toPrecision(6))} J, lies in a step at 273.15 K, where H2O(l) and H2O(cr) have their limits; no single temperature has it`,
    );
    // nasa-2002 boils at 373.195 K under 1 bar (372.76 K in the tables): its liquid and its vapour are of two sources.
    expect(refusedWith(() => isobaric(system, feed, -262000, 1e5))).toBe(
      "range: The enthalpy of the contents, -262000 J, lies in a step at 373.195 K, where a condensed phase comes or goes; no single temperature has it",
    );
    // In a closed volume liquid and vapour are there together at every temperature between.
    expect(rigid(system, feed, -262000, 0.01).temperature).toBeGreaterThan(373);
  });
});
