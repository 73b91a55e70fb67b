// @ts-check
/**
 * The sheet "Oxygen vessel": a charge of benzoic acid in oxygen, all of its energy left in the gas. An adiabatic bound, never rating evidence.
 *   oxygen put in = P V / (R T)
 */
import { formula, heading, line, looks, text } from "./sample-cells.mjs";

/** @typedef {import("./sample-writer.mjs").SampleSheet} SampleSheet */

/** First row of the table of EQUILIBRIUM.RIGID, and the rows it takes. */
export const RIGID_ROW = 26;
const RIGID_ROWS = 22;

/** @returns {SampleSheet} */
export function oxygenSheet() {
  return {
    name: "Oxygen vessel",
    widths: [36, 24, 12, 100],
    heights: { 1: 24, 2: 39 },
    merged: ["A2:C2"],
    cells: [
      text("A1", "A charge in oxygen", "title"),
      text(
        "A2",
        "What the gas would reach if wall, water and crucible took up nothing. The real peak is far lower. Never rating evidence: the limits of the vessel's own certificate govern.",
        "remark",
      ),
      ...heading(4, ["Charge", "", "", ""]),
      ...line(5, "Substance", "C7H6O2", "inputText", "", "benzoic acid"),
      ...line(6, "Gross value in the standard state", 26413.6, "inputOne", "J/g", "not the certified 26434 J/g: see FUEL.COMBUSTION"),
      ...line(7, "Mass", 1, "inputThree", "g"),
      ...line(8, "Volume of the vessel", 340, "input", "mL"),
      ...line(9, "Oxygen pressure, absolute", 30, "inputOne", "atm"),
      ...line(10, "Temperature before", 25, "inputOne", "°C"),
      ...line(11, "Oxygen the substance needs", 7.5, "input", "mol/mol"),
      formula("D11", 'STILL.REACTION.BALANCE(B5&" + O2 = CO2 + H2O")', "note"),
      ...heading(13, ["What is put in", "mol", "", ""], "headingRight"),
      formula("A14", "STILL.BURN.FUEL(B5,B6)", "text"),
      formula("B14", "B7/STILL.MOLARMASS(B5)", "six"),
      text("A15", "O2"),
      formula("B15", 'STILL.UNITS(B9,"atm","Pa")*STILL.UNITS(B8,"mL","m3")/(8.31446261815324*STILL.UNITS(B10,"°C","K"))', "six"),
      ...line(16, "Oxygen to what is needed", "=B15/(B14*B11)", "two", ""),
      ...after(),
      ...table(),
    ],
  };
}

/** What temperature and pressure come to. */
function after() {
  const found = (/** @type {string} */ label) => `VLOOKUP("${label}",A${RIGID_ROW}:B${RIGID_ROW + 60},2,FALSE)`;
  return [
    ...heading(18, ["After, with nothing lost", "", "", ""]),
    ...line(19, "Temperature", `=${found("temperature")}`, "whole", "K"),
    ...line(20, "Pressure, absolute", `=STILL.UNITS(${found("pressure")},"Pa","atm")`, "one", "atm"),
    ...line(
      21,
      "Temperature without dissociation",
      '=STILL.BURN.TEMPERATURE(A14,"O2",1/B16,STILL.UNITS(B10,"°C","K"),STILL.UNITS(B9,"atm","Pa"),"complete")',
      "whole",
      "K",
      "estimate without dissociation; not a bound",
    ),
    ...line(
      22,
      "Pressure without dissociation",
      '=STILL.BURN.PRESSURE(A14,"O2",1/B16,STILL.UNITS(B10,"°C","K"),STILL.UNITS(B9,"atm","Pa"),"complete","atm")',
      "one",
      "atm",
      "estimate without dissociation; not a bound",
    ),
  ];
}

function table() {
  const last = RIGID_ROW + RIGID_ROWS - 1;
  return [
    ...heading(RIGID_ROW - 1, ["The feed at constant energy and volume", "", "", ""]),
    formula(
      `A${RIGID_ROW}`,
      'STILL.EQUILIBRIUM.RIGID(A14:B15,STILL.UNITS(B10,"°C","K"),STILL.UNITS(B8,"mL","m3"))',
      "text",
      `A${RIGID_ROW}:D${last}`,
    ),
    ...looks("A", RIGID_ROW + 1, last, "text"),
    ...looks("B", RIGID_ROW, RIGID_ROW + 2, "whole"),
    ...looks("B", RIGID_ROW + 3, RIGID_ROW + 3, "five"),
    ...looks("B", RIGID_ROW + 4, RIGID_ROW + 4, "four"),
    ...looks("B", RIGID_ROW + 5, RIGID_ROW + 6, "one"),
    ...looks("B", RIGID_ROW + 7, last, "scientific"),
    ...looks("C", RIGID_ROW, last, "unit"),
    ...looks("D", RIGID_ROW, last + 3, "note"),
  ];
}
