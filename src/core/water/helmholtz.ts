/**
 * Helmholtz energy of water, f/(RT) = φ°(δ, τ) + φʳ(δ, τ), with its first and second derivatives in closed form
 * (IAPWS R6-95(2018), eqs. 4 to 6 and Tables 4 and 5), δ = ρ/ρc, τ = Tc/T; each derivative times its variables, see derivatives.ts.
 */
import { CriticalTerms } from "./critical-terms";
import { GaussianTerms } from "./gaussian-terms";
import type { Derivatives } from "./derivatives";
import type { HelmholtzConstants } from "./formulation-constants";
import { IdealPart } from "./ideal-part";
import { PowerTerms } from "./power-terms";

export class Helmholtz {
  private readonly idealPart: IdealPart;
  private readonly power: PowerTerms;
  private readonly gaussian: GaussianTerms;
  private readonly critical: CriticalTerms;
  private tau = NaN;

  constructor({ ideal, power, gaussian, critical }: HelmholtzConstants) {
    this.idealPart = new IdealPart(ideal);
    this.power = new PowerTerms(power);
    this.gaussian = new GaussianTerms(gaussian);
    this.critical = new CriticalTerms(critical);
  }

  /** φ° at a δ and τ above 0; of its derivatives with δ, d = 1, dd = −1 and dt = 0. */
  ideal(delta: number, tau: number): { phi: number; t: number; tt: number } {
    this.turnTo(tau);
    const { phi, t, tt } = this.idealPart;
    return { phi: Math.log(delta) + phi, t, tt };
  }

  /** φʳ at a δ and τ above 0. */
  residual(delta: number, tau: number): Derivatives {
    this.turnTo(tau);
    const sum: Derivatives = { phi: 0, d: 0, dd: 0, t: 0, tt: 0, dt: 0 };
    this.power.add(sum, delta);
    this.gaussian.add(sum, delta, tau);
    this.critical.add(sum, delta, tau);
    return sum;
  }

  /** What depends on the temperature alone is kept from one call to the next: a search along an isotherm pays for it once. */
  private turnTo(tau: number): void {
    if (tau === this.tau) return;
    this.idealPart.turnTo(tau);
    this.power.turnTo(tau);
    this.tau = tau;
  }
}
