import { unzipSync } from "fflate";
import { patch, readPackage, readWorkbook } from "../../../src/book";
import type { CellChange } from "../../../src/book/workbook";
import { MAIN, packageBytes, refusalOf, type PackageOptions } from "../packages";

const SHEET = "xl/worksheets/sheet1.xml";
const HEAD = `<?xml version="1.0"?>\n<worksheet xmlns="${MAIN}"><sheetData>`;
const TAIL = "</sheetData></worksheet>";

function patched(data: string, changes: readonly Omit<CellChange, "sheet">[], options: PackageOptions = {}) {
  const pkg = readPackage(packageBytes({ sheets: { S: data }, ...options }));
  const bytes = patch(
    pkg,
    changes.map((change) => ({ sheet: "S", ...change })),
  );
  const result = readPackage(bytes);
  readWorkbook(result);
  return result;
}

/** Content of the sheet data after the changes. */
function dataAfter(data: string, ...changes: readonly Omit<CellChange, "sheet">[]): string {
  const text = patched(data, changes).text(SHEET);
  expect(text.startsWith(HEAD)).toBe(true);
  expect(text.endsWith(TAIL)).toBe(true);
  return text.slice(HEAD.length, -TAIL.length);
}

describe("a formula cell gets a new value and keeps everything else", () => {
  const row = (cell: string) => `<row r="1" spans="1:1" x="y">${cell}</row>`;
  test.each<[string, string, CellChange["value"], string]>([
    ["number for number", '<c r="A1" s="3"><f>B1</f><v>1</v></c>', 2.5, '<c r="A1" s="3"><f>B1</f><v>2.5</v></c>'],
    [
      "number for error",
      '<c r="A1" t="e" s="3"><f>B1</f><v>#N/A</v></c>',
      0.1 + 0.2,
      '<c r="A1" s="3"><f>B1</f><v>0.30000000000000004</v></c>',
    ],
    ["small numbers with a capital E", '<c r="A1"><f>B1</f></c>', 1.5e-7, '<c r="A1"><f>B1</f><v>1.5E-7</v></c>'],
    ["large numbers", '<c r="A1"><f>B1</f><v/></c>', 6.02214076e23, '<c r="A1"><f>B1</f><v>6.02214076E+23</v></c>'],
    ["minus zero", '<c r="A1"><f>B1</f><v>1</v></c>', -0, '<c r="A1"><f>B1</f><v>0</v></c>'],
    ["text for number", '<c s="1" r="A1"><f>B1</f><v>1</v></c>', "a<b & c", '<c s="1" r="A1" t="str"><f>B1</f><v>a&lt;b &amp; c</v></c>'],
    [
      "text with outer blanks",
      '<c r="A1" t="n"><f>B1</f><v>1</v></c>',
      " x",
      '<c r="A1" t="str"><f>B1</f><v xml:space="preserve"> x</v></c>',
    ],
    [
      "text with control characters",
      '<c r="A1"><f>B1</f></c>',
      "a\u0007_x0041_\r",
      '<c r="A1" t="str"><f>B1</f><v xml:space="preserve">a_x0007__x005F_x0041__x000D_</v></c>',
    ],
    [
      "error for shared text",
      "<c r='A1' t='s' ><f>B1</f><v>1</v></c>",
      { error: "#DIV/0!" },
      "<c r='A1' t=\"e\" ><f>B1</f><v>#DIV/0!</v></c>",
    ],
    [
      "a newer error falls back",
      '<c r="A1" t="e"><f>B1</f><v>#N/A</v></c>',
      { error: "#SPILL!" },
      '<c r="A1" t="e"><f>B1</f><v>#VALUE!</v></c>',
    ],
    ["truth value", '<c r="A1"><f>B1</f><v>1</v></c>', false, '<c r="A1" t="b"><f>B1</f><v>0</v></c>'],
    ["the mark of a number stays", '<c r="A1" t="n"><f>B1</f><v>1</v></c>', 2, '<c r="A1" t="n"><f>B1</f><v>2</v></c>'],
    [
      "value metadata goes, cell metadata stays",
      '<c r="A1" cm="1" t="e" vm="4"><f t="array" ref="A1">B1</f><v>#VALUE!</v></c>',
      2,
      '<c r="A1" cm="1"><f t="array" ref="A1">B1</f><v>2</v></c>',
    ],
    [
      "blanks, comments and extensions within the cell",
      '<c r="A1">\n <f ca="1">B1</f> <!-- <v>9</v> -->\n <v>1</v>\n <extLst><ext><v>5</v></ext></extLst></c>',
      2,
      '<c r="A1">\n <f ca="1">B1</f> <!-- <v>9</v> -->\n <v>2</v>\n <extLst><ext><v>5</v></ext></extLst></c>',
    ],
    [
      "CDATA and > in attributes",
      '<c r="A1" note="a>b"><f><![CDATA[IF(B1>1,"</c>","<v>")]]></f><v>1</v></c>',
      2,
      '<c r="A1" note="a>b"><f><![CDATA[IF(B1>1,"</c>","<v>")]]></f><v>2</v></c>',
    ],
    ["an inline text", '<c r="A1" t="inlineStr"><is><t>a</t></is></c>', 2, '<c r="A1"><v>2</v></c>'],
    ["nothing", '<c r="A1" t="str"><f>B1</f><v>x</v></c>', null, '<c r="A1"><f>B1</f></c>'],
  ])("%s", (_, cell, value, expected) => {
    expect(dataAfter(row(cell), { address: "A1", value })).toBe(row(expected));
  });
});

