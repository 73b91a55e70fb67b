/**
 * What saving has to write: the cells that were edited on the page, and those whose calculated value is not the one the file holds. Cells
 * left alone are not mentioned, so the file keeps their formulas to the byte.
 */
import { addressOf, areaOf } from "../../book/address";
import { toFile, type FunctionNames } from "../../book/formula";
import type { BookCell, BookSheet, BookValue, CellChange, Workbook } from "../../book/workbook";
import type { GridCell, SheetContents } from "../grid/contents";
import type { SheetNaming } from "../grid/sheet-names";

/** What the grid was handed when the workbook was opened, by sheet and address. */
export interface Handed {
  readonly contents: ReadonlyMap<string, ReadonlyMap<string, string>>;
  readonly formats: ReadonlyMap<string, ReadonlyMap<string, string>>;
}

export const NOTHING_HANDED: Handed = { contents: new Map(), formats: new Map() };

export interface Changes {
  readonly changes: readonly CellChange[];
  /** One sentence for each cell that is not saved as it stands in the grid. */
  readonly remarks: readonly string[];
  /** Number of edited cells with a number format (a date, a percentage) that only a file built anew would hold. */
  readonly formats: number;
}

export interface ChangeRules {
  readonly functions: FunctionNames;
  /** Name in the file of a sheet of the grid. */
  readonly naming: SheetNaming;
  /** True if a recalculated value is to replace the one in the file. */
  differs(before: BookValue, after: BookValue, formula: string): boolean;
  /** True if the formula fills cells or must be stored as an array so that it is not reduced to one row. */
  isArray(engineFormula: string): boolean;
}

export function changesOf(now: ReadonlyMap<string, SheetContents>, handed: Handed, workbook: Workbook, rules: ChangeRules): Changes {
  const changes: CellChange[] = [];
  const remarks: string[] = [];
  let formats = 0;
  for (const [name, cells] of now) {
    const sheet = workbook.sheets.find((candidate) => candidate.name === name);
    const before = handed.contents.get(name) ?? new Map<string, string>();
    const spilled = new Set<string>();
    for (const [address, cell] of cells) {
      const write = before.get(address) === cell.content ? recalculated : edited;
      if (write === edited && cell.format !== handed.formats.get(name)?.get(address)) formats += 1;
      write({ name, address, cell, old: sheet?.cells.get(address), rules, changes, remarks, spilled, sheet });
    }
    for (const address of before.keys()) {
      if (!cells.has(address) && !spilled.has(address)) changes.push({ sheet: name, address, value: null, formula: null });
    }
  }
  return { changes, remarks, formats };
}

interface Step {
  readonly name: string;
  readonly address: string;
  readonly cell: GridCell;
  readonly old: BookCell | undefined;
  readonly rules: ChangeRules;
  readonly changes: CellChange[];
  readonly remarks: string[];
  readonly spilled: Set<string>;
  readonly sheet: BookSheet | undefined;
}

/** A cell whose content is as opened: a formula may have another value now, or fill another range. */
function recalculated(step: Step): void {
  const { name, address, cell, old, rules, changes } = step;
  if (!cell.formula || old?.formula === undefined) return;
  const value = storable(cell.value);
  const moved = cell.spill !== undefined && old.array !== undefined && cell.spill !== old.array;
  if (moved || rules.differs(old.value, value, old.formula)) {
    changes.push({ sheet: name, address, value, ...(moved ? { array: cell.spill } : {}) });
  }
  spill(step, (before, after) => moved || rules.differs(before, after, old.formula ?? ""));
}

/** A cell typed, pasted or filled on the page. */
function edited(step: Step): void {
  const { name, address, cell, rules, changes, remarks } = step;
  if (!cell.content.startsWith("=")) {
    changes.push({ sheet: name, address, value: cell.value, formula: null });
    return;
  }
  if (!cell.formula) {
    changes.push({ sheet: name, address, value: cell.content, formula: null });
    remarks.push(
      `${name}!${address} is saved as the text ${cell.content}, because it is no formula that can be calculated here. ${reasonOf(cell.value)}`.trim(),
    );
    return;
  }
  const array = cell.spill ?? (rules.isArray(cell.content) ? address : undefined);
  changes.push({
    sheet: name,
    address,
    value: storable(cell.value),
    formula: toFile(cell.content, rules.functions, rules.naming),
    ...(array ? { array } : {}),
  });
  spill(step, () => true);
}

/** The other cells of a range that a formula fills are changes of their own. */
function spill({ name, cell, changes, spilled, sheet }: Step, wanted: (before: BookValue, after: BookValue) => boolean): void {
  const area = cell.spill === undefined ? undefined : areaOf(cell.spill);
  if (!area) return;
  cell.spilled?.forEach((row, i) =>
    row.forEach((value, j) => {
      if (i === 0 && j === 0) return;
      const address = addressOf(area.top + i, area.left + j);
      spilled.add(address);
      const after = storable(value);
      if (wanted(sheet?.cells.get(address)?.value ?? null, after)) changes.push({ sheet: name, address, value: after });
    }),
  );
}

function reasonOf(value: BookValue): string {
  return typeof value === "object" && value !== null && value.message ? `${value.message}.` : "";
}

/** Errors of the engine's own have no place in a file: Excel knows none of their names. */
function storable(value: BookValue): BookValue {
  if (typeof value !== "object" || value === null) return value;
  const known = /^#(NULL!|DIV\/0!|VALUE!|REF!|NAME\?|NUM!|N\/A|SPILL!|CALC!)$/.test(value.error);
  return known ? value : { ...value, error: value.error === "#CYCLE" ? "#REF!" : "#VALUE!" };
}
