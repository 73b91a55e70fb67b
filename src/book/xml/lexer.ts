/**
 * Finds the tags of an XML text by their places in it, so that a few of them can be changed and the rest stays to the
 * byte. Comments, CDATA sections and processing instructions are stepped over; quoted attribute values may hold `>`.
 * The text has been read by a full parser before; here it is only cut.
 */
import { refuse } from "../../core/refusal";

export interface Tag {
  /** As written, with its prefix: `x:c`. */
  readonly name: string;
  /** Place of `<`. */
  readonly start: number;
  /** Place behind `>`. */
  readonly end: number;
  readonly kind: "open" | "close" | "empty";
}

const LESS = 60;
const GREATER = 62;
const SLASH = 47;

/** The first tag at or behind `from`; undefined when there is none before `limit`. */
export function nextTag(text: string, from: number, limit = text.length): Tag | undefined {
  let at = text.indexOf("<", from);
  while (at >= 0 && at < limit) {
    const next = text.charCodeAt(at + 1);
    if (next === 33 /* ! */) at = text.indexOf("<", endOfDeclaration(text, at));
    else if (next === 63 /* ? */) at = text.indexOf("<", behind(text, "?>", at + 2));
    else return tagAt(text, at);
  }
  return undefined;
}

function endOfDeclaration(text: string, at: number): number {
  if (text.startsWith("<!--", at)) return behind(text, "-->", at + 4);
  if (text.startsWith("<![CDATA[", at)) return behind(text, "]]>", at + 9);
  return behind(text, ">", at);
}

function behind(text: string, mark: string, from: number): number {
  const at = text.indexOf(mark, from);
  return at < 0 ? refuse(`An XML part breaks off before "${mark}"`) : at + mark.length;
}

function tagAt(text: string, start: number): Tag {
  let at = start + 1;
  const closing = text.charCodeAt(at) === SLASH;
  if (closing) at++;
  const nameStart = at;
  while (!isNameEnd(text.charCodeAt(at))) at++;
  const name = text.slice(nameStart, at);
  for (;;) {
    const code = text.charCodeAt(at);
    if (code === GREATER) break;
    if (code === 34 || code === 39) at = behind(text, text[at] as string, at + 1);
    else if (Number.isNaN(code) || code === LESS) refuse(`The XML tag <${name} is not closed`);
    else at++;
  }
  const kind = closing ? "close" : text.charCodeAt(at - 1) === SLASH ? "empty" : "open";
  return { name, start, end: at + 1, kind };
}

/** White space, `/`, `>` or the end of the text. */
const isNameEnd = (code: number): boolean => code <= 32 || code === SLASH || code === GREATER || Number.isNaN(code);

/** Place of the end tag that belongs to an open tag; the tag's own place for an empty one. */
export function closingTag(text: string, tag: Tag): Tag {
  if (tag.kind === "empty") return tag;
  let depth = 0;
  for (let inner = nextTag(text, tag.end); inner; inner = nextTag(text, inner.end)) {
    if (inner.kind === "open") depth++;
    else if (inner.kind === "close" && depth-- === 0) return inner;
  }
  return refuse(`The XML element <${tag.name}> is not closed`);
}

/** An element with its place, from `<` of its start tag to behind `>` of its end tag. */
export interface Element {
  readonly tag: Tag;
  readonly close: Tag;
}

/** Child elements of a piece of text between two places. */
export function* elements(text: string, from: number, to: number): Generator<Element> {
  for (let tag = nextTag(text, from, to); tag && tag.start < to;) {
    const close = closingTag(text, tag);
    yield { tag, close };
    tag = nextTag(text, close.end, to);
  }
}

/** `x:c` -> `c`. */
export const localName = (name: string): string => name.slice(name.indexOf(":") + 1);

export interface RawAttribute {
  readonly name: string;
  /** With character references resolved. */
  readonly value: string;
  /** Place of the white space in front, relative to the start of the tag. */
  readonly start: number;
  /** Place behind the closing quote, relative to the start of the tag. */
  readonly end: number;
}

const ATTRIBUTE = /\s+([^\s=/>"']+)\s*=\s*("([^"]*)"|'([^']*)')/g;

/** Attributes of a start tag in their order. */
export function attributesOf(tagText: string): RawAttribute[] {
  const found: RawAttribute[] = [];
  ATTRIBUTE.lastIndex = 0;
  for (let match = ATTRIBUTE.exec(tagText); match; match = ATTRIBUTE.exec(tagText)) {
    const value = resolved(match[3] ?? match[4] ?? "");
    found.push({ name: match[1] as string, value, start: match.index, end: ATTRIBUTE.lastIndex });
  }
  return found;
}

/** Value of one attribute of a start tag. */
export const attribute = (tagText: string, name: string): string | undefined =>
  attributesOf(tagText).find((found) => found.name === name)?.value;

const NAMED: Readonly<Record<string, string>> = { lt: "<", gt: ">", amp: "&", quot: '"', apos: "'" };

/** Resolves the five named and all numbered character references. */
export function resolved(text: string): string {
  if (!text.includes("&")) return text;
  return text.replace(/&(?:#x([0-9a-fA-F]+)|#(\d+)|(\w+));/g, (whole, hex?: string, decimal?: string, name?: string) => {
    if (hex !== undefined) return String.fromCodePoint(parseInt(hex, 16));
    if (decimal !== undefined) return String.fromCodePoint(Number(decimal));
    return NAMED[name as string] ?? whole;
  });
}

const CONTENT = /<!--[\s\S]*?-->|<!\[CDATA\[([\s\S]*?)\]\]>|<\?[\s\S]*?\?>|[^<]+/g;

/** Text of an element without child elements: references resolved, CDATA sections opened, comments left out. */
export function textOf(content: string): string {
  if (!content.includes("<")) return resolved(content);
  return content.replace(CONTENT, (piece, cdata?: string) => (piece.startsWith("<") ? (cdata ?? "") : resolved(piece)));
}

/** A start tag with attributes set (text) or removed (null); those not named stay as written, new ones follow at the end. */
export function withAttributes(
  tagText: string,
  changes: Readonly<Record<string, string | null | undefined>>,
  present = attributesOf(tagText),
): string {
  let out = tagText;
  // From the last to the first, so that the places in front stay true.
  for (let i = present.length - 1; i >= 0; i--) {
    const { name, value, start, end } = present[i] as RawAttribute;
    const change = changes[name];
    if (change === undefined || change === value) continue;
    out = out.slice(0, start) + (change === null ? "" : ` ${name}="${change}"`) + out.slice(end);
  }
  for (const name of Object.keys(changes)) {
    const change = changes[name];
    if (change === undefined || change === null || present.some((found) => found.name === name)) continue;
    out = out.replace(/\s*\/?>$/, (ending) => ` ${name}="${change}"${ending}`);
  }
  return out;
}
