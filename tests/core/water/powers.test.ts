import fc from "fast-check";
import { Powers } from "../../../src/core/water/powers";
import { iapws95 } from "../../../src/data/iapws95";
import { refusedWith } from "../refused";

test("equal to Math.pow within the rounding of the products", () => {
  const exponents = [...new Set(iapws95.power.map(([, , t]) => t!)), 0, 110];
  const powers = new Powers(exponents);
  fc.assert(
    fc.property(fc.double({ min: 0.3, max: 2.5, noNaN: true }), (x) => {
      const found = powers.of(x);
      // A power of 110 holds some ten products, each with half a unit in the last place, doubled by every squaring.
      exponents.forEach((exponent, k) => expect(Math.abs(found[k]! / x ** exponent - 1)).toBeLessThan(110 * Number.EPSILON));
    }),
  );
});

test("an exponent that is no multiple of 1/8 is refused", () => {
  expect(refusedWith(() => new Powers([1, 0.3]))).toBe("input: An exponent is not a multiple of 1/8: 1, 0.3");
});
