/** What is refused, with the sentence a person reads. */
import { Refusal } from "../../../src/core/refusal";
import {
  absoluteOfGauge,
  beginsWithNumber,
  isUnit,
  parseQuantity,
  parseUnit,
  parseUnitOf,
  requireDimension,
  dimensions,
} from "../../../src/core/units";

function refusal(act: () => unknown): Refusal {
  try {
    act();
  } catch (thrown) {
    if (thrown instanceof Refusal) return thrown;
    throw thrown;
  }
  throw new Error("not refused");
}

test.each([
  ["cal", '"cal" has several sizes: say cal_th (4.184 J), cal_IT (4.1868 J), cal_15 (4.1858 J) or cal_20 (4.1819 J)'],
  ["CAL", "say cal_th (4.184 J)"],
  ["kcal", "say kcal_th (4184 J), kcal_IT (4186.8 J), kcal_15 (4185.8 J) or kcal_20 (4181.9 J)"],
  ["Cal", "say kcal_th (4184 J)"],
  ["kcal/kg", '"kcal" in "kcal/kg" has several sizes'],
  ["cal/(mol K)", '"cal" in "cal/(mol K)" has several sizes'],
  ["calories", "say cal_th"],
  ["Gcal", "say which calorie"],
  ["Btu", '"Btu" has several sizes: say Btu_IT (1055.05585262 J) or Btu_th (1054.350 J)'],
  ["BTU/lb", '"BTU" in "BTU/lb" has several sizes'],
  ["MMBtu", "MMBtu_IT or MMBtu_th"],
  ["MBtu", "Btu_IT"],
  ["gal", "say gal_US (3.785411784 L) or gal_UK (4.54609 L)"],
  ["ton", "say t (1000 kg), ton_US (2000 lb) or ton_UK (2240 lb)"],
  ["M", "say mol/L"],
  ["barg", '"barg" is a gauge pressure, and pressures here are absolute: use UNITS.ABSOLUTE(value, "bar")'],
  ["bar(g)", 'use UNITS.ABSOLUTE(value, "bar")'],
  ["bar g", 'use UNITS.ABSOLUTE(value, "bar")'],
  ["psig", 'use UNITS.ABSOLUTE(value, "psi")'],
  ["PSIG", "use UNITS.ABSOLUTE"],
  ["kPag", 'use UNITS.ABSOLUTE(value, "kPa")'],
  ["MPa(g)", 'use UNITS.ABSOLUTE(value, "MPa")'],
  ["mbar gauge", 'use UNITS.ABSOLUTE(value, "mbar")'],
  ["atü", 'use UNITS.ABSOLUTE(value, "at")'],
  ["kgf/cm2 g", 'use UNITS.ABSOLUTE(value, "kgf/cm2")'],
  ["barg/min", "gauge pressure"],
  ["kJ/(mol C", '"kJ/(mol C" lacks a closing bracket'],
  ["kJ/mol)", "closing bracket too many"],
  ["kJ/()", "empty or unfinished bracket"],
  ["J/", "something is missing at its end"],
  ["J//K", "operator where a unit should stand"],
  ["/K", "operator where a unit should stand"],
  ["J/mol K", '"J/mol K" can be read in two ways: put what stands below the line in brackets, such as "J/(mol K)"'],
  ["J/mol·K", 'such as "J/(mol·K)"'],
  ["kJ/kg-K", "can be read in two ways"],
  ["J/mol K-1", "can be read in two ways"],
  ["J/(kg K)/mol s", "can be read in two ways"],
  ["kJ/(kg Q)", '"Q" in "kJ/(kg Q)" is not a unit Stillwall knows'],
  ["bra", "nearest: bar"],
  ["J/(mul K)", '"mul" in "J/(mul K)" is not a unit Stillwall knows; nearest: '],
  ["calth", "nearest: cal_th"],
  ["Kelvn", "nearest: kelvin"],
  ["mpa", "nearest: MPa"],
  ["MBAR", "nearest: mbar"],
  ["MOL", "nearest: mol"],
  ["mw", "nearest: "],
  ["m^0", "power 0"],
  ["m^10", "cannot be read as a unit"],
  ["m^0.5", "cannot be read as a unit"],
  ["m^", "cannot be read as a unit"],
  ["(m s)^2", "cannot be read as a unit"],
  ["TJ^9 TJ^9 TJ^9", "beyond the range of numbers"],
  ["1/(TJ^9 TJ^9 TJ^9 TJ^9)", "beyond the range of numbers"],
  ["3 J", "number where a unit should stand"],
  ["", "The unit is empty"],
  ["  ", "The unit is empty"],
  ["nasa-2002", "is not a unit Stillwall knows"],
  ["x".repeat(5000), "it has 5000 characters"],
  ["constructor", "is not a unit Stillwall knows"],
  ["__proto__", "cannot be read as a unit"],
])("the unit %s", (text, sentence) => {
  const { kind, message } = refusal(() => parseUnit(text));
  expect(kind).toBe("input");
  expect(message).toContain(sentence);
  expect(isUnit(text)).toBe(false);
});

