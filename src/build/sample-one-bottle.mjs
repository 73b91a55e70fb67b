// @ts-check
/**
 * The sheet "One bottle": nitrogen from well below to far above the day's temperatures by the ideal gas and by two cubic equations, against
 * a limit that falls as the wall grows hot; then the whole table of one state, last because its length depends on the gas.
 */
import { filled, formula, given, heading, kelvin, letter, line, looks, tableColumn, text } from "./sample-cells.mjs";

/** @typedef {import("./sample-writer.mjs").SampleSheet} SampleSheet */

/** °C and bar absolute: invented, and falling as the strength of steel does. @type {readonly (readonly [number, number])[]} */
const LIMIT = [
  [-20, 300],
  [50, 300],
  [100, 290],
  [200, 260],
  [300, 220],
  [350, 195],
];
/** °C. */
const TEMPERATURES = [-20, 0, 15, 30, 50, 65, 80, 100, 150, 200, 250, 300, 350];

/** First rows of the sweep and of the table; rows that the table takes. */
export const SWEEP_ROW = 14;
export const REACH_ROW = SWEEP_ROW + TEMPERATURES.length + 3;
export const REACH_ROWS = 21;
const SWEEP_LAST = SWEEP_ROW + TEMPERATURES.length - 1;
const LIMIT_ROW = 5;
const LIMIT_LAST = LIMIT_ROW + LIMIT.length - 1;

const over = (/** @type {string} */ column) => `${column}${SWEEP_ROW}:${column}${SWEEP_LAST}`;
const knots = (/** @type {string} */ column) => `${column}${LIMIT_ROW}:${column}${LIMIT_LAST}`;
const STATE = 'STILL.UNITS(B6,"L","m3"),STILL.UNITS(B7,"°C","K"),STILL.UNITS(B8,"bar","Pa")';

/** @returns {SampleSheet} */
export function bottleSheet() {
  return {
    name: "One bottle",
    widths: [28, 26, 17, 14, 14, 16, 24],
    heights: { 1: 24 },
    cells: [
      text("A1", "One bottle from cold to hot", "title"),
      text("A2", "The same gas three times: ideal, Peng-Robinson, Soave. The limit is invented and falls as the wall grows hot.", "note"),
      ...givens(),
      ...limit(),
      ...sweep(),
      ...table(),
    ],
    charts: [
      {
        anchor: "I4:Q25",
        title: "Pressure in one bottle, and its limit",
        x: { title: "temperature, °C", from: -50, to: 350 },
        y: { title: "absolute pressure, bar", from: 0 },
        series: [
          { name: "Peng-Robinson", x: over("A"), y: over("C"), style: "line", accent: 1 },
          { name: "ideal gas", x: over("A"), y: over("B"), style: "line", accent: 2 },
          { name: "Soave", x: over("A"), y: over("D"), style: "points", accent: 3 },
          { name: "limit", x: knots("D"), y: knots("E"), style: "line", accent: 5 },
        ],
      },
    ],
  };
}

function givens() {
  return [
    ...heading(4, ["Given", "", ""]),
    ...line(5, "Contents", "N2", "inputText", ""),
    ...line(6, "Volume", 50, "input", "L"),
    ...line(7, "Temperature of filling", 15, "input", "°C"),
    ...line(8, "Filled to, absolute", 200, "input", "bar"),
    ...line(9, "Temperature of the table", 65, "input", "°C"),
    ...line(10, "Wall", "60 kg carbon steel", "inputText", ""),
  ];
}

/** The limit in the units of the charts, and in those of the functions. */
function limit() {
  return [
    ...["Limit at, °C", "Limit, bar", "K", "Pa"].map((words, i) => text(`${letter(3 + i)}4`, words, "headingRight")),
    ...LIMIT.flatMap(([temperature, pressure], i) => [given(`D${LIMIT_ROW + i}`, temperature), given(`E${LIMIT_ROW + i}`, pressure)]),
    ...filled("F", LIMIT_ROW, LIMIT_LAST, kelvin(knots("D")), "two"),
    ...filled("G", LIMIT_ROW, LIMIT_LAST, `STILL.UNITS(${knots("E")},"bar","Pa")`, "whole"),
  ];
}

function sweep() {
  const final = (/** @type {string} */ model) =>
    `STILL.VESSEL.FINALPRESSURE(B5,${kelvin("B7")},STILL.UNITS(B8,"bar","Pa"),${kelvin(over("A"))},"bar","${model}")`;
  const reached = `STILL.VESSEL.REACH(B5,${STATE},${kelvin(over("A"))},,"peng-robinson",F${LIMIT_ROW}:G${LIMIT_LAST})`;
  const head = SWEEP_ROW - 1;
  return [
    ...heading(
      head - 1,
      ["Temperature", "Ideal", "Peng-Robinson", "Soave", "Above ideal", "Soave to P.-R.", "Peng-Robinson"],
      "headingRight",
      "headingRight",
    ),
    ...["°C", "bar", "bar", "bar"].map((unit, i) => text(`${letter(i)}${head}`, unit, "unitRight")),
    ...TEMPERATURES.map((value, i) => given(`A${SWEEP_ROW + i}`, value)),
    ...filled("B", SWEEP_ROW, SWEEP_LAST, final("ideal"), "one"),
    ...filled("C", SWEEP_ROW, SWEEP_LAST, final("peng-robinson"), "one"),
    ...filled("D", SWEEP_ROW, SWEEP_LAST, final("soave"), "one"),
    ...filled("E", SWEEP_ROW, SWEEP_LAST, `${over("C")}/${over("B")}-1`, "percent"),
    ...filled("F", SWEEP_ROW, SWEEP_LAST, `${over("D")}/${over("C")}-1`, "percent"),
    formula(`G${head}`, tableColumn(reached, "pressure at T2 / limit"), "unitRight", `G${head}:G${SWEEP_LAST}`),
    ...looks("G", SWEEP_ROW, SWEEP_LAST, "percent"),
  ];
}

/** One state in full. */
function table() {
  const last = REACH_ROW + REACH_ROWS - 1;
  return [
    ...heading(REACH_ROW - 1, ["One state in full, Peng-Robinson", "", "", "", "", "", ""]),
    formula(
      `A${REACH_ROW}`,
      `STILL.VESSEL.REACH(B5,${STATE},${kelvin("B9")},B10,"peng-robinson",F${LIMIT_ROW}:G${LIMIT_LAST})`,
      "text",
      `A${REACH_ROW}:D${last}`,
    ),
    ...looks("A", REACH_ROW + 1, last, "text"),
    ...looks("B", REACH_ROW, REACH_ROW + 1, "three"),
    ...looks("B", REACH_ROW + 2, REACH_ROW + 2, "whole"),
    ...looks("B", REACH_ROW + 3, REACH_ROW + 3, "two"),
    ...looks("B", REACH_ROW + 4, REACH_ROW + 4, "whole"),
    ...looks("B", REACH_ROW + 5, REACH_ROW + 7, "textRight"),
    ...looks("B", REACH_ROW + 8, REACH_ROW + 9, "four"),
    ...looks("B", REACH_ROW + 10, REACH_ROW + 10, "whole"),
    ...looks("B", REACH_ROW + 11, REACH_ROW + 12, "two"),
    ...looks("B", REACH_ROW + 13, REACH_ROW + 16, "whole"),
    ...looks("B", REACH_ROW + 17, REACH_ROW + 18, "three"),
    ...looks("B", REACH_ROW + 19, last, "textRight"),
    ...looks("C", REACH_ROW, last, "unit"),
    ...looks("D", REACH_ROW, last + 3, "note"),
  ];
}
