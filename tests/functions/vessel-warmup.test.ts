import fc from "fast-check";
import { call, number, refusal } from "./helpers";

describe("VESSEL.WARMUP and VESSEL.WARMTEMP", () => {
  test("the textbook vessel, in numbers and in texts", () => {
    // 15 000 s × ln(250/175), computed apart from this program: 5350 s
    const exact = 15_000 * Math.log(250 / 175);
    expect(number("VESSEL.WARMUP", 30_000, 500, 2, 298.15, 298.15, 373.15)).toBeCloseTo(exact, 8);
    expect(number("VESSEL.WARMUP", "30 kJ/K", "0.5 kW", "2 W/K", "25 °C", "25 °C", "100 °C")).toBeCloseTo(exact, 8);
    expect(number("VESSEL.WARMTEMP", "30 kJ/K", 500, 2, "25 °C", "25 °C", exact, "°C")).toBeCloseTo(100, 9);
    expect(number("VESSEL.WARMTEMP", "30 kJ/K", 500, 0, "25 °C", "25 °C", "75 min")).toBeCloseTo(373.15, 9);
  });

  test("contents as a block, with a set for the gas; the inverse undoes it", () => {
    const block = [
      ["carbon steel", "60 kg"],
      ["N2", "100 mol"],
      ["reaction mass", "0.2 kg at 2.1 kJ/(kg K)"],
    ];
    const time = number("VESSEL.WARMUP", block, "10 kW", 5, "20 °C", "30 °C", "700 °C", "gri-1999");
    expect(number("VESSEL.WARMTEMP", block, "10 kW", 5, "20 °C", "30 °C", time, "°C", "gri-1999")).toBeCloseTo(700, 7);
    expect(time).not.toBe(number("VESSEL.WARMUP", block, "10 kW", 5, "20 °C", "30 °C", "700 °C"));
  });

  test("without loss the time is that of HEAT", () => {
    const heat = number("HEAT", "N2", 100, 300, 900) + number("HEAT", "SiO2(cr,quartz)", 2, 300, 900, undefined, "srd69-shomate");
    const time = number("VESSEL.WARMUP", "100 mol N2 + 2 mol SiO2(cr,quartz)", 1000, 0, 300, 300, 900, "srd69-shomate");
    const nitrogen = number("HEAT", "N2", 100, 300, 900, undefined, "srd69-shomate");
    expect(time / ((heat - number("HEAT", "N2", 100, 300, 900) + nitrogen) / 1000)).toBeCloseTo(1, 10);
  });

  test("a transition of a set is a halt: quartz at 847 K", () => {
    const at = (time: number) => number("VESSEL.WARMTEMP", "1 kg SiO2(cr,quartz)", 1000, 0, 300, 800, time, undefined, "srd69-shomate");
    const halt = number("VESSEL.WARMUP", "1 kg SiO2(cr,quartz)", 1000, 0, 300, 800, 847, "srd69-shomate");
    const step = number("HEAT", "SiO2(cr,quartz)", "1 kg", 847, 847 + 1e-9, undefined, "srd69-shomate") / 1000;
    expect(step).toBeGreaterThan(1);
    expect([at(halt + 0.2 * step), at(halt + 0.8 * step)]).toEqual([847, 847]);
    expect(at(halt + step + 1)).toBeGreaterThan(847);
  });

  test("broadcast: a column of times is a warm-up curve that rises to T_max", () => {
    const times = Array.from({ length: 20 }, (_, hour) => [3600 * hour]);
    const curve = call("VESSEL.WARMTEMP", "60 kg carbon steel + 3 kg N2", "1 kW", 4, "25 °C", "25 °C", times, "°C").map(
      ([t]) => t as number,
    );
    expect(curve[0]).toBe(25);
    for (const [index, value] of curve.entries()) if (index > 0) expect(value).toBeGreaterThan(curve[index - 1]!);
    expect(curve[19]).toBeGreaterThan(270);
    expect(curve[19]).toBeLessThan(275);
    const spread = call("VESSEL.WARMUP", [["30 kJ/K"], [15_000]], [[500], [250]], 0, 300, 300, 400);
    expect(spread).toEqual([[6000], [6000]]);
  });

  test("round trip for any vessel of steel", () =>
    fc.assert(
      fc.property(
        fc.double({ min: 200, max: 20_000, noNaN: true }),
        fc.double({ min: 0, max: 15, noNaN: true }),
        fc.double({ min: 0.01, max: 0.99, noNaN: true }),
        (power, loss, share) => {
          const to = 298.15 + share * Math.min(1100, loss > 0 ? power / loss : 1100);
          const time = number("VESSEL.WARMUP", "60 kg carbon steel", power, loss, 298.15, 298.15, to);
          const back = number("VESSEL.WARMTEMP", "60 kg carbon steel", power, loss, 298.15, 298.15, time);
          expect(Math.abs(back / to - 1)).toBeLessThan(1e-9);
        },
      ),
    ));

  test("refusals", () => {
    expect(refusal("VESSEL.WARMUP", "30 kJ/K", 500, 2, "25 °C", "25 °C", "300 °C")).toBe(
      "#VALUE! Temperature to 573.15 K is not reached from 298.15 K: with 500 W, and a loss of 2 W/K to 298.15 K, the temperature tends to T_max = 548.15 K",
    );
    expect(refusal("VESSEL.WARMUP", "60 kg carbon stel", 500, 2, 298, 298, 400)).toMatch(
      /^#N\/A "carbon stel" is neither a wall material nor a species of the library; nearest: carbon steel/,
    );
    expect(refusal("VESSEL.WARMUP", "30 kJ/K", "500 J", 2, 298, 298, 400)).toBe(
      '#VALUE! Power "500 J" is an energy; a power such as W is expected',
    );
    expect(refusal("VESSEL.WARMTEMP", "60 kg carbon steel", "10 kW", 2, "25 °C", "25 °C", "2 h")).toBe(
      "#VALUE! Time 7200 s is too long: after 5685.39 s the temperature reaches 1473.15 K, the upper limit of en-1993-1-2 for carbon steel (structural)",
    );
    expect(refusal("VESSEL.WARMTEMP", 1000, 10, 2, 298, 298, undefined)).toBe(
      '#VALUE! Time is missing: give a number in s, or a text such as "90 min"',
    );
    expect(refusal("VESSEL.WARMTEMP", 1000, 10, 2, 298, 298, 60, "kg")).toContain('The unit "kg" does not fit this result');
  });
});

