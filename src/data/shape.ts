/** The shape of a molecule for the count of its classical degrees of freedom: number of atoms, and whether it is linear. */
import type { MoleculeShape } from "../core/capacity/limits";
import { parseFormula } from "../core/species/formula";
import type { SpeciesFit } from "../core/species/types";
import linear from "./linear.json";

/** Atoms and linearity of the gas of a fit. A species typed in cells that the library does not list as linear is taken as bent. */
export function shapeOf(fit: SpeciesFit): MoleculeShape {
  const atoms = [...parseFormula(fit.formula).counts.values()].reduce((sum, count) => sum + count, 0);
  return { atoms, linear: linear.species.includes(fit.species.replace(/\(g\)$/, "")) };
}
