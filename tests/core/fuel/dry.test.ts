import fc from "fast-check";
import { dryContent, waterShares } from "../../../src/core/fuel/dry";
import { refusedWith } from "../refused";

const shares = waterShares(1.008, 15.999); // CIAAW abridged weights

test("shares of the elements in water", () => {
  expect(shares.hydrogen).toBeCloseTo(0.1119, 4); // printed in methods for solid fuels, four decimals, from memory
  expect(shares.oxygen).toBeCloseTo(0.8881, 4); // idem
  expect(shares.hydrogen + shares.oxygen).toBeCloseTo(1, 15);
});

test("by hand: 6.5 % hydrogen and 46 % carbon found at 8 % moisture", () => {
  expect(dryContent(6.5, 8, shares.hydrogen, "Hydrogen")).toBeCloseTo((6.5 - 0.1119 * 8) / 0.92, 3); // rounding of 0.1119: 0.00005 × 8/0.92
  expect(dryContent(46, 8, 0, "Carbon")).toBe(50);
});

test("the moisture's hydrogen, counted twice, takes 23.7 J/g from a net value for each per cent of moisture", () => {
  const tooMuch = 6.5 - dryContent(6.5, 1, shares.hydrogen, "Hydrogen") * 0.99; // in 100 g of moist sample, 1 g water
  expect(212.2 * tooMuch).toBeCloseTo(23.7, 1); // 212.2 × 0.1119 = 23.745
});

test("water mixed into a dry sample, and its elements taken off again", () => {
  const percent = fc.double({ min: 0.01, max: 40, noNaN: true });
  fc.assert(
    fc.property(
      percent,
      fc.double({ min: 0, max: 90, noNaN: true }),
      fc.constantFrom(shares.hydrogen, shares.oxygen, 0),
      (dry, moisture, share) => {
        const found = dry * (1 - moisture / 100) + share * moisture;
        expect(dryContent(found, moisture, share, "Content")).toBeCloseTo(dry, 9);
      },
    ),
  );
});

test("pure water holds its own elements and nothing else", () => {
  expect(dryContent(shares.oxygen * 50, 50, shares.oxygen, "Oxygen")).toBe(0);
});

test("refusals", () => {
  expect(refusedWith(() => dryContent(0.5, 8, shares.hydrogen, "Hydrogen"))).toBe(
    "range: Hydrogen 0.5 % is less than the 0.895254 % that 8 % moisture holds",
  );
  expect(refusedWith(() => dryContent(7, 8, shares.oxygen, "Oxygen"))).toBe(
    "range: Oxygen 7 % is less than the 7.10475 % that 8 % moisture holds",
  );
  expect(refusedWith(() => dryContent(95, 10, 0, "Carbon"))).toBe("range: Carbon 95 % is more than a sample of 10 % moisture can hold");
  expect(refusedWith(() => dryContent(5, 100, 0, "Carbon"))).toBe("range: Moisture 100 % is not from 0 % to below 100 %");
  expect(refusedWith(() => dryContent(101, 1, 0, "Carbon"))).toBe("range: Carbon 101 % is not between 0 % and 100 %");
  expect(refusedWith(() => dryContent(5, NaN, 0, "Carbon"))).toContain("Moisture NaN %");
});
