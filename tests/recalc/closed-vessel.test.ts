/**
 * The sample of a closed-vessel test series: its calculated figures against printed and independently computed ones, its ratios against the
 * functions' own account of the mixture, its blanks, its flags, and charts that cover no cell.
 */
import { readFileSync } from "node:fs";
import { join } from "node:path";
import { readCharts, readPackage, readWorkbook } from "../../src/book";
import type { BookCell, BookValue, Workbook } from "../../src/book/workbook";
import { DUST_ROW } from "../../src/build/sample-dust.mjs";
import { CHECK_ROW, REACTION_ROW } from "../../src/build/sample-one-mixture.mjs";
import { HIGHER, WARMER } from "../../src/build/sample-start-conditions.mjs";
import { SERIES, TEST_ROWS } from "../../src/build/sample-test-series.mjs";
import { recalculateWorkbook } from "../../src/recalc/workbook";
import { call, number } from "../functions/helpers";

const bytes = readPackage(readFileSync(join(__dirname, "..", "..", "assets", "samples", "closed-vessel-tests.xlsx")));
const book = readWorkbook(bytes);
const at = (sheet: string, address: string): BookValue => book.sheets.find(({ name }) => name === sheet)?.cells.get(address)?.value ?? null;
const value = (sheet: string, address: string) => Number(at(sheet, address));
/** Rows of a series by its number, first to last. */
const rowsOf = (series: number) => {
  const { first, last } = TEST_ROWS[series]!;
  return Array.from({ length: last - first + 1 }, (_, i) => first + i);
};

// Recomputed from the formula with the ten species and nasa-2002, apart from this code; printed to 0.1 K and 0.001.
test.each([
  [0, "CH4", 2584.9, 8.795, 2818.2, 9.452],
  [1, "H2", 2746.3, 7.999, 3032.4, 8.666],
  [2, "C3H8", 2628.2, 9.326, 2902.8, 10.129],
])("fuel %i of the figures to check, %s, burns to %d K", (row, fuel, temperature, ratio, complete, completeRatio) => {
  const cell = (column: string) => value("One mixture", `${column}${CHECK_ROW + row}`);
  expect(at("One mixture", `A${CHECK_ROW + row}`)).toBe(fuel);
  for (const [column, printed] of Object.entries({ B: temperature, D: complete }))
    expect(Math.abs(cell(column) - printed)).toBeLessThanOrEqual(0.06);
  for (const [column, printed] of Object.entries({ C: ratio, E: completeRatio }))
    expect(Math.abs(cell(column) - printed)).toBeLessThanOrEqual(0.0006);
});

test("carbon monoxide without dissociation, and a complete reaction in a rigid vessel", () => {
  expect([at("One mixture", `A${CHECK_ROW + 3}`), value("One mixture", `D${CHECK_ROW + 3}`).toFixed(1)]).toEqual(["CO", "3178.8"]);
  expect(value("One mixture", `E${CHECK_ROW + 3}`)).toBeCloseTo(9.085, 3); // recomputed as above
  expect(at("One mixture", `A${REACTION_ROW + 1}`)).toBe("heat into the contents");
  expect(value("One mixture", `B${REACTION_ROW + 1}`)).toBeCloseTo(-717.79, 2); // recomputed: nasa-2002 and gri-1999 alike
  expect(value("One mixture", `B${REACTION_ROW + 10}`)).toBeCloseTo(1000 / 298.15, 12); // gas before = gas after: T2/T1
});

describe.each([0, 1, 2])("series %i of one closed vessel", (series) => {
  const readings = rowsOf(series).filter((_, i) => SERIES[series]!.tests[i]![1] !== null);

  test("is measured between half of the calculated pressure and all of it, and closest to it near ratio 1", () => {
    const shares = readings.map((row) => value("Test series", `G${row}`));
    for (const share of shares) expect(share > 0.5 && share < 1).toBe(true);
    const best = readings[shares.indexOf(Math.max(...shares))]!;
    expect(Math.abs(value("Test series", `C${best}`) - 1)).toBeLessThan(0.2);
  });

  test("has the ratio that the functions themselves count from the fuel in the mixture", () => {
    const air = at("Closed vessel", "B10");
    for (const row of rowsOf(series)) {
      const table = call("BURN", SERIES[series]!.fuel, air, value("Test series", `C${row}`), "25 °C", "1.013 bar");
      const line = table.find(([label]) => label === "fuel in the mixture")!;
      expect(Number(line[1])).toBeCloseTo(value("Test series", `B${row}`), 9);
    }
  });

  test("has no pressure without dissociation above ratio 1, and a higher one up to it", () => {
    for (const row of rowsOf(series)) {
      if (value("Test series", `C${row}`) > 1) expect(at("Test series", `K${row}`)).toBe("");
      else expect(value("Test series", `K${row}`)).toBeGreaterThan(value("Test series", `F${row}`));
    }
  });
});

test("flags: none near ratio 1, far below at the limits, no reading, and above the calculated only behind the pipe", () => {
  const flags = SERIES.map((_, series) => rowsOf(series).map((row) => at("Test series", `M${row}`)));
  expect(flags[0]).toEqual(["far below", "", "", "", "", "", "", "", "far below", "no reading"]);
  expect(flags[1]).toEqual(["far below", ...Array<string>(8).fill("")]);
  expect(flags[2]).toEqual(["far below", ...Array<string>(7).fill(""), "far below"]);
  expect(flags[3]).toEqual(["", "above calculated"]);
});

