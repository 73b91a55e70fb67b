/** What a form does with the unusual: missing constants, Cv blocks, odd exponents, faulty fits. */
import { capacityOf } from "../../../src/core/capacity";
import type { SpeciesFit } from "../../../src/core/species/types";
import { refusedWith } from "../refused";
import { benzenePower, graphitePower, methaneNine, methaneSeven, nitrogenNine, nitrogenShomate } from "./fits";

const without = (fit: SpeciesFit, kept: number): SpeciesFit => ({
  ...fit,
  intervals: fit.intervals.map((interval) => ({ ...interval, coefficients: interval.coefficients.slice(0, kept) })),
});

describe("integration constants that are not printed", () => {
  test.each([
    ["nine-term", methaneNine, 7],
    ["seven-term", methaneSeven, 5],
    ["shomate", nitrogenShomate, 5],
  ])("%s: the formation value and the entropy at 298.15 K stand in for them", (_, fit, kept) => {
    const whole = capacityOf(fit);
    const bare = capacityOf({ ...without(fit, kept), formationEnthalpy: whole.enthalpy(298.15), entropy298: whole.entropy(298.15) });
    expect(bare.onFormationScale).toBe(true);
    expect(bare.hasEntropy).toBe(true);
    const lower = [fit.intervals[0]!.from, 298.15, 400];
    for (const t of lower) {
      expect(bare.enthalpy(t)).toBeCloseTo(whole.enthalpy(t), 6);
      expect(bare.entropy(t)).toBeCloseTo(whole.entropy(t), 9);
    }
    // Beyond the joint the printed constants step by what their digits leave; the continuous ones do not.
    const joint = fit.intervals[0]!.to;
    const justAbove = joint * (1 + 1e-15);
    const above = joint + 200;
    const enthalpyStep = whole.enthalpy(justAbove) - whole.enthalpy(joint);
    const entropyStep = whole.entropy(justAbove) - whole.entropy(joint);
    expect(whole.enthalpy(above) - bare.enthalpy(above)).toBeCloseTo(enthalpyStep, 6);
    expect(whole.entropy(above) - bare.entropy(above)).toBeCloseTo(entropyStep, 9);
  });

  test("without a formation value H is counted from 298.15 K, and says so", () => {
    const bare = capacityOf({ ...without(methaneSeven, 5), formationEnthalpy: null });
    expect(bare.onFormationScale).toBe(false);
    expect(bare.hasEntropy).toBe(false);
    expect(bare.enthalpy(298.15)).toBeCloseTo(0, 8);
    expect(bare.entropy(298.15)).toBeNaN();
  });

  test("H and S do not step at the joints", () => {
    const bare = capacityOf({ ...without(methaneSeven, 5), entropy298: 186.371 });
    const above = 1000 * (1 + 1e-15);
    expect(bare.enthalpy(above)).toBeCloseTo(bare.enthalpy(1000), 7);
    expect(bare.entropy(above)).toBeCloseTo(bare.entropy(1000), 10);
  });

  const from300 = (from: number, to = 1500): SpeciesFit => ({
    ...graphitePower,
    phase: "g",
    formationEnthalpy: -100000,
    entropy298: 200,
    exponents: [0],
    intervals: [{ from, to, coefficients: [30] }],
  });

  test("a table that begins at 300 K takes its zero at 298.15 K, its end value of Cp held between", () => {
    const gas = capacityOf(from300(300));
    expect(gas.onFormationScale).toBe(true);
    expect(gas.enthalpy(300)).toBeCloseTo(-100000 + 30 * 1.85, 9);
    expect(gas.entropy(300)).toBeCloseTo(200 + 30 * Math.log(300 / 298.15), 12);
  });

  test("a table that ends just below 298.15 K likewise", () =>
    expect(capacityOf(from300(100, 297)).enthalpy(297)).toBeCloseTo(-100000 - 30 * 1.15, 9));

  test("a table that begins far from 298.15 K has no zero", () => {
    const gas = capacityOf(from300(500));
    expect(gas.onFormationScale).toBe(false);
    expect(gas.hasEntropy).toBe(false);
    expect(gas.enthalpy(500)).toBeCloseTo(0, 9);
  });

  test("a record that is not on the formation scale stays off it", () =>
    expect(capacityOf({ ...nitrogenShomate, onFormationScale: false }).onFormationScale).toBe(false));
});

