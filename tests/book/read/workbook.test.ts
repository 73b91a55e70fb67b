import { readPackage } from "../../../src/book/container/package";
import { readWorkbook } from "../../../src/book/read/workbook";
import type { BookCell, Workbook } from "../../../src/book/workbook";
import { MAIN, packageBytes, refusalOf, type PackageOptions } from "../packages";

const open = (options: PackageOptions): Workbook => readWorkbook(readPackage(packageBytes(options)));
const cells = (data: string, options: PackageOptions = {}): Record<string, BookCell> =>
  Object.fromEntries(open({ sheets: { S: data }, ...options }).sheets[0]!.cells);
const row = (inner: string, number = 1) => `<row r="${number}">${inner}</row>`;

test("every type of value", () => {
  const read = cells(
    row(
      '<c r="A1"><v>1.5E-3</v></c><c r="B1" t="n"><v> 2 </v></c><c r="C1" t="b"><v>1</v></c><c r="D1" t="b"><v>0</v></c><c r="E1" t="e"><v>#N/A</v></c>' +
        '<c r="F1" t="str"><f>A1&amp;""</f><v xml:space="preserve"> x </v></c><c r="G1" t="inlineStr"><is><t>a</t></is></c><c r="H1" s="3"/><c r="I1" t="str"><f>H1</f><v/></c>' +
        '<c r="J1"><f>Z9</f></c>',
    ),
  );
  expect(Object.fromEntries(Object.entries(read).map(([address, cell]) => [address, cell.value]))).toEqual({
    A1: 0.0015,
    B1: 2,
    C1: true,
    D1: false,
    E1: { error: "#N/A" },
    F1: " x ",
    G1: "a",
    I1: "",
    J1: null,
  });
  expect(read.F1!.formula).toBe('A1&""');
});

test("shared and inline texts: runs joined, phonetic guides left out, spelt characters and blanks kept", () => {
  const sst =
    `<sst xmlns="${MAIN}"><si><t>plain</t></si><si><r><rPr><b/></rPr><t>rich </t></r><r><t xml:space="preserve">text </t></r><rPh sb="0" eb="1"><t>guide</t></rPh></si>` +
    `<si><t>a_x000D_b_x005F_x0041_</t></si><si/><si><t><![CDATA[<&>]]></t></si></sst>`;
  const read = cells(
    row(
      [0, 1, 2, 3, 4].map((i) => `<c r="${"ABCDE"[i]}1" t="s"><v>${i}</v></c>`).join("") +
        '<c r="F1" t="inlineStr"><is><r><t>in</t></r><r><t>line</t></r><rPh sb="0" eb="1"><t>no</t></rPh></is></c>',
    ),
    { relations: [["sharedStrings", "sharedStrings.xml"]], parts: { "xl/sharedStrings.xml": sst } },
  );
  expect(["A1", "B1", "C1", "D1", "E1", "F1"].map((address) => read[address]!.value)).toEqual([
    "plain",
    "rich text ",
    "a\rb_x0041_",
    "",
    "<&>",
    "inline",
  ]);
});

test("prefixes, single quotes, comments and missing addresses", () => {
  const book = open({
    sheets: {
      S:
        `<x:worksheet xmlns:x='${MAIN}' xmlns:y="urn:other"><x:sheetData><!-- <x:c r="Z1"/> --><x:row><x:c><x:v>1</x:v></x:c><x:c><x:v>2</x:v></x:c><y:c r="C1"><y:v>9</y:v></y:c></x:row>` +
        `<x:row><x:c r='C2'><x:f>A1<![CDATA[<]]>B1</x:f><x:v>3</x:v></x:c><x:c><x:v>4</x:v></x:c></x:row></x:sheetData></x:worksheet>`,
    },
  });
  expect(Object.fromEntries(Array.from(book.sheets[0]!.cells, ([address, { value }]) => [address, value]))).toEqual({
    A1: 1,
    B1: 2,
    C2: 3,
    D2: 4,
  });
  expect(book.sheets[0]!.cells.get("C2")!.formula).toBe("A1<B1");
  expect(book.sheets[0]).toMatchObject({ rows: 2, columns: 4 });
});

