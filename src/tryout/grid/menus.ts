/**
 * Takes out of the grid's menus what does not work here or would not be kept: charts and pivots (the chart library is not part of the page,
 * and pivots are not stored in .xlsx), images, its own file menu (the page has one), links that lead out of the page.
 */
import { registries } from "./engine";

/** Entries of the menu bar, by the menu they stand in. */
const UNWANTED_IN_BAR: Readonly<Record<string, readonly string[]>> = {
  insert: ["insert_chart", "insert_carousel", "insert_pivot", "insert_image", "insert_link"],
  data: ["pivot_data_sources", "reinsert_dynamic_pivot", "reinsert_static_pivot"],
  view: ["view_irregularity_map"],
};

const UNWANTED_ON_CELLS = [
  "insert_link",
  "pivot_headers_group",
  "pivot_group_remaining",
  "pivot_headers_ungroup",
  "collapse_pivot",
  "pivot_sorting",
  "pivot_fix_formulas",
  "pivot_properties",
];

interface MenuNode {
  id?: string;
  children?: unknown[];
}

export function trimMenus(): void {
  const bar = registries.topbarMenuRegistry;
  bar.remove("file");
  for (const [menu, unwanted] of Object.entries(UNWANTED_IN_BAR)) {
    const node = bar.get(menu) as MenuNode;
    node.children = (node.children ?? []).filter((child) => !unwanted.includes((child as MenuNode).id ?? ""));
  }
  for (const id of UNWANTED_ON_CELLS) registries.cellMenuRegistry.remove(id);
}

/**
 * Keys that the grid takes for itself and this page does not want: Ctrl+P is its own print view, which needs style rules written by script (the
 * page's policy forbids those, and the browser's print stays); Ctrl+K makes links. Must run before the grid is mounted, so that this listener
 * comes first.
 */
export function silenceKeys(): void {
  const silenced = new Set(["p", "k"]);
  const silence = (event: KeyboardEvent) => {
    if ((event.ctrlKey || event.metaKey) && silenced.has(event.key.toLowerCase())) event.stopImmediatePropagation();
  };
  window.addEventListener("keydown", silence, { capture: true });
}

/** A text in a cell that is a web address becomes a link in the grid. The page opens nothing outside itself; `tell` says so. */
export function followNoLinks(tell: (sentence: string) => void): void {
  window.open = (address) => {
    tell(`This page opens no other one: ${String(address ?? "")}`);
    return null;
  };
}
