/**
 * The text of a chemical equation taken apart: `CH4 + 2 O2 = CO2 + 2 H2O(g)`.
 *
 * Sides stand apart by `=`, `->`, `→`, `⇌`, `<=>` and their like. Terms stand apart by a plus with a blank before it, or by a plus that
 * cannot be a charge because a coefficient or a species follows (`Fe^3+ + e-`, `H2+O2`, but `Ca+2 + SO4^2-`).
 * A coefficient is whole (2), decimal (0.5) or a fraction (1/2, ½, 1½), with or without a blank after it; left out it is 1.
 * What a term names is left to the caller: a formula, or a name such as `carbon dioxide`.
 */
import { refuse } from "../refusal";

/** One term of a side, its species as typed. */
export interface Term {
  /** Above 0. */
  readonly coefficient: number;
  readonly species: string;
}

/** An equation as written. The same species may stand on both sides. */
export interface Equation {
  readonly left: readonly Term[];
  readonly right: readonly Term[];
}

const LONGEST = 2000;
const EXAMPLE = '"CH4 + 2 O2 = CO2 + 2 H2O"';

const ARROW = /\s*(?:<=>|<->|[⇌⇄⇆↔→⟶⇒⟹]|=>|\s--+>|->|=+)\s*/;
const NUMBER = String.raw`(?:\d+\s*\/\s*\d+|\d+\.?\d*|\.\d+)`;
/** Begins a species; a bracket with small letters alone is the phase of an ion before it, as in `Na+(aq)`. */
const SPECIES_START = String.raw`(?:[A-Za-z[{]|\((?![a-z]+[,)]))`;
const PLUS = new RegExp(String.raw`\s+\+\s*|\+\s*(?=(?:${NUMBER}\s*)?${SPECIES_START})`);
const COEFFICIENT = new RegExp(String.raw`^(${NUMBER})(?:\s+|(?=${SPECIES_START}))(\S.*)$`);

/**
 * Reads an equation. Refuses, naming what was read: no equals sign or arrow, or several; an empty side; a plus with nothing beside it;
 * a coefficient that is not above 0, has a decimal comma, or stands alone; a text of more than 2000 characters.
 */
export function parseEquation(text: string): Equation {
  const written = text.trim();
  if (written === "") refuse(`The equation is empty; write a text such as ${EXAMPLE}`);
  if (written.length > LONGEST) refuse(`The equation has ${written.length} characters; at most ${LONGEST} are read`);
  const sides = withPlainFractions(written).split(ARROW);
  if (sides.length === 1) refuse(`"${shortened(written)}" has no equals sign or arrow; write reactants = products, such as ${EXAMPLE}`);
  if (sides.length > 2) refuse(`"${shortened(written)}" has ${sides.length - 1} equals signs or arrows; an equation has one`);
  return { left: termsOf(sides[0]!, "left", written), right: termsOf(sides[1]!, "right", written) };
}

/** Numerator and denominator of the fractions that stand in one sign. */
const FRACTIONS: Readonly<Record<string, readonly [number, number]>> = {
  "½": [1, 2],
  "⅓": [1, 3],
  "⅔": [2, 3],
  "¼": [1, 4],
  "¾": [3, 4],
  "⅕": [1, 5],
  "⅙": [1, 6],
  "⅛": [1, 8],
};
const ONE_SIGN = /(^|[\s+=>→])(\d*)\s?([½⅓⅔¼¾⅕⅙⅛])/g;

/** `½ O2` as `1/2 O2`, `1½ O2` as `3/2 O2`. */
function withPlainFractions(text: string): string {
  return text.replace(ONE_SIGN, (_, before: string, whole: string, sign: string) => {
    const [over, under] = FRACTIONS[sign]!;
    return `${before}${Number(whole) * under + over}/${under}`;
  });
}

/** Terms as text, `2 H2 + O2`; a coefficient of 1 is left out. */
export function sideText(terms: readonly { readonly coefficient: number | bigint; readonly species: string }[]): string {
  return terms.map(({ coefficient, species }) => (String(coefficient) === "1" ? species : `${coefficient} ${species}`)).join(" + ");
}

/** Both sides as text, `2 H2 + O2 = 2 H2O`. */
export function equationText({ left, right }: Equation): string {
  return `${sideText(left)} = ${sideText(right)}`;
}

function termsOf(side: string, which: string, written: string): Term[] {
  if (side.trim() === "") refuse(`The ${which} side of "${shortened(written)}" is empty`);
  // A plus at the beginning of a side has no blank before it once the side is trimmed.
  const terms = side.trim().replace(/^\+/, " +").split(PLUS);
  if (terms.some((term) => term.trim() === ""))
    refuse(`The ${which} side of "${shortened(written)}" has a plus sign with nothing beside it`);
  return terms.map((term) => termOf(term.trim()));
}

function termOf(text: string): Term {
  const match = COEFFICIENT.exec(text);
  if (match) {
    const [, number, species] = match as unknown as [string, string, string];
    refuseSecondNumber(text, species);
    return { coefficient: coefficientOf(number, species), species };
  }
  if (/^\d+,\d+(?:\s|[A-Z[({])/.test(text)) refuse(`The coefficient in "${text}" has a decimal comma; write ${text.replace(",", ".")}`);
  if (/^[-−–]\s*[\d.]/.test(text)) refuse(`The coefficient in "${text}" is negative; a species that is used up stands on the left`);
  if (/^[\d./\s]+$/.test(text)) refuse(`"${text}" is a coefficient without a species`);
  return { coefficient: 1, species: text };
}

function refuseSecondNumber(text: string, species: string): void {
  if (COEFFICIENT.test(species)) refuse(`"${text}" has two numbers before the species; write one, such as 1.5 or 3/2`);
}

function coefficientOf(number: string, species: string): number {
  const [over, under = "1"] = number.split("/");
  const value = Number(over) / Number(under);
  if (value > 0 && Number.isFinite(value)) return value;
  return refuse(`The coefficient ${number} of ${species} is not a number above 0`);
}

const SHOWN = 80;

function shortened(text: string): string {
  return text.length > SHOWN ? `${text.slice(0, SHOWN)}…` : text;
}
