/**
 * A function φ(δ, τ) and its derivatives, each taken with its variables. So they stay of the size of φ at every density, and all properties are
 * short sums of them.
 */
export interface Derivatives {
  phi: number;
  /** δ ∂φ/∂δ */
  d: number;
  /** δ² ∂²φ/∂δ² */
  dd: number;
  /** τ ∂φ/∂τ */
  t: number;
  /** τ² ∂²φ/∂τ² */
  tt: number;
  /** δτ ∂²φ/∂δ∂τ */
  dt: number;
}
