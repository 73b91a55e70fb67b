import fc from "fast-check";
import { gaussLegendre, integrate } from "../../../src/core/numeric/gauss-legendre";
import { type CompressedGas, storedEnergy } from "../../../src/core/vessel/stored";
import { refusedWith } from "../refused";

const bottle: CompressedGas = { pressure: 1e7, volume: 0.05, gamma: 1.4, ambient: 101325 };

test("50 L at 100 bar, γ 1.4: Brode 1.24 MJ, isentropic 0.913 MJ, isothermal bound 2.30 MJ, computed apart from this program", () => {
  const { brode, isentropic, isothermal } = storedEnergy(bottle);
  expect(brode / 1e6).toBeCloseTo(1.24, 2);
  expect(isentropic / 1e6).toBeCloseTo(0.913, 3);
  expect(isothermal / 1e6).toBeCloseTo(2.3, 2);
});

const gases = fc.record({
  pressure: fc.double({ min: 1.02e5, max: 1e8, noNaN: true }),
  volume: fc.double({ min: 1e-4, max: 100, noNaN: true }),
  gamma: fc.double({ min: 1.05, max: 1.66, noNaN: true }),
  ambient: fc.constant(101325),
});

test("the isentropic and the isothermal energy are ∫ p dV of their expansions, the useful one less that of the air", () => {
  const points = gaussLegendre(40);
  fc.assert(
    fc.property(gases, (gas) => {
      const { pressure, volume, gamma, ambient } = gas;
      const { isentropic, useful, isothermal } = storedEnergy(gas);
      // over ln V, V dp being smooth there
      const work = (end: number, p: (v: number) => number) =>
        integrate((x) => p(Math.exp(x)) * Math.exp(x), Math.log(volume), Math.log(end), points, 8);
      const end = volume * (pressure / ambient) ** (1 / gamma);
      const adiabat = work(end, (v) => pressure * (volume / v) ** gamma);
      expect(Math.abs(isentropic / adiabat - 1)).toBeLessThan(1e-9);
      expect(Math.abs(useful - (adiabat - ambient * (end - volume)))).toBeLessThan(1e-9 * isentropic);
      const isotherm = work((volume * pressure) / ambient, (v) => (pressure * volume) / v);
      expect(Math.abs(isothermal / isotherm - 1)).toBeLessThan(1e-9);
    }),
  );
});

test("useful < isentropic < isothermal, and isentropic tends to it as γ goes to 1; Brode is the rise of U at constant volume", () =>
  fc.assert(
    fc.property(gases, (gas) => {
      const { brode, isentropic, useful, isothermal } = storedEnergy(gas);
      expect(useful).toBeGreaterThan(0);
      expect(useful).toBeLessThan(isentropic);
      expect(isentropic).toBeLessThan(isothermal);
      expect(storedEnergy({ ...gas, gamma: 1 + 1e-9 }).isentropic / isothermal).toBeCloseTo(1, 7);
      // U = p V/(γ − 1) for a gas of constant Cv
      const energy = (pressure: number) => (pressure * gas.volume) / (gas.gamma - 1);
      expect(Math.abs(brode - (energy(gas.pressure) - energy(gas.ambient)))).toBeLessThan(1e-12 * energy(gas.pressure));
    }),
  ));

describe("refusals", () => {
  test.each([
    [{ pressure: 1e5 }, "Pressure 100000 Pa is not above the ambient pressure, 101325 Pa; pressures are absolute"],
    [{ gamma: 1 }, "Gamma 1 is not above 1"],
    [{ gamma: NaN }, "Gamma NaN is not above 1"],
    [{ volume: 0 }, "Volume 0 m3 is not above 0 m3"],
    [{ ambient: 0 }, "Ambient pressure 0 Pa is not above 0 Pa"],
  ])("%j", (change, sentence) => expect(refusedWith(() => storedEnergy({ ...bottle, ...change }))).toBe(`range: ${sentence}`));
});
