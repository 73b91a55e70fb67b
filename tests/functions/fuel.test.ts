import fc from "fast-check";
import { CellError } from "../../src/functions/cell";
import { call, number, refusal } from "./helpers";

const WOOD = [20200, 6.1, 42.5, 0.1] as const;

describe("FUEL.BASIS", () => {
  test("by hand: 100 g as received are 20 g water, 80 g dry, of which 20 g ash", () => {
    expect(number("FUEL.BASIS", 18000, "ar", "d", undefined, 20)).toBeCloseTo(22500, 9);
    expect(number("FUEL.BASIS", 18000, "ar", "daf", undefined, 20, 25)).toBeCloseTo(30000, 9);
    expect(number("FUEL.BASIS", 27000, "ad", "ar", 10, 20)).toBeCloseTo(24000, 9);
  });

  test("values: text with a unit in J/g, per cent, any plain number", () => {
    expect(number("FUEL.BASIS", "27 MJ/kg", "ad", "d", 10)).toBeCloseTo(30000, 8);
    expect(number("FUEL.BASIS", "45 %", "ad", "d", "10 %")).toBe(50);
    expect(number("FUEL.BASIS", 0.9, "ad", "d", 10)).toBe(1);
    expect(number("FUEL.BASIS", 0, "ad", "d", 10)).toBe(0);
  });

  test("words and capitals for the bases", () => {
    const words = ["as analysed", "As Received", "DRY", "dry ash-free", "Dry, ash-free"];
    const plain = ["ad", "ar", "D", "DAF", "daf"];
    words.forEach((word, at) =>
      expect(number("FUEL.BASIS", 5, word, "d", 10, 20, 30)).toBe(number("FUEL.BASIS", 5, plain[at], "d", 10, 20, 30)),
    );
  });

  test("what the way does not need may be left out or be anything but an error", () => {
    expect(number("FUEL.BASIS", 45, "ad", "d", 10, "n.d.", -3)).toBe(50);
    expect(number("FUEL.BASIS", 45, "ar", "ar")).toBe(45);
  });

  test("refusals", () => {
    expect(refusal("FUEL.BASIS", 5, "ad", "ar", 10)).toBe(
      "#VALUE! The moisture as received is missing: the way from ad to ar needs it, in per cent",
    );
    expect(refusal("FUEL.BASIS", 5, "ad", "d", 100)).toBe(
      "#VALUE! The moisture as analysed is 100 %: nothing remains that a value could be referred to, from ad to d",
    );
    expect(refusal("FUEL.BASIS", 5, "ad", "wet", 10)).toBe(
      '#VALUE! The basis to is "wet"; the bases are ad (as analysed), d (dry), ar (as received) and daf (dry ash-free)',
    );
    expect(refusal("FUEL.BASIS", 5, null, "d", 10)).toBe('#VALUE! The basis "from" is missing: give ad, d, ar or daf');
    expect(refusal("FUEL.BASIS", null, "ad", "d", 10)).toBe(
      '#VALUE! Value is missing: give a number, or a text such as "28 MJ/kg" or "6.1 %"',
    );
    expect(refusal("FUEL.BASIS", -4, "ad", "d", 10)).toBe("#VALUE! Value -4 is negative; a content or a gross value is 0 or more");
    expect(refusal("FUEL.BASIS", "95 %", "ad", "d", 10)).toBe("#VALUE! Value 95 % would be 105.556 % on the basis d, above 100 %");
    expect(refusal("FUEL.BASIS", "-4 MJ/kg", "ad", "d", 10)).toBe("#VALUE! Value -4000 J/g is negative");
    expect(refusal("FUEL.BASIS", "28", "ad", "d", 10)).toBe(
      '#VALUE! Value is the text "28", not a number: give a number in J/g, or a text such as "28 MJ/kg"',
    );
    expect(refusal("FUEL.BASIS", true, "ad", "d", 10)).toContain("Value is TRUE");
    expect(refusal("FUEL.BASIS", "28 kg", "ad", "d", 10)).toContain('Value "28 kg"');
    expect(refusal("FUEL.BASIS", 5, "ad", "d", "8")).toBe(
      '#VALUE! Moisture as analysed is the text "8": give per cent, such as 8 or "8 %"',
    );
    expect(refusal("FUEL.BASIS", 5, "ad", "d", 120)).toBe("#VALUE! Moisture as analysed 120 % is not between 0 % and 100 %");
  });

  test("there and back over the worksheet", () => {
    const basis = fc.constantFrom("ad", "d", "ar", "daf");
    const percent = fc.double({ min: 0, max: 95, noNaN: true });
    fc.assert(
      fc.property(
        fc.double({ min: 1, max: 40000, noNaN: true }),
        basis,
        basis,
        percent,
        percent,
        percent,
        (value, from, to, ad, ar, ash) => {
          const there = number("FUEL.BASIS", value, from, to, ad, ar, ash);
          expect(number("FUEL.BASIS", there, to, from, ad, ar, ash) / value).toBeCloseTo(1, 12);
        },
      ),
    );
  });
});

