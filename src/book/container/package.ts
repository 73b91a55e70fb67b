/**
 * A workbook file as a package of parts. Reading it unpacks only what is asked for; every part that is not changed is
 * written back as the bytes it had. Files that cannot be changed without harm are refused here, before anything is written.
 */
import { refuse } from "../../core/refusal";
import { walkXml } from "../xml/walk";
import { decodeXml } from "../xml/decode";
import { readRelations, relationsPartOf, type Relation } from "./relations";
import { readZip, unpack, type ZipEntry } from "./zip";
import { writeZip } from "./zipwrite";

/** A package that unpacks to more than this is refused: 1 GiB, some fifty million cells. */
export const UNPACKED_LIMIT = 2 ** 30;
/** A single XML part of more than this is refused: a JavaScript string cannot hold much more. */
export const PART_LIMIT = 500_000_000;

/** Changes by part name: text or bytes of the new content, null to remove the part. */
export type PartEdits = ReadonlyMap<string, string | Uint8Array | null>;

export interface Package {
  /** Names of all parts in file order. */
  readonly names: readonly string[];
  /** Name of the workbook part, `xl/workbook.xml` as a rule. */
  readonly workbookPart: string;
  /** True for the strict form of the format (ISO/IEC 29500 strict namespaces). */
  readonly strict: boolean;
  /** The name a part has in this file, whatever the case asked for; undefined if there is none. */
  find(name: string): string | undefined;
  bytes(name: string): Uint8Array;
  text(name: string): string;
  /** Relationships of a part; none if it has no relationship part. */
  relations(part: string): readonly Relation[];
  contentType(part: string): string | undefined;
  /** The file with these parts changed; all others are copied as stored bytes in their old order. */
  with(edits: PartEdits): Uint8Array;
}

/** Opens the bytes of an `.xlsx` or `.xlsm` file. Refuses, with the reason, what is not one or must not be changed. */
export function readPackage(bytes: Uint8Array): Package {
  refuseOtherFormats(bytes);
  const zip = readZip(bytes);
  const entries = indexed(zip.entries);
  const find = (name: string) => entries.get(key(name))?.name;
  const unpacked = (name: string) => unpack(entries.get(key(name)) ?? refuse(`The workbook package has no part ${name}`));
  const text = (name: string) => decodeXml(withinLimit(unpacked(name), name), name);
  refuseOpenDocument(entries, unpacked);
  const types = readContentTypes(find, text);
  const relations = (part: string): readonly Relation[] => {
    const name = find(relationsPartOf(part));
    return name === undefined ? [] : readRelations(text(name), part);
  };
  const contentType = (part: string) =>
    types.parts.get(key(part)) ?? types.extensions.get(part.slice(part.lastIndexOf(".") + 1).toLowerCase());
  const root = relations("");
  if (root.some((relation) => relation.type.includes("/digital-signature/")) || types.signed) {
    refuse("The workbook is digitally signed; changing it would break the signature. Remove the signature first");
  }
  const office = root.find((relation) => relation.role === "officeDocument" && !relation.external);
  if (!office || find(office.target) === undefined) return refuse("The package has no workbook part, so it is not an Excel workbook");
  const workbookPart = find(office.target) as string;
  refuseOtherDocuments(contentType(workbookPart));
  return {
    names: zip.entries.map((entry) => entry.name),
    workbookPart,
    strict: office.type.startsWith("http://purl.oclc.org/"),
    find,
    bytes: unpacked,
    text,
    relations,
    contentType,
    with: (edits) => writeZip(zip, encoded(edits)),
  };
}

const key = (name: string) => name.replace(/\\/g, "/").replace(/^\//, "").toLowerCase();

function indexed(entries: readonly ZipEntry[]): Map<string, ZipEntry> {
  const total = entries.reduce((sum, entry) => sum + entry.size, 0);
  if (total > UNPACKED_LIMIT) refuse(`The workbook would unpack to ${total} bytes, more than the ${UNPACKED_LIMIT} bytes allowed`);
  const byName = new Map<string, ZipEntry>();
  for (const entry of entries) {
    if (byName.has(key(entry.name))) refuse(`The package holds the part ${entry.name} twice`);
    byName.set(key(entry.name), entry);
  }
  return byName;
}

function withinLimit(bytes: Uint8Array, name: string): Uint8Array {
  return bytes.length <= PART_LIMIT
    ? bytes
    : refuse(`The part ${name} has ${bytes.length} bytes, more than the ${PART_LIMIT} bytes allowed for one part`);
}

function encoded(edits: PartEdits): Map<string, Uint8Array | null> {
  const encoder = new TextEncoder();
  return new Map(Array.from(edits, ([name, content]) => [name, typeof content === "string" ? encoder.encode(content) : content]));
}

const OLE = [0xd0, 0xcf, 0x11, 0xe0, 0xa1, 0xb1, 0x1a, 0xe1];

/** The old compound format holds either a binary workbook or an encrypted new one; its directory says which, in UTF-16. */
function refuseOtherFormats(bytes: Uint8Array): void {
  if (bytes.length === 0) refuse("The file is empty");
  if (OLE.every((byte, i) => bytes[i] === byte)) {
    const text = new TextDecoder("utf-16le").decode(bytes.length % 2 ? bytes.subarray(0, -1) : bytes);
    if (text.includes("EncryptedPackage")) refuse("The workbook is encrypted: save it without a password first");
    refuse("The file is in the old binary format (.xls): save it as .xlsx first");
  }
  if (bytes[0] !== 0x50 || bytes[1] !== 0x4b)
    refuse("The file is not an Excel workbook: an .xlsx file is a zip package, and this is not one");
}

function refuseOpenDocument(entries: ReadonlyMap<string, ZipEntry>, unpacked: (name: string) => Uint8Array): void {
  if (!entries.has("mimetype")) return;
  const type = new TextDecoder().decode(unpacked("mimetype"));
  if (type.includes("opendocument")) refuse("The file is an OpenDocument file (.ods): save it as .xlsx first");
}

function refuseOtherDocuments(contentType: string | undefined): void {
  if (contentType?.includes("sheet.binary")) refuse("The file is in the binary format (.xlsb): save it as .xlsx first");
  if (
    !contentType?.includes("sheet.main") &&
    !contentType?.includes("template.main") &&
    !/ms-excel\.(sheet|template)/.test(contentType ?? "")
  ) {
    refuse(`The package is not an Excel workbook: its main part is of type ${contentType ?? "unknown"}`);
  }
}

function readContentTypes(find: Package["find"], text: Package["text"]) {
  const parts = new Map<string, string>();
  const extensions = new Map<string, string>();
  const name = find("[Content_Types].xml") ?? refuse("The zip file has no [Content_Types].xml, so it is not an Excel workbook");
  walkXml(text(name), name, {
    open(element, { PartName, Extension, ContentType }) {
      if (element === "Override" && PartName && ContentType) parts.set(key(PartName), ContentType);
      if (element === "Default" && Extension && ContentType) extensions.set(Extension.toLowerCase(), ContentType);
    },
  });
  const signed = [...parts.values()].some((type) => type.includes("digital-signature"));
  return { parts, extensions, signed };
}
