/** A small XML part as a tree of elements, for parts whose meaning lies in what stands in what (charts, drawings). */
import { refuse } from "../../core/refusal";
import { walkXml, type Attributes } from "./walk";

export interface XmlElement {
  /** Local name. */
  readonly name: string;
  readonly attributes: Attributes;
  readonly children: readonly XmlElement[];
  /** Text directly inside. */
  readonly text: string;
}

type Draft = { name: string; attributes: Attributes; children: Draft[]; text: string };

/** Deeper than this no chart or drawing goes; reading takes time with the square of the depth. */
const DEEPEST = 200;

/** Reads the elements of the namespaces in `seen`; what stands in an unseen element counts as standing in the seen one around it. */
export function readTree(text: string, part: string, seen: ReadonlySet<string>): XmlElement {
  const root: Draft = { name: "", attributes: {}, children: [], text: "" };
  const open = [root];
  const last = () => open[open.length - 1] as Draft;
  walkXml(
    text,
    part,
    {
      open(name, attributes) {
        const element: Draft = { name, attributes, children: [], text: "" };
        last().children.push(element);
        if (open.push(element) > DEEPEST) refuse(`The elements of the part ${part} stand more than ${DEEPEST} deep in one another`);
      },
      text: (piece) => void (last().text += piece),
      close: () => void open.pop(),
    },
    seen,
  );
  return root;
}

/** The element at the end of a path of children, always the first of its name; undefined where the path breaks off. */
export function at(element: XmlElement | undefined, ...path: readonly string[]): XmlElement | undefined {
  return path.reduce<XmlElement | undefined>((place, name) => place?.children.find((child) => child.name === name), element);
}

/** Attribute `val` of the element at the end of a path. */
export const valueAt = (element: XmlElement | undefined, ...path: readonly string[]): string | undefined =>
  at(element, ...path)?.attributes.val;

/** Elements of a name anywhere below, in the order of the file. */
export function below(element: XmlElement, name: string): XmlElement[] {
  const found: XmlElement[] = [];
  const waiting = [element];
  for (let next = waiting.pop(); next; next = waiting.pop()) {
    if (next.name === name) found.push(next);
    for (let i = next.children.length - 1; i >= 0; i--) waiting.push(next.children[i] as XmlElement);
  }
  return found;
}
