/**
 * The charts of the sheet on show, under the grid: a strip that opens and closes them, each drawn from the cells as they stand. Drawn anew
 * only when its numbers or its width change, so an open table or a text selected in it stays as it is.
 */
import { element } from "../../pane/element";
import type { OpenDocument } from "../document";
import { gridName } from "../grid/sheet-names";
import { gridCells } from "./cells";
import { ChartView } from "./view";
import { keptSentence } from "./words";

const BODY = "charts-body";

export class ChartPanel {
  private readonly toggle = element("button", { type: "button", class: "charts-toggle", "aria-controls": BODY });
  private readonly body = element("div", { id: BODY, class: "charts-body" });
  private readonly kept = element("p", { class: "charts-kept" });
  private views: readonly ChartView[] = [];
  private document: OpenDocument | undefined;
  private sheetId = "";
  private waiting = false;

  constructor(
    private readonly section: HTMLElement,
    private open: boolean,
  ) {
    section.append(element("h2", { class: "charts-head" }, this.toggle), this.body, this.kept);
    this.toggle.addEventListener("click", () => this.show(!this.open));
    section.addEventListener("keydown", (event) => {
      if (event.key !== "Escape" || !this.open) return;
      this.show(false);
      this.toggle.focus();
    });
  }

  /** To be called when the workbook, the sheet on show or any cell may have changed. */
  follow(document: OpenDocument): void {
    const sheetId = document.model.getters.getActiveSheetId();
    if (document !== this.document || sheetId !== this.sheetId) {
      this.document = document;
      this.sheetId = sheetId;
      this.build();
    }
    if (this.views.length > 0) this.redrawSoon();
  }

  private build(): void {
    const found = this.document?.charts.find(({ sheet }) => gridName(sheet) === this.sheetId);
    const { charts = [], others = [] } = found ?? {};
    this.views = charts.map((chart, index) => new ChartView(chart, charts.length > 1 ? `Chart ${index + 1}` : "Chart"));
    this.body.replaceChildren(...this.views.map(({ figure }) => figure));
    this.kept.textContent = keptSentence(others);
    this.kept.hidden = others.length === 0;
    (this.toggle.parentElement as HTMLElement).hidden = charts.length === 0;
    const before = this.section.hidden;
    this.section.hidden = !found;
    this.show(this.open, before !== this.section.hidden);
  }

  private show(open: boolean, resized = this.open !== open): void {
    this.open = open;
    this.toggle.setAttribute("aria-expanded", String(open));
    this.body.hidden = !open || this.views.length === 0;
    this.name();
    if (resized) window.dispatchEvent(new Event("resize")); // the grid measures itself anew
    if (open) this.redrawSoon();
  }

  private name(): void {
    const title = this.views.length === 1 ? this.views[0]?.name : `${this.views.length} charts of this sheet`;
    this.toggle.textContent = title ?? "";
  }

  /** Once for all changes up to the next frame. */
  private redrawSoon(): void {
    if (this.waiting) return;
    this.waiting = true;
    requestAnimationFrame(() => {
      this.waiting = false;
      if (!this.document) return;
      const cells = gridCells(this.document.model);
      for (const view of this.views) view.update(cells, this.open);
      this.name();
    });
  }
}
