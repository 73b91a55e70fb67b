import { bookContext } from "../book/formula";
import type { BookError, BookValue, Workbook } from "../book/workbook";
import { atTime } from "./clock";
import type { Engine } from "./engine";
import { isEngineFailure } from "./errors";
import { FormulaGraph } from "./graph";
import { buildModel, internalSheetNames } from "./model";
import { nodeEngine } from "./node-engine";
import type { CellOutcome, CellPlace, RecalculateOptions, Recalculated, Unevaluated } from "./outcome";
import { planCells, type PlannedCell } from "./plan";
import { quietly } from "./quiet";
import { readResult, type CellResult } from "./results";

/**
 * Calculates a workbook: every formula that can be carried over to the engine, each after what it reads. A formula that cannot,
 * and one the engine fails at, is reported and keeps the value of the file; so does all that reads it.
 */
export function recalculateWorkbook(workbook: Workbook, options: RecalculateOptions = {}): Promise<Recalculated> {
  return Promise.resolve().then(() =>
    quietly(() => atTime(options.now, () => calculate(workbook, nodeEngine(), options.now !== undefined))),
  );
}

function calculate(workbook: Workbook, engine: Engine, volatile: boolean): Recalculated {
  const sheetName = internalSheetNames(workbook);
  const cells = planCells(workbook, bookContext(workbook, engine.functions), engine, { volatile, sheetName });
  const graph = new FormulaGraph(cells);
  const before = graph.walk((index) => isProblem(cells[index]!));
  const calculated = before.order.filter((index) => cells[index]!.text !== undefined && !before.unreliable[index]);
  const model = buildModel(
    engine,
    workbook,
    calculated.map((index) => cells[index]!),
    sheetName,
  );
  const results = new Map(calculated.map((index) => [index, readResult(model, cells[index]!, sheetName)]));
  const failed = [...results].filter(([, { value }]) => isFailure(value)).map(([index]) => index);
  const after =
    failed.length === 0 ? before : graph.walk((index) => isProblem(cells[index]!) || isFailure(results.get(index)?.value ?? null));
  return report(cells, results, { unreliable: after.unreliable, circular: before.circular });
}

interface Doubt {
  readonly unreliable: readonly boolean[];
  readonly circular: readonly boolean[];
}

function report(cells: readonly PlannedCell[], results: ReadonlyMap<number, CellResult>, { unreliable, circular }: Doubt): Recalculated {
  const outcomes: CellOutcome[] = [];
  const unevaluated: Unevaluated[] = [];
  const stale: CellPlace[] = [];
  const volatileKept: CellPlace[] = [];
  cells.forEach((cell, index) => {
    const place = { sheet: cell.sheet, address: cell.address };
    const reason = circular[index] ? "The formula refers to itself, round a circle of cells" : whyNot(cell, results.get(index));
    if (cell.kept === "volatile") volatileKept.push(place);
    else if (reason !== undefined) unevaluated.push({ ...place, reason });
    else if (unreliable[index]) stale.push(place);
    else outcomes.push({ ...place, ...results.get(index)!, stillwall: cell.stillwall });
  });
  return { outcomes, unevaluated, stale, volatileKept };
}

function whyNot({ kept }: PlannedCell, result: CellResult | undefined): string | undefined {
  if (typeof kept === "object") return kept.message;
  return result && isFailure(result.value) ? `The engine could not evaluate it: ${result.value.message ?? result.value.error}` : undefined;
}

function isProblem({ kept }: PlannedCell): boolean {
  return typeof kept === "object";
}

/** A failure of the engine itself, not a value that a cell may have. */
function isFailure(value: BookValue): value is BookError {
  return typeof value === "object" && value !== null && isEngineFailure(value.error, value.message);
}
