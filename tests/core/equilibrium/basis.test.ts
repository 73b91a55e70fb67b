/** Bases, shares of other species in them, and what is left of the elements in them. */
import fc from "fast-check";
import { type Basis, basisOf } from "../../../src/core/equilibrium/basis";
import { type System, systemOf, totalsOf } from "../../../src/core/equilibrium/system";
import { candidatesOf, feedOf, systemOfNames } from "./candidates";

const placesOf = (system: System, keys: string) => keys.split(" ").map((key) => system.species.findIndex(({ name }) => name === key));
const namesOf = (system: System, basis: Basis) => basis.members.map((member) => system.species[member]!.name);
const sharesOf = (system: System, basis: Basis, key: string) => {
  const size = basis.members.length;
  const j = placesOf(system, key)[0]!;
  return [...basis.shares.subarray(j * size, (j + 1) * size)];
};
const basisFor = (system: System, feed: Record<string, number>, ranking: string, present = "") =>
  basisOf(system, totalsOf(system, feedOf(feed)), present === "" ? [] : placesOf(system, present), placesOf(system, ranking));

const combustion = systemOfNames("CO2 CO H2O H2 O2 OH O H CH4 C(gr)");

test("shares are those of the reactions of formation", () => {
  const basis = basisFor(combustion, { CH4: 1, O2: 3 }, "O2 CO2 H2O");
  expect(namesOf(combustion, basis)).toEqual(["O2", "CO2", "H2O"]);
  expect(sharesOf(combustion, basis, "CO")).toEqual([-0.5, 1, 0]);
  expect(sharesOf(combustion, basis, "H2")).toEqual([-0.5, 0, 1]);
  expect(sharesOf(combustion, basis, "OH")).toEqual([0.25, 0, 0.5]);
  expect(sharesOf(combustion, basis, "CH4")).toEqual([-2, 1, 2]);
  expect(sharesOf(combustion, basis, "CO2")).toEqual([0, 1, 0]);
});

test("the amounts of components follow from the elements: CH4 + 3 O2 is O2 + CO2 + 2 H2O", () => {
  expect([...basisFor(combustion, { CH4: 1, O2: 3 }, "O2 CO2 H2O").totals]).toEqual([1, 1, 2]);
  expect([...basisFor(combustion, { CH4: 1, O2: 3 }, "O H CO").totals]).toEqual([5, 4, 1]);
});

test("nothing is left of a component that the feed balances exactly", () => {
  const stoichiometric = basisFor(combustion, { CH4: 0.1, O2: 0.2 }, "H2O CO2 O2");
  expect([...stoichiometric.totals]).toEqual([0.2, 0.1, 0]);
  // 0.1 + 0.2 is not 0.3 in doubles, and a part in 1e16 of surplus would be 1e-16 mol of oxygen.
  expect([...basisFor(combustion, { CH4: 0.3, O2: 0.6 }, "H2O CO2 O2").totals]).toEqual([0.6, 0.3, 0]);
  expect(0.1 + 0.2 - 0.3).not.toBe(0);
});

test("what two doubles leave of a component that is balanced is taken for nothing", () => {
  // Three fuels, each with its oxygen: 1/7 mol, some 1e-13 and some 1e-28 mol, too many digits together. Each product is exact.
  const fuels = [
    ["CH4", 2, 1 / 7],
    ["C3H8", 5, Math.round(2 ** 49 / 3) * 2 ** -89],
    ["H2", 0.5, 2 ** -90 / 7],
  ] as const;
  const [oxygen] = feedOf({ O2: 1 });
  const feed = fuels.flatMap(([fuel, needed, amount]) => [...feedOf({ [fuel]: amount }), { ...oxygen!, amount: needed * amount }]);
  const basis = basisOf(combustion, totalsOf(combustion, feed), [], placesOf(combustion, "H2O CO2 O2"));
  expect(basis.totals[2]).toBe(0);
});

test("condensed phases come first; species that depend on those before are passed over", () => {
  const basis = basisFor(combustion, { CH4: 1, O2: 1 }, "CO CO2 O2 H2 H2O", "C(gr)");
  expect(namesOf(combustion, basis)).toEqual(["C(gr)", "CO", "H2"]);
  expect(basis.condensed).toBe(1);
});

test("more condensed phases than elements: those that depend on the others are left out", () => {
  const water = systemOfNames("H2O H2 O2 H2O(l) H2O(cr)");
  expect(namesOf(water, basisFor(water, { H2O: 1 }, "H2 O2", "H2O(l) H2O(cr)"))).toEqual(["H2O(l)", "H2"]);
});

test("fewer independent species than elements make a smaller basis: H2O and N2 alone never part H from O", () => {
  const system = systemOfNames("H2O N2");
  const basis = basisFor(system, { H2O: 2, N2: 1 }, "H2O N2");
  expect(namesOf(system, basis)).toEqual(["H2O", "N2"]);
  expect([...basis.totals]).toEqual([2, 1]);
});

const everything = systemOf(candidatesOf("gri-1999", "C H O N Ar", "gases"));

test("in any basis the shares make up the atoms of every species, and T its unit", () =>
  fc.assert(
    fc.property(fc.shuffledSubarray([...everything.species.keys()], { minLength: everything.species.length }), (ranking) => {
      const elements = everything.elements.length;
      const basis = basisOf(everything, totalsOf(everything, feedOf({ CH4: 1, O2: 2, N2: 7.52, Ar: 1 })), [], ranking);
      const size = basis.members.length;
      expect(size).toBe(elements);
      for (let j = 0; j < everything.species.length; j++)
        for (let i = 0; i < elements; i++) {
          let atoms = 0;
          for (const [k, member] of basis.members.entries())
            atoms += basis.shares[j * size + k]! * everything.atoms[member * elements + i]!;
          expect(atoms).toBeCloseTo(everything.atoms[j * elements + i]!, 12);
        }
      for (const [k, member] of basis.members.entries())
        for (let l = 0; l < size; l++) {
          let unit = 0;
          for (let i = 0; i < elements; i++) unit += basis.fromElements[l * elements + i]! * everything.atoms[member * elements + i]!;
          expect(unit).toBeCloseTo(k === l ? 1 : 0, 12);
        }
    }),
    { numRuns: 50 },
  ));
