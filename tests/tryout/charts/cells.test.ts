/** Charts on the live grid, with the engine under Node: they follow values, inserted rows, renamed and removed sheets, and stay in the saved file. */
import { patch, readPackage } from "../../../src/book";
import { noBook, FunctionNames } from "../../../src/book/formula";
import { nodeEngine } from "../../../src/recalc/node-engine";
import { gridCells } from "../../../src/tryout/charts/cells";
import { plotOf, type Plot } from "../../../src/tryout/charts/plot";
import { rangesOf } from "../../../src/tryout/charts/references";
import { openDocument, type OpenDocument } from "../../../src/tryout/document";
import { isArrayFormula } from "../../../src/tryout/grid/array-formula";
import { installChartRanges } from "../../../src/tryout/grid/chart-ranges";
import { contentsOf } from "../../../src/tryout/grid/contents";
import { installGate } from "../../../src/tryout/grid/gate";
import { fileNames } from "../../../src/tryout/grid/sheet-names";
import { changesOf } from "../../../src/tryout/saving/changes";
import { differs } from "../../../src/tryout/saving/differ";
import { bookBytes } from "../../../src/build/sample-writer.mjs";
import { CHART_SHEETS, chartBook, MEASURED, RATIOS } from "../../book/chart-book";

jest.spyOn(console, "debug").mockImplementation(() => undefined);
const engine = nodeEngine();
installGate(engine);
installChartRanges();

const open = (bytes = chartBook()) => openDocument("charts.xlsx", bytes, engine, true);
const drawn = (document: OpenDocument, sheet = 0): Plot => plotOf(document.charts[sheet]!.charts[0]!, gridCells(document.model));
const heights = (plot: Plot, series: number) => plot.series[series]!.dots.map((dot) => dot?.y ?? null);

function type(document: OpenDocument, address: string, content: string): void {
  const { model } = document;
  const place = { col: address.charCodeAt(0) - 65, row: Number(address.slice(1)) - 1 };
  expect(model.dispatch("UPDATE_CELL", { sheetId: "Test series", ...place, content }).isSuccessful).toBe(true);
}

describe("on the grid", () => {
  test("a chart draws the cells, formulas among them, with its names from the cells", () => {
    const plot = drawn(open());
    expect(plot.series.map(({ name }) => name).slice(0, 3)).toEqual(["Fuel A, measured", "Fuel A, calculated", "Fuel B, measured"]);
    expect(plot.series[0]!.dots.map((dot) => dot?.x)).toEqual(RATIOS);
    expect(heights(plot, 2)).toEqual(MEASURED["Fuel B"]);
    // 9.2 - 8 (1 - 1.08)^2, rounded to 3 places
    expect(heights(plot, 1)[2]).toBe(9.149);
    expect(plot.remarks).toEqual([]);
  });

  test("it follows a value, a formula that reads it, a text and an error", () => {
    const document = open();
    type(document, "A6", "1.08");
    type(document, "B4", "6.25");
    type(document, "B5", "lost");
    type(document, "B7", "=1/0");
    const plot = drawn(document);
    expect(heights(plot, 0)).toEqual([6.25, null, 8.1, null, 7.3]);
    expect(plot.series[1]!.dots[2]).toEqual({ x: 1.08, y: 9.2 });
    expect(plot.remarks).toEqual(["Fuel A, measured has gaps where its cells hold 1 error and 1 text."]);
    expect(heights(drawn(document, 1), 0)).toEqual([6.25, null, 8.1, null, 7.3]);
  });

  test("rows inserted move it, rows inside lengthen it, and undo brings it back", () => {
    const document = open();
    const insert = (base: number) =>
      document.model.dispatch("ADD_COLUMNS_ROWS", {
        sheetId: "Test series",
        sheetName: "Test series",
        dimension: "ROW",
        base,
        position: "before",
        quantity: 1,
      });
    insert(0);
    expect(heights(drawn(document), 2)).toEqual(MEASURED["Fuel B"]);
    insert(6);
    expect(heights(drawn(document), 0)).toEqual([5.9, 7.2, null, 8.1, 8, 7.3]);
    document.model.dispatch("REQUEST_UNDO");
    document.model.dispatch("REQUEST_UNDO");
    expect(heights(drawn(document), 0)).toEqual(MEASURED["Fuel A"]);
  });

  test("a renamed sheet is still its sheet; a removed one is missed in a sentence", () => {
    const document = open();
    document.model.dispatch("RENAME_SHEET", { sheetId: "Test series", oldName: "Test series", newName: "Runs" });
    expect(heights(drawn(document, 1), 0)).toEqual(MEASURED["Fuel A"]);
    document.model.dispatch("DELETE_SHEET", { sheetId: "Test series", sheetName: "Runs" });
    expect(drawn(document, 1)).toMatchObject({
      series: [{ name: "Fuel A", dots: [] }],
      remarks: ["Fuel A: the cells of its y values ('Test series'!$B$4:$B$8) cannot be found, so it is not drawn."],
    });
  });

  test("removed cells are missed too, and come back with undo", () => {
    const document = open();
    document.model.dispatch("REMOVE_COLUMNS_ROWS", { sheetId: "Test series", sheetName: "Test series", dimension: "COL", elements: [1] });
    expect(drawn(document).remarks[0]).toContain("cannot be found");
    expect(drawn(document).series[0]!.name).toBe("Series 1");
    document.model.dispatch("REQUEST_UNDO");
    expect(heights(drawn(document), 0)).toEqual(MEASURED["Fuel A"]);
  });

  test("a sheet with an apostrophe in its name and a whole column are found; one that does not exist is not", () => {
    const [first] = CHART_SHEETS;
    const series = [
      { name: "here", x: "A4:A8", y: "B4:B8", style: "line" as const, accent: 1 as const },
      { name: "nowhere", x: "A4:A8", y: "Elsewhere!B4:B8", style: "line" as const, accent: 2 as const },
    ];
    const document = open(bookBytes([{ ...first!, name: "It's a series", charts: [{ ...first!.charts![0]!, series }] }]));
    expect(heights(drawn(document), 0)).toEqual(MEASURED["Fuel A"]);
    expect(drawn(document).remarks).toEqual([
      "nowhere: the cells of its y values ('Elsewhere'!$B$4:$B$8) cannot be found, so it is not drawn.",
    ]);
  });
});