test.each([
  ["2,5 bar", '"2,5 bar" has a decimal comma; write a point: "2.5 bar"'],
  ["1,000 Pa", "write 1000 or 1.000"],
  ["1,234.5 Pa", "a comma"],
  ["10 000 Pa", "has a thousands mark; write the number without it"],
  ["10\u202f000 Pa", "has a thousands mark"],
  ["10'000 Pa", "has a thousands mark"],
  ["2 × 10^5 Pa", "write it as 1e5"],
  ["1.2.3 bar", "one readable number"],
  ["bar", "does not begin with a number"],
  ["", "does not begin with a number"],
  ["NaN K", "does not begin with a number"],
  ["Infinity K", "does not begin with a number"],
  ["1e999 Pa", "beyond the largest number"],
  ["3 barg", "UNITS.ABSOLUTE"],
  ["5 kcal", "say kcal_th"],
  ["5 quux", "is not a unit"],
  ["1".repeat(400), "it has 400 characters"],
])("the quantity %s", (text, sentence) => {
  const { kind, message } = refusal(() => parseQuantity(text));
  expect(kind).toBe("input");
  expect(message).toContain(sentence);
});

test("a text begins with a number exactly where parseQuantity finds one", () => {
  for (const text of ["25 °C", " -5 K", "\u22125 K", ".5 bar", "1,5 bar", "60kg"]) expect(beginsWithNumber(text)).toBe(true);
  for (const text of ["bar", "", "NaN K", "steel 60 kg", "- 5 K", "e5 Pa"]) {
    expect(beginsWithNumber(text)).toBe(false);
    expect(refusal(() => parseQuantity(text)).message).toContain("does not begin with a number");
  }
});

test("a remembered refusal is the same refusal", () => {
  expect(refusal(() => parseUnit("kcal"))).toBe(refusal(() => parseUnit("kcal")));
  expect(refusal(() => parseQuantity("7 kcal"))).toBe(refusal(() => parseQuantity("7 kcal")));
});

test("the unit inside a gauge unit is found for UNITS.ABSOLUTE", () => {
  expect(["barg", "bar(g)", "psig", "kPa gauge"].map(absoluteOfGauge)).toEqual(["bar", "bar", "psi", "kPa"]);
  expect(["bar", "bara", "kg", "", "g"].map(absoluteOfGauge)).toEqual([undefined, undefined, undefined, undefined, undefined]);
});

test("a wrong dimension names what came and what is expected", () => {
  expect(refusal(() => requireDimension(parseQuantity("2 bar").unit, dimensions.energy, '"2 bar"')).message).toBe(
    '"2 bar" is a pressure; an energy such as kJ is expected',
  );
  expect(refusal(() => requireDimension(parseUnit("K"), [dimensions.mass, dimensions.amount], '"5 K"')).message).toBe(
    '"5 K" is a temperature; a mass such as g or an amount of substance such as mol is expected',
  );
  expect(refusal(() => parseUnitOf("kg m s", dimensions.time)).message).toBe(
    '"kg m s" is a quantity in kg m s; a time such as s is expected',
  );
  expect(refusal(() => parseUnitOf("bar", dimensions.number)).message).toBe('"bar" is a pressure; a pure number is expected');
  expect(() => requireDimension(parseUnit("g"), [dimensions.mass, dimensions.amount], "g")).not.toThrow();
  expect(parseUnitOf("kJ", dimensions.energy).scale).toBe(1000);
});
