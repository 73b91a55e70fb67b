import { unzipSync } from "fflate";
import { blankWorkbook, patch, readPackage, readWorkbook, writeWorkbook, type NewWorkbook } from "../../../src/book";
import { checkDefinedName, quotedSheet } from "../../../src/book/write/names";
import { refusalOf } from "../packages";

const book: NewWorkbook = {
  date1904: true,
  names: [
    { name: "pressure", formula: "'Two words'!$A$1" },
    { name: "Gas", formula: "Data!$B$1" },
    { name: "gas", formula: "Data!$B$2", sheet: "Data" },
  ],
  sheets: [
    {
      name: "Data",
      widths: { B: 20, A: 8.5 },
      frozenRows: 1,
      cells: [
        { address: "B1", value: "N2", style: { bold: true, fill: "DDE6EE" } },
        { address: "A2", value: 20.8, formula: "_xldudf_STILL_CV_AT(B1,300)", array: "A2", style: { format: '0.00" J"', align: "right" } },
        { address: "A3", value: 2, formula: "A2*0+2" },
        { address: "B3", value: 1, formula: "SEQUENCE(2)", array: "B3:B4" },
        { address: "B4", value: 2 },
        { address: "A4", value: true, style: { bold: true, fill: "DDE6EE" } },
        { address: "A5", value: { error: "#N/A" } },
        { address: "A6", value: null, style: { format: "0.0" } },
      ],
    },
    { name: "Two words", cells: [] },
  ],
};

test("a written workbook reads back as it was described", () => {
  const read = readWorkbook(readPackage(writeWorkbook(book)));
  expect(read.sheets.map((sheet) => sheet.name)).toEqual(["Data", "Two words"]);
  expect(Object.fromEntries(read.sheets[0]!.cells)).toEqual({
    B1: { row: 0, column: 1, value: "N2" },
    A2: { row: 1, column: 0, value: 20.8, formula: "_xldudf_STILL_CV_AT(B1,300)", array: "A2", dynamic: true },
    A3: { row: 2, column: 0, value: 2, formula: "A2*0+2" },
    B3: { row: 2, column: 1, value: 1, formula: "SEQUENCE(2)", array: "B3:B4", dynamic: true },
    B4: { row: 3, column: 1, value: 2, filledBy: "B3" },
    A4: { row: 3, column: 0, value: true },
    A5: { row: 4, column: 0, value: { error: "#N/A" } },
  });
  expect(read.names).toEqual([book.names![1], book.names![2], book.names![0]]);
  expect(read).toMatchObject({ date1904: true, notes: [], tables: [] });
});

test("the same description gives the same bytes, and equal styles are written once", () => {
  const bytes = writeWorkbook(book);
  expect(Buffer.compare(Buffer.from(bytes), Buffer.from(writeWorkbook(book)))).toBe(0);
  const styles = new TextDecoder().decode(unzipSync(bytes)["xl/styles.xml"]);
  expect(styles).toContain('<cellXfs count="4">');
  expect(styles).toContain('formatCode="0.00&quot; J&quot;"');
  const sheet = new TextDecoder().decode(unzipSync(bytes)["xl/worksheets/sheet1.xml"]);
  expect(sheet).toContain('<pane ySplit="1" topLeftCell="A2" activePane="bottomLeft" state="frozen"/>');
  expect(sheet).toContain('<col min="1" max="1" width="8.5" customWidth="1"/><col min="2" max="2" width="20" customWidth="1"/>');
  expect(sheet).toContain('<c r="A6" s="3"/>');
});

test("cells are added to a blank workbook", () => {
  const bytes = patch(blankWorkbook(["One", "Two"]), [{ sheet: "Two", address: "C3", value: 1, formula: "1" }]);
  const read = readWorkbook(readPackage(bytes));
  expect(read.sheets.map((sheet) => sheet.cells.size)).toEqual([0, 1]);
});

describe("names no spreadsheet program would open are refused", () => {
  test.each<[readonly string[], string]>([
    [[], "at least one sheet"],
    [[""], "has 0 characters; 1 to 31"],
    [["x".repeat(32)], "has 32 characters"],
    [["a/b"], "holds one of [ ] : * ? / \\"],
    [["'a"], "begins or ends with '"],
    [["Data", "data"], 'two sheets named "data"'],
  ])("sheets %j", (names, sentence) => {
    expect(refusalOf(() => blankWorkbook(names))).toContain(sentence);
  });

  test.each(["B12", "R1C1", "r", "two words", "1st", "a-b"])("name %s", (name) => {
    expect(refusalOf(() => checkDefinedName(name))).toContain(`"${name}" cannot be a name`);
  });

  test("a name local to a sheet that is not there", () => {
    expect(refusalOf(() => blankWorkbook(["A"], { names: [{ name: "x", formula: "1", sheet: "B" }] }))).toContain(
      'belongs to the sheet "B"',
    );
  });
});

test("sheet names in formulas are quoted where they must be", () => {
  expect(["Data", "Two words", "it's", "A1", "R1C1", "true", "2031", "Größe_1"].map(quotedSheet)).toEqual([
    "Data",
    "'Two words'",
    "'it''s'",
    "'A1'",
    "'R1C1'",
    "'true'",
    "'2031'",
    "Größe_1",
  ]);
});
