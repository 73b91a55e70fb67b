/** Kelvin that were meant in °C: the reminder in refusals of the vessel functions, and what would be a plausible number without a refusal. */
import { refuseRange } from "../../src/core/refusal";
import { remindingOfCelsius } from "../../src/functions/celsius";
import { refusedWith } from "../core/refused";
import { call, number, refusal } from "./helpers";

const PR = "peng-robinson";
const reminder = (plain: number) => `; for degrees Celsius write "${plain} °C"`;

describe("the reminder", () => {
  const refused = (temperatures: (number | string | null)[], sentence: string) =>
    refusedWith(() => remindingOfCelsius(temperatures, () => refuseRange(sentence)));

  test.each([
    [[15], "Temperature 15 K is below 200 K", reminder(15)],
    [[200, 150], "At 150 K, below 200 K", reminder(150)],
    [[-20], "Temperature -20 K is not above absolute zero, 0 K", reminder(-20)],
    [[0], "Temperature 0 K is not above absolute zero, 0 K", ""],
    [["15 K"], "Temperature 15 K is below 200 K", ""],
    [[223.15], "Temperature 223.15 K is below 300 K", ""],
    [[15], "Temperature 115 K is below 200 K", ""],
    [[15], "Temperature 15 K is cold; for degrees Celsius write it", ""],
    [[15, null], "The volume is missing", ""],
  ])("%j: %s", (temperatures, sentence, end) => expect(refused(temperatures, sentence)).toBe(`range: ${sentence}${end}`));

  test("what is not a refusal passes", () => {
    expect(remindingOfCelsius([15], () => 7)).toBe(7);
    expect(() =>
      remindingOfCelsius([15], () => {
        throw new RangeError("15 K");
      }),
    ).toThrow(new RangeError("15 K"));
  });
});

describe("vessel functions", () => {
  test("below the range of the heat capacities, and where a gas would be liquid", () => {
    expect(refusal("VESSEL.CV", "N2", 1, "10 L", 50, null, PR)).toBe(
      `#VALUE! Temperature 50 K is below 200 K, the lower limit of nasa-2002 for N2${reminder(50)}`,
    );
    expect(refusal("VESSEL.FINALPRESSURE", "N2", "15 °C", "200 bar", 50, "bar", PR)).toBe(
      `#VALUE! At 50 K N2 at this density is liquid beside vapour, vapour pressure 614.467 Pa; VESSEL.REACH shows both${reminder(50)}`,
    );
  });

  test("of a table", () =>
    expect(refusal("VESSEL.REACH", "N2", "50 L", 15, "2 bar", 50, null, PR)).toBe(
      `#VALUE! Temperature 15 K is below 0.3 of the critical temperature of N2, 126.2 K, from where Peng-Robinson tells a vapour pressure${reminder(15)}`,
    ));

  test("in each row of a column its own", () =>
    expect(call("VESSEL.WARMUP", "60 kg carbon steel", "2 kW", 0, 293.15, [[20], ["20 °C"], [30]], "100 °C")).toEqual([
      [
        expect.objectContaining({
          message: expect.stringMatching(/^Temperature from 20 K is below .*; for degrees Celsius write "20 °C"$/),
        }),
      ],
      [number("VESSEL.WARMUP", "60 kg carbon steel", "2 kW", 0, 293.15, 293.15, 373.15)],
      [
        expect.objectContaining({
          message: expect.stringMatching(/^Temperature from 30 K is below .*; for degrees Celsius write "30 °C"$/),
        }),
      ],
    ]));
});

describe("too cold for a vapour pressure, below 0.3 of the critical temperature: refused, where the filling was a liquid or solid by far", () => {
  test.each([PR, "soave"])("%s, by pressure", (model) => {
    const title = model === PR ? "Peng-Robinson" : "Soave";
    const sentence = `#VALUE! Temperature 15 K is below 0.3 of the critical temperature of N2, 126.2 K, from where ${title} tells a vapour pressure${reminder(15)}`;
    expect(refusal("VESSEL.AMOUNT", "N2", "50 L", 15, "200 bar", "kg", model)).toBe(sentence);
    expect(refusal("VESSEL.COMPRESSIBILITY", "N2", 15, "200 bar", model)).toBe(sentence);
  });

  test("the ideal gas, whose bound is the vapour pressure at 0.3 Tc, 91.236 K of CO2, far below the triple point", () => {
    const refused = refusal("VESSEL.FINALPRESSURE", "CO2", "15 °C", "10 bar", 50, "bar", "ideal");
    expect(refused).toMatch(
      /^#VALUE! CO2 would condense: at 50 K its pressure of 173521 Pa is above its vapour pressure, less than [\d.e-]+ Pa; for degrees Celsius write "50 °C"$/,
    );
    expect(Number(/less than (\S+) Pa/.exec(refused)![1])).toBeLessThan(1);
    expect(refusal("VESSEL.PRESSURE", "H2O", "1 g", "10 L", 100, "bar", "ideal")).toMatch(
      /^#VALUE! H2O would condense: at 100 K its pressure of 4615.\d+ Pa is above its vapour pressure, less than 0.0323\d* Pa; WATER.SEALED holds water/,
    );
  });

  test("not hydrogen and helium, whose critical temperatures lie far below", () => {
    expect(number("VESSEL.AMOUNT", "He", "50 L", 20, "1 bar", null, "ideal")).toBeCloseTo(30.07, 1);
    expect(number("VESSEL.AMOUNT", "H2", "50 L", 30, "1 bar", null, "ideal")).toBeCloseTo(20.05, 1);
  });
});
