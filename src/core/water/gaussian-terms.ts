/**
 * The bell-shaped terms of the residual Helmholtz energy (IAPWS R6-95(2018), eq. 6, terms 52 to 54):
 *   n δ^d τ^t exp(−α(δ − ε)² − β(τ − γ)²)
 * d and t are whole numbers. With u = d − 2αδ(δ − ε) and w = t − 2βτ(τ − γ), each derivative multiplies by u or w, the second by
 * u² − d − 2αδ² or w² − t − 2βτ².
 */
import type { Derivatives } from "./derivatives";

/** Beyond this the exponential is below 1e-43. */
const GONE = 100;

interface GaussianTerm {
  readonly d: number;
  readonly t: number;
  readonly n: number;
  readonly alpha: number;
  readonly beta: number;
  readonly gamma: number;
  readonly epsilon: number;
}

export class GaussianTerms {
  private readonly terms: readonly GaussianTerm[];

  /** Rows d, t, n, α, β, γ, ε. */
  constructor(rows: readonly (readonly number[])[]) {
    this.terms = rows.map((row) => {
      const [d, t, n, alpha, beta, gamma, epsilon] = row as readonly [number, number, number, number, number, number, number];
      return { d, t, n, alpha, beta, gamma, epsilon };
    });
  }

  /** Adds the terms at a δ and τ. */
  add(into: Derivatives, delta: number, tau: number): void {
    for (const term of this.terms) addTerm(into, term, delta, tau);
  }
}

function addTerm(into: Derivatives, { d, t, n, alpha, beta, gamma, epsilon }: GaussianTerm, delta: number, tau: number): void {
  const awayDelta = delta - epsilon;
  const awayTau = tau - gamma;
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
