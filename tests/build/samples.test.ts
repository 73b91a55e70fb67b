/** The committed samples are what the generator writes, with calculated values. */
import { readFileSync } from "node:fs";
import { join } from "node:path";
import { readCharts, readPackage, readWorkbook, type Package } from "../../src/book";
import { SAMPLES } from "../../src/build/samples.mjs";
import { bookBytes } from "../../src/build/sample-writer.mjs";

test.each(SAMPLES)("$file holds the generator's cells and charts, and every formula has a value", ({ file, sheets }) => {
  const [made, stored] = [bookBytes(sheets()), readFileSync(join(__dirname, "..", "..", "assets", "samples", file))].map((bytes) =>
    readPackage(bytes),
  ) as [Package, Package];
  const [written, committed] = [readWorkbook(made), readWorkbook(stored)];
  expect(readCharts(stored)).toEqual(readCharts(made));
  expect(committed.sheets.map((sheet) => sheet.name)).toEqual(written.sheets.map((sheet) => sheet.name));
  expect(committed.notes).toEqual([]);
  written.sheets.forEach((sheet, i) => {
    const found = committed.sheets[i];
    for (const [address, { formula, value }] of sheet.cells) {
      const cell = found?.cells.get(address);
      expect([address, cell?.formula]).toEqual([address, formula]);
      if (formula === undefined && value !== null) expect(cell?.value).toBe(value);
      if (formula !== undefined) expect([address, cell?.value ?? null]).not.toEqual([address, null]);
    }
  });
});

test.each(SAMPLES)("$file says that it is invented, and names who governs", ({ sheets }) => {
  const texts = sheets().flatMap((sheet) => sheet.cells.flatMap(({ text }) => text ?? []));
  expect(texts.some((text) => /^An invented .*licensed practice govern/.test(text))).toBe(true);
});
