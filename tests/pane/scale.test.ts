import fc from "fast-check";
import { linear, roundStep, ticks, widened } from "../../src/pane/scale";
import { fixed, shown } from "../../src/pane/numbers";

/** Spans as charts have them: ends in steps of 0.001 up to 10,000. */
const spans = fc
  .tuple(fc.integer({ min: -1e7, max: 1e7 }), fc.integer({ min: 1, max: 1e7 }))
  .map(([low, width]) => [low / 1000, (low + width) / 1000] as const);

describe("axes", () => {
  test("round steps", () => {
    expect([0.3, 1, 1.2, 3, 7, 130, 1000].map(roundStep)).toEqual([0.5, 1, 2, 5, 10, 200, 1000]);
  });

  test("ticks by hand", () => {
    expect(ticks([200, 3000], 4)).toEqual([1000, 2000, 3000]);
    expect(ticks([20.1, 21.3], 5)).toEqual([20.5, 21]);
    expect(ticks([0, 0.5], 5)).toEqual([0, 0.1, 0.2, 0.3, 0.4, 0.5]);
    expect(ticks([5, 5], 4)).toEqual([5]);
  });

  test("ticks lie inside the span, rise, and are few", () => {
    fc.assert(
      fc.property(spans, fc.integer({ min: 2, max: 12 }), (span, wanted) => {
        const values = ticks(span, wanted);
        const slack = (span[1] - span[0]) * 1e-6;
        expect(values.length).toBeLessThanOrEqual(wanted + 1);
        values.forEach((value, i) => {
          expect(value).toBeGreaterThanOrEqual(span[0] - slack);
          expect(value).toBeLessThanOrEqual(span[1] + slack);
          if (i > 0) expect(value).toBeGreaterThan(values[i - 1] ?? Infinity);
        });
      }),
    );
  });

  test("widening keeps the span inside and makes a point an interval", () => {
    fc.assert(
      fc.property(spans, ([low, high]) => {
        const [wideLow, wideHigh] = widened([low, high], 5);
        const rounding = (Math.abs(low) + Math.abs(high)) * 1e-15;
        expect(wideLow).toBeLessThanOrEqual(low + rounding);
        expect(wideHigh).toBeGreaterThanOrEqual(high - rounding);
      }),
    );
    expect(widened([12.5, 12.5], 5)).toEqual([11.5, 13.5]);
  });

  test("the map meets both ends and inverts", () => {
    const there = linear([200, 3000], [42, 348]);
    const back = linear([42, 348], [200, 3000]);
    expect(there(200)).toBe(42);
    expect(there(3000)).toBe(348);
    expect(back(there(1234.5))).toBeCloseTo(1234.5, 9);
  });
});

describe("numbers as shown", () => {
  test.each([
    [21.26866971234123, "21.2686697123"],
    [500, "500"],
    [-74600, "\u221274600"],
    [0.1 + 0.2, "0.3"],
    [1e-9, "1e\u22129"],
    [1e22, "1e22"],
    [0, "0"],
  ])("%p", (value, expected) => {
    expect(shown(value)).toBe(expected);
  });

  test("fixed decimals round and never show a negative zero", () => {
    expect(fixed(20.8146, 3)).toBe("20.815");
    expect(fixed(-0.0001, 2)).toBe("0.00");
    expect(fixed(-1.5, 1)).toBe("\u22121.5");
  });
});
