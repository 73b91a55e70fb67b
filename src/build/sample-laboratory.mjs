// @ts-check
/**
 * The sample "a fuel laboratory": calibration with benzoic acid, runs of two fuels on a sheet each, results on every basis with the
 * agreement of duplicates, and a certificate with its sources. Everything but the given values is live.
 */
import { END, FIRE } from "./laboratory-runs.mjs";
import { calibrationSheet } from "./sample-calibration.mjs";
import { formula, heading, line, looks, text } from "./sample-cells.mjs";
import { certificateSheet } from "./sample-certificate.mjs";
import { resultsSheet } from "./sample-results.mjs";
import { RUNS, runSheet } from "./sample-runs.mjs";

/** @typedef {import("./sample-writer.mjs").SampleSheet} SampleSheet */

const INVENTED =
  "An invented fuel laboratory: no real place, people, samples or equipment; readings are computed with a little noise. " +
  "Values for a certificate remain the responsibility of those who sign them; local codes and licensed practice govern.";

/** @returns {SampleSheet[]} */
export const laboratoryBook = () => [
  laboratorySheet(),
  calibrationSheet(),
  ...RUNS.map(runSheet),
  resultsSheet(),
  certificateSheet(INVENTED),
];

/** @returns {SampleSheet} */
function laboratorySheet() {
  return {
    name: "Laboratory",
    widths: [36, 23, 12, 78],
    heights: { 1: 24, 2: 52 },
    merged: ["A2:C2"],
    cells: [
      text("A1", "A fuel laboratory", "title"),
      text("A2", INVENTED, "remark"),
      text("A3", "Try it: a formula from the pane"),
      { at: "B3", look: "inputThree" },
      ...heading(4, ["Vessel and calorimeter", "", "", ""]),
      ...line(5, "Vessel volume", 340, "input", "mL"),
      ...line(6, "Water put into the vessel", 1, "input", "g"),
      ...line(7, "Oxygen pressure, absolute", "30 bar", "inputText", "", "a text with its unit; a plain number would be MPa"),
      ...line(8, "Temperature of the reaction", 25, "input", "°C"),
      ...line(9, "Energy limit of the vessel", "33 kJ", "inputText", "", "from the vessel's own certificate"),
      ...line(10, "Pressure limit of the vessel", "4 MPa", "inputText", "", "from the vessel's own certificate"),
      ...heading(12, ["Runs", "", "", ""]),
      ...line(13, "Time of firing", FIRE, "input", "min"),
      ...line(14, "End of the main period", END, "input", "min", "the same in calibration and tests"),
      ...line(15, "Ignition", 42, "input", "J", "kept equal in calibration and tests"),
      ...line(16, "Fuse", "nickel-chromium wire", "inputText", ""),
      ...line(17, "Titrant for all acid", 0.1, "input", "mol/L"),
      ...heading(19, ["Certified substance", "", "", ""]),
      ...line(
        20,
        "Benzoic acid, certified value",
        26434,
        "input",
        "J/g",
        "in vacuum, under the conditions of its certificate (value from memory)",
      ),
      ...line(21, "Density", 1.32, "input", "g/cm3"),
      ...line(
        22,
        "Its energy in the standard state",
        '=INDEX(STILL.FUEL.COMBUSTION("C7H6O2","-3226.9 kJ/mol","enthalpy"),6,2)',
        "one",
        "J/g",
        "not the certified value: 0.08 % apart",
      ),
      ...heading(24, ["Charge of a calibration run, before firing", "", "", ""]),
      formula("A25", 'STILL.CAL.CHARGE(1,B20,B7,B5,B9,B10,"C7H6O2")', "text", "A25:D37"),
      ...looks("A", 26, 37, "text"),
      ...looks("B", 26, 32, "three"),
      ...looks("C", 25, 37, "unit"),
      ...looks("D", 25, 37, "note"),
    ],
  };
}
