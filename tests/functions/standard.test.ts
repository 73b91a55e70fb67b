import { CellError } from "../../src/functions/cell";
import { standardCells } from "../../src/functions/standard";

type Row = [label: string, value: number | string, unit: string, note: string];

/** formula, specific energy, mass, volume, water, pressure, nitric, sulfuric, temperature, density, form */
type State = unknown[];

/** Certificate conditions of benzoic acid. */
const CERTIFICATE: State = ["C7H6O2", 26434, 1, "333.333333333333 mL", 1, "30 atm", null, null, null, 1.32];

const given = (state: State, changes: Readonly<Record<number, unknown>> = {}): State =>
  Array.from({ length: 11 }, (_, index) => (index in changes ? changes[index] : state[index]));

function tableOf(state: State): Row[] {
  const blocks = state.map((value) => (value === undefined ? undefined : [[value]])) as Parameters<typeof standardCells>;
  return standardCells(...blocks) as Row[];
}

const reduced = (changes: Readonly<Record<number, unknown>> = {}): Row[] => tableOf(given(CERTIFICATE, changes));

function row(rows: Row[], label: string): Row {
  const found = rows.find(([own]) => own === label);
  if (!found) throw new Error(`no line ${label} in ${JSON.stringify(rows)}`);
  return found;
}
const value = (rows: Row[], label: string): number => Number(row(rows, label)[1]);
const warnings = (rows: Row[]): string[] => rows.filter(([label]) => label === "warning").map(([, , , text]) => String(text));

const TERMS = [
  "to 25 °C",
  "compression of the compound",
  "compression of the water",
  "evaporation of water",
  "dissolution of oxygen",
  "oxygen to the pressure of the charge",
  "gas to no pressure",
  "release of carbon dioxide",
  "release of oxygen",
  "condensation of vapour",
  "decomposition of nitric acid",
  "sulfuric acid to 115 H2O",
  "decompression of the water",
];

describe("full form", () => {
  const rows = reduced();

  test("benzoic acid under certificate conditions: 26413.2 J/g, accepted 26413.6, and no warning", () => {
    expect(value(rows, "−ΔcU°")).toBeCloseTo(26413.15, 1);
    expect(Math.abs(value(rows, "−ΔcU°") - 26413.6)).toBeLessThan(0.6);
    expect(value(rows, "ΔcU°, molar")).toBeCloseTo(-3225.65, 2);
    // −0.0776 % between 26434 and 26413.6
    expect(value(rows, "correction")).toBeCloseTo(-0.0789, 4);
    expect(rows.slice(-1)).toEqual([["warnings", "none", "", ""]]);
  });

  test("each term is a line in J with its law, in the order of the scheme, and they add up to the sum exactly", () => {
    const places = TERMS.map((label) => rows.findIndex(([own]) => own === label));
    expect(places).toEqual(places.map((_, index) => places[0]! + index));
    for (const label of TERMS) expect([label, row(rows, label)[2], row(rows, label)[3].length > 8]).toEqual([label, "J", true]);
    const sum = TERMS.reduce((added, label) => added + value(rows, label), 0);
    expect(value(rows, "sum of the terms")).toBe(sum);
    expect(value(rows, "ΔcU°")).toBe(value(rows, "energy of the vessel process ΔU") + sum); // 1 g
    expect(value(rows, "energy of the vessel process ΔU")).toBe(-26434);
  });

  test("texts with units give the same table as plain numbers", () => {
    const plain = reduced({ 3: 340, 5: 3.04, 8: 26 });
    expect(reduced({ 1: "26.434 MJ/kg", 2: "1000 mg", 3: "0.34 L", 4: "1 g", 5: "3.04 MPa", 8: "26 °C", 9: "1320 kg/m3" })).toEqual(plain);
    expect(value(reduced({ 3: 340, 5: 3.04, 8: "299.15 K" }), "−ΔcU°")).toBeCloseTo(value(plain, "−ΔcU°"), 6);
  });

  test("nitric acid whose heat is still in the value is taken out; deducted before, it is left out, with the same result", () => {
    const inside = reduced({ 1: 26434 + 0.0005 * 59700, 6: "0.5 mmol" });
    expect(value(inside, "decomposition of nitric acid")).toBeCloseTo(29.85, 9);
    expect(Math.abs(value(inside, "−ΔcU°") - value(rows, "−ΔcU°"))).toBeLessThan(0.45); // 0.9 mmol of gas less
  });

  test("density left out is said in the note, and hardly matters", () => {
    const usual = reduced({ 9: null });
    expect(row(usual, "compression of the compound")[3]).toBe("−T α V Δp; α 0.0005 1/K taken for a solid, density 1.3 g/cm3 taken");
    expect(row(rows, "compression of the compound")[3]).toBe("−T α V Δp; α 0.0005 1/K taken for a solid, density 1.32 g/cm3");
    expect(Math.abs(value(usual, "−ΔcU°") - value(rows, "−ΔcU°"))).toBeLessThan(0.02);
    expect(row(reduced({ 0: "C8H18(l)", 1: 47713, 2: 0.5, 9: null }), "to 25 °C")[3]).toContain("2 J/(g K) taken for a liquid");
  });

  test("sulfuric acid: the value of thermochemistry and the one for SO2, 301.45 kJ for each mole of acid apart", () => {
    const sulfur = reduced({ 0: "C4H4S(l)", 1: 33500, 2: 0.3, 4: 10, 7: 0.003, 9: 1.06 });
    const apart = value(sulfur, "−ΔcU°") - value(sulfur, "−ΔcU°, sulfur to SO2(g)");
    expect(apart).toBeCloseTo((0.003 * 301450) / 0.3, 8);
    expect(row(sulfur, "ΔcU°")[3]).toContain("H2SO4·115 H2O");
    expect(warnings(sulfur)).toEqual([
      "Compounds of sulfur need a rotating vessel, which makes the acid uniform (common practice)",
      "0.000565656 mol of sulfur count as SO2(g), whose deviations from the ideal gas and solubility are not counted",
    ]);
    expect(rows.some(([label]) => label === "−ΔcU°, sulfur to SO2(g)")).toBe(false);
  });
});

