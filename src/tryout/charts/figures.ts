/** The figures of a chart as tables, for the screen reader and for whoever wants to read a number off. */
import { element } from "../../pane/element";
import type { Plot } from "./plot";
import { figuresOf, type Figures } from "./words";

export function figureTables(plot: Plot): HTMLElement[] {
  return figuresOf(plot).flatMap((figures) => [tableOf(figures), ...rest(figures)]);
}

function tableOf({ head, rows }: Figures): HTMLElement {
  const headings = head.map((text) => element("th", { scope: "col" }, text));
  return element(
    "table",
    { class: "chart-table" },
    element("thead", {}, element("tr", {}, ...headings)),
    element("tbody", {}, ...rows.map(([place = "", ...values]) => rowOf(place, values))),
  );
}

const rowOf = (place: string, values: readonly string[]) =>
  element("tr", {}, element("th", { scope: "row" }, place), ...values.map((value) => element("td", {}, value)));

const rest = ({ more }: Figures) => (more > 0 ? [element("p", {}, `${more} more rows stand in the cells.`)] : []);
