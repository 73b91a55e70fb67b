/** What BURN refuses, sentence by sentence, and what a plausible slip comes to: refused, or told in the warnings. */
import { burnt, sentenceOf, SIMPLE_AIR, valueOf, warningsOf } from "./burn-helpers";
import { number, refusal } from "./helpers";

const refused = (...values: unknown[]) => refusal("BURN.TEMPERATURE", ...values);
/** CH4 in simple air with one argument another: fuel, oxidant, ratio, T0, P0, products, unit, set. */
const but = (place: number, value: unknown) =>
  refused(...["CH4", SIMPLE_AIR, 1, 298.15, "1 atm", null, null, null].map((each, i) => (i === place ? value : each)));

test("every function of the family has the same sentence", () => {
  const state = ["CH4", SIMPLE_AIR, 0, 298.15, "1 atm"];
  const sentence = "#VALUE! Equivalence ratio 0 is not above 0: it is 1 where the oxygen just suffices, and above 1 in rich mixtures";
  for (const id of ["BURN", "BURN.TEMPERATURE", "BURN.PRESSURE"]) expect(refusal(id, ...state)).toBe(sentence);
  expect(refusal("BURN.FRACTION", ...state, "NO")).toBe(sentence);
});

describe("fuel and oxidant", () => {
  test("missing", () => {
    for (const blank of [
      null,
      undefined,
      "",
      [
        [null, null],
        [null, null],
      ],
    ]) {
      expect(but(0, blank)).toBe(
        '#VALUE! The fuel is missing: give a species such as "CH4", a mixture, a text of BURN.FUEL, or a range of species and mole fractions',
      );
      expect(but(1, blank)).toBe('#VALUE! The oxidant is missing: give "air", "O2", a mixture, or a range of species and mole fractions');
    }
  });

  test("swapped, or neither", () => {
    expect(refused("air", "CH4", 1, 298.15, "1 atm")).toBe(
      "#VALUE! N2 + O2 + Ar + CO2 is no fuel: complete combustion takes up no oxygen; the fuel comes first, then the oxidant",
    );
    expect(but(1, "N2")).toBe("#VALUE! N2 is no oxidant: it offers no oxygen; the fuel comes first, then the oxidant");
    expect(but(1, "CO2")).toBe("#VALUE! CO2 is no oxidant: it offers no oxygen; the fuel comes first, then the oxidant");
    expect(but(1, "H2")).toBe("#VALUE! H2 is no oxidant: it offers no oxygen; the fuel comes first, then the oxidant");
    expect(but(0, "CO2")).toBe("#VALUE! CO2 is no fuel: complete combustion takes up no oxygen; the fuel comes first, then the oxidant");
  });

  test("unknown, with the nearest names and the way out", () => {
    expect(but(0, "CH5N")).toBe(
      '#N/A "CH5N" is not in the library; nearest: CH3CN, CH4, CH2O; or give the fuel by its gross value through BURN.FUEL',
    );
    expect(but(1, "21% O2")).toBe(
      '#N/A "21% O2" is not in the library; nearest: H2O2, O2, CO2; or give a mixture such as "0.21 O2 + 0.79 N2", or one of MIX.HUMIDAIR',
    );
    expect(but(1, "humid air")).toMatch(/; or give a mixture such as "0\.21 O2 \+ 0\.79 N2", or one of MIX\.HUMIDAIR$/);
    expect(but(0, "Mg")).toBe(
      "#VALUE! Mg(cr) holds Mg; the oxygen balance is known here for C, H, S, O, N, the halogens and the noble gases only: use EQUILIBRIUM with a feed in mol",
    );
    expect(but(0, "C")).toBe('#VALUE! "C" stands for several species: write C(g) (carbon atom) or C(gr) (graphite)');
  });

  test("fractions that are not", () => {
    expect(but(1, "1 O2 + 3.76 N2")).toBe(
      '#VALUE! The mole fractions add up to 4.76, not to 1 within 0.000001; MIX(…, "normalise") normalises on request',
    );
    expect(
      but(1, [
        ["O2", 21],
        ["N2", 79],
      ]),
    ).toBe("#VALUE! The mole fractions add up to 100, not to 1 within 0.000001; for per cent write 0.9, not 90");
    expect(
      but(0, [
        ["CH4", "0.9"],
        ["H2", "0.1"],
      ]),
    ).toBe('#VALUE! Row 1 of the fuel has the text "0.9" beside the species: amounts are plain numbers, mole fractions');
    expect(but(0, 5)).toBe(
      '#VALUE! The fuel is 5; give a species such as "CH4", a mixture, a text of BURN.FUEL, or a range of species and mole fractions',
    );
    expect(but(1, true)).toBe('#VALUE! The oxidant is TRUE; give "air", "O2", a mixture, or a range of species and mole fractions');
  });

  test("nothing that is a gas", () => {
    const nitrate = ["Cp", "cr", "NH4NO3", "power", 200, 400, "J/(mol K)", null, -365600, 151, 139];
    expect(refused("C(gr)", "NH4NO3", 1, 298.15, "1 atm", null, null, [nitrate])).toBe(
      "#VALUE! Nothing that is put in is a gas, so that P0 has no meaning: give an oxidant that is a gas",
    );
  });
});

