/** The chart with its reading: curves, temperature field and slider, one row per set, and all values as a table. */
import { choice } from "./choice";
import { drawChart, sample, type Drawing } from "./drawing";
import { element, freshId, scrolling } from "./element";
import { fixed, shown } from "./numbers";
import { chartOf, coveredSpan, differenceChart, quantityOf, readingsAt, type Limit, type Reading, type Source } from "./points";
import type { Span } from "./scale";
import type { Subject } from "./subject";
import { valuesTable } from "./values";

const HEIGHT = 256;
const START = 298.15;
/** Where the axis ends at first if the data go further, and the other ends to choose from, K. */
const USUAL_TOP = 3000;
const TOPS = [1500, USUAL_TOP, 6000];

/** The section. It draws itself anew when its width changes. */
export function chartView(subject: Subject, limits: readonly Limit[]): HTMLElement {
  return new ChartView(subject, limits).section;
}

class ChartView {
  readonly section: HTMLElement;
  private readonly sources: readonly Source[];
  private readonly order: readonly string[];
  private readonly quantity: "Cv" | "Cp";
  private readonly frame = element("div", { class: "still-chart-frame" });
  private readonly field = element("input", {
    id: freshId("read"),
    type: "number",
    class: "still-read-field",
    step: "any",
    inputmode: "decimal",
  });
  private readonly slider = element("input", {
    type: "range",
    class: "still-slider",
    step: "1",
    "aria-label": "Temperature of the reading, K",
  });
  private readonly rows = element("tbody");
  private readonly values = scrolling("Values as a table");
  private window: Span;
  private differences = false;
  private drawing: Drawing | undefined;
  private width = 0;
  private temperature: number;

  constructor(
    private readonly subject: Subject,
    private readonly limits: readonly Limit[],
  ) {
    this.sources = subject.sources;
    this.order = this.sources.map((source) => source.set);
    this.quantity = quantityOf(this.sources);
    const whole = coveredSpan(this.sources);
    this.window = coveredSpan(this.sources, USUAL_TOP);
    this.temperature = Math.min(whole[1], Math.max(whole[0], START));
    this.section = this.build(whole);
    this.listen();
    this.read(this.temperature);
    this.fillTable();
  }

  private build(whole: Span): HTMLElement {
    const heading = element("h3", {}, `${this.quantity} over temperature`);
    const choices = element("div", { class: "still-choices" }, ...this.curveChoice(), ...this.topChoice(whole));
    const reading = element("label", { for: this.field.id }, "Read at");
    return element(
      "section",
      { class: "still-section still-chart" },
      element("div", { class: "still-head" }, heading, choices),
      this.frame,
      element("div", { class: "still-read" }, reading, this.field, element("span", { "aria-hidden": "true" }, "K"), this.slider),
      this.legend(),
      element("details", { class: "still-values" }, element("summary", {}, "Values as a table"), this.values),
    );
  }

  private legend(): HTMLElement {
    const head = ["Set", `${this.quantity}, J/(mol K)`, ...(this.sources.length > 1 ? ["from first"] : [])];
    return element(
      "table",
      { class: "still-table still-legend" },
      element("caption", { class: "still-hidden" }, `${this.quantity} of each set at the chosen temperature`),
      element("thead", {}, element("tr", {}, ...head.map((text) => element("th", { scope: "col" }, text)))),
      this.rows,
    );
  }

  private curveChoice(): HTMLElement[] {
    if (this.sources.length < 2) return [];
    const options = { values: this.quantity, differences: "differences" };
    return [
      choice("What the chart shows", options, "values", (chosen) => {
        this.differences = chosen === "differences";
        this.redraw();
      }),
    ];
  }

  private topChoice(whole: Span): HTMLElement[] {
    const tops = [...TOPS.filter((top) => top > whole[0] + 200 && top < whole[1]), whole[1]];
    if (tops.length < 2) return [];
    const options = Object.fromEntries(tops.map((top) => [String(top), `to ${shown(top)} K`]));
    return [
      choice("Upper end of the temperature axis", options, String(this.window[1]), (chosen) => {
        this.window = coveredSpan(this.sources, Number(chosen));
        this.redraw();
        this.fillTable();
      }),
    ];
  }

  private listen(): void {
    this.field.addEventListener("input", () => this.read(this.field.value.trim() === "" ? NaN : Number(this.field.value), "field"));
    this.slider.addEventListener("input", () => this.read(Number(this.slider.value), "slider"));
    const follow = (event: PointerEvent) => {
      if (!this.drawing || (event.type === "pointermove" && event.pointerType === "touch")) return;
      this.read(Math.round(this.drawing.temperatureAt(event.clientX - this.drawing.svg.getBoundingClientRect().left)));
    };
    this.frame.addEventListener("pointermove", follow);
    this.frame.addEventListener("pointerdown", follow);
    new ResizeObserver(([entry]) => this.fit(entry?.contentRect.width ?? 0)).observe(this.frame);
  }

  private fit(width: number): void {
    const rounded = Math.floor(width);
    if (rounded === this.width || rounded < 120) return;
    this.width = rounded;
    this.redraw();
  }

  private redraw(): void {
    if (this.width === 0) return;
    const chart = this.differences ? differenceChart(this.sources, this.window) : chartOf(this.sources, this.limits, this.window);
    const range = `from ${shown(this.window[0])} to ${shown(this.window[1])} K`;
    const label = `${this.subject.title}: ${chart.axis} ${range}; the values stand in the table below`;
    this.drawing = drawChart(chart, this.order, this.width, HEIGHT, label);
    this.frame.replaceChildren(this.drawing.svg);
    this.slider.min = String(Math.ceil(this.window[0]));
    this.slider.max = String(Math.floor(this.window[1]));
    this.read(this.temperature);
  }

  /** Shows what every set says at a temperature; a control that is being used keeps its own text. */
  private read(temperature: number, by?: "field" | "slider"): void {
    this.temperature = temperature;
    const known = Number.isFinite(temperature);
    if (by !== "field") this.field.value = known ? String(temperature) : "";
    if (by !== "slider" && known) this.slider.value = String(temperature);
    this.slider.setAttribute("aria-valuetext", known ? `${shown(temperature)} K` : "no temperature");
    const readings = readingsAt(this.sources, temperature);
    this.rows.replaceChildren(...readings.map((reading, index) => legendRow(reading, index, readings.length > 1)));
    this.drawing?.mark(temperature, this.heights(readings));
  }

  /** Where the dots stand: at the values, or at the differences with the first at zero. */
  private heights(readings: readonly Reading[]): (number | null)[] {
    if (!this.differences) return readings.map(({ value }) => value);
    const base = readings[0]?.value ?? null;
    return readings.map(({ differencePercent }, index) => (index === 0 && base !== null ? 0 : differencePercent));
  }

  private fillTable(): void {
    this.values.replaceChildren(valuesTable(this.sources, this.limits, this.window));
  }
}

function legendRow({ set, from, to, value, differencePercent }: Reading, index: number, several: boolean): HTMLElement {
  const name = element("th", { scope: "row" }, sample(index), " ", set);
  if (value === null) {
    return element(
      "tr",
      {},
      name,
      element("td", { class: "still-outside", colspan: several ? 2 : 1 }, `outside ${shown(from)} to ${shown(to)} K`),
    );
  }
  const difference = differencePercent === null ? "" : `${differencePercent >= 0.005 ? "+" : ""}${fixed(differencePercent, 2)} %`;
  const cells = [fixed(value, 4), ...(several ? [difference] : [])];
  return element("tr", {}, name, ...cells.map((text) => element("td", { class: "still-number" }, text)));
}
