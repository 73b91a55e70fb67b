/** Shape of a molecule, for the classical limits of Cv. */
import type { MoleculeShape } from "../core/capacity/limits";
import type { MolecularConstants, SpeciesFit } from "../core/species/types";
import { atomsOf, hillOf } from "./composition";
import { allSpecies, speciesOfKey } from "./species";

/** Whether the molecule is linear: as the library says for this species, or for every gas of this formula; else undefined. */
function isLinear(species: string, formula: string): boolean | undefined {
  const entry = speciesOfKey(species);
  if (entry !== undefined) return entry.linear ?? false;
  const hill = hillOf(formula);
  const answers = new Set(allSpecies().filter((one) => one.phase === "g" && one.formula === hill).map((one) => one.linear ?? false));
  return answers.size === 1 ? [...answers][0] : undefined;
}

/** What the classical limits of a gas need: its molecular constants if the record holds them, else atoms and whether it is linear. */
export function geometryOf(fit: Pick<SpeciesFit, "species" | "formula" | "molecular">): MolecularConstants | MoleculeShape {
  return fit.molecular ?? { atoms: atomsOf(fit.formula), linear: isLinear(fit.species, fit.formula) };
}
