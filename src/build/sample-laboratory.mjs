// @ts-check
/**
 * The sample "a fuel laboratory": calibration with benzoic acid, runs of two fuels on a sheet each, results on every basis with the
 * agreement of duplicates, and a certificate with its sources. Everything but the given values is live.
 */
import { readFileSync } from "node:fs";
import { END, FIRE, readingsOf, TIMES } from "./laboratory-runs.mjs";

/** @typedef {import("./sample-writer.mjs").SampleSheet} SampleSheet */
/** @typedef {import("./sample-writer.mjs").SampleCell} SampleCell */

const INVENTED =
  "An invented fuel laboratory: no real place, people, samples or equipment; readings are computed with a little noise. " +
  "Values for a certificate remain the responsibility of those who sign them; local codes and licensed practice govern.";

/** @returns {SampleSheet[]} */
export const laboratoryBook = () => [laboratorySheet(), calibrationSheet(), ...RUNS.map(runSheet), resultsSheet(), certificateSheet()];

/** @param {string} at @param {string} text @param {string} [look] @returns {SampleCell} */
const text = (at, text, look = "label") => (text === "" ? { at, look } : { at, text, look });
/** @param {string} at @param {number} number @param {string} [look] @returns {SampleCell} */
const given = (at, number, look = "input") => ({ at, number, look });
/** @param {string} at @param {string} formula @param {string} look @param {string} [fills] @returns {SampleCell} */
const formula = (at, formula, look, fills) => ({ at, formula, look, ...(fills ? { fills } : {}) });
/** Cells of a heading row. @param {number} row @param {readonly string[]} words @param {string} [look] @returns {SampleCell[]} */
const heading = (row, words, look = "heading") => words.map((word, i) => text(`${letter(i)}${row}`, word, i === 0 ? "heading" : look));
/** @param {number} index */
const letter = (index) => "ABCDEFGHIJKLMNOPQRSTUVWXYZ"[index] ?? "";
/** Looks of the cells that a spilled block fills. @param {string} columns @param {number} from @param {number} to @param {string} look */
const looks = (columns, from, to, look) =>
  [...columns].flatMap((column) => Array.from({ length: to - from + 1 }, (_, i) => ({ at: `${column}${from + i}`, look })));

