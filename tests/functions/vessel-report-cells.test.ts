/** VESSEL.REACH and VESSEL.ABSORB in cells: cautions, warnings, columns of states, and refusals. The model is in gas-model.test.ts. */
import { CellError } from "../../src/functions/cell";
import { columnOf, labelsOf, textOf, valueOf, warningsOf, type Table } from "./burn-helpers";
import { call, refusal } from "./helpers";

const PR = "peng-robinson";
type Given = unknown;

describe("cautions stand first", () => {
  const LEAD = "these contents can react or decompose; this is not the pressure they would reach: ";
  const first = (substance: string, t: Given = 400) =>
    ["VESSEL.REACH", "VESSEL.ABSORB"].map(
      (id) => call(id, substance, "10 L", 300, "1 bar", id === "VESSEL.REACH" ? t : "1 kJ", null, PR)[0],
    );

  test("methane with air, acetylene", () => {
    for (const row of first("0.095 CH4 + 0.905 air"))
      expect(row).toEqual([
        ...["CAUTION", "see note", ""],
        `${LEAD}fuel CH4 (9.5 %) with oxidant O2 (19 %): limits of flammability are not judged`,
      ]);
    for (const row of first("C2H2"))
      expect(row).toEqual([
        ...["CAUTION", "see note", ""],
        `${LEAD}C2H2: decomposes with a flame and without air, from little above atmospheric pressure`,
      ]);
  });

  test("not where nothing reacts; some only when hot, at T1 or at T2", () => {
    for (const row of first("N2")) expect(row![0]).toBe("amount");
    expect(first("CH4", 999)[0]![0]).toBe("amount");
    expect(first("CH4", 1000)[0]).toEqual(["CAUTION", "see note", "", `${LEAD}CH4: decomposes to hydrogen and carbon`]);
    expect(call("VESSEL.REACH", "CH4", "10 L", 1000, "1 bar", 400, null, PR)[0]![0]).toBe("CAUTION");
  });

  test("in a column of substances the caution is the first column", () => {
    const table = call("VESSEL.REACH", [["N2"], ["C2H2"], ["CO2"]], "10 L", 300, "1 bar", 400, null, PR);
    expect(table[0]![0]).toBe("CAUTION");
    expect(columnOf(table, "CAUTION")).toEqual(["", expect.stringContaining(`${LEAD}C2H2: `), ""]);
  });
});

