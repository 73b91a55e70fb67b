// @ts-check
/** The cells of the sample workbooks in a few words: texts, given values, formulas, headings, lines of label, value, unit and note. */

/** @typedef {import("./sample-writer.mjs").SampleCell} SampleCell */

/** @param {string} at @param {string} text @param {string} [look] @returns {SampleCell} */
export const text = (at, text, look = "label") => (text === "" ? { at, look } : { at, text, look });
/** @param {string} at @param {number} number @param {string} [look] @returns {SampleCell} */
export const given = (at, number, look = "input") => ({ at, number, look });
/** @param {string} at @param {string} formula @param {string} look @param {string} [fills] @returns {SampleCell} */
export const formula = (at, formula, look, fills) => ({ at, formula, look, ...(fills ? { fills } : {}) });
/** Cells of a heading row, the first with a look of its own. @param {number} row @param {readonly string[]} words @param {string} [look] @param {string} [first] @returns {SampleCell[]} */
export const heading = (row, words, look = "heading", first = "heading") =>
  words.map((word, i) => text(`${letter(i)}${row}`, word, i === 0 ? first : look));
/** @param {number} index */
export const letter = (index) => "ABCDEFGHIJKLMNOPQRSTUVWXYZ"[index] ?? "";
/** Looks of the cells that a spilled block fills. @param {string} columns @param {number} from @param {number} to @param {string} look */
export const looks = (columns, from, to, look) =>
  [...columns].flatMap((column) => Array.from({ length: to - from + 1 }, (_, i) => ({ at: `${column}${from + i}`, look })));

/** A column of results that one formula fills. @param {string} column @param {number} from @param {number} to @param {string} body @param {string} look */
export const filled = (column, from, to, body, look) => [
  formula(`${column}${from}`, body, look, `${column}${from}:${column}${to}`),
  ...looks(column, from + 1, to, look),
];

/** Cells in °C as kelvin. @param {string} cells */
export const kelvin = (cells) => `STILL.UNITS(${cells},"°C","K")`;
/** One column of a table with a heading row, found by its heading, which stands above its numbers. @param {string} table @param {string} title */
export const tableColumn = (table, title) => `INDEX(${table},0,MATCH("${title}",INDEX(${table},1,0),0))`;

/** What shares of an allowed pressure are remarked with; `error` for those that are refused. @param {string} shares @param {string} [error] */
export function remark(shares, error) {
  const words = `IF(${shares}>1.2,"far above allowed",IF(${shares}>1,"above allowed",IF(${shares}>0.9,"above 0.9 of it","")))`;
  return error === undefined ? words : `IF(ISERROR(${shares}),"${error}",${words})`;
}

/** A line: label, value or formula, unit, note. @param {number} row @param {string} label @param {string | number} value @param {string} look @param {string} unit @param {string} [note] @returns {SampleCell[]} */
export function line(row, label, value, look, unit, note = "") {
  const at = `B${row}`;
  const middle =
    typeof value === "number" ? given(at, value, look) : value.startsWith("=") ? formula(at, value.slice(1), look) : text(at, value, look);
  return [text(`A${row}`, label), middle, text(`C${row}`, unit, "unit"), ...(note ? [text(`D${row}`, note, "note")] : [])];
}
