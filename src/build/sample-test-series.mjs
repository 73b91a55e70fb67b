// @ts-check
/**
 * The sheet "Test series": fuel in the mixture and gauge peak pressure as a laboratory notes them, for three fuels and for two vessels
 * joined by a pipe; the equivalence ratio, the absolute pressure and the equilibrium at constant volume beside them, each column one formula.
 *   ratio = x / (100 − x) · O2 for a mole of fuel / O2 in a mole of air,   x: mol of fuel in 100 mol of mixture
 */
import { filled, formula, given, letter, text } from "./sample-cells.mjs";

/** @typedef {import("./sample-writer.mjs").SampleSheet} SampleSheet */
/** @typedef {{ name: string, mark: string, fuel: string, equation: string, oxygen: number, traces: readonly [string, string], tests: readonly (readonly [number, number | null])[] }} Series */

/** Fuel in the mixture, %; gauge peak pressure, bar, invented; null: no reading. @type {readonly Series[]} */
export const SERIES = [
  {
    name: "Methane in air",
    mark: "M",
    fuel: "CH4",
    equation: "CH4 + O2 = CO2 + H2O",
    oxygen: 2,
    traces: ["CO", "NO"],
    tests: [
      [5.5, 2.9],
      [6.5, 4.66],
      [7.5, 5.89],
      [8.5, 6.68],
      [9.5, 7.19],
      [10.5, 7.25],
      [11.5, 6.98],
      [13, 5.95],
      [14.5, 4.11],
      [16.5, null],
    ],
  },
  {
    name: "Hydrogen in air",
    mark: "H",
    fuel: "H2",
    equation: "H2 + O2 = H2O",
    oxygen: 0.5,
    traces: ["H2", "NO"],
    tests: [
      [10, 1.93],
      [14, 3.61],
      [18, 4.78],
      [22, 5.72],
      [26, 6.44],
      [30, 6.84],
      [35, 6.77],
      [42, 6.25],
      [50, 5.49],
    ],
  },
  {
    name: "Propane in air",
    mark: "P",
    fuel: "C3H8",
    equation: "C3H8 + O2 = CO2 + H2O",
    oxygen: 5,
    traces: ["CO", "NO"],
    tests: [
      [2.4, 3.65],
      [2.8, 5.38],
      [3.2, 6.43],
      [3.6, 7.13],
      [4, 7.57],
      [4.5, 7.84],
      [5, 7.68],
      [6, 6.62],
      [7, 4.6],
    ],
  },
  {
    name: "Methane in two vessels joined by a pipe: the gauge of the first, then of the second",
    mark: "J",
    fuel: "CH4",
    equation: "CH4 + O2 = CO2 + H2O",
    oxygen: 2,
    traces: ["CO", "NO"],
    tests: [
      [9.5, 7.04],
      [9.5, 11.3],
    ],
  },
];

/** Rows of a series: its name, the fuel, headings, units, then the tests; one row between two series. */
export const FIRST_ROW = 6;
const ROWS_BEFORE_TESTS = 4;

/** First and last row of the tests of each series. */
export const TEST_ROWS = SERIES.map((_, i) => {
  const before = SERIES.slice(0, i).reduce((rows, { tests }) => rows + ROWS_BEFORE_TESTS + tests.length + 1, FIRST_ROW);
  return { first: before + ROWS_BEFORE_TESTS, last: before + ROWS_BEFORE_TESTS + (SERIES[i]?.tests.length ?? 0) - 1 };
});

/** What a flag says, and what to look for. */
const ABOVE = "above calculated";
const FAR_BELOW = "far below";
const FLAGS = `Flags: ${ABOVE}: look for pressure piling, a gauge that rings or drifts, another composition or start; ${FAR_BELOW} (under 0.7): near a limit of flammability, or burnt in part.`;

/** @returns {SampleSheet} */
export function seriesSheet() {
  return {
    name: "Test series",
    widths: [9, 11, 13, 13, 17, 17, 14, 13, 11, 11, 15, 2, 17, 2],
    heights: { 1: 24 },
    cells: [
      text("A1", "Peak pressure from lean to rich", "title"),
      text("A2", "Measured pressures are invented. Set-up: sheet Closed vessel. Each column of results is one formula.", "note"),
      text(
        "A3",
        "Without dissociation, up to ratio 1: an estimate; not a bound. Calculated and measured pressures are no rating of a vessel.",
        "note",
      ),
      text("A4", FLAGS, "note"),
      ...SERIES.flatMap(seriesCells),
    ],
    charts: [pressureChart(), shareChart()],
  };
}