test("a saved workbook keeps drawings, charts and theme byte for byte, with the new values in its cells", () => {
  const document = open();
  type(document, "B4", "6.25");
  const naming = fileNames(document.workbook);
  const rules = { naming, functions: engine.functions, differs, isArray: (formula: string) => isArrayFormula(formula, engine.functions) };
  const saved = readPackage(
    patch(document.package, changesOf(contentsOf(document.model, naming), document.handed, document.workbook, rules).changes),
  );
  expect(saved.names).toEqual(document.package.names);
  const changed = saved.names.filter((name) => !Buffer.from(saved.bytes(name)).equals(Buffer.from(document.package.bytes(name))));
  expect(changed).toEqual(["xl/worksheets/sheet1.xml"]);
  expect(saved.names.filter((name) => /chart|drawing|theme/.test(name))).toHaveLength(7);
});

describe("references", () => {
  const names = [
    { name: "Ratio", formula: "Data!$A$2:$A$9" },
    { name: "Twice", formula: "Data!$A$2:$A$3,Ratio" },
    { name: "Round", formula: "Round" },
    { name: "Moving", formula: "OFFSET(Data!$A$1,1,0,5,1)" },
    { name: "Ratio", formula: "Other!$C$1:$C$4", sheet: "Other" },
  ];
  const book = {
    ...noBook(new FunctionNames([])),
    sheetNamed: (name: string) => ["Data", "Other", "It's, so"].find((known) => known.toUpperCase() === name.toUpperCase()),
    nameFor: (name: string, sheet: string) =>
      names.find((known) => known.name === name && known.sheet === sheet) ?? names.find((known) => known.name === name && !known.sheet),
  };

  test.each<[string, string[] | undefined]>([
    ["Data!$A$2:$A$9", ["Data!$A$2:$A$9"]],
    ["data!A2", ["Data!A2"]],
    ["(Data!$A$2:$A$3,'It''s, so'!$B$1)", ["Data!$A$2:$A$3", "'It''s, so'!$B$1"]],
    ["Data!$B:$B", ["Data!$B:$B"]],
    ["[0]!Ratio", ["Data!$A$2:$A$9"]],
    ["Other!Ratio", ["Other!$C$1:$C$4"]],
    ["Ratio", ["Data!$A$2:$A$9"]],
    ["Round", undefined],
    ["Moving", undefined],
    ["Nothing", undefined],
    ["[1]Data!$A$1", undefined],
    ["Data:Other!$A$1", undefined],
    ["Gone!$A$1", undefined],
    ["Data!#REF!", undefined],
    ["#REF!", undefined],
    ["", undefined],
    ["()", undefined],
  ])("%s", (formula, ranges) => {
    expect(rangesOf(formula, book, (sheet) => sheet)).toEqual(ranges);
  });
});
