/** How the arguments of BURN, BURN.TEMPERATURE, BURN.PRESSURE and BURN.FRACTION are read: spreading, units, blanks, sets, products. */
import fc from "fast-check";
import { CellError } from "../../src/functions/cell";
import { burnt, columnOf, fitsInCells, labelsOf, relative, sentenceOf, SIMPLE_AIR, TEN, textOf, valueOf, warningsOf } from "./burn-helpers";
import { call, number, refusal } from "./helpers";

const temperature = (...values: unknown[]) => number("BURN.TEMPERATURE", ...values);
const usual = temperature("CH4", SIMPLE_AIR, 1, 298.15, 101325);

describe("spreading", () => {
  const given = ["CH4", SIMPLE_AIR, 1, 298.15, "1 atm", "equilibrium", "K", "nasa-2002"];
  const other = ["H2", "air", 0.8, "50 °C", "2 bar", "complete", "°C", "gri-1999"];

  test.each(["fuel", "oxidant", "ratio", "T0", "P0", "products", "unit", "set"].map((name, place) => [name, place] as const))(
    "%s as column, row and block gives each cell its own value",
    (_, place) => {
      const single = (value: unknown) => temperature(...given.map((each, i) => (i === place ? value : each)));
      const spreadOver = (block: unknown[][]) => call("BURN.TEMPERATURE", ...given.map((each, i) => (i === place ? block : each)));
      const [a, b] = [given[place], other[place]];
      for (const block of [
        [[a], [b]],
        [[a, b]],
        [
          [a, b, b],
          [b, a, a],
        ],
      ]) {
        const result = spreadOver(block);
        expect(result.map((row) => row.length)).toEqual(block.map((row) => row.length));
        block.forEach((row, i) => row.forEach((value, j) => expect(relative(result[i]![j] as number, single(value))).toBeLessThan(1e-12)));
      }
      expect(single(a)).not.toBe(single(b));
    },
  );

  test("the species of BURN.FRACTION spread too", () => {
    const block = call("BURN.FRACTION", "CH4", SIMPLE_AIR, 1, 298.15, "1 atm", [
      ["NO", "CO"],
      ["H2O", "CO2"],
    ]);
    const each = (species: string) => number("BURN.FRACTION", "CH4", SIMPLE_AIR, 1, 298.15, "1 atm", species);
    for (const [row, column, species] of [
      [0, 0, "NO"],
      [0, 1, "CO"],
      [1, 0, "H2O"],
      [1, 1, "CO2"],
    ] as const)
      expect(relative(block[row]![column] as number, each(species))).toBeLessThan(1e-11);
  });

  test("ranges of different shape are refused, in every function", () => {
    const sentence =
      "#VALUE! The ranges differ in shape: equivalence_ratio has 2 rows × 1 column, T0 has 3 rows × 1 column; give ranges of one shape, or single cells";
    const state = ["CH4", "air", [[1], [1.1]], [[298], [300], [310]], "1 atm"];
    for (const id of ["BURN", "BURN.TEMPERATURE", "BURN.PRESSURE"]) expect(refusal(id, ...state)).toBe(sentence);
    expect(refusal("BURN.FRACTION", ...state, "NO")).toBe(sentence);
  });

  test("a refused state keeps its place, an error cell comes out unchanged", () => {
    const column = call("BURN.TEMPERATURE", "CH4", SIMPLE_AIR, [[1], [0], [new CellError("#DIV/0!")], [1]], 298.15, "1 atm").map(
      ([cell]) => cell,
    );
    expect(relative(column[0] as number, usual)).toBeLessThan(1e-12);
    expect((column[1] as CellError).message).toMatch(/^Equivalence ratio 0 is not above 0/);
    expect((column[2] as CellError).code).toBe("#DIV/0!");
    expect((column[2] as CellError).message).toBe("");
    expect(relative(column[3] as number, usual)).toBeLessThan(1e-12);
    for (let place = 0; place < 8; place++) {
      const values = given.map((each, i) => (i === place ? new CellError("#REF!") : each));
      expect((call("BURN.TEMPERATURE", ...values)[0]![0] as CellError).code).toBe("#REF!");
    }
  });
});

