import { areaOf } from "../../../src/book/address";
import type { BookCell, BookValue, Workbook } from "../../../src/book/workbook";
import { compare, type Comparison } from "../../../src/command/recalc/compare";
import { differs, isVisible } from "../../../src/book/differ";
import type { Reads } from "../../../src/command/recalc/inherited";
import type { CellOutcome } from "../../../src/recalc/outcome";
import { placeOf } from "../../../src/book/address";

const NA = { error: "#N/A" };
const VALUE = { error: "#VALUE!", message: "Temperature 0 K is not above 0 K" };

describe("when a value is written", () => {
  const up = (x: number, steps: number) => {
    const view = new DataView(new ArrayBuffer(8));
    view.setFloat64(0, x);
    view.setBigInt64(0, view.getBigInt64(0) + BigInt(steps));
    return view.getFloat64(0);
  };

  test.each<[string, BookValue, BookValue, boolean, boolean]>([
    ["the same number", 21.3, 21.3, false, false],
    ["a Stillwall number one bit away", 21.3, up(21.3, 1), true, true],
    ["a built-in number one bit away", 21.3, up(21.3, 1), false, false],
    ["a built-in number 1.1e-14 away", 1, 1 + 1.1e-14, false, true],
    ["a built-in number 0.9e-14 away", 1, 1 + 0.9e-14, false, false],
    ["a zero and a tiny number", 0, 1e-300, false, true],
    ["two zeros of different sign", 0, -0, true, false],
    ["a text for a number", 1, "1", false, true],
    ["a truth value for a number", 1, true, false, true],
    ["the same text", "a", "a", true, false],
    ["a text in other letters", "a", "A", false, true],
    ["nothing for an empty text", null, "", false, true],
    ["the same error, now with a sentence", { error: "#VALUE!" }, VALUE, true, false],
    ["another error", NA, VALUE, true, true],
    ["an error for a number", 1, NA, true, true],
    ["a newer error stored as #VALUE!", { error: "#VALUE!" }, { error: "#SPILL!" }, true, false],
  ])("%s", (_, old, fresh, stillwall, expected) => {
    expect(differs(old, fresh, stillwall)).toBe(expected);
  });

  test("what is seen in 15 digits", () => {
    expect(isVisible(1, 1 + 2e-16)).toBe(false);
    expect(isVisible(1, 1 + 2e-14)).toBe(true);
    expect(isVisible("a", "b")).toBe(true);
  });
});

/** Cells by address: a value, or [formula, value, more]. */
function bookOf(cells: Record<string, BookValue | [string, BookValue, Partial<BookCell>?]>): Workbook {
  const map = new Map<string, BookCell>();
  let [rows, columns] = [0, 0];
  for (const [address, content] of Object.entries(cells)) {
    const { row, column } = placeOf(address)!;
    [rows, columns] = [Math.max(rows, row + 1), Math.max(columns, column + 1)];
    map.set(
      address,
      Array.isArray(content) ? { row, column, formula: content[0], value: content[1], ...content[2] } : { row, column, value: content },
    );
  }
  return { sheets: [{ name: "S", cells: map, rows, columns }], names: [], tables: [], date1904: false, notes: [] };
}

const outcome = (address: string, value: BookValue, more: Partial<CellOutcome> = {}): CellOutcome => ({
  sheet: "S",
  address,
  value,
  stillwall: false,
  ...more,
});

/** The test's formulas are a list of ranges: `B1 C1:C9`. */
const reads: Reads = (sheet, cell) =>
  (cell.formula ?? "").split(" ").flatMap((range) => (areaOf(range) ? [{ sheet, ...areaOf(range)! }] : []));

const compared = (book: Workbook, ...outcomes: CellOutcome[]): Comparison =>
  compare(book, { outcomes, unevaluated: [], stale: [], volatileKept: [] }, reads);
const written = ({ changes }: Comparison) =>
  Object.fromEntries(changes.map(({ address, value, array }) => [address, array === undefined ? value : [value, array]]));

test("only what differs is written, and the last digits are told apart from changes", () => {
  const book = bookOf({ A1: ["x", 1], A2: ["x", 1], A3: ["x", 1], A4: 5 });
  const result = compared(
    book,
    outcome("A1", 1 + 2 ** -52, { stillwall: true }),
    outcome("A2", 1 + 2 ** -52),
    outcome("A3", 2),
    outcome("A4", 9),
  );
  expect(written(result)).toEqual({ A1: 1 + 2 ** -52, A3: 2 });
  expect(result.changed).toEqual([{ sheet: "S", address: "A3", old: 1, new: 2 }]);
  expect(result.lastDigits.map((cell) => cell.address)).toEqual(["A1"]);
  expect(result.failed).toEqual([]);
});

test("a Stillwall cell that fails is written and told, with its sentence, whether it failed before or not", () => {
  const book = bookOf({ A1: ["x", 21.3], A2: ["x", { error: "#VALUE!" }] });
  const result = compared(book, outcome("A1", VALUE, { stillwall: true }), outcome("A2", VALUE, { stillwall: true }));
  expect(written(result)).toEqual({ A1: VALUE });
  expect(result.failed).toEqual(
    ["A1", "A2"].map((address) => ({ sheet: "S", address, error: "#VALUE!", message: VALUE.message, kept: false })),
  );
});