describe("Cv blocks", () => {
  const cvBlock: SpeciesFit = {
    ...benzenePower,
    celsius: false,
    quantity: "Cv",
    exponents: [0, 1],
    intervals: [{ from: 300, to: 900, coefficients: [20, 0.01] }],
  };

  test("a gas has Cp = Cv + R", () => {
    const gas = capacityOf(cvBlock);
    expect(gas.cv(500)).toBeCloseTo(25, 12);
    expect(gas.cp(500)).toBeCloseTo(25 + cvBlock.gasConstant, 12);
  });

  test("a solid has Cp = Cv", () => expect(capacityOf({ ...cvBlock, phase: "cr" }).cp(500)).toBeCloseTo(25, 12));

  test("odd exponents too", () => {
    const gas = capacityOf({ ...cvBlock, exponents: [0, -0.5] });
    expect(gas.cp(400) - gas.cv(400)).toBeCloseTo(cvBlock.gasConstant, 12);
    expect(gas.cv(400)).toBeCloseTo(20 + 0.01 / 20, 12);
  });

  test("constants printed in it are not used", () => {
    const seven: SpeciesFit = { ...methaneSeven, quantity: "Cv", entropy298: null };
    expect(capacityOf(seven).enthalpy(298.15)).toBeCloseTo(-74600, 6);
    expect(capacityOf(seven).hasEntropy).toBe(false);
  });
});

describe("power form with odd exponents", () => {
  // Berman and Brown's form for minerals: a + b T^−0.5 + c T^−2 + d T^−3; the numbers here are made up.
  const berman: SpeciesFit = {
    ...graphitePower,
    exponents: [0, -0.5, -1, -3],
    entropy298: 40,
    formationEnthalpy: -900000,
    intervals: [{ from: 250, to: 1200, coefficients: [80, -240, 500, 4e7] }],
  };
  const mineral = capacityOf(berman);

  test("has the value of its formula", () => expect(mineral.cp(400)).toBeCloseTo(80 - 240 / 20 + 500 / 400 + 4e7 / 400 ** 3, 10));

  test("integrates T⁻¹ to a logarithm", () => {
    const rise = mineral.enthalpy(1000) - mineral.enthalpy(400);
    const expected = 80 * 600 - 480 * (Math.sqrt(1000) - 20) + 500 * Math.log(2.5) - 2e7 * (1e-6 - 1 / 160000);
    expect(rise).toBeCloseTo(expected, 7);
  });

  test("stands at its values at 298.15 K", () => {
    expect(mineral.enthalpy(298.15)).toBeCloseTo(-900000, 6);
    expect(mineral.entropy(298.15)).toBeCloseTo(40, 12);
    expect(mineral.onFormationScale && mineral.hasEntropy).toBe(true);
  });

  test("agrees with the compiled form where both can hold a fit", () => {
    const compiled = capacityOf(graphitePower);
    // a coefficient of 0 with an odd exponent forces the other evaluator
    const summed = capacityOf({
      ...graphitePower,
      exponents: [0, 1, -2, -0.5],
      intervals: [{ from: 273, to: 1373, coefficients: [11.18, 0.01095, -489100, 0] }],
    });
    for (const t of [273, 298.15, 640, 1373]) {
      expect(summed.cp(t)).toBeCloseTo(compiled.cp(t), 12);
      expect(summed.enthalpy(t)).toBeCloseTo(compiled.enthalpy(t), 8);
      expect(summed.entropy(t)).toBeCloseTo(compiled.entropy(t), 11);
    }
  });

  test("two intervals join without a step in H and S", () => {
    const joined = capacityOf({
      ...berman,
      intervals: [...berman.intervals, { from: 1200, to: 1500, coefficients: [90, -240, 500, 4e7] }],
    });
    expect(joined.joints).toEqual([1200]);
    const above = 1200 * (1 + 1e-15);
    expect(joined.cp(1200)).toBeCloseTo(mineral.cp(1200), 12);
    expect(joined.cp(above) - joined.cp(1200)).toBeCloseTo(10, 9);
    expect(joined.enthalpy(above)).toBeCloseTo(joined.enthalpy(1200), 7);
    expect(joined.entropy(above)).toBeCloseTo(joined.entropy(1200), 10);
  });
});

