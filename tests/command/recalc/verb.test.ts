import {
  chmodSync,
  existsSync,
  linkSync,
  mkdtempSync,
  readdirSync,
  readFileSync,
  rmSync,
  statSync,
  symlinkSync,
  writeFileSync,
} from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { readPackage, readWorkbook } from "../../../src/book";
import { recalc } from "../../../src/command/recalc";
import type { RecalcReport } from "../../../src/command/recalc/report";
import type { CellOutcome, Recalculated, RecalculateOptions } from "../../../src/recalc/outcome";
import { packageBytes } from "../../book/packages";

let folder: string;
beforeEach(() => (folder = mkdtempSync(join(tmpdir(), "recalc-"))));
afterEach(() => rmSync(folder, { recursive: true }));

const path = (name: string) => join(folder, name);
const input = () => {
  const rows =
    '<row r="1"><c r="A1"><v>2</v></c><c r="B1"><f>A1*2</f><v>1</v></c><c r="C1"><f>_xldudf_STILL_MOLARMASS("N2")</f><v>28</v></c></row>';
  writeFileSync(path("in.xlsx"), packageBytes({ sheets: { S: rows } }));
  return path("in.xlsx");
};

/** Runs the verb on an engine that gives these results. */
async function run(args: readonly string[], result: Partial<Recalculated> | Error = {}) {
  const lines: string[] = [];
  const complaints: string[] = [];
  const asked: RecalculateOptions[] = [];
  const status = await recalc(args, {
    recalculate: (_, options) => {
      asked.push(options);
      return result instanceof Error
        ? Promise.reject(result)
        : Promise.resolve({ outcomes: [], unevaluated: [], stale: [], volatileKept: [], ...result });
    },
    print: (line) => lines.push(line),
    complain: (line) => complaints.push(line),
  });
  return { status, lines, complaints, asked };
}

const outcome = (address: string, value: CellOutcome["value"], stillwall = false): CellOutcome => ({
  sheet: "S",
  address,
  value,
  stillwall,
});
const valueAt = (file: string, address: string) =>
  readWorkbook(readPackage(new Uint8Array(readFileSync(file)))).sheets[0]!.cells.get(address)!.value;

test("writes a copy beside the input, says what changed, leaves the input", async () => {
  const file = input();
  const before = readFileSync(file);
  const { status, lines } = await run([file], { outcomes: [outcome("B1", 4), outcome("C1", 28.014, true)] });
  expect(status).toBe(0);
  expect(lines).toEqual([
    `${path("in.recalculated.xlsx")}: 2 formula cells of 2 calculated, 2 cells changed`,
    "  S!B1  1 -> 4",
    "  S!C1  28 -> 28.014",
  ]);
  expect(valueAt(path("in.recalculated.xlsx"), "C1")).toBe(28.014);
  expect(readFileSync(file).equals(before)).toBe(true);
  expect(readdirSync(folder).sort()).toEqual(["in.recalculated.xlsx", "in.xlsx"]);
});

test("an existing file is replaced only when it was named", async () => {
  const file = input();
  writeFileSync(path("in.recalculated.xlsx"), "precious");
  const refused = await run([file]);
  expect([refused.status, refused.complaints[0]]).toEqual([2, `${path("in.recalculated.xlsx")} exists already: name the output with -o`]);
  expect(readFileSync(path("in.recalculated.xlsx"), "utf8")).toBe("precious");
  const named = await run([file, "-o", path("in.recalculated.xlsx")], { outcomes: [outcome("B1", 4)] });
  expect(named.status).toBe(0);
  expect(valueAt(path("in.recalculated.xlsx"), "B1")).toBe(4);
});

test("never over the input without --in-place, by whatever name", async () => {
  const file = input();
  linkSync(file, path("hard.xlsx"));
  symlinkSync(file, path("soft.xlsx"));
  const before = readFileSync(file);
  for (const name of [file, join(folder, ".", "in.xlsx"), path("hard.xlsx"), path("soft.xlsx")]) {
    const { status, complaints } = await run([file, "-o", name], { outcomes: [outcome("B1", 4)] });
    expect([status, complaints[0]]).toEqual([2, expect.stringContaining("is the input itself: say --in-place")]);
  }
  expect(readFileSync(file).equals(before)).toBe(true);
});

test("--in-place replaces the input, through a link, permissions kept; without changes it is not touched", async () => {
  const file = input();
  chmodSync(file, 0o640);
  symlinkSync(file, path("soft.xlsx"));
  const untouched = statSync(file, { bigint: true }).ino;
  expect((await run([file, "--in-place"], { outcomes: [outcome("B1", 1)] })).status).toBe(0);
  expect(statSync(file, { bigint: true }).ino).toBe(untouched);
  expect((await run([path("soft.xlsx"), "--in-place"], { outcomes: [outcome("B1", 4)] })).status).toBe(0);
  expect(valueAt(file, "B1")).toBe(4);
  expect(statSync(file).mode & 0o777).toBe(0o640);
  expect(readdirSync(folder).sort()).toEqual(["in.xlsx", "soft.xlsx"]);
});

test("a workbook that a spreadsheet program holds open is not replaced", async () => {
  const file = input();
  writeFileSync(path("~$in.xlsx"), "");
  const { status, complaints } = await run([file, "--in-place"]);
  expect([status, complaints[0]]).toEqual([2, `${file} is open in a spreadsheet program: close it first`]);
});

