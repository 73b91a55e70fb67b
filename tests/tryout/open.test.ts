/** From a file to the grid and back, with the engine under Node: no drawing, but every formula. */
import { readFileSync } from "node:fs";
import { join } from "node:path";
import { patch, readPackage, readWorkbook, writeWorkbook, type NewCell } from "../../src/book";
import type { BookValue } from "../../src/book/workbook";
import { nodeEngine } from "../../src/recalc/node-engine";
import { newDocument, openDocument, type OpenDocument } from "../../src/tryout/document";
import { isArrayFormula } from "../../src/tryout/grid/array-formula";
import { contentsOf } from "../../src/tryout/grid/contents";
import { installGate } from "../../src/tryout/grid/gate";
import { fileNames } from "../../src/tryout/grid/sheet-names";
import { literal } from "../../src/tryout/grid/open";
import { gridHost } from "../../src/tryout/host";
import { changesOf } from "../../src/tryout/saving/changes";
import { differs } from "../../src/tryout/saving/differ";

jest.spyOn(console, "debug").mockImplementation(() => undefined);
const engine = nodeEngine();
installGate(engine);

const SAMPLE = join(__dirname, "..", "..", "assets", "samples", "sealed-vessel.xlsx");

function book(cells: readonly NewCell[], extra: readonly NewCell[] = []): OpenDocument {
  const sheets = [
    { name: "Data", cells },
    { name: "It's more", cells: extra },
  ];
  return openDocument("test.xlsx", writeWorkbook({ sheets }), engine, true);
}

const cell = (address: string, value: BookValue, formula?: string, array?: string): NewCell => ({ address, value, formula, array });
const valueOf = (document: OpenDocument, address: string, sheet = "Data") => contentsOf(document.model).get(sheet)?.get(address)?.value;

function type(document: OpenDocument, address: string, content: string): void {
  const { model } = document;
  const sheetId = model.getters.getActiveSheetId();
  model.dispatch("UPDATE_CELL", { sheetId, col: address.charCodeAt(0) - 65, row: Number(address.slice(1)) - 1, content });
}

function saved(document: OpenDocument): Uint8Array {
  const naming = fileNames(document.workbook);
  const rules = { naming, functions: engine.functions, differs, isArray: (formula: string) => isArrayFormula(formula, engine.functions) };
  return patch(document.package, changesOf(contentsOf(document.model, naming), document.handed, document.workbook, rules).changes);
}

describe("values as the grid keeps them", () => {
  test.each<[BookValue, string | undefined]>([
    ["Heat", "Heat"],
    ["true", "'true"],
    ["1/2", "'1/2"],
    ["=A1", "'=A1"],
    ["'quoted", "''quoted"],
    ["25 °C", "'25 °C"],
    ["", undefined],
    [null, undefined],
    [0.1, "0.1"],
    [true, "TRUE"],
    [{ error: "#N/A" }, "#N/A"],
  ])("%j is kept as %j", (value, content) => {
    expect(literal(value)).toBe(content);
  });

  test("texts, numbers, booleans and errors come back as they were", () => {
    const values: BookValue[] = [
      "Heat",
      "true",
      "1/2",
      "2026-12-01",
      "=A1",
      "25 °C",
      "May 5",
      "1e5",
      "-",
      "Infinity",
      0.1,
      1e-300,
      -1.5,
      12345678901234.5,
      true,
      false,
    ];
    const document = book(values.map((value, i) => cell(`A${i + 1}`, value)));
    values.forEach((value, i) => expect(valueOf(document, `A${i + 1}`)).toBe(value));
    expect(valueOf(book([cell("A1", { error: "#DIV/0!" })]), "A1")).toMatchObject({ error: "#DIV/0!" });
  });
});

test("the sample on the page has the values that the command wrote, bit for bit", () => {
  const document = openDocument("sample.xlsx", new Uint8Array(readFileSync(SAMPLE)), engine, false);
  const now = contentsOf(document.model);
  let formulas = 0;
  for (const sheet of document.workbook.sheets) {
    for (const [address, { formula, value }] of sheet.cells) {
      if (formula === undefined) continue;
      formulas += 1;
      const found = now.get(sheet.name)?.get(address)?.value;
      if (typeof value === "object" && value) expect(found).toMatchObject({ error: value.error });
      else expect(found).toBe(value);
    }
  }
  expect(formulas).toBeGreaterThan(40);
  expect(Buffer.from(saved(document)).equals(readFileSync(SAMPLE))).toBe(true);
});

