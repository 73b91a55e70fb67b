/** Every function stands in the book, in the help, in the registry and in what Excel loads: one list seen from five sides. */
import { readFileSync } from "node:fs";
import { basename, join } from "node:path";
import { readHandbook } from "../../src/build/handbook.mjs";
import { associatedIds } from "../../src/build/functions-check.mjs";
import { brokenRule, camelCase, storedName } from "../../src/build/names.mjs";
import { familyFiles, familyOrder } from "../../src/build/sources.mjs";
import { families, registry } from "../../src/functions";
import { handbook, helpOf } from "../../src/handbook";
import { FUNCTION_BOOK } from "./function-book";
import { ROOT, SRC, nodesOf, treeOf } from "./imports";
import ts from "typescript";

const functionsFolder = join(SRC, "functions");
const ids = handbook.map(({ id }) => id);
const built = (name: string) => readFileSync(join(ROOT, "dist", "addin", name), "utf8");

function signature({ id, parameters }: (typeof handbook)[number]): string {
  return `${id}(${parameters.map(({ name, optional }) => (optional ? `[${name}]` : name)).join(", ")})`;
}

test.each(Object.entries(FUNCTION_BOOK))("the family %s has the names and orders of the book", (family, signatures) => {
  expect(handbook.filter((entry) => entry.family === family).map(signature)).toEqual(signatures);
});

test("no function stands outside the book", () => {
  expect(handbook.filter(({ family }) => !(family in FUNCTION_BOOK)).map(({ id }) => id)).toEqual([]);
});

test("the handbook on disk is the one the sources give", () => {
  expect(handbook).toEqual(readHandbook(functionsFolder));
});

test("folder, index.ts and the bundler see the same families, in the same order", () => {
  const files = familyFiles(functionsFolder).map((file) => basename(file, ".ts"));
  expect(files).toEqual(Object.keys(families));
  expect(files).toEqual(familyOrder(join(functionsFolder, "index.ts")));
  expect([...new Set(handbook.map(({ family }) => family))]).toEqual(files);
});

test("a family file exports its worksheet functions and nothing else", () => {
  for (const [family, exported] of Object.entries(families)) {
    const wanted = handbook.filter((entry) => entry.family === family).map(({ id }) => camelCase(id));
    expect(Object.keys(exported).sort()).toEqual(wanted.sort());
  }
});

test("the registry holds every function under its id", () => {
  expect([...registry.keys()].sort()).toEqual([...ids].sort());
});

test("functions.json and the lines that associate hold the same ids", () => {
  const metadata = JSON.parse(built("functions.json")) as { functions: { id: string; name: string; parameters: { name: string }[] }[] };
  expect(metadata.functions.map(({ id }) => id)).toEqual(ids);
  expect(associatedIds(built("functions.js")).sort()).toEqual([...ids].sort());
  expect(metadata.functions.map(({ parameters }) => parameters.map(({ name }) => name))).toEqual(
    handbook.map(({ parameters }) => parameters.map(({ name }) => name)),
  );
});

test("names keep the rules of the platform, and do not meet in the stored form", () => {
  expect(ids.filter((id) => brokenRule(id))).toEqual([]);
  expect(new Set(ids.map(storedName)).size).toBe(ids.length);
  expect(new Set(ids.map((id) => storedName(id).toLowerCase())).size).toBe(ids.length);
});

test("arguments that may be left out stand last, and names of arguments are not used twice", () => {
  for (const { id, parameters } of handbook) {
    const firstOptional = parameters.findIndex(({ optional }) => optional);
    const late = firstOptional < 0 ? [] : parameters.slice(firstOptional).filter(({ optional }) => !optional);
    expect([id, late]).toEqual([id, []]);
    expect(new Set(parameters.map(({ name }) => name)).size).toBe(parameters.length);
  }
});

test("help is found by id and by name in a cell", () => {
  expect(helpOf("cv.at")?.name).toBe("STILL.CV.AT");
  expect(helpOf("still.cv.at")?.id).toBe("CV.AT");
  expect(helpOf("CV.ELSEWHERE")).toBeUndefined();
});

test("every worksheet function is a plain declaration, which the metadata tool can read", () => {
  for (const file of familyFiles(functionsFolder)) {
    const name = `functions/${basename(file)}`;
    const text = treeOf(name).getFullText();
    const tags = text.match(/@customfunction\b/g)?.length ?? 0;
    const declared = [...nodesOf(treeOf(name))].filter(
      (node) => ts.isFunctionDeclaration(node) && ts.getJSDocTags(node).some((tag) => tag.tagName.text === "customfunction"),
    );
    expect([name, declared.length]).toEqual([name, tags]);
  }
});
