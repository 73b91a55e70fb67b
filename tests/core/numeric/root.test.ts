import fc from "fast-check";
import { newtonInBracket, root } from "../../../src/core/numeric/root";
import { refusedWith } from "../refused";

describe("root by Brent's method", () => {
  test.each([
    ["cos x = x", (x: number) => Math.cos(x) - x, 0, 1, 0.7390851332151607],
    ["x² = 2", (x: number) => x * x - 2, 0, 2, Math.SQRT2],
    ["ln x = 1", (x: number) => Math.log(x) - 1, 0.1, 10, Math.E],
    ["a falling function", (x: number) => 1 - x ** 3, 0, 5, 1],
    ["a flat ninth power", (x: number) => (x - 0.3) ** 9, 0, 1, 0.3],
  ])("%s", (_, f, low, high, expected) => expect(root(f, low, high)).toBeCloseTo(expected, 12 - (expected === 0.3 ? 10 : 0)));

  test("an end that is the root", () => {
    expect(root((x) => x, 0, 3)).toBe(0);
    expect(root((x) => x - 3, 0, 3)).toBe(3);
  });

  test("finds the root of any line inside its bracket", () =>
    fc.assert(
      fc.property(fc.double({ min: -1e3, max: 1e3, noNaN: true }), fc.double({ min: 1e-3, max: 1e3, noNaN: true }), (at, slope) => {
        const found = root((x) => slope * (x - at), -1500, 1500);
        expect(Math.abs(found - at)).toBeLessThan(1e-9);
      }),
    ));

  test("needs few evaluations where the function is smooth", () => {
    let evaluations = 0;
    root((x) => (evaluations++, Math.exp(x) - 5), -10, 10);
    expect(evaluations).toBeLessThan(20);
  });

  test("refuses ends of equal sign, with the bracket", () =>
    expect(refusedWith(() => root((x) => x * x + 1, -1, 1, { what: "The temperature", unit: " K" }))).toBe(
      "input: The temperature does not lie between -1 K and 1 K",
    ));

  test("refuses a function without a value", () =>
    expect(refusedWith(() => root((x) => (x > 0.2 && x < 0.9 ? NaN : x - 0.5), 0, 1))).toMatch(
      /^input: The root was not found: the equation has no value at/,
    ));

  test("refuses when the evaluations run out, with the last bracket", () =>
    expect(refusedWith(() => root((x) => x ** 3 - 0.1, -1e9, 1e9, { iterations: 5 }))).toMatch(
      /^input: The root was not found in 5 steps; it lies between .* and .*/,
    ));
});

describe("Newton in a bracket", () => {
  const cubic = (x: number) => ({ value: x ** 3 - 8, slope: 3 * x * x });

  test("finds the root", () => expect(newtonInBracket(cubic, 0, 10, 5, { tolerance: 1e-8 })).toBeCloseTo(2, 14));

  test("starts from the middle if the start lies outside", () =>
    expect(newtonInBracket(cubic, 0, 10, 99, { tolerance: 1e-8 })).toBeCloseTo(2, 14));

  test("never evaluates outside the bracket, whatever the slope says", () =>
    fc.assert(
      fc.property(fc.double({ min: 0.01, max: 9.99, noNaN: true }), fc.double({ min: 1e-6, max: 1e6, noNaN: true }), (at, lie) => {
        const f = (x: number) => {
          expect(x).toBeGreaterThanOrEqual(0);
          expect(x).toBeLessThanOrEqual(10);
          return { value: Math.atan(x - at), slope: lie };
        };
        try {
          newtonInBracket(f, 0, 10, 5, { tolerance: 1e-12, iterations: 60 });
        } catch (thrown) {
          expect(thrown).toHaveProperty("message", expect.stringMatching(/was not found in 60 steps; it lies between/));
        }
      }),
    ));

  test("a step of the function ends at the step", () =>
    expect(newtonInBracket((x) => ({ value: x < 3 ? -1 : 1, slope: 1e9 }), 0, 10, 5)).toBeCloseTo(3, 12));

  test("refuses a value that is not a number, with the bracket", () =>
    expect(refusedWith(() => newtonInBracket(() => ({ value: NaN, slope: 1 }), 1, 2, 1.5, { what: "The temperature", unit: " K" }))).toBe(
      "input: The temperature was not found in 100 steps; it lies between 1 K and 2 K",
    ));
});
