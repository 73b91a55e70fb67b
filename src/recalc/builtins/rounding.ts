import { numError, type Declarations } from "./declare";

/**
 * Rounding as a worksheet does it: on the decimal digits a person sees, not on the binary fraction behind them.
 * 1.005 is a double just below 1.005, and yet ROUND(1.005, 2) is 1.01. The number is taken with its 15 significant digits, which is
 * what Excel keeps.
 */
export function registerRounding(declare: Declarations): void {
  declare.numbers("ROUND", "number, [places]", (x, places = 0) => decimal(x, places, (scaled) => Math.floor(scaled + 0.5)));
  declare.numbers("ROUNDUP", "number, [places]", (x, places = 0) => decimal(x, places, Math.ceil));
  for (const name of ["ROUNDDOWN", "TRUNC"]) declare.numbers(name, "number, [places]", (x, places = 0) => decimal(x, places, Math.floor));
  declare.numbers("MROUND", "number, multiple", (x, multiple) => {
    if (multiple === 0 || x === 0) return 0;
    if (x * multiple < 0) return numError(`${x} and ${multiple} have different signs`);
    return significant(Math.floor(significant(x / multiple) + 0.5) * multiple);
  });
}

/** Rounds the size of a number at a decimal place, and gives it its sign back. */
export function decimal(x: number, places: number, round: (scaled: number) => number): number {
  const digits = Math.trunc(places);
  const size = Math.abs(x);
  // Nothing stands behind the last of 15 digits: cutting there would take away the digits a double has beyond them.
  if (size === 0 || digits >= 14 - Math.floor(Math.log10(size))) return x;
  const rounded = round(shifted(significantText(size), digits));
  return Math.sign(x) * shifted(String(rounded), -digits);
}

/** A number with its decimal point moved, by way of its text, so that no power of ten is multiplied in. */
function shifted(text: string, places: number): number {
  const [digits, exponent = "0"] = text.split("e");
  return Number(`${digits}e${Number(exponent) + places}`);
}

function significantText(x: number): string {
  return x.toExponential(14);
}

function significant(x: number): number {
  return Number(x.toPrecision(15));
}
