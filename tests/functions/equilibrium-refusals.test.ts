/** What EQUILIBRIUM refuses, sentence by sentence. */
import { CellError } from "../../src/functions/cell";
import { call, refusal } from "./helpers";

const FEED = "1 CH4 + 2 O2 + 7.52 N2";
const rigid = (...values: unknown[]) => refusal("EQUILIBRIUM.RIGID", ...values);
const atPressure = (...values: unknown[]) => refusal("EQUILIBRIUM.ATPRESSURE", ...values);

describe("the feed", () => {
  test("missing or empty", () => {
    for (const blank of [
      null,
      undefined,
      "",
      [
        [null, null],
        ["", null],
      ],
    ])
      expect(rigid(blank, 298.15, 1)).toBe(
        '#VALUE! The feed is missing: give a text in mol such as "1 CH4 + 2 O2 + 7.52 N2", or a range of species and mol',
      );
    expect(
      rigid(
        [
          ["CH4", 0],
          ["O2", 0],
        ],
        298.15,
        1,
      ),
    ).toBe("#VALUE! The mixture holds no species with an amount above zero");
    expect(rigid("0 CH4", 298.15, 1)).toBe("#VALUE! The mixture holds no species with an amount above zero");
  });

  test("negative, half a row, an error in it", () => {
    expect(
      rigid(
        [
          ["CH4", 1],
          ["O2", -2],
        ],
        298.15,
        1,
      ),
    ).toBe("#VALUE! The amount of O2 is -2; amounts are not negative");
    expect(
      rigid(
        [
          ["CH4", 1],
          ["O2", null],
        ],
        298.15,
        1,
      ),
    ).toBe("#VALUE! Row 2 of the composition has no amount for O2");
    expect(
      (
        call(
          "EQUILIBRIUM.RIGID",
          [
            ["CH4", 1],
            ["O2", new CellError("#N/A")],
          ],
          298.15,
          1,
        )[0]![0] as CellError
      ).code,
    ).toBe("#N/A");
  });

  test("masses and units: a feed counts moles", () => {
    expect(rigid("60 g CH4 + 2 O2", 298.15, 1)).toBe(
      '#VALUE! The feed "60 g CH4 + 2 O2" gives an amount in g: write moles without a unit, such as "1 CH4 + 2 O2"',
    );
    expect(rigid("CH4 + 2 mol O2", 298.15, 1)).toBe(
      '#VALUE! The feed "CH4 + 2 mol O2" gives an amount in mol: write moles without a unit, such as "1 CH4 + 2 O2"',
    );
    expect(
      rigid(
        [
          ["CH4", "60 g"],
          ["O2", "64 g"],
        ],
        298.15,
        1,
      ),
    ).toBe('#VALUE! Row 1 of the feed has the text "60 g" beside the species: amounts are plain numbers, in mol');
    expect(
      rigid(
        [
          ["CH4", 1],
          ["O2", "2 mol"],
        ],
        298.15,
        1,
      ),
    ).toBe('#VALUE! The amount of O2 is the text "2 mol"; a number is expected');
  });

  test("species that are unknown, burn with no known energy, or hold elements that no species takes up", () => {
    expect(rigid("1 UF6 + 1 O2", 300, 1)).toBe('#N/A "UF6" is not in the library; nearest: SF6, F2, CF4');
    expect(rigid("1 CH4 + 1 SF6", 300, 1)).toBe(
      "#N/A The library gives SF6 no enthalpy of formation, without which nothing can burn or react; give a coefficient block with it, or a fuel by its gross value through BURN.FUEL",
    );
    expect(rigid("1 Mg(cr) + 1 O2", 300, 1)).toBe(
      '#N/A What is put in holds Mg, and of Mg there is nothing among the 3 species of nasa-2002: give another set, or the species as a list such as "CO2 H2O N2"',
    );
    expect(rigid("1 Ar + 1 O2", 300, 1, "O2 O H2")).toMatch(/^not refused/); // a noble gas need not be listed
    expect(rigid("1 SO2 + 1 H2", 300, 1, "H2O H2")).toBe(
      "#VALUE! What is put in holds S, and no species of the list (H2O, H2) does: add species that hold S",
    );
    expect(rigid("1 CO2 + 1 H2", 300, 1, "CO2 H2O")).toBe(
      "#VALUE! The atoms put in (C, H, O) cannot be made up of CO2, H2O alone: add species to the list",
    );
    expect(atPressure("1 CO2 + 1 SO2", 1000, "1 bar", null, "gri-1999")).toBe(
      "#N/A Set gri-1999 has no enthalpy of formation with entropy for SO2, which may form here: leave the set out for nasa-2002, or give the species as a list",
    );
  });

  test("liquid water where it has no value", () => {
    expect(rigid("1 H2O(l)", 3000, 1)).toBe("#VALUE! Temperature 3000 K is above 600 K, the upper limit of nasa-2002 for H2O(l)");
    expect(rigid("1 H2O", 3000, 1, "H2O(l)")).toBe(
      "#VALUE! The list of species (H2O(l)) holds no gas: an equilibrium here has a gas phase",
    );
    expect(atPressure("1 H2O(l)", 3000, "1 bar")).toMatch(/^not refused/); // its atoms count, not its energy
  });
});

