// @ts-check
/**
 * `npm run bench`: measures what the design promises and prints each ratio beside its goal. It ends with status 0 whatever the
 * numbers are: a busy machine is no fault of the program. Parts can be named: `npm run bench -- capacity worksheet rise equilibrium water realgas bundle recalculation`.
 */
import { mkdirSync, mkdtempSync, rmSync } from "node:fs";
import { createRequire } from "node:module";
import { cpus, loadavg } from "node:os";
import { dirname, join } from "node:path";
import { fileURLToPath } from "node:url";
import webpack from "webpack";
import { bundleGoals } from "./bundle-size.mjs";
import { measureLibreOffice, whyNoLibreOffice } from "./libreoffice.mjs";

const ROOT = join(dirname(fileURLToPath(import.meta.url)), "..", "..");
const CACHE = join(ROOT, "node_modules", ".cache");
const require_ = createRequire(import.meta.url);

/** The measuring program as the products are built: one bundle, production mode. @returns {Promise<typeof import("./index")>} */
async function compile() {
  mkdirSync(CACHE, { recursive: true });
  // A folder of its own, so that two runs at once do not take each other's program away.
  const folder = mkdtempSync(join(CACHE, "bench-"));
  process.once("exit", () => rmSync(folder, { recursive: true, force: true }));
  const compiler = webpack({
    mode: "production",
    target: "node20",
    devtool: false,
    entry: join(ROOT, "tests", "bench", "index.ts"),
    output: { path: folder, filename: "bench.js", libraryTarget: "commonjs2" },
    resolve: { extensions: [".ts", ".js"] },
    externals: { "@odoo/o-spreadsheet": "commonjs @odoo/o-spreadsheet" },
    optimization: { minimize: false },
    module: { rules: [{ test: /\.ts$/, loader: "ts-loader", options: { transpileOnly: true, compilerOptions: { noEmit: false } } }] },
  });
  await new Promise((done, fail) => {
    compiler.run((error, stats) => {
      if (error || stats?.hasErrors()) fail(error ?? new Error(stats?.toString({ preset: "errors-only" })));
      else compiler.close(() => done(undefined));
    });
  });
  return require_(join(folder, "bench.js"));
}

/** @param {string[]} wanted parts; none: all */
async function run(wanted) {
  const { parts, COUNT, formulaByHand, goalLine, isMet, sunk } = await compile();
  /** @type {Record<string, () => import("./goals").Goal[] | Promise<import("./goals").Goal[]>>} */
  const all = {
    capacity: () => parts.capacity(require_("mathjs")),
    worksheet: () => parts.worksheet(),
    rise: () => parts.rise(),
    equilibrium: () => parts.equilibrium(),
    water: () => parts.water(),
    realgas: () => parts.realgas(),
    bundle: () => bundleGoals(ROOT),
    recalculation: () => {
      const why = whyNoLibreOffice();
      if (why !== undefined) console.log(`  LibreOffice is not measured: ${why}`);
      return parts.recalculation(why === undefined ? measureLibreOffice(COUNT, formulaByHand()) : undefined);
    },
  };
  const unknown = wanted.filter((name) => !(name in all));
  if (unknown.length > 0) throw new Error(`"${unknown.join(", ")}" is not a part; the parts are ${Object.keys(all).join(", ")}`);
  console.log(`Node ${process.version}, ${cpus().length} × ${cpus()[0]?.model}`);
  // One part of the load is this program itself.
  const others = /** @type {number} */ (loadavg()[0]) - 1;
  if (others > cpus().length / 2)
    console.log(`The machine is busy (load ${others.toFixed(1)} beside this): ratios hold roughly, times do not`);
  const goals = [];
  for (const name of wanted.length > 0 ? wanted : Object.keys(all)) {
    const found = await /** @type {() => any} */ (all[name])();
    for (const goal of found) console.log(goalLine(goal));
    goals.push(...found);
  }
  const withGoal = goals.filter((goal) => goal.atMost !== undefined || goal.atLeast !== undefined);
  console.log(`${withGoal.filter(isMet).length} of ${withGoal.length} goals met (check sum ${sunk().toExponential(3)})`);
}

await run(process.argv.slice(2));
