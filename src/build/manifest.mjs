// @ts-check
/** Fills in manifest.xml for one address: base address, version of the package, and an id of its own for each address. */
import { createHash } from "node:crypto";
import { mkdtemp, readFile, rm, writeFile } from "node:fs/promises";
import { tmpdir } from "node:os";
import { join } from "node:path";

export const DEFAULT_BASE = "https://localhost:3000";

/**
 * Address of the folder that serves dist/addin, without a slash at its end.
 * @param {string | undefined} text value of STILLWALL_BASE_URL
 */
export function baseAddress(text) {
  const base = (text?.trim() || DEFAULT_BASE).replace(/\/+$/, "");
  if (!URL.canParse(base) || new URL(base).protocol !== "https:")
    throw new Error(`STILLWALL_BASE_URL is "${text}", must be an https address such as ${DEFAULT_BASE}`);
  return base;
}

/**
 * Version of the manifest: four numbers, the first not 0, because installers compare them and refuse versions below 1.0 (common practice).
 * @param {string} version of package.json
 */
export function manifestVersion(version) {
  const match = /^(\d+)\.(\d+)\.(\d+)/.exec(version);
  if (!match) throw new Error(`the version "${version}" of package.json must begin with three numbers`);
  return `1.${match[1]}.${match[2]}.${match[3]}`;
}

/**
 * A name-based identifier (RFC 9562, version 5, name space of addresses): the same address keeps its id for ever, and an
 * add-in tried from the own machine can stand beside the one of the company, because two ids are two add-ins.
 * @param {string} base
 */
export function addinId(base) {
  const space = Buffer.from("6ba7b8119dad11d180b400c04fd430c8", "hex");
  const bytes = createHash("sha1").update(space).update(`${base}/manifest.xml`).digest().subarray(0, 16);
  bytes.writeUInt8((bytes.readUInt8(6) & 0x0f) | 0x50, 6);
  bytes.writeUInt8((bytes.readUInt8(8) & 0x3f) | 0x80, 8);
  return bytes.toString("hex").replace(/^(.{8})(.{4})(.{4})(.{4})(.{12})$/, "$1-$2-$3-$4-$5");
}

/**
 * @param {string} template text of manifest.xml, with __BASE__ and __VERSION__
 * @param {string} base
 * @param {string} version of package.json
 * @returns {Promise<string>}
 */
export async function fillManifest(template, base, version) {
  const { OfficeAddinManifest } = await import("office-addin-manifest");
  const folder = await mkdtemp(join(tmpdir(), "stillwall-manifest-"));
  const file = join(folder, "manifest.xml");
  try {
    await writeFile(file, template.replaceAll("__BASE__", base).replaceAll("__VERSION__", manifestVersion(version)));
    const name = new URL(base).hostname === "localhost" ? "Stillwall (this machine)" : "Stillwall";
    const info = await OfficeAddinManifest.modifyManifestFile(file, addinId(base), name);
    if (info.id !== addinId(base) || info.version !== manifestVersion(version)) throw new Error("manifest.xml was not filled in");
    return await readFile(file, "utf8");
  } finally {
    await rm(folder, { recursive: true, force: true });
  }
}
