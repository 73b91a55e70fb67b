// @ts-check
/**
 * What the metadata tool cannot write into functions.json is added here: that error cells reach the functions
 * (they pass them on unchanged), where the help of each function stands, and descriptions as the handbook words them.
 */
import webpack from "webpack";
import { storedName } from "./names.mjs";

/** @typedef {import("../handbook/index").HandbookEntry} HandbookEntry */
/** @typedef {{ name: string, description?: string, type?: string, dimensionality?: string, optional?: boolean }} ParameterMetadata */
/** @typedef {{ id: string, name: string, description?: string, helpUrl?: string, parameters: ParameterMetadata[] }} FunctionMetadata */
/** @typedef {{ allowErrorForDataTypeAny?: boolean, allowCustomDataForDataTypeAny?: boolean, functions: FunctionMetadata[] }} Metadata */

/**
 * @param {Metadata} metadata as the tool writes it
 * @param {readonly HandbookEntry[]} handbook
 * @param {string} base address of the folder that holds help.html, without a slash at its end
 * @returns {Metadata}
 */
export function patchMetadata(metadata, handbook, base) {
  checkSame(metadata, handbook);
  const entries = new Map(handbook.map((entry) => [entry.id, entry]));
  return {
    allowErrorForDataTypeAny: true,
    allowCustomDataForDataTypeAny: true,
    functions: metadata.functions.map((item) => patchFunction(item, /** @type {HandbookEntry} */ (entries.get(item.id)), base)),
  };
}

/** @param {FunctionMetadata} item @param {HandbookEntry} entry @param {string} base @returns {FunctionMetadata} */
function patchFunction(item, entry, base) {
  return {
    ...item,
    description: entry.description,
    helpUrl: `${base}/help.html#${entry.id}`,
    parameters: item.parameters.map((parameter, at) => ({ ...parameter, description: argumentHelp(entry.parameters[at]) })),
  };
}

/** @param {HandbookEntry["parameters"][number] | undefined} parameter */
function argumentHelp(parameter) {
  if (!parameter) return "";
  return parameter.unit === "-" ? parameter.description : `${parameter.description} [${parameter.unit}]`;
}

/** The two readers of one doc comment must see the same functions with the same arguments. @param {Metadata} metadata @param {readonly HandbookEntry[]} handbook */
function checkSame(metadata, handbook) {
  const stored = metadata.functions.map((item) => storedName(item.id));
  const twice = stored.find((name, at) => stored.indexOf(name) !== at);
  if (twice) throw new Error(`functions.json holds ${twice} twice`);
  const seen = JSON.stringify(metadata.functions.map((item) => [item.id, item.parameters.map((p) => [p.name, p.optional === true])]));
  const wanted = JSON.stringify(handbook.map((entry) => [entry.id, entry.parameters.map((p) => [p.name, p.optional])]));
  if (seen !== wanted) throw new Error(`the metadata tool and the handbook read different functions: ${seen} and ${wanted}`);
}

/** Patches the asset functions.json of a webpack build. */
export class PatchFunctionsJson {
  /** @param {readonly HandbookEntry[]} handbook @param {string} base */
  constructor(handbook, base) {
    this.handbook = handbook;
    this.base = base;
  }

  /** @param {webpack.Compiler} compiler */
  apply(compiler) {
    compiler.hooks.compilation.tap("PatchFunctionsJson", (compilation) => {
      const stage = webpack.Compilation.PROCESS_ASSETS_STAGE_ADDITIONS;
      compilation.hooks.processAssets.tap({ name: "PatchFunctionsJson", stage }, (assets) => {
        const asset = assets["functions.json"];
        if (!asset) throw new Error("the metadata tool wrote no functions.json");
        // The tool adds the file to the small compilations of the HTML pages too, where it would meet the patched one.
        if (compilation.compiler.isChild()) return compilation.deleteAsset("functions.json");
        const patched = patchMetadata(JSON.parse(asset.source().toString()), this.handbook, this.base);
        compilation.updateAsset("functions.json", new webpack.sources.RawSource(JSON.stringify(patched, null, 1)));
      });
    });
  }
}
