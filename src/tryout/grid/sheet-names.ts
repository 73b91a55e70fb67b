/**
 * Names of sheets. The grid cannot read a formula that mentions a sheet with an apostrophe in its name, so on the page such a sheet goes by the
 * name with a raised comma in its place; the file keeps the name it has.
 */
import type { Workbook } from "../../book/workbook";

export type SheetNaming = (name: string) => string;

export const gridName: SheetNaming = (name) => name.replaceAll("'", "\u2019");

/** From the name on the page to the one in the file; a sheet made on the page has only one. */
export function fileNames(workbook: Workbook): SheetNaming {
  const names = new Map(workbook.sheets.map(({ name }) => [gridName(name), name]));
  return (name) => names.get(name) ?? name;
}
