import { evaluateFormulas, type Outcome } from "../recalc/evaluate";
import { printOutcome } from "./outcome-text";
import { writeOut } from "./write-out";

/** Text of `stillwall eval --help`. */
export const evalHelp = `Usage: stillwall eval [--json] [FORMULA...]

Evaluates formulas without a workbook. A formula may mix Stillwall and built-in functions and array constants;
the "=" in front may be left out. Without FORMULA, one formula a line is read from standard input; blank lines
are passed over. Results come in the order of the formulas.

  --json   one JSON object a line: {"formula", "value"} or {"formula", "error": {"code", "message"}};
           a result of several cells is rows of values, with {"error": ...} in place of a failed cell
  --       what follows is a formula even if it starts with "--"
  --help   this text

Without --json a number is printed with as many digits as it takes to get the same number back, a result of
several cells as lines of values with tabs between them, an error as its code and its sentence.

Codes are Excel's; #ERROR! stands for a text that is no formula, or one that cannot be evaluated without cells.

Exit status: 0 every formula gave a value, 1 one or more formulas or cells failed, 2 wrong usage.
`;

interface EvalArguments {
  readonly json: boolean;
  readonly help: boolean;
  readonly formulas: readonly string[];
  /** An option that does not exist. */
  readonly unknown?: string;
}

/** `stillwall eval`. @returns the exit status */
export async function evaluate(args: readonly string[], input: NodeJS.ReadableStream = process.stdin): Promise<number> {
  const { json, help, formulas, unknown } = readArguments(args);
  if (unknown !== undefined) {
    process.stderr.write(`stillwall eval: unknown option ${unknown}\n\n${evalHelp}`);
    return 2;
  }
  if (help) {
    await writeOut(evalHelp);
    return 0;
  }
  if (formulas.length > 0) return printAll(formulas, json);
  let status = 0;
  for await (const lines of linesOf(input)) status = Math.max(status, await printAll(lines, json));
  return status;
}

function readArguments(args: readonly string[]): EvalArguments {
  const end = args.indexOf("--");
  const before = end < 0 ? args : args.slice(0, end);
  const options = before.filter((arg) => /^--[a-z][a-z-]*$/.test(arg) || arg === "-h");
  const formulas = [...before.filter((arg) => !options.includes(arg)), ...(end < 0 ? [] : args.slice(end + 1))];
  return {
    json: options.includes("--json"),
    help: options.includes("--help") || options.includes("-h"),
    unknown: options.find((option) => !["--json", "--help", "-h"].includes(option)),
    formulas,
  };
}

/** Evaluates and prints one batch. @returns 1 if a formula or a cell failed */
async function printAll(formulas: readonly string[], json: boolean): Promise<number> {
  const outcomes = evaluateFormulas(formulas);
  const lines = outcomes.map((outcome) => (json ? JSON.stringify(outcome) : printOutcome(outcome)));
  if (lines.length > 0) await writeOut(`${lines.join("\n")}\n`);
  return outcomes.some(failed) ? 1 : 0;
}

function failed(outcome: Outcome): boolean {
  if ("error" in outcome) return true;
  return Array.isArray(outcome.value) && outcome.value.some((row) => (row as unknown[]).some((cell) => typeof cell === "object"));
}

/** Lines that hold a formula, in the batches in which they arrive, so that who writes line by line is answered line by line. */
async function* linesOf(input: NodeJS.ReadableStream): AsyncGenerator<string[]> {
  input.setEncoding("utf8");
  let rest = "";
  for await (const chunk of input) {
    const lines = (rest + String(chunk)).split(/\r?\n/);
    rest = lines.pop()!;
    yield lines.filter(isFormula);
  }
  yield [rest].filter(isFormula);
}

function isFormula(line: string): boolean {
  return line.trim() !== "";
}
