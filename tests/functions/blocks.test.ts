import { call, number, refusal } from "./helpers";

/** The textbook cubic of CO, 273 to 1800 K, in J/(mol K); the third coefficient is negative (a public reprint has lost the sign). */
const COEFFICIENTS = [28.16, 0.1675e-2, 0.5372e-5, -2.222e-9];
const head = (formula: string, form: string, from: number, to: number, unit: string | null = "J/(mol K)") => [
  "Cp",
  "g",
  formula,
  form,
  from,
  to,
  unit,
  null,
  null,
  null,
];
const carbonMonoxide = [[...head("CO", "power", 273, 1800), ...COEFFICIENTS]];

test("a block in cells is evaluated as printed", () => {
  const t = 500;
  expect(number("CP.AT", "CO", t, null, carbonMonoxide)).toBeCloseTo(
    COEFFICIENTS.reduce((sum, c, power) => sum + c * t ** power, 0),
    10,
  );
  expect(number("CV.AT", "CO", t, null, carbonMonoxide)).toBeCloseTo(number("CP.AT", "CO", t, null, carbonMonoxide) - 8.31446261815324, 10);
  expect(call("CV.AT", "CO", [[300], [400]], null, carbonMonoxide)).toHaveLength(2);
  expect(
    number("CP.AT", "CO(g)", t, null, [
      ["quantity", "phase", "formula", "form", "from", "to", "unit", "R", "Hf", "S", "a", "b", "c", "d"],
      ...carbonMonoxide,
    ]),
  ).toBe(number("CP.AT", "CO", t, null, carbonMonoxide));
});

test("the library's own coefficients typed as a block give the library's values", () => {
  // N2, nasa-2002, 200 to 1000 K, as printed in NASA/TP-2002-211556
  const printed = [
    22103.71497, -381.846182, 6.08273836, -0.00853091441, 1.384646189e-5, -9.62579362e-9, 2.519705809e-12, 710.846086, -10.76003744,
  ];
  const block = [["Cp", "g", "N2", "nine-term", 200, 1000, null, 8.31451, 0, null, ...printed]];
  for (const id of ["CV.AT", "CP.AT", "ENERGY", "ENTHALPY"]) expect(number(id, "N2", 700, null, block)).toBe(number(id, "N2", 700));
  expect(number("ENTROPY", "N2", 700, null, null, block)).toBe(number("ENTROPY", "N2", 700));
});

test("units by mass and calories, Celsius polynomials, Cv blocks, own species", () => {
  const byMass = [[...head("CO", "power 0", 273, 1800, "kJ/(kg K)"), 1.04]];
  expect(number("CP.AT", "CO", 300, "kJ/(kg K)", byMass)).toBeCloseTo(1.04, 12);
  const calories = [[...head("CO", "power 0", 273, 1800, "cal_th/(mol K)"), 7]];
  expect(number("CP.AT", "CO", 300, null, calories)).toBeCloseTo(7 * 4.184, 12);
  const celsius = [[...head("CO", "power 1 degC", 273, 1800), 29, 0.004]];
  expect(number("CP.AT", "CO", "100 °C", null, celsius)).toBeCloseTo(29.4, 10);
  const atVolume = [["Cv", "g", "CO", "power 0", 273, 1800, "J/(mol K)", null, null, null, 21]];
  expect(number("CV.AT", "CO", 300, null, atVolume)).toBeCloseTo(21, 12);
  expect(number("CP.AT", "CO", 300, null, atVolume)).toBeCloseTo(29.31446261815324, 12);
  const benzoic = [["Cp", "cr", "C7H6O2", "power 1", 280, 390, "J/(mol K)", null, -385200, 167.7, 11.9, 0.4527]];
  expect(number("HEAT", "C7H6O2", "10 g", 298.15, 308.15, null, benzoic)).toBeGreaterThan(100);
  expect(number("ENTHALPY", "C7H6O2(cr)", 298.15, "kJ/mol", benzoic)).toBeCloseTo(-385.2, 10);
});

test("two rows of one species are two intervals; gaps and mixed forms are refused", () => {
  const rows = [
    [...head("CO", "power 0", 273, 500), 29],
    [...head("CO", "power 0", 500, 900), 31],
  ];
  expect(number("CP.AT", "CO", 400, null, rows)).toBe(29);
  expect(number("CP.AT", "CO", 600, null, rows)).toBe(31);
  expect(refusal("CP.AT", "CO", 400, null, [rows[0]!, [...head("CO", "power 0", 510, 900), 31]])).toContain(
    "starts at 510 K, but the row above for CO(g) ends at 500 K",
  );
  expect(refusal("CP.AT", "CO", 400, null, [rows[0]!, [...head("CO", "shomate", 500, 900), 31, 1, 1, 1, 1]])).toMatch(
    /Row 2 of the coefficient block/,
  );
});

