import fc from "fast-check";
import { molarMass, parseFormula } from "../../src/core/species/formula";
import {
  formationOf,
  grossFuelOf,
  grossFuelReactant,
  grossFuelText,
  grossFuelWarnings,
  isGrossFuel,
  readGrossFuel,
} from "../../src/functions/fuel-text";
import { call, refusal } from "./helpers";

const text = (...given: unknown[]): unknown => call("BURN.FUEL", ...given)[0]![0];
const refused = (...given: unknown[]): string => refusal("BURN.FUEL", ...given);

test("the text of a fuel", () => {
  expect(text("C7H6O2", 26413.6)).toBe("C7H6O2(cr), gross 26413.6 J/g");
  expect(text("C7H6O2(s)", 26413.6)).toBe("C7H6O2(cr), gross 26413.6 J/g");
  expect(text("C8H18", "47.713 MJ/kg", "l")).toBe("C8H18(l), gross 47713 J/g");
  expect(text("C8H18(l)", "47.713 MJ/kg", "liquid")).toBe("C8H18(l), gross 47713 J/g");
  expect(text(" CH3COOH (l) ", 14560)).toBe("CH3COOH(l), gross 14560 J/g");
  expect(text("CH0.8O0.1N0.015S0.005", 30100, null, 8)).toBe("CH0.8O0.1N0.015S0.005(cr), gross 30100 J/g, ash 8 %");
  expect(text("CH0.8O0.1N0.015S0.005", 30100, null, "8 %")).toBe(text("CH0.8O0.1N0.015S0.005", 30100, null, 8));
  expect(text("C7H6O2", 26413.6, undefined, 0)).toBe("C7H6O2(cr), gross 26413.6 J/g");
  expect(text("CH4", 55500, "g")).toBe("CH4(g), gross 55500 J/g");
  expect(call("BURN.FUEL", [["C7H6O2"], ["C10H8"]], [[26413.6], [40191]])).toEqual([
    ["C7H6O2(cr), gross 26413.6 J/g"],
    ["C10H8(cr), gross 40191 J/g"],
  ]);
});

test("the text reads back to the last bit", () => {
  const count = fc.double({ min: 0.001, max: 3, noNaN: true });
  const gross = fc.double({ min: 1000, max: 149000, noNaN: true });
  const ash = fc.oneof(fc.constant(0), fc.double({ min: 1e-9, max: 99.999, noNaN: true }));
  fc.assert(
    fc.property(count, count, fc.constantFrom("cr", "l", "g"), gross, ash, (h, n, phase, value, percent) => {
      const fuel = grossFuelOf(`CH${h.toFixed(17)}N${n.toFixed(17)}`, value, phase, percent);
      expect(readGrossFuel(grossFuelText(fuel))).toEqual(fuel);
      expect([fuel.gross, fuel.ash, fuel.formula.counts.get("H")]).toEqual([value, percent, Number(h.toFixed(17))]);
    }),
  );
});

test.each([
  "C7H6O2(cr), gross 26413.6 J/g, ash 8 %",
  "  C7H6O2 (cr) ,gross  26413.6 J/g,  ash 8%  ",
  "C7H6O2, gross 26.4136 MJ/kg, ash 8",
  "C7H6O2(s); ash: 8 %; gross: 26413.6",
  "C7H6O2 gross 26413.6 kJ/kg ash 8 %",
  "C7H6O2(cr), GROSS = 26413.6 J/g, Ash = 8 %",
])("%s is read", (written) => {
  expect(isGrossFuel(written)).toBe(true);
  const fuel = readGrossFuel(written);
  expect(fuel.gross).toBeCloseTo(26413.6, 9);
  expect([fuel.matter, fuel.phase, fuel.ash]).toEqual(["C7H6O2", "cr", 8]);
});

test("other texts are not fuels", () => {
  for (const other of ["CH4", "air", "0.79 N2 + 0.21 O2", "benzoic acid", "engross"]) expect(isGrossFuel(other)).toBe(false);
});

