/** The argument fields of a worksheet function for one substance: which there are, what they start with. Pure. */
import type { HandbookEntry, HandbookParameter } from "../handbook";
import { OMITTED, readArgument, textArgument, type Argument } from "./formula";
import type { Subject } from "./subject";
import { labelWord } from "./words";

/** `unit`, `set` and `word` are texts; a `quantity` may be a number, a quantity text or a cell. */
export type FieldRole = "quantity" | "unit" | "set" | "word";

export interface Field {
  /** Name of the parameter; what was typed under it is kept from one function to the next. */
  readonly name: string;
  readonly label: string;
  readonly description: string;
  /** Unit of a plain number; empty where there is none. */
  readonly unit: string;
  readonly optional: boolean;
  readonly role: FieldRole;
  readonly initial: string;
}

const WORDS = new Set(["model", "limit", "method", "form", "basis"]);
const CAUTIONED = new Set(["heat", "vessel", "burn", "water"]);

/** The functions that take one substance first and otherwise single values. */
export function functionsForSubstance(handbook: readonly HandbookEntry[]): HandbookEntry[] {
  return handbook.filter(({ parameters }) => {
    const [first, ...rest] = parameters;
    return first !== undefined && first.name.startsWith("substance") && rest.every((one) => one.optional || one.kind === "value");
  });
}

/** The function to start with: Cv of a gas, Cp of a liquid or solid, else the first there is. */
export function firstFunction(functions: readonly HandbookEntry[], subject: Subject): HandbookEntry | undefined {
  const wanted = subject.phase === "g" ? "CV.AT" : "CP.AT";
  return functions.find((entry) => entry.id === wanted) ?? functions[0];
}

/** The fields behind the substance, in the order of the function. */
export function fieldsOf(entry: HandbookEntry, subject: Subject): Field[] {
  return entry.parameters.slice(1).map((parameter) => ({
    name: parameter.name,
    label: labelWord(parameter.name),
    description: parameter.description,
    unit: parameter.unit === "-" ? "" : parameter.unit,
    optional: parameter.optional,
    role: roleOf(parameter),
    initial: parameter.optional ? "" : initialOf(parameter, subject),
  }));
}

function roleOf({ name }: HandbookParameter): FieldRole {
  if (name === "unit" || name === "set") return name;
  return WORDS.has(name) ? "word" : "quantity";
}

/** A value the function accepts for this substance, so that the preview shows a number from the start. */
function initialOf({ name, unit }: HandbookParameter, subject: Subject): string {
  const range = subject.sources[0]?.capacity;
  if (unit === "K" && range) {
    const wanted = name === "to" || name === "T2" ? 1000 : 298.15;
    return String(Math.min(range.to, Math.max(range.from, wanted)));
  }
  if (name === "amount") return "1";
  if (name === "heat") return "1000";
  return "";
}

/** Substance and fields as arguments; `typed` gives what stands in a field. */
export function argumentsOf(subject: Subject, fields: readonly Field[], typed: (field: Field) => string): Argument[] {
  return [
    { kind: "text", value: subject.text },
    ...fields.map((field) => (field.role === "quantity" ? readArgument(typed(field)) : textArgument(typed(field)))),
  ];
}

/** The first field that must be filled and is not. */
export function missingField(fields: readonly Field[], args: readonly Argument[]): Field | undefined {
  return fields.find((field, i) => !field.optional && (args[i + 1] ?? OMITTED).kind === "omitted");
}

/** The caution that belongs to a family of functions; empty for plain properties. */
export function cautionOf(family: string): string {
  if (!CAUTIONED.has(family)) return "";
  return (
    "Ideal gas unless a model is named, composition frozen, heat of the contents alone: the wall of a vessel often takes far more. " +
    "Not a design or relief calculation; the vessel\u2019s own rating, local codes and licensed practice govern."
  );
}
