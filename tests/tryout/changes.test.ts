/** What saving writes, cell by cell. */
import { FunctionNames } from "../../src/book/formula";
import type { BookCell, BookValue, Workbook } from "../../src/book/workbook";
import type { GridCell } from "../../src/tryout/grid/contents";
import { changesOf, type ChangeRules, type Handed } from "../../src/tryout/saving/changes";
import { differs } from "../../src/tryout/saving/differ";

const rules: ChangeRules = {
  naming: (name) => name,
  functions: new FunctionNames(["CV.AT"]),
  differs,
  isArray: (formula) => formula.includes("STILL."),
};

const bookCell = (value: BookValue, formula?: string, array?: string): BookCell => ({
  row: 0,
  column: 0,
  value,
  formula,
  array,
  dynamic: array !== undefined,
});
const gridCell = (content: string, value: BookValue, more: Partial<GridCell> = {}): GridCell => ({
  content,
  value,
  formula: content.startsWith("="),
  ...more,
});

function changes(file: Record<string, BookCell>, handed: Record<string, string>, now: Record<string, GridCell>) {
  const workbook: Workbook = {
    sheets: [{ name: "S", cells: new Map(Object.entries(file)), rows: 9, columns: 9 }],
    ...{ names: [], tables: [], date1904: false, notes: [] },
  };
  const given: Handed = { contents: new Map([["S", new Map(Object.entries(handed))]]), formats: new Map() };
  return changesOf(new Map([["S", new Map(Object.entries(now))]]), given, workbook, rules);
}

test("a workbook left alone has no changes", () => {
  const file = { A1: bookCell(1), B1: bookCell(2, "A1*2") };
  expect(changes(file, { A1: "1", B1: "=A1*2" }, { A1: gridCell("1", 1), B1: gridCell("=A1*2", 2) })).toEqual({
    changes: [],
    remarks: [],
    formats: 0,
  });
});

test("a formula left alone gets only its new value", () => {
  const file = { B1: bookCell(2, "A1*2") };
  expect(changes(file, { B1: "=A1*2" }, { B1: gridCell("=A1*2", 6) }).changes).toEqual([{ sheet: "S", address: "B1", value: 6 }]);
});

test("a typed formula is written in the dialect of the file, as a dynamic array if it calls the add-in", () => {
  const { changes: found } = changes({}, {}, { B1: gridCell('=STILL.CV.AT("N2",A1)', 20.8), B2: gridCell("=A1+1", 2) });
  expect(found).toEqual([
    { sheet: "S", address: "B1", value: 20.8, formula: '_xldudf_STILL_CV_AT("N2",A1)', array: "B1" },
    { sheet: "S", address: "B2", value: 2, formula: "A1+1" },
  ]);
});

test("values and texts take the place of formulas, and emptied cells are emptied", () => {
  const file = { A1: bookCell(2, "1+1"), A2: bookCell("gone") };
  const { changes: found } = changes(file, { A1: "=1+1", A2: "gone" }, { A1: gridCell("'=x", "=x") });
  expect(found).toEqual([
    { sheet: "S", address: "A1", value: "=x", formula: null },
    { sheet: "S", address: "A2", value: null, formula: null },
  ]);
});

test("cells that a typed formula fills are written with it", () => {
  const spilling = gridCell("=A1:A2*2", 2, { spill: "B1:B2", spilled: [[2], [4]] });
  expect(changes({}, {}, { B1: spilling }).changes).toEqual([
    { sheet: "S", address: "B1", value: 2, formula: "A1:A2*2", array: "B1:B2" },
    { sheet: "S", address: "B2", value: 4 },
  ]);
});

test("a formula that fills another range than in the file moves it", () => {
  const file = { B1: bookCell(1, "SEQUENCE(A1)", "B1:B2"), B2: bookCell(2) };
  const now = gridCell("=SEQUENCE(A1)", 1, { spill: "B1:B3", spilled: [[1], [2], [3]] });
  expect(changes(file, { B1: "=SEQUENCE(A1)" }, { B1: now }).changes).toEqual([
    { sheet: "S", address: "B1", value: 1, array: "B1:B3" },
    { sheet: "S", address: "B2", value: 2 },
    { sheet: "S", address: "B3", value: 3 },
  ]);
});

test("what is no formula is saved as text, with a remark", () => {
  const broken: GridCell = { content: "=?1", formula: false, value: { error: "#BAD_EXPR", message: "It cannot be read" } };
  const { changes: found, remarks } = changes({}, {}, { A1: broken });
  expect(found).toEqual([{ sheet: "S", address: "A1", value: "=?1", formula: null }]);
  expect(remarks).toEqual(["S!A1 is saved as the text =?1, because it is no formula that can be calculated here. It cannot be read."]);
});

test("an error of the engine's own is not written into a file", () => {
  const { changes: found } = changes({}, {}, { A1: gridCell("=A1", { error: "#CYCLE", message: "circle" }) });
  expect(found).toEqual([{ sheet: "S", address: "A1", value: { error: "#REF!", message: "circle" }, formula: "A1" }]);
});

test("a format that came with typing is counted, one that the file has is not", () => {
  const now = { A1: gridCell("0.05", 0.05, { format: "0%" }) };
  expect(changes({}, {}, now).formats).toBe(1);
  const workbook: Workbook = { sheets: [], names: [], tables: [], date1904: false, notes: [] };
  const handed: Handed = { contents: new Map(), formats: new Map([["S", new Map([["A1", "0%"]])]]) };
  expect(changesOf(new Map([["S", new Map(Object.entries(now))]]), handed, workbook, rules).formats).toBe(0);
});

describe("when a recalculated value is written", () => {
  test.each<[BookValue, BookValue, string, boolean]>([
    [1, 1 + 2 ** -52, "SUM(A1)", false], // within the rounding of another order of adding
    [1, 1 + 2 ** -52, "_xldudf_STILL_CV_AT(A1)", true],
    [1, 1.000001, "SUM(A1)", true],
    [1, "1", "A1", true],
    [1, { error: "#VALUE!" }, "SUM(A1)", false], // a built-in that newly fails keeps the value of the file
    [1, { error: "#VALUE!" }, "_xldudf_STILL_CV_AT(A1)", true],
    [{ error: "#NAME?" }, 3, "SUM(A1)", true],
    [{ error: "#VALUE!" }, { error: "#SPILL!" }, "A1:A2", false], // both are stored as #VALUE!
  ])("%j -> %j in %s: %s", (before, after, formula, expected) => {
    expect(differs(before, after, formula)).toBe(expected);
  });
});
