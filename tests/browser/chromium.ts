/** A browser for the browser tests: one page at a time, with everything it complained about and asked for. */
import { chromium, type Browser, type Page } from "playwright-core";
import { findBrowser, NO_BROWSER } from "../../src/build/browser.mjs";

const ARGUMENTS = [
  "--headless",
  "--no-sandbox",
  "--disable-gpu",
  "--disable-background-networking",
  "--disable-component-update",
  "--disable-sync",
  "--no-first-run",
];

export async function launch(): Promise<Browser> {
  const executablePath = findBrowser();
  if (!executablePath) throw new Error(NO_BROWSER);
  return chromium.launch({ executablePath, args: ARGUMENTS });
}

/** What went wrong on a page; both lists stay empty on a good one. */
export interface Record {
  /** Errors of scripts, console errors, and violations of the content security policy (which the console reports). */
  readonly complaints: string[];
  /** Addresses outside this machine that the page asked for. */
  readonly strangers: string[];
}

export function record(page: Page): Record {
  const found: Record = { complaints: [], strangers: [] };
  page.on("pageerror", (error) => found.complaints.push(String(error)));
  page.on("console", (message) => {
    if (message.type() === "error" || message.type() === "warning") found.complaints.push(message.text());
  });
  page.on("request", (request) => {
    const { protocol, hostname } = new URL(request.url());
    if (!["data:", "blob:"].includes(protocol) && hostname !== "127.0.0.1") found.strangers.push(request.url());
  });
  return found;
}
