/** The head of the chosen species or mixture: what it is and how it is written in a cell. */
import { element } from "./element";
import { formulaParts } from "./markup";
import { shown } from "./numbers";
import type { Subject } from "./subject";
import { phaseWord } from "./words";

/** Name, formula, phase, molar mass; for a mixture its parts. */
export function identityView(subject: Subject): HTMLElement {
  const facts: HTMLElement[] = [];
  if (subject.formula) facts.push(...fact("Formula", element("span", {}, ...formulaParts(subject.formula))));
  facts.push(...fact("Phase", phaseWord(subject.phase)));
  facts.push(...fact("Molar mass", `${shown(subject.molarMass, 8)} g/mol`));
  facts.push(...fact("In a cell", element("code", {}, `"${subject.text}"`)));
  if (subject.synonyms.length > 0) facts.push(...fact("Also", subject.synonyms.join(", ")));
  const body: HTMLElement[] = [element("h2", {}, subject.title), element("dl", { class: "still-facts" }, ...facts)];
  if (subject.parts.length > 0) body.push(partsTable(subject));
  if (subject.composition) body.push(element("p", { class: "still-cite" }, subject.composition));
  return element("section", { class: "still-identity", "aria-label": "Chosen substance" }, ...body);
}

function fact(name: string, value: Node | string): HTMLElement[] {
  return [element("dt", {}, name), element("dd", {}, value)];
}

function partsTable(subject: Subject): HTMLElement {
  const head = element(
    "tr",
    {},
    element("th", { scope: "col" }, "Species"),
    element("th", { scope: "col", class: "still-number" }, "Mole fraction"),
    element("th", { scope: "col" }, "Set"),
  );
  const rows = subject.parts.map(({ species, fraction, set }) =>
    element(
      "tr",
      {},
      element("th", { scope: "row" }, species),
      element("td", { class: "still-number" }, shown(fraction)),
      element("td", {}, set),
    ),
  );
  return element(
    "table",
    { class: "still-table" },
    element("caption", {}, "Composition"),
    element("thead", {}, head),
    element("tbody", {}, ...rows),
  );
}
