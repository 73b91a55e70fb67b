/**
 * A workbook file built anew from the grid, for changes of looks and structure that cannot be patched into the file it came from. The grid's
 * own writer supplies formats, widths and rules; every cell is then written by our patcher, formulas in the dialect of the file.
 */
import { strToU8, zipSync } from "fflate";
import { patch, readPackage, readWorkbook } from "../../book";
import { definedNames } from "../../book/write/blank";
import type { DefinedName, Workbook } from "../../book/workbook";
import { quietly } from "../../recalc/quiet";
import { contentsOf } from "../grid/contents";
import type { Model } from "../grid/engine";
import { changesOf, NOTHING_HANDED, type ChangeRules, type Changes } from "./changes";

export interface Rebuilt {
  readonly bytes: Uint8Array;
  readonly remarks: Changes["remarks"];
}

export async function rebuilt(model: Model, origin: Workbook, rules: ChangeRules): Promise<Rebuilt> {
  const { files } = await quietly(() => model.exportXLSX());
  const parts: Record<string, Uint8Array> = {};
  for (const file of files) if ("content" in file) parts[file.path] = strToU8(mended(file.path, file.content, model, origin));
  const frame = readPackage(zipSync(parts));
  const blank: Workbook = { ...readWorkbook(frame), sheets: [] };
  const { changes, remarks } = changesOf(contentsOf(model), NOTHING_HANDED, blank, rules);
  return { bytes: patch(frame, changes), remarks };
}

function mended(path: string, content: string, model: Model, origin: Workbook): string {
  if (path === "xl/styles.xml") return excelFormats(content);
  return path === "xl/workbook.xml" ? workbookPart(content, namesOf(model, origin), model, origin.date1904) : content;
}

/** The engine writes scientific formats as `0.00e`; Excel as `0.00E+00`. */
export function excelFormats(styles: string): string {
  return styles.replace(/(formatCode="[^"]*[0#])e(?=[^a-zA-Z"]*")/g, "$1E+00");
}

/** The grid's writer leaves out names and the way dates are counted. */
function workbookPart(xml: string, names: readonly DefinedName[], model: Model, date1904: boolean): string {
  const sheets = model.getters.getSheetIds().map((id) => model.getters.getSheetName(id));
  const after = xml.replace(/<\/sheets>/, (end) => end + definedNames(names, sheets));
  return date1904 ? after.replace(/<sheets>/, (start) => `<workbookPr date1904="1"/>${start}`) : after;
}

/** Names as the grid has them now; those it does not know (formulas, local to a sheet) as the file had them. */
function namesOf(model: Model, origin: Workbook): DefinedName[] {
  const now = model.getters
    .getNamedRanges()
    .map(({ name, range }) => ({ name, formula: absolute(model.getters.getRangeString(range, "")) }));
  const known = new Set(now.map(({ name }) => name.toUpperCase()));
  const kept = origin.names.filter(({ name, sheet }) => !known.has(name.toUpperCase()) && (sheet === undefined || hasSheet(model, sheet)));
  return [...now, ...kept];
}

function hasSheet(model: Model, name: string): boolean {
  return model.getters.getSheetIds().some((id) => model.getters.getSheetName(id) === name);
}

/** `Sheet1!A1:B2` -> `Sheet1!$A$1:$B$2`, which is what a name means. */
function absolute(range: string): string {
  const mark = range.lastIndexOf("!");
  return range.slice(0, mark + 1) + range.slice(mark + 1).replace(/\$?([A-Z]+)\$?(\d+)/g, "$$$1$$$2");
}