describe("what is held", () => {
  test("the temperature: 0, degrees Celsius as a plain number, beyond the joint range", () => {
    expect(rigid(FEED, 25, 1)).toBe(
      '#VALUE! Temperature 25 K is below 200 K, the lower limit of nasa-2002 for CH4; for degrees Celsius write "25 °C"',
    );
    expect(atPressure(FEED, 25, "1 atm")).toBe(
      '#VALUE! Temperature 25 K is below 200 K, the lower limit of nasa-2002 for N2; for degrees Celsius write "25 °C"',
    );
    expect(refusal("EQUILIBRIUM.ATVOLUME", FEED, 25, 1)).toBe(atPressure(FEED, 25, "1 atm"));
    expect(rigid(FEED, 0, 1)).toBe("#VALUE! Temperature T0 0 K is not above absolute zero, 0 K");
    expect(atPressure(FEED, 0, "1 atm")).toBe("#VALUE! Temperature 0 K is not above absolute zero, 0 K");
    expect(atPressure(FEED, 7000, "1 atm")).toBe("#VALUE! Temperature 7000 K is above 6000 K, the upper limit of nasa-2002 for H2O");
    expect(atPressure(FEED, 4000, "1 atm", null, "gri-1999")).toBe(
      "#VALUE! Temperature 4000 K is above 3000 K, the upper limit of gri-1999 for CH3O",
    );
    expect(atPressure(FEED, 4000, "1 atm", "CO2 CO H2O H2 O2 N2", "gri-1999")).toBe(
      "#VALUE! Temperature 4000 K is above 3500 K, the upper limit of gri-1999 for CO2",
    );
    for (const edge of [200, 6000]) expect(atPressure(FEED, edge, "1 atm")).toMatch(/^not refused/);
  });

  test("the volume: 0, negative, of another dimension, without unit, missing", () => {
    expect(rigid(FEED, 298.15, 0)).toBe("#VALUE! Volume 0 m3 is not above 0 m3");
    expect(rigid(FEED, 298.15, -1)).toBe("#VALUE! Volume -1 m3 is not above 0 m3");
    expect(rigid(FEED, 298.15, "340 g")).toBe('#VALUE! Volume "340 g" is a mass; a volume such as L is expected');
    expect(rigid(FEED, 298.15, "0.34")).toBe(
      '#VALUE! Volume is the text "0.34", not a number: give a number in m3, or a text with a unit such as "0.34 L"',
    );
    expect(rigid(FEED, 298.15, null)).toBe('#VALUE! Volume is missing: give a number in m3, or a text such as "0.34 L"');
    expect(rigid(FEED, 298.15, "340 mL")).toMatch(/^not refused/);
    expect(rigid("0.00819 CH4 + 0.4169 O2", 298.15, "0.34 m3")).toMatch(/^not refused/); // little pressure, but as it was written
  });

  test("the pressure: 0, gauge", () => {
    for (const id of ["EQUILIBRIUM.ATPRESSURE", "EQUILIBRIUM.ISOBARIC"]) {
      expect(refusal(id, FEED, 2000, 0)).toBe(
        "#VALUE! Pressure 0 Pa is not above 0 Pa; pressures are absolute (see UNITS.ABSOLUTE for gauge readings)",
      );
      expect(refusal(id, FEED, 2000, "2 barg")).toBe(
        '#VALUE! "barg" is a gauge pressure, and pressures here are absolute: use UNITS.ABSOLUTE(value, "bar")',
      );
    }
  });

  test("an energy that leads beyond the range, hot or cold", () => {
    expect(rigid("1 C2H2 + 2.5 O2", 298.15, "1 L", null, "gri-1999")).toMatch(
      /^#VALUE! The energy of the contents, \d+ J, leads above 3000 K, the upper limit of gri-1999 for CH3O, where it would be -?\d+ J; a list of species without CH3O reaches 3500 K$/,
    );
    expect(refusal("EQUILIBRIUM.ISOBARIC", "1 C2H2 + 2.5 O2", 298.15, "1000 bar", null, "gri-1999")).toMatch(
      /^#VALUE! The enthalpy of the contents, \d+ J, leads above 3000 K, the upper limit of gri-1999 for CH3O, where it would be -?\d+ J; a list of species without CH3O reaches 3500 K$/,
    );
    // liquid water boils into the room and cools
    expect(rigid("1 H2O(l)", 298.15, 1e6)).toMatch(
      /^#VALUE! The energy of the contents, -\d+ J, leads below 200 K, the lower limit of nasa-2002 for O2, where it would be -\d+ J$/,
    );
  });
});

