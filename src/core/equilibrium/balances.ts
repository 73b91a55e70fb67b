/**
 * The balances of the elements at fixed temperature and volume, for a given set of condensed phases.
 *
 * At equilibrium ln n_j = Σ_k ν_jk y_k − Δ_j for every gas j, with y_k = ln n of the gases of the basis (Basis), and
 *   Δ_j = γ_j − Σ_k ν_jk γ_k,   γ = g/RT + ln(RT / V p°) for a gas, γ = g/RT for a condensed species that is present (activity 1).
 * What is left to find are the y_k that balance the components: Σ_j ν_jk n_j = b_k. They are the minimum of a convex function (the dual of
 * the least Helmholtz energy), so there is one answer, and every descent ends there.
 *
 *   near it   Newton's method for all y at once, in the order of falling abundance, with a limit on the step
 *   far away  one component at a time (one-component.ts)
 *
 * Working in ln n keeps traces right: a component whose terms are all of 1e-30 mol is balanced among those terms.
 */
import type { DoubleDouble } from "../numeric/double-double";
import { type Basis, basisOf } from "./basis";
import { Curvature } from "./curvature";
import { balancingShift } from "./one-component";
import type { System } from "./system";

/** A component is far from balance if its two sides differ by more than this in the logarithm: Newton's method would take that many steps. */
const FAR = 8;
/** Newton's step may change no logarithm by more than this. */
const LONGEST_STEP = 2;
/** A last step this short leaves an error of its square. */
const LAST_STEP = 3e-9;
const ITERATIONS = 400;
/** A gas twice as abundant as a member of the basis that it could replace takes its place. */
const EXCHANGE = Math.LN2;
/** Beyond this the exponential function leaves the range of doubles. */
const LARGEST_LOG = 690;

const EMPTY: Basis = {
  members: [],
  condensed: 0,
  shares: new Float64Array(0),
  totals: new Float64Array(0),
  fromElements: new Float64Array(0),
};

export class Balances {
  /** ln n of the gases; −∞ for those that cannot form. */
  readonly logs: Float64Array;
  basis: Basis;
  iterations = 0;
  private readonly delta: Float64Array;
  private readonly amounts: Float64Array;
  private readonly curvature: Curvature;
  private readonly vector: Float64Array;
  private readonly made: Float64Array;
  private readonly taken: Float64Array;
  /** Gases that can form. */
  private readonly gases: Int32Array;
  private readonly isMember: Uint8Array;

  constructor(
    private readonly system: System,
    private readonly totals: readonly DoubleDouble[],
    /** Gases that can form from what was put in. */
    possible: readonly boolean[],
    /** A basis of gases to begin with. */
    basis: Basis = EMPTY,
  ) {
    const size = system.elements.length;
    this.gases = Int32Array.from(Array.from({ length: system.gases }, (_, j) => j).filter((j) => possible[j]));
    this.isMember = new Uint8Array(system.gases);
    this.logs = new Float64Array(system.gases).fill(-Infinity);
    this.amounts = new Float64Array(system.gases);
    this.delta = new Float64Array(system.gases);
    this.curvature = new Curvature(size);
    this.vector = new Float64Array(size);
    this.made = new Float64Array(size);
    this.taken = new Float64Array(size);
    this.basis = basis;
    this.mark();
  }

  /**
   * Balances everything for potentials γ (by species; those of condensed species are g/RT) and the condensed phases that are present,
   * from the logarithms that `logs` holds. False if it did not come to an end.
   */
  solve(potentials: Float64Array, present: readonly number[]): boolean {
    if (this.isBasedOn(present)) this.relate(potentials);
    else this.rebase(potentials, present);
    for (let step = 0; step < ITERATIONS; step++) {
      this.iterations++;
      this.evaluate();
      if (this.outranked()) {
        this.rebase(potentials, present);
        this.evaluate();
      }
      if (this.farthest() > FAR) this.sweep();
      else {
        const length = this.newton();
        if (Number.isNaN(length)) return false;
        if (length < LAST_STEP) {
          this.evaluate();
          return true;
        }
      }
    }
    return false;
  }

