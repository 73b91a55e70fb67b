/**
 * Corrected rise. Printed values: the one-minute readings below and the results for 1, 0.5 and 0.1 min were computed independently from
 * the model of rise-model.ts (true rise 2.5 K); all digits belong to readings rounded to four decimals.
 */
import fc from "fast-check";
import { analyse } from "../../../src/core/calorimeter/rise/analysis";
import { driftsOf } from "../../../src/core/calorimeter/rise/drifts";
import { gridOf } from "../../../src/core/calorimeter/rise/grid";
import { type Method, methodOf, METHODS } from "../../../src/core/calorimeter/rise/methods";
import { requireAscending, requireNoMistyped } from "../../../src/core/calorimeter/rise/readings";
import { correctedRise } from "../../../src/core/calorimeter/rise/rise";
import { refusedWith } from "../refused";
import { adiabaticAt, EXAMPLE, evenTimes, rounded, temperatureAt } from "./rise-model";

// prettier-ignore
const PRINTED = [
  22.6, 22.6058, 22.6116, 22.6173, 22.6231, 22.6289, 24.3096, 24.8634, 25.0462, 25.1069, 25.1273, 25.1345, 25.1374, 25.1388, 25.1398, 25.1406,
  25.1413, 25.1421, 25.1428, 25.1435, 25.1442, 25.1449, 25.1456, 25.1463, 25.147, 25.1477,
];

function readings(step: number): { times: Float64Array; temperatures: Float64Array } {
  const times = evenTimes(step, 25);
  return { times, temperatures: times.map((time) => rounded(temperatureAt(EXAMPLE, time))) };
}

function analysed(step: number, method: Method = "regnault-pfaundler") {
  const { times, temperatures } = readings(step);
  return analyse(gridOf(times, times.length, 5, 15), temperatures, method);
}

function riseOf(times: ArrayLike<number>, temperatures: ArrayLike<number>, method: Method, fire = 5, end = 15): number {
  return correctedRise(gridOf(Float64Array.from(times), times.length, fire, end), Float64Array.from(temperatures), method);
}

test("the model gives the printed one-minute readings", () => {
  expect([...readings(1).temperatures]).toEqual(PRINTED);
});

// Half a unit of the last printed digit.
test.each([
  {
    step: 1,
    before: 0.0057743,
    after: 0.0007082,
    meanBefore: 22.61445,
    meanAfter: 25.14418,
    meanMain: 24.88887,
    G: 0.0020026,
    limit: 25.4978,
  },
  {
    step: 0.5,
    before: 0.005773,
    after: 0.000711,
    meanBefore: 22.61446,
    meanAfter: 25.14419,
    meanMain: 24.90583,
    G: 0.002001,
    limit: 25.4996,
  },
  { step: 0.1, before: 0.005772, after: 0.000713, meanBefore: 22.61445, meanAfter: 25.14419, meanMain: 24.91137, G: 0.002, limit: 25.5008 },
])("drifts and means of the printed run every $step min", ({ step, before, after, meanBefore, meanAfter, meanMain, G, limit }) => {
  const { drifts, constant, convergence, raw } = analysed(step);
  const rateDigits = step === 1 ? 7 : 6;
  expect(drifts.before).toBeCloseTo(before, rateDigits);
  expect(drifts.after).toBeCloseTo(after, rateDigits);
  expect(constant).toBeCloseTo(G, rateDigits);
  // t_mi at 0.5 min is 22.6144545: the printed 22.61446 is one unit high in the last digit.
  expect(Math.abs(drifts.meanBefore - meanBefore)).toBeLessThan(1e-5);
  expect(drifts.meanAfter).toBeCloseTo(meanAfter, 5);
  expect(Math.abs(drifts.meanMain - meanMain)).toBeLessThan(5.1e-6);
  expect(convergence).toBeCloseTo(limit, 4);
  expect(raw).toBeCloseTo(2.5117, 4);
});

