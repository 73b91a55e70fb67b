/**
 * From the changes asked for to the edits of one sheet. A change can reach further than its own cell: an array formula
 * that fills another range leaves cells behind, and the first cell of a group of shared formulas holds the text of all.
 */
import { refuse } from "../../core/refusal";
import { addressOf, COLUMNS, inside, requireArea, requirePlace, type Area } from "../address";
import { movedFormula } from "../read/shared";
import type { CellChange } from "../workbook";
import { attributesOf, closingTag, elements, localName, nextTag, textOf } from "../xml/lexer";
import type { CellEdit } from "./cell";
import { cellsOf, rowIndex, type CellPlace, type RowPlace, type SheetLayout } from "./rows";

/** More cells than this in one result are refused before memory runs out. */
const MOST_FILLED = 10_000_000;

export interface SheetPlan {
  readonly edits: Map<number, Map<number, CellEdit>>;
  /** True if the set of formula cells, or the range of an array formula, is no longer what it was. */
  readonly formulasMoved: boolean;
}

/** Formula element of a cell as the file has it. */
interface OldFormula {
  readonly type: string | undefined;
  readonly ref: string | undefined;
  readonly group: string | undefined;
  readonly text: string;
}

/** Plans the edits of one sheet. `metadata` gives the cell metadata index of dynamic arrays, and is asked only if one is new. */
export function planSheet(layout: SheetLayout, changes: readonly CellChange[], metadata: () => string): SheetPlan {
  const plan = new Planner(layout, metadata);
  for (const change of changes) plan.add(change);
  return plan.finish();
}

class Planner {
  private readonly edits = new Map<number, Map<number, CellEdit>>();
  private readonly cleared: { anchor: string; old: Area }[] = [];
  /** Cells within the ranges array formulas fill after the changes, as numbers. */
  private readonly filled = new Set<number>();
  private readonly orphans = new Map<string, { formula: string; home: string }>();
  private moved = false;
  private lastRow: { readonly place: RowPlace; readonly cells: ReadonlyMap<number, CellPlace> } | undefined;

  constructor(
    private readonly layout: SheetLayout,
    private readonly metadata: () => string,
  ) {}

  add(change: CellChange): void {
    const { row, column } = requirePlace(change.address);
    const touchesFormula = change.formula !== undefined || change.array !== undefined;
    const old = touchesFormula ? this.oldFormula(row, column) : undefined;
    if (change.array !== undefined) this.checkArray(change, old);
    this.set(row, column, this.editOf(change));
    if (old) this.reach(change, old, row, column);
    else if (change.formula) this.moved = true;
    if (change.array !== undefined) this.fill(requireArea(change.array));
  }

  private fill({ top, left, bottom, right }: Area): void {
    for (let row = top; row <= bottom; row++) for (let column = left; column <= right; column++) this.filled.add(row * COLUMNS + column);
  }

  private checkArray({ address, array, formula }: CellChange, old: OldFormula | undefined): void {
    const area = requireArea(array as string);
    const size = (area.bottom - area.top + 1) * (area.right - area.left + 1);
    if (size > MOST_FILLED) refuse(`The range ${array} has ${size} cells; a formula fills at most ${MOST_FILLED}`);
    if (addressOf(area.top, area.left) !== address.replace(/\$/g, "").toUpperCase())
      refuse(`The range ${array} does not start at ${address}, the cell of its formula`);
    if (formula === null) refuse(`The cell ${address} loses its formula and cannot fill the range ${array}`);
    if (formula === undefined && old?.type !== "array") refuse(`The cell ${address} holds no array formula that could fill ${array}`);
  }

  private editOf({ value, formula, array, dynamic }: CellChange): CellEdit {
    const isNewDynamic = typeof formula === "string" && array !== undefined && dynamic !== false;
    return {
      value,
      ...(formula === undefined ? {} : { formula }),
      ...(array === undefined ? {} : { array }),
      ...(isNewDynamic ? { metadata: this.metadata() } : {}),
    };
  }

