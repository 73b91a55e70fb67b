import { readFileSync } from "node:fs";
import { join } from "node:path";
import { patch, readPackage, readWorkbook } from "../../src/book";
import { readZip } from "../../src/book/container/zip";
import { compare } from "../../src/command/recalc/compare";
import { recalculateWorkbook } from "../../src/recalc/workbook";

/** A workbook saved by LibreOffice 7.4 with chart, picture, conditional format, validation, table, comment, names and protection; see the script beside it. */
const bytes = new Uint8Array(readFileSync(join(__dirname, "fixtures", "libreoffice-made.xlsx")));
const stored = (file: Uint8Array) =>
  new Map(readZip(file).entries.map((entry) => [entry.name, Buffer.from(entry.local).toString("base64")]));

test("the fixture holds what value-only programs lose", () => {
  const pkg = readPackage(bytes);
  const first = pkg.text("xl/worksheets/sheet1.xml");
  for (const mark of ["<cfRule", "<dataValidation ", "<drawing ", "<legacyDrawing ", "<tablePart "]) expect(first).toContain(mark);
  expect(pkg.text("xl/worksheets/sheet2.xml")).toContain("<sheetProtection");
  for (const part of ["xl/charts/chart1.xml", "xl/media/image1.png", "xl/comments1.xml", "xl/tables/table1.xml"])
    expect(pkg.find(part)).toBe(part);
});

test("it reads: sheets, names, table, both spellings of our functions", () => {
  const book = readWorkbook(readPackage(bytes));
  expect(book.sheets.map((sheet) => [sheet.name, sheet.cells.size])).toEqual([
    ["Vessel", 56],
    ["Other sheet", 7],
  ]);
  expect(book.names).toEqual([
    { name: "Gas", formula: "Vessel!$B$3" },
    { name: "Temperatures", formula: "Vessel!$D$4:$D$13" },
  ]);
  expect(book.tables).toEqual([
    {
      name: "Capacities",
      sheet: "Vessel",
      range: "D3:F13",
      columns: ["Temperature", "Capacity", "Rounded"],
      headerRow: true,
      totalsRow: false,
    },
  ]);
  expect(book.notes).toEqual([]);
  expect(book.sheets[0]!.cells.get("E4")).toEqual({
    row: 3,
    column: 4,
    formula: "_xldudf_STILL_CV_AT($B$3,D4)",
    value: { error: "#NAME?" },
  });
  expect(book.sheets[0]!.cells.get("B7")).toMatchObject({ formula: "_xldudf_STILL_HEAT(B3,B4,B5,B6)", array: "B7" });
  expect(book.sheets[1]!.cells.get("A2")).toMatchObject({ formula: "_xldudf_still_molarmass(Gas)" });
  expect(book.sheets[1]!.cells.get("A7")!.value).toBe("plain and bold");
});

describe("recalculated", () => {
  let result: Uint8Array;
  beforeAll(async () => {
    const pkg = readPackage(bytes);
    const book = readWorkbook(pkg);
    const { changes } = compare(book, await recalculateWorkbook(book), () => []);
    result = patch(pkg, changes);
  });

  test("every other part is there to the stored byte, in its old order", () => {
    const [before, after] = [stored(bytes), stored(result)];
    expect([...after.keys()]).toEqual([...before.keys()]);
    const changed = [...before.keys()].filter((name) => before.get(name) !== after.get(name));
    expect(changed).toEqual(["xl/worksheets/sheet1.xml", "xl/worksheets/sheet2.xml"]);
  });

  test("in the sheets only type and value of recalculated cells differ", () => {
    for (const part of ["xl/worksheets/sheet1.xml", "xl/worksheets/sheet2.xml"]) {
      const skeleton = (file: Uint8Array) =>
        readPackage(file)
          .text(part)
          .replace(
            /<c ([^>]*)><f([^>]*)>([^<]*)<\/f><v[^>]*>[^<]*<\/v><\/c>/g,
            (_, attributes: string, f: string, text: string) => `<c ${attributes.replace(/ t="\w+"/, "")}><f${f}>${text}</f></c>`,
          );
      expect(skeleton(result)).toBe(skeleton(bytes));
    }
  });

  test("the numbers are those of the functions, and built-in cells follow them", () => {
    const [vessel, other] = readWorkbook(readPackage(result)).sheets;
    const value = (address: string) => vessel!.cells.get(address)!.value;
    // NIST-JANAF, 4th ed., Cp of N2(g): 29.580 J/(mol K) at 500 K, 32.697 at 1000 K, less R = 8.314; the set differs from that table by 0.002.
    expect(value("E6")).toBeCloseTo(29.58 - 8.314, 2);
    expect(value("E11")).toBeCloseTo(32.697 - 8.314, 2);
    expect(value("F6")).toBe(21.27);
    expect(value("B8")).toBe((value("B7") as number) / 1000);
    expect(value("B11")).toBe("back at the start");
    expect(value("B14")).toBe(Math.max(...Array.from({ length: 10 }, (_, i) => value(`E${i + 4}`) as number)));
    expect(value("A14")).toBe("rows: 10");
    // Molar mass of N2 from the standard atomic weight of nitrogen, 14.007.
    expect(other!.cells.get("A2")!.value).toBe(28.014);
    expect(other!.cells.get("A4")!.value).toEqual({ error: "#VALUE!" });
  });
});
