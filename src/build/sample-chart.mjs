// @ts-check
/**
 * Scatter charts of the sample workbooks: for each sheet that has any, a drawing part that places them on cells, and a chart part each.
 * Numbers stay in the cells: the parts hold references only, and whoever opens the file draws what the cells hold then. Series of one kind
 * differ in the shape of their symbols or in the dashes of their lines as well as in colour. Source of the form: ECMA-376-1, 20.5 and 21.2.
 */
import { escape } from "./html.mjs";

/**
 * @typedef {{ name: string | { cell: string }, x: string, y: string, style: "line" | "points", accent: 1 | 2 | 3 | 4 | 5 | 6 }} SampleSeries
 * Ranges as `A5:A12` on the chart's own sheet, or `Other!A5:A12`; accent: colour of the theme.
 * @typedef {{ title: string, from?: number, to?: number }} SampleAxis An end left out is chosen by whoever draws.
 * @typedef {{ anchor: string, title: string, x: SampleAxis, y: SampleAxis, series: readonly SampleSeries[] }} SampleChart
 * The chart covers the cells of `anchor`, `F3:M22`.
 * @typedef {{ name: string, charts?: readonly SampleChart[] }} SheetWithCharts
 */

const A = 'xmlns:a="http://schemas.openxmlformats.org/drawingml/2006/main"';
const C = 'xmlns:c="http://schemas.openxmlformats.org/drawingml/2006/chart"';
const R = 'xmlns:r="http://schemas.openxmlformats.org/officeDocument/2006/relationships"';
const CHART = "http://schemas.openxmlformats.org/drawingml/2006/chart";
const SYMBOLS = ["circle", "square", "triangle", "diamond", "x", "plus"];
const DASHES = ["solid", "dash", "sysDot", "dashDot", "lgDash", "lgDashDot"];
/** Width of lines and of the edges of symbols: 1.5 pt and 0.75 pt, in the format's 12700 for a point. */
const LINE = 19050;
const EDGE = 9525;

/**
 * The parts that the charts of a workbook need, without the head line of an XML file, by name below `xl/`. `drawings` gives the number of the
 * drawing of a sheet, `charts` the numbers of the charts in a drawing.
 * @param {readonly SheetWithCharts[]} sheets
 */
export function chartParts(sheets) {
  /** @type {Map<string, string>} */
  const parts = new Map();
  /** @type {Map<number, number>} */
  const drawings = new Map();
  /** @type {number[][]} */
  const charts = [];
  let count = 0;
  sheets.forEach((sheet, index) => {
    if (!sheet.charts?.length) return;
    charts.push(sheet.charts.map(() => (count += 1)));
    drawings.set(index, charts.length);
    const numbers = charts[charts.length - 1] ?? [];
    parts.set(`drawings/drawing${charts.length}`, drawingXml(sheet.charts, numbers[0] ?? 1));
    sheet.charts.forEach((chart, i) => parts.set(`charts/chart${numbers[i]}`, chartXml(chart, sheet.name)));
  });
  return { parts, drawings, charts };
}

/** @param {readonly SampleChart[]} charts @param {number} first */
function drawingXml(charts, first) {
  const xdr = 'xmlns:xdr="http://schemas.openxmlformats.org/drawingml/2006/spreadsheetDrawing"';
  return `<xdr:wsDr ${xdr} ${A}>${charts.map((chart, i) => anchorXml(chart, i + 1, first + i)).join("")}</xdr:wsDr>`;
}

/** @param {SampleChart} chart @param {number} relation @param {number} number */
function anchorXml({ anchor, title }, relation, number) {
  const [from = "", to = from] = anchor.split(":");
  const [start, last] = [placeOf(from), placeOf(to)];
  const corner = (/** @type {string} */ name, /** @type {number} */ column, /** @type {number} */ row) =>
    `<xdr:${name}><xdr:col>${column}</xdr:col><xdr:colOff>0</xdr:colOff><xdr:row>${row}</xdr:row><xdr:rowOff>0</xdr:rowOff></xdr:${name}>`;
  return (
    `<xdr:twoCellAnchor>${corner("from", start.column, start.row)}${corner("to", last.column + 1, last.row + 1)}<xdr:graphicFrame macro=""><xdr:nvGraphicFramePr>` +
    `<xdr:cNvPr id="${relation + 1}" name="Chart ${number}" descr="${escape(title)}"/><xdr:cNvGraphicFramePr/></xdr:nvGraphicFramePr>` +
    '<xdr:xfrm><a:off x="0" y="0"/><a:ext cx="0" cy="0"/></xdr:xfrm>' +
    `<a:graphic><a:graphicData uri="${CHART}"><c:chart ${C} ${R} r:id="rId${relation}"/></a:graphicData></a:graphic></xdr:graphicFrame><xdr:clientData/></xdr:twoCellAnchor>`
  );
}