describe("species and set", () => {
  test("words and ids out of place", () => {
    expect(rigid(FEED, 298.15, 1, "complete")).toBe(
      "#VALUE! Complete products are an estimate of BURN; an equilibrium takes a list of species, or none for all",
    );
    expect(rigid(FEED, 298.15, 1, "gri-1999")).toBe('#VALUE! "gri-1999" is a set id; the species come first, the set after them');
    expect(rigid(FEED, 298.15, 1, "equilibrum")).toBe(
      '#N/A "equilibrum" is not in the library; nearest: He, Be(cr), Al(cr); or write "equilibrium", in BURN also "complete", or a list such as "CO2 CO H2O N2"',
    );
    expect(rigid(FEED, 298.15, 1, null, "nasa2002")).toMatch(/^#N\/A There is no set "nasa2002"; the sets are nasa-2002, /);
    expect(rigid(FEED, 298.15, 1, "equilibrium")).toMatch(/^not refused/);
  });

  test("a set without the main products", () => {
    expect(rigid("1 CO2 + 1 NH3", 298.15, 1, null, "srd69-shomate")).toBe(
      "#N/A Set srd69-shomate has no enthalpy of formation with entropy for H2O, H2, O2, which may form here: leave the set out for nasa-2002, or give the species as a list",
    );
  });
});

describe("shapes", () => {
  test("ranges of different shape and states in two dimensions", () => {
    expect(rigid(FEED, [[298.15], [300], [400]], [[1], [2]])).toBe(
      "#VALUE! The ranges differ in shape: T0 has 3 rows × 1 column, volume has 2 rows × 1 column; give ranges of one shape, or single cells",
    );
    expect(atPressure(FEED, [[2000, 2100]], [[1e5], [2e5]])).toBe(
      "#VALUE! The ranges differ in shape: temperature has 1 row × 2 columns, pressure has 2 rows × 1 column; give ranges of one shape, or single cells",
    );
    const plane = "#VALUE! This function gives a table; give one state, or the states as one column, not 2 columns";
    expect(rigid(FEED, [[298.15, 300]], 1)).toBe(plane);
    expect(rigid([["1 H2 + 1 O2", "1 H2 + 2 O2"]], 298.15, 1)).toBe(plane);
  });

  test("an error cell comes out unchanged, in every argument", () => {
    const state = [FEED, 298.15, 1, "equilibrium", "nasa-2002"];
    state.forEach((_, place) => {
      const cell = call("EQUILIBRIUM.RIGID", ...state.map((each, i) => (i === place ? new CellError("#NAME?") : each)))[0]![0] as CellError;
      expect([cell.code, cell.message]).toEqual(["#NAME?", ""]);
    });
  });
});
