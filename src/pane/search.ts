/** The search field: an editable combobox over the species of the library, by name, formula or synonym. */
import { Refusal } from "../core/refusal";
import type { SpeciesEntry } from "../data/library";
import { CLOSED, listed, pressed, type ListState } from "./combobox";
import { element, freshId } from "./element";
import { formulaParts } from "./markup";
import { phaseWord } from "./words";

export interface SearchDoor {
  /** Species that fit a query, best first; for an empty query all of them. */
  find(query: string): readonly SpeciesEntry[];
  choose(entry: SpeciesEntry): void;
  /** Takes what is typed as it stands (a mixture, a synonym); throws a Refusal with the nearest names. */
  take(text: string): void;
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
  const options = element("ul", { id: list, class: "still-options", role: "listbox", "aria-label": "Species", hidden: true });
  const count = element("p", { class: "still-count", role: "status" });
  const box = new SearchBox(door, input, options, count);
  input.addEventListener("input", () => box.query());
  input.addEventListener("keydown", (event) => box.key(event));
  input.addEventListener("blur", () => box.close());
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
  private found: readonly SpeciesEntry[] = [];

  constructor(
    private readonly door: SearchDoor,
    private readonly input: HTMLInputElement,
    private readonly options: HTMLUListElement,
    private readonly count: HTMLElement,
  ) {}

  query(): void {
    const text = this.input.value.trim();
    this.fill(text === "" ? [] : this.door.find(text));
    this.count.textContent = text === "" ? "" : this.countSentence(text);
  }

  key(event: KeyboardEvent): void {
    if (event.isComposing) return;
    if (this.state.count === 0 && (event.key === "ArrowDown" || event.key === "ArrowUp")) this.fillForArrows();
    const step = pressed(this.state, event.key, event.altKey);
    if (step.handled) event.preventDefault();
    const active = this.found[this.state.active];
    this.state = step.state;
    this.show();
    if (step.act === "choose" && active) this.choose(active);
    if (step.act === "ask") this.ask();
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
    this.count.textContent = this.countSentence(text);
  }

  private fill(found: readonly SpeciesEntry[]): void {
    this.found = found.slice(0, SHOWN);
    this.total = found.length;
    this.state = listed(this.found.length);
    this.options.replaceChildren(...this.found.map((entry, index) => this.option(entry, index)));
    this.show();
  }

  private total = 0;

  private countSentence(text: string): string {
    if (this.total === 0) return `No species found for \u201c${text}\u201d. Enter asks for the nearest names.`;
    const all = `${this.total} species${text === "" ? "" : " found"}`;
    return this.total > SHOWN ? `${all}, the first ${SHOWN} listed.` : `${all}.`;
  }

  private option(entry: SpeciesEntry, index: number): HTMLLIElement {
    const item = element(
      "li",
      { id: `${this.options.id}-${index}`, class: "still-option", role: "option", "aria-selected": "false" },
      element("span", { class: "still-option-name" }, entry.name),
      " ",
      element("span", { class: "still-option-formula" }, ...formulaParts(entry.formula)),
      " ",
      element("span", { class: "still-option-phase" }, phaseWord(entry.phase)),
    );
    item.addEventListener("mousedown", (event) => event.preventDefault());
    item.addEventListener("click", () => {
      this.close();
      this.choose(entry);
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

  private choose(entry: SpeciesEntry): void {
    this.input.value = entry.key;
    this.count.textContent = "";
    this.door.choose(entry);
  }

  private ask(): void {
    const text = this.input.value.trim();
    if (text === "") return;
    try {
      this.door.take(text);
      this.close();
      this.count.textContent = "";
    } catch (thrown) {
      if (!(thrown instanceof Refusal)) throw thrown;
      this.count.textContent = thrown.message;
    }
  }

  private clear(): void {
    this.input.value = "";
    this.count.textContent = "";
    this.found = [];
    this.options.replaceChildren();
  }
}