test("a gauge reading becomes absolute by the atmosphere of the set-up", () => {
  expect(value("Test series", `E${TEST_ROWS[0]!.first}`)).toBeCloseTo(2.9 + 1.013, 12);
});

/** The book with one cell of the test series left blank. */
function without(address: string): Workbook {
  const sheets = book.sheets.map((sheet) => {
    if (sheet.name !== "Test series") return sheet;
    const cells = new Map<string, BookCell>(sheet.cells);
    cells.delete(address);
    return { ...sheet, cells };
  });
  return { ...book, sheets };
}

test.each([
  ["D", "gauge", "EG", "CFHIJ"],
  ["B", "fuel", "CFGHIJ", "E"],
])("a blank in column %s (%s) makes #N/A of that test alone", async (column, _, missing, kept) => {
  const { first, last } = TEST_ROWS[1]!;
  const { outcomes } = await recalculateWorkbook(without(`${column}${first + 3}`));
  const filled = (letter: string) => outcomes.find(({ sheet, address }) => sheet === "Test series" && address === `${letter}${first}`)!;
  for (const letter of [...missing, ...kept]) {
    const before = Array.from({ length: last - first + 1 }, (_, i) => at("Test series", `${letter}${first + i}`));
    const gone = missing.includes(letter);
    const expected = before.map((held, i) => (i === 3 && gone ? "#N/A" : held));
    const cells = filled(letter).spill!.map(([cell]) => (typeof cell === "object" && cell !== null ? cell.error : cell));
    const close = cells.map((cell, i) =>
      typeof cell === "number" ? Math.abs(cell / Number(expected[i]) - 1) < 1e-9 : cell === expected[i],
    );
    expect([letter, cells, close]).toEqual([letter, cells, cells.map(() => true)]);
  }
  expect(filled("M").spill![3]).toEqual(["no reading"]);
});

test("warmer before: pressure falls a little less than as 1/T; higher before: its ratio grows slowly", () => {
  const ratios = (first: number) => Array.from({ length: 6 }, (_, i) => value("Start conditions", `E${first + i}`));
  const [warmer, higher] = [ratios(WARMER), ratios(HIGHER)];
  for (let i = 1; i < 6; i++) {
    expect(warmer[i]).toBeLessThan(warmer[i - 1]!);
    expect(higher[i]).toBeGreaterThan(higher[i - 1]!);
    expect(value("Start conditions", `G${WARMER + i}`)).toBeLessThan(0);
    expect(value("Start conditions", `G${WARMER + i}`)).toBeGreaterThan(-0.02);
    expect(value("Start conditions", `G${HIGHER + i}`)).toBeGreaterThan(-0.03);
  }
  expect(warmer[0]).toBe(higher[0]);
});

test("the dust has the ratio that the functions count from its share in the mixture", () => {
  const table = call("BURN", at("Dust", "B11"), "air", value("Dust", `B${DUST_ROW}`), "25 °C", "1.013 bar");
  const share = Number(table.find(([label]) => label === "fuel in the mixture")![1]) / 100;
  // mol of combustible for one mole of air, times its mass with ash, times the moles of air in a cubic metre
  const mass = number("MOLARMASS", "CH0.8O0.1N0.015S0.005") / 0.92;
  const air = 101300 / (8.31446261815324 * 298.15);
  expect((share / (1 - share)) * mass * air).toBeCloseTo(60, 9);
});

test("one gram of benzoic acid in 340 mL of oxygen at 30 atm: about 2240 K and 237 atm if nothing is lost", () => {
  // Recomputed for complete products, printed to 10 K and 1 atm.
  expect(Math.abs(value("Oxygen vessel", "B21") - 2240)).toBeLessThan(5);
  expect(Math.abs(value("Oxygen vessel", "B22") - 237)).toBeLessThan(1);
  // Dissociation takes some of it away.
  expect(value("Oxygen vessel", "B19")).toBeLessThan(value("Oxygen vessel", "B21"));
  expect(value("Oxygen vessel", "B20")).toBeLessThan(value("Oxygen vessel", "B22"));
});

test("charts cover no cell that holds anything, have titles, and axes with a quantity or a unit", () => {
  const sheets = readCharts(bytes);
  expect(sheets.map(({ sheet, charts, others }) => [sheet, charts.length, others])).toEqual([
    ["Test series", 2, []],
    ["Start conditions", 2, []],
    ["Dust", 1, []],
  ]);
  for (const { sheet, charts } of sheets)
    for (const { anchor, title, x, y } of charts) {
      expect([title, x.title, y.title].every((each) => (each?.text.length ?? 0) > 5)).toBe(true);
      expect([sheet, anchor, contentIn(sheet, anchor!)]).toEqual([sheet, anchor, []]);
    }
});

/** Cells of a sheet inside a range that are not blank. */
function contentIn(sheet: string, range: string): string[] {
  const [from, to] = range.split(":").map(placeOf) as [Place, Place];
  const cells = [...book.sheets.find(({ name }) => name === sheet)!.cells];
  const inside = ({ row, column }: BookCell) => row >= from.row && row <= to.row && column >= from.column && column <= to.column;
  return cells.filter(([, cell]) => inside(cell) && (cell.value !== null || cell.formula !== undefined)).map(([address]) => address);
}

interface Place {
  readonly row: number;
  readonly column: number;
}

function placeOf(address: string): Place {
  const [, letter = "", row = ""] = /^([A-Z])(\d+)$/.exec(address)!;
  return { row: Number(row) - 1, column: letter.charCodeAt(0) - 65 };
}
