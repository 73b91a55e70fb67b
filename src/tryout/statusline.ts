/**
 * The line under the grid for the selected cell: why a cell was refused, or its number with every digit. The grid draws its cells as a picture;
 * this line is how the keyboard and a screen reader reach them.
 */
import { element } from "../pane/element";

export interface CellView {
  /** `Heat!B4` or `B4`. */
  readonly address: string;
  readonly value: string | number | boolean | null;
  /** Error sentence; empty if the cell is no error. */
  readonly message: string;
  /** Address of the cell where the error arose, if it is another. */
  readonly origin?: string;
}

export function showCell(line: HTMLElement, cell: CellView): void {
  const [text, refused] = wording(cell);
  line.classList.toggle("refused", refused);
  const said = `${cell.address} ${text}`;
  if (line.textContent === said) return; // an unchanged line must not be read out again
  line.replaceChildren(element("b", {}, cell.address), ` ${text}`);
}

/** What the line says of a cell, and whether it is a refusal. */
export function wording(cell: CellView): [text: string, refused: boolean] {
  if (cell.message) return [`${String(cell.value)} ${cell.message}${cell.origin ? ` (from ${cell.origin})` : ""}`, true];
  if (cell.value === null || cell.value === "") return ["empty", false];
  if (typeof cell.value === "boolean") return [cell.value ? "TRUE" : "FALSE", false];
  return [String(cell.value), false];
}
