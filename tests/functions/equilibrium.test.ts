/** EQUILIBRIUM.ATVOLUME, ATPRESSURE, RIGID, ISOBARIC: values computed elsewhere, what must hold between them, their tables. */
import fc from "fast-check";
import { CellError } from "../../src/functions/cell";
import cases from "../cases/equilibrium.json";
import { ATMOSPHERE, columnOf, fitsInCells, labelsOf, R, relative, type Table, TEN, textOf, valueOf, warningsOf } from "./burn-helpers";
import { call } from "./helpers";

const METHANE = "1 CH4 + 2 O2 + 7.52 N2";
const AT_ONE_ATMOSPHERE = (10.52 * R * 298.15) / ATMOSPHERE;

/** A feed of a case as cells: species | mol. */
const feedOf = (feed: object) => Object.entries(feed).map(([name, amount]) => [name, Number(amount)]);
const totalOf = (feed: object) => feedOf(feed).reduce((sum, [, amount]) => sum + Number(amount), 0);

describe("cases computed with 36 digits, with their fits as a coefficient block", () => {
  // their standard pressure is 1 atm, that of a coefficient block 1 bar, and only the pressure relative to it counts
  test.each(cases.atVolume)("EQUILIBRIUM.RIGID: $name", ({ feed, start, temperature, ratio, fractions }) => {
    const volume = (totalOf(feed) * R * start) / 1e5;
    const table = call("EQUILIBRIUM.RIGID", feedOf(feed), start, volume, Object.keys(fractions).join(" "), fitsInCells);
    expect(relative(valueOf(table, "temperature"), temperature)).toBeLessThan(1e-12);
    expect(relative(valueOf(table, "pressure") / 1e5, ratio)).toBeLessThan(1.2e-11);
    expect(relative(valueOf(table, "pressure before"), 1e5)).toBeLessThan(1e-14);
    for (const [name, fraction] of Object.entries(fractions as Record<string, number>))
      if (fraction > 1e-8) expect(relative(valueOf(table, `${name}(g)`) / valueOf(table, "amount of gas"), fraction)).toBeLessThan(2e-12);
  });

  test.each(cases.atPressure)("EQUILIBRIUM.ISOBARIC: $name", ({ feed, start, pressure, temperature, fractions }) => {
    const species = Object.keys(fractions).join(" ");
    const table = call("EQUILIBRIUM.ISOBARIC", feedOf(feed), start, (pressure / ATMOSPHERE) * 1e5, species, fitsInCells);
    expect(relative(valueOf(table, "temperature"), temperature)).toBeLessThan(1e-12);
    for (const [name, fraction] of Object.entries(fractions as Record<string, number>))
      if (fraction > 1e-8) expect(relative(valueOf(table, `${name}(g)`) / valueOf(table, "amount of gas"), fraction)).toBeLessThan(2e-12);
  });
});

describe("published compositions", () => {
  // Textbook problems (answers from memory), asked with gri-1999. Its CO2 and O2 belong to 1 bar: 0.3 % in the dissociated part
  test.each([
    ["2 CO + 3 O2", 2600, "3 atm", "CO2 CO O2", { CO2: 1.906, CO: 0.094, O2: 2.047 }],
    ["3 CO + 2.5 O2 + 8 N2", 2600, "5 atm", "CO2 CO O2 N2", { CO2: 2.754, CO: 0.246, O2: 1.123, N2: 8 }],
  ] as const)("%s at %d K and %s", (feed, temperature, pressure, species, answer) => {
    const table = call("EQUILIBRIUM.ATPRESSURE", feed, temperature, pressure, species, "gri-1999");
    for (const [name, mol] of Object.entries(answer)) expect(Math.abs(valueOf(table, name) - mol)).toBeLessThan(0.002);
  });

  test("steam at 2500 K dissociates as its K says", () => {
    const table = call("EQUILIBRIUM.ATPRESSURE", "1 H2O", 2500, "1 bar", "H2O H2 O2");
    const [water, hydrogen, oxygen, gas] = ["H2O", "H2", "O2", "amount of gas"].map((label) => valueOf(table, label));
    const lnK = Math.log((hydrogen! * Math.sqrt(oxygen! / gas!)) / water!);
    // ln K of H2O = H2 + 1/2 O2 at 2500 K, from memory of the usual tables: −5.120
    expect(Math.abs(lnK + 5.12)).toBeLessThan(0.02);
    expect(relative(water! + hydrogen!, 1)).toBeLessThan(1e-14);
    expect(relative(hydrogen!, 2 * oxygen!)).toBeLessThan(1e-12);
  });
});