describe("the equivalence ratio", () => {
  test("0, negative, text, missing", () => {
    const not = (value: string) =>
      `#VALUE! Equivalence ratio ${value} is not above 0: it is 1 where the oxygen just suffices, and above 1 in rich mixtures`;
    expect(but(2, 0)).toBe(not("0"));
    expect(but(2, -1)).toBe(not("-1"));
    expect(but(2, null)).toBe(
      "#VALUE! The equivalence ratio is missing: give a number, 1 where the oxygen just suffices, above 1 for rich mixtures",
    );
    expect(but(2, "x")).toBe('#VALUE! The equivalence ratio is "x"; a number is expected, 1 where the oxygen just suffices');
    expect(but(2, "95 %")).toBe('#VALUE! The equivalence ratio is "95 %"; a number is expected, 1 where the oxygen just suffices');
    expect(but(2, true)).toBe("#VALUE! The equivalence ratio is TRUE; a number is expected, 1 where the oxygen just suffices");
  });

  test("in per cent", () => {
    expect(but(2, 100)).toBe(
      "#VALUE! Equivalence ratio 100 is above 50, richer than anything that burns: it is 1, not 100, where the oxygen just suffices; for other feeds use EQUILIBRIUM.RIGID",
    );
    expect(but(2, 50)).toMatch(/^not refused/);
  });

  test("a content of fuel written for it is told in the table", () => {
    const ratio = (value: number) => warningsOf(burnt("CH4", SIMPLE_AIR, value));
    const told = (value: number, side: string) =>
      `Equivalence ratio ${value} is very ${side}: it is fuel to oxidant divided by the same where the oxygen just suffices, not the content of fuel`;
    expect(ratio(9.5)).toContain(told(9.5, "rich"));
    expect(ratio(0.095)).toContain(told(0.095, "lean"));
    expect(ratio(5).some((text) => text.startsWith("Equivalence"))).toBe(false);
    expect(ratio(0.1).some((text) => text.startsWith("Equivalence"))).toBe(false);
  });
});

describe("T0", () => {
  test("0, degrees Celsius as a plain number, outside the range, text without unit", () => {
    expect(but(3, 0)).toBe("#VALUE! Temperature T0 0 K is not above absolute zero, 0 K");
    expect(but(3, 25)).toBe(
      '#VALUE! Temperature 25 K is below 200 K, the lower limit of nasa-2002 for CH4; for degrees Celsius write "25 °C"',
    );
    expect(but(3, 6001)).toBe("#VALUE! Temperature 6001 K is above 6000 K, the upper limit of nasa-2002 for CH4");
    expect(but(3, null)).toBe('#VALUE! Temperature T0 is missing: give a number in K, or a text such as "25 °C"');
    expect(but(3, "25")).toBe(
      '#VALUE! Temperature T0 is the text "25", not a number: give a number in K, or a text with a unit such as "25 °C"',
    );
    expect(but(3, "1 bar")).toBe('#VALUE! Temperature T0 "1 bar" is a pressure; a temperature such as K is expected');
  });
});

