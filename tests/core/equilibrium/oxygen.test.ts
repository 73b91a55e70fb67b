import fc from "fast-check";
import { elementTotals } from "../../../src/core/equilibrium/complete";
import { oxygenUptake, oxygenUptakeOf, proportion } from "../../../src/core/equilibrium/oxygen";
import type { Reactant } from "../../../src/core/equilibrium/types";
import { refusedWith } from "../refused";
import { atoms, simpleAir, species, written } from "./substances";

test.each([
  // by hand, from the equation of complete combustion beside each
  ["CH4", 2], // CH4 + 2 O2 = CO2 + 2 H2O
  ["C3H8", 5],
  ["C8H18", 12.5],
  ["C7H6O2", 7.5], // benzoic acid
  ["C12H22O11", 12], // sucrose: as much oxygen as water holds
  ["CO", 0.5],
  ["H2", 0.5],
  ["H2S", 1.5], // H2S + 1.5 O2 = SO2 + H2O
  ["NH3", 0.75], // 2 NH3 + 1.5 O2 = N2 + 3 H2O
  ["CH3Cl", 1.5], // CH3Cl + 1.5 O2 = CO2 + H2O + HCl
  ["CH1.686O0.843", 1], // cotton
  ["HCl", 0],
  ["CF4", 0],
  ["CO2", 0],
  ["H2O", 0],
  ["SO2", 0],
  ["N2", 0],
  ["Ar", 0],
  ["O2", -1],
  ["N2O", -0.5],
  ["O3", -1.5],
  ["F2", -0.5], // H2 + F2 = 2 HF: fluorine does the work of half an O2
  ["C3H5N3O9", -0.25], // nitroglycerin offers oxygen
])("%s takes up %d mol of oxygen", (formula, uptake) => {
  expect(oxygenUptake(atoms(formula))).toBe(uptake);
});

test("methane in simple air: 1 CH4 + 2 O2 + 7.52 N2, to the last bit", () => {
  expect(written(proportion([species("CH4")], simpleAir, 1))).toBe("1 CH4 + 2 O2 + 7.52 N2");
  expect(written(proportion([species("CH4")], simpleAir, 0.5))).toBe("1 CH4 + 4 O2 + 15.04 N2");
  expect(written(proportion([species("H2")], [species("O2")], 1))).toBe("1 H2 + 0.5 O2");
  expect(written(proportion([species("C3H8")], [species("N2O")], 1))).toBe("1 C3H8 + 10 N2O");
  expect(written(proportion([species("H2")], [atoms("F2")], 1))).toBe("1 H2 + 1 F2");
});

test("with whole numbers and ratio 1 the elements are stoichiometric without any tolerance", () => {
  const count = fc.integer({ min: 0, max: 40 });
  const share = fc.double({ min: 0.05, max: 0.99, noNaN: true });
  fc.assert(
    fc.property(count, fc.integer({ min: 1, max: 80 }), count, share, (c, h, s, oxygen) => {
      const fuel = atoms(`${c > 0 ? `C${c}` : ""}H${h}${s > 0 ? `S${s}` : ""}`);
      const air = [atoms("N2", 0.9 * (1 - oxygen)), atoms("O2", oxygen), atoms("Ar", 0.1 * (1 - oxygen))];
      const totals = elementTotals(proportion([fuel], air, 1));
      expect(totals.get("O")).toBe(2 * c + h / 2 + 2 * s);
    }),
  );
});

/** Fuels and oxidants of several parts in random amounts. */
const amount = fc.double({ min: 0.01, max: 10, noNaN: true });
const mixtureOf = (formulas: readonly string[]): fc.Arbitrary<readonly Reactant[]> =>
  fc.tuple(...formulas.map(() => amount)).map((amounts) => amounts.map((each, index) => atoms(formulas[index]!, each)));
const fuels = mixtureOf(["CH4", "H2", "C2H6O", "CO", "CO2"]);
const oxidants = mixtureOf(["O2", "Ne", "N2O", "H2O"]);
const ratios = fc.double({ min: 0.01, max: 50, noNaN: true });

