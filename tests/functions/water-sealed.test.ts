/** The table of water sealed in a vessel, as a host calls it. */
import { CellError } from "../../src/functions/cell";
import { call, number, refusal } from "./helpers";

type Row = (number | string | boolean | CellError)[];

/** Rows of an upright table by label; warnings as one list. */
function upright(...values: unknown[]): { at: (label: string) => Row; labels: string[]; warnings: string[] } {
  const rows = call("WATER.SEALED", ...values);
  if (rows[0]![0] instanceof CellError) throw new Error(rows[0]![0].message);
  const find = (label: string) => rows.find(([first]) => first === label) ?? [];
  const warnings = rows.filter(([first]) => first === "warning").map((row) => String(row[3]));
  return { at: (label) => find(label).slice(1), labels: rows.map(([label]) => String(label)), warnings };
}

const value = (table: ReturnType<typeof upright>, label: string) => table.at(label)[0] as number;

describe("an autoclave of 2 L with 1.2 kg of water and air, 20 °C to 180 °C", () => {
  const autoclave = upright("2 L", "1.2 kg", "20 °C", "180 °C", "101325 Pa air", "10 kg carbon steel", 36e-6, "20 bar");

  test("its lines", () =>
    expect(autoclave.labels).toEqual([
      "mass of water",
      "volume",
      "gas",
      "amount of gas",
      "pressure at T1",
      "pressure at T2",
      "phase at T1",
      "phase at T2",
      "vapour fraction at T2",
      "liquid at T2",
      "saturation pressure at T2",
      "partial pressure of gas at T2",
      "heat into water",
      "heat into gas",
      "heat into wall",
      "heat in all",
      "liquid-full at",
      "heat from T1 to liquid-full",
      "dew temperature",
      "pressure per kelvin at T2",
      "limit",
      "pressure at T2 / limit",
      "temperature at limit",
      "holds for",
      "warnings",
    ]));

  test("pressures by hand: 2.3393 and 1002.8 kPa saturation pressure, v 0.0010018 and 0.0011274 m³/kg, from memory", () => {
    expect(Math.abs(value(autoclave, "pressure at T1") - 101325 - 2339.3)).toBeLessThan(0.5);
    expect(Math.abs(value(autoclave, "saturation pressure at T2") / 1002.8e3 - 1)).toBeLessThan(1e-4);
    // 3.4 g evaporate; the vessel grows by 0.576 %
    const [room, later] = [2 - 1.2 * 1.0018, 2 * 1.00576 - (1.2 - 0.0034) * 1.1274];
    const gas = (101325 * (453.15 / 293.15) * room) / later;
    expect(Math.abs(value(autoclave, "partial pressure of gas at T2") / gas - 1)).toBeLessThan(1e-3);
    expect(autoclave.at("pressure at T2")[2]).toMatch(/^absolute; water 1002810 Pa \+ gas 188575 Pa$/);
    expect(value(autoclave, "pressure at T2")).toBe(
      value(autoclave, "saturation pressure at T2") + value(autoclave, "partial pressure of gas at T2"),
    );
  });

  test("heat by hand: u of the liquid 83.91 and 761.92 kJ/kg, u of the vapour 2582.8 kJ/kg, from memory; the balance closes", () => {
    const water = (1.2 - 0.0034) * 761.92e3 + 0.0034 * 2582.8e3 - 1.2 * 83.91e3;
    expect(Math.abs(value(autoclave, "heat into water") / water - 1)).toBeLessThan(5e-4);
    const sum = ["water", "gas", "wall"].reduce((total, part) => total + value(autoclave, `heat into ${part}`), 0);
    expect(Math.abs(value(autoclave, "heat in all") / sum - 1)).toBeLessThan(1e-12);
    // air, 0.0332 mol of 20.85 J/(mol K) over 160 K
    expect(Math.abs(value(autoclave, "heat into gas") - 0.033168 * 20.85 * 160)).toBeLessThan(1);
    expect(autoclave.at("heat into wall")[2]).toBe("10 kg carbon steel; heat capacity by en-1993-1-2 for carbon steel (structural)");
    // carbon steel has 440 J/(kg K) at 20 °C and 530 J/(kg K) at 200 °C (EN 1993-1-2)
    expect(Math.abs(value(autoclave, "heat into wall") / (10 * 160 * 485) - 1)).toBeLessThan(0.01);
    expect(autoclave.at("heat in all")[2]).toMatch(
      /^from T1, 293\.15 K, to T2; negative: given off; work on the vessel as it grows is left out, p2 dV = 13\.7\d* J$/,
    );
  });

  test("without wall and expansion the notes say so", () => {
    const bare = upright("2 L", "1.2 kg", "20 °C", "180 °C", "101325 Pa air");
    expect(bare.at("heat into wall")).toEqual([0, "J", "no wall counted"]);
    expect(bare.at("volume")).toEqual([0.002, "m3", "the same at T1 and T2: no expansion of the wall"]);
    expect(bare.at("heat in all")[2]).not.toContain("dV");
    expect(bare.labels).not.toContain("limit");
    expect(value(bare, "pressure at T2")).toBeGreaterThan(value(autoclave, "pressure at T2"));
  });

  test("the limit, reached above T2", () => {
    expect(autoclave.at("temperature at limit")[2]).toMatch(/above T2 by 26\.7\d* K$/);
    expect(autoclave.warnings).toEqual([]);
    const hot = upright("2 L", "1.2 kg", "20 °C", autoclave.at("temperature at limit")[0], "101325 Pa air", undefined, 36e-6, "20 bar");
    expect(Math.abs(value(hot, "pressure at T2 / limit") - 1)).toBeLessThan(1e-10);
    expect(upright("2 L", "1.2 kg", "20 °C", "180 °C", undefined, undefined, undefined, "10 bar").warnings).toEqual([
      "The pressure at T2, 1002810 Pa, exceeds the limit of 1000000 Pa",
    ]);
  });
});

