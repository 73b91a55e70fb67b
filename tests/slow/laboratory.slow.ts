/** The corrected rise and the statistics of a series, calculated by LibreOffice with its own regression and distributions, beside ours. */
import { execFileSync } from "node:child_process";
import { mkdtempSync, readFileSync, rmSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { readPackage, readWorkbook, writeWorkbook } from "../../src/book";
import { call, number } from "../functions/helpers";

jest.setTimeout(300_000);
const folder = mkdtempSync(join(tmpdir(), "office-"));
afterAll(() => rmSync(folder, { recursive: true }));

const laboratory = readWorkbook(readPackage(readFileSync(join(__dirname, "..", "..", "assets", "samples", "fuel-laboratory.xlsx"))));

/** Numbers of a column of a sheet of the sample. */
function column(sheet: string, letter: string, from: number, to: number): number[] {
  const { cells } = laboratory.sheets.find(({ name }) => name === sheet)!;
  return Array.from({ length: to - from + 1 }, (_, i) => Number(cells.get(`${letter}${from + i}`)!.value));
}

/** Readings every half minute from 0 to 22 min, firing at 5 min (row 11), end of the main period at 15 min (row 31). */
const times = column("Coal A 1", "E", 5, 49);
const temperatures = column("Coal A 1", "F", 5, 49);
const equivalents = column("Calibration", "K", 6, 11);
const rises = column("Calibration", "J", 6, 11);

const FORMULAS = {
  driftBefore: "SLOPE(B1:B11,A1:A11)",
  driftAfter: "SLOPE(B31:B45,A31:A45)",
  meanMain: "SUMPRODUCT((B11:B30+B12:B31)/2,A12:A31-A11:A30)/(A31-A11)",
  constant: "(E1-E2)/(AVERAGE(B31:B45)-AVERAGE(B1:B11))",
  rise: "B31-B11-(A31-A11)*(E2+E4*(AVERAGE(B31:B45)-E3))",
  scatter: "STDEV(C1:C6)/AVERAGE(C1:C6)*100",
  grubbs: "MAX(MAX(C1:C6)-AVERAGE(C1:C6),AVERAGE(C1:C6)-MIN(C1:C6))/STDEV(C1:C6)",
  critical: "5/SQRT(6)*SQRT(TINV(0.05/6,4)^2/(4+TINV(0.05/6,4)^2))",
  slope: "SLOPE(C1:C6,D1:D6)",
  t: "E9/(STEYX(C1:C6,D1:D6)/SQRT(DEVSQ(D1:D6)))",
  p: "TDIST(ABS(E10),4,2)",
};

function calculatedThere(): Record<keyof typeof FORMULAS, number> {
  const file = join(folder, "laboratory.xlsx");
  const list = (letter: string, values: readonly number[]) => values.map((value, i) => ({ address: `${letter}${i + 1}`, value }));
  const formulas = Object.values(FORMULAS).map((formula, i) => ({ address: `E${i + 1}`, value: 0, formula }));
  const cells = [...list("A", times), ...list("B", temperatures), ...list("C", equivalents), ...list("D", rises), ...formulas];
  writeFileSync(file, writeWorkbook({ names: [], sheets: [{ name: "Run", cells }] }));
  const frozen = join(folder, "freeze.json"); // nothing to hold: it makes LibreOffice calculate all
  writeFileSync(frozen, "{}");
  const out = execFileSync("/usr/bin/python3", [join(__dirname, "libreoffice.py"), file, frozen], { encoding: "utf8", timeout: 200_000 });
  const seen = (JSON.parse(out) as { cells: Record<string, Record<string, number>> }).cells["Run"]!;
  return Object.fromEntries(Object.keys(FORMULAS).map((name, i) => [name, seen[`E${i + 1}`]])) as Record<keyof typeof FORMULAS, number>;
}

const lineOf = (table: readonly (readonly unknown[])[], label: string) => Number(table.find((row) => row[0] === label)?.[1]);

test("rise, drifts and cooling constant; scatter, Grubbs' test and trend", () => {
  const there = calculatedThere();
  const asColumn = (values: readonly number[]) => values.map((value) => [value]);
  const report = call("CAL.RISE.REPORT", asColumn(times), asColumn(temperatures), 5, 15);
  const series = call("CAL.SERIES", asColumn(equivalents), undefined, asColumn(rises));
  // Slopes of readings around 25 °C with drifts of 1e-4 K/min lose five digits in any program that does not centre them first.
  expect(number("CAL.RISE", asColumn(times), asColumn(temperatures), 5, 15)).toBeCloseTo(there.rise, 10);
  expect(lineOf(report, "drift before firing")).toBeCloseTo(there.driftBefore, 12);
  expect(lineOf(report, "drift after the main period")).toBeCloseTo(there.driftAfter, 12);
  expect(lineOf(report, "mean temperature of the main period")).toBeCloseTo(there.meanMain, 10);
  expect(lineOf(report, "cooling constant")).toBeCloseTo(there.constant, 12);
  expect(lineOf(series, "relative standard deviation")).toBeCloseTo(there.scatter, 10);
  expect(lineOf(series, "Grubbs' statistic")).toBeCloseTo(there.grubbs, 8);
  expect(lineOf(series, "critical value, 5 %")).toBeCloseTo(there.critical, 10);
  expect(lineOf(series, "slope with the rise")).toBeCloseTo(there.slope, 6);
  expect(lineOf(series, "t of the slope with the rise")).toBeCloseTo(there.t, 8);
  expect(lineOf(series, "p of the slope with the rise")).toBeCloseTo(there.p, 8);
});
