/**
 * What was done to a workbook since it was opened, by kind, because saving differs: contents go into the file cell by cell; looks and
 * structure need the file to be built anew.
 */
import type { Model } from "./engine";

export interface Journal {
  /** Anything at all that saving would write. */
  changed(): boolean;
  /** Formats, widths, merged cells, rules. */
  looks(): boolean;
  /** Rows, columns, sheets or names came, went or moved. */
  structure(): boolean;
  /** From now on nothing is changed: the workbook was saved. Looks and structure stay, as the file opened does not have them. */
  saved(): void;
  onChange(listener: () => void): void;
}

const CONTENTS = new Set(["UPDATE_CELL", "CLEAR_CELL", "CLEAR_CELLS", "DELETE_CONTENT", "UNDO", "REDO"]);

const LOOKS = new Set([
  "SET_FORMATTING",
  "CLEAR_FORMATTING",
  "SET_BORDER",
  "SET_ZONE_BORDERS",
  "SET_BORDERS_ON_TARGET",
  "RESIZE_COLUMNS_ROWS",
  "HIDE_COLUMNS_ROWS",
  "UNHIDE_COLUMNS_ROWS",
  "ADD_MERGE",
  "REMOVE_MERGE",
  "ADD_CONDITIONAL_FORMAT",
  "REMOVE_CONDITIONAL_FORMAT",
  "CHANGE_CONDITIONAL_FORMAT_PRIORITY",
  "ADD_DATA_VALIDATION_RULE",
  "REMOVE_DATA_VALIDATION_RULE",
  "FREEZE_COLUMNS",
  "FREEZE_ROWS",
  "UNFREEZE_COLUMNS",
  "UNFREEZE_ROWS",
  "UNFREEZE_COLUMNS_ROWS",
  "GROUP_HEADERS",
  "UNGROUP_HEADERS",
  "CREATE_TABLE",
  "REMOVE_TABLE",
  "UPDATE_TABLE",
  "RESIZE_TABLE",
  "SET_GRID_LINES_VISIBILITY",
  "COLOR_SHEET",
  "HIDE_SHEET",
  "SHOW_SHEET",
  "LOCK_SHEET",
  "UNLOCK_SHEET",
  "FOLD_HEADER_GROUP",
  "UNFOLD_HEADER_GROUP",
  "MOVE_RANGES", // cells cut and pasted take their formats along
]);

const STRUCTURE = new Set([
  "REMOVE_COLUMNS_ROWS",
  "CREATE_SHEET",
  "DELETE_SHEET",
  "DUPLICATE_SHEET",
  "RENAME_SHEET",
  "MOVE_SHEET",
  "CREATE_NAMED_RANGE",
  "UPDATE_NAMED_RANGE",
  "DELETE_NAMED_RANGE",
]);

interface Command {
  type: string;
  sheetId?: string;
  dimension?: "ROW" | "COL";
  base?: number;
  position?: "before" | "after";
  quantity?: number;
  format?: string;
  style?: unknown;
}

export function watch(model: Model): Journal {
  const state = { changed: false, looks: false, structure: false };
  const listeners: (() => void)[] = [];
  const note = (kind: "changed" | "looks" | "structure") => {
    if (state.changed && state[kind]) return;
    state.changed = true;
    state[kind] = true;
    for (const listener of listeners) listener();
  };
  model.on("command-dispatched", state, (dispatched: unknown) => {
    const command = dispatched as Command;
    if (STRUCTURE.has(command.type) || (command.type === "ADD_COLUMNS_ROWS" && !isAtTheEnd(model, command))) note("structure");
    else if (LOOKS.has(command.type)) note("looks");
    else if (CONTENTS.has(command.type)) note("changed");
  });
  return {
    changed: () => state.changed,
    looks: () => state.looks,
    structure: () => state.structure,
    saved() {
      state.changed = false;
    },
    onChange: (listener) => void listeners.push(listener),
  };
}

/** Empty rows below or columns to the right of everything move nothing. Asked after the command: the sheet has grown already. */
function isAtTheEnd(model: Model, { sheetId = "", dimension, base = 0, position, quantity = 0 }: Command): boolean {
  const count = dimension === "ROW" ? model.getters.getNumberRows(sheetId) : model.getters.getNumberCols(sheetId);
  return position === "after" && base + quantity === count - 1;
}
