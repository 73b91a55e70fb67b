/** One argument field as it stands in a form: label, control, unit, help. */
import type { HandbookEntry } from "../handbook";
import { element } from "./element";
import type { Field } from "./fields";
import { suggestedUnits } from "./suggestions";
import { choiceWord } from "./words";

export type Control = HTMLInputElement | HTMLSelectElement;

/** A control with the help below it and the list it suggests from, if any. */
export interface Dressed {
  readonly control: Control;
  readonly help: string;
  readonly extra: readonly HTMLElement[];
}

/** Letters beyond which label, unit or help need the whole width of a narrow pane. */
const LONG = { label: 24, unit: 6, help: 90 };
/** What the mark of a required field takes beside its label. */
const MARK = " required";

/** The usual control of a field: a choice where all words are known, else a line of text. */
export function usualControl(id: string, field: Field, entry: HandbookEntry): Dressed {
  if (field.role === "choice") return { control: wordChoice(id, field), help: field.description, extra: [] };
  const suggested = field.role === "unit" ? suggestedUnits(entry.result.unit) : (field.words ?? []);
  const list = field.role === "unit" || suggested.length > 0 ? `${id}-list` : undefined;
  const extra = list === undefined ? [] : [element("datalist", { id: list }, ...suggested.map((value) => element("option", { value })))];
  const placeholder = field.role === "unit" ? entry.result.unit : field.optional ? "left out" : "";
  const control = element("input", {
    id,
    type: "text",
    autocomplete: "off",
    spellcheck: "false",
    list,
    placeholder,
    "aria-required": !field.optional && "true",
  });
  return { control, help: field.description, extra };
}

function wordChoice(id: string, { words = [], usual = "", optional }: Field): Control {
  const none = optional ? (usual === "" ? "left out" : `left out: ${usual}`) : "choose";
  return element(
    "select",
    { id, "aria-required": !optional && "true" },
    element("option", { value: "" }, none),
    ...words.map((word) => element("option", { value: word }, choiceWord(word))),
  );
}

/** The field with its label; `unit` is where the unit stands and may be rewritten. */
export function fieldView(field: Field, { control, help, extra }: Dressed, unit: HTMLElement): HTMLElement {
  const helpId = `${control.id}-help`;
  control.setAttribute("aria-describedby", helpId);
  control.dataset.field = field.name;
  const mark = field.optional ? [] : [element("span", { class: "still-needed" }, MARK)];
  return element(
    "div",
    { class: `still-field still-field-${field.role}${isWide(field, help) ? " still-field-wide" : ""}` },
    element("label", { for: control.id }, field.label, ...mark),
    element("div", { class: "still-control" }, control, ...(field.unit ? [unit] : []), ...extra),
    element("p", { id: helpId, class: "still-help" }, help),
  );
}

function isWide({ label, unit, optional, role }: Field, help: string): boolean {
  if (role === "choice" || role === "text" || unit.length > LONG.unit || help.length > LONG.help) return true;
  return label.length + (optional ? 0 : MARK.length) > LONG.label;
}
