/** Which species can form at all, and where the search begins. */
import { possibleSpecies, startOf } from "../../../src/core/equilibrium/start";
import { type System, totalsOf } from "../../../src/core/equilibrium/system";
import { atPressure } from "../../../src/core/equilibrium/states";
import { refusedWith } from "../refused";
import { feedOf, systemOfNames } from "./candidates";

const possibleOf = (system: System, feed: Record<string, number>) => {
  const possible = possibleSpecies(system, totalsOf(system, feedOf(feed)));
  return system.species.filter((_, j) => possible[j]).map(({ name }) => name);
};

test.each([
  ["CO from CO2 needs something that takes the oxygen", "CO2 CO", { CO2: 1 }, ["CO2"]],
  ["as O2 does", "CO2 CO O2", { CO2: 1 }, ["CO2", "CO", "O2"]],
  ["elements that were not put in form nothing", "CO2 CO O2 N2 NO H2", { CO2: 1 }, ["CO2", "CO", "O2"]],
  ["nor do those of an amount of 0", "CO2 CO O2 N2 NO", { CO2: 1, N2: 0 }, ["CO2", "CO", "O2"]],
  ["graphite takes the carbon that CO leaves", "CO2 CO C(gr)", { CO: 1 }, ["CO2", "CO", "C(gr)"]],
  ["CO and graphite make CO2, but CO2 neither of them", "CO2 CO C(gr)", { CO2: 1 }, ["CO2"]],
  ["nor in the other order of the list", "C(gr) CO CO2", { CO2: 1 }, ["CO2"]],
  ["H2 takes nothing from water that no species could take the oxygen of", "H2O H2 N2 NH3", { H2O: 1, N2: 1 }, ["H2O", "N2"]],
  ["graphite alone cannot part from CO2", "CO2 C(gr)", { CO2: 1 }, ["CO2"]],
  ["1e-12 of hydrogen still forms all that holds hydrogen", "H2O H2 OH O2 O", { O2: 1, H2: 1e-12 }, ["H2O", "H2", "OH", "O2", "O"]],
  ["1e-25 of CO beside CO2 is kept: it is in the second double", "CO2 CO", { CO2: 1, CO: 1e-25 }, ["CO2", "CO"]],
  ["1e-12 of CO beside CO2 forms nothing else", "CO2 CO", { CO2: 1, CO: 1e-12 }, ["CO2", "CO"]],
])("%s", (_, keys, feed, possible) => {
  expect(possibleOf(systemOfNames(keys), feed as unknown as Record<string, number>)).toEqual(possible);
});

test("what cannot form has no amount, and its logarithm says so", () => {
  const state = atPressure(systemOfNames("CO2 CO"), feedOf({ CO2: 2 }), 4000, 1e5);
  expect([...state.amounts]).toEqual([2, 0]);
  expect([...state.logAmounts]).toEqual([Math.log(2), -Infinity]);
});

test("what could form in the state a search starts from need not form here", () => {
  const system = systemOfNames("CO2 CO");
  const start = atPressure(system, feedOf({ CO2: 1, CO: 1 }), 4000, 1e5);
  expect([...start.amounts]).toEqual([1, 1]);
  expect([...atPressure(system, feedOf({ CO2: 2 }), 4000, 1e5, start).logAmounts]).toEqual([Math.log(2), -Infinity]);
  // And the other way round.
  const none = atPressure(system, feedOf({ CO2: 2 }), 4000, 1e5);
  expect([...atPressure(system, feedOf({ CO2: 1, CO: 1 }), 4000, 1e5, none).amounts]).toEqual([1, 1]);
});

test("the atoms put in must be what the species can hold", () => {
  const of = (keys: string, feed: Record<string, number>) => refusedWith(() => possibleOf(systemOfNames(keys), feed));
  expect(of("CO2 CO", { CO2: 1, O2: 1 })).toBe(
    "input: The atoms put in (C, O) cannot be made up of CO2, CO alone: add species to the list",
  );
  expect(of("H2O N2", { H2: 1, N2: 1 })).toBe("input: The atoms put in (H, N) cannot be made up of H2O, N2 alone: add species to the list");
});

test("the start is the least Gibbs energy without mixing: CO2 and H2O when cold, all of the oxygen used", () => {
  const system = systemOfNames("CO2 CO H2O H2 O2 CH4");
  const totals = totalsOf(system, feedOf({ CH4: 1, O2: 2 }));
  const potentials = Float64Array.from(system.species, ({ capacity }) => (capacity.enthalpy(300) / 300 - capacity.entropy(300)) / 8.31451);
  const { logs, present } = startOf(system, totals, potentials, possibleSpecies(system, totals));
  expect(present).toEqual([]);
  expect(Math.exp(logs[0]!)).toBeCloseTo(1, 12);
  expect(Math.exp(logs[2]!)).toBeCloseTo(2, 12);
  for (const j of [1, 3, 4, 5]) expect(logs[j]!).toBeLessThan(-25);
});
