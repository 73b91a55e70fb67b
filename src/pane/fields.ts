/** The argument fields of a worksheet function for one substance: which there are, what they start with. Pure. */
import type { HandbookEntry, HandbookParameter } from "../handbook";
import { OMITTED, readArgument, textArgument, type Argument } from "./formula";
import type { Subject } from "./subject";
import { labelWord } from "./words";

/**
 * `unit`, `set` and `word` are texts, `choice` is one of a few words; a `quantity` may be a number, a quantity text or a cell,
 * a `range` a list of such, a `text` anything else that may also stand in a cell.
 */
export type FieldRole = "quantity" | "unit" | "set" | "word" | "choice" | "range" | "text";

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
  /** All words of a choice; of another field the words to suggest. */
  readonly words?: readonly string[];
  /** The word of a choice that counts if it is left out. */
  readonly usual?: string;
}

const WORDS = new Set(["model", "limit", "method", "form", "basis"]);
/** The family of closed vessels. */
export const VESSEL = "vessel";
/** More optional fields than this are folded. */
const MOST_OPTIONAL = 4;

/** The functions that take one substance first and otherwise single values. Those on a vessel start from its volume, and stand apart. */
export function functionsForSubstance(handbook: readonly HandbookEntry[]): HandbookEntry[] {
  return handbook.filter(({ family, parameters }) => {
    const [first, ...rest] = parameters;
    return (
      family !== VESSEL &&
      first !== undefined &&
      first.name.startsWith("substance") &&
      rest.every((one) => one.optional || one.kind === "value")
    );
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

/** The argument of a field; arguments without a field, such as the substance, stand in front. */
export function argumentOf(at: number, fields: readonly Field[], args: readonly Argument[]): Argument {
  return args[args.length - fields.length + at] ?? OMITTED;
}

/** The first field that must be filled and is not. */
export function missingField(fields: readonly Field[], args: readonly Argument[]): Field | undefined {
  return fields.find((field, at) => !field.optional && argumentOf(at, fields, args).kind === "omitted");
}

/** The optional fields, if there are so many that they are better folded away; else none. */
export function foldedFields(fields: readonly Field[]): readonly Field[] {
  const optional = fields.filter((field) => field.optional);
  return optional.length > MOST_OPTIONAL ? optional : [];
}

/** The unit of plain numbers in a field: plain times are in what the argument time_unit says. */
export function unitNow(field: Field, fields: readonly Field[], typed: (field: Field) => string): string {
  const timeUnit = field.unit === "min" ? fields.find(({ name }) => name === "time_unit") : undefined;
  return (timeUnit && typed(timeUnit).trim()) || field.unit;
}

const GOVERN = "Not a design or relief calculation; the vessel\u2019s own rating, local codes and licensed practice govern.";

/** What stands under the functions of a family. */
const CAUTIONS: Readonly<Record<string, string>> = {
  heat: `Ideal gas, composition frozen, heat of the contents alone: the wall of a vessel often takes far more. ${GOVERN}`,
  vessel: `Composition frozen; the ideal gas only where it is close enough, unless a model is named. ${GOVERN}`,
  water: `Water by IAPWS-95; gas beside it is ideal and does not dissolve. ${GOVERN}`,
  reaction: `Complete reaction as written, gases ideal. ${GOVERN}`,
  burn: `Ideal gas, no loss of heat, deflagration in one vessel: pressure piling, turbulence, transition to detonation and vent sizing are outside. ${GOVERN}`,
  calorimeter: "Limits of the vessel\u2019s own certificate, local codes and licensed practice govern.",
  fuel: "Values for a certificate remain the responsibility of those who sign it.",
};

const EQUILIBRIUM = `Ideal gas and pure solids and liquids at chemical equilibrium; rates are not considered. ${GOVERN}`;

/** Functions on vessels that take no gas, and so no model of it. */
const WITHOUT_MODEL = /^VESSEL\.(?:WARM|PHI|MTSR|LIQUIDFULL|STORED)/;

/** The caution that belongs to a function of a family; empty for plain properties. */
export function cautionOf(family: string, id = ""): string {
  if (WITHOUT_MODEL.test(id)) return GOVERN;
  return id.startsWith("EQUILIBRIUM.") ? EQUILIBRIUM : (CAUTIONS[family] ?? "");
}
