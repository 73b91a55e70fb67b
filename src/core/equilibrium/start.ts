/**
 * Where the search begins: the composition of least Gibbs energy if mixing is left out, a problem of linear programming
 * (White, Johnson and Dantzig, J. Chem. Phys. 28 (1958) 751), and which species can form at all from what was put in.
 */
import type { DoubleDouble } from "../numeric/double-double";
import { leastCost, type Vertex } from "../numeric/simplex";
import { refuse } from "../refusal";
import { type Basis, basisOf } from "./basis";
import type { System } from "./system";
import type { Equilibrium } from "./types";

export interface Start {
  /** ln of the amounts of the gases, mol. */
  readonly logs: Float64Array;
  /** Condensed species that are there. */
  readonly present: readonly number[];
}

/** ln of the amount given to a gas of the basis that the linear problem leaves at zero, relative to what was put in. */
const TRACE = -30;

/** Amounts measured by what the feed could make at most of each species, atoms by what was put in: everything is near 1. */
class Scaled {
  readonly matrix: Float64Array;
  readonly right: Float64Array;
  readonly most: Float64Array;

  constructor(
    private readonly system: System,
    private readonly totals: readonly DoubleDouble[],
  ) {
    const elements = system.elements.length;
    const columns = system.species.length;
    this.most = Float64Array.from(system.species, (_, j) => {
      let most = Infinity;
      for (let i = 0; i < elements; i++) {
        const count = system.atoms[j * elements + i]!;
        if (count > 0) most = Math.min(most, totals[i]![0] / count);
      }
      return most;
    });
    const rows = totals.map(([total], i) => (total > 0 ? i : -1)).filter((i) => i >= 0);
    this.right = new Float64Array(rows.length).fill(1);
    this.matrix = new Float64Array(rows.length * columns);
    for (const [row, i] of rows.entries())
      for (let j = 0; j < columns; j++) this.matrix[row * columns + j] = (system.atoms[j * elements + i]! * this.most[j]!) / totals[i]![0];
  }

  least(cost: (species: number) => number): Vertex {
    const costs = Float64Array.from(this.system.species, (_, j) => (this.most[j] === 0 ? 0 : cost(j)));
    return leastCost(this.matrix, this.right, costs) ?? this.refuseFeed();
  }

  private refuseFeed(): never {
    const { species, elements } = this.system;
    const put = elements.filter((_, i) => this.totals[i]![0] > 0);
    return refuse(
      `The atoms put in (${put.join(", ")}) cannot be made up of ${species.map(({ name }) => name).join(", ")} alone: add species to the list`,
    );
  }
}

/**
 * Which species can form. A species of an element that was not put in cannot; nor can one whose atoms are all bound elsewhere by the
 * balances, as CO from CO2 where no species could take the oxygen.
 * Refuses a feed that the species cannot make up.
 */
export function possibleSpecies(system: System, totals: readonly DoubleDouble[]): boolean[] {
  const scaled = new Scaled(system, totals);
  const possible = new Array<boolean>(system.species.length).fill(false);
  const first = scaled.least(() => 0);
  const mark = ({ x }: Vertex) => x.forEach((amount, j) => (possible[j] ||= amount > POSSIBLE));
  mark(first);
  exchange(system, totals, first.basis, possible);
  for (let j = 0; j < possible.length; j++) if (!possible[j] && scaled.most[j]! > 0) mark(scaled.least((k) => (k === j ? -1 : 0)));
  return possible;
}

/**
 * The basis of the most abundant gases of a state not far away (`logAmounts`: ln of its amounts, by candidate), if every component of it
 * was put in: then every species can form, as a little of it can be exchanged for them. Else undefined.
 */
export function fullBasis(system: System, totals: readonly DoubleDouble[], logAmounts: Float64Array): Basis | undefined {
  const log = (j: number) => logAmounts[system.places[j]!]!;
  const ranking = Array.from({ length: system.gases }, (_, j) => j).sort((a, b) => log(b) - log(a) || a - b);
  const basis = basisOf(system, totals, [], ranking);
  const least = POSSIBLE * Math.max(...basis.totals);
  return basis.members.length === system.elements.length && basis.totals.every((total) => total > least) ? basis : undefined;
}

/**
 * Marks what can form by exchange with a basis: a little of a species is possible if it takes nothing from members that are not there.
 * Whether a member is there is asked of the exact totals: 1e-12 of CO beside CO2 is no rounding.
 */
function exchange(system: System, totals: readonly DoubleDouble[], members: readonly number[], possible: boolean[]): void {
  const { shares, totals: amounts } = basisOf(system, totals, members, []);
  const size = members.length;
  members.forEach((member, k) => (possible[member] ||= amounts[k]! > 0));
  const share = (j: number, k: number) => shares[j * size + k]!;
  const inside = (j: number) => system.elements.every((_, i) => totals[i]![0] > 0 || system.atoms[j * system.elements.length + i] === 0);
  for (let found = true; found;) {
    found = false;
    for (let j = 0; j < possible.length; j++) {
      if (possible[j] || members.includes(j) || !inside(j)) continue;
      if (!members.every((member, k) => possible[member] || share(j, k) <= 0)) continue;
      found = possible[j] = true;
      members.forEach((member, k) => (possible[member] ||= share(j, k) < 0));
    }
  }
}

/** A share of the most that could form; below it stands the rounding of the feed. */
const POSSIBLE = 1e-9;

/** The start from a state not far away; undefined if a gas that can form now was not there. */
export function startFrom(system: System, near: Equilibrium, possible: readonly boolean[]): Start | undefined {
  const log = (j: number) => near.logAmounts[system.places[j]!]!;
  const logs = new Float64Array(system.gases).map((_, j) => (possible[j] ? log(j) : -Infinity));
  if (logs.some((each, j) => possible[j]! && each === -Infinity)) return undefined;
  const present = system.species.flatMap((_, j) => (j >= system.gases && log(j) > -Infinity ? [j] : []));
  return { logs, present };
}

/** The start for potentials γ by species; species without one (NaN) and those that cannot form are not used. */
export function startOf(system: System, totals: readonly DoubleDouble[], potentials: Float64Array, possible: readonly boolean[]): Start {
  const scaled = new Scaled(system, totals);
  const usable = (j: number) => possible[j]! && !Number.isNaN(potentials[j]!);
  const { basis, x } = scaled.least((j) => (usable(j) ? potentials[j]! * scaled.most[j]! : FORBIDDEN * scaled.most[j]!));
  const logs = new Float64Array(system.gases).fill(-Infinity);
  const whole = Math.log(Math.max(...totals.map(([total]) => total)));
  for (let j = 0; j < system.gases; j++) if (usable(j)) logs[j] = whole + TRACE;
  for (const j of basis) if (j < system.gases && usable(j)) logs[j] = Math.max(Math.log(x[j]! * scaled.most[j]!), whole + TRACE);
  const present = basis.filter((j) => j >= system.gases && usable(j) && x[j]! > POSSIBLE);
  return { logs, present };
}

/** Potential of a species that may not be used, far above any real one. */
const FORBIDDEN = 1e6;
