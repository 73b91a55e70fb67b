import {
  areaOf,
  FormulaProblem,
  inNamespace,
  toEngine,
  volatileFunctions,
  type Area,
  type BookContext,
  type EngineFormula,
  type Reference,
} from "../book/formula";
import type { BookCell, Workbook } from "../book/workbook";
import { checkCalls } from "./compile";
import type { Engine } from "./engine";
import { takesRange } from "./parameters";

/** A formula cell of a workbook, carried over to the engine or not. */
export interface PlannedCell {
  readonly sheet: string;
  readonly address: string;
  readonly cell: BookCell;
  /** Cells it fills by the file: its own, or the range of its array. */
  readonly fills: Area;
  /** Cells it reads, as far as the formula names them. */
  readonly reads: readonly Area[];
  readonly stillwall: boolean;
  /** Text for the engine; missing if the cell keeps its value. */
  readonly text?: string;
  /** Why it keeps its value: a problem to report, or a volatile function without a clock. */
  readonly kept?: FormulaProblem | "volatile";
}

export interface PlanOptions {
  /** Whether NOW, RAND and the like are to be calculated. */
  readonly volatile: boolean;
  /** Name under which the engine knows a sheet. */
  readonly sheetName: (name: string) => string;
}

/** Carries every formula of the workbook over to the engine's dialect. */
export function planCells(workbook: Workbook, book: BookContext, engine: Engine, options: PlanOptions): PlannedCell[] {
  const planned: PlannedCell[] = [];
  for (const sheet of workbook.sheets) {
    for (const [address, cell] of sheet.cells) {
      const at = { sheet: sheet.name, address, cell };
      if (cell.formula !== undefined) planned.push(planCell(at, workbook, book, engine, options));
      else if (cell.unread !== undefined) planned.push(kept(at, new FormulaProblem("unsupported", cell.unread)));
    }
  }
  return planned;
}

type Cell = Pick<PlannedCell, "sheet" | "address" | "cell">;

function kept(at: Cell, problem: FormulaProblem): PlannedCell {
  return { ...at, fills: areaOf(at.address, at.sheet), reads: [], stillwall: false, kept: problem };
}

function planCell(at: Cell, workbook: Workbook, book: BookContext, engine: Engine, { volatile, sheetName }: PlanOptions): PlannedCell {
  const { sheet, address, cell } = at;
  const fills = cell.array === undefined ? areaOf(address, sheet) : areaOf(cell.array, sheet);
  try {
    const place = { sheet, row: cell.row, column: cell.column };
    const translated = toEngine(cell.formula!, book, { place, sheetName, ...shape(cell, fills, engine) });
    const known = {
      ...at,
      fills,
      reads: translated.references.map((reference) => readArea(reference, sheet)),
      stillwall: translated.calls.some(({ name }) => inNamespace(name)),
    };
    const problem =
      checkCalls(engine.library, translated.calls) ?? dateProblem(translated, workbook) ?? hiddenProblem(translated, known.reads, workbook);
    if (problem) return { ...known, kept: problem };
    if (!volatile && translated.calls.some(({ name }) => volatileFunctions.has(name))) return { ...known, reads: [], kept: "volatile" };
    return { ...known, text: engine.door.admit(translated.text) };
  } catch (reason) {
    if (reason instanceof FormulaProblem) return { ...kept(at, reason), fills };
    throw reason;
  }
}

/** A dynamic array takes the room it needs; an array formula of the old kind fills its range; any other cell holds one value. */
function shape(cell: BookCell, fills: Area, engine: Engine) {
  if (cell.dynamic) return {};
  if (cell.array === undefined) return { single: takesRange(engine.library) };
  return { fill: { rows: fills.bottom - fills.top + 1, columns: fills.right - fills.left + 1 } };
}

function readArea({ sheet, top, left, bottom, right }: Reference, own: string): Area {
  return { sheet: sheet || own, top: top ?? 0, left: left ?? 0, bottom: bottom ?? Infinity, right: right ?? Infinity };
}

const dateFunctions = new Set(
  `DATE DATEVALUE DATEDIF DAY DAYS DAYS360 EDATE EOMONTH HOUR ISOWEEKNUM MINUTE MONTH NETWORKDAYS NETWORKDAYS.INTL NOW SECOND TEXT TODAY VALUE
   WEEKDAY WEEKNUM WORKDAY WORKDAY.INTL YEAR YEARFRAC`.split(/\s+/),
);

function dateProblem({ calls }: EngineFormula, { date1904 }: Workbook): FormulaProblem | undefined {
  const found = date1904 ? calls.find(({ name }) => dateFunctions.has(name)) : undefined;
  return found && new FormulaProblem("unsupported", `${found.name} in a workbook that counts days from 1904 is not supported`);
}

/** Whether a subtotal counts a hidden row depends on how it came to be hidden, which is not known here. */
function hiddenProblem({ calls }: EngineFormula, reads: readonly Area[], { sheets }: Workbook): FormulaProblem | undefined {
  const found = calls.find(({ name }) => name === "SUBTOTAL" || name === "AGGREGATE");
  if (!found) return undefined;
  const covered = reads.some(({ sheet, top, bottom }) => {
    const hidden = sheets.find(({ name }) => name === sheet)?.hiddenRows;
    return hidden !== undefined && [...hidden].some((row) => row >= top && row <= bottom);
  });
  return covered ? new FormulaProblem("unsupported", `${found.name} over hidden rows is not supported`) : undefined;
}
