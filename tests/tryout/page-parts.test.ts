/** The page's small parts that need no browser. */
import { existsSync, readFileSync } from "node:fs";
import { join } from "node:path";
import libraries from "../../src/tryout/libraries.json";
import { lossesOf } from "../../src/tryout/saving/losses";
import { wording } from "../../src/tryout/statusline";

const ROOT = join(__dirname, "..", "..");

describe("the list of libraries", () => {
  test.each(libraries)("$name is the installed version, and its files exist", ({ package: name, version, licence, files }) => {
    const installed = JSON.parse(readFileSync(join(ROOT, "node_modules", name, "package.json"), "utf8"));
    expect(installed.version).toBe(version);
    expect(licence.replace("OFL-1.1 (font), MIT (style sheet)", "(OFL-1.1 AND MIT)")).toBe(installed.license);
    for (const { from } of files) expect(existsSync(join(ROOT, "node_modules", from))).toBe(true);
    expect(files.some(({ to }) => /LICENSE|README/.test(to))).toBe(true);
  });

  test("holds every file that the page loads from lib", () => {
    const page = readFileSync(join(ROOT, "src", "tryout", "index.html"), "utf8");
    const loaded = [...page.matchAll(/"(lib\/[^"]+)"/g)].map((match) => match[1]);
    const listed = libraries.flatMap(({ files }) => files.map(({ to }) => to));
    expect(loaded.length).toBeGreaterThan(4);
    for (const file of loaded) expect(listed).toContain(file);
  });
});

test("the status line gives a refusal with its origin, and numbers with every digit", () => {
  expect(wording({ address: "A1", value: 20.80984033083204, message: "" })).toEqual(["20.80984033083204", false]);
  expect(wording({ address: "A1", value: "#VALUE!", message: "Temperature 0 K is not above 0 K" })).toEqual([
    "#VALUE! Temperature 0 K is not above 0 K",
    true,
  ]);
  expect(wording({ address: "A1", value: "#N/A", message: "m", origin: "Data!B2" })).toEqual(["#N/A m (from Data!B2)", true]);
  expect(wording({ address: "A1", value: true, message: "" })).toEqual(["TRUE", false]);
  expect(wording({ address: "A1", value: null, message: "" })).toEqual(["empty", false]);
});

test("what a rebuilt file would lack is named once each", () => {
  const parts = [
    "xl/workbook.xml",
    "xl/charts/chart1.xml",
    "xl/charts/chart2.xml",
    "xl/media/image1.png",
    "xl/comments1.xml",
    "xl/worksheets/sheet1.xml",
  ];
  expect(lossesOf(parts)).toEqual(["charts", "pictures", "comments"]);
  expect(lossesOf(["xl/workbook.xml", "xl/styles.xml"])).toEqual([]);
});