describe("what the gross value means", () => {
  test("benzoic acid: −385.2 kJ/mol within what the molar mass of 2001 and of now differ", () => {
    // 26413.6 J/g (from memory) and ΔfH° −385.2 (SRD 69 −385.2 ± 0.5); by hand 7 × −393.51 + 3 × −285.83 + 26.4136 × 122.123 + 0.5 RT
    expect(formationOf(readGrossFuel("C7H6O2, gross 26413.6 J/g"))).toBeCloseTo(-385112, -1);
    expect(formationOf(readGrossFuel("C7H6O2, gross 26413.6 J/g")) / 1000).toBeCloseTo(
      7 * -393.51 + 3 * -285.83 + 26.4136 * 122.123 + 0.5 * 2.478957,
      4,
    );
  });

  test("a coal with ash, by hand: gross of the matter is gross/(1 − ash/100)", () => {
    // CH0.8O0.1N0.015S0.005: M = 12.011 + 0.8 × 1.008 + 1.5999 + 0.015 × 14.007 + 0.005 × 32.06 = 14.787805 (S 32.06, CIAAW abridged)
    const mass = 12.011 + 0.8 * 1.008 + 1.5999 + 0.015 * 14.007 + 0.005 * 32.06;
    expect(readGrossFuel("CH0.8O0.1N0.015S0.005, gross 30100 J/g, ash 8 %").molarMass).toBeCloseTo(mass, 9);
    // Δn = 0.1/2 + 0.015/2 − 0.8/4 = −0.1425; ΔcU = −30.1/0.92 × M
    const formation = -393.51 + 0.4 * -285.83 + 0.005 * -296.81 + (30.1 / 0.92) * mass + 0.1425 * 2.478957;
    expect(formationOf(readGrossFuel("CH0.8O0.1N0.015S0.005, gross 30100 J/g, ash 8 %")) / 1000).toBeCloseTo(formation, 5);
  });

  test("ash and gross value together: the matter of a fuel with ash is that of the fuel without", () => {
    fc.assert(
      fc.property(fc.double({ min: 0.1, max: 90, noNaN: true }), (ash) => {
        const clean = formationOf(readGrossFuel("CH0.8O0.1, gross 32000 J/g"));
        const dirty = formationOf(readGrossFuel(`CH0.8O0.1, gross ${32000 * (1 - ash / 100)} J/g, ash ${ash} %`));
        expect(Math.abs(dirty - clean)).toBeLessThan(1e-5); // J/mol of some 480 000: rounding of the products
      }),
    );
  });

  test("a solid's energy is its enthalpy; a gas gives off RT more for the mole of gas it is", () => {
    const solid = grossFuelReactant(readGrossFuel("CH4(cr), gross 55500 J/g")).capacity;
    const gas = grossFuelReactant(readGrossFuel("CH4(g), gross 55500 J/g")).capacity;
    expect(solid.energy(298.15)).toBe(solid.enthalpy(298.15));
    // the same ΔcU from the same products: the same U of the fuel, whatever its phase
    expect(gas.energy(298.15)).toBeCloseTo(solid.energy(298.15), 6);
    expect(gas.enthalpy(298.15) - gas.energy(298.15)).toBeCloseTo(2478.957, 2);
  });
});

test("the reactant has the atoms and the name of the matter", () => {
  const fuel = readGrossFuel("CH0.8O0.1N0.015S0.005, gross 30100 J/g, ash 8 %");
  const { name, counts } = grossFuelReactant(fuel);
  expect(name).toBe("CH0.8O0.1N0.015S0.005(cr)");
  expect([...counts]).toEqual([...parseFormula("CH0.8O0.1N0.015S0.005").counts]);
  expect(molarMass({ counts, charge: 0 }, new Map(Object.entries({ C: 1, H: 0, O: 0, N: 0, S: 0 })))).toBe(1);
});

test("warnings: a value that does not fit the formula, and ash", () => {
  expect(grossFuelWarnings(readGrossFuel("C7H6O2, gross 26413.6 J/g"))).toEqual([]);
  // 11 373 Btu/lb taken for J/g, by hand: 11.373 / 0.92 × 122.123 / (7.5 × 31.998)
  expect(grossFuelWarnings(readGrossFuel("C7H6O2, gross 11373 J/g, ash 8 %"))).toEqual([
    expect.stringMatching(
      /^C7H6O2\(cr\): The value is 6\.29072 kJ for each gram of oxygen consumed; organic compounds give 13\.1 kJ within /,
    ),
    "The ash of C7H6O2(cr), 8 %, is inert: its heating is not counted",
  ]);
  expect(grossFuelWarnings(readGrossFuel("C7H7O2, gross 26413.6 J/g"))).toEqual([
    "C7H7O2(cr): C7H7O2 has an odd number of hydrogen and nitrogen atoms together, which no stable molecule has: check the formula",
  ]);
  expect(grossFuelWarnings(readGrossFuel("C7H6O2, gross 26434 J/g"))).toEqual([
    expect.stringMatching(/^C7H6O2\(cr\): 26434 J\/g looks like the certificate value of benzoic acid, /),
  ]);
});

