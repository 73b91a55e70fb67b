/** What prepares a fresh clone: hashes and stamps, one process at a time, a browser where there is one. */
import { execFileSync, spawnSync } from "node:child_process";
import { createHash } from "node:crypto";
import { existsSync, readFileSync, writeFileSync } from "node:fs";
import { delimiter, join } from "node:path";
import ts from "typescript";
import { findBrowser, NO_BROWSER } from "../../src/build/browser.mjs";
import { ensurePackages } from "../../src/build/install.mjs";
import { hashOf, isStamped, writeStamp } from "../../src/build/stamp.mjs";
import { inTurn } from "../../src/build/turn.mjs";
import { folderWith, ROOT } from "./folders";

const quiet = () => undefined;

describe("hash of sources", () => {
  const root = folderWith({ "src/a.ts": "1", "src/deep/b.ts": "2", "src/out/c.ts": "3", "top.json": "{}" });
  const hash = (without: string[] = [], extra = "") => hashOf(root, ["src", "top.json", "missing"], without, extra);

  test("follows content, names and the extra text, and nothing left out", () => {
    const before = hash(["src/out"]);
    expect(hash(["src/out"])).toBe(before);
    expect(hash(["src/out"], "https://elsewhere")).not.toBe(before);
    writeFileSync(join(root, "src/out/c.ts"), "other");
    expect(hash(["src/out"])).toBe(before);
    writeFileSync(join(root, "src/deep/b.ts"), "other");
    expect(hash(["src/out"])).not.toBe(before);
  });

  test("a stamp is good for its own hash only", () => {
    const stamp = join(root, "dist/.built/page");
    expect(isStamped(stamp, "one")).toBe(false);
    writeStamp(stamp, "one");
    expect([isStamped(stamp, "one"), isStamped(stamp, "two")]).toEqual([true, false]);
  });
});

describe("installation", () => {
  const npm = `require("node:fs").writeFileSync("asked", process.argv.slice(2).join(" ")); process.stdout.write("npm speaks"); process.exit(Number(process.env.NPM_STATUS || 0));`;
  const project = () => folderWith({ "package-lock.json": "{}", "npm.cjs": npm, "node_modules/x": "" });
  const run = (root: string, status: string) => {
    const module = JSON.stringify(join(ROOT, "src/build/install.mjs"));
    const script = `import { ensurePackages } from ${module}; try { ensurePackages(${JSON.stringify(root)}, () => {}); } catch (e) { process.stderr.write(e.message); process.exit(7); }`;
    const env = { ...process.env, npm_execpath: join(root, "npm.cjs"), NPM_STATUS: status };
    return spawnSync(process.execPath, ["--input-type=module", "-e", script], { env, encoding: "utf8" });
  };

  test("asks npm for the lock file's packages, speaks on the standard error, and marks what is there", () => {
    const root = project();
    const { status, stdout, stderr } = run(root, "0");
    expect([status, stdout, stderr]).toEqual([0, "", "npm speaks"]);
    expect(readFileSync(join(root, "asked"), "utf8")).toBe("ci --include=dev");
    expect(readFileSync(join(root, "node_modules/.ready"), "utf8")).toBe(createHash("sha256").update("{}").digest("hex"));
    // A second time there is nothing to do: npm is not asked, or it would answer with a failure.
    expect(run(root, "1").status).toBe(0);
    writeFileSync(join(root, "package-lock.json"), "{ }");
    expect(run(root, "1").status).toBe(7);
  });

  test("a failure of npm is told and leaves no mark", () => {
    const root = project();
    const { status, stderr } = run(root, "3");
    expect([status, stderr]).toEqual([7, "npm speaksnpm ci ended with status 3; its words stand above"]);
    expect(existsSync(join(root, "node_modules/.ready"))).toBe(false);
  });

  test("what is ready stays untouched", () => {
    const root = project();
    writeFileSync(join(root, "node_modules/.ready"), createHash("sha256").update("{}").digest("hex") + "\n");
    ensurePackages(root, () => {
      throw new Error("said something");
    });
    expect(existsSync(join(root, "asked"))).toBe(false);
  });
});

