/**
 * Cubic equations of state of two parameters, in one form:
 *
 *   P = R T/(v − b) − a(T)/((v + d1 b)(v + d2 b))
 *   b = Ωb R Tc/Pc,   a = Ωa R² Tc²/Pc · α,   α = (1 + m (1 − √(T/Tc)))²,   m = m0 + m1 ω + m2 ω²
 *
 * P Pa, T K, v m³/mol. The figures of an equation are data and arrive as an argument.
 */

/** The figures of one published equation. */
export interface CubicForm {
  readonly id: string;
  /** As sentences name it: `Peng-Robinson`. */
  readonly title: string;
  readonly d1: number;
  readonly d2: number;
  /** Ωa and Ωb, which the conditions at the critical point fix. */
  readonly omegaA: number;
  readonly omegaB: number;
  /** m0, m1, m2. */
  readonly m: readonly number[];
}

/** Critical point and acentric factor of one gas. */
export interface CriticalPoint {
  /** As sentences name the gas. */
  readonly species: string;
  /** Critical temperature, K. */
  readonly temperature: number;
  /** Critical pressure, Pa. */
  readonly pressure: number;
  /** Acentric factor. */
  readonly acentric: number;
  /** Vapour pressure, Pa, at T in K, where it is known better than an equation tells it, up to the critical temperature. */
  readonly vapourPressure?: (temperature: number) => number;
}

/** One gas of a mixture. */
export interface CubicPart {
  readonly fraction: number;
  readonly critical: CriticalPoint;
}
