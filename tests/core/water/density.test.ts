import fc from "fast-check";
import { water } from "../../../src/functions/steam";
import { refusedWith } from "../refused";
import { TABLE_7 } from "./printed";

const { from, to, gasConstant, criticalTemperature } = water.constants;

describe("from the printed pressures of Table 7 back to its densities", () => {
  test.each(TABLE_7)("%d K, %d kg/m³", (temperature, density, megapascal) => {
    const { pressureByDensity } = water.single(temperature, density);
    // Half of the ninth digit of the pressure is what the density may differ by.
    const pressure = Number(megapascal) * 1e6;
    const lastDigit = 10 ** (Math.floor(Math.log10(pressure)) - 8);
    expect(Math.abs(water.density(temperature, pressure) - density)).toBeLessThan((0.51 * lastDigit) / pressureByDensity);
  });
});

test("there and back: density of the pressure of a density, in every stable phase", () => {
  // To 600 MPa, below every melting pressure.
  const states = fc
    .tuple(fc.double({ min: from, max: to, noNaN: true }), fc.double({ min: -6, max: 3.05, noNaN: true }))
    .map(([temperature, exponent]) => [temperature, 10 ** exponent] as const)
    .filter(([temperature, given]) => water.single(temperature, given).pressure < 6e8);
  fc.assert(
    fc.property(states, ([temperature, given]) => {
      const state = water.state(temperature, given);
      if (state.phase === "two-phase") return;
      const { density, pressureByDensity, pressure } = water.single(temperature, given);
      // The pressure is known to 5e-13 of ρRT, see saturation-line.test.ts; a soft fluid makes more of it.
      const room = (5e-13 * density * gasConstant * temperature) / pressureByDensity;
      const phase = state.phase === "supercritical" || temperature >= criticalTemperature ? undefined : state.phase;
      expect(Math.abs(water.density(temperature, pressure, phase) - density)).toBeLessThan(1e-13 * density + room);
    }),
    { numRuns: 1000 },
  );
});

test("the saturation pressure gives the density of the phase that is named", () => {
  fc.assert(
    fc.property(fc.double({ min: from, max: criticalTemperature - 1, noNaN: true }), (temperature) => {
      const { pressure, liquid, vapour } = water.saturation(temperature);
      expect(water.density(temperature, pressure, "liquid")).toBe(liquid.density);
      expect(water.density(temperature, pressure, "vapour")).toBe(vapour.density);
      // A little to either side the stable phase needs no name.
      expect(water.density(temperature, pressure * (1 + 1e-8))).toBeGreaterThanOrEqual(liquid.density);
      expect(water.density(temperature, pressure * (1 - 1e-8))).toBeLessThanOrEqual(vapour.density);
    }),
  );
});

describe("refusals", () => {
  test.each([
    [
      400,
      245769.3455657301,
      undefined,
      "input: Pressure 0.245769 MPa at 400 K is the saturation pressure: say whether liquid or vapour is meant",
    ],
    [400, 1e5, "liquid", "range: Pressure 0.1 MPa at 400 K is vapour, not liquid: the saturation pressure is 0.245769 MPa"],
    [400, 1e6, "vapour", "range: Pressure 1 MPa at 400 K is liquid, not vapour: the saturation pressure is 0.245769 MPa"],
    [400, 1.1e9, undefined, "range: The pressure at 400 K is 1100 MPa, above 1000 MPa, the limit of IAPWS-95"],
    [280, 9e8, undefined, "range: The pressure at 280 K is 900 MPa, above 712.374 MPa, where water freezes to ice VI"],
    [400, 0, undefined, "range: Pressure 0 Pa is not above 0 Pa"],
    [400, NaN, undefined, "range: Pressure NaN Pa is not above 0 Pa"],
    [273, 1e5, undefined, "range: Temperature 273 K is below 273.16 K, the triple point and the lower limit of IAPWS-95"],
  ] as const)("%d K, %d Pa, %s", (temperature, pressure, phase, sentence) => {
    expect(refusedWith(() => water.density(temperature, pressure, phase))).toBe(sentence);
  });
});
