/** Chemical formulas with their numbers below the line and their charges above it. */
import { element } from "./element";

export interface FormulaRun {
  readonly text: string;
  readonly place: "line" | "below" | "above";
}

/** `C2H5OH` as runs: numbers after a letter or bracket go below, a charge at the end goes above. Pure. */
export function formulaRuns(formula: string): FormulaRun[] {
  const runs: FormulaRun[] = [];
  for (const [piece] of formula.matchAll(/(?<=[\p{L})\]])[\d.]+|[\d]*[+-]$|[^\d]|\d+/gu)) {
    const previous = runs[runs.length - 1];
    const place = runs.length > 0 && /^\d*[+-]$/.test(piece) ? "above" : /^[\d.]+$/.test(piece) && previous ? "below" : "line";
    if (previous?.place === place) runs[runs.length - 1] = { text: previous.text + piece, place };
    else runs.push({ text: piece, place });
  }
  return runs;
}

/** The same as document nodes. */
export function formulaParts(formula: string): (Node | string)[] {
  return formulaRuns(formula).map(({ text, place }) => (place === "line" ? text : element(place === "below" ? "sub" : "sup", {}, text)));
}
