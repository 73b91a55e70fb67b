/** Reads XML as a stream of events with namespaces resolved, so that `<x:c>` and `<c>` are the same element. */
import { SaxesParser, type SaxesAttributeNS, type SaxesTagNS } from "saxes";
import { Refusal, refuse } from "../../core/refusal";

/** Attributes of an element by local name, unprefixed ones only (`r`, `t`, `ref`), and the relationship id (`r:id`) where there is one. */
export type Attributes = Readonly<Record<string, string | undefined>>;

export interface XmlHandler {
  /** Called for elements of the namespaces that are read: as a rule the spreadsheet's (transitional or strict), those of relationships and of content types; others pass unseen. */
  open?(name: string, attributes: Attributes): void;
  text?(text: string): void;
  close?(name: string): void;
}

const SEEN = new Set([
  "http://schemas.openxmlformats.org/spreadsheetml/2006/main",
  "http://purl.oclc.org/ooxml/spreadsheetml/main",
  "http://schemas.openxmlformats.org/package/2006/relationships",
  "http://schemas.openxmlformats.org/package/2006/content-types",
]);
/** Drawings on sheets, and the charts in them; the element names of sheets and drawings meet, so a part is read with one set or the other. */
export const DRAWN: ReadonlySet<string> = new Set(
  ["chart", "spreadsheetDrawing", "main"].flatMap((name) => [
    `http://schemas.openxmlformats.org/drawingml/2006/${name}`,
    `http://purl.oclc.org/ooxml/drawingml/${name}`,
  ]),
);
const RELATIONSHIPS = new Set([
  "http://schemas.openxmlformats.org/officeDocument/2006/relationships",
  "http://purl.oclc.org/ooxml/officeDocument/relationships",
]);

/** Walks through one part. A document type declaration is refused: no workbook needs one, and entities can unfold without end. */
export function walkXml(text: string, part: string, handler: XmlHandler, seen: ReadonlySet<string> = SEEN): void {
  const parser = new SaxesParser({ xmlns: true, position: false });
  parser.on("doctype", () => refuse(`The part ${part} holds a document type declaration, which a workbook must not`));
  parser.on("error", (error) => {
    throw new Refusal("input", `The part ${part} is not well-formed XML: ${error.message}`);
  });
  if (handler.open) parser.on("opentag", (tag) => seen.has(tag.uri) && handler.open?.(tag.local, plainAttributes(tag)));
  if (handler.close) parser.on("closetag", (tag) => seen.has(tag.uri) && handler.close?.(tag.local));
  if (handler.text) {
    parser.on("text", (piece) => handler.text?.(piece));
    parser.on("cdata", (piece) => handler.text?.(piece));
  }
  parser.write(text).close();
}

function plainAttributes(tag: SaxesTagNS): Attributes {
  const plain: Record<string, string> = {};
  const attributes: Record<string, SaxesAttributeNS> = tag.attributes;
  for (const key in attributes) {
    const attribute = attributes[key] as SaxesAttributeNS;
    if (attribute.prefix === "") plain[attribute.local] = attribute.value;
    else if (attribute.local === "id" && RELATIONSHIPS.has(attribute.uri)) plain["r:id"] = attribute.value;
    else if (attribute.uri === "http://www.w3.org/XML/1998/namespace") plain[`xml:${attribute.local}`] = attribute.value;
  }
  return plain;
}

/** `1` and `true` in any case mean yes in this format. */
export const isTrue = (value: string | undefined): boolean => value === "1" || value?.toLowerCase() === "true";
