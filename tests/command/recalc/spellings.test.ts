import { mkdtempSync, readFileSync, rmSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { readPackage, readWorkbook } from "../../../src/book";
import { processHost, recalc } from "../../../src/command/recalc";
import { registry } from "../../../src/functions";
import { packageBytes } from "../../book/packages";

const folder = mkdtempSync(join(tmpdir(), "recalc-"));
afterAll(() => rmSync(folder, { recursive: true }));

async function recalculated(rows: string) {
  const [input, output] = [join(folder, "in.xlsx"), join(folder, "out.xlsx")];
  writeFileSync(input, packageBytes({ sheets: { S: rows } }));
  const lines: string[] = [];
  const status = await recalc([input, "-o", output], {
    ...processHost,
    print: (line) => lines.push(line),
    complain: (line) => lines.push(line),
  });
  const pkg = readPackage(new Uint8Array(readFileSync(output)));
  return { status, lines, cells: readWorkbook(pkg).sheets[0]!.cells, text: pkg.text("xl/worksheets/sheet1.xml") };
}

const cell = (r: string, formula: string, v = "<v>1</v>") => `<c r="${r}"><f>${formula}</f>${v}</c>`;

test("every spelling of our functions in a file gives the direct call's number, and keeps its spelling", async () => {
  const spellings = [
    '_xldudf_STILL_CV_AT("N2",500)',
    'STILL.CV.AT("N2",500)',
    'still.cv.at("N2",500)',
    '_xldudf_still_cv_at("N2",500)',
    '[2]!_xldudf_STILL_CV_AT("N2",500)',
  ];
  const direct = registry.get("CV.AT")!([["N2"]], [[500]])[0]![0] as number;
  const { status, cells, text, lines } = await recalculated(
    spellings.map((formula, i) => `<row r="${i + 1}">${cell(`A${i + 1}`, formula)}</row>`).join(""),
  );
  expect(status).toBe(0);
  spellings.forEach((formula, i) => {
    expect(cells.get(`A${i + 1}`)!.value).toBe(direct);
    expect(text).toContain(`<f>${formula}</f><v>${direct}</v>`);
  });
  expect(lines.filter((line) => line.startsWith("Note"))).toEqual([
    expect.stringContaining("2 formulas such as S!A2 name the function as STILL."),
  ]);
});

test("order of dependence, not of place; a function nobody knows keeps its value and its readers are told", async () => {
  const { status, cells, lines } = await recalculated(
    `<row r="1">${cell("A1", "B1*2")}${cell("B1", "C1+1")}<c r="C1"><v>20</v></c></row><row r="2">${cell("A2", "NOSUCHFUNCTION(C1)", "<v>7</v>")}${cell("B2", "A2+1", "<v>8</v>")}${cell("C2", "IFERROR(STILL.CV.AT(&quot;N2&quot;,0),-1)")}</row>`,
  );
  expect([cells.get("A1")!.value, cells.get("B1")!.value, cells.get("C2")!.value]).toEqual([42, 21, -1]);
  expect([cells.get("A2")!.value, cells.get("B2")!.value, status]).toEqual([7, 8, 1]);
  expect(lines.join("\n")).toMatch(/1 cell could not be evaluated[^\n]*:\n {2}S!A2 {2}.*NOSUCHFUNCTION/);
  expect(lines.join("\n")).toMatch(/1 cell may be out of date[^\n]*:\n {2}S!B2/);
});

test("a refusal reaches the cells that read it, and only those", async () => {
  const { status, cells, lines } = await recalculated(
    `<row r="1">${cell("A1", "_xldudf_STILL_CV_AT(&quot;N2&quot;,B1)", "<v>21</v>")}<c r="B1"><v>-3</v></c>${cell("C1", "ROUND(A1,1)", "<v>21</v>")}${cell("D1", "B1*2", "<v>600</v>")}</row>`,
  );
  expect(status).toBe(1);
  expect(["A1", "C1", "D1"].map((address) => cells.get(address)!.value)).toEqual([{ error: "#VALUE!" }, { error: "#VALUE!" }, -6]);
  expect(lines.join("\n")).toContain("S!A1  #VALUE!  Temperature -3 K is not above");
});

test("NOW and what reads it stay as in the file", async () => {
  const { status, cells } = await recalculated(`<row r="1">${cell("A1", "NOW()", "<v>40000</v>")}${cell("B1", "A1+1", "<v>1</v>")}</row>`);
  expect([status, cells.get("A1")!.value, cells.get("B1")!.value]).toEqual([0, 40000, 40001]);
});
