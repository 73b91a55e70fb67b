// @ts-check
/**
 * The sheet "Dust": a coal dust in air by its gross value, over the concentration.
 *   ratio = c (1 − ash) / M · O2 for a mole of the combustible / (x(O2) P / (R T)),   CHhOoNnSs: O2 = 1 + h/4 − o/2 + s
 * c in g/m3, M in g/mol of the combustible matter; the air fills the vessel, the dust takes no room.
 */
import { filled, given, heading, letter, line, text } from "./sample-cells.mjs";

/** @typedef {import("./sample-writer.mjs").SampleSheet} SampleSheet */

/** g/m3. */
const CONCENTRATIONS = [60, 90, 120, 150, 180, 250, 350, 500, 750];

export const DUST_ROW = 22;
const LAST = DUST_ROW + CONCENTRATIONS.length - 1;

/** @returns {SampleSheet} */
export function dustSheet() {
  const c = `A${DUST_ROW}:A${LAST}`;
  const states = `B11,B14,B${DUST_ROW}:B${LAST},STILL.UNITS(B12,"°C","K"),STILL.UNITS(B13,"bar","Pa")`;
  return {
    name: "Dust",
    widths: [32, 18, 16, 16, 16, 18],
    heights: { 1: 24, 2: 39 },
    merged: ["A2:D2"],
    cells: [
      text("A1", "A dust by its gross value", "title"),
      text(
        "A2",
        "The dust is invented. Calculated as if all of it came to equilibrium. Real dusts burn in part, and the highest pressure of a coal is measured at several times the ratio 1 (common experience), where this equilibrium has left its peak: no substitute for tests.",
        "remark",
      ),
      ...heading(4, ["Dust, dry", "", "", "", "", ""]),
      ...line(5, "Hydrogen for one carbon", 0.8, "input", "mol"),
      ...line(6, "Oxygen for one carbon", 0.1, "input", "mol"),
      ...line(7, "Nitrogen for one carbon", 0.015, "input", "mol"),
      ...line(8, "Sulfur for one carbon", 0.005, "input", "mol"),
      ...line(9, "Ash", 8, "input", "%"),
      ...line(10, "Gross value, with its ash", "30.1 MJ/kg", "inputText", ""),
      ...line(11, "Fuel", '=STILL.BURN.FUEL(B16,B10,"cr",B9)', "text", ""),
      ...line(12, "Temperature before", 25, "inputOne", "°C"),
      ...line(13, "Pressure before, absolute", 1.013, "inputThree", "bar"),
      ...line(14, "Oxidant", "air", "inputText", ""),
      ...line(16, "Combustible matter", '=SUBSTITUTE("CH"&B5&"O"&B6&"N"&B7&"S"&B8,",",".")', "text", ""),
      ...line(17, "Oxygen it needs", "=1+B5/4-B6/2+B8", "four", "mol/mol", "carbon to CO2, hydrogen to H2O, sulfur to SO2"),
      ...line(
        18,
        "Oxygen in the air",
        '=VLOOKUP("O2",STILL.MIX.TABLE(B14),2,FALSE)*STILL.UNITS(B13,"bar","Pa")/(8.31446261815324*STILL.UNITS(B12,"°C","K"))',
        "four",
        "mol/m3",
        "x P / (R T)",
      ),
      ...heading(DUST_ROW - 2, ["Concentration", "Ratio", "Pressure", "Temperature", "CO", "Soot"], "headingRight", "headingRight"),
      ...["g/m3", "fuel to air", "bar, absolute", "K", "%, mol", "mol to 100 mol gas"].map((unit, i) =>
        text(`${letter(i)}${DUST_ROW - 1}`, unit, "unitRight"),
      ),
      ...CONCENTRATIONS.map((value, i) => given(`A${DUST_ROW + i}`, value)),
      ...filled("B", DUST_ROW, LAST, `${c}*(1-B9/100)/STILL.MOLARMASS(B16)*B17/B18`, "three"),
      ...filled("C", DUST_ROW, LAST, `STILL.BURN.PRESSURE(${states},,"bar")`, "two"),
      ...filled("D", DUST_ROW, LAST, `STILL.BURN.TEMPERATURE(${states})`, "whole"),
      ...filled("E", DUST_ROW, LAST, `100*STILL.BURN.FRACTION(${states},"CO")`, "two"),
      ...filled("F", DUST_ROW, LAST, `100*STILL.BURN.FRACTION(${states},"C(gr)")`, "two"),
    ],
    charts: [
      {
        anchor: `A${LAST + 2}:D${LAST + 22}`,
        title: "A dust, calculated",
        x: { title: "concentration, g/m3", from: 0, to: 800 },
        y: { title: "absolute pressure, bar", from: 0, to: 10 },
        series: [{ name: "equilibrium", x: c, y: `C${DUST_ROW}:C${LAST}`, style: "line", accent: 1 }],
      },
    ],
  };
}
