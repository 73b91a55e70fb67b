/**
 * A bell-shaped term of the residual Helmholtz energy (IAPWS R6-95(2018), eq. 6, terms 52 to 54):
 *   n δ^d τ^t exp(−α(δ − ε)² − β(τ − γ)²)
 * d and t are whole numbers. With u = d − 2αδ(δ − ε) and w = t − 2βτ(τ − γ), each derivative multiplies by u or w, the second by
 * u² − d − 2αδ² or w² − t − 2βτ².
 */
import type { Derivatives } from "./helmholtz";

/** Beyond this the exponential is below 1e-43. */
const GONE = 100;

export function addGaussian(into: Derivatives, term: readonly number[], delta: number, tau: number): void {
  const [d, t, n, alpha, beta, gamma, epsilon] = term as readonly [number, number, number, number, number, number, number];
  const [awayDelta, awayTau] = [delta - epsilon, tau - gamma];
  const exponent = alpha * awayDelta * awayDelta + beta * awayTau * awayTau;
  if (exponent > GONE) return;
  const value = n * delta ** d * tau ** t * Math.exp(-exponent);
  const byDelta = d - 2 * alpha * delta * awayDelta;
  const byTau = t - 2 * beta * tau * awayTau;
  into.phi += value;
  into.d += value * byDelta;
  into.dd += value * (byDelta * byDelta - d - 2 * alpha * delta * delta);
  into.t += value * byTau;
  into.tt += value * (byTau * byTau - t - 2 * beta * tau * tau);
  into.dt += value * byDelta * byTau;
}
