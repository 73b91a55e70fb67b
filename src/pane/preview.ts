/** The value of a formula before it is inserted, from the worksheet function itself, or the sentence with which it refuses. */
import { registry } from "../functions/registry";
import type { HandbookEntry } from "../handbook";
import { argumentOf, missingField, type Field } from "./fields";
import type { Argument } from "./formula";
import { firstLines, isUpright, restSentence, type Line } from "./lines";
import { shown } from "./numbers";

export type Preview =
  | { readonly kind: "value"; readonly rows: readonly (readonly string[])[]; readonly unit: string }
  /** A table of labelled lines: the first of them and all that warn. */
  | { readonly kind: "table"; readonly lines: readonly Line[]; readonly rest: string }
  | { readonly kind: "refused"; readonly sentence: string }
  /** Something must be typed first. */
  | { readonly kind: "waiting"; readonly sentence: string }
  /** The value depends on cells, which only the sheet knows. */
  | { readonly kind: "sheet"; readonly sentence: string };

/** Calls the registered function with the arguments as blocks of cells. */
export function previewOf(entry: HandbookEntry, fields: readonly Field[], args: readonly Argument[]): Preview {
  const missing = missingField(fields, args);
  if (missing) return { kind: "waiting", sentence: needed(missing) };
  if (args.some((argument) => argument.kind === "reference"))
    return { kind: "sheet", sentence: "An argument is a cell: the sheet works out the value." };
  const worksheetFunction = registry.get(entry.id);
  if (!worksheetFunction) return { kind: "refused", sentence: `${entry.name} is not loaded.` };
  return rendered(worksheetFunction(...args.map(blockOf)), unitOf(entry, fields, args));
}

function needed({ label, unit, role }: Field): string {
  const verb = /[^s]s$/.test(label) ? "are" : "is";
  const other = role === "text" ? "" : ` or with ${verb === "are" ? "their" : "its"} unit`; // a feed counts mol alone
  return `${label} ${verb} needed${unit ? `, in ${unit}${other}` : ""}.`;
}

/** Help of a result whose unit depends on an argument: `Net value in J/g; in J/mL if the density is given`. */
const UNIT_IF_GIVEN = /\bin (\S+) if the (\w+) is given/;

/** The unit of the result: what the unit argument says, or the help for an argument that is given, else the function's own. */
function unitOf(entry: HandbookEntry, fields: readonly Field[], args: readonly Argument[]): string {
  const argument = (test: (field: Field) => boolean) => {
    const at = fields.findIndex(test);
    return at < 0 ? undefined : argumentOf(at, fields, args);
  };
  const chosen = argument(({ role }) => role === "unit");
  if (chosen?.kind === "text") return chosen.value;
  const [, unit = "", condition] = UNIT_IF_GIVEN.exec(entry.result.description) ?? [];
  const deciding = argument(({ name }) => name === condition);
  if (deciding && deciding.kind !== "omitted") return unit;
  return entry.result.unit === "-" ? "" : entry.result.unit;
}

function blockOf(argument: Argument): unknown[][] | undefined {
  if (argument.kind === "array") return argument.rows.map((row) => [...row]);
  return argument.kind === "number" || argument.kind === "text" ? [[argument.value]] : undefined;
}

function rendered(block: readonly (readonly unknown[])[], unit: string): Preview {
  const single = block.length === 1 && block[0]?.length === 1 ? block[0][0] : undefined;
  if (isError(single)) return { kind: "refused", sentence: single.message || single.code };
  if (isUpright(block)) return upright(block);
  const rows = block.map((row) => row.map((cell) => cellText(cell)));
  const numbers = block.every((row) => row.every((cell) => typeof cell === "number"));
  return { kind: "value", rows, unit: numbers ? unit : "" };
}

/** Digits of a number in a table. */
const DIGITS = 8;

function upright(block: readonly (readonly unknown[])[]): Preview {
  const lines = firstLines(block, (cell) => cellText(cell, DIGITS));
  return { kind: "table", lines, rest: restSentence(block.length, lines.length) };
}

function cellText(cell: unknown, digits?: number): string {
  if (typeof cell === "number") return shown(cell, digits);
  if (isError(cell)) return `${cell.code} ${cell.message}`.trim();
  return cell === null || cell === undefined ? "" : String(cell);
}

/** Our own error class, or the host's: both carry a code and a message. */
function isError(cell: unknown): cell is { code: string; message: string } {
  return typeof cell === "object" && cell !== null && "code" in cell;
}
