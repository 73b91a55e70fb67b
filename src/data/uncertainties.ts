/** Published uncertainties of enthalpies of formation. Not part of library.ts. */
import table from "./uncertainties.json";

export interface FormationUncertainty {
  /** Species key; a substance outside the library by its own name. */
  readonly species: string;
  readonly phase: string;
  /** Enthalpy of formation at 298.15 K as printed: kJ/mol unless `unit` says otherwise. */
  readonly formation: number;
  /** Published uncertainty, about 95 %, in the same unit. */
  readonly uncertainty: number;
  readonly unit?: string;
  /** The network of measurements behind the value, where there is one. */
  readonly network?: string;
  /** The line as printed. */
  readonly printed?: string;
  /** Key in sources.json. */
  readonly source: string;
  readonly fromMemory?: boolean;
}

const rows: readonly FormationUncertainty[] = table.rows;

/** Every row. */
export function allFormationUncertainties(): readonly FormationUncertainty[] {
  return rows;
}

/** The rows of a species, the smallest uncertainty first; empty if it has none. */
export function formationUncertaintiesOf(species: string): readonly FormationUncertainty[] {
  return rows.filter((row) => row.species === species).sort((a, b) => a.uncertainty - b.uncertainty);
}
