import type { Outcome, OutcomeCell, OutcomeError } from "../recalc/evaluate";

/** An outcome for the eye: the value, rows with tabs between the values, or `#VALUE! sentence`. */
export function printOutcome(outcome: Outcome): string {
  if ("error" in outcome) return errorText(outcome.error);
  const { value } = outcome;
  if (!Array.isArray(value)) return cellText(value as OutcomeCell);
  return (value as readonly (readonly OutcomeCell[])[]).map((row) => row.map(cellText).join("\t")).join("\n");
}

function cellText(cell: OutcomeCell): string {
  if (typeof cell === "object") return errorText(cell.error);
  return typeof cell === "boolean" ? String(cell).toUpperCase() : String(cell);
}

function errorText({ code, message }: OutcomeError): string {
  return message === "" ? code : `${code} ${message}`;
}
