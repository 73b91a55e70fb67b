/**
 * Comparison with a limit of decimals that a double holds only nearly, and the words for it: 28.26 − 28.13 is not above 0.13.
 */

/** Relative rounding a chain of a few operations on decimals may leave. */
const ROUNDING = 1e-12;

/** Whether a value is above a limit by more than the rounding of numbers of the given size. */
export function isAbove(value: number, limit: number, size: number = limit): boolean {
  return value - limit > ROUNDING * Math.abs(size);
}

/** The value with as few significant digits, two or more, as still stand above the limit: 0.1504 above 0.15 is "0.1504", not "0.15". */
export function printedAbove(value: number, limit: number, digits = 2): string {
  for (let shown = digits; shown < 17; shown++) {
    const rounded = Number(value.toPrecision(shown));
    if (rounded > limit) return String(rounded);
  }
  return String(value);
}
