import { recordOf } from "../../src/data/library";
import { CellError } from "../../src/functions/cell";
import { fitUncertainty } from "../../src/functions/reaction-uncertainty";
import { call, number, refusal } from "./helpers";

type Row = [label: string, value: number | string, unit: string, note: string];

const rigid = (...given: unknown[]): Row[] => call("REACTION.RIGID", ...given) as Row[];

function row(rows: Row[], label: string): Row {
  const found = rows.find(([own]) => own === label);
  if (!found) throw new Error(`no line ${label} in ${JSON.stringify(rows)}`);
  return found;
}

const warnings = (rows: Row[]): string[] => rows.filter(([label]) => label === "warning").map(([, , , text]) => text);

const SURPLUS = "CH4 + 3 O2 = CO2 + 2 H2O + O2";

test.each(["nasa-2002", "gri-1999"])("methane and oxygen, 25 °C and 1 atm to 1000 K, set %s", (set) => {
  const rows = rigid(SURPLUS, "25 °C", "1 atm", 1000, set);
  // recomputed here from the formula: −717.79 kJ for one mol of methane, 3.3540 atm; both sets agree to 0.01 kJ
  expect(Math.abs(Number(row(rows, "heat into the contents")[1]) + 717.79)).toBeLessThan(0.006);
  expect(Number(row(rows, "pressure ratio P2/P1")[1])).toBeCloseTo(3.354, 4);
  expect(Number(row(rows, "final pressure P2")[1]) / 101325).toBeCloseTo(3.354, 4);
  expect(row(rows, "sets")[1]).toBe(set);
  expect(row(rows, "reaction")[1]).toBe(SURPLUS);
  expect([row(rows, "gas before")[1], row(rows, "gas after")[1], row(rows, "change in gas")[1]]).toEqual([4, 4, 0]);
  expect(warnings(rows)).toEqual([]);
});

test("the heat is ΔrU of REACTION.ENERGY and the heat of HEAT for the products", () => {
  const rows = rigid(SURPLUS, 298.15, "1 atm", 1000);
  const energy = number("REACTION.ENERGY", SURPLUS, 298.15, "kJ/mol");
  const products = [
    ["CO2", 1],
    ["H2O", 2],
    ["O2", 1],
  ];
  const heating = number("HEAT", products, null, 298.15, 1000, "kJ");
  expect(row(rows, "energy of reaction ΔrU")[1]).toBeCloseTo(energy, 8);
  expect(row(rows, "heating of the products")[1]).toBeCloseTo(heating, 8);
  expect(row(rows, "heat into the contents")[1]).toBeCloseTo(energy + heating, 8);
});

test("uncertainty from published formation values: what is known, and what is not", () => {
  const rows = rigid(SURPLUS, 298.15, "1 atm", 1000);
  // CH4 ± 0.3 (ANL-05/20), CO2 ± 0.13 (CODATA 1989), H2O ± 0.04, twice; by hand √(0.09 + 0.0169 + 0.0064) = 0.3366
  expect(row(rows, "uncertainty from formation values")[1]).toBeCloseTo(0.3366, 4);
  expect(row(rows, "uncertainty from formation values")[3]).toContain("CH4 ± 0.3, CO2 ± 0.13, H2O ± 0.04 kJ/mol");
  expect(row(rows, "uncertainty from formation values")[3]).toContain("elements in their reference state are exact");
  expect(row(rows, "without published uncertainty")[1]).toBe("none");
  // the value of liquid water is from memory, and says so
  expect(row(rigid("H2 + 1/2 O2 = H2O(l)", 298.15, "9 bar", 298.15), "uncertainty from formation values")[3]).toContain(
    "H2O(l) ± 0.04 (from memory)",
  );
  expect(row(rigid("CH2CO + 2 O2 = 2 CO2 + H2O", 400, "1 bar", 400), "without published uncertainty")[1]).toBe("CH2CO");
});

test("a formation value that lies outside the published one is warned of", () => {
  const sentence = (set: string, value: string) =>
    `The formation enthalpy of NO in ${set}, ${value} kJ/mol, lies outside the published 91.097 ± 0.085 kJ/mol`;
  expect(warnings(rigid("1/2 N2 + 1/2 O2 = NO", 300, "1 bar", 600))).toEqual([sentence("nasa-2002", "91.2713")]);
  expect(warnings(rigid("1/2 N2 + 1/2 O2 = NO", 300, "1 bar", 600, [["NO", "srd69-shomate"]]))).toEqual([
    sentence("srd69-shomate", "90.2911"),
  ]);
  // with as much on both sides it does not count
  expect(warnings(rigid("CO + 1/2 O2 + NO = CO2 + NO", 300, "1 bar", 600))).toEqual([]);
});