test("what a block cannot say is refused", () => {
  expect(refusal("ENERGY", "CO", 300, null, carbonMonoxide)).toContain("No formation enthalpy of CO(g) is known in the coefficient block");
  expect(refusal("ENTROPY", "CO", 300, null, null, carbonMonoxide)).toContain("No entropy of CO(g)");
  expect(refusal("CV.AT", "N2", 300, null, carbonMonoxide)).toContain("The coefficient block has no row for N2; it has CO(g)");
  expect(refusal("CV.AT", "CO", 2000, null, carbonMonoxide)).toBe(
    "#VALUE! Temperature 2000 K is above 1800 K, the upper limit of the coefficient block for CO(g)",
  );
  const wrong = (row: unknown[]) => refusal("CV.AT", "CO", 300, null, [row]);
  expect(wrong(["Cq", ...carbonMonoxide[0]!.slice(1)])).toBe(
    '#VALUE! Row 1 of the coefficient block: the quantity "Cq" is not one of Cp, Cv',
  );
  expect(wrong([null, ...carbonMonoxide[0]!.slice(1)])).toBe(
    "#VALUE! Row 1 of the coefficient block: the quantity is blank; a text is expected",
  );
  expect(wrong(carbonMonoxide[0]!.slice(0, 10))).toBe("#VALUE! Row 1 of the coefficient block: no constants are given");
  expect(wrong([...head("CO", "power", 273, 1800).slice(0, 1), "x", ...head("CO", "power", 273, 1800).slice(2), 1])).toBe(
    '#VALUE! Row 1 of the coefficient block: the phase "x" is not one of g, l, cr',
  );
  expect(wrong([...head("CO", "cubic", 273, 1800), 1])).toContain('Row 1 of the coefficient block: the form "cubic" is not one of');
  expect(wrong([...head("CO", "power", 900, 300), 1])).toContain("the range 900 to 300 K must rise");
  expect(wrong([...head("CO", "power", 273, 1800, null), 1])).toContain("the unit is blank");
  expect(wrong([...head("CO", "power", 273, 1800, "J"), 1])).toContain('the unit "J" is not a heat capacity');
  expect(wrong([...head("CO", "nine-term", 273, 1800, null), 1, 2])).toContain("takes 9 constants, 2 are given");
  expect(wrong([...head("Qq", "power 0", 273, 1800), 1])).toBe(
    '#VALUE! Row 1 of the coefficient block: "Qq" in "Qq" is not the symbol of an element',
  );
});

test("a block with a blank quantity is refused whole, in every cell of a column: nothing falls back to the library", () => {
  const column = call("CV.AT", "CO", [[300], [400], [500]], null, [[null, ...carbonMonoxide[0]!.slice(1)]]);
  expect(column.flat().filter((cell) => typeof cell === "number")).toEqual([]);
});

test("a row of set ids is a list of sets, not a block", () => {
  const row = call("CV.AT", "N2", [[300, 300]], null, [["nasa-2002", "gri-1999"]]);
  expect(row).toEqual([[number("CV.AT", "N2", 300, null, "nasa-2002"), number("CV.AT", "N2", 300, null, "gri-1999")]]);
});

test("a molecule typed as a block", () => {
  const nitrogen = [["Cp", "g", "N2", "molecular", 200, 1500, null, null, 0, null, "linear", 2, 1, 1.98958, 2329.92, 1]];
  expect(Math.abs(number("CP.AT", "N2", 298.15, null, nitrogen) / 29.124 - 1)).toBeLessThan(1e-3); // JANAF 29.124
});

test("SOURCE.CHECK finds the lost sign", () => {
  const verdicts = (rows: unknown[][]) =>
    call("SOURCE.CHECK", rows)
      .slice(1)
      .filter((row) => row[2] === "doubt")
      .map((row) => row[1]);
  expect(verdicts(carbonMonoxide)).toEqual([]);
  const lost = [[...head("CO", "power", 273, 1800), 28.16, 0.1675e-2, 0.5372e-5, 2.222e-9]];
  expect(verdicts(lost)).toEqual(expect.arrayContaining(["Cp(1000 K) against nasa-2002", expect.stringContaining("Cp at most")]));
});
