/**
 * Ions whose number before a bare sign may be atoms or charge: `Fe2+`, `SO42-`, `[Fe(CN)6]3-`. Formulas read it as a count of atoms, most
 * people mean a charge; an equation would balance either way, so these are refused and both ways of writing are told.
 */
import { refuse } from "../core/refusal";

/** Elements whose charged molecules are common (H2+, N2+, O2-, I3-): their number is a count of atoms. */
const MOLECULAR = new Set("H He B C N O F Ne Si P Cl Ar Se Br Kr Te I Xe".split(" "));

/** Refuses an ion whose number before the sign can be read in two ways. */
export function refuseUnclearCharge(text: string): void {
  const match = /^(.*[^^])(\d)([+\-−–])((?:\([a-z]+\))?)$/.exec(text.replace(/\s+/g, ""));
  if (!match) return;
  const [, base = "", digit = "", sign = "", phase = ""] = match;
  const isAtom = /^[A-Z][a-z]?$/.test(base) && !MOLECULAR.has(base);
  const isLongCount = /\d$/.test(base) && /[234]/.test(digit);
  if (!isAtom && !isLongCount && !base.endsWith("]")) return;
  refuse(
    `"${text}" can be read in two ways; write ${base}^${digit}${sign}${phase} for the charge ${digit}${sign}, or ${base}${digit}^${sign}${phase} for the charge ${sign} alone`,
  );
}
