/** The sample workbooks, calculated anew: every formula gives what the committed file holds, and the invented laboratory finds what it was made from. */
import { readFileSync } from "node:fs";
import { join } from "node:path";
import { readPackage, readWorkbook } from "../../src/book";
import type { BookValue, Workbook } from "../../src/book/workbook";
import { SAMPLES } from "../../src/build/samples.mjs";
import { recalculateWorkbook } from "../../src/recalc/workbook";

const ASSETS = join(__dirname, "..", "..", "assets", "samples");
const bookOf = (file: string) => readWorkbook(readPackage(readFileSync(join(ASSETS, file))));

/** Cells that are refused on purpose, to show a refusal. */
const REFUSED: Readonly<Record<string, readonly string[]>> = {
  "sealed-vessel.xlsx": ["Sealed vessel!B43", "Sealed vessel!C43", "Units and mixtures!D10"],
  "fuel-laboratory.xlsx": [],
  "closed-vessel-tests.xlsx": ["Test series!E19", "Test series!G19"], // a test without a reading: charts leave #N/A out
  // carbon dioxide that is full of liquid, and #N/A for the chart
  "bottle-store.xlsx": ["B21", "B22", "B23", "D21", "D22", "D23"].map((address) => `Filled by mass!${address}`),
};

test.each(SAMPLES.map(({ file }) => file))("%s: each value is that of the file, and only what is meant to be refused is", async (file) => {
  const book = bookOf(file);
  const { outcomes, unevaluated, stale } = await recalculateWorkbook(book);
  expect([unevaluated, stale]).toEqual([[], []]);
  const found: string[] = [];
  for (const { sheet, address, value, spill } of outcomes) {
    const rows = spill ?? [[value]];
    const { row: top, column: left } = cellOf(book, sheet, address);
    rows.forEach((cells, row) =>
      cells.forEach((cell, column) => {
        const held = valueAt(book, sheet, top + row, left + column);
        expect([sheet, address, row, column, plain(held)]).toEqual([sheet, address, row, column, plain(cell)]);
        if (isError(cell)) found.push(`${sheet}!${"ABCDEFGHIJKLMNOP"[left + column]}${top + row + 1}`);
      }),
    );
  }
  expect(found).toEqual(REFUSED[file]);
});

describe("the invented laboratory", () => {
  const book = bookOf("fuel-laboratory.xlsx");
  const at = (sheet: string, address: string) => book.sheets.find(({ name }) => name === sheet)?.cells.get(address)?.value;

  // What the readings were computed from: src/build/laboratory-runs.mjs and sample-laboratory.mjs.
  test("finds the energy equivalent its calorimeter was given, 10 185 J/K, within three standard uncertainties", () => {
    expect(Math.abs(Number(at("Calibration", "B13")) - 10185)).toBeLessThan(3 * Number(at("Calibration", "B14")));
    expect(at("Calibration", "N28")).toBe("accept: mean of 6 runs");
  });

  test.each([
    ["Coal A 1", 27180 + 12],
    ["Coal A 2", 27180 - 31],
    ["Wood B 1", 18890 + 66],
    ["Wood B 2", 18890 - 64],
    ["Wood B 3", 18890 - 10],
  ])("finds the gross value of %s that its readings were made from", (sheet, value) => {
    const scatter = Number(at("Calibration", "B14")) / Number(at("Calibration", "B13"));
    expect(Math.abs(Number(at(sheet, "B22")) / value - 1)).toBeLessThan(3 * scatter + 3e-4); // rise: 0.3 mK of 2 K and more
  });

  test("the wood needed its third run, the coal did not", () => {
    expect([at("Results", "I21"), at("Results", "I22")]).toEqual(["mean of 2", "mean of 3"]);
  });

  test("no run is warned of", () => {
    for (const { name, cells } of book.sheets)
      expect([name, [...cells.values()].filter(({ value }) => value === "warning").map(({ row }) => row)]).toEqual([
        name,
        name === "Laboratory" ? [36] : [],
      ]); // the charge: 80 % of the vessel's energy limit, which is what it is meant to show
  });
});

function cellOf(book: Workbook, sheet: string, address: string) {
  return book.sheets.find(({ name }) => name === sheet)!.cells.get(address)!;
}

function valueAt(book: Workbook, sheet: string, row: number, column: number): BookValue {
  return book.sheets.find(({ name }) => name === sheet)?.cells.get(`${"ABCDEFGHIJKLMNOP"[column]}${row + 1}`)?.value ?? null;
}

/** A file holds no sentence, and holds a number to 17 digits. */
function plain(value: BookValue): BookValue {
  return isError(value) ? { error: value.error } : value;
}

function isError(value: BookValue): value is { error: string } {
  return typeof value === "object" && value !== null;
}
