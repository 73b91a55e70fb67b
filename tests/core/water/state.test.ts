import fc from "fast-check";
import { water } from "../../../src/functions/steam";
import { refusedWith } from "../refused";
import { FORTY_DIGITS_CV } from "./printed";

const { criticalTemperature, criticalDensity, from, to } = water.constants;

/** A temperature below the critical one and a mass fraction of vapour between 0 and 1. */
const wet = fc.record({
  temperature: fc.double({ min: from, max: criticalTemperature - 0.01, noNaN: true }),
  fraction: fc.double({ min: 1e-6, max: 1 - 1e-6, noNaN: true }),
});

function densityOf(temperature: number, fraction: number): number {
  const { liquid, vapour } = water.saturation(temperature);
  return 1 / (fraction / vapour.density + (1 - fraction) / liquid.density);
}

describe("two phases", () => {
  test("the lever rule gives back the fraction, and both routes to energy and entropy agree", () => {
    fc.assert(
      fc.property(wet, ({ temperature, fraction }) => {
        const density = densityOf(temperature, fraction);
        const { liquid, vapour, pressure } = water.saturation(temperature);
        const state = water.state(temperature, density);
        expect(state.phase).toBe("two-phase");
        expect(state.pressure).toBe(pressure);
        // The fraction is a difference of volumes, at the triple point 1e-3 of 200 m³/kg.
        expect(Math.abs(state.vapourFraction! - fraction)).toBeLessThan(1e-12);
        // From the liquid on, by the heat of evaporation: T Δs at constant temperature, and u = h − p v.
        const evaporated = fraction * (vapour.enthalpy - liquid.enthalpy);
        expect(Math.abs(state.energy - (liquid.enthalpy + evaporated - pressure / density))).toBeLessThan(1e-5);
        expect(Math.abs(state.entropy - (liquid.entropy + evaporated / temperature))).toBeLessThan(1e-7);
      }),
    );
  });

  test("cv in closed form is the derivative of the energy at constant overall density", () => {
    fc.assert(
      fc.property(
        fc.double({ min: from + 1, max: criticalTemperature - 2, noNaN: true }),
        fc.double({ min: 0.05, max: 0.95, noNaN: true }),
        (temperature, fraction) => {
          const density = densityOf(temperature, fraction);
          const h = 2e-3;
          const u = (k: number) => water.state(temperature + k * h, density).energy;
          const numerical = (u(-2) - 8 * u(-1) + 8 * u(1) - u(2)) / (12 * h);
          // Rounding of u, 1e-9 J/kg of MJ/kg, over the step, and 1e-7 for the steep end.
          expect(Math.abs(water.state(temperature, density).cv / numerical - 1)).toBeLessThan(3e-7);
        },
      ),
    );
  });

  // Within 0.002 K the densities come from the critical law, whose width is right to 0.6 %.
  test.each(FORTY_DIGITS_CV)("cv %d K below the critical temperature, to 0.4 %%", (distance, cv) => {
    expect(Math.abs(water.state(criticalTemperature - distance, criticalDensity).cv / cv - 1)).toBeLessThan(4e-3);
  });

  test("pressure and energy run on across the end of the two phases; cv falls", () => {
    for (const temperature of [280, 400, 550, 640]) {
      const { liquid, vapour } = water.saturation(temperature);
      for (const { density } of [liquid, vapour]) {
        const [inside, outside] = density === liquid.density ? [density * (1 - 1e-9), density] : [density * (1 + 1e-9), density];
        const [two, one] = [water.state(temperature, inside), water.state(temperature, outside)];
        expect([two.phase, one.phase]).toEqual(["two-phase", density === liquid.density ? "liquid" : "vapour"]);
        expect(Math.abs(two.energy / one.energy - 1)).toBeLessThan(1e-6);
        // Roundings of the parts that the pressure of a cold liquid is summed from, see saturation-line.test.ts.
        expect(Math.abs(two.pressure - one.pressure)).toBeLessThan(1e-9 * two.pressure + 5e-13 * density * 461.5 * temperature);
        expect(two.cv).toBeGreaterThan(one.cv);
      }
    }
  });
});

