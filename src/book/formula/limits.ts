/** Rows and columns of a sheet (ECMA-376 workbooks, Excel 2007 and later). */
export const mostRows = 1048576;
export const mostColumns = 16384;
