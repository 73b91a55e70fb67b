import { refuse } from "../../refusal";
import type { MolecularConstants, SpeciesFit } from "../../species/types";
import { labelOf } from "../printed";

/** How many rotational constants a molecule of this shape has. */
const ROTATIONAL_CONSTANTS = { atom: 0, linear: 1, nonlinear: 3 } as const;

/** The spectroscopic constants of the fit, or the refusal of the first that cannot be used. */
export function checkMolecule(fit: SpeciesFit): MolecularConstants {
  const label = labelOf(fit);
  const molecule = fit.molecular ?? refuse(`The molecular constants of ${label} are not given`);
  if (fit.phase !== "g") refuse(`The form molecular is for gases; ${label} has the phase ${fit.phase}`);
  if (!(fit.molarMass > 0 && fit.molarMass < Infinity))
    refuse(`The molar mass ${fit.molarMass} g/mol of ${label} is not a positive number`);
  if (fit.range && !(fit.range[0] > 0 && fit.range[1] > fit.range[0] && fit.range[1] < Infinity))
    refuse(`The range of ${label} runs from ${fit.range[0]} K to ${fit.range[1]} K; it must begin above 0 K and end above its beginning`);
  const needed = ROTATIONAL_CONSTANTS[molecule.geometry];
  if (needed === undefined) refuse(`"${molecule.geometry}" is not a shape of a molecule; the shapes are atom, linear, nonlinear`);
  if (molecule.rotation.length !== needed && molecule.rotation.length !== 0)
    refuse(`A molecule of the shape ${molecule.geometry} has ${needed} rotational constants; ${label} has ${molecule.rotation.length}`);
  if (!(molecule.symmetry >= 1 && molecule.symmetry < Infinity)) refuse(`The symmetry number ${molecule.symmetry} of ${label} is below 1`);
  positive(molecule.rotation, "rotational constant", label);
  positive(
    molecule.vibrations.map(([wavenumber]) => wavenumber),
    "vibrational wavenumber",
    label,
  );
  positive(
    [...molecule.vibrations, ...molecule.electronic].map(([, degeneracy]) => degeneracy),
    "degeneracy",
    label,
  );
  if (molecule.electronic.length === 0) refuse(`${label} has no electronic ground level; give 0 1/cm and its degeneracy`);
  return molecule;
}

function positive(values: readonly number[], what: string, label: string): void {
  const wrong = values.find((value) => !(value > 0 && value < Infinity));
  if (wrong !== undefined) refuse(`The ${what} ${wrong} of ${label} is not a positive number`);
}
