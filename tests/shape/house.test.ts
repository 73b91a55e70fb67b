/** What stands at the top of the house, what is shipped, and that files and functions stay small. */
import { readdirSync, readFileSync, statSync } from "node:fs";
import { join } from "node:path";
import { gzipSync } from "node:zlib";
import ts from "typescript";
import { checkAddin } from "../../src/build/manifest-check.mjs";
import { filesUnder } from "../../src/build/stamp.mjs";
import { nodesOf, ROOT, sourceFiles, SRC, treeOf } from "./imports";

const ADDIN = join(ROOT, "dist", "addin");
const PAGE = join(ROOT, "dist", "page");

const TOP_LEVEL =
  "package.json package-lock.json tsconfig.json webpack.config.js manifest.xml README.md DEVELOPERS.md LICENSE src tests assets".split(" ");
const MADE = ["node_modules", "dist", "coverage"];

test("the top level holds what the house lists and nothing else", () => {
  const others = readdirSync(ROOT).filter((name) => !name.startsWith(".") && !MADE.includes(name) && !TOP_LEVEL.includes(name));
  expect(others).toEqual([]);
});

test("the licence is MIT, in the file and in the package", () => {
  expect(readFileSync(join(ROOT, "LICENSE"), "utf8")).toMatch(/^MIT License/);
  expect(JSON.parse(readFileSync(join(ROOT, "package.json"), "utf8")).license).toBe("MIT");
});

test("the lock file names no registry, and every package has its hash", () => {
  const lock = JSON.parse(readFileSync(join(ROOT, "package-lock.json"), "utf8")) as {
    packages: Record<string, { resolved?: string; integrity?: string; link?: boolean; inBundle?: boolean }>;
  };
  const packages = Object.entries(lock.packages).filter(([path]) => path !== "");
  expect(packages.length).toBeGreaterThan(100);
  expect(packages.filter(([, { resolved }]) => resolved).map(([path]) => path)).toEqual([]);
  expect(packages.filter(([, { integrity, inBundle }]) => !integrity && !inBundle).map(([path]) => path)).toEqual([]);
});

test("package.json does not let the bundler drop what only registers itself", () => {
  expect(JSON.parse(readFileSync(join(ROOT, "package.json"), "utf8"))).not.toHaveProperty("sideEffects");
});

describe("dist/addin", () => {
  const texts = filesUnder(ADDIN).filter((file) => /\.(js|json|html|css|xml|txt)$/.test(file));

  test("passes the offline check of manifest, files and functions", () => {
    expect(checkAddin(ADDIN)).toEqual([]);
  });

  test("holds no trace of the spreadsheet engine", () => {
    expect(texts.length).toBeGreaterThan(5);
    const found = texts.filter((file) =>
      /o[-_]spreadsheet|odoo|\bowl\b|formulajs|@borgar|LGPL|GNU LESSER/i.test(readFileSync(file, "utf8")),
    );
    expect(found).toEqual([]);
  });

  test("runs under a policy without code generation and inline scripts", () => {
    const script = readFileSync(join(ADDIN, "functions.js"), "utf8");
    expect(script.match(/\bnew Function\b|[^.\w]Function\(|[^.\w]eval\(/g)).toBeNull();
    for (const file of texts.filter((name) => name.endsWith(".html"))) {
      const inline = [...readFileSync(file, "utf8").matchAll(/<script\b([^>]*)>([^<]*)/g)].filter(
        ([, attributes = "", body = ""]) => body.trim() || !/src=/.test(attributes),
      );
      expect([file, inline.length]).toEqual([file, 0]);
    }
  });

  // Functions start when this file is read; the ceiling is the house's own.
  test("functions.js stays below 230 kB gzip", () => {
    expect(gzipSync(readFileSync(join(ADDIN, "functions.js")), { level: 9 }).length).toBeLessThan(230_000);
  });
});

describe("dist/page", () => {
  test("holds the libraries as they came, with their licences", () => {
    const libraries = JSON.parse(readFileSync(join(SRC, "tryout", "libraries.json"), "utf8")) as {
      name: string;
      files: { from: string; to: string }[];
    }[];
    for (const { name, files } of libraries) {
      for (const { from, to } of files) {
        const same = readFileSync(join(PAGE, to)).equals(readFileSync(join(ROOT, "node_modules", from)));
        expect([name, to, same]).toEqual([name, to, true]);
      }
      expect([name, files.some(({ to }) => /licen[cs]e|readme/i.test(to))]).toEqual([name, true]);
    }
  });

  test("keeps the engine out of its own script", () => {
    expect(statSync(join(PAGE, "page.js")).size).toBeLessThan(statSync(join(PAGE, "lib/o-spreadsheet/o_spreadsheet.iife.js")).size);
    expect(readFileSync(join(PAGE, "page.js"), "utf8")).not.toContain("https://github.com/odoo");
  });
});

test("files and functions stay small: a habit, so a warning", () => {
  const longFiles = sourceFiles().map((file) => [file, treeOf(file).getLineStarts().length] as const);
  const notes = longFiles.filter(([, lines]) => lines > 250).map(([file, lines]) => `${file} has ${lines} lines`);
  for (const file of sourceFiles()) notes.push(...longFunctions(file));
  if (notes.length > 0) process.stderr.write(`Longer than the habit (250 lines a file, 60 a function):\n  ${notes.join("\n  ")}\n`);
  expect(longFiles.length).toBeGreaterThan(0);
});

function longFunctions(file: string): string[] {
  const tree = treeOf(file);
  const line = (position: number) => tree.getLineAndCharacterOfPosition(position).line;
  return [...nodesOf(tree)]
    .filter((node) => ts.isFunctionLike(node) && "body" in node && node.body !== undefined)
    .map((node) => ({ at: line(node.getStart()) + 1, lines: line(node.end) - line(node.getStart()) + 1 }))
    .filter(({ lines }) => lines > 60)
    .map(({ at, lines }) => `${file}:${at} holds a function of ${lines} lines`);
}
