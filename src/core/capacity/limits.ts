import { GAS_CONSTANT } from "../constants";
import { printed, refuse } from "../refusal";
import type { MolecularConstants } from "../species/types";

/** What is known of a molecule without its spectrum. */
export interface MoleculeShape {
  /** Number of atoms in the molecule. */
  readonly atoms: number;
  /** Whether a molecule of three or more atoms is linear; not needed for one or two. */
  readonly linear?: boolean;
}

export interface ClassicalLimits {
  /** Cv with translation and rotation only, J/(mol K). */
  readonly frozen: number;
  /** Cv with every vibration fully excited, J/(mol K). */
  readonly excited: number;
  /** Number of vibrations counted. */
  readonly vibrations: number;
  /** Where the count comes from, in words. */
  readonly basis: string;
}

/** Cv/R of translation and classical rotation. */
const FROZEN = { atom: 1.5, linear: 2.5, nonlinear: 3 } as const;

/**
 * Equipartition limits of Cv of an ideal gas: 3/2 R, 5/2 R or 3 R with the vibrations frozen, and R more for each vibration fully
 * excited. Vibrations are those listed in the molecular constants (each internal rotor counts as one), or without them 3N − 5 for a
 * linear and 3N − 6 for another molecule of N atoms. Electronic excitation and anharmonicity can carry a real gas above the upper value.
 *
 * Refuses a molecule of three or more atoms of which nobody says whether it is linear.
 */
export function classicalLimits(molecule: MolecularConstants | MoleculeShape): ClassicalLimits {
  if ("geometry" in molecule) {
    const listed = molecule.vibrations.reduce((sum, [, degeneracy]) => sum + degeneracy, 0);
    const rotors = molecule.rotors?.length ?? 0;
    const words = rotors === 0 ? "" : `, ${rotors} of them internal rotors`;
    return limits(molecule.geometry, listed + rotors, `${vibrationWords(listed + rotors)} of the molecular constants${words}`);
  }
  return limitsOfShape(molecule);
}

function limitsOfShape({ atoms, linear }: MoleculeShape): ClassicalLimits {
  if (!Number.isInteger(atoms) || atoms < 1)
    refuse(`A molecule of ${printed(atoms)} atoms has no classical limits; the count must be whole and at least 1`);
  if (atoms === 1) return limits("atom", 0, "an atom has no vibrations");
  if (atoms === 2) return limits("linear", 1, "a molecule of 2 atoms has 1 vibration");
  if (linear === undefined)
    refuse(`It is not known whether this molecule of ${atoms} atoms is linear, so its classical limits are not known`);
  const vibrations = 3 * atoms - (linear ? 5 : 6);
  return limits(
    linear ? "linear" : "nonlinear",
    vibrations,
    `${vibrationWords(vibrations)} of a ${linear ? "linear" : "non-linear"} molecule of ${atoms} atoms`,
  );
}

function vibrationWords(count: number): string {
  return count === 1 ? "1 vibration" : `${count} vibrations`;
}

function limits(geometry: keyof typeof FROZEN, vibrations: number, basis: string): ClassicalLimits {
  const frozen = FROZEN[geometry] * GAS_CONSTANT;
  return { frozen, excited: frozen + vibrations * GAS_CONSTANT, vibrations, basis };
}
