/** Workbook files in and out: open, read, patch, write anew. */
export { readPackage, type Package } from "./container/package";
export { readCharts } from "./read/charts";
export { readWorkbook } from "./read/workbook";
export { patch } from "./patch/patch";
export { blankWorkbook } from "./write/blank";
export { writeWorkbook, type NewWorkbook, type NewSheet, type NewCell } from "./write/write";
export type { CellStyle } from "./write/styles";
