import fc from "fast-check";
import { GAS_CONSTANT } from "../../../src/core/constants";
import { completeProducts, completeRigid, elementTotals, requireLean } from "../../../src/core/equilibrium/complete";
import { proportion } from "../../../src/core/equilibrium/oxygen";
import type { Reactant } from "../../../src/core/equilibrium/types";
import { refusedWith } from "../refused";
import { atoms, simpleAir, species, written } from "./substances";

const START = 298.15;
const energyOf = (parts: readonly Reactant[]) => parts.reduce((sum, { amount, capacity }) => sum + amount * capacity.energy(START), 0);
const moles = (parts: readonly { amount: number }[]) => parts.reduce((sum, { amount }) => sum + amount, 0);
const candidates = (parts: readonly { name: string; amount: number }[]) =>
  parts.map(({ name, amount }) => ({ candidate: species(name), amount }));

/** Temperature, K, and pressure ratio of complete combustion at constant volume from 298.15 K and 1 atm. */
function burned(fuel: string, ratio: number): { temperature: number; ratioOfPressures: number } {
  const reactants = proportion([species(fuel)], simpleAir, ratio);
  const volume = (moles(reactants) * GAS_CONSTANT * START) / 101325;
  const state = completeRigid(candidates(completeProducts(reactants)), energyOf(reactants), volume);
  return { temperature: state.temperature, ratioOfPressures: state.pressure / 101325 };
}

test.each([
  // recomputed independently from the nasa-2002 coefficients, O2 + 3.76 N2, frozen complete products; half a unit of the printed digit
  ["CH4", 2818.2, 9.452],
  ["H2", 3032.4, 8.666],
  ["C3H8", 2902.8, 10.129],
  ["CO", 3178.8, 9.085],
])("%s at ratio 1 in simple air: %d K, pressure ratio %d", (fuel, temperature, ratio) => {
  const state = burned(fuel, 1);
  expect(Math.abs(state.temperature - temperature)).toBeLessThanOrEqual(0.05);
  expect(Math.abs(state.ratioOfPressures - ratio)).toBeLessThanOrEqual(0.0005);
});

test("the products hold the energy that was put in, at any ratio", () => {
  fc.assert(
    fc.property(fc.constantFrom("CH4", "H2", "C3H8", "CO", "NH3", "H2S"), fc.double({ min: 0.05, max: 1, noNaN: true }), (fuel, ratio) => {
      const reactants = proportion([species(fuel)], simpleAir, ratio);
      const products = candidates(completeProducts(reactants));
      const { temperature, pressure } = completeRigid(products, energyOf(reactants), 0.25);
      const held = products.reduce((sum, { candidate, amount }) => sum + amount * candidate.capacity.energy(temperature), 0);
      expect(Math.abs(held - energyOf(reactants))).toBeLessThan(1e-6 * moles(products)); // 1e-9 K times some 30 J/K
      expect((pressure * 0.25) / (GAS_CONSTANT * temperature) / moles(products)).toBeCloseTo(1, 12);
    }),
  );
});

test("leaner mixtures are cooler", () => {
  const temperatures = [1, 0.8, 0.6, 0.4, 0.2].map((ratio) => burned("CH4", ratio).temperature);
  expect([...temperatures].sort((a, b) => b - a)).toEqual(temperatures);
});

test.each([
  ["CH4 in simple air", proportion([species("CH4")], simpleAir, 1), "1 CO2 + 2 H2O + 7.52 N2"],
  ["CH4 with twice the air", proportion([species("CH4")], simpleAir, 0.5), "1 CO2 + 2 H2O + 15.04 N2 + 2 O2"],
  ["thiophene", [atoms("C4H4S"), atoms("O2", 6)], "4 CO2 + 2 H2O + 1 SO2"],
  ["methyl chloride", [atoms("CH3Cl"), atoms("O2", 2), atoms("Ar", 3)], "1 CO2 + 1 H2O + 3 Ar + 1 HCl + 0.5 O2"],
  ["chloroform has no hydrogen left for water", [atoms("CHCl3", 2), atoms("CH4", 1), atoms("O2", 3)], "3 CO2 + 6 HCl"],
  ["carbon monoxide, without hydrogen", [atoms("CO"), atoms("O2", 0.5)], "1 CO2"],
])("%s", (_, reactants, products) => {
  // chloroform: 2 CHCl3 + CH4 hold 6 H and 6 Cl; 3 C bind 3 O2
  expect(written(completeProducts(reactants))).toBe(products);
});

