// @ts-check
/**
 * The sample "a store of gas bottles": bottles filled by pressure or by mass on a hot day and in the heat, one of them in full, and a small
 * autoclave with water. Everything is invented; every column of results is one formula.
 */
import { autoclaveSheet } from "./sample-autoclave.mjs";
import { massSheet } from "./sample-filled-by-mass.mjs";
import { bottleSheet } from "./sample-one-bottle.mjs";
import { filled, given, heading, kelvin, letter, line, remark, text } from "./sample-cells.mjs";

/** @typedef {import("./sample-writer.mjs").SampleSheet} SampleSheet */

const INVENTED =
  "An invented store of gas bottles and a small autoclave: no real place, people or equipment; fillings and allowed pressures are invented. " +
  "Not a design or relief calculation: the vessel's own rating, local codes and licensed practice govern.";

/** Contents by mole fractions, litres, filling pressure at 15 °C and allowed pressure, both bar absolute. @type {readonly (readonly [string, string, number, number, number])[]} */
const BOTTLES = [
  ["Nitrogen", "N2", 50, 200, 300],
  ["Nitrogen, 300 bar", "N2", 50, 300, 450],
  ["Helium", "He", 50, 200, 300],
  ["Argon", "Ar", 50, 200, 300],
  ["Oxygen", "O2", 50, 200, 300],
  ["Hydrogen", "H2", 50, 200, 300],
  ["Methane", "CH4", 50, 200, 300],
  ["Natural gas", "0.92 CH4 + 0.06 C2H6 + 0.02 N2", 80, 200, 280],
  ["Breathing air", "air", 12, 300, 450],
  ["Calibration gas", "0.9795 N2 + 0.02 CO2 + 0.0005 CO", 10, 150, 250],
  ["Air receiver", "air", 500, 11, 13],
];

/** First and last row of the bottles. */
export const BOTTLE_ROWS = { first: 13, last: 12 + BOTTLES.length };

/** Sentences below the table. */
const CAUTIONS = [
  "Filling pressures hold at 15 °C. All pressures are absolute: a gauge shows one atmosphere less.",
  "The allowed pressure is what the bottle's mark or certificate gives; here it is invented. The remarks begin at 0.9 of it.",
  "In a fire the wall weakens long before the gas law's pressure is reached: no number here tells when a bottle fails.",
  "A pressure below the limit is no permission. Relief devices, valves, decomposition and reaction of the contents are not counted.",
  "Peng-Robinson errs by some per cent where the gas is dense. Sheets: bottles filled by mass, one bottle in full, an autoclave.",
];

/** @returns {SampleSheet[]} */
export const bottleStoreBook = () => [storeSheet(), massSheet(), bottleSheet(), autoclaveSheet()];

/** @returns {SampleSheet} */
function storeSheet() {
  return {
    name: "Bottle store",
    widths: [30, 36, 10, 10, 11, 8, 9, 18, 16, 14, 16, 18, 13, 19],
    heights: { 1: 24, 2: 39 },
    merged: ["A2:E2"],
    cells: [
      text("A1", "A store of gas bottles on a hot day", "title"),
      text("A2", INVENTED, "remark"),
      text("A3", "Try it: a formula from the pane"),
      { at: "B3", look: "inputThree" },
      ...heading(4, ["Given", "", "", "", ""]),
      ...line(5, "Temperature of filling", 15, "input", "°C"),
      ...line(6, "Hot day, bottles in the sun", 50, "input", "°C", "try 65"),
      ...line(7, "Heated", 300, "input", "°C", "far above any allowed state: to be seen, not to be reached"),
      text("A8", "Yellow cells are given: change them, and all else follows.", "note"),
      ...bottles(),
      ...CAUTIONS.map((words, i) => text(`A${BOTTLE_ROWS.last + 2 + i}`, words, "note")),
    ],
  };
}

function bottles() {
  const { first, last } = BOTTLE_ROWS;
  const rows = (/** @type {string} */ column) => `${column}${first}:${column}${last}`;
  const fill = `STILL.UNITS(${rows("D")},"bar","Pa")`;
  const reached = (/** @type {string} */ at, /** @type {string} */ model) =>
    `STILL.VESSEL.FINALPRESSURE(${rows("B")},${kelvin("B5")},${fill},${kelvin(at)},"bar","${model}")`;
  const words = [
    "Bottle",
    "Contents",
    "Volume",
    "Filled",
    "Allowed",
    "Gas",
    "Ideal",
    "Peng-Robinson",
    "Above ideal",
    "Of allowed",
    "Remark",
  ];
  const units = ["", "mole fractions", "L", "bar", "bar", "kg", "bar", "bar", "", "", ""];
  return [
    text("G10", "on the hot day", "note"),
    text("L10", "heated", "note"),
    ...heading(first - 2, [...words, "Peng-Robinson", "Of allowed", "Remark"], "headingRight"),
    ...[...units, "bar", "", ""].map((unit, i) => text(`${letter(i)}${first - 1}`, unit, "unitRight")),
    ...BOTTLES.flatMap(([name, contents, volume, filling, allowed], i) => [
      text(`A${first + i}`, name),
      text(`B${first + i}`, contents, "inputText"),
      given(`C${first + i}`, volume),
      given(`D${first + i}`, filling),
      given(`E${first + i}`, allowed),
    ]),
    ...filled(
      "F",
      first,
      last,
      `STILL.VESSEL.AMOUNT(${rows("B")},STILL.UNITS(${rows("C")},"L","m3"),${kelvin("B5")},${fill},"kg","peng-robinson")`,
      "two",
    ),
    ...filled("G", first, last, reached("B6", "ideal"), "one"),
    ...filled("H", first, last, reached("B6", "peng-robinson"), "one"),
    ...filled("I", first, last, `${rows("H")}/${rows("G")}-1`, "percent"),
    ...filled("J", first, last, `${rows("H")}/${rows("E")}`, "percent"),
    ...filled("K", first, last, remark(rows("J")), "textRight"),
    ...filled("L", first, last, reached("B7", "peng-robinson"), "one"),
    ...filled("M", first, last, `${rows("L")}/${rows("E")}`, "percent"),
    ...filled("N", first, last, remark(rows("M")), "textRight"),
  ];
}
