/** The workbook behind a package: sheets with their cells, defined names, tables, and a note for everything that is kept but not read. */
import { refuse } from "../../core/refusal";
import type { Package } from "../container/package";
import type { Relation } from "../container/relations";
import { isTrue, walkXml, type Attributes } from "../xml/walk";
import type { BookSheet, BookTable, DefinedName, Workbook } from "../workbook";
import { readMetadata } from "./metadata";
import { readSheet } from "./sheet";
import { readSharedStrings } from "./strings";
import { readTable } from "./table";

/** What the workbook part says. */
export interface WorkbookPart {
  /** In the order of the tabs; `relation` leads to the part. */
  readonly sheets: readonly { readonly name: string; readonly relation: Relation | undefined }[];
  readonly names: readonly DefinedName[];
  readonly date1904: boolean;
  readonly notes: readonly string[];
}

/** Reads everything a calculation needs. Refuses a damaged package; never drops silently what it does not read. */
export function readWorkbook(pkg: Package): Workbook {
  const { sheets: listed, names, date1904, notes: partNotes } = readWorkbookPart(pkg);
  const notes = [...partNotes, ...keptParts(pkg)];
  const strings = sharedPart(pkg, "sharedStrings", readSharedStrings) ?? [];
  const dynamic = sharedPart(pkg, "sheetMetadata", readMetadata)?.dynamic ?? new Set<string>();
  const sheets: BookSheet[] = [];
  const tables: BookTable[] = [];
  for (const { name, relation } of listed) {
    const part = relation && pkg.find(relation.target);
    if (!relation || part === undefined) return refuse(`The workbook lists the sheet ${name}, but its part is missing`);
    if (relation.role !== "worksheet") {
      notes.push(`${name} is a ${relation.role}; it holds no cells and is kept as it is`);
      continue;
    }
    sheets.push(readSheet(pkg.text(part), { name, part, strings, date1904, dynamic, note: (sentence) => notes.push(sentence) }));
    tables.push(...tablesOf(pkg, part, name, notes));
  }
  notes.push(...dataTableNotes(sheets));
  return { sheets, names, tables, date1904, notes };
}

/** Reads the workbook part alone: sheets, names, calendar. */
export function readWorkbookPart(pkg: Package): WorkbookPart {
  const sheets: { name: string; relation: Relation | undefined }[] = [];
  const drafts: { name: string; local: string | undefined; formula: string }[] = [];
  const notes: string[] = [];
  const relations = new Map(pkg.relations(pkg.workbookPart).map((relation) => [relation.id, relation]));
  let date1904 = false;
  let collecting = false;
  walkXml(pkg.text(pkg.workbookPart), pkg.workbookPart, {
    open(name, attributes) {
      if (name === "sheet") sheets.push({ name: attributes.name ?? "", relation: relations.get(attributes["r:id"] ?? "") });
      else if (name === "workbookPr") date1904 = isTrue(attributes.date1904);
      else if (name === "calcPr") notes.push(...calculationNotes(attributes));
      else if (name === "definedName") {
        drafts.push({ name: attributes.name ?? "", local: attributes.localSheetId, formula: "" });
        collecting = true;
      }
    },
    text(piece) {
      const last = drafts[drafts.length - 1];
      if (collecting && last) last.formula += piece;
    },
    close(name) {
      if (name === "definedName") collecting = false;
    },
  });
  if (sheets.length === 0) refuse("The workbook has no sheets");
  return { sheets, names: drafts.map((draft) => definedName(draft, sheets)), date1904, notes };
}

function definedName(
  { name, local, formula }: { name: string; local: string | undefined; formula: string },
  sheets: readonly { name: string }[],
): DefinedName {
  const sheet = local === undefined ? undefined : sheets[Number(local)]?.name;
  return { name, formula: formula.replace(/^\s*=/, ""), ...(sheet === undefined ? {} : { sheet }) };
}

function calculationNotes({ iterate, fullPrecision }: Attributes): string[] {
  const notes: string[] = [];
  if (isTrue(iterate)) notes.push("The workbook asks for iterative calculation; circular references are not iterated here");
  if (fullPrecision !== undefined && !isTrue(fullPrecision))
    notes.push('The workbook is set to "precision as displayed"; it is calculated here with full precision');
  return notes;
}

/** Reads the part that plays a role for the whole workbook, where there is one. */
function sharedPart<T>(pkg: Package, role: string, read: (text: string, part: string) => T): T | undefined {
  const relation = pkg.relations(pkg.workbookPart).find((candidate) => candidate.role === role);
  const part = relation && pkg.find(relation.target);
  return part === undefined ? undefined : read(pkg.text(part), part);
}

const KEPT: Readonly<Record<string, string>> = {
  externalLink: "The workbook links to other workbooks; formulas that use them keep their values",
  pivotCacheDefinition: "The workbook holds pivot tables; they are kept and not refreshed",
  vbaProject: "The workbook holds macros; they are kept and not run",
  connections: "The workbook holds data connections; they are kept and not refreshed",
  xlMacrosheet: "The workbook holds a macro sheet; it is kept and not run",
};

function keptParts(pkg: Package): string[] {
  const roles = new Set(pkg.relations(pkg.workbookPart).map((relation) => relation.role));
  return Object.keys(KEPT)
    .filter((role) => roles.has(role))
    .map((role) => KEPT[role] as string);
}

function tablesOf(pkg: Package, sheetPart: string, sheet: string, notes: string[]): BookTable[] {
  const tables: BookTable[] = [];
  for (const { role, target } of pkg.relations(sheetPart)) {
    const part = role === "table" ? pkg.find(target) : undefined;
    if (part === undefined) continue;
    const table = readTable(pkg.text(part), part, sheet);
    if (table) tables.push(table);
    else notes.push(`The table ${part} names no range and is not read`);
  }
  return tables;
}

function dataTableNotes(sheets: readonly BookSheet[]): string[] {
  const notes = new Set<string>();
  for (const sheet of sheets) for (const cell of sheet.cells.values()) if (cell.unread) notes.add(`${sheet.name}: ${cell.unread}`);
  return [...notes];
}
