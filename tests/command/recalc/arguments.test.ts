import { readArguments } from "../../../src/command/recalc/arguments";
import { refusalOf } from "../../book/packages";

test("what a line means", () => {
  expect(readArguments(["in.xlsx"])).toEqual({ input: "in.xlsx", inPlace: false, now: false });
  expect(readArguments(["-o", "out.xlsx", "in.xlsx", "--report=r.json", "--now"])).toEqual({
    input: "in.xlsx",
    output: "out.xlsx",
    report: "r.json",
    inPlace: false,
    now: true,
  });
  expect(readArguments(["--in-place", "--report", "r=1.json", "--", "-odd.xlsx"])).toEqual({
    input: "-odd.xlsx",
    report: "r=1.json",
    inPlace: true,
    now: false,
  });
});

test.each<[string[], string]>([
  [[], "recalc needs the name of a workbook"],
  [["a.xlsx", "b.xlsx"], 'recalc takes one workbook, but "b.xlsx" follows "a.xlsx"'],
  [["a.xlsx", "--force"], "recalc has no option --force"],
  [["a.xlsx", "-o"], "The option -o needs a file name"],
  [["a.xlsx", "-o", "b.xlsx", "--in-place"], "--in-place and -o exclude each other"],
])("%j is refused", (args, sentence) => {
  expect(refusalOf(() => readArguments(args))).toBe(sentence);
});
