/** What the charts of a workbook read in the grid. */
import type { BookChart, SheetCharts } from "../../book/chart";
import type { BookContext } from "../../book/formula";
import { valueAt } from "../grid/contents";
import { placesOf, type ChartRanges } from "../grid/chart-ranges";
import type { Model } from "../grid/engine";
import { gridName } from "../grid/sheet-names";
import type { Cells } from "./plot";
import { rangesOf } from "./references";

/** The ranges of all formulas of all charts, for the engine to keep; a formula that leads nowhere is left out. */
export function chartRanges(sheets: readonly SheetCharts[], book: BookContext): ChartRanges {
  const ranges = new Map<string, readonly string[]>();
  for (const formula of sheets.flatMap(({ charts }) => charts.flatMap(formulasOf))) {
    const found = rangesOf(formula, book, gridName);
    if (found) ranges.set(formula, found);
  }
  return ranges;
}

function formulasOf({ title, x, y, series }: BookChart): string[] {
  const sources = [title, x.title, y.title, ...series.flatMap((each) => [each.name, each.x, each.y])];
  return sources.flatMap((source) => (source && "formula" in source && source.formula !== undefined ? [source.formula] : []));
}

/** The cells of the grid as they stand at the moment of asking; texts as the grid shows them. */
export function gridCells(model: Model): Cells {
  return {
    values: (formula) => placesOf(model, formula)?.map(({ sheetId, col, row }) => valueAt(model, sheetId, col, row)),
    text: (formula) =>
      placesOf(model, formula)
        ?.map((place) => model.getters.getEvaluatedCell(place).formattedValue)
        .filter((text) => text !== "")
        .join(" "),
  };
}
