/** Figures of the cubic equations of state. Not part of library.ts. */
import type { CubicForm } from "../core/realgas/form";
import table from "./cubic-equations.json";

export interface CubicEquation extends CubicForm {
  /** Acentric factor up to which the equation was fitted; from memory. */
  readonly acentricUpTo: number;
  /** Key in sources.json. */
  readonly source: string;
}

export const cubicEquations: readonly CubicEquation[] = table.equations;