test("shared formulas are written out for their own cell", () => {
  const book = open({
    sheets: {
      S:
        row(
          '<c r="B1"><f t="shared" ref="B1:C3" si="0">A1*$A1+A$1&amp;"A1"+LOG10(A1)+SUM(A:A,1:1)+Other!A1+gas</f><v>1</v></c><c r="C1"><f t="shared" si="0"/><v>1</v></c>',
        ) +
        row('<c r="B2"><f t="shared" si="0"/><v>1</v></c>', 2) +
        row('<c r="B3"><f t="shared" si="0">A3</f><v>1</v></c>', 3),
      Other: "",
    },
  });
  const formulas = Array.from(book.sheets[0]!.cells, ([address, { formula }]) => [address, formula]);
  expect(formulas).toEqual([
    ["B1", 'A1*$A1+A$1&"A1"+LOG10(A1)+SUM(A:A,1:1)+Other!A1+gas'],
    ["C1", 'B1*$A1+B$1&"A1"+LOG10(B1)+SUM(B:B,1:1)+Other!B1+gas'],
    ["B2", 'A2*$A2+A$1&"A1"+LOG10(A2)+SUM(A:A,2:2)+Other!A2+gas'],
    ["B3", "A3"],
  ]);
});

test("a shared formula that moves off the sheet comes in on the other side, and a group may be named before its text", () => {
  const read = cells(
    row('<c r="A1"><f t="shared" si="7"/><v>1</v></c>') +
      row('<c r="A2"><f t="shared" ref="A1:A2" si="7">A1+XFD1048576</f><v>1</v></c>', 2),
  );
  expect(read.A1!.formula).toBe("A1048576+XFD1048575");
});

test("array formulas, dynamic arrays and the cells they fill", () => {
  const metadata =
    `<metadata xmlns="${MAIN}" xmlns:xda="http://schemas.microsoft.com/office/spreadsheetml/2017/dynamicarray"><metadataTypes count="2"><metadataType name="XLRICHVALUE"/><metadataType name="XLDAPR"/></metadataTypes>` +
    `<futureMetadata name="XLDAPR" count="1"><bk><extLst><ext uri="{bdbb8cdc-fa1e-496e-a857-3c3f30c029c3}"><xda:dynamicArrayProperties fDynamic="1" fCollapsed="0"/></ext></extLst></bk></futureMetadata>` +
    `<cellMetadata count="2"><bk><rc t="1" v="0"/></bk><bk><rc t="2" v="0"/></bk></cellMetadata></metadata>`;
  const read = cells(
    row('<c r="A1" cm="2"><f t="array" ref="A1:B2">_xldudf_STILL_CV_LIMITS("N2")</f><v>1</v></c><c r="B1"><v>2</v></c>') +
      row(
        '<c r="A2" t="str"><v>x</v></c><c r="B2"><f>1+1</f><v>2</v></c><c r="C2" cm="1"><f t="array" ref="C2">SUM(A1:A2*2)</f><v>3</v></c>',
        2,
      ),
    { relations: [["sheetMetadata", "metadata.xml"]], parts: { "xl/metadata.xml": metadata } },
  );
  expect(read.A1).toMatchObject({ array: "A1:B2", dynamic: true });
  expect(read.C2).toEqual({ row: 1, column: 2, formula: "SUM(A1:A2*2)", array: "C2", value: 3 });
  expect(read.B1!.filledBy).toBe("A1");
  expect(read.A2!.filledBy).toBe("A1");
  expect(read.B2!.filledBy).toBeUndefined();
});

test("what is not read is said, and its value stays", () => {
  const book = open({
    sheets: {
      S:
        row(
          '<c r="A1"><f t="dataTable" ref="A1:A2" dt2D="0" r1="C1"/><v>5</v></c><c r="B1"><f t="shared" si="3"/><v>6</v></c><c r="D1" t="e" vm="1"><v>#VALUE!</v></c>',
        ) + row('<c r="A2"><v>7</v></c>', 2),
    },
    workbook: '<calcPr iterate="1" fullPrecision="0"/>',
    relations: [
      ["externalLink", "externalLinks/externalLink1.xml"],
      ["vbaProject", "vbaProject.bin"],
      ["pivotCacheDefinition", "pivotCache/x.xml"],
    ],
  });
  const read = book.sheets[0]!.cells;
  expect(read.get("A1")).toMatchObject({ value: 5, unread: expect.stringContaining("data table A1:A2") });
  expect(read.get("A2")).toMatchObject({ value: 7, unread: expect.stringContaining("data table A1:A2") });
  expect(read.get("B1")).toMatchObject({ value: 6, unread: expect.stringContaining("no text") });
  const notes = book.notes.join("\n");
  for (const word of [
    "iterative",
    "precision as displayed",
    "other workbooks",
    "macros",
    "pivot",
    "S: The data table",
    "pictures, data types",
  ])
    expect(notes).toContain(word);
});

