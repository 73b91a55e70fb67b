/** The form that writes a worksheet formula: function, arguments, preview, insert and copy. What it starts from is its way. */
import type { HandbookEntry } from "../handbook";
import { fieldView, usualControl, type Dressed } from "./controls";
import { element, freshId } from "./element";
import { cautionOf, foldedFields, unitNow, type Field } from "./fields";
import { writeFormula, type Argument } from "./formula";
import type { Outlet } from "./outlet";
import { previewOf } from "./preview";
import { showPreview } from "./result";
import { familyWord } from "./words";

/** One way to a formula: from a substance, or from the readings of a laboratory. */
export interface Way {
  readonly functions: readonly HandbookEntry[];
  readonly heading: HTMLElement;
  fieldsOf(entry: HandbookEntry): readonly Field[];
  /** Arguments of all fields, in the order of the function, with whatever stands in front of them. */
  argumentsOf(fields: readonly Field[], typed: (field: Field) => string): readonly Argument[];
  /** What was typed for a function, by name of the field. */
  draftOf(entry: HandbookEntry): Map<string, string>;
  /** A control of the way's own for a field; undefined for the usual one. */
  controlOf(id: string, field: Field): Dressed | undefined;
  /** What is to be known about a function, below its formula. */
  factsOf(entry: HandbookEntry): readonly HTMLElement[];
}

export class InsertForm {
  readonly section: HTMLElement;
  private entry: HandbookEntry | undefined;
  private fields: readonly Field[] = [];
  private readonly units = new Map<string, HTMLElement>();
  private readonly functionChoice = element("select", { id: freshId("function"), class: "still-function" });
  private readonly description = element("p", { class: "still-description" });
  private readonly inputs = element("div", { class: "still-fields" });
  private readonly preview = element("output", { class: "still-preview" });
  private readonly formula = element("code", { class: "still-formula" });
  private readonly caution = element("p", { class: "still-caution" });
  private readonly facts = element("div", { class: "still-function-facts" });

  constructor(
    private readonly way: Way,
    private readonly outlet: Outlet,
  ) {
    this.section = this.build();
    this.functionChoice.addEventListener("change", () => this.choose(this.functionChoice.value));
  }

  get chosen(): HandbookEntry | undefined {
    return this.entry;
  }

  /** Shows a function by its id. */
  choose(id: string): void {
    this.entry = this.way.functions.find((entry) => entry.id === id);
    this.functionChoice.value = id;
    this.description.textContent = this.entry?.description ?? "";
    const caution = this.entry ? cautionOf(this.entry.family, this.entry.id) : "";
    this.caution.textContent = caution;
    this.caution.hidden = caution === "";
    this.fill();
  }

  /** Builds the fields anew, with what was typed. */
  fill(): void {
    const { entry, way } = this;
    if (!entry) return;
    this.units.clear();
    this.fields = way.fieldsOf(entry);
    const views = this.fields.map((field) => this.viewOf(field, entry));
    this.inputs.replaceChildren(...this.arranged(views));
    this.facts.replaceChildren(...way.factsOf(entry));
    this.refresh();
  }

  private build(): HTMLElement {
    const { outlet } = this;
    const label = element("label", { for: this.functionChoice.id }, "Function");
    const form = element(
      "form",
      { class: "still-form", novalidate: true },
      element(
        "div",
        { class: "still-entry" },
        element("div", { class: "still-field" }, label, this.functionChoice),
        this.description,
        this.inputs,
      ),
      element(
        "div",
        { class: "still-outcome" },
        element("div", { class: "still-result", role: "group", "aria-label": "Formula and its value" }, this.formula, this.preview),
        this.caution,
        outlet.buttons,
        outlet.advice,
        outlet.status,
        this.facts,
      ),
    );
    form.addEventListener("submit", (event) => {
      event.preventDefault();
      void outlet.insertFormula();
    });
    this.fillFunctions();
    return element("section", { class: "still-section still-insert" }, this.way.heading, form);
  }

  private fillFunctions(): void {
    const { functions } = this.way;
    for (const family of new Set(functions.map((entry) => entry.family))) {
      const group = element("optgroup", { label: familyWord(family) });
      for (const entry of functions)
        if (entry.family === family) group.append(element("option", { value: entry.id }, `${entry.id}: ${inShort(entry)}`));
      this.functionChoice.append(group);
    }
  }

  private viewOf(field: Field, entry: HandbookEntry): HTMLElement {
    const id = freshId("field");
    const dressed = this.way.controlOf(id, field) ?? usualControl(id, field, entry);
    const { control } = dressed;
    const unit = element("span", { class: "still-unit" }, field.unit);
    this.units.set(field.name, unit);
    control.value = this.valueOf(field);
    control.addEventListener("input", () => {
      this.way.draftOf(entry).set(field.name, control.value);
      this.refresh();
    });
    return fieldView(field, dressed, unit);
  }

  /** Many optional fields are folded; what was typed into one of them is never hidden. */
  private arranged(views: readonly HTMLElement[]): readonly HTMLElement[] {
    const folded = foldedFields(this.fields);
    if (folded.length === 0) return views;
    const of = (fields: readonly Field[]) => views.filter((_view, at) => fields.some((field) => field === this.fields[at]));
    const open = folded.some((field) => this.valueOf(field) !== "");
    const inside = element("div", { class: "still-fields" }, ...of(folded));
    const more = element("details", { class: "still-more", open }, element("summary", {}, `More: ${folded.length} optional`), inside);
    return [...of(this.fields.filter((field) => !folded.includes(field))), more];
  }

  private readonly valueOf = (field: Field): string => {
    const typed = this.entry && this.way.draftOf(this.entry).get(field.name);
    return typed ?? field.initial;
  };

  private refresh(): void {
    const { entry, fields, way } = this;
    if (!entry) return;
    const args = way.argumentsOf(fields, this.valueOf);
    const formula = writeFormula(entry.id, args);
    const preview = previewOf(entry, fields, args);
    for (const field of fields) this.units.get(field.name)?.replaceChildren(unitNow(field, fields, this.valueOf));
    this.formula.textContent = formula;
    showPreview(this.preview, preview);
    this.outlet.offer(formula, args, preview.kind !== "refused" && preview.kind !== "waiting");
  }
}

/** What a function gives, up to the first comma, colon or full stop of its description. */
function inShort({ description }: HandbookEntry): string {
  const words = /^[^,.:;]+/.exec(description)?.[0] ?? description;
  return words.charAt(0).toLowerCase() + words.slice(1);
}