  /** What the change of a cell that held a formula means for others. */
  private reach(change: CellChange, old: OldFormula, row: number, column: number): void {
    const home = addressOf(row, column);
    if (change.formula === null) this.moved = true;
    if (old.type === "shared" && old.group !== undefined && old.text !== "" && change.formula !== undefined) {
      this.orphans.set(old.group, { formula: old.text, home });
    }
    if (old.type === "array" && old.ref !== undefined && old.ref !== change.array) {
      this.cleared.push({ anchor: home, old: requireArea(old.ref) });
      this.moved = true;
    }
    if (old.type !== "array" && change.array !== undefined) this.moved = true;
  }

  finish(): SheetPlan {
    this.clearLeftBehind();
    this.freeOrphans();
    this.markFilled();
    return { edits: this.edits, formulasMoved: this.moved };
  }

  /** Cells the old range filled and nobody fills or sets now become empty. */
  private clearLeftBehind(): void {
    for (const { anchor, old } of this.cleared) {
      for (const { row, column } of this.cellsIn(old)) {
        if (addressOf(row, column) === anchor || this.edits.get(row)?.has(column)) continue;
        if (this.filled.has(row * COLUMNS + column)) continue;
        if (this.oldFormula(row, column) === undefined) this.set(row, column, { value: null });
      }
    }
  }

  /** The other cells of a shared group whose first cell is gone get the formula written out for themselves. */
  private freeOrphans(): void {
    if (this.orphans.size === 0) return;
    for (const { row, column, text } of this.allCells()) {
      const old = formulaOf(text);
      const orphan = old?.group === undefined || old.text !== "" ? undefined : this.orphans.get(old.group);
      if (!orphan || this.edits.get(row)?.get(column)?.formula !== undefined) continue;
      const address = addressOf(row, column);
      const formula = movedFormula(orphan.formula, orphan.home, address);
      if (formula === undefined)
        refuse(`The shared formula "${orphan.formula}" of ${orphan.home} cannot be read, so its first cell cannot be changed`);
      this.set(row, column, { ...this.edits.get(row)?.get(column), formula });
    }
  }

  private markFilled(): void {
    if (this.filled.size === 0) return;
    for (const [row, cells] of this.edits) {
      for (const [column, edit] of cells) if (this.filled.has(row * COLUMNS + column)) cells.set(column, { ...edit, filled: true });
    }
  }

  private set(row: number, column: number, edit: CellEdit): void {
    const cells = this.edits.get(row);
    if (cells) cells.set(column, edit);
    else this.edits.set(row, new Map([[column, edit]]));
  }

  private oldFormula(row: number, column: number): OldFormula | undefined {
    const place = this.layout.rows[rowIndex(this.layout, row)];
    if (place?.row !== row) return undefined;
    // Changes come row by row as a rule: the cells of the last row looked at are kept.
    if (this.lastRow?.place !== place)
      this.lastRow = { place, cells: new Map(cellsOf(this.layout, place).map((cell) => [cell.column, cell])) };
    const cell = this.lastRow.cells.get(column);
    return cell && formulaOf(this.layout.text.slice(cell.start, cell.end));
  }

  private *cellsIn(area: Area): Generator<{ row: number; column: number; text: string }> {
    for (let index = rowIndex(this.layout, area.top); index < this.layout.rows.length; index++) {
      const place = this.layout.rows[index] as RowPlace;
      if (place.row > area.bottom) return;
      for (const { column, start, end } of cellsOf(this.layout, place)) {
        if (inside(area, place.row, column)) yield { row: place.row, column, text: this.layout.text.slice(start, end) };
      }
    }
  }

  private allCells() {
    return this.cellsIn({ top: 0, left: 0, bottom: Infinity, right: Infinity });
  }
}

/** Reads the formula element of a cell; undefined if it has none. */
export function formulaOf(cell: string): OldFormula | undefined {
  const tag = nextTag(cell, 0);
  if (!tag || tag.kind === "empty") return undefined;
  for (const { tag: child, close } of elements(cell, tag.end, closingTag(cell, tag).start)) {
    if (localName(child.name) !== "f") continue;
    const attributes = attributesOf(cell.slice(child.start, child.end));
    const valueOf = (name: string) => attributes.find((found) => found.name === name)?.value;
    const text = child.kind === "empty" ? "" : textOf(cell.slice(child.end, close.start));
    return { type: valueOf("t"), ref: valueOf("ref"), group: valueOf("si"), text };
  }
  return undefined;
}
