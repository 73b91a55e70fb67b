import fc from "fast-check";
import { constantProperty, type LiquidFull, liquidFullRise, propertyLine } from "../../../src/core/vessel/liquid-full";
import { refusedWith } from "../refused";

/** Water near 25 °C in carbon steel: expansion 210e-6 1/K against 36e-6 1/K, compressibility 4e-10 1/Pa, modulus 2e11 Pa. */
const water = (slenderness: number): LiquidFull => ({
  expansion: constantProperty(210e-6),
  compressibility: constantProperty(4e-10),
  wallExpansion: 36e-6,
  yielding: slenderness / 2e11,
});
/** Expansion of water, 1/K, at 20 °C, 40 °C and 60 °C; handbook values from memory. */
const WATER: readonly (readonly [number, number])[] = [
  [293.15, 207e-6],
  [313.15, 385e-6],
  [333.15, 523e-6],
];
const measured: LiquidFull = { ...water(0), expansion: propertyLine(WATER, "expansion") };

test.each([
  [0, 0.435],
  [10, 0.387],
  [100, 0.193],
])("water in steel of D/t %d: %d MPa for one kelvin, computed apart from this program", (slenderness, megapascals) => {
  expect(liquidFullRise(water(slenderness), 298.15, 299.15) / 1e6).toBeCloseTo(megapascals, 3);
});

test("rigid and without expansion of its own: β/κ for each kelvin; water at 25 °C 5.7 bar/K", () => {
  const rigid = { ...water(0), expansion: constantProperty(257e-6), compressibility: constantProperty(4.52e-10), wallExpansion: 0 };
  expect(liquidFullRise(rigid, 298.15, 299.15) / 1e5).toBeCloseTo(5.7, 1);
});

describe("properties by temperature", () => {
  test("expansion on straight lines, κ constant: trapezoids by hand", () => {
    const trapezoid = ((207 + 385) / 2) * 1e-6 * 20 + ((385 + 523) / 2) * 1e-6 * 20 - 36e-6 * 40;
    expect(liquidFullRise(measured, 293.15, 333.15)).toBeCloseTo(trapezoid / 4e-10, 4);
  });

  test("κ on a straight line, β constant: a logarithm", () => {
    const kappa = propertyLine(
      [
        [300, 4e-10],
        [400, 8e-10],
      ],
      "compressibility",
    );
    const rise = liquidFullRise({ ...water(10), compressibility: kappa }, 300, 400);
    expect(rise / (((210e-6 - 36e-6) * 100 * Math.log(8.5 / 4.5)) / 4e-10)).toBeCloseTo(1, 12);
  });

  test("a flat line is a constant", () => {
    const flat = propertyLine(
      [
        [290, 210e-6],
        [350, 210e-6],
      ],
      "expansion",
    );
    expect(liquidFullRise({ ...water(10), expansion: flat }, 298.15, 320) / liquidFullRise(water(10), 298.15, 320)).toBeCloseTo(1, 12);
  });

  test("two stretches add up to the whole, and the way back takes it away", () =>
    fc.assert(
      fc.property(fc.double({ min: 293.15, max: 333.15, noNaN: true }), fc.double({ min: 293.15, max: 333.15, noNaN: true }), (a, b) => {
        const whole = liquidFullRise(measured, 293.15, b);
        expect(liquidFullRise(measured, 293.15, a) + liquidFullRise(measured, a, b)).toBeCloseTo(whole, 4);
        expect(liquidFullRise(measured, b, a) + liquidFullRise(measured, a, b)).toBe(0);
      }),
    ));
});

test("what makes a vessel yield lowers the rise; a wall that expands does too", () => {
  const rise = (change: Partial<LiquidFull>) => liquidFullRise({ ...water(0), ...change }, 298.15, 318.15);
  expect(rise({ yielding: 5e-11 })).toBeLessThan(rise({}));
  expect(rise({ wallExpansion: 0 })).toBeGreaterThan(rise({}));
});

describe("refusals", () => {
  test.each([
    [
      () => liquidFullRise(measured, 293.15, 334),
      "range: Temperature T2 334 K is outside 293.15 K to 333.15 K, where the expansion is given",
    ],
    [
      () => liquidFullRise(measured, 273.15, 300),
      "range: Temperature T1 273.15 K is outside 293.15 K to 333.15 K, where the expansion is given",
    ],
    [() => propertyLine([[300, 1]], "expansion"), "input: The expansion by temperature needs 2 points or more, not 1"],
    [
      () =>
        propertyLine(
          [
            [300, 1],
            [300, 2],
          ],
          "compressibility",
        ),
      "input: The temperatures of the compressibility must rise: 300 K follows 300 K",
    ],
  ])("%#", (call, sentence) => expect(refusedWith(call)).toBe(sentence));
});
