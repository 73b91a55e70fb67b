/** How a value stands in a cell of the file: its type attribute and its element. */
import { refuse } from "../../core/refusal";
import type { BookValue } from "../workbook";
import { cellText, needsSpace } from "../xml/escape";

export interface StoredValue {
  /** Attribute `t`; null for numbers and empty cells, which carry none. */
  readonly type: string | null;
  /** `<v>` or `<is>` element, or nothing. */
  readonly element: string;
}

/** Errors every reader of the format knows; newer ones (#SPILL!, #CALC! …) are stored as #VALUE!, which is what they fall back to. */
const KNOWN_ERRORS = new Set(["#NULL!", "#DIV/0!", "#VALUE!", "#REF!", "#NAME?", "#NUM!", "#N/A", "#GETTING_DATA"]);

export const storedError = (code: string): string => (KNOWN_ERRORS.has(code) ? code : "#VALUE!");

/** A number in the shortest decimal form that reads back the same, with a capital E as Excel writes it. Refuses NaN and infinities. */
export function storedNumber(value: number): string {
  if (!Number.isFinite(value)) refuse(`A cell cannot hold the number ${value}`);
  return Object.is(value, -0) ? "0" : String(value).replace("e", "E");
}

/**
 * `computed` tells a result of a formula or spill from a text typed in: results stand in `<v>`, typed texts in `<is>`.
 * `prefix` is that of the sheet's own elements, as a rule empty.
 */
export function storedValue(value: BookValue, computed: boolean, prefix: string): StoredValue {
  if (value === null) return { type: null, element: "" };
  if (typeof value === "number") return { type: null, element: tagged("v", storedNumber(value), prefix) };
  if (typeof value === "boolean") return { type: "b", element: tagged("v", value ? "1" : "0", prefix) };
  if (typeof value !== "string") return { type: "e", element: tagged("v", storedError(value.error), prefix) };
  const space = needsSpace(value) ? ' xml:space="preserve"' : "";
  if (computed) return { type: "str", element: tagged("v", cellText(value), prefix, space) };
  return { type: "inlineStr", element: `<${prefix}is>${tagged("t", cellText(value), prefix, space)}</${prefix}is>` };
}

const tagged = (name: string, content: string, prefix: string, attributes = "") =>
  `<${prefix}${name}${attributes}>${content}</${prefix}${name}>`;
