/** Tables of results: upright for one state, rows for several; what stands in a note upright stands in the row itself. */
import { refuse } from "../../src/core/refusal";
import { CellError } from "../../src/functions/cell";
import { line, type Report, SEE_NOTE, tableOf } from "../../src/functions/table";

const state =
  (value: number, warnings: readonly string[] = []) =>
  (): Report => ({
    lines: [
      line("temperature", value, "K", "of the gas"),
      line("caution", SEE_NOTE, "", "first"),
      line("caution", SEE_NOTE, "", "second"),
      line("kind", "ideal"),
    ],
    warnings,
  });

test("one state stands upright, its long texts in the last column", () => {
  expect(tableOf([state(300, ["hot", "dense"])])).toEqual([
    ["temperature", 300, "K", "of the gas"],
    ["caution", SEE_NOTE, "", "first"],
    ["caution", SEE_NOTE, "", "second"],
    ["kind", "ideal", "", ""],
    ["warning", SEE_NOTE, "", "hot"],
    ["warning", SEE_NOTE, "", "dense"],
  ]);
  expect(tableOf([state(300)])[4]).toEqual(["warnings", "none", "", ""]);
});

test("several states are rows: texts in words, lines of one label joined, warnings last", () => {
  expect(tableOf([state(300), state(400, ["hot", "dense"])])).toEqual([
    ["temperature [K]", "caution", "kind", "warnings"],
    [300, "first; second", "ideal", "none"],
    [400, "first; second", "ideal", "hot; dense"],
  ]);
});

test("a refused state keeps its row; if all are refused, one column says why", () => {
  const refused = () => refuse("Too cold");
  const error = new CellError("#VALUE!", "Too cold");
  expect(tableOf([refused, state(300)]).slice(1)).toEqual([
    [error, error, error, error],
    [300, "first; second", "ideal", "none"],
  ]);
  expect(tableOf([refused, refused])).toEqual([["error"], [error], [error]]);
  expect(tableOf([refused])).toEqual([[error]]);
});

test("a line that an earlier state lacks gets its column behind the line before it", () => {
  const of = (labels: string) => (): Report => ({ lines: [...labels].map((label) => line(label, 1, "mol")), warnings: [] });
  expect(tableOf([of("acd"), of("abcd")])).toEqual([
    ["a [mol]", "b [mol]", "c [mol]", "d [mol]", "warnings"],
    [1, "", 1, 1, "none"],
    [1, 1, 1, 1, "none"],
  ]);
  expect(tableOf([of("abcd"), of("acd")])[0]).toEqual(tableOf([of("acd"), of("abcd")])[0]);
  expect(tableOf([of("bc"), of("abc")])[0]).toEqual(["a [mol]", "b [mol]", "c [mol]", "warnings"]);
});
