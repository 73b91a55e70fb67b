import { looksOnly, ROWS_WITH_LOOKS, scientificFormats } from "../../src/tryout/grid/appearance";
import { excelFormats } from "../../src/tryout/saving/rebuild";

describe("looks of a sheet", () => {
  test("keep cells, styles and rules, without contents, drawings and tables", () => {
    const sheet =
      '<worksheet><sheetData><row r="1" ht="20"><c r="A1" s="3" t="s"><v>7</v></c><c r="B1" s="4" cm="1"><f t="array" ref="B1">SUM(1,2)</f><v>3</v></c>' +
      '<c r="C1" t="inlineStr" s="2"><is><t>a &lt; b</t></is></c></row></sheetData><conditionalFormatting sqref="A1"/><drawing r:id="rId1"/>' +
      '<tableParts count="1"><tablePart r:id="rId2"/></tableParts></worksheet>';
    expect(looksOnly(sheet)).toBe(
      '<worksheet><sheetData><row r="1" ht="20"><c r="A1" s="3"></c><c r="B1" s="4"></c><c r="C1" s="2"></c></row></sheetData>' +
        '<conditionalFormatting sqref="A1"/></worksheet>',
    );
  });

  test("end at the last row that is drawn", () => {
    const rows = [1, ROWS_WITH_LOOKS, ROWS_WITH_LOOKS + 1, ROWS_WITH_LOOKS + 2].map(
      (row) => `<row r="${row}"><c r="A${row}" s="1"/></row>`,
    );
    const short = looksOnly(`<sheetData>${rows.join("")}</sheetData><mergeCells/>`);
    expect(short).toBe(`<sheetData>${rows.slice(0, 2).join("")}</sheetData><mergeCells/>`);
  });
});

describe("scientific formats", () => {
  test("become the engine's, the built-in ones too", () => {
    const styles =
      '<styleSheet><numFmts count="1"><numFmt numFmtId="170" formatCode="0.0000E+00"/></numFmts><cellXfs><xf numFmtId="11"/><xf numFmtId="48"/><xf numFmtId="1"/></cellXfs></styleSheet>';
    const read = scientificFormats(styles);
    expect(read).toContain('formatCode="0.0000e"');
    expect(read).toContain('<numFmt numFmtId="9011" formatCode="0.00e"/>');
    expect(read).toContain('<xf numFmtId="9011"/><xf numFmtId="9048"/><xf numFmtId="1"/>');
  });

  test("are found in a style part without number formats of its own", () => {
    expect(scientificFormats('<styleSheet xmlns="x"><cellXfs><xf numFmtId="11"/></cellXfs></styleSheet>')).toContain('<numFmts count="2">');
  });

  test("go back as Excel writes them, and other formats stay", () => {
    expect(excelFormats('<numFmt formatCode="0.00e"/>')).toBe('<numFmt formatCode="0.00E+00"/>');
    for (const code of ["0.00", "m/d/yyyy", "[$€]0.00", "hh:mm:ss a", "0.0%"])
      expect(excelFormats(`formatCode="${code}"`)).toBe(`formatCode="${code}"`);
  });
});
