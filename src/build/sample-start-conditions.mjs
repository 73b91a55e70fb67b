// @ts-check
/** The sheet "Start conditions": one mixture of fuel and dry air, warmer before, and at higher pressure before, beside the two rules of thumb. */
import { filled, given, heading, letter, line, text } from "./sample-cells.mjs";

/** @typedef {import("./sample-writer.mjs").SampleSheet} SampleSheet */

/** °C. */
const TEMPERATURES = [25, 50, 75, 100, 125, 150];
/** bar. */
const PRESSURES = [1, 2, 3, 5, 7, 10];

/** First rows of the two sweeps. */
export const WARMER = 13;
export const HIGHER = WARMER + TEMPERATURES.length + 5;

/** @returns {SampleSheet} */
export function startSheet() {
  return {
    name: "Start conditions",
    widths: [35, 20, 13, 15, 16, 17, 13, 13],
    heights: { 1: 24 },
    cells: [
      text("A1", "Temperature and pressure before", "title"),
      text("A2", "Calculated only. Dry air: that of a humid day at 25 °C would lose water when it is compressed.", "note"),
      ...line(4, "Fuel, mole fractions", "0.8 CH4 + 0.2 H2", "inputText", ""),
      ...line(5, "Oxidant", "air", "inputText", ""),
      ...line(6, "Equivalence ratio", 1.05, "inputTwo", "", "near the highest pressure"),
      ...line(7, "Pressure before, first table", 1, "inputThree", "bar"),
      ...line(8, "Temperature before, second table", 25, "inputOne", "°C"),
      ...warmer(),
      ...higher(),
    ],
    charts: [
      chart("A31:C51", "Pressure ratio, warmer before", "temperature before, °C", WARMER, TEMPERATURES.length),
      chart("D31:H51", "Pressure ratio, higher pressure before", "pressure before, bar", HIGHER, PRESSURES.length),
    ],
  };
}

/** At one pressure: a column of temperatures. */
function warmer() {
  const [first, last] = [WARMER, WARMER + TEMPERATURES.length - 1];
  const states = `B4,B5,B6,B${first}:B${last},STILL.UNITS(B7,"bar","Pa")`;
  return [
    ...head(
      first,
      ["Warmer before", "Before", "After", "After", "Pressure ratio", "If as 1/T before", "Differs by", "CO after"],
      ["°C", "K", "bar", "K", "after to before", "ratio", "", "%, mol"],
    ),
    ...TEMPERATURES.map((value, i) => given(`A${first + i}`, value)),
    ...filled("B", first, last, `STILL.UNITS(A${first}:A${last},"°C","K")`, "two"),
    ...results(first, last, states, `C${first}:C${last}/B7`),
    ...filled("F", first, last, `E${first}*B${first}/B${first}:B${last}`, "three"),
  ];
}

/** At one temperature: a column of pressures. */
function higher() {
  const [first, last] = [HIGHER, HIGHER + PRESSURES.length - 1];
  const states = `B4,B5,B6,STILL.UNITS(B8,"°C","K"),B${first}:B${last}`;
  return [
    ...head(
      first,
      ["Higher pressure before", "Before", "After", "After", "Pressure ratio", "If as P before", "Differs by", "CO after"],
      ["bar", "Pa", "bar", "K", "after to before", "ratio", "", "%, mol"],
    ),
    ...PRESSURES.map((value, i) => given(`A${first + i}`, value)),
    ...filled("B", first, last, `STILL.UNITS(A${first}:A${last},"bar","Pa")`, "whole"),
    ...results(first, last, states, `C${first}:C${last}/A${first}:A${last}`),
    ...filled("F", first, last, `E${first}*B${first}:B${last}/B${first}:B${last}`, "three"),
  ];
}

/** @param {number} first @param {readonly string[]} words @param {readonly string[]} units */
function head(first, words, units) {
  return [...heading(first - 2, words, "headingRight"), ...units.map((unit, i) => text(`${letter(i)}${first - 1}`, unit, "unitRight"))];
}

/** @param {number} first @param {number} last @param {string} states the first five arguments of BURN @param {string} ratio */
function results(first, last, states, ratio) {
  return [
    ...filled("C", first, last, `STILL.BURN.PRESSURE(${states},,"bar")`, "two"),
    ...filled("D", first, last, `STILL.BURN.TEMPERATURE(${states})`, "whole"),
    ...filled("E", first, last, ratio, "three"),
    ...filled("G", first, last, `F${first}:F${last}/E${first}:E${last}-1`, "percent"),
    ...filled("H", first, last, `100*STILL.BURN.FRACTION(${states},"CO")`, "two"),
  ];
}

/** @param {string} anchor @param {string} title @param {string} x @param {number} first @param {number} count @returns {import("./sample-chart.mjs").SampleChart} */
function chart(anchor, title, x, first, count) {
  const rows = (/** @type {string} */ column) => `${column}${first}:${column}${first + count - 1}`;
  return {
    anchor,
    title,
    x: { title: x, from: 0 },
    y: { title: "pressure after / pressure before" },
    series: [
      { name: "calculated", x: rows("A"), y: rows("E"), style: "points", accent: 1 },
      { name: { cell: `F${first - 2}` }, x: rows("A"), y: rows("F"), style: "line", accent: 2 },
    ],
  };
}
