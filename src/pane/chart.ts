/** The chart with its reading: curve, temperature field and slider, one row per set, and all values as a table. */
import { coveredSpan, chartOf, quantityOf, readingsAt, tableTemperatures, type Limit, type Reading, type Source } from "./points";
import { drawChart, sample, type Drawing } from "./drawing";
import { element, freshId } from "./element";
import { fixed, shown } from "./numbers";
import type { Span } from "./scale";
import type { Subject } from "./subject";

const HEIGHT = 250;
const START = 298.15;
/** Upper ends of the axis to choose from, K, below the end of the data. */
const TOPS = [1500, 3000, 6000];

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
  private readonly field = element("input", { id: freshId("read"), type: "number", class: "still-read-field", step: "any", inputmode: "decimal" });
  private readonly slider = element("input", { type: "range", class: "still-slider", step: "1", "aria-label": "Temperature of the reading, K" });
  private readonly rows = element("tbody");
  private readonly values = element("div", { class: "still-scroll" });
  private window: Span;
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
    this.window = coveredSpan(this.sources, whole[1] > 3000 ? 3000 : Infinity);
    this.temperature = Math.min(whole[1], Math.max(whole[0], START));
    this.section = this.build(whole);
    this.listen();
    this.read(this.temperature);
    this.fillTable();
  }

  private build(whole: Span): HTMLElement {
    const heading = `${this.quantity} over temperature`;
    const legend = element(
      "table",
      { class: "still-table still-legend" },
      element("caption", { class: "still-hidden" }, `${this.quantity} of each set at the chosen temperature`),
      element("thead", {}, element("tr", {}, ...["Set", `${this.quantity}, J/(mol K)`, "from first"].map((text) => element("th", { scope: "col" }, text)))),
      this.rows,
    );
    return element(
      "section",
      { class: "still-section still-chart" },
      element("div", { class: "still-head" }, element("h3", {}, heading), this.topChoice(whole)),
      this.frame,
      element(
        "div",
        { class: "still-read" },
        element("label", { for: this.field.id }, "Read at"),
        this.field,
        element("span", { "aria-hidden": "true" }, "K"),
        this.slider,
      ),
      legend,
      element("details", { class: "still-values" }, element("summary", {}, "Values as a table"), this.values),
    );
  }

  private topChoice(whole: Span): HTMLElement {
    const tops = TOPS.filter((top) => top > whole[0] + 200 && top < whole[1]);
    if (tops.length === 0) return element("span");
    const select = element("select", { class: "still-top", "aria-label": "Upper end of the temperature axis" });
    for (const top of tops) select.append(element("option", { value: top, selected: top === this.window[1] }, `to ${top} K`));
    select.append(element("option", { value: whole[1], selected: whole[1] === this.window[1] }, `to ${shown(whole[1])} K`));
    select.addEventListener("change", () => {
      this.window = coveredSpan(this.sources, Number(select.value));
      this.redraw();
      this.fillTable();
    });
    return select;
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
    const chart = chartOf(this.sources, this.limits, this.window);
    const label = `${this.quantity} of ${this.subject.title} in J/(mol K) from ${shown(this.window[0])} to ${shown(this.window[1])} K; the values stand in the table below`;
    this.drawing = drawChart(chart, this.order, this.width, HEIGHT, label);
    this.frame.replaceChildren(this.drawing.svg);
    this.slider.min = String(Math.ceil(this.window[0]));
    this.slider.max = String(Math.floor(this.window[1]));
    this.read(this.temperature);
  }

  /** Shows what every set says at a temperature; a control that is being used keeps its own text. */
  private read(temperature: number, by?: "field" | "slider"): void {
    this.temperature = temperature;
    if (by !== "field") this.field.value = Number.isFinite(temperature) ? String(temperature) : "";
    if (by !== "slider" && Number.isFinite(temperature)) this.slider.value = String(temperature);
    this.slider.setAttribute("aria-valuetext", Number.isFinite(temperature) ? `${shown(temperature)} K` : "no temperature");
    const readings = readingsAt(this.sources, temperature);
    this.rows.replaceChildren(...readings.map((reading, index) => legendRow(reading, index)));
    this.drawing?.mark(temperature, readings);
  }

  private fillTable(): void {
    const temperatures = tableTemperatures(this.window);
    const head = ["T, K", ...this.order].map((text) => element("th", { scope: "col" }, text));
    const rows = temperatures.map((temperature) =>
      element(
        "tr",
        {},
        element("th", { scope: "row", class: "still-number" }, shown(temperature)),
        ...readingsAt(this.sources, temperature).map(({ value }) =>
          element("td", { class: "still-number" }, value === null ? "\u2013" : fixed(value, 3)),
        ),
      ),
    );
    const limits = this.limits.map(({ label, value }) => `${label} ${shown(value, 6)}`).join("; ");
    this.values.replaceChildren(
      element(
        "table",
        { class: "still-table" },
        element("caption", {}, `${this.quantity} in J/(mol K); a dash stands outside the range of a set.${limits ? ` Classical limits: ${limits}.` : ""}`),
        element("thead", {}, element("tr", {}, ...head)),
        element("tbody", {}, ...rows),
      ),
    );
  }
}

function legendRow({ set, from, to, value, differencePercent }: Reading, index: number): HTMLElement {
  const difference = differencePercent === null ? "" : `${differencePercent >= 0.005 ? "+" : ""}${fixed(differencePercent, 2)} %`;
  const cells =
    value === null
      ? [element("td", { class: "still-outside", colspan: 2 }, `outside ${shown(from)} to ${shown(to)} K`)]
      : [element("td", { class: "still-number" }, fixed(value, 4)), element("td", { class: "still-number" }, difference)];
  return element("tr", {}, element("th", { scope: "row" }, sample(index), " ", set), ...cells);
}
