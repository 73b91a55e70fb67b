import fc from "fast-check";
import { combustionOf } from "../../../src/core/reaction/combustion";
import { parseFormula } from "../../../src/core/species/formula";
import { refusedWith } from "../../core/refused";

const of = (text: string) => combustionOf(parseFormula(text));

test.each([
  // textbook stoichiometry, exact
  ["C7H6O2", [7.5, 7, 3, 0, 0, -0.5]],
  ["C12H22O11", [12, 12, 11, 0, 0, 0]],
  ["C10H8", [12, 10, 4, 0, 0, -2]],
  ["C8H18(l)", [12.5, 8, 9, 0, 0, -4.5]],
  ["CH4(g)", [2, 1, 2, 0, 0, -2]],
  ["CO(g)", [0.5, 1, 0, 0, 0, -0.5]],
  ["C4H4S", [6, 4, 2, 0, 1, -1]],
  ["CO(NH2)2", [1.5, 1, 2, 1, 0, 0.5]],
  ["C(gr)", [1, 1, 0, 0, 0, 0]],
])("combustion of %s", (text, [oxygen, carbonDioxide, water, nitrogen, sulfurDioxide, gasChange]) => {
  expect(of(text)).toEqual({ oxygen, carbonDioxide, water, nitrogen, sulfurDioxide, gasChange });
});

test("cotton with broken counts takes up 1 mol of oxygen for each carbon", () => {
  // CH1.686O0.843: 1 + 1.686/4 - 0.843/2 = 1, by hand
  expect(of("CH1.686O0.843").oxygen).toBeCloseTo(1, 14);
  expect(of("CH1.686O0.843").gasChange).toBeCloseTo(0, 14);
});

test("every atom of the compound and of its oxygen is in the products, and the gas is counted", () => {
  const count = fc.integer({ min: 0, max: 40 });
  fc.assert(
    fc.property(fc.integer({ min: 1, max: 40 }), count, count, count, count, (c, h, o, n, s) => {
      const counts = new Map(Object.entries({ C: c, H: h, O: o, N: n, S: s }).filter(([, atoms]) => atoms > 0));
      fc.pre(c + h / 4 + s > o / 2);
      const found = combustionOf({ counts, charge: 0 });
      expect(found.carbonDioxide).toBe(c);
      expect(found.water * 2).toBe(h);
      expect(found.nitrogen * 2).toBe(n);
      expect(found.sulfurDioxide).toBe(s);
      expect(2 * found.carbonDioxide + found.water + 2 * found.sulfurDioxide).toBe(o + 2 * found.oxygen);
      expect(found.gasChange).toBe(found.carbonDioxide + found.nitrogen + found.sulfurDioxide - found.oxygen);
    }),
  );
});

test.each([
  ["CO2", "input: CO2 takes up no oxygen: there is nothing in it to burn"],
  ["H2O(l)", "input: H2O takes up no oxygen: there is nothing in it to burn"],
  ["N2", "input: N2 takes up no oxygen: there is nothing in it to burn"],
  ["CO0.7H0.6O1.6", "input: CH0.6O2.3 takes up no oxygen: there is nothing in it to burn"],
  [
    "C3H5N3O9",
    "range: C3H5N3O9 needs -0.25 mol of oxygen for each mole: it holds more oxygen than its carbon, hydrogen and sulfur can bind, which complete combustion does not cover",
  ],
  ["NH4+", "input: H4N^+ carries a charge; combustion is of neutral compounds"],
  [
    "C6H5Cl",
    "input: C6H5Cl holds Cl; complete combustion is written here for compounds of C, H, O, N and S only (halogens, metals and other elements are not covered)",
  ],
  [
    "C2H4BrF",
    "input: C2H4BrF holds Br, F; complete combustion is written here for compounds of C, H, O, N and S only (halogens, metals and other elements are not covered)",
  ],
])("%s is refused", (text, sentence) => {
  expect(refusedWith(() => of(text))).toBe(sentence);
});