describe("short forms", () => {
  test("three terms, 1 g of benzoic acid, 1 g of water, 0.34 L, 30 atm", () => {
    // +102.7 − 82.4 + 3.5 = +23.7 J, 26 410 J/g, recomputed from the formula independently of this program
    const rows = reduced({ 3: 340, 10: "three-term" });
    expect(value(rows, "gas to no pressure")).toBeCloseTo(102.7, 1);
    expect(value(rows, "oxygen to the pressure of the charge")).toBeCloseTo(-82.4, 1);
    expect(value(rows, "release of carbon dioxide")).toBeCloseTo(3.5, 1);
    expect(value(rows, "sum of the terms")).toBeCloseTo(23.7, 1);
    expect(value(rows, "−ΔcU°")).toBeCloseTo(26410.3, 1);
    expect(row(rows, "form")[3]).toBe(
      "approximate; not for publication; good to some 4 J/g (0.015 %) for compounds of C, H and O near 30 atm",
    );
    expect(warnings(rows)).toEqual(["The form three-term is approximate; not for publication"]);
  });

  test("per cent", () => {
    const rows = reduced({ 10: "percent" });
    expect(value(rows, "correction")).toBeCloseTo(-0.0807, 4);
    expect(value(rows, "−ΔcU°")).toBeCloseTo(26434 * (1 - 0.000806809), 2);
    expect(row(rows, "form")[3]).toMatch(/^approximate; not for publication; /);
    expect(warnings(rows)).toEqual(["The form percent is approximate; not for publication"]);
  });

  test("say what they do not cover", () => {
    expect(warnings(reduced({ 0: "C4H4SN2", 1: 26000, 8: 27, 10: "percent" })).slice(0, 3)).toEqual([
      "The form percent is approximate; not for publication",
      "The short forms are written for compounds of C, H and O; this one holds N and S",
      "The short forms hold at 25 °C; 27 °C is not corrected for",
    ]);
  });
});

