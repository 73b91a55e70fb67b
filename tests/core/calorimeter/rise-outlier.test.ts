/** Grubbs' test on the readings of a line: held against the line without the suspect reading, and against its own level. */
import { outlierOf } from "../../../src/core/calorimeter/rise/outlier";
import { straightLine } from "../../../src/core/statistics/line";
import { evenTimes, Generator } from "./rise-model";

function tested(times: Float64Array, temperatures: Float64Array, negligible = 0) {
  const line = straightLine(Array.from(times), Array.from(temperatures));
  return outlierOf(times, temperatures, [0, times.length - 1], line, negligible);
}

test.each([0, 1, 5, 10])("the statistic is the distance from the line without reading %d, in its own standard deviations", (at) => {
  const random = new Generator(2);
  const times = evenTimes(1, 10);
  const temperatures = times.map((time, k) => 22 + 0.005 * time + 0.0005 * random.normal() + (k === at ? 0.02 : 0));
  const found = tested(times, temperatures)!;
  expect(found.index).toBe(at);
  const others = Array.from(times, (_, k) => k).filter((k) => k !== at);
  const line = straightLine(
    others.map((k) => times[k]!),
    others.map((k) => temperatures[k]!),
  );
  const mean = others.reduce((sum, k) => sum + times[k]!, 0) / others.length;
  const spread = others.reduce((sum, k) => sum + (times[k]! - mean) ** 2, 0);
  const distance = temperatures[at]! - line.intercept - line.slope * times[at]!;
  const deleted = distance / (line.residual * Math.sqrt(1 + 1 / others.length + (times[at]! - mean) ** 2 / spread));
  // r² = (n − 2) t²/(n − 3 + t²), n = 11
  expect(found.statistic).toBeCloseTo(Math.sqrt((9 * deleted ** 2) / (8 + deleted ** 2)), 9);
});

test("critical values: t of 8 degrees of freedom at 1 %/22 for 11 readings", () => {
  const times = evenTimes(1, 10);
  const temperatures = times.map((time) => 0.001 * Math.cos(3 * time) + (time === 4 ? 1 : 0));
  // t(8; 0.99954545) = 5.1183, from Simpson integrals of the density: √(9 · 5.1183²/(8 + 5.1183²)) = 2.62575
  expect(tested(times, temperatures)!.critical).toBeCloseTo(2.62575, 5);
});

test("among runs that have none, one in a hundred is called one", () => {
  const random = new Generator(4);
  const times = evenTimes(1, 9);
  const runs = 4000;
  const called = Array.from({ length: runs }, () =>
    tested(
      times,
      times.map(() => random.normal()),
    ),
  ).filter((found) => found !== undefined);
  // 40 expected; three standard deviations of a count are 19
  expect(called.length).toBeGreaterThan(21);
  expect(called.length).toBeLessThan(59);
});

test("none among three readings, on a perfect line, or of a size that does not matter", () => {
  const three = Float64Array.of(0, 1, 2);
  expect(tested(three, Float64Array.of(20, 21, 20))).toBeUndefined();
  const times = evenTimes(1, 8);
  expect(
    tested(
      times,
      times.map((time) => 20 + time),
    ),
  ).toBeUndefined();
  const slipped = times.map((time) => 20 + 0.0001 * Math.cos(5 * time) + (time === 3 ? 0.01 : 0));
  expect(tested(times, slipped)?.index).toBe(3);
  expect(tested(times, slipped, 0.02)).toBeUndefined();
});
