/**
 * Balancing a chemical equation: the smallest whole numbers ν above 0 with
 *   Σ ν a(element) of the left = Σ ν a(element) of the right   for every element, and the same for the charge z.
 * Exact: the null space of the matrix of atoms and charges in whole numbers of any size. Phases do not matter; broken counts of atoms
 * (CH1.686O0.843) are taken as the decimal fractions they are written as. It needs no figure from outside.
 */
import { integerNullSpace, withoutDivisor } from "../numeric/null-space";
import { refuse } from "../refusal";
import { sideText } from "./equation";
import { minimalSolutions } from "./minimal";

/** A species that takes part. */
export interface Participant {
  /** As sentences and the balanced equation name it. */
  readonly species: string;
  /** Tells substances apart: two spellings of one substance in one phase have the same. */
  readonly identity: string;
  readonly counts: ReadonlyMap<string, number>;
  readonly charge: number;
}

/** A species with its whole number. */
export interface Balanced {
  readonly coefficient: bigint;
  readonly species: string;
}

export interface BalancedEquation {
  readonly left: readonly Balanced[];
  readonly right: readonly Balanced[];
}

const MOST = 50;
/** So many reactions are written out where an equation holds several. */
const SHOWN = 4;

/**
 * The balanced equation, in the order of the species given.
 *
 * Refuses an empty side, more than 50 species, a species that is named twice; an element or a charge on one side only; what no numbers
 * balance; species that would have to stand on the other side, or take no part; and what can be balanced in more than one way,
 * naming the independent reactions.
 */
export function balance(left: readonly Participant[], right: readonly Participant[]): BalancedEquation {
  requireSides(left, right);
  const all = [...left, ...right];
  const isLeft = (index: number) => index < left.length;
  requireBothSides(left, right);
  const rows = conservation(left, right);
  const solutions = integerNullSpace(rows, all.length);
  if (solutions.length === 0) refuse(`No numbers above 0 balance ${namesOf(all)}: a species is missing or mistyped`);
  if (solutions.length > 1) refuseSeveral(solutions, minimalSolutions(rows, all.length) ?? solutions, all, isLeft);
  const numbers = oriented(solutions[0]!);
  requirePositive(numbers, all, isLeft);
  return written(numbers, all, isLeft);
}

function requireSides(left: readonly Participant[], right: readonly Participant[]): void {
  if (left.length === 0 || right.length === 0) refuse(`The ${left.length === 0 ? "left" : "right"} side holds no species`);
  const all = [...left, ...right];
  if (all.length > MOST) refuse(`The equation has ${all.length} species; at most ${MOST} are balanced`);
  const seen = new Map<string, number>();
  all.forEach(({ species, identity }, index) => {
    const first = seen.get(identity);
    if (first === undefined) seen.set(identity, index);
    else refuse(twice(species, all[first]!.species, first < left.length, index < left.length));
  });
}

function twice(species: string, first: string, firstLeft: boolean, left: boolean): string {
  const name = species === first ? species : `${species} (${first})`;
  if (firstLeft === left) return `${name} stands twice on the ${left ? "left" : "right"}; write each species once`;
  return `${name} stands on both sides; leave it out, or write it on the side where more of it stands`;
}

/** Every element, and the charge if there is any, must be able to cancel. */
function requireBothSides(left: readonly Participant[], right: readonly Participant[]): void {
  for (const element of elementsOf([...left, ...right])) {
    const holding = (side: readonly Participant[]) => side.filter(({ counts }) => counts.has(element));
    const [here, there] = [holding(left), holding(right)];
    if (here.length > 0 && there.length > 0) continue;
    const [empty, full, holds] = there.length === 0 ? ["right", "left", here] : ["left", "right", there];
    refuse(`Nothing on the ${empty} holds ${element}, which ${namesOf(holds)} on the ${full} ${holds.length === 1 ? "does" : "do"}`);
  }
  requireCharges([...left.map(({ charge }) => charge), ...right.map(({ charge }) => -charge)]);
}

function requireCharges(towards: readonly number[]): void {
  const [positive, negative] = [towards.some((charge) => charge > 0), towards.some((charge) => charge < 0)];
  if (positive === negative) return;
  refuse(
    `The charges cannot balance: nothing makes up for the ${positive ? "positive" : "negative"} charge on the left or the ${positive ? "negative" : "positive"} on the right; an ion or e- is missing`,
  );
}

function elementsOf(all: readonly Participant[]): string[] {
  return [...new Set(all.flatMap(({ counts }) => [...counts.keys()]))];
}