describe("texts with units, and blanks", () => {
  test("temperatures and pressures in any unit", () => {
    for (const start of [298.15, "298.15 K", "25 °C", "77 °F"])
      for (const pressure of [101325, "1 atm", "1.01325 bar", "101.325 kPa", "760 mmHg"])
        expect(Math.abs(temperature("CH4", SIMPLE_AIR, 1, start, pressure) - usual)).toBeLessThan(1e-4); // mmHg is rough in its last digits
  });

  test("null, empty text and, for texts, 0 are left out", () => {
    for (const blank of [undefined, null, "", 0, [[null]], [[""]]])
      expect(temperature("CH4", SIMPLE_AIR, 1, 298.15, "1 atm", blank, blank, blank)).toBe(usual);
    expect(number("BURN.FRACTION", "CH4", SIMPLE_AIR, 1, 298.15, "1 atm", "NO", 0, 0)).toBe(
      number("BURN.FRACTION", "CH4", SIMPLE_AIR, 1, 298.15, "1 atm", "NO"),
    );
    expect(call("BURN.FUEL", "C7H6O2", 26413.6, 0, null)).toEqual(call("BURN.FUEL", "C7H6O2", 26413.6));
  });
});

describe("fuel and oxidant", () => {
  test("a species, its name, a mixture in fractions or moles, a range, are one and the same", () => {
    const range = (...rows: unknown[][]) => rows;
    for (const fuel of [
      "CH4",
      "methane",
      "1 CH4",
      range(["CH4", 1]),
      range(["CH4", 1, "nasa-2002"]),
      range(["species", "mole fraction"], ["CH4", 1]),
    ])
      expect(temperature(fuel, SIMPLE_AIR, 1, 298.15, "1 atm")).toBe(usual);
    const simple = temperature("CH4", "0.21 O2 + 0.79 N2", 1, 298.15, "1 atm");
    for (const oxidant of [
      range(["O2", 0.21], ["N2", 0.79]),
      range(["O2", "21 %"], ["N2", "79 %"]),
      range(["O2", 0.21, null], ["N2", 0.79, "nasa-2002"]),
    ])
      expect(relative(temperature("CH4", oxidant, 1, 298.15, "1 atm"), simple)).toBeLessThan(1e-12);
    expect(temperature("CH4", "Air", 1, 298.15, "1 atm")).toBe(temperature("CH4", "air", 1, 298.15, "1 atm"));
    expect(temperature("CH4", call("MIX.TABLE", "air"), 1, 298.15, "1 atm")).toBe(temperature("CH4", "air", 1, 298.15, "1 atm"));
  });

  test("a set beside a species is its own", () => {
    const mixed = burnt([["CH4", 1, "gri-1999"]], SIMPLE_AIR, 1, 298.15, "1 atm");
    // −74.600 kJ/mol in both sets to a few J: 0.01 K at most
    expect(Math.abs(valueOf(mixed, "final temperature") - usual)).toBeLessThan(0.02);
    expect(valueOf(mixed, "final temperature")).not.toBe(usual);
    expect(sentenceOf(burnt([["CH4", 1, "usc-2007"]]))).toMatch(/^#N\/A Set usc-2007 does not hold CH4; sets that do: nasa-2002/);
  });

  test("a composition beside a column of states serves all of them", () => {
    const column = call(
      "BURN.TEMPERATURE",
      [
        ["CH4", 0.9],
        ["H2", 0.1],
      ],
      "air",
      [[0.8], [1], [1.2]],
      298.15,
      "1 atm",
    );
    expect(column).toHaveLength(3);
    for (const [row, ratio] of [0.8, 1, 1.2].entries())
      expect(relative(column[row]![0] as number, temperature("0.9 CH4 + 0.1 H2", "air", ratio, 298.15, "1 atm"))).toBeLessThan(1e-12);
  });
});

describe("products", () => {
  const listed = temperature("CH4", SIMPLE_AIR, 1, 298.15, "1 atm", TEN);

  test("a list with blanks, commas, semicolons, as row or column, in any order", () => {
    const names = TEN.split(" ");
    for (const list of [TEN, names.join(", "), names.join(";"), [names], names.map((name) => [name]), [[...names, null]], ` ${TEN}  `])
      expect(temperature("CH4", SIMPLE_AIR, 1, 298.15, "1 atm", list)).toBe(listed);
    expect(relative(temperature("CH4", SIMPLE_AIR, 1, 298.15, "1 atm", [...names].reverse().join(" ")), listed)).toBeLessThan(1e-12);
  });

  test("a comma inside brackets belongs to the name", () => {
    const alumina = (list: string) => call("EQUILIBRIUM.ATPRESSURE", "1 Al2O3(cr,alpha) + 1 O2", 1000, "1 bar", list);
    for (const list of ["Al2O3(cr,alpha) O2", "Al2O3(cr,alpha), O2", "O2; Al2O3(cr,alpha)"])
      expect(valueOf(alumina(list), "Al2O3(cr,alpha)")).toBeCloseTo(1, 12);
  });

  test("species of other elements in a list are passed over", () => {
    expect(relative(temperature("CH4", SIMPLE_AIR, 1, 298.15, "1 atm", `${TEN} SO2 HCl`), listed)).toBeLessThan(1e-12);
  });

  test("a noble gas that is put in need not be listed", () => {
    const table = burnt("CH4", "air", 1, 298.15, "1 atm", TEN);
    expect(textOf(table, "products")).toBe("10 species of the list, each from the library's first choice and Ar");
    expect(valueOf(table, "final temperature")).toBe(temperature("CH4", "air", 1, 298.15, "1 atm", `${TEN} Ar`));
  });

  test("words in any case, one or in a column; more species only lower the temperature", () => {
    expect(temperature("CH4", SIMPLE_AIR, 1, 298.15, "1 atm", "Equilibrium")).toBe(usual);
    const column = call("BURN.TEMPERATURE", "CH4", SIMPLE_AIR, 1, 298.15, "1 atm", [["complete"], ["EQUILIBRIUM"]]);
    expect(column[0]![0]).toBe(temperature("CH4", SIMPLE_AIR, 1, 298.15, "1 atm", "complete"));
    expect(relative(column[1]![0] as number, usual)).toBeLessThan(1e-12);
    expect(usual).toBeLessThan(listed);
    expect(listed).toBeLessThan(temperature("CH4", SIMPLE_AIR, 1, 298.15, "1 atm", "CO2 CO H2O N2 O2 H2"));
  });
});

describe("sets", () => {
  test("left out, nasa-2002, any case, extrapolation where none is needed", () => {
    for (const set of ["nasa-2002", "NASA-2002", "nasa-2002; extrapolate", "; extrapolate", "extrapolate"])
      expect(temperature("CH4", SIMPLE_AIR, 1, 298.15, "1 atm", null, null, set)).toBe(usual);
    const gri = temperature("CH4", SIMPLE_AIR, 1, 298.15, "1 atm", null, null, "gri-1999");
    // two evaluations: OH of gri-1999 is 2 kJ/mol higher
    expect(gri).toBeGreaterThan(usual + 1);
    expect(gri).toBeLessThan(usual + 3);
  });

  test("extrapolated states say so, at both ends, once for each inlet and the products", () => {
    const hot = burnt("C2H2", "O2", 1, 298.15, "100 bar", null, "gri-1999; extrapolate");
    expect(valueOf(hot, "final temperature")).toBeGreaterThan(5000);
    expect(warningsOf(hot)).toEqual([
      expect.stringMatching(
        /^Extrapolated as asked for: 5225\.2 K is above 3000 K, the upper limit of gri-1999 for CH3O \(and beyond that of \d+ more\); beyond it the heat capacity is held$/,
      ),
      "The ideal gas is assumed; at 205.042 MPa the pressure of real gases is higher, by about 15 % (from a covolume of 27 cm3/mol)",
    ]);
    const cold = burnt("CH4", SIMPLE_AIR, 1, 150, "1 atm", null, "; extrapolate");
    expect(warningsOf(cold)).toEqual([
      "Extrapolated as asked for: 150 K is below 200 K, the lower limit of nasa-2002 for CH4; beyond it the heat capacity is held",
      "Extrapolated as asked for: 150 K is below 200 K, the lower limit of nasa-2002 for O2 (and beyond that of 1 more); beyond it the heat capacity is held",
    ]);
    // of several fits the one that ends first is named: N2 of gri-1999 begins at 300 K, O2 at 200 K
    expect(warningsOf(burnt("CH4", SIMPLE_AIR, 1, 150, "1 atm", TEN, "gri-1999; extrapolate"))[1]).toBe(
      "Extrapolated as asked for: 150 K is below 300 K, the lower limit of gri-1999 for N2 (and beyond that of 1 more); beyond it the heat capacity is held",
    );
    const complete = burnt("C2H2", "O2", 1, 298.15, "1 atm", "complete", "; extrapolate");
    expect(warningsOf(complete)[0]).toMatch(/^Extrapolated as asked for: \d+\.\d+ K is above 6000 K, the upper limit of nasa-2002 for H2O/);
  });

  test("a coefficient block serves its own species, nasa-2002 the others", () => {
    const nonane = ["Cp", "g", "C9H20", "power", 200, 6000, "J/(mol K)", null, -228900, 500, 200, 0.1];
    const table = burnt("C9H20", SIMPLE_AIR, 1, 298.15, "1 atm", null, [nonane]);
    expect(textOf(table, "products")).toBe("32 species of nasa-2002 and the coefficient block");
    expect(warningsOf(table)).toEqual([
      "The coefficient block has no row for O2: nasa-2002 is used",
      "The coefficient block has no row for N2: nasa-2002 is used",
    ]);
    // complete products: N2 is put in and formed, and named once
    expect(warningsOf(burnt("C9H20", SIMPLE_AIR, 1, 298.15, "1 atm", "complete", [nonane]))).toEqual(
      ["O2", "N2", "CO2", "H2O"].map((species) => `The coefficient block has no row for ${species}: nasa-2002 is used`),
    );
    // its heat of formation is that of nonane (from memory, −228.9 kJ/mol): the flame of an alkane between heptane and dodecane
    const [heptane, dodecane] = ["n-C7H16", "n-C12H26"].map((fuel) => valueOf(burnt(fuel), "final temperature"));
    expect(valueOf(table, "final temperature")).toBeGreaterThan(Math.min(heptane!, dodecane!) - 5);
    expect(valueOf(table, "final temperature")).toBeLessThan(Math.max(heptane!, dodecane!) + 5);
    expect(number("BURN.FRACTION", "C9H20", SIMPLE_AIR, 1, 298.15, "1 atm", "C9H20", null, [nonane])).toBeLessThan(1e-30);
    const short = burnt("C9H20", SIMPLE_AIR, 1, 298.15, "1 atm", "CO2 CO H2O N2 O2 H2", [nonane]);
    expect(textOf(short, "products")).toBe("6 species of the list, from the coefficient block and the library's first choice");
  });

  test("a row replaces the library's species; without entropy it burns but does not form, and that is said", () => {
    const water = (entropy: number | null) => ["Cp", "g", "H2O", "power", 200, 6000, "J/(mol K)", null, -251826, entropy, 33.6, 0.005];
    const with10 = burnt("H2", SIMPLE_AIR, 1, 298.15, "1 atm", null, [water(188.8)]);
    expect(textOf(with10, "products")).toBe("17 species of nasa-2002 and the coefficient block");
    // the row makes water 10 kJ/mol more stable than the library does
    expect(valueOf(with10, "H2O(g)")).toBeGreaterThan(0.25);
    expect(valueOf(with10, "final temperature")).toBeGreaterThan(temperature("H2", SIMPLE_AIR, 1, 298.15, "1 atm") + 20);
    expect(labelsOf(with10)).not.toContain("H2O");
    const without = burnt("H2", SIMPLE_AIR, 1, 298.15, "1 atm", null, [water(null)]);
    expect(valueOf(without, "final temperature")).toBe(temperature("H2", SIMPLE_AIR, 1, 298.15, "1 atm"));
    expect(warningsOf(without)).toContain("Without enthalpy of formation or entropy, and so passed over: H2O(g)");
  });

  test("all fits from cells: names without phase find the gases", () => {
    const state = ["CH4", SIMPLE_AIR, 1, 298.15, "1 bar"];
    const table = call("BURN", ...state, TEN, fitsInCells);
    expect(number("BURN.FRACTION", ...state, "NO", TEN, fitsInCells)).toBe(valueOf(table, "NO(g)"));
    expect(number("BURN.FRACTION", ...state, "NO(g)", TEN, fitsInCells)).toBe(valueOf(table, "NO(g)"));
    expect(warningsOf(table)).toEqual([]);
  });
});

describe("tables", () => {
  test("one state stands upright, with a line for each species above 1e-9 and the traces together", () => {
    const table = burnt("CH4");
    expect(table.every((row) => row.length === 4)).toBe(true);
    expect(labelsOf(table)).toEqual([
      ...["final temperature", "final pressure", "pressure ratio", "gas formed to gas put in", "fuel in the mixture", "mixture"],
      ...["N2", "H2O", "CO2", "CO", "O2", "OH", "H2", "NO", "H", "O", "NO2", "N2O", "N", "NH", "NH3", "traces"],
      ...["products", "mass-action residual", "element residual", "assumptions", "caution", "warnings"],
    ]);
    expect(table[0]).toEqual(["final temperature", usual, "K", ""]);
    expect(table[1]!.slice(2)).toEqual(["Pa", "absolute"]);
    expect(table[4]).toEqual([
      "fuel in the mixture",
      expect.closeTo(100 / 10.52, 12),
      "%",
      "mol of fuel to mol of fuel and oxidant; stoichiometric: 1 times the oxidant that just suffices",
    ]);
    expect(textOf(table, "traces")).toBe(
      "below 1e-9 of the gas: O3, HCN, HNO3, C(g), CH4, C2H2, C2N2, CH3CN, C2H4, C2H6, propyne, C3H8, i-C4H10; see BURN.FRACTION",
    );
    expect(table.find(([label]) => label === "products")).toEqual([
      "products",
      "31 species of nasa-2002",
      "",
      "left out, as they have no value at 2584.9 K: H2O(l), H2O(cr)",
    ]);
    expect(textOf(table, "caution")).toMatch(
      /not a design or relief calculation: the vessel's own rating, local codes and licensed practice govern$/,
    );
    expect(textOf(table, "caution")).toMatch(/^deflagration in one closed vessel/);
    expect(table[table.length - 1]).toEqual(["warnings", "none", "", ""]);
  });

  test("lean and rich mixtures say on which side they are", () => {
    const side = (ratio: number) => String(burnt("CH4", SIMPLE_AIR, ratio)[4]![3]).split("; ")[1];
    expect(side(0.5)).toBe("lean: 2 times the oxidant that just suffices");
    expect(side(1.25)).toBe("rich: 0.8 times the oxidant that just suffices");
  });

  test("a column of states: headings with units, a row each, cautions in words, refused states in their row", () => {
    const ratios = [[0.8], [0], [1], [new CellError("#N/A")], [1.2]];
    const table = call("BURN", "CH4", SIMPLE_AIR, ratios, 298.15, "1 atm");
    expect(table).toHaveLength(6);
    expect(table[0]!.slice(0, 7)).toEqual([
      ...[
        "final temperature [K]",
        "final pressure [Pa]",
        "pressure ratio",
        "gas formed to gas put in [mol/mol]",
        "fuel in the mixture [%]",
        "mixture",
      ],
      "N2 [mol/mol]",
    ]);
    expect(new Set(table[0]).size).toBe(table[0]!.length);
    expect(table.every((row) => row.length === table[0]!.length)).toBe(true);
    for (const [row, ratio] of [
      [1, 0.8],
      [3, 1],
      [5, 1.2],
    ] as const) {
      const single = burnt("CH4", SIMPLE_AIR, ratio);
      expect(relative(table[row]![0] as number, valueOf(single, "final temperature"))).toBeLessThan(1e-12);
      expect(relative(table[row]![1] as number, valueOf(single, "final pressure"))).toBeLessThan(1e-12);
      for (const species of ["CO2", "CO", "NO", "OH"])
        expect(relative(columnOf(table, `${species} [mol/mol]`)[row - 1] as number, valueOf(single, species))).toBeLessThan(1e-10);
    }
    for (const cell of table[2]!) expect((cell as CellError).message).toMatch(/^Equivalence ratio 0 is not above 0/);
    for (const cell of table[4]!) expect((cell as CellError).code).toBe("#N/A");
    expect(columnOf(table, "caution")[0]).toBe(textOf(burnt("CH4"), "caution"));
    expect(columnOf(table, "assumptions")[0]).toMatch(/^ideal gas; solids and liquids have no volume/);
    // rows hold all traces, and nothing for species that have no value at the temperature
    expect(columnOf(table, "C2H6 [mol/mol]")[2]).toBeLessThan(1e-20);
    expect(table[0]).not.toContain("H2O(l) [mol/mol]");
    expect(columnOf(table, "C(gr) [mol/mol]")[2]).toBe(0);
  });

  test("complete and equilibrium in one column: what a state lacks is blank", () => {
    const table = call("BURN", "CH4", SIMPLE_AIR, 0.9, 298.15, "1 atm", [["complete"], ["equilibrium"]]);
    expect(columnOf(table, "complete products")).toEqual(["estimate without dissociation; not a bound", ""]);
    expect(columnOf(table, "NO [mol/mol]")[0]).toBe("");
    expect(columnOf(table, "NO [mol/mol]")[1]).toBeGreaterThan(0.001);
    expect(columnOf(table, "mass-action residual")[0]).toBe("");
  });

  test("two-dimensional states are refused", () => {
    expect(refusal("BURN", "CH4", "air", [[0.8, 1]], 298.15, "1 atm")).toBe(
      "#VALUE! This function gives a table; give one state, or the states as one column, not 2 columns",
    );
  });
});

describe("the same again", () => {
  test("the same call gives the same bits, after any other calls", () => {
    const state = ["C2H4", "air", 0.95, "30 °C", "3 bar"];
    const first = [call("BURN", ...state), call("BURN.PRESSURE", "H2", "air", [[0.7], [1.3]], 298.15, "1 atm")];
    for (let i = 0; i < 1100; i++) call("BURN.TEMPERATURE", "H2", "O2", 0.5 + i / 2000, 298.15, "1 bar", "H2 O2 H2O OH H O"); // fills the cache
    expect([call("BURN", ...state), call("BURN.PRESSURE", "H2", "air", [[0.7], [1.3]], 298.15, "1 atm")]).toEqual(first);
  });

  test("a sweep agrees with single calls, whatever its order", () => {
    fc.assert(
      fc.property(fc.array(fc.double({ min: 0.3, max: 3, noNaN: true }), { minLength: 2, maxLength: 6 }), (ratios) => {
        const sweep = call(
          "BURN.TEMPERATURE",
          "CH4",
          SIMPLE_AIR,
          ratios.map((ratio) => [ratio]),
          298.15,
          "1 atm",
        ).map(([cell]) => cell as number);
        const backwards = call(
          "BURN.TEMPERATURE",
          "CH4",
          SIMPLE_AIR,
          [...ratios].reverse().map((ratio) => [ratio]),
          298.15,
          "1 atm",
        ).map(([cell]) => cell as number);
        ratios.forEach((ratio, i) => {
          const single = temperature("CH4", SIMPLE_AIR, ratio, 298.15, "1 atm");
          expect(relative(sweep[i]!, single)).toBeLessThan(1e-12);
          expect(relative(backwards[ratios.length - 1 - i]!, single)).toBeLessThan(1e-12);
        });
      }),
      { numRuns: 30 },
    );
  });

  test("a sweep over fuels of other elements is no worse", () => {
    const fuels = ["CH4", "H2", "H2S", "C(gr)", "NH3", "CH4", "CO"];
    const sweep = call(
      "BURN.PRESSURE",
      fuels.map((fuel) => [fuel]),
      SIMPLE_AIR,
      1,
      298.15,
      "1 atm",
    );
    fuels.forEach((fuel, i) =>
      expect(relative(sweep[i]![0] as number, number("BURN.PRESSURE", fuel, SIMPLE_AIR, 1, 298.15, "1 atm"))).toBeLessThan(1e-12),
    );
  });
});
