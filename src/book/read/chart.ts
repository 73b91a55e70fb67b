/**
 * One chart part: a scatter chart on one pair of plain axes in full, any other by its kind in words. Series with references keep them; the
 * numbers that the file caches beside them are left alone. Source of the form: ECMA-376-1, 21.2.
 */
import type { BookChart, ChartAxis, ChartNumbers, ChartSeries, ChartText } from "../chart";
import { at, below, readTree, valueAt, type XmlElement } from "../xml/tree";
import { DRAWN } from "../xml/walk";

/** A kind whose element name does not say it in words. */
const KINDS: Readonly<Record<string, string>> = { ofPie: "pie" };

/** The scatter chart of a part, or the kind of another chart: `bar chart`. Throws what is no XML. */
export function readChart(text: string, part: string): BookChart | string {
  const chart = at(readTree(text, part, DRAWN), "chartSpace", "chart");
  const plotArea = at(chart, "plotArea");
  if (!chart || !plotArea) return UNREAD;
  const plots = plotArea.children.filter(({ name }) => name.endsWith("Chart"));
  const axes = plotArea.children.filter(({ name }) => name.endsWith("Ax"));
  const kind = kindOf(plots, axes);
  if (kind !== "scatter chart") return kind;
  const [x, y] = axesOf(axes);
  const series = plots.flatMap(({ children }) => children.filter(({ name }) => name === "ser")).flatMap(seriesOf);
  return { title: titleOf(chart), x: axisOf(x), y: axisOf(y), series };
}

export const UNREAD = "chart that could not be read";

function kindOf(plots: readonly XmlElement[], axes: readonly XmlElement[]): string {
  const names = new Set(plots.map(({ name }) => name.replace(/(3D)?Chart$/, "")));
  const [name] = names;
  if (name === undefined) return UNREAD;
  if (names.size > 1) return "chart of several kinds";
  if (name !== "scatter") return `${KINDS[name] ?? name} chart`;
  if (axes.length !== 2 || axes.some((axis) => axis.name !== "valAx")) return "scatter chart with other than two axes of numbers";
  if (axes.some((axis) => at(axis, "scaling", "logBase"))) return "scatter chart with a logarithmic axis";
  if (axes.some((axis) => valueAt(axis, "scaling", "orientation") === "maxMin")) return "scatter chart with a reversed axis";
  return "scatter chart";
}

/** Horizontal and vertical, by their side; without sides the first is the horizontal one. */
function axesOf(axes: readonly XmlElement[]): [XmlElement | undefined, XmlElement | undefined] {
  const flat = (axis: XmlElement | undefined) => ["b", "t"].includes(valueAt(axis, "axPos") ?? "");
  const [first, second] = axes;
  return flat(second) && !flat(first) ? [second, first] : [first, second];
}

function axisOf(axis: XmlElement | undefined): ChartAxis {
  const scaling = at(axis, "scaling");
  return { title: titleOf(axis), from: numberOf(valueAt(scaling, "min")), to: numberOf(valueAt(scaling, "max")) };
}

/** The title of the chart or of an axis. */
function titleOf(owner: XmlElement | undefined): ChartText | undefined {
  const text = at(owner, "title", "tx");
  return at(text, "rich") ? plain(paragraphs(at(text, "rich") as XmlElement)) : referred(at(text, "strRef"));
}

const plain = (text: string): ChartText | undefined => (text.trim() === "" ? undefined : { text: text.trim() });

function paragraphs(rich: XmlElement): string {
  return below(rich, "p")
    .map((paragraph) => paragraph.children.map((run) => (run.name === "br" ? " " : (at(run, "t")?.text ?? ""))).join(""))
    .join(" ");
}

/** A text taken from a cell, with the text the file holds for it. */
function referred(reference: XmlElement | undefined): ChartText | undefined {
  const formula = formulaOf(reference);
  const text = reference
    ? below(reference, "v")
        .map((value) => value.text)
        .join(" ")
    : "";
  return formula === undefined ? plain(text) : { text, formula };
}

const formulaOf = (reference: XmlElement | undefined): string | undefined => at(reference, "f")?.text.trim().replace(/^=/, "") || undefined;

/** A series without heights is none. */
function seriesOf(series: XmlElement): ChartSeries[] {
  const y = numbersOf(at(series, "yVal"));
  if (!y) return [];
  const name = referred(at(series, "tx", "strRef")) ?? plain(at(series, "tx", "v")?.text ?? "");
  const line = at(series, "spPr", "ln", "noFill") === undefined;
  const points = valueAt(series, "marker", "symbol") !== "none";
  return [{ name, x: numbersOf(at(series, "xVal")), y, line, points, accent: accentOf(series) }];
}

function numbersOf(values: XmlElement | undefined): ChartNumbers | undefined {
  for (const kind of ["numRef", "strRef", "multiLvlStrRef"]) {
    const formula = formulaOf(at(values, kind));
    if (formula !== undefined) return { formula };
  }
  const literal = at(values, "numLit");
  return literal && { values: literalValues(literal) };
}

/** More values than this in the chart itself are not read: an index of a damaged file must not fill the memory. */
const MOST_LITERALS = 100_000;

function literalValues(literal: XmlElement): (number | null)[] {
  const values: (number | null)[] = [];
  for (const point of literal.children) {
    const index = Number(point.attributes.idx);
    if (point.name !== "pt" || !Number.isInteger(index) || index < 0 || index >= MOST_LITERALS) continue;
    while (values.length <= index) values.push(null);
    values[index] = numberOf(at(point, "v")?.text) ?? null;
  }
  return values;
}

function accentOf(series: XmlElement): number | undefined {
  const inLine = at(series, "spPr", "ln", "solidFill", "schemeClr");
  const inMarker = at(series, "marker", "spPr", "solidFill", "schemeClr");
  const accent = /^accent([1-6])$/.exec((inLine ?? inMarker)?.attributes.val ?? "");
  return accent ? Number(accent[1]) : undefined;
}

function numberOf(text: string | undefined): number | undefined {
  const number = text === undefined || text.trim() === "" ? NaN : Number(text);
  return Number.isFinite(number) ? number : undefined;
}
