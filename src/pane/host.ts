/** What the pane sees of the program around it. The same pane stands in Excel, on the local page and in a bare browser window. */

/** The cell that an inserted formula would go to. */
export interface Selection {
  /** As the host writes it: `B4` or `Sheet1!B4`. */
  readonly address: string;
  /** What the cell holds now, formula or value as text; null if it is empty. */
  readonly formula: string | null;
}

export interface Host {
  readonly kind: "excel" | "page" | "none";
  /** Writes a formula (with its leading `=`) into the selected cell; rejects with an Error whose message is one sentence. */
  insertFormula(formula: string): Promise<void>;
  /** The selected cell, or null where there is none. Never rejects. */
  selection(): Promise<Selection | null>;
  onSelectionChange(listener: (selection: Selection) => void): void;
  theme(): "light" | "dark";
  onThemeChange(listener: (theme: "light" | "dark") => void): void;
}
