/**
 * Ideal-gas part of the Helmholtz energy without its ln δ (IAPWS R6-95(2018), eq. 5 and Table 4):
 *   n1 + n2 τ + n3 ln τ + Σ n ln(1 − exp(−γτ))
 * and its derivatives with τ, each times τ for every derivative.
 */
import type { HelmholtzConstants } from "./formulation-constants";

export class IdealPart {
  phi = NaN;
  t = NaN;
  tt = NaN;

  constructor(private readonly ideal: HelmholtzConstants["ideal"]) {}

  /** Computes the three for a τ. */
  turnTo(tau: number): void {
    const { constant, linear, logarithm, oscillators } = this.ideal;
    let phi = constant + linear * tau + logarithm * Math.log(tau);
    let t = linear * tau + logarithm;
    let tt = -logarithm;
    for (const [n, gamma] of oscillators as readonly (readonly [number, number])[]) {
      const x = gamma * tau;
      const decay = Math.exp(-x);
      const rest = -Math.expm1(-x);
      phi += n * Math.log(rest);
      t += (n * x * decay) / rest;
      tt -= (n * x * x * decay) / (rest * rest);
    }
    this.phi = phi;
    this.t = t;
    this.tt = tt;
  }
}
