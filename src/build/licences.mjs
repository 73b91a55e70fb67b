// @ts-check
/** Writes licences.txt beside a bundle: the licence text of every package whose code went into it. */
import { readFileSync, readdirSync } from "node:fs";
import { join, sep } from "node:path";
import webpack from "webpack";

/**
 * Folder of the package that a file belongs to, undefined for our own files.
 * @param {string} file
 * @returns {string | undefined}
 */
export function packageFolder(file) {
  const parts = file.split(sep);
  const at = parts.lastIndexOf("node_modules");
  if (at < 0) return undefined;
  const depth = parts[at + 1]?.startsWith("@") ? 3 : 2;
  return parts.slice(0, at + depth).join(sep);
}

/**
 * Name, version, licence and licence text of one package. Throws if the package tells its licence nowhere.
 * @param {string} folder
 * @returns {string}
 */
export function licenceOf(folder) {
  const { name, version, license, licenses = [] } = JSON.parse(readFileSync(join(folder, "package.json"), "utf8"));
  const files = readdirSync(folder).filter((file) => /^(licen[cs]e|copying|notice)/i.test(file));
  const texts = files.map((file) => readFileSync(join(folder, file), "utf8").trim());
  const stated = license ?? licenses.map((/** @type {{ type: string }} */ one) => one.type).join(" or ");
  if (!stated && texts.length === 0) throw new Error(`the package ${name} tells its licence nowhere`);
  return [`${name} ${version} (${stated || "licence below"})`, ...texts].join("\n\n");
}

export class CollectLicences {
  /** @param {webpack.Compiler} compiler */
  apply(compiler) {
    compiler.hooks.thisCompilation.tap("CollectLicences", (compilation) => {
      const stage = webpack.Compilation.PROCESS_ASSETS_STAGE_ADDITIONAL;
      compilation.hooks.processAssets.tap({ name: "CollectLicences", stage }, () => {
        const files = [...compilation.modules].flatMap(partsOf).map((module) => module.nameForCondition() ?? "");
        const folders = new Set(files.map(packageFolder).filter((folder) => folder !== undefined));
        const texts = [...folders].sort().map(licenceOf);
        const text = texts.join(`\n\n${"-".repeat(80)}\n\n`);
        compilation.emitAsset("licences.txt", new webpack.sources.RawSource(`Packages in this bundle\n\n${text}\n`));
      });
    });
  }
}

/** webpack joins modules into one; each keeps its file inside. @param {webpack.Module} module @returns {webpack.Module[]} */
function partsOf(module) {
  return "modules" in module ? /** @type {webpack.Module[]} */ (module.modules) : [module];
}
