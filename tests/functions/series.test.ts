import { CellError } from "../../src/functions/cell";
import { seriesCells } from "../../src/functions/series";

const column = (...values: unknown[]): any[][] => values.map((value) => [value]);
const one = (value: unknown): any[][] => [[value]];

/** Value of a line of the upright table. */
function valueOf(table: any[][], label: string): unknown {
  const found = table.filter(([title]) => title === label);
  expect([label, found.length]).toEqual([label, 1]);
  return found[0]![1];
}

function rowOf(table: any[][], label: string): unknown[] {
  return table.find(([title]) => title === label)!;
}

function refusal(...given: Parameters<typeof seriesCells>): string {
  const cell = seriesCells(...given)[0]![0] as unknown;
  return cell instanceof CellError ? `${cell.code} ${cell.message}` : `not refused: ${String(cell)}`;
}

const GOOD = column(10686, 10692, 10680, 10690, 10682);
const RISES = column(2.5, 2.51, 2.49, 2.52, 2.48);

test("the whole table of five plain runs", () => {
  const table = seriesCells(GOOD);
  expect(table.map(([label]) => label as string)).toEqual([
    "number of runs",
    "mean",
    "standard deviation",
    "relative standard deviation",
    "standard deviation of the mean",
    "relative range",
    "Grubbs' statistic",
    "critical value, 5 %",
    "critical value, 1 %",
    "farthest run",
    "value of the farthest run",
    "slope with the order",
    "t of the slope with the order",
    "p of the slope with the order",
    "slope with the rise",
    "t of the slope with the rise",
    "p of the slope with the rise",
    "lowest rise",
    "highest rise",
    "deviation from the reference",
    "difference from the reference",
    "t of the difference",
    "p of the difference",
    "verdict",
    "warnings",
  ]);
  expect(rowOf(table, "mean")).toEqual(["mean", 10686, "", "in the unit of the values"]);
  expect(rowOf(table, "relative standard deviation")[3]).toBe("limit 0.2 % (ISO 1928:1995, 5 or more runs; from memory)");
  expect(valueOf(table, "standard deviation")).toBeCloseTo(Math.sqrt(26), 12);
  expect(rowOf(table, "slope with the order")[2]).toBe("per run");
  expect(valueOf(table, "slope with the rise")).toBe("not asked");
  expect(valueOf(table, "deviation from the reference")).toBe("not asked");
  expect(valueOf(table, "verdict")).toBe("accept: mean of 5 runs");
  expect(table.at(-1)).toEqual(["warnings", "none", "", ""]);
});

test("the lines stay where they are, whatever is asked and whatever can be tested", () => {
  const labels = (table: any[][]) => table.map(([label]) => label as string).slice(0, 24);
  const plain = labels(seriesCells(GOOD));
  expect(labels(seriesCells(GOOD, one(0.1), RISES, one(10000)))).toEqual(plain);
  expect(labels(seriesCells(column(1, 2)))).toEqual(plain);
  expect(labels(seriesCells(column(1, 1, 1)))).toEqual(plain);
});

test("rises and reference", () => {
  const table = seriesCells(GOOD, undefined, RISES, one(10680));
  expect(valueOf(table, "slope with the rise")).toBeCloseTo(280, 8);
  expect(valueOf(table, "lowest rise")).toBe(2.48);
  expect(valueOf(table, "highest rise")).toBe(2.52);
  expect(valueOf(table, "deviation from the reference")).toBeCloseTo(600 / 10680, 12);
  expect(valueOf(table, "difference from the reference")).toBe(6);
  expect(valueOf(table, "t of the difference")).toBeCloseTo(6 / Math.sqrt(26 / 5), 12);
});

test("what cannot be tested says why", () => {
  const two = seriesCells(column(10686, 10690), undefined, column(2.5, 2.6));
  expect(valueOf(two, "Grubbs' statistic")).toBe("needs 3 runs");
  expect(valueOf(two, "p of the slope with the order")).toBe("needs 3 runs");
  expect(valueOf(two, "t of the slope with the rise")).toBe("needs 3 runs");
  const equal = seriesCells(column(10686, 10686, 10686), undefined, column(2, 2, 2), one(10686));
  expect(valueOf(equal, "farthest run")).toBe("all values are equal");
  expect(valueOf(equal, "slope with the order")).toBe(0);
  expect(valueOf(equal, "t of the slope with the order")).toBe("all values are equal");
  expect(valueOf(equal, "slope with the rise")).toBe("all rises are equal");
  expect(valueOf(equal, "t of the difference")).toBe("all values are equal");
  expect(valueOf(seriesCells(column(1, 2, 3)), "t of the slope with the order")).toBe("no scatter about the line");
});

test("texts of one dimension are taken in the unit of the first", () => {
  const table = seriesCells(column("10.686 kJ/K", "10692 J/K", "10.680 kJ/°C"), undefined, column("4.5 °F", 2.6, 2.7), one("10.68 kJ/K"));
  expect(rowOf(table, "mean").slice(0, 3)).toEqual(["mean", expect.closeTo(10.686, 12), "kJ/K"]);
  expect(rowOf(table, "slope with the rise")[2]).toBe("kJ/K per K");
  expect(valueOf(table, "lowest rise")).toBeCloseTo(2.5, 12);
  expect(valueOf(table, "difference from the reference")).toBeCloseTo(0.006, 10);
});