test("prefixes of the sheet are used for what is put in", () => {
  const xml = `<?xml version="1.0"?>\n<x:worksheet xmlns:x="${MAIN}"><x:sheetData><x:row r="2"><x:c r="B2"/></x:row></x:sheetData></x:worksheet>`;
  const text = patched(xml, [
    { address: "B2", value: 1 },
    { address: "C2", value: "t" },
    { address: "A3", value: true, formula: "1=1" },
  ]).text(SHEET);
  expect(text).toContain(
    '<x:row r="2"><x:c r="B2"><x:v>1</x:v></x:c><x:c r="C2" t="inlineStr"><x:is><x:t>t</x:t></x:is></x:c></x:row><x:row r="3"><x:c r="A3" t="b"><x:f>1=1</x:f><x:v>1</x:v></x:c></x:row></x:sheetData>',
  );
});

test("the root may be written with a prefix and its content without", () => {
  const xml = `<?xml version="1.0"?>\n<x:worksheet xmlns:x="${MAIN}" xmlns="${MAIN}"><sheetData><row r="1"><c r="A1"><v>1</v></c></row></sheetData></x:worksheet>`;
  expect(patched(xml, [{ address: "A1", value: 2 }]).text(SHEET)).toBe(xml.replace("<v>1", "<v>2"));
});

test("a byte order mark stays", () => {
  const xml = `\ufeff<?xml version="1.0" encoding="utf-8"?>\r\n<worksheet xmlns="${MAIN}"><sheetData><row r="1"><c r="A1"><v>1</v></c></row></sheetData></worksheet>`;
  expect(patched(xml, [{ address: "A1", value: 2 }]).text(SHEET)).toBe(xml.replace("<v>1", "<v>2"));
});

