/** What the formulation of water is built from: coefficients and limits. They live in the data; the core holds the forms alone. */

/** Coefficients of IAPWS R6-95(2018), Tables 1 and 2, with δ = ρ/ρc and τ = Tc/T. */
export interface HelmholtzConstants {
  /** Tc, K. */
  readonly criticalTemperature: number;
  /** ρc, kg/m³. */
  readonly criticalDensity: number;
  /** Specific gas constant, J/(kg K). */
  readonly gasConstant: number;
  readonly ideal: {
    readonly constant: number;
    readonly linear: number;
    readonly logarithm: number;
    /** n and γ of n ln(1 − exp(−γτ)). */
    readonly oscillators: readonly (readonly number[])[];
  };
  /** c, d, t, n of n δ^d τ^t exp(−δ^c); without the exponential where c is 0. The t are multiples of 1/8. */
  readonly power: readonly (readonly number[])[];
  /** d, t, n, α, β, γ, ε of n δ^d τ^t exp(−α(δ − ε)² − β(τ − γ)²). */
  readonly gaussian: readonly (readonly number[])[];
  /** a, b, B, n, C, D, A, β of n Δ^b δ exp(−C(δ − 1)² − D(τ − 1)²). */
  readonly critical: readonly (readonly number[])[];
}

/** Melting curve of one ice (IAPWS R14-08): p = pressure (1 − a (1 − (T/from)^b)). */
export interface MeltingCurve {
  readonly ice: string;
  /** The triple point where the ice begins, K; also the temperature the curve is reduced by. */
  readonly from: number;
  readonly to: number;
  /** Pressure at `from`, Pa. */
  readonly pressure: number;
  readonly a: number;
  readonly b: number;
}

export interface FormulationConstants extends HelmholtzConstants {
  /**
   * Coefficients and exponents, in sixths for the vapour and thirds for the liquid, of the densities at saturation (IAPWS SR1-86) with
   * θ = 1 − T/Tc: ρ/ρc = 1 + Σ b θ^(e/3) and ln(ρ/ρc) = Σ c θ^(e/6).
   */
  readonly saturatedLiquid: readonly (readonly number[])[];
  readonly saturatedVapour: readonly (readonly number[])[];
  /** Ices that melt between `from` and `to` below the highest pressure, by rising temperature. */
  readonly melting: readonly MeltingCurve[];
  /** Lowest temperature (the triple point) and highest, K. */
  readonly from: number;
  readonly to: number;
  /** Pa. */
  readonly highestPressure: number;
}
