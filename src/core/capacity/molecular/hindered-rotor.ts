import { KELVIN_PER_WAVENUMBER, BOLTZMANN, PLANCK } from "../../constants";
import { tridiagonalEigenvalues } from "../../numeric/tridiagonal";
import { printed, refuse } from "../../refusal";
import type { HinderedRotor } from "../../species/types";
import { type Levels, levelsOf } from "./levels";

/** Basis functions are taken up to this many kT at the top of the range, above the barrier: what is cut off weighs less than 1e-17. */
const REACH = 40;
/** A heavier or hotter rotor than this many basis functions can hold is a typing error in the moment of inertia. */
const LARGEST_BASIS = 4000;

/**
 * Energy levels of an internal rotor with V(φ) = V0/2 (1 − cos nφ), in kelvin (energy over k), counted from the lowest:
 * eigenvalues of −(ħ²/2I) d²/dφ² + V in the free-rotor basis e^(imφ).
 *
 *   diagonal ħ²m²/2I + V0/2;  between m and m ± n: −V0/4
 *
 * Only functions n apart mix, so the matrix falls into n tridiagonal blocks. The n minima are equal: every n-th orientation is the same
 * molecule, and each level is weighed 1/n (for a methyl group n = 3 is its symmetry number).
 */
export function rotorLevels(rotor: HinderedRotor, highestTemperature: number): Levels {
  check(rotor);
  const barrier = rotor.barrier * KELVIN_PER_WAVENUMBER;
  const rotation = PLANCK ** 2 / (8 * Math.PI ** 2 * rotor.reducedMoment * BOLTZMANN);
  const highest = Math.ceil(Math.sqrt((barrier + REACH * highestTemperature) / rotation)) + 3 * rotor.folds;
  if (highest > LARGEST_BASIS)
    refuse(`The reduced moment of inertia ${printed(rotor.reducedMoment)} kg m² is too large for an internal rotor`);
  const levels: (readonly [number, number])[] = [];
  for (let block = 0; block < rotor.folds; block++) {
    const diagonal = blockOf(block, rotor.folds, highest).map((m) => rotation * m * m + barrier / 2);
    const offDiagonal = new Array<number>(Math.max(diagonal.length - 1, 0)).fill(-barrier / 4);
    for (const energy of tridiagonalEigenvalues(diagonal, offDiagonal)) levels.push([energy, 1 / rotor.folds]);
  }
  return levelsOf(levels);
}

/** All m between −highest and highest that leave the remainder `block` by `folds`. */
function blockOf(block: number, folds: number, highest: number): number[] {
  const members: number[] = [];
  for (let m = block - folds * Math.floor((highest + block) / folds); m <= highest; m += folds) members.push(m);
  return members;
}

function check({ barrier, folds, reducedMoment }: HinderedRotor): void {
  if (!(barrier >= 0 && barrier < Infinity)) refuse(`The barrier ${barrier} 1/cm of an internal rotor is not a number from 0 up`);
  if (!Number.isInteger(folds) || folds < 1 || folds > 12) refuse(`An internal rotor has 1 to 12 equal minima, not ${folds}`);
  if (!(reducedMoment > 0 && reducedMoment < Infinity))
    refuse(`The reduced moment of inertia ${reducedMoment} kg m² is not a positive number`);
}
