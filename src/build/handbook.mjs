// @ts-check
/**
 * Writes src/handbook/handbook.json from the doc comments of the worksheet functions: the one place where a function is described.
 * The order is that of the families in src/functions/index.ts, inside a family that of the file.
 */
import { readFileSync, writeFileSync } from "node:fs";
import { basename } from "node:path";
import ts from "typescript";
import { readEntry } from "./doc-comment.mjs";
import { storedName } from "./names.mjs";
import { familyFiles } from "./sources.mjs";

/** @typedef {import("../handbook/index").PromisedEntry} HandbookEntry */

/**
 * The entries of all families of a folder. Throws an Error with one sentence for the first fault.
 * @param {string} folder src/functions
 * @returns {HandbookEntry[]}
 */
export function readHandbook(folder) {
  const entries = familyFiles(folder).flatMap(readFamily);
  checkUnique(entries);
  return entries;
}

/** @param {string} file @returns {HandbookEntry[]} */
export function readFamily(file) {
  const family = basename(file, ".ts");
  const tree = ts.createSourceFile(file, readFileSync(file, "utf8"), ts.ScriptTarget.ES2021, true);
  const entries = [];
  for (const node of tree.statements) {
    if (!hasTag(node)) continue;
    if (!ts.isFunctionDeclaration(node)) {
      const line = tree.getLineAndCharacterOfPosition(node.getStart()).line + 1;
      throw new Error(`${family}.ts, line ${line}: @customfunction stands before something else than a top-level function`);
    }
    entries.push(readEntry(node, family));
  }
  return entries;
}

/** @param {ts.Node} node */
function hasTag(node) {
  return ts.getJSDocTags(node).some((tag) => tag.tagName.text === "customfunction");
}

/** @param {readonly HandbookEntry[]} entries */
function checkUnique(entries) {
  /** @type {Map<string, HandbookEntry>} */
  const seen = new Map();
  for (const entry of entries) {
    const other = seen.get(storedName(entry.id));
    if (other) throw new Error(`${entry.family}.ts, ${entry.id}: meets ${other.id} of ${other.family}.ts in ${storedName(entry.id)}`);
    seen.set(storedName(entry.id), entry);
  }
}

/**
 * Reads and writes; leaves a file that would not change alone, so that nothing is built again for nothing.
 * @param {string} folder src/functions
 * @param {string} output handbook.json
 * @returns {number} how many functions the handbook holds
 */
export function writeHandbook(folder, output) {
  const entries = readHandbook(folder);
  const text = JSON.stringify(entries, null, 1) + "\n";
  if (readOr(output) !== text) writeFileSync(output, text);
  return entries.length;
}

/** @param {string} file */
function readOr(file) {
  try {
    return readFileSync(file, "utf8");
  } catch {
    return "";
  }
}
