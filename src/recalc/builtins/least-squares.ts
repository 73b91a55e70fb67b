/**
 * Householder reflections with the column of most length first; a column that adds nothing gets the coefficient 0, as in Excel.
 * `unit` are the columns of R⁻¹, whose rows give the standard errors.
 */
export function leastSquares(columns: readonly (readonly number[])[], y: readonly number[]) {
  const a = columns.map((column) => [...column]);
  const b = [...y];
  const order = a.map((_, index) => index);
  const first = a.map((column) => squares(column, 0));
  const diagonal: number[] = [];
  for (let k = 0; k < Math.min(a.length, b.length); k++) {
    const best = order
      .slice(k)
      .reduce((most, column) => (squares(a[column]!, k) / first[column]! > squares(a[most]!, k) / first[most]! ? column : most), order[k]!);
    if (!(squares(a[best]!, k) > 1e-26 * first[best]!)) break;
    order.splice(order.indexOf(best), 1);
    order.splice(k, 0, best);
    diagonal.push(reflect(a, b, a[best]!, k, order.slice(k + 1)));
  }
  const rank = diagonal.length;
  const solved = backSubstituted(a, order, diagonal, b.slice(0, rank));
  const residual = sumOfSquares(b.slice(rank));
  const spread = (values: readonly number[]) => columns.map((_, column) => values[order.indexOf(column)] ?? 0);
  const unit = diagonal.map((_, index) =>
    spread(
      backSubstituted(
        a,
        order,
        diagonal,
        diagonal.map((_d, place) => (place === index ? 1 : 0)),
      ),
    ),
  );
  return { coefficients: spread(solved), residual, unit, rank };
}

/** Turns a column onto its first remaining axis, and all others with it. @returns its diagonal element */
function reflect(a: number[][], b: number[], pivot: number[], k: number, others: readonly number[]): number {
  const length = Math.sqrt(squares(pivot, k));
  const diagonal = pivot[k]! > 0 ? -length : length;
  const vector = pivot.slice(k);
  vector[0]! -= diagonal;
  const size = vector.reduce((sum, value) => sum + value * value, 0);
  for (const target of [...others.map((column) => a[column]!), b]) {
    const factor = (2 * vector.reduce((sum, value, index) => sum + value * target[k + index]!, 0)) / size;
    vector.forEach((value, index) => (target[k + index]! -= factor * value));
  }
  return diagonal;
}

function backSubstituted(
  a: readonly number[][],
  order: readonly number[],
  diagonal: readonly number[],
  right: readonly number[],
): number[] {
  const solution = [...right];
  for (let row = diagonal.length - 1; row >= 0; row--) {
    for (let column = row + 1; column < diagonal.length; column++) solution[row]! -= a[order[column]!]![row]! * solution[column]!;
    solution[row]! /= diagonal[row]!;
  }
  return solution;
}

function squares(column: readonly number[], from: number): number {
  let sum = 0;
  for (let index = from; index < column.length; index++) sum += column[index]! ** 2;
  return sum;
}

export function dot(a: readonly number[], b: readonly number[]): number {
  return a.reduce((sum, value, index) => sum + value * b[index]!, 0);
}

export function sumOfSquares(values: readonly number[]): number {
  return values.reduce((sum, value) => sum + value * value, 0);
}