describe("refusals", () => {
  test("of the formula", () => {
    expect(refused(null, 26413.6)).toBe('#VALUE! The formula is missing: give a text such as "C7H6O2"');
    expect(refused("benzoic acid", 26413.6)).toBe(
      '#VALUE! "benzoic acid" is not a formula: the symbol of an element begins with a capital letter',
    );
    expect(refused("CCl4", 20000)).toBe(
      "#VALUE! CCl4 holds Cl; complete combustion is written here for compounds of C, H, O, N and S only (halogens, metals and other elements are not covered)",
    );
    expect(refused("H2O(l)", 20000)).toBe("#VALUE! H2O takes up no oxygen: there is nothing in it to burn");
    expect(refused("HNO3(aq)", 20000)).toBe("#VALUE! HNO3(aq) is a solution; give the compound itself, with (l), (s) or (g)");
  });

  test("of the phase", () => {
    expect(refused("C7H6O2", 26413.6, "melt")).toBe('#VALUE! The phase "melt" is not one of cr, l, g');
    expect(refused("C8H18(l)", 47713, "g")).toBe("#VALUE! The formula C8H18(l) names the phase l, the argument g; give one of them");
    expect(refused("C3H8", 50000)).toBe(
      '#VALUE! C3H8 is the formula of a gas: give the phase, "g", or "l" or "cr" for a liquid or solid of this composition',
    );
    // a composition for one atom of carbon is no gas: polyethylene, a mineral oil
    expect(text("CH2", "46.3 MJ/kg")).toBe("CH2(cr), gross 46300 J/g");
    expect(text("CH1.8", "45 MJ/kg", "l")).toBe("CH1.8(l), gross 45000 J/g");
  });

  test("of the gross value and the ash", () => {
    expect(refused("C7H6O2", null)).toBe('#VALUE! Gross value is missing: give a number in J/g, or a text such as "26.4136 MJ/kg"');
    expect(refused("C7H6O2", 26.4136)).toBe('#VALUE! Gross value 26.4136 J/g is below 100 J/g: say "26.4136 MJ/kg"');
    expect(refused("C7H6O2", -26413.6)).toBe("#VALUE! Gross value -26413.6 J/g is not above 0 J/g");
    expect(refused("C7H6O2", 26413.6, null, 100)).toBe("#VALUE! Ash 100 % leaves nothing of C7H6O2 to burn");
    expect(refused("C7H6O2", 26413.6, null, 101)).toBe("#VALUE! Ash 101 % is not between 0 % and 100 %");
    expect(refused("C7H6O2", 26413.6, null, "8")).toBe('#VALUE! Ash is the text "8": give per cent, such as 8 or "8 %"');
  });

  test("of the text, part by part", () => {
    const read = (written: string) => () => readGrossFuel(written);
    const sentence = (written: string): string => {
      try {
        read(written)();
      } catch (thrown) {
        return String(thrown);
      }
      return "not refused";
    };
    expect(sentence("C7H6O2(cr), gross 26413,6 J/g")).toBe(
      'In the fuel "C7H6O2(cr), gross 26413,6 J/g" the part "6 J/g" is neither gross nor ash; write "C7H6O2(cr), gross 26413.6 J/g, ash 8 %", with decimal points',
    );
    expect(sentence("C7H6O2, gross 26413.6 J/g, gross 3 J/g")).toBe('The fuel "C7H6O2, gross 26413.6 J/g, gross 3 J/g" gives gross twice');
    expect(sentence("C7H6O2, ash 3 %")).toBe(
      'The fuel "C7H6O2, ash 3 %" has no gross value; write "C7H6O2(cr), gross 26413.6 J/g, ash 8 %"',
    );
    expect(sentence("C7H6O2, gross")).toBe('Gross value is missing: give a number in J/g, or a text such as "26.4136 MJ/kg"');
    expect(sentence("C7H6O2, gross 3 bar")).toMatch(/^Gross value "3 bar" /);
    expect(sentence("C7H6O2, gross 6318 cal/g")).toMatch(/cal_th/);
    expect(sentence("C7H6O2, gross 26413.6 J/g, ash 8 g")).toBe('Ash is the text "8 g": give per cent, such as 8 or "8 %"');
  });
});
