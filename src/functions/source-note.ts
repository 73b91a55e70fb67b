/** The note beside a citation: what set and form, what was taken for the phase, what the source says of itself, and how sure the formation value is. */
import { grades, type SetRecord, setOfId, sourceOf } from "../data/library";
import { disagreement } from "./disagreement";
import { formationUncertaintiesOf } from "../data/uncertainties";

const PHASES = { g: "", l: "liquid: Cv not known, U = H", cr: "solid: Cv = Cp taken, U = H" } as const;

/** Everything a reader of a certificate may ask about one species, in one text. */
export function noteOf(record: SetRecord): string {
  return [
    `set ${record.set} (${setOfId(record.set)?.title ?? ""}), form ${record.form}`,
    record.reference ? `printed reference: ${record.reference}` : "",
    PHASES[record.phase],
    ...record.flags,
    formationWords(record),
    disagreementWords(record.species),
    `grade ${record.grade}: ${grades[record.grade]}`,
  ]
    .filter(Boolean)
    .join("; ");
}

/** The formation enthalpy of the set beside the published value that has the smallest uncertainty. */
function formationWords({ species, phase, formationEnthalpy }: SetRecord): string {
  const row = formationUncertaintiesOf(species).find((one) => one.phase === phase && one.unit === undefined);
  if (!row || formationEnthalpy === null) return "";
  return `formation enthalpy here ${formationEnthalpy / 1000} kJ/mol, published ${row.formation} ± ${row.uncertainty} kJ/mol (${sourceOf(row.source).citation})`;
}

function disagreementWords(species: string): string {
  const properties = [...new Set(disagreement(species).map(({ property }) => property))];
  return properties.length === 0
    ? ""
    : `the sets of ${species} disagree by more than their grades allow in ${properties.join(", ")}: compare SOURCE.SETS`;
}