describe("FUEL.DRY", () => {
  test("hydrogen and oxygen lose the moisture's own; others are only put on the dry basis", () => {
    expect(number("FUEL.DRY", 6.5, 8, "H")).toBeCloseTo((6.5 - 8 * (2.016 / 18.015)) / 0.92, 12);
    expect(number("FUEL.DRY", 46, 8, "O")).toBeCloseTo((46 - 8 * (15.999 / 18.015)) / 0.92, 12);
    for (const element of ["C", "n", "sulfur", "Cl", "F", "Ash"]) expect(number("FUEL.DRY", 46, 8, element)).toBe(50);
    expect(number("FUEL.DRY", "6.5 %", "0 %", "hydrogen")).toBe(6.5);
  });

  test("left in, the moisture's hydrogen takes 23.7 J/g for each per cent of moisture from the net value", () => {
    // 92 g dry wood with 6.1 % hydrogen in 100 g as analysed; whoever takes the total for the sample's own is low by 8 × 23.7 J/g.
    const moisture = 8;
    const total = 6.1 * 0.92 + (moisture * 2.016) / 18.015;
    const [q, , o, n] = WOOD;
    const right = number("FUEL.NET", q, number("FUEL.DRY", total, moisture, "H"), o, n, moisture, null, "iso-18125-2017");
    const wrong = number("FUEL.NET", q, total / 0.92, o, n, moisture, null, "iso-18125-2017");
    expect(right).toBeCloseTo(17166.34, 8);
    expect((right - wrong) / moisture).toBeCloseTo(23.7, 1); // 212.2 × 0.1119
  });

  test("refusals", () => {
    expect(refusal("FUEL.DRY", 0.5, 8, "H")).toBe("#VALUE! Hydrogen 0.5 % is less than the 0.895254 % that 8 % moisture holds");
    expect(refusal("FUEL.DRY", 5, 8, "X")).toBe('#VALUE! The element "X" is not one of H, O, C, N, S, Cl, F, ash');
    expect(refusal("FUEL.DRY", 5, 8, null)).toBe(
      '#VALUE! The element is missing: give "H", "O", or what else the value is of, such as "C" or "ash"',
    );
    expect(refusal("FUEL.DRY", 5, null, "C")).toBe('#VALUE! Moisture is missing: give per cent, such as 8 or "8 %"');
    expect(refusal("FUEL.DRY", 5, 100, "C")).toBe("#VALUE! Moisture 100 % is not from 0 % to below 100 %");
    expect(refusal("FUEL.DRY", 0.065, 0.08, "H")).toBe(
      '#VALUE! H 0.065 %, moisture 0.08 %: looks like fractions; percent expected (if it is per cent, write the hydrogen as "0.065 %")',
    );
    expect(number("FUEL.DRY", "0.065 %", 0.08, "H")).toBeCloseTo(0.0561, 4);
  });
});

