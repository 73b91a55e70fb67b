/**
 * A coefficient block in cells, one row per interval:
 *   quantity (Cp | Cv) | phase (g | l | cr) | formula | form | from K | to K | unit | R | formation enthalpy J/mol | entropy J/(mol K) | constants …
 * R blank: CODATA. Formation enthalpy or entropy blank: not known. A heading row that begins with "quantity" is passed over.
 * Constants of `molecular`: geometry (atom | linear | nonlinear) | symmetry number | degeneracy of the ground level |
 * rotational constants in 1/cm (none, one, three) | then wavenumber in 1/cm and degeneracy of each vibration in turn.
 */
import { GAS_CONSTANT, STANDARD_PRESSURE } from "../core/constants";
import { Refusal, refuse } from "../core/refusal";
import { hill, molarMass, parseFormula } from "../core/species/formula";
import type { Form, Interval, MolecularConstants, Phase, SpeciesFit } from "../core/species/types";
import { dimensionOf, parseUnit } from "../core/units";
import { atomicWeights } from "../data/library";
import { quoted } from "./arguments";
import { Block, Cell, CellError, plain } from "./cell";

const FIRST_CONSTANT = 10;
const MOLAR = dimensionOf("J/(mol K)");
const BY_MASS = dimensionOf("J/(kg K)");

/**
 * True if a range given as the set argument is a coefficient block and not a list of set ids: it holds a number, or begins with its
 * quantity. A block whose quantity is blank or misspelt must be read as a block and refused, never passed over for the library's own set.
 */
export function isCoefficientBlock(block: Block): boolean {
  if ((block[0]?.length ?? 0) < 2) return false;
  const first = plain(block[0]![0]);
  if (typeof first === "string" && /^(cp|cv|quantity)$/i.test(first.trim())) return true;
  return block.some((row) => row.some((cell) => typeof plain(cell) === "number" && cell !== 0));
}

/** The fits of a coefficient block, one for each species and phase; every row that cannot be read is refused with its number. */
export function readCoefficientBlock(block: Block): readonly SpeciesFit[] {
  const rows = block.map((row) => row.map(plain));
  const fits = new Map<string, SpeciesFit>();
  rows.forEach((row, index) => {
    if (row.every((cell) => cell === null) || isHeading(row)) return;
    const fit = readRow(row, index + 1);
    const key = `${hill(parseFormula(fit.formula))}(${fit.phase})`;
    const held = fits.get(key);
    fits.set(key, held ? joined(held, fit, index + 1) : fit);
  });
  return fits.size > 0 ? [...fits.values()] : refuse("The coefficient block holds no row");
}

function isHeading(row: readonly Cell[]): boolean {
  return typeof row[0] === "string" && row[0].trim().toLowerCase() === "quantity";
}

function joined(held: SpeciesFit, next: SpeciesFit, row: number): SpeciesFit {
  const last = held.intervals[held.intervals.length - 1];
  const first = next.intervals[0];
  const same =
    held.form === next.form &&
    held.quantity === next.quantity &&
    held.gasConstant === next.gasConstant &&
    held.unitFactor === next.unitFactor &&
    held.celsius === next.celsius &&
    String(held.exponents) === String(next.exponents);
  if (!last || !first || !same)
    return refuse(
      `Row ${row} of the coefficient block does not continue the rows above for ${held.species}: quantity, form, unit and R must be the same`,
    );
  if (first.from !== last.to)
    return refuse(
      `Row ${row} of the coefficient block starts at ${first.from} K, but the row above for ${held.species} ends at ${last.to} K`,
    );
  return { ...held, intervals: [...held.intervals, first] };
}

function readRow(row: readonly Cell[], number: number): SpeciesFit {
  const error = row.find((cell) => cell instanceof CellError);
  if (error instanceof CellError) throw error;
  try {
    return fitOf(row);
  } catch (thrown) {
    if (thrown instanceof Refusal) throw new Refusal(thrown.kind, `Row ${number} of the coefficient block: ${thrown.message}`);
    throw thrown;
  }
}

function fitOf(row: readonly Cell[]): SpeciesFit {
  const text = (column: number, name: string): string => {
    const cell = row[column];
    return typeof cell === "string" ? cell.trim() : refuse(`${name} is ${quoted(cell)}; a text is expected`);
  };
  const quantity = oneOf(text(0, "the quantity"), ["Cp", "Cv"] as const, "quantity");
  const phase: Phase = oneOf(text(1, "the phase"), ["g", "l", "cr"] as const, "phase");
  const formula = text(2, "the formula");
  const { form, exponents, celsius } = readForm(text(3, "the form"));
  const [from, to] = [required(row[4], "from"), required(row[5], "to")];
  if (!(from > 0 && to > from)) refuse(`the range ${from} to ${to} K must rise and lie above 0 K`);
  const constants = row.slice(FIRST_CONSTANT);
  const weight = molarMass(parseFormula(formula), atomicWeights);
  return {
    species: `${formula}(${phase})`,
    formula,
    phase,
    set: "the coefficient block",
    form,
    quantity,
    unitFactor: unitFactor(row[6], form, weight),
    celsius,
    exponents: exponents?.(trimmed(constants).length),
    gasConstant: optional(row[7], "R") ?? GAS_CONSTANT,
    standardPressure: STANDARD_PRESSURE,
    intervals: form === "molecular" ? [] : [interval(from, to, constants, form)],
    molecular: form === "molecular" ? readMolecular(constants) : undefined,
    range: form === "molecular" ? [from, to] : undefined,
    molarMass: weight,
    formationEnthalpy: optional(row[8], "the formation enthalpy"),
    entropy298: optional(row[9], "the entropy"),
  };
}

