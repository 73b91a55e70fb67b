/**
 * Solves A x = b for a symmetric, positive definite matrix, in place (Cholesky; Golub and Van Loan, Matrix Computations, 4th ed. 2013, 4.2).
 * Rows and columns are taken as they stand: a matrix whose diagonal falls from the first row to the last keeps the relative accuracy of
 * its small last entries.
 *
 * `matrix`: size × size, row by row, its lower triangle is overwritten; `vector`: b on entry, x on return.
 * Gives false, with both in disorder, if the matrix is not positive definite in doubles.
 */
export function solvePositive(matrix: Float64Array, vector: Float64Array, size: number): boolean {
  for (let row = 0; row < size; row++) {
    for (let column = 0; column <= row; column++) {
      let sum = matrix[row * size + column]!;
      for (let k = 0; k < column; k++) sum -= matrix[row * size + k]! * matrix[column * size + k]!;
      if (column < row) matrix[row * size + column] = sum / matrix[column * size + column]!;
      else if (sum > 0) matrix[row * size + row] = Math.sqrt(sum);
      else return false;
    }
  }
  for (let row = 0; row < size; row++) {
    let sum = vector[row]!;
    for (let k = 0; k < row; k++) sum -= matrix[row * size + k]! * vector[k]!;
    vector[row] = sum / matrix[row * size + row]!;
  }
  for (let row = size - 1; row >= 0; row--) {
    let sum = vector[row]!;
    for (let k = row + 1; k < size; k++) sum -= matrix[k * size + row]! * vector[k]!;
    vector[row] = sum / matrix[row * size + row]!;
  }
  return true;
}