  /** True if the basis holds these condensed phases and no others. */
  private isBasedOn(present: readonly number[]): boolean {
    const { members, condensed } = this.basis;
    return members.length > 0 && condensed === present.length && present.every((species, k) => members[k] === species);
  }

  /** The basis of the most abundant gases, and Δ in it. */
  private rebase(potentials: Float64Array, present: readonly number[]): void {
    const { system, logs, gases } = this;
    const ranking = Array.from(gases).sort((a, b) => logs[b]! - logs[a]! || a - b);
    this.basis = basisOf(system, this.totals, present, ranking);
    this.mark();
    this.relate(potentials);
  }

  private mark(): void {
    const { members, condensed } = this.basis;
    this.isMember.fill(0);
    for (let k = condensed; k < members.length; k++) this.isMember[members[k]!] = 1;
  }

  /** Δ of every gas in the basis. */
  private relate(potentials: Float64Array): void {
    const { members, shares } = this.basis;
    const size = members.length;
    for (const j of this.gases) {
      let sum = 0;
      if (this.isMember[j] === 0) {
        sum = potentials[j]!;
        for (let k = 0; k < size; k++) {
          const share = shares[j * size + k]!;
          if (share !== 0) sum -= share * potentials[members[k]!]!;
        }
      }
      this.delta[j] = sum;
    }
  }

  /** ln n and n of all gases from those of the basis. */
  private evaluate(): void {
    const { members, condensed, shares } = this.basis;
    const { logs, delta, amounts, gases, isMember } = this;
    const size = members.length;
    for (const j of gases) {
      if (isMember[j] === 0) {
        let sum = -delta[j]!;
        for (let k = condensed; k < size; k++) {
          const share = shares[j * size + k]!;
          if (share !== 0) sum += share * logs[members[k]!]!;
        }
        logs[j] = sum;
      }
      amounts[j] = amountOf(logs[j]!);
    }
  }

  /** True if a gas outside the basis is clearly more abundant than a member that it could replace. */
  private outranked(): boolean {
    const { members, condensed, shares } = this.basis;
    const size = members.length;
    for (let k = condensed; k < size; k++) {
      const limit = this.logs[members[k]!]! + EXCHANGE;
      for (let j = 0; j < this.logs.length; j++) if (this.logs[j]! > limit && shares[j * size + k] !== 0) return true;
    }
    return false;
  }

  /** The largest |ln(made / taken)| of the components; fills both sides. */
  private farthest(): number {
    const { members, condensed } = this.basis;
    let farthest = 0;
    for (let k = condensed; k < members.length; k++) {
      this.sidesOf(k);
      const distance = Math.abs(Math.log(this.made[k]! / this.taken[k]!));
      if (!(distance <= farthest)) farthest = Number.isNaN(distance) ? Infinity : distance;
    }
    return farthest;
  }

  /** Σ ν n over positive and over negative terms of a component, what was put in standing on the side where it is positive. */
  private sidesOf(k: number): void {
    const { members, shares, totals } = this.basis;
    const size = members.length;
    let made = Math.max(0, -totals[k]!);
    let taken = Math.max(0, totals[k]!);
    for (let j = 0; j < this.amounts.length; j++) {
      const part = shares[j * size + k]! * this.amounts[j]!;
      if (part > 0) made += part;
      else taken -= part;
    }
    this.made[k] = made;
    this.taken[k] = taken;
  }

  /** Balances one component after another, the most abundant first. */
  private sweep(): void {
    const { members, condensed } = this.basis;
    for (let k = condensed; k < members.length; k++) {
      this.sidesOf(k);
      if (Math.abs(Math.log(this.made[k]! / this.taken[k]!)) < FAR / 10) continue;
      this.shift(k, balancingShift(this.basis, k, this.gases, this.logs));
    }
  }

