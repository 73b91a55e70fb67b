// @ts-check
/** The sample "heat in a sealed vessel": an invented laboratory's small job, where its numbers come from, and units and mixtures. */

import { formula, heading, line, text } from "./sample-cells.mjs";

/** @typedef {import("./sample-writer.mjs").SampleSheet} SampleSheet */

const INVENTED =
  "An invented fuel laboratory and its closed vessels: no real place, people or equipment. Composition is held fixed and walls are not counted. " +
  "Not a design or relief calculation: the vessel's own rating, local codes and licensed practice govern.";

/** @returns {SampleSheet[]} */
export const heatBook = () => [vesselSheet(), sourcesSheet(), mixtureSheet()];

const TEMPERATURES = [400, 600, 900, 1300, 1800, 2500, 3500, 5000, 25];

/** @returns {SampleSheet} */
function vesselSheet() {
  const first = 35;
  const last = first + TEMPERATURES.length - 1;
  const range = `A${first}:A${last}`;
  return {
    name: "Sealed vessel",
    widths: [32, 13, 21, 23, 46],
    heights: { 1: 24, 2: 39, 32: 24 },
    merged: ["A2:D2"],
    cells: [
      text("A1", "Heat in a sealed vessel", "title"),
      text("A2", INVENTED, "remark"),
      text("A3", "Try it: a formula from the pane"),
      { at: "B3", look: "inputThree" },
      ...heading(4, ["Given", "", "", "", ""]),
      ...line(5, "Vessel volume", 2, "input", "L"),
      ...line(6, "Gas", "N2", "inputText", "", "try CO2, air, or 0.79 N2 + 0.21 O2"),
      ...line(7, "Temperature at the start", 25, "input", "°C"),
      ...line(8, "Filling pressure, absolute", 3, "input", "bar"),
      ...line(9, "Temperature to reach", 400, "input", "°C"),
      ...line(10, "Heat supplied", 1500, "input", "J"),
      ...heading(12, ["Charge", "", "", "", ""]),
      ...line(13, "Start", '=STILL.UNITS(B7,"°C","K")', "two", "K"),
      ...line(14, "Target", '=STILL.UNITS(B9,"°C","K")', "two", "K"),
      ...line(
        15,
        "Amount of gas",
        '=STILL.UNITS(B8,"bar","Pa")*STILL.UNITS(B5,"L","m3")/(8.31446261815324*B13)',
        "four",
        "mol",
        "ideal gas: p V / (R T)",
      ),
      ...line(16, "Mass of gas", "=B15*STILL.MOLARMASS(B6)", "three", "g"),
      ...heading(18, ["Heat to reach the target", "", "", "", ""]),
      ...line(19, "Heat at constant volume", "=STILL.HEAT(B6,B15,B13,B14)", "bold", "J", "n (U2 - U1), Cv changing with temperature"),
      ...line(20, "Cv at the start", "=STILL.CV.AT(B6,B13)", "three", "J/(mol K)"),
      ...line(21, "Mean Cv, start to target", "=STILL.CV.MEAN(B6,B13,B14)", "three", "J/(mol K)"),
      ...line(22, "Heat by the short cut", "=B15*B20*(B14-B13)", "one", "J", "Cv held at its value at the start"),
      ...line(23, "Error of the short cut", "=B22/B19-1", "percent", ""),
      ...line(24, "Pressure at the target", "=B8*B14/B13", "three", "bar", "ideal gas, absolute"),
      ...heading(26, ["Temperature from the heat supplied", "", "", "", ""]),
      ...line(27, "Final temperature", "=STILL.HEAT.FINALTEMP(B6,B15,B13,B10)", "two", "K"),
      ...line(28, "Final temperature", '=STILL.UNITS(B27,"K","°C")', "bold", "°C"),
      ...line(29, "By the short cut", '=STILL.UNITS(B13+B10/(B15*B20),"K","°C")', "one", "°C"),
      ...line(30, "Short cut too high by", "=B29-B28", "two", "K"),
      text("A32", "How far the short cut drifts", "title"),
      ...heading(33, ["Temperature", "Cv", "Mean Cv from start", "Error of the short cut", ""], "headingRight", "headingRight"),
      text("A34", "K", "unitRight"),
      text("B34", "J/(mol K)", "unitRight"),
      text("C34", "J/(mol K)", "unitRight"),
      ...TEMPERATURES.map((number, i) => ({ at: `A${first + i}`, number, look: "input" })),
      ...TEMPERATURES.map((_, i) => formula(`D${first + i}`, `IF(ISERROR(C${first + i}),"refused",$B$20/C${first + i}-1)`, "percent")),
      formula(`B${first}`, `STILL.CV.AT(B6,${range})`, "three", `B${first}:B${last}`),
      formula(`C${first}`, `STILL.CV.MEAN(B6,B13,${range})`, "three", `C${first}:C${last}`),
      ...TEMPERATURES.slice(1).flatMap((_, i) => ["B", "C"].map((column) => ({ at: `${column}${first + 1 + i}`, look: "three" }))),
      text(`E${last}`, `a Celsius value where kelvin belong: select B${last} to read why it is refused`, "note"),
    ],
  };
}