test("without a gas the table says that no air is counted", () => {
  for (const gas of [undefined, 0, ""]) {
    const alone = upright("2 L", "1.2 kg", "20 °C", "180 °C", gas);
    expect(alone.at("gas")).toEqual([
      "no air counted",
      "",
      'water alone, as if the air had been drawn off: a vessel closed in air also holds it, give gas as "101325 Pa air"',
    ]);
    expect(value(alone, "pressure at T2")).toBe(number("WATER.SATURATION", "180 °C"));
    expect(value(alone, "pressure at T2")).toBe(number("WATER.PRESSURE", 600, "180 °C"));
    expect(alone.at("partial pressure of gas at T2")).toEqual([0, "Pa", "no gas"]);
  }
});

test("heating is the difference of WATER.ENERGY", () => {
  const difference = 1.2 * (number("WATER.ENERGY", 600, "180 °C") - number("WATER.ENERGY", 600, "20 °C"));
  expect(Math.abs(value(upright("2 L", "1.2 kg", "20 °C", "180 °C"), "heat into water") / difference - 1)).toBeLessThan(1e-14);
});

describe("humid air", () => {
  test("60 % at 30 °C in 1 m³, cooled to 5 °C: 11.4 g of 18.2 g condense, and the heat given off holds their evaporation", () => {
    const cooled = upright("1 m3", "60 % humidity", "30 °C", "5 °C", "101325 Pa air");
    // v of saturated vapour 32.88 and 147.01 m³/kg, from memory
    expect(Math.abs(value(cooled, "mass of water") - 0.6 / 32.88)).toBeLessThan(1e-5);
    expect(cooled.at("mass of water")[2]).toBe("vapour at 60 % of the saturated density at T1");
    expect(Math.abs(value(cooled, "vapour fraction at T2") - 32.88 / 0.6 / 147.01)).toBeLessThan(2e-4);
    expect(cooled.at("heat into water")[2]).toBe("0.011447 kg condense, counted");
    expect(value(cooled, "heat into water")).toBeLessThan(-0.0114 * 2.36e6);
    expect(cooled.at("phase at T1")[0]).toBe("vapour");
    expect(cooled.at("phase at T2")[0]).toBe("liquid and vapour");
    // 20.9 °C, a little below the 21.4 °C at constant pressure
    expect(Math.abs(value(cooled, "dew temperature") - 294.05)).toBeLessThan(0.1);
    expect(cooled.at("liquid-full at")).toEqual(["never", "K", "the liquid evaporates before it fills the vessel"]);
    expect(cooled.warnings).toEqual([]);
  });

  test("the ways to write humidity", () => {
    const mass = value(upright(1, "60 % humidity", "30 °C", "40 °C"), "mass of water");
    for (const text of ["60% RH", "60 % r.h.", "60 % relative humidity", " 60 % Humidity "])
      expect(value(upright(1, text, "30 °C", "40 °C"), "mass of water")).toBe(mass);
    expect(value(upright(1, mass, "30 °C", "40 °C"), "pressure at T2")).toBe(
      value(upright(1, "60% rh", "30 °C", "40 °C"), "pressure at T2"),
    );
  });

  test("drier than saturation at the triple point it has no dew temperature here", () =>
    expect(upright(1, "1 % RH", "20 °C", "40 °C", "1 atm air").at("dew temperature")).toEqual(["none", "K", "no liquid down to 273.16 K"]));

  test("heated without liquid, all of it follows the ideal gas within 0.1 %", () => {
    const heated = upright(1, "50 % humidity", "20 °C", "100 °C", "100 kPa air");
    const ideal = value(heated, "pressure at T1") * (373.15 / 293.15);
    expect(Math.abs(value(heated, "pressure at T2") / ideal - 1)).toBeLessThan(1e-3);
    expect(heated.at("heat into water")[2]).toBe("nothing evaporates or condenses");
  });
});

