/** Identities that hold for every species of every set of the library. Each test judges the worst of many temperatures. */
import { temperatureAtEnergy } from "../../src/core/capacity/inverse";
import { gaussLegendre, integrate } from "../../src/core/numeric/gauss-legendre";
import { everyCase, intervalsOf, sizeOfTerms, temperaturesOf } from "./support";

const quadrature = gaussLegendre(32);

test("the library holds the sets", () => expect(everyCase.length).toBeGreaterThan(200));

describe.each(everyCase)("%s", (_, { capacity, record }) => {
  const temperatures = temperaturesOf(capacity);
  const r = record.phase === "g" ? record.gasConstant : 0;

  /** Largest deviation as a share of what is allowed; below 1 is good, and NaN fails. */
  const worst = (shareAt: (t: number) => number) => Math.max(...temperatures.map(shareAt));

  test("dU/dT is Cv and dH/dT is Cp", () => {
    const limits = [capacity.from, ...capacity.joints, capacity.to];
    const central = (f: (t: number) => number, t: number, h: number) => (f(t + h) - f(t - h)) / (2 * h);
    const share = (f: (t: number) => number, slope: (t: number) => number) => (t: number) => {
      // Central differences with steps of 4e-4 T and half of it, extrapolated to 0: what is left is the fifth derivative of U times
      // step⁴/30, below 1e-8 of Cv even where Cv changes by its own size over a hundredth of T (iron and sulfur near their transitions).
      const step = Math.min(4e-4 * t, Math.min(...limits.map((limit) => Math.abs(limit - t))) / 2);
      if (step < 1e-5 * t) return 0;
      const found = (4 * central(f, t, step / 2) - central(f, t, step)) / 3;
      const rounding = (4 * Number.EPSILON * sizeOfTerms(capacity, t)) / step;
      return Math.abs(found - slope(t)) / (1e-8 * slope(t) + rounding);
    };
    expect(
      worst(
        share(
          (t) => capacity.energy(t),
          (t) => capacity.cv(t),
        ),
      ),
    ).toBeLessThan(1);
    expect(
      worst(
        share(
          (t) => capacity.enthalpy(t),
          (t) => capacity.cp(t),
        ),
      ),
    ).toBeLessThan(1);
  });

  test("the integral of Cv by quadrature is the rise of U, and that of Cp/T the rise of S, to 1e-9", () => {
    for (const { from, to } of intervalsOf(capacity)) {
      // the lower limit of a later interval belongs to the one before
      const start = from === capacity.from ? from : from * (1 + 1e-13);
      const heat = integrate((t) => capacity.cv(t), start, to, quadrature, 8);
      expect(Math.abs(heat / (capacity.energy(to) - capacity.energy(start)) - 1)).toBeLessThan(1e-9);
      if (!capacity.hasEntropy) continue;
      const entropy = integrate((t) => capacity.cp(t) / t, start, to, quadrature, 8);
      expect(Math.abs(entropy / (capacity.entropy(to) - capacity.entropy(start)) - 1)).toBeLessThan(1e-9);
    }
  });

  test("H − U is RT for a gas and 0 for a solid or liquid; Cp − Cv is R or 0", () => {
    expect(capacity.gasConstant).toBe(r);
    const rounding = (t: number) => 2 * Number.EPSILON * sizeOfTerms(capacity, t);
    expect(worst((t) => Math.abs(capacity.enthalpy(t) - capacity.energy(t) - r * t) / rounding(t))).toBeLessThan(1);
    expect(worst((t) => (Math.abs(capacity.cp(t) - capacity.cv(t) - r) * t) / rounding(t))).toBeLessThan(1);
  });

  test("the inverse gives the temperature back to 1e-9 K", () => {
    expect(worst((t) => Math.abs(temperatureAtEnergy(capacity, capacity.energy(t), t) - t) / 1e-9)).toBeLessThan(1);
  });

  test("one temperature and a column of them give the same bits", () => {
    const edges = [capacity.from, capacity.to, ...capacity.joints, capacity.to + 1, NaN, capacity.from / 2];
    const column = Float64Array.from([...temperatures, ...edges, ...temperatures]);
    const out = new Float64Array(column.length);
    capacity.cvInto(column, out);
    expect([...out]).toEqual([...column].map((t) => capacity.cv(t)));
  });

  test("Cv is positive and finite everywhere, NaN outside", () => {
    const values = [capacity.from, ...temperatures, capacity.to].map((t) => capacity.cv(t));
    expect(Math.min(...values)).toBeGreaterThan(0);
    expect(Math.max(...values)).toBeLessThan(Infinity);
    expect(capacity.cv(capacity.from * 0.999)).toBeNaN();
    expect(capacity.cv(capacity.to * 1.001)).toBeNaN();
  });
});
