// @ts-check
/**
 * The sheet "One mixture": adiabatic combustion of four fuels at constant volume, to be checked against printed figures; a complete reaction
 * in a rigid vessel; the whole table of one mixture, last because its length depends on the mixture.
 */
import { filled, formula, heading, letter, line, looks, text } from "./sample-cells.mjs";

/** @typedef {import("./sample-writer.mjs").SampleSheet} SampleSheet */

const FUELS = ["CH4", "H2", "C3H8", "CO"];

/** First rows: of the fuels, of the reaction's table, of the mixture's table; rows that the tables take. */
export const CHECK_ROW = 10;
export const REACTION_ROW = CHECK_ROW + FUELS.length + 7;
const REACTION_ROWS = 16;
export const BURN_ROW = REACTION_ROW + REACTION_ROWS + 9;
const BURN_ROWS = 30;

/** @returns {SampleSheet} */
export function mixtureSheet() {
  return {
    name: "One mixture",
    widths: [34, 33, 20, 20, 20],
    heights: { 1: 24 },
    cells: [...checks(), ...reaction(), ...mixture()],
  };
}

function checks() {
  const last = CHECK_ROW + FUELS.length - 1;
  const states = `A${CHECK_ROW}:A${last},B4,1,B5,"1 atm"`;
  return [
    text("A1", "One mixture in full", "title"),
    text("A2", "Stoichiometric mixtures at 298.15 K and 1 atm; ten species only, as printed comparisons take them.", "note"),
    text("A4", "Oxidant"),
    text("B4", "O2 + 3.76 N2", "inputText"),
    text("A5", "Temperature before, K"),
    { at: "B5", number: 298.15, look: "inputTwo" },
    text("A6", "Species"),
    text("B6", "CO2 CO H2O H2 O2 N2 OH NO H O", "text"),
    ...heading(CHECK_ROW - 2, ["Fuel", "Temperature", "Pressure ratio", "Temperature", "Pressure ratio"], "headingRight", "headingRight"),
    ...["", "K, equilibrium", "equilibrium", "K, no dissociation", "no dissociation"].map((unit, i) =>
      text(`${letter(i)}${CHECK_ROW - 1}`, unit, "unitRight"),
    ),
    text("C4", "without dissociation: an estimate; not a bound", "note"),
    ...FUELS.map((fuel, i) => text(`A${CHECK_ROW + i}`, fuel, "inputText")),
    ...filled("B", CHECK_ROW, last, `STILL.BURN.TEMPERATURE(${states},B6)`, "one"),
    ...filled("C", CHECK_ROW, last, `STILL.BURN.PRESSURE(${states},B6,"atm")`, "three"),
    ...filled("D", CHECK_ROW, last, `STILL.BURN.TEMPERATURE(${states},"complete")`, "one"),
    ...filled("E", CHECK_ROW, last, `STILL.BURN.PRESSURE(${states},"complete","atm")`, "three"),
  ];
}

function reaction() {
  const last = REACTION_ROW + REACTION_ROWS - 1;
  return [
    ...heading(REACTION_ROW - 5, ["A complete reaction in a rigid vessel", "", "", "", ""]),
    text(`A${REACTION_ROW - 4}`, "Reaction"),
    text(`B${REACTION_ROW - 4}`, "CH4 + 3 O2 = CO2 + 2 H2O + O2", "inputLabel"),
    ...line(REACTION_ROW - 3, "Before", 298.15, "inputTwo", "K, 1 atm"),
    ...line(REACTION_ROW - 2, "After", 1000, "input", "K"),
    formula(
      `A${REACTION_ROW}`,
      `STILL.REACTION.RIGID(B${REACTION_ROW - 4},B${REACTION_ROW - 3},"1 atm",B${REACTION_ROW - 2})`,
      "text",
      `A${REACTION_ROW}:D${last}`,
    ),
    ...looks("A", REACTION_ROW + 1, last, "text"),
    ...looks("B", REACTION_ROW, REACTION_ROW, "text"),
    ...looks("B", REACTION_ROW + 1, REACTION_ROW + 8, "two"),
    ...looks("B", REACTION_ROW + 9, REACTION_ROW + 9, "whole"),
    ...looks("B", REACTION_ROW + 10, last, "four"),
    ...looks("C", REACTION_ROW, last, "unit"),
    ...looks("D", REACTION_ROW, last, "note"),
  ];
}

function mixture() {
  const last = BURN_ROW + BURN_ROWS - 1;
  return [
    ...heading(BURN_ROW - 7, ["A mixture, every species that its elements allow", "", "", "", ""]),
    ...line(BURN_ROW - 6, "Fuel", "CH4", "inputText", ""),
    ...line(BURN_ROW - 5, "Oxidant", "air", "inputText", ""),
    ...line(BURN_ROW - 4, "Equivalence ratio", 1, "inputTwo", ""),
    ...line(BURN_ROW - 3, "Temperature before", "25 °C", "inputText", ""),
    ...line(BURN_ROW - 2, "Pressure before, absolute", "1.013 bar", "inputText", ""),
    formula(
      `A${BURN_ROW}`,
      `STILL.BURN(B${BURN_ROW - 6},B${BURN_ROW - 5},B${BURN_ROW - 4},B${BURN_ROW - 3},B${BURN_ROW - 2})`,
      "text",
      `A${BURN_ROW}:D${last}`,
    ),
    ...looks("A", BURN_ROW + 1, last, "text"),
    ...looks("B", BURN_ROW, BURN_ROW + 1, "whole"),
    ...looks("B", BURN_ROW + 2, BURN_ROW + 4, "three"),
    ...looks("B", BURN_ROW + 5, BURN_ROW + 5, "text"),
    ...looks("B", BURN_ROW + 6, last, "scientific"),
    ...looks("C", BURN_ROW, last, "unit"),
    ...looks("D", BURN_ROW, last + 3, "note"),
  ];
}
