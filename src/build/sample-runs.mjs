// @ts-check
/** The sheets of the runs: weighing, heats, readings, result, and the run judged. */
import { readingsOf, TIMES } from "./laboratory-runs.mjs";
import { MEAN_ROW } from "./sample-calibration.mjs";
import { formula, given, heading, line, looks, text } from "./sample-cells.mjs";

/** @typedef {import("./sample-writer.mjs").SampleSheet} SampleSheet */

/** Runs of the samples. Heat released is made from the value each was invented with. */
const SAMPLES = {
  coal: { name: "Coal A", density: 1.35, formulaOf: "", sulfur: 0.82, value: 27180 },
  wood: { name: "Wood pellets B", density: 1.15, formulaOf: "", sulfur: 0.03, value: 18890 },
};

/** @typedef {{ sheet: string, sample: keyof typeof SAMPLES, mass: number, wire: number, acid: number, off: number, seed: number, start: number }} Run */
/** @type {readonly Run[]} */
export const RUNS = [
  { sheet: "Coal A 1", sample: "coal", mass: 0.9824, wire: 8.0, acid: 6.9, off: 12, seed: 21, start: 22.82 },
  { sheet: "Coal A 2", sample: "coal", mass: 0.9951, wire: 7.7, acid: 7.1, off: -31, seed: 22, start: 22.79 },
  { sheet: "Wood B 1", sample: "wood", mass: 1.0482, wire: 8.3, acid: 1.6, off: 66, seed: 23, start: 23.31 },
  { sheet: "Wood B 2", sample: "wood", mass: 1.0337, wire: 8.1, acid: 1.5, off: -64, seed: 24, start: 23.35 },
  { sheet: "Wood B 3", sample: "wood", mass: 1.0419, wire: 7.9, acid: 1.6, off: -10, seed: 25, start: 23.33 },
];

/** @param {Run} run */
function heatOf({ sample, mass, wire, acid, off }) {
  const { density, sulfur, value } = SAMPLES[sample];
  const vacuum = (mass * (1 - 0.0012 / 8)) / (1 - 0.0012 / density);
  const sulfuricAcid = ((sulfur / 100) * vacuum) / 32.06;
  const acids = 60000 * (acid * 1e-4 - 2 * sulfuricAcid) + 301700 * sulfuricAcid;
  return vacuum * (value + off) + 42 + 9.6 * wire + acids;
}

/** @param {Run} run @returns {SampleSheet} */
export function runSheet(run) {
  const { name, density, sulfur } = SAMPLES[run.sample];
  const readings = readingsOf({ heat: heatOf(run), start: run.start, seed: run.seed });
  const bottom = 4 + TIMES.length;
  const acids = (/** @type {number} */ row) => `=INDEX(STILL.CAL.ACIDS(B14,Laboratory!B17,B15,B7,"separated"),${row},2)`;
  return {
    name: run.sheet,
    widths: [42, 13, 9, 3, 12, 12, 3, 44, 15, 9, 78],
    heights: { 1: 24 },
    cells: [
      text("A1", `${name}, run ${run.sheet.slice(-1)}`, "title"),
      text("A2", "Readings on the right; every number without a tinted cell is calculated.", "note"),
      ...heading(4, ["Weighing", "", ""]),
      ...line(5, "Mass of the sample, in air", run.mass, "input", "g"),
      ...line(6, "Density", density, "input", "g/cm3"),
      ...line(7, "Mass in vacuum", "=STILL.CAL.BUOYANCY(B5,B6)", "five", "g"),
      ...heading(9, ["Heats beside the sample's", "", ""]),
      ...line(10, "Ignition", "=Laboratory!B15", "one", "J"),
      ...line(11, "Wire consumed", run.wire, "input", "cm"),
      ...line(12, "Wire", "=STILL.CAL.HEATOF(Laboratory!B16,B11)", "one", "J"),
      ...line(14, "All acid, titrated", run.acid, "input", "mL"),
      ...line(15, "Sulfur, as analysed", sulfur, "input", "%"),
      ...line(16, "Nitric acid, separated", acids(1), "one", "J"),
      ...line(17, "Sulfuric acid, separated", acids(2), "one", "J"),
      ...heading(19, ["Result", "", ""]),
      ...line(20, "Corrected rise", `=STILL.CAL.RISE(E5:E${bottom},F5:F${bottom},Laboratory!B13,Laboratory!B14)`, "four", "K"),
      ...line(21, "Energy equivalent", `=Calibration!B${MEAN_ROW}`, "one", "J/K"),
      ...line(22, "Gross value, constant volume, as analysed", "=STILL.CAL.GROSS(B21,B20,B7,SUM(B10,B12,B16),B17)", "bold", "J/g"),
      ...line(
        23,
        "The same rise by Dickinson 0.60",
        `=STILL.CAL.RISE(E5:E${bottom},F5:F${bottom},Laboratory!B13,Laboratory!B14,"dickinson")`,
        "four",
        "K",
      ),
      text("E3", "Readings", "note"),
      text("E4", "Time, min", "headingRight"),
      text("F4", "°C", "headingRight"),
      ...TIMES.flatMap((time, i) => [given(`E${5 + i}`, time, "inputOne"), given(`F${5 + i}`, readings[i] ?? 0, "inputFour")]),
      text("H4", "The run judged", "heading"),
      ...["I4", "J4", "K4"].map((at) => text(at, "", "heading")),
      formula("H5", `STILL.CAL.RISE.REPORT(E5:E${bottom},F5:F${bottom},Laboratory!B13,Laboratory!B14)`, "text", `H5:K${REPORT_END}`),
      ...looks("H", 6, REPORT_END, "text"),
      ...looks("I", 6, REPORT_END - 12, "six"),
      ...looks("I", REPORT_END - 11, REPORT_END - 10, "two"),
      ...looks("I", REPORT_END - 9, REPORT_END - 7, "whole"),
      ...looks("I", REPORT_END - 6, REPORT_END, "six"),
      ...looks("J", 5, REPORT_END, "unit"),
      ...looks("K", 5, REPORT_END, "note"),
      { at: "I5", look: "six" },
    ],
  };
}

/** Last row of the spilled report of a run without warnings. */
const REPORT_END = 41;
