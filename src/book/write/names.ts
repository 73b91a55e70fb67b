/** Rules for names of sheets and of defined names, as Excel has them. */
import { refuse } from "../../core/refusal";
import { placeOf } from "../address";

/** Refuses sheet names Excel would not open: too long, forbidden characters, twice the same (case does not count). */
export function checkSheetNames(names: readonly string[]): void {
  if (names.length === 0) refuse("A workbook needs at least one sheet");
  const seen = new Set<string>();
  for (const name of names) {
    if (name.length < 1 || name.length > 31) refuse(`The sheet name "${name}" has ${name.length} characters; 1 to 31 are allowed`);
    if (/[[\]:*?/\\]|^'|'$/.test(name)) refuse(`The sheet name "${name}" holds one of [ ] : * ? / \\ or begins or ends with '`);
    if (seen.has(name.toLowerCase())) refuse(`The workbook has two sheets named "${name}"`);
    seen.add(name.toLowerCase());
  }
}

/** Refuses a defined name Excel would not open. */
export function checkDefinedName(name: string): void {
  if (name.length > 255 || !/^[\p{L}_\\][\p{L}\p{N}_.\\?]*$/u.test(name))
    refuse(`"${name}" cannot be a name: letters, digits, _ and . only, beginning with a letter or _`);
  if (placeOf(name) || /^[rc]$/i.test(name) || /^r\d*c\d*$/i.test(name)) refuse(`"${name}" cannot be a name: it reads as a cell address`);
}

/** Sheet name as a formula spells it: in quotes unless it is a plain word. */
export function quotedSheet(name: string): string {
  const plain = /^[\p{L}_][\p{L}\p{N}_.]*$/u.test(name) && !placeOf(name) && !/^(r\d*c?\d*|c\d*|true|false)$/i.test(name);
  return plain ? name : `'${name.replace(/'/g, "''")}'`;
}
