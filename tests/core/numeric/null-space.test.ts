import fc from "fast-check";
import { greatestCommonDivisor, integerNullSpace, withoutDivisor } from "../../../src/core/numeric/null-space";

const whole = (rows: number[][]) => rows.map((row) => row.map(BigInt));

test.each([
  // by hand: H2 + O2 = H2O, rows H and O
  [
    [
      [2, 0, -2],
      [0, 2, -1],
    ],
    3,
    [[2, 1, 2]],
  ],
  // two free columns
  [
    [[1, 1, 1]],
    3,
    [
      [-1, 1, 0],
      [-1, 0, 1],
    ],
  ],
  // a row that is the sum of others, and a row of zeros
  [
    [
      [1, -1, 0],
      [0, 0, 0],
      [2, -2, 0],
    ],
    3,
    [
      [1, 1, 0],
      [0, 0, 1],
    ],
  ],
  // only 0 solves
  [
    [
      [1, 0],
      [1, 1],
    ],
    2,
    [],
  ],
  // no condition at all
  [
    [],
    2,
    [
      [1, 0],
      [0, 1],
    ],
  ],
])("%j", (rows, columns, expected) => {
  expect(integerNullSpace(whole(rows), columns)).toEqual(whole(expected));
});

/** Rank by an elimination of its own, modulo a prime far above every minor of the small matrices below. */
function rankModulo(rows: readonly (readonly bigint[])[], prime = 2n ** 61n - 1n): number {
  const power = (base: bigint, exponent: bigint): bigint =>
    exponent === 0n ? 1n : (power((base * base) % prime, exponent / 2n) * (exponent % 2n === 1n ? base : 1n)) % prime;
  const matrix = rows.map((row) => row.map((value) => ((value % prime) + prime) % prime));
  let rank = 0;
  for (let column = 0; column < (matrix[0]?.length ?? 0); column++) {
    const found = matrix.findIndex((row, index) => index >= rank && row[column] !== 0n);
    if (found < 0) continue;
    [matrix[rank], matrix[found]] = [matrix[found]!, matrix[rank]!];
    const inverse = power(matrix[rank]![column]!, prime - 2n);
    for (let index = rank + 1; index < matrix.length; index++) {
      const factor = (matrix[index]![column]! * inverse) % prime;
      matrix[index] = matrix[index]!.map((value, k) => (((value - factor * matrix[rank]![k]!) % prime) + prime) % prime);
    }
    rank++;
  }
  return rank;
}

test("every vector solves, has no common divisor, and there are as many as columns less rank", () => {
  const matrix = fc.tuple(fc.integer({ min: 1, max: 5 }), fc.integer({ min: 1, max: 7 })).chain(([height, width]) =>
    fc.array(fc.array(fc.integer({ min: -9, max: 9 }).map(BigInt), { minLength: width, maxLength: width }), {
      minLength: height,
      maxLength: height,
    }),
  );
  fc.assert(
    fc.property(matrix, (rows) => {
      const columns = rows[0]!.length;
      const basis = integerNullSpace(rows, columns);
      expect(basis.length).toBe(columns - rankModulo(rows));
      for (const vector of basis) {
        for (const row of rows) expect(row.reduce((sum, value, k) => sum + value * vector[k]!, 0n)).toBe(0n);
        expect(vector.reduce(greatestCommonDivisor, 0n)).toBe(1n);
      }
      expect(rankModulo(basis)).toBe(basis.length);
    }),
  );
});

test("numbers beyond doubles stay exact", () => {
  const large = 10n ** 30n;
  expect(integerNullSpace([[large + 1n, -large]], 2)).toEqual([[large, large + 1n]]);
});

test("divisors", () => {
  expect(greatestCommonDivisor(-12n, 18n)).toBe(6n);
  expect(greatestCommonDivisor(0n, 7n)).toBe(7n);
  expect(withoutDivisor([4n, 0n, -6n])).toEqual([2n, 0n, -3n]);
  expect(withoutDivisor([0n, 0n])).toEqual([0n, 0n]);
});