describe("cells and rows that are missing are put in at their place", () => {
  test("into a row, in front, between and behind", () => {
    const after = dataAfter(
      '<row r="2" spans="2:4"><c r="B2"/><c r="D2"><v>4</v></c></row>',
      { address: "E2", value: 5 },
      { address: "A2", value: 1 },
      { address: "C2", value: 3 },
    );
    expect(after).toBe(
      '<row r="2" spans="1:5"><c r="A2"><v>1</v></c><c r="B2"/><c r="C2"><v>3</v></c><c r="D2"><v>4</v></c><c r="E2"><v>5</v></c></row>',
    );
  });
  test("rows in front, between and behind, and into an empty row", () => {
    const after = dataAfter(
      '<row r="2"/><row r="5" ht="9"/>',
      { address: "A9", value: 9 },
      { address: "A1", value: 1 },
      { address: "B5", value: 5 },
      { address: "A3", value: 3 },
      { address: "A4", value: 4 },
    );
    expect(after).toBe(
      '<row r="1"><c r="A1"><v>1</v></c></row><row r="2"/><row r="3"><c r="A3"><v>3</v></c></row><row r="4"><c r="A4"><v>4</v></c></row><row r="5" ht="9"><c r="B5"><v>5</v></c></row><row r="9"><c r="A9"><v>9</v></c></row>',
    );
  });
  test("into an empty sheet; the dimension grows, and nothing is put in for nothing", () => {
    const xml = `<?xml version="1.0"?>\n<worksheet xmlns="${MAIN}"><dimension ref="A1"/><sheetData /><pageMargins/></worksheet>`;
    const text = patched(xml, [
      { address: "C4", value: 1 },
      { address: "Z9", value: null },
      { address: "B2", value: 1 },
    ]).text(SHEET);
    expect(text).toBe(
      `<?xml version="1.0"?>\n<worksheet xmlns="${MAIN}"><dimension ref="A1:C4"/><sheetData><row r="2"><c r="B2"><v>1</v></c></row><row r="4"><c r="C4"><v>1</v></c></row></sheetData><pageMargins/></worksheet>`,
    );
  });
  test("cells without addresses are counted", () => {
    expect(
      dataAfter(
        "<row><c><v>1</v></c><c><v>2</v></c></row><row><c><v>3</v></c></row>",
        { address: "B1", value: 9 },
        { address: "A2", value: 8 },
      ),
    ).toBe("<row><c><v>1</v></c><c><v>9</v></c></row><row><c><v>8</v></c></row>");
  });
});

describe("formulas", () => {
  const CHAIN: PackageOptions = {
    relations: [["calcChain", "calcChain.xml"]],
    parts: { "xl/calcChain.xml": `<calcChain xmlns="${MAIN}"><c r="A1" i="1"/></calcChain>` },
    overrides: { "xl/calcChain.xml": "application/vnd.openxmlformats-officedocument.spreadsheetml.calcChain+xml" },
  };
  const chainOf = (pkg: ReturnType<typeof patched>) => [
    pkg.find("xl/calcChain.xml"),
    /calcChain/.test(pkg.text("[Content_Types].xml")),
    /calcChain/.test(pkg.text("xl/_rels/workbook.xml.rels")),
  ];

  test("a value alone leaves the calculation chain; so does another formula in a formula's place", () => {
    const data = '<row r="1"><c r="A1"><f>B1</f><v>1</v></c></row>';
    expect(chainOf(patched(data, [{ address: "A1", value: 2 }], CHAIN))).toEqual(["xl/calcChain.xml", true, true]);
    const changed = patched(data, [{ address: "A1", value: 2, formula: 'B1&"<"' }], CHAIN);
    expect(chainOf(changed)).toEqual(["xl/calcChain.xml", true, true]);
    expect(changed.text(SHEET)).toContain('<c r="A1"><f>B1&amp;"&lt;"</f><v>2</v></c>');
  });

  test.each<[string, Omit<CellChange, "sheet">, string]>([
    ["goes", { address: "A1", value: "typed", formula: null }, '<c r="A1" t="inlineStr"><is><t>typed</t></is></c>'],
    ["comes", { address: "B1", value: 3, formula: "A1*3" }, '<c r="A1"><f>B1</f><v>1</v></c><c r="B1"><f>A1*3</f><v>3</v></c>'],
  ])("a formula that %s takes the chain with it, its relationship and its content type", (_, change, cells) => {
    const pkg = patched('<row r="1"><c r="A1"><f>B1</f><v>1</v></c></row>', [change], CHAIN);
    expect(chainOf(pkg)).toEqual([undefined, false, false]);
    expect(pkg.text(SHEET)).toContain(cells);
  });

  test("a shared formula whose first cell changes is written out for the others, values kept", () => {
    const data =
      '<row r="1"><c r="B1"><f t="shared" ref="B1:B3" si="0">A1*2</f><v>2</v></c></row><row r="2"><c r="B2" s="5"><f t="shared" si="0"/><v>4</v></c></row>' +
      '<row r="3"><c r="B3"><f t="shared" si="0"/><v>6</v></c><c r="C3"><f t="shared" si="1"/><v>6</v></c></row>';
    expect(dataAfter(data, { address: "B1", value: 7, formula: "A1*7" }, { address: "B3", value: 8 })).toBe(
      '<row r="1"><c r="B1"><f>A1*7</f><v>7</v></c></row><row r="2"><c r="B2" s="5"><f>A2*2</f><v>4</v></c></row>' +
        '<row r="3"><c r="B3"><f>A3*2</f><v>8</v></c><c r="C3"><f t="shared" si="1"/><v>6</v></c></row>',
    );
    expect(dataAfter(data, { address: "B2", value: 1, formula: null })).toContain('<f t="shared" ref="B1:B3" si="0">A1*2</f>');
  });
});

