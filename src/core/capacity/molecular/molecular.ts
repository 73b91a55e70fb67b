import { AVOGADRO, BOLTZMANN, KELVIN_PER_WAVENUMBER, PLANCK, REFERENCE_TEMPERATURE } from "../../constants";
import { refuse } from "../../refusal";
import type { MolecularConstants, SpeciesFit } from "../../species/types";
import type { Capacity } from "../capacity";
import { CurveCapacity } from "../curves";
import { headOf, labelOf } from "../printed";
import { checkMolecule } from "./check";
import { rotorLevels } from "./hindered-rotor";
import { type Contribution, type Levels, levelsOf, oscillator, overLevels } from "./levels";

/**
 * The form `molecular`: ideal gas of rigid rotors and harmonic oscillators with electronic levels and, if given, hindered internal rotors.
 * Everything comes from the partition function in closed form (McQuarrie, Statistical Mechanics, chapters 5, 6 and 8).
 *
 * Classical rotation: light rotors such as H2 need the quantum sum below about 300 K; the record's range has to say so.
 * H is counted so that H(298.15 K) is the formation enthalpy, or 0 and off the formation scale if the record gives none.
 * S is absolute, at the standard pressure of the record; without rotational constants it is not known.
 */
export function molecular(fit: SpeciesFit): Capacity {
  const molecule = checkMolecule(fit);
  const [from, to] = fit.range ?? refuse(`The range of ${labelOf(fit)} is not given`);
  const motions = motionsOf(molecule, to);
  const gasConstant = fit.gasConstant;
  const hasEntropy = molecule.geometry === "atom" || molecule.rotation.length > 0;
  const zeroOfEntropy = translationConstant(fit.molarMass, fit.standardPressure) + (hasEntropy ? rotationConstant(molecule) : NaN);
  const relative = (t: number) => gasConstant * t * (1 + total(motions, t).energy);
  const shift = (fit.formationEnthalpy ?? 0) - relative(REFERENCE_TEMPERATURE);
  const translationAndRotation = 2.5 + rotationalHeat(molecule);
  const onFormationScale = fit.formationEnthalpy !== null && (fit.onFormationScale ?? true);
  return new CurveCapacity(headOf(fit, onFormationScale, hasEntropy), from, to, [], {
    cp: (t) => gasConstant * (1 + total(motions, t).heat),
    enthalpy: (t) => relative(t) + shift,
    entropy: (t) => gasConstant * (zeroOfEntropy + translationAndRotation * (1 + Math.log(t)) + total(motions, t).entropy),
  });
}

/** Everything that depends on temperature, prepared once. */
interface Motions {
  /** Cv/R of translation and rotation, which is also their U/RT. */
  readonly classical: number;
  /** Energy of one quantum, K, and degeneracy. */
  readonly oscillators: readonly (readonly [energy: number, degeneracy: number])[];
  /** Electronic levels and the levels of each internal rotor. */
  readonly levels: readonly Levels[];
}

function motionsOf(molecule: MolecularConstants, highestTemperature: number): Motions {
  const inKelvin = ([wavenumber, degeneracy]: readonly [number, number]) => [wavenumber * KELVIN_PER_WAVENUMBER, degeneracy] as const;
  return {
    classical: 1.5 + rotationalHeat(molecule),
    oscillators: molecule.vibrations.map(inKelvin),
    levels: [
      levelsOf(molecule.electronic.map(inKelvin)),
      ...(molecule.rotors ?? []).map((rotor) => rotorLevels(rotor, highestTemperature)),
    ],
  };
}

/** Cv/R and U/RT of all motions; S/R of vibration, electrons and internal rotors only. */
function total(motions: Motions, temperature: number): Contribution {
  let heat = motions.classical;
  let energy = motions.classical;
  let entropy = 0;
  const add = (part: Contribution, times: number) => {
    heat += times * part.heat;
    energy += times * part.energy;
    entropy += times * part.entropy;
  };
  for (const [quantum, degeneracy] of motions.oscillators) add(oscillator(quantum, temperature), degeneracy);
  for (const levels of motions.levels) add(overLevels(levels, temperature), 1);
  return { heat, energy, entropy };
}

/** Cv/R of classical rotation: one half for each axis that counts. */
function rotationalHeat(molecule: MolecularConstants): number {
  return { atom: 0, linear: 1, nonlinear: 1.5 }[molecule.geometry];
}

/** Sackur and Tetrode: S/R = constant + 5/2 + 5/2 ln T; constant = ln[(2πmk/h²)^(3/2) k/p]. Molar mass in g/mol, pressure in Pa. */
function translationConstant(molarMass: number, pressure: number): number {
  const mass = molarMass / 1000 / AVOGADRO;
  return 1.5 * Math.log((2 * Math.PI * mass * BOLTZMANN) / PLANCK ** 2) + Math.log(BOLTZMANN / pressure);
}

/** S/R of rotation less its Cv/R (1 + ln T): −ln(σΘ) for a linear molecule, ln[√(π/ΘaΘbΘc)/σ] for another. */
function rotationConstant({ geometry, rotation, symmetry }: MolecularConstants): number {
  if (geometry === "atom") return 0;
  const theta = rotation.map((constant) => constant * KELVIN_PER_WAVENUMBER);
  if (geometry === "linear") return -Math.log(symmetry * theta[0]!);
  return 0.5 * Math.log(Math.PI / (theta[0]! * theta[1]! * theta[2]!)) - Math.log(symmetry);
}
