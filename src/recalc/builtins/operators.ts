import { FunctionError, type Declarations } from "./declare";
import { clock, serialOf } from "../clock";
import { isErrorCode } from "../errors";
import { engineFunction, engineFunctions, isTable, type EngineArgument, type EngineCall, type EngineValue } from "../library";
import { compare } from "./arrays";

/** Operators and clock functions as Excel has them. */
export function registerOperators(declare: Declarations): void {
  for (const [name, holds] of Object.entries(comparisons)) {
    declare.scalars(name, "left, right", (_read, left, right) => holds(ordered(checked(left), checked(right))));
  }
  mendIndex(declare);
  for (const name of ["POWER", "POW"]) declare.numbers(name, "base, exponent", power);
  declare.numbers("MOD", "number, divisor", modulus);
  mendYearFraction(declare);
  declare.numbers("NOW", "", () => serialOf(clock()));
  declare.numbers("TODAY", "", () => Math.floor(serialOf(clock())));
}

/** By its definition, number − divisor · INT(number/divisor): what is left of 5.5 by 1.1 is 0, not 1.1 less an ulp. */
function modulus(value: number, divisor: number): number {
  if (divisor === 0) throw new FunctionError("#DIV/0!", "The divisor is 0");
  const rest = value - divisor * Math.floor(value / divisor);
  return rest * divisor < 0 ? 0 : rest;
}

/** A year fraction of whole days over 360 or 365 is that quotient; the engine comes to it by way of milliseconds. */
function mendYearFraction({ library }: Declarations): void {
  const known = engineFunction(library, "YEARFRAC")!;
  const engine = known.compute as unknown as (this: EngineCall, ...args: EngineArgument[]) => EngineValue | number;
  const mended = function (this: EngineCall, ...args: EngineArgument[]) {
    const outcome = engine.apply(this, args);
    const basis = (args[2] as EngineValue | undefined)?.value ?? 0;
    const year = basis === 3 ? 365 : basis === 1 ? undefined : 360;
    return typeof outcome === "number" && year !== undefined ? Math.round(outcome * year) / year : outcome;
  };
  engineFunctions(library).replace("YEARFRAC", { ...known, compute: mended as never });
}

function power(base: number, exponent: number): number {
  if (base === 0 && exponent === 0) throw new FunctionError("#NUM!", "0 to the power 0 has no value");
  if (base === 0 && exponent < 0) throw new FunctionError("#DIV/0!", "0 to a negative power divides by 0");
  return base ** exponent;
}

const comparisons: Readonly<Record<string, (order: number) => boolean>> = {
  EQ: (order) => order === 0,
  NE: (order) => order !== 0,
  LT: (order) => order < 0,
  LTE: (order) => order <= 0,
  GT: (order) => order > 0,
  GTE: (order) => order >= 0,
};

/** Numbers before texts before truth values; a blank is the 0, the empty text or the FALSE of the other side. */
function ordered(left: unknown, right: unknown): number {
  const a = left ?? blankLike(right);
  const b = right ?? blankLike(left);
  if (typeof a === "number" && typeof b === "number" && alike(a, b)) return 0;
  return compare(a, b, 1);
}

function blankLike(other: unknown): unknown {
  return typeof other === "string" ? "" : typeof other === "boolean" ? false : 0;
}

/** Numbers are compared in the 15 digits that a worksheet keeps: 0.1 + 0.2 equals 0.3. */
function alike(a: number, b: number): boolean {
  return a === b || (Math.abs(a - b) < 1e-14 * Math.abs(a) && a.toPrecision(15) === b.toPrecision(15));
}

function checked(argument: EngineArgument): unknown {
  const { value = null, message = "" } = (argument as EngineValue | undefined) ?? { value: null };
  if (isErrorCode(value)) throw new FunctionError(value, message);
  return value;
}

/** INDEX of a single row counts along the row, as INDEX(LINEST(…), 2) needs; beyond the array it is #REF!; of an error it is that error. */
function mendIndex({ library }: Declarations): void {
  const known = engineFunction(library, "INDEX")!;
  const engine = known.compute as unknown as (this: EngineCall, ...args: EngineArgument[]) => unknown;
  const mended = function (this: EngineCall, array: EngineArgument, row: EngineArgument, ...rest: EngineArgument[]) {
    const error = alone(array);
    if (isErrorCode(error?.value)) return error;
    const along = rest.length === 0 && row !== undefined && isTable(array) && array.length > 1 && array[0]!.length === 1;
    try {
      return beyond(along ? engine.call(this, array, { value: 1 }, row) : engine.call(this, array, row, ...rest));
    } catch (reason) {
      throw beyond(reason);
    }
  };
  engineFunctions(library).replace("INDEX", { ...known, compute: mended as never });
}

/** The only value of an argument. */
function alone(argument: EngineArgument): EngineValue | undefined {
  if (!isTable(argument)) return argument as EngineValue | undefined;
  return argument.length === 1 && argument[0]!.length === 1 ? argument[0]![0] : undefined;
}

function beyond(outcome: unknown): unknown {
  const { value, message } = (outcome ?? {}) as EngineValue;
  return value === "#VALUE!" && /out of range/.test(String(message))
    ? { value: "#REF!", message: "The array has no such row or column" }
    : outcome;
}
