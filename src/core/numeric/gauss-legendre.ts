import { refuse } from "../refusal";

/** Points and weights for the interval from −1 to 1. */
export interface Quadrature {
  readonly points: readonly number[];
  readonly weights: readonly number[];
}

/**
 * Gauss–Legendre quadrature with n points, 1 to 64: exact for polynomials up to degree 2n − 1. Points are the zeros of the Legendre
 * polynomial, found by Newton's method from the Chebyshev estimate.
 */
export function gaussLegendre(n: number): Quadrature {
  if (!Number.isInteger(n) || n < 1 || n > 64) refuse(`A quadrature has 1 to 64 points, not ${n}`);
  const points: number[] = [];
  const weights: number[] = [];
  for (let i = n; i >= 1; i--) {
    let x = Math.cos((Math.PI * (i - 0.25)) / (n + 0.5));
    let slope = 1;
    for (let step = 0; step < 100; step++) {
      const legendre = legendreAt(n, x);
      slope = legendre.slope;
      const correction = legendre.value / slope;
      x -= correction;
      if (Math.abs(correction) <= 1e-16) break;
    }
    slope = legendreAt(n, x).slope;
    points.push(x);
    weights.push(2 / ((1 - x * x) * slope * slope));
  }
  return { points, weights };
}

/** P_n and its derivative inside (−1, 1), by the three-term recurrence. */
function legendreAt(n: number, x: number): { value: number; slope: number } {
  let before = 1;
  let value = x;
  for (let k = 2; k <= n; k++) [before, value] = [value, ((2 * k - 1) * x * value - (k - 1) * before) / k];
  return { value, slope: (n * (x * value - before)) / (x * x - 1) };
}

/** ∫ f from a to b with a quadrature, on `panels` equal panels. */
export function integrate(f: (x: number) => number, a: number, b: number, quadrature: Quadrature, panels = 1): number {
  const half = (b - a) / panels / 2;
  let sum = 0;
  for (let panel = 0; panel < panels; panel++) {
    const middle = a + (2 * panel + 1) * half;
    quadrature.points.forEach((point, i) => (sum += quadrature.weights[i]! * f(middle + half * point)));
  }
  return sum * half;
}
