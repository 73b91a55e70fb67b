import fc from "fast-check";
import { call, number, refusal } from "./helpers";

test("exact conversions of the trade", () => {
  expect(number("UNITS", 1, "Btu_IT/lb", "J/g")).toBe(2.326); // exact by definition of the international Btu
  expect(number("UNITS", 1, "cal_IT", "cal_th")).toBeCloseTo(4.1868 / 4.184, 14);
  expect(number("UNITS", 26434, "J/g", "cal_th/g")).toBeCloseTo(26434 / 4.184, 9);
  expect(number("UNITS", 1, "atm", "Pa")).toBe(101325);
  expect(number("UNITS", 25, "°C", "K")).toBe(298.15);
  expect(number("UNITS", 1, "kcal_IT/kg", "kJ/kg")).toBeCloseTo(4.1868, 14);
});

test("molar and mass units are linked by the substance", () => {
  expect(number("UNITS", 1, "kJ/mol", "kJ/kg", "H2O")).toBeCloseTo(1000 / 18.015, 10);
  expect(number("UNITS", 1, "kg", "mol", "CO2")).toBeCloseTo(1000 / 44.009, 10);
  expect(number("UNITS", 29, "J/(mol K)", "kJ/(kg K)", "air")).toBeCloseTo(29 / 28.9656, 4);
  expect(refusal("UNITS", 1, "J/mol", "J/g")).toContain("name the substance as fourth argument");
  expect(refusal("UNITS", 1, "J", "m")).toContain("cannot be converted into each other");
});

test("round trips", () => {
  const pairs = [
    ["bar", "psi"],
    ["kJ/(kg K)", "Btu_IT/(lb °F)"],
    ["°C", "°F"],
    ["L", "ft3"],
    ["kWh", "cal_th"],
  ] as const;
  fc.assert(
    fc.property(fc.constantFrom(...pairs), fc.double({ min: -1e6, max: 1e6, noNaN: true }), ([from, to], value) => {
      const there = number("UNITS", value, from, to);
      expect(Math.abs(number("UNITS", there, to, from) - value)).toBeLessThanOrEqual(1e-9 * Math.max(1, Math.abs(value)));
    }),
  );
});

test("a column of values and a column of units", () => {
  expect(call("UNITS", [[1], [2]], "bar", "Pa")).toEqual([[100000], [200000]]);
  expect(call("UNITS", 1, [["bar"], ["atm"]], "Pa")).toEqual([[100000], [101325]]);
});

test("gauge readings become absolute", () => {
  expect(number("UNITS.ABSOLUTE", 1, "bar")).toBe(201325);
  expect(number("UNITS.ABSOLUTE", 1, "barg", "bar", "985 mbar")).toBeCloseTo(1.985, 12);
  expect(number("UNITS.ABSOLUTE", 0, "psig", "atm")).toBe(1);
  expect(number("UNITS.ABSOLUTE", -0.5, "bar", "bar", "1 bar")).toBeCloseTo(0.5, 12);
  expect(refusal("UNITS.ABSOLUTE", -2, "bar")).toBe("#VALUE! A gauge reading of -2 bar lies below vacuum when the atmosphere is 101325 Pa");
  expect(refusal("UNITS.ABSOLUTE", 1, "kJ")).toContain('The unit "kJ" is not a pressure');
});

test("refusals say the way out", () => {
  expect(refusal("UNITS", 1, "cal", "J")).toMatch(/cal_th.*cal_IT/);
  expect(refusal("UNITS", 1, "barg", "Pa")).toContain("UNITS.ABSOLUTE");
  expect(refusal("UNITS", "one", "J", "kJ")).toBe('#VALUE! The value is the text "one"; a number is expected');
  expect(refusal("UNITS", 1, null, "kJ")).toBe("#VALUE! The unit from is missing");
});