const SPECIES = ["N2", "O2", "CO2", "H2O", "Ar", "CH4", "CO", "H2"];
/** Number of sets that hold carbon dioxide, and the heading row. */
const SET_ROWS = 5;

/** @returns {SampleSheet} */
function sourcesSheet() {
  const last = 4 + SPECIES.length;
  const sets = last + 5;
  const compare = sets + SET_ROWS + 2;
  return {
    name: "Sources",
    widths: [18, 12, 12, 12, 10, 60, 60],
    heights: { 1: 24, [last + 2]: 24, [compare]: 24 },
    cells: [
      text("A1", "Where the numbers come from", "title"),
      text(
        "A2",
        "Each number of Stillwall has a source, a range of temperatures and a grade: A, B or C. These cells ask for them.",
        "note",
      ),
      ...heading(4, ["Species", "From, K", "To, K", "", "Grade", "Source", ""]),
      ...SPECIES.map((species, i) => text(`A${5 + i}`, species, "inputLabel")),
      formula("B5", `STILL.SOURCE.RANGE(A5:A${last})`, "whole", `B5:C${last}`),
      ...SPECIES.map((_, i) => formula(`E${5 + i}`, `INDEX(STILL.SOURCE(A${5 + i}),1,2)`, "text")),
      ...SPECIES.map((_, i) => formula(`F${5 + i}`, `INDEX(STILL.SOURCE(A${5 + i}),1,1)`, "text")),
      text(`A${last + 2}`, "Every set that holds", "title"),
      text(`A${last + 3}`, "Species"),
      text(`B${last + 3}`, "CO2", "inputText"),
      formula(`A${sets}`, `STILL.SOURCE.SETS(B${last + 3})`, "text", `A${sets}:G${sets + SET_ROWS - 1}`),
      text(`A${compare}`, "The same Cv from two sets, 1500 K", "title"),
      text(`A${compare + 1}`, "nasa-2002"),
      formula(`B${compare + 1}`, 'STILL.CV.AT("CO2",1500,"J/(mol K)","nasa-2002")', "three"),
      text(`A${compare + 2}`, "gri-1999"),
      formula(`B${compare + 2}`, 'STILL.CV.AT("CO2",1500,"J/(mol K)","gri-1999")', "three"),
      text(`A${compare + 3}`, "Difference"),
      formula(`B${compare + 3}`, `B${compare + 2}/B${compare + 1}-1`, "percent"),
    ],
  };
}

