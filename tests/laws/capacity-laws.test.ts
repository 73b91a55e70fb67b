/** Identities that hold for every species of every set of the library. */
import { temperatureAtEnergy } from "../../src/core/capacity/inverse";
import { gaussLegendre, integrate } from "../../src/core/numeric/gauss-legendre";
import { everyCase, intervalsOf, temperaturesOf } from "./support";

test("the library holds the sets", () => expect(everyCase.length).toBeGreaterThan(200));

describe.each(everyCase)("%s", (_, { capacity, record }) => {
  const temperatures = temperaturesOf(capacity);

  test("dU/dT is Cv and dH/dT is Cp", () => {
    for (const t of temperatures) {
      // Central difference with a step of 2e-4 T: its error is the third derivative of U times step²/6, at most some 1e-7 of Cv where
      // Cv changes by its own size over a fifth of T (iron near its Curie point: 1e-6), plus rounding of U over the step.
      const step = Math.min(2e-4 * t, (t - capacity.from) / 2, (capacity.to - t) / 2);
      if (step < 1e-6 * t) continue;
      const rounding = (4e-15 * sizeOf(capacity.enthalpy(t), t)) / step;
      const slopeOf = (f: (t: number) => number) => (f(t + step) - f(t - step)) / (2 * step);
      expect(Math.abs(slopeOf((x) => capacity.energy(x)) - capacity.cv(t))).toBeLessThan(2e-6 * capacity.cv(t) + rounding);
      expect(Math.abs(slopeOf((x) => capacity.enthalpy(x)) - capacity.cp(t))).toBeLessThan(2e-6 * capacity.cp(t) + rounding);
    }
  });

  test("the integral of Cv by quadrature is the rise of U, and that of Cp/T the rise of S, to 1e-9", () => {
    const quadrature = gaussLegendre(32);
    for (const { from, to } of intervalsOf(capacity)) {
      // the lower limit of a later interval belongs to the one before
      const start = from === capacity.from ? from : from * (1 + 1e-13);
      const heat = integrate((t) => capacity.cv(t), start, to, quadrature, 8);
      const rise = capacity.energy(to) - capacity.energy(start);
      expect(Math.abs(heat / rise - 1)).toBeLessThan(1e-9);
      if (!capacity.hasEntropy) continue;
      const entropy = integrate((t) => capacity.cp(t) / t, start, to, quadrature, 8);
      expect(Math.abs(entropy / (capacity.entropy(to) - capacity.entropy(start)) - 1)).toBeLessThan(1e-9);
    }
  });

  test("H − U is RT for a gas and 0 for a solid or liquid; Cp − Cv is R or 0", () => {
    const r = record.phase === "g" ? record.gasConstant : 0;
    expect(capacity.gasConstant).toBe(r);
    for (const t of temperatures) {
      expect(Math.abs(capacity.enthalpy(t) - capacity.energy(t) - r * t)).toBeLessThan(1e-15 * sizeOf(capacity.enthalpy(t), t));
      expect(Math.abs(capacity.cp(t) - capacity.cv(t) - r)).toBeLessThan(4e-15 * sizeOf(capacity.cp(t) * t, t));
    }
  });

  test("the inverse gives the temperature back to 1e-9 K", () => {
    for (const t of temperatures) {
      const found = temperatureAtEnergy(capacity, capacity.energy(t), t);
      expect(Math.abs(found - t)).toBeLessThan(1e-9);
    }
  });

  test("one temperature and a column of them give the same bits", () => {
    const column = Float64Array.from([
      ...temperatures,
      capacity.from,
      capacity.to,
      ...capacity.joints,
      capacity.to + 1,
      NaN,
      capacity.from / 2,
      ...temperatures,
    ]);
    const out = new Float64Array(column.length);
    capacity.cvInto(column, out);
    column.forEach((t, k) => expect(Object.is(out[k], capacity.cv(t))).toBe(true));
  });

  test("Cv is positive and finite everywhere, NaN outside", () => {
    for (const t of [capacity.from, ...temperatures, capacity.to]) {
      expect(capacity.cv(t)).toBeGreaterThan(0);
      expect(capacity.cv(t)).toBeLessThan(Infinity);
    }
    expect(capacity.cv(capacity.from * 0.999)).toBeNaN();
    expect(capacity.cv(capacity.to * 1.001)).toBeNaN();
  });
});

/** Size of the numbers whose rounding counts in H: its value, or the terms of a fit that cancel, some 300 J/(mol K) times T. */
function sizeOf(enthalpy: number, temperature: number): number {
  return Math.abs(enthalpy) + 300 * temperature;
}
