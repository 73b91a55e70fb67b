/** The sets of the chosen species in the library's order: range, form, grade, printed reference, citation, flags. */
import { grades, sourceOf, type SetRecord } from "../data/library";
import type { Notice } from "./disagreement";
import { element } from "./element";
import { shown } from "./numbers";
import type { Subject } from "./subject";
import { formWord } from "./words";

export interface SetsDoor {
  /** The set for the formula below. */
  use(set: string): void;
}

/** The list; the first choice stands open, and above it where the sets disagree beyond their accuracy. */
export function setsView(subject: Subject, notice: Notice, door: SetsDoor): HTMLElement {
  const title = element("h3", {}, "Coefficient sets");
  const items = subject.records.map((record, index) => element("li", {}, setView(record, subject, index, door)));
  const list = element("ol", { class: "still-sets" }, ...items);
  return element("section", { class: "still-section still-sets-section" }, title, ...noticeViews(notice), list);
}

function noticeViews({ first, others }: Notice): HTMLElement[] {
  if (first.length + others.length === 0) return [];
  const lines = (sentences: readonly string[]) => sentences.map((sentence) => element("p", {}, sentence));
  const head = element("p", { class: "still-notice-head" }, "These sets disagree by more than their grades allow.");
  const more = `${others.length} more between the other sets`;
  const rest = others.length === 0 ? [] : [element("details", {}, element("summary", {}, more), ...lines(others))];
  return [element("div", { class: "still-notice", role: "note" }, head, ...lines(first), ...rest)];
}

function setView(record: SetRecord, subject: Subject, index: number, door: SetsDoor): HTMLElement {
  const use = element("button", { type: "button", class: "still-quiet" }, "Use in the formula");
  use.addEventListener("click", () => door.use(record.set));
  return element(
    "details",
    { class: "still-set", open: index === 0 },
    summaryOf(record, subject, index),
    element("dl", { class: "still-facts" }, ...details(record)),
    ...record.flags.map((flag) => element("p", { class: "still-flag" }, flag)),
    use,
  );
}

function summaryOf(record: SetRecord, subject: Subject, index: number): HTMLElement {
  const { capacity } = subject.sources[index] ?? {};
  const marks: HTMLElement[] = [element("span", { class: "still-set-id" }, record.set)];
  if (index === 0) marks.push(element("span", { class: "still-first" }, "first choice"));
  marks.push(element("span", { class: `still-grade still-grade-${record.grade}`, title: grades[record.grade] }, `grade ${record.grade}`));
  const range = capacity ? `${shown(capacity.from)} to ${shown(capacity.to)} K` : "";
  const notes = record.flags.length === 0 ? "" : `, ${record.flags.length} note${record.flags.length > 1 ? "s" : ""}`;
  return element(
    "summary",
    {},
    element("span", { class: "still-set-head" }, ...marks),
    element("span", { class: "still-set-line" }, `${range}, ${formWord(record.form)}${notes}`),
  );
}

function details(record: SetRecord): HTMLElement[] {
  const rows: [string, string][] = [
    ["Grade", `${record.grade}: ${grades[record.grade]}`],
    ["Reference", record.reference],
    ["Source", sourceOf(record.source).citation],
  ];
  return rows.filter(([, text]) => text !== "").flatMap(([name, text]) => [element("dt", {}, name), element("dd", {}, text)]);
}
