import fc from "fast-check";
import { saturationPressure } from "../../src/core/water/saturation";
import { saturation } from "../../src/data/saturation";
import { call, number, refusal } from "./helpers";

const text = (id: string, ...values: unknown[]) => String(call(id, ...values)[0]![0]);

test("mixture text from mole, mass, volume fractions and partial pressures", () => {
  expect(text("MIX", [["N2"], ["O2"]], [[0.79], [0.21]])).toBe("0.79 N2 + 0.21 O2");
  expect(text("MIX", [["N2", "O2"]], [["79 %", "21 %"]], "volume")).toBe("0.79 N2 + 0.21 O2");
  expect(text("MIX", [["N2"], ["O2"]], [["0.6 bar"], ["0.2 bar"]], "pressure")).toBe("0.75 N2 + 0.25 O2");
  expect(number("MOLARMASS", text("MIX", [["H2"], ["O2"]], [[0.5], [0.5]], "mass"))).toBeCloseTo(2 / (1 / 2.016 + 1 / 31.998), 10);
});

test("mixture text reads back to the same fractions, to the last bit", () => {
  fc.assert(
    fc.property(fc.array(fc.double({ min: 1e-9, max: 1e6, noNaN: true }), { minLength: 3, maxLength: 3 }), (amounts) => {
      const mixture = text(
        "MIX",
        [["N2"], ["O2"], ["CO2"]],
        amounts.map((amount) => [amount]),
        null,
        "normalise",
      );
      const sum = amounts.reduce((added, amount) => added + amount, 0);
      const table = call("MIX.TABLE", mixture).slice(1);
      table.forEach((row, index) => expect(row[1]).toBe(amounts[index]! / sum));
    }),
  );
});

test("the table of a mixture has mole and mass fractions that add up to 1, and serves as a substance", () => {
  const table = call("MIX.TABLE", "air");
  const sum = (column: number) => table.slice(1).reduce((added, row) => added + Number(row[column]), 0);
  expect(sum(1)).toBeCloseTo(1, 12);
  expect(sum(2)).toBeCloseTo(1, 12);
  expect(number("CV.AT", table, 500)).toBe(number("CV.AT", "air", 500));
});

test("named mixtures inside mixtures are written out, equal species are added", () => {
  expect(number("MOLARMASS", "0.9 air + 0.1 CH4")).toBeCloseTo(0.9 * number("MOLARMASS", "air") + 0.1 * number("MOLARMASS", "CH4"), 10);
  expect(call("MIX.TABLE", "0.5 N2 + 0.5 nitrogen")).toHaveLength(2);
});

test("saturation pressure of water against the printed check values", () => {
  // IAPWS SR1-86(1992), table 1: 0.000 611 657 MPa at 273.16 K, 0.101 325 MPa at 373.1243 K, 22.064 MPa at the critical point (from memory)
  expect(saturationPressure(273.16, saturation)).toBeCloseTo(611.657, 3);
  expect(Math.abs(saturationPressure(373.1243, saturation) - 101325)).toBeLessThan(0.5);
  expect(saturationPressure(647.096, saturation)).toBe(22064000);
  // IAPWS R14-08(2011), table of check values: 8.94735 Pa at 230 K
  expect(saturationPressure(230, saturation)).toBeCloseTo(8.94735, 5);
  expect(() => saturationPressure(150, saturation)).toThrow(expect.objectContaining({ kind: "range" }) as Error);
});

test("humid air: dry at 0, and the partial pressure of water at saturation", () => {
  expect(text("MIX.HUMIDAIR", "25 °C", 101325, 0)).toBe("0.78084 N2 + 0.20946 O2 + 0.0093 Ar + 0.0004 CO2");
  const table = call("MIX.TABLE", text("MIX.HUMIDAIR", "25 °C", 101325, 1));
  const water = Number(table.find(([species]) => species === "H2O")![1]);
  expect(water * 101325).toBeCloseTo(3169.8, 1); // 3.1698 kPa, steam tables (from memory)
  expect(number("MOLARMASS", text("MIX.HUMIDAIR", 298.15, "1 atm", "50 %"))).toBeLessThan(28.9656);
});

test("refusals", () => {
  expect(refusal("MIX", [["N2"], ["O2"]], [[0.7], [0.2]])).toContain("The mole fractions add up to 0.9");
  expect(refusal("MIX", [["N2"], ["O2"]], [[0.7]])).toBe("#VALUE! There are 2 species and 1 amounts; give as many of one as of the other");
  expect(refusal("MIX", [["N2"]], [[1]], "weight")).toContain('The basis "weight" is not one of mole, mass, volume, pressure');
  expect(refusal("MIX", [["N2"]], [[1]], null, "please")).toContain('the only word it takes is "normalise"');
  expect(refusal("MIX", [["N2"], ["O2"]], [[-1], [2]])).toContain("The amount of N2 is -1");
  expect(refusal("MIX.HUMIDAIR", "25 °C", 101325, 45)).toContain(
    'The relative humidity 45 is not between 0 and 1; write a percentage as "45 %"',
  );
  expect(refusal("MIX.HUMIDAIR", "120 °C", 101325, 1)).toContain("Water vapour alone would have");
  expect(refusal("CV.AT", "0.5 N2 + O2", 300)).toContain('the part "O2" has no fraction before it');
});
