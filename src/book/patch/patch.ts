/**
 * Puts new values and formulas into a workbook file and leaves the rest alone: only the elements of changed cells are
 * rewritten, and every part without a changed cell is copied as stored bytes.
 */
import { refuse } from "../../core/refusal";
import type { Package } from "../container/package";
import { readWorkbookPart } from "../read/workbook";
import type { CellChange } from "../workbook";
import { withHeadings } from "./headings";
import { metadataPart, metadataPartOf, withDynamicArrays } from "./metadata";
import { PartStore } from "./parts";
import { planSheet } from "./plan";
import { layoutOf } from "./rows";
import { patchedSheet } from "./sheet";

/** Content type of the metadata part. */
const METADATA_TYPE = "application/vnd.openxmlformats-officedocument.spreadsheetml.sheetMetadata+xml";

/**
 * The bytes of the workbook with the changes made. Spilled cells are changes of their own, without a formula; cells that
 * an array formula filled and fills no longer are emptied here. The calculation chain, which only tells Excel an order,
 * is left out when formulas came or went: Excel builds it anew.
 */
export function patch(pkg: Package, changes: readonly CellChange[]): Uint8Array {
  const store = new PartStore(pkg);
  patchInto(store, changes);
  return pkg.with(store.edits);
}

/** As patch, into edits under way. */
export function patchInto(store: PartStore, changes: readonly CellChange[]): void {
  const { pkg } = store;
  let formulasMoved = false;
  const metadata = metadataSource(store);
  const parts = sheetParts(pkg);
  for (const [sheet, ofSheet] of bySheet(changes)) {
    const part = parts.get(sheet) ?? refuse(`The workbook has no sheet "${sheet}" with cells`);
    const layout = layoutOf(store.text(part));
    const plan = planSheet(layout, withHeadings(store, sheet, part, ofSheet), metadata);
    const text = patchedSheet(layout, plan.edits);
    if (text !== layout.text) store.set(part, text);
    formulasMoved ||= plan.formulasMoved;
  }
  if (formulasMoved) dropCalculationChain(store);
}

function bySheet(changes: readonly CellChange[]): Map<string, CellChange[]> {
  const grouped = new Map<string, CellChange[]>();
  for (const change of changes) {
    const list = grouped.get(change.sheet);
    if (list) list.push(change);
    else grouped.set(change.sheet, [change]);
  }
  return grouped;
}

/** Part of every worksheet by name. */
export function sheetParts(pkg: Package): Map<string, string> {
  const parts = new Map<string, string>();
  for (const { name, relation } of readWorkbookPart(pkg).sheets) {
    const part = relation?.role === "worksheet" ? pkg.find(relation.target) : undefined;
    if (part !== undefined) parts.set(name, part);
  }
  return parts;
}

/** Gives the `cm` of dynamic arrays, and sees to the metadata part the first time it is asked. */
function metadataSource(store: PartStore): () => string {
  let cm: string | undefined;
  return () => (cm ??= ensureMetadata(store));
}

function ensureMetadata(store: PartStore): string {
  const { pkg } = store;
  const part = metadataPartOf(pkg);
  if (part === undefined) {
    const name = pkg.workbookPart.replace(/[^/]*$/, "metadata.xml");
    store.add(pkg.workbookPart, name, "sheetMetadata", METADATA_TYPE, metadataPart(pkg.strict));
    return "1";
  }
  const old = store.text(part);
  const { text, cm } = withDynamicArrays(old, part);
  if (text !== old) store.set(part, text);
  return cm;
}

function dropCalculationChain(store: PartStore): void {
  const { pkg } = store;
  const relation = pkg.relations(pkg.workbookPart).find(({ role }) => role === "calcChain");
  const part = relation && pkg.find(relation.target);
  if (part !== undefined) store.remove(pkg.workbookPart, part, "calcChain");
}
