// @ts-check
/** The sheet "Calibration": runs with benzoic acid, their readings, the series judged, the condition factor. */
import { readingsOf, TIMES } from "./laboratory-runs.mjs";
import { formula, given, heading, letter, looks, text } from "./sample-cells.mjs";

/** @typedef {import("./sample-writer.mjs").SampleSheet} SampleSheet */

/** Calibration runs: mass in air, wire consumed, nitric acid, and by how much the run scatters. @type {readonly (readonly [number, number, number, number])[]} */
const CALIBRATION = [
  [1.0012, 8.2, 1.9, 0.0004],
  [0.9987, 7.6, 2.1, -0.0007],
  [1.0241, 8.8, 2.0, 0.0002],
  [0.9768, 8.1, 1.8, 0.0009],
  [1.0105, 7.9, 2.2, -0.0005],
  [0.9934, 8.4, 2.0, -0.0003],
];

/** What the formulas of the workbook deduct and add, so that the readings fit them. */
const CERTIFIED = 26434 * (1 + 1e-6 * (20 * (30 / 1.01325 - 30) + 42 * (1 / 0.34 - 3) + 30 * (1 / 0.34 - 3)));
const IN_VACUUM = (1 - 0.0012 / 8) / (1 - 0.0012 / 1.32);

/** @returns {SampleSheet} */
export function calibrationSheet() {
  const first = 6;
  const last = first + CALIBRATION.length - 1;
  const rows = (/** @type {string} */ column) => `${column}${first}:${column}${last}`;
  const top = last + 6; // first row of the readings' numbers
  const bottom = top + TIMES.length - 1;
  const runs = CALIBRATION.map(([mass, wire, nitric, scatter], i) =>
    readingsOf({
      heat: (mass * IN_VACUUM * CERTIFIED + 42 + 9.6 * wire + 6 * nitric) * (1 + scatter),
      start: 22.75 + 0.03 * ((i * 5) % 7),
      seed: 11 + i,
    }),
  );
  const spill = (/** @type {string} */ column, /** @type {string} */ body, /** @type {string} */ look) => [
    formula(`${column}${first}`, body, look, rows(column)),
    ...looks(column, first + 1, last, look),
  ];
  return {
    name: "Calibration",
    widths: [34, 12, 12, 12, 15, 13, 11, 11, 11, 12, 15, 3, 34, 24, 10, 60],
    heights: { 1: 24 },
    frozenRows: 5,
    cells: [
      text("A1", "Energy equivalent from benzoic acid", "title"),
      text(
        "A2",
        "Six runs over three days. Each column of results is one formula; the readings stand below, a column for each run.",
        "note",
      ),
      ...heading(
        4,
        ["Run", "Mass, air", "Wire used", "Nitric acid", "Mass, vacuum", "Factor", "Ignition", "Wire", "Nitric", "Rise", "Equivalent"],
        "headingRight",
      ),
      ...["", "g", "cm", "mL", "g", "", "J", "J", "J", "K", "J/K"].map((unit, i) => text(`${letter(i)}5`, unit, "unitRight")),
      ...CALIBRATION.flatMap(([mass, wire, nitric], i) => [
        text(`A${first + i}`, `Calibration ${i + 1}`),
        given(`B${first + i}`, mass),
        given(`C${first + i}`, wire),
        given(`D${first + i}`, nitric),
        formula(`G${first + i}`, "Laboratory!$B$15", "one"),
      ]),
      ...spill("E", `STILL.CAL.BUOYANCY(${rows("B")},Laboratory!B21)`, "five"),
      ...spill("F", `STILL.CAL.CERTIFICATE(Laboratory!B7,Laboratory!B5,${rows("E")},Laboratory!B6,Laboratory!B8)`, "seven"),
      ...spill("H", `STILL.CAL.HEATOF(Laboratory!B16,${rows("C")})`, "one"),
      ...spill("I", `STILL.CAL.NITRIC(${rows("D")},Laboratory!B17)`, "one"),
      ...spill("J", `TRANSPOSE(STILL.CAL.RISE(A${top}:A${bottom},B${top}:G${bottom},Laboratory!B13,Laboratory!B14))`, "four"),
      ...spill("K", `STILL.CAL.EQUIVALENT(${rows("E")},Laboratory!B20,${rows("J")},G${first}:I${last},${rows("F")})`, "bold"),
      text(`A${last + 2}`, "Mean energy equivalent"),
      formula(`B${last + 2}`, `AVERAGE(${rows("K")})`, "bold"),
      text(`C${last + 2}`, "J/K", "unit"),
      text(`A${last + 3}`, "Standard uncertainty of the mean"),
      formula(`B${last + 3}`, `STDEV(${rows("K")})/SQRT(COUNT(${rows("K")}))`, "one"),
      text(`C${last + 3}`, "J/K", "unit"),
      text(`D${last + 3}`, "scatter of the runs; the certificate's 3 J/g come on top", "note"),
      ...heading(top - 1, ["Time, min", ...CALIBRATION.map((_, i) => `Run ${i + 1}, °C`)], "headingRight"),
      ...TIMES.flatMap((time, row) => [
        given(`A${top + row}`, time, "inputOne"),
        ...runs.map((readings, i) => given(`${letter(i + 1)}${top + row}`, readings[row] ?? 0, "inputFour")),
      ]),
      text("M4", "The series judged", "heading"),
      ...["N4", "O4", "P4"].map((at) => text(at, "", "heading")),
      formula("M5", `STILL.CAL.SERIES(${rows("K")},,${rows("J")})`, "text", "M5:P29"),
      ...looks("M", 6, 29, "text"),
      ...looks("N", 5, 5, "whole"),
      ...looks("N", 6, 13, "three"),
      ...looks("N", 14, 14, "whole"),
      ...looks("N", 15, 29, "three"),
      ...looks("O", 5, 29, "unit"),
      ...looks("P", 5, 29, "note"),
      text("M31", "The condition factor of run 1", "heading"),
      ...["N31", "O31", "P31"].map((at) => text(at, "", "heading")),
      formula("M32", `STILL.CAL.CERTIFICATE.REPORT(Laboratory!B7,Laboratory!B5,E${first},Laboratory!B6,Laboratory!B8)`, "text", "M32:P42"),
      ...looks("M", 33, 42, "text"),
      ...looks("N", 32, 32, "seven"),
      ...looks("N", 33, 42, "three"),
      ...looks("O", 32, 42, "unit"),
      ...looks("P", 32, 42, "note"),
    ],
  };
}

/** Row of the mean energy equivalent; its standard uncertainty stands below. */
export const MEAN_ROW = 7 + CALIBRATION.length;
