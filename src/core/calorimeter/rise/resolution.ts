/** The step in which readings were written: the largest of 5, 2, 1 times a power of ten, down to 1e-6, of which all are multiples. */

const MOST_DECIMALS = 6;
/** What conversion of units leaves beside a multiple, in steps. */
const SLACK = 1e-3;

/** Resolution of `count` readings, in their unit; 0 if they are finer than 1e-6. */
export function resolutionOf(readings: Float64Array, count: number): number {
  let decimals = 0;
  for (let k = 0; k < count; k++) {
    while (!isMultiple(readings[k]!, 10 ** decimals)) if (++decimals > MOST_DECIMALS) return 0;
  }
  const perUnit = 10 ** decimals;
  for (const factor of [5, 2]) if (allMultiples(readings, count, perUnit / factor)) return factor / perUnit;
  return 1 / perUnit;
}

function allMultiples(readings: Float64Array, count: number, perUnit: number): boolean {
  for (let k = 0; k < count; k++) if (!isMultiple(readings[k]!, perUnit)) return false;
  return true;
}

function isMultiple(reading: number, perUnit: number): boolean {
  const steps = reading * perUnit;
  return Math.abs(steps - Math.round(steps)) < SLACK;
}
