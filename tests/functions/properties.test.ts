import fc from "fast-check";
import { GAS_CONSTANT } from "../../src/core/constants";
import { allSpecies, recordsOf } from "../../src/data/library";
import { call, number, refusal } from "./helpers";

/**
 * Change of internal energy from 298.15 K, kJ/mol, set nasa-2002; computed independently from the printed coefficients, three decimals.
 * That computation took RT with R of CODATA; here R of the fit (8.31451) is used, so the values differ by ΔR ΔT, 0.08 J/mol at 2000 K.
 */
const ENERGY_CHANGES: readonly (readonly [species: string, to: number, change: number])[] = [
  ["N2", 1000, 15.627],
  ["O2", 1000, 16.872],
  ["CO2", 1000, 27.564],
  ["H2O", 1000, 20.168],
  ["H2", 1000, 14.844],
  ["CO", 1000, 15.852],
  ["CH4", 1000, 32.849],
  ["N2", 2000, 41.986],
  ["O2", 2000, 45.052],
  ["H2O", 2000, 58.893],
  ["CH4", 2000, 114.304],
];

test.each(ENERGY_CHANGES)("the energy change of %s from 298.15 to %d K is %d kJ/mol", (species, to, change) => {
  const difference = number("CV.INTEGRAL", species, 298.15, to, "kJ/mol", "nasa-2002") - change;
  expect(Math.abs(difference)).toBeLessThan(0.0005 + ((8.31451 - GAS_CONSTANT) * (to - 298.15)) / 1000);
});

/** The Shomate fits of SRD 69 are fits to JANAF 1998; the values are differences of printed JANAF enthalpies minus R ΔT, in kJ/mol. */
test.each([
  ["CO", 1000, 15.848],
  ["CH4", 1000, 32.342],
  ["CH4", 2000, 109.469],
] as const)("SRD 69 gives %s to %d K as %d kJ/mol", (species, to, change) => {
  // 0.01 kJ/mol: the Shomate fits reproduce the printed table to a few joules per mole
  expect(Math.abs(number("CV.INTEGRAL", species, 298.15, to, "kJ/mol", "srd69-shomate") - change)).toBeLessThan(0.01);
});

test("dry air from 300 K to 1000 and 2000 K", () => {
  // Computed independently from the printed nasa-2002 coefficients
  expect(number("CV.INTEGRAL", "air", 300, 1000, "kJ/kg")).toBeCloseTo(545.12, 2);
  // Ideal-gas table of air in engineering textbooks, u in kJ/kg (from memory): 214.07 at 300 K, 758.94 at 1000 K, 1678.7 at 2000 K.
  // 0.06 %: the table rests on older heat capacities and another composition
  expect(Math.abs(number("CV.INTEGRAL", "air", 300, 1000, "kJ/kg") / (758.94 - 214.07) - 1)).toBeLessThan(6e-4);
  expect(Math.abs(number("CV.INTEGRAL", "air", 300, 2000, "kJ/kg") / (1678.7 - 214.07) - 1)).toBeLessThan(6e-4);
  // The textbook Otto cycle with 800 kJ/kg runs from 652.4 K to 1575.1 K (from memory)
  expect(Math.abs(number("CV.INTEGRAL", "air", 652.4, 1575.1, "kJ/kg") / 800 - 1)).toBeLessThan(1e-4);
});

test("N2: true and mean Cv, the usual shortcut and its error", () => {
  expect(number("CV.AT", "N2", 298.15)).toBeCloseTo(20.81, 2); // JANAF: Cp 29.124 - R 8.314
  expect(number("CV.MEAN", "N2", 298.15, 1500)).toBeCloseTo(23.64, 2);
  expect(number("CV.AT", "N2", 1500)).toBeCloseTo(26.53, 2);
});

test("formation values: H(298.15 K) and U(298.15 K)", () => {
  expect(number("ENTHALPY", "CO2", 298.15)).toBeCloseTo(-393510, 0); // CODATA 1989: -393.51 +- 0.13 kJ/mol
  expect(number("ENTHALPY", "H2O(l)", 298.15)).toBeCloseTo(-285830, 0); // CODATA 1989: -285.830 +- 0.040 kJ/mol
  expect(number("ENERGY", "N2", 298.15)).toBeCloseTo(-8.31451 * 298.15, 1); // R of the fit
  expect(number("ENERGY", "H2O(l)", 298.15)).toBe(number("ENTHALPY", "H2O(l)", 298.15));
});

test("entropies of CODATA 1989 at 1 bar, and the effect of pressure", () => {
  expect(number("ENTROPY", "N2", 298.15)).toBeCloseTo(191.609, 2); // +- 0.004
  expect(number("ENTROPY", "CO2", 298.15)).toBeCloseTo(213.785, 1); // +- 0.010; the fit gives 213.79
  expect(number("ENTROPY", "Ar", 298.15)).toBeCloseTo(154.846, 2); // +- 0.003
  const fall = number("ENTROPY", "N2", 298.15) - number("ENTROPY", "N2", 298.15, "10 bar");
  expect(fall).toBeCloseTo(8.31451 * Math.log(10), 10);
  expect(number("ENTROPY", "H2O(l)", 298.15, "10 bar")).toBe(number("ENTROPY", "H2O(l)", 298.15));
});

test("entropies are given at the pressure asked for, whatever the standard pressure of the record", () => {
  // N2 of gri-1999 is printed for 1 atm, O2 for 1 bar; CODATA 1989 at 1 bar: 191.609 and 205.152 J/(mol K)
  expect(number("ENTROPY", "N2", 300, "1 bar", null, "gri-1999") - number("ENTROPY", "N2", 300, "1 bar")).toBeCloseTo(0, 1);
  expect(Math.abs(number("ENTROPY", "O2", 298.15, "1 bar", null, "gri-1999") - 205.152)).toBeLessThan(0.01);
  for (const species of ["N2", "O2"]) {
    const fall = number("ENTROPY", species, 300, "1 bar", null, "gri-1999") - number("ENTROPY", species, 300, "1 atm", null, "gri-1999");
    expect(fall).toBeCloseTo(8.31451 * Math.log(1.01325), 10);
  }
});

