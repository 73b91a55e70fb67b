/**
 * One cell element of a sheet, rewritten: type, value, value metadata, and the formula where a new one is given. Every
 * other attribute, child and blank of the element stays as written.
 */
import type { BookValue } from "../workbook";
import { needsSpace, xmlAttribute, xmlText } from "../xml/escape";
import { attributesOf, closingTag, elements, localName, nextTag, withAttributes, type Tag } from "../xml/lexer";

/** What is to become of one cell. A key left out leaves that side of the cell alone. */
export interface CellEdit {
  readonly value?: BookValue;
  /** null removes the formula; text sets a new one. */
  readonly formula?: string | null;
  /** Range of the array formula: with `formula` a new array formula, without it the new range of the one in the file. */
  readonly array?: string;
  /** Cell metadata index of a new dynamic array. */
  readonly metadata?: string;
  /** True if the cell is filled by an array formula of another cell. */
  readonly filled?: boolean;
}

export interface CellWriter {
  /** Prefix of the sheet's own elements with its colon, or nothing. */
  readonly prefix: string;
  stored(value: BookValue, computed: boolean): { readonly type: string | null; readonly element: string };
}

/** The cell element as it reads after the edit. */
export function editedCell(cell: string, edit: CellEdit, writer: CellWriter): string {
  const tag = nextTag(cell, 0) as Tag;
  const close = closingTag(cell, tag);
  const old = childrenOf(cell, tag, close);
  const formula = newFormula(old.formula, edit, writer.prefix);
  const hasFormula = formula !== "";
  const tagText = cell.slice(tag.start, tag.end);
  const attributes = attributesOf(tagText);
  const type = attributes.find(({ name }) => name === "t")?.value;
  const stored = edit.value === undefined ? undefined : writer.stored(edit.value, hasFormula || edit.filled === true);
  const value = stored ? stored.element : old.value;
  const inner = assembled(cell, tag, close, old, formula, value);
  const head = withAttributes(tagText, attributeChanges(edit, stored, type), attributes);
  if (inner.trim() === "") return tag.kind === "empty" ? head : `${head.replace(/\s*>$/, "")}/>`;
  const open = tag.kind === "empty" ? head.replace(/\s*\/>$/, ">") : head;
  return open + inner + (tag.kind === "empty" ? `</${tag.name}>` : cell.slice(close.start, close.end));
}

function attributeChanges(
  edit: CellEdit,
  stored: { type: string | null } | undefined,
  type: string | undefined,
): Record<string, string | null> {
  const changes: Record<string, string | null> = {};
  if (stored) {
    // A number may say t="n" or nothing: leave it as it is.
    if (!(stored.type === null && type === "n")) changes.t = stored.type;
    changes.vm = null;
  }
  if (edit.metadata !== undefined) changes.cm = edit.metadata;
  else if (edit.formula !== undefined) changes.cm = null;
  return changes;
}

interface Children {
  /** Text of `<f>`, `<v>` or `<is>`, empty if there is none. */
  readonly formula: string;
  readonly value: string;
  readonly formulaAt?: readonly [number, number];
  readonly valueAt?: readonly [number, number];
}

function childrenOf(cell: string, tag: Tag, close: Tag): Children {
  let formulaAt: [number, number] | undefined;
  let valueAt: [number, number] | undefined;
  if (tag.kind === "open") {
    for (const { tag: child, close: end } of elements(cell, tag.end, close.start)) {
      const name = localName(child.name);
      if (name === "f") formulaAt = [child.start, end.end];
      // A cell may carry both; the type attribute says which counts, and neither survives a new value.
      else if (name === "v" || name === "is") valueAt = [valueAt?.[0] ?? child.start, end.end];
    }
  }
  const textAt = (at: readonly [number, number] | undefined) => (at ? cell.slice(at[0], at[1]) : "");
  return { formula: textAt(formulaAt), value: textAt(valueAt), formulaAt, valueAt };
}

function assembled(cell: string, tag: Tag, close: Tag, old: Children, formula: string, value: string): string {
  if (tag.kind === "empty") return formula + value;
  const from = tag.end;
  const to = close.start;
  const [formulaStart, formulaEnd] = old.formulaAt ?? [from, from];
  const [valueStart, valueEnd] = old.valueAt ?? [formulaEnd, formulaEnd];
  return cell.slice(from, formulaStart) + formula + cell.slice(formulaEnd, valueStart) + value + cell.slice(valueEnd, to);
}

function newFormula(old: string, edit: CellEdit, prefix: string): string {
  if (edit.formula === null) return "";
  if (edit.formula !== undefined) return formulaElement(edit.formula, edit.array, prefix);
  if (edit.array === undefined || old === "") return old;
  const tag = nextTag(old, 0) as Tag;
  return withAttributes(old.slice(0, tag.end), { ref: edit.array }) + old.slice(tag.end);
}

/** `<f>` element of a formula in the file's dialect. */
export function formulaElement(formula: string, array: string | undefined, prefix: string): string {
  const range = array === undefined ? "" : ` t="array" ref="${xmlAttribute(array)}"`;
  const space = needsSpace(formula) ? ' xml:space="preserve"' : "";
  return `<${prefix}f${range}${space}>${xmlText(formula)}</${prefix}f>`;
}
