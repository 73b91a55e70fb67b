import fc from "fast-check";
import { molarMass, parseFormula } from "../../src/core/species/formula";
import { CellError } from "../../src/functions/cell";
import { combustionCells } from "../../src/functions/combustion";

type Row = [label: string, value: number | string, unit: string, note: string];

const tableOf = (formula: unknown, value: unknown, given?: unknown): Row[] =>
  combustionCells([[formula]], [[value]], given === undefined ? undefined : [[given]]) as Row[];

function line(rows: Row[], label: string): number {
  const row = rows.find(([own]) => own === label);
  if (!row) throw new Error(`no line ${label} in ${JSON.stringify(rows)}`);
  return Number(row[1]);
}

const warnings = (rows: Row[]): string[] => rows.filter(([label]) => label.toLowerCase() === "warning").map(([, , , text]) => String(text));

function sentence(formula: unknown, value: unknown, given?: unknown): string {
  const cell = tableOf(formula, value, given)[0]![0] as unknown;
  return cell instanceof CellError ? `${cell.code} ${cell.message}` : `not refused: ${String(cell)}`;
}

/** Atomic weights C 12.0107, H 1.00794, O 15.9994 (2001), with which the J/g below were calculated; they are 14 to 30 millionths smaller. */
const olderMass = (formula: string): number =>
  molarMass(parseFormula(formula), new Map(Object.entries({ C: 12.0107, H: 1.00794, O: 15.9994 })));

/** Compound, ΔcH° kJ/mol as the literature gives it; Δn, ΔcU° kJ/mol, −ΔcU° J/g, ΔfH° kJ/mol recomputed here, J/g with the older atomic weights below; published ΔfH° from memory. */
const LITERATURE: [
  formula: string,
  enthalpy: number,
  change: number,
  energy: number,
  gross: number,
  formation: number,
  published: number,
][] = [
  ["C7H6O2", -3226.9, -0.5, -3225.66, 26413.6, -385.2, -385.2],
  ["C12H22O11(s)", -5643.4, 0, -5643.4, 16487, -2222.9, -2222],
  ["C10H8", -5156.3, -2, -5151.3, 40191, 77.9, 78],
  ["C8H18(l)", -5461.3, -4.5, -5450.1, 47713, -259.3, -259.2],
  ["C7H6O3", -3022.2, 0, -3022.2, 21881, -589.9, -589.9],
];

describe.each(LITERATURE)("%s", (formula, enthalpy, change, energy, gross, formation, published) => {
  const rows = tableOf(formula, enthalpy * 1000, "enthalpy");

  test("energy, gross value and formation from the enthalpy of combustion", () => {
    expect(line(rows, "change of gas")).toBe(change);
    expect(line(rows, "enthalpy of combustion ΔcH°")).toBe(enthalpy);
    // half a unit of the last digit printed above
    expect(Math.abs(line(rows, "energy of combustion ΔcU°") - energy)).toBeLessThan(energy === -3225.66 ? 0.005 : 0.05);
    const older = (line(rows, "gross value at constant volume") * line(rows, "molar mass")) / olderMass(formula);
    expect(Math.abs(older - gross)).toBeLessThan(gross === 26413.6 ? 0.05 : 0.5);
    expect(Math.abs(line(rows, "enthalpy of formation ΔfH°") - formation)).toBeLessThan(0.06);
    // the published formation values are rounded to 1 kJ/mol or less
    expect(Math.abs(line(rows, "enthalpy of formation ΔfH°") - published)).toBeLessThan(1);
    expect(warnings(rows)).toEqual([]);
  });

  test("the way back, from the gross value and from the formation value, is the same table", () => {
    for (const [label, kind, factor] of [
      ["gross value at constant volume", "energy", 1],
      ["enthalpy of formation ΔfH°", "formation", 1000],
    ] as const) {
      const back = tableOf(formula, line(rows, label) * factor, kind);
      for (const [name, value] of rows.slice(1, -1)) {
        if (typeof value === "number")
          expect([name, line(back, name) / (value || 1)]).toEqual([name, expect.closeTo(value === 0 ? 0 : 1, 10)]);
      }
    }
  });
});

test("published values of benzoic acid and salicylic acid", () => {
  // SRD 69: benzoic acid ΔcH° −3226.87 ± 0.18 kJ/mol (1969); 26413.6 J/g between standard states (from memory) within their 0.18/3226
  const benzoic = line(tableOf("C7H6O2", "-3226.87 kJ/mol", "enthalpy"), "gross value at constant volume");
  expect(Math.abs(benzoic - 26413.6) / 26413.6).toBeLessThan(0.18 / 3226.87);
  // salicylic acid 21 888.8 ± 10.9 and 21 877.2 ± 4.6 J/g (published determinations, from memory), ΔfH° −589.9 kJ/mol
  for (const [gross, uncertainty] of [
    [21888.8, 10.9],
    [21877.2, 4.6],
  ] as const) {
    const formation = line(tableOf("C7H6O3", gross), "enthalpy of formation ΔfH°");
    expect(Math.abs(formation + 589.9)).toBeLessThan((uncertainty * 138.12) / 1000 + 0.92);
  }
  // methane: ΔcH° −890.7 ± 0.4 kJ/mol (1972) and −890.35 ± 0.3 (1945), SRD 69, gives ΔfH° −74.6 ± 0.3
  expect(Math.abs(line(tableOf("CH4(g)", "-890.7 kJ/mol", "enthalpy"), "enthalpy of formation ΔfH°") + 74.6)).toBeLessThan(0.5);
  expect(line(tableOf("CH4(g)", "-890.7 kJ/mol", "enthalpy"), "change of gas")).toBe(-2);
});