describe("warnings", () => {
  const warned = (...given: Given[]) => warningsOf(call("VESSEL.REACH", ...given));

  test("a dense gas: from a molar volume of 1.5 critical volumes on", () => {
    expect(warned("N2", "50 L", "15 °C", "200 bar", "50 °C", null, PR)).toEqual([
      "The gas is dense (121.939 cm3/mol): a cubic equation errs by some per cent of the pressure there, by 5 to 15 % near the critical point (common practice)",
    ]);
    // 1.5 times 0.3074 R Tc/pc, the critical volume of Peng-Robinson, is 142.4 cm3/mol: 70.2 mol in 10 L
    expect(warned("N2", "10 L", 300, "70.0 mol", 400, null, PR)).toEqual([]);
    expect(warned("N2", "10 L", 300, "70.4 mol", 400, null, PR)).toHaveLength(1);
  });

  test("an acentric factor beyond those the equation was fitted to", () => {
    const factor = "The acentric factor of C2H5OH, 0.649, is above 0.49, up to which Peng-Robinson was fitted";
    expect(warned("C2H5OH", "10 L", 500, "2 bar", 600, null, PR)).toEqual([factor]);
    expect(warned("0.1 C2H5OH + 0.9 N2", "10 L", 500, "2 bar", 600, null, PR)).toEqual([factor]);
    expect(warned("C2H5OH", "10 L", 500, "2 bar", 600, null, "soave")).toEqual([]);
    expect(warned("NO2", "10 L", 500, "2 bar", 600, null, "soave")).toEqual([
      "The acentric factor of NO2, 0.851088, is above 0.7, up to which Soave was fitted",
    ]);
  });

  test("quantum gases, where they are dense: Peng-Robinson has too small a Z, Soave is nearer", () => {
    const told = (gas: string) =>
      `Quantum gas (${gas}): from a pressure Peng-Robinson tells 2 to 4 % too much of it at 300 K and 200 bar (from memory), from an amount too low a pressure; "soave" is nearer there`;
    expect(warned("He", "50 L", "15 °C", "200 bar", "50 °C", null, PR)).toEqual([told("He")]);
    expect(warned("0.5 Ar + 0.5 H2", "50 L", "15 °C", "200 bar", "50 °C", null, PR)).toContain(told("H2"));
    expect(warned("He", "50 L", "15 °C", "200 bar", "50 °C", null, "soave")).toEqual([]);
    expect(warned("He", "50 L", 300, "24 bar", 350, null, PR)).toEqual([]);
    expect(warned("0.95 Ar + 0.05 H2", "50 L", 300, "60 bar", 350, null, PR)).toEqual([]);
    // Z at 300 K and 20 MPa = 1 + B/v + C/v²; B 11.8, 14.3, 11.4 cm3/mol and C 110, 330, 230 cm6/mol2, from memory
    for (const [gas, published] of Object.entries({ He: 1.093, H2: 1.12, Ne: 1.095 })) {
      const z = (model: string) => call("VESSEL.COMPRESSIBILITY", gas, 300, "200 bar", model)[0]![0] as number;
      expect([gas, z(PR) / published - 1 < -0.02, z(PR) / published - 1 > -0.04]).toEqual([gas, true, true]);
      expect([gas, Math.abs(z("soave") / published - 1) < 0.006]).toEqual([gas, true]);
    }
  });

  test("water, where it is more than half", () => {
    const polar = "Water is polar: Peng-Robinson errs by far more than the WATER functions do";
    expect(warned("H2O", "10 L", 500, "2 bar", 600, null, PR)).toEqual([polar]);
    expect(warned("0.6 H2O + 0.4 N2", "10 L", 500, "2 bar", 600, null, PR)).toEqual([polar]);
    expect(warned("0.4 H2O + 0.6 N2", "10 L", 500, "2 bar", 600, null, PR)).toEqual([]);
  });

  test("a plain number of the charge that was meant in bar; a text is taken at its word", () => {
    expect(warned("N2", "10 L", 300, 200, 400)).toEqual([
      '200 Pa is near vacuum: a plain pressure is in Pa; for another unit write "200 bar"',
    ]);
    expect(warned("N2", "10 L", 300, 999.9, 400)).toHaveLength(1);
    expect(warned("N2", "10 L", 300, 1000, 400)).toEqual([]);
    expect(warned("N2", "10 L", 300, "200 Pa", 400)).toEqual([]);
    expect(warned("N2", "10 L", 300, "0.001 mol", 400)).toEqual([]);
    expect(warningsOf(call("VESSEL.ABSORB", "N2", "10 L", 300, 200, 0.1))).toHaveLength(1);
  });

  test("the ideal gas, named, where a part would condense: at T1 and at T2, each once", () => {
    const moist = (from: Given, to: Given) => warned("0.97 air + 0.03 H2O", "10 L", from, "1 bar", to, null, "ideal");
    const condenses = (kelvin: number, own: string, limit: string) =>
      `H2O would condense: at ${kelvin} K its pressure of ${own} Pa is above its vapour pressure, about ${limit} Pa; WATER.SEALED holds water with a gas over it`;
    expect(moist("50 °C", "10 °C")).toEqual([condenses(283.15, "2628.66", "1228.11")]);
    expect(moist("10 °C", "50 °C")).toEqual([condenses(283.15, "3000", "1228.11")]);
    expect(moist("10 °C", "10 °C")).toEqual([condenses(283.15, "3000", "1228.11")]);
    expect(moist("10 °C", "15 °C")).toHaveLength(2);
    expect(moist("50 °C", "40 °C")).toEqual([]);
    expect(warned("C3H8", "10 L", "20 °C", "10 bar", "50 °C", null, "ideal")).toEqual([
      "C3H8 would condense: at 293.15 K its pressure of 1000000 Pa is above its vapour pressure, about 836070 Pa",
      "The ideal gas is named; at T2 Peng-Robinson stands 14 % below it, from the same amount",
    ]);
    expect(warned("N2", "50 L", "15 °C", "200 bar", "300 °C", null, "ideal")).toEqual([
      "The ideal gas is named; at T1 Peng-Robinson stands 2 % above it, from the same amount",
      "The ideal gas is named; at T2 Peng-Robinson stands 20 % above it, from the same amount",
    ]);
  });

  test("beyond the range of a set, as asked for", () =>
    expect(warned("N2", "10 L", 300, "2 mol", 6000, null, "ideal", null, "gri-1999; extrapolate")).toEqual([
      "Extrapolated as asked for: 6000 K is above 5000 K, the upper limit of gri-1999 for N2; beyond it the heat capacity is held",
    ]));

  test("near the limit, beyond it, reached on the way", () => {
    const nitrogen = (limit: Given, from = 300, to = 400) => warned("N2", "10 L", from, "2 mol", to, null, "ideal", limit);
    expect(nitrogen("10 bar")).toEqual([]);
    expect(nitrogen("7 bar")).toEqual(["The pressure at T2, 665157 Pa, is above 0.9 of the limit of 700000 Pa"]);
    expect(nitrogen("6 bar")).toEqual(["The pressure at T2, 665157 Pa, exceeds the limit of 600000 Pa"]);
    expect(nitrogen("6 bar", 400, 300)).toEqual(["The pressure at T1, 665157 Pa, exceeds the limit of 600000 Pa there"]);
    expect(nitrogen("4 bar")).toEqual([
      "The pressure at T1, 498868 Pa, exceeds the limit of 400000 Pa there",
      "The pressure at T2, 665157 Pa, exceeds the limit of 400000 Pa",
    ]);
    expect(nitrogen("4 bar", 400, 400)).toEqual(["The pressure at T2, 665157 Pa, exceeds the limit of 400000 Pa"]);
  });
});

