/** Family calorimeter in cells: laboratory units, ranges, tables, and the sentence of every refusal. */
import { CellError } from "../../src/functions/cell";
import { call, number, refusal } from "./helpers";

/** Value beside a label of an upright table. */
const lineOf = (table: readonly (readonly unknown[])[], label: string) => table.find((row) => row[0] === label)?.[1];
const column = (...values: unknown[]) => values.map((value) => [value]);

describe("CAL.EQUIVALENT and CAL.GROSS", () => {
  test("a text in any unit gives what the plain number gives", () => {
    const plain = number("CAL.EQUIVALENT", 1.0012, 26434, 2.499819, [[205, 42]]);
    expect(plain).toBeCloseTo(10685.86, 2);
    expect(number("CAL.EQUIVALENT", "1001.2 mg", "26.434 MJ/kg", "2.499819 K", [["0.205 kJ", "42 J"]])).toBeCloseTo(plain, 8);
    expect(number("CAL.EQUIVALENT", 1.0012, 26434, `${2.499819 * 1.8} °F`, 247)).toBeCloseTo(plain, 8);
    expect(number("CAL.GROSS", "10.2 kJ/K", 2.75, 1, 122)).toBe(number("CAL.GROSS", 10200, 2.75, 1, 122));
  });

  test("heats are one row for each run, their columns added; blanks count nothing", () => {
    const values = call("CAL.GROSS", 10200, column(2.75, 2.8, 2.9), column(1, 1.01, 1.05), [
      [50, 30, 42],
      [50, null, 42],
      [50, "", 40],
    ]);
    expect(values).toEqual([[(10200 * 2.75 - 122) / 1], [(10200 * 2.8 - 92) / 1.01], [(10200 * 2.9 - 90) / 1.05]]);
  });

  test("one row of heats serves one run, or every run of a column", () => {
    expect(call("CAL.GROSS", 10200, column(2.75, 2.8), 1, [[50, 30]])).toEqual([[10200 * 2.75 - 80], [10200 * 2.8 - 80]]);
    expect(refusal("CAL.GROSS", 10200, [[2.75, 2.8]], 1, [[50, 30]])).toBe(
      "#VALUE! Heats are one row for each run, their columns added; the runs stand in 1 row × 2 columns: give the runs as one column",
    );
    expect(refusal("CAL.GROSS", 10200, column(2.75, 2.8), 1, column(50, 30, 40))).toBe(
      "#VALUE! The ranges differ in shape: heats has 3 rows × 1 column, rise has 2 rows × 1 column; give ranges of one shape, or single cells",
    );
  });

  test("each cell its own error, and an error cell comes out unchanged", () => {
    const values = call("CAL.GROSS", 10200, column(2.75, -1, new CellError("#DIV/0!"), 2.75), 1, [
      [50],
      [50],
      [50],
      [new CellError("#N/A")],
    ]).flat();
    expect(values[0]).toBeCloseTo(28000, 9);
    expect(values[1]).toMatchObject({ code: "#VALUE!", message: "Corrected rise -1 K is not above 0 K" });
    expect(values[2]).toMatchObject({ code: "#DIV/0!" });
    expect(values[3]).toMatchObject({ code: "#N/A" });
  });

  test("sulfur deducted twice: the sulfur column stands among the heats too", () => {
    expect(refusal("CAL.GROSS", 10200, 2.75, 1, [[50, 112.9]], 112.9)).toBe(
      '#VALUE! The heat of sulfuric acid 112.9 J also stands among the heats of this run: sulfur would be deducted twice; if it is another heat, write that as the text "112.9 J"',
    );
    expect(number("CAL.GROSS", 10200, 2.75, 1, [[50, 0]], 0)).toBeCloseTo(28000, 9);
  });

  test.each([
    [[10200, 2.75, 1, -50], "Heat -50 J is negative"],
    [[10200, 2.75, 1, 0, -3], "Heat of sulfuric acid -3 J is negative"],
    [[10200, 25.14, 1], "Corrected rise 25.14 K is above 15 K: give the rise, not the final temperature"],
    [[10.2, 2.75, 1], 'Energy equivalent 10.2 J/K is below 50 J/K: say "10.2 kJ/K"'],
    [[10200, 2.75, 1001.2], 'Sample mass 1001.2 g is above 50 g: say "1001.2 mg"'],
    [[10200, 2.75, 1, 0, 0, 0.05], "Soot 0.05 g is more than 1 % of the sample, 0.01 g: the combustion was incomplete; repeat the run"],
    [[10200, "2.75", 1], 'Corrected rise is the text "2.75", not a number: give a number in K, or a text such as "4.5 °F"'],
    [[10200, "2.75 J", 1], 'Corrected rise "2.75 J" is an energy; a temperature such as K is expected'],
    [[10200, null, 1], 'Corrected rise is missing: give a number in K, or a text such as "4.5 °F"'],
    [[10200, true, 1], 'Corrected rise is TRUE: give a number in K, or a text such as "4.5 °F"'],
  ] as const)("CAL.GROSS(%j) is refused", (given, sentence) => {
    expect(refusal("CAL.GROSS", ...given)).toBe(`#VALUE! ${sentence}`);
  });

  test("a factor that is none", () => {
    expect(refusal("CAL.EQUIVALENT", 1, 26434, 2.5, 0, 100.02)).toBe(
      "#VALUE! The condition factor 100.02 is not within 0.01 of 1; CAL.CERTIFICATE gives it, such as 1.0002",
    );
  });
});