test("the molar mass of benzoic acid is 122.12 g/mol, not the 123.126 behind a wrong −3254.71 kJ/mol in circulation", () => {
  const rows = tableOf("C7H6O2", 26434);
  expect(line(rows, "molar mass")).toBeCloseTo(122.123, 10); // 7 × 12.011 + 6 × 1.008 + 2 × 15.999
  expect(3254.71 / 26.434).toBeCloseTo(123.126, 3);
  expect(line(rows, "energy of combustion ΔcU°")).toBeCloseTo(-26.434 * 122.123, 10);
  expect(line(rows, "energy of combustion ΔcU°")).not.toBeCloseTo(-3254.71, 0);
});

test("the uncertainty that carbon dioxide and water bring, by hand", () => {
  // (7 × 0.13)² + (3 × 0.040)², CODATA 1989
  expect(line(tableOf("C7H6O2", 26413.6), "uncertainty from the products")).toBeCloseTo(Math.sqrt(0.91 ** 2 + 0.12 ** 2), 12);
  // thiophene: (4 × 0.13)² + (2 × 0.040)² + 0.20²
  expect(line(tableOf("C4H4S(l)", 33000), "uncertainty from the products")).toBeCloseTo(Math.sqrt(0.52 ** 2 + 0.08 ** 2 + 0.2 ** 2), 12);
});

test("reactions written out", () => {
  const reaction = (formula: string) => tableOf(formula, 25000)[0]![1];
  expect(reaction("C7H6O2")).toBe("C7H6O2 + 7.5 O2(g) = 7 CO2(g) + 3 H2O(l)");
  expect(reaction("CH1.686O0.843")).toBe("CH1.686O0.843 + O2(g) = CO2(g) + 0.843 H2O(l)");
  expect(reaction("C4H4S(l)")).toBe("C4H4S(l) + 6 O2(g) = 4 CO2(g) + 2 H2O(l) + SO2(g)");
  expect(reaction("C6H5NH2(l)")).toBe("C6H5NH2(l) + 7.75 O2(g) = 6 CO2(g) + 3.5 H2O(l) + 0.5 N2(g)");
  expect(reaction("H2(g)")).toBe("H2(g) + 0.5 O2(g) = H2O(l)");
});

test("enthalpy less energy is Δn RT, for any compound", () => {
  const count = fc.integer({ min: 1, max: 20 });
  fc.assert(
    fc.property(count, count, count, fc.double({ min: 15000, max: 50000, noNaN: true }), (c, h, n, gross) => {
      const rows = tableOf(`C${c}H${h}N${n}O1`, gross);
      const difference = line(rows, "enthalpy of combustion ΔcH°") - line(rows, "energy of combustion ΔcU°");
      expect(difference).toBeCloseTo((0.5 + n / 2 - h / 4) * 2.47895702, 5);
    }),
  );
});

test("elements: graphite and hydrogen have no enthalpy of formation", () => {
  expect(line(tableOf("C(gr)", 0, "formation"), "enthalpy of combustion ΔcH°")).toBe(-393.51);
  expect(line(tableOf("H2(g)", 0, "formation"), "enthalpy of combustion ΔcH°")).toBe(-285.83);
  expect(line(tableOf("S(cr)", 0, "formation"), "enthalpy of combustion ΔcH°")).toBe(-296.81);
  // thiophene by hand: 4 × −393.51 − 2 × 285.83 − 296.81 + 2530 kJ/mol
  expect(line(tableOf("C4H4S(l)", -2530000, "enthalpy"), "enthalpy of formation ΔfH°")).toBeCloseTo(87.49, 9);
  // gas: Δn = −1.5 for H2(g) + 1/2 O2(g) = H2O(l)
  expect(line(tableOf("H2(g)", 0, "formation"), "energy of combustion ΔcU°")).toBeCloseTo(-285.83 + 1.5 * 2.478957, 5);
});

test("a column of states is one row each, a refused one its error", () => {
  const rows = combustionCells([["C7H6O2"], ["C10H8"], ["CCl4"]], [[26413.6], [40191], [20000]]);
  expect(rows).toHaveLength(4);
  expect(rows[0]!.slice(0, 3)).toEqual(["reaction", "molar mass [g/mol]", "change of gas [mol/mol]"]);
  expect(rows[2]![2]).toBe(-2);
  expect(rows[3]![0]).toBeInstanceOf(CellError);
});

