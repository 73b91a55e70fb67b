/** Building document parts without markup text: nothing the user or a data file says can become an element or a script. */

type Attributes = Readonly<Record<string, string | number | boolean | undefined>>;
type Content = Node | string;

const SVG = "http://www.w3.org/2000/svg";
let serial = 0;

/** An id not used before on this page, so that two panes can stand on it. */
export function freshId(stem: string): string {
  serial += 1;
  return `still-${stem}-${serial}`;
}

/** An HTML element. `true` gives an empty attribute; `false` and `undefined` leave it out. */
export function element<K extends keyof HTMLElementTagNameMap>(
  tag: K,
  attributes: Attributes = {},
  ...content: readonly Content[]
): HTMLElementTagNameMap[K] {
  return filled(document.createElement(tag), attributes, content);
}

/** A frame in which a wide table scrolls, also by keyboard. */
export function scrolling(label: string, ...content: readonly Content[]): HTMLElement {
  return element("div", { class: "still-scroll", role: "region", tabindex: 0, "aria-label": label }, ...content);
}

/** An SVG element, in the same manner. */
export function drawn<K extends keyof SVGElementTagNameMap>(
  tag: K,
  attributes: Attributes = {},
  ...content: readonly Content[]
): SVGElementTagNameMap[K] {
  return filled(document.createElementNS(SVG, tag), attributes, content);
}

function filled<E extends Element>(target: E, attributes: Attributes, content: readonly Content[]): E {
  for (const [name, value] of Object.entries(attributes)) {
    if (value === undefined || value === false) continue;
    target.setAttribute(name, value === true ? "" : String(value));
  }
  target.append(...content);
  return target;
}