describe("CAL.CERTIFICATE", () => {
  test("pressure in any unit, volume in mL or as text", () => {
    expect(number("CAL.CERTIFICATE", "40 atm", 1000 / 3, 1, 1, 25)).toBeCloseTo(1.0002, 9);
    expect(number("CAL.CERTIFICATE", 4.053, "0.3333333333 L", "1 g", "1000 mg", "298.15 K")).toBeCloseTo(1.0002, 9);
    expect(refusal("CAL.CERTIFICATE", "2.9 MPa", 0.34, 1, 1, 25)).toBe('#VALUE! Vessel volume 0.34 mL is below 5 mL: say "0.34 L"');
    expect(refusal("CAL.CERTIFICATE", "29 barg", 340, 1, 1, 25)).toBe(
      '#VALUE! Oxygen pressure: "barg" is a gauge pressure, and pressures here are absolute: use UNITS.ABSOLUTE(value, "bar")',
    );
    expect(refusal("CAL.CERTIFICATE", "30 atm", 340, 1, 1, 25, "beyond")).toBe(
      '#VALUE! The last argument is "beyond"; the only words it takes are "beyond limits"',
    );
  });

  test("the report carries the warning, and a column of states one row each", () => {
    const one = call("CAL.CERTIFICATE.REPORT", "30 atm", 340, 1, 0, 25);
    expect(lineOf(one, "condition factor")).toBeCloseTo(0.9999075, 7);
    expect(lineOf(one, "within limits")).toBe("no");
    expect(one.at(-1)![3]).toBe(
      "Water 0 g does not saturate the vessel, which takes 0.0078 g: the factor may be too high by some 0.0008; CAL.STANDARD counts the vapour",
    );
    expect(one.at(-2)).toEqual([
      "warning",
      "see note",
      "",
      "Water load 0 g/L is outside 2 to 4 g/L, the limits of the certificate's condition factor",
    ]);
    expect(call("CAL.CERTIFICATE.REPORT", "30 atm", 340, 1, 0.01, 25).filter(([label]) => label === "warning")).toHaveLength(1);
    const many = call("CAL.CERTIFICATE.REPORT", column("30 atm", "40 atm", "30 bla"), 1000 / 3, 1, 1, 25);
    expect(many[0]!.slice(0, 4)).toEqual(["condition factor", "within limits", "oxygen pressure [atm]", "oxygen pressure, share [1e-6]"]);
    expect(many[2]![0]).toBeCloseTo(1.0002, 9);
    expect(many[1]!.at(-1)).toBe("none");
    expect(many[3]!.every((cell) => cell instanceof CellError)).toBe(true);
    expect(refusal("CAL.CERTIFICATE.REPORT", [["30 atm", "40 atm"]], 340, 1, 1, 25)).toBe(
      "#VALUE! This function gives a table; give one state, or the states as one column, not 2 columns",
    );
  });
});

