/**
 * Three bundles, each for itself:
 *   addin    dist/addin    what Excel loads from a static https host; nothing of the spreadsheet engine
 *   page     dist/page     the local page; engine and view library lie beside it as they came, replaceable
 *   command  dist/command  the `stillwall` command, for Node
 * STILLWALL_BASE_URL is the address from which dist/addin will be served.
 */
const { readdirSync, readFileSync } = require("node:fs");
const { join } = require("node:path");
const CopyWebpackPlugin = require("copy-webpack-plugin");
const CustomFunctionsMetadataPlugin = require("custom-functions-metadata-plugin");
const HtmlWebpackPlugin = require("html-webpack-plugin");

const source = (...path) => join(__dirname, "src", ...path);
const package_ = (...path) => join(__dirname, "node_modules", ...path);
const output = (name) => ({ path: join(__dirname, "dist", name), filename: "[name].js", clean: true });

const ICON_SIZES = [16, 20, 24, 32, 40, 48, 64, 80];

const shared = {
  mode: "production",
  devtool: false,
  resolve: { extensions: [".ts", ".js"] },
  performance: { hints: false },
  module: {
    rules: [
      {
        test: /\.ts$/,
        loader: "ts-loader",
        options: { transpileOnly: true, onlyCompileBundledFiles: true, compilerOptions: { noEmit: false } },
      },
    ],
  },
};

/**
 * What help page and tests read of these files, and no function or pane does: examples and lines of the handbook (PromisedEntry); of figures
 * the expression as it was printed, remarks of those who carried them over, and what publishers allow.
 */
const unread = {
  handbook: ["examples", "lines"],
  walls: ["about", "printed", "flags", "note", "meanValue", "statedErrorPercent"],
  critical: ["about", "note"],
  sources: ["licence", "url"],
  uncertainties: ["about", "printed"],
  "self-reactive": ["about"],
  precision: ["about"],
};
const withoutUnread = Object.entries(unread).map(([name, keys]) => ({
  test: new RegExp(`[\\\\/](?:handbook|data)[\\\\/]${name}\\.json$`),
  type: "json",
  parser: { parse: (text) => JSON.parse(text, (key, value) => (keys.includes(key) ? undefined : value)) },
}));

/** For what is read from this machine's own disk: loading it takes less time than minimising, and a stack trace stays readable. */
const readable = { minimize: false };

/** Deferred scripts of the head run in order after the page is read; the query keeps a browser from mixing two versions. */
const page = (template, filename) =>
  new HtmlWebpackPlugin({ template, filename, inject: "head", scriptLoading: "defer", hash: true, minify: false });

async function addin() {
  const { familyFiles } = await import("./src/build/sources.mjs");
  const { readHandbook } = await import("./src/build/handbook.mjs");
  const { PatchFunctionsJson } = await import("./src/build/functions-json.mjs");
  const { baseAddress, fillManifest } = await import("./src/build/manifest.mjs");
  const { helpPage } = await import("./src/build/help.mjs");
  const { CollectLicences } = await import("./src/build/licences.mjs");
  const base = baseAddress(process.env.STILLWALL_BASE_URL);
  const handbook = readHandbook(source("functions"));
  const figures = (...path) => JSON.parse(readFileSync(source("data", ...path), "utf8"));
  const cited = figures("sources.json");
  const sets = readdirSync(source("data", "sets")).map((file) => figures("sets", file));
  const laboratory = {
    editions: figures("net-values.json").editions,
    precision: figures("precision.json").limits,
    series: figures("series-limits.json").relativeDeviation,
    kinds: figures("burning-heats.json"),
  };
  const { records: walls, recommended } = figures("walls.json");
  const vessels = { walls, recommended, gases: figures("critical.json").constants };
  const help = (shell) => helpPage(shell.toString(), handbook, cited, sets, laboratory, vessels);
  const { version } = JSON.parse(readFileSync(join(__dirname, "package.json"), "utf8"));
  return {
    ...shared,
    module: { rules: [...shared.module.rules, ...withoutUnread] },
    name: "addin",
    target: ["web", "es2021"],
    // One module: two on one page would hold two copies of every module and its state, or keep apart what they share.
    entry: { functions: source("pane", "addin.ts") },
    output: { ...output("addin"), chunkFilename: "[name].js" },
    plugins: [
      new CustomFunctionsMetadataPlugin({ input: familyFiles(source("functions")), output: "functions.json" }),
      new PatchFunctionsJson(handbook, base),
      new CollectLicences(),
      page(source("pane", "taskpane.html"), "taskpane.html"),
      new CopyWebpackPlugin({
        patterns: [
          { from: "manifest.xml", transform: (text) => fillManifest(text.toString(), base, version) },
          { from: "assets/help.html", info: { minimized: true }, transform: help },
          { from: "assets/help.css", to: "assets/" },
          ...ICON_SIZES.map((size) => ({ from: `assets/icons/icon-${size}.png`, to: "assets/" })),
          { from: "*.css", context: source("pane") },
          { from: "LICENSE", to: "LICENSE.txt", toType: "file" },
        ],
      }),
    ],
    devServer: {
      port: 3000,
      hot: false,
      liveReload: false,
      client: false,
      server: "https",
      headers: { "Access-Control-Allow-Origin": "*" },
    },
  };
}

async function tryout() {
  const { CollectLicences } = await import("./src/build/licences.mjs");
  const libraries = require("./src/tryout/libraries.json");
  const copied = libraries.flatMap((library) => library.files);
  return {
    ...shared,
    name: "page",
    target: ["web", "es2021"],
    entry: { page: source("tryout", "index.ts") },
    output: { ...output("page"), chunkFilename: "[name].js" },
    externals: { "@odoo/o-spreadsheet": "o_spreadsheet", "@odoo/owl": "owl" },
    optimization: readable,
    plugins: [
      new CollectLicences(),
      page(source("tryout", "index.html"), "index.html"),
      new CopyWebpackPlugin({
        patterns: [
          // Unchanged, as their licences ask: `minimized` keeps the minimiser away.
          ...copied.map(({ from, to }) => ({ from: package_(from), to, toType: "file", info: { minimized: true } })),
          { from: "*.css", context: source("tryout") },
          { from: "*.css", context: source("pane") },
          { from: "assets/samples", to: "samples", noErrorOnMissing: true },
          { from: "assets/icons/icon-32.png", to: "assets/" },
          { from: "LICENSE", to: "LICENSE.txt", toType: "file" },
        ],
      }),
    ],
  };
}

function command() {
  return {
    ...shared,
    name: "command",
    target: "node20",
    entry: { stillwall: source("command", "index.ts") },
    output: { ...output("command"), libraryTarget: "commonjs2" },
    externals: { "@odoo/o-spreadsheet": "commonjs @odoo/o-spreadsheet" },
    optimization: readable,
  };
}

module.exports = async () => [await addin(), await tryout(), command()];
