/** A workbook that is open on the page: the file it came from, what the grid was given, and what happened to it since. */
import { blankWorkbook, readCharts, readPackage, readWorkbook, type Package } from "../book";
import type { SheetCharts } from "../book/chart";
import { bookContext } from "../book/formula";
import type { Workbook } from "../book/workbook";
import type { Engine } from "../recalc/engine";
import { FormulaGraph } from "../recalc/graph";
import { inOrder, type EnginePosition } from "../recalc/order";
import type { PlannedCell } from "../recalc/plan";
import { quietly } from "../recalc/quiet";
import { chartRanges } from "./charts/cells";
import { appearanceOf } from "./grid/appearance";
import { nextChartRanges } from "./grid/chart-ranges";
import { formatsOf } from "./grid/contents";
import { Model } from "./grid/engine";
import { nextWorkbook } from "./grid/gate";
import { gridOf } from "./grid/open";
import { fileNames, gridName } from "./grid/sheet-names";
import { watch, type Journal } from "./grid/journal";
import type { Handed } from "./saving/changes";

export interface OpenDocument {
  /** File name under which it is saved. */
  readonly name: string;
  /** True if it came from a file of the user: its other parts must not be lost unasked. */
  readonly fromFile: boolean;
  readonly package: Package;
  readonly workbook: Workbook;
  /** Charts of the file by sheet. */
  readonly charts: readonly SheetCharts[];
  readonly handed: Handed;
  readonly model: Model;
  readonly journal: Journal;
  /** Cell to select once the workbook is on show; A1 if left out. 0-based. */
  readonly start?: { readonly row: number; readonly column: number };
  /** What the page does not show or does not calculate, one sentence each. */
  readonly notes: readonly string[];
}

/** Opens the bytes of a workbook. Throws a Refusal with one sentence if it cannot be read. */
export function openDocument(name: string, bytes: Uint8Array, engine: Engine, fromFile: boolean): OpenDocument {
  return opened(name, readPackage(bytes), bytes, engine, fromFile);
}

/** A new workbook with one empty sheet. */
export function newDocument(engine: Engine): OpenDocument {
  return opened("workbook.xlsx", blankWorkbook(["Sheet1"]), undefined, engine, false);
}

function opened(name: string, pkg: Package, bytes: Uint8Array | undefined, engine: Engine, fromFile: boolean): OpenDocument {
  const workbook = readWorkbook(pkg);
  const looks = bytes && quietly(() => appearanceOf(bytes));
  const { data, contents, planned, kept } = gridOf(workbook, looks, engine);
  nextWorkbook(workbook);
  const charts = readCharts(pkg);
  nextChartRanges(chartRanges(charts, bookContext(workbook, engine.functions)));
  const model = quietly(() => inOrder(orderOf(planned), () => new Model(data as never)));
  const unlike = bytes && !looks ? ["The formats of this file could not be shown here; they stay in the file."] : [];
  return {
    name,
    fromFile,
    package: pkg,
    workbook,
    charts,
    handed: { contents, formats: formatsOf(model, fileNames(workbook)) },
    model,
    journal: watch(model),
    notes: [...workbook.notes, ...kept, ...unlike],
  };
}

/** Each formula after what it reads: the engine recurses, and a long chain would be too deep for it. */
function orderOf(planned: readonly PlannedCell[]): EnginePosition[] {
  const calculated = planned.filter(({ text }) => text !== undefined);
  const { order } = new FormulaGraph(calculated).walk(() => false);
  return order.map((index) => {
    const { sheet, cell } = calculated[index] as PlannedCell;
    return { sheetId: gridName(sheet), row: cell.row, col: cell.column };
  });
}
