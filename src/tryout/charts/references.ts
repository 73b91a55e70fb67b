/**
 * The ranges that a formula of a chart stands for: one range, several in brackets, or a name of the workbook for them. Anything that must be
 * calculated to know its cells (OFFSET, spilled ranges), other workbooks and ranges across sheets are not followed.
 */
import type { BookContext } from "../../book/formula";
import { printReference, readReference, type Reference } from "../../book/formula/references";

type Book = Pick<BookContext, "nameFor" | "sheetNamed">;

/** Ranges with their sheet: `'Test series'!$A$4:$A$8`; undefined for what is not followed. `naming` gives the name by which a sheet is asked for. */
export function rangesOf(formula: string, book: Book, naming: (sheet: string) => string): string[] | undefined {
  return follow(formula, book, 0)?.map((reference) => printReference({ ...reference, sheet: naming(reference.sheet) }));
}

function follow(formula: string, book: Book, names: number): Reference[] | undefined {
  const ranges: Reference[] = [];
  for (const part of parts(formula)) {
    const found = plain(part, book) ?? (names < MOST_NAMES ? named(part, book, names) : undefined);
    if (!found) return undefined;
    ranges.push(...found);
  }
  return ranges.length > 0 ? ranges : undefined;
}

/** A name may stand for another; not for itself. */
const MOST_NAMES = 8;

/** `(A!A1,'b,c'!B2)` -> its two ranges; brackets belong to a list only. */
function parts(formula: string): string[] {
  const list = /^\((.*)\)$/s.exec(formula.trim());
  return list ? ((list[1] as string).match(/(?:'(?:[^']|'')*'|[^',])+/g) ?? []) : [formula.trim()];
}

function plain(text: string, book: Book): Reference[] | undefined {
  try {
    const reference = readReference(text);
    const sheet = book.sheetNamed(reference.sheet);
    return sheet === undefined ? undefined : [{ ...reference, sheet }];
  } catch {
    return undefined;
  }
}

/** `Sheet1!Pressures`, `[0]!Pressures`, `Pressures`: the name local to that sheet, or the workbook's. */
function named(text: string, book: Book, names: number): Reference[] | undefined {
  const mark = text.lastIndexOf("!");
  const scope = text
    .slice(0, Math.max(mark, 0))
    .replace(/^'(.*)'$/s, "$1")
    .replaceAll("''", "'");
  const definition = book.nameFor(text.slice(mark + 1), scope);
  return definition && follow(definition.formula, book, names + 1);
}