describe("tables without numbers where there are none", () => {
  test("species without critical constants have no Peng-Robinson beside the ideal gas", () => {
    const labels = labelsOf(call("VESSEL.REACH", "HI", "10 L", 400, "1 bar", 500, null, "ideal"));
    expect(labels).not.toContain("Peng-Robinson at T2");
    expect(labels.slice(-2)).toEqual(["holds for", "warnings"]);
  });

  test("binary parameters as they are cited, and that the others are 0", () => {
    const model = (substance: string, equation = PR) =>
      String(call("VESSEL.REACH", substance, "10 L", 400, "20 bar", 500, null, equation).find(([label]) => label === "model")![3]);
    expect(model("0.5 N2 + 0.5 O2")).toMatch(/; binary parameters N2-O2 -0\.0119 \(knapp-1982, from memory\)$/);
    expect(model("0.5 N2 + 0.4 O2 + 0.1 He")).toMatch(/; binary parameters N2-O2 -0\.0119 \(knapp-1982, from memory\), the others 0$/);
    expect(model("0.5 He + 0.5 Ar")).toMatch(/; binary parameters 0: none is cited for these pairs$/);
    expect(model("0.5 N2 + 0.5 O2", "soave")).toMatch(/; binary parameters 0: none is cited for this equation$/);
    expect(model("N2")).not.toContain("binary");
  });
});