/** @param {SampleChart} chart @param {string} sheet */
function chartXml({ title, x, y, series }, sheet) {
  /** @type {Record<string, number>} */
  const used = { line: 0, points: 0 };
  const drawn = series.map((each, i) => seriesXml(each, i, (used[each.style] = (used[each.style] ?? 0) + 1) - 1, sheet));
  const font = '<c:txPr><a:bodyPr/><a:lstStyle/><a:p><a:pPr><a:defRPr sz="900"/></a:pPr><a:endParaRPr lang="en-GB"/></a:p></c:txPr>';
  return (
    `<c:chartSpace ${C} ${A} ${R}><c:roundedCorners val="0"/><c:chart>${titleXml(title, 1200)}<c:autoTitleDeleted val="0"/><c:plotArea><c:layout/>` +
    `<c:scatterChart><c:scatterStyle val="lineMarker"/><c:varyColors val="0"/>${drawn.join("")}<c:axId val="101"/><c:axId val="102"/></c:scatterChart>` +
    `${axisXml(x, 101, 102, "b")}${axisXml(y, 102, 101, "l")}</c:plotArea><c:legend><c:legendPos val="b"/><c:overlay val="0"/></c:legend>` +
    `<c:plotVisOnly val="1"/><c:dispBlanksAs val="gap"/></c:chart>${font}</c:chartSpace>`
  );
}

/** @param {string} title @param {number} size in hundredths of a point */
function titleXml(title, size) {
  const run = `<a:r><a:rPr lang="en-GB" sz="${size}" b="1"/><a:t>${escape(title)}</a:t></a:r>`;
  const text = `<a:p><a:pPr><a:defRPr sz="${size}" b="1"/></a:pPr>${run}</a:p>`;
  return `<c:title><c:tx><c:rich><a:bodyPr/><a:lstStyle/>${text}</c:rich></c:tx><c:overlay val="0"/></c:title>`;
}

/** An axis of numbers; it meets the other at its lower end. @param {SampleAxis} axis @param {number} id @param {number} other @param {"b" | "l"} side */
function axisXml({ title, from, to }, id, other, side) {
  const end = (/** @type {string} */ name, /** @type {number | undefined} */ value) =>
    value === undefined ? "" : `<c:${name} val="${value}"/>`;
  const line = (/** @type {string} */ shade) => `<c:spPr><a:ln w="${EDGE}"><a:solidFill>${shade}</a:solidFill></a:ln></c:spPr>`;
  const pale = '<a:schemeClr val="tx1"><a:lumMod val="15000"/><a:lumOff val="85000"/></a:schemeClr>';
  return (
    `<c:valAx><c:axId val="${id}"/><c:scaling><c:orientation val="minMax"/>${end("max", to)}${end("min", from)}</c:scaling><c:delete val="0"/>` +
    `<c:axPos val="${side}"/><c:majorGridlines>${line(pale)}</c:majorGridlines>${titleXml(title, 1000)}<c:numFmt formatCode="General" sourceLinked="0"/>` +
    `<c:majorTickMark val="out"/><c:minorTickMark val="none"/><c:tickLblPos val="low"/>${line('<a:schemeClr val="tx2"/>')}` +
    `<c:crossAx val="${other}"/><c:crosses val="min"/><c:crossBetween val="midCat"/></c:valAx>`
  );
}

/** @param {SampleSeries} series @param {number} index among all series @param {number} turn among those of its style @param {string} sheet */
function seriesXml({ name, x, y, style, accent }, index, turn, sheet) {
  const reference = (/** @type {string} */ range) => `<c:f>${escape(absolute(range, sheet))}</c:f>`;
  const tx = typeof name === "string" ? `<c:v>${escape(name)}</c:v>` : `<c:strRef>${reference(name.cell)}</c:strRef>`;
  const fill = `<a:solidFill><a:schemeClr val="accent${accent}"/></a:solidFill>`;
  const dash = `<a:prstDash val="${DASHES[turn % DASHES.length]}"/><a:round/>`;
  const line = style === "line" ? `<a:ln w="${LINE}" cap="rnd">${fill}${dash}</a:ln>` : `<a:ln w="${LINE}"><a:noFill/></a:ln>`;
  const look = `<c:spPr>${fill}<a:ln w="${EDGE}">${fill}</a:ln></c:spPr>`;
  const marker =
    style === "line" ? '<c:symbol val="none"/>' : `<c:symbol val="${SYMBOLS[turn % SYMBOLS.length]}"/><c:size val="7"/>${look}`;
  return (
    `<c:ser><c:idx val="${index}"/><c:order val="${index}"/><c:tx>${tx}</c:tx><c:spPr>${line}</c:spPr><c:marker>${marker}</c:marker>` +
    `<c:xVal><c:numRef>${reference(x)}</c:numRef></c:xVal><c:yVal><c:numRef>${reference(y)}</c:numRef></c:yVal><c:smooth val="0"/></c:ser>`
  );
}

/** `A5:A12` -> `'Sweep'!$A$5:$A$12`. @param {string} range @param {string} sheet */
function absolute(range, sheet) {
  const mark = range.lastIndexOf("!");
  const name =
    mark < 0
      ? sheet
      : range
          .slice(0, mark)
          .replace(/^'(.*)'$/, "$1")
          .replaceAll("''", "'");
  return `'${name.replaceAll("'", "''")}'!${range.slice(mark + 1).replace(/\$?([A-Z]+)\$?(\d+)/g, "$$$1$$$2")}`;
}

/** `F3` -> column 5, row 2. @param {string} address */
function placeOf(address) {
  const [, letters = "", row = ""] = /^([A-Z]+)(\d+)$/.exec(address) ?? [];
  if (!row) throw new Error(`"${address}" is no cell for a chart to stand on`);
  return { column: [...letters].reduce((sum, letter) => sum * 26 + letter.charCodeAt(0) - 64, 0) - 1, row: Number(row) - 1 };
}