describe("array formulas", () => {
  const anchor = (ref: string, first: string) => `<c r="B2" cm="1"><f t="array" ref="${ref}">F(A1)</f><v>${first}</v></c>`;
  const grid = `<row r="2">${anchor("B2:C3", "1")}<c r="C2"><v>2</v></c></row><row r="3"><c r="B3" s="4"><v>3</v></c><c r="C3" t="str"><v>x</v></c><c r="D3"><v>9</v></c></row>`;

  test("a smaller result empties what it no longer fills, formats kept", () => {
    expect(dataAfter(grid, { address: "B2", value: 5, array: "B2:C2" }, { address: "C2", value: 6 })).toBe(
      `<row r="2">${anchor("B2:C2", "5")}<c r="C2"><v>6</v></c></row><row r="3"><c r="B3" s="4"/><c r="C3"/><c r="D3"><v>9</v></c></row>`,
    );
  });

  test("a larger result puts in cells and rows; texts in it are results, not typed texts", () => {
    const after = dataAfter(
      grid,
      { address: "B2", value: 5, array: "B2:C4" },
      { address: "C2", value: "t" },
      { address: "B4", value: "u" },
      { address: "C4", value: 7 },
    );
    expect(after).toBe(
      `<row r="2">${anchor("B2:C4", "5")}<c r="C2" t="str"><v>t</v></c></row><row r="3"><c r="B3" s="4"><v>3</v></c><c r="C3" t="str"><v>x</v></c><c r="D3"><v>9</v></c></row>` +
        `<row r="4"><c r="B4" t="str"><v>u</v></c><c r="C4"><v>7</v></c></row>`,
    );
  });

  test("an array formula that becomes a value or a plain formula leaves nothing behind", () => {
    for (const [formula, cell] of [
      [null, '<c r="B2"><v>1</v></c>'],
      ["1+0", '<c r="B2"><f>1+0</f><v>1</v></c>'],
    ] as const) {
      expect(dataAfter(grid, { address: "B2", value: 1, formula })).toBe(
        `<row r="2">${cell}<c r="C2"/></row><row r="3"><c r="B3" s="4"/><c r="C3"/><c r="D3"><v>9</v></c></row>`,
      );
    }
  });

  test("a new dynamic array brings the metadata part, once; a legacy one does not", () => {
    const changes = [
      { address: "A1", value: 1, formula: '_xldudf_STILL_CV_AT("N2",500)', array: "A1" },
      { address: "A2", value: 1, formula: "F(1)", array: "A2:B2" },
    ];
    const pkg = patched("", changes);
    expect(pkg.text(SHEET)).toContain('<c r="A1" cm="1"><f t="array" ref="A1">_xldudf_STILL_CV_AT("N2",500)</f><v>1</v></c>');
    expect(pkg.text("[Content_Types].xml").match(/sheetMetadata/g)).toHaveLength(1);
    expect(readWorkbook(pkg).sheets[0]!.cells.get("A2")).toMatchObject({ dynamic: true, array: "A2:B2" });
    const again = readPackage(patch(pkg, [{ sheet: "S", address: "A3", value: 1, formula: "F(2)", array: "A3" }]));
    expect(again.text("xl/metadata.xml")).toBe(pkg.text("xl/metadata.xml"));
    expect(patched("", [{ ...changes[0]!, dynamic: false }]).find("xl/metadata.xml")).toBeUndefined();
  });

  test("a metadata part that knows only rich values is extended", () => {
    const metadata =
      `<m:metadata xmlns:m="${MAIN}"><m:metadataTypes count="1"><m:metadataType name="XLRICHVALUE"/></m:metadataTypes><m:futureMetadata name="XLRICHVALUE" count="1"><m:bk/></m:futureMetadata>` +
      `<m:valueMetadata count="1"><m:bk><m:rc t="1" v="0"/></m:bk></m:valueMetadata></m:metadata>`;
    const pkg = patched("", [{ address: "A1", value: 1, formula: "F(1)", array: "A1" }], {
      relations: [["sheetMetadata", "metadata.xml"]],
      parts: { "xl/metadata.xml": metadata },
    });
    expect(readWorkbook(pkg).sheets[0]!.cells.get("A1")!.dynamic).toBe(true);
    expect(pkg.text("xl/metadata.xml")).toMatch(
      /metadataTypes count="2".*futureMetadata name="XLRICHVALUE".*futureMetadata name="XLDAPR".*<m:cellMetadata count="1"><m:bk><m:rc t="2" v="0"\/><\/m:bk><\/m:cellMetadata><m:valueMetadata count="1">/s,
    );
  });

  test.each<[string, Omit<CellChange, "sheet">, string]>([
    ["a range that starts elsewhere", { address: "B2", value: 1, array: "C2:C3" }, "does not start at B2"],
    ["a range for a plain cell", { address: "D3", value: 1, array: "D3:D4" }, "holds no array formula"],
    ["a range without formula", { address: "B2", value: 1, formula: null, array: "B2" }, "loses its formula"],
    ["an address that is none", { address: "B0", value: 1 }, '"B0" is not a cell address'],
    ["a number that is none", { address: "B2", value: NaN }, "cannot hold the number NaN"],
    ["an infinity", { address: "B2", value: -Infinity }, "cannot hold the number -Infinity"],
  ])("%s is refused", (_, change, sentence) => {
    expect(refusalOf(() => patched(grid, [change]))).toContain(sentence);
  });
});

