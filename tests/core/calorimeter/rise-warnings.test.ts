/** Every warning of a run by a run that earns it, whole; and none for good runs, quiet or noisy. */
import { analyse } from "../../../src/core/calorimeter/rise/analysis";
import { gridOf } from "../../../src/core/calorimeter/rise/grid";
import type { Method } from "../../../src/core/calorimeter/rise/methods";
import { warningsOf } from "../../../src/core/calorimeter/rise/warnings";
import { study } from "./rise-coverage";
import { adiabaticAt, EXAMPLE, evenTimes, Generator, type Model, rounded, temperatureAt } from "./rise-model";

interface Run {
  readonly model?: Partial<Model>;
  readonly step?: number;
  readonly last?: number;
  readonly end?: number;
  readonly method?: Method;
  /** What happens to each reading. */
  readonly change?: (temperature: number, time: number) => number;
}

function warned({ model, step = 0.5, last = 25, end = 15, method = "regnault-pfaundler", change = rounded }: Run): readonly string[] {
  const whole = { ...EXAMPLE, ...model };
  const times = evenTimes(step, last);
  const temperatures = times.map((time) => change(temperatureAt(whole, time), time));
  return warningsOf(analyse(gridOf(times, times.length, whole.fire, end), temperatures, method));
}

test("a good run has none", () => {
  for (const step of [0.5, 0.25, 0.1]) expect(warned({ step })).toEqual([]);
  for (const method of ["dickinson", "dickinson-63"] as const) expect(warned({ step: 1, method })).toEqual([]);
});

test("noise of up to 1 mK cries wolf about the drifts or a reading in few good runs", () => {
  const { analysed } = study(new Generator(20260), 1000, "regnault-pfaundler", true);
  const about = (words: RegExp) => analysed.filter(({ run }) => warningsOf(run).some((text) => words.test(text))).length;
  // Both tests are made at 1 % for each of two periods.
  expect(about(/is not steady/)).toBeLessThanOrEqual(20);
  expect(about(/outlier/)).toBeLessThanOrEqual(30);
  expect(about(/scatter/)).toBe(0);
  // Half of the drawn main periods last but ten to twelve releases.
  expect(about(/still to come/)).toBeLessThanOrEqual(15);
});

test("one-minute readings: the trapezoid of the first interval", () => {
  // (I_h − I_2h)/3 × G of the printed readings: 0.00042 K of 2.49951 K
  expect(warned({ step: 1 })).toEqual([
    "The first interval after firing lasts 1 min, more than 0.5 min, and the trapezoids may be off by 0.017 % of the rise: " +
      "read every 30 s or faster, or see the refined value",
  ]);
});

test("few readings and short periods", () => {
  expect(warned({ step: 1, method: "dickinson", model: { fire: 3 }, end: 13, last: 16 })).toEqual([
    "The fore-period holds 4 readings, fewer than 5",
    "The fore-period lasts 3 min, less than 5 min",
    "The after-period holds 4 readings, fewer than 5",
    "The after-period lasts 3 min, less than 5 min",
  ]);
});

test("a main period that is too short", () => {
  expect(warned({ end: 11 })).toContain(
    "The main period is too short: by its 63 % time of 0.9 min, at least about 0.15 % of the rise was still to come at its end, more than 0.02 %; end it later",
  );
  expect(warned({ model: { release: 0.35 }, end: 9, step: 0.1 })).toEqual(["The main period lasts 4 min, less than 5 min"]);
});

test("ten times the 63 % time by a hair is no fault: what is left decides, and is printed above its limit", () => {
  expect(warned({ model: { release: 1 }, last: 35 })).toEqual([]);
  const [found] = warned({ model: { release: 1.2 }, last: 35 }).filter((text) => text.startsWith("The main period is too short"));
  expect(Number(/at least about ([\d.]+) %/.exec(found!)![1])).toBeGreaterThan(0.02);
  // Each run near the limit prints more than the limit or nothing.
  for (let release = 1.08; release < 1.2; release += 0.002)
    for (const text of warned({ model: { release }, last: 35 }).filter((each) => each.includes("still to come")))
      expect([text, Number(/about ([\d.]+) %/.exec(text)![1]) > 0.02]).toEqual([text, true]);
});

test("heat that comes after the end is not called an outlier", () => {
  const found = warned({ model: { release: 1.2 }, last: 35 });
  expect(found[0]).toMatch(
    /^The reading 25\.14\d+ in row 31 of the readings lies 0\.0005\d* K below the line of the after-period: heat still came at the end of the main period: give a later end$/,
  );
  expect(found.filter((text) => text.includes("outlier"))).toEqual([]);
  // Above the line, or below it later on, it remains one.
  const slip = (by: number, at: number) => (temperature: number, time: number) => rounded(temperature + (time === at ? by : 0));
  expect(warned({ change: slip(0.01, 15) }).filter((text) => text.includes("row 31"))[0]).toContain(
    "above the line of the after-period: an outlier",
  );
  expect(warned({ change: slip(-0.01, 20) }).filter((text) => text.includes("row 41"))[0]).toContain(
    "below the line of the after-period: an outlier",
  );
});

