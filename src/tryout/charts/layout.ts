/**
 * Where everything of a chart lies on a drawing of so many pixels, as plain numbers and the `d` of SVG paths: ticks with their words, one path
 * for the line of a series and one for all its symbols. Lines break at gaps and are cut at the frame by the drawing; symbols outside are left out.
 */
import { shown } from "../../pane/numbers";
import { linear, ticks, type Span } from "../../pane/scale";
import { within, type Dot, type Plot, type PlotSeries } from "./plot";

export interface Tick {
  /** Pixels from the left or the top. */
  readonly at: number;
  readonly words: string;
}

export interface DrawnSeries {
  readonly series: PlotSeries;
  /** Empty where nothing is to be drawn. */
  readonly line: string;
  readonly symbols: string;
}

export interface Layout {
  readonly width: number;
  readonly height: number;
  /** Sides of the frame that the axes make. */
  readonly left: number;
  readonly right: number;
  readonly top: number;
  readonly bottom: number;
  readonly xTicks: readonly Tick[];
  readonly yTicks: readonly Tick[];
  readonly series: readonly DrawnSeries[];
}

/** Width of a digit at the size of the tick words, with a little room. */
const DIGIT = 6.4;
/** Room for half a symbol above the frame, and for the tick words below it. */
const ABOVE = 8;
const BELOW = 24;

export function layoutOf(plot: Plot, width: number, height: number): Layout {
  const yValues = severalTicks(plot.y, (height - ABOVE - BELOW) / 36);
  const widest = Math.max(...yValues.map((value) => shown(value).length));
  const frame = { left: Math.round(12 + widest * DIGIT), right: width - 14, top: ABOVE, bottom: height - BELOW };
  const x = linear(plot.x, [frame.left, frame.right]);
  const y = linear(plot.y, [frame.bottom, frame.top]);
  const place = (dot: Dot): Place => [held(x(dot.x)), held(y(dot.y))];
  return {
    width,
    height,
    ...frame,
    xTicks: xTicks(plot, frame.right - frame.left).map((value) => ({ at: x(value), words: shown(value) })),
    yTicks: yValues.map((value) => ({ at: y(value), words: shown(value) })),
    series: plot.series.map((series) => ({
      series,
      line: series.line ? linePath(series.dots, place) : "",
      symbols: series.points ? symbolsPath(series, plot, place) : "",
    })),
  };
}

/** About so many ticks, but two at least: round steps may step over a short axis. */
function severalTicks(span: Span, wanted: number): number[] {
  for (let more = Math.max(2, Math.floor(wanted)); more < wanted + 12; more += 1) {
    const values = ticks(span, more);
    if (values.length > 1) return values;
  }
  return [...span];
}

/** As many as fit without their words touching. */
function xTicks(plot: Plot, width: number): number[] {
  for (let wanted = Math.floor(width / 70); wanted > 2; wanted -= 1) {
    const values = severalTicks(plot.x, wanted);
    const widest = Math.max(...values.map((value) => shown(value).length)) * DIGIT + 12;
    if (widest * (values.length - 1) <= width) return values;
  }
  const few = severalTicks(plot.x, 2);
  return [few[0] as number, few[few.length - 1] as number];
}

/** A browser draws lines to places near 1e9 wrongly; held at a hundred thousand pixels, they leave the frame within a pixel of their true way. */
const held = (pixels: number) => Math.min(1e5, Math.max(-1e5, pixels));

type Place = readonly [x: number, y: number];

const at = (value: number) => String(Number(value.toFixed(1)));

/** Pieces between gaps; a point alone between two gaps is a dot, by a line without length. */
export function linePath(dots: readonly (Dot | null)[], place: (dot: Dot) => Place): string {
  let path = "";
  dots.forEach((dot, i) => {
    if (!dot) return;
    const [x, y] = place(dot).map(at) as [string, string];
    const [before, after] = [dots[i - 1] ?? null, dots[i + 1] ?? null];
    path += `${before ? "L" : "M"}${x} ${y}${!before && !after ? "h0" : ""}`;
  });
  return path;
}

/** Outlines about a point, drawn from its place on: circle, square, triangle, diamond, cross, plus. All cover about the same area. */
const SYMBOLS = [
  "m-4 0a4 4 0 1 0 8 0a4 4 0 1 0 -8 0z",
  "m-3.6 -3.6h7.2v7.2h-7.2z",
  "m0 -4.8l4.8 8.4h-9.6z",
  "m0 -5.2l5.2 5.2l-5.2 5.2l-5.2 -5.2z",
  "m-3.6 -3.6l7.2 7.2m0 -7.2l-7.2 7.2",
  "m0 -4.6v9.2m-4.6 -4.6h9.2",
];

export const symbolOf = (series: Pick<PlotSeries, "symbol">): string => SYMBOLS[series.symbol % SYMBOLS.length] ?? "";

/** Crosses have no inside to fill. */
export const isOpen = (series: Pick<PlotSeries, "symbol">): boolean => series.symbol % SYMBOLS.length >= 4;

function symbolsPath(series: PlotSeries, plot: Plot, place: (dot: Dot) => Place): string {
  const symbol = symbolOf(series);
  return series.dots
    .filter((dot): dot is Dot => dot !== null && within(dot.x, plot.x) && within(dot.y, plot.y))
    .map((dot) => `M${place(dot).map(at).join(" ")}${symbol}`)
    .join("");
}
