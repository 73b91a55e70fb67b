/**
 * The bundle that Excel loads, run as it is built: it associates every function, in the right order behind its stand-in for the host, and
 * gives what the sources give, although it leaves out parts of the figures that only help and tests read.
 */
import { readFileSync } from "node:fs";
import { join } from "node:path";
import { createContext, runInContext } from "node:vm";
import "../../src/functions";
import { registry } from "../../src/functions/registry";
import { promised } from "../../src/handbook/promised";
import { rowsOf } from "../shape/example-result";

type WorksheetFunction = (...blocks: unknown[]) => unknown[][];

/** The functions of dist/addin/functions.js by id, loaded where there is no page and, as in a host that is late, no CustomFunctions. */
function bundled(): Map<string, WorksheetFunction> {
  const functions = new Map<string, WorksheetFunction>();
  const associate = (id: string, implementation: WorksheetFunction) => functions.set(id, implementation);
  const page = { getElementById: () => null, addEventListener: () => undefined };
  const scope = createContext({ CustomFunctions: { associate }, document: page, performance, setTimeout, clearTimeout, console });
  runInContext(readFileSync(join(__dirname, "..", "..", "dist", "addin", "functions.js"), "utf8"), scope);
  return functions;
}

const addin = bundled();

test("associates every function of the handbook and no other", () =>
  expect([...addin.keys()].sort()).toEqual(promised.map(({ id }) => id).sort()));

/** One argument of an example as the block a host hands over. */
function blockOf(written: string): unknown {
  if (written.trim() === "") return undefined;
  return rowsOf(written).map((row) =>
    row.map((cell) => (cell.startsWith('"') ? cell.slice(1, -1).replaceAll('""', '"') : cell === "" ? null : Number(cell))),
  );
}

/** The one call of an example, without the INDEX around it; undefined for formulas that hold several. */
function callOf(formula: string): { id: string; blocks: unknown[] } | undefined {
  const bare = formula.replace(/^INDEX\((.*),\d+,\d+\)$/, "$1");
  const match = /^STILL\.([A-Z0-9.]+)\((.*)\)$/.exec(bare);
  if (!match || match[2]!.includes("STILL.")) return undefined;
  const pieces = match[2]!.match(/(?:"(?:[^"]|"")*"|\{[^}]*\}|[^,"{}])+|(?<=^|,)(?=,|$)/g) ?? [];
  return { id: match[1]!, blocks: pieces.map(blockOf) };
}

const calls = promised.flatMap(({ examples }) => examples.flatMap(({ formula }) => callOf(formula) ?? []));
/** Calls whose notes read most of the figures: sources, walls, critical constants, hazards, reduction to the standard state. */
const more: typeof calls = [
  ...["N2", "CH4", "n-C8H18", "H2O(l)"].flatMap((species) =>
    ["SOURCE", "SOURCE.SETS"].map((id) => ({ id, blocks: [[[species]]] as unknown[] })),
  ),
  ...["peng-robinson", "soave"].map((model) => ({
    id: "VESSEL.REACH",
    blocks: ["0.5 CO2 + 0.4 N2 + 0.1 C2H2", "50 L", "15 °C", "20 bar", "50 °C", "60 kg carbon steel + 2 kg copper", model, "30 bar"].map(
      (text) => [[text]],
    ) as unknown[],
  })),
];

test("gives what the sources give for the examples of the help, to the last bit", () => {
  expect(calls.length).toBeGreaterThan(0.9 * promised.flatMap(({ examples }) => examples).length);
  for (const { id, blocks } of [...calls, ...more]) {
    const [built, own] = [addin.get(id)!(...blocks), registry.get(id)!(...(blocks as never[]))];
    expect([id, JSON.stringify(built)]).toEqual([id, JSON.stringify(own)]);
  }
});
