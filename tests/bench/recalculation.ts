/** 100,000 Stillwall cells through the engine, beside the same polynomial typed by hand in LibreOffice. */
import { addressOf, bookContext } from "../../src/book/formula";
import type { BookCell, Workbook } from "../../src/book/workbook";
import { buildModel, internalSheetNames } from "../../src/recalc/model";
import { nodeEngine } from "../../src/recalc/node-engine";
import { planCells } from "../../src/recalc/plan";
import { quietly } from "../../src/recalc/quiet";
import { recalculateWorkbook } from "../../src/recalc/workbook";
import type { Goal } from "./goals";
import { bareIntervals, COUNT, nitrogen, rising } from "./subjects";
import { median } from "./timing";

/** A column of temperatures and beside it a Stillwall formula for each. */
function workbook(): Workbook {
  const cells = new Map<string, BookCell>();
  rising().forEach((temperature, row) => {
    cells.set(addressOf(row, 0), { row, column: 0, value: temperature });
    cells.set(addressOf(row, 1), { row, column: 1, value: null, formula: `_xldudf_STILL_CV_AT("N2",A${row + 1})` });
  });
  return { sheets: [{ name: "Heat", cells, rows: COUNT, columns: 2 }], names: [], tables: [], date1904: false, notes: [] };
}

/** The formula a person would type for the same number, for row 1. */
export function formulaByHand(): string {
  const [low, high] = bareIntervals(nitrogen).map(
    ({ c }) => `(((${c[6]}*A1+${c[5]})*A1+${c[4]})*A1+${c[3]})*A1+${c[2]}+(${c[0]}/A1+${c[1]})/A1`,
  );
  return `=IF(A1<=1000,${low},${high})`.replace(/\+-/g, "-");
}

export interface OtherProgram {
  /** Seconds of each hard recalculation. */
  readonly seconds: readonly number[];
  /** Value of the last cell, to see that it computed the same. */
  readonly last: number;
}

/** Seconds of one hard recalculation of all cells by the engine, and of the command's whole way from workbook to outcomes. */
export async function recalculationGoals(other: OtherProgram | undefined): Promise<Goal[]> {
  const book = workbook();
  const start = performance.now();
  const { outcomes } = await recalculateWorkbook(book);
  const whole = (performance.now() - start) / 1000;
  const last = outcomes[outcomes.length - 1]!.value;
  if (outcomes.length !== COUNT || typeof last !== "number")
    throw new Error(`The engine gave ${outcomes.length} values, the last ${JSON.stringify(last)}`);
  const engine = median(hardRecalculations(book));
  const reported: Goal[] = [
    { what: "100,000 Stillwall cells calculated by the engine", measured: engine, unit: "s" },
    { what: "the same from workbook to outcomes: read formulas, order, load, calculate", measured: whole, unit: "s" },
  ];
  if (other === undefined) return reported;
  if (Math.abs(other.last - last) > 1e-12 * last) throw new Error(`LibreOffice gives ${other.last} in the last cell, Stillwall ${last}`);
  const theirs = median(other.seconds);
  return [
    ...reported,
    { what: "100,000 cells of the polynomial typed by hand, calculated by LibreOffice", measured: theirs, unit: "s" },
    { what: "Stillwall cells against cells typed by hand in LibreOffice", measured: engine / theirs, unit: "×", note: "reported, no goal" },
  ];
}

function hardRecalculations(book: Workbook): number[] {
  return quietly(() => {
    const engine = nodeEngine();
    const sheetName = internalSheetNames(book);
    const model = buildModel(
      engine,
      book,
      planCells(book, bookContext(book, engine.functions), engine, { volatile: false, sheetName }),
      sheetName,
    );
    return Array.from({ length: 5 }, () => {
      const start = performance.now();
      model.dispatch("EVALUATE_CELLS");
      return (performance.now() - start) / 1000;
    });
  });
}
