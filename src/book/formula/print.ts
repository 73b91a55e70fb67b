import { printReference, readReference, type Reference } from "./references";
import { fail } from "./problem";
import { calledName, type Argument, type Expression } from "./tree";

/** What differs between the text of a file and the text for the engine. */
export interface Dialect {
  functionName(canonical: string): string;
  text(value: string): string;
  error(code: string): string;
  sheetName(name: string): string;
  /** `A1#` where the dialect has it. */
  spill(reference: string): string;
}

const strength: Readonly<Record<string, number>> = {
  "=": 1, "<": 1, ">": 1, "<=": 1, ">=": 1, "<>": 1,
  "&": 2,
  "+": 3, "-": 3,
  "*": 4, "/": 4,
  "^": 5,
}; // prettier-ignore

/**
 * Prints a syntax tree. A sign in front of an operand is always put in parentheses: dialects differ in whether it binds closer
 * than the power (`-2^2`) or even than a product (`6/-3*2`), and `(-2)^2` means the same in all of them.
 * @throws FormulaProblem for what no dialect can hold here: names and tables not resolved, unions, LAMBDA as a value
 */
export function print(node: Expression, dialect: Dialect): string {
  switch (node.type) {
    case "Literal":
      return printLiteral(node.value, dialect);
    case "ErrorLiteral":
      return dialect.error(node.value);
    case "ReferenceIdentifier":
      return printIdentifier(node.kind, node.value, dialect);
    case "UnaryExpression":
      return printUnary(node.operator, node.arguments[0]!, dialect);
    case "BinaryExpression":
      return printBinary(node.operator, node.arguments[0]!, node.arguments[1]!, dialect);
    case "CallExpression":
      return printCall(calledName(node), node.arguments, dialect);
    case "ArrayExpression":
      return `{${node.elements.map((row) => row.map((element) => print(element, dialect)).join(",")).join(";")}}`;
    case "LambdaExpression":
      return fail("unsupported", "LAMBDA is supported only where it is applied at once");
    case "LetExpression":
      return fail("unsupported", "LET was not resolved");
  }
}

function printLiteral(value: string | number | boolean, dialect: Dialect): string {
  if (typeof value === "string") return dialect.text(value);
  if (typeof value === "boolean") return value ? "TRUE" : "FALSE";
  return printNumber(value);
}

/** All digits of a double, in a form both dialects read. */
export function printNumber(value: number): string {
  if (!Number.isFinite(value)) fail("syntax", "A number in the formula is larger than 1.797E+308");
  return Object.is(value, -0) ? "-0" : String(value).toUpperCase();
}

function printIdentifier(kind: string, value: string, dialect: Dialect): string {
  if (kind === "name") return fail("unknown", `The name ${value} is not defined`);
  if (kind === "table") return fail("unsupported", `The table reference ${value} has no workbook to look it up in`);
  const reference: Reference = readReference(value);
  return printReference({ ...reference, sheet: reference.sheet && dialect.sheetName(reference.sheet) });
}

function printUnary(operator: string, operand: Expression, dialect: Dialect): string {
  const inner = print(operand, dialect);
  if (operator === "#") return dialect.spill(inner);
  if (operator === "@") return `${dialect.functionName("SINGLE")}(${inner})`;
  if (operator === "%") return `${isAtom(operand) ? inner : `(${inner})`}%`;
  // -(5%) keeps its brackets: without them the sign would be read as part of the number.
  return `${operator}${isAtom(operand) || (isPercent(operand) && operand.operator === "#") ? inner : `(${inner})`}`;
}

function printBinary(operator: string, left: Expression, right: Expression, dialect: Dialect): string {
  const own = strength[operator];
  if (own === undefined)
    return fail("unsupported", `The operator "${operator === "," ? "union" : operator}" between references is not supported here`);
  return print2(left, own, dialect) + operator + print2(right, own + 0.5, dialect);
}

function print2(operand: Expression, needed: number, dialect: Dialect): string {
  const text = print(operand, dialect);
  if (isAtom(operand) || isPercent(operand)) return text;
  const own = operand.type === "BinaryExpression" ? (strength[operand.operator] ?? 0) : 0;
  return own >= needed ? text : `(${text})`;
}

function printCall(name: string | undefined, args: readonly Argument[], dialect: Dialect): string {
  if (name === undefined) return fail("unsupported", "A call of something other than a function is not supported");
  return `${dialect.functionName(name)}(${args.map((arg) => (arg === null ? "" : print(arg, dialect))).join(",")})`;
}

function isAtom(node: Expression): boolean {
  if (node.type === "Literal") return typeof node.value !== "number" || !isNegative(node.value);
  return node.type !== "UnaryExpression" && node.type !== "BinaryExpression";
}

/** Negative zero counts: its sign is printed too. */
function isNegative(value: number): boolean {
  return value < 0 || Object.is(value, -0);
}

function isPercent(node: Expression): node is Expression & { type: "UnaryExpression" } {
  return node.type === "UnaryExpression" && (node.operator === "%" || node.operator === "#");
}
