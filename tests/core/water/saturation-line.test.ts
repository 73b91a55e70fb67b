import fc from "fast-check";
import { WaterFormulation } from "../../../src/core/water/formulation";
import { saturationPressure } from "../../../src/core/water/saturation";
import type { WaterPhase } from "../../../src/core/water/types";
import { iapws95 } from "../../../src/data/iapws95";
import { saturation as sr186 } from "../../../src/data/saturation";
import { water } from "../../../src/functions/steam";
import { refusedWith } from "../refused";
import { FORTY_DIGITS, FORTY_DIGITS_NEAREST, roundsTo, TABLE_8 } from "./printed";

const { criticalTemperature, criticalDensity, from } = iapws95;
/** Where the two free energies still differ by enough. */
const NEAREST = 0.002;
const solved = fc.double({ min: from, max: criticalTemperature - NEAREST, noNaN: true });
/** Temperatures that close in on the critical one by decades. */
const closing = fc.double({ min: -9, max: 2, noNaN: true }).map((exponent) => criticalTemperature - 10 ** exponent);

describe("Table 8 of the release, to every printed digit", () => {
  test.each(TABLE_8)("%d K", (temperature, ...printed) => {
    const { pressure, liquid, vapour } = water.saturation(temperature);
    const values = [
      pressure / 1e6,
      liquid.density,
      vapour.density,
      liquid.enthalpy / 1e3,
      vapour.enthalpy / 1e3,
      liquid.entropy / 1e3,
      vapour.entropy / 1e3,
    ];
    expect(values.filter((value, k) => !roundsTo(value, printed[k]!))).toEqual([]);
  });
});

describe("against a solution with 40 digits", () => {
  test.each(FORTY_DIGITS)("%d K", (temperature, liquid, vapour, pressure) => {
    const found = water.saturation(temperature);
    expect(Math.abs(found.pressure / pressure - 1)).toBeLessThan(1e-12);
    // 1e-12 of the density; close to the critical point, where ∂p/∂ρ is small, what 1e-13 of the pressure makes of it.
    const room = ({ density, pressureByDensity }: WaterPhase) => 1e-12 * density + (1e-13 * pressure) / pressureByDensity;
    expect(Math.abs(found.liquid.density - liquid)).toBeLessThan(room(found.liquid));
    expect(Math.abs(found.vapour.density - vapour)).toBeLessThan(room(found.vapour));
  });

  test.each(FORTY_DIGITS_NEAREST)(
    "%d K below the critical temperature: p to 2e-12, the width to 0.6 %%",
    (distance, liquid, vapour, pressure) => {
      const found = water.saturation(criticalTemperature - distance);
      expect(Math.abs(found.pressure / pressure - 1)).toBeLessThan(2e-12);
      expect(Math.abs((found.liquid.density - found.vapour.density) / (liquid - vapour) - 1)).toBeLessThan(6e-3);
      expect(Math.abs((found.liquid.density + found.vapour.density) / (liquid + vapour) - 1)).toBeLessThan(2e-6);
    },
  );
});

test("energy and entropy are 0 for the liquid at the triple point, and the pressure there is that of the release", () => {
  const { liquid, pressure } = water.saturation(from);
  // The constants of the ideal part are printed with 14 digits; u is the difference of parts of 2e6 J/kg.
  expect(Math.abs(liquid.energy)).toBeLessThan(1e-5);
  expect(Math.abs(liquid.entropy)).toBeLessThan(1e-7);
  // 611.654 771 Pa, R6-95 (from memory).
  expect(roundsTo(pressure, "611.654771")).toBe(true);
});

test("equal pressure and Gibbs energy of the phases", () => {
  fc.assert(
    fc.property(solved, (temperature) => {
      const { pressure, liquid, vapour } = water.saturation(temperature);
      expect([liquid.pressure, vapour.pressure]).toEqual([pressure, pressure]);
      for (const { density } of [liquid, vapour]) {
        const single = water.single(temperature, density);
        // In the cold liquid the parts that p/(ρRT) is summed from add up to 2300 in size: with their roundings 2300 × 2.2e-16 = 5e-13.
        expect(Math.abs(single.pressure - pressure)).toBeLessThan(5e-13 * density * iapws95.gasConstant * temperature + 1e-12 * pressure);
      }
      // The pressure is made from this equality; what is left are the last digits of 1e7 J/kg.
      expect(Math.abs(liquid.gibbs - vapour.gibbs)).toBeLessThan(1e-8);
      for (const { energy, enthalpy, density } of [liquid, vapour])
        expect(Math.abs(enthalpy - energy - pressure / density)).toBeLessThan(1e-8);
      expect(liquid.density).toBeGreaterThan(vapour.density);
    }),
  );
});

test("Clapeyron: the slope is (h'' − h')/(T (v'' − v')), and the derivative of the pressure", () => {
  fc.assert(
    fc.property(fc.double({ min: from + 0.1, max: criticalTemperature - 1, noNaN: true }), (temperature) => {
      const { slope, liquid, vapour } = water.saturation(temperature);
      const volume = 1 / vapour.density - 1 / liquid.density;
      const latent = (vapour.enthalpy - liquid.enthalpy) / (temperature * volume);
      // Entropies and enthalpies are differences of parts of some MJ/kg, near the critical point small ones.
      expect(Math.abs(latent / slope - 1)).toBeLessThan(1e-10);
      const h = 0.02;
      const p = (k: number) => water.saturation(temperature + k * h).pressure;
      expect(Math.abs((p(-2) - 8 * p(-1) + 8 * p(1) - p(2)) / (12 * h) / slope - 1)).toBeLessThan(1e-7);
    }),
  );
});

