import fc from "fast-check";
import { looksLikeFractions } from "../../../src/core/fuel/fractions";

test("wood as fractions, dry or moist", () => {
  expect(looksLikeFractions(0.061, [0.425, 0.001, 0.08])).toBe(true);
  expect(looksLikeFractions(0.061, [0.425, 0.001, 0])).toBe(true);
});

test("per cent, and what is not known to be either", () => {
  expect(looksLikeFractions(6.1, [42.5, 0.1, 8])).toBe(false);
  expect(looksLikeFractions(0.2, [0.5, 1.1, 0.5])).toBe(false); // a coke
  expect(looksLikeFractions(0.1, [0, 0, 0])).toBe(false); // a graphite
  expect(looksLikeFractions(0, [0.5, 0.5, 0.5])).toBe(false);
});

test("every fuel of 0.5 % to 24.9 % hydrogen is seen when its per cent are divided by 100, and never as it is", () => {
  const part = fc.double({ min: 0.001, max: 60, noNaN: true });
  fc.assert(
    fc.property(fc.double({ min: 0.5, max: 24.9, noNaN: true }), part, part, part, (hydrogen, oxygen, nitrogen, moisture) => {
      const others = [oxygen, nitrogen, moisture];
      expect(looksLikeFractions(hydrogen, others)).toBe(false);
      expect(
        looksLikeFractions(
          hydrogen / 100,
          others.map((percent) => percent / 100),
        ),
      ).toBe(true);
    }),
  );
});
