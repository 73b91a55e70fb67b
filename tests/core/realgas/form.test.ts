/** The figures of the cubic equations, and what a gas refuses to be made of. */
import { GAS_CONSTANT } from "../../../src/core/constants";
import { CubicGas } from "../../../src/core/realgas/cubic-gas";
import { criticalVolume } from "../../../src/core/realgas/saturation";
import { sourceOf } from "../../../src/data/library";
import { cubicEquations } from "../../../src/data/cubic-equations";
import { refusedWith } from "../refused";
import { criticalPoint, type Equation, EQUATIONS, formOf, mixtureOf, pureGas } from "./gases";

const R = GAS_CONSTANT;

/** As the papers print them. */
const PRINTED = {
  "peng-robinson": { omegaA: 0.45724, within: 5e-6, omegaB: 0.0778, criticalZ: 0.307, m: [0.37464, 1.54226, -0.26992] },
  soave: { omegaA: 0.42747, within: 1.1e-5, omegaB: 0.08664, criticalZ: 0.333, m: [0.48, 1.574, -0.176] },
} as const;

test("both equations are there, each with its source", () => {
  expect(cubicEquations.map(({ id }) => id)).toEqual(EQUATIONS);
  for (const { source } of cubicEquations) expect(sourceOf(source)).toBeDefined();
});

describe.each(EQUATIONS)("%s", (equation: Equation) => {
  const form = formOf(equation);
  const printed = PRINTED[equation];

  test("rounded, the figures are those of the paper", () => {
    // Soave prints 0.42747 for 0.4274802…: one unit of the last digit less than it rounds to.
    expect(Math.abs(form.omegaA - printed.omegaA)).toBeLessThan(printed.within);
    expect(Number(form.omegaB.toFixed(5))).toBe(printed.omegaB);
    expect(form.m).toEqual(printed.m);
  });

  test("d1 and d2 are those of v (v + b) + b (v − b), or of v (v + b)", () => {
    const [sum, product] = equation === "peng-robinson" ? [2, -1] : [1, 0];
    expect(form.d1 + form.d2).toBeCloseTo(sum, 15);
    expect(form.d1 * form.d2).toBeCloseTo(product, 15);
  });

  test("at the critical point P is Pc, and its first two derivatives by v are 0", () => {
    // The same as saying that the cubic in Z of the head of volumes.ts, with A = Ωa and B = Ωb, is (Z − Zc)³: compared by its terms.
    const { omegaA: a, omegaB: b, d1, d2 } = form;
    const zc = (1 - (d1 + d2 - 1) * b) / 3;
    expect(Math.abs(a + d1 * d2 * b * b - (d1 + d2) * b * (b + 1) - 3 * zc * zc)).toBeLessThan(1e-15);
    expect(Math.abs(a * b + d1 * d2 * b * b * (b + 1) - zc ** 3)).toBeLessThan(1e-15);
    expect(zc).toBeCloseTo(printed.criticalZ, 3);
  });

  test.each(["CO2", "H2O", "N2", "C3H8"])("%s has its critical point where its constants say", (species) => {
    const gas = pureGas(species, equation);
    const { temperature, pressure } = criticalPoint(species);
    const volume = criticalVolume(gas);
    expect(Math.abs(gas.pressure(temperature, volume) / pressure - 1)).toBeLessThan(1e-13);
    // Both derivatives against the size of one of their two terms.
    const repulsion = (R * temperature) / (volume - gas.b);
    expect(Math.abs(gas.pressureByVolume(temperature, volume)) * ((volume - gas.b) / repulsion)).toBeLessThan(1e-12);
    // The slope itself is flat there: it grows with the square of the distance, by d3P/dv3.
    const beside = (share: number) => gas.pressureByVolume(temperature, volume * (1 + share));
    expect(beside(1e-4)).toBeLessThan(0);
    expect(beside(-1e-4)).toBeLessThan(0);
    expect(Math.abs((beside(1e-4) - beside(-1e-4)) / (beside(1e-4) + beside(-1e-4)))).toBeLessThan(1e-3);
    const { omegaA, omegaB } = form;
    expect(Math.abs(gas.attraction(temperature) / ((omegaA * (R * temperature) ** 2) / pressure) - 1)).toBeLessThan(1e-14);
    expect(Math.abs(gas.b / ((omegaB * R * temperature) / pressure) - 1)).toBeLessThan(1e-15);
  });
});

