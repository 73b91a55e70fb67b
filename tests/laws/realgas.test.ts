/**
 * Laws of thermodynamics between the closed formulas of the cubic equations, at states of one phase and of none: the formulas hold
 * wherever v is above b. Compared with the pressure as the papers write it, integrated and differentiated by numbers.
 */
import fc from "fast-check";
import { GAS_CONSTANT } from "../../src/core/constants";
import { gaussLegendre, integrate } from "../../src/core/numeric/gauss-legendre";
import { CubicGas } from "../../src/core/realgas/cubic-gas";
import { criticalVolume } from "../../src/core/realgas/saturation";
import { volumesAt } from "../../src/core/realgas/volumes";
import { mixtureOf } from "../core/realgas/gases";
import {
  derivative,
  fractionsOf,
  gasOf,
  helmholtzByQuadrature,
  looseness,
  outward,
  pressureAsWritten,
  secondDerivative,
  temperature,
} from "./realgas-support";

const R = GAS_CONSTANT;

/** Every law at the same kinds of states: a gas or a mixture of up to four, T, and v. */
function holds(law: (gas: CubicGas, temperature: number, volume: number) => void, gases = gasOf(1, 4)): void {
  fc.assert(
    fc.property(gases, temperature, looseness, (gas, t, times) => law(gas, t, times * gas.b)),
    { numRuns: 200 },
  );
}

/** Fails with the names of the state, so that a counterexample can be read. */
function near(found: number, wanted: number, within: number): void {
  if (!(Math.abs(found - wanted) <= within)) throw new Error(`${found} instead of ${wanted}, more than ${within} away`);
}

/** Residual Helmholtz energy by the closed formulas, J/mol. */
const helmholtz = (gas: CubicGas, t: number, v: number) => gas.residualEnergy(t, v) - t * gas.residualEntropy(t, v);

/** The pull and the push of the molecules as energies, J/mol: what rounding is to be measured by. */
const sizeOf = (gas: CubicGas, t: number, v: number) =>
  -R * t * Math.log1p(-gas.b / v) + (Math.abs(gas.residualEnergy(t, v)) + t * Math.abs(gas.residualCv(t, v)));

describe("pressure", () => {
  test("is that of the papers, by pairs", () =>
    holds((gas, t, v) =>
      near(gas.pressure(t, v), pressureAsWritten(gas, t, v), 1e-13 * ((R * t) / (v - gas.b)) * (1 + gas.b / (v - gas.b))),
    ));

  test("∂P/∂T and ∂P/∂v are its derivatives", () =>
    holds((gas, t, v) => {
      const push = (R * t) / (v - gas.b);
      near(
        gas.pressureByTemperature(t, v),
        derivative((x) => pressureAsWritten(gas, x, v), t, 0.05 * t),
        1e-10 * (push / t),
      );
      const gap = v - gas.b;
      near(
        gas.pressureByVolume(t, v),
        derivative((x) => pressureAsWritten(gas, t, x), v, 0.02 * gap),
        1e-9 * (push / gap),
      );
    }));

  test("becomes that of the ideal gas: (Z − 1) v tends to B", () =>
    holds((gas, t) => {
      const limit = gas.secondVirial(t);
      const slope = (times: number) => (gas.compressibility(t, times * gas.b) - 1) * times * gas.b;
      const size = gas.b + gas.attraction(t) / (R * t);
      // Two densities, extrapolated; each has lost four digits of Z − 1.
      near(2 * slope(2e4) - slope(1e4), limit, 1e-6 * size);
      for (const residual of [gas.residualEnergy(t, 1e9 * gas.b) / (R * t), gas.residualCv(t, 1e9 * gas.b) / R])
        near(residual, 0, 1e-8 * (1 + size / gas.b));
    }));
});

describe("residuals", () => {
  test("energy less T times entropy is the Helmholtz energy, ∫ (P − R T/v) dv", () =>
    holds((gas, t, v) => near(helmholtz(gas, t, v), helmholtzByQuadrature(gas, t, v), 1e-11 * sizeOf(gas, t, v))));

  test("energy is ∫ (T ∂P/∂T − P) dv", () =>
    holds((gas, t, v) => {
      const integrand = (x: number) => t * gas.pressureByTemperature(t, x) - gas.pressure(t, x);
      near(gas.residualEnergy(t, v), -outward(integrand, v), 1e-11 * sizeOf(gas, t, v));
    }));

  test("Cv is −T ∂²A/∂T² of the quadrature", () =>
    holds((gas, t, v) => {
      const second = secondDerivative((x) => helmholtzByQuadrature(gas, x, v), t, 0.1 * t);
      // P − R T/v of a thin gas has lost digits of R T, and the smallest step divides them by 1.6e-4.
      near(gas.residualCv(t, v), -t * second, 1e-8 * (sizeOf(gas, t, v) / t) + 5e-11 * R);
    }));

  test("Cv is ∂u/∂T at constant v", () =>
    holds((gas, t, v) =>
      near(
        gas.residualCv(t, v),
        derivative((x) => gas.residualEnergy(x, v), t, 0.05 * t),
        1e-10 * (sizeOf(gas, t, v) / t),
      ),
    ));

  test("entropy is (u − a)/T, with a by quadrature", () =>
    holds((gas, t, v) =>
      near(gas.residualEntropy(t, v), (gas.residualEnergy(t, v) - helmholtzByQuadrature(gas, t, v)) / t, 1e-11 * (sizeOf(gas, t, v) / t)),
    ));

  test("∂s/∂v at constant T is ∂P/∂T at constant v (Maxwell)", () =>
    holds((gas, t, v) => {
      const gap = v - gas.b;
      const entropy = (x: number) => gas.residualEntropy(t, x) + R * Math.log(x);
      near(derivative(entropy, v, 0.02 * gap), gas.pressureByTemperature(t, v), 1e-9 * (R / gap));
    }));
});

