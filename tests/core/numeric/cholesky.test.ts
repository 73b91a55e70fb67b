/** The solution of symmetric, positive definite systems, and small entries beside large ones. */
import fc from "fast-check";
import { solvePositive } from "../../../src/core/numeric/cholesky";

/** Solution of a copy; undefined if the matrix is refused. */
function solved(matrix: readonly number[], vector: readonly number[]): number[] | undefined {
  const x = Float64Array.from(vector);
  return solvePositive(Float64Array.from(matrix), x, vector.length) ? [...x] : undefined;
}

test("two equations worked by hand: 4x + 2y = 10, 2x + 5y = 13", () => {
  expect(solved([4, 2, 2, 5], [10, 13])).toEqual([1.5, 2]);
});

test("the upper triangle is not used", () => {
  expect(solved([4, NaN, 2, 5], [10, 13])).toEqual([1.5, 2]);
});

test.each([
  ["singular", [1, 1, 1, 1]],
  ["indefinite", [1, 2, 2, 1]],
  ["negative", [-1, 0, 0, 1]],
  ["no number", [NaN, 0, 0, 1]],
])("a %s matrix is refused", (_, matrix) => {
  expect(solved(matrix, [1, 1])).toBeUndefined();
});

const entry = fc.integer({ min: -9, max: 9 });
const square = fc.integer({ min: 1, max: 6 }).chain((size) =>
  fc.record({
    size: fc.constant(size),
    factor: fc.array(entry, { minLength: size * size, maxLength: size * size }),
    x: fc.array(entry, { minLength: size, maxLength: size }),
    powers: fc.array(fc.integer({ min: 0, max: 30 }), { minLength: size, maxLength: size }),
  }),
);

/** BᵀB + 1: positive definite, of whole numbers. */
function positive(factor: readonly number[], size: number): number[] {
  return Array.from({ length: size * size }, (_, place) => {
    const [i, j] = [Math.floor(place / size), place % size];
    let sum = i === j ? 1 : 0;
    for (let k = 0; k < size; k++) sum += factor[k * size + i]! * factor[k * size + j]!;
    return sum;
  });
}

const times = (matrix: readonly number[], x: readonly number[]) =>
  x.map((_, i) => x.reduce((sum, each, j) => sum + matrix[i * x.length + j]! * each, 0));

test("what a matrix makes of x leads back to x", () =>
  fc.assert(
    fc.property(square, ({ size, factor, x }) => {
      const matrix = positive(factor, size);
      // Condition numbers up to 6 × 81 × 6 of the unit that was added.
      solved(matrix, times(matrix, x))!.forEach((each, i) => expect(Math.abs(each - x[i]!)).toBeLessThan(1e-9));
    }),
  ));

test("rows and columns of 1 down to 1e-150, in falling order, lose no digit", () =>
  fc.assert(
    fc.property(square, ({ size, factor, x, powers }) => {
      const matrix = positive(factor, size);
      const falling = [...powers].sort((a, b) => a - b).map((power) => 10 ** (-5 * power));
      const graded = matrix.map((each, place) => each * falling[Math.floor(place / size)]! * falling[place % size]!);
      const right = times(matrix, x).map((each, i) => each * falling[i]!);
      solved(graded, right)!.forEach((each, i) => expect(Math.abs(each * falling[i]! - x[i]!)).toBeLessThan(1e-9));
    }),
  ));
