/** The way from a substance: its functions, the fields behind it, and the choice of its sets. */
import type { HandbookEntry } from "../handbook";
import type { Dressed } from "./controls";
import { element } from "./element";
import { argumentsOf, fieldsOf, firstFunction, type Field } from "./fields";
import { InsertForm, type Way } from "./insert";
import type { Outlet } from "./outlet";
import type { Subject } from "./subject";

const SET_HELP = "A first choice is fixed: leaving it out and writing it give the same number.";

export class SubstanceForm {
  readonly section: HTMLElement;
  private subject: Subject | undefined;
  /** What was typed, by parameter name, so that it outlives a change of function. */
  private readonly typed = new Map<string, string>();
  private readonly form: InsertForm;

  constructor(
    private readonly functions: readonly HandbookEntry[],
    private readonly outlet: Outlet,
  ) {
    this.form = new InsertForm(this.way(), outlet);
    this.section = this.form.section;
  }

  /** Another species or mixture. The function and what was typed stay, except the set, which may not exist here. */
  show(subject: Subject): void {
    this.subject = subject;
    this.typed.delete("set");
    const entry = this.form.chosen ?? firstFunction(this.functions, subject);
    const usual = subject.phase !== "g" && entry?.id === "CV.AT" ? firstFunction(this.functions, subject) : entry;
    if (usual) this.form.choose(usual.id);
    this.outlet.say("");
  }

  /** Writes a set into the formula. */
  useSet(set: string): void {
    this.typed.set("set", set);
    this.form.fill();
    this.outlet.say(`The formula names ${set}.`);
  }

  private way(): Way {
    return {
      functions: this.functions,
      heading: element("h3", {}, "Formula"),
      fieldsOf: (entry) => (this.subject ? fieldsOf(entry, this.subject) : []),
      argumentsOf: (fields, typed) => (this.subject ? argumentsOf(this.subject, fields, typed) : []),
      draftOf: () => this.typed,
      controlOf: (id, field) => this.setControl(id, field),
      factsOf: () => [],
    };
  }

  private setControl(id: string, { role }: Field): Dressed | undefined {
    const { subject } = this;
    if (role !== "set" || !subject || subject.records.length === 0) return undefined;
    return { control: setChoice(id, subject), help: SET_HELP, extra: [] };
  }
}

function setChoice(id: string, subject: Subject): HTMLSelectElement {
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
