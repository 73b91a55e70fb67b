import fc from "fast-check";
import { ELEMENT_SYMBOLS, isElement } from "../../../src/core/species/elements";
import { type Formula, hill, molarMass, parseFormula } from "../../../src/core/species/formula";
import { refusedWith } from "../refused";

const counts = (text: string) => Object.fromEntries(parseFormula(text).counts);

describe("counts", () => {
  test.each([
    ["H2O", { H: 2, O: 1 }],
    ["Ca(OH)2", { Ca: 1, O: 2, H: 2 }],
    ["K3[Fe(CN)6]", { K: 3, Fe: 1, C: 6, N: 6 }],
    ["[Co(NH3)5Cl]Cl2", { Co: 1, N: 5, H: 15, Cl: 3 }],
    ["{[(CH3)2Si]O}4", { C: 8, H: 24, Si: 4, O: 4 }],
    ["CH3CH2OH", { C: 2, H: 6, O: 1 }],
    ["CuSO4·5H2O", { Cu: 1, S: 1, O: 9, H: 10 }],
    ["CuSO4.5H2O", { Cu: 1, S: 1, O: 9, H: 10 }],
    ["CuSO4 * 5H2O", { Cu: 1, S: 1, O: 9, H: 10 }],
    ["CuSO4.H2O", { Cu: 1, S: 1, O: 5, H: 2 }],
    ["CaSO4·0.5H2O", { Ca: 1, S: 1, O: 4.5, H: 1 }],
    ["CaSO4.0.5H2O", { Ca: 1, S: 1, O: 4.5, H: 1 }],
    ["BF3·NH3", { B: 1, F: 3, N: 1, H: 3 }],
    ["CH1.686O0.843", { C: 1, H: 1.686, O: 0.843 }],
    ["H₂SO₄", { H: 2, S: 1, O: 4 }],
    ["  N2  ", { N: 2 }],
    ["CO", { C: 1, O: 1 }],
    ["Co", { Co: 1 }],
  ])("%s", (text, expected) => expect(counts(text)).toEqual(expected));
});

describe("charges", () => {
  test.each([
    ["SO4^2-", -2, { S: 1, O: 4 }],
    ["SO₄²⁻", -2, { S: 1, O: 4 }],
    ["SO4^-2", -2, { S: 1, O: 4 }],
    ["Fe(3+)", 3, { Fe: 1 }],
    ["Fe^3+", 3, { Fe: 1 }],
    ["Ca+2", 2, { Ca: 1 }],
    ["Ca++", 2, { Ca: 1 }],
    ["NH4+", 1, { N: 1, H: 4 }],
    ["NH₄⁺", 1, { N: 1, H: 4 }],
    ["N2+", 1, { N: 2 }],
    ["OH−", -1, { O: 1, H: 1 }],
    ["e-", -1, {}],
    ["e^-", -1, {}],
    ["e⁻", -1, {}],
  ])("%s", (text, charge, expected) => {
    expect(parseFormula(text).charge).toBe(charge);
    expect(counts(text)).toEqual(expected);
  });
});

describe("phases", () => {
  test.each([
    ["H2O(g)", "g", "g"],
    ["H2O (l)", "l", "l"],
    ["Fe(cr)", "cr", "cr"],
    ["C(gr)", "cr", "gr"],
    ["NaCl(s)", "cr", "s"],
    ["Al2O3(cr,alpha)", "cr", "cr,alpha"],
    ["SO4^2-(aq)", undefined, "aq"],
    ["Ca(OH)2", undefined, undefined],
  ])("%s", (text, phase, suffix) => {
    const formula = parseFormula(text);
    expect(formula.phase).toBe(phase);
    expect(formula.suffix).toBe(suffix);
  });
});

describe("refusals", () => {
  test.each([
    ["", "The formula is empty"],
    ["Xx2", '"Xx" in "Xx2" is not the symbol of an element'],
    ["NaCL", '"L" in "NaCL" is not the symbol of an element'],
    ["Ca(OH2", 'The bracket "(" in "Ca(OH2" is not closed'],
    ["CaOH)2", 'The bracket ")" in "CaOH)2" closes nothing'],
    ["Ca(OH]2", 'The bracket "]" in "Ca(OH]2" closes nothing'],
    ["Ca()2", 'A bracket in "Ca()2" is empty'],
    ["n-C4H10", '"n-C4H10" is a name, not a formula: leave out "n-"'],
    ["i-C4H10", '"i-C4H10" is a name, not a formula: leave out "i-"'],
    ["tert-C4H10", '"tert-C4H10" is a name, not a formula: leave out "tert-"'],
    ["2-C4H8", '"2-C4H8" is a name, not a formula: leave out "2-"'],
    ["water", '"water" is not a formula: the symbol of an element begins with a capital letter'],
    ["2H2O", '"2H2O" begins with a number; a formula begins with an element or a bracket'],
    ["H0", 'The count 0 in "H0" is not a number above 0'],
    ["H2O(x)", '(x) in "H2O(x)" is not a phase; the phases are (g) (l) (s) (cr) (gr) (aq)'],
    ["CH3-CH3", 'The character "-" in "CH3-CH3" does not belong in a formula'],
    ["H2O;", 'The character ";" in "H2O;" does not belong in a formula'],
    ["CuSO4·", 'A part of "CuSO4·" beside the dot is empty'],
    ["SO4^2", 'The charge in "SO4^2" is not understood; write it as ^2- or ^+'],
    ["Fe^99+", 'The charge 99 in "Fe^99+" is not between 1 and 20'],
    ["+", '"+" names no element'],
  ])("%s", (text, sentence) => expect(refusedWith(() => parseFormula(text))).toBe(`input: ${sentence}`));

  test("a text too long", () => expect(refusedWith(() => parseFormula("C".repeat(201)))).toMatch(/^input: The formula has 201 characters/));
});