test.each([
  { step: 1, rise: 2.49951, refined: 2.49988, d60: 2.50008, at60: 5.8967, d63: 2.49985, at63: 5.9415, mean: 2.47929 },
  { step: 0.5, rise: 2.49982, refined: 2.49994, d60: 2.50024, at60: 5.8583, d63: 2.49993, at63: 5.9198, mean: 2.47928 },
  { step: 0.1, rise: 2.49991, refined: 2.49992, d60: 2.50037, at60: 5.8292, d63: 2.50002, at63: 5.8987, mean: 2.47927 },
])("every method on the printed run every $step min", ({ step, rise, refined, d60, at60, d63, at63, mean }) => {
  const { comparison } = analysed(step);
  expect(comparison.regnaultPfaundler).toBeCloseTo(rise, 5);
  expect(comparison.refined).toBeCloseTo(refined, 5); // printed for 1 min only; the others follow from (t1 − t0)/9 by hand
  expect(comparison.dickinson).toBeCloseTo(d60, 5);
  expect(comparison.dickinson63).toBeCloseTo(d63, 5);
  expect(comparison.meanRate).toBeCloseTo(mean, 5);
  expect(5 + analysed(step, "dickinson").split!).toBeCloseTo(at60, 4);
  expect(5 + analysed(step, "dickinson-63").split!).toBeCloseTo(at63, 4);
});

test("each method gives its own number", () => {
  const { comparison } = analysed(1);
  expect(METHODS.map((method) => analysed(1, method).rise)).toEqual([
    comparison.regnaultPfaundler,
    comparison.dickinson,
    comparison.dickinson63,
    comparison.adiabatic,
  ]);
});

test("an adiabatic run with a common drift gives its rise exactly", () => {
  // After 12 min a release of 0.4 min has 2.3e-13 K to go.
  const times = evenTimes(0.5, 30);
  const model = { ...EXAMPLE, release: 0.4, fire: 6 };
  const temperatures = times.map((time) => adiabaticAt(model, 0.0004, time));
  expect(riseOf(times, temperatures, "adiabatic", 6, 18)).toBeCloseTo(2.5, 11);
});

test("two straight drifts and a step give the step between the lines where they meet", () => {
  // Before 20 + 0.01 τ, after 23 − 0.004 τ. Dickinson at 0.60 of the raw rise; one reading between at exactly that share.
  const times = [0, 1, 2, 3, 4, 5, 6, 7, 8];
  const raw = 22.976 - 20.03;
  const temperatures = [20, 20.01, 20.02, 20.03, 20.03 + 0.6 * raw, 22.98, 22.976, 22.972, 22.968];
  expect(riseOf(times, temperatures, "dickinson", 3, 6)).toBeCloseTo(23 - 0.004 * 4 - (20 + 0.01 * 4), 12);
});

test("where no reading stands at firing or at the end, the fitted lines give the temperatures", () => {
  const times = [0, 1, 2, 3, 4, 5, 6, 7, 8, 9];
  const temperatures = [20, 20.01, 20.02, 20.03, 22, 22.9, 22.976, 22.972, 22.968, 22.964];
  const drifts = driftsOf(gridOf(Float64Array.from(times), 10, 3.5, 5.5), Float64Array.from(temperatures));
  expect(drifts.start).toBeCloseTo(20.035, 12);
  expect(drifts.end).toBeCloseTo(22.978, 12);
  // Trapezoids (3.5, 20.035) (4, 22) (5, 22.9) (5.5, 22.978) over 2 min
  expect(drifts.meanMain).toBeCloseTo((0.25 * (20.035 + 22) + 0.5 * (22 + 22.9) + 0.25 * (22.9 + 22.978)) / 2, 12);
});

test("uneven readings: the mean of the main period is that of the broken line", () => {
  const { times, temperatures } = readings(1);
  fc.assert(
    fc.property(fc.integer({ min: 5, max: 14 }), fc.double({ min: 0.05, max: 0.95, noNaN: true }), (gap, share) => {
      const time = times[gap]! + share * (times[gap + 1]! - times[gap]!);
      const onChord = temperatures[gap]! + share * (temperatures[gap + 1]! - temperatures[gap]!);
      const [more, warmer] = [[...times, time].sort((a, b) => a - b), [...temperatures]];
      warmer.splice(gap + 1, 0, onChord);
      const before = driftsOf(gridOf(times, 26, 5, 15), temperatures);
      const after = driftsOf(gridOf(Float64Array.from(more), 27, 5, 15), Float64Array.from(warmer));
      expect(after.meanMain).toBeCloseTo(before.meanMain, 11);
      for (const method of METHODS) expect(riseOf(more, warmer, method)).toBeCloseTo(riseOf(times, temperatures, method), 11);
    }),
  );
});

