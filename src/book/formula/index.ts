/** Formulas of a workbook: read, resolved and carried over to the engine and back. */
export { bookContext, noBook, type BookContext } from "./book-context";
export { errorFunction } from "./dialects";
export { FunctionNames, inNamespace } from "./function-names";
export { volatileFunctions } from "./function-classes";
export { mostColumns, mostRows } from "./limits";
export { FormulaProblem, type ProblemKind } from "./problem";
export { addressOf, areaOf, cellOf, columnName, type Area, type Reference } from "./references";
export type { Place } from "./structured";
export { fillFunction, toEngine, toFile, type EngineFormula, type TranslationOptions } from "./translate";
