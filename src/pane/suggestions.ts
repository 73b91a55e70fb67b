/** What the pane suggests for a field; other texts can be typed. */
import { allPrecision } from "../data/precision";
import type { HandbookParameter } from "../handbook";
import { suggestionsOf } from "./wording";

/** Units to choose from for a result, by the unit in which the function gives it. Every one is an ordinary unit text; others can be typed. */
const BY_RESULT: Readonly<Record<string, readonly string[]>> = {
  "J/(mol K)": ["kJ/(mol K)", "J/(g K)", "kJ/(kg K)", "cal_th/(mol K)", "Btu_IT/(lb degF)"],
  "J/mol": ["kJ/mol", "J/g", "kJ/kg", "MJ/kg", "cal_th/mol", "Btu_IT/lb"],
  "g/mol": ["kg/mol"],
  J: ["kJ", "MJ", "kWh", "cal_th", "Btu_IT"],
  K: ["\u00b0C", "\u00b0F"],
  Pa: ["kPa", "bar", "MPa", "atm", "psi"],
  mol: ["kmol"],
};

export function suggestedUnits(resultUnit: string): readonly string[] {
  return BY_RESULT[resultUnit] ?? [];
}

/** Words that an argument takes beside numbers and cells: those its help names, and the methods whose precision the library knows. */
export function suggestedTexts(parameter: HandbookParameter): readonly string[] {
  if (parameter.name === "repeatability") return allPrecision().map(({ id }) => id);
  return parameter.name === "formula" ? [] : suggestionsOf(parameter);
}
