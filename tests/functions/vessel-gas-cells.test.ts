/** The one-number functions of a gas in a vessel in cells: what they refuse, and ranges. What belongs to the model is in gas-model.test.ts. */
import { R } from "./burn-helpers";
import { call, number, refusal } from "./helpers";

const PR = "peng-robinson";
type Given = unknown;

describe("refusals", () => {
  const ABSOLUTE = "pressures are absolute (see UNITS.ABSOLUTE for gauge readings)";
  const gauge = (unit: string, plain: string) =>
    `#VALUE! "${unit}" is a gauge pressure, and pressures here are absolute: use UNITS.ABSOLUTE(value, "${plain}")`;

  test("volumes", () => {
    const refused = (volume: Given) => [
      refusal("VESSEL.AMOUNT", "N2", volume, 300, 1e5),
      refusal("VESSEL.PRESSURE", "N2", 1, volume, 300),
      refusal("VESSEL.CV", "N2", 1, volume, 300),
      refusal("VESSEL.FINALTEMP", "N2", volume, 300, 1e5, 1),
    ];
    for (const sentence of refused(0)) expect(sentence).toBe("#VALUE! Volume 0 m3 is not above 0 m3");
    for (const sentence of refused("-5 L")) expect(sentence).toBe("#VALUE! Volume -0.005 m3 is not above 0 m3");
    for (const sentence of refused("5 kg")) expect(sentence).toBe('#VALUE! Volume "5 kg" is a mass; a volume such as L is expected');
    for (const sentence of refused(null))
      expect(sentence).toBe('#VALUE! Volume is missing: give a number in m3, or a text such as "0.34 L"');
  });

  test("amounts", () => {
    for (const id of ["VESSEL.PRESSURE", "VESSEL.CV"]) {
      expect(refusal(id, "N2", 0, "10 L", 300)).toBe("#VALUE! Amount 0 is not above zero");
      expect(refusal(id, "N2", "-5 g", "10 L", 300)).toBe('#VALUE! Amount "-5 g" is not above zero');
      expect(refusal(id, "N2", "5 L", "10 L", 300)).toBe(
        '#VALUE! The amount "5 L" is neither an amount nor a mass; write a text such as "2 mol" or "60 g"',
      );
      expect(refusal(id, "N2", null, "10 L", 300)).toBe(
        '#VALUE! The amount is blank: give moles as a number, or a text such as "2 mol" or "60 g"',
      );
    }
  });

  test.each([
    ["Pressure", "2.5 bar", (pressure: Given) => refusal("VESSEL.AMOUNT", "N2", "10 L", 300, pressure)],
    ["Pressure", "2.5 bar", (pressure: Given) => refusal("VESSEL.COMPRESSIBILITY", "N2", 300, pressure)],
    ["Pressure P1", "200 bar", (pressure: Given) => refusal("VESSEL.FINALPRESSURE", "N2", 300, pressure, 400)],
    ["Charge", undefined, (pressure: Given) => refusal("VESSEL.FINALTEMP", "N2", "10 L", 300, pressure, 1)],
  ])("pressures, by the name %s", (name, example, refused) => {
    expect(refused(0)).toBe(`#VALUE! ${name} 0 Pa is not above 0 Pa; ${ABSOLUTE}`);
    expect(refused("-5 bar")).toBe(`#VALUE! ${name} -500000 Pa is not above 0 Pa; ${ABSOLUTE}`);
    expect(refused("5 barg")).toBe(gauge("barg", "bar"));
    expect(refused("5 bar(g)")).toBe(gauge("bar(g)", "bar"));
    expect(refused("75 psig")).toBe(gauge("psig", "psi"));
    if (example) expect(refused(null)).toBe(`#VALUE! ${name} is missing: give a number in Pa, or a text such as "${example}"`);
  });

  const charge = (cell: Given) => refusal("VESSEL.FINALTEMP", "N2", "10 L", 300, cell, 1);

  test.each([
    [null, '#VALUE! The charge is missing: give an absolute pressure in Pa, or a text such as "200 bar", "60 g" or "2 mol"'],
    [true, '#VALUE! The charge is TRUE: give an absolute pressure in Pa, or a text such as "200 bar", "60 g" or "2 mol"'],
    ["full", '#VALUE! "full" does not begin with a number; write a quantity as "200 bar", "60 g" or "2 mol"'],
    ["5 L", '#VALUE! The charge "5 L" is neither a pressure nor an amount nor a mass; write a text such as "200 bar", "60 g" or "2 mol"'],
    ["3 K", '#VALUE! The charge "3 K" is neither a pressure nor an amount nor a mass; write a text such as "200 bar", "60 g" or "2 mol"'],
    [
      "200",
      '#VALUE! Charge is the text "200", not a number: give a number in Pa, or a text with a unit such as "200 bar", "60 g" or "2 mol"',
    ],
    ["0 g", '#VALUE! Amount "0 g" is not above zero'],
    ["-2 mol", '#VALUE! Amount "-2 mol" is not above zero'],
  ])("a charge of %j", (cell, sentence) => expect(charge(cell)).toBe(sentence));

  test("walls, heats and temperatures", () => {
    const after = (...rest: Given[]) => refusal("VESSEL.FINALTEMP", "N2", "10 L", ...rest);
    expect(after(300, "2 mol", 1, "60 kg kryptonite")).toMatch(
      /^#N\/A "kryptonite" is not a wall material of the library; nearest: \w+, \w+, .*$/,
    );
    expect(after(300, "2 mol", null)).toBe('#VALUE! Heat is missing: give a number in J, or a text such as "12 kJ"');
    expect(after(300, "2 mol", "20 K")).toBe('#VALUE! Heat "20 K" is a temperature; an energy such as kJ is expected');
    expect(after(0, "2 mol", 1)).toBe("#VALUE! Temperature T1 0 K is not above absolute zero, 0 K");
    expect(refusal("VESSEL.FINALPRESSURE", "N2", 300, 1e5, "-300 °C")).toBe(
      "#VALUE! Temperature T2 -26.85 K is not above absolute zero, 0 K",
    );
    expect(refusal("VESSEL.CV", "N2", 1, "30 L", 25000)).toBe(
      "#VALUE! Temperature 25000 K is above 20000 K, the upper limit of nasa-2002 for N2",
    );
    expect(after(300, "2 mol", "20 MJ")).toBe(
      "#VALUE! A heat of 20000000 J leads beyond 20000 K, the upper limit of nasa-2002 for N2; from this start it can be at most 1636550 J",
    );
    expect(after(300, "2 mol", "-20 kJ")).toBe(
      "#VALUE! A heat of -20000 J leads beyond 200 K, the lower limit of nasa-2002 for N2; from this start it can be at least -4159.43 J",
    );
    expect(after(300, "2 mol", "20 MJ", "1 kg carbon steel")).toMatch(
      /^#VALUE! A heat of 20000000 J leads beyond 1473\.15 K, the upper limit of en-1993-1-2 for carbon steel \(structural\); from this start it can be at most 879\d{3} J$/,
    );
  });

  test("substances and sets", () => {
    expect(refusal("VESSEL.AMOUNT", null, "10 L", 300, 1e5)).toBe(
      '#VALUE! The substance is missing: give a species such as "N2", a mixture, or a range of species and amounts',
    );
    expect(refusal("VESSEL.CV", "N2", 1, "30 L", 300, null, null, "nasa-2003")).toMatch(
      /^#N\/A There is no set "nasa-2003"; the sets are nasa-2002, /,
    );
    const fractions = [
      ["N2", 0.79],
      ["O2", 0.3],
    ];
    expect(refusal("VESSEL.AMOUNT", fractions, "10 L", 300, 1e5)).toBe(
      '#VALUE! The mole fractions add up to 1.09, not to 1 within 0.000001; MIX(…, "normalise") normalises on request',
    );
  });
});

