import { arrayFunctions } from "./function-classes";
import { inNamespace } from "./function-names";
import { fixedReference, printReference, readReference } from "./references";
import type { Place } from "./structured";
import { call, calledName, children, errorLiteral, mapChildren, range, type Expression } from "./tree";

/** Whether a function takes a whole range in one of its arguments (by position, of so many given). */
export type TakesRange = (name: string, position: number, count: number) => boolean;

/**
 * Implicit intersection: a cell that is neither an array formula nor a dynamic array holds one value, so a range of several cells
 * where one value is wanted means the cell in the formula's own row or column. `@` asks for the same anywhere.
 */
export function intersected(root: Expression, place: Place, takesRange: TakesRange): Expression {
  function walk(node: Expression, wanted: "value" | "array"): Expression {
    if (node.type === "ReferenceIdentifier") return wanted === "value" ? crossing(node.value, place) : node;
    if (node.type === "CallExpression") return walkCall(node, wanted);
    if (node.type === "UnaryExpression" && node.operator === "#") return node;
    return mapChildren(node, (child) => walk(child, wanted));
  }

  function walkCall(node: Expression & { type: "CallExpression" }, wanted: "value" | "array"): Expression {
    const name = calledName(node)!;
    const asArrays = wanted === "array" || arrayFunctions.has(name) || inNamespace(name);
    const count = node.arguments.length;
    const args = node.arguments.map((arg, position) => {
      if (arg === null) return null;
      if (asArrays || name === "SINGLE") return walk(arg, "array");
      return takesRange(name, position, count) && arg.type === "ReferenceIdentifier" ? arg : walk(arg, "value");
    });
    return call(name, args);
  }

  const single = walk(root, "value");
  return mayFillCells(single) ? call("SINGLE", [single]) : single;
}

/** The cell of a reference that stands in the formula's row or column. */
export function crossing(text: string, place: Place): Expression {
  const reference = readReference(text);
  const { sheet, left, right, top, bottom } = reference;
  if (top === bottom && left === right && top !== null && left !== null) return range(text);
  const inRow = left === right && left !== null && place.row >= (top ?? 0) && place.row <= (bottom ?? Infinity);
  const inColumn = top === bottom && top !== null && place.column >= (left ?? 0) && place.column <= (right ?? Infinity);
  if (!inRow && !inColumn) return errorLiteral("#VALUE!");
  const [row, column] = inRow ? [place.row, left!] : [top!, place.column];
  return range(
    printReference({ ...fixedReference({ sheet, top: row, bottom: row, left: column, right: column }), fixed: reference.fixed }),
  );
}

function mayFillCells(node: Expression): boolean {
  if (node.type === "ArrayExpression") return true;
  if (node.type === "CallExpression" && calledName(node) === "SINGLE") return false;
  return node.type === "CallExpression" ? node.arguments.length > 0 : children(node).some(mayFillCells);
}
