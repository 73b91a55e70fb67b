/**
 * Linear programming for small dense problems: least c·x with A x = b, x ≥ 0, b ≥ 0, by the simplex method in two phases on a full tableau
 * (Dantzig 1963): the steepest column first; after some steps the first one, so that it cannot circle (Bland, Mathematics of Operations
 * Research 2 (1977) 103).
 * Meant for rows and columns scaled near 1.
 */
export interface Vertex {
  /** The variables of the basis, one for each row that is independent of the others. */
  readonly basis: readonly number[];
  /** All variables. */
  readonly x: Float64Array;
}

/** What counts as zero among numbers scaled near 1. */
const ZERO = 1e-11;
/** A right-hand side this small is the rounding of a zero. */
const ROUNDED = 1e-15;

/**
 * The vertex of least cost, or undefined if no x ≥ 0 satisfies A x = b (to `ZERO` of the right-hand side).
 * `a`: rows × columns, row by row. A problem without a bound below ends at the last vertex (it cannot occur where every column has a
 * positive entry and none a negative one, as with atoms).
 */
export function leastCost(a: Float64Array, b: Float64Array, cost: Float64Array): Vertex | undefined {
  const rows = b.length;
  const columns = cost.length;
  const width = columns + rows + 1;
  const tableau = new Float64Array(rows * width);
  const basis: number[] = [];
  for (let i = 0; i < rows; i++) {
    tableau.set(a.subarray(i * columns, (i + 1) * columns), i * width);
    tableau[i * width + columns + i] = 1;
    tableau[i * width + width - 1] = b[i]!;
    basis.push(columns + i);
  }
  const artificial = new Float64Array(columns + rows).fill(1, columns);
  descend(tableau, basis, artificial, columns + rows);
  let missing = 0;
  for (const [i, variable] of basis.entries()) if (variable >= columns) missing += tableau[i * width + width - 1]!;
  if (missing > ZERO) return undefined;
  driveOut(tableau, basis, columns);
  const whole = new Float64Array(columns + rows);
  whole.set(cost);
  descend(tableau, basis, whole, columns);
  const x = new Float64Array(columns);
  for (const [i, variable] of basis.entries()) if (variable < columns) x[variable] = Math.max(0, tableau[i * width + width - 1]!);
  return { basis: basis.filter((variable) => variable < columns), x };
}

/** Artificial variables that stay in the basis at zero give their place to any real one; a row without one depends on the others. */
function driveOut(tableau: Float64Array, basis: number[], columns: number): void {
  const width = tableau.length / basis.length;
  for (let i = 0; i < basis.length; i++) {
    if (basis[i]! < columns) continue;
    for (let j = 0; j < columns; j++) {
      if (Math.abs(tableau[i * width + j]!) > 1e-9) {
        pivot(tableau, basis, i, j);
        break;
      }
    }
  }
}

function descend(tableau: Float64Array, basis: number[], cost: Float64Array, eligible: number): void {
  const width = tableau.length / basis.length;
  const reduced = reducedCosts(tableau, basis, cost, width);
  const least = -ZERO * cost.reduce((size, each) => Math.max(size, Math.abs(each)), 0);
  const patience = 4 * basis.length + 20;
  const limit = 20 * (basis.length + eligible);
  for (let step = 0; step < limit; step++) {
    const entering = step < patience ? steepest(reduced, eligible, least) : first(reduced, eligible, least);
    if (entering < 0) return;
    const leaving = leavingRow(tableau, basis, entering, width);
    if (leaving < 0) return;
    pivot(tableau, basis, leaving, entering);
    const factor = reduced[entering]!;
    for (let k = 0; k < width - 1; k++) reduced[k] = reduced[k]! - factor * tableau[leaving * width + k]!;
    reduced[entering] = 0;
  }
}

function reducedCosts(tableau: Float64Array, basis: readonly number[], cost: Float64Array, width: number): Float64Array {
  const reduced = new Float64Array(width - 1);
  reduced.set(cost);
  for (let i = 0; i < basis.length; i++) {
    const factor = cost[basis[i]!]!;
    if (factor !== 0) for (let k = 0; k < width - 1; k++) reduced[k] = reduced[k]! - factor * tableau[i * width + k]!;
  }
  return reduced;
}

/** The column that lowers the cost most for each unit, by more than `most` (negative). */
function steepest(reduced: Float64Array, eligible: number, most: number): number {
  let found = -1;
  let least = most;
  for (let j = 0; j < eligible; j++) if (reduced[j]! < least) [found, least] = [j, reduced[j]!];
  return found;
}

/** The first column that lowers the cost: it ends also where many vertices are one. */
function first(reduced: Float64Array, eligible: number, most: number): number {
  for (let j = 0; j < eligible; j++) if (reduced[j]! < most) return j;
  return -1;
}

function leavingRow(tableau: Float64Array, basis: readonly number[], entering: number, width: number): number {
  let best = -1;
  let least = Infinity;
  for (let i = 0; i < basis.length; i++) {
    const slope = tableau[i * width + entering]!;
    if (slope <= 1e-9) continue;
    const ratio = tableau[i * width + width - 1]! / slope;
    if (ratio < least || (ratio === least && basis[i]! < basis[best]!)) [best, least] = [i, ratio];
  }
  return best;
}

function pivot(tableau: Float64Array, basis: number[], row: number, column: number): void {
  const width = tableau.length / basis.length;
  const at = row * width;
  const divisor = tableau[at + column]!;
  for (let k = 0; k < width; k++) tableau[at + k] = tableau[at + k]! / divisor;
  for (let i = 0; i < basis.length; i++) {
    const factor = tableau[i * width + column]!;
    if (i === row || factor === 0) continue;
    for (let k = 0; k < width; k++) tableau[i * width + k] = tableau[i * width + k]! - factor * tableau[at + k]!;
    tableau[i * width + column] = 0;
    if (Math.abs(tableau[(i + 1) * width - 1]!) < ROUNDED) tableau[(i + 1) * width - 1] = 0;
  }
  basis[row] = column;
}