describe("a mixture that is liquid fills the vessel as a pure liquid does, and is refused", () => {
  const LPG = "0.5 C3H8 + 0.5 n-C4H10";
  const liquid = (kelvin: string, label: string) => `#VALUE! At ${kelvin} K ${label} at this density is liquid that fills the volume`;

  test.each([PR, "soave"])("%s: by pressure and by mass, at T1 and at T2", (model) => {
    for (const refused of [
      refusal("VESSEL.AMOUNT", LPG, "50 L", "15 °C", "20 bar", "kg", model),
      refusal("VESSEL.COMPRESSIBILITY", LPG, "15 °C", "20 bar", model),
      refusal("VESSEL.FINALPRESSURE", LPG, "15 °C", "20 bar", "25 °C", "bar", model),
      refusal("VESSEL.REACH", LPG, "50 L", "15 °C", "20 bar", "50 °C", null, model),
      refusal("VESSEL.PRESSURE", LPG, "29.2 kg", "50 L", "15 °C", "bar", model),
      refusal("VESSEL.CV", LPG, "29.2 kg", "50 L", "15 °C", null, model),
      refusal("VESSEL.REACH", LPG, "50 L", "15 °C", "29.2 kg", "50 °C", null, model),
      refusal("VESSEL.ABSORB", LPG, "50 L", "15 °C", "29.2 kg", "1 kJ", null, model),
    ])
      expect(refused).toContain(liquid("288.15", LPG));
    expect(refusal("VESSEL.AMOUNT", "air", "50 L", "100 K", "200 bar", "kg", model)).toContain(liquid("100", "air"));
  });

  test("its vapour, and gases as they are stored, are served", () => {
    expect(number("VESSEL.AMOUNT", LPG, "50 L", "15 °C", "1 bar", "kg", PR)).toBeCloseTo(0.1093, 3);
    for (const [gas, celsius] of [
      ["0.92 CH4 + 0.06 C2H6 + 0.02 N2", -20],
      ["air", -40],
      ["0.82 Ar + 0.18 CO2", 0],
    ] as const)
      expect(number("VESSEL.AMOUNT", gas, "50 L", `${celsius} °C`, "200 bar", "kg", PR)).toBeGreaterThan(10);
  });
});

