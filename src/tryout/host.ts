/** The pane's host on this page: formulas go into the selected cell by the same road as typed ones. */
import type { Host, Selection } from "../pane/host";
import { toXc } from "./grid/selection";
import type { Model } from "./grid/engine";
import type { ThemeSwitch } from "./theme";

export interface GridHost extends Host {
  /** To be called when the selection or the contents may have changed. */
  refresh(): void;
}

export function gridHost(model: () => Model, theme: ThemeSwitch): GridHost {
  const listeners: ((selection: Selection) => void)[] = [];
  let last = "";
  return {
    kind: "page",
    insertFormula: async (formula) => insert(model(), formula),
    selection: async () => selectionOf(model()),
    onSelectionChange: (listener) => void listeners.push(listener),
    theme: () => theme.current(),
    onThemeChange: (listener) => theme.onChange(listener),
    refresh() {
      const selection = selectionOf(model());
      const state = `${selection.address} ${selection.formula ?? ""}`;
      if (state === last) return;
      last = state;
      for (const listener of listeners) listener(selection);
    },
  };
}

export function selectionOf(model: Model): Selection {
  const position = model.getters.getActivePosition();
  const content = model.getters.getCellText(position, { showFormula: true });
  return { address: toXc(position), formula: content === "" ? null : content };
}

function insert(model: Model, formula: string): void {
  const { sheetId, col, row } = model.getters.getActivePosition();
  if (model.getters.isSheetLocked(sheetId))
    throw new Error("The sheet is protected: remove the protection or select a cell of another sheet.");
  const spread = model.getters.getArrayFormulaSpreadingOn({ sheetId, col, row });
  if (spread && (spread.col !== col || spread.row !== row)) {
    throw new Error(`The cell ${toXc({ col, row })} is filled by the formula in ${toXc(spread)}: select an empty cell.`);
  }
  const result = model.dispatch("UPDATE_CELL", { sheetId, col, row, content: formula });
  if (!result.isSuccessful) throw new Error(`The cell ${toXc({ col, row })} did not take the formula: ${result.reasons.join(", ")}.`);
}
