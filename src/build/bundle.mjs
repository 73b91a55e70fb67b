// @ts-check
/**
 * Runs webpack for the named configurations and is silent about success: `node src/build/bundle.mjs addin page command`.
 * Errors and warnings come in the thrown Error or on the standard error.
 */
import { createRequire } from "node:module";
import { dirname, join, resolve } from "node:path";
import { fileURLToPath } from "node:url";
import webpack from "webpack";

/**
 * @param {string} root folder of the project
 * @param {readonly string[]} names of configurations in webpack.config.js
 */
export async function bundle(root, names) {
  /** @type {webpack.Configuration[]} */
  const all = await createRequire(import.meta.url)(join(root, "webpack.config.js"))();
  for (const name of names) {
    const configuration = all.find((candidate) => candidate.name === name);
    if (!configuration) throw new Error(`webpack.config.js has no configuration "${name}"`);
    await run(configuration);
  }
}

/** @param {webpack.Configuration} configuration @returns {Promise<void>} */
function run(configuration) {
  return new Promise((done, fail) => {
    const compiler = webpack(configuration);
    compiler.run((error, stats) => {
      compiler.close(() => {
        const problems = error ? error.message : problemsOf(stats);
        if (error || stats?.hasErrors()) fail(new Error(`dist/${configuration.name} could not be built: ${problems}`));
        else {
          if (problems) process.stderr.write(problems + "\n");
          done();
        }
      });
    });
  });
}

/** @param {webpack.Stats | undefined} stats */
function problemsOf(stats) {
  return stats?.hasErrors() || stats?.hasWarnings() ? stats.toString({ preset: "errors-warnings", colors: false }) : "";
}

if (process.argv[1] && resolve(process.argv[1]) === fileURLToPath(import.meta.url)) {
  const root = join(dirname(fileURLToPath(import.meta.url)), "..", "..");
  try {
    await bundle(root, process.argv.slice(2));
  } catch (error) {
    process.stderr.write(`${error instanceof Error ? error.message : String(error)}\n`);
    process.exitCode = 1;
  }
}
