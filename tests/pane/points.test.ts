import { capacityOf } from "../../src/core/capacity";
import type { Capacity } from "../../src/core/capacity/capacity";
import { allSpecies, recordsOf } from "../../src/data/library";
import {
  chartOf,
  coveredSpan,
  curveOf,
  differenceChart,
  quantityOf,
  readingsAt,
  tableTemperatures,
  type Source,
} from "../../src/pane/points";

const sourcesOf = (species: string): Source[] => recordsOf(species).map((record) => ({ set: record.set, capacity: capacityOf(record) }));

/** A capacity made by hand: Cv = level + slope T between its limits, with one joint where it steps by `step`. */
function handMade(from: number, to: number, level: number, slope: number, joint: number, step: number): Capacity {
  const cv = (temperature: number) => {
    if (!(temperature >= from && temperature <= to)) return NaN;
    return level + slope * temperature + (temperature < joint ? 0 : step);
  };
  return { ...capacityOf(recordsOf("N2")[0]!), phase: "g", from, to, joints: [joint], cv };
}

describe("the numbers of the chart", () => {
  test("N2 of the first choice at 298.15 K: Cp 29.124 J/(mol K) (NIST-JANAF, 4th ed.) less R, within its 0.01 %", () => {
    const [first] = readingsAt(sourcesOf("N2"), 298.15);
    expect(first?.value).toBeGreaterThan((29.124 - 8.314463) * 0.9999);
    expect(first?.value).toBeLessThan((29.124 - 8.314463) * 1.0001);
    expect(first?.differencePercent).toBeNull();
  });

  test("a curve covers its own range and nothing beside it, at the values of its set", () => {
    const [first] = sourcesOf("CO2");
    const curve = curveOf(first!, [0, 1e5]);
    expect(curve.temperatures[0]).toBe(first!.capacity.from);
    expect(curve.temperatures[curve.temperatures.length - 1]).toBe(first!.capacity.to);
    curve.temperatures.forEach((temperature, i) => expect(curve.values[i]).toBe(first!.capacity.cv(temperature)));
  });

  test("a window cuts the curve; one outside the window has no points", () => {
    const [first] = sourcesOf("CO2");
    const cut = curveOf(first!, [500, 800]);
    expect([cut.temperatures[0], cut.temperatures[cut.temperatures.length - 1]]).toEqual([500, 800]);
    expect(curveOf(first!, [1, 100]).values).toEqual([]);
  });

  test("a step at a joint is drawn as a step: both sides within a billionth of the joint", () => {
    const source = { set: "hand", capacity: handMade(200, 1000, 20, 0.01, 333, 5) };
    const { temperatures, values } = curveOf(source, [200, 1000]);
    const at = temperatures.findIndex((temperature) => temperature >= 333);
    expect(temperatures[at]! - temperatures[at - 1]!).toBeLessThan(1e-6);
    expect(values[at]! - values[at - 1]!).toBeCloseTo(5, 6);
  });

  test("readings by hand: difference in percent of the first, null outside the range", () => {
    const one = { set: "one", capacity: handMade(200, 1000, 20, 0, 300, 0) };
    const other = { set: "other", capacity: handMade(500, 2000, 21, 0, 600, 0) };
    expect(readingsAt([one, other], 700)).toEqual([
      { set: "one", from: 200, to: 1000, value: 20, differencePercent: null },
      { set: "other", from: 500, to: 2000, value: 21, differencePercent: expect.closeTo(5, 12) },
    ]);
    expect(readingsAt([one, other], 400)[1]).toMatchObject({ value: null, differencePercent: null });
    expect(readingsAt([one, other], 1500)[1]).toMatchObject({ value: 21, differencePercent: null });
    expect(readingsAt([one, other], NaN).map(({ value }) => value)).toEqual([null, null]);
  });

  test("differences by hand: the first is the line at zero, the other is drawn where both are valid", () => {
    const one = { set: "one", capacity: handMade(200, 1000, 20, 0, 300, 0) };
    const other = { set: "other", capacity: handMade(500, 2000, 20.5, 0, 600, 0) };
    const { axis, curves, values } = differenceChart([one, other], [200, 3000]);
    expect(axis).toBe("difference from one, %");
    expect(curves.map(({ temperatures }) => [temperatures[0], temperatures[temperatures.length - 1]])).toEqual([
      [200, 1000],
      [500, 1000],
    ]);
    expect(Math.max(...(curves[0]?.values.map(Math.abs) ?? [NaN]))).toBe(0);
    for (const value of curves[1]?.values ?? []) expect(value).toBeCloseTo(2.5, 12);
    expect(values).toEqual([0, 2.5]);
    const turned = differenceChart([other, one], [200, 3000]).curves;
    expect(turned.map(({ temperatures }) => [temperatures[0], temperatures[temperatures.length - 1]])).toEqual([
      [500, 2000],
      [500, 1000],
    ]);
  });

  test("the axis holds every curve and both limits", () => {
    const limits = [
      { label: "frozen", value: 3 },
      { label: "excited", value: 77 },
    ];
    const sources = sourcesOf("H2O");
    const chart = chartOf(sources, limits, coveredSpan(sources));
    expect(chart.values[0]).toBeLessThanOrEqual(3);
    expect(chart.values[1]).toBeGreaterThanOrEqual(77);
    for (const curve of chart.curves) {
      expect(Math.min(...curve.values)).toBeGreaterThanOrEqual(chart.values[0]);
      expect(Math.max(...curve.values)).toBeLessThanOrEqual(chart.values[1]);
    }
  });

  test("the axis is cut on request, but never to nothing", () => {
    const sources = sourcesOf("N2");
    const [low, high] = coveredSpan(sources);
    expect(coveredSpan(sources, 3000)).toEqual([low, 3000]);
    expect(coveredSpan(sources, low)).toEqual([low, high]);
    expect(coveredSpan(sources, 1e9)).toEqual([low, high]);
  });

  test("gases are drawn as Cv, condensed species as Cp", () => {
    expect(quantityOf(sourcesOf("N2"))).toBe("Cv");
    const water = sourcesOf("H2O(l)");
    expect(quantityOf(water)).toBe("Cp");
    expect(readingsAt(water, 300)[0]?.value).toBe(water[0]!.capacity.cp(300));
  });

  test("every species of the library has a chart of finite numbers", () => {
    for (const { key } of allSpecies()) {
      const sources = sourcesOf(key);
      const chart = chartOf(sources, [], coveredSpan(sources));
      expect([key, chart.curves.length]).toEqual([key, sources.length]);
      expect([key, chart.values.every(Number.isFinite) && chart.values[1] > chart.values[0]]).toEqual([key, true]);
      for (const curve of chart.curves) expect([key, curve.set, curve.values.every(Number.isFinite)]).toEqual([key, curve.set, true]);
    }
  });
});

describe("the table of values", () => {
  test("298.15 K and round temperatures", () => {
    expect(tableTemperatures([200, 3000])).toEqual([298.15, 500, 1000, 1500, 2000, 2500, 3000]);
    expect(tableTemperatures([273.15, 380])).toEqual([280, 290, 298.15, 300, 310, 320, 330, 340, 350, 360, 370, 380]);
    expect(tableTemperatures([500, 900]).includes(298.15)).toBe(false);
  });

  test("never more rows than asked for, always inside the range", () => {
    for (const high of [300, 650, 1200, 3500, 6000, 20000]) {
      const rows = tableTemperatures([200, high]);
      expect(rows.length).toBeLessThanOrEqual(14);
      expect(rows.length).toBeGreaterThan(3);
      expect(Math.min(...rows)).toBeGreaterThanOrEqual(200);
      expect(Math.max(...rows)).toBeLessThanOrEqual(high);
    }
  });
});