test("of several published values the nearest to the one of the set counts", () => {
  // CO in nasa-2002 −110.535: −110.538 ± 0.026 and −110.53 ± 0.17 are published; CO2 −393.51: −393.472 ± 0.014 and −393.51 ± 0.13
  const published = (key: string, set: string) => fitUncertainty(recordOf(key, set)).joules;
  expect([published("CO", "nasa-2002"), published("CO2", "nasa-2002")]).toEqual([26, 130]);
  // elements, also where a set prints no formation value or the user types zero
  expect([published("N2", "nasa-2002"), published("N2", "molecular"), published("C(gr)", "nasa-2002")]).toEqual([0, 0, 0]);
  expect(published("O", "nasa-2002")).toBe(100);
  const nitrogen = [["Cp", "g", "N2", "power 0", 200, 3000, "J/(mol K)", null, 0, null, 29]];
  const rows = rigid("N2 + O2 = 2 NO", 400, "1 bar", 400, nitrogen);
  expect(row(rows, "without published uncertainty")[1]).toBe("none");
});

test("a fuel in cells has no published uncertainty", () => {
  const fuel = [["Cp", "g", "CH4", "power 0", 200, 3000, "J/(mol K)", null, -74600, null, 36]];
  const rows = rigid(SURPLUS, 298.15, "1 atm", 1000, fuel);
  expect(row(rows, "without published uncertainty")[1]).toBe("CH4(g)");
  expect(row(rows, "sets")[1]).toBe("the coefficient block: CH4(g); nasa-2002: O2, CO2, H2O");
});

test("solids have no volume and no gas", () => {
  const rows = rigid("C(gr) + O2 = CO2", 300, "2 bar", 600);
  expect([row(rows, "gas before")[1], row(rows, "gas after")[1]]).toEqual([1, 1]);
  expect(row(rows, "final pressure P2")[1]).toBeCloseTo(400000, 6);
  // by hand: 8.314463 × 300 / 200000 = 0.01247169 m³
  expect(row(rows, "volume")[1]).toBeCloseTo(0.01247169, 8);
});

test("where no gas is left there is no pressure, in words", () => {
  const rows = rigid("H2 + 1/2 O2 = H2O(l)", 298.15, "30 bar", 298.15);
  for (const label of ["final pressure P2", "pressure ratio P2/P1"]) expect(row(rows, label)[1]).toBe("no gas left");
  expect(row(rows, "final pressure P2")[3]).toBe("what remains is the vapour pressure of the liquids and solids, which is not given here");
});

test("a product without a value at T1 leaves the heat, and says why its parts are not known", () => {
  const rows = rigid("2 H2S + SO2 = 3 S(L) + 2 H2O", 298.15, "1 bar", 500);
  const reason = "Temperature 298.15 K is below 388.36 K, the lower limit of nasa-2002 for S(L)";
  for (const label of ["energy of reaction ΔrU", "heating of the products"])
    expect(row(rows, label)).toEqual([label, "not known", "kJ/mol", reason]);
  expect(typeof row(rows, "heat into the contents")[1]).toBe("number");
});

describe("water", () => {
  test("vapour above saturation is warned of, before and after", () => {
    // saturation at 25 °C by IAPWS: 3169.8 Pa; 2/3 of 101325 Pa is 67550 Pa
    expect(warnings(rigid("CH4 + 2 O2 = CO2 + 2 H2O", 298.15, "1 atm", 298.15))).toEqual([
      "Water after the reaction: the partial pressure of H2O(g), 67550 Pa, is above the saturation pressure over liquid water at 298.15 K, 3169.82 Pa: 1.90615 of 2 mol would condense, which heat and pressure here do not count",
    ]);
    expect(warnings(rigid("CO + H2O = CO2 + H2", 298.15, "1 atm", 1000))).toEqual([
      "Water before the reaction: the partial pressure of H2O(g), 50662.5 Pa, is above the saturation pressure over liquid water at 298.15 K, 3169.82 Pa: 0.937433 of 1 mol would condense, which heat and pressure here do not count",
    ]);
    expect(warnings(rigid("CH4 + 2 O2 = CO2 + 2 H2O", 298.15, "1 atm", 250))[0]).toContain(
      "above the saturation pressure over ice at 250 K",
    );
    expect(warnings(rigid("CH4 + 2 O2 = CO2 + 2 H2O", 298.15, "1 atm", 400))).toEqual([]);
  });

  test("liquid that would evaporate is warned of, in part or all", () => {
    expect(warnings(rigid("CH4 + 2 O2 = CO2 + 2 H2O(l)", 298.15, "1 atm", 298.15))).toEqual([
      "Water after the reaction: H2O(l) would evaporate, 0.0938512 of 2 mol, which heat and pressure here do not count: all as vapour it would have the partial pressure 67550 Pa, against the saturation pressure over liquid water at 298.15 K, 3169.82 Pa",
    ]);
    expect(warnings(rigid("CH4 + 2 O2 = CO2 + 2 H2O(l)", 298.15, "1 atm", 500))[0]).toContain("H2O(l) would evaporate, all of it,");
  });

  test("traces are not: in an oxygen vessel at 30 atm the vapour is less than a hundredth", () => {
    expect(warnings(rigid("CH4 + 12 O2 = CO2 + 2 H2O(l) + 10 O2", 298.15, "30 atm", 298.15))).toEqual([]);
  });
});