describe("a vessel that fills with liquid", () => {
  const full = upright("1 L", "0.9 kg", "20 °C", "200 °C");

  test("where it is full, the heat that leads there, the pressure per kelvin", () => {
    // v of saturated liquid 0.0011111 m³/kg between 0.001108 at 165 °C and 0.001114 at 170 °C, from memory
    expect(Math.abs(value(full, "liquid-full at") - 440.7)).toBeLessThan(0.6);
    const there = upright("1 L", "0.9 kg", "20 °C", full.at("liquid-full at")[0]);
    expect(value(full, "heat from T1 to liquid-full")).toBe(value(there, "heat in all"));
    expect(full.at("phase at T2")[0]).toBe("liquid");
    expect(full.at("liquid at T2")[0]).toBe(1);
    const [low, high] = ["199.9 °C", "200.1 °C"].map((t) => value(upright("1 L", "0.9 kg", "20 °C", t), "pressure at T2"));
    expect(Math.abs((high! - low!) / 0.2 / value(full, "pressure per kelvin at T2") - 1)).toBeLessThan(1e-5);
    expect(full.warnings).toEqual([
      `The water fills the vessel from 440.643 K on: at T2 each kelvin more adds ${Number(value(full, "pressure per kelvin at T2").toPrecision(6))} Pa, if the wall does not yield to the pressure`,
    ]);
  });

  test("just below, always, at T1 already", () => {
    expect(upright("1 L", "0.9 kg", "20 °C", "160 °C").warnings).toEqual([
      "The water fills the vessel at 440.643 K, 7.4926 K above T2: from there on the pressure rises steeply",
    ]);
    expect(upright("1 L", "0.9 kg", "20 °C", "120 °C").warnings).toEqual([]);
    const always = upright("1 L", "1.02 kg", "20 °C", "30 °C");
    expect(always.at("liquid-full at").slice(0, 2)).toEqual(["always", "K"]);
    // in the last kelvin below the critical point the slope of squeezed contents is not told
    const critical = upright("1 L", "0.9 kg", "20 °C", 646.6, "1 atm air");
    expect(critical.at("pressure per kelvin at T2")[0]).toBe("not known");
    expect(critical.warnings[0]).toBe("The water fills the vessel from 440.643 K on");
    expect(always.warnings[0]).toMatch(
      /^The water fills the vessel at every temperature: at T2 each kelvin more adds \d+ Pa, if the wall does not yield to the pressure$/,
    );
    const cooling = upright("1 L", "0.9 kg", "200 °C", "100 °C");
    expect(cooling.at("liquid-full at")[2]).toMatch(/^below T1: already full there/);
    expect(cooling.at("heat from T1 to liquid-full")).toEqual(["none", "J", "full at T1"]);
    expect(cooling.at("phase at T2")[0]).toBe("liquid and vapour");
  });

  test("below 4 °C water expands as it cools, and may fill the vessel again", () => {
    // saturated liquid has 999.9 kg/m3 at 1.3 °C and at 5.8 °C, between them more (from memory)
    const again = (kelvin: number) =>
      `At ${kelvin} K the water fills the vessel as well: below 4 °C it expands as it cools, and the pressure rises`;
    const cooled = upright("1 L", "0.9999 kg", "4 °C", "0.5 °C");
    expect(cooled.at("phase at T2")[0]).toBe("liquid");
    expect(cooled.warnings).toEqual([again(273.65)]);
    expect(upright("1 L", "0.9999 kg", "4 °C", "0.5 °C", "1 bar air").warnings[0]).toBe(again(273.65));
    expect(upright("1 L", "0.9999 kg", "0.5 °C", "4 °C").warnings[1]).toBe(again(273.65));
    expect(upright("1 L", "0.9999 kg", "4 °C", "3 °C").warnings).toHaveLength(1);
  });

  test("a pad of air is squeezed: an upper estimate, with the pressure of the water alone as the other end", () => {
    const padded = upright("1 L", "0.9 kg", "20 °C", "200 °C", "1 atm air");
    const alone = Number(value(full, "pressure at T2").toPrecision(6));
    expect(padded.warnings).toHaveLength(3);
    expect(padded.warnings[1]).toMatch(
      new RegExp(
        `^The water squeezes the gas from 0\\.0000983\\d+ m3 to \\S+ m3: much of it would dissolve, and the pressure is an upper estimate for this amount of gas; if all of it dissolved, the water alone would have ${alone} Pa$`,
      ),
    );
    expect(padded.warnings[2]).toMatch(/^The gas, at \d+ Pa, is taken as ideal, from which it then differs by some per cent or more$/);
    expect(value(padded, "pressure at T2")).toBeGreaterThan(alone);
    expect(padded.at("liquid-full at")[2]).toContain("of the water alone");
  });

  test("dense vapour beside a gas is told, and a range of the wall that ends before", () => {
    expect(upright("1 L", "0.5 kg", "20 °C", "380 °C", "1 atm air").warnings.join()).toMatch(
      /The water around the gas has 500 kg\/m3, above 0\.3 of its critical density: adding their pressures is rough there/,
    );
    const lined = upright("1 L", "0.9 kg", 280, 288, undefined, "2 kg PTFE").at("heat from T1 to liquid-full");
    expect(lined.slice(0, 2)).toEqual(["not known", "J"]);
    expect(lined[2]).toBe("nist-cryogenic for PTFE ends at 300 K");
  });
});

