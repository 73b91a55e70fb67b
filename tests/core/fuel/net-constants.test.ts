import { derivedGrossPressureConstants, derivedNetConstants, requireLikely, type WaterFigures } from "../../../src/core/fuel/net-constants";
import { refusedWith } from "../refused";

// CIAAW abridged weights; vaporisation of the NBS tables of 1982, 285.830 - 241.818 kJ/mol, from memory.
const water: WaterFigures = { vaporisation: 44012, waterMass: 18.015, hydrogenMass: 2.016, oxygenMass: 31.998, nitrogenMass: 28.014 };
const pressure = derivedNetConstants("constant-pressure", water);
const volume = derivedNetConstants("constant-volume", water);
const gross = derivedGrossPressureConstants(water);

// Half a unit of the last printed digit. Printed: ISO 1928:2009 and the methods that share its constants, from memory.
test.each([
  ["hydrogen, constant pressure", pressure.hydrogen, 212.2, 0.05],
  ["oxygen, constant pressure", pressure.oxygen, 0.8, 0.05],
  ["moisture, constant pressure", pressure.moisture, 24.43, 0.005],
  ["hydrogen, constant volume", volume.hydrogen, 206.0, 0.05],
  ["moisture, constant volume", volume.moisture, 23.05, 0.005],
  ["hydrogen, gross at constant pressure", gross.hydrogen, 6.15, 0.005],
  ["oxygen, gross at constant pressure", gross.oxygen, 0.8, 0.05],
])("%s: the derived constant rounds to the printed one", (_, derived, printed, half) => {
  expect(Math.abs(derived - printed)).toBeLessThanOrEqual(half);
});

test("nitrogen is the exception: 0.885 derived, 0.8 printed", () => {
  expect(pressure.nitrogen).toBeCloseTo(0.885, 3); // RT/M(N2)/100 by hand: 2478.957/28.014/100
  expect(Math.abs(pressure.nitrogen - 0.8)).toBeGreaterThan(0.05);
  expect(gross.nitrogen).toBe(pressure.nitrogen);
});

test("the choice of the vaporisation: 44.004 (CODATA 1989) and 44.016 kJ/mol each miss one printed constant, and by how little", () => {
  const codata = derivedNetConstants("constant-pressure", { ...water, vaporisation: 44004 });
  expect(212.2 - codata.hydrogen).toBeGreaterThan(0.05); // 212.126: rounds to 212.1
  expect(212.2 - codata.hydrogen).toBeLessThan(0.08);
  const higher = derivedNetConstants("constant-volume", { ...water, vaporisation: 44016 });
  expect(higher.moisture - 23.05).toBeGreaterThan(0.005); // 23.057: rounds to 23.06
  expect(higher.moisture - 23.05).toBeLessThan(0.008);
});

test("at constant volume oxygen and nitrogen have no term", () => {
  expect([volume.oxygen, volume.nitrogen]).toEqual([0, 0]);
});

test("own constants: the misplaced decimal point and other units", () => {
  expect(refusedWith(() => requireLikely("oxygen", 8, pressure.oxygen))).toBe(
    "range: The oxygen constant 8 J/g per % is 10.3 times the derived 0.774722; up to a factor of 3 is accepted",
  );
  expect(refusedWith(() => requireLikely("hydrogen", 0.2122, pressure.hydrogen))).toBe(
    "range: The hydrogen constant 0.2122 J/g per % is 0.001 times the derived 212.165; up to a factor of 3 is accepted",
  );
  expect(refusedWith(() => requireLikely("moisture", 5.83, pressure.moisture))).toContain("is 0.239 times the derived 24.4308"); // kcal/kg
  expect(refusedWith(() => requireLikely("hydrogen", -212, pressure.hydrogen))).toBe(
    "range: The hydrogen constant -212 J/g per % is negative; give sizes, the formula has the signs",
  );
  expect(refusedWith(() => requireLikely("oxygen", 0.8, volume.oxygen))).toBe(
    "range: The oxygen constant 0.8 J/g per % has no place at constant volume: give 0",
  );
  expect(refusedWith(() => requireLikely("oxygen", Infinity, 0.8))).toBe("input: The oxygen constant is not a finite number");
  expect(refusedWith(() => requireLikely("hydrogen", 0, pressure.hydrogen))).toContain("is 0 times the derived");
});

test("own constants: printed ones of any edition pass, and 0 for oxygen and nitrogen", () => {
  for (const value of [0, 0.8, 0.885, 1]) requireLikely("nitrogen", value, pressure.nitrogen);
  requireLikely("oxygen", 0, volume.oxygen);
  expect(requireLikely("moisture", 24.5, pressure.moisture)).toBeUndefined();
});
