/**
 * The metadata part that marks dynamic arrays. A cell with `cm="1"` points at the first block of cell metadata, which
 * says fDynamic. Structure of the part: the metadata part of ISO/IEC 29500-1 (18.9) with the extension for dynamic arrays.
 */
import type { Package } from "../container/package";
import { readMetadata, DYNAMIC } from "../read/metadata";
import { attribute, closingTag, elements, localName, nextTag, withAttributes } from "../xml/lexer";
import { Splice } from "./splice";

const MAIN = {
  transitional: "http://schemas.openxmlformats.org/spreadsheetml/2006/main",
  strict: "http://purl.oclc.org/ooxml/spreadsheetml/main",
};
const ARRAY_NAMESPACE = "http://schemas.microsoft.com/office/spreadsheetml/2017/dynamicarray";

const type = (prefix: string) =>
  `<${prefix}metadataType name="${DYNAMIC}" minSupportedVersion="120000" copy="1" pasteAll="1" pasteValues="1" merge="1" splitFirst="1" rowColShift="1" clearFormats="1" clearComments="1" assign="1" coerce="1" cellMeta="1"/>`;
const future = (prefix: string) =>
  `<${prefix}futureMetadata name="${DYNAMIC}" count="1"><${prefix}bk><${prefix}extLst><${prefix}ext uri="{bdbb8cdc-fa1e-496e-a857-3c3f30c029c3}">` +
  `<xda:dynamicArrayProperties xmlns:xda="${ARRAY_NAMESPACE}" fDynamic="1" fCollapsed="0"/></${prefix}ext></${prefix}extLst></${prefix}bk></${prefix}futureMetadata>`;
const block = (prefix: string, typeIndex: number) => `<${prefix}bk><${prefix}rc t="${typeIndex}" v="0"/></${prefix}bk>`;

/** A whole metadata part for a package that has none. Its only `cm` is 1. */
export function metadataPart(strict: boolean): string {
  return (
    `<?xml version="1.0" encoding="UTF-8" standalone="yes"?>\n<metadata xmlns="${strict ? MAIN.strict : MAIN.transitional}">` +
    `<metadataTypes count="1">${type("")}</metadataTypes>${future("")}<cellMetadata count="1">${block("", 1)}</cellMetadata></metadata>`
  );
}

/** The metadata part of a package extended, where it must be, by dynamic arrays; and the value of `cm` that means one. */
export function withDynamicArrays(text: string, part: string): { text: string; cm: string } {
  const known = [...readMetadata(text, part).dynamic][0];
  if (known !== undefined) return { text, cm: known };
  const splice = new Splice(text);
  const root = nextTag(text, 0);
  if (!root) return { text, cm: "1" };
  const prefix = root.name.slice(0, root.name.indexOf(":") + 1);
  const rootEnd = closingTag(text, root).start;
  const found = new Map(Array.from(elements(text, root.end, rootEnd), (element) => [localName(element.tag.name), element]));
  const count = (name: string) => {
    const element = found.get(name);
    return element ? Array.from(elements(text, element.tag.end, element.close.start)).length : 0;
  };
  const append = (name: string, content: string, fallbackAt: number) => {
    const element = found.get(name);
    if (!element || element.tag.kind === "empty")
      return splice.replace(
        element?.tag.start ?? fallbackAt,
        element?.tag.end ?? fallbackAt,
        `<${prefix}${name} count="1">${content}</${prefix}${name}>`,
      );
    const head = text.slice(element.tag.start, element.tag.end);
    const counted = attribute(head, "count") === undefined ? head : withAttributes(head, { count: String(count(name) + 1) });
    splice.replace(element.tag.start, element.tag.end, counted);
    splice.replace(element.close.start, element.close.start, content);
  };
  // Order in the part: types, strings, mdx, future metadata, cell metadata, value metadata, extensions.
  const beforeCells =
    found.get("cellMetadata")?.tag.start ?? found.get("valueMetadata")?.tag.start ?? found.get("extLst")?.tag.start ?? rootEnd;
  append("metadataTypes", type(prefix), root.end);
  splice.replace(beforeCells, beforeCells, future(prefix));
  append("cellMetadata", block(prefix, count("metadataTypes") + 1), beforeCells);
  return { text: splice.result(), cm: String(count("cellMetadata") + 1) };
}

/** Part that holds the metadata of a package; undefined if it has none. */
export function metadataPartOf(pkg: Package): string | undefined {
  const relation = pkg.relations(pkg.workbookPart).find(({ role }) => role === "sheetMetadata");
  return relation && pkg.find(relation.target);
}
