/**
 * A unit as the rest of the program sees it. A value v in the unit is, in the SI base of its dimension,
 *
 *   (v − zero) × numerator / denominator + offset
 *
 * zero and offset are 0 but for °C and °F standing alone. Where the definition is exact, numerator / denominator is that exact ratio.
 */
export interface Unit {
  /** As the user typed it, trimmed. */
  readonly text: string;
  /** Canonical dimension, such as `kg m^2 s^-2 K^-1 mol^-1`; `1` for a pure number. */
  readonly dimension: string;
  /** numerator / denominator, correctly rounded: the size of the unit in the SI base of its dimension. */
  readonly scale: number;
  readonly numerator: number;
  readonly denominator: number;
  /** Reading of the scale at `offset`, in its own degrees: 32 for °F, else 0. */
  readonly zero: number;
  /** 273.15 (K) for °C and °F standing alone, else 0. */
  readonly offset: number;
}

/** A number with its unit: `"2.5 bar"`. */
export interface Quantity {
  readonly value: number;
  readonly unit: Unit;
}
