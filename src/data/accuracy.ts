import type { Grade } from "./sources";

/** Standard accuracy a grade stands for: Cp in percent, H in kJ/mol, S in J/(mol K), both at 298.15 K (common practice, set here). */
export const ACCURACY: Readonly<Record<Grade, { readonly cp: number; readonly enthalpy: number; readonly entropy: number }>> = {
  A: { cp: 1, enthalpy: 0.5, entropy: 0.3 },
  B: { cp: 2, enthalpy: 1, entropy: 1 },
  C: { cp: 3, enthalpy: 4, entropy: 3 },
};
