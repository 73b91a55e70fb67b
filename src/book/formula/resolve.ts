import { mostColumns, mostRows } from "./limits";
import type { BookContext } from "./book-context";
import { aggregates } from "./function-classes";
import { readFormula } from "./parse";
import { fail } from "./problem";
import { fixedReference, printReference, readReference, type Area, type Reference } from "./references";
import { structuredArea, tableData, type Place } from "./structured";
import { substitute } from "./substitute";
import { binary, call, calledName, errorLiteral, literal, mapChildren, range, unary, type Argument, type Expression } from "./tree";

/**
 * Makes a formula stand on its own: LET and LAMBDA are applied, defined names and tables become the references and expressions
 * they stand for, whole columns end where the data end, several sheets at once are written out.
 * @throws FormulaProblem naming the part that is not known or not supported
 */
export function resolveFormula(root: Expression, book: BookContext, place?: Place): Expression {
  return resolveWith(root, { book, place, open: [] });
}

interface Resolving {
  readonly book: BookContext;
  readonly place: Place | undefined;
  /** Defined names being written out, to stop a name that refers to itself. */
  readonly open: readonly string[];
}

function resolveWith(root: Expression, at: Resolving): Expression {
  return resolve(
    substitute(root, (name) => definition(name, at)),
    at,
  );
}

function resolve(node: Expression, at: Resolving): Expression {
  switch (node.type) {
    case "ReferenceIdentifier":
      if (node.kind === "name") return resolveName(node.value, at);
      return node.kind === "table"
        ? fromArea(structuredArea(node.value, at.book.tables, at.place), "#VALUE!")
        : resolveReference(node.value, at);
    case "BinaryExpression":
      return resolveBinary(node, at);
    case "UnaryExpression":
      return node.operator === "@" ? call("SINGLE", [resolve(node.arguments[0]!, at)]) : mapChildren(node, (child) => resolve(child, at));
    case "CallExpression":
      return resolveCall(node, at);
    default:
      return mapChildren(node, (child) => resolve(child, at));
  }
}

function resolveCall(node: Expression & { type: "CallExpression" }, at: Resolving): Expression {
  const name = calledName(node);
  if (name === undefined) return fail("unsupported", "A call of something other than a function is not supported");
  const args = node.arguments as readonly Argument[];
  if (name === "ANCHORARRAY" && args.length === 1 && args[0]) return unary("#", resolve(args[0], at));
  const whole = wholeSize(name, args);
  if (whole !== undefined) return literal(whole);
  const spread = aggregates.has(name) ? args.flatMap((arg) => separated(arg, at)) : args;
  return call(
    name,
    spread.map((arg) => (arg === null ? null : resolve(arg, at))),
  );
}

/** ROWS(A:A) counts the sheet, not the data. */
function wholeSize(name: string, args: readonly Argument[]): number | undefined {
  const [only] = args;
  if ((name !== "ROWS" && name !== "COLUMNS") || only?.type !== "ReferenceIdentifier" || only.kind !== "beam") return undefined;
  const { top, left, bottom, right } = readReference(only.value);
  if (name === "ROWS") return top === null || bottom === null ? mostRows : bottom - top + 1;
  return left === null || right === null ? mostColumns : right - left + 1;
}

/** `SUM((A1:A3,C1))` and `SUM(First:Last!B2)`: the parts, each an argument of its own. */
function separated(arg: Argument, at: Resolving): readonly Argument[] {
  if (arg?.type === "BinaryExpression" && (arg.operator as string) === ",") return arg.arguments.flatMap((part) => separated(part, at));
  const several = arg?.type === "ReferenceIdentifier" && /^(?:'((?:[^']|'')+)'|([^'!]+))!(.+)$/.exec(arg.value);
  const sheets = several ? (several[1] ?? several[2]!).replaceAll("''", "'") : "";
  const colon = sheets.indexOf(":");
  if (!several || colon < 0) return [arg];
  const span = at.book.sheetsBetween(sheets.slice(0, colon), sheets.slice(colon + 1));
  if (span.length === 0) fail("unknown", `There are no sheets ${sheets}`);
  return span.map((sheet) => range(printReference({ ...readReference(several[3]!), sheet })));
}

function resolveBinary(node: Expression & { type: "BinaryExpression" }, at: Resolving): Expression {
  const [left, right] = node.arguments.map((operand) => resolve(operand, at)) as [Expression, Expression];
  const operator: string = node.operator;
  if (operator !== ":" && operator !== " ") return binary(operator, left, right);
  if (left.type !== "ReferenceIdentifier" || right.type !== "ReferenceIdentifier") {
    return fail("unsupported", `The ${operator === ":" ? "range" : "intersection"} of computed references is not supported here`);
  }
  return combined(operator, readReference(left.value), readReference(right.value));
}

