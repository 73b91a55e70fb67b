/** Gases and mixtures of the library as the cubic equations take them, for tests. */
import { CubicGas } from "../../../src/core/realgas/cubic-gas";
import type { CriticalPoint, CubicForm } from "../../../src/core/realgas/form";
import { criticalOf, pairOf } from "../../../src/data/critical";
import { cubicEquations } from "../../../src/data/cubic-equations";

export type Equation = "peng-robinson" | "soave";
export const EQUATIONS: readonly Equation[] = ["peng-robinson", "soave"];

export function formOf(equation: Equation): CubicForm {
  return cubicEquations.find(({ id }) => id === equation)!;
}

/** The library's first choice of critical constants. */
export function criticalPoint(species: string): CriticalPoint {
  const { temperature, pressure, acentric } = criticalOf(species)!;
  return { species, temperature, pressure: 1e6 * pressure, acentric };
}

/** `{ CH4: 0.9, "n-C4H10": 0.1 }` as one gas, with the binary parameters of the library (those of Peng-Robinson for both equations). */
export function mixtureOf(
  fractions: Readonly<Record<string, number>>,
  equation: Equation = "peng-robinson",
  pointOf: (species: string) => CriticalPoint = criticalPoint,
): CubicGas {
  const names = Object.keys(fractions);
  const parts = names.map((species) => ({ fraction: fractions[species]!, critical: pointOf(species) }));
  return new CubicGas(formOf(equation), parts, (i, j) => pairOf(names[i]!, names[j]!)?.kij ?? 0);
}

export function pureGas(species: string, equation: Equation = "peng-robinson"): CubicGas {
  return mixtureOf({ [species]: 1 }, equation);
}