test.each([
  [{ 2: 4 }, "The vessel holds 1.67459 times the oxygen that is needed; below 2 times, combustion may stay incomplete"],
  [{ 5: "45 atm" }, "Oxygen of 4.55962 MPa is outside 2 MPa to 4.1 MPa, where the figures of the reduction were proved"],
  [{ 5: "15 atm" }, "Oxygen of 1.51988 MPa is outside 2 MPa to 4.1 MPa, where the figures of the reduction were proved"],
  [{ 8: 31 }, "31 °C is more than 5 K from 25 °C; the correction rests on a usual heat capacity of the compound"],
  [
    { 1: 11000 },
    "The value is 5.59765 kJ for each gram of oxygen consumed; organic compounds give 13.1 kJ within 40 %: check formula, value and unit",
  ],
  [
    { 4: 0 },
    "0 g of water do not saturate the gas before the combustion; the water formed evaporates instead, which the terms count, but the vessel must have been as dry as that",
  ],
])("warning for %j", (changes, sentence) => {
  expect(warnings(reduced(changes))).toEqual([sentence]);
});

test.each([
  [{ 2: 7 }, "Combustion needs 0.429894 mol of oxygen, but the vessel holds 0.408531 mol: it would not be complete"],
  [
    { 0: "C6H5Cl" },
    "C6H5Cl holds Cl; complete combustion is written here for compounds of C, H, O, N and S only (halogens, metals and other elements are not covered)",
  ],
  [{ 0: "CH4(g)" }, "The compound is a gas; the reduction is written for solids and liquids"],
  [{ 0: null }, 'The formula is missing: give a text such as "C7H6O2"'],
  [{ 1: -26434 }, "Specific energy -26434 J/g is not above 0 J/g"],
  [{ 3: 0.34 }, 'Vessel volume 0.34 mL is below 5 mL: say "0.34 L"'],
  [{ 4: null }, 'Mass of water in the vessel is missing: give a number in g, or a text such as "1 g"'],
  [{ 5: 30 }, 'Oxygen pressure 30 MPa is above 6 MPa: say "30 atm" or "30 bar"'],
  [{ 6: 0.5 }, 'Nitric acid 0.5 mol is above 0.005 mol: say "0.5 mmol"'],
  [{ 7: -0.001 }, "Sulfuric acid -0.001 mol is negative"],
  [{ 8: 298.15 }, 'Temperature 298.15 °C is outside 0 °C to 60 °C; temperatures in kelvin are written "298.15 K"'],
  [{ 10: "washburn" }, '"washburn" is not a form of the reduction; the forms are full, three-term, percent'],
  [{ 6: 0.001, 10: "percent" }, "The form percent has no terms for acids; leave nitric_mol and sulfuric_mol out, or use the form full"],
])("refused: %j", (changes, sentence) => {
  const cell = reduced(changes)[0]![0] as unknown;
  expect(cell instanceof CellError ? cell.message : cell).toBe(sentence);
});

test("a column of runs is one row each under one heading; a refused run is its error", () => {
  const column = standardCells(
    [["C7H6O2"], ["C12H22O11"], ["C7H6O2"]],
    [[26434], [16502], [26434]],
    [[1], [1.5], [9]],
    [[340]],
    [[1]],
    [["30 atm"]],
  );
  expect(column).toHaveLength(4);
  const at = column[0]!.indexOf("−ΔcU° [J/g]");
  expect(column[1]![at]).toBe(value(tableOf(given(["C7H6O2", 26434, 1, 340, 1, "30 atm"])), "−ΔcU°"));
  // sucrose: 16487 J/g between standard states; the vessel value is 0.09 % more
  expect(Math.abs(Number(column[2]![at]) - 16487)).toBeLessThan(1);
  expect(column[3]![at]).toBeInstanceOf(CellError);
});

test("values of benzoic acid that are none of a vessel's process, and corrections that are too large, are told", () => {
  const warned = (...cells: unknown[]) =>
    standardCells(...(cells.map((cell) => [[cell]]) as Parameters<typeof standardCells>)).map((cells) =>
      cells[1] === "see note" ? cells[3] : cells[1],
    );
  expect(warned("C7H6O2", 26413.6, 1, 340, 1, "30 atm")).toContain(
    "26413.6 J/g looks like the energy between standard states: it would be reduced twice",
  );
  expect(warned("C7H6O2", 26454, 1, 340, 1, "30 atm")).toContain(
    "26454 J/g looks like the certified value for mass in air: give mass and value in vacuum",
  );
  expect(warned("C7H6O2", 26434, 1, 340, 1, "30 atm").at(-1)).toBe("none");
  expect(warned("C7H6O2", 26434, 1, 340, 1, "30 atm", 0.004)).toContain(
    "The correction is -0.97 % of the value, usual ones are below 0.5 %: check acids, water, pressure and mass",
  );
});