describe("P0", () => {
  test("0, negative, gauge, missing", () => {
    const absolute = "pressures are absolute (see UNITS.ABSOLUTE for gauge readings)";
    expect(but(4, 0)).toBe(`#VALUE! Pressure P0 0 Pa is not above 0 Pa; ${absolute}`);
    expect(but(4, -5)).toBe(`#VALUE! Pressure P0 -5 Pa is not above 0 Pa; ${absolute}`);
    expect(but(4, "2 barg")).toBe('#VALUE! "barg" is a gauge pressure, and pressures here are absolute: use UNITS.ABSOLUTE(value, "bar")');
    expect(but(4, "30 psig")).toBe('#VALUE! "psig" is a gauge pressure, and pressures here are absolute: use UNITS.ABSOLUTE(value, "psi")');
    expect(but(4, null)).toBe('#VALUE! Pressure P0 is missing: give a number in Pa, or a text such as "1 atm"');
  });

  test("in bar, kPa or MPa as a plain number; any pressure as a text", () => {
    expect(but(4, 1)).toBe('#VALUE! Pressure P0 1 Pa is below 1000 Pa: say "1 bar" or "1 kPa" or "1 Pa"');
    expect(but(4, 101.325)).toBe('#VALUE! Pressure P0 101.325 Pa is below 1000 Pa: say "101.325 bar" or "101.325 kPa" or "101.325 Pa"');
    expect(but(4, 0.1)).toBe('#VALUE! Pressure P0 0.1 Pa is below 1000 Pa: say "0.1 MPa" or "0.1 kPa" or "0.1 Pa"');
    expect(but(4, 999.9)).toMatch(/^#VALUE! Pressure P0 999\.9 Pa is below 1000 Pa/);
    for (const fine of [1000, "1 Pa", "999 Pa", "10 mbar"]) expect(but(4, fine)).toMatch(/^not refused/);
  });
});

describe("products", () => {
  test("words that are none, and lists that hold them", () => {
    expect(but(5, "equilibirum")).toBe(
      '#N/A "equilibirum" is not in the library; nearest: Al(cr), Nb(cr), CaO(cr) (quicklime); or write "equilibrium", in BURN also "complete", or a list such as "CO2 CO H2O N2"',
    );
    expect(but(5, "complete CO2")).toBe('#VALUE! "equilibrium" and "complete" stand alone, not in a list of species');
    expect(but(5, [["complete"], ["CO2"]])).toBe('#VALUE! "equilibrium" and "complete" stand alone, not in a list of species');
    expect(but(5, "nasa-2002")).toBe('#VALUE! "nasa-2002" is a set id; the species come first, the set after them');
    expect(but(5, 5)).toBe("#VALUE! The list of species is 5; a text is expected");
    expect(but(5, [["CO2"], [5]])).toBe('#VALUE! The list of species holds 5; each is a text such as "CO2"');
    expect(
      but(5, [
        ["CO2", "CO"],
        ["H2O", "N2"],
      ]),
    ).toBe("#VALUE! The species are 2 rows × 2 columns; give one row or one column");
  });

  test("lists that cannot hold the feed, that hold no gas, that name a species twice or one that is unknown", () => {
    expect(but(5, "CO2 CO")).toBe(
      "#VALUE! What is put in holds H, N, and no species of the list (CO2, CO) does: add species that hold H, N",
    );
    expect(refused("CH4", SIMPLE_AIR, 0.5, 298.15, "1 atm", "CO2 H2O N2")).toBe(
      "#VALUE! The atoms put in (C, H, N, O) cannot be made up of CO2, H2O, N2 alone: add species to the list",
    );
    expect(refused("C(gr)", "O2", 1, 298.15, "1 atm", "C(gr) H2O(l)")).toBe(
      "#VALUE! What is put in holds O, and no species of the list (C(gr), H2O(l)) does: add species that hold O",
    );
    expect(refused("H2", "O2", 1, 298.15, "1 atm", "H2O(l)")).toBe(
      "#VALUE! The list of species (H2O(l)) holds no gas: an equilibrium here has a gas phase",
    );
    expect(but(5, [["CO2 CO"], ["H2O N2"]])).toBe(
      '#N/A "CO2 CO" is not in the library; nearest: CH2CO, CH2CHO, CO2; one species stands in each cell, or between commas',
    );
    expect(but(5, "CO2 CO H2O N2 CO2")).toBe("#VALUE! The list of species names CO2 twice");
    expect(but(5, "CO2 CO H2O N2 XX")).toBe('#N/A "XX" is not in the library; nearest: Xe, N2, O2');
    expect(but(5, "CO2 CO H2O N2 CS2")).not.toMatch(/entropy|formation/); // sulfur is not there: passed over
    expect(refused("H2S", SIMPLE_AIR, 1, 298.15, "1 atm", "SO2 H2O N2 O2 H2 CS2 CO CO2")).toMatch(/^not refused/);
    expect(refused("CH4", "F2", 1, 298.15, "1 atm", "HF CF4")).toBe(
      "#VALUE! molecular for CF4 has no enthalpy of formation, which an equilibrium needs",
    );
  });

  test("complete above ratio 1", () => {
    expect(refused("CH4", SIMPLE_AIR, 1.2, 298.15, "1 atm", "complete")).toBe(
      "#VALUE! Complete products hold up to equivalence ratio 1; at 1.2 the oxygen does not suffice: use equilibrium",
    );
  });

  test("a fraction that the state does not have", () => {
    const fraction = (...values: unknown[]) => refusal("BURN.FRACTION", "CH4", SIMPLE_AIR, 1, 298.15, "1 atm", ...values);
    expect(fraction("NO", "complete")).toBe(
      "#N/A NO is not among the complete products, each from the library's first choice: CO2, H2O, N2, O2",
    );
    expect(fraction("Ar", "CO2 CO H2O N2")).toBe(
      "#N/A Ar is not among the 4 species of the list, each from the library's first choice: CO2, CO, H2O, N2",
    );
    expect(fraction("H2O(l)")).toBe(
      "#VALUE! H2O(l) has no value at 2584.9 K, where this combustion ends, and was left out of the equilibrium",
    );
    expect(fraction("water")).toBe(
      '#VALUE! "water" stands for several species: write H2O (water vapour) or H2O(l) (water, liquid) or H2O(cr) (water, ice)',
    );
    expect(fraction(null)).toBe('#VALUE! The species is missing: give a text such as "NO"');
    expect(fraction("C(gr)")).toBe("not refused: 0");
    expect(fraction("complete", "NO")).toBe(
      '#VALUE! "complete" says which products there are; the species comes first, the products after it',
    );
  });
});

describe("unit and set", () => {
  test("a set id in the unit's place, a unit that does not fit, gauge units", () => {
    expect(but(6, "gri-1999")).toBe('#VALUE! "gri-1999" is a set id; the unit comes first, the set after it');
    expect(but(6, "bar")).toBe('#VALUE! The unit "bar" does not fit this result; give a temperature such as "°C"');
    const pressure = (unit: string) => refusal("BURN.PRESSURE", "CH4", SIMPLE_AIR, 1, 298.15, "1 atm", null, unit);
    expect(pressure("K")).toBe('#VALUE! The unit "K" does not fit this result; give a pressure such as "bar"');
    expect(pressure("nasa-2002")).toBe('#VALUE! "nasa-2002" is a set id; the unit comes first, the set after it');
    expect(pressure("barg")).toMatch(/^#VALUE! "barg" is a gauge pressure/);
  });

  test("sets that are none, or hold no enthalpy of formation", () => {
    expect(but(7, "nasa-2003")).toMatch(/^#N\/A There is no set "nasa-2003"; the sets are nasa-2002, gri-1999, /);
    expect(but(7, "molecular")).toBe(
      "#N/A Set molecular gives CH4 no enthalpy of formation, without which nothing can burn or react; sets that do: nasa-2002, aramco-2013, srd69-shomate, gri-1999",
    );
  });

  test("sets that lack a main product: an equilibrium among the rest would be far from the truth", () => {
    const lacks = (set: string, missing: string) =>
      `#N/A Set ${set} has no enthalpy of formation with entropy for ${missing}, which may form here: leave the set out for nasa-2002, or give the species as a list`;
    // without steam, hydrogen and oxygen it would be 1476 K
    expect(but(7, "srd69-shomate")).toBe(lacks("srd69-shomate", "H2O, H2, O2"));
    expect(but(7, "usc-2007")).toBe(lacks("usc-2007", "CO2, CO, H2O, H2, O2, N2"));
    expect(refused("H2S", SIMPLE_AIR, 1, 298.15, "1 atm", null, null, "gri-1999")).toBe(lacks("gri-1999", "SO2"));
    expect(refused("CH3Cl", SIMPLE_AIR, 1, 298.15, "1 atm", null, null, "gri-1999")).toBe(lacks("gri-1999", "HCl"));
    for (const fuel of ["CH4", "H2", "CO", "NH3", "C(gr)", "CH3OH"])
      expect(refused(fuel, "air", 1, 298.15, "1 atm", null, null, "gri-1999")).toMatch(/^not refused/);
    for (const fuel of ["CH4", "H2S", "CH3Cl", "HCN"])
      expect(refused(fuel, "air", 1, 298.15, "1 atm", null, null, "nasa-2002")).toMatch(/^not refused/);
  });

  test("a set without the free atoms of an element says so where they would form", () => {
    expect(warningsOf(burnt("CH3Cl"))).toEqual([
      "No free atoms of Cl are among the species; they form at 2583.92 K, so that temperature and pressure come out too high",
    ]);
    expect(warningsOf(burnt("CH4"))).toEqual([]);
    expect(warningsOf(burnt("CH3Cl", SIMPLE_AIR, 0.3)).some((text) => text.startsWith("No free atoms"))).toBe(false);
  });

  test("results beyond the range name the limit and the set", () => {
    expect(refused("C2H2", "O2", 1, 298.15, "100 bar", null, null, "gri-1999")).toBe(
      "#VALUE! The energy of the contents, 219524 J, leads above 3000 K, the upper limit of gri-1999 for CH3O, where it would be -625950 J; a list of species without CH3O reaches 3500 K",
    );
    expect(refused("C2H2", "O2", 1, 298.15, "1 atm", "complete", null, "gri-1999")).toBe(
      "#VALUE! The complete products would be above 3500 K, the upper limit of gri-1999 for CO2",
    );
    expect(refused("C2H2", "O2", 1, 298.15, "1 atm", "complete")).toBe(
      "#VALUE! The complete products would be above 6000 K, the upper limit of nasa-2002 for H2O",
    );
  });
});

describe("BURN.FUEL", () => {
  test("a gross value in MJ/kg as a plain number, here and in a text", () => {
    expect(refusal("BURN.FUEL", "C7H6O2", 26.4136)).toBe('#VALUE! Gross value 26.4136 J/g is below 100 J/g: say "26.4136 MJ/kg"');
    expect(but(0, "C7H6O2, gross 26.4136")).toBe('#VALUE! Gross value 26.4136 J/g is below 100 J/g: say "26.4136 MJ/kg"');
    expect(valueOf(burnt("C7H6O2, gross 26.4136 MJ/kg"), "final temperature")).toBe(
      valueOf(burnt("C7H6O2(cr), gross 26413.6 J/g"), "final temperature"),
    );
  });
});

test("a whole table is refused with its one sentence", () => {
  expect(sentenceOf(burnt("CH4", "N2"))).toBe("#VALUE! N2 is no oxidant: it offers no oxygen; the fuel comes first, then the oxidant");
  expect(burnt("CH4", "N2")).toHaveLength(1);
});

test("a start just below a fit says how the fit is carried down to it", () => {
  expect(refusal("BURN.PRESSURE", "CH4", "air", 1, "20 °C", "1 bar", null, "bar", "gri-1999")).toBe(
    '#VALUE! Temperature 293.15 K is below 298.15 K, the lower limit of gri-1999 for N2; "gri-1999; extrapolate", or "extrapolate" alone, as the set holds the heat capacity below it',
  );
  expect(number("BURN.PRESSURE", "CH4", "air", 1, "20 °C", "1 bar", null, "bar", "gri-1999; extrapolate")).toBeCloseTo(8.95, 1);
  expect(number("BURN.PRESSURE", "n-C7H16", "air", 1, "20 °C", "1 bar", null, "bar", "extrapolate")).toBeGreaterThan(9);
});
