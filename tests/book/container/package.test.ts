import { strToU8 } from "fflate";
import { readPackage, UNPACKED_LIMIT } from "../../../src/book/container/package";
import { readWorkbook } from "../../../src/book/read/workbook";
import { packageBytes, refusalOf, zipped } from "../packages";

const utf16 = (text: string) => Buffer.from(text, "utf16le");
const ole = (name: string) => new Uint8Array([0xd0, 0xcf, 0x11, 0xe0, 0xa1, 0xb1, 0x1a, 0xe1, ...new Uint8Array(504), ...utf16(name)]);
const open = (bytes: Uint8Array) => () => readWorkbook(readPackage(bytes));

describe("refused, each with its sentence", () => {
  test.each<[string, Uint8Array, string]>([
    ["nothing", new Uint8Array(0), "The file is empty"],
    ["text", strToU8("a,b\n1,2\n"), "not an Excel workbook: an .xlsx file is a zip package"],
    ["the old binary format", ole("Workbook"), "old binary format (.xls)"],
    ["an encrypted workbook", ole("EncryptedPackage"), "is encrypted: save it without a password"],
    ["a zip of something else", zipped({ "a.txt": "x" }), "no [Content_Types].xml"],
    ["an OpenDocument file", zipped({ mimetype: "application/vnd.oasis.opendocument.spreadsheet", "content.xml": "<a/>" }), "(.ods)"],
    ["the binary package", packageBytes({ mainType: "application/vnd.ms-excel.sheet.binary.macroEnabled.main" }), "(.xlsb)"],
    [
      "a text document",
      packageBytes({ mainType: "application/vnd.openxmlformats-officedocument.wordprocessingml.document.main+xml" }),
      "not an Excel workbook: its main part",
    ],
    ["a package without its workbook part", packageBytes({ parts: { "xl/workbook.xml": null } }), "no workbook part"],
    [
      "a package without a sheet part",
      packageBytes({ parts: { "xl/worksheets/sheet1.xml": null } }),
      "lists the sheet Sheet1, but its part is missing",
    ],
    ["a workbook without sheets", packageBytes({ sheets: {} }), "has no sheets"],
    ["broken XML", packageBytes({ parts: { "xl/worksheets/sheet1.xml": "<worksheet><sheetData></worksheet>" } }), "is not well-formed XML"],
    [
      "a document type with entities",
      packageBytes({ parts: { "xl/worksheets/sheet1.xml": '<!DOCTYPE x [<!ENTITY a "b">]><worksheet/>' } }),
      "document type declaration",
    ],
    [
      "another encoding",
      packageBytes({ parts: { "xl/worksheets/sheet1.xml": '<?xml version="1.0" encoding="ISO-8859-1"?><worksheet/>' } }),
      "is in ISO-8859-1; only UTF-8",
    ],
    ["UTF-16", packageBytes({ parts: { "xl/worksheets/sheet1.xml": new Uint8Array([0xff, 0xfe, 60, 0]) } }), "is in UTF-16"],
    [
      "bytes that are not UTF-8",
      packageBytes({ parts: { "xl/worksheets/sheet1.xml": new Uint8Array([60, 97, 62, 0xff, 60, 47, 97, 62]) } }),
      "is not valid UTF-8",
    ],
  ])("%s", (_, bytes, sentence) => {
    expect(refusalOf(open(bytes))).toContain(sentence);
  });

  test("a digitally signed package", () => {
    const rels =
      '<Relationships xmlns="http://schemas.openxmlformats.org/package/2006/relationships">' +
      '<Relationship Id="a" Type="http://schemas.openxmlformats.org/officeDocument/2006/relationships/officeDocument" Target="xl/workbook.xml"/>' +
      '<Relationship Id="b" Type="http://schemas.openxmlformats.org/package/2006/relationships/digital-signature/origin" Target="_xmlsignatures/origin.sigs"/></Relationships>';
    expect(refusalOf(open(packageBytes({ parts: { "_rels/.rels": rels } })))).toContain("digitally signed");
  });

  test("a package that would unpack to more than a gibibyte", () => {
    const bytes = packageBytes().slice();
    const view = new DataView(bytes.buffer);
    // The declared size in the first record of the directory stands 24 bytes behind its mark.
    let at = 0;
    while (view.getUint32(at, true) !== 0x02014b50) at++;
    view.setUint32(at + 24, UNPACKED_LIMIT, true);
    expect(refusalOf(open(bytes))).toMatch(/would unpack to \d+ bytes, more than the 1073741824 bytes allowed/);
  });
});

test("part names are found whatever their case, and relative and absolute targets lead to the same part", () => {
  const pkg = readPackage(
    packageBytes({ relations: [["sharedStrings", "/xl/SharedStrings.xml"]], parts: { "xl/sharedStrings.xml": "<sst/>" } }),
  );
  expect(pkg.find("/XL/sharedstrings.xml")).toBe("xl/sharedStrings.xml");
  expect(pkg.relations("xl/workbook.xml").map(({ role, target }) => [role, target])).toEqual([
    ["worksheet", "xl/worksheets/sheet1.xml"],
    ["sharedStrings", "xl/SharedStrings.xml"],
  ]);
});

test("macro-enabled workbooks and templates are workbooks", () => {
  for (const mainType of [
    "application/vnd.ms-excel.sheet.macroEnabled.main+xml",
    "application/vnd.ms-excel.template.macroEnabled.main+xml",
    "application/vnd.openxmlformats-officedocument.spreadsheetml.template.main+xml",
  ]) {
    expect(readWorkbook(readPackage(packageBytes({ mainType }))).sheets).toHaveLength(1);
  }
});