test("an unknown sheet is refused", () => {
  expect(refusalOf(() => patch(readPackage(packageBytes()), [{ sheet: "Nowhere", address: "A1", value: 1 }]))).toBe(
    'The workbook has no sheet "Nowhere" with cells',
  );
});

test("the strict form keeps its own namespaces and relationship types", () => {
  const pkg = patched("", [{ address: "A1", value: 1, formula: "F(1)", array: "A1" }], { strict: true });
  expect(pkg.text("xl/metadata.xml")).toContain("http://purl.oclc.org/ooxml/spreadsheetml/main");
  expect(pkg.text("xl/_rels/workbook.xml.rels")).toContain("http://purl.oclc.org/ooxml/officeDocument/relationships/sheetMetadata");
  expect(readWorkbook(pkg).sheets[0]!.cells.get("A1")!.dynamic).toBe(true);
});

test("parts without a changed cell keep their stored bytes", () => {
  const options: PackageOptions = {
    sheets: { S: '<row r="1"><c r="A1"><f>1</f><v>1</v></c></row>', T: '<row r="1"><c r="A1"><v>1</v></c></row>' },
    parts: { "xl/media/x.bin": new Uint8Array(999).fill(7) },
  };
  const before = packageBytes(options);
  const after = patch(readPackage(before), [{ sheet: "S", address: "A1", value: 2 }]);
  const [old, fresh] = [unzipSync(before), unzipSync(after)];
  expect(Object.keys(fresh)).toEqual(Object.keys(old));
  for (const name of Object.keys(old))
    expect([name, Buffer.compare(Buffer.from(old[name]!), Buffer.from(fresh[name]!)) === 0]).toEqual([name, name !== SHEET]);
});
