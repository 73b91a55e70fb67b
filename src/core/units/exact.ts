/**
 * The unit part of mathjs, handed exact fractions in place of floating-point numbers: it reads a product of units and powers,
 * resolves prefixes and keeps the dimensions, and the size of the result is an exact ratio of integers.
 * Its own table of units is emptied first: in it C is a coulomb, F a farad, cp a cup, and torr and mmHg are rough.
 */
import { createFractionClass, createUnitClass, type ExactFraction, type UnitEngine } from "mathjs";
import { unitRows, type UnitRow } from "./table";

declare module "mathjs" {
  interface ExactFraction {
    readonly s: bigint;
    readonly n: bigint;
    readonly d: bigint;
    mul(other: ExactFraction): ExactFraction;
    pow(power: ExactFraction): ExactFraction;
  }
  interface ExactUnit {
    name: string;
    base: unknown;
    dimensions: number[];
    prefixes: unknown;
    value: ExactFraction;
    offset: number;
  }
  interface UnitEngine {
    UNITS: Record<string, ExactUnit>;
    BASE_UNITS: Record<string, { dimensions: number[] }>;
    parse(text: string, options?: { allowNoUnits: boolean }): { value: ExactFraction; dimensions: number[] };
    createUnitSingle(name: string, definition: { definition: unknown }): unknown;
    deleteUnit(name: string): void;
  }
  function createFractionClass(scope: object): new (value: string | number) => ExactFraction;
  function createUnitClass(scope: object): UnitEngine;
}

const Fraction = createFractionClass({});

/** Base units of mathjs, with the name of their dimension there and their size in its own base (kg for mass). */
const baseUnits: Readonly<Record<string, readonly [base: string, size: string]>> = {
  m: ["LENGTH", "1"],
  g: ["MASS", "1/1000"],
  s: ["TIME", "1"],
  K: ["TEMPERATURE", "1"],
  mol: ["AMOUNT_OF_SUBSTANCE", "1"],
};

/** Symbols in the order in which mathjs keeps dimensions: kg m s A K cd mol. */
const dimensionSymbols = ["kg", "m", "s", "A", "K", "cd", "mol"] as const;

/** SI brochure, 9th edition, table 7; MM is the trade's million, for Btu. As ratios: mathjs' own doubles make nano an exact fraction of 0. */
const prefixSizes: Readonly<Record<string, string>> = {
  "": "1",
  MM: "1000000",
  T: "1000000000000",
  G: "1000000000",
  M: "1000000",
  k: "1000",
  h: "100",
  d: "1/10",
  c: "1/100",
  m: "1/1000",
  u: "1/1000000",
  n: "1/1000000000",
};

/** The prefixes of a row as mathjs keeps them. */
function prefixesOf(row: UnitRow): unknown {
  const names = ["", ...(row.prefixes ?? "").replace("μ", "u").split(" ").filter(Boolean)];
  return Object.fromEntries(names.map((name) => [name, { name, value: new Fraction(prefixSizes[name]!), scientific: true }]));
}

/** What mathjs calls for while it is used for parsing only. */
function unused(): never {
  throw new Error("The unit part is used for parsing only");
}

function createEngine(): UnitEngine {
  const engine = createUnitClass({
    config: { number: "Fraction", predictable: true },
    multiplyScalar: (left: ExactFraction, right: ExactFraction) => left.mul(right),
    pow: (base: ExactFraction, power: ExactFraction) => base.pow(power),
    isNumeric: () => true,
    Fraction,
    Complex: { I: undefined },
    ...Object.fromEntries(
      ["addScalar", "subtractScalar", "divideScalar", "abs", "fix", "round", "equal", "format", "number", "BigNumber"].map((name) => [
        name,
        unused,
      ]),
    ),
  });
  for (const name of Object.keys(engine.UNITS)) engine.deleteUnit(name);
  for (const row of unitRows) define(engine, row);
  return engine;
}

function define(engine: UnitEngine, row: UnitRow): void {
  const base = baseUnits[row.inside];
  if (base) {
    const dimension = engine.BASE_UNITS[base[0]]!;
    engine.UNITS[row.inside] = {
      name: row.inside,
      base: dimension,
      dimensions: dimension.dimensions,
      prefixes: prefixesOf(row),
      value: new Fraction(base[1]),
      offset: 0,
    };
    return;
  }
  const [ratio, unit] = row.size!;
  const definition = engine.parse(`1 ${unit}`, { allowNoUnits: true }) as { value: ExactFraction; dimensions: number[] };
  definition.value = definition.value.mul(new Fraction(ratio));
  engine.createUnitSingle(row.inside, { definition });
  engine.UNITS[row.inside]!.prefixes = prefixesOf(row);
}

/** The exact size of a product of units, and its canonical dimension. */
export interface ExactSize {
  readonly numerator: bigint;
  readonly denominator: bigint;
  readonly dimension: string;
}

let engine: UnitEngine | undefined;

/** Evaluates an expression in the names of the table's `inside` column, such as `kcalth/(g K)`. */
export function exactSize(expression: string): ExactSize {
  engine ??= createEngine();
  const { value, dimensions } = engine.parse(`1 ${expression}`, { allowNoUnits: true });
  return { numerator: value.n, denominator: value.d, dimension: canonicalDimension(dimensions) };
}

function canonicalDimension(powers: readonly number[]): string {
  const factors = dimensionSymbols.flatMap((symbol, i) => {
    const power = powers[i] ?? 0;
    return power === 0 ? [] : [power === 1 ? symbol : `${symbol}^${power}`];
  });
  return factors.join(" ") || "1";
}