test("no readings in the main period", () => {
  const times = Float64Array.of(0, 1, 2, 3, 4, 5, 15, 16, 17, 18, 19, 20);
  const temperatures = times.map((time) => rounded(adiabaticAt(EXAMPLE, 0.0002, time)));
  const { uncertainty, response, split, comparison, ...run } = analyse(gridOf(times, 12, 5, 15), temperatures, "adiabatic");
  expect([response, split, comparison.regnaultPfaundler, comparison.dickinson]).toEqual([undefined, undefined, undefined, undefined]);
  expect(uncertainty.unfinished).toBe(0);
  expect(warningsOf({ uncertainty, response, split, comparison, ...run })).toEqual([
    "The main period holds no readings: whether heat still came at its end is not known",
  ]);
});

test("drifts that are not steady, and scatter", () => {
  const bent = (temperature: number, time: number) => rounded(temperature - (time > 20 ? 0.003 * (time - 20) : 0));
  expect(warned({ change: bent })[0]).toMatch(
    /^The drift after the main period is not steady: its second half is 0\.003 K\/min below its first, more than 0\.0005 K\/min$/,
  );
  const random = new Generator(5);
  const rough = (temperature: number) => rounded(temperature + 0.005 * random.normal());
  const found = warned({ change: rough });
  expect(found.filter((text) => text.includes("scatter"))).toHaveLength(2);
  expect(found[0]).toMatch(/^Readings before firing scatter by 0\.00\d+ K about their line, more than 0\.002 K$/);
});

test("an outlying reading, with its row", () => {
  const slip = (temperature: number, time: number) => rounded(temperature + (time === 20 ? 0.01 : 0));
  expect(warned({ change: slip }).filter((text) => text.includes("Grubbs"))).toEqual([
    // 21 readings about the line: r can be √19 = 4.36 at most; t(18, 1 %/42) = 4.25, √(19 · 4.25²/(18 + 4.25²)) = 3.09
    "The reading 25.1542 in row 41 of the readings lies 0.0095 K above the line of the after-period: an outlier by Grubbs' test at 1 % (4.36, critical 3.09)",
  ]);
});

test("coarse readings", () => {
  const coarse = (temperature: number) => Math.round(temperature * 10) / 10;
  expect(warned({ model: { rise: 2.1 }, change: coarse })).toContain(
    "Readings to 0.1 K: resolution alone is ±5 % of the rise, more than 0.05 %",
  );
  // 0.001 K of 2.5 K is 0.04 %, of 1.9 K it is 0.053 %
  const milli = (temperature: number) => Math.round(temperature * 1000) / 1000;
  expect(warned({ change: milli })).toEqual([]);
  expect(warned({ change: milli, model: { rise: 1.9 } })).toEqual([
    "Readings to 0.001 K: resolution alone is ±0.05 % of the rise, more than 0.05 %",
  ]);
});

test("temperatures in another unit, and far from the room", () => {
  expect(warned({ change: (each) => rounded(each + 273.15) })).toEqual([
    "Temperatures from 295.75 °C to 298.298 °C are outside 5 °C to 50 °C: they look like kelvins; the rise is the same",
  ]);
  expect(warned({ change: (each) => rounded(1.8 * each + 32) })[0]).toBe(
    "Temperatures from 72.68 °C to 77.2659 °C are outside 5 °C to 50 °C: if they are degrees Fahrenheit, the rise is 1.8 times too large",
  );
});

test("an unusual rise", () => {
  expect(warned({ model: { rise: 1.2 } })).toEqual(["The rise of 1.2 K is below the usual 1.5 K to 3.5 K"]);
  expect(warned({ model: { rise: 4 } })[0]).toBe("The rise of 4 K is above the usual 1.5 K to 3.5 K");
});

test("a slow release under large drifts: the methods disagree", () => {
  expect(warned({ model: { release: 3, constant: 0.006 }, end: 40, last: 55 })).toEqual([
    "Regnault-Pfaundler and Dickinson differ by 0.36 %, more than 0.1 %: check the firing time and the periods",
  ]);
});

test("a cooling constant that cannot be", () => {
  const warming = (temperature: number, time: number) => rounded(temperature + (time > 15 ? 0.008 * (time - 15) : 0));
  expect(warned({ change: warming }).filter((text) => text.includes("cooling constant"))).toEqual([
    "The cooling constant is -0.0011 per min, not above 0: the drift after is not below the drift before",
  ]);
});

test("adiabatic: a jacket that did not follow", () => {
  const times = evenTimes(0.5, 25);
  const temperatures = times.map((time) => rounded(adiabaticAt(EXAMPLE, 0.0002, time) + (time > 15 ? 0.001 * (time - 15) : 0)));
  const grid = gridOf(times, times.length, 5, 15);
  expect(warningsOf(analyse(grid, temperatures, "adiabatic"))).toEqual([
    "The drifts before and after differ by 0.001 K/min, more than 0.0005 K/min: the jacket did not follow",
  ]);
  const following = times.map((time) => rounded(adiabaticAt(EXAMPLE, 0.0002, time)));
  expect(warningsOf(analyse(grid, following, "adiabatic"))).toEqual([]);
});
