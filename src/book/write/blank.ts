/** A new workbook package of our own making, with empty sheets, to which patch() can add cells. */
import { readPackage, type Package } from "../container/package";
import { writeZip } from "../container/zipwrite";
import { xmlAttribute, xmlText } from "../xml/escape";
import type { DefinedName } from "../workbook";
import { checkDefinedName, checkSheetNames } from "./names";
import { StyleBook } from "./styles";
import { refuse } from "../../core/refusal";

/** What a sheet part holds around its (still empty) cells. */
export interface SheetFrame {
  readonly name: string;
  /** XML in front of the sheet data: views, column widths. */
  readonly before?: string;
  /** XML of the rows with styled, empty cells. */
  readonly rows?: string;
}

export interface BlankOptions {
  readonly names?: readonly DefinedName[];
  readonly date1904?: boolean;
  readonly styles?: StyleBook;
}

const HEAD = '<?xml version="1.0" encoding="UTF-8" standalone="yes"?>\n';
const MAIN = "http://schemas.openxmlformats.org/spreadsheetml/2006/main";
const OFFICE = "http://schemas.openxmlformats.org/officeDocument/2006/relationships";
const PACKAGE = "http://schemas.openxmlformats.org/package/2006";
const TYPE = "application/vnd.openxmlformats-officedocument.spreadsheetml";

/** A valid package with empty sheets of these names, opened. The same names give the same bytes. */
export function blankWorkbook(sheets: readonly (string | SheetFrame)[] = ["Sheet1"], options: BlankOptions = {}): Package {
  const frames = sheets.map((sheet) => (typeof sheet === "string" ? { name: sheet } : sheet));
  checkSheetNames(frames.map((frame) => frame.name));
  const parts: [string, string][] = [
    ["[Content_Types].xml", contentTypes(frames.length)],
    [
      "_rels/.rels",
      `${HEAD}<Relationships xmlns="${PACKAGE}/relationships"><Relationship Id="rId1" Type="${OFFICE}/officeDocument" Target="xl/workbook.xml"/></Relationships>`,
    ],
    ["xl/workbook.xml", workbookPart(frames, options)],
    ["xl/_rels/workbook.xml.rels", workbookRelations(frames.length)],
    ["xl/styles.xml", (options.styles ?? new StyleBook()).part()],
    ...frames.map((frame, index): [string, string] => [`xl/worksheets/sheet${index + 1}.xml`, sheetPart(frame)]),
  ];
  const encoder = new TextEncoder();
  return readPackage(
    writeZip({ entries: [], comment: new Uint8Array(0) }, new Map(parts.map(([name, text]) => [name, encoder.encode(text)]))),
  );
}

/** An empty sheet part. */
export function sheetPart({ before = "", rows = "" }: Omit<SheetFrame, "name">): string {
  const data = rows === "" ? "<sheetData/>" : `<sheetData>${rows}</sheetData>`;
  return `${HEAD}<worksheet xmlns="${MAIN}" xmlns:r="${OFFICE}"><dimension ref="A1"/>${before}${data}<pageMargins left="0.7" right="0.7" top="0.75" bottom="0.75" header="0.3" footer="0.3"/></worksheet>`;
}

function contentTypes(sheets: number): string {
  const override = (part: string, type: string) => `<Override PartName="/xl/${part}" ContentType="${TYPE}.${type}+xml"/>`;
  const ofSheets = Array.from({ length: sheets }, (_, index) => override(`worksheets/sheet${index + 1}.xml`, "worksheet")).join("");
  return (
    `${HEAD}<Types xmlns="${PACKAGE}/content-types"><Default Extension="rels" ContentType="application/vnd.openxmlformats-package.relationships+xml"/>` +
    `<Default Extension="xml" ContentType="application/xml"/>${override("workbook.xml", "sheet.main")}${ofSheets}${override("styles.xml", "styles")}</Types>`
  );
}

function workbookRelations(sheets: number): string {
  const relation = (number: number, role: string, target: string) =>
    `<Relationship Id="rId${number}" Type="${OFFICE}/${role}" Target="${target}"/>`;
  const ofSheets = Array.from({ length: sheets }, (_, index) => relation(index + 1, "worksheet", `worksheets/sheet${index + 1}.xml`)).join(
    "",
  );
  return `${HEAD}<Relationships xmlns="${PACKAGE}/relationships">${ofSheets}${relation(sheets + 1, "styles", "styles.xml")}</Relationships>`;
}

function workbookPart(frames: readonly SheetFrame[], { names = [], date1904 = false }: BlankOptions): string {
  const sheets = frames
    .map(({ name }, index) => `<sheet name="${xmlAttribute(name)}" sheetId="${index + 1}" r:id="rId${index + 1}"/>`)
    .join("");
  const defined = definedNames(
    names,
    frames.map((frame) => frame.name),
  );
  return (
    `${HEAD}<workbook xmlns="${MAIN}" xmlns:r="${OFFICE}"><workbookPr${date1904 ? ' date1904="1"' : ""}/><bookViews><workbookView/></bookViews>` +
    `<sheets>${sheets}</sheets>${defined}<calcPr calcId="191029"/></workbook>`
  );
}

/** The element of the defined names, sorted as Excel sorts them; nothing when there are none. */
export function definedNames(names: readonly DefinedName[], sheets: readonly string[]): string {
  if (names.length === 0) return "";
  const sorted = [...names].sort((a, b) => (a.name.toLowerCase() < b.name.toLowerCase() ? -1 : 1));
  const elements = sorted.map(({ name, formula, sheet }) => {
    checkDefinedName(name);
    const index = sheet === undefined ? -1 : sheets.indexOf(sheet);
    if (sheet !== undefined && index < 0) refuse(`The name ${name} belongs to the sheet "${sheet}", which the workbook does not have`);
    return `<definedName name="${xmlAttribute(name)}"${index >= 0 ? ` localSheetId="${index}"` : ""}>${xmlText(formula)}</definedName>`;
  });
  return `<definedNames>${elements.join("")}</definedNames>`;
}
