/** Cells of one worksheet part. */
import { refuse } from "../../core/refusal";
import { addressOf, areaOf, columnIndex } from "../address";
import type { BookCell, BookSheet } from "../workbook";
import { walkXml, type Attributes } from "../xml/walk";
import { sharedFormula, type SharedFormula } from "./shared";
import { RichText } from "./strings";
import { readValue } from "./value";

export interface SheetContext {
  readonly name: string;
  readonly part: string;
  readonly strings: readonly string[];
  readonly date1904: boolean;
  /** Values of `cm` that mean a dynamic array. */
  readonly dynamic: ReadonlySet<string>;
  /** Takes one sentence for the user. */
  note(sentence: string): void;
}

type Draft = { -readonly [K in keyof BookCell]: BookCell[K] };

/** Reads the cells of a sheet from the text of its part. */
export function readSheet(text: string, context: SheetContext): BookSheet {
  const reader = new SheetReader(context);
  walkXml(text, context.part, reader);
  return reader.finish();
}

class SheetReader {
  private readonly cells = new Map<string, Draft>();
  private readonly groups = new Map<string, SharedFormula | string>();
  private readonly waiting: { cell: Draft; address: string; group: string }[] = [];
  /** Formulas that fill a range. */
  private readonly blocks: { anchor: Draft; address: string; range: string }[] = [];
  private readonly inline = new RichText();
  private readonly hiddenRows = new Set<number>();
  private rows = 0;
  private columns = 0;
  private row = -1;
  private column = -1;
  private cell: Attributes | undefined;
  private formula: Attributes | undefined;
  private formulaText = "";
  private content: string | undefined;
  private collecting: "f" | "v" | "is" | undefined;
  private hasInline = false;
  private inData = false;
  private richValues = 0;

  constructor(private readonly context: SheetContext) {}

  open(name: string, attributes: Attributes): void {
    if (name === "sheetData") this.inData = true;
    else if (!this.inData) return;
    else if (name === "c") this.openCell(attributes);
    else if (name === "row") this.openRow(attributes);
    else if (!this.cell) return;
    else if (this.collecting === "is") this.inline.open(name);
    else if (name === "f") [this.formula, this.formulaText, this.collecting] = [attributes, "", "f"];
    else if (name === "v") [this.content, this.collecting] = ["", "v"];
    else if (name === "is") {
      this.inline.clear();
      [this.hasInline, this.collecting] = [true, "is"];
    }
  }

  text(piece: string): void {
    if (this.collecting === "v") this.content += piece;
    else if (this.collecting === "f") this.formulaText += piece;
    else if (this.collecting === "is") this.inline.text(piece);
  }

  close(name: string): void {
    if (name === this.collecting) this.collecting = undefined;
    else if (this.collecting === "is") this.inline.close(name);
    else if (name === "c" && this.cell) this.closeCell(this.cell);
    else if (name === "sheetData") this.inData = false;
  }

  private openRow({ r, hidden }: Attributes): void {
    this.row = r === undefined ? this.row + 1 : Number(r) - 1;
    this.column = -1;
    if (!Number.isInteger(this.row) || this.row < 0) refuse(`The sheet ${this.context.name} holds a row numbered "${r}"`);
    if (hidden === "1" || hidden === "true") this.hiddenRows.add(this.row);
  }

  private openCell(attributes: Attributes): void {
    const { r } = attributes;
    if (r === undefined) this.column++;
    else {
      const letters = /^([A-Za-z]{1,3})(\d+)$/.exec(r) ?? refuse(`The sheet ${this.context.name} holds a cell with the address "${r}"`);
      if (Number(letters[2]) !== this.row + 1) refuse(`The sheet ${this.context.name} holds the cell ${r} in row ${this.row + 1}`);
      this.column = columnIndex(letters[1] as string);
    }
    this.cell = attributes;
    this.formula = this.content = undefined;
    this.hasInline = false;
  }

  private closeCell(attributes: Attributes): void {
    this.cell = undefined;
    const address = addressOf(this.row, this.column);
    const where = () => `${this.context.name}!${address}`;
    const inline = this.hasInline ? this.inline.content() : undefined;
    const value = readValue(
      { type: attributes.t, content: this.content, inline },
      { strings: this.context.strings, date1904: this.context.date1904, where },
    );
    if (attributes.vm !== undefined) this.richValues++;
    if (value === null && !this.formula) return;
    if (this.cells.has(address)) refuse(`The workbook holds the cell ${where()} twice`);
    const cell: Draft = { row: this.row, column: this.column, value };
    if (this.formula) this.readFormula(cell, address, this.formula, attributes.cm);
    this.cells.set(address, cell);
    this.rows = Math.max(this.rows, this.row + 1);
    this.columns = Math.max(this.columns, this.column + 1);
  }

  private readFormula(cell: Draft, address: string, { t, ref, si }: Attributes, cm: string | undefined): void {
    const formula = this.formulaText.replace(/^\s*=/, "");
    if (t === "dataTable") {
      cell.unread = `The data table ${ref ?? address} is not calculated here`;
      this.blocks.push({ anchor: cell, address, range: ref ?? address });
    } else if (t === "shared" && si !== undefined) {
      if (formula === "") this.waiting.push({ cell, address, group: si });
      else {
        cell.formula = formula;
        // The first cell of a group carries its range; some writers repeat the text in every cell.
        if (!this.groups.has(si)) this.groups.set(si, sharedFormula(formula, address) ?? formula);
      }
    } else if (formula === "") {
      cell.unread = "The file marks the cell as a formula but holds no formula text";
    } else {
      cell.formula = formula;
      if (t === "array") {
        cell.array = ref ?? address;
        this.blocks.push({ anchor: cell, address, range: cell.array });
        if (cm !== undefined && this.context.dynamic.has(cm)) cell.dynamic = true;
      }
    }
  }

  finish(): BookSheet {
    for (const { cell, address, group } of this.waiting) {
      const shared = this.groups.get(group);
      if (typeof shared === "function") cell.formula = shared(address);
      else
        cell.unread =
          shared === undefined ? `The shared formula ${group} has no text in the file` : `The shared formula "${shared}" cannot be read`;
    }
    this.markFilled();
    if (this.richValues > 0) {
      this.context.note(
        `${this.context.name} holds ${this.richValues} cells with pictures, data types or newer errors; only the plain value beside them is read`,
      );
    }
    const hidden = this.hiddenRows.size > 0 ? { hiddenRows: this.hiddenRows } : {};
    return { name: this.context.name, cells: this.cells, rows: this.rows, columns: this.columns, ...hidden };
  }

  /** Values inside the range of an array formula or data table belong to it; they are no input of their own. */
  private markFilled(): void {
    for (const { anchor, address, range } of this.blocks) {
      const area = areaOf(range);
      if (!area) continue;
      for (let row = area.top; row <= Math.min(area.bottom, this.rows - 1); row++) {
        for (let column = area.left; column <= Math.min(area.right, this.columns - 1); column++) {
          const cell = this.cells.get(addressOf(row, column));
          if (!cell || cell === anchor || cell.formula !== undefined) continue;
          if (anchor.array) cell.filledBy = address;
          else cell.unread = anchor.unread;
        }
      }
    }
  }
}
