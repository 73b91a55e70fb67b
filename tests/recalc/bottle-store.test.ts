/**
 * The sample of a store of gas bottles: the ideal gas against P1 T2/T1, Peng-Robinson against figures computed apart from this code, bottles
 * filled by mass, the limit, water that fills an autoclave, the warm-up against its closed formula, and charts that cover no cell.
 */
import { readFileSync } from "node:fs";
import { join } from "node:path";
import { readCharts, readPackage, readWorkbook } from "../../src/book";
import type { BookCell, BookValue } from "../../src/book/workbook";
import { HEAT_ROW, SEALED_ROW, SEALED_ROWS } from "../../src/build/sample-autoclave.mjs";
import { BOTTLE_ROWS } from "../../src/build/sample-bottle-store.mjs";
import { MASS_ROW, WARMING_ROW } from "../../src/build/sample-filled-by-mass.mjs";
import { REACH_ROW, REACH_ROWS, SWEEP_ROW } from "../../src/build/sample-one-bottle.mjs";
import { call, number } from "../functions/helpers";

const bytes = readPackage(readFileSync(join(__dirname, "..", "..", "assets", "samples", "bottle-store.xlsx")));
const book = readWorkbook(bytes);
const cellsOf = (sheet: string) => book.sheets.find(({ name }) => name === sheet)!.cells;
const at = (sheet: string, address: string): BookValue => cellsOf(sheet).get(address)?.value ?? null;
const value = (sheet: string, address: string) => Number(at(sheet, address));
/** Row of a sweep whose first column holds a temperature, °C. */
function rowOf(sheet: string, first: number, temperature: number): number {
  const row = Array.from({ length: 30 }, (_, i) => first + i).find((each) => at(sheet, `A${each}`) === temperature);
  if (row === undefined) throw new Error(`${sheet} has no row at ${temperature} °C`);
  return row;
}

const bottles = Array.from({ length: BOTTLE_ROWS.last - BOTTLE_ROWS.first + 1 }, (_, i) => BOTTLE_ROWS.first + i);

test.each(bottles)(
  "the bottle in row %i: ideal as P1 T2/T1, real as the functions give it, share and remark as its allowed pressure",
  (row) => {
    const cell = (column: string) => value("Bottle store", `${column}${row}`);
    const contents = at("Bottle store", `B${row}`);
    expect(cell("G") / ((cell("D") * 323.15) / 288.15)).toBeCloseTo(1, 12);
    expect(cell("H")).toBe(number("VESSEL.FINALPRESSURE", contents, 288.15, cell("D") * 1e5, 323.15, "bar", "peng-robinson"));
    expect(cell("I")).toBeCloseTo(cell("H") / cell("G") - 1, 14);
    expect(cell("J")).toBeCloseTo(cell("H") / cell("E"), 14);
    expect(at("Bottle store", `K${row}`)).toBe(cell("J") > 0.9 ? "above 0.9 of it" : "");
    // The mass of the gas holds the same pressure.
    const moles = (1000 * cell("F")) / number("MOLARMASS", contents);
    expect(number("VESSEL.PRESSURE", contents, moles, cell("C") / 1000, 288.15, "bar", "peng-robinson") / cell("D")).toBeCloseTo(1, 10);
    expect([cell("M") > 1, at("Bottle store", `N${row}`)]).toEqual([true, "far above allowed"]);
  },
);

// Recomputed from the equation with 126.19 K, 33.958 bar and 0.0372, printed to 1 bar; the library's constants differ in the fifth digit.
test("nitrogen of 200 bar at 15 °C: 234 bar at 50 °C, 282 at 100 °C, 467 at 300 °C", () => {
  const real = [50, 100, 300].map((temperature) => value("One bottle", `C${rowOf("One bottle", SWEEP_ROW, temperature)}`));
  expect(real.map(Math.round)).toEqual([234, 282, 467]);
  expect(value("Bottle store", `H${BOTTLE_ROWS.first}`)).toBeCloseTo(real[0]!, 10);
});

test("low pressures need no real gas, high ones do: below 0.5 % for the air receiver, above 4 % for nitrogen", () => {
  expect(value("Bottle store", `I${BOTTLE_ROWS.last}`)).toBeLessThan(0.005);
  expect(value("Bottle store", `I${BOTTLE_ROWS.first}`)).toBeGreaterThan(0.04);
});

test("carbon dioxide by mass: two phases on filling, full of liquid between, one dense gas on the hot day", () => {
  const [first, warm] = [MASS_ROW, (temperature: number) => rowOf("Filled by mass", WARMING_ROW, temperature)];
  expect(["F", "G"].map((column) => at("Filled by mass", `${column}${first}`))).toEqual(["liquid and vapour", "supercritical"]);
  // Vapour pressure at 15 °C: 50.87 bar (reference equation of carbon dioxide, from memory); Peng-Robinson tells it to 2 %.
  expect(Math.abs(value("Filled by mass", `H${first}`) / 50.87 - 1)).toBeLessThan(0.02);
  // The two bottles of carbon dioxide hold the same pressure while both hold liquid and vapour.
  expect(value("Filled by mass", `H${first + 1}`)).toBe(value("Filled by mass", `H${first}`));
  expect([15, 20, 30, 35].map((temperature) => at("Filled by mass", `C${warm(temperature)}`))).toEqual([
    "liquid and vapour",
    "full of liquid: refused",
    "full of liquid: refused",
    "supercritical",
  ]);
  expect(value("Filled by mass", `D${warm(50)}`)).toBe(value("Filled by mass", `I${first}`));
  expect(value("Filled by mass", `D${warm(50)}`)).toBeCloseTo(
    number("VESSEL.PRESSURE", "CO2", "7.5 kg", 0.01, 323.15, "bar", "peng-robinson"),
    9,
  );
});

