import { water } from "../../src/functions/steam";
import { call, number, refusal } from "./helpers";

describe("printed values in cells", () => {
  // IAPWS R6-95, Tables 7 and 8 (from memory), nine digits.
  test.each([
    ["WATER.PRESSURE", [838.025, 500, "MPa"], 10.0003858],
    ["WATER.PRESSURE", [0.241, 900, "MPa"], 0.100062559],
    ["WATER.CV", [996.556, 300, "kJ/(kg K)"], 4.13018112],
    ["WATER.CV", [870.769, 900, "kJ/(kg K)"], 2.6642235],
    ["WATER.SATURATION", [450, "MPa"], 0.932203564],
    ["WATER.SATURATION", [625, "MPa"], 16.9082693],
  ] as const)("%s %j", (id, values, printed) => {
    expect(Number(number(id, ...values).toPrecision(9))).toBe(printed);
  });

  test("energy, computed elsewhere from the same coefficients, 12 digits", () => {
    expect(number("WATER.ENERGY", 838.025, 500, "kJ/kg")).toBeCloseTo(965.248345538727, 9);
  });
});

describe("units", () => {
  test("text in every place", () => {
    expect(number("WATER.PRESSURE", "0.838025 g/cm3", "226.85 °C", "bar")).toBeCloseTo(number("WATER.PRESSURE", 838.025, 500) / 1e5, 6);
  });

  test("by mass as computed, molar by the molar mass of the table of atomic weights", () => {
    const cv = number("WATER.CV", 838.025, 500);
    expect(number("WATER.CV", 838.025, 500, "J/(kg K)")).toBe(cv);
    // CIAAW, abridged: 2 × 1.0080 + 15.999 g/mol.
    expect(number("WATER.CV", 838.025, 500, "J/(mol K)") / cv).toBeCloseTo(0.018015, 12);
    expect(number("WATER.ENERGY", 838.025, 500, "kJ/mol") / number("WATER.ENERGY", 838.025, 500)).toBeCloseTo(0.018015e-3, 15);
  });

  test.each([
    ["WATER.PRESSURE", [838.025, 500, "J"], '#VALUE! The unit "J" does not fit this result; give a pressure such as "MPa"'],
    [
      "WATER.CV",
      [838.025, 500, "MPa"],
      '#VALUE! The unit "MPa" does not fit this result; give a heat capacity such as "J/(mol K)" or "kJ/(kg K)"',
    ],
    [
      "WATER.ENERGY",
      [838.025, 500, "kJ"],
      '#VALUE! The unit "kJ" does not fit this result; give an energy by amount or mass such as "kJ/mol" or "kJ/kg"',
    ],
    ["WATER.SATURATION", [450, "nasa-2002"], '#VALUE! "nasa-2002" is a set id; the unit comes first, the set after it'],
  ] as const)("%s %j is refused", (id, values, sentence) => {
    expect(refusal(id, ...values)).toBe(sentence);
  });
});

describe("two phases", () => {
  test("between the saturated densities the pressure is that of saturation", () => {
    expect(number("WATER.PRESSURE", 100, "100 °C")).toBe(number("WATER.SATURATION", "100 °C"));
  });

  test("cv is what the energy takes up at constant overall density", () => {
    const u = (temperature: number) => number("WATER.ENERGY", 50, temperature);
    const h = 1e-2;
    const slope = (u(500 - 2 * h) - 8 * u(500 - h) + 8 * u(500 + h) - u(500 + 2 * h)) / (12 * h);
    // Rounding of 1e-9 J/kg in MJ/kg over the step.
    expect(Math.abs(number("WATER.CV", 50, 500) / slope - 1)).toBeLessThan(1e-9);
  });
});

describe("ranges", () => {
  test("a column of densities at one temperature, each its own value or refusal", () => {
    const [one, two, three] = call("WATER.PRESSURE", [[1], [100], [2000]], [[500]], [["MPa"]]);
    expect(one![0]).toBe(water.state(500, 1).pressure / 1e6);
    expect(two![0]).toBe(water.saturation(500).pressure / 1e6);
    expect(String((three![0] as { message: string }).message)).toMatch(
      /^Density 2000 kg\/m3 at 500 K would need .* MPa, above 1000 MPa, the limit of IAPWS-95$/,
    );
  });

  test("a row of temperatures", () => {
    expect(call("WATER.SATURATION", [[300, 400]])).toEqual([[water.saturation(300).pressure, water.saturation(400).pressure]]);
  });

  test("shapes that differ are refused", () => {
    expect(refusal("WATER.CV", [[1], [2]], [[300, 400]])).toMatch(/^#VALUE! The ranges differ in shape/);
  });
});

describe("refusals", () => {
  test.each([
    ["WATER.PRESSURE", [1400, 300], "#VALUE! Density 1400 kg/m3 at 300 K would need 2534.16 MPa, above 1000 MPa, the limit of IAPWS-95"],
    [
      "WATER.PRESSURE",
      [1000, 25],
      '#VALUE! Temperature 25 K is below 273.16 K, the triple point and the lower limit of IAPWS-95; for degrees Celsius write "25 °C"',
    ],
    [
      "WATER.PRESSURE",
      [800, 250],
      '#VALUE! Temperature 250 K is below 273.16 K, the triple point and the lower limit of IAPWS-95; for degrees Celsius write "250 °C"',
    ],
    [
      "WATER.PRESSURE",
      [1000, "-10 °C"],
      "#VALUE! Temperature 263.15 K is below 273.16 K, the triple point and the lower limit of IAPWS-95",
    ],
    ["WATER.CV", [0, 300], "#VALUE! Density 0 kg/m3 is not above 0 kg/m3"],
    ["WATER.CV", [322, 647.096], "#VALUE! The heat capacity of water has no finite value at the critical point, 647.096 K and 322 kg/m3"],
    ["WATER.CV", ["1 kg", 300], '#VALUE! Density "1 kg" is a mass; a density such as kg/m3 is expected'],
    ["WATER.ENERGY", [undefined, 300], '#VALUE! Density is missing: give a number in kg/m3, or a text such as "0.8 g/cm3"'],
    ["WATER.SATURATION", [700], "#VALUE! Temperature 700 K is above 647.096 K, the critical point: water has no saturation there"],
    [
      "WATER.SATURATION",
      [100],
      '#VALUE! Temperature 100 K is below 273.16 K, the triple point and the lower limit of IAPWS-95; for degrees Celsius write "100 °C"',
    ],
  ] as const)("%s %j", (id, values, sentence) => {
    expect(refusal(id, ...values)).toBe(sentence);
  });

  test("the Cv of liquid water is refused with the way to WATER.CV", () => {
    expect(refusal("CV.AT", "H2O(l)", 300)).toBe(
      "#VALUE! H2O(l) is liquid, and the Cv of a liquid is not its Cp; use CP.AT, or WATER.CV for water",
    );
  });
});
