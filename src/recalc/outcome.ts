import type { BookValue } from "../book/workbook";

/** What became of one formula cell when a workbook was calculated. */
export interface CellOutcome {
  readonly sheet: string;
  readonly address: string;
  /** New value; for a formula that fills a range, of its first cell. */
  readonly value: BookValue;
  /** Rows of a spilled result, first cell included. */
  readonly spill?: readonly (readonly BookValue[])[];
  /** True if the formula (not its precedents) calls a Stillwall function. */
  readonly stillwall: boolean;
}

/** A formula that could not be evaluated: its cached value stays, and everything that depends on it is marked stale. */
export interface Unevaluated {
  readonly sheet: string;
  readonly address: string;
  /** One sentence: which function or construct is not known here. */
  readonly reason: string;
}

export interface Recalculated {
  readonly outcomes: readonly CellOutcome[];
  readonly unevaluated: readonly Unevaluated[];
}