describe("names of the phases", () => {
  test.each([
    [300, 1000, "liquid"],
    [300, 1e-6, "vapour"],
    [300, 500, "two-phase"],
    [646, 700, "liquid"],
    [647, 322, "two-phase"],
    [criticalTemperature, 300, "vapour"],
    [criticalTemperature, 340, "supercritical"],
    [700, 10, "vapour"],
    [700, 400, "supercritical"],
  ])("%d K, %d kg/m³: %s", (temperature, density, phase) => {
    const state = water.state(temperature, density);
    expect(state.phase).toBe(phase);
    expect("vapourFraction" in state).toBe(phase === "two-phase");
  });

  test("one phase is that of the formulation, whether the quick test or the saturation decides", () => {
    fc.assert(
      fc.property(
        fc.double({ min: from, max: criticalTemperature, noNaN: true }),
        fc.double({ min: 0.9, max: 1.1, noNaN: true }),
        (t, near) => {
          const { liquid, vapour } = water.saturation(t);
          for (const density of [liquid.density * near, vapour.density * near]) {
            const isOne = density >= liquid.density || density <= vapour.density;
            // A liquid a tenth denser may freeze or lie beyond 1000 MPa; then there is no state.
            if (isOne && t < 310 && density > liquid.density) continue;
            const state = water.state(t, density);
            expect(state.phase === "two-phase").toBe(!isOne);
            if (isOne) expect(state.cv).toBe(water.single(t, density).cv);
          }
        },
      ),
    );
  });
});

/** States to 600 MPa, below every melting pressure. */
const allowed = fc
  .tuple(fc.double({ min: from, max: to, noNaN: true }), fc.double({ min: -6, max: 3.05, noNaN: true }))
  .map(([temperature, exponent]) => [temperature, 10 ** exponent] as const)
  .filter(([temperature, density]) => water.single(temperature, density).pressure < 6e8);

test("every state within the limits has finite numbers, a positive cv and a pressure that does not fall with density", () => {
  fc.assert(
    fc.property(allowed, ([temperature, density]) => {
      const [state, denser] = [water.state(temperature, density), water.state(temperature, density * 1.001)];
      expect([state.pressure, state.energy, state.entropy, state.cv].every(Number.isFinite)).toBe(true);
      expect(state.cv).toBeGreaterThan(0);
      if (state.phase === "two-phase" && denser.phase === "two-phase") expect(denser.pressure).toBe(state.pressure);
      else expect(denser.pressure).toBeGreaterThan(state.pressure);
    }),
    { numRuns: 1000 },
  );
});

describe("refusals", () => {
  test.each([
    [300, 1400, "range: Density 1400 kg/m3 at 300 K would need 2534.16 MPa, above 1000 MPa, the limit of IAPWS-95"],
    [1273, 1e200, "range: Density 1e+200 kg/m3 would need far more than 1000 MPa, the limit of IAPWS-95"],
    [290, 1240, "range: Density 1240 kg/m3 at 290 K would need 981.86 MPa, above 845.449 MPa, where water freezes to ice VI"],
    [273.2, 1200, "range: Density 1200 kg/m3 at 273.2 K would need 689.135 MPa, above 630.155 MPa, where water freezes to ice V"],
    [300, 0, "range: Density 0 kg/m3 is not above 0 kg/m3"],
    [300, -1, "range: Density -1 kg/m3 is not above 0 kg/m3"],
    [300, NaN, "range: Density NaN kg/m3 is not above 0 kg/m3"],
    [273.15, 1000, "range: Temperature 273.15 K is below 273.16 K, the triple point and the lower limit of IAPWS-95"],
    [1273.5, 1, "range: Temperature 1273.5 K is above 1273 K, the upper limit of IAPWS-95"],
    [
      criticalTemperature,
      criticalDensity,
      "range: The heat capacity of water has no finite value at the critical point, 647.096 K and 322 kg/m3",
    ],
  ])("%d K, %d kg/m³", (temperature, density, sentence) => {
    expect(refusedWith(() => water.state(temperature, density))).toBe(sentence);
  });
});
