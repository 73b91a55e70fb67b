/** The end of the main period where none is given, the 63 % time and the resolution it rests on. */
import fc from "fast-check";
import { endOf } from "../../../src/core/calorimeter/rise/end";
import { resolutionOf } from "../../../src/core/calorimeter/rise/resolution";
import { responseTime } from "../../../src/core/calorimeter/rise/response";
import { refusedWith } from "../refused";
import { EXAMPLE, evenTimes, Generator, rounded, temperatureAt } from "./rise-model";

function found(step: number, last: number, release = 0.9, noise = 0): number {
  const random = new Generator(1);
  const times = evenTimes(step, last);
  const temperatures = times.map((time) => rounded(temperatureAt({ ...EXAMPLE, release }, time) + noise * random.normal()));
  return endOf(times, temperatures, times.length, 5);
}

test("the printed run: ten times 0.904 min after firing, at the next reading", () => {
  expect(found(1, 25)).toBe(15);
  expect(found(0.5, 25)).toBe(14.5);
  expect(found(0.1, 25)).toBeCloseTo(14.1, 12);
});

test("the end does not depend on how long the record is, nor on noise of a millikelvin", () => {
  for (const last of [20, 22, 30, 40]) expect(found(1, last)).toBe(15);
  for (const noise of [0.0002, 0.0005, 0.001]) expect(found(0.5, 25, 0.9, noise)).toBe(14.5);
});

test("noise above the 0.0005 K/min is weighed by its own uncertainty: 2 mK at one minute", () => {
  // The slopes of two halves of six readings then differ by 0.7 mK/min, more than 0.5 mK/min in half of all runs.
  const random = new Generator(9);
  const times = evenTimes(1, 25);
  const ends = Array.from({ length: 200 }, () =>
    endOf(
      times,
      times.map((time) => rounded(temperatureAt(EXAMPLE, time) + 0.002 * random.normal())),
      times.length,
      5,
    ),
  );
  expect(ends.filter((end) => end === 15).length).toBeGreaterThan(170);
});

test("a slower release ends later", () => {
  fc.assert(
    fc.property(fc.double({ min: 0.4, max: 1.2, noNaN: true }), (release) => {
      const end = found(0.25, 30, release);
      expect(end).toBeGreaterThanOrEqual(5 + 10 * release);
      // 0.6 %: the drift during the release; 0.25 min: the next reading
      expect(end).toBeLessThanOrEqual(5 + 10 * release * 1.02 + 0.25);
    }),
  );
});

test("a drift that settles late pushes the end behind it", () => {
  const times = evenTimes(1, 40);
  // After the usual run the drift changes by 0.004 K/min at 22 min.
  const bent = times.map((time) => rounded(temperatureAt(EXAMPLE, time) - 0.004 * Math.max(0, time - 22)));
  expect(endOf(times, bent, times.length, 5)).toBeGreaterThanOrEqual(21);
});

test("refused with the cure", () => {
  expect(refusedWith(() => found(1, 18))).toBe(
    // By hand: (25.1428 − 24.3096)/(25.1428 − 22.6289) = 0.33144 is left after 1 min, so τ63 = 1/−ln 0.33144 = 0.9055 min
    "input: No end of the main period is found: no reading from 14.06 min on lies behind the last of the heat and is followed by a steady drift " +
      "of at least 5 readings over 5 min to the end of the record; record longer, or give the end",
  );
  const times = evenTimes(1, 20);
  expect(
    refusedWith(() =>
      endOf(
        times,
        times.map(() => 25),
        times.length,
        5,
      ),
    ),
  ).toBe("input: The temperature does not rise after firing: check the firing time and the order of the columns");
  expect(refusedWith(() => endOf(times, times, times.length, 30))).toBe("range: Firing time 30 min is outside the record, 0 min to 20 min");
  expect(refusedWith(() => endOf(times, times, times.length, 1))).toContain("holds 2 readings; at least 3 are needed");
  // A drift that never steadies.
  const curved = times.map((time) => (time <= 5 ? 22 : 24 + 0.01 * (time - 5) ** 2));
  expect(refusedWith(() => endOf(times, curved, times.length, 5))).toContain("No end of the main period is found");
});

