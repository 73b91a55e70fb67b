/**
 * From a calculation to what is written and what is reported. Pure: no file, no clock.
 *
 * A built-in function that turns into an error keeps the value of the file and is reported, because the fault may lie in
 * this program's own version of the function. It does not where the error came in from a cell it reads: then the value
 * in the file is no longer true, and the error is written.
 */
import { rangeOf } from "../../book/address";
import type { BookCell, BookSheet, BookValue, CellChange, Workbook } from "../../book/workbook";
import type { CellOutcome, Recalculated } from "../../recalc/outcome";
import { blockOf, type Block } from "./block";
import { differs, isError, isVisible } from "../../book/differ";
import { inheritedErrors, type Reads } from "./inherited";

export interface ChangedCell {
  readonly sheet: string;
  readonly address: string;
  readonly old: BookValue;
  readonly new: BookValue;
}

export interface FailedCell {
  readonly sheet: string;
  readonly address: string;
  readonly error: string;
  /** Why; empty where the calculation gave no reason. */
  readonly message: string;
  /** True if the value of the file was kept. */
  readonly kept: boolean;
}

export interface Comparison {
  readonly changes: readonly CellChange[];
  /** Written cells whose difference is seen in 15 digits. */
  readonly changed: readonly ChangedCell[];
  /** Written cells that differ in the last digits only. */
  readonly lastDigits: readonly ChangedCell[];
  readonly failed: readonly FailedCell[];
}

interface Candidate {
  readonly cell: BookCell;
  readonly outcome: CellOutcome;
  readonly block: Block;
  /** True if a built-in function gives an error where the file has a value. */
  readonly newlyFailed: boolean;
}

/** Compares a calculation with the file. `reads` gives the ranges a formula cell reads. */
export function compare(workbook: Workbook, { outcomes }: Recalculated, reads: Reads): Comparison {
  const sheets = new Map(workbook.sheets.map((sheet) => [sheet.name, sheet]));
  const candidates = outcomes.flatMap((outcome) => candidateOf(sheets, outcome));
  const inherited = inheritedErrors(workbook, candidates.map(standing), reads);
  const result = { changes: [] as CellChange[], changed: [] as ChangedCell[], lastDigits: [] as ChangedCell[], failed: [] as FailedCell[] };
  for (const candidate of candidates) {
    const kept = candidate.newlyFailed && !inherited.has(placeKey(candidate.outcome));
    if (!kept) write(result, candidate);
    result.failed.push(...failures(candidate, kept));
  }
  return result;
}

const placeKey = ({ sheet, address }: { sheet: string; address: string }) => `${sheet}!${address}`;

function candidateOf(sheets: ReadonlyMap<string, BookSheet>, outcome: CellOutcome): Candidate[] {
  const sheet = sheets.get(outcome.sheet);
  const cell = sheet?.cells.get(outcome.address);
  if (!sheet || cell?.formula === undefined) return [];
  const block = blockOf(sheet, cell, outcome);
  const newlyFailed = !outcome.stillwall && block.cells.some(({ old, fresh }) => isError(fresh) && !isError(old) && old !== null);
  return [{ cell, outcome, block, newlyFailed }];
}

/** What the search for inherited errors needs: the errors a formula gives, and whether they are in doubt. */
function standing({ outcome, block, newlyFailed }: Candidate) {
  const errors = block.cells.flatMap(({ address, fresh }) => [{ address, error: isError(fresh) ? fresh.error : undefined }]);
  return { sheet: outcome.sheet, address: outcome.address, cells: errors, doubtful: newlyFailed };
}

function write(result: { changes: CellChange[]; changed: ChangedCell[]; lastDigits: ChangedCell[] }, { outcome, block }: Candidate): void {
  const { sheet, address: anchor, stillwall } = outcome;
  const array = block.resized && rangeOf(block.resized);
  block.cells.forEach(({ address, old, fresh }) => {
    const isAnchor = address === anchor;
    const differing = differs(old, fresh, stillwall);
    if (!differing && !(isAnchor && array !== undefined)) return;
    result.changes.push({ sheet, address, value: differing ? fresh : old, ...(isAnchor && array !== undefined ? { array } : {}) });
    if (differing) (isVisible(old, fresh) ? result.changed : result.lastDigits).push({ sheet, address, old, new: fresh });
  });
}

/** A Stillwall cell fails whenever it holds an error; a built-in one only if it did not before, for an error may be meant. */
function failures({ outcome, block, newlyFailed }: Candidate, kept: boolean): FailedCell[] {
  if (!outcome.stillwall && !newlyFailed) return [];
  const failed: FailedCell[] = [];
  for (const { address, old, fresh } of block.cells) {
    if (!isError(fresh) || (!outcome.stillwall && isError(old))) continue;
    failed.push({ sheet: outcome.sheet, address, error: fresh.error, message: fresh.message ?? "", kept });
  }
  return failed;
}
