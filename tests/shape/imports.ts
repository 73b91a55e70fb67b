/** Walks the imports of all sources: every arrow from one of our files to another, or to a package. */
import { readdirSync, readFileSync, existsSync } from "node:fs";
import { dirname, join, relative, resolve } from "node:path";
import ts from "typescript";

export const ROOT = resolve(__dirname, "..", "..");
export const SRC = join(ROOT, "src");

export interface Arrow {
  /** Importing file, relative to src, with "/". */
  readonly from: string;
  /** File relative to src, or name of a package. */
  readonly to: string;
  readonly isPackage: boolean;
  /** True if nothing of the target is left when the types are gone. */
  readonly isType?: boolean;
}

/** All source files of the product, relative to src; the build scripts are looked at too. */
export function sourceFiles(folder: string = SRC): string[] {
  return readdirSync(folder, { withFileTypes: true })
    .flatMap((entry) => {
      const path = join(folder, entry.name);
      if (entry.isDirectory()) return sourceFiles(path);
      return /\.(ts|mjs)$/.test(entry.name) && !entry.name.endsWith(".d.ts") ? [relative(SRC, path).replaceAll("\\", "/")] : [];
    })
    .sort();
}

const trees = new Map<string, ts.SourceFile>();

export function treeOf(file: string): ts.SourceFile {
  const known = trees.get(file);
  if (known) return known;
  const tree = ts.createSourceFile(file, readFileSync(join(SRC, file), "utf8"), ts.ScriptTarget.ES2022, true);
  trees.set(file, tree);
  return tree;
}

/** Every node of a file. */
export function* nodesOf(node: ts.Node): Generator<ts.Node> {
  yield node;
  const children: ts.Node[] = [];
  ts.forEachChild(node, (child) => void children.push(child));
  for (const child of children) yield* nodesOf(child);
}

/** Module names in import and export declarations, `import()`, `require()`, `import(…)` types and `new URL(…, import.meta.url)`. */
export function specifiersOf(file: string): { name: string; isType: boolean }[] {
  return [...nodesOf(treeOf(file))].flatMap((node) => specifierOf(node).map((name) => ({ name, isType: isTypeOnly(node) })));
}

function specifierOf(node: ts.Node): string[] {
  if ((ts.isImportDeclaration(node) || ts.isExportDeclaration(node)) && node.moduleSpecifier) return textOf(node.moduleSpecifier);
  if (ts.isImportEqualsDeclaration(node) && ts.isExternalModuleReference(node.moduleReference))
    return textOf(node.moduleReference.expression);
  if (ts.isImportTypeNode(node) && ts.isLiteralTypeNode(node.argument)) return textOf(node.argument.literal);
  return ts.isCallExpression(node) && isLoading(node) ? textOf(node.arguments[0]) : [];
}

/** `import type …`, `import { type A, type B } …`, the same for exports, and `import("…").A` as a type. */
function isTypeOnly(node: ts.Node): boolean {
  if (ts.isImportTypeNode(node)) return true;
  if (ts.isExportDeclaration(node)) return node.isTypeOnly || allTypes(node.exportClause);
  if (!ts.isImportDeclaration(node) || !node.importClause) return false;
  const { isTypeOnly, name, namedBindings } = node.importClause;
  return isTypeOnly || (name === undefined && allTypes(namedBindings));
}

function allTypes(names: ts.NamedExportBindings | ts.NamedImportBindings | undefined): boolean {
  return names !== undefined && (ts.isNamedExports(names) || ts.isNamedImports(names)) && names.elements.every((one) => one.isTypeOnly);
}

function isLoading(call: ts.CallExpression): boolean {
  return call.expression.kind === ts.SyntaxKind.ImportKeyword || (ts.isIdentifier(call.expression) && call.expression.text === "require");
}

function textOf(node: ts.Node | undefined): string[] {
  return node && ts.isStringLiteralLike(node) ? [node.text] : [];
}

export function arrows(): Arrow[] {
  return sourceFiles().flatMap((from) =>
    specifiersOf(from).map(({ name, isType }) => {
      if (!name.startsWith(".")) return { from, to: name, isPackage: true, isType };
      return { from, to: target(from, name), isPackage: false, isType };
    }),
  );
}

/** The file that a relative specifier means; fails the test for one that means none. */
function target(from: string, specifier: string): string {
  const base = resolve(SRC, dirname(from), specifier);
  const found = [base, `${base}.ts`, join(base, "index.ts")].find((path) => existsSync(path) && /\.(ts|mjs|json)$/.test(path));
  // handbook.json is written by the build, and may be imported before it is there.
  if (!found && !specifier.endsWith(".json")) throw new Error(`${from} imports ${specifier}, which is no file`);
  return relative(SRC, found ?? base).replaceAll("\\", "/");
}

/** The first ring of imports, file by file, or undefined. */
export function cycle(all: readonly Arrow[]): string[] | undefined {
  const targets = new Map<string, string[]>();
  for (const { from, to, isPackage } of all) if (!isPackage) targets.set(from, [...(targets.get(from) ?? []), to]);
  const done = new Set<string>();
  const visit = (file: string, path: readonly string[]): string[] | undefined => {
    if (path.includes(file)) return [...path.slice(path.indexOf(file)), file];
    if (done.has(file)) return undefined;
    for (const next of targets.get(file) ?? []) {
      const ring = visit(next, [...path, file]);
      if (ring) return ring;
    }
    done.add(file);
    return undefined;
  };
  for (const file of targets.keys()) {
    const ring = visit(file, []);
    if (ring) return ring;
  }
  return undefined;
}
