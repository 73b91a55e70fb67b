import fc from "fast-check";
import { patch, readPackage, readWorkbook } from "../../../src/book";
import { addressOf } from "../../../src/book/address";
import type { BookValue, CellChange } from "../../../src/book/workbook";
import { MAIN, packageBytes } from "../packages";

const value: fc.Arbitrary<BookValue> = fc.oneof(
  fc.double({ noNaN: true, noDefaultInfinity: true }),
  fc.string({ minLength: 1, unit: "binary" }),
  fc.boolean(),
  fc.constantFrom({ error: "#N/A" }, { error: "#DIV/0!" }),
  fc.constant(null),
);
const address = fc.tuple(fc.integer({ min: 0, max: 6 }), fc.integer({ min: 0, max: 30 })).map(([row, column]) => addressOf(row, column));
const formula = fc.constantFrom(undefined, undefined, null, "A1+1", 'IF(B2<3,"a & b","")');
const change = fc.record({ address, value, formula }).map(({ address: at, value: v, formula: f }): CellChange => ({
  sheet: "S",
  address: at,
  value: v,
  ...(f === undefined ? {} : { formula: f }),
}));

/** A sheet with odd but valid habits: gaps, missing addresses, self-closed cells, comments, a prefix. */
const sheet = fc
  .tuple(
    fc.constantFrom("", "x:"),
    fc.array(
      fc.tuple(
        fc.integer({ min: 1, max: 3 }),
        fc.array(fc.constantFrom("plain", "empty", "formula", "unaddressed", "comment", "text"), { maxLength: 6 }),
      ),
      { maxLength: 4 },
    ),
  )
  .map(([p, rows]) => {
    let number = 0;
    const xml = rows.map(([step, kinds]) => {
      number += step;
      let column = -1;
      const cells = kinds.map((kind) => {
        if (kind === "comment") return `<!-- <${p}c r="A${number}"/> -->`;
        column += kind === "unaddressed" ? 1 : 2;
        const r = addressOf(number - 1, column);
        if (kind === "unaddressed") return `<${p}c><${p}v>5</${p}v></${p}c>`;
        if (kind === "empty") return `<${p}c r="${r}" s="1"/>`;
        if (kind === "formula") return `<${p}c s='2' r='${r}'><${p}f>1&lt;2</${p}f><${p}v>1</${p}v></${p}c>`;
        if (kind === "text") return `<${p}c r="${r}" t="inlineStr"><${p}is><${p}t>t</${p}t></${p}is></${p}c>`;
        return `<${p}c r="${r}"><${p}v>7</${p}v></${p}c>`;
      });
      return `<${p}row r="${number}">${cells.join("\n")}</${p}row>`;
    });
    const ns = p === "" ? "xmlns" : "xmlns:x";
    return `<?xml version="1.0"?><${p}worksheet ${ns}="${MAIN}"><${p}sheetData>${xml.join("\n")}</${p}sheetData></${p}worksheet>`;
  });

type Content = Map<string, { value: BookValue; formula: string | undefined }>;

function contentOf(pkg: ReturnType<typeof readPackage>): Content {
  return new Map(Array.from(readWorkbook(pkg).sheets[0]!.cells, ([at, { value: v, formula: f }]) => [at, { value: v, formula: f }]));
}

function expected(before: Content, changes: readonly CellChange[]): Content {
  const after = new Map(before);
  for (const { address: at, value: v, formula: f } of changes) {
    const now = f === undefined ? after.get(at)?.formula : (f ?? undefined);
    after.set(at, { value: Object.is(v, -0) ? 0 : v, formula: now });
  }
  for (const [at, cell] of after) if (cell.value === null && cell.formula === undefined) after.delete(at);
  return after;
}

test("whatever the sheet and the changes, the workbook reads back as before but for the changes", () => {
  fc.assert(
    fc.property(sheet, fc.uniqueArray(change, { selector: (c) => c.address, maxLength: 12 }), (xml, changes) => {
      const pkg = readPackage(packageBytes({ sheets: { S: xml } }));
      const after = readPackage(patch(pkg, changes));
      expect(contentOf(after)).toEqual(expected(contentOf(pkg), changes));
    }),
    { numRuns: 300 },
  );
});

test("changes to what already stands there leave the sheet to the byte", () => {
  fc.assert(
    fc.property(sheet, (xml) => {
      const pkg = readPackage(packageBytes({ sheets: { S: xml } }));
      const same = Array.from(readWorkbook(pkg).sheets[0]!.cells)
        .filter(([, cell]) => typeof cell.value === "number")
        .map(([at, cell]) => ({ sheet: "S", address: at, value: cell.value }));
      expect(readPackage(patch(pkg, same)).text("xl/worksheets/sheet1.xml")).toBe(xml);
    }),
  );
});