describe("the critical point", () => {
  test("both phases have the critical density, the pressure is 22.064 MPa", () => {
    const { liquid, vapour, pressure, slope } = water.saturation(criticalTemperature);
    expect([liquid.density, vapour.density]).toEqual([criticalDensity, criticalDensity]);
    // Wagner and Pruß: 22.064 MPa; the formulation reproduces it within its rounding.
    expect(Math.abs(pressure / 22.064e6 - 1)).toBeLessThan(1e-12);
    expect(slope).toBeCloseTo(water.single(criticalTemperature, criticalDensity).pressureByTemperature, 6);
  });

  test("towards it pressure and vapour density rise, liquid density falls, each without a step", () => {
    const temperatures = Array.from({ length: 1200 }, (_, k) => criticalTemperature - 10 ** (2 - k / 100));
    const all = temperatures.map((temperature) => water.saturation(temperature));
    all.slice(1).forEach(({ pressure, liquid, vapour, temperature }, k) => {
      const before = all[k]!;
      if (temperature === before.temperature) return;
      // The last decades move the pressure by less than its last digit.
      expect(pressure / before.pressure).toBeGreaterThan(criticalTemperature - temperature < 1e-6 ? 1 - 1e-15 : 1);
      expect(liquid.density).toBeLessThan(before.liquid.density);
      expect(vapour.density).toBeGreaterThan(before.vapour.density);
      const width = before.liquid.density - before.vapour.density;
      // One hundredth of a decade narrows the square root by 1.2 %, and the width by less.
      expect(1 - (liquid.density - vapour.density) / width).toBeLessThan(0.012);
    });
  });

  test("where the critical law takes over, neither pressure nor slope nor density jumps", () => {
    const [above, below] = [NEAREST - 1e-9, NEAREST + 1e-9].map((distance) => water.saturation(criticalTemperature - distance));
    expect(Math.abs((above!.pressure - below!.pressure - 2e-9 * below!.slope) / below!.pressure)).toBeLessThan(1e-12);
    expect(Math.abs(above!.slope / below!.slope - 1)).toBeLessThan(1e-6);
    expect(Math.abs(above!.liquid.density - below!.liquid.density)).toBeLessThan(1e-5);
  });
});

/** Counts how often the formulation is evaluated. */
class Counted extends WaterFormulation {
  evaluations = 0;

  override single(temperature: number, density: number): WaterPhase {
    this.evaluations++;
    return super.single(temperature, density);
  }
}

test("at most 12 evaluations of the formulation, at every temperature; none for one that was just asked for", () => {
  const counted = new Counted(iapws95);
  fc.assert(
    fc.property(fc.oneof(solved, closing), (temperature) => {
      const before = counted.evaluations;
      const first = counted.saturation(temperature);
      const after = counted.evaluations;
      expect(after - before).toBeLessThanOrEqual(12);
      expect(counted.saturation(temperature)).toBe(first);
      expect(counted.evaluations).toBe(after);
    }),
    { numRuns: 2000 },
  );
});

test("the auxiliary equation for the pressure lies within its 0.025 % of the formulation", () => {
  // IAPWS SR1-86: ±0.025 % is the uncertainty of the skeleton table it was fitted to (from memory); the two agree ten times better in the middle.
  for (let temperature = from; temperature < criticalTemperature; temperature += 0.5) {
    expect(Math.abs(saturationPressure(temperature, sr186) / water.saturation(temperature).pressure - 1)).toBeLessThan(2.5e-4);
  }
});

test("estimates of the densities lie within 1 % of those solved", () => {
  fc.assert(
    fc.property(fc.oneof(solved, closing), (temperature) => {
      const { liquid, vapour } = water.saturation(temperature);
      const estimate = water.estimate(temperature);
      expect(Math.abs(estimate.liquid / liquid.density - 1)).toBeLessThan(0.01);
      expect(Math.abs(estimate.vapour / vapour.density - 1)).toBeLessThan(0.01);
    }),
    { numRuns: 1000 },
  );
});

// the saturation is solved to 1e-12
test("0.01 °C is the triple point, whatever the last digit of its temperature in kelvin", () => {
  const celsius = 0.01 + 273.15;
  expect(celsius).toBeLessThan(from);
  expect(Math.abs(water.saturation(celsius).pressure / water.saturation(from).pressure - 1)).toBeLessThan(1e-12);
  expect(water.state(celsius, 1).pressure).toBe(water.saturation(celsius).pressure);
  expect(Math.abs(water.density(celsius, 1e5, "liquid") / water.density(from, 1e5, "liquid") - 1)).toBeLessThan(1e-12);
});

describe("refusals", () => {
  test.each([
    [273.1599999, "range: Temperature 273.1599999 K is below 273.16 K, the triple point and the lower limit of IAPWS-95"],
    [273.15, "range: Temperature 273.15 K is below 273.16 K, the triple point and the lower limit of IAPWS-95"],
    [647.0961, "range: Temperature 647.0961 K is above 647.096 K, the critical point: water has no saturation there"],
    [1300, "range: Temperature 1300 K is above 1273 K, the upper limit of IAPWS-95"],
    [NaN, "range: Temperature NaN K is below 273.16 K, the triple point and the lower limit of IAPWS-95"],
  ])("%d K", (temperature, sentence) => {
    expect(refusedWith(() => water.saturation(temperature))).toBe(sentence);
  });
});
