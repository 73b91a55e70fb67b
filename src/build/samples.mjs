// @ts-check
/**
 * Writes the sample workbooks: `node src/build/samples.mjs` makes assets/samples without calculated values; the command's `recalc` fills
 * them in. Contents are invented and say so.
 */
import { mkdirSync, writeFileSync } from "node:fs";
import { dirname, join, resolve } from "node:path";
import { fileURLToPath } from "node:url";
import { bottleStoreBook } from "./sample-bottle-store.mjs";
import { heatBook } from "./sample-heat.mjs";
import { laboratoryBook } from "./sample-laboratory.mjs";
import { vesselTestsBook } from "./sample-vessel-tests.mjs";
import { bookBytes } from "./sample-writer.mjs";

/** File name and contents of every sample. */
export const SAMPLES = [
  { file: "sealed-vessel.xlsx", sheets: heatBook },
  { file: "fuel-laboratory.xlsx", sheets: laboratoryBook },
  { file: "closed-vessel-tests.xlsx", sheets: vesselTestsBook },
  { file: "bottle-store.xlsx", sheets: bottleStoreBook },
];

/** @param {string} folder */
export function writeSamples(folder) {
  mkdirSync(folder, { recursive: true });
  for (const { file, sheets } of SAMPLES) writeFileSync(join(folder, file), bookBytes(sheets()));
}

if (process.argv[1] && resolve(process.argv[1]) === fileURLToPath(import.meta.url)) {
  writeSamples(join(dirname(fileURLToPath(import.meta.url)), "..", "..", "assets", "samples"));
}
