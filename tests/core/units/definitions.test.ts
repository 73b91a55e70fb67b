/**
 * Sizes of units against printed definitions.
 *
 * SI brochure = BIPM, The International System of Units, 9th edition (2019), tables 4 and 8, chapter 3.
 * SP 811 = NIST Special Publication 811 (2008), appendix B.8; the digits below were written down from memory of that table,
 * with seven figures as it prints them, and bold (exact) where it prints bold.
 */
import { exactSize } from "../../../src/core/units/exact";
import { insideExpression } from "../../../src/core/units/grammar";
import { parseUnit } from "../../../src/core/units";
import { decimal, ulpsApart } from "./exact-decimal";

/** Exact by definition: the ratio of integers must be the definition itself. */
const exactDefinitions: readonly (readonly [unit: string, size: string, dimension: string])[] = [
  ["min", "60", "s"], // SI brochure table 8
  ["h", "3600", "s"],
  ["d", "86400", "s"],
  ["L", "0.001", "m^3"],
  ["t", "1000", "kg"],
  ["bar", "1e5", "kg m^-1 s^-2"], // SP 811
  ["mbar", "100", "kg m^-1 s^-2"],
  ["atm", "101325", "kg m^-1 s^-2"],
  ["at", "98066.5", "kg m^-1 s^-2"],
  ["kgf/cm2", "98066.5", "kg m^-1 s^-2"],
  ["torr", "101325/760", "kg m^-1 s^-2"],
  ["mmHg", "133.322387415", "kg m^-1 s^-2"], // 13595.1 kg/m3 × 9.80665 m/s2 × 0.001 m
  ["inHg", "3386.388640341", "kg m^-1 s^-2"],
  ["mmH2O", "9.80665", "kg m^-1 s^-2"],
  ["inH2O", "249.08891", "kg m^-1 s^-2"],
  ["lb", "0.45359237", "kg"],
  ["oz", "0.028349523125", "kg"],
  ["lbf", "4.4482216152605", "kg m s^-2"], // 0.45359237 kg × 9.80665 m/s2
  ["psi", "4.4482216152605/0.00064516", "kg m^-1 s^-2"],
  ["ft3", "0.028316846592", "m^3"],
  ["in3", "0.000016387064", "m^3"],
  ["gal_US", "0.003785411784", "m^3"],
  ["gal_UK", "0.00454609", "m^3"],
  ["cal_th", "4.184", "kg m^2 s^-2"],
  ["cal_IT", "4.1868", "kg m^2 s^-2"],
  ["cal_15", "4.18580", "kg m^2 s^-2"],
  ["cal_20", "4.18190", "kg m^2 s^-2"],
  ["Btu_IT", "1055.05585262", "kg m^2 s^-2"],
  ["MMBtu_IT", "1055055852.62", "kg m^2 s^-2"],
  ["kWh", "3.6e6", "kg m^2 s^-2"],
  ["erg", "1e-7", "kg m^2 s^-2"],
  ["eV", "1.602176634e-19", "kg m^2 s^-2"],
  ["Btu_IT/lb", "2326", "m^2 s^-2"],
  ["Btu_IT/(lb °F)", "4186.8", "m^2 s^-2 K^-1"],
  ["Btu_th/(lb °F)", "4184", "m^2 s^-2 K^-1"],
  ["cal_th/(g °C)", "4184", "m^2 s^-2 K^-1"],
  ["lbmol", "453.59237", "mol"],
  ["°R", "5/9", "K"],
  ["L atm", "101.325", "kg m^2 s^-2"],
  ["g/cm3", "1000", "kg m^-3"],
  ["g/L", "1", "kg m^-3"],
  ["mol/L", "1000", "m^-3 mol"],
  ["%", "0.01", "1"],
  ["ppm", "1e-6", "1"],
];

test.each(exactDefinitions)("%s is exactly %s in %s", (unit, size, dimension) => {
  const found = exactSize(insideExpression(unit, unit));
  expect(decimal(`${found.numerator}/${found.denominator}`).minus(decimal(size)).div(decimal(size)).abs().toNumber()).toBeLessThan(1e-75);
  expect(found.dimension).toBe(dimension);
});

test.each(exactDefinitions)("the scale of %s is the nearest double to %s", (unit, size) => {
  expect(ulpsApart(parseUnit(unit).scale, decimal(size))).toBeLessThanOrEqual(0.5);
});

/** SP 811, appendix B.8, rounded to seven figures as printed there. */
const printed: readonly (readonly [unit: string, factor: string])[] = [
  ["Btu_IT", "1.055056E+03"],
  ["Btu_th", "1.054350E+03"],
  ["Btu_th/lb", "2.324444E+03"],
  ["Btu_IT/h", "2.930711E-01"],
  ["cmHg", "1.333224E+03"],
  ["inHg", "3.386389E+03"],
  ["torr", "1.333224E+02"],
  ["psi", "6.894757E+03"],
  ["ksi", "6.894757E+06"],
  ["lbf", "4.448222E+00"],
  ["ft-lbf", "1.355818E+00"],
  ["oz", "2.834952E-02"],
  ["lb/ft3", "1.601846E+01"],
  ["ton_US", "9.071847E+02"],
  ["ton_UK", "1.016047E+03"],
  ["gal_US", "3.785412E-03"],
];

test.each(printed)("%s agrees with the printed %s", (unit, factor) => {
  expect(parseUnit(unit).scale.toExponential(6)).toBe(Number(factor).toExponential(6));
});
