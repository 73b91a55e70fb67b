// @ts-check
/** Installs the packages of the lock file when node_modules does not hold them yet. Node built-ins only. */
import { spawnSync } from "node:child_process";
import { createHash } from "node:crypto";
import { existsSync, readFileSync, writeFileSync } from "node:fs";
import { join } from "node:path";

/**
 * @param {string} root folder of the project
 * @param {(line: string) => void} say
 */
export function ensurePackages(root, say) {
  const wanted = createHash("sha256")
    .update(readFileSync(join(root, "package-lock.json")))
    .digest("hex");
  const marker = join(root, "node_modules", ".ready");
  if (existsSync(marker) && readFileSync(marker, "utf8").trim() === wanted) return;
  say("installing the packages of package-lock.json (once; about a minute)");
  install(root);
  writeFileSync(marker, wanted);
}

/**
 * npm's own words go to the standard error: the standard output belongs to the command that runs afterwards.
 * @param {string} root
 */
function install(root) {
  const npm = process.env.npm_execpath;
  const words = ["ci", "--include=dev"];
  const options = { cwd: root, stdio: /** @type {["ignore", 2, 2]} */ (["ignore", 2, 2]) };
  const result = npm ? spawnSync(process.execPath, [npm, ...words], options) : spawnSync("npm", words, { ...options, shell: true });
  if (result.error) throw new Error(`npm ci could not be started: ${result.error.message}`);
  if (result.status !== 0) throw new Error(`npm ci ended with status ${result.status}; its words stand above`);
}
