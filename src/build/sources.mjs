// @ts-check
/**
 * Which files hold worksheet functions, and in which order their families stand. Node built-ins only.
 * A family is a file in src/functions with a `@customfunction` tag; the order is that of `families` in
 * src/functions/index.ts.
 */
import { readdirSync, readFileSync, existsSync } from "node:fs";
import { basename, join } from "node:path";

/** A `@customfunction` tag at the start of a line of a comment. */
const TAG = /^\s*\*\s*@customfunction\b/m;

/**
 * Absolute paths of the family files, in the order of index.ts; families that it does not name come last, by name.
 * @param {string} folder src/functions
 * @returns {string[]}
 */
export function familyFiles(folder) {
  const order = familyOrder(join(folder, "index.ts"));
  const place = (/** @type {string} */ file) => {
    const at = order.indexOf(basename(file, ".ts"));
    return at < 0 ? order.length : at;
  };
  return readdirSync(folder)
    .filter((name) => name.endsWith(".ts") && !name.endsWith(".d.ts"))
    .filter((name) => TAG.test(readFileSync(join(folder, name), "utf8")))
    .sort((a, b) => place(a) - place(b) || (a < b ? -1 : 1))
    .map((name) => join(folder, name));
}

/**
 * The names in `families = { properties, heat, … }` of src/functions/index.ts, in order.
 * @param {string} file
 * @returns {string[]}
 */
export function familyOrder(file) {
  if (!existsSync(file)) return [];
  const match = /\bfamilies\b[^=]*=\s*\{([^}]*)\}/.exec(readFileSync(file, "utf8"));
  return (match?.[1] ?? "")
    .split(",")
    .map((name) => name.trim())
    .filter(Boolean);
}
