import { ACCURACY, allSpecies } from "../../src/data/library";
import { disagreement } from "../../src/functions/disagreement";

describe("sets that differ by more than their grades allow", () => {
  const found = allSpecies().flatMap(({ key }) =>
    disagreement(key).map((one) => `${key}: ${one.property} of ${one.setB} against ${one.setA}`),
  );

  test("are these", () => {
    expect(found).toEqual([
      "CH4: Cp of srd69-shomate against nasa-2002",
      "CH4: Cp of srd69-shomate against aramco-2013",
      "CH4: Cp of gri-1999 against aramco-2013",
      "CH4: Cp of gri-1999 against srd69-shomate",
      "NO2: Cp of srd69-shomate against nasa-2002",
      "NO2: Cp of srd69-shomate against gri-1999",
      "C(gr): Cp of felder-b2 against nasa-2002",
      "N2H4: Cp of c3mech-2022 against hychem-2018",
      "N2H4: H(298.15 K) of c3mech-2022 against hychem-2018",
      "HCN: H(298.15 K) of gri-1999 against nasa-2002",
      "CH2CO: S(298.15 K) of hashemi-2016 against gri-1999",
      "C3H6: S(298.15 K) of usc-2007 against aramco-2013",
      "C3H6: S(298.15 K) of molecular against usc-2007",
      "acetone: Cp of felder-b2 against usc-2007",
      "CaO(cr): Cp of felder-b2 against srd69-shomate",
      "OH: H(298.15 K) of gri-1999 against nasa-2002",
    ]);
  });

  test("say by how much: methane 11.6 % at 3000 K, hydroxyl 2.07 kJ/mol", () => {
    const methane = disagreement("CH4")[0]!;
    expect(methane).toMatchObject({ temperature: 3000, property: "Cp", setA: "nasa-2002", setB: "srd69-shomate" });
    expect(methane.percent).toBeCloseTo(-11.57, 1);
    const hydroxyl = disagreement("OH")[0]!;
    expect(hydroxyl.difference).toBeCloseTo(2068.9, 0);
    expect(hydroxyl.allowed).toBeCloseTo(1000 * Math.SQRT2, 6);
  });

  test("exceed what is allowed, and what is allowed grows from A to C", () => {
    for (const { key } of allSpecies()) for (const one of disagreement(key)) expect(Math.abs(one.difference)).toBeGreaterThan(one.allowed);
    for (const quantity of ["cp", "enthalpy", "entropy"] as const)
      expect(ACCURACY.A[quantity] < ACCURACY.B[quantity] && ACCURACY.B[quantity] < ACCURACY.C[quantity]).toBe(true);
  });

  test("an unknown species is refused", () => expect(() => disagreement("N3")).toThrow(expect.objectContaining({ kind: "absent" })));
});
