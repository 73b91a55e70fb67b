/**
 * Why a formula cannot be carried over:
 *   "syntax"       not a formula that Excel would take
 *   "unknown"      a function, name, table or sheet that is not known here
 *   "arguments"    a known function with too few or too many arguments
 *   "unsupported"  a construct that is read but cannot be evaluated here (another workbook, unions, …)
 * It never becomes a cell's value by itself: the cell keeps what it had, and the sentence is reported.
 */
export type ProblemKind = "syntax" | "unknown" | "arguments" | "unsupported";

export class FormulaProblem {
  constructor(
    readonly kind: ProblemKind,
    readonly message: string,
  ) {}

  toString(): string {
    return this.message;
  }
}

/** Throws a problem; the sentence names the part of the formula that is meant. */
export function fail(kind: ProblemKind, message: string): never {
  throw new FormulaProblem(kind, message);
}
