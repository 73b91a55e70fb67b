import { areaOf, FormulaProblem, inNamespace, toEngine, volatileFunctions, type Area, type BookContext, type EngineFormula, type Reference } from "../book/formula";
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
      if (cell.formula !== undefined) planned.push(planCell({ sheet: sheet.name, address, cell }, workbook, book, engine, options));
    }
  }
  return planned;
}

function planCell(
  at: { sheet: string; address: string; cell: BookCell },
  { date1904 }: Workbook,
  book: BookContext,
  engine: Engine,
  { volatile, sheetName }: PlanOptions,
): PlannedCell {
  const { sheet, address, cell } = at;
  const fills = cell.array === undefined ? areaOf(address, sheet) : areaOf(cell.array, sheet);
  const nothing = { ...at, fills, reads: [], stillwall: false };
  try {
    const place = { sheet, row: cell.row, column: cell.column };
    const translated = toEngine(cell.formula!, book, { place, sheetName, ...shape(cell, fills, engine) });
    const known = { ...at, fills, reads: translated.references.map((reference) => readArea(reference, sheet)), stillwall: translated.calls.some(({ name }) => inNamespace(name)) };
    const problem = checkCalls(engine.library, translated.calls) ?? (date1904 ? dateProblem(translated) : undefined);
    if (problem) return { ...known, kept: problem };
    if (!volatile && translated.calls.some(({ name }) => volatileFunctions.has(name))) return { ...known, reads: [], kept: "volatile" };
    return { ...known, text: engine.door.admit(translated.text) };
  } catch (reason) {
    if (reason instanceof FormulaProblem) return { ...nothing, kept: reason };
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

function dateProblem({ calls }: EngineFormula): FormulaProblem | undefined {
  const found = calls.find(({ name }) => dateFunctions.has(name));
  return found && new FormulaProblem("unsupported", `${found.name} in a workbook that counts days from 1904 is not supported`);
}