describe("two solids that hold an element which no gas holds", () => {
  const REDUCTION = "Fe(cr) FeO(cr) CO CO2";
  const at = (feed: string, list = REDUCTION) => call("EQUILIBRIUM.ATPRESSURE", feed, 1000, "1 bar", list);

  test("FeO + CO = Fe + CO2: one ratio of the gases for every feed that leaves both solids", () => {
    const feeds = ["1 FeO(cr) + 1.9 CO + 0.1 CO2", "1 FeO(cr) + 2 CO", "1 FeO(cr) + 0.5 CO", "1 Fe(cr) + 0.6 CO + 0.3 CO2 + 1 FeO(cr)"];
    const ratios = feeds.map((feed) => valueOf(at(feed), "CO2") / valueOf(at(feed), "CO"));
    // ΔrG(1000 K) of FeO + CO = Fe + CO2 is 10 to 12 kJ/mol with the usual table of stoichiometric FeO, from memory: K 0.24 to 0.30
    expect(ratios[0]).toBeGreaterThan(0.24);
    expect(ratios[0]).toBeLessThan(0.3);
    for (const ratio of ratios) expect(relative(ratio, ratios[0]!)).toBeLessThan(1e-9);
  });

  test("one solid where the other cannot stay, and carbon beside them", () => {
    expect(valueOf(at("1 FeO(cr) + 20 CO"), "FeO(cr)")).toBe(0);
    expect(valueOf(at("1 FeO(cr) + 20 CO"), "Fe(cr)")).toBeCloseTo(1, 12);
    expect(valueOf(at("1 Fe(cr) + 2 CO2"), "Fe(cr)")).toBe(0);
    const deposit = at("1 FeO(cr) + 2 CO", `${REDUCTION} C(gr)`);
    expect(valueOf(deposit, "CO") + valueOf(deposit, "CO2") + valueOf(deposit, "C(gr)")).toBeCloseTo(2, 12);
  });
});

/** A state of RIGID, and what it becomes when asked for otherwise. */
function sameState(one: Table, other: Table, tolerance: number): void {
  for (const label of ["temperature", "pressure", "volume", "amount of gas", "CO2", "CO", "H2O", "OH", "NO"])
    expect(relative(valueOf(other, label), valueOf(one, label))).toBeLessThan(tolerance);
}

