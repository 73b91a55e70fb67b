/** What is said about a recalculation: lines for the reader, and the whole as JSON. */
import type { BookValue, Workbook } from "../../book/workbook";
import type { CellPlace, Recalculated, Unevaluated } from "../../recalc/outcome";
import { quotedSheet } from "../../book/write/names";
import type { ChangedCell, Comparison, FailedCell } from "./compare";
import { isError } from "../../book/differ";

export interface RecalcReport {
  readonly input: string;
  readonly output: string;
  readonly exit: 0 | 1;
  readonly counts: Readonly<Record<"formulas" | "calculated" | "written" | "changed" | "failed" | "unevaluated" | "stale", number>>;
  readonly changed: readonly ChangedCell[];
  readonly lastDigits: readonly ChangedCell[];
  readonly failed: readonly FailedCell[];
  readonly unevaluated: readonly Unevaluated[];
  readonly stale: readonly CellPlace[];
  readonly volatileKept: readonly CellPlace[];
  readonly notes: readonly string[];
}

/** Puts the report together. The exit status is 1 when a cell failed, could not be evaluated or may be out of date. */
export function reportOf(
  files: { input: string; output: string },
  workbook: Workbook,
  calculated: Recalculated,
  comparison: Comparison,
): RecalcReport {
  const { changed, lastDigits, failed, changes } = comparison;
  const unevaluated = [...calculated.unevaluated, ...unreadCells(workbook, calculated)];
  const { stale, volatileKept, outcomes } = calculated;
  const formulas = workbook.sheets.reduce(
    (sum, sheet) => sum + [...sheet.cells.values()].filter((cell) => cell.formula !== undefined).length,
    0,
  );
  return {
    ...files,
    exit: failed.length + unevaluated.length + stale.length > 0 ? 1 : 0,
    counts: {
      formulas,
      calculated: outcomes.length,
      written: changes.length,
      changed: changed.length,
      failed: failed.length,
      unevaluated: unevaluated.length,
      stale: stale.length,
    },
    changed,
    lastDigits,
    failed,
    unevaluated,
    stale,
    volatileKept,
    notes: [...workbook.notes, ...unboundNames(workbook, calculated)],
  };
}

/** Excel knows an add-in function in a file only as `_xldudf_STILL_…`; the formula itself is not ours to rewrite here. */
function unboundNames(workbook: Workbook, { outcomes }: Recalculated): string[] {
  const sheets = new Map(workbook.sheets.map((sheet) => [sheet.name, sheet.cells]));
  const plain = outcomes.filter(
    ({ stillwall, sheet, address }) => stillwall && /STILL\./i.test(sheets.get(sheet)?.get(address)?.formula ?? ""),
  );
  const [first] = plain;
  if (!first) return [];
  return [
    `${plural(plain.length, "formula")} such as ${placeText(first)} name the function as STILL. and not as _xldudf_STILL_; Excel will show #NAME? there until the cell is entered again with the add-in`,
  ];
}

/** Cells the reader could not read are out of reach of the engine; they are named all the same, once. */
function unreadCells(workbook: Workbook, { unevaluated }: Recalculated): Unevaluated[] {
  const named = new Set(unevaluated.map((cell) => placeText(cell)));
  return workbook.sheets.flatMap((sheet) =>
    Array.from(sheet.cells, ([address, { unread }]) => ({ sheet: sheet.name, address, reason: unread ?? "" })).filter(
      (cell) => cell.reason !== "" && !named.has(placeText(cell)),
    ),
  );
}

const placeText = ({ sheet, address }: CellPlace) => `${quotedSheet(sheet)}!${address}`;

/** A value as one reads it in a line: texts in quotes, errors by their code. */
export function valueText(value: BookValue): string {
  if (value === null) return "empty";
  if (typeof value === "string") return JSON.stringify(value);
  if (typeof value === "boolean") return value ? "TRUE" : "FALSE";
  return isError(value) ? value.error : String(value).replace("e", "E");
}

/** Lines shown of each list. */
const MOST_LINES = 20;

/** The report in lines. */
export function reportLines(report: RecalcReport): string[] {
  const { counts, changed, lastDigits, failed, unevaluated, stale, volatileKept, notes } = report;
  return [
    `${report.output}: ${plural(counts.calculated, "formula cell")} of ${counts.formulas} calculated, ${plural(counts.changed, "cell")} changed`,
    ...listed(changed, (cell) => `${placeText(cell)}  ${valueText(cell.old)} -> ${valueText(cell.new)}`),
    ...(lastDigits.length ? [`${plural(lastDigits.length, "cell")} written anew that differ beyond the 15th digit only`] : []),
    ...section(failed, "failed", failedLine),
    ...section(unevaluated, "could not be evaluated and kept the value of the file", (cell) => `${placeText(cell)}  ${cell.reason}`),
    ...section(stale, "may be out of date, depending on such cells", placeText),
    ...section(volatileKept, "kept the value of the file, for NOW, TODAY and random numbers are held (--now lets them go)", placeText),
    ...notes.map((note) => `Note: ${note}`),
  ];
}

function failedLine(cell: FailedCell): string {
  const reason = cell.message === "" ? "" : `  ${cell.message}`;
  return `${placeText(cell)}  ${cell.error}${reason}${cell.kept ? " (a built-in function; the value of the file is kept)" : ""}`;
}

function section<T>(items: readonly T[], title: string, line: (item: T) => string): string[] {
  return items.length === 0 ? [] : [`${plural(items.length, "cell")} ${title}:`, ...listed(items, line)];
}

function listed<T>(items: readonly T[], line: (item: T) => string): string[] {
  const shown = items.slice(0, MOST_LINES).map((item) => `  ${line(item)}`);
  const rest = items.length - shown.length;
  return rest > 0 ? [...shown, `  and ${rest} more (all of them with --report FILE.json)`] : shown;
}

const plural = (count: number, noun: string): string => `${count} ${noun}${count === 1 ? "" : "s"}`;
