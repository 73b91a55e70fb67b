import { request } from "node:http";
import type { AddressInfo } from "node:net";
import { join } from "node:path";
import { ADDRESS, fileOf, listen, pageServer } from "../../src/build/serve.mjs";
import { folderWith } from "./folders";

const folder = folderWith({
  "site/index.html": "<p>page",
  "site/lib/x.js": "1",
  "site/lib/ä b.txt": "t",
  "secret.txt": "no",
  "site2/a.txt": "no",
});
const site = join(folder, "site");

test.each([
  ["/", "index.html"],
  ["/index.html?x=1", "index.html"],
  ["/lib/x.js", "lib/x.js"],
  ["/lib/%C3%A4%20b.txt", "lib/ä b.txt"],
])("%s is a file", (url, file) => {
  expect(fileOf(site, url)).toBe(join(site, file));
});

test.each([
  "/missing",
  "/lib",
  "/lib/",
  "/../secret.txt",
  "/%2e%2e/secret.txt",
  "/..%2fsecret.txt",
  "/%2e%2e%2fsite2/a.txt",
  "/%",
  "/a%00b",
])("%s is not served", (url) => {
  expect(fileOf(site, url)).toBeUndefined();
});

describe("the server", () => {
  const server = pageServer(site);
  const second = pageServer(site);
  let port = 0;
  beforeAll(async () => {
    port = await listen(server, 39100);
  });
  afterAll(() => {
    server.close();
    second.close();
  });

  function ask(path: string, method = "GET") {
    return new Promise<{ status: number | undefined; headers: Record<string, unknown>; body: string }>((done, fail) => {
      const sent = request({ host: ADDRESS, port, path, method }, (answer) => {
        let body = "";
        answer.on("data", (piece) => (body += piece));
        answer.on("end", () => done({ status: answer.statusCode, headers: answer.headers, body }));
      });
      sent.on("error", fail);
      sent.end();
    });
  }

  test("answers to this machine only, with the policy on everything", async () => {
    expect((server.address() as AddressInfo).address).toBe("127.0.0.1");
    for (const path of ["/", "/lib/x.js", "/missing"]) {
      const { headers } = await ask(path);
      expect(headers["content-security-policy"]).toBe(
        "default-src 'none'; script-src 'self' 'unsafe-eval'; style-src 'self'; style-src-attr 'unsafe-inline'; font-src 'self'; " +
          "img-src 'self' data:; connect-src 'self'; base-uri 'none'; form-action 'none'; frame-ancestors 'none'",
      );
    }
  });

  test("sends files with their type, and nothing else", async () => {
    expect(await ask("/")).toMatchObject({ status: 200, body: "<p>page", headers: { "content-type": "text/html; charset=utf-8" } });
    expect(await ask("/lib/x.js")).toMatchObject({ status: 200, body: "1", headers: { "content-type": "text/javascript; charset=utf-8" } });
    expect(await ask("/", "HEAD")).toMatchObject({ status: 200, body: "" });
    expect(await ask("/missing")).toMatchObject({ status: 404 });
    expect(await ask("/", "POST")).toMatchObject({ status: 404 });
  });

  test("takes the next port when one is taken", async () => {
    expect(await listen(second, port)).toBe(port + 1);
  });
});
