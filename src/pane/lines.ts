/** Tables that stand upright, label | value | unit | note: the lines of them that fit a pane. Pure. */

export interface Line {
  readonly label: string;
  readonly value: string;
  readonly unit: string;
}

/** Lines that are shown at least; those that warn are shown whatever their place. */
const FIRST_LINES = 8;

/** True for the label of a line that warns. */
export function isWarning(label: string): boolean {
  return /^(?:warning|caution|standing caution)\b/i.test(label);
}

/** True for a table that ends in its warnings, or in the line that says that there are none. */
export function isUpright(block: readonly (readonly unknown[])[]): boolean {
  const last = block[block.length - 1];
  return block.length > 1 && last?.length === 4 && (last[0] === "warning" || last[0] === "warnings");
}

/** The first lines and every warning; `text` writes a value. */
export function firstLines(block: readonly (readonly unknown[])[], text: (cell: unknown) => string): Line[] {
  return block
    .filter(([label], at) => at < FIRST_LINES || isWarning(String(label)))
    .map(([label, value, unit, note]) => ({
      label: String(label),
      // What warns stands in the note.
      value: isWarning(String(label)) && note ? String(note) : text(value),
      unit: String(unit),
    }));
}

/** What the pane leaves to the sheet. */
export function restSentence(rows: number, lines: number): string {
  const hidden = rows - lines;
  const more = hidden === 0 ? "The" : `${hidden} more ${hidden === 1 ? "line" : "lines"} and the`;
  return `${more} notes stand in the sheet. The table fills ${rows} rows of 4 cells.`;
}
