/** The form that writes a worksheet formula for the chosen substance: function, arguments, set, preview, insert and copy. */
import type { HandbookEntry } from "../handbook";
import { copyText } from "./clipboard";
import { element, freshId, scrolling } from "./element";
import { argumentsOf, cautionOf, fieldsOf, firstFunction, type Field } from "./fields";
import { refersTo, writeFormula, type Argument } from "./formula";
import type { Host, Selection } from "./host";
import { previewOf, type Preview } from "./preview";
import type { Subject } from "./subject";
import { suggestedUnits } from "./suggestions";
import { familyWord } from "./words";

export class InsertForm {
  readonly section: HTMLElement;
  private subject: Subject | undefined;
  private entry: HandbookEntry | undefined;
  private fields: readonly Field[] = [];
  private args: readonly Argument[] = [];
  private target: Selection | null = null;
  /** What was typed, by parameter name, so that it outlives a change of function. */
  private readonly typed = new Map<string, string>();
  private readonly functionChoice = element("select", { id: freshId("function"), class: "still-function" });
  private readonly description = element("p", { class: "still-description" });
  private readonly inputs = element("div", { class: "still-fields" });
  private readonly preview = element("output", { class: "still-preview" });
  private readonly formula = element("code", { class: "still-formula" });
  private readonly caution = element("p", { class: "still-caution" });
  private readonly advice = element("p", { class: "still-advice" });
  private readonly insert = element("button", { type: "submit", class: "still-primary" }, "Insert");
  private readonly copy = element("button", { type: "button" }, "Copy");

  constructor(
    private readonly functions: readonly HandbookEntry[],
    private readonly host: Host,
    private readonly say: (sentence: string) => void,
  ) {
    this.section = this.build();
    this.functionChoice.addEventListener("change", () => this.chooseFunction(this.functionChoice.value));
    this.copy.addEventListener("click", () => void this.copyFormula());
    this.insert.hidden = host.kind === "none";
    if (this.insert.hidden) this.copy.className = "still-primary";
    host.onSelectionChange((selection) => this.retarget(selection));
    void host.selection().then((selection) => this.retarget(selection));
  }

  /** Another species or mixture. The function and what was typed stay, except the set, which may not exist here. */
  show(subject: Subject): void {
    this.subject = subject;
    this.typed.delete("set");
    const entry = this.entry ?? firstFunction(this.functions, subject);
    const usual = subject.phase !== "g" && entry?.id === "CV.AT" ? firstFunction(this.functions, subject) : entry;
    if (usual) this.chooseFunction(usual.id);
  }

  /** Writes a set into the formula. */
  useSet(set: string): void {
    this.typed.set("set", set);
    this.fill();
    this.say(`The formula names ${set}.`);
  }

  private build(): HTMLElement {
    const form = element(
      "form",
      { class: "still-form", novalidate: true },
      element("div", { class: "still-field" }, element("label", { for: this.functionChoice.id }, "Function"), this.functionChoice),
      this.description,
      this.inputs,
      element("div", { class: "still-result", role: "group", "aria-label": "Formula and its value" }, this.formula, this.preview),
      this.caution,
      element("div", { class: "still-buttons" }, this.insert, this.copy),
      this.advice,
    );
    form.addEventListener("submit", (event) => {
      event.preventDefault();
      void this.insertFormula();
    });
    this.fillFunctions();
    return element("section", { class: "still-section still-insert" }, element("h3", {}, "Formula"), form);
  }

  private fillFunctions(): void {
    for (const family of new Set(this.functions.map((entry) => entry.family))) {
      const group = element("optgroup", { label: familyWord(family) });
      for (const entry of this.functions)
        if (entry.family === family) group.append(element("option", { value: entry.id }, `${entry.id}: ${inShort(entry)}`));
      this.functionChoice.append(group);
    }
  }

  private chooseFunction(id: string): void {
    this.entry = this.functions.find((entry) => entry.id === id);
    this.functionChoice.value = id;
    this.description.textContent = this.entry?.description ?? "";
    const caution = this.entry ? cautionOf(this.entry.family) : "";
    this.caution.textContent = caution;
    this.caution.hidden = caution === "";
    this.fill();
  }

  private fill(): void {
    const { entry, subject } = this;
    if (!entry || !subject) return;
    this.fields = fieldsOf(entry, subject);
    this.inputs.replaceChildren(...this.fields.map((field) => this.fieldView(field, entry, subject)));
    this.refresh();
  }

