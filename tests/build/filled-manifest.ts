import { execFileSync } from "node:child_process";
import { pathToFileURL } from "node:url";
import { join } from "node:path";
import { ROOT } from "./folders";

/**
 * The repository's manifest.xml, filled in for an address as version 0.1.0. In a process of its own: the package that edits
 * manifests brings modules which the test runner cannot load.
 */
export function filledManifest(base: string): string {
  const module = pathToFileURL(join(ROOT, "src", "build", "manifest.mjs")).href;
  const script = `
    import { readFileSync } from "node:fs";
    import { fillManifest } from ${JSON.stringify(module)};
    process.stdout.write(await fillManifest(readFileSync("manifest.xml", "utf8"), ${JSON.stringify(base)}, "0.1.0"));`;
  return execFileSync(process.execPath, ["--input-type=module", "-e", script], { cwd: ROOT, encoding: "utf8" });
}
