/** The curves as a table of numbers: what a screen reader reads and what can be copied. */
import { element } from "./element";
import { fixed, shown } from "./numbers";
import { quantityOf, readingsAt, tableTemperatures, type Limit, type Source } from "./points";
import type { Span } from "./scale";

export function valuesTable(sources: readonly Source[], limits: readonly Limit[], window: Span): HTMLElement {
  const head = ["T, K", ...sources.map(({ set }) => set)].map((text) => element("th", { scope: "col" }, text));
  return element(
    "table",
    { class: "still-table" },
    element("caption", {}, caption(sources, limits)),
    element("thead", {}, element("tr", {}, ...head)),
    element("tbody", {}, ...tableTemperatures(window).map((temperature) => row(sources, temperature))),
  );
}

function caption(sources: readonly Source[], limits: readonly Limit[]): string {
  const lines = limits.map(({ label, value }) => `${label} ${shown(value, 6)}`).join("; ");
  const dash = "a dash stands outside the range of a set.";
  return `${quantityOf(sources)} in J/(mol K); ${dash}${lines ? ` Classical limits: ${lines}.` : ""}`;
}

function row(sources: readonly Source[], temperature: number): HTMLElement {
  const cells = readingsAt(sources, temperature).map(({ value }) => (value === null ? "\u2013" : fixed(value, 3)));
  return element(
    "tr",
    {},
    element("th", { scope: "row", class: "still-number" }, shown(temperature)),
    ...cells.map((text) => element("td", { class: "still-number" }, text)),
  );
}