  private fieldView(field: Field, entry: HandbookEntry, subject: Subject): HTMLElement {
    const id = freshId("field");
    const help = `${id}-help`;
    const control = field.role === "set" && subject.records.length > 0 ? setChoice(id, subject) : textField(id, field, entry);
    control.setAttribute("aria-describedby", help);
    control.dataset.field = field.name;
    control.value = this.valueOf(field);
    control.addEventListener("input", () => {
      this.typed.set(field.name, control.value);
      this.refresh();
    });
    const unit = field.unit ? [element("span", { class: "still-unit" }, field.unit)] : [];
    const extra = field.role === "unit" ? [unitList(`${id}-units`, entry)] : [];
    return element(
      "div",
      { class: `still-field still-field-${field.role}` },
      element("label", { for: id }, field.label, ...(field.optional ? [] : [element("span", { class: "still-needed" }, " required")])),
      element("div", { class: "still-control" }, control, ...unit, ...extra),
      element("p", { id: help, class: "still-help" }, control instanceof HTMLSelectElement ? SET_HELP : field.description),
    );
  }

  private valueOf(field: Field): string {
    return this.typed.get(field.name) ?? field.initial;
  }

  private refresh(): void {
    const { entry, subject } = this;
    if (!entry || !subject) return;
    this.args = argumentsOf(subject, this.fields, (field) => this.valueOf(field));
    this.formula.textContent = writeFormula(entry.id, this.args);
    const preview = previewOf(entry, this.fields, this.args);
    showPreview(this.preview, preview);
    this.insert.disabled = preview.kind === "refused" || preview.kind === "waiting";
    this.copy.disabled = this.insert.disabled;
    this.advise();
  }

  private retarget(selection: Selection | null): void {
    this.target = selection;
    this.advise();
  }

  /** Where the formula would go and what speaks against it. */
  private advise(): void {
    const { target } = this;
    this.insert.textContent = target ? `Insert into ${target.address}` : "Insert";
    if (this.host.kind === "none") this.advice.textContent = "No workbook here: copy the formula and paste it into a cell.";
    else if (target && refersTo(this.args, target.address))
      this.advice.textContent = `The formula would refer to ${target.address}, the cell it goes into. Select another cell.`;
    else if (target && target.formula !== null && target.formula !== "")
      this.advice.textContent = `${target.address} is not empty; its content will be replaced.`;
    else this.advice.textContent = "";
  }

  private async insertFormula(): Promise<void> {
    const formula = this.formula.textContent ?? "";
    if (this.insert.disabled) return;
    try {
      await this.host.insertFormula(formula);
      this.say(`${formula} inserted${this.target ? ` into ${this.target.address}` : ""}.`);
    } catch (thrown) {
      this.say(thrown instanceof Error ? thrown.message : String(thrown));
    }
  }

  private async copyFormula(): Promise<void> {
    const formula = this.formula.textContent ?? "";
    const copied = await copyText(formula);
    this.say(copied ? `${formula} copied.` : `The browser does not allow copying here; select the formula and copy it by hand: ${formula}`);
  }
}

const SET_HELP = "A first choice is fixed: leaving it out and writing it give the same number.";

/** What a function gives, up to the first comma, colon or full stop of its description. */
function inShort({ description }: HandbookEntry): string {
  const words = /^[^,.:;]+/.exec(description)?.[0] ?? description;
  return words.charAt(0).toLowerCase() + words.slice(1);
}

type Control = HTMLInputElement | HTMLSelectElement;

function textField(id: string, field: Field, entry: HandbookEntry): Control {
  const list = field.role === "unit" ? `${id}-units` : undefined;
  const placeholder = field.role === "unit" ? entry.result.unit : field.optional ? "left out" : "";
  return element("input", {
    id,
    type: "text",
    autocomplete: "off",
    spellcheck: "false",
    list,
    placeholder,
    "aria-required": !field.optional && "true",
  });
}

function unitList(id: string, entry: HandbookEntry): HTMLElement {
  return element("datalist", { id }, ...suggestedUnits(entry.result.unit).map((unit) => element("option", { value: unit })));
}

function setChoice(id: string, subject: Subject): Control {
  const first = subject.records[0]?.set ?? "";
  return element(
    "select",
    { id },
    element("option", { value: "" }, `first choice (${first}), left out of the formula`),
    ...subject.records.map(({ set }, index) =>
      element("option", { value: set }, `${set}${index === 0 ? ", the first choice," : ""} in the formula`),
    ),
  );
}

function showPreview(output: HTMLElement, preview: Preview): void {
  output.dataset.kind = preview.kind;
  if (preview.kind !== "value") return output.replaceChildren(preview.sentence);
  const single = preview.rows.length === 1 && preview.rows[0]?.length === 1 ? preview.rows[0][0] : undefined;
  if (single !== undefined) return output.replaceChildren(`= ${single}${preview.unit ? ` ${preview.unit}` : ""}`);
  const rows = preview.rows.map((row) => element("tr", {}, ...row.map((cell) => element("td", {}, cell))));
  const caption = preview.unit ? [element("caption", {}, preview.unit)] : [];
  const table = element("table", { class: "still-table" }, ...caption, element("tbody", {}, ...rows));
  output.replaceChildren(scrolling("Result of the formula", table));
}
