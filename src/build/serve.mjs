// @ts-check
/**
 * Serves dist/page to this machine only: `npm start`. Plain http on 127.0.0.1, port 3000 or the next free one ($PORT to begin
 * elsewhere); the policy sent with every answer lets the page load nothing from anywhere else.
 */
import { createReadStream, existsSync, statSync } from "node:fs";
import { createServer } from "node:http";
import { dirname, extname, join, normalize, resolve, sep } from "node:path";
import { fileURLToPath } from "node:url";

export const ADDRESS = "127.0.0.1";
const FIRST_PORT = 3000;
const PORTS_TRIED = 100;

/**
 * The strictest policy under which the page works: the spreadsheet engine compiles formulas, hence unsafe-eval, and its
 * view library sets style attributes.
 */
export const PAGE_POLICY = [
  "default-src 'none'",
  "script-src 'self' 'unsafe-eval'",
  "style-src 'self'",
  "style-src-attr 'unsafe-inline'",
  "font-src 'self'",
  "img-src 'self' data:",
  "connect-src 'self'",
  "base-uri 'none'",
  "form-action 'none'",
  "frame-ancestors 'none'",
].join("; ");

/** @type {Readonly<Record<string, string>>} */
const TYPES = {
  ".html": "text/html; charset=utf-8",
  ".js": "text/javascript; charset=utf-8",
  ".css": "text/css; charset=utf-8",
  ".json": "application/json; charset=utf-8",
  ".xml": "application/xml; charset=utf-8",
  ".txt": "text/plain; charset=utf-8",
  ".png": "image/png",
  ".svg": "image/svg+xml",
  ".woff2": "font/woff2",
  ".xlsx": "application/vnd.openxmlformats-officedocument.spreadsheetml.sheet",
};

/**
 * The file that an address means, or undefined if there is none inside the folder.
 * @param {string} folder
 * @param {string | undefined} url
 */
export function fileOf(folder, url) {
  const path = new URL(url ?? "/", "http://page").pathname;
  const file = normalize(join(folder, safeDecode(path), path.endsWith("/") ? "index.html" : ""));
  if (!file.startsWith(resolve(folder) + sep) || !existsSync(file) || !statSync(file).isFile()) return undefined;
  return file;
}

/** @param {string} path */
function safeDecode(path) {
  try {
    return decodeURIComponent(path);
  } catch {
    return path;
  }
}

/** @param {string} folder @returns {import("node:http").Server} */
export function pageServer(folder) {
  return createServer((request, response) => {
    const file = request.method === "GET" || request.method === "HEAD" ? fileOf(resolve(folder), request.url) : undefined;
    const headers = { "Content-Security-Policy": PAGE_POLICY, "X-Content-Type-Options": "nosniff", "Cache-Control": "no-cache" };
    if (!file) {
      response.writeHead(404, { ...headers, "Content-Type": TYPES[".txt"] }).end("not here\n");
      return;
    }
    response.writeHead(200, { ...headers, "Content-Type": TYPES[extname(file)] ?? "application/octet-stream" });
    if (request.method === "HEAD") response.end();
    else createReadStream(file).pipe(response);
  });
}

/**
 * Listens on the first free port and answers which it was.
 * @param {import("node:http").Server} server
 * @param {number} first
 * @returns {Promise<number>}
 */
export async function listen(server, first) {
  for (let port = first; port < first + PORTS_TRIED; port++) {
    if (await listens(server, port)) return port;
  }
  throw new Error(`no free port between ${first} and ${first + PORTS_TRIED - 1}`);
}

/** @param {import("node:http").Server} server @param {number} port @returns {Promise<boolean>} */
function listens(server, port) {
  return new Promise((done, fail) => {
    const failed = (/** @type {NodeJS.ErrnoException} */ error) => {
      if (error.code === "EADDRINUSE" || error.code === "EACCES") done(false);
      else fail(error);
    };
    server.once("error", failed);
    server.listen(port, ADDRESS, () => {
      server.off("error", failed);
      done(true);
    });
  });
}

async function main() {
  const folder = join(dirname(fileURLToPath(import.meta.url)), "..", "..", "dist", "page");
  const port = await listen(pageServer(folder), Number(process.env.PORT) || FIRST_PORT);
  process.stdout.write(`Stillwall is at http://${ADDRESS}:${port}/ (end with Ctrl+C)\n`);
}

if (process.argv[1] && resolve(process.argv[1]) === fileURLToPath(import.meta.url)) {
  main().catch((error) => {
    process.stderr.write(`stillwall: ${error instanceof Error ? error.message : String(error)}\n`);
    process.exitCode = 1;
  });
}
