/** What a file holds that is not in one built anew from the grid, in the user's words. */

const KINDS: readonly (readonly [part: RegExp, name: string])[] = [
  [/\/charts\//, "charts"],
  [/\/media\//, "pictures"],
  [/\/drawings\//, "drawings"],
  [/\/(comments|threadedComments)/, "comments"],
  [/\/tables\//, "tables"],
  [/\/pivot(Tables|Cache)\//, "pivot tables"],
  [/\/slicer/i, "slicers"],
  [/vbaProject/, "macros"],
  [/\/externalLinks\//, "links to other workbooks"],
  [/printerSettings|\/ctrlProps\/|\/activeX\//, "printer settings and form controls"],
  [/^customXml\//, "data of other programs"],
  [/^docProps\//, "document properties"],
];

export function lossesOf(parts: readonly string[]): string[] {
  return KINDS.filter(([part]) => parts.some((name) => part.test(name))).map(([, name]) => name);
}
