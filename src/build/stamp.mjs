// @ts-check
/** Tells whether what was built still belongs to the sources, by a hash of their content. Node built-ins only. */
import { createHash } from "node:crypto";
import { existsSync, mkdirSync, readFileSync, readdirSync, statSync, writeFileSync } from "node:fs";
import { dirname, join, relative } from "node:path";

/**
 * Hash of files and folders: names and contents, in a fixed order, whatever the separator of the system.
 * @param {string} root
 * @param {readonly string[]} paths files and folders, relative to root; those that do not exist count as absent
 * @param {readonly string[]} without folders and files left out, relative to root, with "/"
 * @param {string} extra further text the result depends on
 */
export function hashOf(root, paths, without = [], extra = "") {
  const hash = createHash("sha256").update(extra);
  for (const file of paths.flatMap((path) => filesUnder(join(root, path)))) {
    const name = relative(root, file).replaceAll("\\", "/");
    if (without.some((path) => name === path || name.startsWith(`${path}/`))) continue;
    hash.update(`\n${name}\n`).update(readFileSync(file));
  }
  return hash.digest("hex");
}

/** @param {string} path @returns {string[]} */
export function filesUnder(path) {
  if (!existsSync(path)) return [];
  if (!statSync(path).isDirectory()) return [path];
  return readdirSync(path)
    .sort()
    .flatMap((name) => filesUnder(join(path, name)));
}

/** @param {string} stamp file that holds the hash of the last build @param {string} hash */
export function isStamped(stamp, hash) {
  return existsSync(stamp) && readFileSync(stamp, "utf8") === hash;
}

/** @param {string} stamp @param {string} hash */
export function writeStamp(stamp, hash) {
  mkdirSync(dirname(stamp), { recursive: true });
  writeFileSync(stamp, hash);
}
