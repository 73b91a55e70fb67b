/**
 * Properties of one phase from the Helmholtz energy (IAPWS R6-95(2018), Table 3), with the derivatives of helmholtz.ts, R by mass:
 *   p = ρRT (1 + d)          u = RT t           s = R (t − φ)        h = RT (1 + t + d)      g = RT (1 + φ + d)
 *   cv = −R tt               ∂p/∂ρ = RT (1 + 2d + dd)                ∂p/∂T = ρR (1 + d − dt)
 *   cp = cv + T (∂p/∂T)² / (ρ² ∂p/∂ρ)                                w² = cp/cv ∂p/∂ρ
 */
import type { HelmholtzConstants } from "./formulation-constants";
import type { Helmholtz } from "./helmholtz";
import type { WaterPhase } from "./types";

/** The phase of a temperature, K, and density, kg/m³, both above 0; no test whether it is stable. Where it is unstable w is 0. */
export function phaseOf(helmholtz: Helmholtz, constants: HelmholtzConstants, temperature: number, density: number): WaterPhase {
  const { criticalTemperature, criticalDensity, gasConstant } = constants;
  const delta = density / criticalDensity;
  const tau = criticalTemperature / temperature;
  const ideal = helmholtz.ideal(delta, tau);
  const residual = helmholtz.residual(delta, tau);
  const rt = gasConstant * temperature;
  const phi = ideal.phi + residual.phi;
  const t = ideal.t + residual.t;
  const cv = -gasConstant * (ideal.tt + residual.tt);
  const pressureByDensity = rt * (1 + 2 * residual.d + residual.dd);
  const pressureByTemperature = density * gasConstant * (1 + residual.d - residual.dt);
  const cp = cv + (temperature * (pressureByTemperature / density) ** 2) / pressureByDensity;
  const squaredSpeed = (cp / cv) * pressureByDensity;
  return {
    temperature,
    density,
    pressure: density * rt * (1 + residual.d),
    energy: rt * t,
    enthalpy: rt * (1 + t + residual.d),
    entropy: gasConstant * (t - phi),
    gibbs: rt * (1 + phi + residual.d),
    cv,
    cp,
    soundSpeed: pressureByDensity > 0 && squaredSpeed < Infinity ? Math.sqrt(squaredSpeed) : 0,
    pressureByDensity,
    pressureByTemperature,
  };
}
