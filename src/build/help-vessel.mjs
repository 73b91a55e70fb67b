// @ts-check
/** Tables for the help page on heated vessels: wall materials, and gases with critical constants. */
import { escape } from "./html.mjs";
import { table } from "./help-laboratory.mjs";

/**
 * @typedef {{ wall: string, use: string, note?: string }} Recommended
 * @typedef {{ id: string, material: string, source: string, temperature: string, from?: number, to?: number, fromMemory?: boolean }} Wall
 * @typedef {{ species: string, temperature: number, pressure: number, acentric: number, source: string, fromMemory?: boolean }} Gas
 * @typedef {{ recommended: readonly Recommended[], walls: readonly Wall[], gases: readonly Gas[] }} VesselFigures
 */

/**
 * @param {VesselFigures} figures
 * @param {(key: string) => string} cite citation of a source key
 * @returns {string}
 */
export function vesselTables({ recommended, walls, gases }, cite) {
  const byId = new Map(walls.map((wall) => [wall.id, wall]));
  const named = new Set(recommended.map(({ use }) => use));
  const rows = [
    ...recommended.map(({ wall, use, note }) => wallRow(wall, byId.get(use), note ?? "", cite)),
    ...walls.filter(({ id }) => !named.has(id)).map((wall) => wallRow(wall.material, wall, "", cite)),
  ];
  const sources = [...new Set(gases.map(({ source }) => source))];
  return [
    "<h3>Wall materials</h3>",
    "<p>The first names are recommended ones; a name that several sources share means the first of them, and an id such as <code>carbon-steel-structural@en-1993-1-2</code> means one of them. Ranges in K or °C as printed.</p>",
    table(["material", "range", "note", "source"], rows),
    "<h3>Gases with critical constants</h3>",
    `<p>What the models peng-robinson and soave can take, alone and in mixtures. Sources: ${sources.map((key) => `${escape(key)}, ${escape(cite(key))}`).join("; ")}.</p>`,
    table(
      ["gas", "critical temperature", "critical pressure", "acentric factor", "source"],
      [...gases]
        .sort((a, b) => (a.species < b.species ? -1 : 1))
        .map(({ species, temperature, pressure, acentric, source, fromMemory }) => [
          escape(species),
          `${temperature} K`,
          `${pressure} MPa`,
          String(acentric),
          `${escape(source)}${fromMemory ? ", from memory" : ""}`,
        ]),
    ),
  ].join("\n");
}

/** @param {string} name @param {Wall | undefined} wall @param {string} note @param {(key: string) => string} cite */
function wallRow(name, wall, note, cite) {
  if (wall === undefined) throw new Error(`the recommended wall ${name} has no record`);
  const unit = wall.temperature === "degC" ? "°C" : "K";
  const range = wall.from === undefined || wall.to === undefined ? "constant" : `${wall.from} to ${wall.to} ${unit}`;
  return [escape(name), range, escape(note), `${escape(cite(wall.source))}${wall.fromMemory ? ", from memory" : ""}`];
}