function interval(from: number, to: number, constants: readonly Cell[], form: Form): Interval {
  const coefficients = trimmed(constants).map((cell, index) => (cell === null ? null : required(cell, `constant ${index + 1}`)));
  const wanted = { "nine-term": 9, "seven-term": 7, shomate: 8, power: 0, molecular: 0 }[form];
  if (wanted > 0 && (coefficients.length > wanted || coefficients.length < wanted - 3)) {
    refuse(`the form ${form} takes ${wanted} constants, ${coefficients.length} are given`);
  }
  if (coefficients.length === 0) refuse("no constants are given");
  return {
    from,
    to,
    coefficients: wanted > coefficients.length ? [...coefficients, ...Array<null>(wanted - coefficients.length).fill(null)] : coefficients,
  };
}

function trimmed(cells: readonly Cell[]): Cell[] {
  const last = cells.reduce<number>((end, cell, index) => (cell === null ? end : index + 1), 0);
  return cells.slice(0, last);
}

interface FormWords {
  readonly form: Form;
  readonly exponents?: (count: number) => readonly number[];
  readonly celsius: boolean;
}

/** `power`, `power 3`, `power 0,1,-2`, each possibly ending in `degC`; the other forms by name. */
function readForm(text: string): FormWords {
  const celsius = /\bdegC$/i.test(text);
  const [name = "", ...rest] = text
    .replace(/\s*degC$/i, "")
    .trim()
    .split(/\s+/);
  const form = oneOf(name, ["nine-term", "seven-term", "shomate", "power", "molecular"] as const, "form");
  if (form !== "power") return rest.length > 0 ? refuse(`the form "${text}" carries more words than its name`) : { form, celsius };
  const listed = rest.join("").split(",").filter(Boolean).map(Number);
  if (listed.some((exponent) => !Number.isFinite(exponent))) refuse(`the exponents in "${text}" are not numbers`);
  if (rest.length === 0) return { form, celsius, exponents: (count) => Array.from({ length: count }, (_, power) => power) };
  if (listed.length === 1 && !text.includes(","))
    return { form, celsius, exponents: () => Array.from({ length: listed[0]! + 1 }, (_, power) => power) };
  return { form, celsius, exponents: () => listed };
}

function unitFactor(cell: Cell | undefined, form: Form, weight: number): number {
  if (cell === null || cell === undefined) {
    return form === "nine-term" || form === "seven-term" || form === "molecular"
      ? 1
      : refuse('the unit is blank; give the unit of the constants, such as "J/(mol K)"');
  }
  const unit = parseUnit(String(cell));
  if (form === "nine-term" || form === "seven-term" || form === "molecular") return 1;
  if (unit.dimension === MOLAR) return unit.scale;
  if (unit.dimension === BY_MASS) return (unit.scale * weight) / 1000;
  return refuse(`the unit "${String(cell)}" is not a heat capacity such as "J/(mol K)" or "kJ/(kg K)"`);
}

function readMolecular(constants: readonly Cell[]): MolecularConstants {
  const [shape, ...rest] = trimmed(constants);
  const geometry = oneOf(String(shape), ["atom", "linear", "nonlinear"] as const, "geometry");
  const numbers = rest.map((cell, index) => required(cell, `constant ${index + 2}`));
  const rotations = { atom: 0, linear: 1, nonlinear: 3 }[geometry];
  const pairs = numbers.slice(2 + rotations);
  if (numbers.length < 2 + rotations || pairs.length % 2 === 1)
    refuse(
      `the constants of a ${geometry} molecule are: symmetry number, degeneracy of the ground level, ${rotations} rotational constants, then wavenumber and degeneracy in pairs`,
    );
  return {
    geometry,
    symmetry: numbers[0]!,
    rotation: numbers.slice(2, 2 + rotations),
    electronic: [[0, numbers[1]!]],
    vibrations: Array.from({ length: pairs.length / 2 }, (_, index) => [pairs[2 * index]!, pairs[2 * index + 1]!] as const),
  };
}

function required(cell: Cell | undefined, name: string): number {
  return typeof cell === "number" ? cell : refuse(`${name} is ${quoted(cell)}; a number is expected`);
}

function optional(cell: Cell | undefined, name: string): number | null {
  return cell === null || cell === undefined ? null : required(cell, name);
}

function oneOf<Word extends string>(text: string, words: readonly Word[], name: string): Word {
  return (
    words.find((word) => word.toLowerCase() === text.toLowerCase()) ?? refuse(`the ${name} "${text}" is not one of ${words.join(", ")}`)
  );
}
