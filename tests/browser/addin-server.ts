import { spawnSync } from "node:child_process";
import { existsSync, readFileSync } from "node:fs";
import { createServer, type Server } from "node:http";
import type { AddressInfo } from "node:net";
import { extname, join, normalize } from "node:path";

const ROOT = join(__dirname, "..", "..");
const ADDIN = join(ROOT, "dist", "addin");
const TYPES: Record<string, string> = {
  ".html": "text/html; charset=utf-8",
  ".js": "text/javascript; charset=utf-8",
  ".json": "application/json",
  ".css": "text/css; charset=utf-8",
  ".png": "image/png",
};

/** The strictest policy under which the pane must work: no eval, no inline script, no inline style. */
const POLICY =
  "default-src 'none'; script-src 'self' https://appsforoffice.microsoft.com; style-src 'self'; img-src 'self' data:; connect-src 'self'";

/** Builds dist/addin if it is not there (`npm test` has built it already). */
export function ensureAddin(): void {
  if (existsSync(join(ADDIN, "taskpane.html"))) return;
  const built = spawnSync(process.execPath, [join("src", "build", "bundle.mjs"), "addin"], { cwd: ROOT, encoding: "utf8" });
  if (built.status !== 0) throw new Error(`dist/addin could not be built: ${built.stderr}`);
}

/** Serves dist/addin on a free port of this machine under the strict policy. */
export async function serveAddin(): Promise<{ address: string; server: Server }> {
  const server = createServer((request, response) => {
    const path = normalize(join(ADDIN, new URL(request.url ?? "/", "http://localhost").pathname));
    if (!path.startsWith(ADDIN) || !existsSync(path)) return void response.writeHead(404).end();
    response.writeHead(200, { "content-type": TYPES[extname(path)] ?? "text/plain", "content-security-policy": POLICY });
    response.end(readFileSync(path));
  });
  await new Promise<void>((listening) => server.listen(0, "127.0.0.1", listening));
  return { address: `http://127.0.0.1:${(server.address() as AddressInfo).port}`, server };
}
