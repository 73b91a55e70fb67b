import fc from "fast-check";
import { Helmholtz } from "../../../src/core/water/helmholtz";
import { iapws95 } from "../../../src/data/iapws95";
import { roundsTo, TABLE_6 } from "./printed";

const helmholtz = new Helmholtz(iapws95);

describe("Table 6 of the release, to every printed digit", () => {
  test.each(TABLE_6)("$temperature K, $density kg/m³", ({ temperature, density, ideal, residual }) => {
    const [delta, tau] = [density / iapws95.criticalDensity, iapws95.criticalTemperature / temperature];
    const raw = ({ phi, d, dd, t, tt, dt }: ReturnType<Helmholtz["residual"]>) => [
      phi,
      d / delta,
      dd / delta ** 2,
      t / tau,
      tt / tau ** 2,
      dt / (delta * tau),
    ];
    const found = helmholtz.ideal(delta, tau);
    const wrong = (values: number[], printed: readonly string[]) => values.filter((value, k) => !roundsTo(value, printed[k]!));
    expect(wrong(raw(helmholtz.residual(delta, tau)), residual)).toEqual([]);
    expect(wrong(raw({ ...found, d: 1, dd: -1, dt: 0 }), ideal)).toEqual([]);
  });
});

test("the state before does not matter: what is kept of a temperature is that of the temperature asked for", () => {
  const fresh = new Helmholtz(iapws95).residual(1.1, 1.3);
  helmholtz.residual(1.1, 0.7);
  helmholtz.residual(0.2, 1.3);
  expect(helmholtz.residual(1.1, 1.3)).toEqual(fresh);
  expect(helmholtz.ideal(2, 0.9)).toEqual(new Helmholtz(iapws95).ideal(2, 0.9));
});

test("a number for every density above 0, also where nothing of water is left", () => {
  fc.assert(
    fc.property(fc.double({ min: -300, max: 60, noNaN: true }), fc.double({ min: 0.4, max: 2.4, noNaN: true }), (exponent, tau) => {
      expect(Object.values(helmholtz.residual(10 ** exponent, tau)).filter(Number.isNaN)).toEqual([]);
    }),
  );
});

test("at the critical point all is finite but the second derivative with τ, which grows without bound", () => {
  const { tt, ...rest } = helmholtz.residual(1, 1);
  expect(tt).toBe(-Infinity);
  expect(Object.values(rest).every(Number.isFinite)).toBe(true);
  // Beside it the first derivatives run into those at the point: δ φδ = p/(ρRT) − 1.
  expect(helmholtz.residual(1 + 1e-9, 1 + 1e-9).d).toBeCloseTo(rest.d, 7);
});