describe("one at a time", () => {
  test("two works in one folder do not overlap", async () => {
    const lock = join(folderWith({ x: "" }), "dist/lock");
    const events: string[] = [];
    const work = (name: string) => async () => {
      events.push(`${name} begins`);
      await new Promise((resolve) => setTimeout(resolve, 50));
      events.push(`${name} ends`);
    };
    await Promise.all([inTurn(lock, work("first"), quiet), inTurn(lock, work("second"), quiet)]);
    expect(events).toEqual(["first begins", "first ends", "second begins", "second ends"]);
    expect(existsSync(lock)).toBe(false);
  });

  test("the lock goes when the work fails", async () => {
    const lock = join(folderWith({ x: "" }), "lock");
    await expect(inTurn(lock, () => Promise.reject(new Error("no")), quiet)).rejects.toThrow("no");
    expect(existsSync(lock)).toBe(false);
  });

  test("the lock of a process that died is taken over", async () => {
    const dead = Number(execFileSync(process.execPath, ["-p", "process.pid"], { encoding: "utf8" }));
    const lock = join(folderWith({ "held/lock": String(dead) }), "held/lock");
    expect(await inTurn(lock, () => Promise.resolve("done"), quiet)).toBe("done");
  });
});

describe("browser", () => {
  const folder = folderWith({ "one/chromium": "", "two/google-chrome": "", own: "" });
  const path = [join(folder, "none"), join(folder, "two"), join(folder, "one")].join(delimiter);

  test("$BROWSER comes first, then the path", () => {
    expect(findBrowser({ BROWSER: join(folder, "own"), PATH: path })).toBe(join(folder, "own"));
    expect(findBrowser({ BROWSER: join(folder, "gone"), PATH: path })).toBe(join(folder, "one/chromium"));
    expect(findBrowser({ PATH: join(folder, "two") })).toBe(join(folder, "two/google-chrome"));
  });

  test("programs of Windows are found in their usual places", () => {
    const programs = folderWith({ [join("pf", "Microsoft\\Edge\\Application\\msedge.exe")]: "" });
    expect(findBrowser({ PATH: "", PROGRAMFILES: join(programs, "pf") })).toBe(
      join(programs, "pf", "Microsoft\\Edge\\Application\\msedge.exe"),
    );
  });

  test("none is undefined, and the sentence says what to do", () => {
    if (process.platform === "linux") expect(findBrowser({ PATH: join(folder, "none") })).toBeUndefined();
    expect(NO_BROWSER).toMatch(/BROWSER/);
  });
});

test("an unknown purpose is refused, on the standard error", () => {
  const { status, stdout, stderr } = spawnSync(process.execPath, [join(ROOT, "src/build/ready.mjs"), "dance"], { encoding: "utf8" });
  expect([status, stdout]).toEqual([1, ""]);
  expect(stderr).toMatch(/"dance" is not a purpose; the purposes are packages, build, start/);
});

test("what prepares the clone imports nothing that is not there before the packages are", () => {
  const seen = new Set<string>();
  // Loaded later, when the packages are there.
  const later = ["./handbook.mjs", "./bundle.mjs"];
  const walk = (name: string) => {
    if (seen.has(name)) return;
    seen.add(name);
    const text = readFileSync(join(ROOT, "src/build", name), "utf8");
    const targets = ts.preProcessFile(text).importedFiles.map(({ fileName }) => fileName);
    for (const target of targets) {
      expect([name, target]).toEqual([name, expect.stringMatching(/^(node:|\.\/)/)]);
      if (target.startsWith("./") && !later.includes(target)) walk(target.slice(2));
    }
  };
  walk("ready.mjs");
  walk("serve.mjs");
  expect(seen.size).toBeGreaterThan(4);
});