/** @param {Series} series @param {number} index */
function seriesCells({ name, mark, fuel, equation, oxygen, traces, tests }, index) {
  const { first, last } = TEST_ROWS[index] ?? { first: 0, last: 0 };
  const [top, names, units] = [first - 4, first - 2, first - 1];
  const at = `$B$${first - 3}`;
  const rows = (/** @type {string} */ column) => `${column}${first}:${column}${last}`;
  const set = (/** @type {number} */ row) => `'Closed vessel'!$B$${row}`;
  const states = `${at},${set(10)},${rows("C")},${set(5)},${set(7)}`;
  const spill = (/** @type {string} */ column, /** @type {string} */ body, /** @type {string} */ look) =>
    filled(column, first, last, body, look);
  const share = `IFERROR(${rows("G")},1)`;
  const words = ["Test", "Fuel", "Ratio", "Gauge", "", "", "Measured to", "Calculated", ...traces, "Undissociated"];
  return [
    ...Array.from({ length: 13 }, (_, i) => text(`${letter(i)}${top}`, i === 0 ? name : "", "heading")),
    text(`A${top + 1}`, "Fuel"),
    text(`B${top + 1}`, fuel, "inputText"),
    text(`C${top + 1}`, "O2 per mole", "textRight"),
    given(`D${top + 1}`, oxygen),
    formula(`E${top + 1}`, `STILL.REACTION.BALANCE("${equation}")`, "text"),
    ...words.map((word, i) => text(`${letter(i)}${names}`, word, i === 8 || i === 9 ? "inputText" : "textRight")),
    formula(`E${names}`, `${at}&" measured"`, "textRight"),
    formula(`F${names}`, `${at}&" calculated"`, "textRight"),
    ...[
      "",
      "%, mol",
      "fuel to air",
      "bar, gauge",
      "bar, absolute",
      "bar, absolute",
      "calculated",
      "K",
      "%, mol",
      "%, mol",
      "bar, absolute",
    ].map((unit, i) => text(`${letter(i)}${units}`, unit, "unitRight")),
    ...tests.flatMap(([share, gauge], i) => [
      text(`A${first + i}`, `${mark}${i + 1}`, "textRight"),
      given(`B${first + i}`, share, "inputOne"),
      gauge === null ? { at: `D${first + i}`, look: "inputTwo" } : given(`D${first + i}`, gauge, "inputTwo"),
    ]),
    ...spill("C", `IF(${rows("B")}="",NA(),${rows("B")}/(100-${rows("B")})*$D$${top + 1}/${set(11)})`, "three"),
    ...spill("E", `STILL.UNITS.ABSOLUTE(IF(${rows("D")}="",NA(),${rows("D")}),"bar","bar",${set(8)})`, "two"),
    ...spill("F", `STILL.BURN.PRESSURE(${states},,"bar")`, "two"),
    ...spill("G", `${rows("E")}/${rows("F")}`, "two"),
    ...spill("H", `STILL.BURN.TEMPERATURE(${states})`, "whole"),
    ...spill("I", `100*STILL.BURN.FRACTION(${states},I${names})`, "two"),
    ...spill("J", `100*STILL.BURN.FRACTION(${states},J${names})`, "two"),
    ...spill("K", `IF(IFERROR(${rows("C")},2)>1,"",STILL.BURN.PRESSURE(${states},"complete","bar"))`, "two"),
    ...spill("M", `IF(ISNUMBER(${rows("G")}),IF(${share}>1,"${ABOVE}",IF(${share}<0.7,"${FAR_BELOW}","")),"no reading")`, "note"),
  ];
}

/** The three fuels of one vessel: not the joined ones. */
const CHARTED = TEST_ROWS.slice(0, 3);
const RATIO = { title: "equivalence ratio", from: 0, to: 2.5 };

/** @returns {import("./sample-chart.mjs").SampleChart} */
function pressureChart() {
  return {
    anchor: "O6:W28",
    title: "Peak pressure, measured and calculated",
    x: RATIO,
    y: { title: "absolute pressure, bar", from: 0, to: 10 },
    series: CHARTED.flatMap(({ first, last }, i) =>
      /** @type {const} */ ([
        ["E", "points"],
        ["F", "line"],
      ]).map(([column, style]) => ({
        name: { cell: `${column}${first - 2}` },
        x: `C${first}:C${last}`,
        y: `${column}${first}:${column}${last}`,
        style,
        accent: /** @type {1 | 2 | 3} */ (i + 1),
      })),
    ),
  };
}

/** @returns {import("./sample-chart.mjs").SampleChart} */
function shareChart() {
  return {
    anchor: "O30:W52",
    title: "Measured to calculated",
    x: RATIO,
    y: { title: "measured / calculated", from: 0.4, to: 1 },
    series: CHARTED.map(({ first, last }, i) => ({
      name: { cell: `B${first - 3}` },
      x: `C${first}:C${last}`,
      y: `G${first}:G${last}`,
      style: "points",
      accent: /** @type {1 | 2 | 3} */ (i + 1),
    })),
  };
}
