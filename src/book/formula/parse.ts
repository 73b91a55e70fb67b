import { parse, tokenize, type Token } from "@borgar/fx/xlsx";
import { FormulaProblem, fail } from "./problem";
import type { FunctionNames } from "./function-names";
import type { Expression } from "./tree";

/** A formula longer than Excel takes is refused before it is read. */
const longest = 32767;

const textOrQuotedSheetOrDamage = /"(?:[^"]|"")*"|'(?:[^']|'')*'|\[\d+\]!(?=_xldudf_STILL_)/gi;

/**
 * Reads a formula, with or without `=`, in the dialect of the file format (which is also what is typed): unary minus binds closer
 * than the power, so `-2^2` is 4. Function names come out canonical (`STILL.CV.AT`, `XLOOKUP`).
 * @throws FormulaProblem with the reader's own words where the text is not a formula
 */
export function readFormula(formula: string, names: FunctionNames): Expression {
  if (formula.length > longest) fail("syntax", `The formula has ${formula.length} characters; Excel takes ${longest}`);
  try {
    return parse(tokens(formula, names));
  } catch (reason) {
    if (reason instanceof FormulaProblem) throw reason;
    return fail("syntax", unreadable(formula, reason));
  }
}

function tokens(formula: string, names: FunctionNames): Token[] {
  const text = formula.trimStart().startsWith("=") ? formula : `=${formula}`;
  const read = tokenize(text.replace(textOrQuotedSheetOrDamage, keepUnlessDamage), { mergeRefs: true });
  return joinLostReferences(read).map((token) => (token.type === "func" ? { ...token, value: names.canonical(token.value) } : token));
}

/** `[2]!_xldudf_STILL_…` is left by programs that took the add-in for another workbook. */
function keepUnlessDamage(part: string): string {
  return part.startsWith("[") ? "" : part;
}

/** `Sheet1!#REF!` comes as three tokens; it is the lost reference all the same. */
function joinLostReferences(read: readonly Token[]): Token[] {
  const joined: Token[] = [];
  for (const token of read) {
    const lost = token.type === "error" && token.value.toUpperCase() === "#REF!";
    if (lost && joined.at(-1)?.value === "!" && joined.at(-2)?.type.startsWith("context")) joined.splice(-2);
    joined.push(token);
  }
  return joined;
}

function unreadable(formula: string, reason: unknown): string {
  if (reason instanceof RangeError) return "The formula is nested too deeply to be read";
  const shown = formula.length > 80 ? `${formula.slice(0, 77)}...` : formula;
  return `"${shown}" cannot be read as a formula${reason instanceof Error ? `: ${reason.message}` : ""}`;
}
