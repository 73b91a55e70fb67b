import { FormulaProblem, noBook, toEngine, type ProblemKind } from "../book/formula";
import type { BookError, BookValue } from "../book/workbook";
import { checkCalls } from "./compile";
import type { Engine } from "./engine";
import { isEngineFailure } from "./errors";
import type { EngineResult } from "./library";
import { nodeEngine } from "./node-engine";
import { quietly } from "./quiet";
import { bookRows } from "./values";

/** The error a formula came to; the message says why. */
export interface OutcomeError {
  readonly code: string;
  readonly message: string;
}

export type OutcomeCell = number | string | boolean | { readonly error: OutcomeError };

/** What one formula on its own came to: a value, rows of values, or an error. */
export type Outcome =
  | { readonly formula: string; readonly value: OutcomeCell | readonly (readonly OutcomeCell[])[] }
  | { readonly formula: string; readonly error: OutcomeError };

/** Codes for formulas that no cell would take, beside Excel's own for results. */
const problemCodes: Record<ProblemKind, string> = { syntax: "#ERROR!", unknown: "#NAME?", arguments: "#VALUE!", unsupported: "#ERROR!" };

let sheet: { engine: Engine; evaluate: (text: string) => EngineResult } | undefined;

/** Evaluates formulas one by one, without cells: each may mix Stillwall and built-in functions and array constants. `=` may be left out. */
export function evaluateFormulas(formulas: readonly string[], engine: Engine = nodeEngine()): Outcome[] {
  return quietly(() => formulas.map((formula) => evaluateFormula(formula, engine)));
}

function evaluateFormula(formula: string, engine: Engine): Outcome {
  try {
    return outcome(formula, bookRows(emptySheet(engine)(prepared(formula, engine))));
  } catch (reason) {
    if (reason instanceof FormulaProblem) return { formula, error: { code: problemCodes[reason.kind], message: reason.message } };
    if (reason instanceof RangeError)
      return { formula, error: { code: "#ERROR!", message: "The formula is nested too deeply to be evaluated" } };
    throw reason;
  }
}

function prepared(formula: string, { functions, library, door }: Engine): string {
  const { text, references, calls } = toEngine(formula, noBook(functions));
  if (references.length > 0 || calls.some(({ name }) => name === "INDIRECT"))
    throw new FormulaProblem("unsupported", "The formula refers to cells, and there are none here");
  const problem = checkCalls(library, calls);
  if (problem) throw problem;
  return door.admit(text);
}

function outcome(formula: string, rows: readonly (readonly BookValue[])[]): Outcome {
  const [only] = rows.length === 1 && rows[0]!.length === 1 ? rows[0]! : [];
  if (only !== undefined && isError(only)) return { formula, error: described(only) };
  return { formula, value: only !== undefined ? outcomeCell(only) : rows.map((row) => row.map(outcomeCell)) };
}

/** A blank counts as 0, as in a cell. */
function outcomeCell(value: BookValue): OutcomeCell {
  if (value === null) return 0;
  return isError(value) ? { error: described(value) } : value;
}

function isError(value: BookValue): value is BookError {
  return typeof value === "object" && value !== null;
}

function described({ error, message = "" }: BookError): OutcomeError {
  return { code: isEngineFailure(error, message) ? "#ERROR!" : error, message };
}

/** One empty sheet serves every formula. */
function emptySheet(engine: Engine): (text: string) => EngineResult {
  if (sheet?.engine !== engine) {
    const model = new engine.library.Model();
    const sheetId = model.getters.getActiveSheetId();
    sheet = { engine, evaluate: (text) => model.getters.evaluateFormulaResult(sheetId, text) as EngineResult };
  }
  return sheet.evaluate;
}
