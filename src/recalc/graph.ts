import type { Area } from "../book/formula";

/** A formula as the dependency walk sees it: the cells its result fills, and what it reads. */
export interface GraphNode {
  readonly fills: Area;
  readonly reads: readonly Area[];
}

/** Order of calculation, and what stands in the way of it. Numbers are positions in the list of formulas. */
export interface Walk {
  /** Every formula, each after all that it reads. */
  readonly order: readonly number[];
  /** True for a formula that reads itself, round a circle. */
  readonly circular: readonly boolean[];
  /** True for a formula that is doubtful or reads, however far away, one that is. Circular ones are doubtful. */
  readonly unreliable: readonly boolean[];
}

const untouched = 0;
const open = 1;
const done = 2;

/**
 * Which formula reads which. Ranges are nodes of their own, one for each distinct range, so that a thousand sums over the same column
 * look at its cells once. Nothing here is recursive: a chain may be as long as a sheet.
 */
export class FormulaGraph {
  private readonly columns = new Map<string, Column[]>();
  private readonly areas: Area[] = [];
  private readonly readsOf: number[][];

  constructor(private readonly formulas: readonly GraphNode[]) {
    this.indexCells();
    const numbers = new Map<string, number>();
    this.readsOf = formulas.map(({ reads }) => reads.map((area) => this.areaNumber(area, numbers)));
  }

  /** Walks every formula after what it reads. @param doubtful formulas whose value is not to be relied on */
  walk(doubtful: (formula: number) => boolean): Walk {
    const count = this.formulas.length;
    const state = new Uint8Array(count + this.areas.length);
    const unreliable = new Uint8Array(state.length);
    const order: number[] = [];
    const heads: number[] = [];
    const stack: number[] = [];
    const enter = (node: number) => {
      state[node] = open;
      stack.push(-node - 1);
      this.eachChild(node, (child) => {
        if (state[child] === untouched) stack.push(child);
      });
    };
    const leave = (node: number) => {
      let doubt = node < count && doubtful(node);
      this.eachChild(node, (child) => {
        if (state[child] === open) heads.push(child);
        doubt ||= state[child] === open || unreliable[child] === 1;
      });
      state[node] = done;
      unreliable[node] = doubt ? 1 : 0;
      if (node < count) order.push(node);
    };
    for (let start = 0; start < count; start++) {
      if (state[start] === untouched) stack.push(start);
      while (stack.length > 0) {
        const node = stack.pop()!;
        if (node < 0) leave(-node - 1);
        else if (state[node] === untouched) enter(node);
      }
    }
    const flags = (marks: Uint8Array) => Array.from(marks.subarray(0, count), (mark) => mark === 1);
    return { order, circular: flags(this.between(heads, unreliable)), unreliable: flags(unreliable) };
  }

  /** What the heads of circles read and is itself unreliable: the members of the circles (and what lies between two of them). */
  private between(heads: readonly number[], unreliable: Uint8Array): Uint8Array {
    const reached = new Uint8Array(unreliable.length);
    const pending = [...heads];
    while (pending.length > 0) {
      const node = pending.pop()!;
      if (reached[node] === 1 || unreliable[node] === 0) continue;
      reached[node] = 1;
      this.eachChild(node, (child) => {
        if (reached[child] === 0) pending.push(child);
      });
    }
    return reached;
  }

  private eachChild(node: number, visit: (child: number) => void): void {
    if (node < this.formulas.length) {
      for (const area of this.readsOf[node]!) visit(area);
    } else {
      this.eachMember(this.areas[node - this.formulas.length]!, visit);
    }
  }

  private eachMember({ sheet, top, left, bottom, right }: Area, visit: (formula: number) => void): void {
    const columns = this.columns.get(sheet) ?? [];
    for (let at = firstAtLeast(columns, left, (column) => column.index); at < columns.length && columns[at]!.index <= right; at++) {
      const { cells } = columns[at]!;
      for (let i = firstAtLeast(cells, top, (cell) => cell.row); i < cells.length && cells[i]!.row <= bottom; i++) visit(cells[i]!.formula);
    }
  }

  private areaNumber(area: Area, numbers: Map<string, number>): number {
    const key = `${area.sheet}!${area.top},${area.left},${area.bottom},${area.right}`;
    let number = numbers.get(key);
    if (number === undefined) {
      number = this.formulas.length + this.areas.length;
      numbers.set(key, number);
      this.areas.push(area);
    }
    return number;
  }

  private indexCells(): void {
    const sheets = new Map<string, Map<number, Column>>();
    this.formulas.forEach(({ fills: { sheet, top, left, bottom, right } }, formula) => {
      const columns = sheets.get(sheet) ?? new Map<number, Column>();
      sheets.set(sheet, columns);
      for (let index = left; index <= right; index++) {
        const column = columns.get(index) ?? { index, cells: [] };
        columns.set(index, column);
        for (let row = top; row <= bottom; row++) column.cells.push({ row, formula });
      }
    });
    for (const [sheet, columns] of sheets) {
      const sorted = [...columns.values()].sort((a, b) => a.index - b.index);
      for (const { cells } of sorted) cells.sort((a, b) => a.row - b.row);
      this.columns.set(sheet, sorted);
    }
  }
}

interface Column {
  readonly index: number;
  readonly cells: { readonly row: number; readonly formula: number }[];
}

function firstAtLeast<T>(sorted: readonly T[], wanted: number, keyOf: (item: T) => number): number {
  let low = 0;
  let high = sorted.length;
  while (low < high) {
    const middle = (low + high) >> 1;
    if (keyOf(sorted[middle]!) < wanted) low = middle + 1;
    else high = middle;
  }
  return low;
}
