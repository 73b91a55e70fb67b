/** Compares what an example promises with what came: the grammar of `@example formula -> result`. */
import type { Outcome, OutcomeCell } from "../../src/recalc/evaluate";

/** The sentence that says why the two differ, or undefined if the promise is kept. */
export function broken(promise: string, outcome: Outcome): string | undefined {
  if (promise.startsWith("#")) return errorFault(promise, outcome);
  if ("error" in outcome) return `gave ${outcome.error.code} ${outcome.error.message}`;
  const rounded = promise.startsWith("~");
  const wanted = rowsOf(promise.replace(/^~\s*/, ""));
  const came = Array.isArray(outcome.value) ? (outcome.value as readonly (readonly OutcomeCell[])[]) : [[outcome.value as OutcomeCell]];
  const sameShape = came.length === wanted.length && came.every((row, at) => row.length === wanted[at]?.length);
  const kept = sameShape && came.every((row, i) => row.every((cell, j) => agrees(wanted[i]?.[j] ?? "", cell, rounded)));
  return kept ? undefined : `gave ${JSON.stringify(outcome.value)}`;
}

/** `#VALUE! sentence`: the code, and the sentence or its beginning. */
function errorFault(promise: string, outcome: Outcome): string | undefined {
  const [, code = "", sentence = ""] = /^(#\S+)\s*(.*?)\s*(?:…|\.\.\.)?$/.exec(promise) ?? [];
  if (!("error" in outcome)) return `gave ${JSON.stringify(outcome.value)}`;
  const kept = outcome.error.code === code && outcome.error.message.startsWith(sentence);
  return kept ? undefined : `gave ${outcome.error.code} ${outcome.error.message}`;
}

/** Rows of literals of `{1,"a";TRUE,2}`, or the one literal. */
export function rowsOf(text: string): string[][] {
  const inside = /^\{([^]*)\}$/.exec(text.trim())?.[1];
  if (inside === undefined) return [[text.trim()]];
  return splitOutsideQuotes(inside, ";").map((row) => splitOutsideQuotes(row, ",").map((cell) => cell.trim()));
}

function splitOutsideQuotes(text: string, separator: string): string[] {
  const parts = [""];
  let quoted = false;
  for (const letter of text) {
    if (letter === '"') quoted = !quoted;
    if (letter === separator && !quoted) parts.push("");
    else parts[parts.length - 1] += letter;
  }
  return parts;
}

function agrees(wanted: string, cell: OutcomeCell, rounded: boolean): boolean {
  if (wanted.startsWith('"')) return cell === wanted.slice(1, -1).replaceAll('""', '"');
  if (wanted === "TRUE" || wanted === "FALSE") return cell === (wanted === "TRUE");
  if (wanted.startsWith("#")) return typeof cell === "object" && cell.error.code === wanted;
  if (typeof cell !== "number" || !/^[-+]?\d+(\.\d+)?(e[-+]?\d+)?$/i.test(wanted)) return false;
  return rounded ? roundsTo(wanted, cell) : cell.toPrecision(15) === Number(wanted).toPrecision(15);
}

/** Half a unit of the last printed digit, and the rounding of the comparison itself. */
function roundsTo(printed: string, value: number): boolean {
  const [mantissa = "", exponent = "0"] = printed.toLowerCase().split("e");
  const decimals = mantissa.split(".")[1]?.length ?? 0;
  const unit = 10 ** (Number(exponent) - decimals);
  return Math.abs(value - Number(printed)) <= unit / 2 + 1e-13 * Math.abs(value);
}
