/** The panel of a substance: search, the chosen substance with its sets and its chart, and the form that writes a formula. */
import { handbook } from "../handbook";
import { candidatesFor } from "./candidates";
import { chartView } from "./chart";
import { noticeOf } from "./disagreement";
import { element } from "./element";
import { functionsForSubstance } from "./fields";
import { identityView } from "./identity";
import { limitsOf } from "./limits";
import type { Outlet } from "./outlet";
import { searchField } from "./search";
import { setsView } from "./sets";
import { subjectOf, type Subject } from "./subject";
import { SubstanceForm } from "./substance-way";

const START = "N2";

/** Its parts, with nitrogen chosen. */
export function substancePanel(outlet: Outlet): HTMLElement[] {
  const form = new SubstanceForm(functionsForSubstance(handbook), outlet);
  const identity = element("div");
  const data = element("div", { class: "still-data" });
  const show = (subject: Subject) => {
    identity.replaceChildren(identityView(subject));
    data.replaceChildren(...dataViews(subject, form));
    form.show(subject);
  };
  const search = searchField({
    find: candidatesFor,
    take(text) {
      const subject = subjectOf(text);
      show(subject);
      return takenSentence(subject);
    },
  });
  show(subjectOf(START));
  return [search, element("div", { class: "still-columns" }, element("div", { class: "still-work" }, identity, form.section), data)];
}

function takenSentence({ title, records, parts }: Subject): string {
  if (parts.length > 0) return `${title}: ${parts.length} species.`;
  const first = records[0]?.set ?? "";
  return `${title}: ${records.length === 1 ? `one set, ${first}` : `${records.length} sets, first choice ${first}`}.`;
}

function dataViews(subject: Subject, form: SubstanceForm): HTMLElement[] {
  const views = [chartView(subject, limitsOf(subject))];
  if (subject.records.length > 0) views.unshift(setsView(subject, noticeOf(subject), { use: (set) => form.useSet(set) }));
  return views;
}
