/** A whole new workbook from a short description: cells with values, formulas and a few formats; used for saving and for samples. */
import { addressOf, columnIndex, requirePlace } from "../address";
import { patch } from "../patch/patch";
import type { BookValue, CellChange, DefinedName } from "../workbook";
import { blankWorkbook, type SheetFrame } from "./blank";
import { StyleBook, type CellStyle } from "./styles";

export interface NewCell {
  /** `B12` */
  readonly address: string;
  readonly value: BookValue;
  /** In the file's dialect, without `=`. */
  readonly formula?: string;
  /** Range of a formula that spills; its other cells are listed as cells of their own. */
  readonly array?: string;
  readonly style?: CellStyle;
}

export interface NewSheet {
  readonly name: string;
  readonly cells: readonly NewCell[];
  /** Column widths in characters by column letter. */
  readonly widths?: Readonly<Record<string, number>>;
  /** Rows at the top that stay in view. */
  readonly frozenRows?: number;
}

export interface NewWorkbook {
  readonly sheets: readonly NewSheet[];
  readonly names?: readonly DefinedName[];
  readonly date1904?: boolean;
}

/** The bytes of a new `.xlsx` file. */
export function writeWorkbook({ sheets, names, date1904 }: NewWorkbook): Uint8Array {
  const styles = new StyleBook();
  const frames = sheets.map((sheet) => frameOf(sheet, styles));
  const pkg = blankWorkbook(frames, { names, date1904, styles });
  return patch(
    pkg,
    sheets.flatMap((sheet) => sheet.cells.map((cell) => changeOf(sheet.name, cell))),
  );
}

function changeOf(sheet: string, { address, value, formula, array }: NewCell): CellChange {
  return { sheet, address, value, ...(formula === undefined ? {} : { formula }), ...(array === undefined ? {} : { array }) };
}

function frameOf(sheet: NewSheet, styles: StyleBook): SheetFrame {
  return { name: sheet.name, before: viewOf(sheet) + widthsOf(sheet), rows: styledRows(sheet.cells, styles) };
}

function viewOf({ frozenRows = 0 }: NewSheet): string {
  if (frozenRows === 0) return "";
  return `<sheetViews><sheetView workbookViewId="0"><pane ySplit="${frozenRows}" topLeftCell="${addressOf(frozenRows, 0)}" activePane="bottomLeft" state="frozen"/></sheetView></sheetViews>`;
}

function widthsOf({ widths = {} }: NewSheet): string {
  const columns = Object.keys(widths)
    .map((letters) => ({ number: columnIndex(letters) + 1, width: widths[letters] as number }))
    .sort((a, b) => a.number - b.number);
  if (columns.length === 0) return "";
  return `<cols>${columns.map(({ number, width }) => `<col min="${number}" max="${number}" width="${width}" customWidth="1"/>`).join("")}</cols>`;
}

/** Rows with an empty cell for every style; patching then fills in values and formulas. */
function styledRows(cells: readonly NewCell[], styles: StyleBook): string {
  const rows = new Map<number, Map<number, number>>();
  for (const { address, style } of cells) {
    const { row, column } = requirePlace(address);
    if (!rows.has(row)) rows.set(row, new Map());
    rows.get(row)?.set(column, styles.number(style));
  }
  const ascending = <T>(map: Map<number, T>) => [...map].sort(([a], [b]) => a - b);
  return ascending(rows)
    .map(([row, columns]) => {
      const text = ascending(columns).map(([column, style]) => `<c r="${addressOf(row, column)}"${style ? ` s="${style}"` : ""}/>`);
      return `<row r="${row + 1}">${text.join("")}</row>`;
    })
    .join("");
}