test("chart sheets are noted; names are local to the right sheet; the calendar is read", () => {
  const book = open({
    sheets: { S: row('<c r="A1"><v>1</v></c>'), T: "" },
    workbook: `<definedNames><definedName name="gas">S!$A$1</definedName><definedName name="loc" localSheetId="1" hidden="1">=T!$A$1&amp;"x"</definedName></definedNames><workbookPr date1904="true"/>`,
    relations: [],
    parts: {
      "xl/_rels/workbook.xml.rels":
        '<Relationships xmlns="http://schemas.openxmlformats.org/package/2006/relationships"><Relationship Id="r1" Type="x/chartsheet" Target="chartsheets/sheet1.xml"/><Relationship Id="r2" Type="x/worksheet" Target="worksheets/sheet2.xml"/></Relationships>',
      "xl/chartsheets/sheet1.xml": "<chartsheet/>",
    },
  });
  expect(book.names).toEqual([
    { name: "gas", formula: "S!$A$1" },
    { name: "loc", formula: 'T!$A$1&"x"', sheet: "T" },
  ]);
  expect(book.date1904).toBe(true);
  expect(book.sheets.map((sheet) => sheet.name)).toEqual(["T"]);
  expect(book.notes).toEqual(["S is a chartsheet; it holds no cells and is kept as it is"]);
});

test("tables with their columns", () => {
  const book = open({
    sheets: { S: "" },
    parts: {
      "xl/worksheets/_rels/sheet1.xml.rels":
        '<Relationships xmlns="http://schemas.openxmlformats.org/package/2006/relationships"><Relationship Id="a" Type="x/table" Target="../tables/t.xml"/></Relationships>',
      "xl/tables/t.xml": `<table xmlns="${MAIN}" name="n" displayName="Runs" ref="A1:B9" totalsRowCount="1"><tableColumns count="2"><tableColumn id="1" name="T"/><tableColumn id="2" name="two_x000a_lines"/></tableColumns></table>`,
    },
  });
  expect(book.tables).toEqual([
    { name: "Runs", sheet: "S", range: "A1:B9", columns: ["T", "two\nlines"], headerRow: true, totalsRow: true },
  ]);
});

describe("the strict form", () => {
  test("is read like the other; dates become day numbers of the workbook's calendar", () => {
    const data = row(
      '<c r="A1" t="d"><v>1900-01-01</v></c><c r="B1" t="d"><v>1900-02-28</v></c><c r="C1" t="d"><v>1900-03-01</v></c><c r="D1" t="d"><v>2031-05-17T06:00:00</v></c><c r="E1" t="d"><v>18:00:00</v></c>',
    );
    const values = (options: PackageOptions) => Object.values(cells(data, options)).map((cell) => cell.value);
    // Day numbers as every spreadsheet program shows them: 1, 59, 61, 17 May 2031 = 47985.
    expect(values({ strict: true })).toEqual([1, 59, 61, 47985.25, 0.75]);
    // The 1904 calendar counts from 0 on 1 January 1904 and lies 1462 days behind.
    expect(values({ strict: true, workbook: '<workbookPr date1904="1"/>' })[3]).toBe(47985.25 - 1462);
  });
});

describe("a sheet that contradicts itself is refused", () => {
  test.each([
    ["a cell twice", row('<c r="A1"><v>1</v></c><c r="A1"><v>2</v></c>'), "holds the cell S!A1 twice"],
    ["a cell in another row", row('<c r="A2"><v>1</v></c>'), "the cell A2 in row 1"],
    ["an address that is none", row('<c r="1A"><v>1</v></c>'), 'the address "1A"'],
    ["text for a number", row('<c r="A1"><v>abc</v></c>'), 'S!A1 holds "abc" where a number belongs'],
    ["a shared text that is not there", row('<c r="A1" t="s"><v>4</v></c>'), "S!A1 names the shared text 4, of 0"],
    ["a row without number", '<row r="x"><c><v>1</v></c></row>', 'a row numbered "x"'],
  ])("%s", (_, data, sentence) => {
    expect(refusalOf(() => cells(data))).toContain(sentence);
  });
});
