/** The allowed pressure of a vessel: its curve, and the temperature at which contents reach it. */
import fc from "fast-check";
import { refuseRange } from "../../../src/core/refusal";
import { constantLimit, curveLimit, limitReached, requireInside } from "../../../src/core/vessel/limit";
import type { Content } from "../../../src/core/vessel/types";
import { refusedWith } from "../refused";

/** Contents of which only the pressure counts. */
function contents(pressure: (temperature: number) => number, from = 200, to = 1000, kinks: readonly number[] = []): Content {
  return {
    from,
    to,
    fromLabel: "the lower label",
    toLabel: "the upper label",
    kinks,
    at: (temperature) => ({ temperature, pressure: pressure(temperature), energy: 0 }),
  };
}

/** An ideal gas with 1000 Pa/K. */
const gas = contents((temperature) => 1000 * temperature);

/** 6 bar up to 400 K, falling to 2 bar at 600 K. */
const falling = curveLimit([
  { temperature: 300, pressure: 6e5 },
  { temperature: 400, pressure: 6e5 },
  { temperature: 600, pressure: 2e5 },
]);

describe("a limit", () => {
  test("of one number is the same everywhere", () => {
    const limit = constantLimit(2e6);
    expect([limit.at(1), limit.at(3000), limit.from, limit.to, limit.knots]).toEqual([2e6, 2e6, 0, Infinity, []]);
  });

  test("of points is straight between them, exact at them, and nothing outside", () => {
    expect([300, 350, 400, 450, 500, 600].map((t) => falling.at(t))).toEqual([6e5, 6e5, 6e5, 5e5, 4e5, 2e5]);
    expect([299.999, 600.001, NaN].map((t) => falling.at(t))).toEqual([NaN, NaN, NaN]);
    expect([falling.from, falling.to, falling.knots]).toEqual([300, 600, [300, 400, 600]]);
  });

  const refusedCurve = (...points: [number, number][]) =>
    refusedWith(() => curveLimit(points.map(([temperature, pressure]) => ({ temperature, pressure }))));

  test("is refused if it is not one", () => {
    expect(refusedWith(() => constantLimit(0))).toBe("range: A limit of 0 Pa is not a pressure above 0 Pa");
    expect(refusedWith(() => constantLimit(NaN))).toBe("range: A limit of NaN Pa is not a pressure above 0 Pa");
    expect(refusedCurve([300, 1e5])).toBe("input: A limit that depends on temperature needs 2 points or more, not 1");
    expect(refusedCurve([300, 1e5], [300, 2e5])).toBe(
      "input: The temperatures of the limit must rise from point to point: 300 K follows 300 K",
    );
    expect(refusedCurve([400, 1e5], [300, 2e5])).toBe(
      "input: The temperatures of the limit must rise from point to point: 300 K follows 400 K",
    );
    expect(refusedCurve([0, 1e5], [300, 2e5])).toBe("range: The limit begins at 0 K, which is not a temperature above 0 K");
    expect(refusedCurve([300, 1e5], [400, -1])).toBe("range: A limit of -1 Pa is not a pressure above 0 Pa");
    expect(refusedWith(() => requireInside(falling, 650))).toBe(
      "range: Temperature 650 K is outside 300 K to 600 K, where the limit of the vessel is given",
    );
  });
});