test("without changes the copy is the input to the byte", async () => {
  const file = input();
  await run([file, "-o", path("out.xlsx")], { outcomes: [outcome("B1", 1)] });
  expect(readFileSync(path("out.xlsx")).equals(readFileSync(file))).toBe(true);
});

test("failures, gaps and stale cells are listed, long lists are cut, and the status is 1", async () => {
  const file = input();
  const { status, lines } = await run([file, "--report", path("r.json"), "-o", path("out.xlsx")], {
    outcomes: [outcome("C1", { error: "#VALUE!", message: "Because of this" }, true)],
    unevaluated: [{ sheet: "S", address: "Z1", reason: "The function CUBEVALUE is not known here" }],
    stale: Array.from({ length: 30 }, (_, i) => ({ sheet: "S", address: `D${i + 1}` })),
    volatileKept: [{ sheet: "S", address: "E1" }],
  });
  expect(status).toBe(1);
  const text = lines.join("\n");
  expect(text).toContain("  S!C1  28 -> #VALUE!");
  expect(text).toContain("1 cell failed:\n  S!C1  #VALUE!  Because of this");
  expect(text).toContain("1 cell could not be evaluated and kept the value of the file:\n  S!Z1  The function CUBEVALUE is not known here");
  expect(text).toContain("30 cells may be out of date, depending on such cells:\n  S!D1\n");
  expect(text).toContain("  S!D20\n  and 10 more (all of them with --report FILE.json)");
  expect(text).toContain("1 cell kept the value of the file, for NOW, TODAY and random numbers are held (--now lets them go):\n  S!E1");
  const report = JSON.parse(readFileSync(path("r.json"), "utf8")) as RecalcReport;
  expect(report).toMatchObject({
    input: file,
    output: path("out.xlsx"),
    exit: 1,
    counts: { formulas: 2, calculated: 1, written: 1, changed: 1, failed: 1, unevaluated: 1, stale: 30 },
  });
  expect(report.stale).toHaveLength(30);
  expect(report.failed).toEqual([{ sheet: "S", address: "C1", error: "#VALUE!", message: "Because of this", kept: false }]);
});

test("cells the reader could not read count as not evaluated", async () => {
  const rows = '<row r="1"><c r="A1"><f t="dataTable" ref="A1:A1" dt2D="0" dtr="0" r1="C1"/><v>5</v></c></row>';
  writeFileSync(path("in.xlsx"), packageBytes({ sheets: { S: rows } }));
  const { status, lines } = await run([path("in.xlsx")]);
  expect(status).toBe(1);
  expect(lines).toContain("  S!A1  The data table A1:A1 is not calculated here");
});

test("--now hands the engine the clock; without it the engine gets none", async () => {
  const file = input();
  expect((await run([file, "-o", path("a.xlsx")])).asked).toEqual([{}]);
  const [options] = (await run([file, "-o", path("a.xlsx"), "--now"])).asked;
  expect(Math.abs((options!.now as Date).getTime() - Date.now())).toBeLessThan(60_000);
});

describe("refused with status 2, a sentence, and nothing written", () => {
  test.each<[string, (file: string) => string[], string]>([
    ["no such file", () => [path("none.xlsx")], "Cannot read"],
    ["a folder", () => [folder], "is not a file"],
    ["no workbook", () => [path("text.xlsx"), "-o", path("out.xlsx"), "--report", path("r.json")], "not an Excel workbook"],
    ["a folder that is not there", (file) => [file, "-o", path("no/out.xlsx")], "there is no such file or folder"],
    [
      "a report that cannot be written",
      (file) => [file, "-o", path("out.xlsx"), "--report", path("no/r.json")],
      "there is no such file or folder",
    ],
    ["a folder as output", (file) => [file, "-o", folder], "is not a file"],
    [
      "report over the output",
      (file) => [file, "-o", path("out.xlsx"), "--report", path("out.xlsx")],
      "cannot be both workbook and report",
    ],
    ["report over the input", (file) => [file, "-o", path("out.xlsx"), "--report", file], "cannot be both workbook and report"],
    ["an unknown option", (file) => [file, "--fast"], "recalc has no option --fast"],
  ])("%s", async (_, args, sentence) => {
    const file = input();
    writeFileSync(path("text.xlsx"), "a,b");
    const before = readdirSync(folder).sort();
    const bytes = readFileSync(file);
    const { status, complaints, lines } = await run(args(file), { outcomes: [outcome("B1", 4)] });
    expect([status, lines]).toEqual([2, []]);
    expect(complaints).toEqual([expect.stringContaining(sentence)]);
    expect(readdirSync(folder).sort()).toEqual(before);
    expect(readFileSync(file).equals(bytes)).toBe(true);
  });

  test("an engine that gives up", async () => {
    const { status, complaints } = await run([input()], new Error("out of memory"));
    expect([status, complaints]).toEqual([2, ["The workbook could not be calculated: out of memory"]]);
    expect(existsSync(path("in.recalculated.xlsx"))).toBe(false);
  });
});

test("--help tells the options", async () => {
  const { status, lines } = await run(["--help"]);
  expect(status).toBe(0);
  for (const word of ["--output", "--report", "--in-place", "--now", "Exit status"]) expect(lines.join("\n")).toContain(word);
});
