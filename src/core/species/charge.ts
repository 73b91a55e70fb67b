import { refuse } from "../refusal";

/** More than this is a slip of the pen. */
const LARGEST_CHARGE = 20;

/**
 * Takes a charge off the end: `^2-`, `^-2`, `^+`, `(2+)`, or bare signs `+`, `-`, `++`, with a number after the sign (`Ca+2`).
 * A number before a bare sign counts atoms, as in `NH4+` and `N2+`: iron(III) is `Fe^3+` or `Fe+3`.
 */
export function takeCharge(text: string): { readonly rest: string; readonly charge: number } {
  const match = /^(.*?)(?:\^(\d*)([+-]+)|\^([+-])(\d+)|\((\d*)([+-])\)|([+-]+)|([+-])(\d+))$/.exec(text);
  if (!match) {
    if (text.includes("^")) refuse(`The charge in "${text}" is not understood; write it as ^2- or ^+`);
    return { rest: text, charge: 0 };
  }
  const rest = match[1]!;
  const signs = match[3] ?? match[4] ?? match[7] ?? match[8] ?? match[9]!;
  const digits = match[2] || match[5] || match[6] || match[10];
  const size = digits === undefined || digits === "" ? signs.length : Number(digits);
  if (/\+-|-\+/.test(signs) || (digits && signs.length > 1)) refuse(`The charge in "${text}" is not understood; write it as ^2- or ^+`);
  if (size === 0 || size > LARGEST_CHARGE) refuse(`The charge ${digits ?? signs} in "${text}" is not between 1 and ${LARGEST_CHARGE}`);
  return { rest, charge: signs.startsWith("-") ? -size : size };
}
