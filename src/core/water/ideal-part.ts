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

  private readonly oscillators: readonly { readonly n: number; readonly gamma: number }[];

  constructor(private readonly ideal: HelmholtzConstants["ideal"]) {
    this.oscillators = ideal.oscillators.map(([n, gamma]) => ({ n: n!, gamma: gamma! }));
  }

  /** Computes the three for a τ. */
  turnTo(tau: number): void {
    const { constant, linear, logarithm } = this.ideal;
    let phi = constant + linear * tau + logarithm * Math.log(tau);
    let t = linear * tau + logarithm;
    let tt = -logarithm;
    for (const { n, gamma } of this.oscillators) {
      const x = gamma * tau;
      const decay = Math.exp(-x);
      const rest = 1 - decay;
      phi += n * Math.log(rest);
      t += (n * x * decay) / rest;
      tt -= (n * x * x * decay) / (rest * rest);
    }
    this.phi = phi;
    this.t = t;
    this.tt = tt;
  }
}