describe("one state, held four ways", () => {
  const closed = call("EQUILIBRIUM.RIGID", METHANE, 298.15, AT_ONE_ATMOSPHERE);
  const [temperature, pressure] = [valueOf(closed, "temperature"), valueOf(closed, "pressure")];

  test("ATVOLUME and ATPRESSURE at the state that RIGID reached give it back", () => {
    const held = call("EQUILIBRIUM.ATVOLUME", METHANE, temperature, AT_ONE_ATMOSPHERE);
    sameState(closed, held, 1e-11);
    expect(relative(valueOf(held, "energy U"), valueOf(closed, "energy U"))).toBeLessThan(1e-10);
    sameState(closed, call("EQUILIBRIUM.ATPRESSURE", METHANE, temperature, pressure), 1e-11);
  });

  test("ATPRESSURE at the state that ISOBARIC reached gives it back, and the held numbers are as given", () => {
    const open = call("EQUILIBRIUM.ISOBARIC", METHANE, "25 °C", "3 atm");
    expect(valueOf(open, "pressure")).toBe(303975);
    expect(relative(valueOf(open, "volume before"), (10.52 * R * 298.15) / 303975)).toBeLessThan(1e-15);
    const held = call("EQUILIBRIUM.ATPRESSURE", METHANE, valueOf(open, "temperature"), "3 atm");
    expect(valueOf(held, "pressure")).toBe(303975);
    sameState(open, held, 1e-11);
    expect(relative(valueOf(held, "enthalpy H"), valueOf(open, "enthalpy H"))).toBeLessThan(1e-10);
    expect(valueOf(call("EQUILIBRIUM.ATVOLUME", METHANE, 2000, 0.3), "volume")).toBe(0.3);
    expect(valueOf(call("EQUILIBRIUM.ATVOLUME", METHANE, 2000, 0.3), "temperature")).toBe(2000);
  });

  test("energy or enthalpy is held: that of the reactants at T0", () => {
    // ΔfH of CH4 −74.6 kJ/mol less 10.52 R · 298.15 K
    expect(Math.abs(valueOf(closed, "energy U") / 1000 - (-74.6 - (10.52 * R * 298.15) / 1000))).toBeLessThan(0.01);
    const open = call("EQUILIBRIUM.ISOBARIC", METHANE, 298.15, "1 atm");
    expect(Math.abs(valueOf(open, "enthalpy H") / 1000 + 74.6)).toBeLessThan(0.01);
    for (const table of [closed, open]) {
      const work = valueOf(table, "pressure") * valueOf(table, "volume");
      expect(Math.abs(valueOf(table, "enthalpy H") - valueOf(table, "energy U") - work)).toBeLessThan(2e-5 * work); // R of the fits
      expect(relative(work, valueOf(table, "amount of gas") * R * valueOf(table, "temperature"))).toBeLessThan(1e-12);
    }
  });

  test("twice the feed in twice the volume is twice the amounts", () => {
    const twice = call("EQUILIBRIUM.RIGID", "2 CH4 + 4 O2 + 15.04 N2", 298.15, 2 * AT_ONE_ATMOSPHERE);
    for (const label of ["temperature", "pressure", "pressure before"])
      expect(relative(valueOf(twice, label), valueOf(closed, label))).toBeLessThan(1e-12);
    for (const label of ["volume", "amount of gas", "energy U", "CO2", "NO", "H"])
      expect(relative(valueOf(twice, label), 2 * valueOf(closed, label))).toBeLessThan(1e-11);
  });

  test("the feed may be a range, in any order, in parts, with moles as text without numbers", () => {
    const again = (feed: unknown) => sameState(closed, call("EQUILIBRIUM.RIGID", feed, 298.15, AT_ONE_ATMOSPHERE), 1e-12);
    again([
      ["CH4", 1],
      ["O2", 2],
      ["N2", 7.52],
    ]);
    again([
      ["N2", 7, "nasa-2002"],
      ["methane", 1, null],
      [null, null, null],
      ["O2", 2, null],
      ["N2", 0.52, null],
    ]);
    again("CH4 + 2O2 + 7.52N2");
    again("7.52 N2 + 1 O2 + 1 CH4 + 1 O2");
  });

  test("what is put in counts by its atoms where temperature is held", () => {
    const one = call("EQUILIBRIUM.ATPRESSURE", "1 CO2 + 2 H2O + 7.52 N2", 2200, "1 bar");
    sameState(one, call("EQUILIBRIUM.ATPRESSURE", METHANE, 2200, "1 bar"), 1e-11);
  });

  test("random states: ATVOLUME at what ATPRESSURE shows gives it back", () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 400, max: 5000 }),
        fc.integer({ min: 3, max: 7 }),
        fc.integer({ min: 0, max: 40 }),
        (kelvin, power, rich) => {
          const feed = `${1 + rich / 10} CH4 + 2 O2 + 7.52 N2`;
          const open = call("EQUILIBRIUM.ATPRESSURE", feed, kelvin, 10 ** power);
          const closedAgain = call("EQUILIBRIUM.ATVOLUME", feed, kelvin, valueOf(open, "volume"));
          expect(relative(valueOf(closedAgain, "pressure"), 10 ** power)).toBeLessThan(1e-11);
          for (const [label, amount, unit] of open)
            if (unit === "mol" && Number(amount) > 1e-6)
              expect(relative(valueOf(closedAgain, String(label)), Number(amount))).toBeLessThan(1e-9);
        },
      ),
      { numRuns: 60 },
    );
  });
});

