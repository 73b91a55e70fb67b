/** The search field: an editable combobox over the species and mixtures of the library, by name, formula or synonym. */
import { Refusal } from "../core/refusal";
import type { Candidate } from "./candidates";
import { CLOSED, listed, pressed, type ListState } from "./combobox";
import { element, freshId } from "./element";
import { formulaParts } from "./markup";

export interface SearchDoor {
  /** What fits a query, best first; for an empty query everything. */
  find(query: string): readonly Candidate[];
  /** Takes a substance by its text, from the list or as typed; gives a sentence on what was taken, throws a Refusal with the nearest names. */
  take(text: string): string;
}

/** More would not be read; the count says how many there are. */
const SHOWN = 40;

/** Builds the field. */
export function searchField(door: SearchDoor): HTMLElement {
  const list = freshId("list");
  const input = element("input", {
    id: freshId("search"),
    class: "still-search-input",
    type: "text",
    role: "combobox",
    autocomplete: "off",
    autocapitalize: "none",
    spellcheck: "false",
    placeholder: "name or formula, such as CO2 or ethanol",
    "aria-autocomplete": "list",
    "aria-expanded": "false",
    "aria-controls": list,
  });
  const options = element("ul", { id: list, class: "still-options", role: "listbox", "aria-label": "Substances", hidden: true });
  const count = element("p", { class: "still-count", role: "status" });
  const box = new SearchBox(door, input, options, count);
  input.addEventListener("input", () => box.query());
  input.addEventListener("keydown", (event) => box.key(event));
  input.addEventListener("blur", () => box.close());
  options.addEventListener("mousedown", (event) => event.preventDefault()); // the focus stays in the field
  return element(
    "div",
    { class: "still-search" },
    element("label", { for: input.id }, "Species or mixture"),
    element("div", { class: "still-search-frame" }, input, options),
    count,
  );
}

class SearchBox {
  private state: ListState = CLOSED;
  private found: readonly Candidate[] = [];
  private total = 0;

  constructor(
    private readonly door: SearchDoor,
    private readonly input: HTMLInputElement,
    private readonly options: HTMLUListElement,
    private readonly count: HTMLElement,
  ) {}

  query(): void {
    const text = this.input.value.trim();
    this.fill(text === "" ? [] : this.door.find(text));
    this.tell(text === "" ? "" : this.countSentence(text));
  }

  key(event: KeyboardEvent): void {
    if (event.isComposing) return;
    if (this.state.count === 0 && (event.key === "ArrowDown" || event.key === "ArrowUp")) this.fillForArrows();
    const step = pressed(this.state, event.key, event.altKey);
    if (step.handled) event.preventDefault();
    const active = this.found[this.state.active];
    this.state = step.state;
    this.show();
    if (step.act === "choose" && active) this.take(active.text);
    if (step.act === "ask") this.take(this.input.value.trim());
    if (step.act === "clear") this.clear();
  }

  close(): void {
    this.state = { ...this.state, open: false, active: -1 };
    this.show();
  }

  private fillForArrows(): void {
    const text = this.input.value.trim();
    this.fill(this.door.find(text));
    this.state = { ...this.state, open: false };
    this.tell(this.countSentence(text));
  }

  private fill(found: readonly Candidate[]): void {
    this.found = found.slice(0, SHOWN);
    this.total = found.length;
    this.state = listed(this.found.length);
    this.options.replaceChildren(...this.found.map((entry, index) => this.option(entry, index)));
    this.show();
  }

  private countSentence(text: string): string {
    if (this.total === 0) return `Nothing found for \u201c${text}\u201d. Enter asks for the nearest names.`;
    const all = `${this.total} ${text === "" ? "substances" : this.total === 1 ? "substance found" : "substances found"}`;
    return this.total > SHOWN ? `${all}, the first ${SHOWN} listed.` : `${all}.`;
  }

  private option(entry: Candidate, index: number): HTMLLIElement {
    const item = element(
      "li",
      { id: `${this.options.id}-${index}`, class: "still-option", role: "option", "aria-selected": "false" },
      element("span", { class: "still-option-name" }, entry.name),
      " ",
      element("span", { class: "still-option-formula" }, ...formulaParts(entry.formula)),
      " ",
      element("span", { class: "still-option-phase" }, entry.kind),
    );
    item.addEventListener("click", () => {
      this.close();
      this.take(entry.text);
    });
    return item;
  }

  private show(): void {
    const { open, active } = this.state;
    this.options.hidden = !open;
    this.input.setAttribute("aria-expanded", String(open));
    this.options.querySelectorAll("[role=option]").forEach((item, index) => {
      item.setAttribute("aria-selected", String(open && index === active));
      if (open && index === active) item.scrollIntoView({ block: "nearest" });
    });
    if (open && active >= 0) this.input.setAttribute("aria-activedescendant", `${this.options.id}-${active}`);
    else this.input.removeAttribute("aria-activedescendant");
  }

  private take(text: string): void {
    if (text === "") return;
    try {
      this.tell(this.door.take(text));
      this.input.value = text;
      this.close();
    } catch (thrown) {
      if (!(thrown instanceof Refusal)) throw thrown;
      this.tell(thrown.message, "refused");
    }
  }

  private tell(sentence: string, kind: "found" | "refused" = "found"): void {
    this.count.dataset.kind = kind;
    this.count.textContent = sentence;
  }

  private clear(): void {
    this.input.value = "";
    this.tell("");
    this.found = [];
    this.options.replaceChildren();
  }
}
