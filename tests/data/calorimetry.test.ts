/** Figures of oxygen-vessel calorimetry: they agree with the other form in which the trade prints them. */
import { acidMolarHeats, buoyancy, certificate, chargeRules, sootHeat, titration } from "../../src/data/calorimetry";
import { burningKindOf, burningKinds } from "../../src/data/burning-heats";
import { atomicWeights } from "../../src/data/library";

const CALORIE = 4.184; // thermochemical, exact

test("fuse wires: 2.3 and 2.7 calories for each centimetre, as printed by ASTM D240 (from memory)", () => {
  expect(burningKindOf("nickel-chromium wire")!.perCentimetre).toBeCloseTo(2.3 * CALORIE, 1);
  expect(burningKindOf("iron wire")!.perCentimetre).toBeCloseTo(2.7 * CALORIE, 1);
});

test("length and mass of a wire tell the same heat: 34 gauge is 0.160 mm thick (common practice)", () => {
  // Densities 8.4 and 7.87 g/cm3; the printed heats by length and by mass agree within a tenth.
  for (const [kind, density] of [
    ["nickel-chromium wire", 8.4],
    ["iron wire", 7.87],
  ] as const) {
    const { perCentimetre, perGram } = burningKindOf(kind)!;
    const gramsPerCentimetre = density * (Math.PI / 4) * 0.016 ** 2;
    expect(Math.abs((perGram! * gramsPerCentimetre) / perCentimetre! - 1)).toBeLessThan(0.1);
  }
});

test("acids: 6.0 J/mL, 94.1 J for each per cent and gram, 15.1 J/mL, 14.1 calories for each milliequivalent", () => {
  expect(acidMolarHeats.nitric * 1e-4).toBeCloseTo(6.0, 12);
  expect(acidMolarHeats.sulfuric / atomicWeights.get("S")! / 100).toBeCloseTo(94.1, 1);
  expect(acidMolarHeats.titratedSulfuric * 0.05e-3).toBeCloseTo(15.1, 12);
  expect(14.1 * CALORIE).toBeCloseTo(acidMolarHeats.nitric / 1000, -1); // 59.0 kJ/mol of another family of methods, from memory
});

test("soot: the heat of combustion of graphite, 393.5 kJ/mol by CODATA, within 1 %", () => {
  expect(Math.abs(sootHeat / (393510 / atomicWeights.get("C")!) - 1)).toBeLessThan(0.01);
});

test("the certificate's own conditions are inside its limits", () => {
  for (const { reference, least, most } of [certificate.pressure, certificate.sampleLoad, certificate.waterLoad, certificate.temperature]) {
    expect(reference).toBeGreaterThan(least);
    expect(reference).toBeLessThan(most);
  }
  // p M/(R T) of saturated vapour at 25 °C, 3169 Pa
  expect(certificate.saturatedLoad).toBeCloseTo((3169 * 18.015) / (8.314462618 * 298.15) / 1000, 3);
});

test("oxygen reckoned from the heat: methane, benzoic acid and carbon lie within 6.5 % of 13.1 kJ/g, by CODATA enthalpies", () => {
  const oxygen = 2 * atomicWeights.get("O")!;
  for (const heatPerMoleOfOxygen of [890_700 / 2, 3_226_900 / 7.5, 393_510]) {
    expect(Math.abs(heatPerMoleOfOxygen / oxygen / chargeRules.heatPerOxygen - 1)).toBeLessThan(0.065);
  }
  expect(chargeRules.cautionPressure).toBeCloseTo(30 * 0.101325, 9);
});

test("carbonate of the double titration can take all the barium holds in", () => {
  expect(2 * titration.carbonate * titration.carbonateVolume).toBeCloseTo(2, 12);
  expect(buoyancy).toEqual({ weights: 8, air: 0.0012 });
});

test("a name means one kind", () => {
  const names = burningKinds.flatMap(({ kind, names }) => [kind, ...names]);
  expect(new Set(names).size).toBe(names.length);
  expect(burningKindOf("  Cotton   Thread ")?.kind).toBe("cotton");
  expect(burningKindOf("straw")).toBeUndefined();
});
