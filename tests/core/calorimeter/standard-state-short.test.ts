/** The short forms of the reduction against their worked values, and against the full form. */
import { percentCorrection, threeTerms } from "../../../src/core/calorimeter/standard-state/approximate";
import { standardReduction } from "../../../src/core/calorimeter/standard-state/reduction";
import type { VesselRun } from "../../../src/core/calorimeter/standard-state/states";
import { molarMass, parseFormula } from "../../../src/core/species/formula";
import { atomicWeights } from "../../../src/data/library";
import { percentFigures, standardState } from "../../../src/data/standard-state";
import { refusedWith } from "../refused";

function run(text: string, change: Partial<VesselRun> = {}): VesselRun {
  const formula = parseFormula(text);
  return {
    formula,
    molarMass: molarMass(formula, atomicWeights),
    specificEnergy: 26434,
    mass: 1,
    volume: 340,
    water: 1,
    pressure: 30 * 0.101325,
    nitric: 0,
    sulfuric: 0,
    temperature: 25,
    ...change,
  };
}

test("three terms for 1 g of benzoic acid, 1 g of water, 0.34 L, 30 atm", () => {
  // +102.7 − 82.4 + 3.5 = +23.7 J, so 26 410 J/g; recomputed from the formula, independently of this program
  const { before, after, dissolved } = threeTerms(run("C7H6O2"), standardState);
  expect(after).toBeCloseTo(102.7, 1);
  expect(before).toBeCloseTo(-82.4, 1);
  expect(dissolved).toBeCloseTo(3.5, 1);
  expect(before + after + dissolved).toBeCloseTo(23.7, 1);
  expect(26434 - (before + after + dissolved)).toBeCloseTo(26410.3, 1);
});

/** Gross value, J/g, and the correction the percent form gives at 30 atm, recomputed independently, from memory of the formula. */
const PERCENT = [
  ["C7H6O2", 26434, -0.0807, 4],
  ["C12H22O11", 16487, -0.085, 3],
  ["C10H8", 40191, -0.062, 3],
  ["C8H18(l)", 47713, -0.025, 3],
] as const;

test.each(PERCENT)("percent form of %s", (text, specificEnergy, percent, digits) => {
  expect(percentCorrection(run(text, { specificEnergy }), percentFigures)).toBeCloseTo(percent, digits);
});

test.each(PERCENT)(
  "full form of %s within 0.003 % of the percent form, and three terms within 0.017 % of the full form",
  (text, specificEnergy) => {
    // one heat of 26.4 kJ in a vessel of 1/3 L, as Washburn's figure of 3 g of benzoic acid in a litre
    const own = run(text, { specificEnergy, mass: 26434 / specificEnergy, volume: 1000 / 3 });
    const { sum, vessel } = standardReduction(own, standardState);
    expect(Math.abs((100 * sum) / vessel - percentCorrection(own, percentFigures))).toBeLessThan(0.003);
    const { before, after, dissolved } = threeTerms(own, standardState);
    expect(Math.abs((100 * (before + after + dissolved - sum)) / vessel)).toBeLessThan(0.017);
  },
);

test.each([
  [
    run("C7H6O2", { mass: 7 }),
    "range: Combustion needs 0.429894 mol of oxygen, but the vessel holds 0.416915 mol: it would not be complete",
  ],
  [run("C7H6O2", { water: 400 }), "range: 401.627 mL of water fill the vessel of 340 mL"],
  [run("CH4(g)"), "input: The compound is a gas; the reduction is written for solids and liquids"],
  [
    run("C7H6O2", { nitric: 1e-4 }),
    "input: The form three-term has no terms for acids; leave nitric_mol and sulfuric_mol out, or use the form full",
  ],
])("three-term refusal %#", (refused, sentence) => {
  expect(refusedWith(() => threeTerms(refused, standardState))).toBe(sentence);
});

test.each([
  [run("N2H4(l)"), "input: The percent form holds for compounds of carbon; use the form full"],
  [
    run("C4H4S(l)", { sulfuric: 1e-4 }),
    "input: The form percent has no terms for acids; leave nitric_mol and sulfuric_mol out, or use the form full",
  ],
  [run("CO2"), "input: CO2 takes up no oxygen: there is nothing in it to burn"],
])("percent refusal %#", (refused, sentence) => {
  expect(refusedWith(() => percentCorrection(refused, percentFigures))).toBe(sentence);
});