test("classical limits: 3/2 R, 5/2 R, 3 R and R for each vibration", () => {
  const inR = (species: string) => call("CV.LIMITS", species)[0]!.map((cell) => Number(cell) / GAS_CONSTANT);
  expect(inR("Ar")).toEqual([1.5, 1.5]);
  expect(inR("N2")).toEqual([2.5, 3.5]);
  expect(inR("CO2")).toEqual([2.5, 6.5]);
  expect(inR("H2O")).toEqual([3, 6]);
  expect(inR("CH4")).toEqual([3, 12]);
  expect(call("CV.LIMITS", [["Ar"], ["N2"]])).toHaveLength(2);
  expect(refusal("CV.LIMITS", "H2O(l)")).toBe("#VALUE! CV.LIMITS is for gases; H2O(l) holds a liquid or a solid");
});

test("gamma: 5/3 of atoms, falling with temperature for air", () => {
  expect(number("GAMMA", "Ar", 300)).toBeCloseTo(5 / 3, 5);
  expect(number("GAMMA", "air", 300)).toBeCloseTo(1.4, 2);
  expect(number("GAMMA", "air", 1500)).toBeLessThan(1.32);
  expect(refusal("GAMMA", "C(gr)", 300)).toContain("GAMMA is for gases");
});

test("molar masses from the CIAAW weights, for species, names, formulas and mixtures", () => {
  expect(number("MOLARMASS", "H2O")).toBeCloseTo(18.015, 12);
  expect(number("MOLARMASS", "C")).toBe(12.011); // a formula, though not a species
  expect(number("MOLARMASS", "n-C4H10")).toBeCloseTo(4 * 12.011 + 10 * 1.008, 10);
  expect(number("MOLARMASS", "C7H6O2")).toBeCloseTo(122.123, 10);
  expect(number("MOLARMASS", "CuSO4·5H2O", "kg/mol")).toBeCloseTo(0.249677, 6);
  expect(number("MOLARMASS", "air")).toBeCloseTo(28.9656, 3);
  expect(refusal("MOLARMASS", "benzodust")).toMatch(/^#N\/A/);
});

test("units of the result: molar and by mass agree through the molar mass", () => {
  fc.assert(
    fc.property(fc.constantFrom("N2", "CO2", "air", "H2O"), fc.double({ min: 250, max: 3000, noNaN: true }), (substance, temperature) => {
      const molar = number("CV.AT", substance, temperature);
      const byMass = number("CV.AT", substance, temperature, "J/(g K)");
      expect(byMass * number("MOLARMASS", substance)).toBeCloseTo(molar, 10);
      expect(number("CV.AT", substance, temperature, "cal_th/(mol K)") * 4.184).toBeCloseTo(molar, 10);
    }),
  );
});

test("a range call is bit for bit the single calls, for every species and set", () => {
  for (const { key, phase } of allSpecies()) {
    for (const record of recordsOf(key)) {
      const id = phase === "l" ? "CP.AT" : "CV.AT";
      const [low, high] = call("SOURCE.RANGE", key, record.set)[0] as [number, number];
      const temperatures = Array.from({ length: 7 }, (_, index) => [low + ((high - low) * index) / 6]);
      const column = call(id, key, temperatures, null, record.set);
      temperatures.forEach(([temperature], row) => expect(column[row]![0]).toBe(number(id, key, temperature, null, record.set)));
    }
  }
});

test("Cp - Cv is the gas constant of the fit, and H - U = RT, for every gas and set", () => {
  for (const { key, phase } of allSpecies()) {
    if (phase !== "g") continue;
    for (const record of recordsOf(key)) {
      const [low, high] = call("SOURCE.RANGE", key, record.set)[0] as [number, number];
      const temperature = (low + high) / 2;
      expect(number("CP.AT", key, temperature, null, record.set) - number("CV.AT", key, temperature, null, record.set)).toBeCloseTo(
        record.gasConstant,
        9,
      );
      if (record.onFormationScale === false || record.form === "power" || record.form === "molecular") continue;
      const difference = number("ENTHALPY", key, temperature, null, record.set) - number("ENERGY", key, temperature, null, record.set);
      expect(difference / (record.gasConstant * temperature)).toBeCloseTo(1, 9);
    }
  }
});

test("a mixture is the sum of its parts", () => {
  fc.assert(
    fc.property(fc.double({ min: 0.01, max: 0.99, noNaN: true }), fc.double({ min: 300, max: 3000, noNaN: true }), (share, temperature) => {
      const text = `${share} CO2 + ${1 - share} Ar`;
      const parts = share * number("ENERGY", "CO2", temperature) + (1 - share) * number("ENERGY", "Ar", temperature);
      expect(number("ENERGY", text, temperature) / parts).toBeCloseTo(1, 11);
    }),
  );
});

test("extrapolation is asked for, holds the end value of Cv, and is refused for condensed species", () => {
  const end = number("CV.AT", "CO2", 3500, null, "gri-1999");
  expect(number("CV.AT", "CO2", 5200, null, "gri-1999; extrapolate")).toBe(end);
  expect(number("CV.INTEGRAL", "CO2", 3500, 4500, null, "gri-1999; extrapolate")).toBeCloseTo(1000 * end, 5);
  expect(refusal("CP.AT", "H2O(l)", 700, null, "nasa-2002; extrapolate")).toContain("is not extrapolated");
});
