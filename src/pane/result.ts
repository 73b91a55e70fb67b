/** The preview of a formula in the form. */
import { element, scrolling } from "./element";
import { isWarning, type Line } from "./lines";
import type { Preview } from "./preview";

/** Shows a value with its unit, a table, or the sentence that stands for them. */
export function showPreview(output: HTMLElement, preview: Preview): void {
  output.dataset.kind = preview.kind;
  output.replaceChildren(...partsOf(preview));
}

function partsOf(preview: Preview): (Node | string)[] {
  if (preview.kind === "table") {
    const body = element("tbody", {}, ...preview.lines.map(lineView));
    return [element("table", { class: "still-table still-lines" }, body), element("p", { class: "still-help" }, preview.rest)];
  }
  if (preview.kind !== "value") return [preview.sentence];
  const single = preview.rows.length === 1 && preview.rows[0]?.length === 1 ? preview.rows[0][0] : undefined;
  if (single !== undefined) return [`= ${single}${preview.unit ? ` ${preview.unit}` : ""}`];
  return [scrolling("Result of the formula", table(preview.rows, preview.unit))];
}

/** Label and value with its unit; a warning takes the whole width. */
function lineView({ label, value, unit }: Line): HTMLElement {
  if (isWarning(label)) return element("tr", {}, element("td", { class: "still-warning", colspan: 2 }, `${label}: ${value}`));
  const quantity =
    unit === "" ? [value] : [value, " ", element("span", { class: "still-unit" }, /^\d/.test(unit) ? `\u00d7 ${unit}` : unit)];
  return element("tr", {}, element("th", { scope: "row" }, label), element("td", {}, ...quantity));
}

function table(rows: readonly (readonly string[])[], unit = ""): HTMLElement {
  const cells = rows.map((row) => element("tr", {}, ...row.map((cell) => element("td", {}, cell))));
  const caption = unit ? [element("caption", {}, unit)] : [];
  return element("table", { class: "still-table" }, ...caption, element("tbody", {}, ...cells));
}
