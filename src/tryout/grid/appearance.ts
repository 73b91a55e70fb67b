/**
 * How a workbook looks: fonts, fills, borders, number formats, widths, merged cells, frozen panes, conditional formats, validations. The
 * grid's own file reader supplies it. The cells' contents are taken out of the sheets before, so no formula of the file reaches the engine
 * this way; drawings, tables and pivots are taken out because the page does not show them (they stay in the file).
 */
import { strFromU8, unzipSync } from "fflate";
import { load } from "./engine";
import type { GridData } from "./data";

/** Rows below this one keep their contents and lose only their look on the page: the reader's time grows with the square of the rows. */
export const ROWS_WITH_LOOKS = 5000;

const WANTED_PARTS =
  /^(\[Content_Types\]\.xml|xl\/workbook\.xml|xl\/_rels\/workbook\.xml\.rels|xl\/styles\.xml|xl\/theme\/[^/]+\.xml|xl\/worksheets\/[^/]+\.xml)$/;

/** The look of the package's sheets as engine data without cells; undefined if the reader cannot make sense of the file. */
export function appearanceOf(bytes: Uint8Array): GridData | undefined {
  const parts: Record<string, string> = {};
  const unzipped = unzipSync(bytes, { filter: (entry) => WANTED_PARTS.test(entry.name) });
  for (const [name, content] of Object.entries(unzipped)) parts[name] = prepared(name, strFromU8(content));
  try {
    return load(parts) as unknown as GridData;
  } catch {
    return undefined;
  }
}

function prepared(name: string, text: string): string {
  if (name === "[Content_Types].xml")
    return text.replace(/<Override\b[^>]*\/>/g, (entry) => (WANTED_PARTS.test(partOf(entry)) ? entry : ""));
  if (name === "xl/styles.xml") return scientificFormats(text);
  if (name.startsWith("xl/worksheets/")) return looksOnly(text);
  return text;
}

function partOf(override: string): string {
  return (/PartName="\/?([^"]+)"/.exec(override) ?? [])[1] ?? "";
}

/** A sheet's XML without contents, drawings, tables and rows below the limit. */
export function looksOnly(sheet: string): string {
  return belowLimit(sheet)
    .replace(/<f\b[^>]*\/>|<f\b[^>]*>[^]*?<\/f>|<v\b[^>]*>[^]*?<\/v>|<is\b[^>]*>[^]*?<\/is>|<v\/>/g, "")
    .replace(/(<c\b[^>]*?)\s(?:t|cm|vm)="[^"]*"/g, "$1")
    .replace(/(<c\b[^>]*?)\s(?:t|cm|vm)="[^"]*"/g, "$1")
    .replace(/<(drawing|legacyDrawing|picture|tablePart|pivotTableDefinition)\b[^>]*\/>/g, "")
    .replace(/<(tableParts|hyperlinks|extLst)\b[^>]*>[^]*?<\/\1>/g, "");
}

function belowLimit(sheet: string): string {
  for (const match of sheet.matchAll(/<row\b[^>]*\br="(\d+)"/g)) {
    if (Number(match[1]) <= ROWS_WITH_LOOKS) continue;
    const end = sheet.indexOf("</sheetData>", match.index);
    return end < 0 ? sheet : sheet.slice(0, match.index) + sheet.slice(end);
  }
  return sheet;
}

/** The engine writes `0.00E+00` as `0.00e`, and does not know the built-in formats 11 and 48, which are scientific. */
export function scientificFormats(styles: string): string {
  const custom = styles
    .replace(/(formatCode="[^"]*?)E\+0+(?=[^"]*")/g, "$1e")
    .replace(/(<xf\b[^>]*\bnumFmtId=")(11|48)"/g, (_all, start: string, id: string) => `${start}${id === "11" ? 9011 : 9048}"`);
  const added = '<numFmt numFmtId="9011" formatCode="0.00e"/><numFmt numFmtId="9048" formatCode="##0.0e"/>';
  if (/<numFmts\b[^>]*>/.test(custom)) return custom.replace(/<numFmts\b[^>]*>/, (tag) => `${tag}${added}`);
  return custom.replace(/(<styleSheet\b[^>]*>)/, (tag) => `${tag}<numFmts count="2">${added}</numFmts>`);
}
