import { noBook, type BookContext } from "./book-context";
import { engineDialect, errorFunction, fileDialect } from "./dialects";
import type { FunctionNames } from "./function-names";
import { crossing, intersected, type TakesRange } from "./intersect";
import { readFormula } from "./parse";
import { print } from "./print";
import { readReference, type Reference } from "./references";
import { resolveFormula } from "./resolve";
import type { Place } from "./structured";
import { call, calledName, children, errorLiteral, literal, mapChildren, type Expression } from "./tree";

/** A formula ready for the engine, and what it reads and calls. */
export interface EngineFormula {
  /** With `=`, printed from a syntax tree: nothing else may reach the engine, which compiles formulas. */
  readonly text: string;
  /** Every cell and range it reads; an empty sheet means its own. */
  readonly references: readonly Reference[];
  /** Canonical name and number of arguments of every call. */
  readonly calls: readonly { readonly name: string; readonly count: number }[];
}

export interface TranslationOptions {
  /** Where the formula stands; needed for names and tables that depend on it and for `@`. */
  readonly place?: Place;
  /** Given for a cell that holds a single value (neither array formula nor dynamic array): ranges are intersected. */
  readonly single?: TakesRange;
  /** Rows and columns that an array formula of the old kind fills, whatever the size of its result. */
  readonly fill?: { readonly rows: number; readonly columns: number };
  /** Name under which the engine knows a sheet. */
  readonly sheetName?: (name: string) => string;
}

/** Name of the hidden function that gives a result a fixed number of rows and columns. */
export const fillFunction = "ARRAY.FILL";

/**
 * From the dialect of the file (or what was typed, which is the same) to the engine's.
 * @throws FormulaProblem if the formula cannot be read, refers to something unknown, or uses what is not supported
 */
export function toEngine(formula: string, book: BookContext, options: TranslationOptions = {}): EngineFormula {
  const { place, single, fill, sheetName } = options;
  let tree = resolveFormula(readFormula(formula, book.functions), book, place);
  if (place) tree = withCrossings(tree, place);
  if (single && place) tree = intersected(tree, place, single);
  if (fill) tree = call(fillFunction, [tree, literal(fill.rows), literal(fill.columns)]);
  const found = parts(tree);
  return { text: `=${print(tree, engineDialect(book.functions, sheetName))}`, ...found };
}

/**
 * From the engine's text, as this translator printed it, back to the dialect of the file, without `=`.
 * @throws FormulaProblem if the text is none of ours
 */
export function toFile(engineText: string, functions: FunctionNames, sheetName?: (name: string) => string): string {
  const tree = restored(resolveFormula(readFormula(engineText, functions), noBook(functions)));
  return print(tree, fileDialect(functions, sheetName));
}

/** `@A1:A9` where the place is known: the one cell, so that the whole column is neither read nor depended on. */
function withCrossings(node: Expression, place: Place): Expression {
  const [only] = node.type === "CallExpression" && calledName(node) === "SINGLE" ? node.arguments : [];
  if (only?.type === "ReferenceIdentifier") return crossing(only.value, place);
  return mapChildren(node, (child) => withCrossings(child, place));
}

/** Undoes what only the engine needs: its spelling of texts with quotes, and of error values. */
function restored(node: Expression): Expression {
  const inner = mapChildren(node, restored);
  if (inner.type !== "CallExpression") return inner;
  const name = calledName(inner);
  const [first] = inner.arguments;
  if (name === errorFunction && first?.type === "Literal") return errorLiteral(String(first.value));
  if (name === fillFunction && first) return first;
  return (name === "CONCATENATE" && joinedText(inner.arguments)) || inner;
}

function joinedText(args: readonly (Expression | null)[]): Expression | undefined {
  let text = "";
  let spelt = false;
  for (const arg of args) {
    if (arg?.type === "Literal" && typeof arg.value === "string") text += arg.value;
    else {
      const code = arg?.type === "CallExpression" && calledName(arg) === "CHAR" ? arg.arguments[0] : undefined;
      if (code?.type !== "Literal" || ![10, 13, 34, 92].includes(Number(code.value))) return undefined;
      text += String.fromCharCode(Number(code.value));
      spelt = true;
    }
  }
  return spelt ? literal(text) : undefined;
}

function parts(root: Expression): Pick<EngineFormula, "references" | "calls"> {
  const references: Reference[] = [];
  const calls: { name: string; count: number }[] = [];
  const visit = (node: Expression): void => {
    if (node.type === "ReferenceIdentifier" && (node.kind === "range" || node.kind === "beam")) references.push(readReference(node.value));
    if (node.type === "CallExpression") calls.push({ name: calledName(node) ?? "", count: node.arguments.length });
    children(node).forEach(visit);
  };
  visit(root);
  return { references, calls };
}