test("the standard state knows the step that the factor does not: 1 g of benzoic acid without and with water", () => {
  const vesselEnergy = (water: number) => {
    const table = call("CAL.STANDARD", "C7H6O2", 26434, 1.02, 340, water, "30 atm");
    return 2 * 26434 - Number(lineOf(table, "−ΔcU°")); // what the vessel would give for the same energy between standard states
  };
  const step = vesselEnergy(0) / vesselEnergy(1.02) - 1;
  const factor = (water: number) => number("CAL.CERTIFICATE", "30 atm", 340, 1.02, water, 25, "beyond limits");
  expect(step).toBeCloseTo(-0.00082, 4);
  expect(factor(0) / factor(1.02) - 1 - step).toBeCloseTo(0.0007, 4);
});

describe("acids", () => {
  test("CAL.SULFURIC needs its convention", () => {
    const words = '"separated" (nitric and sulfuric acid determined apart) or "total" (all acid titrated as nitric)';
    expect(refusal("CAL.SULFURIC", 1.2, 0.9)).toBe(`#VALUE! The convention is missing: say ${words}`);
    expect(refusal("CAL.SULFURIC", 1.2, 0.9, "both")).toBe(`#VALUE! The convention "both" is not ${words}`);
    expect(refusal("CAL.SULFURIC", 120, 0.9, "total")).toBe("#VALUE! Sulfur 120 % is not between 0 % and 100 %");
    expect(number("CAL.SULFURIC", "1.2 %", 0.9, "Separated")).toBe(number("CAL.SULFURIC", 1.2, "900 mg", "separated"));
    expect(refusal("CAL.SULFURIC", 1.2, 0.9, "total", 301.7)).toBe(
      '#VALUE! Molar heat of sulfuric acid 301.7 J/mol is below 1000 J/mol: say "301.7 kJ/mol"',
    );
  });

  test("CAL.ACIDS: both conventions deduct the same, and the mistake between them has its size", () => {
    const separated = call("CAL.ACIDS", 11.73737, 0.1, 1.2, 0.9, "separated");
    const total = call("CAL.ACIDS", 11.73737, 0.1, 1.2, 0.9, "total");
    const deducted = (table: typeof total) =>
      (Number(lineOf(table, "heat for the column of heats")) + Number(lineOf(table, "heat for sulfur_heat"))) / 0.9;
    expect(deducted(separated)).toBeCloseTo(deducted(total), 9);
    expect(deducted(separated)).toBeCloseTo(146.26, 2);
    expect(lineOf(separated, "gross value too low by, if deducted twice")).toBeCloseTo(44.9, 1);
    expect(separated.at(-1)![3]).toBe(
      'Never add a heat of the convention "total" to these: sulfur would be deducted twice, or not in full',
    );
    expect(call("CAL.ACIDS", 5, 0.1, 0, 0.9, "total").at(-1)!.slice(0, 2)).toEqual(["warnings", "none"]);
  });

  test("CAL.TITRATION: 30.0 J, 60.4 J, 6.41 mg", () => {
    const found = call("CAL.TITRATION", 9, 15);
    expect(found.slice(0, 2).map((row) => row[1])).toEqual([expect.closeTo(30, 9), expect.closeTo(60.4, 9)]);
    expect(lineOf(found, "sulfur in the washings")).toBeCloseTo(6.41, 2);
    expect(call("CAL.TITRATION", 4.5, 7.5, 10, [[0.1, 0.1, 0.2]])[0]![1]).toBeCloseTo(30, 9);
    expect(refusal("CAL.TITRATION", 9, 15, 20, [[0.05, 0.1]])).toBe(
      "#VALUE! Concentrations: 2; give three: barium hydroxide, sodium carbonate, hydrochloric acid, in mol/L",
    );
    expect(call("CAL.TITRATION", column(9, 9), column(15, 21))).toHaveLength(3);
  });
});

