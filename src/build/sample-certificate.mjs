// @ts-check
/** The sheet "Certificate": rounded values, uncertainty, method and sources. */
import { readFileSync } from "node:fs";
import { TIMES } from "./laboratory-runs.mjs";
import { MEAN_ROW } from "./sample-calibration.mjs";
import { ANALYSIS } from "./sample-results.mjs";
import { formula, heading, letter, text } from "./sample-cells.mjs";

/** @typedef {import("./sample-writer.mjs").SampleSheet} SampleSheet */

/** Sources that the certificate names, by their keys in the library. */
const CITED = [
  "calorimetry",
  "nist-srm-39j",
  "coops-1956",
  "oiml-d28",
  "astm-d240",
  "iso-1928",
  "iso-1928-acids",
  "iso-1928-2009",
  "iso-18125",
  "iso-18125-2017",
  "iso-5725-6",
  "ciaaw-2021",
];

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

const FIRST_COMPONENT = 14;

/** Standard uncertainties of a single run on the dry basis, J/g, for both samples. @param {(body: (row: number) => string) => string[]} each */
function uncertaintyOf(each) {
  const runs = ["Coal A 1", "Wood B 1"];
  const readings = (/** @type {string} */ sheet) => `'${sheet}'!E5:E${4 + TIMES.length},'${sheet}'!F5:F${4 + TIMES.length}`;
  const perGram = (/** @type {number} */ joules) => runs.map((sheet) => `${joules}/'${sheet}'!B7`);
  const assumed = "an assumption of this example";
  return [
    {
      label: "Energy equivalent, scatter",
      formulas: each((row) => `Calibration!$B$${MEAN_ROW + 1}/Calibration!$B$${MEAN_ROW}*Results!B${row}`),
      note: "of the mean of the series",
    },
    {
      label: "Certified value of benzoic acid, 1.5 J/g",
      formulas: each((row) => `1.5/Laboratory!$B$20*Results!B${row}`),
      note: "half of the 3 J/g stated (95 %)",
    },
    {
      label: "Corrected rise",
      formulas: runs.map(
        (sheet, i) =>
          `INDEX(STILL.CAL.RISE.REPORT(${readings(sheet)},Laboratory!B13,Laboratory!B14),2,2)/'${sheet}'!B20*Results!B${27 + i}`,
      ),
      note: "standard uncertainty from CAL.RISE.REPORT",
    },
    { label: "Weighing, 0.2 mg", formulas: runs.map((sheet, i) => `0.0002/'${sheet}'!B7*Results!B${27 + i}`), note: assumed },
    { label: "Ignition and fuse, 5 J", formulas: perGram(5), note: assumed },
    { label: "Acids, 5 J", formulas: perGram(5), note: assumed },
    {
      label: "Moisture, 0.1 % absolute",
      formulas: ANALYSIS.map((_, i) => `0.1/(100-Results!B${6 + i})*Results!B${27 + i}`),
      note: assumed,
    },
  ];
}

/** @param {string} invented says that all of it is invented @returns {SampleSheet} */
export function certificateSheet(invented) {
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
  const components = uncertaintyOf(each);
  const combined = FIRST_COMPONENT + components.length;
  return {
    name: "Certificate",
    widths: [46, 18, 18, 12, 70],
    heights: { 1: 24, 2: 52 },
    merged: ["A2:C2"],
    cells: [
      text("A1", "Certificate of heating values", "title"),
      text("A2", invented, "remark"),
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
      ...components.flatMap(({ label, formulas, note }, i) => rows(FIRST_COMPONENT + i, label, formulas, "one", "J/g", note)),
      ...rows(
        combined,
        "Combined standard uncertainty",
        ["B", "C"].map((column) => `SQRT(SUMSQ(${column}${FIRST_COMPONENT}:${column}${combined - 1}))`),
        "bold",
        "J/g",
      ),
      ...rows(
        combined + 1,
        "Expanded, coverage factor 2",
        ["B", "C"].map((column) => `2*${column}${combined}`),
        "bold",
        "J/g",
      ),
      ...heading(combined + 3, ["How it was found", "", "", "", ""]),
      text(`A${combined + 4}`, "Reference temperature 25 °C; products CO2, N2, SO2 and liquid water"),
      text(`A${combined + 5}`, "Corrected rise by Regnault-Pfaundler; masses reduced to vacuum for standard and samples alike"),
      text(`A${combined + 6}`, 'Acids in the convention "separated"; net values with the constants of the edition named in Results'),
      ...heading(combined + 8, ["Sources", "", "", "", ""]),
      ...citations().map((citation, i) => text(`A${combined + 9 + i}`, citation, "note")),
    ],
  };
}
