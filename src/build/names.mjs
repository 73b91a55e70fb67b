// @ts-check
/**
 * What the platform asks of a function's name: at least three characters, the first a letter, and neither a cell address
 * nor a command of the old macro sheets (a cell would call the command). Source: the platform's naming rules for custom
 * functions; the list of macro commands is that of the binary workbook format's function tables.
 */
import { MACRO_COMMANDS } from "./macro-commands.mjs";

/** Last column of a worksheet, XFD, as a number. */
const LAST_COLUMN = 16384;
const LAST_ROW = 1048576;

/**
 * The rule that a name breaks, as the end of a sentence; undefined for a good name.
 * @param {string} id
 * @returns {string | undefined}
 */
export function brokenRule(id) {
  if (id.length < 3) return "has fewer than 3 characters";
  if (!/^[A-Z]/.test(id)) return "does not start with a capital letter";
  if (!/^[A-Z0-9]+(\.[A-Z0-9]+)*$/.test(id)) return "holds something else than capitals, digits and single dots between them";
  if (isAddress(id)) return "reads as a cell address";
  if (MACRO_COMMANDS.has(id)) return "is a command of the old macro sheets";
  return undefined;
}

/** @param {string} id */
function isAddress(id) {
  if (/^R(\d+)?(C(\d+)?)?$|^C(\d+)?$/.test(id)) return true;
  const match = /^([A-Z]{1,3})(\d{1,7})$/.exec(id);
  if (!match?.[1] || !match[2]) return false;
  const column = [...match[1]].reduce((sum, letter) => sum * 26 + letter.charCodeAt(0) - 64, 0);
  const row = Number(match[2]);
  return column <= LAST_COLUMN && row >= 1 && row <= LAST_ROW;
}

/**
 * The name of the TypeScript function that belongs to an id: `CV.AT` -> `cvAt`.
 * @param {string} id
 */
export function camelCase(id) {
  return id
    .toLowerCase()
    .split(".")
    .map((part, at) => (at === 0 ? part : part.charAt(0).toUpperCase() + part.slice(1)))
    .join("");
}

/**
 * The form in which a workbook file stores a name; two functions must not meet in it: `CV.AT` -> `CV_AT`.
 * @param {string} id
 */
export function storedName(id) {
  return id.replaceAll(".", "_");
}
