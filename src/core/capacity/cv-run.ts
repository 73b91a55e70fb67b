/**
 * The bare loops of `cvInto`: Cv of temperatures that follow one another in one interval, so that its coefficients stay in registers.
 * Begins at `start` and gives back the place of the first temperature outside (above, upTo].
 * Both bodies repeat `valueAt` of laurent.ts, operation for operation: a range and a cell give the same bits.
 */
export type CvRun = (
  temperatures: Float64Array,
  out: Float64Array,
  start: number,
  above: number,
  upTo: number,
  rows: Float64Array,
  at: number,
) => number;

/** For fits with terms in 1/T² and 1/T. */
export const runWithInversePowers: CvRun = (temperatures, out, start, above, upTo, rows, at) =>
  inverse(
    temperatures,
    out,
    start,
    above,
    upTo,
    rows[at]!,
    rows[at + 1]!,
    rows[at + 2]!,
    rows[at + 3]!,
    rows[at + 4]!,
    rows[at + 5]!,
    rows[at + 6]!,
  );

/** For fits without inverse powers, whose row begins with two zeros: it never divides. */
export const runPolynomial: CvRun = (temperatures, out, start, above, upTo, rows, at) =>
  polynomial(temperatures, out, start, above, upTo, rows[at + 2]!, rows[at + 3]!, rows[at + 4]!, rows[at + 5]!, rows[at + 6]!);

// The coefficients are arguments, not variables of the loop: only so does the compiler keep them in registers (3 times as fast).
function inverse(
  temperatures: Float64Array,
  out: Float64Array,
  start: number,
  above: number,
  upTo: number,
  m2: number,
  m1: number,
  c0: number,
  c1: number,
  c2: number,
  c3: number,
  c4: number,
): number {
  let i = start;
  for (; i < temperatures.length; i++) {
    const t = temperatures[i]!;
    if (!(t > above && t <= upTo)) break;
    const r = 1 / t;
    out[i] = (((c4 * t + c3) * t + c2) * t + c1) * t + c0 + (m2 * r + m1) * r;
  }
  return i;
}

function polynomial(
  temperatures: Float64Array,
  out: Float64Array,
  start: number,
  above: number,
  upTo: number,
  c0: number,
  c1: number,
  c2: number,
  c3: number,
  c4: number,
): number {
  let i = start;
  for (; i < temperatures.length; i++) {
    const t = temperatures[i]!;
    if (!(t > above && t <= upTo)) break;
    out[i] = (((c4 * t + c3) * t + c2) * t + c1) * t + c0;
  }
  return i;
}
