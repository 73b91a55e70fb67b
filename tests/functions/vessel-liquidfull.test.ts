import { call, number, refusal } from "./helpers";

const WATER = ["210e-6 1/K", "0.0004 1/MPa", "25 °C", "26 °C"] as const;

test.each([
  [undefined, 0.435],
  [0, 0.435],
  [10, 0.387],
  [100, 0.193],
])("water in steel, D/t %p: %d MPa for a kelvin, computed apart from this program", (slenderness, megapascals) => {
  expect(number("VESSEL.LIQUIDFULL", ...WATER, "36e-6 1/K", slenderness, "200 GPa") / 1e6).toBeCloseTo(megapascals, 3);
});

test("plain numbers are 1/K, 1/Pa and Pa; a wall without expansion is left out", () => {
  expect(number("VESSEL.LIQUIDFULL", 210e-6, 4e-10, 298.15, 299.15, 36e-6, 10, 2e11)).toBeCloseTo(386666.667, 2);
  expect(number("VESSEL.LIQUIDFULL", 210e-6, "4e-5 1/bar", 300, 310)).toBeCloseTo((210e-6 * 10) / 4e-10, 3);
});

test("expansion by temperature, with headings; one line for a column of states", () => {
  const expansion = [
    ["temperature", "expansion"],
    ["20 °C", "207e-6 1/K"],
    ["40 °C", 385e-6],
    ["60 °C", 523e-6],
  ];
  const rises = call("VESSEL.LIQUIDFULL", expansion, "0.00045 1/MPa", "20 °C", [["20 °C"], ["40 °C"], ["60 °C"], ["61 °C"]]);
  expect(rises[0]![0]).toBe(0);
  expect(rises[1]![0]).toBeCloseTo((296e-6 * 20) / 4.5e-10, 3);
  expect(rises[2]![0]).toBeCloseTo((296e-6 * 20 + 454e-6 * 20) / 4.5e-10, 3);
  expect(rises[3]![0]).toMatchObject({
    message: "Temperature T2 334.15 K is outside 293.15 K to 333.15 K, where the expansion is given",
  });
  const compressibility = [
    ["20 °C", "0.00045 1/MPa"],
    ["60 °C", "0.00045 1/MPa"],
  ];
  expect(number("VESSEL.LIQUIDFULL", expansion, compressibility, "20 °C", "60 °C")).toBeCloseTo(rises[2]![0] as number, 3);
});

test.each([
  [
    ["0.0004 1/MPa", "0.0004 1/MPa", 300, 310],
    'Expansion "0.0004 1/MPa" is a compressibility; an expansion coefficient such as 1/K is expected',
  ],
  [[210, 4e-10, 300, 310], 'Expansion 210 is a plain number and would be in 1/K: say it with its unit, such as "210e-6 1/K"'],
  [[2e-4, 4e-4, 300, 310], 'Compressibility 0.0004 is a plain number and would be in 1/Pa: say it with its unit, such as "0.0004 1/MPa"'],
  [[2e-4, 0, 300, 310], "Compressibility 0 1/Pa is not above 0 1/Pa"],
  [
    [2e-4, 4e-10, 300, 310, 0, 10],
    'The modulus of the wall is missing: diameter_to_thickness needs it, such as "200 GPa", common for carbon steel',
  ],
  [[2e-4, 4e-10, 300, 310, 0, 10, 200_000], 'Modulus 200000 is a plain number and would be in Pa: say it with its unit, such as "200 GPa"'],
  [[2e-4, 4e-10, 300, 310, 0, -1], "Diameter to thickness -1 is negative"],
  [
    [
      [
        [20, 2e-4],
        [60, 5e-4],
      ],
      4e-10,
      300,
      310,
    ],
    'Temperature 20 of the expansion is a plain number and would be in K: say "20 °C" or "20 K"',
  ],
  [
    [
      [
        ["40 °C", 2e-4],
        ["20 °C", 5e-4],
      ],
      4e-10,
      300,
      310,
    ],
    "The temperatures of the expansion must rise: 293.15 K follows 313.15 K",
  ],
])("refuses %j", (given, sentence) => expect(refusal("VESSEL.LIQUIDFULL", ...given)).toBe(`#VALUE! ${sentence}`));
