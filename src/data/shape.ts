/** The shape of a molecule for the count of its classical degrees of freedom: number of atoms, and whether it is linear. */
import type { MoleculeShape } from "../core/capacity/limits";
import type { SpeciesFit } from "../core/species/types";
import { atomsOf, hillOf } from "./composition";
import { allSpecies, speciesOfKey } from "./species";

/**
 * Atoms and linearity of the gas of a fit. A species typed in cells takes the shape of the library's gas of the same formula if all
 * isomers agree; one the library does not know is taken as bent.
 */
export function shapeOf(fit: Pick<SpeciesFit, "species" | "formula">): MoleculeShape {
  const entry = speciesOfKey(fit.species);
  return { atoms: atomsOf(fit.formula), linear: entry === undefined ? isLinear(fit.formula) : (entry.linear ?? false) };
}

function isLinear(formula: string): boolean {
  const hill = hillOf(formula);
  const gases = allSpecies().filter((one) => one.phase === "g" && one.formula === hill);
  return gases.length > 0 && gases.every((one) => one.linear === true);
}
