/**
 * Text as the spreadsheet format writes it. XML forbids most control characters, so the format spells them `_x000D_`;
 * a text that happens to look like such a spelling gets its underscore spelt `_x005F_`. Source: ISO/IEC 29500-1, 22.9.2.19 (ST_Xstring).
 */
const SPELT = /_x([0-9A-Fa-f]{4})_/g;
// eslint-disable-next-line no-control-regex
const FORBIDDEN = /[\u0000-\u0008\u000b-\u001f\ufffe\uffff]/g;
const LONE_SURROGATE = /[\ud800-\udbff](?![\udc00-\udfff])|(?<![\ud800-\udbff])[\udc00-\udfff]/g;

const hex = (character: string) => `_x${character.charCodeAt(0).toString(16).toUpperCase().padStart(4, "0")}_`;

/** Text of a cell -> content of an XML element. */
export function cellText(text: string): string {
  return xmlText(speltText(text));
}

/** Text -> the same with characters spelt that XML cannot hold; still to be escaped. */
export function speltText(text: string): string {
  return text
    .replace(/_(?=x[0-9A-Fa-f]{4}_)/g, "_x005F_")
    .replace(FORBIDDEN, hex)
    .replace(LONE_SURROGATE, hex);
}

/** Content of an XML element, already read by a parser -> text of a cell. */
export function fromCellText(content: string): string {
  return content.includes("_x") ? content.replace(SPELT, (_, code: string) => String.fromCharCode(parseInt(code, 16))) : content;
}

/** Text -> content of an XML element; the formulas of cells need no more than this. */
export function xmlText(text: string): string {
  return text.replace(/&/g, "&amp;").replace(/</g, "&lt;").replace(/>/g, "&gt;").replace(/\r/g, "&#13;");
}

/** Text -> value of an XML attribute in double quotes. */
export function xmlAttribute(text: string): string {
  return xmlText(text).replace(/"/g, "&quot;").replace(/\n/g, "&#10;").replace(/\t/g, "&#9;");
}

/** True if a reader would be free to drop white space of this text without `xml:space="preserve"`. */
export const needsSpace = (text: string): boolean => /^\s|\s$|\n|\t|\r| {2}/.test(text);
