import fc from "fast-check";
import { byVolume, netOfAviationFuel, netOfLiquid } from "../../../src/core/fuel/liquid";
import { refusedWith } from "../refused";

const line = { intercept: 10025, slope: 0.7195, from: 43000, to: 50000 }; // ASTM D240, from memory

test("diesel, 45.70 MJ/kg gross and 13.3 % hydrogen", () => {
  expect(netOfLiquid(45700, 13.3, 212.2)).toBeCloseTo(42877.74, 9); // by hand: 45.70 - 0.2122 × 13.3
  expect(netOfAviationFuel(45700, line)).toBeCloseTo(42906.15, 9); // by hand: 10.025 + 0.7195 × 45.70
});

test("the estimate for aviation fuels is that of a fuel whose hydrogen grows with its gross value", () => {
  fc.assert(
    fc.property(fc.double({ min: 45000, max: 48000, noNaN: true }), (gross) => {
      const hydrogen = (gross - netOfAviationFuel(gross, line)) / 212.2;
      expect(hydrogen).toBeGreaterThan(12); // aviation gasolines and kerosines: 13 % to 16 %
      expect(hydrogen).toBeLessThan(16.5);
    }),
  );
});

test("by volume: J/mL", () => {
  expect(byVolume(42877.74, 0.845)).toBeCloseTo(36231.69, 2); // by hand
  expect(refusedWith(() => byVolume(42877, 0))).toBe("range: Density 0 g/cm3 is not above 0 g/cm3");
});

test("refusals", () => {
  expect(refusedWith(() => netOfLiquid(45700, 30, 212.2))).toBe(
    "range: Hydrogen 30 % is above 26 %; methane, the richest in hydrogen, has 25.1 %",
  );
  expect(refusedWith(() => netOfLiquid(45700, 4, 212.2))).toBe(
    "range: Hydrogen 4 % is below 5 %, which hydrocarbon liquids exceed; for other fuels use FUEL.NET",
  );
  expect(refusedWith(() => netOfLiquid(45700, NaN, 212.2))).toContain("Hydrogen NaN %");
  expect(refusedWith(() => netOfLiquid(-1, 13, 212.2))).toBe("range: Gross value -1 J/g is not above 0 J/g");
  expect(refusedWith(() => netOfAviationFuel(30000, line))).toBe(
    "range: Gross value 30000 J/g is outside 43000 to 50000 J/g, the aviation fuels of the estimate without hydrogen: give the hydrogen",
  );
});