describe("what a gas does beside water", () => {
  test("its distance from the ideal gas is told by Peng-Robinson: carbon dioxide at 20 bar", () => {
    // Z of CO2 at 20 °C, 20 bar: 1 + B P/(RT), B -129 cm3/mol from memory: 0.89; from the ideal pressure at the same volume 10 % less
    const { warnings } = upright("1 L", "0.5 kg", "20 °C", "25 °C", "20 bar CO2");
    const [, ideal, real, size] = /^The gas, at (\d+) Pa, is taken as ideal; Peng-Robinson has (\d+) Pa for it alone, (\d+) % less$/.exec(
      warnings[0]!,
    )!;
    expect(Math.abs(Number(real) / Number(ideal) - 0.9)).toBeLessThan(0.015);
    expect(Math.round(100 * (1 - Number(real) / Number(ideal)))).toBe(Number(size));
    expect(upright("1 L", "0.5 kg", "20 °C", "150 °C", "1 atm air").warnings).toEqual([]);
  });

  test("one that dissolves is named, where there is liquid and more than a trace of it", () => {
    const IN_WATER =
      " in water, which is not counted: water that has stood under it holds much of it at T1 and gives it off when heated, so that the pressure may be above this one as well as below";
    expect(upright("1 L", "0.5 kg", "20 °C", "150 °C", "1 bar CO2").warnings).toEqual([`CO2 dissolves${IN_WATER}`]);
    expect(upright("1 L", "0.5 kg", "20 °C", "150 °C", "1 bar 0.9 N2 + 0.06 NH3 + 0.04 H2S").warnings).toEqual([
      `NH3, H2S dissolve${IN_WATER.replaceAll("under it", "under them").replaceAll("of it", "of them").replace("gives it", "gives them")}`,
    ]);
    expect(upright("1 L", "50 % humidity", "20 °C", "150 °C", "1 bar CO2").warnings).toEqual([]);
  });

  test("one that would be liquid is refused at T1 and told at T2", () => {
    expect(refusal("WATER.SEALED", "1 L", "0.5 kg", "20 °C", "150 °C", "80 bar CO2")).toMatch(
      /^#VALUE! CO2 would condense: at 293\.15 K its pressure of 8000000 Pa is above its vapour pressure, about 57\d{5} Pa$/,
    );
    expect(upright("1 L", "0.5 kg", "60 °C", "5 °C", "1 bar n-C4H10").warnings.join()).not.toContain("condense");
    expect(upright("1 L", "0.5 kg", "90 °C", "5 °C", "5 bar n-C4H10").warnings.join()).toMatch(
      /n-C4H10 would condense: at 278\.15 K its pressure of \d+ Pa is above its vapour pressure, about 12\d{4}/,
    );
  });

  test("the thinnest of gases leaves the water alone", () => {
    const alone = upright("1 L", "0.5 kg", "20 °C", "30 °C");
    for (const gas of ["1e-3 Pa air", "1e-6 Pa air", "1e-12 Pa air"]) {
      const thin = upright("1 L", "0.5 kg", "20 °C", "30 °C", gas);
      expect(Math.abs(value(thin, "pressure at T2") / value(alone, "pressure at T2") - 1)).toBeLessThan(1e-6);
      // p V_vapour/T held: 303.15/293.15, and 0.3 % more because the liquid grows
      expect(Math.abs(value(thin, "partial pressure of gas at T2") / Number.parseFloat(gas) - 1.0369)).toBeLessThan(0.001);
    }
  });

  test("one that reacts with water has the first row", () => {
    expect(upright("1 L", "0.5 kg", "20 °C", "150 °C", "0.9 bar F2").at("CAUTION")).toEqual([
      "see note",
      "",
      expect.stringContaining("F2 and H2O react, as fluorine takes these too"),
    ]);
  });

  test("traces that can react stand below the table", () => {
    expect(upright("1 L", "0.5 kg", "20 °C", "150 °C", "1 bar 0.0001 H2 + 0.21 O2 + 0.7899 N2").warnings).toEqual([
      "Traces that can react, by no more than some 25 K if all of them did: fuel H2 (0.01 %) with oxidant O2 (21 %): limits of flammability are not judged",
    ]);
  });
});

