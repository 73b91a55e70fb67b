// @ts-check
/** Tables of the laboratory's figures for the help page: net-value constants by edition, precision limits, heats of fuses and aids. */
import { escape } from "./html.mjs";

/**
 * @typedef {{ hydrogen: number, oxygen?: number, nitrogen?: number, moisture?: number }} Constants
 * @typedef {{ id: string, title: string, source: string, constantPressure: Constants, constantVolume?: Constants, grossPressure?: Constants }} Edition
 * @typedef {{ id: string, title: string, what: string, unit: string, repeatability: number, reproducibility?: number, source: string }} Limit
 * @typedef {{ kind: string, perCentimetre?: number, perGram?: number, note?: string, source: string }} Kind
 * @typedef {{ id: string, title: string, source: string, runs: number, percent: number }} SeriesLimit
 * @typedef {{ editions: readonly Edition[], precision: readonly Limit[], series: readonly SeriesLimit[], kinds: readonly Kind[] }} Figures
 */

/**
 * @param {Figures} figures
 * @param {(key: string) => string} cite citation of a source key
 * @returns {string}
 */
export function laboratoryTables({ editions, precision, series, kinds }, cite) {
  return [
    "<h3>Constants of net values, by edition</h3>",
    "<p>In J/g for each per cent of hydrogen, oxygen, nitrogen and moisture; the argument <i>constants</i> of FUEL.NET and FUEL.GROSSPRESSURE takes the id. Left out, they are derived from the vaporisation of water: 212.17, 0.77, 0.88 and 24.43; methods print 0.8 for nitrogen as for oxygen. FUEL.LIQUIDNET takes astm-d240 (212.2 for hydrogen). Inventory handbooks print the oxygen term of net values as 0.0008 or as 0.008 MJ/kg; the derived one is 0.0008, the larger is ten times too large.</p>",
    table(
      ["edition", "net, constant pressure", "net, constant volume", "gross, constant pressure", "source"],
      editions.map(({ id, constantPressure, constantVolume, grossPressure, source }) => [
        code(id),
        constants(constantPressure),
        constants(constantVolume),
        constants(grossPressure),
        escape(cite(source)),
      ]),
    ),
    "<h3>Precision limits</h3>",
    "<p>FUEL.AGREE takes the id, or your own limit. Printed figures in circulation differ: check your edition.</p>",
    table(
      ["id", "what", "repeatability", "reproducibility", "source"],
      precision.map(({ id, what, unit, repeatability, reproducibility, source }) => [
        code(id),
        escape(what),
        `${repeatability} ${escape(unit)}`,
        reproducibility === undefined ? "" : `${reproducibility} ${escape(unit)}`,
        escape(cite(source)),
      ]),
    ),
    "<h3>Limits of a calibration series</h3>",
    table(
      ["by", "runs", "relative standard deviation", "source"],
      series.map(({ title, runs, percent, source }) => [escape(title), String(runs), `${percent} %`, escape(cite(source))]),
    ),
    "<h3>Heats of fuses and combustion aids</h3>",
    "<p>CAL.HEATOF takes the kind; determine your own lots and give their heat as the third argument.</p>",
    table(
      ["kind", "J/cm", "J/g", "note", "source"],
      kinds.map(({ kind, perCentimetre, perGram, note, source }) => [
        code(kind),
        perCentimetre === undefined ? "" : String(perCentimetre),
        perGram === undefined ? "" : String(perGram),
        escape(note ?? ""),
        escape(cite(source)),
      ]),
    ),
  ].join("\n");
}

/** @param {readonly string[]} headings @param {readonly (readonly string[])[]} rows */
export function table(headings, rows) {
  const head = headings.map((text) => `<th scope="col">${text}</th>`).join("");
  const body = rows.map(
    ([first = "", ...others]) => `<tr><th scope="row">${first}</th>${others.map((cell) => `<td>${cell}</td>`).join("")}</tr>`,
  );
  return `<div class="wide"><table><thead><tr>${head}</tr></thead>\n<tbody>${body.join("\n")}</tbody></table></div>`;
}

/** @param {Constants | undefined} constants */
function constants(constants) {
  if (!constants) return "not held";
  const { hydrogen, oxygen, nitrogen, moisture } = constants;
  return [
    ["H", hydrogen],
    ["O", oxygen],
    ["N", nitrogen],
    ["M", moisture],
  ]
    .filter(([, value]) => value !== undefined)
    .map(([symbol, value]) => `${symbol} ${value}`)
    .join(", ");
}

/** @param {string} text */
function code(text) {
  return `<code>${escape(text)}</code>`;
}
