import { engineFunctions, type EngineLibrary } from "./library";

/** Functions that the engine has and Excel has not: a workbook that calls them would show #NAME? there. Operators call some of them. */
export const engineOnly: ReadonlySet<string> = new Set(
  `ADD ARRAY.CONSTRAIN ARRAY.LITERAL ARRAY.ROW AVERAGE.WEIGHTED COUNTUNIQUE COUNTUNIQUEIFS DIVIDE EQ FLATTEN FORMAT.LARGE.NUMBER GT GTE JOIN LT LTE
   MATTHEWS MINUS MONTH.END MONTH.START MULTIPLY NE PIVOT PIVOT.HEADER PIVOT.VALUE POLYFIT.COEFFS POLYFIT.FORECAST POW QUARTER QUARTER.END
   QUARTER.START SORTN SPEARMAN SPILLED.RANGE SPLIT UMINUS UNARY.PERCENT UPLUS YEAR.END YEAR.START`.split(/\s+/),
);

/** Keeps them out of autocompletion, with the stand-ins that only the translator writes. */
export function hideEngineOnly(library: EngineLibrary): void {
  const registry = engineFunctions(library);
  for (const name of [...engineOnly, "LOG_10"]) {
    const known = registry.content[name];
    if (known) registry.replace(name, { ...known, hidden: true });
  }
}
