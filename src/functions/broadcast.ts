/**
 * How values spread over ranges: every argument that is a value may be one cell or a range; ranges of one call have one shape,
 * single cells are repeated, and the result has that shape, each cell its own value or its own error.
 */
import { Refusal } from "../core/refusal";
import { Block, Cell, CellError, cells, errorOf, isLeftOut, plain } from "./cell";

/** Name of an argument and its block, for the sentence about shapes. */
export type Named = readonly [name: string, block: Block | undefined];

export interface Shape {
  readonly rows: number;
  readonly columns: number;
}

export function shapeOf(block: Block): Shape {
  return { rows: block.length, columns: block[0]?.length ?? 0 };
}

export function isSingle(block: Block | undefined): boolean {
  return block === undefined || block === null || (block.length === 1 && block[0]!.length === 1);
}

/** The common shape of the arguments; refused if two ranges differ in shape. */
export function commonShape(named: readonly Named[]): Shape {
  let shape: Shape | undefined;
  let owner = "";
  for (const [name, block] of named) {
    if (block === undefined || isSingle(block)) continue;
    const own = shapeOf(block);
    if (shape && (own.rows !== shape.rows || own.columns !== shape.columns)) {
      throw new Refusal(
        "input",
        `The ranges differ in shape: ${owner} has ${sizeText(shape)}, ${name} has ${sizeText(own)}; give ranges of one shape, or single cells`,
      );
    }
    if (!shape) [shape, owner] = [own, name];
  }
  return shape ?? { rows: 1, columns: 1 };
}

function sizeText({ rows, columns }: Shape): string {
  return `${rows} ${rows === 1 ? "row" : "rows"} × ${columns} ${columns === 1 ? "column" : "columns"}`;
}

/** The cell of an argument that belongs to a place of the result: its own, or the single one; undefined if left out. */
export function cellAt(block: Block | undefined, row: number, column: number): Cell | undefined {
  if (block === undefined || block === null || isLeftOut(block)) return undefined;
  const cell = isSingle(block) ? block[0]![0] : block[row]![column];
  return plain(cell);
}

/** Evaluates a function cell by cell over the common shape. An error cell among the arguments comes out unchanged. */
export function spread(named: readonly Named[], each: (cells: (Cell | undefined)[]) => Cell): Block {
  return cells(() => {
    const shape = commonShape(named);
    const block: Block = new Array(shape.rows);
    for (let row = 0; row < shape.rows; row++) {
      const target: Cell[] = new Array(shape.columns);
      for (let column = 0; column < shape.columns; column++) target[column] = one(argumentsAt(named, row, column), each);
      block[row] = target;
    }
    return block;
  });
}

/** The cells of all arguments that belong to one place of the result. */
function argumentsAt(named: readonly Named[], row: number, column: number): (Cell | undefined)[] {
  const values: (Cell | undefined)[] = new Array(named.length);
  for (let index = 0; index < named.length; index++) values[index] = cellAt(named[index]![1], row, column);
  return values;
}

function one(values: (Cell | undefined)[], each: (cells: (Cell | undefined)[]) => Cell): Cell {
  for (const value of values) if (value instanceof CellError) return errorOf(value);
  try {
    return each(values);
  } catch (thrown) {
    return errorOf(thrown);
  }
}

/** As `spread`, for functions that give a row of several cells for each state: the states must form one column. */
export function spreadRows(named: readonly Named[], width: number, each: (cells: (Cell | undefined)[]) => Block[number]): Block {
  return cells(() => {
    const shape = commonShape(named);
    if (shape.columns > 1) {
      throw new Refusal(
        "input",
        `This function gives ${width} cells for each row; give the states as one column, not ${shape.columns} columns`,
      );
    }
    return Array.from({ length: shape.rows }, (_, row) => rowOf(argumentsAt(named, row, 0), width, each));
  });
}

function rowOf(values: (Cell | undefined)[], width: number, each: (cells: (Cell | undefined)[]) => Block[number]): Block[number] {
  const error = values.find((value) => value instanceof CellError);
  try {
    if (error instanceof CellError) throw error;
    return each(values);
  } catch (thrown) {
    return Array.from({ length: width }, () => errorOf(thrown));
  }
}
