/**
 * The published uncertainty behind the formation enthalpy that a fit holds: that of the published value nearest to it.
 * Elements in their reference state have the enthalpy of formation 0 by definition and are exact.
 */
import { printed } from "../core/refusal";
import { parseFormula } from "../core/species/formula";
import type { SpeciesFit } from "../core/species/types";
import { recordsOf } from "../data/library";
import { type FormationUncertainty, formationUncertaintiesOf } from "../data/uncertainties";

/** The uncertainty of a fit, J/mol (0: exact; undefined: none published), and the published row behind it. */
export interface FitUncertainty {
  readonly joules: number | undefined;
  readonly row?: FormationUncertainty;
}

export function fitUncertainty(fit: SpeciesFit): FitUncertainty {
  if (isReferenceElement(fit)) return { joules: 0 };
  const own = fit.formationEnthalpy;
  if (own === null || !isOfLibrary(fit)) return { joules: undefined };
  const [row] = formationUncertaintiesOf(fit.species)
    .filter(({ phase, unit }) => phase === fit.phase && unit === undefined)
    .sort((a, b) => distance(a, own) - distance(b, own) || b.uncertainty - a.uncertainty);
  return row ? { joules: 1000 * row.uncertainty, row } : { joules: undefined };
}

/** The sentence for a fit whose formation enthalpy lies outside the published value and its uncertainty; undefined if it does not. */
export function outsidePublished(fit: SpeciesFit, { row }: FitUncertainty): string | undefined {
  const own = fit.formationEnthalpy;
  if (!row || own === null || distance(row, own) <= row.uncertainty * (1 + 1e-9)) return undefined;
  return `The formation enthalpy of ${fit.species} in ${fit.set}, ${printed(own / 1000)} kJ/mol, lies outside the published ${row.formation} ± ${row.uncertainty} kJ/mol`;
}

/** kJ/mol. */
function distance(row: FormationUncertainty, own: number): number {
  return Math.abs(row.formation - own / 1000);
}

function isOfLibrary(fit: SpeciesFit): boolean {
  return "source" in fit;
}

/** One element with the enthalpy of formation 0, in this fit or in another set of the library. */
function isReferenceElement(fit: SpeciesFit): boolean {
  if (parseFormula(fit.formula).counts.size !== 1) return false;
  return (
    fit.formationEnthalpy === 0 || (isOfLibrary(fit) && recordsOf(fit.species).some(({ formationEnthalpy }) => formationEnthalpy === 0))
  );
}
