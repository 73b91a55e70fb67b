import { ELEMENT_SYMBOLS } from "../../src/core/species/elements";
import { molarMass, parseFormula } from "../../src/core/species/formula";
import { Refusal } from "../../src/core/refusal";
import { atomicWeights, elementOf, elements, findSpecies } from "../../src/data/library";

const mass = (formula: string): number => molarMass(parseFormula(formula), atomicWeights);

test("every element with a standard atomic weight up to uranium is there, under its own number", () => {
  const withoutWeight = ["Tc", "Pm", "Po", "At", "Rn", "Fr", "Ra", "Ac"];
  const expected = ELEMENT_SYMBOLS.slice(0, 92).filter((symbol) => !withoutWeight.includes(symbol));
  expect(elements.map((element) => element.symbol)).toEqual(expected);
  for (const element of elements) expect(ELEMENT_SYMBOLS[element.number - 1]).toBe(element.symbol);
});

test("weights rise with the atomic number, but for the four known inversions", () => {
  const inverted = elements
    .slice(1)
    .flatMap((element, i) => (element.weight > elements[i]!.weight ? [] : [`${elements[i]!.symbol} ${element.symbol}`]));
  expect(inverted).toEqual(["Ar K", "Co Ni", "Te I", "Th Pa"]);
});

test("each abridged weight, with its uncertainty, reaches the published standard weight or interval", () => {
  const seen = elements.filter((element) => element.standard !== undefined);
  expect(seen).toHaveLength(32);
  for (const { symbol, weight, uncertainty, standard } of seen) {
    const interval = /^\[([\d.]+), ([\d.]+)\]$/.exec(standard!);
    const [low, high] = interval ? [Number(interval[1]), Number(interval[2])] : [parseFloat(standard!), parseFloat(standard!)];
    expect([symbol, weight >= low - uncertainty && weight <= high + uncertainty]).toEqual([symbol, true]);
    expect([symbol, uncertainty >= 0.00009 && uncertainty <= 1.1]).toEqual([symbol, true]);
  }
});

/** Molar masses of the SI and CODATA literature; the tolerance is what five figures of each weight allow. */
test.each([
  ["H2O", 18.01528, 0.0005],
  ["CO2", 44.0095, 0.001],
  ["CH4", 16.04246, 0.001],
  ["O2", 31.9988, 0.001],
  ["N2", 28.0134, 0.001],
  ["C7H6O2", 122.1213, 0.003],
  ["CaCO3", 100.087, 0.005],
  ["SF6", 146.055, 0.03],
  ["UO2", 270.03, 0.02],
  ["PbO", 223.2, 0.3],
  ["BaSO4", 233.39, 0.03],
  ["HgCl2", 271.5, 0.05],
  ["LiOH", 23.95, 0.06],
])("%s weighs %d g/mol", (formula, expected, tolerance) => expect(Math.abs(mass(formula) - expected)).toBeLessThan(tolerance));

test("a species takes its molar mass from this table", () => {
  expect(findSpecies("H2O").molarMass).toBe(2 * 1.008 + 15.999);
  expect(findSpecies("Ca(OH)2").molarMass).toBeCloseTo(74.092, 3);
});

test("an element without a standard weight is refused", () => {
  expect(() => elementOf("Tc")).toThrow(new Refusal("input", '"Tc" is not an element with a standard atomic weight') as never);
});