/** A line: label, value or formula, unit, note. @param {number} row @param {string} label @param {string | number} value @param {string} look @param {string} unit @param {string} [note] @returns {SampleCell[]} */
function line(row, label, value, look, unit, note = "") {
  const at = `B${row}`;
  const middle =
    typeof value === "number" ? given(at, value, look) : value.startsWith("=") ? formula(at, value.slice(1), look) : text(at, value, look);
  return [text(`A${row}`, label), middle, text(`C${row}`, unit, "unit"), ...(note ? [text(`D${row}`, note, "note")] : [])];
}

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
      formula("A25", 'STILL.CAL.CHARGE(1,B20,B7,B5,B9,B10,"C7H6O2")', "text", "A25:D36"),
      ...looks("A", 26, 36, "text"),
      ...looks("B", 26, 32, "three"),
      ...looks("C", 25, 36, "unit"),
      ...looks("D", 25, 36, "note"),
    ],
  };
}

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
function calibrationSheet() {
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

/** Runs of the samples. Heat released is made from the value each was invented with. */
const SAMPLES = {
  coal: { name: "Coal A", density: 1.35, formulaOf: "", sulfur: 0.82, value: 27180 },
  wood: { name: "Wood pellets B", density: 1.15, formulaOf: "", sulfur: 0.03, value: 18890 },
};

/** @typedef {{ sheet: string, sample: keyof typeof SAMPLES, mass: number, wire: number, acid: number, off: number, seed: number, start: number }} Run */
/** @type {readonly Run[]} */
const RUNS = [
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
function runSheet(run) {
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
      ...line(21, "Energy equivalent", `=Calibration!B${7 + CALIBRATION.length}`, "one", "J/K"),
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

/** Analysis of the samples, per cent: moisture as analysed and as received, ash dry; hydrogen, oxygen, nitrogen, as analysed. */
const ANALYSIS = [
  {
    name: "Coal A",
    edition: "iso-1928-2009",
    precision: "iso-1928",
    runs: ["Coal A 1", "Coal A 2"],
    percent: [2.4, 8.6, 9.8, 4.72, 10.3, 1.31],
  },
  {
    name: "Wood pellets B",
    edition: "iso-18125-2017",
    precision: "iso-18125",
    runs: ["Wood B 1", "Wood B 2", "Wood B 3"],
    percent: [5.9, 7.8, 0.4, 6.35, 44.6, 0.12],
  },
];

/** @returns {SampleSheet} */
function resultsSheet() {
  const two = (/** @type {string} */ column, /** @type {number} */ row) => `${column}${row}:${column}${row + 1}`;
  const spill = (/** @type {string} */ column, /** @type {number} */ row, /** @type {string} */ body, /** @type {string} */ look) => [
    formula(`${column}${row}`, body, look, two(column, row)),
    { at: `${column}${row + 1}`, look },
  ];
  const names = (/** @type {number} */ row) => ANALYSIS.map(({ name }, i) => text(`A${row + i}`, name));
  const units = (/** @type {number} */ row, /** @type {readonly string[]} */ list) =>
    list.map((unit, i) => text(`${letter(i)}${row}`, unit, "unitRight"));
  const net = (/** @type {string} */ condition) =>
    `STILL.FUEL.NET(${two("B", 27)},${two("B", 11)},${two("C", 11)},${two("D", 11)},${two("C", 6)},"${condition}",${two("H", 6)})`;
  return {
    name: "Results",
    widths: [32, 18, 18, 18, 20, 20, 22, 21, 14, 60],
    heights: { 1: 24 },
    cells: [
      text("A1", "Results on every basis", "title"),
      text("A2", "ad as analysed, d dry, ar as received, daf dry ash-free. One formula fills the cells of both samples.", "note"),
      ...heading(4, ["Analysis", "Moisture", "Moisture", "Ash", "Hydrogen", "Oxygen", "Nitrogen", "Constants"], "headingRight"),
      ...units(5, ["", "%, ad", "%, ar", "%, d", "%, ad", "%, ad", "%, ad", "edition"]),
      ...names(6),
      ...ANALYSIS.flatMap(({ percent, edition }, i) => [
        ...percent.map((value, k) => given(`${letter(k + 1)}${6 + i}`, value)),
        text(`H${6 + i}`, edition, "inputText"),
      ]),
      ...heading(9, ["Freed of the moisture's own", "Hydrogen", "Oxygen", "Nitrogen"], "headingRight"),
      ...units(10, ["", "%, d", "%, d", "%, d"]),
      ...names(11),
      ...spill("B", 11, `STILL.FUEL.DRY(${two("E", 6)},${two("B", 6)},"H")`, "two"),
      ...spill("C", 11, `STILL.FUEL.DRY(${two("F", 6)},${two("B", 6)},"O")`, "two"),
      ...spill("D", 11, `STILL.FUEL.DRY(${two("G", 6)},${two("B", 6)},"N")`, "two"),
      ...heading(14, ["Gross, constant volume, dry", "Run 1", "Run 2", "Run 3", "Precision by"], "headingRight"),
      ...units(15, ["", "J/g", "J/g", "J/g", "method"]),
      ...names(16),
      ...ANALYSIS.flatMap(({ runs, precision }, i) => [
        ...runs.map((sheet, k) => formula(`${letter(k + 1)}${16 + i}`, `STILL.FUEL.BASIS('${sheet}'!$B$22,"ad","d",$B${6 + i})`, "whole")),
        text(`E${16 + i}`, precision, "inputText"),
      ]),
      ...heading(19, ["Duplicates judged", "", "", "", "", "", "", "", "", ""]),
      formula("B20", `STILL.FUEL.AGREE(B16:D17,${two("E", 16)})`, "textRight", "B20:J22"),
      ...names(21),
      ...looks("CDEFH", 20, 20, "textRight"),
      ...looks("BCDEFH", 21, 22, "whole"),
      ...looks("GIJ", 20, 22, "text"),
      ...heading(
        25,
        ["Reported values", "Gross, volume", "Gross, volume", "Gross, volume", "Gross, pressure", "Net, pressure", "Net, volume"],
        "headingRight",
      ),
      ...units(26, ["J/g", "d", "ar", "daf", "d", "ar", "ar"]),
      ...names(27),
      ...spill("B", 27, two("H", 21), "bold"),
      ...spill("C", 27, `STILL.FUEL.BASIS(${two("B", 27)},"d","ar",,${two("C", 6)})`, "one"),
      ...spill("D", 27, `STILL.FUEL.BASIS(${two("B", 27)},"d","daf",,,${two("D", 6)})`, "one"),
      ...spill("E", 27, `STILL.FUEL.GROSSPRESSURE(${two("B", 27)},${two("B", 11)},${two("C", 11)},${two("D", 11)},${two("H", 6)})`, "one"),
      ...spill("F", 27, net("constant-pressure"), "bold"),
      ...spill("G", 27, net("constant-volume"), "one"),
      text("A30", "volume: at constant volume; pressure: at constant pressure, 25 °C", "note"),
    ],
  };
}

/** Sources that the certificate names, by their keys in the library. */
const CITED = ["calorimetry", "coops-1956", "iso-1928-acids", "iso-1928-2009", "iso-18125-2017", "iso-5725-6", "ciaaw-2021"];

/** @returns {readonly string[]} */
function citations() {
  /** @type {{ sources: readonly { key: string, citation: string }[] }} */
  const { sources } = JSON.parse(readFileSync(new URL("../data/sources.json", import.meta.url), "utf8"));
  return CITED.map((key) => {
    const found = sources.find((source) => source.key === key);
    if (!found) throw new Error(`no source "${key}"`);
    return found.citation;
  });
}

/** @returns {SampleSheet} */
function certificateSheet() {
  const mean = 7 + CALIBRATION.length; // row of the mean energy equivalent; its uncertainty stands below
  const rows = (
    /** @type {number} */ row,
    /** @type {string} */ label,
    /** @type {readonly string[]} */ formulas,
    /** @type {string} */ look,
    /** @type {string} */ unit,
    note = "",
  ) => [
    text(`A${row}`, label),
    ...formulas.map((body, i) => formula(`${letter(i + 1)}${row}`, body, look)),
    text(`D${row}`, unit, "unit"),
    ...(note ? [text(`E${row}`, note, "note")] : []),
  ];
  const each = (/** @type {(row: number) => string} */ body) => [body(27), body(28)];
  const runs = ["Coal A 1", "Wood B 1"];
  return {
    name: "Certificate",
    widths: [46, 18, 18, 12, 70],
    heights: { 1: 24, 2: 52 },
    merged: ["A2:C2"],
    cells: [
      text("A1", "Certificate of heating values", "title"),
      text("A2", INVENTED, "remark"),
      ...heading(4, ["Sample", ...ANALYSIS.map(({ name }) => name), "", ""], "headingRight"),
      ...rows(
        5,
        "Gross value, constant volume, dry",
        each((row) => `ROUND(Results!B${row},-1)`),
        "whole",
        "J/g",
        "rounded to 10 J/g",
      ),
      ...rows(
        6,
        "Gross value, constant volume, as received",
        each((row) => `ROUND(Results!C${row},-1)`),
        "whole",
        "J/g",
      ),
      ...rows(
        7,
        "Gross value, constant volume, dry ash-free",
        each((row) => `ROUND(Results!D${row},-1)`),
        "whole",
        "J/g",
      ),
      ...rows(
        8,
        "Net value, constant pressure, as received",
        each((row) => `ROUND(Results!F${row},-1)`),
        "whole",
        "J/g",
      ),
      ...rows(
        9,
        "Net value, constant pressure, as received",
        each((row) => `STILL.UNITS(Results!F${row},"J/g","kcal_IT/kg")`),
        "whole",
        "kcal/kg",
        "International Table calorie",
      ),
      ...rows(
        10,
        "Duplicates",
        each((row) => `Results!G${row - 6}`),
        "textRight",
        "",
      ),
      ...rows(
        11,
        "Total moisture",
        each((row) => `Results!C${row - 21}`),
        "one",
        "%, ar",
      ),
      ...heading(13, ["Uncertainty of a single run, dry", "", "", "", ""]),
      ...rows(
        14,
        "Energy equivalent, scatter",
        each((row) => `Calibration!$B$${mean + 1}/Calibration!$B$${mean}*Results!B${row}`),
        "one",
        "J/g",
      ),
      ...rows(
        15,
        "Certified value of benzoic acid, 1.5 J/g",
        each((row) => `1.5/Laboratory!$B$20*Results!B${row}`),
        "one",
        "J/g",
        "half of the 3 J/g stated (95 %)",
      ),
      ...rows(
        16,
        "Corrected rise",
        runs.map(
          (sheet, i) =>
            `INDEX(STILL.CAL.RISE.REPORT('${sheet}'!E5:E${4 + TIMES.length},'${sheet}'!F5:F${4 + TIMES.length},Laboratory!B13,Laboratory!B14),2,2)/'${sheet}'!B20*Results!B${27 + i}`,
        ),
        "one",
        "J/g",
        "standard uncertainty from CAL.RISE.REPORT",
      ),
      ...rows(
        17,
        "Moisture, 0.1 % absolute",
        ANALYSIS.map((_, i) => `0.1/(100-Results!B${6 + i})*Results!B${27 + i}`),
        "one",
        "J/g",
        "an assumption of this example",
      ),
      ...rows(
        18,
        "Combined standard uncertainty",
        ["B", "C"].map((column) => `SQRT(SUMSQ(${column}14:${column}17))`),
        "bold",
        "J/g",
      ),
      ...rows(
        19,
        "Expanded, coverage factor 2",
        ["B", "C"].map((column) => `2*${column}18`),
        "bold",
        "J/g",
      ),
      ...heading(21, ["How it was found", "", "", "", ""]),
      text("A22", "Reference temperature 25 °C; products CO2, N2, SO2 and liquid water"),
      text("A23", "Corrected rise by Regnault-Pfaundler; masses reduced to vacuum for standard and samples alike"),
      text("A24", 'Acids in the convention "separated"; net values with the constants of the edition named in Results'),
      ...heading(26, ["Sources", "", "", "", ""]),
      ...citations().map((citation, i) => text(`A${27 + i}`, citation, "note")),
    ],
  };
}
