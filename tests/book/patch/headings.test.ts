import { patch, readPackage, readWorkbook } from "../../../src/book";
import type { CellChange } from "../../../src/book/workbook";
import { MAIN, packageBytes, refusalOf } from "../packages";

const TABLE = `<table xmlns="${MAIN}" id="1" name="Runs" displayName="Runs" ref="B2:C4"><autoFilter ref="B2:C4"/><tableColumns count="2"><tableColumn id="1" name='T'/><tableColumn id="2" name="Rise" dataDxfId="3"><calculatedColumnFormula>1</calculatedColumnFormula></tableColumn></tableColumns></table>`;

function changed(changes: readonly Omit<CellChange, "sheet">[], formula = "SUM(Runs[T])") {
  const pkg = readPackage(
    packageBytes({
      sheets: {
        S: `<row r="2"><c r="B2" t="inlineStr"><is><t>T</t></is></c><c r="C2" t="inlineStr"><is><t>Rise</t></is></c></row><row r="3"><c r="B3"><v>1</v></c><c r="E3"><f>${formula}</f><v>1</v></c></row>`,
      },
      parts: {
        "xl/worksheets/_rels/sheet1.xml.rels":
          '<Relationships xmlns="http://schemas.openxmlformats.org/package/2006/relationships"><Relationship Id="a" Type="x/table" Target="../tables/t.xml"/></Relationships>',
        "xl/tables/t.xml": TABLE,
      },
    }),
  );
  return readPackage(
    patch(
      pkg,
      changes.map((change) => ({ sheet: "S", ...change })),
    ),
  );
}

test("a changed heading changes cell and table part, and nothing else of it", () => {
  const pkg = changed([{ address: "C2", value: 'Rise & "fall"\nin K' }]);
  expect(pkg.text("xl/tables/t.xml")).toBe(TABLE.replace('name="Rise"', 'name="Rise &amp; &quot;fall&quot;_x000a_in K"'));
  const book = readWorkbook(pkg);
  expect(book.tables[0]!.columns).toEqual(["T", 'Rise & "fall"\nin K']);
  expect(book.sheets[0]!.cells.get("C2")!.value).toBe('Rise & "fall"\nin K');
});

test("a number or formula as heading becomes a text; other cells of the table are free", () => {
  const pkg = changed([
    { address: "C2", value: 2031, formula: "2030+1" },
    { address: "B3", value: 5 },
  ]);
  expect(readWorkbook(pkg).sheets[0]!.cells.get("C2")).toEqual({ row: 1, column: 2, value: "2031" });
  expect(readWorkbook(pkg).tables[0]!.columns).toEqual(["T", "2031"]);
  expect(changed([{ address: "B3", value: 5 }]).text("xl/tables/t.xml")).toBe(TABLE);
});

test.each<[string, Omit<CellChange, "sheet">, string]>([
  ["empty", { address: "C2", value: null }, "The cell C2 is the heading of a table column and needs a text"],
  ["an error", { address: "C2", value: { error: "#N/A" } }, "The cell C2 is the heading of a table column and needs a text"],
  ["there already", { address: "C2", value: "t" }, 'The table Runs would have two columns "t", the second at C2'],
  [
    "used by a formula",
    { address: "B2", value: "Kelvin" },
    'The heading "T" of the table Runs cannot change: the formula SUM(Runs[T]) uses it',
  ],
])("a heading that is %s is refused", (_, change, sentence) => {
  expect(refusalOf(() => changed([change]))).toBe(sentence);
});
