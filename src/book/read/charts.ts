/**
 * The charts of a workbook by sheet, through the drawing of each sheet. A part that is missing, damaged or strange never stops the opening of
 * a workbook: its chart then counts as one that could not be read.
 */
import { addressOf, COLUMNS, rangeOf, ROWS } from "../address";
import type { BookChart, SheetCharts } from "../chart";
import type { Package } from "../container/package";
import { relationsPartOf } from "../container/relations";
import { at, below, readTree, type XmlElement } from "../xml/tree";
import { DRAWN } from "../xml/walk";
import { readChart, UNREAD } from "./chart";
import { readWorkbookPart } from "./workbook";

const ANCHORS = ["twoCellAnchor", "oneCellAnchor", "absoluteAnchor"];

/** Sheets that hold charts, in the order of the tabs. */
export function readCharts(pkg: Package): SheetCharts[] {
  return readWorkbookPart(pkg).sheets.flatMap(({ name, relation }) => {
    const part = relation && pkg.find(relation.target);
    if (part === undefined || relation?.role !== "worksheet") return [];
    const drawings = drawingsOf(pkg, part);
    const found = drawings.flatMap((drawing) => chartsOf(pkg, drawing));
    const charts = found.filter((chart): chart is Placed => typeof chart !== "string").sort(fromTheTop);
    const others = found.filter((chart): chart is string => typeof chart === "string");
    const parts = drawings.flatMap((drawing) => ownParts(pkg, drawing));
    return found.length === 0 ? [] : [{ sheet: name, charts: charts.map(({ chart }) => chart), others, parts }];
  });
}

interface Placed {
  readonly chart: BookChart;
  readonly row: number;
  readonly column: number;
}

const fromTheTop = (one: Placed, other: Placed) => one.row - other.row || one.column - other.column;

/** What `read` gives, or `otherwise` for anything it throws. */
function tolerant<T>(read: () => T, otherwise: T): T {
  try {
    return read();
  } catch {
    return otherwise;
  }
}

function drawingsOf(pkg: Package, sheetPart: string): string[] {
  const relations = tolerant(() => pkg.relations(sheetPart), []);
  return relations.filter(({ role, external }) => role === "drawing" && !external).flatMap(({ target }) => pkg.find(target) ?? []);
}

function chartsOf(pkg: Package, drawing: string): (Placed | string)[] {
  const root = tolerant(() => readTree(pkg.text(drawing), drawing, DRAWN), undefined);
  const targets = new Map(tolerant(() => pkg.relations(drawing), []).map(({ id, target }) => [id, target]));
  const anchors = at(root, "wsDr")?.children.filter(({ name }) => ANCHORS.includes(name)) ?? [];
  return anchors.flatMap((anchor) =>
    below(anchor, "graphicData").flatMap((graphic) => {
      const { uri = "" } = graphic.attributes;
      if (!/chart/.test(uri)) return [];
      const id = at(graphic, "chart")?.attributes["r:id"];
      return id === undefined && /chartex/.test(uri) ? ["chart of a newer kind"] : [placed(pkg, targets.get(id ?? ""), anchor)];
    }),
  );
}

/** Chart parts of a drawing with their looks, and the drawing itself if it leads to nothing but charts. */
function ownParts(pkg: Package, drawing: string): string[] {
  const related = (part: string) => tolerant(() => pkg.relations(part), []);
  const relations = related(drawing);
  const charts = relations.filter(({ role }) => role === "chart" || role === "chartEx").flatMap(({ target }) => pkg.find(target) ?? []);
  const looks = charts.flatMap(related).filter(({ role }) => /^chart(Style|ColorStyle)$/.test(role));
  const shapes = tolerant(() => /<(?:\w+:)?(?:sp|cxnSp|pic)\b/.test(pkg.text(drawing)), true);
  return [
    ...(shapes ? [] : [drawing, relationsPartOf(drawing)]),
    ...charts,
    ...charts.map(relationsPartOf),
    ...looks.map(({ target }) => target),
  ];
}

function placed(pkg: Package, target: string | undefined, anchor: XmlElement): Placed | string {
  const part = target === undefined ? undefined : pkg.find(target);
  if (part === undefined) return UNREAD;
  const chart = tolerant(() => readChart(pkg.text(part), part), UNREAD);
  if (typeof chart === "string") return chart;
  const { row = Infinity, column = Infinity } = corner(anchor, "from") ?? {};
  return { chart: { ...chart, anchor: coveredCells(anchor) }, row, column };
}

/** Place of a corner, 0-based, and whether it lies inside its cell, beyond the lines that part it from the one before. */
function corner(anchor: XmlElement, name: string) {
  const value = (part: string) => Number(at(anchor, name, part)?.text ?? NaN);
  const [row, column] = [value("row"), value("col")];
  if (!(row >= 0 && row < ROWS && column >= 0 && column < COLUMNS && Number.isInteger(row) && Number.isInteger(column))) return undefined;
  return { row, column, intoRow: value("rowOff") > 0, intoColumn: value("colOff") > 0 };
}

function coveredCells(anchor: XmlElement): string | undefined {
  const [from, to] = [corner(anchor, "from"), corner(anchor, "to")];
  if (!from) return undefined;
  if (!to) return addressOf(from.row, from.column);
  const bottom = Math.max(from.row, to.intoRow ? to.row : to.row - 1);
  const right = Math.max(from.column, to.intoColumn ? to.column : to.column - 1);
  return rangeOf({ top: from.row, left: from.column, bottom, right });
}
