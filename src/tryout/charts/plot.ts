/**
 * The numbers of a workbook's chart: its series as points in the order of their cells, with gaps where a cell holds no number, and its two axes.
 * A point needs a number for both its places. What cannot be drawn is said in a sentence each.
 */
import type { BookChart, ChartAxis, ChartNumbers, ChartSeries, ChartText } from "../../book/chart";
import type { BookValue } from "../../book/workbook";
import { widened, type Span } from "../../pane/scale";

/** What the cells hold that a formula of the chart names, in the order of its ranges, row by row; undefined if it leads to no cells. */
export interface Cells {
  values(formula: string): readonly BookValue[] | undefined;
  text(formula: string): string | undefined;
}

export interface Dot {
  readonly x: number;
  readonly y: number;
}

export interface PlotSeries {
  readonly name: string;
  readonly line: boolean;
  readonly points: boolean;
  /** 1 to 6. */
  readonly colour: number;
  /** How it is told from the others of its kind: the number of its dashes, and of its symbol, from 0. */
  readonly dashes: number;
  readonly symbol: number;
  /** null is a gap. */
  readonly dots: readonly (Dot | null)[];
}

export interface Plot {
  readonly title: string;
  readonly xTitle: string;
  readonly yTitle: string;
  readonly series: readonly PlotSeries[];
  readonly x: Span;
  readonly y: Span;
  /** One sentence for each thing that is not drawn as a reader might expect. */
  readonly remarks: readonly string[];
}

export const COLOURS = 6;

/** The chart as the cells stand now. A series that is neither line nor points is not to be seen in the file either and is left out. */
export function plotOf(chart: BookChart, cells: Cells): Plot {
  const seen = chart.series.filter(({ line, points }) => line || points);
  const used = { lines: 0, symbols: 0 };
  const remarks: string[] = [];
  const series = seen.map((each, index) => {
    const look = { dashes: each.line ? used.lines++ : 0, symbol: each.points ? used.symbols++ : 0 };
    const name = textOf(each.name, cells) || `Series ${index + 1}`;
    const dots = dotsOf(each, name, cells, remarks);
    return { name, line: each.line, points: each.points, colour: each.accent ?? (index % COLOURS) + 1, ...look, dots };
  });
  const dots = series.flatMap((each) => each.dots.filter((dot): dot is Dot => dot !== null));
  const [x, y] = [
    spanOf(
      dots.map((dot) => dot.x),
      chart.x,
    ),
    spanOf(
      dots.map((dot) => dot.y),
      chart.y,
    ),
  ];
  const outside = dots.filter((dot) => !within(dot.x, x) || !within(dot.y, y)).length;
  if (outside > 0) remarks.push(`${counted(outside, "point lies", "points lie")} outside the axes that the file fixes.`);
  const titles = { title: textOf(chart.title, cells), xTitle: textOf(chart.x.title, cells), yTitle: textOf(chart.y.title, cells) };
  return { ...titles, series, x, y, remarks };
}

/** Whether a value lies on an axis, the rounding of its ends set aside. */
export function within(value: number, [low, high]: Span): boolean {
  const slack = (high - low) * 1e-9;
  return value >= low - slack && value <= high + slack;
}

const counted = (count: number, one: string, several: string) => `${count} ${count === 1 ? one : several}`;

/** The text of the cell, or what the file holds for it where the cell cannot be found. */
function textOf(text: ChartText | undefined, cells: Cells): string {
  if (!text) return "";
  return (text.formula === undefined ? undefined : cells.text(text.formula)) ?? text.text;
}

function dotsOf({ x, y }: ChartSeries, name: string, cells: Cells, remarks: string[]): (Dot | null)[] {
  const heights = valuesOf(y, cells);
  const places = x && valuesOf(x, cells);
  if (!heights || (x && !places)) {
    remarks.push(
      `${name}: the cells of its ${heights ? "x" : "y"} values (${formulaOf(heights ? x : y)}) cannot be found, so it is not drawn.`,
    );
    return [];
  }
  if (places && places.length !== heights.length)
    remarks.push(
      `${name} has ${places.length} x values and ${heights.length} y values; the first ${Math.min(places.length, heights.length)} are drawn.`,
    );
  const count = Math.min(heights.length, places?.length ?? Infinity);
  const used = [...heights.slice(0, count), ...(places?.slice(0, count) ?? [])];
  const trouble = troubles(used);
  if (trouble) remarks.push(`${name} has gaps where its cells hold ${trouble}.`);
  return Array.from({ length: count }, (_, i) => {
    const [across, up] = [places ? numberOf(places[i]) : i + 1, numberOf(heights[i])];
    return across === undefined || up === undefined ? null : { x: across, y: up };
  });
}

const formulaOf = (numbers: ChartNumbers | undefined) => (numbers && "formula" in numbers ? numbers.formula : "");

const valuesOf = (numbers: ChartNumbers, cells: Cells): readonly BookValue[] | undefined =>
  "formula" in numbers ? cells.values(numbers.formula) : numbers.values;

/** Beyond this no axis can be laid out in doubles. */
const LARGEST = 1e300;

function numberOf(value: BookValue | undefined): number | undefined {
  return typeof value === "number" && Math.abs(value) <= LARGEST ? value : undefined;
}

/** `2 errors and 1 text`; blank cells are gaps without a word. */
function troubles(values: readonly BookValue[]): string {
  const errors = values.filter((value) => typeof value === "object" && value !== null).length;
  const texts = values.filter((value) => typeof value === "string" && value.trim() !== "").length;
  const truths = values.filter((value) => typeof value === "boolean").length;
  const huge = values.filter((value) => typeof value === "number" && numberOf(value) === undefined).length;
  const words = [
    ...(errors ? [counted(errors, "error", "errors")] : []),
    ...(texts ? [counted(texts, "text", "texts")] : []),
    ...(truths ? [counted(truths, "truth value", "truth values")] : []),
    ...(huge ? [counted(huge, "number beyond 1e300", "numbers beyond 1e300")] : []),
  ];
  return words.length > 1 ? `${words.slice(0, -1).join(", ")} and ${words[words.length - 1]}` : (words[0] ?? "");
}

/** About so many ticks on an axis. */
const TICKS = 5;

/** Differences that a double holds only as rounding are none: the axis of such values is that of one value. */
const isFlat = (low: number, high: number) => !(high - low > 1e-9 * Math.max(Math.abs(low), Math.abs(high)) && high - low > 1e-90);

/** Ends that the file fixes, else whole ticks around the values. Ends that leave no room are not taken. */
function spanOf(values: readonly number[], { from, to }: ChartAxis): Span {
  const low = values.reduce((least, value) => Math.min(least, value), Infinity);
  const high = values.reduce((most, value) => Math.max(most, value), -Infinity);
  const own: Span = values.length > 0 ? around(low, high) : bare(from, to);
  const fixed: Span = [from ?? own[0], to ?? own[1]];
  return isFlat(...fixed) || fixed.some((end) => Math.abs(end) > LARGEST) ? own : fixed;
}

/** An axis without values: one unit long, at the end that the file fixes. */
function bare(from: number | undefined, to: number | undefined): Span {
  const start = from ?? (to === undefined ? 0 : to - 1);
  return isFlat(start, start + 1) ? [0, 1] : [start, start + 1];
}

function around(low: number, high: number): Span {
  if (!isFlat(low, high)) return widened([low, high], TICKS);
  const room = Math.abs(low) > 1e-80 ? Math.abs(low) / 10 : 1;
  return widened([low - room, high + room], TICKS);
}
