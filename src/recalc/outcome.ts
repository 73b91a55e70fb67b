import type { BookValue, Workbook } from "../book/workbook";

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

export interface CellPlace {
  readonly sheet: string;
  readonly address: string;
}

export interface RecalculateOptions {
  /** Clock for NOW and TODAY, and leave to draw RAND afresh. Left out: cells that call them keep the values of the file, and the rest is calculated from those. */
  readonly now?: Date;
}

export interface Recalculated {
  readonly outcomes: readonly CellOutcome[];
  readonly unevaluated: readonly Unevaluated[];
  /** Formula cells that depend on an unevaluated one, themselves not among `outcomes`: their cached values stay and may be out of date. */
  readonly stale: readonly CellPlace[];
  /** Cells that call NOW, TODAY, RAND … and kept the values of the file because no clock was given. */
  readonly volatileKept: readonly CellPlace[];
}

/** The engine as the command sees it; rejects only when nothing at all could be calculated. */
export type Recalculate = (workbook: Workbook, options: RecalculateOptions) => Promise<Recalculated>;