describe("fugacity", () => {
  const quadrature = gaussLegendre(48);

  test("ln φ of a gas above its critical temperature is ∫ (Z − 1)/P dP", () =>
    fc.assert(
      fc.property(
        gasOf(1, 1),
        fc.double({ min: 1.1, max: 4, noNaN: true }),
        fc.double({ min: 0.01, max: 5, noNaN: true }),
        (gas, tr, pr) => {
          const t = tr * gas.criticalTemperature;
          const p = pr * gas.parts[0]!.critical.pressure;
          const z = (pressure: number) => gas.compressibility(t, volumesAt(gas, t, pressure).thin);
          const integral = integrate((x) => (z(x) - 1) / x, 0, p, quadrature, 4);
          near(gas.logFugacity(t, volumesAt(gas, t, p).thin), integral, 1e-9);
        },
      ),
      { numRuns: 100 },
    ));

  test("ln φ_i is ∂(n A/(R T))/∂n_i at constant T and V, less ln Z", () =>
    holds(
      (gas, t, v) => {
        const z = gas.compressibility(t, v);
        if (!(z > 0)) return;
        const size = 1 + sizeOf(gas, t, v) / (R * t);
        gas.logFugacities(t, v).forEach((log, i) => {
          const total = (more: number) => {
            const fractions = gas.parts.map(({ fraction }, j) => (fraction + (i === j ? more : 0)) / (1 + more));
            return ((1 + more) * helmholtz(gas.withFractions(fractions), t, v / (1 + more))) / (R * t);
          };
          // Steps small beside the amount of the part and beside the room that is left.
          const h = 0.02 * Math.min(gas.parts[i]!.fraction, (v - gas.b) / v);
          near(log, derivative(total, 0, h) - Math.log(z), 1e-9 * size + (1e-14 * size) / h);
        });
      },
      gasOf(1, 4),
    ));

  test("Σ x ln φ_i is ln φ of the whole", () =>
    holds((gas, t, v) => {
      if (!(gas.pressure(t, v) > 0)) return;
      const sum = gas.logFugacities(t, v).reduce((total, log, i) => total + gas.parts[i]!.fraction * log, 0);
      near(sum, gas.logFugacity(t, v), 1e-13 * (10 + (sizeOf(gas, t, v) / (R * t)) * (v / (v - gas.b))));
    }));

  test("Gibbs and Duhem: Σ x d ln φ_i = (Z − 1) d ln P along a change of composition at constant T and v", () =>
    holds(
      (gas, t, v) => {
        if (!(gas.pressure(t, v) > 0)) return;
        // Parts 0 and 1 change places by an amount that leaves both their sign, and P its own.
        const along = (more: number) =>
          gas.withFractions(gas.parts.map(({ fraction }, i) => fraction + (i === 0 ? more : i === 1 ? -more : 0)));
        const h = 0.02 * Math.min(gas.parts[0]!.fraction, gas.parts[1]!.fraction, (v - gas.b) / v) * Math.min(1, gas.compressibility(t, v));
        const pressure = derivative((x) => along(x).pressure(t, v), 0, h);
        const sum = gas.parts.reduce(
          (total, { fraction }, i) => total + fraction * derivative((x) => along(x).logFugacities(t, v)[i]!, 0, h),
          0,
        );
        const z = gas.compressibility(t, v);
        const size = (1 + sizeOf(gas, t, v) / (R * t)) * (v / (v - gas.b)) * (1 + 1 / z);
        near(sum, ((z - 1) * pressure) / gas.pressure(t, v), 1e-8 * size + (1e-14 * size) / h);
      },
      gasOf(2, 4),
    ));
});

