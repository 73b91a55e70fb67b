// @ts-check
/** The sheet "Certificate": rounded values, uncertainty, method and sources. */
import { readFileSync } from "node:fs";
import { TIMES } from "./laboratory-runs.mjs";
import { MEAN_ROW } from "./sample-calibration.mjs";
import { ANALYSIS } from "./sample-results.mjs";
import { formula, heading, letter, text } from "./sample-cells.mjs";

/** @typedef {import("./sample-writer.mjs").SampleSheet} SampleSheet */

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
  const runs = ["Coal A 1", "Wood B 1"];
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
      ...rows(
        14,
        "Energy equivalent, scatter",
        each((row) => `Calibration!$B$${MEAN_ROW + 1}/Calibration!$B$${MEAN_ROW}*Results!B${row}`),
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
