/** The check of an oxygen vessel's charge: amounts computed apart, each verdict, and that worse never looks better. */
import fc from "fast-check";
import { checkCharge, type ChargePart } from "../../../src/core/calorimeter/charge";
import { chargeRules } from "../../../src/data/calorimetry";
import { refusedWith } from "../refused";

const OXYGEN = 31.998;
const benzoic: ChargePart = { mass: 1, specificEnergy: 26434, oxygenPerGram: 7.5 / 122.123 };
const limits = { energy: 35000, pressure: 4 };
const check = (parts: readonly ChargePart[], pressure = 2.5, volume = 340, unknown = false, own = limits) =>
  checkCharge(parts, pressure, volume, own, unknown, chargeRules, OXYGEN);

test("1 g of benzoic acid, 0.34 L, 2.5 MPa: 0.343 mol of oxygen against 0.0614 mol", () => {
  const found = check([benzoic]);
  expect(found.oxygen).toBeCloseTo((2.5e6 * 340e-6) / (8.314462618 * 298.15), 9); // p V/(R T)
  expect(found.oxygenNeeded).toBeCloseTo(0.061413, 6); // 7.5 mol for each mole of C7H6O2
  expect(found.oxygenRatio).toBeCloseTo(5.58, 2);
  expect(found.energyShare).toBeCloseTo(26434 / 35000, 12);
  expect([found.verdict, found.reasons]).toEqual(["within the limits given", []]);
});

test("without a formula oxygen is reckoned at 13.1 kJ for each gram; for benzoic acid that is 3 % off", () => {
  const found = check([{ mass: 1, specificEnergy: 26434 }]);
  expect(found.oxygenNeeded).toBeCloseTo(26434 / 13100 / OXYGEN, 12);
  expect(found.oxygenNeeded / check([benzoic]).oxygenNeeded).toBeCloseTo(1.027, 3);
});

test.each([
  [
    "above the energy limit",
    [{ ...benzoic, mass: 1.4 }],
    2.5,
    340,
    false,
    "Do not fire: the charge holds 37007.6 J, above the vessel's limit of 35000 J",
  ],
  ["above the pressure limit", [benzoic], 4.2, 340, false, "Do not fire: oxygen at 4.2 MPa is above the vessel's limit of 4 MPa"],
  [
    "too little oxygen",
    [benzoic],
    2.5,
    100,
    false,
    "Do not fire: the oxygen is 1.64 times what complete combustion needs; at least 2 times is asked for",
  ],
  [
    "unknown and large",
    [benzoic],
    2.5,
    340,
    true,
    "Do not fire: the sample is unknown and the charge is 75.5 % of the energy limit; stay below 50 %",
  ],
] as const)("do not fire: %s", (_, parts, pressure, volume, unknown, reason) => {
  const found = check(parts, pressure, volume, unknown);
  expect(found.verdict).toBe("do not fire");
  expect(found.reasons[0]).toBe(reason);
});

test.each([
  ["80 % of the energy limit", [{ ...benzoic, mass: 1.1 }], 2.5, false, "Caution: the charge is 83.1 % of the vessel's energy limit"],
  ["3.04 MPa", [benzoic], 3.04, false, "Caution: oxygen at 3.04 MPa is at or above 30 atm, 3.03975 MPa"],
  ["30 atm, printed as 3.04 MPa", [benzoic], 30 * 0.101325, false, "Caution: oxygen at 3.03975 MPa is at or above 30 atm, 3.03975 MPa"],
  ["29.9 atm is still below", [benzoic], 29.9 * 0.101325, false, undefined],
  [
    "unknown and small",
    [{ ...benzoic, mass: 0.3 }],
    2.5,
    true,
    "Caution: the sample is unknown; begin with a small charge and raise it step by step",
  ],
] as const)("caution: %s", (_, parts, pressure, unknown, reason) => {
  const found = check(parts, pressure, 340, unknown);
  expect(found.verdict).toBe(reason === undefined ? "within the limits given" : "caution");
  expect(found.reasons[0]).toBe(reason);
});

test("every reason is told, the gravest first", () => {
  const { reasons } = check([{ ...benzoic, mass: 3 }], 4.2, 100, true);
  expect(reasons.map((text) => text.split(":")[0])).toEqual(["Do not fire", "Do not fire", "Do not fire"]);
});

test("more fuel, more pressure or tighter limits never improve the verdict", () => {
  const rank = ["within the limits given", "caution", "do not fire"];
  const some = (min: number, max: number) => fc.double({ min, max, noNaN: true });
  fc.assert(
    fc.property(some(0.1, 2), some(1.5, 4.5), some(20, 400), some(0.1, 0.99), fc.boolean(), (mass, pressure, volume, part, unknown) => {
      const verdictOf = (grams: number, energy: number) =>
        rank.indexOf(check([{ ...benzoic, mass: grams }], pressure, volume, unknown, { energy, pressure: 4 }).verdict);
      expect(verdictOf(mass, 35000)).toBeGreaterThanOrEqual(verdictOf(mass * part, 35000));
      expect(verdictOf(mass, 35000 * part)).toBeGreaterThanOrEqual(verdictOf(mass, 35000));
    }),
  );
});

test("an empty charge and limits of zero are refused", () => {
  expect(refusedWith(() => check([]))).toBe("input: The charge is empty: give the mass of each part");
  expect(refusedWith(() => check([benzoic], 2.5, 340, false, { energy: 0, pressure: 4 }))).toBe(
    "range: The limits of the vessel must be above zero",
  );
});