describe("tables", () => {
  test("one state stands upright", () => {
    const table = call("EQUILIBRIUM.RIGID", METHANE, 298.15, AT_ONE_ATMOSPHERE, TEN);
    expect(labelsOf(table)).toEqual([
      ...["pressure before", "temperature", "pressure", "volume", "amount of gas", "energy U", "enthalpy H"],
      ...["CO2", "CO", "H2O", "H2", "O2", "N2", "OH", "NO", "H", "O"],
      ...["species", "mass-action residual", "element residual", "assumptions", "caution", "warnings"],
    ]);
    expect(table.slice(0, 7).map(([, , unit]) => unit)).toEqual(["Pa", "K", "Pa", "m3", "mol", "J", "J"]);
    expect(table[12]!).toEqual(["N2", expect.closeTo(7.4949, 3), "mol", "mole fraction 0.702266"]);
    expect(textOf(table, "species")).toBe("10 species of the list, each from the library's first choice");
    expect(textOf(table, "assumptions")).toBe("ideal gas and pure condensed phases at chemical equilibrium; rates are not considered");
    expect(textOf(table, "caution")).toBe(
      "not a design or relief calculation; the vessel's own rating, local codes and licensed practice govern",
    );
    expect(valueOf(table, "mass-action residual")).toBeLessThan(1e-9);
    expect(valueOf(table, "element residual")).toBeLessThan(1e-9);
    const amounts = table.slice(7, 17).reduce((sum, [, amount]) => sum + Number(amount), 0);
    expect(relative(amounts, valueOf(table, "amount of gas"))).toBeLessThan(1e-14);
  });

  test("condensed species and traces say what they are", () => {
    const soot = call("EQUILIBRIUM.ATPRESSURE", "1 C(gr) + 0.2 O2", 1500, "1 bar");
    expect(soot.find(([label]) => label === "C(gr)")).toEqual(["C(gr)", expect.closeTo(0.6, 3), "mol", "condensed"]);
    expect(textOf(soot, "traces")).toBe("below 1e-9 of everything: O, C(g), O2, O3; list the species to see them all");
    const cold = call("EQUILIBRIUM.ATPRESSURE", "2 H2 + 1 O2", 300, "1 bar");
    expect(valueOf(cold, "H2O(l)")).toBe(2);
    expect(valueOf(cold, "amount of gas")).toBe(0);
    expect(valueOf(cold, "volume")).toBe(0);
    expect(cold.find(([label]) => label === "pressure")).toEqual(["pressure", 1e5, "Pa", "as given: everything condenses, no gas is left"]);
    const hot = call("EQUILIBRIUM.ATPRESSURE", "2 H2 + 1 O2", 1000, "1 bar");
    expect(hot.find(([label]) => label === "species")).toEqual([
      "species",
      "9 species of nasa-2002",
      "",
      "left out, as they have no value at 1000 K: H2O(l), H2O(cr)",
    ]);
  });

  test("a column of states: a row each, refused states in their row, no number where a species has no value", () => {
    const temperatures = [[300], [400], [7000], [new CellError("#NUM!")], [2600]];
    const table = call("EQUILIBRIUM.ATPRESSURE", "2 H2 + 1 O2", temperatures, "1 bar");
    expect(table).toHaveLength(6);
    expect(table[0]!.slice(0, 6)).toEqual([
      "temperature [K]",
      "pressure [Pa]",
      "volume [m3]",
      "amount of gas [mol]",
      "energy U [J]",
      "enthalpy H [J]",
    ]);
    expect(columnOf(table, "H2O(l) [mol]").slice(0, 2)).toEqual([2, 0]);
    expect(columnOf(table, "H2O(l) [mol]")[4]).toBe("");
    expect(columnOf(table, "pressure [Pa]")[4]).toBe(1e5);
    for (const cell of table[3]!)
      expect((cell as CellError).message).toBe("Temperature 7000 K is above 6000 K, the upper limit of nasa-2002 for H2O");
    for (const cell of table[4]!) expect((cell as CellError).code).toBe("#NUM!");
    expect(columnOf(table, "caution")[0]).toMatch(/^not a design or relief calculation/);
    const single = call("EQUILIBRIUM.ATPRESSURE", "2 H2 + 1 O2", 2600, "1 bar");
    for (const species of ["H2O", "H2", "OH", "O"])
      expect(relative(columnOf(table, `${species} [mol]`)[4] as number, valueOf(single, species))).toBeLessThan(1e-11);
  });

  test.each([
    ["EQUILIBRIUM.ATVOLUME", [2000, 2600, 1500], [0.3, 0.26, 0.5]],
    ["EQUILIBRIUM.ATPRESSURE", [2000, 2600, 1500], [1e5, 2e5, 1e6]],
    ["EQUILIBRIUM.RIGID", [298.15, 400, 350], [0.26, 0.3, 0.1]],
    ["EQUILIBRIUM.ISOBARIC", [298.15, 400, 350], [1e5, 2e5, 1e6]],
  ])("%s: sweeps over feed, both quantities and set agree with single calls in any order", (id, first, second) => {
    const feeds = [METHANE, "1 H2 + 0.6 O2 + 2 N2", "1 CO + 0.4 O2 + 2 N2"];
    const sets = ["", "nasa-2002", "gri-1999"];
    const column = (values: readonly unknown[], order: readonly number[]) => order.map((i) => [values[i]]);
    const sweep = (order: readonly number[]) =>
      call(id, column(feeds, order), column(first, order), column(second, order), null, column(sets, order));
    for (const order of [
      [0, 1, 2],
      [2, 0, 1],
      [1, 2, 0],
    ]) {
      const table = sweep(order);
      for (const [row, i] of order.entries()) {
        const single = call(id, feeds[i], first[i], second[i], null, sets[i]);
        for (const label of ["temperature", "pressure", "volume", "amount of gas"]) {
          const place = table[0]!.findIndex((heading) => String(heading).startsWith(`${label} [`));
          expect(relative(table[row + 1]![place] as number, valueOf(single, label))).toBeLessThan(1e-12);
        }
      }
    }
  });

  test("the same call gives the same bits", () => {
    const once = () => call("EQUILIBRIUM.RIGID", METHANE, 298.15, 0.2574);
    const first = once();
    call("EQUILIBRIUM.RIGID", [["1 H2 + 1 O2"], [METHANE]], 298.15, 0.2574);
    expect(once()).toEqual(first);
  });

  test("the columns stand in one order, whichever temperature comes first: liquid water keeps its place among the species", () => {
    const heading = (temperatures: number[][]) => call("EQUILIBRIUM.ATPRESSURE", "1 H2O", temperatures, "1 bar")[0]!;
    expect(heading([[3000], [300]])).toEqual(heading([[300], [3000]]));
    expect(heading([[3000], [300]]).slice(-1)).toEqual(["warnings"]);
    expect(heading([[3000], [300]])[9]).toBe("H2O(l) [mol]");
  });

  test("a listed species of elements that are not put in is named, not dropped without a word", () => {
    expect(textOf(call("EQUILIBRIUM.ATPRESSURE", "2 CO + O2", 2000, "1 bar", "CO2 NO CO O2 H2O"), "species")).toBe(
      "3 species of the list, each from the library's first choice, without NO, H2O, of elements that are not put in",
    );
  });

  test("a composition of the feed beside a column of temperatures serves all of them", () => {
    const range = [
      ["CO", 2],
      ["O2", 3],
    ];
    const table = call("EQUILIBRIUM.ATPRESSURE", range, [[2000], [2600]], "3 atm", [["CO2", "CO", "O2"]]);
    const single = call("EQUILIBRIUM.ATPRESSURE", "2 CO + 3 O2", 2600, "3 atm", "CO2 CO O2");
    expect(relative(columnOf(table, "CO [mol]")[1] as number, valueOf(single, "CO"))).toBeLessThan(1e-12);
  });
});

