/** The recalculated workbook as LibreOffice sees it, and its own calculation beside ours. Needs soffice and the system's python3 with uno. */
import { execFileSync } from "node:child_process";
import { mkdtempSync, readFileSync, rmSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { readPackage, readWorkbook, writeWorkbook } from "../../src/book";
import type { BookValue, Workbook } from "../../src/book/workbook";
import { processHost, recalc } from "../../src/command/recalc";

type Seen = number | string | { error: string };
interface Opened {
  readonly cells: Record<string, Record<string, Seen>>;
  readonly kept: Record<string, unknown>;
}

const folder = mkdtempSync(join(tmpdir(), "office-"));
afterAll(() => rmSync(folder, { recursive: true }));
jest.setTimeout(300_000);

const path = (name: string) => join(folder, name);

function openInOffice(file: string, ...more: readonly string[]): Opened {
  const out = execFileSync("/usr/bin/python3", [join(__dirname, "libreoffice.py"), file, ...more], {
    encoding: "utf8",
    maxBuffer: 1e8,
    timeout: 200_000,
  });
  return JSON.parse(out) as Opened;
}

const bookOf = (file: string): Workbook => readWorkbook(readPackage(new Uint8Array(readFileSync(file))));
const recalculated = async (input: string, output: string) => recalc([input, "-o", output], { ...processHost, print: () => undefined });

/** LibreOffice shows 0.1+0.2-0.3 as 0: sums of a few cells may differ by some last bits of the largest of them. */
const close = (ours: number, theirs: number) => Math.abs(ours - theirs) <= 1e-13 * Math.max(1, Math.abs(ours), Math.abs(theirs));

function differences(book: Workbook, seen: Opened, skip: (formula: string | undefined) => boolean): string[] {
  const found: string[] = [];
  for (const sheet of book.sheets) {
    for (const [address, { value, formula }] of sheet.cells) {
      const theirs = seen.cells[sheet.name]?.[address];
      if (skip(formula) || agree(value, theirs)) continue;
      found.push(`${sheet.name}!${address}: ${JSON.stringify(value)} here, ${JSON.stringify(theirs)} there`);
    }
  }
  return found;
}

function agree(ours: BookValue, theirs: Seen | undefined): boolean {
  if (typeof ours === "number") return typeof theirs === "number" && close(ours, theirs);
  if (typeof ours === "boolean") return theirs === Number(ours);
  if (ours === null) return theirs === undefined || theirs === "";
  return typeof ours === "string" ? theirs === ours : typeof theirs === "object";
}

/** Our cells as constants, for LibreOffice to calculate the rest from. */
function frozenCells(book: Workbook): string {
  const frozen: Record<string, Record<string, BookValue>> = {};
  for (const sheet of book.sheets) {
    for (const [address, { formula, value }] of sheet.cells) {
      if (formula && /still/i.test(formula) && (typeof value === "number" || typeof value === "string"))
        (frozen[sheet.name] ??= {})[address] = value;
    }
  }
  const file = path("freeze.json");
  writeFileSync(file, JSON.stringify(frozen));
  return file;
}

describe("the workbook made by LibreOffice", () => {
  const fixture = join(__dirname, "..", "book", "fixtures", "libreoffice-made.xlsx");
  const output = path("out.xlsx");
  let before: Opened;
  let after: Opened;
  beforeAll(async () => {
    // One cell of the fixture refuses on purpose: status 1.
    expect(await recalculated(fixture, output)).toBe(1);
    before = openInOffice(fixture);
    after = openInOffice(output);
  });

  test("opens and shows the new numbers", () => {
    const book = bookOf(output);
    expect(before.cells["Vessel"]!["E4"]).toEqual({ error: "#NAME?" });
    // LibreOffice calculates array formulas on opening, and does not know the functions in them: B7, B9, B10 and their readers.
    expect(differences(book, after, (formula) => /_STILL_(HEAT|CV_MEAN)|^(B7|IF\(ABS)/.test(formula ?? ""))).toEqual([]);
    expect(after.cells["Vessel"]!["E4"]).toBe(book.sheets[0]!.cells.get("E4")!.value);
    expect(after.cells["Vessel"]!["F4"]).toBe(20.81);
  });

  test("keeps chart, picture, comment, names, protection and conditional format", () => {
    expect(after.kept).toEqual(before.kept);
    expect(after.kept).toMatchObject({ charts: 1, pictures: 1, comments: 1, names: 2, conditions: 1, protected: ["Other sheet"] });
  });

  test("its own calculation of the built-in cells agrees, with ours held as numbers", () => {
    const book = bookOf(output);
    const calculated = openInOffice(output, frozenCells(book));
    expect(differences(book, calculated, (formula) => /cv_at\("N2",0\)/.test(formula ?? ""))).toEqual([]);
  });
});

test("a workbook of our own making opens with its values, formats and names", () => {
  const file = path("own.xlsx");
  const cells = [
    { address: "A1", value: "Größe <&> _x0041_", style: { bold: true } },
    { address: "A2", value: 0.1 + 0.2, style: { format: "0.00" } },
    { address: "A3", value: true },
    { address: "A4", value: 2.5e-7, formula: "A2*0+2.5E-7" },
    { address: "A5", value: " blanks ", formula: '" blanks "' },
    { address: "B1", value: 1, formula: "ROW(A1:A3)", array: "B1:B3" },
    { address: "B2", value: 2 },
    { address: "B3", value: 3 },
  ];
  writeFileSync(
    file,
    writeWorkbook({
      names: [{ name: "first", formula: "'My sheet'!$A$1" }],
      sheets: [
        { name: "My sheet", cells, widths: { A: 30 }, frozenRows: 1 },
        { name: "Empty", cells: [] },
      ],
    }),
  );
  const seen = openInOffice(file);
  expect(differences(bookOf(file), seen, () => false)).toEqual([]);
  expect(seen.kept).toMatchObject({ names: 1 });
});