test("supercritical states tell what has no meaning there", () => {
  const table = upright("1 L", "0.3 kg", "20 °C", "400 °C");
  for (const label of ["vapour fraction at T2", "liquid at T2", "saturation pressure at T2"])
    expect(table.at(label)[0]).toBe("above critical");
  expect(table.at("phase at T2")[0]).toBe("supercritical");
  expect(table.at("heat into water")[2]).toBe("");
});

test("fuel and oxidant in the gas are told first", () => {
  const rows = call("WATER.SEALED", "2 L", "1 kg", "20 °C", "90 °C", "1 bar 0.1 H2 + 0.9 N2");
  expect(rows[0]![0]).toBe("mass of water");
  const caution = call("WATER.SEALED", "2 L", "1 kg", "20 °C", "90 °C", "1 bar 0.3 H2 + 0.7 O2");
  expect(caution[0]![0]).toBe("CAUTION");
});

test("a column of states gives rows, each with its own limit or one curve for all; a refused state keeps its row", () => {
  const temperatures = [["100 °C"], ["-5 °C"], ["200 °C"]];
  const rows = call("WATER.SEALED", "2 L", "1 kg", "20 °C", temperatures, "1 atm air", undefined, undefined, [
    ["2 bar"],
    ["2 bar"],
    ["30 bar"],
  ]);
  const [headings, first, refused, third] = rows as [Row, Row, Row, Row];
  const limit = headings.indexOf("limit [Pa]");
  expect([first[limit], third[limit]]).toEqual([2e5, 3e6]);
  expect(refused[0]).toMatchObject({ code: "#VALUE!", message: "Temperature 268.15 K is below 273.16 K, where water freezes" });
  const one = upright("2 L", "1 kg", "20 °C", "200 °C", "1 atm air");
  expect(third[headings.indexOf("pressure at T2 [Pa]")]).toBe(value(one, "pressure at T2"));
  const curve = [
    ["20 °C", "25 bar"],
    ["150 °C", "25 bar"],
    ["250 °C", "15 bar"],
  ];
  const swept = call("WATER.SEALED", "2 L", "1 kg", "20 °C", [["100 °C"], ["200 °C"]], "1 atm air", undefined, undefined, curve);
  expect(swept.slice(1).map((row) => row[swept[0]!.indexOf("limit [Pa]")])).toEqual([2.5e6, expect.closeTo(2e6, 5)]);
  expect(refusal("WATER.SEALED", "2 L", "1 kg", "20 °C", "300 °C", undefined, undefined, undefined, curve)).toBe(
    "#VALUE! Temperature 573.15 K is outside 293.15 K to 523.15 K, where the limit of the vessel is given",
  );
});

