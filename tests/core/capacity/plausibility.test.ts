import { capacityOf } from "../../../src/core/capacity";
import { checkContinuity, checkGas } from "../../../src/core/capacity/plausibility";
import type { SpeciesFit } from "../../../src/core/species/types";

const cubic = (coefficients: readonly number[], from = 273, to = 1800): SpeciesFit => ({
  species: "CO",
  formula: "CO",
  phase: "g",
  set: "cells",
  form: "power",
  quantity: "Cp",
  unitFactor: 1,
  exponents: [0, 1, 2, 3],
  gasConstant: 8.31446261815324,
  standardPressure: 100000,
  intervals: [{ from, to, coefficients }],
  molarMass: 28.01,
  formationEnthalpy: null,
  entropy298: null,
});

const doubts = (fit: SpeciesFit) =>
  checkGas(capacityOf(fit), { atoms: 2 })
    .filter(({ verdict }) => verdict === "doubt")
    .map(({ check }) => check);

test("the textbook cubic of CO keeps every bound; with the sign of its last term lost it breaks the classical limit", () => {
  expect(doubts(cubic([28.16, 0.1675e-2, 0.5372e-5, -2.222e-9]))).toEqual([]);
  expect(doubts(cubic([28.16, 0.1675e-2, 0.5372e-5, 2.222e-9]))).toEqual([expect.stringContaining("Cp at most")]);
});

test("a cubic used far beyond its range falls with temperature", () => {
  expect(doubts(cubic([28.9, -0.1571e-2, 0.8081e-5, -2.873e-9], 273, 3000))).toContain("Cp does not fall"); // N2 cubic, range 273 to 1800 K
});

test("Cp below 5/2 R is doubted", () => {
  expect(doubts(cubic([12.5, 0, 0, 0]))).toContain("Cp at least 5/2 R");
});

test("a step at a joint is found, and its size said", () => {
  const stepped: SpeciesFit = {
    ...cubic([29, 0, 0, 0], 300, 500),
    intervals: [
      { from: 300, to: 500, coefficients: [29, 0, 0, 0] },
      { from: 500, to: 900, coefficients: [30, 0, 0, 0] },
    ],
  };
  const joint = checkContinuity(capacityOf(stepped), null).find(({ check }) => check === "joint at 500 K")!;
  expect(joint.verdict).toBe("doubt");
  expect(joint.detail).toContain("Cp steps by 1 J/(mol K)");
});

test("H(298.15 K) must meet the formation enthalpy", () => {
  const fit: SpeciesFit = { ...cubic([29, 0, 0, 0]), formationEnthalpy: -110530 };
  const verdict = (formation: number) =>
    checkContinuity(capacityOf(fit), formation).find(({ check }) => check.startsWith("H(298.15 K)"))!.verdict;
  expect(verdict(-110530)).toBe("passed");
  expect(verdict(-110400)).toBe("doubt");
});