test("the equivalence ratio comes back from the mixture", () => {
  fc.assert(
    fc.property(fuels, oxidants, ratios, (fuel, oxidant, ratio) => {
      const parts = proportion(fuel, oxidant, ratio);
      const ofOxidant = parts.filter(({ name }) => oxidant.some((part) => part.name === name));
      const ofFuel = parts.filter(({ name }) => fuel.some((part) => part.name === name));
      // sums of a handful of terms: some units of the last place
      expect(oxygenUptakeOf(ofFuel) / -oxygenUptakeOf(ofOxidant) / ratio).toBeCloseTo(1, 12);
      expect(ofFuel.map((part) => part.amount)).toEqual(fuel.map((part) => part.amount));
    }),
  );
});

test("only the proportions of the oxidant count, and the amounts follow those of the fuel", () => {
  fc.assert(
    fc.property(fuels, oxidants, ratios, amount, (fuel, oxidant, ratio, factor) => {
      const scaled = (parts: readonly Reactant[]) => parts.map((part) => ({ ...part, amount: part.amount * factor }));
      const once = elementTotals(proportion(fuel, oxidant, ratio));
      const sameFuel = elementTotals(proportion(fuel, scaled(oxidant), ratio));
      const moreFuel = elementTotals(proportion(scaled(fuel), oxidant, ratio));
      for (const [element, total] of once) {
        expect(sameFuel.get(element)! / total).toBeCloseTo(1, 12);
        expect(moreFuel.get(element)! / total / factor).toBeCloseTo(1, 12);
      }
    }),
  );
});

test("a species of fuel and oxidant is one part, unless it comes from two sets", () => {
  const [nitrogen, other] = [species("N2", 0.5), species("N2", 0.5)];
  const oxygen = species("O2", 0.5);
  const same = proportion([{ ...species("H2"), amount: 0.5 }, nitrogen], [oxygen, nitrogen], 1);
  expect(written(same)).toBe("0.5 H2 + 0.75 N2 + 0.25 O2");
  const apart = proportion([{ ...species("H2"), amount: 0.5 }, nitrogen], [oxygen, other], 1);
  expect(written(apart)).toBe("0.5 H2 + 0.5 N2 + 0.25 O2 + 0.25 N2");
});

test("refusals: no fuel, no oxidant, no ratio, elements without a rule", () => {
  const [methane, oxygen, nitrogen] = [atoms("CH4"), atoms("O2"), atoms("N2")];
  expect(refusedWith(() => proportion([nitrogen], [oxygen], 1))).toBe(
    "input: N2 is no fuel: complete combustion takes up no oxygen; the fuel comes first, then the oxidant",
  );
  expect(refusedWith(() => proportion([oxygen], [methane], 1))).toBe(
    "input: O2 is no fuel: complete combustion takes up no oxygen; the fuel comes first, then the oxidant",
  );
  expect(refusedWith(() => proportion([methane], [nitrogen, atoms("Ar")], 1))).toBe(
    "input: N2 + Ar is no oxidant: it offers no oxygen; the fuel comes first, then the oxidant",
  );
  for (const ratio of [0, -1, NaN, Infinity])
    expect(refusedWith(() => proportion([methane], [oxygen], ratio))).toBe(
      `range: Equivalence ratio ${ratio} is not above 0: it is 1 where the oxygen just suffices, and above 1 in rich mixtures`,
    );
  expect(refusedWith(() => proportion([atoms("Al")], [oxygen], 1))).toBe(
    "input: Al holds Al; the oxygen balance is known here for C, H, S, O, N, the halogens and the noble gases only: use EQUILIBRIUM with a feed in mol",
  );
});

test("a mixture that is balanced in itself is no fuel, whatever its decimals", () => {
  // 0.1 H2 and 0.05 O2: 0.025 - 0.05 + … cancels to the rounding of the decimals
  expect(oxygenUptakeOf([atoms("H2", 0.1), atoms("O2", 0.05)])).toBe(0);
  expect(oxygenUptakeOf([atoms("CH4", 0.1), atoms("CO", 0.2), atoms("O2", 0.3)])).toBe(0);
  expect(oxygenUptakeOf([atoms("CH4", 0.1), atoms("CO", 0.2), atoms("O2", 0.299999)])).toBeCloseTo(1e-6, 12);
});
