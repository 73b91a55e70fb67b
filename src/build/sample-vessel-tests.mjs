// @ts-check
/**
 * The sample "tests in a closed vessel": peak pressures of fuels in air beside the equilibrium at constant volume, what temperature and
 * pressure before change, a dust and an oxygen vessel by their gross values, one mixture in full. Readings are invented; all else is live.
 */
import { heading, line, text } from "./sample-cells.mjs";
import { dustSheet } from "./sample-dust.mjs";
import { mixtureSheet } from "./sample-one-mixture.mjs";
import { oxygenSheet } from "./sample-oxygen-vessel.mjs";
import { startSheet } from "./sample-start-conditions.mjs";
import { seriesSheet } from "./sample-test-series.mjs";

/** @typedef {import("./sample-writer.mjs").SampleSheet} SampleSheet */

const INVENTED =
  "An invented laboratory with a 20 L sphere: no real place, people, samples or equipment; the measured pressures are invented. " +
  "Nothing here is a rating, a design or a relief calculation: the vessel's own rating, local codes and licensed practice govern.";

/** Sentences in cells of three columns, with the lines they take. @type {readonly (readonly [string, number])[]} */
const CAUTIONS = [
  [
    "Calculated: a deflagration in one closed vessel without loss of heat. Energy and volume are held, the products are at chemical equilibrium, gases are ideal.",
    3,
  ],
  [
    "Outside: whether a mixture ignites, flame speed and the rate of pressure rise, heat lost to the wall, turbulence, pressure piling in divided or connected vessels, transition to detonation, vent sizing.",
    3,
  ],
  [
    "An equilibrium pressure is no rating and no bound. Real peaks lie below it, in small vessels and near the limits of flammability far below; pressure piling and detonation lead above it.",
    3,
  ],
  [
    "A pressure without dissociation is an estimate, not a bound either. Ratings, local codes and licensed practice govern, not this workbook.",
    2,
  ],
];

/** @type {readonly (readonly [string, string])[]} */
const SHEETS = [
  ["Test series", "three fuels in air from lean to rich: measured, calculated, charts"],
  ["Start conditions", "one fuel, other temperatures and pressures before"],
  ["Dust", "a coal dust by its gross value, g/m3 to ratio and pressure"],
  ["Oxygen vessel", "benzoic acid in oxygen: the adiabatic bound of a charge"],
  ["One mixture", "figures to check against, a reaction, a composition in full"],
];

/** @returns {SampleSheet[]} */
export const vesselTestsBook = () => [frontSheet(), seriesSheet(), startSheet(), dustSheet(), oxygenSheet(), mixtureSheet()];

/** @returns {SampleSheet} */
function frontSheet() {
  const cautions = 13;
  const sheets = cautions + CAUTIONS.length + 2;
  const use = sheets + SHEETS.length + 2;
  const sentence = (/** @type {number} */ row, /** @type {string} */ words) => text(`A${row}`, words, "remark");
  return {
    name: "Closed vessel",
    widths: [32, 18, 14, 74],
    heights: {
      1: 24,
      2: 52,
      ...Object.fromEntries(CAUTIONS.map(([, lines], i) => [cautions + 1 + i, 13 * lines])),
      [use + 1]: 26,
      [use + 2]: 39,
    },
    merged: [
      "A2:C2",
      ...CAUTIONS.map((_, i) => `A${cautions + 1 + i}:C${cautions + 1 + i}`),
      `A${use + 1}:C${use + 1}`,
      `A${use + 2}:C${use + 2}`,
    ],
    cells: [
      text("A1", "Tests in a closed vessel", "title"),
      text("A2", INVENTED, "remark"),
      text("A3", "Try it: a formula from the pane"),
      { at: "B3", look: "inputThree" },
      ...heading(4, ["Set-up of the test series", "", "", ""]),
      ...line(5, "Temperature before", "25 °C", "inputText", "", "a text with its unit; a plain number would be kelvin"),
      ...line(6, "Pressure before, absolute", 1.013, "inputThree", "bar"),
      ...line(7, "The same in pascal", '=STILL.UNITS(B6,"bar","Pa")', "whole", "Pa"),
      ...line(
        8,
        "Atmosphere at the gauge",
        "1013 mbar",
        "inputText",
        "",
        "of a gauge that reads the rise from the start: the pressure before",
      ),
      ...line(9, "Relative humidity of the air", "45 %", "inputText", "", "0 % for dry air"),
      ...line(10, "Air as it is, mole fractions", "=STILL.MIX.HUMIDAIR(B5,B7,B9)", "text", ""),
      ...line(11, "Oxygen in it", '=VLOOKUP("O2",STILL.MIX.TABLE(B10),2,FALSE)', "five", "mol/mol"),
      ...heading(cautions, ["Read before a number is used", "", "", ""]),
      ...CAUTIONS.map(([words], i) => sentence(cautions + 1 + i, words)),
      ...heading(sheets, ["Sheets", "", "", ""]),
      ...SHEETS.flatMap(([name, words], i) => [text(`A${sheets + 1 + i}`, name), text(`B${sheets + 1 + i}`, words)]),
      ...heading(use, ["How to use it", "", "", ""]),
      sentence(use + 1, "Yellow cells are given: change them, and all else follows, charts too. Each column of results is one formula."),
      sentence(
        use + 2,
        "A test without a reading is left blank: its cells show #N/A, and the charts leave it out. Plain numbers of STILL functions are kelvin and pascal; other units are written as text.",
      ),
    ],
  };
}
