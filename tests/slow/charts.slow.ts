/** A workbook with charts of the sample writer, opened and written anew by LibreOffice: it saw the same charts over the same cells. */
import { execFileSync } from "node:child_process";
import { mkdtempSync, readFileSync, rmSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { pathToFileURL } from "node:url";
import { readCharts, readPackage } from "../../src/book";
import type { BookChart } from "../../src/book/chart";
import { below, parseXml } from "../../src/build/xml.mjs";
import { chartBook, MEASURED } from "../book/chart-book";

jest.setTimeout(300_000);
const folder = mkdtempSync(join(tmpdir(), "office-charts-"));
afterAll(() => rmSync(folder, { recursive: true }));

function throughLibreOffice(bytes: Uint8Array): Uint8Array {
  const file = join(folder, "charts.xlsx");
  const out = join(folder, "out");
  writeFileSync(file, bytes);
  const profile = `-env:UserInstallation=${pathToFileURL(join(folder, "profile")).href}`;
  execFileSync("soffice", [profile, "--headless", "--convert-to", "xlsx", "--outdir", out, file], { timeout: 200_000, stdio: "pipe" });
  return new Uint8Array(readFileSync(join(out, "charts.xlsx")));
}

/** References without the quotes that only one of the two writes. */
const plain = ({ series }: BookChart) =>
  series.map(({ name, x, y, line, points }) => JSON.stringify({ f: name?.formula, x, y, line, points }).replaceAll("'", ""));

test("series, kinds, titles and ends are those that were written, with the values of the cells", () => {
  const written = readCharts(readPackage(chartBook()));
  const pkg = readPackage(throughLibreOffice(chartBook()));
  const read = readCharts(pkg);
  expect(read.map(({ sheet, charts, others }) => [sheet, charts.length, others])).toEqual([
    ["Test series", 1, []],
    ["Comparison", 1, []],
  ]);
  const [mine, theirs] = [written[0]!.charts[0]!, read[0]!.charts[0]!];
  expect(plain(theirs)).toEqual(plain(mine));
  expect([theirs.title, theirs.x, theirs.y.title]).toEqual([mine.title, mine.x, mine.y.title]);
  const chart = pkg.relations("xl/drawings/drawing1.xml").find(({ role }) => role === "chart")!.target;
  const heights = below(parseXml(pkg.text(chart)), "c:yVal").map((values) => below(values, "c:v").map(({ text }) => Number(text)));
  expect(heights[0]).toEqual(MEASURED["Fuel A"]);
  expect(heights[1]![2]).toBe(9.149); // a formula without a value in the file
});