test("the limit of the one bottle is crossed between 100 °C and 150 °C, where its table says", () => {
  const share = (temperature: number) => value("One bottle", `G${rowOf("One bottle", SWEEP_ROW, temperature)}`);
  const labels = Array.from({ length: REACH_ROWS }, (_, i) => at("One bottle", `A${REACH_ROW + i}`));
  const found = value("One bottle", `B${REACH_ROW + labels.indexOf("temperature at limit")}`) - 273.15;
  expect([share(100) < 1, share(150) > 1]).toEqual([true, true]);
  expect(found > 100 && found < 150).toBe(true);
  // From 290 bar at 100 °C to 260 bar at 200 °C in a straight line.
  expect(number("VESSEL.FINALPRESSURE", "N2", 288.15, 2e7, found + 273.15, "bar", "peng-robinson")).toBeCloseTo(
    290 - 0.3 * (found - 100),
    6,
  );
});

describe("the autoclave", () => {
  const cell = (column: string, temperature: number) => value("Autoclave", `${column}${rowOf("Autoclave", HEAT_ROW, temperature)}`);

  test("holds steam and squeezed air: far from full near the sum of both, near full far above", () => {
    for (const temperature of [20, 100, 200]) {
      const free = (1 - cell("D", temperature)) / (1 - cell("D", 20));
      const grown = 1 + 48e-6 * (temperature - 20);
      const air = (1.01325 * (temperature + 273.15)) / 293.15 / (free * grown);
      expect(Math.abs(cell("C", temperature) / (cell("F", temperature) + air) - 1)).toBeLessThan(1e-4);
    }
    expect(cell("C", 290) / cell("F", 290)).toBeGreaterThan(1.5);
  });

  test("fills with liquid near the temperature at which 7.5 kg of saturated liquid take up the whole volume", () => {
    const labels = Array.from({ length: SEALED_ROWS }, (_, i) => at("Autoclave", `A${SEALED_ROW + i}`));
    const full = value("Autoclave", `B${SEALED_ROW + labels.indexOf("liquid-full at")}`);
    const density = 7.5 / (0.01 * (1 + 48e-6 * (full - 293.15)));
    // Just denser than that the water is liquid alone, just thinner it boils: the pressure there is that of saturation.
    const saturated = number("WATER.SATURATION", full);
    expect(number("WATER.PRESSURE", density * 0.9999, full) / saturated).toBeCloseTo(1, 9);
    expect(number("WATER.PRESSURE", density * 1.001, full)).toBeGreaterThan(1.01 * saturated);
  });

  test("takes the time of its heat without loss, and more with it", () => {
    for (const temperature of [100, 200, 290]) {
      expect(cell("J", temperature)).toBeCloseTo(cell("G", temperature) / 3000 / 3600, 12);
      expect(cell("I", temperature)).toBeGreaterThan(cell("J", temperature));
    }
    const table = call("WATER.SEALED", 0.01, 7.5, 293.15, 473.15, "101325 Pa air", "60 kg austenitic stainless steel", "48e-6 1/K");
    expect(cell("G", 200)).toBe(Number(table.find(([label]) => label === "heat in all")![1]));
  });
});

test("tables fill the rows that are kept for them", () => {
  for (const [sheet, first, rows] of [["One bottle", REACH_ROW, REACH_ROWS] as const, ["Autoclave", SEALED_ROW, SEALED_ROWS] as const]) {
    expect(at(sheet, `A${first + rows - 1}`)).toMatch(/^warning/);
    expect(at(sheet, `A${first + rows}`)).toBeNull();
  }
});

test("charts cover no cell that holds anything, have titles, and axes with a quantity and a unit", () => {
  const sheets = readCharts(bytes);
  expect(sheets.map(({ sheet, charts, others }) => [sheet, charts.length, others])).toEqual([
    ["Filled by mass", 1, []],
    ["One bottle", 1, []],
    ["Autoclave", 2, []],
  ]);
  for (const { sheet, charts } of sheets)
    for (const { anchor, title, x, y } of charts) {
      expect([title?.text, x.title?.text, y.title?.text].every((each) => (each?.length ?? 0) > 5)).toBe(true);
      expect([sheet, anchor, contentIn(sheet, anchor!)]).toEqual([sheet, anchor, []]);
    }
});

/** Cells of a sheet inside a range that are not blank. */
function contentIn(sheet: string, range: string): string[] {
  const [from, to] = range.split(":").map(placeOf) as [Place, Place];
  const inside = ({ row, column }: BookCell) => row >= from.row && row <= to.row && column >= from.column && column <= to.column;
  return [...cellsOf(sheet)]
    .filter(([, cell]) => inside(cell) && (cell.value !== null || cell.formula !== undefined))
    .map(([address]) => address);
}

interface Place {
  readonly row: number;
  readonly column: number;
}

function placeOf(address: string): Place {
  const [, letter = "", row = ""] = /^([A-Z])(\d+)$/.exec(address)!;
  return { row: Number(row) - 1, column: letter.charCodeAt(0) - 65 };
}
