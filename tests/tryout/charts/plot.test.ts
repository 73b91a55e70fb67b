/** The numbers of a drawn chart: points from cells, gaps, axes, and what is said about them. */
import fc from "fast-check";
import type { BookChart, ChartSeries } from "../../../src/book/chart";
import type { BookValue } from "../../../src/book/workbook";
import { layoutOf } from "../../../src/tryout/charts/layout";
import { plotOf, within, type Cells, type Dot } from "../../../src/tryout/charts/plot";

/** Cells by formula: `x` and `y` are the formulas themselves. */
const cells = (values: Record<string, readonly BookValue[]>): Cells => ({
  values: (formula) => values[formula],
  text: (formula) => values[formula]?.join(" "),
});
const series = (more: Partial<ChartSeries> = {}): ChartSeries => ({
  x: { formula: "x" },
  y: { formula: "y" },
  line: true,
  points: true,
  ...more,
});
const chart = (more: Partial<BookChart> = {}): BookChart => ({ x: {}, y: {}, series: [series()], ...more });
const plot = (values: Record<string, readonly BookValue[]>, more: Partial<BookChart> = {}) => plotOf(chart(more), cells(values));

describe("points", () => {
  test("pair the cells in their order", () => {
    const { series: drawn, remarks } = plot({ x: [1, 3, 2], y: [10, 30, 20] });
    expect(drawn[0]!.dots).toEqual([{ x: 1, y: 10 }, { x: 3, y: 30 }, { x: 2, y: 20 }]); // prettier-ignore
    expect(remarks).toEqual([]);
  });

  test("blank cells leave gaps without a word", () => {
    expect(plot({ x: [1, 2, null, 4], y: [1, null, 3, 4] })).toMatchObject({
      series: [{ dots: [{ x: 1, y: 1 }, null, null, { x: 4, y: 4 }] }],
      remarks: [],
    });
  });

  test("errors, texts and truth values leave gaps and are counted", () => {
    const { series: drawn, remarks } = plot({ x: [1, 2, 3, "four", 5, 6], y: [1, { error: "#N/A" }, "n/a", 4, true, 6] });
    expect(drawn[0]!.dots).toEqual([{ x: 1, y: 1 }, null, null, null, null, { x: 6, y: 6 }]);
    expect(remarks).toEqual(["Series 1 has gaps where its cells hold 1 error, 2 texts and 1 truth value."]);
  });

  test("lists of unlike length end with the shorter one, and it is said", () => {
    const { series: drawn, remarks } = plot({ x: [1, 2, 3], y: [1, 2, 3, 4, "note"] });
    expect(drawn[0]!.dots).toHaveLength(3);
    expect(remarks).toEqual(["Series 1 has 3 x values and 5 y values; the first 3 are drawn."]);
  });

  test("without x values they count from 1; values in the chart itself are taken", () => {
    const counted = plotOf(chart({ series: [series({ x: undefined, y: { values: [5, null, 7] } })] }), cells({}));
    expect(counted.series[0]!.dots).toEqual([{ x: 1, y: 5 }, null, { x: 3, y: 7 }]);
  });

  test("a formula that leads to no cells draws nothing and says which", () => {
    const lost = chart({ series: [series({ name: { text: "Lost" }, y: { formula: "Gone!$B$1:$B$3" } }), series()] });
    const { series: drawn, remarks } = plotOf(lost, cells({ x: [1, 2], y: [3, 4] }));
    expect(drawn.map(({ dots }) => dots.length)).toEqual([0, 2]);
    expect(remarks).toEqual(["Lost: the cells of its y values (Gone!$B$1:$B$3) cannot be found, so it is not drawn."]);
    expect(plot({ y: [1] }).remarks).toEqual(["Series 1: the cells of its x values (x) cannot be found, so it is not drawn."]);
  });

  test("numbers that no axis can hold are gaps", () => {
    expect(plot({ x: [1, 2], y: [1, 1e301] })).toMatchObject({
      series: [{ dots: [{ x: 1, y: 1 }, null] }],
      remarks: ["Series 1 has gaps where its cells hold 1 number beyond 1e300."],
    });
  });
});

