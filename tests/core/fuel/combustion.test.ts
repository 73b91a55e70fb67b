import fc from "fast-check";
import { combustionValues, THERMAL_ENERGY, type CombustionProducts, type Known } from "../../../src/core/fuel/combustion";
import { molarMass, parseFormula } from "../../../src/core/species/formula";
import { refusedWith } from "../refused";

/** CODATA key values, 1989 (from memory), kJ/mol. */
const products: CombustionProducts = {
  carbonDioxide: { species: "CO2(g)", formation: -393.51, uncertainty: 0.13 },
  water: { species: "H2O(l)", formation: -285.83, uncertainty: 0.04 },
  sulfurDioxide: { species: "SO2(g)", formation: -296.81, uncertainty: 0.2 },
};
const weights = new Map(Object.entries({ C: 12.011, H: 1.008, O: 15.999, N: 14.007, S: 32.06 }));

function values(text: string, known: Known) {
  const formula = parseFormula(text);
  return combustionValues(formula, molarMass(formula, weights), 31.998, known, products);
}

test("RT at 298.15 K is 2.478957 kJ/mol", () => {
  expect(THERMAL_ENERGY).toBeCloseTo(2.478957, 6); // 8.314462618 J/(mol K) × 298.15 K
});

test("methane from its enthalpy of formation, by hand", () => {
  // −393.51 − 2 × 285.83 + 74.6 = −890.57 kJ/mol; published −890.7 ± 0.4 (SRD 69)
  const found = values("CH4(g)", { kind: "formation", formation: -74.6 });
  expect(found.enthalpy).toBeCloseTo(-890.57, 10);
  expect(found.energy).toBeCloseTo(-890.57 + 2 * 2.478957, 5);
  expect(found.grossPressure).toBeCloseTo(890570 / 16.043, 8);
  expect(found.perOxygen).toBeCloseTo(found.energy / -63.996, 10);
});

test("the liquid and the gas of a compound differ by one RT in energy for one enthalpy", () => {
  const liquid = values("C8H18(l)", { kind: "enthalpy", enthalpy: -5461.3 });
  const gas = values("C8H18(g)", { kind: "enthalpy", enthalpy: -5461.3 });
  expect(gas.energy - liquid.energy).toBeCloseTo(THERMAL_ENERGY, 9);
});

test("energy, enthalpy and formation give one another back", () => {
  const count = fc.integer({ min: 1, max: 30 });
  fc.assert(
    fc.property(count, count, count, count, fc.double({ min: 5000, max: 60000, noNaN: true }), (c, h, n, s, gross) => {
      const text = `C${c}H${h}N${n}S${s}`;
      const first = values(text, { kind: "energy", gross });
      for (const known of [
        { kind: "enthalpy", enthalpy: first.enthalpy },
        { kind: "formation", formation: first.formation },
      ] as const) {
        const again = values(text, known);
        expect(Math.abs(again.grossVolume / gross - 1)).toBeLessThan(1e-11);
        expect(Math.abs(again.formation - first.formation)).toBeLessThan(1e-8);
      }
    }),
  );
});

test("a value from which combustion would take up heat is refused", () => {
  expect(refusedWith(() => values("CH4(g)", { kind: "formation", formation: -1000 }))).toBe(
    "range: The energy of combustion would be 39.7879 kJ/mol; combustion gives off heat, so it is negative",
  );
});
