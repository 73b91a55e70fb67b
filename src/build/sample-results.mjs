// @ts-check
/** The sheet "Results": analysis, dry contents, agreement of duplicates, values on every basis. */
import { formula, given, heading, letter, looks, text } from "./sample-cells.mjs";

/** @typedef {import("./sample-writer.mjs").SampleSheet} SampleSheet */

/** Analysis of the samples, per cent: moisture as analysed and as received, ash dry; hydrogen, oxygen, nitrogen, as analysed. */
export const ANALYSIS = [
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
export function resultsSheet() {
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