describe("CAL.HEATOF", () => {
  test("lengths, masses, other names, own heats", () => {
    expect(number("CAL.HEATOF", "nickel-chromium wire", 4.1)).toBeCloseTo(39.36, 9);
    expect(number("CAL.HEATOF", "Nickel-Chromium Wire", "41 mm")).toBeCloseTo(39.36, 9);
    expect(number("CAL.HEATOF", "iron wire", "7 mg")).toBeCloseTo(52.5, 9);
    expect(number("CAL.HEATOF", "oil", 0.1)).toBeCloseTo(4600, 9);
    expect(number("CAL.HEATOF", "oil", 0.1, "45.9 kJ/g")).toBeCloseTo(4590, 9);
    expect(number("CAL.HEATOF", "our capsules", 0.1, 19000)).toBeCloseTo(1900, 9);
    expect(call("CAL.HEATOF", "cotton", column(0.05, 0.06))).toEqual([[875], [1050]]);
  });

  test.each([
    [
      ["string", 0.1],
      '#N/A "string" is not a kind the library holds: nickel-chromium wire, iron wire, platinum wire, copper wire, cotton, paraffin oil, polyethylene, gelatin, benzoic acid; for another give its specific_heat in J/g',
    ],
    [
      ["iron wire", 15],
      "#VALUE! Iron wire consumed 15 cm is above 12 cm, larger than the wire: give what was consumed, the length fitted less the length that remained",
    ],
    [["cotton", 50], '#VALUE! Cotton consumed 50 g is above 0.5 g, larger than a run can hold: give grams, or a text such as "50 mg"'],
    [["cotton", "3 cm"], "#VALUE! No heat by length is known for cotton: give what was consumed by mass"],
    [["cotton", -0.01], "#VALUE! Cotton consumed -0.01 g is negative"],
    [
      ["cotton", "50 J"],
      '#VALUE! What was consumed of cotton is "50 J", neither a length nor a mass: give grams, or a text such as "50 mg"',
    ],
    [
      ["iron wire", 5, "6 kJ/g"],
      '#VALUE! The heat of combustion "6 kJ/g" does not fit what was consumed: give J/cm, or a text such as "9.6 J/cm"',
    ],
    [["iron wire"], '#VALUE! What was consumed of iron wire is missing: give centimetres, or a text such as "4.1 cm" or "7 mg"'],
    [[null, 1], '#VALUE! The kind is missing: give a text such as "nickel-chromium wire" or "cotton"'],
  ] as const)("CAL.HEATOF(%j) is refused", (given, sentence) => {
    expect(refusal("CAL.HEATOF", ...given)).toBe(sentence);
  });
});

describe("CAL.BUOYANCY", () => {
  test("units, and the density typed in kg/m3", () => {
    expect(number("CAL.BUOYANCY", 1, "1320 kg/m3")).toBeCloseTo(1.0007598, 7);
    expect(refusal("CAL.BUOYANCY", 1, 1320)).toBe('#VALUE! Density of the sample 1320 g/cm3 is above 25 g/cm3: say "1320 kg/m3"');
    expect(refusal("CAL.BUOYANCY", -1, 1.32)).toBe("#VALUE! Mass -1 g is not above 0 g");
  });
});

describe("CAL.CHARGE", () => {
  const limits = ["33 kJ", "4 MPa"];

  test("the table has verdict, reasons and cautions", () => {
    const table = call("CAL.CHARGE", 1, 26434, "25 atm", 340, ...limits, "C7H6O2");
    expect(lineOf(table, "verdict")).toBe("caution");
    expect(lineOf(table, "energy of the charge")).toBe(26434);
    expect(lineOf(table, "oxygen needed")).toBeCloseTo(1.965, 3); // 7.5 mol of O2 for each mole of C7H6O2
    expect(table.filter(([label]) => label === "standing caution")).toHaveLength(4);
    expect(table.at(-1)![3]).toBe("Caution: the charge is 80.1 % of the vessel's energy limit");
    expect(table.flat().join(" ")).toContain("local codes and licensed practice govern");
    expect(table.flat().join(" ")).not.toMatch(/\bsafe/i);
  });

  test("parts of a charge, one with a formula; blank rows are no parts", () => {
    const masses = column(0.5, 0.2, null);
    const energies = column(18000, 46000, null);
    const table = call("CAL.CHARGE", masses, energies, "30 bar", 340, ...limits, column("C6H10O5", null, null));
    expect(lineOf(table, "energy of the charge")).toBeCloseTo(18200, 9);
    const oxygen = (0.5 * 6) / 162.141 + (0.2 * 46000) / 13100 / 31.998; // C6H10O5 takes 6 O2
    expect(lineOf(table, "oxygen needed")).toBeCloseTo(oxygen * 31.998, 4);
  });

  test("unknown samples stay below half the limit", () => {
    expect(lineOf(call("CAL.CHARGE", 1, 26434, "25 atm", 340, ...limits, undefined, "unknown"), "verdict")).toBe("do not fire");
    expect(lineOf(call("CAL.CHARGE", 0.4, 26434, "25 atm", 340, ...limits, undefined, true), "verdict")).toBe("caution");
    expect(lineOf(call("CAL.CHARGE", 0.4, 26434, "25 atm", 340, ...limits, undefined, false), "verdict")).toBe("within the limits given");
  });

  test.each([
    [
      [1, 26434, "25 atm", 340, undefined, "4 MPa"],
      '#VALUE! Energy limit of the vessel is missing: give a number in J, or a text such as "33 kJ"',
    ],
    [
      [1, 26434, "25 atm", 340, "33 kJ", undefined],
      '#VALUE! Oxygen-pressure limit of the vessel is missing: give a number in MPa, or a text such as "30 atm"',
    ],
    [[1, 26434, "25 atm", 340, 33, "4 MPa"], '#VALUE! Energy limit of the vessel 33 J is below 100 J: say "33 kJ"'],
    [[[[1], [2]], 26434, "25 atm", 340, "33 kJ", "4 MPa"], "#VALUE! Masses: 2, specific energies: 1; give as many of one as of the other"],
    [[1, 26434, [["25 atm", "30 atm"]], 340, "33 kJ", "4 MPa"], "#VALUE! The pressure must be one cell, not 1 × 2 cells"],
    [[1, 26434, "25 atm", 340, "33 kJ", "4 MPa", 7], '#VALUE! The formula is 7; a text such as "C7H6O2" is expected'],
    [
      [1, 26434, "25 atm", 340, "33 kJ", "4 MPa", "C7H6O2", "maybe"],
      '#VALUE! The last argument is "maybe"; say "unknown" or TRUE for an unknown sample, or leave it out',
    ],
    [[undefined, undefined, "25 atm", 340, "33 kJ", "4 MPa"], "#VALUE! The charge is empty: give the mass of each part"],
  ] as const)("CAL.CHARGE(%j) is refused", (given, sentence) => {
    expect(refusal("CAL.CHARGE", ...given)).toBe(sentence);
  });
});

