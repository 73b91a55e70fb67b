import { refuse } from "../refusal";
import { takeCharge } from "./charge";
import { countAtoms } from "./formula-groups";
import { takePhase } from "./phase";
import type { Phase } from "./types";

/** A chemical formula taken apart. */
export interface Formula {
  /** Atoms of each element; whole or broken numbers above 0. Empty for the electron. */
  readonly counts: ReadonlyMap<string, number>;
  /** Charge in units of the elementary charge; −2 for SO4^2-. */
  readonly charge: number;
  /** Phase of the suffix, if there is one: (s), (cr) and (gr) are "cr"; none for (aq). */
  readonly phase?: Phase;
  /** The suffix as written, without brackets: `gr`, `aq`, `cr,alpha`. */
  readonly suffix?: string;
}

const LONGEST = 200;

/**
 * Reads a chemical formula: `Ca(OH)2`, `K3[Fe(CN)6]`, `CuSO4·5H2O` (also `*`, or a full stop before water), `SO4^2-`, `NH4+`, `e-`,
 * `e^-`, `H2O(l)`, `H₂O`, `CH1.686O0.843`. Spaces around it do not count.
 *
 * Refuses names and prefixes (`n-C4H10`), unknown elements, brackets that do not match and counts that are not above 0,
 * each with one sentence.
 */
export function parseFormula(text: string): Formula {
  const written = plainSigns(text);
  if (written === "") refuse("The formula is empty");
  if (written.length > LONGEST) refuse(`The formula has ${written.length} characters; at most ${LONGEST} are read`);
  const { rest: withCharge, phase, suffix } = takePhase(written);
  if (/^e\^?-$/.test(withCharge)) return formula(new Map(), -1, phase, suffix);
  refuseName(withCharge, written);
  const { rest, charge } = takeCharge(withCharge);
  if (rest === "") refuse(`"${written}" names no element`);
  return formula(countAtoms(rest, written), charge, phase, suffix);
}

function formula(counts: ReadonlyMap<string, number>, charge: number, phase: Phase | undefined, suffix: string | undefined): Formula {
  return { counts, charge, ...(phase === undefined ? {} : { phase }), ...(suffix === undefined ? {} : { suffix }) };
}

/**
 * Molar mass in g/mol from a table of atomic weights (g/mol by symbol). The mass of electrons lost or gained counts if the table
 * holds `e`. Refuses an element that the table lacks.
 */
export function molarMass(of: Formula, weights: ReadonlyMap<string, number>): number {
  let mass = of.counts.size === 0 ? 0 : -of.charge * (weights.get("e") ?? 0);
  if (of.counts.size === 0) mass = weights.get("e") ?? refuse("The molar mass of the electron is not in the table of atomic weights");
  for (const [element, count] of of.counts) {
    const weight = weights.get(element) ?? refuse(`${element} has no atomic weight in the table`);
    mass += count * weight;
  }
  return mass;
}

/**
 * The formula in the order of Hill: carbon, hydrogen, then the alphabet; without carbon the alphabet alone. The charge follows as `^2-`.
 */
export function hill(of: Formula): string {
  const symbols = [...of.counts.keys()].sort();
  const first = of.counts.has("C") ? ["C", "H"].filter((symbol) => of.counts.has(symbol)) : [];
  const ordered = [...first, ...symbols.filter((symbol) => !first.includes(symbol))];
  const atoms = ordered.map((symbol) => symbol + countText(of.counts.get(symbol)!)).join("");
  return (atoms || "e") + chargeText(of.charge, atoms === "");
}

/** 12 digits hide the rounding of 0.1 + 0.2 and keep every count a person types. */
function countText(count: number): string {
  return count === 1 ? "" : String(Number(count.toPrecision(12)));
}

function chargeText(charge: number, bare: boolean): string {
  if (charge === 0) return "";
  const size = Math.abs(charge) === 1 ? "" : String(Math.abs(charge));
  return `${bare ? "" : "^"}${size}${charge > 0 ? "+" : "-"}`;
}

/** Names that people write before or in place of a formula. */
function refuseName(text: string, written: string): void {
  const prefix = /^([a-z]+|[NnOo]|[0-9,]+)-(?=[A-Za-z])/.exec(text);
  if (prefix) refuse(`"${written}" is a name, not a formula: leave out "${prefix[0]}"`);
  if (/^[a-z]/.test(text)) refuse(`"${written}" is not a formula: the symbol of an element begins with a capital letter`);
  if (/^[0-9.]/.test(text)) refuse(`"${written}" begins with a number; a formula begins with an element or a bracket`);
}

const SUBSCRIPTS = "₀₁₂₃₄₅₆₇₈₉";
const SUPERSCRIPTS = "⁰¹²³⁴⁵⁶⁷⁸⁹";

/** Subscript and superscript characters, dashes and middle dots as plain characters; no spaces. */
function plainSigns(text: string): string {
  return String(text)
    .trim()
    .replace(/[₀-₉]/g, (digit) => String(SUBSCRIPTS.indexOf(digit)))
    .replace(/[⁰¹²³⁴-⁹⁺⁻]+/g, (run) => "^" + run.replace(/./g, (sign) => plainSuperscript(sign)))
    .replace(/[−–‐‑]/g, "-")
    .replace(/\s*[·•∙⋅*]\s*/g, "·")
    .replace(/\s+(?=\()/g, "");
}

function plainSuperscript(sign: string): string {
  if (sign === "⁺") return "+";
  if (sign === "⁻") return "-";
  return String(SUPERSCRIPTS.indexOf(sign));
}
