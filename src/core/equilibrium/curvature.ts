/**
 * The matrix of the balances, Σ_j ν_jk ν_jl n_j over all gases j, for the gases k, l of the basis: the slope of each balance with ln n of
 * each member. It is scaled with 1/√n of the members, so that its diagonal is 1 or a little more and, as no gas is more abundant than the
 * members it could replace, nothing in it is large.
 */
import { solvePositive } from "../numeric/cholesky";
import type { Basis } from "./basis";

export class Curvature {
  private readonly matrix: Float64Array;
  private readonly scale: Float64Array;

  /** `size`: most members of a basis. */
  constructor(size: number) {
    this.matrix = new Float64Array(size * size);
    this.scale = new Float64Array(size);
  }

  /** Solves matrix × x = vector in place, one entry for each gas of the basis. False if that fails. */
  solve(basis: Basis, logs: Float64Array, amounts: Float64Array, vector: Float64Array): boolean {
    const { scale } = this;
    const unknowns = basis.members.length - basis.condensed;
    this.fill(basis, logs, amounts);
    for (let k = 0; k < unknowns; k++) vector[k] = vector[k]! * scale[k]!;
    if (!solvePositive(this.matrix, vector, unknowns)) return false;
    for (let k = 0; k < unknowns; k++) {
      vector[k] = vector[k]! * scale[k]!;
      if (!Number.isFinite(vector[k]!)) return false;
    }
    return true;
  }

  /** The lower triangle. */
  private fill({ members, condensed, shares }: Basis, logs: Float64Array, amounts: Float64Array): void {
    const { matrix, scale } = this;
    const size = members.length;
    const unknowns = size - condensed;
    for (let k = 0; k < unknowns; k++) scale[k] = Math.exp(-logs[members[condensed + k]!]! / 2);
    matrix.fill(0);
    for (let j = 0; j < amounts.length; j++) {
      const amount = amounts[j]!;
      if (amount === 0) continue;
      const at = j * size + condensed;
      for (let k = 0; k < unknowns; k++) {
        const share = shares[at + k]!;
        if (share === 0) continue;
        const part = share * amount * scale[k]!;
        for (let l = 0; l <= k; l++) matrix[k * unknowns + l] = matrix[k * unknowns + l]! + part * shares[at + l]! * scale[l]!;
      }
    }
  }
}
