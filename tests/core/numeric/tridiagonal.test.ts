import fc from "fast-check";
import { tridiagonalEigenvalues } from "../../../src/core/numeric/tridiagonal";
import { refusedWith } from "../refused";

describe("eigenvalues of a symmetric tridiagonal matrix", () => {
  test("the second difference of n points has 2 − 2 cos(kπ/(n+1))", () => {
    const n = 40;
    const expected = Array.from({ length: n }, (_, k) => 2 - 2 * Math.cos(((k + 1) * Math.PI) / (n + 1)));
    const found = tridiagonalEigenvalues(new Array<number>(n).fill(2), new Array<number>(n - 1).fill(-1));
    found.forEach((value, k) => expect(value).toBeCloseTo(expected[k]!, 13));
  });

  test("a diagonal matrix, an empty one and one of a single row", () => {
    expect(tridiagonalEigenvalues([3, 1, 2], [0, 0])).toEqual([1, 2, 3]);
    expect(tridiagonalEigenvalues([], [])).toEqual([]);
    expect(tridiagonalEigenvalues([7], [])).toEqual([7]);
  });

  test("numbers so small that their squares vanish", () => {
    expect(tridiagonalEigenvalues([0, 0, 0, 0], [5e-317, 5e-324, 7e-317])).toEqual([0, 0, 0, 0]);
  });

  const entry = fc.double({ min: -100, max: 100, noNaN: true });

  test("sum and sum of squares are those of the matrix", () =>
    fc.assert(
      fc.property(fc.array(fc.tuple(entry, entry), { minLength: 2, maxLength: 30 }), (rows) => {
        const diagonal = rows.map(([d]) => d);
        const off = rows.slice(1).map(([, e]) => e);
        const found = tridiagonalEigenvalues(diagonal, off);
        const sum = (values: readonly number[]) => values.reduce((total, value) => total + value, 0);
        const squares = sum(diagonal.map((d) => d * d)) + 2 * sum(off.map((e) => e * e));
        const size = 1 + Math.sqrt(squares);
        expect(Math.abs(sum(found) - sum(diagonal))).toBeLessThan(1e-12 * size * rows.length);
        expect(Math.abs(sum(found.map((x) => x * x)) - squares)).toBeLessThan(1e-12 * size * size * rows.length);
      }),
    ));

  test("refuses lengths that do not belong together", () =>
    expect(refusedWith(() => tridiagonalEigenvalues([1, 2], [1, 2]))).toBe(
      "input: A tridiagonal matrix of 2 rows has 1 off-diagonal numbers, not 2",
    ));
});