/** value, from, to; the last is refused because "cal" alone could be any of several calories. @type {readonly (readonly [number, string, string])[]} */
const CONVERSIONS = [
  [25, "°C", "K"],
  [30, "atm", "MPa"],
  [1, "Btu_IT", "J"],
  [1, "cal_th", "J"],
  [6.5, "kcal_IT/g", "MJ/kg"],
  [1, "cal", "J"],
];
/** Burnt gas of the invented laboratory's furnace, in mol. @type {readonly (readonly [string, number])[]} */
const BURNT = [
  ["N2", 71.5],
  ["H2O", 18.2],
  ["CO2", 9.1],
  ["O2", 1.2],
];

/** @returns {SampleSheet} */
function mixtureSheet() {
  const conversionsEnd = 4 + CONVERSIONS.length;
  const gauge = conversionsEnd + 2;
  const mix = gauge + 4;
  const mixEnd = mix + BURNT.length;
  const results = mixEnd + 2;
  return {
    name: "Units and mixtures",
    widths: [30, 16, 16, 16, 60],
    heights: { 1: 24 },
    cells: [
      text("A1", "Units and mixtures", "title"),
      text(
        "A2",
        "One formula converts the whole table; the last row is refused because several calories exist: select D10 to read more.",
        "note",
      ),
      ...heading(4, ["Value", "From", "To", "Result"], "headingRight", "headingRight"),
      ...CONVERSIONS.flatMap(([number, from, to], i) => [
        { at: `A${5 + i}`, number, look: "input" },
        text(`B${5 + i}`, from, "inputText"),
        text(`C${5 + i}`, to, "inputText"),
        ...(i > 0 ? [{ at: `D${5 + i}`, look: "four" }] : []),
      ]),
      formula("D5", `STILL.UNITS(A5:A${conversionsEnd},B5:B${conversionsEnd},C5:C${conversionsEnd})`, "four", `D5:D${conversionsEnd}`),
      text(`A${gauge}`, "Gauge reading, bar"),
      { at: `B${gauge}`, number: 29.2, look: "input" },
      text(`A${gauge + 1}`, "Absolute pressure, MPa"),
      formula(`B${gauge + 1}`, `STILL.UNITS.ABSOLUTE(B${gauge},"bar","MPa","985 mbar")`, "four"),
      text(`A${mix}`, "Burnt gas (invented)", "heading"),
      text(`B${mix}`, "Amount, mol", "headingRight"),
      ...BURNT.flatMap(([species, number], i) => [
        text(`A${mix + 1 + i}`, species, "inputLabel"),
        { at: `B${mix + 1 + i}`, number, look: "input" },
      ]),
      text(`A${results}`, "As mixture text"),
      formula(`B${results}`, `STILL.MIX(A${mix + 1}:A${mixEnd},B${mix + 1}:B${mixEnd},"mole","normalise")`, "text"),
      text(`A${results + 1}`, "Molar mass, g/mol"),
      formula(`B${results + 1}`, `STILL.MOLARMASS(B${results})`, "three"),
      text(`A${results + 2}`, "Cv at 1200 K, J/(mol K)"),
      formula(`B${results + 2}`, `STILL.CV.AT(B${results},1200)`, "three"),
      text(`A${results + 3}`, "Cp/Cv at 1200 K"),
      formula(`B${results + 3}`, `STILL.GAMMA(B${results},1200)`, "four"),
      text(`A${results + 4}`, "Heat, 300 K to 1200 K, kJ/kg"),
      formula(`B${results + 4}`, `STILL.CV.INTEGRAL(B${results},300,1200,"kJ/kg")`, "one"),
      text(`A${results + 6}`, "Air at 22 °C, 45 % humidity"),
      formula(`B${results + 6}`, 'STILL.MIX.HUMIDAIR("22 °C",101325,"45 %")', "text"),
      formula(`A${results + 8}`, `STILL.MIX.TABLE(B${results})`, "text", `A${results + 8}:C${results + 8 + BURNT.length}`),
      ...BURNT.flatMap((_, i) => ["B", "C"].map((column) => ({ at: `${column}${results + 9 + i}`, look: "four" }))),
    ],
  };
}