describe("columns of states", () => {
  const error = new CellError("#DIV/0!");
  /** The rows of a table as single calls give them: label and unit to value. */
  const single = (table: Table) =>
    Object.fromEntries(
      table
        .filter(([label]) => !String(label).startsWith("warning"))
        .map(([label, value, unit, note]) => [
          unit === "" ? label : `${String(label)} [${String(unit)}]`,
          value === "see note" ? note : value,
        ]),
    );
  const row = (table: Table, index: number) =>
    Object.fromEntries(
      table[0]!.slice(0, -1).flatMap((heading, place) => (table[index]![place] === "" ? [] : [[heading, table[index]![place]]])),
    );

  test("of T2: each row is what its single call gives, its own error, or the error cell that came in", () => {
    const reach = (t: Given) => call("VESSEL.REACH", "N2", "10 L", 300, "2 mol", t, "1 kg copper", null, "12 bar");
    const table = reach([[400], ["600 K"], [25000], [error], [null], [350]]);
    for (const [index, t] of [
      [1, 400],
      [2, 600],
      [6, 350],
    ] as const)
      expect(row(table, index)).toEqual(single(reach(t)));
    for (const cell of table[3]! as CellError[]) expect(cell.message).toMatch(/^Temperature 25000 K is above /);
    for (const cell of table[4]! as CellError[]) expect(cell.code).toBe("#DIV/0!");
    for (const cell of table[5]! as CellError[])
      expect(cell.message).toBe('Temperature T2 is missing: give a number in K, or a text such as "50 °C"');
    expect(table[0]!.slice(0, 5)).toEqual([
      "amount [mol]",
      "mass [kg]",
      "pressure at T1 [Pa]",
      "temperature T2 [K]",
      "pressure at T2 [Pa]",
    ]);
    expect(table[0]!.slice(-2)).toEqual(["holds for", "warnings"]);
    expect(new Set(table.map((cells) => cells.length))).toEqual(new Set([table[0]!.length]));
  });

  test("of substances, models, walls and sets", () => {
    const column = (...cells: Given[]) => cells.map((cell) => [cell]);
    const substances = ["N2", "CO2", "air", "0.5 He + 0.5 Ar"];
    const models = [null, PR, "soave", "ideal"];
    const walls = [null, "1 kg copper", 0, 500];
    const sets = [null, "nasa-2002", "gri-1999", "nasa-2002"];
    const of = (s: Given, w: Given, m: Given, set: Given, id = "VESSEL.REACH", last: Given = 450) =>
      call(id, s, "10 L", 300, "3 bar", last, w, m, null, set);
    for (const [id, last] of [
      ["VESSEL.REACH", 450],
      ["VESSEL.ABSORB", "2 kJ"],
    ] as const) {
      const table = of(column(...substances), column(...walls), column(...models), column(...sets), id, last);
      substances.forEach((substance, i) => {
        const alone = of(substance, walls[i], models[i], sets[i], id, last);
        expect([i, row(table, i + 1)]).toEqual([i, alone[0]!.length === 1 ? expect.anything() : single(alone)]);
      });
    }
  });

  test("of charges as text and number mixed", () => {
    const table = call("VESSEL.REACH", "N2", "10 L", 300, [["2 mol"], ["5 bar"], [500000], ["56 g"], ["2 L"], [200]], 400);
    expect(columnOf(table, "amount [mol]").slice(1, 3)).toEqual([
      expect.closeTo(5000 / (8.31446261815324 * 300), 12),
      columnOf(table, "amount [mol]")[1],
    ]);
    expect(columnOf(table, "amount [mol]")[0]).toBe(2);
    expect(columnOf(table, "mass [kg]")[3]).toBeCloseTo(0.056, 15);
    expect((columnOf(table, "mass [kg]")[4] as CellError).message).toBe(
      'The charge "2 L" is neither a pressure nor an amount nor a mass; write a text such as "200 bar", "60 g" or "2 mol"',
    );
    expect(columnOf(table, "warnings")[5]).toContain("200 Pa is near vacuum");
    expect(columnOf(table, "warnings")[2]).toBe("none");
  });

  test("the columns stand in one order, whichever state comes first", () => {
    const states: Given[] = [263.15, 289.15, 333.15];
    const heading = (order: number[]) =>
      call(
        "VESSEL.REACH",
        "CO2",
        "10 L",
        "15 °C",
        "7.5 kg",
        order.map((i) => [states[i]]),
        null,
        PR,
        order.map((i) => [[null, "200 bar", "300 bar"][i]]),
      )[0];
    const models = (order: Given[]) =>
      call(
        "VESSEL.REACH",
        "N2",
        "10 L",
        300,
        "2 mol",
        400,
        null,
        order.map((model) => [model]),
      )[0];
    for (const order of [
      [2, 1, 0],
      [1, 0, 2],
      [0, 2, 1],
    ])
      expect(heading(order)).toEqual(heading([0, 1, 2]));
    expect(heading([2, 0, 1])).toEqual([
      ...["amount [mol]", "mass [kg]", "pressure at T1 [Pa]", "temperature T2 [K]", "pressure at T2 [Pa]", "model", "phase at T1"],
      ...["vapour fraction at T1 [mol/mol]", "phase at T2", "vapour fraction at T2 [mol/mol]", "two phases up to [K]"],
      ...["compressibility at T1 [-]", "compressibility at T2 [-]", "ideal gas at T2 [Pa]", "above the ideal gas [%]"],
      ...["second virial coefficient at T2 [cm3/mol]", "heat into contents [J]", "heat into wall [J]", "heat [J]"],
      ...["limit [Pa]", "pressure at T2 / limit", "temperature at limit [K]", "holds for", "warnings"],
    ]);
    const some = ["ideal", PR, "soave"];
    for (const order of [some, [...some].reverse(), [PR, "ideal", "soave"]]) expect(models(order)).toEqual(models(some));
    expect(models(some)!.slice(4, 14)).toEqual([
      ...[
        "pressure at T2 [Pa]",
        "Peng-Robinson at T2 [Pa]",
        "Peng-Robinson above the ideal gas [%]",
        "model",
        "phase at T1",
        "phase at T2",
      ],
      ...["compressibility at T1 [-]", "compressibility at T2 [-]", "ideal gas at T2 [Pa]", "above the ideal gas [%]"],
    ]);
  });

  test("a composition is one substance for all rows, a coefficient block one set", () => {
    const range = [
      ["N2", 0.79],
      ["O2", 0.21],
    ];
    const reach = (substance: Given, set?: Given) =>
      call("VESSEL.REACH", substance, "10 L", 300, "2 mol", [[400], [500]], null, PR, null, set);
    expect(reach(range)).toEqual(reach("0.79 N2 + 0.21 O2"));
    const block = [["Cp", "g", "N2", "power 0", 250, 1500, "J/(mol K)", null, null, null, 30]];
    const heats = columnOf(reach("N2", block), "heat [J]").map(Number);
    // 2 mol with Cv = 30 J/(mol K) - R, and some 0.3 % of the residual
    for (const [i, span] of [100, 200].entries())
      expect(Math.abs(heats[i]! / (2 * (30 - 8.31446261815324) * span) - 1)).toBeLessThan(0.005);
    expect(refusal("VESSEL.REACH", "N2", "10 L", 300, "2 mol", 1600, null, PR, null, block)).toBe(
      "#VALUE! Temperature 1600 K is above 1500 K, the upper limit of the coefficient block for N2(g)",
    );
  });

  test("rows of states are refused, and ranges of two shapes", () => {
    expect(refusal("VESSEL.REACH", "N2", "10 L", 300, "2 mol", [[400, 500]])).toBe(
      "#VALUE! This function gives a table; give one state, or the states as one column, not 2 columns",
    );
    expect(refusal("VESSEL.REACH", "N2", "10 L", [[300], [310]], "2 mol", [[400], [500], [600]])).toBe(
      "#VALUE! The ranges differ in shape: T1 has 2 rows × 1 column, T2 has 3 rows × 1 column; give ranges of one shape, or single cells",
    );
  });

  test("an error cell comes through upright and in a curve of the limit", () => {
    for (const given of [
      ["N2", error, 300, "2 mol", 400],
      ["N2", "10 L", 300, "2 mol", error],
      ["N2", "10 L", 300, "2 mol", 400, error],
      [error, "10 L", 300, "2 mol", 400],
      [
        "N2",
        "10 L",
        300,
        "2 mol",
        400,
        null,
        null,
        [
          [300, "10 bar"],
          [400, error],
        ],
      ],
    ])
      expect(refusal("VESSEL.REACH", ...given)).toBe("#DIV/0! ");
  });
});