test("every state says what it is not", () => {
  const rows = rigid(SURPLUS, 298.15, "1 atm", 1000);
  expect(row(rows, "caution")).toEqual([
    "caution",
    "see note",
    "",
    "not a design or relief calculation; the vessel's own rating, local codes and licensed practice govern",
  ]);
  expect(row(rows, "assumptions")[3]).toMatch(/^complete reaction as written is assumed/);
});

test("a column of states is a heading row and a row for each, refused ones with their error", () => {
  const block = call("REACTION.RIGID", SURPLUS, 298.15, "1 atm", [[1000], [99], [500]]);
  expect(block).toHaveLength(4);
  expect(block[0]!.slice(0, 2)).toEqual(["reaction", "heat into the contents [kJ/mol]"]);
  expect(block[1]![1]).toBe(row(rigid(SURPLUS, 298.15, "1 atm", 1000), "heat into the contents")[1]);
  expect((block[2]![1] as CellError).message).toBe(
    'Temperature 99 K is below 200 K, the lower limit of nasa-2002 for O2; for degrees Celsius write "99 °C"',
  );
  expect(block[3]![block[3]!.length - 1]).toBe("none");
});

test.each<[unknown[], string]>([
  [
    ["C(gr) = C(gr)", 300, 1e5, 400],
    "#VALUE! No gas stands on the left: the pressure before the reaction has no meaning, and the vessel has no volume to speak of",
  ],
  [
    ["CH4 + 2 O2 = CO2 + 2 H2O(l)", 298.15, 1e5, 1000],
    "#VALUE! Temperature 1000 K is above 600 K, the upper limit of nasa-2002 for H2O(l)",
  ],
  [
    [SURPLUS, 25, 1e5, 1000],
    '#VALUE! Temperature 25 K is below 200 K, the lower limit of nasa-2002 for CH4; for degrees Celsius write "25 °C"',
  ],
  [
    [SURPLUS, 298.15, 0, 1000],
    "#VALUE! Pressure P1 0 Pa is not above 0 Pa; pressures are absolute (see UNITS.ABSOLUTE for gauge readings)",
  ],
  [[SURPLUS, 298.15, null, 1000], '#VALUE! Pressure P1 is missing: give a number in Pa, or a text such as "1 atm"'],
  [[SURPLUS, -5, 1e5, 1000], "#VALUE! Temperature T1 -5 K is not above absolute zero, 0 K"],
  [[SURPLUS, 298.15, 1e5, "hot"], '#VALUE! "hot" does not begin with a number; write a quantity as "25 °C"'],
  [[SURPLUS, [[298, 300]], 1e5, 1000], "#VALUE! This function gives a table; give one state, or the states as one column, not 2 columns"],
  [
    ["CH4 + 2 O2 = CO2 + H2O", 298.15, 1e5, 1000],
    '#VALUE! "CH4 + 2 O2 = CO2 + H2O" is not balanced: H 4 on the left, 2 on the right; O 4 on the left, 3 on the right; balanced it is CH4 + 2 O2 = CO2 + 2 H2O',
  ],
])("%j is refused", (given, sentence) => {
  expect(refusal("REACTION.RIGID", ...given)).toBe(sentence);
});

describe("states that an equation alone does not tell", () => {
  test("a plain pressure in another unit, hot products that dissociate, dense gas", () => {
    const burnt = "CH4 + 2 O2 = CO2 + 2 H2O";
    expect(warnings(rigid(burnt, 298.15, 1, 1000))).toEqual([
      '1 Pa is near vacuum: a plain pressure is in Pa; for another unit write "1 bar"',
    ]);
    expect(warnings(rigid(burnt, 298.15, "1 Pa", 1000))).toEqual([]);
    expect(warnings(rigid(burnt, 298.15, "1 atm", 1999))).toEqual([]);
    expect(warnings(rigid(burnt, 298.15, "1 atm", 2000))).toEqual([
      "At 2000 K the products of most reactions dissociate, which the equation leaves out: see EQUILIBRIUM.ATVOLUME",
    ]);
    // 7.5 MPa, three times the temperature, two thirds of the gas: 15 MPa
    expect(warnings(rigid("2 CO + O2 = 2 CO2", 300, "7.5 MPa", 900)).at(-1)).toMatch(/^The ideal gas is assumed; at 15 MPa/);
  });
});