describe("mixtures", () => {
  const compared = (one: CubicGas, other: CubicGas, t: number, v: number) => {
    const size = sizeOf(one, t, v);
    near(one.b, other.b, 1e-15 * other.b * 4);
    near(one.pressure(t, v), other.pressure(t, v), 1e-13 * ((R * t) / (v - one.b)) * (v / (v - one.b)));
    near(one.residualEnergy(t, v), other.residualEnergy(t, v), 1e-13 * size);
    near(one.residualCv(t, v), other.residualCv(t, v), 1e-13 * (size / t));
    near(one.residualEntropy(t, v), other.residualEntropy(t, v), 1e-13 * (size / t) * (v / (v - one.b)));
  };

  test("a gas mixed with itself is the gas, and its parts have its fugacity", () =>
    holds(
      (gas, t, v) => {
        const { critical } = gas.parts[0]!;
        const parts = [0.25, 0.6, 0.15].map((fraction) => ({ fraction, critical }));
        const mixed = new CubicGas(gas.form, parts);
        compared(mixed, gas, t, v);
        if (!(gas.pressure(t, v) > 0)) return;
        const size = (10 + sizeOf(gas, t, v) / (R * t)) * (v / (v - gas.b)) * (1 + 1 / gas.compressibility(t, v));
        for (const log of mixed.logFugacities(t, v)) near(log, gas.logFugacity(t, v), 1e-13 * size);
      },
      gasOf(1, 1),
    ));

  test("the order of the parts does not matter, and each keeps its fugacity", () =>
    fc.assert(
      fc.property(fractionsOf(2, 5), temperature, looseness, (fractions, t, times) => {
        const gas = mixtureOf(fractions);
        const turned = mixtureOf(Object.fromEntries(Object.entries(fractions).reverse()));
        const v = times * gas.b;
        compared(turned, gas, t, v);
        if (!(gas.pressure(t, v) > 0)) return;
        const size = (10 + sizeOf(gas, t, v) / (R * t)) * (v / (v - gas.b)) * (1 + 1 / gas.compressibility(t, v));
        const logs = turned.logFugacities(t, v).reverse();
        gas.logFugacities(t, v).forEach((log, i) => near(logs[i]!, log, 1e-13 * size));
      }),
      { numRuns: 200 },
    ));

  test("a change of composition gives what the gas built anew gives, bit for bit", () =>
    fc.assert(
      fc.property(fractionsOf(3, 3), temperature, looseness, (fractions, t, times) => {
        const gas = mixtureOf(fractions);
        const [x, y, z] = gas.parts.map(({ fraction }) => fraction) as [number, number, number];
        const names = Object.keys(fractions);
        const anew = mixtureOf({ [names[0]!]: y, [names[1]!]: z, [names[2]!]: x });
        const changed = gas.withFractions([y, z, x]);
        const v = times * anew.b;
        expect([changed.pressure(t, v), changed.residualCv(t, v), ...changed.logFugacities(t, v)]).toEqual([
          anew.pressure(t, v),
          anew.residualCv(t, v),
          ...anew.logFugacities(t, v),
        ]);
      }),
    ));
});

describe("volumes at T and P", () => {
  /** How much a rounding of v moves P, relative to P. */
  const sensitivity = (gas: CubicGas, t: number, v: number, p: number) =>
    (Math.abs(v * gas.pressureByVolume(t, v)) + ((R * t) / (v - gas.b)) * (v / (v - gas.b))) / p;

  test("give back the pressure, each of them", () =>
    fc.assert(
      fc.property(gasOf(1, 4), temperature, fc.double({ min: 0, max: Math.log(1e9), noNaN: true }).map(Math.exp), (gas, t, p) => {
        const { dense, thin } = volumesAt(gas, t, p);
        expect(dense).toBeLessThanOrEqual(thin);
        for (const v of [dense, thin]) near(gas.pressure(t, v) / p, 1, 1e-12 + 4 * Number.EPSILON * sensitivity(gas, t, v, p));
      }),
      { numRuns: 2000 },
    ));

  test("are two below the critical temperature however low the pressure is", () =>
    fc.assert(
      fc.property(
        gasOf(1, 1),
        fc.double({ min: 0.5, max: 0.83, noNaN: true }),
        fc.double({ min: -12, max: 3, noNaN: true }),
        (gas, tr, logP) => {
          const t = tr * gas.criticalTemperature;
          const { dense, thin } = volumesAt(gas, t, 10 ** logP);
          expect(dense).toBeLessThan(criticalVolume(gas));
          expect(thin).toBeGreaterThan(10 * criticalVolume(gas));
          // The liquid is that of no pressure, but for its compressibility.
          near(gas.pressure(t, dense), 10 ** logP, 1e-12 * 10 ** logP + 4 * Number.EPSILON * sensitivity(gas, t, dense, 1));
        },
      ),
      { numRuns: 1000 },
    ));

  test("are the volume the pressure came from, where only one has it", () =>
    holds((gas, t, v) => {
      const p = gas.pressure(t, v);
      if (!(p > 0)) return;
      const { dense, thin } = volumesAt(gas, t, p);
      const nearest = Math.abs(dense - v) < Math.abs(thin - v) ? dense : thin;
      const slope = gas.pressureByVolume(t, v);
      // Between two spinodals the volume is the middle root, which is neither.
      if (slope >= 0) return;
      const rounding = (8 * Number.EPSILON * (sensitivity(gas, t, v, p) * p)) / Math.abs(slope);
      // Near a spinodal two roots come together, and the root is known to the square root of the rounding only.
      if (rounding > 1e-9 * v) return;
      near(nearest, v, 1e-12 * v + 4 * rounding);
    }));
});
