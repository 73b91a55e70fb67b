import { refuse } from "../refusal";
import { gaussLegendre, integrate } from "./gauss-legendre";

const POINTS = gaussLegendre(12);
/** Halvings of one stretch; a function that needs more is not smooth. */
const DEEPEST = 40;

/**
 * ∫ f from a to b by Gauss–Legendre quadrature with 12 points, halved wherever the halves and the whole differ by more than `tolerance`
 * times the largest |f| met at first, times the width. The error is far below that difference where f is smooth; split at joints before.
 *
 * Refuses a function that has no value somewhere between, or that 40 halvings do not settle.
 */
export function integrateAdaptively(f: (x: number) => number, a: number, b: number, tolerance = 1e-13): number {
  if (a === b) return 0;
  let largest = 0;
  const whole = integrate((x) => noted(f(x)), a, b, POINTS);
  return settled(f, a, b, whole, tolerance * largest * Math.abs(b - a), DEEPEST);

  function noted(value: number): number {
    largest = Math.max(largest, Math.abs(value));
    return value;
  }
}

function settled(f: (x: number) => number, a: number, b: number, whole: number, allowed: number, depth: number): number {
  const middle = a + (b - a) / 2;
  const [left, right] = [integrate(f, a, middle, POINTS), integrate(f, middle, b, POINTS)];
  const difference = Math.abs(left + right - whole);
  if (difference <= allowed) return left + right;
  if (!(difference < Infinity) || depth === 0) return refuse("An integral was not found: its function has no value, or is not smooth");
  return settled(f, a, middle, left, allowed, depth - 1) + settled(f, middle, b, right, allowed, depth - 1);
}
