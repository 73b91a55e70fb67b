import { agreeCells } from "../../src/functions/agreement";
import { CellError } from "../../src/functions/cell";

const one = (value: unknown): any[][] => [[value]];

function refusal(...given: Parameters<typeof agreeCells>): string {
  const cell = agreeCells(...given)[0]![0] as unknown;
  return cell instanceof CellError ? `${cell.code} ${cell.message}` : `not refused: ${String(cell)}`;
}

test("one sample stands upright", () => {
  expect(agreeCells([[28000, 28130]], one(120))).toEqual([
    ["number of results", 2, "", ""],
    ["mean", 28065, "J/g", ""],
    ["range", 130, "J/g", "highest - lowest"],
    ["repeatability", 120, "J/g", "as given"],
    ["allowed range", 120, "J/g", "the repeatability (ISO 5725-6, from memory)"],
    ["verdict", "make a third run: the difference 130 J/g is above 120 J/g", "", ""],
    ["value to report", "none yet", "J/g", "round it to the nearest 10 or 20 J/g"],
    ["reported as", "none yet", "", ""],
    ["warning", "see note", "", "The results do not agree: make a third run: the difference 130 J/g is above 120 J/g"],
  ]);
});

test("several samples are rows, each with its own number of results; a refused one is a row of its error", () => {
  const table = agreeCells(
    [
      [28000, 28100, null, null],
      [28000, 28130, 28140, null],
      [28200, 28130, 28000, 28150],
      [28000, null, null, null],
    ],
    one(120),
  );
  expect(table[0]).toEqual([
    "number of results",
    "mean [J/g]",
    "range [J/g]",
    "repeatability [J/g]",
    "allowed range [J/g]",
    "verdict",
    "value to report [J/g]",
    "reported as",
    "warnings",
  ]);
  expect(table[1]).toEqual([2, 28050, 100, 120, 120, "agree", 28050, "mean of 2", "none"]);
  expect(table[2]!.slice(0, 8)).toEqual([3, 28090, 140, 120, 144, "agree", 28090, "mean of 3"]);
  expect(table[3]!.slice(5, 8)).toEqual([
    "take the median and look for the cause: the range 200 J/g is above 156 J/g",
    28140,
    "median of 4",
  ]);
  expect(table[4]).toEqual(new Array(9).fill(new CellError("#VALUE!", "Sample 4 has 1 result; give 2 to 4 in its row")));
});

test("repeatability as text with a unit, and by the id of a method", () => {
  const [liquid] = [[["45.70 MJ/kg", "45.83 MJ/kg"]]];
  const value = (table: any[][], label: string) => table.find(([title]) => title === label)![1] as unknown;
  for (const limit of ["0.13 MJ/kg", "astm-d240", "ASTM D240"]) {
    const table = agreeCells(liquid, one(limit));
    expect(value(table, "verdict")).toBe("agree");
    expect(value(table, "repeatability")).toBeCloseTo(130, 10);
    expect(value(table, "value to report")).toBeCloseTo(45765, 9);
  }
  expect(value(agreeCells(liquid, one("astm-d4809-gross")), "verdict")).toBe("make a third run: the difference 130 J/g is above 97 J/g");
  // 30 Btu_IT/lb = 30 × 2.326 J/g
  expect(value(agreeCells([[28000, 28069]], one("astm-d5865")), "allowed range")).toBeCloseTo(69.78, 10);
});

test("a method says what it is for, how to round, and that its figure is to be checked", () => {
  const table = agreeCells([["45.70 MJ/kg", "45.75 MJ/kg"]], one("astm-d240"));
  expect(table[3]).toEqual(["repeatability", 130, "J/g", "ASTM D240, liquid hydrocarbon fuels, gross and net value"]);
  expect(table[6]![3]).toBe("round it after the conversion, to two or three decimals of MJ/kg");
  expect(table.at(-1)).toEqual([
    "warning",
    "see note",
    "",
    "The repeatability of astm-d240 is from memory, and printed figures in circulation differ: check your edition",
  ]);
});

test("one repeatability for each row", () => {
  const table = agreeCells(
    [
      [28000, 28100],
      [28000, 28100],
    ],
    [[120], ["60 J/g"]],
  );
  expect([table[1]![5], table[2]![5]]).toEqual(["agree", "make a third run: the difference 100 J/g is above 60 J/g"]);
});

test("refusals", () => {
  const two = [[28000, 28100]];
  expect(refusal(one(null), one(120))).toBe("#VALUE! The values are missing: give the results of a sample in one row, 2 to 4 of them");
  expect(refusal([[1, 2, 3, 4, 5].map((value) => value * 1000)], one(120))).toBe(
    "#VALUE! The sample has 5 results; give 2 to 4 in its row",
  );
  expect(refusal([[28, 28.1]], one(120))).toBe('#VALUE! Result 1 of the sample 28 J/g is below 100 J/g: say "28 MJ/kg"');
  expect(refusal(two, one(null))).toBe(
    '#VALUE! Repeatability is missing: give a number in J/g, or a text such as "0.13 MJ/kg" or a method such as "iso-1928"',
  );
  expect(refusal(two, one(0))).toBe("#VALUE! Repeatability 0 J/g is not above 0 J/g");
  expect(refusal(two, one(0.13))).toBe('#VALUE! Repeatability 0.13 J/g is below 1 J/g: say "0.13 MJ/kg"');
  expect(refusal(two, one(120000))).toBe('#VALUE! Repeatability 120000 J/g is above 1000 J/g: say "120000 J/kg"');
  expect(refusal(two, one("-1 J/g"))).toBe("#VALUE! Repeatability -1 J/g is not above 0 J/g");
  expect(refusal(two, one("0.3 %"))).toContain('Repeatability "0.3 %" is');
  expect(refusal(two, one("iso-9831"))).toMatch(/^#N\/A "iso-9831" is not a method of the precision table; it holds iso-1928, /);
  expect(refusal(two, [[120, 130]])).toBe(
    "#VALUE! The repeatability is 1 × 2 cells; give one cell, or one column with a cell for each of 1 samples",
  );
  expect(refusal([...two, ...two], [[120], [120], [120]])).toBe(
    "#VALUE! The repeatability is 3 × 1 cells; give one cell, or one column with a cell for each of 2 samples",
  );
});

test("an error cell comes out unchanged", () => {
  expect(agreeCells([[28000, new CellError("#DIV/0!")]], one(120))).toEqual([[new CellError("#DIV/0!")]]);
  expect(agreeCells([[28000, 28100]], one(new CellError("#N/A")))).toEqual([[new CellError("#N/A")]]);
});
