/** Rows and columns of a sheet (ECMA-376 workbooks, Excel 2007 and later). */
export { COLUMNS as mostColumns, ROWS as mostRows } from "../address";
