/** Arguments that are read whole: a single cell for all states, or a list of cells. An error cell among them is thrown, and comes out unchanged. */
import { refuse } from "../core/refusal";
import { isSingle, shapeOf } from "./broadcast";
import { Block, Cell, CellError, isLeftOut, plain } from "./cell";

/** The only cell of an argument; null if left out. `name` follows "The". */
export function singleCell(block: Block | undefined, name: string): Cell {
  if (block === undefined || isLeftOut(block)) return null;
  const { rows, columns } = shapeOf(block);
  if (!isSingle(block)) refuse(`The ${name} must be one cell, not ${rows} × ${columns} cells`);
  return listed(block)[0]!;
}

/** The cells of a list, one row or one column; none if left out. `name` follows "The" and is in the plural. */
export function listOf(block: Block | undefined, name: string): readonly Cell[] {
  if (block === undefined || isLeftOut(block)) return [];
  const { rows, columns } = shapeOf(block);
  if (rows > 1 && columns > 1) refuse(`The ${name} are ${rows} rows × ${columns} columns; give one row or one column`);
  return listed(block);
}

function listed(block: Block): Cell[] {
  const list = block.flat().map(plain);
  const error = list.find((cell) => cell instanceof CellError);
  if (error instanceof CellError) throw error;
  return list;
}