  /** Changes y_k, and with it every gas that holds a share of component k. */
  private shift(k: number, change: number): void {
    const { members, shares } = this.basis;
    const size = members.length;
    for (const j of this.gases) {
      const share = shares[j * size + k]!;
      if (share === 0) continue;
      this.logs[j] = this.logs[j]! + share * change;
      this.amounts[j] = amountOf(this.logs[j]!);
    }
  }

  /** One limited step of Newton's method; gives its length, NaN if the matrix failed. */
  private newton(): number {
    const { members, condensed, shares, totals } = this.basis;
    const { logs, amounts, vector } = this;
    const size = members.length;
    for (let k = condensed; k < size; k++) {
      let missing = totals[k]!;
      for (let j = 0; j < amounts.length; j++) missing -= shares[j * size + k]! * amounts[j]!;
      vector[k - condensed] = missing;
    }
    if (!this.curvature.solve(this.basis, this.logs, this.amounts, this.vector)) return NaN;
    let length = 0;
    for (let k = 0; k < size - condensed; k++) length = Math.max(length, Math.abs(vector[k]!));
    const part = length > LONGEST_STEP ? LONGEST_STEP / length : 1;
    for (let k = condensed; k < size; k++) logs[members[k]!] = logs[members[k]!]! + part * vector[k - condensed]!;
    return length;
  }

  /**
   * How the balanced amounts follow a change: `pushes` is −dγ of every species for a unit of it (gases and condensed). Gives d ln n of the
   * gases; those of the condensed members follow from `condensedChange`. False if the matrix failed.
   */
  follow(pushes: Float64Array, changes: Float64Array): boolean {
    const { members, condensed, shares } = this.basis;
    const { amounts, vector } = this;
    const size = members.length;
    for (let j = 0; j < amounts.length; j++) {
      let push = this.isMember[j] === 1 ? 0 : pushes[j]!;
      if (this.isMember[j] === 0) for (let k = 0; k < size; k++) push -= shares[j * size + k]! * pushes[members[k]!]!;
      changes[j] = push;
    }
    for (let k = condensed; k < size; k++) {
      let sum = 0;
      for (let j = 0; j < amounts.length; j++) sum -= shares[j * size + k]! * amounts[j]! * changes[j]!;
      vector[k - condensed] = sum;
    }
    if (!this.curvature.solve(this.basis, this.logs, this.amounts, this.vector)) return false;
    for (let j = 0; j < amounts.length; j++)
      for (let k = condensed; k < size; k++) changes[j] = changes[j]! + shares[j * size + k]! * vector[k - condensed]!;
    return true;
  }

  /** Carries ln n of the basis along their slopes. */
  lead(slopes: Float64Array, change: number): void {
    const { members, condensed } = this.basis;
    for (let k = condensed; k < members.length; k++) this.logs[members[k]!] = this.logs[members[k]!]! + slopes[members[k]!]! * change;
  }

  /** Change of the amount of condensed member k, mol, that belongs to changes d ln n of the gases. */
  condensedChange(k: number, changes: Float64Array): number {
    const { members, shares } = this.basis;
    let change = 0;
    for (let j = 0; j < this.amounts.length; j++) change -= shares[j * members.length + k]! * this.amounts[j]! * changes[j]!;
    return change;
  }

  /** Amounts of the gases, mol. */
  gasAmounts(): Float64Array {
    return this.amounts;
  }

  /** True if the condensed phases that are there can hold everything: nothing of the components of the gas was put in. */
  get canCondense(): boolean {
    const { condensed, totals } = this.basis;
    return condensed > 0 && totals.subarray(condensed).every((total) => total === 0);
  }

  /** Takes the gas away; everything stands in the condensed phases. */
  dropGas(): void {
    this.amounts.fill(0);
    this.logs.fill(-Infinity);
  }

  /** Amount of a condensed member: what the gases leave of its component. */
  condensedAmount(k: number): number {
    const { members, shares, totals } = this.basis;
    let amount = totals[k]!;
    for (let j = 0; j < this.amounts.length; j++) amount -= shares[j * members.length + k]! * this.amounts[j]!;
    return amount;
  }
}

function amountOf(log: number): number {
  return Math.exp(Math.min(log, LARGEST_LOG));
}
