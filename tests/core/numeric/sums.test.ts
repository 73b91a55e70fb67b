import fc from "fast-check";
import { compensatedSum } from "../../../src/core/numeric/compensated-sum";
import { gaussLegendre, integrate } from "../../../src/core/numeric/gauss-legendre";
import { refusedWith } from "../refused";

describe("compensated sum", () => {
  test("keeps what a plain sum loses", () => {
    expect(compensatedSum([1, 1e100, 1, -1e100])).toBe(2);
    expect(compensatedSum(new Array<number>(10).fill(0.1))).toBe(1);
    expect(compensatedSum([])).toBe(0);
  });

  test("is the exact sum of integers far apart in size", () =>
    fc.assert(
      fc.property(fc.array(fc.maxSafeInteger(), { maxLength: 50 }), (values) => {
        const exact = Number(values.reduce((sum, value) => sum + BigInt(value), 0n));
        expect(compensatedSum(values)).toBe(exact + 0);
      }),
    ));
});

describe("Gauss–Legendre quadrature", () => {
  test("five points as printed (Abramowitz and Stegun, table 25.4)", () => {
    const { points, weights } = gaussLegendre(5);
    expect(points[4]).toBeCloseTo(0.906179845938664, 15);
    expect(weights[4]).toBeCloseTo(0.236926885056189, 15);
    expect(points[2]).toBeCloseTo(0, 15);
    expect(weights[2]).toBeCloseTo(0.568888888888889, 15);
  });

  test.each([1, 2, 7, 20, 64])("%d points integrate every power up to 2n − 1", (n) => {
    const quadrature = gaussLegendre(n);
    for (let power = 0; power < 2 * n; power++) {
      const exact = power % 2 === 0 ? 2 / (power + 1) : 0;
      expect(integrate((x) => x ** power, -1, 1, quadrature)).toBeCloseTo(exact, 13);
    }
  });

  test("panels", () => expect(integrate(Math.exp, 0, 3, gaussLegendre(8), 4)).toBeCloseTo(Math.exp(3) - 1, 12));

  test("refuses 0 points", () => expect(refusedWith(() => gaussLegendre(0))).toBe("input: A quadrature has 1 to 64 points, not 0"));
});