describe("refusals", () => {
  const reach = (...given: Given[]) => refusal("VESSEL.REACH", ...given);
  const absorb = (...given: Given[]) => refusal("VESSEL.ABSORB", ...given);

  test("volume, charge, temperature and heat that are no such thing", () => {
    for (const refused of [reach, absorb]) {
      expect(refused("N2", 0, 300, "2 mol", 400)).toBe("#VALUE! Volume 0 m3 is not above 0 m3");
      expect(refused("N2", -1, 300, "2 mol", 400)).toBe("#VALUE! Volume -1 m3 is not above 0 m3");
      expect(refused("N2", "10 L", 300, "-2 mol", 400)).toBe('#VALUE! Amount "-2 mol" is not above zero');
      expect(refused("N2", "10 L", 300, 0, 400)).toBe(
        "#VALUE! Charge 0 Pa is not above 0 Pa; pressures are absolute (see UNITS.ABSOLUTE for gauge readings)",
      );
      expect(refused("N2", "10 L", 300, "5 barg", 400)).toBe(
        '#VALUE! "barg" is a gauge pressure, and pressures here are absolute: use UNITS.ABSOLUTE(value, "bar")',
      );
      expect(refused("N2", "10 L", "300", "2 mol", 400)).toBe(
        '#VALUE! Temperature T1 is the text "300", not a number: give a number in K, or a text with a unit such as "15 °C"',
      );
      expect(refused("N2", "10 L", 300, "2 mol", 400, "60 kg kryptonite")).toMatch(
        /^#N\/A "kryptonite" is not a wall material of the library; nearest: /,
      );
      expect(refused("N2", "10 L", 300, "2 mol", 400, null, null, null, "bar")).toMatch(
        /^#N\/A There is no set "bar"; the sets are nasa-2002, /,
      );
    }
    expect(reach("N2", "10 L", 300, "2 mol", "-300 °C")).toBe("#VALUE! Temperature T2 -26.85 K is not above absolute zero, 0 K");
    expect(absorb("N2", "10 L", 300, "2 mol", null)).toBe('#VALUE! Heat is missing: give a number in J, or a text such as "12 kJ"');
  });

  test("T2 outside the range of the set, or of the wall; heat that leads beyond", () => {
    for (const model of [undefined, "ideal", PR, "soave"]) {
      expect(reach("N2", "10 L", 300, "2 mol", 25000, null, model)).toBe(
        "#VALUE! Temperature 25000 K is above 20000 K, the upper limit of nasa-2002 for N2",
      );
      expect(reach("N2", "10 L", 300, "2 mol", 2000, "1 kg carbon steel", model)).toBe(
        "#VALUE! Temperature 2000 K is above 1473.15 K, the upper limit of en-1993-1-2 for carbon steel (structural)",
      );
      expect(absorb("N2", "10 L", 300, "2 mol", "20 MJ", "1 kg carbon steel", model)).toMatch(
        /^#VALUE! A heat of 20000000 J leads beyond 1473\.15 K, the upper limit of en-1993-1-2 for carbon steel \(structural\); from this start it can be at most 8794?\d+(\.\d+)? J$/,
      );
      expect(absorb("N2", "10 L", 300, "2 mol", "-20 kJ", null, model)).toMatch(
        /^#VALUE! A heat of -20000 J leads beyond 200 K, the lower limit of nasa-2002 for N2; from this start it can be at least -41\d\d\.?\d* J$/,
      );
    }
    expect(reach("N2", "10 L", 300, "2 mol", 199, null, "ideal")).toBe(
      '#VALUE! Temperature 199 K is below 200 K, the lower limit of nasa-2002 for N2; for degrees Celsius write "199 °C"',
    );
    // the heat in the sentence leads to the end, and a little more does not
    const most = Number(/at most (\S+) J/.exec(absorb("N2", "10 L", 300, "2 mol", "20 MJ"))![1]);
    expect(Math.abs(valueOf(call("VESSEL.ABSORB", "N2", "10 L", 300, "2 mol", 0.99999 * most), "temperature T2") - 20000)).toBeLessThan(1);
    expect(absorb("N2", "10 L", 300, "2 mol", 1.00001 * most)).toContain("leads beyond 20000 K");
    expect(textOf(call("VESSEL.REACH", "N2", "10 L", 300, "2 mol", 20000), "model")).toBe("ideal gas");
  });
});
