// @ts-check
/**
 * A small writer of formatted workbooks for the samples: named looks, column widths, formulas in the dialect of the file
 * (`_xldudf_STILL_…`, dynamic arrays with cell metadata), scatter charts. Values of formulas are left to a recalculation.
 */
import { strToU8, zipSync } from "fflate";
import { chartParts } from "./sample-chart.mjs";
import { metadataXml, stylesXml, LOOKS } from "./sample-styles.mjs";
import { themeXml } from "./sample-theme.mjs";

/** @typedef {{ at: string, look?: string, text?: string, number?: number, formula?: string, fills?: string }} SampleCell */
/** @typedef {{ name: string, widths: readonly number[], heights?: Readonly<Record<number, number>>, frozenRows?: number, merged?: readonly string[], cells: readonly SampleCell[], charts?: readonly import("./sample-chart.mjs").SampleChart[] }} SampleSheet */

const MAIN = "http://schemas.openxmlformats.org/spreadsheetml/2006/main";
const OFFICE = "http://schemas.openxmlformats.org/officeDocument/2006/relationships";
const PACKAGE = "http://schemas.openxmlformats.org/package/2006";
const HEAD = '<?xml version="1.0" encoding="UTF-8" standalone="yes"?>\n';

/** @param {readonly SampleSheet[]} sheets @returns {Uint8Array} */
export function bookBytes(sheets) {
  const charts = chartParts(sheets);
  const themed = charts.parts.size > 0;
  /** @type {Record<string, string>} */
  const parts = {
    "[Content_Types].xml": contentTypes(sheets.length, [...charts.parts.keys()]),
    "_rels/.rels": relationships([["officeDocument", "xl/workbook.xml"]]),
    "xl/workbook.xml": workbookXml(sheets),
    "xl/_rels/workbook.xml.rels": relationships([
      ...sheets.map((_, i) => /** @type {[string, string]} */ (["worksheet", `worksheets/sheet${i + 1}.xml`])),
      ["styles", "styles.xml"],
      ["sheetMetadata", "metadata.xml"],
      ...(themed ? [/** @type {[string, string]} */ (["theme", "theme/theme1.xml"])] : []),
    ]),
    "xl/styles.xml": HEAD + stylesXml(),
    "xl/metadata.xml": HEAD + metadataXml(),
  };
  sheets.forEach((sheet, i) => (parts[`xl/worksheets/sheet${i + 1}.xml`] = sheetXml(sheet)));
  if (themed) Object.assign(parts, drawnParts(charts));
  // A fixed date: the same contents give the same bytes.
  const mtime = new Date(2026, 0, 1);
  return zipSync(Object.fromEntries(Object.entries(parts).map(([name, xml]) => [name, [strToU8(xml), { mtime }]])));
}

/** Theme, drawings and charts, with the relationships that lead to them. @param {ReturnType<typeof chartParts>} charts */
function drawnParts({ parts, drawings, charts }) {
  /** @type {Record<string, string>} */
  const drawn = { "xl/theme/theme1.xml": HEAD + themeXml() };
  for (const [name, xml] of parts) drawn[`xl/${name}.xml`] = HEAD + xml;
  for (const [sheet, drawing] of drawings)
    drawn[`xl/worksheets/_rels/sheet${sheet + 1}.xml.rels`] = relationships([["drawing", `../drawings/drawing${drawing}.xml`]]);
  charts.forEach((numbers, i) => {
    const targets = numbers.map((number) => /** @type {[string, string]} */ (["chart", `../charts/chart${number}.xml`]));
    drawn[`xl/drawings/_rels/drawing${i + 1}.xml.rels`] = relationships(targets);
  });
  return drawn;
}

/** @param {number} count @param {readonly string[]} drawn parts of the charts, below xl/ without their ending */
function contentTypes(count, drawn) {
  const type = (/** @type {string} */ part, /** @type {string} */ kind) =>
    `<Override PartName="/xl/${part}.xml" ContentType="application/vnd.openxmlformats-officedocument.spreadsheetml.${kind}+xml"/>`;
  const sheets = Array.from({ length: count }, (_, i) => type(`worksheets/sheet${i + 1}`, "worksheet")).join("");
  const charts = drawn.map((part) => {
    const kind = part.startsWith("charts/") ? "drawingml.chart" : "drawing";
    return `<Override PartName="/xl/${part}.xml" ContentType="application/vnd.openxmlformats-officedocument.${kind}+xml"/>`;
  });
  if (drawn.length > 0)
    charts.push('<Override PartName="/xl/theme/theme1.xml" ContentType="application/vnd.openxmlformats-officedocument.theme+xml"/>');
  return (
    `${HEAD}<Types xmlns="${PACKAGE}/content-types">` +
    '<Default Extension="rels" ContentType="application/vnd.openxmlformats-package.relationships+xml"/><Default Extension="xml" ContentType="application/xml"/>' +
    `${type("workbook", "sheet.main")}${sheets}${type("styles", "styles")}${type("metadata", "sheetMetadata")}${charts.join("")}</Types>`
  );
}

