import { aviationEstimate, inventoryTerms, liquidEditions, netEditions, vaporisation } from "../../src/data/net-values";
import { formationUncertaintiesOf } from "../../src/data/uncertainties";
import { sourceOf } from "../../src/data/library";

const cited = [...netEditions, ...liquidEditions];

test("ids are single, plain, and name their source; every figure from memory says so in its citation", () => {
  expect(new Set(cited.map(({ id }) => id)).size).toBe(cited.length);
  for (const { id, source, title, fromMemory } of cited) {
    expect(id).toMatch(/^[a-z0-9]+(-[a-z0-9]+)*$/);
    expect(source.startsWith(id)).toBe(true);
    expect(title.length).toBeGreaterThan(10);
    expect(fromMemory).toBe(true);
    expect(sourceOf(source).citation).toContain("from memory");
  }
  for (const source of [aviationEstimate.source, vaporisation.source]) expect(sourceOf(source).citation).toContain("from memory");
});

test("every printed constant is of the size of its kind: a slipped decimal would show", () => {
  for (const { constantPressure, constantVolume, grossPressure } of netEditions) {
    expect(Math.abs(constantPressure.hydrogen / 212 - 1)).toBeLessThan(0.02);
    expect(Math.abs(constantPressure.moisture / 24.4 - 1)).toBeLessThan(0.02);
    expect([constantPressure.oxygen, constantPressure.nitrogen]).toEqual([0.8, 0.8]);
    if (constantVolume) expect([constantVolume.hydrogen, constantVolume.moisture]).toEqual([206, 23.05]);
    if (grossPressure) expect(grossPressure).toEqual({ hydrogen: 6.15, oxygen: 0.8, nitrogen: 0.8 });
  }
});

test("where an edition prints gross at constant pressure, its three hydrogen constants fit together", () => {
  // net p = gross p - L/M(H2), net V = gross V - (L - RT)/M(H2): the sum of 6.15 and 212.2 is L/M(H2), of 206.0 and RT/M(H2) too.
  const both = netEditions.filter(({ constantVolume, grossPressure }) => constantVolume && grossPressure);
  expect(both.length).toBe(4);
  for (const { constantPressure, constantVolume, grossPressure } of both) {
    const fromPressure = constantPressure.hydrogen + grossPressure!.hydrogen;
    const fromVolume = constantVolume!.hydrogen + 2 * grossPressure!.hydrogen;
    expect(Math.abs(fromPressure - fromVolume)).toBeLessThanOrEqual(0.1); // 0.05 for each hydrogen constant
  }
});

test("the vaporisation of water agrees with the CODATA formation enthalpies within their 0.04 kJ/mol", () => {
  const ofCodata = (species: string) => formationUncertaintiesOf(species).find(({ source }) => source === "codata-1989")!.formation;
  expect(Math.abs(vaporisation.value - (ofCodata("H2O") - ofCodata("H2O(l)")))).toBeLessThan(0.04);
});

test("liquids and aviation fuels, as printed in MJ/kg (ASTM D240, from memory)", () => {
  expect(liquidEditions.map(({ id, hydrogen }) => [id, hydrogen])).toEqual([["astm-d240", 0.2122]]);
  expect(aviationEstimate).toMatchObject({ intercept: 10.025, slope: 0.7195, from: 45, to: 48 });
  // The same line is printed as 4310 + 0.7195 Q in Btu/lb, from memory: 1 Btu_IT/lb = 2.326 J/g exactly.
  expect(4310 * 0.002326).toBeCloseTo(aviationEstimate.intercept, 3);
});

test("the inventory terms differ by ten; the note says which is right", () => {
  expect(inventoryTerms.oxygen[1]! / inventoryTerms.oxygen[0]!).toBeCloseTo(10, 12);
  expect(inventoryTerms.note).toContain("ten times too large");
});
