/**
 * Compositions: mixture text such as `0.79 N2 + 0.21 O2`, named mixtures, and ranges of two or three columns (species, amount, set).
 * Fractions must add up to 1 within 1e-6; nothing is normalised silently.
 */
import { Refusal, refuse } from "../core/refusal";
import { findSpecies, namedMixture } from "../data/library";
import { quoted, readFraction } from "./arguments";
import { Block, Cell, CellError, plain } from "./cell";

export interface Part {
  /** Species as the user wrote it, or as a named mixture lists it. */
  readonly species: string;
  readonly amount: number;
  /** Set id from the third column. */
  readonly set?: string;
}

const TOLERANCE = 1e-6;
/** A plus between parts: with a blank before it, or with a number and a blank after it (so that the charge in Na+ stays). */
const PLUS = /\s+\+\s*|\+\s*(?=(?:\d+\.?\d*|\.\d+)(?:e-?\d+)?\s)/i;
const TERM = /^([+-]?(?:\d+\.?\d*|\.\d+)(?:[eE][+-]?\d+)?)\s+(\S.*)$/;

/** The parts of a mixture text or of a named mixture; undefined if the text is neither, that is, a single species. */
export function partsOfText(text: string): readonly Part[] | undefined {
  const named = namedMixture(text);
  if (named) return named.parts.map(({ species, fraction }) => ({ species, amount: fraction }));
  const terms = text.trim().split(PLUS);
  if (terms.length === 1 && !TERM.test(text.trim())) return undefined;
  return merged(terms.flatMap((term) => termParts(term, text)));
}

/** A number of moles before a species, with or without a blank between: `2 O2`, `2O2`. Without one the term is 1 mol. */
const MOLES = /^([+-]?(?:\d+\.?\d*|\.\d+)(?:[eE][+-]?\d+)?)(?:\s+(?=\S)|(?=[A-Z]))(.*)$/;

/** The parts of a text in moles, `CH4 + 2 O2 + 7.52 N2`: a term without a number is 1 mol, and the sum is free. */
export function molesOfText(text: string): readonly Part[] {
  return merged(
    text
      .trim()
      .split(PLUS)
      .flatMap((written) => {
        const term = written.trim();
        const match = MOLES.exec(term);
        if (!match && /^$|^\+/.test(term)) return refuse(`In "${text}" a species is missing beside a plus sign`);
        return match ? expanded(match[2]!, checkedAmount(Number(match[1]), match[2]!)) : expanded(term, 1);
      }),
  );
}

/** True if a text is a mixture with a term that has no number: it counts moles, as `O2 + 3.76 N2` does. */
export function countsMoles(text: string): boolean {
  const terms = text.trim().split(PLUS);
  return terms.length > 1 && terms.some((term) => !MOLES.test(term.trim()));
}

function termParts(term: string, text: string): readonly Part[] {
  const match = TERM.exec(term.trim());
  if (!match) {
    return refuse(
      `In the mixture "${text}" the part "${term.trim()}" has no fraction before it; write mole fractions, such as "0.79 N2 + 0.21 O2"`,
    );
  }
  return expanded(match[2]!, checkedAmount(Number(match[1]), match[2]!));
}

/** A named mixture inside a mixture is written out in its species. */
function expanded(species: string, amount: number, set?: string): readonly Part[] {
  const named = namedMixture(species);
  if (!named) return [{ species, amount, set }];
  return named.parts.map((part) => ({ species: part.species, amount: part.fraction * amount, set }));
}

function checkedAmount(amount: number, species: string): number {
  if (Number.isFinite(amount) && amount >= 0) return amount;
  throw new Refusal("range", `The amount of ${species} is ${amount}; amounts are not negative`);
}

/** Parts of the same species and set are added; parts of amount zero are left out. */
function merged(parts: readonly Part[]): readonly Part[] {
  const sums = new Map<string, Part>();
  for (const part of parts) {
    if (part.amount === 0) continue;
    const key = `${findSpeciesKey(part.species)}|${part.set ?? ""}`;
    const held = sums.get(key);
    sums.set(key, held ? { ...held, amount: held.amount + part.amount } : part);
  }
  return sums.size > 0 ? [...sums.values()] : refuse("The mixture holds no species with an amount above zero");
}

function findSpeciesKey(text: string): string {
  try {
    return findSpecies(text).key;
  } catch {
    return text; // a species that only a coefficient block knows
  }
}

/** True if a range is a composition (species beside amounts) and not a list of substances. */
export function isComposition(block: Block | undefined): block is Block {
  const columns = block?.[0]?.length ?? 0;
  if (!block || columns < 2 || columns > 3) return false;
  return isHeading(block[0]!) || block.some((row) => isAmount(plain(row[1])));
}

function isAmount(cell: Cell): boolean {
  return typeof cell === "number" || (typeof cell === "string" && /^\s*[\d.]+\s*%\s*$/.test(cell));
}

/** The heading row that MIX.TABLE writes. */
function isHeading(row: readonly unknown[]): boolean {
  return row[0] === "species" && row[1] === "mole fraction";
}

/** The parts of a composition range; blank rows are passed over, a row with half its cells is refused with its number. */
export function partsOfRange(block: Block): readonly Part[] {
  const heading = isHeading(block[0]!);
  const withSets = block[0]!.length === 3 && !(heading && block[0]![2] === "mass fraction");
  const parts = block.flatMap((row, index) => {
    if (heading && index === 0) return [];
    return rowParts(row.map(plain), index + 1, withSets);
  });
  return merged(parts);
}

function rowParts(row: readonly Cell[], number: number, withSets: boolean): readonly Part[] {
  const error = row.find((cell) => cell instanceof CellError);
  if (error instanceof CellError) throw error;
  const [species, amount, set] = row;
  if ((species === null || species === 0) && (amount === null || amount === 0)) return [];
  if (typeof species !== "string") return refuse(`Row ${number} of the composition has ${quoted(species)} where a species is expected`);
  if (amount === null || amount === undefined) return refuse(`Row ${number} of the composition has no amount for ${species}`);
  const value = checkedAmount(readFraction(amount, `The amount of ${species}`), species);
  return expanded(species.trim(), value, withSets && typeof set === "string" ? set : undefined);
}

/** Sum of the amounts. */
export function total(parts: readonly Part[]): number {
  return parts.reduce((sum, part) => sum + part.amount, 0);
}

/** Refuses mole fractions that do not add up to 1 within 1e-6. */
export function requireFractions(parts: readonly Part[]): void {
  const sum = total(parts);
  if (Math.abs(sum - 1) <= TOLERANCE) return;
  throw new Refusal(
    "range",
    `The mole fractions add up to ${Number(sum.toPrecision(10))}, not to 1 within 0.000001; ${Math.abs(sum - 100) <= 100 * TOLERANCE ? "for per cent write 0.9, not 90" : 'MIX(…, "normalise") normalises on request'}`,
  );
}

/** Mixture text that reads back to the same fractions, to the last bit. */
export function mixtureText(parts: readonly { species: string; amount: number }[]): string {
  return parts.map(({ species, amount }) => `${amount} ${species}`).join(" + ");
}