test("a built-in function that newly fails keeps the value of the file and is told", () => {
  const result = compared(bookOf({ A1: ["B1", 3], B1: 1, A2: ["B1", NA] }), outcome("A1", NA), outcome("A2", NA));
  expect(written(result)).toEqual({});
  expect(result.failed).toEqual([{ sheet: "S", address: "A1", error: "#N/A", message: "", kept: true }]);
});

describe("an error that came in from a cell it reads is written", () => {
  test("through a chain, in any order, from a Stillwall cell that now refuses", () => {
    const book = bookOf({ A1: ["", 1], B1: ["A1", 1], C1: ["B1:B2", 1], D1: ["C1", 1], E1: ["F1", 1], F1: 1 });
    const result = compared(
      book,
      outcome("D1", { error: "#VALUE!" }),
      outcome("C1", { error: "#VALUE!" }),
      outcome("B1", { error: "#VALUE!" }),
      outcome("E1", { error: "#VALUE!" }),
      outcome("A1", VALUE, { stillwall: true }),
    );
    expect(Object.keys(written(result)).sort()).toEqual(["A1", "B1", "C1", "D1"]);
    expect(result.failed.filter((cell) => cell.kept).map((cell) => cell.address)).toEqual(["E1"]);
  });

  test("not if the cell read holds another error, or has just lost its error", () => {
    const book = bookOf({ A1: ["", NA], B1: ["A1", 1], C1: ["D1", 1], D1: { error: "#DIV/0!" } });
    const result = compared(book, outcome("A1", 5, { stillwall: true }), outcome("B1", NA), outcome("C1", NA));
    expect(written(result)).toEqual({ A1: 5 });
    expect(result.failed.map((cell) => [cell.address, cell.kept])).toEqual([
      ["B1", true],
      ["C1", true],
    ]);
  });

  test("not round a circle of doubtful cells alone", () => {
    const result = compared(bookOf({ A1: ["B1", 1], B1: ["A1", 1] }), outcome("A1", NA), outcome("B1", NA));
    expect(written(result)).toEqual({});
  });
});

describe("results that fill ranges", () => {
  const filled = (...addresses: string[]) =>
    Object.fromEntries(
      addresses.map((address) => [
        address,
        [undefined as unknown as string, 1, { filledBy: "A1" }] as [string, BookValue, Partial<BookCell>],
      ]),
    );

  test("a dynamic array grows and shrinks; what it leaves becomes empty and is told", () => {
    const book = bookOf({ A1: ["x", 1, { array: "A1:A3", dynamic: true }], ...filled("A2", "A3") });
    const smaller = compared(book, outcome("A1", 1, { spill: [[1], [4]], stillwall: true }));
    expect(written(smaller)).toEqual({ A1: [1, "A1:A2"], A2: 4, A3: null });
    expect(smaller.changed.map(({ address, new: fresh }) => [address, fresh])).toEqual([
      ["A2", 4],
      ["A3", null],
    ]);
    expect(written(compared(book, outcome("A1", 1, { spill: [[1, 2]] })))).toEqual({ A1: [1, "A1:B1"], B1: 2, A2: null, A3: null });
    expect(written(compared(book, outcome("A1", 9)))).toEqual({ A1: [9, "A1"], A2: null, A3: null });
  });

  test("it never covers what somebody typed", () => {
    const book = bookOf({ A1: ["x", 1, { array: "A1", dynamic: true }], A3: "typed" });
    const result = compared(book, outcome("A1", 1, { spill: [[1], [2], [3]], stillwall: true }));
    expect(written(result)).toEqual({ A1: { error: "#SPILL!", message: "The result needs the cells A1:A3, but A3 is not empty" } });
    expect(result.failed[0]).toMatchObject({ address: "A1", error: "#SPILL!", kept: false });
  });

  test("an array formula of the old kind keeps its range: repeated or cut, and #N/A where nothing is", () => {
    const book = bookOf({ A1: ["x", 0, { array: "A1:B3" }], ...filled("B1", "A2", "B2", "A3", "B3") });
    expect(written(compared(book, outcome("A1", 7)))).toEqual({ A1: 7, B1: 7, A2: 7, B2: 7, A3: 7, B3: 7 });
    expect(written(compared(book, outcome("A1", 1, { spill: [[1, 2, 3]], stillwall: true })))).toEqual({ A1: 1, B1: 2, B2: 2, B3: 2 });
    expect(written(compared(book, outcome("A1", 5, { spill: [[5], [6]], stillwall: true })))).toEqual({
      A1: 5,
      B1: 5,
      A2: 6,
      B2: 6,
      A3: NA,
      B3: NA,
    });
  });

  test("a formula that is no array formula takes the first value only", () => {
    expect(written(compared(bookOf({ A1: ["x", 1] }), outcome("A1", 3, { spill: [[3], [4]] })))).toEqual({ A1: 3 });
  });
});