test("shifting the clock or the scale of temperature leaves the rise alone", () => {
  const { times, temperatures } = readings(0.5);
  fc.assert(
    fc.property(
      fc.constantFrom(...METHODS),
      fc.double({ min: -1e5, max: 1e5, noNaN: true }),
      fc.double({ min: -10, max: 10, noNaN: true }),
      (method, later, warmer) => {
        const shifted = riseOf(
          times.map((time) => time + later),
          temperatures.map((each) => each + warmer),
          method,
          5 + later,
          15 + later,
        );
        // Times near 1e5 keep 1e-11 min.
        expect(shifted).toBeCloseTo(riseOf(times, temperatures, method), 9);
      },
    ),
  );
});

test("the rise is in proportion to the temperatures about the convergence temperature, and free of the unit of time", () => {
  const { times, temperatures } = readings(1);
  for (const method of METHODS) {
    const rise = riseOf(times, temperatures, method);
    const fahrenheit = temperatures.map((each) => 1.8 * each + 32);
    expect(riseOf(times, fahrenheit, method)).toBeCloseTo(1.8 * rise, 11);
    const seconds = times.map((time) => 60 * time);
    expect(riseOf(seconds, temperatures, method, 300, 900)).toBeCloseTo(rise, 11);
  }
});

test("a reading stands at firing although its time was added up from tenths", () => {
  let time = 0;
  const times = Float64Array.from({ length: 251 }, () => (time += 0.1) - 0.1);
  const temperatures = times.map((each) => rounded(temperatureAt(EXAMPLE, each)));
  expect([times[50], times[150]]).not.toEqual([5, 15]);
  const grid = gridOf(times, 251, 5, 15);
  expect([grid.lastFore, grid.firstAfter, grid.readAtFire, grid.readAtEnd]).toEqual([50, 150, true, true]);
  expect(correctedRise(grid, temperatures, "regnault-pfaundler")).toBeCloseTo(2.49991, 5);
});

test("names of methods", () => {
  expect(METHODS.map((method) => methodOf(` ${method.toUpperCase()} `))).toEqual([...METHODS]);
  expect(refusedWith(() => methodOf("graphical"))).toBe(
    'input: The method "graphical" is not one of regnault-pfaundler, dickinson, dickinson-63, adiabatic',
  );
});