describe("numbers in another unit or of another kind, which would pass for plausible ones", () => {
  test.each([
    [
      "CAL.GROSS",
      [10200, 2.75, 1, [[50], [30], [42]]],
      "Heats of one run stand in one row, its columns added; 3 rows would be as many runs: give the heats in a row, or the other values in as many rows",
    ],
    [
      "CAL.GROSS",
      [10200, 2.75, 1, [[50, 112.85]], 112.9],
      'The heat of sulfuric acid 112.9 J also stands among the heats of this run: sulfur would be deducted twice; if it is another heat, write that as the text "112.9 J"',
    ],
    [
      "CAL.EQUIVALENT",
      [1.0012, 6318, 2.5],
      'Certified value 6318 J/g is below 12000 J/g: say "6318 cal_th/g" or "6318 cal_IT/g" or "6318 Btu_IT/lb"',
    ],
    ["CAL.EQUIVALENT", [1.0012, 26434000, 2.5], 'Certified value 26434000 J/g is above 150000 J/g: say "26434000 J/kg"'],
    [
      "CAL.EQUIVALENT",
      [1.0012, 26413.6, 2.5],
      "Certified value 26413.6 J/g is the energy of benzoic acid between standard states; a calorimeter is calibrated with the value under the conditions of the certificate, such as 26434 J/g",
    ],
    [
      "CAL.EQUIVALENT",
      [0.0010012, 26434, 2.5],
      "The energy equivalent would be 10.5863 J/K, outside 50 to 1000000 J/K: check mass 0.0010012 g, certified value 26434 J/g and rise 2.5 K",
    ],
    ["CAL.BUOYANCY", [1, 1.32, 8, 1.2], 'Density of the air 1.2 g/cm3 is above 0.1 g/cm3: say "1.2 kg/m3"'],
    ["CAL.BUOYANCY", [1, 1.32, 8, 0.012], "Density of the air 0.012 g/cm3 is outside 0.0005 to 0.002 g/cm3"],
    ["CAL.BUOYANCY", [1001.2, 1.32], 'Mass 1001.2 g is above 50 g: say "1001.2 mg"'],
    ["CAL.HEATOF", ["cotton", 0.05, 17.5], 'Heat of combustion 17.5 J/g is below 100 J/g: say "17.5 kJ/g"'],
    ["CAL.HEATOF", ["iron wire", 10, 1.13], 'Heat of combustion 1.13 J/cm is below 3 J/cm: say "1.13 J/mm"'],
    ["CAL.HEATOF", ["iron wire", 10, 1130], 'Heat of combustion 1130 J/cm is above 100 J/cm: say "1130 J/m"'],
    ["CAL.HEATOF", ["cotton", "2,5"], 'What was consumed of cotton is the text "2,5" with a decimal comma: give the number 2.5'],
    ["CAL.NITRIC", [5000, 0.1], 'Volume of titrant 5000 mL is above 200 mL: say "5000 uL"'],
    ["CAL.NITRIC", [5, 0.1, 1430], "Molar heat of nitric acid 1430 J/mol is outside 40000 to 80000 J/mol; the usual one is 60000 J/mol"],
    [
      "CAL.SULFURIC",
      [1.2, 0.9, "separated", "94.1 kJ/mol"],
      "Molar heat of sulfuric acid 94100 J/mol is outside 250000 to 350000 J/mol; the usual one is 301700 J/mol",
    ],
    ["CAL.CERTIFICATE", ["30 atm", 340, 1, 1, 298.15], 'Temperature 298.15 °C is above 100 °C: say "298.15 K"'],
    ["CAL.GROSS", [10200, 2.75, "abc"], 'Sample mass is the text "abc": give a number in g, or a text such as "1.0012 g"'],
    ["CAL.GROSS", [10200, 2.75, "1 MG"], /^Sample mass: "MG" is not a unit/],
    ["CAL.GROSS", [10200, "2,75", 1], 'Corrected rise is the text "2,75" with a decimal comma: give the number 2.75'],
    ["CAL.GROSS", [10200, " ", 1], 'Corrected rise is missing: give a number in K, or a text such as "4.5 °F"'],
    ["CAL.SULFURIC", ["1,2 %", 0.9, "total"], 'Sulfur is the text "1,2 %" with a decimal comma: say "1.2 %"'],
    ["CAL.STANDARD", ["C7H6O2", 26434, 1, 340, 1, "30 atm", 0.06], 'Nitric acid 0.06 mol is above 0.005 mol: say "0.06 mmol"'],
    [
      "CAL.CHARGE",
      [1, 6000, "3 MPa", 340, "33 kJ", "4 MPa", "C3H5N3O9"],
      "C3H5N3O9 carries all the oxygen it needs, as explosives do: do not fire it",
    ],
    [
      "CAL.CHARGE",
      [1, 26434, "3 MPa", 340, "33 kJ", "4 MPa", "C7H6O2(aq)"],
      "C7H6O2(aq) is a solution; give the compound itself, with (l), (s) or (g)",
    ],
  ] as [string, unknown[], string | RegExp][])("%s%j", (id, given, sentence) => {
    const found = refusal(id, ...given).replace("#VALUE! ", "");
    if (typeof sentence === "string") expect(found).toBe(sentence);
    else expect(found).toMatch(sentence);
  });

  test("a heat equal to that of sulfuric acid, as a text, is another heat", () => {
    expect(number("CAL.GROSS", 10200, 2.75, 1, [["30 J", 42]], 30)).toBeCloseTo(28050 - 102, 9);
  });

  test("words are read with hyphens, dashes or spaces", () => {
    expect(number("CAL.HEATOF", "nickel chromium wire", 4.1)).toBeCloseTo(39.36, 9);
    expect(call("CAL.STANDARD", "C7H6O2", 26434, 1, 340, 1, "30 atm", ...Array(4).fill(undefined), "three term")[4]![1]).toBe("three-term");
  });

  test("formula and value that contradict each other: the larger need of oxygen counts, and is told", () => {
    const table = call("CAL.CHARGE", 1.2, 46000, "1.2 MPa", "0.34 L", "60 kJ", "4 MPa", "C2H2O4");
    expect(lineOf(table, "verdict")).toBe("do not fire");
    expect(lineOf(table, "oxygen, times what is needed")).toBeCloseTo(1.25, 2);
    expect(table.at(-1)![3]).toContain("check formula, value and unit");
  });

  test("a charge that meets a limit exactly does not exceed it", () => {
    expect(lineOf(call("CAL.CHARGE", 0.32, 26434, "2.5 MPa", "0.34 L", 8458.88, "4 MPa", "C7H6O2"), "verdict")).toBe("caution");
  });

  test("states that are all refused keep their heading row", () => {
    const found = call("CAL.CERTIFICATE.REPORT", column(30, 31), 340, 1, 1, 25);
    expect(found[0]).toEqual(["error"]);
    expect(found).toHaveLength(3);
  });
});
