import { FunctionError, type Declarations } from "./declare";
import { clock, serialOf } from "../clock";

/** Operators and clock functions as Excel has them. */
export function registerOperators(declare: Declarations): void {
  for (const name of ["POWER", "POW"]) declare.numbers(name, "base, exponent", power);
  declare.numbers("NOW", "", () => serialOf(clock()));
  declare.numbers("TODAY", "", () => Math.floor(serialOf(clock())));
}

function power(base: number, exponent: number): number {
  if (base === 0 && exponent === 0) throw new FunctionError("#NUM!", "0 to the power 0 has no value");
  if (base === 0 && exponent < 0) throw new FunctionError("#DIV/0!", "0 to a negative power divides by 0");
  return base ** exponent;
}