/** One row for each element and one for the charge, what stands on the right negative, in whole numbers. */
function conservation(left: readonly Participant[], right: readonly Participant[]): bigint[][] {
  const all = [...left, ...right];
  const row = (of: (participant: Participant) => number) => all.map((one, index) => (index < left.length ? of(one) : -of(one)));
  const atoms = elementsOf(all).map((element) => row(({ counts }) => counts.get(element) ?? 0));
  return [...atoms, row(({ charge }) => charge)].map(wholeNumbers);
}

/** Twelve digits hide the rounding of a count such as 3 × 0.1 and keep every count a person types. */
function wholeNumbers(row: readonly number[]): bigint[] {
  const decimals = row.map((value) => decimal(value));
  const places = Math.max(...decimals.map(({ fraction }) => fraction.length));
  return decimals.map(({ whole, fraction, negative }) => {
    const digits = BigInt(whole + fraction.padEnd(places, "0"));
    return negative ? -digits : digits;
  });
}

function decimal(value: number): { whole: string; fraction: string; negative: boolean } {
  const [whole = "0", fraction = ""] = String(Number(Math.abs(value).toPrecision(12))).split(".");
  if (/e/.test(whole + fraction)) refuse(`The count of atoms ${value} is too small or too large to be balanced`);
  return { whole, fraction, negative: value < 0 };
}

/** The vector or its negative, whichever leaves fewer species on the wrong side; of two equal the one with the first species positive. */
function oriented(vector: readonly bigint[]): bigint[] {
  const sign = (wanted: (value: bigint) => boolean) => vector.filter(wanted).length;
  const [above, below] = [sign((value) => value > 0n), sign((value) => value < 0n)];
  const first = vector.find((value) => value !== 0n)!;
  return below > above || (below === above && first < 0n) ? vector.map((value) => -value) : [...vector];
}

function requirePositive(numbers: readonly bigint[], all: readonly Participant[], isLeft: (index: number) => boolean): void {
  const wrong = all.filter((_, index) => numbers[index]! < 0n);
  const idle = all.filter((_, index) => numbers[index] === 0n);
  const balanced = () => textOf(written(numbers, all, isLeft));
  if (wrong.length > 0) refuse(`The equation balances only with ${namesOf(wrong)} on the other side: ${balanced()}`);
  if (idle.length > 0) refuse(`${namesOf(idle)} ${idle.length === 1 ? "takes" : "take"} no part: only ${balanced()} balances`);
}

/** `shown` are the reactions to name: the minimal ones, which keep every species on its side, or any independent ones. */
function refuseSeveral(
  independent: readonly bigint[][],
  shown: readonly (readonly bigint[])[],
  all: readonly Participant[],
  isLeft: (index: number) => boolean,
): never {
  const idle = all.filter((_, index) => shown.every((vector) => vector[index] === 0n));
  const texts = shown.slice(0, SHOWN).map((vector) => textOf(written(oriented(vector), all, isLeft)));
  const list = texts.join("; ") + (shown.length > SHOWN ? "; …" : "");
  if (shown.length === 0) return refuse(`No numbers above 0 balance ${namesOf(all)}: a species is missing or on the wrong side`);
  if (idle.length > 0) return refuse(`${namesOf(idle)} ${idle.length === 1 ? "takes" : "take"} no part: only sums of ${list} balance`);
  return refuse(
    `The equation can be balanced in more than one way: it holds ${independent.length} independent reactions, such as ${list}; write one of them, or the sum that is meant with its numbers`,
  );
}

/** The equation of a vector; a species with a negative number goes to the other side, one with 0 is left out. */
function written(numbers: readonly bigint[], all: readonly Participant[], isLeft: (index: number) => boolean): BalancedEquation {
  const terms = withoutDivisor(numbers)
    .map((number, index) => ({
      coefficient: number < 0n ? -number : number,
      species: all[index]!.species,
      left: isLeft(index) === number > 0n,
    }))
    .filter(({ coefficient }) => coefficient !== 0n);
  const side = (left: boolean) => terms.filter((term) => term.left === left).map(({ coefficient, species }) => ({ coefficient, species }));
  return { left: side(true), right: side(false) };
}

function textOf({ left, right }: BalancedEquation): string {
  return `${sideText(left)} = ${sideText(right)}`;
}

/** `H2`, `H2 and O2`, `H2, O2 and H2O`. */
function namesOf(all: readonly { readonly species: string }[]): string {
  const names = all.map(({ species }) => species);
  return names.length < 2 ? names.join("") : `${names.slice(0, -1).join(", ")} and ${names[names.length - 1]}`;
}
