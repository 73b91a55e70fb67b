// @ts-check
/** Finds a browser of the Chromium family for the browser tests. Node built-ins only. */
import { spawnSync } from "node:child_process";
import { existsSync, readFileSync } from "node:fs";
import { delimiter, join } from "node:path";

const COMMANDS = ["chromium", "chromium-browser", "google-chrome", "google-chrome-stable", "microsoft-edge", "msedge"];

const MAC = [
  "/Applications/Google Chrome.app/Contents/MacOS/Google Chrome",
  "/Applications/Chromium.app/Contents/MacOS/Chromium",
  "/Applications/Microsoft Edge.app/Contents/MacOS/Microsoft Edge",
];

const WINDOWS = [
  "Google\\Chrome\\Application\\chrome.exe",
  "Microsoft\\Edge\\Application\\msedge.exe",
  "Chromium\\Application\\chrome.exe",
];

/** What the tests say where there is none. */
export const NO_BROWSER =
  "no browser found for the browser tests: install Chromium, Chrome or Edge, or put the path of one into the variable BROWSER";

/**
 * Path of a browser, or undefined. $BROWSER comes first; it must be the path of a program that exists.
 * @param {NodeJS.ProcessEnv} environment
 * @returns {string | undefined}
 */
export function findBrowser(environment = process.env) {
  return candidates(environment).find((path) => existsSync(path));
}

/** @param {NodeJS.ProcessEnv} environment */
function candidates(environment) {
  const folders = (environment.PATH ?? "").split(delimiter).filter(Boolean);
  const onPath = COMMANDS.flatMap((command) => folders.map((folder) => join(folder, command)));
  const programs = [environment.PROGRAMFILES, environment["PROGRAMFILES(X86)"], environment.LOCALAPPDATA].filter(
    (base) => base !== undefined,
  );
  const onWindows = programs.flatMap((base) => WINDOWS.map((path) => join(base, path)));
  return [...(environment.BROWSER ? [environment.BROWSER] : []), ...onPath, ...MAC, ...onWindows];
}

/**
 * Looks for a browser, and installs Debian's own where that is the plain thing to do: on Debian, as root. Never an error:
 * without a browser the browser tests fail and say so, and the others run.
 * @param {(line: string) => void} say
 */
export function ensureBrowser(say) {
  if (findBrowser()) return;
  if (isDebianRoot()) {
    say("installing chromium for the browser tests");
    aptInstall(["chromium"]);
  }
  if (!findBrowser()) say(NO_BROWSER);
}

/** True on Debian with the rights to install. */
export function isDebianRoot() {
  return process.getuid?.() === 0 && existsSync("/etc/os-release") && /^ID=debian$/m.test(readFileSync("/etc/os-release", "utf8"));
}

/** @param {string[]} packages */
export function aptInstall(packages) {
  const options = {
    stdio: /** @type {["ignore", 2, 2]} */ (["ignore", 2, 2]),
    env: { ...process.env, DEBIAN_FRONTEND: "noninteractive" },
  };
  spawnSync("apt-get", ["update", "-qq"], options);
  return spawnSync("apt-get", ["install", "-y", "-qq", "--no-install-recommends", ...packages], options).status === 0;
}
