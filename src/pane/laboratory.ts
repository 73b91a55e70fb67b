/**
 * Functions of laboratory and plant: those that start from masses, readings and ranges instead of a substance, and all on closed vessels;
 * and their argument fields. A family that comes later joins by the same rule. Pure.
 */
import type { HandbookEntry, HandbookParameter } from "../handbook";
import { VESSEL, type Field, type FieldRole } from "./fields";
import { readArgument, textArgument, type Argument } from "./formula";
import { readList, readText } from "./list";
import { suggestedTexts } from "./suggestions";
import { choicesOf, usualWord } from "./wording";
import { labelWord } from "./words";

/** Families that serve the other way in: conversions, mixtures, citations of substances. */
const ELSEWHERE = new Set(["units", "mixture", "sources"]);
const SUBSTANCE = /^(?:substance|species)/;
/** Arguments whose texts can look like the address of a cell: `CH4`, `CO2`. */
const TEXTS = new Set(["substance", "formula", "fuel", "oxidant", "equation", "feed", "species", "products", "text"]);

/** Said of arguments in the middle of a function that some of its calls do without. */
const MAY_BE_BLANK = /\bmay be blank\b/;

export function functionsForLaboratory(handbook: readonly HandbookEntry[]): HandbookEntry[] {
  return handbook.filter(
    ({ family, parameters: [first] }) =>
      first !== undefined && (family === VESSEL || (!ELSEWHERE.has(family) && !SUBSTANCE.test(first.name))),
  );
}

/** One field for each parameter. They start empty: no number stands in a certificate because a program put it there. */
export function laboratoryFields(entry: HandbookEntry): Field[] {
  return entry.parameters.map((parameter) => ({
    name: parameter.name,
    label: labelWord(parameter.name),
    description: [parameter.description.replace(/\.$/, ""), ...hintsOf(parameter)].join(". "),
    unit: parameter.unit === "-" ? "" : parameter.unit,
    optional: parameter.optional || MAY_BE_BLANK.test(parameter.description),
    role: roleOf(parameter),
    initial: "",
    words: choicesOf(parameter).length > 0 ? choicesOf(parameter) : suggestedTexts(parameter),
    usual: usualWord(parameter.description),
  }));
}

function roleOf(parameter: HandbookParameter): FieldRole {
  const { name, kind } = parameter;
  if (name === "unit" || name === "set") return name;
  if (choicesOf(parameter).length > 0) return "choice";
  if (TEXTS.has(name)) return "text";
  return kind === "value" ? "quantity" : "range";
}

function hintsOf(parameter: HandbookParameter): string[] {
  const { kind, name } = parameter;
  const range = `a range such as ${kind === "block" ? "B2:D9" : "B2:B40"}`;
  if (roleOf(parameter) === "text") return [`A cell with its equals sign: =B2${kind === "value" ? "" : `, or ${range}`}`];
  if (kind === "value") return [];
  return [kind === "block" || name.endsWith("s") ? `A${range.slice(1)}` : `A value, or ${range}`];
}

/** The fields as arguments; `typed` gives what stands in a field. */
export function laboratoryArguments(fields: readonly Field[], typed: (field: Field) => string): Argument[] {
  return fields.map((field) => READ[field.role](typed(field)));
}

const READ: Readonly<Record<FieldRole, (typed: string) => Argument>> = {
  quantity: readArgument,
  range: readList,
  text: readText,
  choice: textArgument,
  word: textArgument,
  unit: textArgument,
  set: textArgument,
};

/** A function and its report are about the same run, and share what was typed; two other functions never do. */
export function draftKey(id: string): string {
  return id.replace(/\.REPORT$/, "");
}
