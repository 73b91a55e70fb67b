// @ts-check
/**
 * A small writer of formatted workbooks for the samples: named looks, column widths, formulas in the dialect of the file
 * (`_xldudf_STILL_…`, dynamic arrays with cell metadata). Values of formulas are left to a recalculation.
 */
import { strToU8, zipSync } from "fflate";
import { metadataXml, stylesXml, LOOKS } from "./sample-styles.mjs";

/** @typedef {{ at: string, look?: string, text?: string, number?: number, formula?: string, fills?: string }} SampleCell */
/** @typedef {{ name: string, widths: readonly number[], heights?: Readonly<Record<number, number>>, frozenRows?: number, merged?: readonly string[], cells: readonly SampleCell[] }} SampleSheet */

const MAIN = "http://schemas.openxmlformats.org/spreadsheetml/2006/main";
const OFFICE = "http://schemas.openxmlformats.org/officeDocument/2006/relationships";
const PACKAGE = "http://schemas.openxmlformats.org/package/2006";
const HEAD = '<?xml version="1.0" encoding="UTF-8" standalone="yes"?>\n';

/** @param {readonly SampleSheet[]} sheets @returns {Uint8Array} */
export function bookBytes(sheets) {
  /** @type {Record<string, string>} */
  const parts = {
    "[Content_Types].xml": contentTypes(sheets.length),
    "_rels/.rels": relationships([["officeDocument", "xl/workbook.xml"]]),
    "xl/workbook.xml": workbookXml(sheets),
    "xl/_rels/workbook.xml.rels": relationships([
      ...sheets.map((_, i) => /** @type {[string, string]} */ (["worksheet", `worksheets/sheet${i + 1}.xml`])),
      ["styles", "styles.xml"],
      ["sheetMetadata", "metadata.xml"],
    ]),
    "xl/styles.xml": HEAD + stylesXml(),
    "xl/metadata.xml": HEAD + metadataXml(),
  };
  sheets.forEach((sheet, i) => (parts[`xl/worksheets/sheet${i + 1}.xml`] = sheetXml(sheet)));
  // A fixed date: the same contents give the same bytes.
  const mtime = new Date(2026, 0, 1);
  return zipSync(Object.fromEntries(Object.entries(parts).map(([name, xml]) => [name, [strToU8(xml), { mtime }]])));
}

/** @param {number} count */
function contentTypes(count) {
  const type = (/** @type {string} */ part, /** @type {string} */ kind) =>
    `<Override PartName="/xl/${part}.xml" ContentType="application/vnd.openxmlformats-officedocument.spreadsheetml.${kind}+xml"/>`;
  const sheets = Array.from({ length: count }, (_, i) => type(`worksheets/sheet${i + 1}`, "worksheet")).join("");
  return (
    `${HEAD}<Types xmlns="${PACKAGE}/content-types">` +
    '<Default Extension="rels" ContentType="application/vnd.openxmlformats-package.relationships+xml"/><Default Extension="xml" ContentType="application/xml"/>' +
    `${type("workbook", "sheet.main")}${sheets}${type("styles", "styles")}${type("metadata", "sheetMetadata")}</Types>`
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
  return (
    `${HEAD}<worksheet xmlns="${MAIN}"><sheetViews><sheetView workbookViewId="0" showGridLines="0">${pane}</sheetView></sheetViews>` +
    `<sheetFormatPr defaultRowHeight="15"/><cols>${columns.join("")}</cols><sheetData>${rowsXml(sheet)}</sheetData>${merged}</worksheet>`
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
