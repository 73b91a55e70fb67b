// @ts-check
/** Lets one process at a time prepare the checkout: two commands started together must not build into one folder. Node built-ins only. */
import { closeSync, mkdirSync, openSync, readFileSync, rmSync, writeSync } from "node:fs";
import { dirname } from "node:path";

/** Pause between two looks at the lock, ms. */
const PAUSE = 100;

/**
 * @template T
 * @param {string} lock file that exists while a process works
 * @param {() => Promise<T>} work
 * @param {(line: string) => void} say
 * @returns {Promise<T>}
 */
export async function inTurn(lock, work, say) {
  mkdirSync(dirname(lock), { recursive: true });
  for (let waits = 0; !take(lock); waits++) {
    if (waits === 10) say("waiting for another process that prepares this checkout");
    await new Promise((resolve) => setTimeout(resolve, PAUSE));
  }
  try {
    return await work();
  } finally {
    rmSync(lock, { force: true });
  }
}

/** True if the lock is ours now. A lock whose process has died is removed, to be taken at the next look. @param {string} lock */
function take(lock) {
  try {
    const handle = openSync(lock, "wx");
    writeSync(handle, String(process.pid));
    closeSync(handle);
    return true;
  } catch (error) {
    if (/** @type {NodeJS.ErrnoException} */ (error).code !== "EEXIST") throw error;
    if (isAbandoned(lock)) rmSync(lock, { force: true });
    return false;
  }
}

/** @param {string} lock */
function isAbandoned(lock) {
  const owner = Number(readOr(lock));
  if (!owner) return false;
  try {
    process.kill(owner, 0);
    return false;
  } catch (error) {
    return /** @type {NodeJS.ErrnoException} */ (error).code === "ESRCH";
  }
}

/** @param {string} file */
function readOr(file) {
  try {
    return readFileSync(file, "utf8");
  } catch {
    return "";
  }
}