// CIAAW abridged standard atomic weights (2021), g/mol.
const weights = new Map([
  ["H", 1.008],
  ["C", 12.011],
  ["N", 14.007],
  ["O", 15.999],
  ["S", 32.06],
  ["Cu", 63.546],
  ["Na", 22.99],
]);

describe("molar mass", () => {
  test.each([
    ["H2O", 18.015],
    ["C7H6O2", 122.123],
    ["CuSO4·5H2O", 249.677],
  ])("%s is the sum of its atomic weights", (text, mass) => expect(molarMass(parseFormula(text), weights)).toBeCloseTo(mass, 9));

  test("the mass of the electrons counts where the table holds it", () => {
    // electron 5.485799e-4 g/mol (CODATA 2022)
    const withElectron = new Map([...weights, ["e", 5.485799e-4]]);
    expect(molarMass(parseFormula("Na+"), withElectron)).toBeCloseTo(22.99 - 5.485799e-4, 12);
    expect(molarMass(parseFormula("Na+"), weights)).toBe(22.99);
    expect(molarMass(parseFormula("e-"), withElectron)).toBe(5.485799e-4);
    expect(refusedWith(() => molarMass(parseFormula("e-"), weights))).toMatch(/electron/);
  });

  test("an element without a weight", () =>
    expect(refusedWith(() => molarMass(parseFormula("Tc"), weights))).toBe("input: Tc has no atomic weight in the table"));
});

describe("order of Hill", () => {
  test.each([
    ["CH3CH2OH", "C2H6O"],
    ["Ca(OH)2", "CaH2O2"],
    ["H2SO4", "H2O4S"],
    ["CO2", "CO2"],
    ["NaHCO3", "CHNaO3"],
    ["SO4^2-", "O4S^2-"],
    ["NH4+", "H4N^+"],
    ["e-", "e-"],
    ["CH1.686O0.843", "CH1.686O0.843"],
  ])("%s", (text, expected) => expect(hill(parseFormula(text))).toBe(expected));

  const atoms = fc.uniqueArray(fc.tuple(fc.constantFrom(...ELEMENT_SYMBOLS), fc.integer({ min: 1, max: 99 })), {
    minLength: 1,
    maxLength: 6,
    selector: ([symbol]) => symbol,
  });

  test("reading what it writes gives the same formula", () =>
    fc.assert(
      fc.property(atoms, fc.integer({ min: -4, max: 4 }), (pairs, charge) => {
        const formula: Formula = { counts: new Map(pairs), charge };
        const again = parseFormula(hill(formula));
        expect(again.counts).toEqual(formula.counts);
        expect(again.charge).toBe(charge);
      }),
    ));

  test("a group counts as often as its number says", () =>
    fc.assert(
      fc.property(atoms, fc.integer({ min: 2, max: 20 }), (pairs, times) => {
        const inner = hill({ counts: new Map(pairs), charge: 0 });
        const grouped = parseFormula(`(${inner})${times}`).counts;
        for (const [symbol, count] of pairs) expect(grouped.get(symbol)).toBe(count * times);
      }),
    ));

  test("no text makes the reader throw anything but a refusal", () =>
    fc.assert(
      fc.property(fc.string({ maxLength: 30, unit: fc.constantFrom(..."CHNOSa-+^()[]·.*23₂² gl") }), (text) => {
        let formula: Formula;
        try {
          formula = parseFormula(text);
        } catch (thrown) {
          expect(thrown).toHaveProperty("kind", "input");
          return;
        }
        for (const [symbol, count] of formula.counts) {
          expect(isElement(symbol)).toBe(true);
          expect(count).toBeGreaterThan(0);
        }
      }),
      { numRuns: 2000 },
    ));
});

test("118 elements", () => {
  expect(ELEMENT_SYMBOLS).toHaveLength(118);
  expect(new Set(ELEMENT_SYMBOLS).size).toBe(118);
  expect(ELEMENT_SYMBOLS[25]).toBe("Fe");
  expect(ELEMENT_SYMBOLS[91]).toBe("U");
});
