import fc from "fast-check";
import {
  addressOf,
  areaOf,
  columnIndex,
  columnLetters,
  COLUMNS,
  placeOf,
  rangeOf,
  requireArea,
  requirePlace,
  ROWS,
} from "../../src/book/address";
import { refusalOf } from "./packages";

const row = fc.integer({ min: 0, max: ROWS - 1 });
const column = fc.integer({ min: 0, max: COLUMNS - 1 });

test("addresses and places are each other's inverse", () => {
  fc.assert(fc.property(row, column, (r, c) => expect(placeOf(addressOf(r, c))).toEqual({ row: r, column: c })));
  fc.assert(fc.property(column, (c) => expect(columnIndex(columnLetters(c))).toBe(c)));
});

// The last cell of a sheet is XFD1048576 in every program that reads the format.
test("the corners of a sheet", () => {
  expect(placeOf("A1")).toEqual({ row: 0, column: 0 });
  expect(placeOf("$xfd$1048576")).toEqual({ row: ROWS - 1, column: COLUMNS - 1 });
  expect([columnLetters(25), columnLetters(26), columnLetters(701), columnLetters(702)]).toEqual(["Z", "AA", "ZZ", "AAA"]);
  for (const none of ["XFE1", "A1048577", "A0", "1", "A", "", "A1:B2", "A-1", "ÄA1"]) expect(placeOf(none)).toBeUndefined();
});

test("ranges in any order of corners", () => {
  fc.assert(
    fc.property(row, column, row, column, (r1, c1, r2, c2) => {
      const area = { top: Math.min(r1, r2), left: Math.min(c1, c2), bottom: Math.max(r1, r2), right: Math.max(c1, c2) };
      expect(areaOf(`${addressOf(r1, c1)}:${addressOf(r2, c2)}`)).toEqual(area);
      expect(areaOf(rangeOf(area))).toEqual(area);
    }),
  );
  expect(rangeOf(requireArea("B2"))).toBe("B2");
});

test("what is no address or range is refused", () => {
  expect(refusalOf(() => requirePlace("R1C1"))).toBe('"R1C1" is not a cell address such as B12');
  expect(refusalOf(() => requireArea("A1:B2:C3"))).toBe('"A1:B2:C3" is not a range of cells such as B2:B10');
});
