// @ts-check
/**
 * The sheet "Filled by mass": liquefied gases, which are filled by weight. At 15 °C they are liquid and vapour; warmer, the liquid may fill
 * the bottle, where a cubic equation is refused; above the critical temperature there is one dense gas.
 */
import { filled, formula, given, heading, kelvin, letter, line, looks, remark, tableColumn, text } from "./sample-cells.mjs";

/** @typedef {import("./sample-writer.mjs").SampleSheet} SampleSheet */

/** Name, contents, litres, mass, allowed pressure in bar. @type {readonly (readonly [string, string, number, string, number])[]} */
const BOTTLES = [
  ["Carbon dioxide, 0.75 kg/L", "CO2", 10, "7.5 kg", 250],
  ["Carbon dioxide, 0.60 kg/L", "CO2", 50, "30 kg", 190],
  ["Propane", "C3H8", 27, "11 kg", 30],
];
/** °C, of the first bottle: two phases to 16 °C, liquid-full to 31 °C, one dense gas above. */
const TEMPERATURES = [0, 10, 15, 16, 20, 25, 30, 35, 40, 50, 60, 65];

/** First rows of the bottles and of the first of them over temperature. */
export const MASS_ROW = 10;
export const WARMING_ROW = MASS_ROW + BOTTLES.length + 4;
const LAST = MASS_ROW + BOTTLES.length - 1;
const WARMING_LAST = WARMING_ROW + TEMPERATURES.length - 1;

/** @returns {SampleSheet} */
export function massSheet() {
  return {
    name: "Filled by mass",
    widths: [30, 20, 22, 13, 15, 18, 18, 12, 12, 14, 24, 22, 22],
    heights: { 1: 24 },
    cells: [
      text("A1", "Bottles filled by mass", "title"),
      text(
        "A2",
        "Liquefied gases: Peng-Robinson tells the pressure of liquid and vapour, and of the dense gas above the critical temperature.",
        "note",
      ),
      ...heading(4, ["Given", "", "", "", ""]),
      ...line(5, "Temperature of filling, T1", 15, "input", "°C"),
      ...line(6, "Hot day, T2", 50, "input", "°C", "try 25: the first bottle is full of liquid, and refused"),
      ...bottles(),
      ...warming(),
    ],
    charts: [
      {
        anchor: `A${WARMING_LAST + 3}:E${WARMING_LAST + 22}`,
        title: "One bottle of carbon dioxide, 0.75 kg/L",
        x: { title: "temperature, °C", from: 0, to: 70 },
        y: { title: "absolute pressure, bar", from: 0 },
        series: [
          { name: "Peng-Robinson", x: over("A"), y: over("D"), style: "points", accent: 1 },
          { name: "P1 T2/T1", x: over("A"), y: over("E"), style: "line", accent: 2 },
          { name: "allowed", x: over("A"), y: over("F"), style: "line", accent: 5 },
        ],
      },
    ],
  };
}

const rows = (/** @type {string} */ column) => `${column}${MASS_ROW}:${column}${LAST}`;
const over = (/** @type {string} */ column) => `${column}${WARMING_ROW}:${column}${WARMING_LAST}`;

function bottles() {
  const table = `STILL.VESSEL.REACH(${rows("B")},STILL.UNITS(${rows("C")},"L","m3"),${kelvin("B5")},${rows("D")},${kelvin("B6")},,"peng-robinson")`;
  const words = [
    "Bottle",
    "Contents",
    "Volume",
    "Filled",
    "Allowed",
    "On filling",
    "Hot day",
    "On filling",
    "Hot day",
    "Of allowed",
    "Remark",
  ];
  const column = (/** @type {string} */ at, /** @type {string} */ title, /** @type {string} */ look) => [
    formula(`${at}${MASS_ROW - 1}`, tableColumn(table, title), "unitRight", `${at}${MASS_ROW - 1}:${at}${LAST}`),
    ...looks(at, MASS_ROW, LAST, look),
  ];
  return [
    ...heading(MASS_ROW - 2, [...words, "On filling", "Hot day"], "headingRight"),
    ...["", "", "L", "", "bar", "", "", "bar", "bar", ""].flatMap((unit, i) =>
      unit ? [text(`${letter(i)}${MASS_ROW - 1}`, unit, "unitRight")] : [],
    ),
    ...BOTTLES.flatMap(([name, contents, volume, mass, allowed], i) => [
      text(`A${MASS_ROW + i}`, name),
      text(`B${MASS_ROW + i}`, contents, "inputText"),
      given(`C${MASS_ROW + i}`, volume),
      text(`D${MASS_ROW + i}`, mass, "inputText"),
      given(`E${MASS_ROW + i}`, allowed),
    ]),
    ...column("F", "phase at T1", "textRight"),
    ...column("G", "phase at T2", "textRight"),
    ...filled("H", MASS_ROW, LAST, `STILL.UNITS(${rows("L")},"Pa","bar")`, "one"),
    ...filled("I", MASS_ROW, LAST, `STILL.UNITS(${rows("M")},"Pa","bar")`, "one"),
    ...filled("J", MASS_ROW, LAST, `${rows("I")}/${rows("E")}`, "percent"),
    ...filled("K", MASS_ROW, LAST, remark(rows("J"), "full of liquid: refused"), "textRight"),
    ...column("L", "pressure at T1 [Pa]", "whole"),
    ...column("M", "pressure at T2 [Pa]", "whole"),
  ];
}

/** The first bottle over temperature. */
function warming() {
  const first = MASS_ROW;
  const table = `STILL.VESSEL.REACH(B${first},STILL.UNITS(C${first},"L","m3"),${kelvin("B5")},D${first},${kelvin(over("A"))},,"peng-robinson")`;
  const head = WARMING_ROW - 1;
  const phase = tableColumn(table, "phase at T2");
  return [
    ...heading(head - 1, ["The first bottle warmed", "From the table", "", "Pressure", "If P1 T2/T1", "Allowed"], "headingRight"),
    text(`A${head}`, "°C", "unitRight"),
    ...["D", "E", "F"].map((column) => text(`${column}${head}`, "bar", "unitRight")),
    ...TEMPERATURES.map((value, i) => given(`A${WARMING_ROW + i}`, value)),
    formula(`B${head}`, tableColumn(table, "pressure at T2 [Pa]"), "unitRight", `B${head}:B${WARMING_LAST}`),
    ...looks("B", WARMING_ROW, WARMING_LAST, "whole"),
    formula(`C${head}`, `IFERROR(${phase},"full of liquid: refused")`, "unitRight", `C${head}:C${WARMING_LAST}`),
    ...looks("C", WARMING_ROW, WARMING_LAST, "textRight"),
    ...filled("D", WARMING_ROW, WARMING_LAST, `IFERROR(STILL.UNITS(${over("B")},"Pa","bar"),NA())`, "one"),
    ...filled("E", WARMING_ROW, WARMING_LAST, `H${first}*${kelvin(over("A"))}/${kelvin("B5")}`, "one"),
    ...filled("F", WARMING_ROW, WARMING_LAST, `E${first}+0*${over("A")}`, "whole"),
    text(
      `A${WARMING_LAST + 1}`,
      "Refused cells say why when they are selected: the liquid fills the bottle, and a cubic equation does not tell its pressure.",
      "note",
    ),
  ];
}
