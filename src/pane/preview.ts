/** The value of a formula before it is inserted, from the worksheet function itself, or the sentence with which it refuses. */
import { registry } from "../functions/registry";
import type { HandbookEntry } from "../handbook";
import { missingField, type Field } from "./fields";
import type { Argument } from "./formula";
import { shown } from "./numbers";

export type Preview =
  | { readonly kind: "value"; readonly rows: readonly (readonly string[])[]; readonly unit: string }
  | { readonly kind: "refused"; readonly sentence: string }
  /** Something must be typed first. */
  | { readonly kind: "waiting"; readonly sentence: string }
  /** The value depends on cells, which only the sheet knows. */
  | { readonly kind: "sheet"; readonly sentence: string };

/** Calls the registered function with the arguments as one-cell blocks. */
export function previewOf(entry: HandbookEntry, fields: readonly Field[], args: readonly Argument[]): Preview {
  const missing = missingField(fields, args);
  if (missing)
    return { kind: "waiting", sentence: `${missing.label} is needed${missing.unit ? `, in ${missing.unit} or with its unit` : ""}.` };
  if (args.some((argument) => argument.kind === "reference"))
    return { kind: "sheet", sentence: "An argument is a cell: the sheet works out the value." };
  const worksheetFunction = registry.get(entry.id);
  if (!worksheetFunction) return { kind: "refused", sentence: `${entry.name} is not loaded.` };
  return rendered(worksheetFunction(...args.map(blockOf)), unitOf(entry, fields, args));
}

/** The unit of the result: what the unit argument says, else the function's own. */
function unitOf(entry: HandbookEntry, fields: readonly Field[], args: readonly Argument[]): string {
  const at = fields.findIndex((field) => field.role === "unit");
  const chosen = at < 0 ? undefined : args[at + 1];
  if (chosen?.kind === "text") return chosen.value;
  return entry.result.unit === "-" ? "" : entry.result.unit;
}

function blockOf(argument: Argument): unknown[][] | undefined {
  return argument.kind === "number" || argument.kind === "text" ? [[argument.value]] : undefined;
}

function rendered(block: readonly (readonly unknown[])[], unit: string): Preview {
  const single = block.length === 1 && block[0]?.length === 1 ? block[0][0] : undefined;
  if (isError(single)) return { kind: "refused", sentence: single.message || single.code };
  const rows = block.map((row) => row.map(cellText));
  const numbers = block.every((row) => row.every((cell) => typeof cell === "number"));
  return { kind: "value", rows, unit: numbers ? unit : "" };
}

function cellText(cell: unknown): string {
  if (typeof cell === "number") return shown(cell);
  if (isError(cell)) return `${cell.code} ${cell.message}`.trim();
  return cell === null || cell === undefined ? "" : String(cell);
}

/** Our own error class, or the host's: both carry a code and a message. */
function isError(cell: unknown): cell is { code: string; message: string } {
  return typeof cell === "object" && cell !== null && "code" in cell;
}
