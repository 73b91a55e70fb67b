/**
 * The chart as an SVG drawing. Numbers come from points.ts; colours and dashes from pane.css by class, so that dark and
 * forced-colour themes need no second drawing.
 */
import { drawn } from "./element";
import { shown } from "./numbers";
import type { Chart, Curve } from "./points";
import { linear, ticks } from "./scale";

const MARGIN = { left: 42, right: 18, top: 24, bottom: 38 };

/** How a curve of the n-th set is told from the others, by class; five differ in colour and in dash. */
export function curveClass(index: number): string {
  return `still-curve still-curve-${index % 5}`;
}

export interface Drawing {
  readonly svg: SVGSVGElement;
  /** Moves the reading line and its dots; heights in the order of the sets, null for no dot. */
  mark(temperature: number, heights: readonly (number | null)[]): void;
  /** Temperature under a horizontal place in the drawing, held inside the axis. */
  temperatureAt(x: number): number;
}

/** Draws the chart in a box of pixels. `order` lists all sets, so that a set keeps its line style when another is outside the window. */
export function drawChart(chart: Chart, order: readonly string[], width: number, height: number, label: string): Drawing {
  const x = linear(chart.temperatures, [MARGIN.left, width - MARGIN.right]);
  const y = linear(chart.values, [height - MARGIN.bottom, MARGIN.top]);
  const back = linear([MARGIN.left, width - MARGIN.right], chart.temperatures);
  const svg = drawn("svg", { class: "still-drawing", viewBox: `0 0 ${width} ${height}`, width, height, role: "img", "aria-label": label });
  svg.append(
    ...axes(chart, x, y, width, height),
    ...chart.curves.map((curve) => curveLine(curve, order, x, y)),
    ...limitLines(chart, y, width),
  );
  const marks = drawn("g", { class: "still-marks" });
  svg.append(marks);
  return {
    svg,
    mark: (temperature, heights) => marks.replaceChildren(...markParts(chart, temperature, heights, x, y, height)),
    temperatureAt: (place) => Math.min(chart.temperatures[1], Math.max(chart.temperatures[0], back(place))),
  };
}

type Map = (value: number) => number;

function axes(chart: Chart, x: Map, y: Map, width: number, height: number): SVGElement[] {
  const base = height - MARGIN.bottom;
  const parts: SVGElement[] = [];
  for (const value of ticks(chart.values, 5)) {
    parts.push(drawn("line", { class: "still-grid", x1: MARGIN.left, x2: width - MARGIN.right, y1: y(value), y2: y(value) }));
    parts.push(drawn("text", { class: "still-tick", x: MARGIN.left - 6, y: y(value) + 4, "text-anchor": "end" }, shown(value)));
  }
  for (const value of ticks(chart.temperatures, Math.max(3, width / 80))) {
    parts.push(drawn("line", { class: "still-axis", x1: x(value), x2: x(value), y1: base, y2: base + 4 }));
    parts.push(drawn("text", { class: "still-tick", x: x(value), y: base + 17, "text-anchor": "middle" }, shown(value)));
  }
  parts.push(drawn("line", { class: "still-axis", x1: MARGIN.left, x2: width - MARGIN.right, y1: base, y2: base }));
  parts.push(drawn("text", { class: "still-axis-name", x: 0, y: 11 }, chart.axis));
  parts.push(drawn("text", { class: "still-axis-name", x: width - MARGIN.right, y: height - 4, "text-anchor": "end" }, "temperature, K"));
  return parts;
}

/** Cv rises: the lower limit is named at the right and the upper one at the left, where the curves are not. */
function limitLines(chart: Chart, y: Map, width: number): SVGElement[] {
  const place = (index: number) => (index === 0 ? { x: width - MARGIN.right, "text-anchor": "end" } : { x: MARGIN.left + 40 });
  return chart.limits.flatMap(({ label, value }, index) => [
    drawn("line", { class: "still-limit", x1: MARGIN.left, x2: width - MARGIN.right, y1: y(value), y2: y(value) }),
    drawn("text", { class: "still-limit-name", y: y(value) - 5, ...place(index) }, `${label} ${shown(value, 4)}`),
  ]);
}

function curveLine(curve: Curve, order: readonly string[], x: Map, y: Map): SVGElement {
  const points = curve.temperatures.map((temperature, i) => `${x(temperature).toFixed(2)},${y(curve.values[i] ?? NaN).toFixed(2)}`);
  return drawn("polyline", { class: curveClass(order.indexOf(curve.set)), "data-set": curve.set, points: points.join(" ") });
}

function markParts(chart: Chart, temperature: number, heights: readonly (number | null)[], x: Map, y: Map, height: number): SVGElement[] {
  if (!(temperature >= chart.temperatures[0] && temperature <= chart.temperatures[1])) return [];
  const at = x(temperature);
  const dots = heights.flatMap((value, index) =>
    value === null ? [] : [drawn("circle", { class: `still-dot still-dot-${index % 5}`, cx: at, cy: y(value), r: 3.5 })],
  );
  return [drawn("line", { class: "still-reading-line", x1: at, x2: at, y1: MARGIN.top, y2: height - MARGIN.bottom }), ...dots];
}

/** A short piece of a curve for the legend. */
export function sample(index: number): SVGSVGElement {
  return drawn(
    "svg",
    { class: "still-sample", viewBox: "0 0 28 10", width: 28, height: 10, "aria-hidden": "true" },
    drawn("polyline", { class: curveClass(index), points: "1,5 27,5" }),
  );
}
