/** IF and IFS over arrays answer cell by cell, as the vendor's documentation of array formulas has it (from memory). */
import { evaluateFormulas } from "../../../src/recalc/evaluate";

function valueOf(formula: string): unknown {
  const [outcome] = evaluateFormulas([formula]);
  if (outcome === undefined) return undefined;
  if ("error" in outcome) return outcome.error.code;
  return Array.isArray(outcome.value) ? outcome.value.map((row: readonly unknown[]) => row.map(plain)) : outcome.value;
}

function plain(cell: unknown): unknown {
  return typeof cell === "object" && cell !== null && "error" in cell ? ((cell.error as { code?: string }).code ?? cell.error) : cell;
}

test.each([
  ['=IF({1;#N/A;3}>1,"a","b")', [["b"], ["#N/A"], ["a"]]],
  ["=IF({TRUE;#DIV/0!;FALSE},{1;2;3},{4;5;6})", [[1], ["#DIV/0!"], [6]]],
  ["=IF({1,0,#N/A},{1,#NUM!,3},5)", [[1, 5, "#N/A"]]],
  [
    "=IF({1;0},{1,2},{3,4})",
    [
      [1, 2],
      [3, 4],
    ],
  ],
  ["=IF({1;0;1},{1;2},9)", [[1], [9], ["#N/A"]]],
  ['=IF({"no";1},1,2)', [["#VALUE!"], [1]]],
  ["=IF({1;0},7)", [[7], [false]]],
  ["=IFS({1;#N/A;0},1,TRUE,2)", [[1], ["#N/A"], [2]]],
  ["=IFERROR(IF({1;#N/A}>0,1,2),0)", [[1], [0]]],
])("%s", (formula, expected) => expect(valueOf(formula)).toEqual(expected));

test("a single condition keeps what it had: a whole array, an error, a text", () => {
  expect(valueOf("=IF(TRUE,{1;2},3)")).toEqual([[1], [2]]);
  expect(valueOf("=IF(#N/A,1,2)")).toBe("#N/A");
  expect(valueOf("=IF(1>2,1)")).toBe(false);
  expect(valueOf("=IF(1>2,1,)")).toBe(0);
  expect(valueOf('=IFS(1>2,"a",TRUE,"b")')).toBe("b");
});
