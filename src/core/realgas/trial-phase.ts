/**
 * A phase of any composition x of given gases at one T and P, the one of smaller Gibbs energy where there are two (form.ts, cubic-gas.ts):
 *
 *   ln φ_i = (b_i/b) (Z − 1) − ln Z − ln(1 − b/v) − (2 Σ x_j a_ij − a b_i/b) L/(R T)
 *
 * What depends on T alone is computed once: a search asks for hundreds of compositions. T in K, P in Pa, a_ij in J m³/mol², b_i in m³/mol.
 */
import { GAS_CONSTANT } from "../constants";
import type { CubicForm } from "./form";
import { logarithmOf } from "./one-fluid";
import { stableVolumeOf } from "./volumes";

export class TrialPhase {
  private readonly cross: number[];

  constructor(
    private readonly form: CubicForm,
    private readonly temperature: number,
    private readonly pressure: number,
    private readonly sizes: readonly number[],
    private readonly pulls: readonly (readonly number[])[],
  ) {
    this.cross = sizes.map(() => 0);
  }

  /** Writes ln φ_i at the mole fractions x into `out`. */
  logFugacities(fractions: readonly number[], out: number[]): void {
    const { form, temperature, pressure, sizes, pulls, cross } = this;
    let [a, b] = [0, 0];
    for (let i = 0; i < sizes.length; i++) {
      const row = pulls[i]!;
      let sum = 0;
      for (let j = 0; j < sizes.length; j++) sum += fractions[j]! * row[j]!;
      cross[i] = sum;
      a += fractions[i]! * sum;
      b += fractions[i]! * sizes[i]!;
    }
    const volume = stableVolumeOf(form, a, b, temperature, pressure);
    const z = (pressure * volume) / (GAS_CONSTANT * temperature);
    const packing = -Math.log(z) - Math.log1p(-b / volume);
    const strength = logarithmOf(form, b, volume) / (GAS_CONSTANT * temperature);
    const [push, pull] = [(z - 1) / b, (a / b) * strength];
    for (let i = 0; i < sizes.length; i++) out[i] = sizes[i]! * (push + pull) + packing - 2 * cross[i]! * strength;
  }
}