describe("the attraction of a pure gas", () => {
  test.each(EQUATIONS)("is that of the paper, α = (1 + m (1 − √Tr))², by %s", (equation) => {
    const form = formOf(equation);
    for (const species of ["CO2", "H2", "He", "n-C10H22"]) {
      const { temperature, pressure, acentric } = criticalPoint(species);
      const m = form.m[0]! + form.m[1]! * acentric + form.m[2]! * acentric ** 2;
      const gas = pureGas(species, equation);
      for (const reduced of [0.4, 0.7, 1, 3, 10]) {
        const alpha = (1 + m * (1 - Math.sqrt(reduced))) ** 2;
        const wanted = (form.omegaA * (R * temperature) ** 2 * alpha) / pressure;
        // against its size at the critical point: it may be near 0
        const size = (form.omegaA * (R * temperature) ** 2) / pressure;
        expect(Math.abs(gas.attraction(reduced * temperature) - wanted)).toBeLessThan(1e-14 * size * (1 + alpha));
      }
    }
  });

  test("is 0 where it is said to end, and of a mixture where that of its first part does", () => {
    const gas = pureGas("CO2");
    expect(gas.attraction(gas.attractionEnds)).toBeLessThan(1e-15 * gas.attraction(300));
    expect(gas.attraction(1.1 * gas.attractionEnds)).toBeGreaterThan(0);
    const [nitrogen, mixture] = [pureGas("N2"), mixtureOf({ CO2: 0.5, N2: 0.5 })];
    expect(mixture.attractionEnds).toBe(Math.min(nitrogen.attractionEnds, gas.attractionEnds));
    // m below 0: it never ends
    expect(pureGas("He").attractionEnds).toBe(Infinity);
  });
});

describe("what is no gas", () => {
  const gas = (fractions: readonly number[], point = {}) =>
    refusedWith(() => {
      const critical = { ...criticalPoint("CO2"), ...point };
      return new CubicGas(
        formOf("peng-robinson"),
        fractions.map((fraction) => ({ fraction, critical })),
      );
    });

  test("is refused with the value", () => {
    expect(gas([1.1, -0.1])).toBe("input: The mole fraction of CO2 is -0.1; fractions are not negative");
    expect(gas([NaN, 1])).toBe("input: The mole fraction of CO2 is NaN; fractions are not negative");
    expect(gas([0.5, 0.4])).toBe("input: The mole fractions of the gas add up to 0.9, not to 1");
    expect(gas([])).toBe("input: The mole fractions of the gas add up to 0, not to 1");
    expect(gas([1], { temperature: 0 })).toBe("range: The critical temperature of CO2, 0 K, is not above 0 K");
    expect(gas([1], { pressure: -1 })).toBe("range: The critical pressure of CO2, -1 Pa, is not above 0 Pa");
    expect(gas([1], { pressure: Infinity })).toBe("range: The critical pressure of CO2, Infinity Pa, is not above 0 Pa");
    expect(gas([1], { acentric: NaN })).toBe("range: The acentric factor of CO2, NaN, is not a number");
  });

  test("a volume not above b has no pressure and no residuals", () => {
    const one = pureGas("CO2");
    for (const volume of [one.b, 0.5 * one.b, 0, -1, NaN]) {
      expect(one.pressure(300, volume)).toBeNaN();
      expect(one.pressureByVolume(300, volume)).toBeNaN();
      expect(one.pressureByTemperature(300, volume)).toBeNaN();
      expect(one.residualEnergy(300, volume)).toBeNaN();
      expect(one.residualCv(300, volume)).toBeNaN();
      expect(one.residualEntropy(300, volume)).toBeNaN();
      expect(one.logFugacity(300, volume)).toBeNaN();
    }
  });
});