test("a row is a list too; blank cells are skipped, and a run keeps its place", () => {
  const table = seriesCells([[10686, 10687, "", 10720, null, 10686, 10687]]);
  expect(valueOf(table, "number of runs")).toBe(5);
  expect(valueOf(table, "farthest run")).toBe(4);
  expect(valueOf(table, "verdict")).toBe("check run 4 (Grubbs, 1 %): look for the cause");
  const short = seriesCells(column(10686, null, 10690, null), undefined, column(2.5, 2.6, 2.7, null));
  expect(valueOf(short, "highest rise")).toBe(2.7);
});

test("a burn that went wrong: naphthalene, J/g, against the accepted value", () => {
  const table = seriesCells(column(18290, 18310, 18300), undefined, undefined, one(40191));
  expect(valueOf(table, "verdict")).toContain("54 % below the reference value");
  expect(table.filter(([label]) => label === "warning").map(([, , , text]) => text as string)).toEqual([
    "The mean lies 54 % below the reference value, more than 0.15 %: find the cause before any value is used",
    "The series has 3 runs; it needs at least 5",
  ]);
});

test("the limit, plain or as text", () => {
  const wide = column(10025, 9975, 10000, 9975, 10025);
  expect(valueOf(seriesCells(wide), "verdict")).toBe("repeat: the relative standard deviation 0.25 % is above the limit 0.2 %");
  expect(valueOf(seriesCells(wide, one("0.3 %")), "verdict")).toBe("accept: mean of 5 runs");
  expect(rowOf(seriesCells(wide, one(0.3)), "relative standard deviation")[3]).toBe("limit 0.3 %, as given");
  const words = "#VALUE! Limit of the relative standard deviation";
  expect(refusal(wide, one(0))).toBe(`${words} 0 % is not above 0 % and at most 5 %`);
  expect(refusal(wide, one(6))).toBe(`${words} 6 % is not above 0 % and at most 5 %`);
  expect(refusal(wide, one(0.002))).toBe(`${words} 0.002 % looks like a fraction; per cent is expected: say 0.2 or "0.2 %"`);
  expect(valueOf(seriesCells(wide, one("0.002 %")), "verdict")).toContain("is above the limit 0.002 %");
  expect(refusal(wide, column(0.1, 0.2))).toBe("#VALUE! The limit must be one cell, not 2 × 1 cells");
});

test("refusals", () => {
  expect(refusal(one(null))).toBe("#VALUE! The equivalents are missing: give them as one row or one column");
  expect(refusal(column(null, ""))).toBe("#VALUE! The equivalents are missing: all cells are blank");
  expect(
    refusal([
      [1, 2],
      [3, 4],
    ]),
  ).toBe("#VALUE! The equivalents are 2 rows × 2 columns; give one row or one column");
  expect(refusal(column(10686, null))).toBe("#VALUE! A series needs at least 2 runs, not 1");
  expect(refusal(column(10686, -5))).toBe("#VALUE! Run 2, -5, is not above 0");
  expect(refusal(column(10686, "10690"))).toBe(
    '#VALUE! Run 2 is the text "10690", but the first run is a plain number: give all with a unit, or none',
  );
  expect(refusal(column("10686", "10690"))).toBe(
    '#VALUE! Run 1 is the text "10686", not a number: give a number, or a text with a unit such as "10.2 kJ/K"',
  );
  expect(refusal(column("10 kJ/K", 10690))).toBe(
    "#VALUE! Run 2 is the plain number 10690, but the first run is a text in kJ/K: give all with a unit, or none",
  );
  expect(refusal(column("10 kJ/K", "10 bar"))).toContain('Run 2 "10 bar" is a pressure');
  expect(refusal(column("25 °C", "26 °C"))).toBe('#VALUE! Run 1, "25 °C", is a point on a temperature scale; it has no relative deviation');
  expect(refusal(column(true, 1))).toBe('#VALUE! Run 1 is TRUE: give a number, or a text with a unit such as "10.2 kJ/K"');
  expect(refusal(column(1, 2), undefined, column(2.5))).toBe("#VALUE! Equivalents: 2, rises: 1; give as many of one as of the other");
  expect(refusal(column(1, 2), undefined, column(2.5, null))).toBe(
    "#VALUE! Run 2 has a value but no rise: give the rise of every run, or none",
  );
  expect(refusal(column(1, 2), undefined, column(2.5, 25))).toBe(
    "#VALUE! Run 2: corrected rise 25 K is above 15 K: give the rise, not the final temperature",
  );
  expect(refusal(GOOD, undefined, undefined, one("10 kJ/K"))).toBe(
    '#VALUE! The reference value is the text "10 kJ/K", but the first run is a plain number: give all with a unit, or none',
  );
  expect(refusal(GOOD, undefined, undefined, one(0))).toBe("#VALUE! The reference value, 0, is not above 0");
});

test("an error cell comes out unchanged", () => {
  expect(seriesCells(column(10686, new CellError("#DIV/0!")))).toEqual([[new CellError("#DIV/0!")]]);
  expect(seriesCells(GOOD, undefined, column(2, 2, 2, 2, new CellError("#N/A")))).toEqual([[new CellError("#N/A")]]);
  expect(seriesCells(GOOD, undefined, undefined, one(new CellError("#REF!")))).toEqual([[new CellError("#REF!")]]);
});
