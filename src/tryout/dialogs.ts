/** Questions, notices and the licence page. Native dialogs: the browser keeps the focus inside and gives it back. */
import { element } from "../pane/element";

export interface Choice<T> {
  readonly label: string;
  readonly value: T;
  readonly strong?: boolean;
}

/** Shows a dialog and resolves to the choice; Escape gives the last one. */
export function ask<T>(title: string, body: readonly (Node | string)[], choices: readonly Choice<T>[]): Promise<T> {
  const dialog = element("dialog", { class: "dialog", "aria-label": title }, element("h2", {}, title));
  for (const part of body) dialog.append(typeof part === "string" ? element("p", {}, part) : part);
  return new Promise((resolve) => {
    const last = choices[choices.length - 1] as Choice<T>;
    let chosen = last.value;
    const buttons = choices.map((choice) => {
      const button = element("button", { type: "button", class: choice.strong ? "button strong" : "button" }, choice.label);
      button.addEventListener("click", () => {
        chosen = choice.value;
        dialog.close();
      });
      return button;
    });
    dialog.append(element("div", { class: "dialog-buttons" }, ...buttons));
    dialog.addEventListener("close", () => {
      dialog.remove();
      resolve(chosen);
    });
    document.body.append(dialog);
    dialog.showModal();
    (buttons[choices.findIndex((choice) => choice.strong)] ?? buttons[0])?.focus({ preventScroll: true });
  });
}

/** A list for a dialog: one sentence an entry. */
export function sentences(list: readonly string[]): HTMLElement {
  return element("ul", {}, ...list.map((sentence) => element("li", {}, sentence)));
}

const NOTICE_TIME = 9000;

/** A sentence in the corner, read out by a screen reader. Errors stay until closed. */
export function notice(text: string, kind: "note" | "error" = "note"): void {
  const close = element("button", { type: "button", class: "button", "aria-label": "Close this notice" }, "×");
  const shown = element("div", { class: `notice ${kind}`, role: kind === "error" ? "alert" : "status" }, element("p", {}, text), close);
  close.addEventListener("click", () => shown.remove());
  noticeCorner().append(shown);
  if (kind === "note") setTimeout(() => shown.remove(), NOTICE_TIME);
}

function noticeCorner(): HTMLElement {
  const found = document.querySelector<HTMLElement>(".notices");
  if (found) return found;
  const made = element("div", { class: "notices" });
  document.body.append(made);
  return made;
}
