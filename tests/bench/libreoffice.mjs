// @ts-check
/** Starts a LibreOffice of its own, with a fresh profile, has it measured, and ends it. */
import { spawn, spawnSync } from "node:child_process";
import { existsSync, mkdtempSync, rmSync } from "node:fs";
import { tmpdir } from "node:os";
import { dirname, join } from "node:path";
import { fileURLToPath, pathToFileURL } from "node:url";

const SCRIPT = join(dirname(fileURLToPath(import.meta.url)), "libreoffice.py");

/** Pythons that may know the module uno: the one of the system first. */
const PYTHONS = ["/usr/bin/python3", "python3"];

/** @returns {string | undefined} why LibreOffice cannot be measured here */
export function whyNoLibreOffice() {
  if (!findOffice()) return "soffice is not on the path";
  if (!findPython()) return "no python with the module uno (python3-uno) was found";
  return undefined;
}

/** @param {number} rows @param {string} formula of row 1 @returns {{ seconds: number[], last: number }} */
export function measureLibreOffice(rows, formula) {
  const profile = mkdtempSync(join(tmpdir(), "stillwall-bench-"));
  const pipe = `stillwall-bench-${process.pid}`;
  const arguments_ = [
    "--headless",
    "--norestore",
    "--nologo",
    `--accept=pipe,name=${pipe};urp`,
    `-env:UserInstallation=${pathToFileURL(profile)}`,
  ];
  const office = spawn(/** @type {string} */ (findOffice()), arguments_, { stdio: "ignore", detached: true });
  try {
    const python = /** @type {string} */ (findPython());
    const run = spawnSync(python, [SCRIPT, pipe, String(rows), formula], { encoding: "utf8", timeout: 300_000 });
    if (run.status !== 0) throw new Error(`LibreOffice could not be measured: ${run.stderr || run.error?.message}`);
    return JSON.parse(run.stdout);
  } finally {
    end(office.pid);
    rmSync(profile, { recursive: true, force: true, maxRetries: 10, retryDelay: 200 });
  }
}

/** Ends the office and what it started; it has usually ended itself by then. @param {number | undefined} pid */
function end(pid) {
  try {
    if (pid !== undefined) process.kill(-pid);
  } catch {
    // It is gone.
  }
}

function findOffice() {
  return (process.env.PATH ?? "")
    .split(":")
    .map((folder) => join(folder, "soffice"))
    .find((file) => existsSync(file));
}

function findPython() {
  return PYTHONS.find((python) => spawnSync(python, ["-c", "import uno"]).status === 0);
}