describe("the temperature at the limit", () => {
  test("of a number, by hand: 1000 Pa/K reach 4.5 bar at 450 K", () =>
    expect(limitReached(gas, constantLimit(4.5e5), 300)).toEqual({ kind: "reached", temperature: 450, pressure: 4.5e5 }));

  test("of a curve, by hand: 1000 T = 6e5 − 2000 (T − 400) at T = 1.4e6/3000 K", () => {
    const reached = limitReached(gas, falling, 300);
    expect(reached.kind).toBe("reached");
    if (reached.kind !== "reached") return;
    expect(Math.abs(reached.temperature - 1.4e6 / 3000)).toBeLessThan(1e-10);
    expect(Math.abs(reached.pressure - 1.4e9 / 3000)).toBeLessThan(1e-6);
  });

  test("at the start, where the contents are at the limit or above it", () => {
    expect(limitReached(gas, constantLimit(3e5), 300)).toEqual({ kind: "already", temperature: 300, pressure: 3e5 });
    expect(limitReached(gas, falling, 600)).toEqual({ kind: "already", temperature: 600, pressure: 6e5 });
  });

  test("exactly at a knot, and exactly at the end of what is known", () => {
    const knotted = curveLimit([
      { temperature: 300, pressure: 9e5 },
      { temperature: 500, pressure: 5e5 },
      { temperature: 700, pressure: 5e5 },
    ]);
    expect(limitReached(gas, knotted, 300)).toMatchObject({ kind: "reached", temperature: 500 });
    expect(limitReached(gas, constantLimit(1e6), 300)).toMatchObject({ kind: "reached", temperature: 1000 });
  });

  test("not reached: where the contents end, or where the curve ends", () => {
    expect(limitReached(gas, constantLimit(2e6), 300)).toEqual({ kind: "never", to: 1000, because: "the upper limit of the upper label" });
    const thin = contents((temperature) => 100 * temperature);
    expect(limitReached(thin, falling, 300)).toEqual({ kind: "never", to: 600, because: "the end of the limit's curve" });
  });

  test("the lowest of two, where the curve of the limit dips below the pressure in one stretch and rises again", () => {
    const dip = curveLimit([
      { temperature: 300, pressure: 6e5 },
      { temperature: 400, pressure: 3e5 },
      { temperature: 900, pressure: 9e6 },
    ]);
    const reached = limitReached(gas, dip, 300);
    expect(reached).toMatchObject({ kind: "reached" });
    // 1000 T = 6e5 − 3000 (T − 300) at T = 1.5e6/4000
    if (reached.kind === "reached") expect(Math.abs(reached.temperature - 375)).toBeLessThan(1e-10);
  });

  test("inside a stretch on which both rise, the pressure first the faster", () => {
    // p rises by 4 bar over 100 K from 450 K on, then stays; the limit rises from 5 to 8 bar over 700 K
    const risen = contents((t) => 3e5 + 4000 * Math.min(Math.max(t - 450, 0), 100), 200, 1000, [450, 550]);
    const rising = curveLimit([
      { temperature: 300, pressure: 5e5 },
      { temperature: 1000, pressure: 8e5 },
    ]);
    // 3e5 + 4000 (T − 450) = 5e5 + 3e5/700 (T − 300)
    const expected = (2e5 + 4000 * 450 - (3e5 / 700) * 300) / (4000 - 3e5 / 700);
    for (const one of [risen, { ...risen, kinks: [] }]) {
      const reached = limitReached(one, rising, 300);
      expect(reached.kind === "reached" && Math.abs(reached.temperature - expected) < 1e-9).toBe(true);
    }
  });

  test("a steep bend at a kink", () => {
    const bent = contents((t) => (t < 500 ? 1e5 + t : 1e5 + 500 + 1e6 * (t - 500)), 200, 1000, [500]);
    const reached = limitReached(bent, constantLimit(1e6), 300);
    expect(reached.kind === "reached" && Math.abs(reached.temperature - 500.8995) < 1e-9).toBe(true);
  });

  test("is where the pressure is the limit, above the start, for any line and any falling curve", () =>
    fc.assert(
      fc.property(
        fc.double({ min: 10, max: 5000, noNaN: true }),
        fc.array(fc.double({ min: 1e4, max: 5e6, noNaN: true }), { minLength: 2, maxLength: 6 }),
        (slope, pressures) => {
          const limit = curveLimit(pressures.map((pressure, index) => ({ temperature: 300 + 100 * index, pressure })));
          const one = contents((t) => slope * t);
          const reached = limitReached(one, limit, 300);
          const excess = (t: number) => slope * t - limit.at(t);
          if (reached.kind === "never") for (const knot of limit.knots) expect(excess(knot)).toBeLessThan(0);
          else if (reached.kind === "already") expect(excess(300)).toBeGreaterThanOrEqual(0);
          else {
            expect(Math.abs(excess(reached.temperature))).toBeLessThan(1e-8 * limit.at(reached.temperature));
            for (const knot of limit.knots) if (knot < reached.temperature) expect(excess(knot)).toBeLessThanOrEqual(0);
          }
        },
      ),
    ));
});

describe("contents without a state somewhere", () => {
  /** Contents that refuse above a temperature, or between two. */
  const refusing = (low: number, high = Infinity): Content => ({
    ...gas,
    at: (t) => (t > low && t < high ? refuseRange(`Nothing is known at ${t} K`) : gas.at(t)),
  });

  test("the search ends at the last state, and says why", () => {
    const reached = limitReached(refusing(432.1), constantLimit(5e5), 300);
    expect(reached.kind).toBe("never");
    if (reached.kind !== "never") return;
    expect(Math.abs(reached.to - 432.1)).toBeLessThan(1e-6);
    expect(reached.because).toMatch(/^Nothing is known at 432\.1\d* K$/);
  });

  test("what is reached before is found", () =>
    expect(limitReached(refusing(432.1), constantLimit(4e5), 300)).toMatchObject({ kind: "reached", pressure: 4e5 }));

  test("a gap in which the limit would be reached ends the search", () => {
    const reached = limitReached(refusing(400, 900), constantLimit(6e5), 300);
    expect(reached.kind === "never" && Math.abs(reached.to - 400) < 1e-6).toBe(true);
  });

  test("a start without a state is refused, and other faults come out as they are", () => {
    expect(refusedWith(() => limitReached(refusing(250), constantLimit(5e5), 300))).toBe("range: Nothing is known at 300 K");
    const broken: Content = {
      ...gas,
      at: (t) => {
        if (t > 300) throw new TypeError("broken");
        return gas.at(t);
      },
    };
    expect(() => limitReached(broken, constantLimit(5e5), 300)).toThrow(TypeError);
  });

  test("a start outside the curve is refused", () =>
    expect(refusedWith(() => limitReached(gas, falling, 250))).toBe(
      "range: Temperature 250 K is outside 300 K to 600 K, where the limit of the vessel is given",
    ));

  test("a search that finds no state right above the start ends there", () => {
    const reached = limitReached(refusing(300), constantLimit(5e5), 300);
    expect(reached).toEqual({ kind: "never", to: 300, because: expect.stringContaining("Nothing is known") as string });
  });
});