test("atoms are kept", () => {
  const amount = fc.double({ min: 0.001, max: 5, noNaN: true });
  fc.assert(
    fc.property(amount, amount, amount, amount, fc.double({ min: 0.05, max: 1, noNaN: true }), (a, b, c, d, ratio) => {
      const fuel = [atoms("CH4", a), atoms("C4H4S", b), atoms("CH3Cl", c), atoms("CH0.8O0.1N0.015S0.005", d)];
      const reactants = proportion(fuel, [atoms("O2", 1), atoms("N2", 3), atoms("He", 0.1)], ratio);
      const before = elementTotals(reactants);
      const after = elementTotals(completeProducts(reactants).map(({ name, amount: mol }) => atoms(name, mol)));
      expect([...after.keys()].sort()).toEqual([...before.keys()].sort());
      for (const [element, total] of before) expect(after.get(element)! / total).toBeCloseTo(1, 11);
    }),
  );
});

test("decimals at ratio 1 leave no trace of oxygen", () => {
  const count = fc.integer({ min: 1, max: 300 }).map((hundredths) => hundredths / 100);
  fc.assert(
    fc.property(count, count, fc.integer({ min: 0, max: 40 }), (h, s, o) => {
      const fuel = atoms(`CH${h}S${s}${o > 0 ? `O${o / 100}` : ""}`);
      const air = [atoms("N2", 0.78084), atoms("O2", 0.20946), atoms("Ar", 0.0093), atoms("CO2", 0.0004)];
      expect(completeProducts(proportion([fuel], air, 1)).map(({ name }) => name)).toEqual(["CO2", "H2O", "SO2", "N2", "Ar"]);
    }),
  );
});

test("refusals", () => {
  expect(refusedWith(() => requireLean(1.2))).toBe(
    "range: Complete products hold up to equivalence ratio 1; at 1.2 the oxygen does not suffice: use equilibrium",
  );
  // ten steps of 0.1 are 1, though their sum in binary is not
  expect(() => requireLean(0.1 * 3 + 0.7)).not.toThrow();
  expect(() => requireLean(1 + 2e-16)).not.toThrow();
  expect(refusedWith(() => completeProducts([atoms("CH4"), atoms("O2", 1.5)]))).toBe(
    "range: Complete products bind 4 mol of oxygen atoms and 3 mol are there: the oxygen does not suffice, use equilibrium",
  );
  expect(refusedWith(() => completeProducts([atoms("CCl4"), atoms("CH4"), atoms("HCl"), atoms("F2"), atoms("O2", 9)]))).toBe(
    "input: Complete products bind each halogen atom to hydrogen; here are 7 mol of halogen for 5 mol of hydrogen: use equilibrium",
  );
  expect(refusedWith(() => completeProducts([atoms("Al2O3"), atoms("CH4"), atoms("O2", 9)]))).toBe(
    "input: Complete products are known here for C, H, O, N, S, halogens and noble gases, not for Al: use equilibrium",
  );
  const water = [{ candidate: species("H2O"), amount: 2 }];
  expect(refusedWith(() => completeRigid(water, 1e7, 0.02))).toBe(
    "range: The complete products would be above 6000 K, the upper limit of nasa-2002 for H2O",
  );
  expect(refusedWith(() => completeRigid(water, -1e7, 0.02))).toBe(
    "range: The complete products would be below 200 K, the lower limit of nasa-2002 for H2O",
  );
  expect(refusedWith(() => completeRigid(water, 0, 0))).toBe("range: Volume 0 m³ is not above 0");
  expect(refusedWith(() => completeRigid([{ candidate: species("C(gr)"), amount: 1 }], 0, 1))).toBe(
    "input: The products hold no gas, so that they have no pressure",
  );
});