/** @param {readonly (readonly [string, string])[]} targets */
function relationships(targets) {
  const entries = targets.map(([type, target], i) => `<Relationship Id="rId${i + 1}" Type="${OFFICE}/${type}" Target="${target}"/>`);
  return `${HEAD}<Relationships xmlns="${PACKAGE}/relationships">${entries.join("")}</Relationships>`;
}

/** @param {readonly SampleSheet[]} sheets */
function workbookXml(sheets) {
  const entries = sheets.map(({ name }, i) => `<sheet name="${escaped(name)}" sheetId="${i + 1}" r:id="rId${i + 1}"/>`);
  return `${HEAD}<workbook xmlns="${MAIN}" xmlns:r="${OFFICE}"><sheets>${entries.join("")}</sheets></workbook>`;
}

/** @param {SampleSheet} sheet */
function sheetXml(sheet) {
  const pane = sheet.frozenRows
    ? `<pane ySplit="${sheet.frozenRows}" topLeftCell="A${sheet.frozenRows + 1}" activePane="bottomLeft" state="frozen"/>`
    : "";
  const columns = sheet.widths.map((width, i) => `<col min="${i + 1}" max="${i + 1}" width="${width}" customWidth="1"/>`);
  const merged = sheet.merged?.length
    ? `<mergeCells count="${sheet.merged.length}">${sheet.merged.map((range) => `<mergeCell ref="${range}"/>`).join("")}</mergeCells>`
    : "";
  const office = sheet.charts?.length ? ` xmlns:r="${OFFICE}"` : "";
  const drawing = sheet.charts?.length ? '<drawing r:id="rId1"/>' : "";
  return (
    `${HEAD}<worksheet xmlns="${MAIN}"${office}><sheetViews><sheetView workbookViewId="0" showGridLines="0">${pane}</sheetView></sheetViews>` +
    `<sheetFormatPr defaultRowHeight="15"/><cols>${columns.join("")}</cols><sheetData>${rowsXml(sheet)}</sheetData>${merged}${drawing}</worksheet>`
  );
}

/** @param {SampleSheet} sheet */
function rowsXml(sheet) {
  /** @type {Map<number, SampleCell[]>} */
  const rows = new Map();
  for (const cell of sheet.cells) {
    const row = Number(/\d+/.exec(cell.at)?.[0]);
    rows.set(row, [...(rows.get(row) ?? []), cell]);
  }
  return [...rows.keys()]
    .sort((a, b) => a - b)
    .map((row) => {
      const height = sheet.heights?.[row];
      const cells = [...(rows.get(row) ?? [])].sort((a, b) => columnOf(a.at) - columnOf(b.at));
      return `<row r="${row}"${height ? ` ht="${height}" customHeight="1"` : ""}>${cells.map(cellXml).join("")}</row>`;
    })
    .join("");
}

/** @param {string} address */
function columnOf(address) {
  return [...address.replace(/\d+/, "")].reduce((sum, letter) => sum * 26 + letter.charCodeAt(0) - 64, 0);
}

/** @param {SampleCell} cell */
function cellXml(cell) {
  const style = cell.look ? ` s="${lookIndex(cell.look)}"` : "";
  if (cell.formula !== undefined) return formulaXml(cell, style);
  if (cell.number !== undefined) return `<c r="${cell.at}"${style}><v>${cell.number}</v></c>`;
  if (cell.text !== undefined)
    return `<c r="${cell.at}"${style} t="inlineStr"><is><t xml:space="preserve">${escaped(cell.text)}</t></is></c>`;
  return `<c r="${cell.at}"${style}/>`;
}

/** @param {SampleCell} cell @param {string} style */
function formulaXml(cell, style) {
  const formula = escaped(inFileDialect(cell.formula ?? ""));
  if (formula.includes("_xldudf_") || cell.fills) {
    return `<c r="${cell.at}"${style} cm="1"><f t="array" ref="${cell.fills ?? cell.at}">${formula}</f></c>`;
  }
  return `<c r="${cell.at}"${style}><f>${formula}</f></c>`;
}

/** `STILL.CV.AT(` as Excel stores it: `_xldudf_STILL_CV_AT(`. Texts in quotes are left alone. @param {string} formula */
function inFileDialect(formula) {
  return formula.replace(/"[^"]*"|STILL(\.[A-Z]+)+(?=\()/g, (part) =>
    part.startsWith('"') ? part : `_xldudf_${part.replace(/\./g, "_")}`,
  );
}

/** @param {string} look */
function lookIndex(look) {
  const index = Object.keys(LOOKS).indexOf(look);
  if (index < 0) throw new Error(`no look "${look}"`);
  return index + 1;
}

/** @param {string} text */
function escaped(text) {
  return text.replace(/&/g, "&amp;").replace(/</g, "&lt;").replace(/>/g, "&gt;").replace(/"/g, "&quot;");
}