test("a formula that cannot be calculated here keeps the value of the file, and says so", () => {
  const document = book([cell("A1", 7, "NOSUCH(1)"), cell("A2", 8, "A1+1")]);
  expect(document.notes).toContain("Data!A1 keeps the value of the file: The function NOSUCH is not known here.");
  expect(valueOf(document, "A1")).toBe(7);
  expect(readWorkbook(readPackage(saved(document))).sheets[0]?.cells.get("A1")).toMatchObject({ formula: "NOSUCH(1)", value: 7 });
});

test("a typed formula is read as Excel reads it, saved in the file's dialect, and live again", () => {
  const document = book([cell("A1", 500)], [cell("B2", 3)]);
  type(document, "C1", "=-2^2");
  type(document, "C2", '=STILL.CV.AT("N2",A1)');
  type(document, "C3", "='It''s more'!B2*2");
  type(document, "C4", '=_xldudf_still_molarmass("N2")');
  type(document, "C5", "=SUM(A1:A2*2)");
  expect([1, 3, 4, 5].map((row) => valueOf(document, `C${row}`))).toEqual([4, 6, 28.014, 1000]);
  const cells = readWorkbook(readPackage(saved(document))).sheets[0]?.cells;
  expect(["C1", "C2", "C3", "C4", "C5"].map((address) => cells?.get(address)?.formula)).toEqual([
    "(-2)^2",
    '_xldudf_STILL_CV_AT("N2",A1)',
    "'It''s more'!B2*2",
    '_xldudf_STILL_MOLARMASS("N2")',
    "SUM(A1:A2*2)",
  ]);
  expect(cells?.get("C3")?.array).toBeUndefined();
  expect(cells?.get("C5")).toMatchObject({ array: "C5", dynamic: true });
});

test("nothing but what the translator printed is compiled", () => {
  const document = newDocument(engine);
  for (const content of ["=?1+1", "=|N|", "=1+", '=CONCATENATE("a"+']) {
    type(document, "A1", content);
    expect(valueOf(document, "A1", "Sheet1")).toMatchObject({ error: "#BAD_EXPR" });
    expect(contentsOf(document.model).get("Sheet1")?.get("A1")).toMatchObject({ content, formula: false });
  }
});

test("a long chain of cells opens", () => {
  const chain = Array.from({ length: 20_000 }, (_, i) => (i === 0 ? cell("A1", 1) : cell(`A${i + 1}`, 0, `A${i}+1`)));
  expect(valueOf(book(chain), "A20000")).toBe(20_000);
});

test("the journal tells contents from looks and structure", () => {
  const document = newDocument(engine);
  const { model, journal } = document;
  const sheetId = model.getters.getActiveSheetId();
  const told: boolean[] = [];
  journal.onChange(() => told.push(journal.changed()));
  expect(journal.changed()).toBe(false);
  const sheetName = model.getters.getSheetName(sheetId);
  const last = model.getters.getNumberRows(sheetId) - 1;
  model.dispatch("ADD_COLUMNS_ROWS", { sheetId, sheetName, dimension: "ROW", base: last, position: "after", quantity: 10 });
  expect([journal.changed(), journal.structure()]).toEqual([false, false]);
  type(document, "A1", "1");
  expect([journal.changed(), journal.looks(), journal.structure()]).toEqual([true, false, false]);
  journal.saved();
  expect(journal.changed()).toBe(false);
  model.dispatch("SET_FORMATTING", { sheetId, target: [{ left: 0, right: 0, top: 0, bottom: 0 }], style: { bold: true } });
  expect([journal.changed(), journal.looks(), journal.structure()]).toEqual([true, true, false]);
  model.dispatch("ADD_COLUMNS_ROWS", { sheetId, sheetName, dimension: "ROW", base: 0, position: "before", quantity: 1 });
  expect(journal.structure()).toBe(true);
  expect(told.length).toBeGreaterThanOrEqual(3);
});

describe("the pane's host", () => {
  const theme = { current: () => "light" as const, toggle: () => undefined, onChange: () => undefined };

  test("inserts by the road of typed formulas and tells of the selection", async () => {
    const document = newDocument(engine);
    const host = gridHost(() => document.model, theme);
    const told: string[] = [];
    host.onSelectionChange(({ address }) => told.push(address));
    expect(await host.selection()).toEqual({ address: "A1", formula: null });
    await host.insertFormula('=STILL.MOLARMASS("N2")');
    expect(valueOf(document, "A1", "Sheet1")).toBe(28.014);
    document.model.selection.selectCell(1, 2);
    host.refresh();
    host.refresh();
    expect(told).toEqual(["B3"]);
  });

  test("refuses a cell that another formula fills", async () => {
    const document = newDocument(engine);
    type(document, "A1", "={1;2}");
    document.model.selection.selectCell(0, 1);
    const host = gridHost(() => document.model, theme);
    await expect(host.insertFormula("=1")).rejects.toThrow("The cell A2 is filled by the formula in A1: select an empty cell.");
  });
});
