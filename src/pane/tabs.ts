/**
 * Tabs after the ARIA Authoring Practices Guide ("Tabs with Automatic Activation"): one tab stop; Left and Right go round, Home and End
 * to the ends, and the tab that has the focus is the one shown. A panel is built when it is shown first.
 */
import { element, freshId } from "./element";

export interface Tab {
  readonly title: string;
  build(): readonly HTMLElement[];
}

/** Index of the tab a key leads to; undefined for keys that are none of the tabs' own. Pure. */
export function tabAfter(key: string, at: number, count: number): number | undefined {
  switch (key) {
    case "ArrowRight":
      return (at + 1) % count;
    case "ArrowLeft":
      return (at + count - 1) % count;
    case "Home":
      return 0;
    case "End":
      return count - 1;
    default:
      return undefined;
  }
}

/** The list of tabs and their panels, the first one shown. */
export function tabbed(label: string, tabs: readonly Tab[]): HTMLElement[] {
  const panels = tabs.map(() => element("div", { id: freshId("panel"), class: "still-panel", role: "tabpanel" }));
  const handles = tabs.map(({ title }, at) => handle(title, panels[at]?.id ?? ""));
  handles.forEach(({ id }, at) => panels[at]?.setAttribute("aria-labelledby", id));
  const show = (chosen: number) => {
    panels.forEach((panel, at) => {
      panel.hidden = at !== chosen;
      if (at === chosen && panel.childElementCount === 0) panel.replaceChildren(...(tabs[at]?.build() ?? []));
    });
    handles.forEach((each, at) => {
      each.setAttribute("aria-selected", String(at === chosen));
      each.tabIndex = at === chosen ? 0 : -1;
    });
  };
  handles.forEach((each, at) => {
    each.addEventListener("click", () => show(at));
    each.addEventListener("keydown", (event) => {
      const next = event.altKey || event.ctrlKey || event.metaKey ? undefined : tabAfter(event.key, at, handles.length);
      if (next === undefined) return;
      event.preventDefault();
      show(next);
      handles[next]?.focus();
    });
  });
  show(0);
  return [element("div", { class: "still-tabs", role: "tablist", "aria-label": label }, ...handles), ...panels];
}

function handle(title: string, panel: string): HTMLButtonElement {
  return element("button", { id: freshId("tab"), type: "button", class: "still-tab", role: "tab", "aria-controls": panel }, title);
}