describe("refused", () => {
  const { times, temperatures } = readings(1);
  const grid = (fire: number, end: number, record = times) => refusedWith(() => gridOf(record, record.length, fire, end));

  test("periods that the record does not hold", () => {
    expect(grid(30, 40)).toBe("range: Firing time 30 min is outside the record, 0 min to 25 min");
    expect(grid(-1, 15)).toBe("range: Firing time -1 min is outside the record, 0 min to 25 min");
    expect(grid(5, 26)).toBe("range: End of the main period 26 min is outside the record, 0 min to 25 min");
    expect(grid(5, 4)).toBe("range: End of the main period 4 min is not after firing at 5 min");
    expect(grid(5, 5)).toBe("range: End of the main period 5 min is not after firing at 5 min");
    expect(grid(1, 15)).toBe("range: The fore-period, up to firing at 1 min, holds 2 readings; at least 3 are needed");
    expect(grid(0.5, 15)).toBe("range: The fore-period, up to firing at 0.5 min, holds 1 reading; at least 3 are needed");
    expect(grid(5, 24)).toBe("range: The after-period, from 24 min on, holds 2 readings; at least 3 are needed");
    expect(grid(5, 15, new Float64Array(0))).toBe("input: There are no readings");
    expect(() => gridOf(times, 26, 2, 23)).not.toThrow();
  });

  test("times that do not ascend", () => {
    expect(refusedWith(() => requireAscending(Float64Array.of(0, 1, 2, 2, 3), 5))).toBe(
      "input: Time 2 min stands in row 3 and again in row 4 of the readings: every reading needs its own time",
    );
    expect(refusedWith(() => requireAscending(Float64Array.of(0, 1, 3, 2), 4))).toBe(
      "input: Time 2 min in row 4 of the readings comes after 3 min in row 3: times must ascend",
    );
    expect(() => requireAscending(Float64Array.of(0, 1, 2, 1), 3)).not.toThrow();
  });

  test("a mistyped reading, wherever it stands", () => {
    const slip = (at: number, value: number) => {
      const changed = Float64Array.from(temperatures);
      changed[at] = value;
      return refusedWith(() => requireNoMistyped(changed, 26));
    };
    expect(slip(8, 38.0462)).toBe(
      "input: Temperature 38.0462 in row 9 of the readings stands 12.9 K above both neighbours: check the reading",
    );
    expect(slip(20, 2.5144)).toBe(
      "input: Temperature 2.5144 in row 21 of the readings stands 22.6 K below both neighbours: check the reading",
    );
    expect(slip(0, 226)).toBe(
      "input: Temperature 226 in row 1 of the readings stands 203 K above the two readings next to it: check the reading",
    );
    expect(slip(25, 25.417)).toBe(
      "input: Temperature 25.417 in row 26 of the readings stands 0.27 K above the two readings next to it: check the reading",
    );
    expect(slip(5, 26.6289)).toBe(
      "input: Temperature 26.6289 in row 6 of the readings stands 2.32 K above both neighbours: check the reading",
    );
    // Every reading 6.4 % of the span off is seen, except where the run itself climbs.
    for (const at of [0, 1, 2, 3, 4, 10, 15, 24, 25])
      expect(slip(at, temperatures[at]! - 0.16)).toContain(`in row ${at + 1} of the readings stands`);
  });

  test("no good run and no coarse run counts as mistyped", () => {
    expect(() => requireNoMistyped(temperatures, 26)).not.toThrow();
    const coarse = temperatures.map((each, k) => Math.round(each * 10) / 10 + (k % 7 === 3 ? 0.3 : 0));
    expect(() => requireNoMistyped(coarse, 26)).not.toThrow();
  });

  test("a run without a rise", () => {
    const flat = temperatures.map(() => 25);
    expect(refusedWith(() => riseOf(times, flat, "dickinson"))).toBe(
      "range: The temperature does not rise after firing: it is 25 °C at firing and 25 °C at the end of the main period; " +
        "check the firing time and the order of the columns",
    );
    const endothermic = temperatures.map((each) => 50 - each);
    expect(refusedWith(() => riseOf(times, endothermic, "adiabatic"))).toContain("it is 27.3711 °C at firing and 24.8594 °C at the end");
    const sinking = times.map((time) => (time < 5 ? 30 - time : time < 15 ? 25 + (time - 5) / 10 : 26 - (time - 15) / 2));
    expect(refusedWith(() => riseOf(times, sinking, "adiabatic"))).toContain("its mean is 27.5 °C before and 23.5 °C after");
    const climbing = times.map((time) => 20 + 0.1 * time - (time >= 15 ? 0.05 : 0));
    expect(refusedWith(() => riseOf(times, climbing, "adiabatic"))).toBe(
      "range: The corrected rise is -0.05 K, not above 0 K: check the firing time and the drifts",
    );
  });

  test("a rise that reaches into a drift period", () => {
    expect(refusedWith(() => riseOf(times, temperatures, "regnault-pfaundler", 6, 16))).toBe(
      "input: Temperature changes by 1.68 K from row 6 to row 7 of the readings, before firing at 6 min: check the firing time",
    );
    expect(refusedWith(() => riseOf(times, temperatures, "dickinson", 5, 6))).toBe(
      "input: Temperature changes by 0.554 K from row 7 to row 8 of the readings, after the main period, which ends at 6 min: check its end",
    );
    // Coarse readings step by themselves.
    const coarse = temperatures.map((each) => Math.round(each * 2) / 2 + (each > 25.1425 ? 0.5 : 0));
    expect(() => riseOf(times, coarse, "dickinson")).not.toThrow();
  });

  test("a main period without readings, but by the adiabatic method", () => {
    const few = Float64Array.of(0, 1, 2, 3, 10, 11, 12);
    const climbed = Float64Array.of(20, 20.001, 20.002, 20.003, 22.51, 22.511, 22.512);
    expect(riseOf(few, climbed, "adiabatic", 3, 10)).toBeCloseTo(2.5, 12);
    for (const method of ["regnault-pfaundler", "dickinson", "dickinson-63"] as const) {
      expect(refusedWith(() => riseOf(few, climbed, method, 3, 10))).toBe(
        "input: The main period holds no reading between firing and its end",
      );
    }
  });
});
