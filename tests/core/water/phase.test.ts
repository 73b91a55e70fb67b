import fc from "fast-check";
import { water } from "../../../src/functions/steam";
import { COMPUTED, roundsTo, TABLE_7 } from "./printed";

const { gasConstant, criticalTemperature, criticalDensity } = water.constants;

describe("Table 7 of the release, to every printed digit", () => {
  test.each(TABLE_7)("%d K, %d kg/m³", (temperature, density, ...printed) => {
    const { pressure, cv, soundSpeed, entropy } = water.single(temperature, density);
    const values = [pressure / 1e6, cv / 1e3, soundSpeed, entropy / 1e3];
    expect(values.filter((value, k) => !roundsTo(value, printed[k]!))).toEqual([]);
  });
});

describe("energy, enthalpy and cp computed elsewhere", () => {
  // 12 digits; p, of which h and cp hold derivatives, has 13 in the liquid. At 647 K cp is 3500 kJ/(kg K) and loses two of them.
  test.each(TABLE_7.map(([temperature, density], k) => [temperature, density, ...COMPUTED[k]!] as const))(
    "%d K, %d kg/m³",
    (temperature, density, ...expected) => {
      const { energy, enthalpy, cp } = water.single(temperature, density);
      [energy, enthalpy, cp].forEach((value, k) => expect(Math.abs(value / 1e3 / expected[k]! - 1)).toBeLessThan(1e-12));
    },
  );
});

const temperatures = fc.double({ min: 273.16, max: 1273, noNaN: true });
/** From the thinnest vapour to the densest liquid, evenly by digits. */
const densities = fc.double({ min: -4, max: Math.log10(1200), noNaN: true }).map((exponent) => 10 ** exponent);
/** Away from the critical point, where higher derivatives are too large for differences. */
const states = fc
  .tuple(temperatures, densities)
  .filter(([t, rho]) => Math.abs(t / criticalTemperature - 1) > 0.05 || Math.abs(rho / criticalDensity - 1) > 0.4);

/** Derivative of f at x by differences of fourth order. */
function slope(f: (x: number) => number, x: number): number {
  const h = 3e-4 * x;
  return (f(x - 2 * h) - 8 * f(x - h) + 8 * f(x + h) - f(x + 2 * h)) / (12 * h);
}

/** Agreement within 1e-7 of a scale: truncation of the differences at the narrowest term, and 1e-13 of rounding over a step of 3e-4. */
function agree(found: number, expected: number, scale: number): void {
  expect(Math.abs(found - expected) / Math.max(Math.abs(expected), scale)).toBeLessThan(1e-7);
}

describe("identities, against differences over the whole range", () => {
  const each = (check: (temperature: number, density: number) => void) => () =>
    fc.assert(fc.property(states, ([temperature, density]) => check(temperature, density)));

  test(
    "∂p/∂ρ and ∂p/∂T",
    each((t, rho) => {
      const { pressureByDensity, pressureByTemperature } = water.single(t, rho);
      agree(
        pressureByDensity,
        slope((x) => water.single(t, x).pressure, rho),
        gasConstant * t,
      );
      agree(
        pressureByTemperature,
        slope((x) => water.single(x, rho).pressure, t),
        gasConstant * rho,
      );
    }),
  );

  test(
    "cv is ∂u/∂T, and T ∂s/∂T",
    each((t, rho) => {
      const { cv } = water.single(t, rho);
      agree(
        cv,
        slope((x) => water.single(x, rho).energy, t),
        gasConstant,
      );
      agree(cv, t * slope((x) => water.single(x, rho).entropy, t), gasConstant);
    }),
  );

  test(
    "Maxwell: ∂s/∂v at constant T is ∂p/∂T at constant v",
    each((t, rho) => {
      const { pressureByTemperature } = water.single(t, rho);
      agree(pressureByTemperature, -rho * rho * slope((x) => water.single(t, x).entropy, rho), gasConstant * rho);
    }),
  );

  test(
    "∂u/∂v at constant T is T ∂p/∂T − p",
    each((t, rho) => {
      const { pressure, pressureByTemperature } = water.single(t, rho);
      agree(t * pressureByTemperature - pressure, -rho * rho * slope((x) => water.single(t, x).energy, rho), gasConstant * rho * t);
    }),
  );

  test(
    "cp is ∂h/∂T along an isobar, w² is ∂p/∂ρ along an isentrope, where the phase is stable",
    each((t, rho) => {
      const { cv, cp, soundSpeed, pressureByDensity, pressureByTemperature } = water.single(t, rho);
      if (pressureByDensity < gasConstant * t * 0.05) return;
      const isobar = (x: number) => rho - (pressureByTemperature / pressureByDensity) * (x - t);
      const isentrope = (x: number) => t + ((t * pressureByTemperature) / (cv * rho * rho)) * (x - rho);
      // First order along the line is enough for the derivative at the point itself.
      agree(
        cp,
        slopeAt((x) => water.single(x, isobar(x)).enthalpy, t),
        gasConstant,
      );
      agree(
        soundSpeed ** 2,
        slopeAt((x) => water.single(isentrope(x), x).pressure, rho),
        gasConstant * t,
      );
    }),
  );
});

/** As `slope`, with a step that no line leaves the states of water by. */
function slopeAt(f: (x: number) => number, x: number): number {
  const h = 1e-4 * x;
  return (f(x - 2 * h) - 8 * f(x - h) + 8 * f(x + h) - f(x + 2 * h)) / (12 * h);
}

test("enthalpy and Gibbs energy are what they are called", () => {
  fc.assert(
    fc.property(states, ([t, rho]) => {
      const { energy, enthalpy, entropy, gibbs, pressure } = water.single(t, rho);
      expect(Math.abs(enthalpy - energy - pressure / rho)).toBeLessThan(1e-12 * (Math.abs(energy) + gasConstant * t));
      expect(Math.abs(gibbs - enthalpy + t * entropy)).toBeLessThan(1e-12 * (Math.abs(enthalpy) + Math.abs(t * entropy)));
    }),
  );
});

test.each([280, 500, 1000])("thin vapour at %d K is an ideal gas", (temperature) => {
  const { pressure, cp, cv, soundSpeed } = water.single(temperature, 1e-9);
  // The second virial coefficient of water is at most 2 m³/kg in size: 2e-9 and, for its derivatives, some times that.
  expect(Math.abs(pressure / (1e-9 * gasConstant * temperature) - 1)).toBeLessThan(5e-9);
  expect(Math.abs((cp - cv) / gasConstant - 1)).toBeLessThan(5e-8);
  expect(Math.abs(soundSpeed ** 2 / ((cp / cv) * gasConstant * temperature) - 1)).toBeLessThan(1e-8);
});
