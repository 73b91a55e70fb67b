/**
 * The task pane: two ways to a formula, from a substance of the library or from what a laboratory measured.
 * Importing this file does nothing; `mountPane` fills an element.
 */
import "../functions";
import { handbook } from "../handbook";
import { element } from "./element";
import type { Host } from "./host";
import { laboratoryForm } from "./laboratory-way";
import { Outlet } from "./outlet";
import { substancePanel } from "./substance-panel";
import { tabbed } from "./tabs";
import { Target } from "./target";

/** Fills `root` with the pane; what was in it is replaced. */
export function mountPane(root: HTMLElement, host: Host): void {
  const target = new Target(host);
  wear(root, host);
  root.replaceChildren(
    ...(host.kind === "page" ? [] : [header()]),
    ...tabbed("What a formula starts from", [
      { title: "Substance", build: () => substancePanel(new Outlet(host, target)) },
      { title: "Vessels and runs", build: () => [laboratoryForm(handbook, new Outlet(host, target))] },
    ]),
  );
}

/** The page has its own head; in Excel the right corner of this one stays free for the host's menu. */
function header(): HTMLElement {
  return element(
    "header",
    { class: "still-header" },
    element("h1", {}, "Stillwall"),
    element("p", {}, "Heat at constant volume, with its sources"),
  );
}

function wear(root: HTMLElement, host: Host): void {
  root.classList.add("still-pane");
  root.dataset.theme = host.theme();
  host.onThemeChange((theme) => {
    root.dataset.theme = theme;
  });
}
