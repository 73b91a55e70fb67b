/** Names of the host, of the browser's document and of the file system stand only where the house allows them. */
import ts from "typescript";
import { arrows, nodesOf, sourceFiles, treeOf } from "./imports";

const OFFICE = ["Office", "Excel", "CustomFunctions", "OfficeRuntime", "OfficeExtension"];
const OFFICE_PLACES = ["functions/cell.ts", "functions/host.ts", "pane/excel.ts"];

const DOM =
  "document window navigator location history localStorage sessionStorage indexedDB fetch XMLHttpRequest WebSocket alert confirm prompt self HTMLElement Element Node Event MouseEvent KeyboardEvent ResizeObserver MutationObserver requestAnimationFrame getComputedStyle matchMedia".split(
    " ",
  );
const DOM_PLACES = ["pane/", "tryout/"];

const FILES = /^(node:)?(fs|fs\/promises|child_process|os|path|url|http|https|net|module)$/;
const FILE_PLACES = ["command/", "build/"];

/** Names that a file uses without declaring them: identifiers that are neither members, keys nor declared in the file. */
function freeNames(file: string): Set<string> {
  const known = found.get(file) ?? namesOf(file);
  found.set(file, known);
  return known;
}

const found = new Map<string, Set<string>>();

function namesOf(file: string): Set<string> {
  const used = new Set<string>();
  const declared = new Set<string>();
  for (const node of nodesOf(treeOf(file))) {
    if (!ts.isIdentifier(node)) continue;
    if (isDeclaration(node)) declared.add(node.text);
    else if (!isMemberOrKey(node) && !ts.isExportSpecifier(node.parent)) used.add(node.text);
  }
  return new Set([...used].filter((name) => !declared.has(name)));
}

function isDeclaration(node: ts.Identifier): boolean {
  const parent = node.parent;
  const declares =
    ts.isVariableDeclaration(parent) ||
    ts.isParameter(parent) ||
    ts.isBindingElement(parent) ||
    ts.isFunctionDeclaration(parent) ||
    ts.isClassDeclaration(parent) ||
    ts.isInterfaceDeclaration(parent) ||
    ts.isTypeAliasDeclaration(parent) ||
    ts.isTypeParameterDeclaration(parent) ||
    ts.isImportSpecifier(parent) ||
    ts.isImportClause(parent) ||
    ts.isNamespaceImport(parent);
  return declares && (parent as ts.NamedDeclaration).name === node;
}

function isMemberOrKey(node: ts.Identifier): boolean {
  const parent = node.parent;
  if (ts.isPropertyAccessExpression(parent)) return parent.name === node;
  if (ts.isQualifiedName(parent)) return parent.right === node;
  const keyed =
    ts.isPropertyAssignment(parent) ||
    ts.isPropertySignature(parent) ||
    ts.isPropertyDeclaration(parent) ||
    ts.isMethodSignature(parent) ||
    ts.isMethodDeclaration(parent) ||
    ts.isGetAccessor(parent) ||
    ts.isEnumMember(parent) ||
    ts.isNamedTupleMember(parent);
  return keyed && (parent as ts.NamedDeclaration).name === node;
}

const outside = (places: readonly string[]) =>
  sourceFiles().filter((file) => file.endsWith(".ts") && !places.some((place) => file.startsWith(place)));

test("names of the host", () => {
  const found = outside(OFFICE_PLACES).flatMap((file) =>
    OFFICE.filter((name) => freeNames(file).has(name)).map((name) => `${file}: ${name}`),
  );
  expect(found).toEqual([]);
});

test("the browser's document", () => {
  const found = outside(DOM_PLACES).flatMap((file) => DOM.filter((name) => freeNames(file).has(name)).map((name) => `${file}: ${name}`));
  expect(found).toEqual([]);
});

test("the file system and the machine", () => {
  const found = arrows().filter(
    ({ from, to, isPackage }) => isPackage && FILES.test(to) && !FILE_PLACES.some((place) => from.startsWith(place)),
  );
  expect(found).toEqual([]);
});

test("the finder sees what it should: the places that may use the names do", () => {
  expect(OFFICE.some((name) => freeNames("pane/excel.ts").has(name))).toBe(true);
  expect(sourceFiles().some((file) => file.startsWith("pane/") && freeNames(file).has("document"))).toBe(true);
});

test("nothing draws unseeded random numbers or reads the clock below the worksheet", () => {
  const found = sourceFiles()
    .filter((file) => /^(core|data|functions)\//.test(file))
    .flatMap((file) => [...nodesOf(treeOf(file))].filter((node) => isChance(node)).map(() => file));
  expect(found).toEqual([]);
});

/** `Math.random`, `Date` and `performance`. */
function isChance(node: ts.Node): boolean {
  if (ts.isPropertyAccessExpression(node)) return node.getText() === "Math.random";
  return ts.isIdentifier(node) && (node.text === "Date" || node.text === "performance") && !isMemberOrKey(node);
}
