import { CellError } from "../../src/functions/cell";
import { call, number, refusal } from "./helpers";

test("unknown species: the nearest names", () => {
  expect(refusal("CV.AT", "N3", 300)).toMatch(/^#N\/A "N3" is not in the library; nearest: /);
});

test.each(["C", "S"])("bare %s is refused with its meanings", (species) => {
  expect(refusal("CV.AT", species, 300)).toContain(`"${species}" stands for several species: write ${species}(g)`);
});

test("units: misspelt, bare calories, gauge, wrong kind, set id in the unit's place", () => {
  expect(refusal("CV.AT", "N2", 300, "kJ/(mool K)")).toBe(
    '#VALUE! "mool" in "kJ/(mool K)" is not a unit Stillwall knows; nearest: mol, mmol, kmol',
  );
  expect(refusal("CV.AT", "N2", 300, "cal/(mol K)")).toMatch(/cal_th .*cal_IT/);
  expect(refusal("UNITS", 1, "Btu", "J")).toMatch(/Btu_IT.*Btu_th/);
  expect(refusal("ENTROPY", "N2", 300, "2 barg")).toMatch(/gauge.*UNITS\.ABSOLUTE/);
  expect(refusal("CV.AT", "N2", 300, "kJ/mol")).toContain('The unit "kJ/mol" does not fit this result; give a heat capacity such as');
  expect(refusal("CV.AT", "N2", 300, "gri-1999")).toBe('#VALUE! "gri-1999" is a set id; the unit comes first, the set after it');
});

test("sets: unknown, without the species, misplaced words", () => {
  expect(refusal("CV.AT", "N2", 300, null, "nasa-1066")).toMatch(/^#N\/A There is no set "nasa-1066"; the sets are nasa-2002, /);
  expect(refusal("CV.AT", "Xe", 300, null, "gri-1999")).toBe("#N/A Set gri-1999 does not hold Xe; sets that do: nasa-2002, molecular");
  expect(refusal("CV.AT", "N2", 300, null, "nasa-2002; quickly; extrapolate")).toContain("is not understood");
});

test("temperatures: 0 K and below, outside the range, a hint for degrees Celsius", () => {
  expect(refusal("CV.AT", "N2", 0)).toBe("#VALUE! Temperature 0 K is not above absolute zero, 0 K");
  expect(refusal("CV.AT", "N2", "-300 °C")).toBe("#VALUE! Temperature -26.85 K is not above absolute zero, 0 K");
  expect(refusal("CV.AT", "CO2", 5200, null, "gri-1999")).toBe(
    "#VALUE! Temperature 5200 K is above 3500 K, the upper limit of gri-1999 for CO2",
  );
  expect(refusal("CV.AT", "N2", 25)).toBe(
    '#VALUE! Temperature 25 K is below 200 K, the lower limit of nasa-2002 for N2; for degrees Celsius write "25 °C"',
  );
  // what is a day's temperature already is not taken for degrees Celsius
  expect(refusal("CV.AT", "N2", "20 °C", null, "gri-1999")).toBe(
    "#VALUE! Temperature 293.15 K is below 300 K, the lower limit of gri-1999 for N2",
  );
  expect(refusal("CV.AT", "N2", 290, null, "gri-1999")).not.toContain("degrees Celsius");
  expect(refusal("CV.AT", "0.5 N2 + 0.5 CH4", 7000)).toBe(
    "#VALUE! Temperature 7000 K is above 6000 K, the upper limit of nasa-2002 for CH4",
  );
});

test("liquids have no Cv here", () => {
  expect(refusal("CV.AT", "H2O(l)", 300)).toContain("use CP.AT");
  expect(refusal("CV.MEAN", "H2O(l)", 300, 310)).toContain("use CP.AT");
  expect(number("CP.AT", "H2O(l)", 298.15)).toBeCloseTo(75.35, 1); // CODATA-era value 75.3 J/(mol K)
});

test("fractions that do not add up, and mixed shapes", () => {
  expect(refusal("CV.AT", "0.79 N2 + 0.2 O2", 300)).toContain("The mole fractions add up to 0.99, not to 1 within 0.000001");
  expect(
    refusal(
      "CV.AT",
      [
        ["N2", 0.79],
        ["O2", 0.2],
      ],
      300,
    ),
  ).toContain("add up to 0.99");
  expect(refusal("CV.AT", [["N2"], ["O2"]], [[300, 400]])).toBe(
    "#VALUE! The ranges differ in shape: substance has 2 rows × 1 column, temperature has 1 row × 2 columns; give ranges of one shape, or single cells",
  );
});

test.each([
  [[["N2", "O2"]], [[300, 400, 500]]],
  [
    [["N2"], ["O2"]],
    [
      ["300 K", "400 K"],
      ["500 K", "600 K"],
    ],
  ],
])("ranges that agree in one direction only are refused too", (substance, temperature) => {
  expect(refusal("CV.AT", substance, temperature)).toContain("The ranges differ in shape");
});

test("text where a number belongs, blanks, booleans", () => {
  expect(refusal("CV.AT", "N2", "warm")).toBe('#VALUE! "warm" does not begin with a number; write a quantity as "25 °C"');
  expect(refusal("CV.AT", "N2", "300")).toContain('Temperature is the text "300", not a number');
  expect(refusal("CV.AT", "N2", true)).toContain("Temperature is TRUE");
  expect(refusal("CV.AT", "N2", null)).toContain("Temperature is missing");
  expect(refusal("CV.AT", 12, 300)).toContain("The substance is 12; give a species");
  expect(
    refusal(
      "CV.AT",
      [
        ["N2", "much"],
        ["O2", 0.2],
      ],
      300,
    ),
  ).toBe('#VALUE! The amount of N2 is the text "much"; a number is expected');
});

test("error cells come out unchanged, in their own place", () => {
  const column = call("CV.AT", "N2", [[300], [new CellError("#DIV/0!")], [400]]);
  expect(column.map(([cell]) => (cell instanceof CellError ? cell.code : typeof cell))).toEqual(["number", "#DIV/0!", "number"]);
  expect(refusal("CV.AT", new CellError("#REF!"), 300)).toBe("#REF! ");
  expect(
    refusal(
      "HEAT",
      [
        ["N2", new CellError("#NUM!")],
        ["O2", 1],
      ],
      null,
      300,
      400,
    ),
  ).toBe("#NUM! ");
});

test("older hosts: 0 for a blank text argument, rich values, null for a missing one", () => {
  expect(number("CV.AT", "N2", 300, 0, 0)).toBe(number("CV.AT", "N2", 300));
  expect(number("CV.AT", "N2", 300, null, null)).toBe(number("CV.AT", "N2", 300));
  expect(number("CV.AT", "N2", { type: "Double", basicValue: 300 })).toBe(number("CV.AT", "N2", 300));
  expect(refusal("CV.AT", "N2", { code: "#NULL!" })).toBe("#NULL! ");
});

test("a million rows, good and bad, are one call", () => {
  const temperatures = Array.from({ length: 1_000_000 }, (_, row) => [row % 4 === 3 ? 0 : 300 + (row % 1000)]);
  const column = call("CV.AT", "N2", temperatures);
  expect(column).toHaveLength(1_000_000);
  expect(column[3]![0]).toBeInstanceOf(CellError);
  expect(column[999_996]![0]).toBe(number("CV.AT", "N2", 1296));
});
