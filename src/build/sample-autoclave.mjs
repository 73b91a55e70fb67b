// @ts-check
/**
 * The sheet "Autoclave": water and the air it was closed with, heated in a small vessel. Liquid water expands until it fills the vessel; from
 * there on it squeezes the air, and the pressure leaves that of saturated steam. Beside it the time a heater takes; then one state in full.
 */
import { filled, formula, given, heading, kelvin, letter, line, looks, remark, tableColumn, text } from "./sample-cells.mjs";

/** @typedef {import("./sample-writer.mjs").SampleSheet} SampleSheet */

/** °C and bar absolute; invented. @type {readonly (readonly [number, number])[]} */
const LIMIT = [
  [0, 100],
  [100, 100],
  [200, 92],
  [250, 88],
  [300, 84],
  [350, 80],
];
/** °C. */
const TEMPERATURES = [20, 60, 100, 140, 180, 200, 220, 240, 250, 260, 270, 275, 280, 285, 290];

/** First rows of the sweep and of the table; rows that the table takes. */
export const HEAT_ROW = 19;
export const SEALED_ROW = HEAT_ROW + TEMPERATURES.length + 26;
export const SEALED_ROWS = 25;
const HEAT_LAST = HEAT_ROW + TEMPERATURES.length - 1;
const LIMIT_ROW = 5;
const LIMIT_LAST = LIMIT_ROW + LIMIT.length - 1;

const over = (/** @type {string} */ column) => `${column}${HEAT_ROW}:${column}${HEAT_LAST}`;
const knots = (/** @type {string} */ column) => `${column}${LIMIT_ROW}:${column}${LIMIT_LAST}`;
/** The table at temperatures of some cells in °C. @param {string} cells */
const sealed = (cells) =>
  `STILL.WATER.SEALED(STILL.UNITS(B5,"L","m3"),B6,${kelvin("B8")},${kelvin(cells)},B7,B10,B11,F${LIMIT_ROW}:G${LIMIT_LAST})`;

/** @returns {SampleSheet} */
export function autoclaveSheet() {
  return {
    name: "Autoclave",
    widths: [30, 34, 13, 22, 22, 18, 20, 18, 14, 14],
    heights: { 1: 24 },
    cells: [
      text("A1", "Water in a small autoclave", "title"),
      text(
        "A2",
        "Invented: a vessel closed in air. Close to full the air is squeezed, much of it would dissolve: an upper estimate.",
        "note",
      ),
      ...givens(),
      ...limit(),
      ...sweep(),
      ...table(),
    ],
    charts: [pressureChart(), timeChart()],
  };
}

function givens() {
  return [
    ...heading(4, ["Given", "", ""]),
    ...line(5, "Volume", 10, "input", "L"),
    ...line(6, "Water", 7.5, "input", "kg"),
    ...line(7, "Closed with", "101325 Pa air", "inputText", ""),
    ...line(8, "Closed at", 20, "input", "°C"),
    ...line(9, "Temperature of the table", 200, "input", "°C"),
    ...line(10, "Wall", "60 kg austenitic stainless steel", "inputText", ""),
    ...line(11, "Its expansion, by volume", "48e-6 1/K", "inputText", ""),
    ...line(12, "Heater", 3, "input", "kW"),
    ...line(13, "Loss to the surroundings", 4, "input", "W/K"),
    ...line(14, "Surroundings", 20, "input", "°C"),
    ...line(15, "Wall and water, to be warmed", '=B10&" + "&B6&" kg at 4.4 kJ/(kg K)"', "text", ""),
  ];
}

/** The limit in the units of the chart, and in those of the functions. */
function limit() {
  return [
    ...["Limit at, °C", "Limit, bar", "K", "Pa"].map((words, i) => text(`${letter(3 + i)}4`, words, "headingRight")),
    ...LIMIT.flatMap(([temperature, pressure], i) => [given(`D${LIMIT_ROW + i}`, temperature), given(`E${LIMIT_ROW + i}`, pressure)]),
    ...filled("F", LIMIT_ROW, LIMIT_LAST, kelvin(knots("D")), "two"),
    ...filled("G", LIMIT_ROW, LIMIT_LAST, `STILL.UNITS(${knots("E")},"bar","Pa")`, "whole"),
    text("D11", "The limit falls as the wall grows hot; it is invented.", "note"),
    text("D12", "Full of liquid, each kelvin more adds several bar.", "note"),
    text("D13", "4.4 kJ/(kg K): a mean of liquid water for the warm-up.", "note"),
  ];
}