describe("fits that are refused", () => {
  const bad = (change: Partial<SpeciesFit>) => refusedWith(() => capacityOf({ ...nitrogenNine, ...change }));
  const first = nitrogenNine.intervals[0]!;

  test.each<[string, Partial<SpeciesFit>, string]>([
    ["no interval", { intervals: [] }, "There is no temperature interval in nasa-2002 for N2"],
    [
      "an unknown form",
      { form: "eight-term" as never },
      '"eight-term" of nasa-2002 for N2 is not a form; the forms are nine-term, seven-term, shomate, power, molecular',
    ],
    [
      "too few coefficients",
      { intervals: [{ ...first, coefficients: [1, 2] }] },
      "The form nine-term takes 7 to 9 coefficients; interval 1 of nasa-2002 for N2 has 2",
    ],
    [
      "too many coefficients",
      { intervals: [{ ...first, coefficients: [...first.coefficients, 1] }] },
      "The form nine-term takes 7 to 9 coefficients; interval 1 of nasa-2002 for N2 has 10",
    ],
    [
      "a blank coefficient",
      { intervals: [{ ...first, coefficients: [1, null, 3, 4, 5, 6, 7] }] },
      "Coefficient 2 of interval 1 of nasa-2002 for N2 is blank",
    ],
    [
      "a coefficient that is not finite",
      { intervals: [{ ...first, coefficients: [1, NaN, 3, 4, 5, 6, 7] }] },
      "Interval 1 of nasa-2002 for N2 holds NaN, which is not a finite number",
    ],
    [
      "limits upside down",
      { intervals: [{ ...first, from: 1000, to: 200 }] },
      "Interval 1 of nasa-2002 for N2 runs from 1000 K to 200 K; it must begin above 0 K and end above its beginning",
    ],
    [
      "a beginning at 0 K",
      { intervals: [{ ...first, from: 0 }] },
      "Interval 1 of nasa-2002 for N2 runs from 0 K to 1000 K; it must begin above 0 K and end above its beginning",
    ],
    [
      "a gap",
      { intervals: [first, { ...first, from: 1100, to: 2000 }] },
      "Interval 2 of nasa-2002 for N2 begins at 1100 K, but the one before it ends at 1000 K",
    ],
    ["no gas constant", { gasConstant: 0 }, "The gas constant 0 of nasa-2002 for N2 is not a positive number"],
    ["no pressure", { standardPressure: NaN }, "The standard pressure NaN Pa of nasa-2002 for N2 is not a positive number"],
    ["a unit factor of 0", { unitFactor: 0 }, "The unit factor 0 of nasa-2002 for N2 is not a positive number"],
    ["a block of the user's", { set: "cells", intervals: [] }, "There is no temperature interval in the coefficient block for N2"],
  ])("%s", (_, change, sentence) => expect(bad(change)).toBe(`input: ${sentence}`));

  test.each<[string, Partial<SpeciesFit>, string]>([
    [
      "a broken exponent in °C",
      { exponents: [0, 0.5, 2, 3] },
      "The exponent 0.5 of textbook for Benzene cannot be used with a temperature in °C; whole exponents from 0 to 6 can",
    ],
    [
      "an exponent out of all proportion",
      { exponents: [0, 1, 2, 99] },
      "The exponent 99 of textbook for Benzene is not between -12 and 12",
    ],
    [
      "fewer exponents than coefficients",
      { exponents: [0, 1] },
      "The form power takes 2 coefficients; interval 1 of textbook for Benzene has 4",
    ],
    ["no exponent", { exponents: [] }, "textbook for Benzene has no exponents"],
  ])("%s", (_, change, sentence) => expect(refusedWith(() => capacityOf({ ...benzenePower, ...change }))).toBe(`input: ${sentence}`));

  test("exponents left out are 0, 1, 2 …", () =>
    expect(capacityOf({ ...benzenePower, exponents: undefined }).cp(373.15)).toBe(capacityOf(benzenePower).cp(373.15)));
});
