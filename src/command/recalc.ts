/**
 * `stillwall recalc`: reads a workbook, calculates it, and writes a copy in which only what changed is new. The engine and
 * the two outputs are given by the caller, so that the verb can be tried without them.
 */
import { bookContext, FunctionNames, toEngine } from "../book/formula";
import { readPackage, readWorkbook, patch } from "../book";
import type { BookCell, Workbook } from "../book/workbook";
import { Refusal, refuse } from "../core/refusal";
import { registry } from "../functions/registry";
import type { Recalculate, Recalculated } from "../recalc/outcome";
import { readArguments, RECALC_USAGE, type RecalcArguments } from "./recalc/arguments";
import { compare } from "./recalc/compare";
import { outputOf, readInput, sameFile, writeWhole } from "./recalc/files";
import type { Reads, SheetArea } from "./recalc/inherited";
import { reportLines, reportOf, type RecalcReport } from "./recalc/report";

export interface RecalcHost {
  readonly recalculate: Recalculate;
  /** One line for the standard output. */
  print(line: string): void;
  /** One line for the standard error. */
  complain(line: string): void;
}

/** The real engine, loaded when the first workbook has been read, and the process's own outputs. */
export const processHost: RecalcHost = {
  recalculate: async (workbook, options) => (await import("../recalc/workbook")).recalculateWorkbook(workbook, options),
  print: (line) => void process.stdout.write(`${line}\n`),
  complain: (line) => void process.stderr.write(`stillwall: ${line}\n`),
};

/** Runs the verb on the arguments after the word `recalc`; gives the exit status. */
export async function recalc(args: readonly string[], host: RecalcHost = processHost): Promise<0 | 1 | 2> {
  if (args.includes("--help") || args.includes("-h")) {
    host.print(RECALC_USAGE);
    return 0;
  }
  try {
    const report = await run(readArguments(args), host.recalculate);
    reportLines(report).forEach((line) => host.print(line));
    return report.exit;
  } catch (error) {
    if (!(error instanceof Refusal)) throw error;
    host.complain(error.message);
    return 2;
  }
}

async function run(args: RecalcArguments, recalculate: Recalculate): Promise<RecalcReport> {
  const bytes = readInput(args.input);
  const output = outputOf(args);
  if (args.report !== undefined && [args.input, output].some((file) => sameFile(file, args.report as string)))
    refuse(`${args.report} cannot be both workbook and report`);
  const pkg = readPackage(bytes);
  const workbook = readWorkbook(pkg);
  const calculated = await calculate(workbook, args, recalculate);
  const comparison = compare(workbook, calculated, readsOf(workbook));
  const result = comparison.changes.length === 0 ? bytes : patch(pkg, comparison.changes);
  const report = reportOf({ input: args.input, output }, workbook, calculated, comparison);
  writeWhole([
    ...(args.inPlace && result === bytes ? [] : [{ file: output, content: result }]),
    ...(args.report === undefined ? [] : [{ file: args.report, content: `${JSON.stringify(report, null, 1)}\n` }]),
  ]);
  return report;
}

async function calculate(workbook: Workbook, { now }: RecalcArguments, recalculate: Recalculate): Promise<Recalculated> {
  try {
    return await recalculate(workbook, now ? { now: new Date() } : {});
  } catch (error) {
    if (error instanceof Refusal) throw error;
    return refuse(`The workbook could not be calculated: ${error instanceof Error ? error.message : String(error)}`);
  }
}

/** The ranges a formula reads, from the translator that also feeds the engine. */
function readsOf(workbook: Workbook): Reads {
  const context = bookContext(workbook, new FunctionNames(registry.keys()));
  return (sheet, cell) => {
    try {
      return referencesOf(sheet, cell, context);
    } catch {
      // A formula the translator cannot read has no known precedents; its error then counts as not inherited.
      return [];
    }
  };
}

function referencesOf(sheet: string, cell: BookCell, context: ReturnType<typeof bookContext>): SheetArea[] {
  const place = { sheet, row: cell.row, column: cell.column };
  const { references } = toEngine(cell.formula ?? "", context, { place });
  return references.map(({ sheet: named, top, left, bottom, right }) => ({
    sheet: named || sheet,
    top: top ?? 0,
    left: left ?? 0,
    bottom: bottom ?? Infinity,
    right: right ?? Infinity,
  }));
}