describe("names and looks", () => {
  test("texts come from their cells, else from the file", () => {
    const more = { title: { text: "old", formula: "t" }, x: { title: { text: "kept", formula: "gone" } }, y: { title: { text: "bar" } } };
    expect(plot({ x: [1], y: [1], t: ["Peak"] }, more)).toMatchObject({ title: "Peak", xTitle: "kept", yTitle: "bar" });
  });

  test("series without a name are numbered; a hidden one takes no number", () => {
    const list = [series({ name: { text: "A" } }), series({ line: false, points: false }), series()];
    expect(plot({ x: [1], y: [1] }, { series: list }).series.map(({ name }) => name)).toEqual(["A", "Series 2"]);
  });

  test("series of one kind differ in symbol or dashes; a measured series and its curve may share a colour", () => {
    const pair = (accent: number) => [series({ accent, line: false }), series({ accent, points: false })];
    const drawn = plot({ x: [1], y: [1] }, { series: [...pair(1), ...pair(2), ...pair(3)] }).series;
    expect(drawn.map(({ colour }) => colour)).toEqual([1, 1, 2, 2, 3, 3]);
    expect(drawn.filter(({ points }) => points).map(({ symbol }) => symbol)).toEqual([0, 1, 2]);
    expect(drawn.filter(({ line }) => line).map(({ dashes }) => dashes)).toEqual([0, 1, 2]);
  });

  test("without colours in the file they take turns", () => {
    const eight = Array.from({ length: 8 }, () => series());
    expect(plot({ x: [1], y: [1] }, { series: eight }).series.map(({ colour }) => colour)).toEqual([1, 2, 3, 4, 5, 6, 1, 2]);
  });
});

describe("axes", () => {
  test("reach to whole ticks around the values", () => {
    const { x, y } = plot({ x: [0.6, 1.4], y: [5.1, 9.15] });
    expect(y).toEqual([5, 10]);
    expect([x[0] <= 0.6, x[1] >= 1.4 - 1e-12]).toEqual([true, true]);
  });

  test("keep the ends that the file fixes, and points outside are counted", () => {
    const { x, y, remarks } = plot({ x: [1, 2, 3], y: [1, 2, 9] }, { x: { from: 0, to: 2.5 }, y: { from: 0 } });
    expect([x, y]).toEqual([[0, 2.5], [0, 10]]); // prettier-ignore
    expect(remarks).toEqual(["1 point lies outside the axes that the file fixes."]);
  });

  test("fixed ends that leave no room are not taken", () => {
    expect(plot({ x: [1, 2], y: [1, 2] }, { x: { from: 5, to: 5 } }).x).toEqual([1, 2]);
    expect(plot({ x: [1, 2], y: [1, 2] }, { x: { from: 9 } }).x).toEqual([1, 2]);
  });

  test("one value, or values that differ by rounding alone, stand in the middle of some room", () => {
    for (const y of [
      [7, 7],
      [0.1 + 0.2, 0.3],
    ]) {
      const span = plot({ x: [1, 2], y }).y;
      expect(span[0]).toBeLessThan(y[0]! * 0.95);
      expect(span[1]).toBeGreaterThan(y[0]! * 1.05);
    }
    expect(plot({ x: [0], y: [0] }).y).toEqual([-1, 1]);
  });

  test("a chart without points has axes all the same", () => {
    expect(plot({ x: [], y: [] })).toMatchObject({ x: [0, 1], y: [0, 1] });
    expect(plot({ x: [], y: [] }, { x: { from: 3 }, y: { to: -2 } })).toMatchObject({ x: [3, 4], y: [-3, -2] });
  });

  const numbers = fc.oneof(
    fc.double({ noNaN: true }),
    fc.integer({ min: -1000, max: 1000 }),
    fc.constantFrom(1, 1 + 2 ** -52, 1e300, 5e-324),
  );
  const ends = fc.option(numbers, { nil: undefined });
  test("whatever the numbers, every point that is drawn has a place on a finite drawing", () => {
    const pairs = fc.array(fc.tuple(numbers, numbers), { maxLength: 8 });
    fc.assert(
      fc.property(pairs, ends, ends, (list, from, to) => {
        const made = plot({ x: list.map(([x]) => x), y: list.map(([, y]) => y) }, { x: { from, to } });
        const layout = layoutOf(made, 300, 200);
        expect(made.x[1]).toBeGreaterThan(made.x[0]);
        for (const { at } of [...layout.xTicks, ...layout.yTicks]) expect(Number.isFinite(at)).toBe(true);
        expect(layout.xTicks.length).toBeGreaterThan(1);
        expect(layout.xTicks.length).toBeLessThan(20);
        for (const { line, symbols } of layout.series) expect(line + symbols).not.toMatch(/NaN|Infinity/);
        const dots = made.series[0]!.dots.filter((dot): dot is Dot => dot !== null);
        if (from === undefined && to === undefined) for (const dot of dots) expect([dot, within(dot.x, made.x)]).toEqual([dot, true]);
      }),
      { numRuns: 500 },
    );
  });
});
