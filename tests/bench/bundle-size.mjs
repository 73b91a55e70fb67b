// @ts-check
/** The size of the add-in as a browser fetches it: every script of dist/addin, gzip level 9, and the share of the figures in it. */
import { existsSync, readdirSync, readFileSync } from "node:fs";
import { join } from "node:path";
import { gzipSync } from "node:zlib";

const kilobytes = (/** @type {Buffer | string} */ content) => gzipSync(content, { level: 9 }).length / 1000;

/** @param {string} folder @param {string} ending @returns {string[]} */
function filesIn(folder, ending) {
  return readdirSync(folder, { recursive: true, encoding: "utf8" })
    .filter((name) => name.endsWith(ending))
    .map((name) => join(folder, name));
}

/** @param {string} root @returns {Promise<import("./goals").Goal[]>} */
export async function bundleGoals(root) {
  const folder = join(root, "dist", "addin");
  if (!existsSync(join(folder, "functions.js"))) await (await import("../../src/build/bundle.mjs")).bundle(root, ["addin"]);
  const scripts = filesIn(folder, ".js").map((file) => readFileSync(file));
  const figures = filesIn(join(root, "src", "data"), ".json").map((file) => JSON.stringify(JSON.parse(readFileSync(file, "utf8"))));
  return [
    { what: "add-in: all scripts", measured: scripts.reduce((sum, script) => sum + kilobytes(script), 0), unit: "kB gzip", atMost: 230 },
    {
      what: "add-in: the figures of src/data",
      measured: kilobytes(figures.join("\n")),
      unit: "kB gzip",
      atMost: 60,
      note: "compressed by themselves",
    },
  ];
}