describe("warnings", () => {
  test("of a plain volume in litres and a plain pressure in bar; a text with its unit is taken at its word", () => {
    const charge = "0.00819 CH4 + 0.4169 O2"; // 30 atm in 0.34 L
    const litres = call("EQUILIBRIUM.RIGID", charge, 298.15, 0.34);
    expect(warningsOf(litres)).toContain('3099.35 Pa in 0.34 m3 is little: a plain volume is in m3; for litres write "0.34 L"');
    expect(warningsOf(call("EQUILIBRIUM.RIGID", charge, 298.15, "0.34 m3")).some((text) => text.includes("litres"))).toBe(false);
    expect(warningsOf(call("EQUILIBRIUM.RIGID", charge, 298.15, "340 mL")).some((text) => text.includes("litres"))).toBe(false);
    expect(warningsOf(call("EQUILIBRIUM.ATVOLUME", METHANE, 2000, 257))).toContain(
      '689.698 Pa in 257 m3 is little: a plain volume is in m3; for litres write "257 L"',
    );
    const vacuum = '1 Pa is near vacuum: a plain pressure is in Pa; for another unit write "1 bar"';
    expect(warningsOf(call("EQUILIBRIUM.ATPRESSURE", METHANE, 2000, 1))).toEqual([vacuum]);
    expect(warningsOf(call("EQUILIBRIUM.ISOBARIC", METHANE, 298.15, 1))).toEqual([vacuum]);
    expect(warningsOf(call("EQUILIBRIUM.ATPRESSURE", METHANE, 2000, "1 Pa"))).toEqual([]);
    expect(warningsOf(call("EQUILIBRIUM.ATPRESSURE", METHANE, 2000, 1000))).toEqual([]);
  });

  test("of extrapolation, missing atoms, sets, and pressures beyond the ideal gas", () => {
    expect(warningsOf(call("EQUILIBRIUM.ATPRESSURE", METHANE, 4000, "1 atm", null, "gri-1999; extrapolate"))).toEqual([
      expect.stringMatching(
        /^Extrapolated as asked for: 4000 K is above 3000 K, the upper limit of gri-1999 for CH3O \(and beyond that of \d+ more\)/,
      ),
    ]);
    expect(warningsOf(call("EQUILIBRIUM.ATPRESSURE", "1 HCl", 2500, "1 bar"))).toEqual([
      "No free atoms of Cl are among the species; they form at 2500 K, so that volume and energy come out too low",
    ]);
    expect(warningsOf(call("EQUILIBRIUM.RIGID", METHANE, 298.15, "1 L"))[0]).toMatch(/^The ideal gas is assumed; at \d+\.\d+ MPa/);
    expect(warningsOf(call("EQUILIBRIUM.RIGID", "1 i-C8H18 + 12.5 O2", 298.15, "1 m3"))).toEqual([
      "c3mech-2022 for i-C8H18 begins at 300 K; from there down to 298.15 K the heat capacity at 300 K is held",
    ]);
    // at a held temperature what is put in counts by its atoms, and its fit does not matter
    expect(warningsOf(call("EQUILIBRIUM.ATVOLUME", "1 i-C8H18 + 12.5 O2", 2500, "1 m3"))).toEqual([]);
  });
});
