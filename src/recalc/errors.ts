import type { EngineLibrary } from "./library";

/** Error values a cell may hold, as Excel writes them, with the number ERROR.TYPE gives. */
export const errorNumbers: ReadonlyMap<string, number> = new Map([
  ["#NULL!", 1],
  ["#DIV/0!", 2],
  ["#VALUE!", 3],
  ["#REF!", 4],
  ["#NAME?", 5],
  ["#NUM!", 6],
  ["#N/A", 7],
  ["#GETTING_DATA", 8],
  ["#SPILL!", 9],
  ["#CONNECT!", 10],
  ["#BLOCKED!", 11],
  ["#UNKNOWN!", 12],
  ["#FIELD!", 13],
  ["#CALC!", 14],
]);

/** The engine's own codes for a failure of its own: never values of a cell. */
export const engineFailures: ReadonlySet<string> = new Set(["#BAD_EXPR", "#CYCLE"]);

/** True for a text that the engine, or Excel, takes for an error value. */
export function isErrorCode(value: unknown): value is string {
  return typeof value === "string" && value.startsWith("#") && (errorNumbers.has(value) || engineFailures.has(value));
}

/** What a cell says where the engine itself stumbled, in place of its maker's address. */
const stumbled = "The spreadsheet engine failed at this formula.";

/** True for an error that is the engine's failure and not the value of a formula. */
export function isEngineFailure(code: string, message = ""): boolean {
  return engineFailures.has(code) || message.startsWith(stumbled) || message.includes("call stack size exceeded");
}

/**
 * Excel's names for the two errors that the engine calls otherwise. Without it #VALUE! and #REF! are plain texts to IFERROR.
 * Must run before the first workbook is built.
 */
export function mendErrors(library: EngineLibrary): void {
  const { errorTypes } = library.registries;
  for (const own of ["#ERROR", "#REF"]) errorTypes.delete(own);
  for (const code of errorNumbers.keys()) errorTypes.add(code);
  const names = library.CellErrorType as unknown as Record<string, string>;
  names.GenericError = "#VALUE!";
  names.InvalidReference = "#REF!";
  library.setTranslationMethod(
    ((text: string) => (text.startsWith("An unexpected error occurred") ? stumbled : text)) as never,
    () => true,
  );
}