test("warnings: certificate value, sulfur, a value that does not fit the formula", () => {
  const certificate =
    "26434 J/g looks like the certificate value of benzoic acid, which holds in the vessel (30 atm oxygen; 26454 J/g is for mass in air); between standard states −ΔcU° is 26413.6 J/g, 0.077 % less: see CAL.STANDARD";
  expect(warnings(tableOf("C6H5COOH", "26.434 MJ/kg"))).toEqual([certificate]);
  expect(warnings(tableOf("C7H6O2", 26454))).toEqual([certificate.replace("26434", "26454")]);
  expect(warnings(tableOf("C7H6O2", 26413.6))).toEqual([]);
  expect(warnings(tableOf("C4H4S(l)", 33000))).toEqual([
    "Sulfur is taken to SO2(g), as fuel laboratories do; tables of thermochemistry burn it to H2SO4·115 H2O and their values differ",
  ]);
  expect(warnings(tableOf("C10H8", 18300))).toEqual([
    "The value is 6.10867 kJ for each gram of oxygen consumed; organic compounds give 13.1 kJ within 40 %: check formula, value and unit",
  ]);
});

test.each([
  [
    ["C7H6O2", -3226.9, "enthalpy"],
    '#VALUE! Enthalpy of combustion -3226.9 J/mol is below 20000 J/mol in size and looks like kJ/mol or J/g: say "-3226.9 kJ/mol", or give J/mol',
  ],
  [
    ["C7H6O2", -385.2, "formation"],
    '#VALUE! Enthalpy of formation -385.2 J/mol is below 20000 J/mol in size and looks like kJ/mol or J/g: say "-385.2 kJ/mol", or give J/mol',
  ],
  [
    ["C7H6O2", 3226900, "enthalpy"],
    "#VALUE! Enthalpy of combustion 3226900 J/mol is not negative: combustion gives off heat, so ΔcH° is written with a minus sign",
  ],
  [["C7H6O2", -26413.6], "#VALUE! Specific energy -26413.6 J/g is not above 0 J/g"],
  [["C7H6O2", 26.4136], '#VALUE! Specific energy 26.4136 J/g is below 100 J/g: say "26.4136 MJ/kg"'],
  [["C7H6O2", undefined], '#VALUE! Specific energy is missing: give a number in J/g, or a text such as "26.434 MJ/kg"'],
  [["C7H6O2", "-3226.9 kJ/mol"], null],
  [["C7H6O2", 26413.6, "gross"], '#VALUE! "gross" is not a kind of value; the kinds are energy, enthalpy, formation'],
  [["C7H6O2(aq)", 26413.6], "#VALUE! C7H6O2(aq) is a solution; give the compound itself, with (l), (s) or (g)"],
  [[undefined, 26413.6], '#VALUE! The formula is missing: give a text such as "C7H6O2"'],
  [["CO2", 100], "#VALUE! CO2 takes up no oxygen: there is nothing in it to burn"],
  [["CH4(g)", -1e6, "formation"], "#VALUE! The energy of combustion would be 39.7879 kJ/mol; combustion gives off heat, so it is negative"],
] as [unknown[], string | null][])("%j is refused", ([formula, value, given], expected) => {
  if (expected === null) expect(sentence(formula, value, given)).toMatch(/^#VALUE! Specific energy "-3226.9 kJ\/mol"/);
  else expect(sentence(formula, value, given)).toBe(expected);
});

test("zero enthalpy of formation is an element's; zero enthalpy of combustion is refused", () => {
  expect(sentence("C(gr)", 0, "enthalpy")).toBe(
    "#VALUE! Enthalpy of combustion 0 J/mol is not negative: combustion gives off heat, so ΔcH° is written with a minus sign",
  );
});

test("a formula no molecule has, a gas written without its phase, and the phase taken, are told", () => {
  const table = (...cells: unknown[]) => combustionCells(...(cells.map((cell) => [[cell]]) as Parameters<typeof combustionCells>));
  const texts = (...cells: unknown[]) => table(...cells).map((row) => (row[1] === "see note" ? row[3] : row[1]));
  expect(texts("C7H7O2", 26434)).toContain(
    "C7H7O2 has an odd number of hydrogen and nitrogen atoms together, which no stable molecule has: check the formula",
  );
  expect(texts("CH1.686O0.843", 16240).join(" ")).not.toContain("odd number");
  expect(texts("CH4", 55509)).toContain("CH4 is taken as liquid or solid: for the gas write CH4(g)");
  expect(texts("CH4(g)", 55509).join(" ")).not.toContain("is taken as liquid or solid");
  const phase = (formula: string, value: number) => table(formula, value).find(([label]) => label === "change of gas")![3];
  expect(phase("C8H18", 47712)).toContain("taken as liquid or solid, because its formula names no phase");
  expect(phase("C8H18(l)", 47712)).toContain("is liquid");
  expect(phase("CH4(g)", 55509)).toContain("is a gas");
});
