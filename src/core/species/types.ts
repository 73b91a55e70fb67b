/**
 * What the core knows of a species: the record of one published fit, exactly as printed, and what the fit needs to be evaluated.
 * The numbers come from src/data or from cells of the user; the core never imports them.
 */

/** Gas, liquid or crystal (any solid). */
export type Phase = "g" | "l" | "cr";

export type Form = "nine-term" | "seven-term" | "shomate" | "power" | "molecular";

/** One temperature interval of a fit. `null` stands for a coefficient the source does not give. */
export interface Interval {
  /** Lower limit, K. */
  readonly from: number;
  /** Upper limit, K. */
  readonly to: number;
  /** Coefficients exactly as printed, in the order of the form. */
  readonly coefficients: readonly (number | null)[];
}

/** Spectroscopic constants of a molecule, wavenumbers in 1/cm. */
export interface MolecularConstants {
  readonly geometry: "atom" | "linear" | "nonlinear";
  /** Symmetry number for rotation. */
  readonly symmetry: number;
  /** Rotational constants, 1/cm: none, one (linear) or three. */
  readonly rotation: readonly number[];
  /** Fundamental wavenumber, 1/cm, and degeneracy. */
  readonly vibrations: readonly (readonly [wavenumber: number, degeneracy: number])[];
  /** Electronic level, 1/cm, and degeneracy; the ground level first. */
  readonly electronic: readonly (readonly [wavenumber: number, degeneracy: number])[];
  /** Hindered internal rotors, each with its own term. */
  readonly rotors?: readonly HinderedRotor[];
}

/** One hindered internal rotor with a cosine barrier, V = V0/2 (1 − cos nφ). */
export interface HinderedRotor {
  /** Barrier V0, 1/cm. */
  readonly barrier: number;
  /** Number of equal minima in one turn. */
  readonly folds: number;
  /** Reduced moment of inertia, kg m². */
  readonly reducedMoment: number;
}

/** The fit of one species in one set, as printed in its source or as typed by the user in a coefficient block. */
export interface SpeciesFit {
  /** Species key, for example `H2O(l)`. */
  readonly species: string;
  /** Chemical formula without the phase, for example `H2O`. */
  readonly formula: string;
  readonly phase: Phase;
  /** Id of the set, as the user types it; `cells` for a block of the user. */
  readonly set: string;
  readonly form: Form;
  /** Whether the polynomial gives Cp (all published sets) or Cv (user blocks only). */
  readonly quantity: "Cp" | "Cv";
  /** Multiplies the printed coefficients to reach J/(mol K); 1 for joules, 4.184 where the source prints thermochemical calories. */
  readonly unitFactor: number;
  /** True if the temperature in the polynomial is in °C. */
  readonly celsius?: boolean;
  /** Exponents of T, form `power` only, one for each coefficient. */
  readonly exponents?: readonly number[];
  /** Gas constant the fit was made with, J/(mol K). */
  readonly gasConstant: number;
  /** Standard pressure of the entropy, Pa. */
  readonly standardPressure: number;
  /** Empty for `molecular`, whose range is `range`. */
  readonly intervals: readonly Interval[];
  readonly molecular?: MolecularConstants;
  /** Validity of the form `molecular`, K. */
  readonly range?: readonly [from: number, to: number];
  /** Molar mass, g/mol, from the one table of atomic weights (translation of `molecular` needs it). */
  readonly molarMass: number;
  /**
   * Enthalpy of formation at 298.15 K, J/mol; null if the source gives none.
   * For nine-term and seven-term it is a check value (the fit holds it); for the other forms it fixes the zero of H.
   */
  readonly formationEnthalpy: number | null;
  /** Entropy at 298.15 K, J/(mol K); for the forms that need it from outside (`power`), else null. */
  readonly entropy298: number | null;
  /** False where H of the fit is only relative to 298.15 K, not on the formation scale. Left out: true if known. */
  readonly onFormationScale?: boolean;
}
