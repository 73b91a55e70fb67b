/** Where a chart's parts lie, and what is said of it in words. */
import { isOpen, layoutOf, linePath, symbolOf } from "../../../src/tryout/charts/layout";
import type { Dot, Plot, PlotSeries } from "../../../src/tryout/charts/plot";
import { figuresOf, keptSentence, labelOf } from "../../../src/tryout/charts/words";

const series = (dots: (Dot | null)[], more: Partial<PlotSeries> = {}): PlotSeries => ({
  name: "A",
  line: true,
  points: true,
  colour: 1,
  dashes: 0,
  symbol: 0,
  dots,
  ...more,
});
const plot = (list: PlotSeries[], more: Partial<Plot> = {}): Plot => ({
  title: "T",
  xTitle: "ratio",
  yTitle: "bar",
  series: list,
  x: [0, 10],
  y: [0, 100],
  remarks: [],
  ...more,
});

describe("lines", () => {
  const place = ({ x, y }: Dot) => [x, y] as const;
  test("break at gaps, and a point alone is a dot", () => {
    const dots = [{ x: 1, y: 2 }, { x: 2, y: 3.26 }, null, { x: 4, y: 5 }, null, null, { x: 7, y: 8 }, { x: 8, y: 9 }]; // prettier-ignore
    expect(linePath(dots, place)).toBe("M1 2L2 3.3M4 5h0M7 8L8 9");
    expect(linePath([null, null], place)).toBe("");
  });
});

describe("a layout", () => {
  const layout = layoutOf(plot([series([{ x: 0, y: 0 }, { x: 10, y: 100 }])]), 400, 200); // prettier-ignore

  test("has its corners where the axes end, and its ticks between", () => {
    const { left, right, top, bottom } = layout;
    expect(layout.series[0]!.line).toBe(`M${left} ${bottom}L${right} ${top}`);
    expect(layout.xTicks.map(({ words }) => words)).toEqual(["0", "2", "4", "6", "8", "10"]);
    expect(layout.yTicks.map(({ words }) => words)).toEqual(["0", "50", "100"]);
    expect([layout.yTicks[0]!.at, layout.yTicks[2]!.at]).toEqual([bottom, top]);
    expect(left).toBeGreaterThan(3 * 6); // room for "100"
    expect(right).toBeLessThan(400);
  });

  test("has a symbol for each point inside the axes and none outside", () => {
    const inside = layoutOf(plot([series([{ x: 5, y: 50 }, null, { x: 11, y: 50 }, { x: 5, y: -1 }], { symbol: 1 })]), 400, 200);
    expect(inside.series[0]!.symbols.match(/M/g)).toHaveLength(1);
    expect(inside.series[0]!.symbols).toContain(symbolOf({ symbol: 1 }));
  });

  test("draws the line only, or the points only, of a series that is only that", () => {
    const dots = [{ x: 1, y: 1 }, { x: 2, y: 2 }]; // prettier-ignore
    const [points, line] = layoutOf(plot([series(dots, { line: false }), series(dots, { points: false })]), 400, 200).series;
    expect([points!.line, points!.symbols !== "", line!.line !== "", line!.symbols]).toEqual(["", true, true, ""]);
  });

  test.each([160, 296, 356, 720])("at %i pixels the words of the ticks keep apart", (width) => {
    const ends: Plot["x"][] = [[0, 1], [0, 8_100_000], [1.05, 1.47], [-0.00004, 0.00004], [123456.7, 123456.9]]; // prettier-ignore
    for (const x of ends) {
      const { xTicks } = layoutOf(plot([series([])], { x }), width, 200);
      expect(xTicks.length).toBeGreaterThan(1);
      xTicks.slice(1).forEach(({ at, words }, i) => {
        const before = xTicks[i]!;
        expect(at - before.at).toBeGreaterThan((Math.max(words.length, before.words.length) * 6.4 * 9) / 10);
      });
    }
  });

  test("six symbols differ, the last two without an inside", () => {
    const six = [0, 1, 2, 3, 4, 5].map((symbol) => symbolOf({ symbol }));
    expect(new Set(six).size).toBe(6);
    expect(symbolOf({ symbol: 6 })).toBe(six[0]);
    expect([3, 4, 5, 6].map((symbol) => isOpen({ symbol }))).toEqual([false, true, true, false]);
  });
});

describe("in words", () => {
  const measured = series([{ x: 0.6, y: 5.9 }, null, { x: 1, y: 8.1 }]);
  const calculated = series([{ x: 0.6, y: 6 }, { x: 0.8, y: 7 }, { x: 1, y: 8 }], { name: "B" }); // prettier-ignore

  test("the label gives title, ranges and counts", () => {
    expect(labelOf(plot([measured, calculated]), "Peak")).toBe(
      "Peak. Across: ratio, 0.6 to 1. Up: bar, 5.9 to 8.1. 2 series, 5 points; the figures stand in the table below.",
    );
    expect(labelOf(plot([series([null])], { xTitle: "" }), "Peak")).toBe("Peak. 1 series, 0 points: there is nothing to draw.");
  });

  test("series over the same x values share a table, gaps as dashes; others have their own", () => {
    const other = series([{ x: 3, y: 1 }], { name: "C" });
    expect(figuresOf(plot([measured, calculated, other]))).toEqual([
      { head: ["ratio", "A", "B"], rows: [["0.6", "5.9", "6"], ["0.8", "–", "7"], ["1", "8.1", "8"]], more: 0 }, // prettier-ignore
      { head: ["ratio", "C"], rows: [["3", "1"]], more: 0 },
    ]);
  });

  test("a long table is cut, and says by how much", () => {
    const long = series(Array.from({ length: 700 }, (_, i) => ({ x: i, y: i })));
    const [figures] = figuresOf(plot([long]));
    expect([figures!.rows.length, figures!.more]).toEqual([500, 200]);
  });

  test.each([
    [[], ""],
    [["bar chart"], "A bar chart on this sheet is kept in the file but not drawn here."],
    [["area chart", "pie chart", "pie chart"], "An area chart and 2 pie charts on this sheet are kept in the file but not drawn here."],
    [
      ["chart of several kinds", "chart of several kinds"],
      "2 charts of several kinds on this sheet are kept in the file but not drawn here.",
    ],
  ])("%j: %s", (others, sentence) => {
    expect(keptSentence(others)).toBe(sentence);
  });
});
