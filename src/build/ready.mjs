// @ts-check
/**
 * Makes a checkout ready for one purpose: `node src/build/ready.mjs <purpose>`; npm runs it before its commands.
 * Installs the packages, writes the handbook, builds what the purpose needs, each only if something it depends on has changed.
 * Every word goes to the standard error, because the output of `npm run --silent stillwall` is read by programs.
 * Only Node built-ins are imported here; the rest comes after the packages are there.
 */
import { existsSync } from "node:fs";
import { dirname, join } from "node:path";
import { fileURLToPath } from "node:url";
import { ensureBrowser } from "./browser.mjs";
import { ensurePackages } from "./install.mjs";
import { hashOf, isStamped, writeStamp } from "./stamp.mjs";
import { inTurn } from "./turn.mjs";

const ROOT = join(dirname(fileURLToPath(import.meta.url)), "..", "..");

/** What each purpose needs beside the packages and the handbook. @type {Readonly<Record<string, readonly string[]>>} */
const NEEDS = {
  packages: [],
  build: ["addin", "page", "command"],
  start: ["page"],
  stillwall: ["command"],
  bench: ["command", "addin"],
  test: ["page", "command", "addin", "browser"],
};

/** Sources that a bundle does not hold; a change of theirs does not build it again. @type {Readonly<Record<string, readonly string[]>>} */
const WITHOUT = {
  addin: ["src/command", "src/tryout", "src/recalc"],
  page: ["src/command"],
  command: ["src/pane", "src/tryout"],
};

const say = (/** @type {string} */ line) => process.stderr.write(`stillwall: ${line}\n`);

/** @param {string} purpose */
async function ready(purpose) {
  const needs = NEEDS[purpose];
  if (!needs) throw new Error(`"${purpose}" is not a purpose; the purposes are ${Object.keys(NEEDS).join(", ")}`);
  ensurePackages(ROOT, say);
  await ensureHandbook();
  for (const need of needs) {
    if (need === "browser") ensureBrowser(say);
    else await ensureBundle(need, purpose);
  }
}

async function ensureHandbook() {
  const output = join(ROOT, "src/handbook/handbook.json");
  const stamp = join(ROOT, "dist/.built/handbook");
  const hash = hashOf(ROOT, ["src/functions", "src/build", "package-lock.json"]);
  if (existsSync(output) && isStamped(stamp, hash)) return;
  const { writeHandbook } = await import("./handbook.mjs");
  writeHandbook(join(ROOT, "src/functions"), output);
  writeStamp(stamp, hash);
}

/** @param {string} name @param {string} purpose */
async function ensureBundle(name, purpose) {
  const stamp = join(ROOT, "dist/.built", name);
  const inputs = ["src", "assets", "manifest.xml", "webpack.config.js", "package.json", "package-lock.json", "tsconfig.json", "LICENSE"];
  const address = name === "addin" ? process.env.STILLWALL_BASE_URL : "";
  const hash = hashOf(ROOT, inputs, WITHOUT[name], address);
  const upToDate = existsSync(join(ROOT, "dist", name)) && isStamped(stamp, hash);
  if (!upToDate || purpose === "build") say(`dist/${name} ${upToDate ? "is up to date" : "is being built"}`);
  if (upToDate) return;
  const { bundle } = await import("./bundle.mjs");
  await bundle(ROOT, [name]);
  writeStamp(stamp, hash);
}

try {
  await inTurn(join(ROOT, "dist/.ready.lock"), () => ready(process.argv[2] ?? ""), say);
} catch (error) {
  say(error instanceof Error ? error.message : String(error));
  process.exitCode = 1;
}
