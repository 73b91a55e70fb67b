/** Value of a cell from its type attribute and content. */
import { refuse } from "../../core/refusal";
import { fromCellText } from "../xml/escape";
import type { BookValue } from "../workbook";

export interface ValueSource {
  /** Attribute `t`; numbers as a rule have none. */
  readonly type: string | undefined;
  /** Content of `<v>`; undefined if there is none. */
  readonly content: string | undefined;
  /** Text of `<is>`. */
  readonly inline: string | undefined;
}

/** What a reader needs to know beyond the cell itself. */
export interface ValueContext {
  readonly strings: readonly string[];
  readonly date1904: boolean;
  /** `Sheet1!B2`, for the sentence of a refusal. */
  where(): string;
}

export function readValue(source: ValueSource, context: ValueContext): BookValue {
  const { type = "n", content } = source;
  if (type === "inlineStr") return source.inline ?? "";
  if (type === "str") return content === undefined ? "" : fromCellText(content);
  if (content === undefined || content === "") return null;
  if (type === "s") return sharedString(content, context);
  if (type === "b") return content.trim() === "1" || content.trim().toLowerCase() === "true";
  if (type === "e") return { error: content.trim() };
  if (type === "d") return serialOf(content.trim(), context);
  const number = Number(content);
  if (!Number.isFinite(number)) return refuse(`The cell ${context.where()} holds "${content}" where a number belongs`);
  return number;
}

function sharedString(content: string, context: ValueContext): string {
  return (
    context.strings[Number(content)] ?? refuse(`The cell ${context.where()} names the shared text ${content}, of ${context.strings.length}`)
  );
}

const DAY = 86_400_000;

/** A date of the strict format, `2026-03-01T12:00:00`, as a day number of the workbook's calendar. */
function serialOf(content: string, context: ValueContext): number {
  const time = /^\d\d:/.test(content)
    ? Date.parse(`1970-01-01T${content}Z`)
    : Date.parse(/T.*(Z|[+-]\d\d:?\d\d)$/.test(content) || !content.includes("T") ? content : `${content}Z`);
  if (Number.isNaN(time)) return refuse(`The cell ${context.where()} holds "${content}" where a date belongs`);
  if (/^\d\d:/.test(content)) return time / DAY;
  const days = (time - Date.UTC(1904, 0, 1)) / DAY;
  if (context.date1904) return days;
  // Day 60 of the 1900 calendar is the 29 February 1900 that never was, so earlier days count from one day later.
  const serial = days + 1462;
  return serial < 61 ? serial - 1 : serial;
}
