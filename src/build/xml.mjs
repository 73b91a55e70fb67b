// @ts-check
/** The few words of XML that the manifest check needs: elements with attributes, children and text. */
import { SaxesParser } from "saxes";

/** @typedef {{ name: string, attributes: Record<string, string>, children: XmlElement[], text: string }} XmlElement */

/** @param {string} text @returns {XmlElement} the root element */
export function parseXml(text) {
  /** @type {XmlElement} */
  const outside = { name: "", attributes: {}, children: [], text: "" };
  const open = [outside];
  const parser = new SaxesParser();
  parser.on("error", (error) => {
    throw error;
  });
  parser.on("opentag", ({ name, attributes }) => {
    const element = { name, attributes: { ...attributes }, children: [], text: "" };
    open.at(-1)?.children.push(element);
    open.push(element);
  });
  parser.on("text", (piece) => {
    const element = open.at(-1);
    if (element) element.text += piece;
  });
  parser.on("closetag", () => void open.pop());
  parser.write(text).close();
  const root = outside.children[0];
  if (!root) throw new Error("the XML has no element");
  return root;
}

/** Elements of one name anywhere below. @param {XmlElement} element @param {string} name @returns {XmlElement[]} */
export function below(element, name) {
  return element.children.flatMap((child) => [...(child.name === name ? [child] : []), ...below(child, name)]);
}

/** First child with this name, or undefined. @param {XmlElement} element @param {string} name */
export function child(element, name) {
  return element.children.find((candidate) => candidate.name === name);
}
