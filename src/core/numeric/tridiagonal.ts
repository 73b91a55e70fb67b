import { refuse } from "../refusal";

/** Off-diagonal numbers below this count as zero, so that no sweep works on numbers whose squares underflow. */
const VANISHING = 1e-150;

/** Sweeps allowed for one eigenvalue; the shifted QL method needs two or three. */
const MOST_SWEEPS = 60;

/**
 * Eigenvalues, rising, of the symmetric tridiagonal matrix with this diagonal (n numbers) and off-diagonal (n − 1 numbers).
 * QL method with implicit shifts (Dubrulle, Martin, Wilkinson, Numerische Mathematik 12 (1968) 377). Neither argument is changed.
 */
export function tridiagonalEigenvalues(diagonal: readonly number[], offDiagonal: readonly number[]): number[] {
  if (diagonal.length === 0) return [];
  if (offDiagonal.length !== diagonal.length - 1)
    refuse(`A tridiagonal matrix of ${diagonal.length} rows has ${diagonal.length - 1} off-diagonal numbers, not ${offDiagonal.length}`);
  const d = Float64Array.from(diagonal);
  const e = Float64Array.from([...offDiagonal, 0]);
  for (let row = 0; row < d.length; row++) deflate(d, e, row);
  return Array.from(d).sort((a, b) => a - b);
}

/** Repeats QL sweeps until the off-diagonal number at `row` vanishes. */
function deflate(d: Float64Array, e: Float64Array, row: number): void {
  for (let sweep = 0; ; sweep++) {
    const end = endOfBlock(d, e, row);
    if (end === row) return;
    if (sweep === MOST_SWEEPS) refuse(`Eigenvalue ${row + 1} of ${d.length} was not found in ${MOST_SWEEPS} sweeps`);
    sweepOnce(d, e, row, end);
  }
}

/** First place at or below `row` whose off-diagonal number no longer counts beside its neighbours. */
function endOfBlock(d: Float64Array, e: Float64Array, row: number): number {
  let end = row;
  while (end < d.length - 1) {
    const size = Math.abs(d[end]!) + Math.abs(d[end + 1]!);
    if (Math.abs(e[end]!) <= Math.max(Number.EPSILON * size, VANISHING)) break;
    end++;
  }
  return end;
}

/** One implicit QL sweep from `end` up to `row`, shifted by the eigenvalue of the leading 2 × 2 block nearer to its corner. */
function sweepOnce(d: Float64Array, e: Float64Array, row: number, end: number): void {
  const half = (d[row + 1]! - d[row]!) / (2 * e[row]!);
  const radius = Math.hypot(half, 1);
  let g = d[end]! - d[row]! + e[row]! / (half + (half >= 0 ? radius : -radius));
  let sine = 1;
  let cosine = 1;
  let moved = 0;
  for (let i = end - 1; i >= row; i--) {
    const f = sine * e[i]!;
    const b = cosine * e[i]!;
    const r = Math.hypot(f, g);
    e[i + 1] = r;
    if (r === 0) {
      d[i + 1] = d[i + 1]! - moved;
      e[end] = 0;
      return;
    }
    sine = f / r;
    cosine = g / r;
    const shifted = d[i + 1]! - moved;
    const q = (d[i]! - shifted) * sine + 2 * cosine * b;
    moved = sine * q;
    d[i + 1] = shifted + moved;
    g = cosine * q - b;
  }
  d[row] = d[row]! - moved;
  e[row] = g;
  e[end] = 0;
}
