/** The page's own toolbar: what to do with workbooks on the left, how to look at them on the right. */
import { element } from "../pane/element";

export interface BarDeeds {
  open(): void;
  save(): void;
  create(): void;
  sample(id: string): void;
  theme(): void;
  about(): void;
  /** Opens or closes the pane; tells whether it is open now. */
  side(): boolean;
}

export interface SampleEntry {
  readonly id: string;
  readonly title: string;
  readonly note: string;
}

export interface Bar {
  showBook(title: string, changed: boolean): void;
  showTheme(theme: "light" | "dark"): void;
  showSide(open: boolean): void;
}

export function buildBar(
  actions: HTMLElement,
  view: HTMLElement,
  book: HTMLElement,
  samples: readonly SampleEntry[],
  deeds: BarDeeds,
): Bar {
  const sampleMenu = menu("samples", sampleButtons(samples, deeds));
  const narrowMenu = menu("file-menu", [
    row("Open…", deeds.open),
    row("Save as .xlsx", deeds.save),
    row("New workbook", deeds.create),
    ...sampleButtons(samples, deeds),
    row("About", deeds.about),
  ]);
  actions.append(
    button("Open…", deeds.open),
    button("Save as .xlsx", deeds.save, "strong"),
    button("New", deeds.create),
    opener("Samples", sampleMenu),
    button("About", deeds.about),
  );
  const side = button("Pane", () => showSide(deeds.side()));
  side.setAttribute("aria-controls", "side");
  const theme = button("Dark", deeds.theme);
  view.append(opener("Workbook", narrowMenu, "only-narrow"), theme, side);
  document.body.append(sampleMenu, narrowMenu);
  function showSide(open: boolean): void {
    side.setAttribute("aria-expanded", String(open));
  }
  return {
    showSide,
    showBook(title, changed) {
      book.textContent = changed ? `${title} · not saved` : title;
      document.title = `${changed ? "• " : ""}${title} · Stillwall`;
    },
    showTheme(current) {
      theme.textContent = current === "dark" ? "Light" : "Dark";
      theme.setAttribute("aria-label", current === "dark" ? "Switch to light" : "Switch to dark");
    },
  };
}

function button(label: string, deed: () => void, look = ""): HTMLButtonElement {
  const made = element("button", { type: "button", class: `button ${look}`.trim() }, label);
  made.addEventListener("click", deed);
  return made;
}

/** An entry of a menu; the menu closes when it is chosen. */
function row(label: string, deed: () => void, note = ""): HTMLButtonElement {
  const made = element("button", { type: "button" }, label, ...(note ? [element("small", {}, note)] : []));
  made.addEventListener("click", () => {
    made.closest<HTMLElement>("[popover]")?.hidePopover();
    deed();
  });
  return made;
}

function sampleButtons(samples: readonly SampleEntry[], deeds: BarDeeds): HTMLButtonElement[] {
  return samples.map((sample) => row(sample.title, () => deeds.sample(sample.id), sample.note));
}

function menu(id: string, rows: readonly HTMLButtonElement[]): HTMLElement {
  return element("div", { id, class: "menu", popover: "auto" }, ...rows);
}

/** A button that opens a menu under itself. */
function opener(label: string, target: HTMLElement, look = ""): HTMLButtonElement {
  const made = button(label, () => undefined, look);
  made.setAttribute("popovertarget", target.id); // the browser opens and closes it
  made.setAttribute("aria-haspopup", "true");
  made.setAttribute("aria-expanded", "false");
  target.addEventListener("toggle", (event) => {
    const open = (event as ToggleEvent).newState === "open";
    made.setAttribute("aria-expanded", String(open));
    if (!open) return;
    const place = made.getBoundingClientRect();
    target.style.top = `${place.bottom + 4}px`;
    target.style.left = `${Math.max(8, Math.min(place.left, window.innerWidth - target.offsetWidth - 8))}px`;
    target.querySelector("button")?.focus();
  });
  return made;
}