describe("FUEL.NET", () => {
  // Recomputed from the formula with the printed constants, to the digits shown; J/g.
  test.each([
    ["dry, constant pressure", 0, "constant-pressure", 18871.5],
    ["8 % moisture, constant pressure", 8, "Constant pressure", 17166.34],
    ["8 % moisture, constant volume", 8, "constant-volume", 17243.528],
  ])("wood with the printed constants: %s", (_, moisture, condition, expected) => {
    for (const edition of ["iso-1928-2009", "iso-18125-2017", "en-14918-2009", "iso-21654-2021", "ISO 18125:2017"])
      expect(number("FUEL.NET", ...WOOD, moisture, condition, edition)).toBeCloseTo(expected, 8);
  });

  test("the older edition of the coal standard: 212, 0.8, 24.5", () => {
    expect(number("FUEL.NET", ...WOOD, 8, null, "iso-1928-1995")).toBeCloseTo((20200 - 212 * 6.1 - 0.8 * 42.6) * 0.92 - 24.5 * 8, 8);
  });

  test("derived constants come within the rounding of the printed ones", () => {
    // 0.035 × 6.1 + 0.0253 × 42.5 - 0.085 × 0.1 upwards for the dry sample: 1.28 J/g, times 0.92, less 0.0008 × 8.
    expect(number("FUEL.NET", ...WOOD, 8)).toBeCloseTo(17166.34 + 1.17, 1);
    expect(number("FUEL.NET", ...WOOD, 8, "constant-volume")).toBeCloseTo(17243.53 - 0.13, 1);
    // 10 % nitrogen, as in some waste: the one constant that differs by more than rounding.
    const [q, h, o] = WOOD;
    const derivedLoss = number("FUEL.NET", q, h, o, 0, 0) - number("FUEL.NET", q, h, o, 10, 0);
    const printedLoss =
      number("FUEL.NET", q, h, o, 0, 0, null, "iso-18125-2017") - number("FUEL.NET", q, h, o, 10, 0, null, "iso-18125-2017");
    expect(derivedLoss).toBeCloseTo(8.849, 3);
    expect(printedLoss).toBeCloseTo(8, 9);
  });

  test("own constants, in a row or a column", () => {
    const own = [212.2, 0.8, 0.8, 24.43];
    expect(number("FUEL.NET", ...WOOD, 8, null, [own])).toBeCloseTo(17166.34, 8);
    expect(number("FUEL.NET", ...WOOD, 8, null, own.map((value) => [value]))).toBeCloseTo(17166.34, 8); // prettier-ignore
    expect(number("FUEL.NET", ...WOOD, 8, "constant-volume", [[206, 0, 0, 23.05]])).toBeCloseTo(17243.528, 8);
    // Rules that leave out oxygen and nitrogen.
    expect(number("FUEL.NET", ...WOOD, 8, null, [[212.2, 0, 0, 24.43]])).toBeCloseTo(17166.34 + 0.8 * 42.6 * 0.92, 8);
  });

  test("own constants that cannot be", () => {
    const refused = (constants: unknown, condition: unknown = null) => refusal("FUEL.NET", ...WOOD, 8, condition, constants);
    expect(refused([[212.2, 8, 0.8, 24.43]])).toBe(
      "#VALUE! The oxygen constant 8 J/g per % is 10.3 times the derived 0.774722; up to a factor of 3 is accepted",
    );
    expect(refused([[0.2122, 0.0008, 0.0008, 0.02443]])).toContain("The hydrogen constant 0.2122 J/g per % is 0.001 times the derived");
    expect(refused([[-212.2, -0.8, -0.8, -24.43]])).toBe(
      "#VALUE! The hydrogen constant -212.2 J/g per % is negative; give sizes, the formula has the signs",
    );
    expect(refused([[212.2, 0.8, 0.8, 24.43]], "constant-volume")).toBe(
      "#VALUE! The oxygen constant 0.8 J/g per % has no place at constant volume: give 0",
    );
    expect(refused([[212.2, 0.8, 24.43]])).toBe(
      "#VALUE! The constants are 1 × 3 cells; give 4 numbers in one row or column (hydrogen, oxygen, nitrogen, moisture, in J/g for each per cent), or the id of an edition",
    );
    expect(refused([[212.2, 0.8], [0.8, 24.43]])).toContain("The constants are 2 × 2 cells"); // prettier-ignore
    expect(refused(212.2)).toContain("The constants are 1 × 1 cells");
    expect(refused([[212.2, null, 0.8, 24.43]])).toBe("#VALUE! The oxygen constant is missing: give a number");
    expect(refused([[212.2, "0,8", 0.8, 24.43]])).toBe('#VALUE! The oxygen constant is the text "0,8"; a number is expected');
  });

  test("editions the library does not hold, or not for this value", () => {
    expect(refusal("FUEL.NET", ...WOOD, 8, null, "iso-1928")).toBe(
      '#N/A "iso-1928" is not an edition with constants for this value; the editions are iso-1928-2009, iso-1928-1995, iso-18125-2017, en-14918-2009, iso-21654-2021',
    );
    expect(refusal("FUEL.NET", ...WOOD, 8, null, "astm-d240")).toMatch(/^#N\/A "astm-d240" is not an edition with constants/);
    expect(refusal("FUEL.NET", ...WOOD, 8, "constant-volume", "iso-1928-1995")).toBe(
      "#N/A The library holds no constants of iso-1928-1995 for net values at constant volume; it does of iso-1928-2009, iso-18125-2017, en-14918-2009, iso-21654-2021",
    );
  });

  test("missing, impossible, and in other units", () => {
    const [q, h, o, n] = WOOD;
    expect(refusal("FUEL.NET", null, h, o, n, 8)).toBe(
      '#VALUE! Gross value, dry is missing: give a number in J/g, or a text such as "26.434 MJ/kg"',
    );
    expect(refusal("FUEL.NET", 20.2, h, o, n, 8)).toBe('#VALUE! Gross value, dry 20.2 J/g is below 100 J/g: say "20.2 MJ/kg"');
    expect(refusal("FUEL.NET", 20.2e6, h, o, n, 8)).toContain('Gross value, dry 20200000 J/g is above 150000 J/g: say "20200000 J/kg"');
    expect(refusal("FUEL.NET", q, null, o, n, 8)).toBe('#VALUE! Hydrogen, dry is missing: give per cent, such as 8 or "8 %"');
    expect(refusal("FUEL.NET", q, h, null, n, 8)).toBe('#VALUE! Oxygen, dry is missing: give per cent, such as 8 or "8 %"');
    expect(refusal("FUEL.NET", q, h, o, null, 8)).toBe('#VALUE! Nitrogen, dry is missing: give per cent, such as 8 or "8 %"');
    expect(refusal("FUEL.NET", q, h, o, n, null)).toBe('#VALUE! Moisture is missing: give per cent, such as 8 or "8 %"');
    expect(refusal("FUEL.NET", q, 61, o, n, 8)).toBe("#VALUE! Hydrogen 61 % is above 26 %; methane, the richest in hydrogen, has 25.1 %");
    expect(refusal("FUEL.NET", q, h, 94.5, n, 8)).toBe("#VALUE! Hydrogen, oxygen and nitrogen add up to 100.7 %, above 100 %");
    expect(refusal("FUEL.NET", q, h, o, n, 8, "isothermal")).toBe(
      '#VALUE! The condition "isothermal" is not "constant-pressure" or "constant-volume"',
    );
  });

  test("per cent typed as fractions, and a composition that really is so small", () => {
    expect(refusal("FUEL.NET", 20200, 0.061, 0.425, 0.001, 0.08)).toBe(
      '#VALUE! H 0.061 %, O 0.425 %, N 0.001 %, moisture 0.08 %: looks like fractions; percent expected (if it is per cent, write the hydrogen as "0.061 %")',
    );
    expect(refusal("FUEL.NET", 20200, 0.061, 0.425, 0.001, 0)).toContain("looks like fractions");
    expect(number("FUEL.NET", 32500, "0.061 %", 0.425, 0.001, 0.08)).toBeCloseTo(32458.7, 0);
    expect(number("FUEL.NET", 32500, 0.2, 0.5, 1.1, 0.5)).toBeLessThan(32500); // a coke: not asked
  });

  test("at constant volume oxygen and nitrogen may be blank", () => {
    expect(number("FUEL.NET", 20200, 6.1, null, null, 8, "constant-volume")).toBe(number("FUEL.NET", ...WOOD, 8, "constant-volume"));
  });

  test("very wet samples are below zero, and 0 in the text arguments counts as left out", () => {
    expect(number("FUEL.NET", ...WOOD, 95, 0, 0)).toBeCloseTo(18872.8 * 0.05 - 24.431 * 95, 0);
  });

  test("columns spread; errors and refusals stay in their cells", () => {
    const broken = new CellError("#DIV/0!");
    const block = call(
      "FUEL.NET",
      [[20200], [broken], ["20.2 MJ/kg"], [20.2]],
      6.1,
      42.5,
      0.1,
      [[0], [0], [8], [8]],
      null,
      "iso-18125-2017",
    );
    expect(block[0]![0]).toBeCloseTo(18871.5, 8);
    expect(block[1]![0]).toMatchObject({ code: "#DIV/0!" });
    expect(block[2]![0]).toBeCloseTo(17166.34, 8);
    expect(block[3]![0]).toMatchObject({ code: "#VALUE!" });
    expect(call("FUEL.NET", ...WOOD, 8, [["constant-pressure", "constant-volume"]], "iso-18125-2017")[0]).toHaveLength(2);
    expect(call("FUEL.NET", ...WOOD, 8, null, [[212.2, broken, 0.8, 24.43]])).toMatchObject([[{ code: "#DIV/0!" }]]);
  });
});

describe("FUEL.GROSSPRESSURE", () => {
  test("wood: printed and derived constants", () => {
    expect(number("FUEL.GROSSPRESSURE", ...WOOD, "iso-18125-2017")).toBeCloseTo(20203.435, 8); // by hand: 37.515 - 34 - 0.08
    expect(number("FUEL.GROSSPRESSURE", ...WOOD, [[6.15, 0.8, 0.8]])).toBeCloseTo(20203.435, 8);
    // 20200 + RT (6.1/(2 × 2.016) - 42.5/31.998 - 0.1/28.014)/100, RT = 2478.957 J/mol
    expect(number("FUEL.GROSSPRESSURE", ...WOOD)).toBeCloseTo(20200 + 24.78957 * (6.1 / 4.032 - 42.5 / 31.998 - 0.1 / 28.014), 3);
  });

  test("benzoic acid: the gas formed is -0.5 mol per mol", () => {
    const mass = 122.123;
    const percent = (weight: number) => (100 * weight) / mass;
    const gross = number("FUEL.GROSSPRESSURE", 26413.6, percent(6 * 1.008), percent(2 * 15.999), 0);
    expect(gross - 26413.6).toBeCloseTo((0.5 * 2478.957) / mass, 4);
  });

  test("refusals", () => {
    expect(refusal("FUEL.GROSSPRESSURE", 20200, 0.061, 0.425, 0.001)).toContain("H 0.061 %, O 0.425 %, N 0.001 %: looks like fractions");
    expect(refusal("FUEL.GROSSPRESSURE", ...WOOD, [[212.2, 0.8, 0.8]])).toContain("The hydrogen constant 212.2 J/g per % is 34.5 times");
    expect(refusal("FUEL.GROSSPRESSURE", ...WOOD, "iso-1928-1995")).toBe(
      "#N/A The library holds no constants of iso-1928-1995 for gross values at constant pressure; it does of iso-1928-2009, iso-18125-2017, en-14918-2009, iso-21654-2021",
    );
    expect(refusal("FUEL.GROSSPRESSURE", 20200, 6.1, null, 0.1)).toContain("Oxygen, dry is missing");
    expect(refusal("FUEL.GROSSPRESSURE", ...WOOD, [[6.15, 0.8, 0.8, 24.43]])).toContain(
      "give 3 numbers in one row or column (hydrogen, oxygen, nitrogen,",
    );
  });
});

describe("FUEL.LIQUIDNET", () => {
  test("diesel: with hydrogen 42.878, estimated 42.906 MJ/kg", () => {
    expect(number("FUEL.LIQUIDNET", 45700, 13.3, null, "astm-d240")).toBeCloseTo(42877.74, 8); // by hand with 0.2122 MJ/kg
    expect(number("FUEL.LIQUIDNET", "45.70 MJ/kg", null, null, "ASTM D240")).toBeCloseTo(42906.15, 8); // 10.025 + 0.7195 × 45.70
    expect(number("FUEL.LIQUIDNET", 45700)).toBeCloseTo(42906.15, 8);
  });

  test("the derived constant, and one of one's own", () => {
    expect(number("FUEL.LIQUIDNET", 45700, 13.3)).toBeCloseTo(42877.74 + 0.0347 * 13.3, 2);
    expect(number("FUEL.LIQUIDNET", 45700, "13.3 %", null, 212.2)).toBeCloseTo(42877.74, 8);
    expect(number("FUEL.LIQUIDNET", 45700, 13.3, null, 0)).toBe(number("FUEL.LIQUIDNET", 45700, 13.3));
  });

  test("isooctane, 15.88 % hydrogen: net of 47713 J/g is the enthalpy of combustion to steam", () => {
    const mass = 114.232; // C8H18
    const net = number("FUEL.LIQUIDNET", 47713, (100 * 18 * 1.008) / mass);
    // gross V + Δn RT with Δn(gas, steam) = 8 + 9 - 12.5, less 9 mol of vaporisation: 5450352 - 4.5 × ... per mol, by hand
    expect(net).toBeCloseTo(47713 - (9 * 44012 - 4.5 * 2478.957) / mass, 4);
  });

  test("by volume in J/mL", () => {
    expect(number("FUEL.LIQUIDNET", 45700, 13.3, 0.845, "astm-d240")).toBeCloseTo(36231.69, 2);
    expect(number("FUEL.LIQUIDNET", 45700, 13.3, "845 kg/m3", "astm-d240")).toBeCloseTo(36231.69, 2);
  });

  test("refusals", () => {
    expect(refusal("FUEL.LIQUIDNET", 45.7, 13.3)).toBe('#VALUE! Gross value 45.7 J/g is below 100 J/g: say "45.7 MJ/kg"');
    expect(refusal("FUEL.LIQUIDNET", 45700, 0.133)).toBe("#VALUE! Hydrogen 0.133 % looks like a fraction; percent expected, such as 13.3");
    expect(refusal("FUEL.LIQUIDNET", 45700, 3)).toContain("Hydrogen 3 % is below 5 %");
    expect(refusal("FUEL.LIQUIDNET", 45700, "0.133 %")).toContain("Hydrogen 0.133 % is below 5 %");
    expect(refusal("FUEL.LIQUIDNET", 45700, 133)).toBe("#VALUE! Hydrogen 133 % is not between 0 % and 100 %");
    expect(refusal("FUEL.LIQUIDNET", 29700)).toBe(
      "#VALUE! Gross value 29700 J/g is outside 45000 to 48000 J/g, the aviation fuels of the estimate without hydrogen: give the hydrogen",
    );
    expect(refusal("FUEL.LIQUIDNET", 45700, 13.3, 845)).toBe('#VALUE! Density of the liquid 845 g/cm3 is above 2 g/cm3: say "845 kg/m3"');
    expect(refusal("FUEL.LIQUIDNET", 45700, 13.3, null, 0.2122)).toContain("The hydrogen constant 0.2122 J/g per % is 0.001 times");
    expect(refusal("FUEL.LIQUIDNET", 45700, 13.3, null, "iso-1928-2009")).toBe(
      '#N/A "iso-1928-2009" is not an edition with constants for this value; the editions are astm-d240',
    );
    expect(refusal("FUEL.LIQUIDNET", 45700, 13.3, null, [[212.2, 0.8]])).toContain("give one number (hydrogen, in J/g for each per cent)");
  });

  test("a gap in a column of hydrogens or densities is refused, not estimated", () => {
    const block = call("FUEL.LIQUIDNET", 45700, [[13.3], [null]]);
    expect(block[0]![0]).toBeCloseTo(42878.2, 1);
    expect(block[1]![0]).toMatchObject({ code: "#VALUE!", message: 'Hydrogen is missing: give per cent, such as 8 or "8 %"' });
    expect(call("FUEL.LIQUIDNET", 45700, 13.3, [[0.845], [null]])[1]![0]).toMatchObject({
      message: 'Density of the liquid is missing: give a number in g/cm3, or a text such as "845 kg/m3"',
    });
  });
});

test("the tables are those of their bodies", () => {
  const agree = call("FUEL.AGREE", [[28000, 28130]], 120);
  expect(agree.find(([label]) => label === "verdict")![1]).toMatch(/third run/);
  const acid = call("FUEL.COMBUSTION", "C7H6O2", 26413.6);
  expect(acid.find(([label]) => label === "enthalpy of combustion ΔcH°")![1]).toBeCloseTo(-3226.9, 1);
});

test("a column of editions gives each sample its own constants; a blank derives them", () => {
  const column = (...values: unknown[]) => values.map((value) => [value]);
  const editions = column("iso-18125-2017", "iso-1928-1995", null, "iso-0", new CellError("#REF!"));
  const values = call("FUEL.NET", 20200, 6.1, 42.5, 0.1, 8, undefined, editions).flat();
  expect(values.slice(0, 3)).toEqual(
    ["iso-18125-2017", "iso-1928-1995", undefined].map((id) => number("FUEL.NET", 20200, 6.1, 42.5, 0.1, 8, undefined, id)),
  );
  expect(values[3]).toMatchObject({ code: "#N/A", message: expect.stringContaining('"iso-0" is not an edition') });
  expect(values[4]).toMatchObject({ code: "#REF!" });
  const gross = call("FUEL.GROSSPRESSURE", column(20200, 20200), 6.1, 42.5, 0.1, column("iso-18125-2017", null)).flat();
  expect(gross).toEqual([
    number("FUEL.GROSSPRESSURE", 20200, 6.1, 42.5, 0.1, "iso-18125-2017"),
    number("FUEL.GROSSPRESSURE", 20200, 6.1, 42.5, 0.1),
  ]);
  const liquid = call("FUEL.LIQUIDNET", 45700, 13.3, undefined, column("astm-d240", null)).flat();
  expect(liquid).toEqual([number("FUEL.LIQUIDNET", 45700, 13.3, undefined, "astm-d240"), number("FUEL.LIQUIDNET", 45700, 13.3)]);
});
