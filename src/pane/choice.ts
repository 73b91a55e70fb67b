/** A small native choice without a visible label of its own. */
import { element } from "./element";

/** `options` are value → text. */
export function choice(
  label: string,
  options: Readonly<Record<string, string>>,
  chosen: string,
  onChoose: (value: string) => void,
): HTMLElement {
  const select = element("select", { class: "still-choice", "aria-label": label });
  for (const [value, text] of Object.entries(options)) select.append(element("option", { value, selected: value === chosen }, text));
  select.addEventListener("change", () => onChoose(select.value));
  return select;
}