function sweep() {
  const head = HEAT_ROW - 1;
  const column = (/** @type {string} */ at, /** @type {string} */ title, /** @type {string} */ look) => [
    formula(`${at}${head}`, tableColumn(sealed(over("A")), title), "unitRight", `${at}${head}:${at}${HEAT_LAST}`),
    ...looks(at, HEAT_ROW, HEAT_LAST, look),
  ];
  const words = ["Temperature", "Pressure", "Pressure", "Liquid", "Of the limit", "Steam alone", "Heat", "Remark", "Time", "Nothing lost"];
  return [
    ...heading(head - 1, words, "headingRight", "headingRight"),
    ...[..."ACFIJ"].map((at, i) => text(`${at}${head}`, ["°C", "bar", "bar", "h", "h"][i] ?? "", "unitRight")),
    ...TEMPERATURES.map((value, i) => given(`A${HEAT_ROW + i}`, value)),
    ...column("B", "pressure at T2 [Pa]", "whole"),
    ...filled("C", HEAT_ROW, HEAT_LAST, `STILL.UNITS(${over("B")},"Pa","bar")`, "two"),
    ...column("D", "liquid at T2 [m3/m3]", "percent"),
    ...column("E", "pressure at T2 / limit", "percent"),
    ...filled("F", HEAT_ROW, HEAT_LAST, `STILL.WATER.SATURATION(${kelvin(over("A"))},"bar")`, "two"),
    ...column("G", "heat in all [J]", "whole"),
    ...filled("H", HEAT_ROW, HEAT_LAST, remark(over("E")), "textRight"),
    ...filled(
      "I",
      HEAT_ROW,
      HEAT_LAST,
      `STILL.UNITS(STILL.VESSEL.WARMUP(B15,1000*B12,B13,${kelvin("B14")},${kelvin("B8")},${kelvin(over("A"))}),"s","h")`,
      "two",
    ),
    ...filled("J", HEAT_ROW, HEAT_LAST, `STILL.UNITS(${over("G")}/(1000*B12),"s","h")`, "two"),
  ];
}

/** One state in full. */
function table() {
  const last = SEALED_ROW + SEALED_ROWS - 1;
  const [at, whole] = [(/** @type {number} */ row) => SEALED_ROW + row, "whole"];
  return [
    ...heading(SEALED_ROW - 1, ["One state in full", "", "", "", "", "", "", ""]),
    formula(`A${SEALED_ROW}`, sealed("B9"), "text", `A${SEALED_ROW}:D${last}`),
    ...looks("A", at(1), last, "text"),
    ...looks("B", at(0), at(0), "three"),
    ...looks("B", at(1), at(1), "six"),
    ...looks("B", at(2), at(2), "textRight"),
    ...looks("B", at(3), at(3), "five"),
    ...looks("B", at(4), at(5), whole),
    ...looks("B", at(6), at(7), "textRight"),
    ...looks("B", at(8), at(9), "five"),
    ...looks("B", at(10), at(15), whole),
    ...looks("B", at(16), at(16), "two"),
    ...looks("B", at(17), at(17), whole),
    ...looks("B", at(18), at(19), "textRight"),
    ...looks("B", at(20), at(20), whole),
    ...looks("B", at(21), at(21), "three"),
    ...looks("B", at(22), at(22), "two"),
    ...looks("B", at(23), last, "textRight"),
    ...looks("C", SEALED_ROW, last, "unit"),
    ...looks("D", SEALED_ROW, last + 3, "note"),
  ];
}

/** @returns {import("./sample-chart.mjs").SampleChart} */
const pressureChart = () => ({
  anchor: `A${HEAT_LAST + 2}:C${HEAT_LAST + 22}`,
  title: "Pressure in the autoclave, and its limit",
  x: { title: "temperature, °C", from: 0, to: 350 },
  y: { title: "absolute pressure, bar", from: 0 },
  series: [
    { name: "water and air", x: over("A"), y: over("C"), style: "line", accent: 1 },
    { name: "saturated steam", x: over("A"), y: over("F"), style: "line", accent: 2 },
    { name: "limit", x: knots("D"), y: knots("E"), style: "line", accent: 5 },
  ],
});

/** @returns {import("./sample-chart.mjs").SampleChart} */
const timeChart = () => ({
  anchor: `D${HEAT_LAST + 2}:H${HEAT_LAST + 22}`,
  title: "Time to a temperature",
  x: { title: "time, h", from: 0 },
  y: { title: "temperature, °C", from: 0 },
  series: [
    { name: "with the loss", x: over("I"), y: over("A"), style: "line", accent: 1 },
    { name: "nothing lost", x: over("J"), y: over("A"), style: "line", accent: 2 },
  ],
});
