/**
 * The task pane: search, the chosen substance with its sets and its chart, and the form that writes a formula.
 * Importing this file does nothing; `mountPane` fills an element.
 */
import "../functions";
import { handbook } from "../handbook";
import { candidatesFor } from "./candidates";
import { chartView } from "./chart";
import { noticeOf } from "./disagreement";
import { element } from "./element";
import { functionsForSubstance } from "./fields";
import type { Host } from "./host";
import { identityView } from "./identity";
import { InsertForm } from "./insert";
import { limitsOf } from "./limits";
import { searchField } from "./search";
import { setsView } from "./sets";
import { subjectOf, type Subject } from "./subject";

const START = "N2";

/** Fills `root` with the pane; what was in it is replaced. */
export function mountPane(root: HTMLElement, host: Host): void {
  const status = element("p", { class: "still-status", role: "status" });
  const say = (sentence: string) => {
    status.textContent = sentence;
  };
  const form = new InsertForm(functionsForSubstance(handbook), host, say);
  const identity = element("div");
  const data = element("div", { class: "still-data" });
  const show = (subject: Subject) => {
    identity.replaceChildren(identityView(subject));
    data.replaceChildren(...dataViews(subject, form));
    form.show(subject);
    say("");
  };
  const search = searchField({
    find: candidatesFor,
    take(text) {
      const subject = subjectOf(text);
      show(subject);
      return takenSentence(subject);
    },
  });
  wear(root, host);
  root.replaceChildren(
    ...(host.kind === "page" ? [] : [header()]),
    search,
    element("div", { class: "still-columns" }, element("div", { class: "still-work" }, identity, form.section, status), data),
  );
  show(subjectOf(START));
}

function takenSentence({ title, records, parts }: Subject): string {
  if (parts.length > 0) return `${title}: ${parts.length} species.`;
  const first = records[0]?.set ?? "";
  return `${title}: ${records.length === 1 ? `one set, ${first}` : `${records.length} sets, first choice ${first}`}.`;
}

/** The page has its own head; in Excel the right corner of this one stays free for the host's menu. */
function header(): HTMLElement {
  return element(
    "header",
    { class: "still-header" },
    element("h1", {}, "Stillwall"),
    element("p", {}, "Heat at constant volume, with its sources"),
  );
}

function dataViews(subject: Subject, form: InsertForm): HTMLElement[] {
  const views = [chartView(subject, limitsOf(subject))];
  if (subject.records.length > 0) views.unshift(setsView(subject, noticeOf(subject), { use: (set) => form.useSet(set) }));
  return views;
}

function wear(root: HTMLElement, host: Host): void {
  root.classList.add("still-pane");
  root.dataset.theme = host.theme();
  host.onThemeChange((theme) => {
    root.dataset.theme = theme;
  });
}
