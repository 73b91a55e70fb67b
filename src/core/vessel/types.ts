/**
 * What the calculations on a sealed vessel work with: contents at a fixed amount, a wall (or anything else) that takes up heat, and the
 * pressure that the vessel may have. All in SI: K, Pa, J, m³, s.
 */

/** One state of the contents. */
export interface ContentState {
  readonly temperature: number;
  /** Absolute pressure, Pa. */
  readonly pressure: number;
  /** Internal energy of all the contents, J, from a zero that is the same for every temperature. */
  readonly energy: number;
}

/** Contents of a vessel of fixed amount, so that their state depends on temperature alone. */
export interface Content<State extends ContentState = ContentState> {
  /** Lowest and highest temperature with a state, K, and who sets them, as sentences name them: `nasa-2002 for N2`. */
  readonly from: number;
  readonly to: number;
  readonly fromLabel: string;
  readonly toLabel: string;
  /** Temperatures, K, at which pressure or energy has a kink: a phase appears or goes. */
  readonly kinks: readonly number[];
  /** The state at a temperature inside the limits; refuses outside them, and what the model cannot say. */
  at(temperature: number): State;
}

/** Something that stores heat: a wall, a charge of liquid, a block of metal. */
export interface HeatStore {
  /** As tables name it: `60 kg carbon steel`. */
  readonly label: string;
  /** Where its heat capacity comes from, each once: `en-1993-1-2 for carbon steel`; none for one that was given as such. */
  readonly sources?: readonly string[];
  /** Range of validity, K; 0 to Infinity for a constant. */
  readonly from: number;
  readonly to: number;
  /** Who sets the lower and the upper limit. */
  readonly fromLabel: string;
  readonly toLabel: string;
  /** Joints inside the range, K, where the capacity jumps or bends. */
  readonly joints: readonly number[];
  /** Below this temperature, K, the capacity is not known and the one there is held; left out if nothing is held. */
  readonly heldBelow?: number;
  /** Heat stored, J, from a zero that is the same for every temperature; NaN outside the range. */
  heat(temperature: number): number;
  /** Heat capacity, J/K; NaN outside the range. */
  capacity(temperature: number): number;
}

/** The absolute pressure that a vessel may have: one number, or straight lines between the points of its certificate. */
export interface PressureLimit {
  /** Where the limit is known, K: 0 to Infinity for one number. */
  readonly from: number;
  readonly to: number;
  /** Temperatures of the points of a curve, rising, K; none for one number. */
  readonly knots: readonly number[];
  /** Allowed absolute pressure, Pa; NaN outside the range. */
  at(temperature: number): number;
}
