/**
 * The terms of the residual Helmholtz energy that are not analytic at the critical point (IAPWS R6-95(2018), eq. 6, terms 55 and 56):
 *   n Δ^b δ ψ,  ψ = exp(−C(δ − 1)² − D(τ − 1)²),  Δ = θ² + B x^a,  θ = (1 − τ) + A x^e,  x = (δ − 1)²,  e = 1/(2β)
 *
 * Derivatives of Δ (Table 5), written with x^(e−1) and x^(a−1), which stay finite at the critical density:
 *   Δδ  = (δ − 1) (4Ae θ x^(e−1) + 2Ba x^(a−1))
 *   Δδδ = 4Ae(2e − 1) θ x^(e−1) + 8A²e² x x^(2e−2) + 2Ba(2a − 1) x^(a−1)
 *   Δτ = −2θ,  Δττ = 2,  Δδτ = −4Ae (δ − 1) x^(e−1)
 * At the critical point itself Δ is 0: the term and its first derivatives vanish there, and of the second ones that with τ is −∞ (cv
 * grows without bound).
 */
import type { Derivatives } from "./derivatives";

/** Beyond this ψ is below 1e-34. */
const GONE = 80;

interface CriticalTerm {
  readonly a: number;
  readonly b: number;
  readonly bigB: number;
  readonly n: number;
  readonly bigC: number;
  readonly bigD: number;
  readonly bigA: number;
  /** 1/(2β). */
  readonly e: number;
}

export class CriticalTerms {
  private readonly terms: readonly CriticalTerm[];

  /** Rows a, b, B, n, C, D, A, β. */
  constructor(rows: readonly (readonly number[])[]) {
    this.terms = rows.map((row) => {
      const [a, b, bigB, n, bigC, bigD, bigA, beta] = row as readonly [number, number, number, number, number, number, number, number];
      return { a, b, bigB, n, bigC, bigD, bigA, e: 1 / (2 * beta) };
    });
  }

  /** Adds the terms at a δ and τ. */
  add(into: Derivatives, delta: number, tau: number): void {
    for (const term of this.terms) addTerm(into, term, delta, tau);
  }
}

function addTerm(into: Derivatives, { a, b, bigB, n, bigC, bigD, bigA, e }: CriticalTerm, delta: number, tau: number): void {
  const away = delta - 1;
  const cold = tau - 1;
  const x = away * away;
  const exponent = bigC * x + bigD * cold * cold;
  if (exponent > GONE) return;
  const xe = x ** (e - 1);
  const xa = x ** (a - 1);
  const theta = -cold + bigA * xe * x;
  const distance = theta * theta + bigB * xa * x;
  const psi = n * Math.exp(-exponent);
  if (distance === 0) {
    into.tt = -Infinity;
    return;
  }
  const distanceD = away * (4 * bigA * e * theta * xe + 2 * bigB * a * xa);
  const distanceDD = 4 * bigA * e * (2 * e - 1) * theta * xe + 8 * bigA * bigA * e * e * x * xe * xe + 2 * bigB * a * (2 * a - 1) * xa;
  const distanceDT = -4 * bigA * e * away * xe;
  // Δ^b and its derivatives over Δ^b itself, then those of ψ over ψ.
  const power = distance ** b;
  const slope = b / distance;
  const bend = (slope * (b - 1)) / distance;
  const pD = slope * distanceD;
  const pT = -2 * slope * theta;
  const pDD = slope * distanceDD + bend * distanceD * distanceD;
  const pTT = 2 * slope + 4 * bend * theta * theta;
  const pDT = slope * distanceDT - 2 * bend * theta * distanceD;
  const psiD = -2 * bigC * away;
  const psiT = -2 * bigD * cold;
  const psiDD = psiD * psiD - 2 * bigC;
  const psiTT = psiT * psiT - 2 * bigD;
  const value = power * delta * psi;
  const byDelta = 1 + delta * (pD + psiD);
  into.phi += value;
  into.d += value * byDelta;
  into.dd += value * delta * (2 * (pD + psiD) + delta * (pDD + 2 * pD * psiD + psiDD));
  into.t += value * tau * (pT + psiT);
  into.tt += value * tau * tau * (pTT + 2 * pT * psiT + psiTT);
  into.dt += value * tau * (byDelta * psiT + pT + delta * (pDT + pT * psiD));
}