describe("refusals", () => {
  const refused = (...values: unknown[]) => refusal("WATER.SEALED", ...values);

  test("volume and mass", () => {
    expect(refused(0, 1, 300, 400)).toBe("#VALUE! Volume 0 m3 is not above 0 m3");
    expect(refused("2 L", -1, 300, 400)).toBe("#VALUE! Mass of water -1 kg is not above 0 kg");
    expect(refused("2 L", "1 L", 300, 400)).toBe('#VALUE! Mass of water "1 L" is a volume; a mass such as g is expected');
    expect(refused("2 L", undefined, 300, 400)).toBe('#VALUE! Mass of water is missing: give a number in kg, or a text such as "1.2 kg"');
    expect(refused("2 L", 3, 300, 400)).toMatch(/1000 MPa|freezes/);
    expect(refused("1 L", 0.999, "20 °C", 400, "1 atm air")).toBe(
      "#VALUE! 0.999 kg of water take up 0.00100079 m3 at 293.15 K: there is no room for a gas in 0.001 m3",
    );
  });

  test("humidity", () => {
    expect(refused(1, "120 % humidity", 300, 400)).toBe("#VALUE! The relative humidity 120 % is not above 0 % and up to 100 %");
    expect(refused(1, "0 % humidity", 300, 400)).toBe("#VALUE! The relative humidity 0 % is not above 0 % and up to 100 %");
    for (const text of ["60 %", "0.6 humidity"])
      expect(refused(1, text, 300, 400)).toBe(
        `#VALUE! Mass of water "${text}": write a mass such as "1.2 kg", or the humidity as "60 % humidity"`,
      );
    expect(refused(1, "60 % humidity", 700, 400)).toMatch(/647\.096 K/);
  });

  test("temperatures", () => {
    expect(refused("2 L", 1, "270 K", 400)).toBe("#VALUE! Temperature 270 K is below 273.16 K, where water freezes");
    expect(refused("2 L", 1, "20 °C", 250)).toBe(
      '#VALUE! Temperature T2 250 K is below 273.16 K, where water freezes; for degrees Celsius write "250 °C"',
    );
    expect(refused("2 L", 1, 300, 1300)).toBe("#VALUE! Temperature 1300 K is above 1273 K, the upper limit of IAPWS-95 for water");
    expect(refused("2 L", 1, 20, 400)).toBe(
      '#VALUE! Temperature T1 20 K is below 273.16 K, where water freezes; for degrees Celsius write "20 °C"',
    );
  });

  test("the gas", () => {
    const suchAs = 'give its absolute partial pressure at T1 and the gas, such as "101325 Pa air"';
    expect(refused("2 L", 1, 300, 400, "air")).toBe(`#VALUE! The gas is "air": ${suchAs}`);
    expect(refused("2 L", 1, 300, 400, 101325)).toBe(`#VALUE! The gas is 101325: ${suchAs}`);
    expect(refused("2 L", 1, 300, 400, "-1 bar air")).toContain("Partial pressure of the gas -100000 Pa is not above 0 Pa");
    expect(refused("2 L", 1, 300, 400, "1 barg air")).toContain("UNITS.ABSOLUTE");
    expect(refused("2 L", 1, 300, 400, "1,5 bar N2")).toBe('#VALUE! "1,5 bar N2" has a decimal comma; write a point: "1.5 bar N2"');
    expect(refused("2 L", 1, 300, 400, "1 bar H2O")).toBe(
      '#VALUE! The gas "1 bar H2O" holds water: name the dry gas, the vapour belongs to the mass of water',
    );
    expect(refused("2 L", 1, 300, 400, "1 bar H2O(l)")).toBe('#VALUE! The gas "1 bar H2O(l)" holds H2O(l), which is not a gas');
    expect(refused("2 L", 1, 300, 400, "2 kg air")).toMatch(/is a mass; a pressure such as bar is expected/);
    expect(refused("2 L", 1, 300, 400, "1 bar nonsense")).toMatch(/^#N\/A/);
  });

  test("expansion and limit", () => {
    expect(refused("2 L", 1, 300, 400, undefined, undefined, 0.1)).toBe(
      "#VALUE! Wall expansion 0.1 1/K is not from 0 to 0.001 1/K; carbon steel has 36e-6 by volume",
    );
    expect(refused("2 L", 1, 300, 400, undefined, undefined, -1e-6)).toContain("is not from 0 to 0.001 1/K");
    expect(refused("2 L", 1, 300, 400, undefined, undefined, undefined, [[300, 1e6]])).toContain(
      "The limit is a range of 1 row × 2 columns",
    );
    expect(value(upright("2 L", 1, 300, 400, undefined, undefined, "36e-6 1/K"), "volume")).toBeCloseTo(0.0020072, 12);
  });
});
