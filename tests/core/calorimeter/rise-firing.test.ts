/** A firing time that is too early or too late is named; a right one, at or between readings, is not. */
import { analyse } from "../../../src/core/calorimeter/rise/analysis";
import { gridOf } from "../../../src/core/calorimeter/rise/grid";
import { warningsOf } from "../../../src/core/calorimeter/rise/warnings";
import { study } from "./rise-coverage";
import { EXAMPLE, evenTimes, Generator, type Model, rounded, temperatureAt } from "./rise-model";

function analysed(fire: number, step: number, model: Model = EXAMPLE) {
  const times = evenTimes(step, 25);
  const temperatures = times.map((time) => rounded(temperatureAt(model, time)));
  return analyse(gridOf(times, times.length, fire, 15), temperatures, "dickinson");
}

test.each([
  { fire: 4, step: 0.5, quiet: 1 },
  { fire: 4, step: 1, quiet: 1 },
  { fire: 4.4, step: 0.1, quiet: 0.6 },
  { fire: 3.5, step: 0.1, quiet: 1.5 },
])("fired at 5 min, given $fire min, a reading every $step min", ({ fire, step, quiet }) => {
  const run = analysed(fire, step);
  expect(run.quiet).toBeCloseTo(quiet, 9);
  expect(warningsOf(run)).toContain(`Nothing rises in the first ${quiet} min after firing: check the firing time`);
  // The release is measured from where it begins: without that e^(−11/1.9), 0.3 % of the rise, would seem to be missing.
  expect(run.uncertainty.unfinished).toBeLessThan(0.0003);
  expect(warningsOf(run).filter((text) => text.includes("too short"))).toEqual([]);
});

test.each([
  { fire: 5.9, step: 1, hidden: "0.9" },
  { fire: 5.4, step: 0.5, hidden: "0.4" },
  { fire: 5.25, step: 0.5, hidden: "0.25" },
])("fired at 5 min, given $fire min, the next reading at the end of that interval", ({ fire, step, hidden }) => {
  expect(warningsOf(analysed(fire, step))).toContain(
    `The first step after firing is too steep: carried back, the readings that follow let the rise begin ${hidden} min before firing; check the firing time`,
  );
});

test("a right firing time is not doubted", () => {
  for (const step of [0.1, 0.25, 0.5, 1])
    for (const fire of [5, 5.05, 5.3, 5.45, 5.9])
      for (const release of [0.4, 0.9, 1.2]) {
        const { quiet, hidden } = analysed(fire, step, { ...EXAMPLE, fire, release });
        expect([fire, step, quiet, hidden]).toEqual([fire, step, 0, 0]);
      }
  const { analysed: runs } = study(new Generator(20260), 1000, "regnault-pfaundler", true);
  expect(runs.filter(({ run }) => run.quiet > 0 || run.hidden > 0)).toEqual([]);
});

test("a lag of a few readings before half a minute is the calorimeter's own", () => {
  expect(analysed(4.7, 0.1).quiet).toBe(0);
  expect(analysed(4.5, 0.1).quiet).toBeCloseTo(0.5, 9);
});