function combined(operator: string, first: Reference, second: Reference): Expression {
  const sheet = first.sheet || second.sheet;
  const a = { ...whole(first), sheet };
  const b = { ...whole(second), sheet };
  if (first.sheet !== second.sheet && second.sheet !== "") return errorLiteral("#VALUE!");
  const [outer, inner] = operator === ":" ? [Math.min, Math.max] : [Math.max, Math.min];
  const area = {
    sheet,
    top: outer(a.top, b.top),
    left: outer(a.left, b.left),
    bottom: inner(a.bottom, b.bottom),
    right: inner(a.right, b.right),
  };
  return area.top > area.bottom || area.left > area.right ? errorLiteral("#NULL!") : fromArea(area, "#REF!");
}

function whole({ sheet, top, left, bottom, right }: Reference): Area {
  return { sheet, top: top ?? 0, left: left ?? 0, bottom: bottom ?? mostRows - 1, right: right ?? mostColumns - 1 };
}

function resolveReference(text: string, at: Resolving): Expression {
  const reference = readReference(text);
  const sheet = reference.sheet && at.book.sheetNamed(reference.sheet);
  if (sheet === undefined) return fail("unknown", `There is no sheet ${reference.sheet}`);
  return range(printReference({ ...bounded(reference, at.book.used), sheet }));
}

/** A whole column or row ends with the data. */
function bounded(reference: Reference, used: BookContext["used"]): Reference {
  if (!used) return reference;
  const { top, left, bottom, right } = reference;
  return {
    ...reference,
    top: top ?? 0,
    left: left ?? 0,
    bottom: bottom ?? Math.max(used.rows - 1, top ?? 0),
    right: right ?? Math.max(used.columns - 1, left ?? 0),
  };
}

function resolveName(written: string, at: Resolving): Expression {
  const { sheet, name } = nameParts(written, at);
  const text = definition(written, at);
  if (text) return inName(text, name, { ...at, place: at.place && { ...at.place, sheet: sheet || at.place.sheet } });
  const table = at.book.tables.find((candidate) => candidate.name.toUpperCase() === name.toUpperCase());
  return table ? fromArea(tableData(table), "#REF!") : fail("unknown", `The name ${written} is not defined`);
}

function inName(text: Expression, name: string, at: Resolving): Expression {
  const key = name.toUpperCase();
  if (at.open.includes(key)) return fail("unsupported", `The name ${name} refers to itself`);
  return resolveWith(moved(text, name, at.place), { ...at, open: [...at.open, key] });
}

function definition(written: string, at: Resolving): Expression | undefined {
  const { sheet, name } = nameParts(written, at);
  const found = at.book.nameFor(name, sheet);
  return found && readFormula(found.formula, at.book.functions);
}

function nameParts(written: string, at: Resolving): { sheet: string; name: string } {
  if (/^'?\[/.test(written)) fail("unsupported", `The name ${written} belongs to another workbook`);
  const mark = written.lastIndexOf("!");
  if (mark < 0) return { sheet: at.place?.sheet ?? "", name: written };
  const sheet = written.slice(0, mark).replace(/^'|'$/g, "").replaceAll("''", "'");
  return { sheet: at.book.sheetNamed(sheet) ?? sheet, name: written.slice(mark + 1) };
}

/** A defined name holds relative references as seen from A1: they move with the cell that uses the name. */
function moved(node: Expression, name: string, place?: Place): Expression {
  if (node.type !== "ReferenceIdentifier" || (node.kind !== "range" && node.kind !== "beam"))
    return mapChildren(node, (child) => moved(child, name, place));
  const reference = readReference(node.value);
  const { top, left, bottom, right, fixed } = reference;
  const relative = (top !== null && !(fixed.top && fixed.bottom)) || (left !== null && !(fixed.left && fixed.right));
  if (!relative) return node;
  if (!place) return fail("unsupported", `The name ${name} depends on the cell that uses it`);
  const down = (index: number | null, stays: boolean) => (index === null || stays ? index : (index + place.row) % mostRows);
  const across = (index: number | null, stays: boolean) => (index === null || stays ? index : (index + place.column) % mostColumns);
  const sides = {
    top: down(top, fixed.top),
    bottom: down(bottom, fixed.bottom),
    left: across(left, fixed.left),
    right: across(right, fixed.right),
  };
  return range(printReference({ ...reference, ...sides }));
}

function fromArea(area: Area | undefined, missing: string): Expression {
  return area ? range(printReference(fixedReference(area))) : errorLiteral(missing);
}
