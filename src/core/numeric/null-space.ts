/**
 * The null space of a matrix of whole numbers, exact: all x with A x = 0, spanned by vectors of whole numbers.
 * Gauss-Jordan elimination without fractions in arbitrary precision; each row is kept without a common divisor, so numbers stay small.
 */

/**
 * A basis of the null space, one vector for each free column, in the order of the columns. Each vector has no common divisor, is positive
 * in its free column and 0 in the other free ones. Empty if only x = 0 solves.
 * `rows` have `columns` numbers each.
 */
export function integerNullSpace(rows: readonly (readonly bigint[])[], columns: number): bigint[][] {
  const matrix = rows.map((row) => [...row]);
  const pivots = eliminate(matrix, columns);
  const free = Array.from({ length: columns }, (_, column) => column).filter((column) => !pivots.includes(column));
  return free.map((column) => solution(matrix, pivots, column, columns));
}

/** Brings the matrix to reduced form in place; gives the pivot column of each of its first rows. */
function eliminate(matrix: bigint[][], columns: number): number[] {
  const pivots: number[] = [];
  for (let column = 0; column < columns && pivots.length < matrix.length; column++) {
    const rank = pivots.length;
    const found = matrix.findIndex((row, index) => index >= rank && row[column] !== 0n);
    if (found < 0) continue;
    [matrix[rank], matrix[found]] = [matrix[found]!, matrix[rank]!];
    for (let index = 0; index < matrix.length; index++) {
      if (index !== rank) matrix[index] = cleared(matrix[index]!, matrix[rank]!, column);
    }
    pivots.push(column);
  }
  return pivots;
}

/** The row with a multiple of the pivot row taken off, so that it is 0 in the column. */
function cleared(row: readonly bigint[], pivot: readonly bigint[], column: number): bigint[] {
  const factor = row[column]!;
  const leading = pivot[column]!;
  return withoutDivisor(factor === 0n ? row : row.map((value, k) => value * leading - pivot[k]! * factor));
}

/** The vector that is 1 in the free column before it is made whole: x at each pivot is −entry / pivot. */
function solution(matrix: readonly (readonly bigint[])[], pivots: readonly number[], free: number, columns: number): bigint[] {
  const scale = pivots.reduce((multiple, pivot, row) => leastCommonMultiple(multiple, matrix[row]![pivot]!), 1n);
  const vector = new Array<bigint>(columns).fill(0n);
  vector[free] = scale;
  pivots.forEach((pivot, row) => (vector[pivot] = (-matrix[row]![free]! * scale) / matrix[row]![pivot]!));
  return withoutDivisor(vector);
}

/** The numbers divided by their greatest common divisor. */
export function withoutDivisor(numbers: readonly bigint[]): bigint[] {
  const divisor = numbers.reduce(greatestCommonDivisor, 0n);
  return divisor <= 1n ? [...numbers] : numbers.map((value) => value / divisor);
}

/** Greatest common divisor of two whole numbers, not negative; of 0 and a number, the number. */
export function greatestCommonDivisor(a: bigint, b: bigint): bigint {
  let [x, y] = [a < 0n ? -a : a, b < 0n ? -b : b];
  while (y !== 0n) [x, y] = [y, x % y];
  return x;
}

function leastCommonMultiple(a: bigint, b: bigint): bigint {
  const multiple = (a / greatestCommonDivisor(a, b)) * b;
  return multiple < 0n ? -multiple : multiple;
}