describe("VESSEL.PHI", () => {
  test("50 L of air at 25 °C and 1 atm in 60 kg of steel at 0.46 kJ/(kg K): about 650, computed apart from this program", () => {
    const moles = (101325 * 0.05) / (8.31446261815324 * 298.15);
    const phi = number("VESSEL.PHI", `${moles} mol air`, "60 kg at 0.46 kJ/(kg K)");
    expect(phi).toBeCloseTo(1 + 27_600 / (moles * number("CV.AT", "air", 298.15)), 8);
    expect(Math.abs(phi - 650)).toBeLessThan(5);
  });

  test("at a temperature, and over a column of walls", () => {
    expect(number("VESSEL.PHI", "1 kJ/K", "60 kg carbon steel", "100 °C")).toBeCloseTo(1 + 0.06 * (425 + 77.3 - 16.9 + 2.22), 9);
    expect(call("VESSEL.PHI", 1000, [[0], [500], ["1 kJ/K"]])).toEqual([[1], [1.5], [2]]);
  });

  test("refusals", () => {
    expect(refusal("VESSEL.PHI", 1000, undefined)).toBe(
      '#VALUE! The wall is missing: give a text such as "60 kg carbon steel", or a number in J/K',
    );
    expect(refusal("VESSEL.PHI", 0, 5)).toBe("#VALUE! The contents of 0 J/K are not above 0 J/K");
    expect(refusal("VESSEL.PHI", 1000, "60 kg carbon steel", 200)).toBe(
      '#VALUE! Temperature 200 K is below 223.15 K, the lower limit of the capacity held below 293.15 K of en-1993-1-2 for carbon steel (structural); for degrees Celsius write "200 °C"',
    );
  });
});

describe("VESSEL.MTSR", () => {
  test("60 °C, 120 K, 30 % accumulated: 96 °C; a rise in °C is a difference", () => {
    expect(number("VESSEL.MTSR", "60 °C", 120, 0.3)).toBeCloseTo(369.15, 9);
    for (const rise of ["120 K", "120 °C", "216 °F"]) expect(number("VESSEL.MTSR", "60 °C", rise, "30 %")).toBeCloseTo(369.15, 9);
    expect(number("VESSEL.MTSR", "60 °C", 100, undefined, 1.2)).toBeCloseTo(453.15, 9);
    expect(call("VESSEL.MTSR", 300, 100, [[0.25], [0.5], [1]])).toEqual([[325], [350], [400]]);
    // older Excel sends 0 for a blank cell: it must not mean that nothing accumulated
    expect(refusal("VESSEL.MTSR", 300, 100, 0)).toBe(
      "#VALUE! Accumulation 0 is no accumulation, or a blank cell: leave the argument out for all of it, or give a share above 0",
    );
  });

  test("refusals", () => {
    expect(refusal("VESSEL.MTSR", "60 °C", 120, 30)).toBe("#VALUE! Accumulation 30 is not between 0 and 1");
    expect(refusal("VESSEL.MTSR", "60 °C", 120, 1, 0.5)).toBe("#VALUE! Thermal inertia phi 0.5 is below 1, its value without a wall");
    expect(refusal("VESSEL.MTSR", "60 °C", -5)).toBe("#VALUE! Adiabatic rise -5 K is negative");
  });
});
