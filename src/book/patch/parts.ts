/** Adding and removing parts of a package: the part, its relationship and its content type go together. */
import type { Package } from "../container/package";
import { relationsPartOf } from "../container/relations";
import { xmlAttribute } from "../xml/escape";
import { attribute, closingTag, elements, nextTag } from "../xml/lexer";
import { Splice } from "./splice";

/** Edits of a package under way: the newest text of each part. */
export class PartStore {
  readonly edits = new Map<string, string | null>();

  constructor(readonly pkg: Package) {}

  text(name: string): string {
    return this.edits.get(name) ?? this.pkg.text(name);
  }

  set(name: string, text: string): void {
    this.edits.set(name, text);
  }

  /** Name of the relationship part of a part, empty but present afterwards. */
  private relationsOf(source: string): string {
    const name = this.pkg.find(relationsPartOf(source)) ?? relationsPartOf(source);
    if (this.edits.has(name) || this.pkg.find(name)) return name;
    this.set(
      name,
      `<?xml version="1.0" encoding="UTF-8" standalone="yes"?>\n<Relationships xmlns="http://schemas.openxmlformats.org/package/2006/relationships"></Relationships>`,
    );
    return name;
  }

  /** Adds a part with its relationship from `source`; gives the relationship id. */
  add(source: string, part: string, role: string, contentType: string, text: string): string {
    const relations = this.relationsOf(source);
    const used = new Set(Array.from(children(this.text(relations)), ({ head }) => attribute(head, "Id")));
    let number = used.size + 1;
    while (used.has(`rId${number}`)) number++;
    const base = this.pkg.strict
      ? "http://purl.oclc.org/ooxml/officeDocument/relationships"
      : "http://schemas.openxmlformats.org/officeDocument/2006/relationships";
    this.append(relations, "Relationship", `Id="rId${number}" Type="${base}/${role}" Target="/${xmlAttribute(encodeURI(part))}"`);
    this.append(this.contentTypes(), "Override", `PartName="/${xmlAttribute(encodeURI(part))}" ContentType="${contentType}"`);
    this.set(part, text);
    return `rId${number}`;
  }

  /** Removes a part, the relationship of `source` that leads to it, and its content type. */
  remove(source: string, part: string, role: string): void {
    this.cut(this.relationsOf(source), (head) => (attribute(head, "Type") ?? "").endsWith(`/${role}`));
    this.cut(this.contentTypes(), (head) => attribute(head, "PartName")?.replace(/^\//, "").toLowerCase() === part.toLowerCase());
    this.edits.set(part, null);
  }

  private contentTypes(): string {
    return this.pkg.find("[Content_Types].xml") as string;
  }

  private append(name: string, element: string, attributes: string): void {
    const text = this.text(name);
    const root = nextTag(text, 0);
    if (!root) return;
    const prefix = root.name.slice(0, root.name.indexOf(":") + 1);
    const child = `<${prefix}${element} ${attributes}/>`;
    const splice = new Splice(text);
    if (root.kind === "empty")
      splice.replace(root.start, root.end, `${text.slice(root.start, root.end).replace(/\s*\/>$/, ">")}${child}</${root.name}>`);
    else {
      const end = closingTag(text, root).start;
      splice.replace(end, end, child);
    }
    this.set(name, splice.result());
  }

  private cut(name: string, matches: (head: string) => boolean): void {
    const text = this.text(name);
    const splice = new Splice(text);
    for (const { head, start, end } of children(text)) if (matches(head)) splice.replace(start, end, "");
    this.set(name, splice.result());
  }
}

function* children(text: string): Generator<{ head: string; start: number; end: number }> {
  const root = nextTag(text, 0);
  if (!root || root.kind === "empty") return;
  for (const { tag, close } of elements(text, root.end, closingTag(text, root).start)) {
    yield { head: text.slice(tag.start, tag.end), start: tag.start, end: close.end };
  }
}
