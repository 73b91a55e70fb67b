/** A chart as an SVG drawing from its layout; colours and dashes come from charts.css by class, so that dark and forced colours need no second drawing. */
import { drawn, freshId } from "../../pane/element";
import { isOpen, symbolOf, type DrawnSeries, type Layout } from "./layout";
import type { PlotSeries } from "./plot";

/** Dashes of the lines of one chart, by class: six kinds. */
const DASHES = 6;

const lineClass = (series: PlotSeries) => `chart-line chart-colour-${series.colour} chart-dashes-${series.dashes % DASHES}`;
const symbolClass = (series: PlotSeries) => `chart-symbol chart-colour-${series.colour}${isOpen(series) ? " chart-open" : ""}`;

/** The drawing; `label` is what is read out in its place. */
export function pictureOf(layout: Layout, label: string): SVGSVGElement {
  const { width, height, left, right, top, bottom } = layout;
  const clip = freshId("clip");
  const frame = drawn("clipPath", { id: clip }, drawn("rect", { x: left, y: top, width: right - left, height: bottom - top }));
  return drawn(
    "svg",
    { class: "chart-drawing", viewBox: `0 0 ${width} ${height}`, width, height, role: "img", "aria-label": label },
    frame,
    ...axes(layout),
    drawn("g", { "clip-path": `url(#${clip})` }, ...layout.series.flatMap(({ series, line }) => path(lineClass(series), line))),
    ...layout.series.flatMap(({ series, symbols }: DrawnSeries) => path(symbolClass(series), symbols)),
  );
}

const path = (look: string, d: string): SVGElement[] => (d === "" ? [] : [drawn("path", { class: look, d })]);

function axes({ left, right, top, bottom, xTicks, yTicks }: Layout): SVGElement[] {
  return [
    ...yTicks.flatMap(({ at, words }) => [
      drawn("line", { class: "chart-grid", x1: left, x2: right, y1: at, y2: at }),
      drawn("text", { x: left - 7, y: at + 4, "text-anchor": "end" }, words),
    ]),
    ...xTicks.flatMap(({ at, words }) => [
      drawn("line", { class: "chart-axis", x1: at, x2: at, y1: bottom, y2: bottom + 4 }),
      drawn("text", { x: at, y: bottom + 17, "text-anchor": "middle" }, words),
    ]),
    drawn("path", { class: "chart-axis", d: `M${left} ${top}V${bottom}H${right}` }),
  ];
}

/** A short piece of a series for the legend. */
export function sampleOf(series: PlotSeries): SVGSVGElement {
  return drawn(
    "svg",
    { class: "chart-sample", viewBox: "0 0 30 12", width: 30, height: 12, "aria-hidden": "true" },
    ...(series.line ? path(lineClass(series), "M1 6H29") : []),
    ...(series.points ? path(symbolClass(series), `M15 6${symbolOf(series)}`) : []),
  );
}
