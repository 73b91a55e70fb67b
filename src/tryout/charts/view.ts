/** One chart on the page: its title, drawing, legend, remarks, and its figures as a table that is filled when it is opened. */
import type { BookChart } from "../../book/chart";
import { element, scrolling } from "../../pane/element";
import { figureTables } from "./figures";
import { layoutOf } from "./layout";
import { pictureOf, sampleOf } from "./picture";
import { plotOf, type Cells, type Plot } from "./plot";
import { labelOf } from "./words";

const NARROWEST = 160;
/** Height of the drawing for its width, pixels: lower on a telephone, where the cells need the room. */
const heightFor = (width: number) => Math.round(Math.min(232, Math.max(176, width * 0.6)));

export class ChartView {
  readonly figure: HTMLElement;
  /** Title of the chart as the cells stand, or its number. */
  name: string;
  private readonly title = element("figcaption", { class: "chart-title" });
  private readonly up = element("p", { class: "chart-axis-name", "aria-hidden": "true" });
  private readonly frame = element("div", { class: "chart-frame" });
  private readonly across = element("p", { class: "chart-axis-name chart-across", "aria-hidden": "true" });
  private readonly legend = element("ul", { class: "chart-legend", "aria-label": "Series" });
  private readonly remarks = element("ul", { class: "chart-remarks", "aria-label": "Remarks on the drawing" });
  private readonly tables: HTMLElement;
  private readonly details: HTMLDetailsElement;
  private plot: Plot | undefined;
  private known = "";
  private width = 0;

  constructor(
    private readonly chart: BookChart,
    private readonly number: string,
  ) {
    this.name = number;
    this.tables = scrolling(`Figures of ${number}`);
    this.details = element("details", { class: "chart-figures" }, element("summary", {}, "Figures as a table"), this.tables);
    const drawing = element("div", { class: "chart-picture" }, this.up, this.frame, this.across);
    const beside = element("div", { class: "chart-beside" }, this.legend, this.remarks);
    this.figure = element(
      "figure",
      { class: "chart" },
      this.title,
      element("div", { class: "chart-parts" }, drawing, beside, this.details),
    );
    this.details.addEventListener("toggle", () => this.fillTables());
    new ResizeObserver(([entry]) => this.fit(entry?.contentRect.width ?? 0)).observe(this.frame);
  }

  /** Takes the cells as they stand; `drawn` is false while nobody can see the drawing. */
  update(cells: Cells, drawn: boolean): void {
    if (!drawn && this.plot) return;
    const plot = plotOf(this.chart, cells);
    const now = JSON.stringify(plot);
    if (now === this.known) return;
    this.known = now;
    this.plot = plot;
    this.name = plot.title || this.number;
    this.title.textContent = this.name;
    this.up.textContent = plot.yTitle;
    this.across.textContent = plot.xTitle;
    this.legend.replaceChildren(...plot.series.map((series) => element("li", {}, sampleOf(series), element("span", {}, series.name))));
    this.remarks.replaceChildren(...plot.remarks.map((remark) => element("li", {}, remark)));
    this.remarks.hidden = plot.remarks.length === 0;
    this.draw();
    this.fillTables();
  }

  private fit(width: number): void {
    const rounded = Math.floor(width);
    if (rounded === this.width || rounded < NARROWEST) return;
    this.width = rounded;
    this.draw();
  }

  private draw(): void {
    if (!this.plot || this.width === 0) return;
    this.frame.replaceChildren(pictureOf(layoutOf(this.plot, this.width, heightFor(this.width)), labelOf(this.plot, this.name)));
  }

  private fillTables(): void {
    this.tables.replaceChildren(...(this.plot && this.details.open ? figureTables(this.plot) : []));
  }
}
