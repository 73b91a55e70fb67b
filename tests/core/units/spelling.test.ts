/** What people type for the same unit. */
import { parseQuantity, parseUnit, toBase } from "../../../src/core/units";

const molarHeatCapacity = "kg m^2 s^-2 K^-1 mol^-1";

test.each([
  "J/(mol K)",
  "J/(mol·K)",
  "J/(mol*K)",
  "J/(mol × K)",
  "J/(mol ⋅ K)",
  "J/(mol.K)",
  "J/mol/K",
  "J mol-1 K-1",
  "J mol^-1 K^-1",
  "J mol⁻¹ K⁻¹",
  "J·mol⁻¹·K⁻¹",
  "J K^(-1) mol^(-1)",
  "J/(mol^1 K^1)",
  "(J)/(mol (K))",
  "J m^2/(mol K m^2)",
  "J m^2/(mol K m^(2))",
  "J/(mol °C)",
  "J/(mol degC)",
  " J / ( mol K ) ",
  "joule/(mol kelvin)",
  "J per mol per K",
])("%s is the molar heat capacity unit", (text) => {
  expect(parseUnit(text)).toMatchObject({ dimension: molarHeatCapacity, scale: 1, offset: 0 });
});

test.each([
  ["25 °C", 298.15],
  ["25°C", 298.15],
  ["25 ° C", 298.15],
  ["25 ºC", 298.15],
  ["25 ℃", 298.15],
  ["25 degC", 298.15],
  ["25 deg C", 298.15],
  ["25 degrees C", 298.15],
  ["25 C", 298.15],
  ["−25 °C", 273.15 - 25],
  ["–25 °C", 273.15 - 25],
  ["0 °C", 273.15],
  ["-273.15 °C", 0],
  ["-25 °C", 273.15 - 25],
  ["77 °F", 298.15],
  ["77 F", 298.15],
  ["77 ℉", 298.15],
  ["212 °F", 373.15],
  ["-40 °F", 273.15 - 40],
  ["536.67 °R", 298.15],
  ["536.67 R", 298.15],
  ["300 K", 300],
  ["300K", 300],
  ["2.5 bar", 250000],
  ["2500 mbar", 250000],
  ["250 kPa", 250000],
  ["0.25 MPa", 250000],
  ["2.5 bara", 250000],
  ["2.5 bar(a)", 250000],
  ["2.5 bar abs", 250000],
  ["1 kgf/cm2", 98066.5],
  ["1 kgf/cm²", 98066.5],
  ["760 torr", 101325],
  ["1 atm", 101325],
  ["1e5 Pa", 100000],
  ["1E5Pa", 100000],
  [".5 bar", 50000],
  ["5. bar", 500000],
  ["+1 bar", 100000],
  ["0.34 L", 0.00034],
  ["340 mL", 0.00034],
  ["340 ml", 0.00034],
  ["340 cm3", 0.00034],
  ["340 cm³", 0.00034],
  ["340 cm^3", 0.00034],
  ["340 cc", 0.00034],
  ["1.2E-3 m3", 0.0012],
  ["1.2 dm3", 0.0012],
  ["5 µL", 5e-9],
  ["5 μL", 5e-9],
  ["5 uL", 5e-9],
  ["60 g", 0.06],
  ["60g", 0.06],
  ["2 lb", 0.90718474],
  ["3 kmol", 3000],
  ["2 lb-mol", 907.18474],
  ["12 kJ", 12000],
  ["12 kj", 12000],
  ["12 KJ", 12000],
  ["1 Kpa", 1000],
  ["1 BAR", 100000],
  ["1 KWH", 3600000],
  ["1 btu_it", 1055.05585262],
  ["1 CAL_TH", 4.184],
  ["2 h", 7200],
  ["8 %", 0.08],
  ["8%", 0.08],
  ["45 ppm", 0.000045],
  ["3", 3],
  ["760 mm Hg", 101325.0144354],
  ["4erg", 4e-7],
  ["1 kWh", 3600000],
  ["1 1/MPa", 1e-6],
  ["2 W/(m2 K)", 2],
  ["25\u00a0°C", 298.15],
])("%s is %d in the SI base, to the last bit", (text, base) => {
  const { value, unit } = parseQuantity(text);
  expect(toBase(value, unit)).toBe(base);
});

test("the unit keeps the text as typed, for refusals and headings", () => {
  expect(parseUnit(" J/(mol·K) ").text).toBe("J/(mol·K)");
  expect(parseQuantity("25 °C").unit.text).toBe("°C");
});

test("a pure number is 1, a dash, or no unit at all", () => {
  for (const unit of [parseUnit("1"), parseUnit("-"), parseQuantity("7").unit])
    expect(unit).toMatchObject({ dimension: "1", scale: 1, offset: 0 });
});

test("mass and amount stay apart", () => {
  expect(parseQuantity("60 g").unit.dimension).toBe("kg");
  expect(parseQuantity("2 mol").unit.dimension).toBe("mol");
});
