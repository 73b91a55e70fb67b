import { integrateAdaptively } from "../../../src/core/numeric/adaptive";
import { refusedWith } from "../refused";

test.each([
  ["exp", Math.exp, 0, 3, Math.E ** 3 - 1],
  ["1/(3 − x) next to its pole", (x: number) => 1 / (3 - x), 0, 2.999, Math.log(3000)],
  ["a narrow peak", (x: number) => 1 / (1e-6 + x * x), -1, 2, 1000 * (Math.atan(2000) + Math.atan(1000))],
  ["the square root, not smooth at its end", Math.sqrt, 0, 1, 2 / 3],
  ["a sum that cancels", Math.sin, -2, 2.5, Math.cos(2) - Math.cos(2.5)],
  ["backwards", (x: number) => x ** 5, 2, 1, -63 / 6],
  ["no width", Math.exp, 1, 1, 0],
])("%s to 1e-12", (_, f, a, b, exact) => {
  expect(Math.abs(integrateAdaptively(f, a, b) - exact)).toBeLessThanOrEqual(1e-12 * Math.max(1, Math.abs(exact)));
});

test("takes few evaluations where the function is smooth", () => {
  let evaluations = 0;
  integrateAdaptively((x) => (evaluations++, Math.exp(x)), 0, 1);
  expect(evaluations).toBe(36); // 12 on the whole, 12 on each half
});

test("refuses a function without value, and one that no halving settles", () => {
  const sentence = "input: An integral was not found: its function has no value, or is not smooth";
  expect(refusedWith(() => integrateAdaptively(() => NaN, 0, 1))).toBe(sentence);
  expect(refusedWith(() => integrateAdaptively((x) => 1 / x, 0, 1))).toBe(sentence);
});
