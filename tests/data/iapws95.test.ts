import { iapws95 } from "../../src/data/iapws95";
import { saturation } from "../../src/data/saturation";
import { sourceOf } from "../../src/data/sources";

test("the 56 terms of the residual part, in rows of equal length", () => {
  const { power, gaussian, critical, ideal } = iapws95;
  expect([power.length, gaussian.length, critical.length, ideal.oscillators.length]).toEqual([51, 3, 2, 5]);
  expect([power, gaussian, critical, ideal.oscillators].map((rows) => [...new Set(rows.map((row) => row.length))])).toEqual([
    [4],
    [7],
    [8],
    [2],
  ]);
});

test("figures are kept as printed, in kJ and MPa, and turned once", () => {
  expect([iapws95.gasConstant, iapws95.highestPressure, iapws95.melting[0]!.pressure]).toEqual([461.51805, 1e9, 350.1e6]);
});

test("one critical and one triple temperature for all equations of water", () => {
  expect([iapws95.criticalTemperature, iapws95.from]).toEqual([saturation.criticalTemperature, saturation.tripleTemperature]);
});

test("every source is known", () => {
  for (const key of [iapws95.source, iapws95.saturatedSource, iapws95.meltingSource]) expect(sourceOf(key).citation).toMatch(/IAPWS/);
});

// IAPWS SR1-86(1992), check values (from memory), to their six digits.
test.each([
  [273.16, 999.789, 0.00485426],
  [373.1243, 958.365, 0.597586],
  [647.096, 322, 322],
])("auxiliary densities at %d K", (temperature, liquid, vapour) => {
  const theta = 1 - temperature / iapws95.criticalTemperature;
  const sum = (rows: readonly (readonly number[])[], root: number) => rows.reduce((added, [b, e]) => added + b! * theta ** (e! / root), 0);
  expect(Number((iapws95.criticalDensity * (1 + sum(iapws95.saturatedLiquid, 3))).toPrecision(6))).toBe(liquid);
  expect(Number((iapws95.criticalDensity * Math.exp(sum(iapws95.saturatedVapour, 6))).toPrecision(6))).toBe(vapour);
});
