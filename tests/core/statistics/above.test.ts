import { isAbove, printedAbove } from "../../../src/core/statistics/above";

test("a difference of decimals that equals the limit is not above it", () => {
  expect(28.26 - 28.13 > 0.13).toBe(true); // what a double makes of it
  expect(isAbove(28.26 - 28.13, 0.13, 28.26)).toBe(false);
  expect(isAbove(28.261 - 28.13, 0.13, 28.261)).toBe(true);
  expect(isAbove(0.2, 0.2)).toBe(false);
  expect(isAbove(0.2000001, 0.2)).toBe(true);
});

test("a value above its limit is printed so that it shows", () => {
  expect(printedAbove(54.4674, 0.15)).toBe("54");
  expect(printedAbove(0.1504, 0.15)).toBe("0.1504");
  expect(printedAbove(0.2496, 0.2)).toBe("0.25");
  expect(printedAbove(130, 120, 6)).toBe("130");
  expect(printedAbove(120.0000004, 120, 6)).toBe("120.0000004");
});