test("the 63 % time of an exponential is exact however coarse the readings are", () => {
  for (const step of [0.1, 0.5, 1, 2]) {
    const times = evenTimes(step, 20);
    const temperatures = times.map((time) => 20 + 2 * (1 - Math.exp(-time / 0.9)));
    expect(responseTime(times, temperatures, [1, times.length - 1], 0, [20, 22])).toBeCloseTo(0.9, 9);
  }
});

test("the 63 % time where the top is reached at once, and where the way is not done", () => {
  const [times, temperatures] = [Float64Array.of(0, 1, 2), Float64Array.of(20, 22, 22)];
  expect(responseTime(times, temperatures, [1, 2], 0, [20, 22])).toBeCloseTo(1 - Math.exp(-1), 12);
  expect(responseTime(times, temperatures, [1, 2], 0, [20, 30])).toBeUndefined();
});

test.each([
  { readings: [22.6, 22.6058, 25.1001], step: 0.0001 },
  { readings: [22.6, 25.1, 25.3], step: 0.1 },
  { readings: [22, 25, 27], step: 1 },
  { readings: [22.002, 22.004, 25.018], step: 0.002 },
  { readings: [22.05, 22.15, 25], step: 0.05 },
  { readings: [22.600001, 25.123456], step: 0.000001 },
  { readings: [22.6, 25.12345678], step: 0 },
])("readings $readings stand to $step", ({ readings, step }) => {
  expect(resolutionOf(Float64Array.from(readings), readings.length)).toBe(step);
});

test("the resolution survives a change from kelvins", () => {
  const kelvins = [295.7512, 295.757, 298.2899];
  expect(
    resolutionOf(
      Float64Array.from(kelvins, (each) => each - 273.15),
      3,
    ),
  ).toBe(0.0001);
});

describe("what remains behind the end", () => {
  /** The printed run, of which a share comes with a slow time constant. */
  const withSlow = (share: number, slow: number, last: number, noise = 0) => {
    const random = new Generator(3);
    const times = evenTimes(0.1, last);
    const at = (time: number) => (1 - share) * temperatureAt(EXAMPLE, time) + share * temperatureAt({ ...EXAMPLE, release: slow }, time);
    return { times, temperatures: times.map((time) => rounded(at(time) + noise * random.normal())) };
  };

  test("five minutes, however fast the readings are", () => {
    // Found at 14.1 min in a longer record.
    expect(found(0.1, 19.2)).toBeCloseTo(14.1, 12);
    expect(refusedWith(() => found(0.1, 19))).toContain("at least 5 readings over 5 min to the end of the record; record longer");
    for (const noise of [0.0002, 0.001]) expect(found(0.1, 19.3, 0.9, noise)).toBeLessThanOrEqual(14.3);
  });

  test.each([
    { share: 0.02, slow: 10, noise: 0 },
    { share: 0.02, slow: 10, noise: 0.0003 },
    { share: 0.005, slow: 8, noise: 0 },
    { share: 0.01, slow: 8, noise: 0 },
    { share: 0.01, slow: 8, noise: 0.0001 },
  ])("no end is found while $share of the heat comes with $slow min, noise $noise K; a longer record has one", ({ share, slow, noise }) => {
    const { times, temperatures } = withSlow(share, slow, 30, noise);
    expect(refusedWith(() => endOf(times, temperatures, times.length, 5))).toContain("No end of the main period is found");
    const longer = withSlow(share, slow, 90, noise);
    const end = endOf(longer.times, longer.temperatures, longer.times.length, 5);
    // By then less than twice the 0.01 % is to come.
    expect(share * Math.exp((5 - end) / slow)).toBeLessThan(0.0002);
  });

  test("a firing time that is too early is named", () => {
    const times = evenTimes(0.5, 24);
    const temperatures = times.map((time) => rounded(temperatureAt(EXAMPLE, time)));
    expect(refusedWith(() => endOf(times, temperatures, times.length, 4))).toMatch(
      /to the end of the record; nothing rises in the first 1 min after firing: check the firing time$/,
    );
  });
});