describe("ranges", () => {
  const error = { code: "#DIV/0!" };
  const shown = (block: ReturnType<typeof call>) => block.map((row) => row.map((cell) => (typeof cell === "object" ? cell.code : cell)));

  test("each cell has its own value or its own error, and errors come through", () => {
    const hot = (t: number) => number("VESSEL.FINALPRESSURE", "N2", 300, 1e5, t);
    const block = call("VESSEL.FINALPRESSURE", "N2", 300, 1e5, [
      [400, error],
      [-1, 500],
    ]);
    expect(shown(block)).toEqual([
      [hot(400), "#DIV/0!"],
      ["#VALUE!", hot(500)],
    ]);
    expect(
      shown(call("VESSEL.AMOUNT", [["N2"], ["CO2"], ["H2O(l)"], [error], [null], ["HI"]], "10 L", 300, "0.5 bar")).map(([cell]) => cell),
    ).toEqual([
      number("VESSEL.AMOUNT", "N2", "10 L", 300, "0.5 bar"),
      number("VESSEL.AMOUNT", "CO2", "10 L", 300, "0.5 bar"),
      "#VALUE!",
      "#DIV/0!",
      "#VALUE!",
      "#N/A",
    ]);
  });

  test("charges as text and number mixed, units and models one for each", () => {
    const after = (charge: Given, unit?: Given, model?: Given) =>
      call("VESSEL.FINALTEMP", "N2", "10 L", 300, charge, 1000, null, unit, model);
    const charges = ["2 mol", 5e5, "5 bar", "56 g", "5 L"];
    const units = ["K", "°C", null, "°F", "K"];
    const models = [PR, "ideal", "soave", null, null];
    const block = after(...([charges, units, models].map((list) => list.map((cell) => [cell])) as [Given, Given, Given]));
    expect(block).toEqual(charges.map((_, i) => after(charges[i], units[i], models[i])[0]!));
    expect(block.slice(0, 4).every(([cell]) => typeof cell === "number")).toBe(true);
  });

  test("a composition is one substance; sets one for each, or a coefficient block", () => {
    const range = [
      ["N2", 0.79],
      ["O2", 0.21],
    ];
    expect(call("VESSEL.AMOUNT", range, "10 L", 300, [[1e5], [2e5]])).toEqual(
      call("VESSEL.AMOUNT", "0.79 N2 + 0.21 O2", "10 L", 300, [[1e5], [2e5]]),
    );
    const cv = (t: Given, set: Given) => call("VESSEL.CV", "N2", "1 mol", "30 L", t, null, null, set);
    expect(cv(500, [["nasa-2002"], ["gri-1999"]]).flat()).toEqual([cv(500, "nasa-2002")[0]![0], cv(500, "gri-1999")[0]![0]]);
    const block = [["Cp", "g", "N2", "power 0", 250, 1500, "J/(mol K)", null, null, null, 30]];
    expect(cv([[400], [500]], block).flat()).toEqual([30 - R, 30 - R]);
    expect(refusal("VESSEL.CV", "N2", "1 mol", "30 L", 1600, null, null, block)).toBe(
      "#VALUE! Temperature 1600 K is above 1500 K, the upper limit of the coefficient block for N2(g)",
    );
  });

  test("beyond the range of a set if it is asked for", () => {
    expect(number("VESSEL.CV", "N2", 1, "30 L", 6000, null, "ideal", "gri-1999; extrapolate")).toBe(
      number("VESSEL.CV", "N2", 1, "30 L", 5000, null, "ideal", "gri-1999"),
    );
    expect(refusal("VESSEL.CV", "N2", 1, "30 L", 6000, null, "ideal", "gri-1999")).toBe(
      "#VALUE! Temperature 6000 K is above 5000 K, the upper limit of gri-1999 for N2",
    );
  });

  test("ranges of two shapes", () =>
    expect(refusal("VESSEL.FINALPRESSURE", "N2", 300, [[1e5], [2e5]], [[400], [500], [600]])).toBe(
      "#VALUE! The ranges differ in shape: P1 has 2 rows × 1 column, T2 has 3 rows × 1 column; give ranges of one shape, or single cells",
    ));
});
