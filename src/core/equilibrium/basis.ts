/**
 * A basis: as many species as there are independent elements, from which every other species can be formed by a reaction,
 *   a_j = Σ_k ν_jk a_k     a: atoms of a species, ν: share of basis species k in species j
 * chosen from the most abundant species. In such a basis the balance of a trace component holds traces only, so that it is right to the
 * last digit beside components that are 10³⁰ times as abundant. Everything is computed in whole numbers (Bareiss, Mathematics of
 * Computation 22 (1968) 565), so that a share that is zero is exactly zero.
 */
import { add, type DoubleDouble, timesDouble } from "../numeric/double-double";
import type { System } from "./system";

export interface Basis {
  /** Species of the basis: the condensed phases that are there, then gases, the most abundant first. */
  readonly members: readonly number[];
  /** How many of the members are condensed. */
  readonly condensed: number;
  /** ν, species × members, row by row. */
  readonly shares: Float64Array;
  /** Amount of each component, Σ T b, mol. */
  readonly totals: Float64Array;
  /** T: members × elements; the amount of component k is Σ_i T_ki b_i. */
  readonly fromElements: Float64Array;
}

/** A component of which less than this share of its terms is left is exactly balanced. */
const CANCELLED = 1e-29;

/**
 * The basis for given abundances.
 *
 * `present`: condensed species that must be in it, by index; one that depends on those before it is passed over.
 * `ranking`: gases in falling order of abundance. `totals`: atoms put in, as `totalsOf` gives them.
 */
export function basisOf(system: System, totals: readonly DoubleDouble[], present: readonly number[], ranking: readonly number[]): Basis {
  const elimination = new Elimination(system);
  const members: number[] = [];
  for (const species of present) if (elimination.take(species)) members.push(species);
  const condensed = members.length;
  for (const species of ranking) {
    if (members.length === system.elements.length) break;
    if (elimination.take(species)) members.push(species);
  }
  const fromElements = elimination.transform();
  return { members, condensed, shares: elimination.shares(), fromElements, totals: componentTotals(elimination, totals) };
}

/** Fraction-free elimination of [atoms by element | unit matrix], one species after another. */
class Elimination {
  private readonly species: number;
  private readonly width: number;
  private readonly table: Float64Array;
  /** Row of each member, in the order taken. */
  private readonly rows: number[] = [];
  private determinant = 1;

  constructor(private readonly system: System) {
    const elements = system.elements.length;
    this.species = system.species.length;
    this.width = this.species + elements;
    this.table = new Float64Array(elements * this.width);
    for (let i = 0; i < elements; i++) {
      for (let j = 0; j < this.species; j++) this.table[i * this.width + j] = system.atoms[j * elements + i]!;
      this.table[i * this.width + this.species + i] = 1;
    }
  }

  /** Takes a species into the basis; false if it depends on those already in it. */
  take(species: number): boolean {
    const { table, width, system } = this;
    for (let row = 0; row < system.elements.length; row++) {
      const pivot = table[row * width + species]!;
      if (pivot === 0 || this.rows.includes(row)) continue;
      for (let other = 0; other < system.elements.length; other++) if (other !== row) this.clear(other, row, species, pivot);
      this.rows.push(row);
      this.determinant = pivot;
      return true;
    }
    return false;
  }

  private clear(row: number, from: number, species: number, pivot: number): void {
    const { table, width, determinant } = this;
    const factor = table[row * width + species]!;
    for (let k = 0; k < width; k++)
      table[row * width + k] = (pivot * table[row * width + k]! - factor * table[from * width + k]!) / determinant;
  }

  shares(): Float64Array {
    const size = this.rows.length;
    const shares = new Float64Array(this.species * size);
    for (const [k, row] of this.rows.entries())
      for (let j = 0; j < this.species; j++) shares[j * size + k] = this.table[row * this.width + j]! / this.determinant + 0;
    return shares;
  }

  transform(): Float64Array {
    const elements = this.system.elements.length;
    const result = new Float64Array(this.rows.length * elements);
    for (const [k] of this.rows.entries())
      for (let i = 0; i < elements; i++) result[k * elements + i] = this.whole(k, i) / this.determinant + 0;
    return result;
  }

  /** Whole number T_ki times the determinant. */
  whole(member: number, element: number): number {
    return this.table[this.rows[member]! * this.width + this.species + element]!;
  }

  get size(): number {
    return this.rows.length;
  }

  get divisor(): number {
    return this.determinant;
  }
}

function componentTotals(elimination: Elimination, totals: readonly DoubleDouble[]): Float64Array {
  const result = new Float64Array(elimination.size);
  for (let k = 0; k < elimination.size; k++) {
    let sum: DoubleDouble = [0, 0];
    let size = 0;
    for (const [i, total] of totals.entries()) {
      const whole = elimination.whole(k, i);
      if (whole === 0) continue;
      sum = add(sum, timesDouble(total, whole));
      size += Math.abs(whole * total[0]);
    }
    result[k] = Math.abs(sum[0]) <= CANCELLED * size ? 0 : sum[0] / elimination.divisor;
  }
  return result;
}
