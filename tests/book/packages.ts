/** Small workbook packages for the tests, made from the text of their sheets. */
import { strToU8, zipSync, type Zippable } from "fflate";
import { Refusal } from "../../src/core/refusal";

export const MAIN = "http://schemas.openxmlformats.org/spreadsheetml/2006/main";
export const STRICT = "http://purl.oclc.org/ooxml/spreadsheetml/main";
const OFFICE = "http://schemas.openxmlformats.org/officeDocument/2006/relationships";
const STRICT_OFFICE = "http://purl.oclc.org/ooxml/officeDocument/relationships";
const TYPE = "application/vnd.openxmlformats-officedocument.spreadsheetml";

export interface PartList {
  readonly [name: string]: string | Uint8Array | null;
}

export interface PackageOptions {
  /** Content of `<sheetData>` by sheet name, or whole sheet parts (beginning with `<?xml` or `<`+prefix+`worksheet`). */
  readonly sheets?: Readonly<Record<string, string>>;
  /** Elements of the workbook part behind its sheets. */
  readonly workbook?: string;
  readonly strict?: boolean;
  /** Relationships of the workbook part as [role, target]. */
  readonly relations?: readonly (readonly [string, string])[];
  /** More parts, or other ones; null leaves one out. */
  readonly parts?: PartList;
  readonly overrides?: Readonly<Record<string, string>>;
  readonly mainType?: string;
}

const sheetXml = (data: string, strict: boolean) =>
  data.includes("worksheet")
    ? data
    : `<?xml version="1.0"?>\n<worksheet xmlns="${strict ? STRICT : MAIN}"><sheetData>${data}</sheetData></worksheet>`;

/** Bytes of a package with these sheets. */
export function packageBytes(options: PackageOptions = {}): Uint8Array {
  const {
    sheets = { Sheet1: "" },
    workbook = "",
    strict = false,
    relations = [],
    parts = {},
    overrides = {},
    mainType = `${TYPE}.sheet.main+xml`,
  } = options;
  const base = strict ? STRICT_OFFICE : OFFICE;
  const names = Object.keys(sheets);
  const own = names.map((_, i) => ["worksheet", `worksheets/sheet${i + 1}.xml`] as const);
  const all: Record<string, string | Uint8Array | null> = {
    "[Content_Types].xml":
      `<?xml version="1.0"?><Types xmlns="http://schemas.openxmlformats.org/package/2006/content-types"><Default Extension="xml" ContentType="application/xml"/>` +
      `<Default Extension="rels" ContentType="application/vnd.openxmlformats-package.relationships+xml"/><Override PartName="/xl/workbook.xml" ContentType="${mainType}"/>` +
      Object.entries(overrides)
        .map(([part, type]) => `<Override PartName="/${part}" ContentType="${type}"/>`)
        .join("") +
      `</Types>`,
    "_rels/.rels": `<Relationships xmlns="http://schemas.openxmlformats.org/package/2006/relationships"><Relationship Id="a" Type="${base}/officeDocument" Target="xl/workbook.xml"/></Relationships>`,
    "xl/workbook.xml":
      `<workbook xmlns="${strict ? STRICT : MAIN}" xmlns:r="${base}"><sheets>` +
      names.map((name, i) => `<sheet name="${name}" sheetId="${i + 1}" r:id="r${i + 1}"/>`).join("") +
      `</sheets>${workbook}</workbook>`,
    "xl/_rels/workbook.xml.rels":
      `<Relationships xmlns="http://schemas.openxmlformats.org/package/2006/relationships">` +
      [...own, ...relations]
        .map(([role, target], i) => `<Relationship Id="r${i + 1}" Type="${base}/${role}" Target="${target}"/>`)
        .join("") +
      `</Relationships>`,
  };
  names.forEach((name, i) => (all[`xl/worksheets/sheet${i + 1}.xml`] = sheetXml(sheets[name] as string, strict)));
  return zipped({ ...all, ...parts });
}

/** Zips parts by name; null leaves one out. */
export function zipped(parts: PartList): Uint8Array {
  const files: Zippable = {};
  for (const [name, content] of Object.entries(parts))
    if (content !== null) files[name] = typeof content === "string" ? strToU8(content) : content;
  return zipSync(files, { level: 6, mtime: new Date(2031, 4, 17, 12) });
}

/** Runs and gives the sentence of the refusal; fails if there is none. */
export function refusalOf(action: () => unknown): string {
  try {
    action();
  } catch (error) {
    if (error instanceof Refusal) return error.message;
    throw error;
  }
  throw new Error("Nothing was refused");
}
