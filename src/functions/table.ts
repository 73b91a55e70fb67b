/**
 * Tables of results. One state stands upright, label | value | unit | note, its warnings below as notes; a column of n states gives one heading
 * row with units, then one row for each state, its warnings in the last cell. A refused state is a row of its error.
 */
import { Refusal } from "../core/refusal";
import { cellAt, commonShape, type Named } from "./broadcast";
import { Block, Cell, CellError, cells, errorOf, finite } from "./cell";

export interface Line {
  readonly label: string;
  readonly value: number | string;
  readonly unit: string;
  readonly note: string;
}

export interface Report {
  readonly lines: readonly Line[];
  /** Each a sentence. */
  readonly warnings: readonly string[];
}

/** Value of a line that is all note: long texts stand in the last column, where nothing beside them cuts them off. */
export const SEE_NOTE = "see note";

/** A line of a report; unit and note may be left out. */
export function line(label: string, value: number | string, unit = "", note = ""): Line {
  return { label, value, unit, note };
}

/** The table of a function whose arguments are values: evaluated for one state, or for each of a column of states. */
export function table(named: readonly Named[], each: (cells: (Cell | undefined)[]) => Report): Block {
  return cells(() => {
    const { rows, columns } = commonShape(named);
    if (columns > 1)
      throw new Refusal("input", `This function gives a table; give one state, or the states as one column, not ${columns} columns`);
    const states = Array.from({ length: rows }, (_, row) => () => {
      const values = named.map(([, block]) => cellAt(block, row, 0));
      const error = values.find((value) => value instanceof CellError);
      if (error instanceof CellError) throw error;
      return each(values);
    });
    return tableOf(states);
  });
}

/** The table of states that are evaluated one by one; each may refuse. */
export function tableOf(states: readonly (() => Report)[]): Block {
  if (states.length === 1) return cells(() => upright(states[0]!()));
  return rowsOf(states.map(outcomeOf));
}

function outcomeOf(state: () => Report): Report | CellError {
  try {
    return state();
  } catch (thrown) {
    return errorOf(thrown);
  }
}

function upright({ lines, warnings }: Report): Block {
  const below = warnings.length === 0 ? [["warnings", "none", "", ""]] : warnings.map((text) => ["warning", SEE_NOTE, "", text]);
  return [...lines.map(({ label, value, unit, note }) => [label, shown(value), unit, note]), ...below];
}

function rowsOf(outcomes: readonly (Report | CellError)[]): Block {
  const headings = new Headings();
  for (const outcome of outcomes) if ("lines" in outcome) headings.take(outcome.lines);
  const titles = headings.titles();
  if (titles.length === 0) return [["error"], ...outcomes.map((outcome) => [outcome])];
  return [[...titles, "warnings"], ...outcomes.map((outcome) => rowOf(outcome, headings, titles.length))];
}

/**
 * The headings of rows. A line that an earlier state lacks gets its place behind the line before it, so that the columns stand in the same
 * order whichever state comes first. Found by label and unit, without a text made for each line of a sweep.
 */
class Headings {
  /** In the order of the columns. */
  private readonly columns: { readonly title: string; place: number }[] = [];
  private readonly known = new Map<string, Map<string, { place: number }>>();

  take(lines: readonly Line[]): void {
    let before = -1;
    for (const each of lines) before = (this.find(each) ?? this.insert(each, before + 1)).place;
  }

  placeOf(each: Line): number {
    return this.find(each)!.place;
  }

  titles(): string[] {
    return this.columns.map(({ title }) => title);
  }

  private find({ label, unit }: Line): { place: number } | undefined {
    return this.known.get(label)?.get(unit);
  }

  private insert({ label, unit }: Line, place: number): { place: number } {
    const column = { title: unit === "" ? label : `${label} [${unit}]`, place };
    for (const behind of this.columns.slice(place)) behind.place += 1;
    this.columns.splice(place, 0, column);
    const byUnit = this.known.get(label) ?? new Map<string, { place: number }>();
    this.known.set(label, byUnit.set(unit, column));
    return column;
  }
}

function rowOf(outcome: Report | CellError, headings: Headings, width: number): Block[number] {
  if (!("lines" in outcome)) return Array.from({ length: width + 1 }, () => outcome);
  const row = new Array<number | string>(width + 1).fill("");
  const isFilled = new Uint8Array(width);
  for (const each of outcome.lines) {
    const place = headings.placeOf(each);
    row[place] = isFilled[place] && each.value === SEE_NOTE ? `${row[place]}; ${each.note}` : shown(wordsOf(each));
    isFilled[place] = 1;
  }
  row[width] = outcome.warnings.join("; ") || "none";
  return row;
}

/** What a row has in the place of a line that is all note: the note itself. */
function wordsOf({ value, note }: Line): number | string {
  return value === SEE_NOTE ? note : value;
}

function shown(value: number | string): number | string {
  return typeof value === "number" ? finite(value) : value;
}
