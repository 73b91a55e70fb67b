/** Feeds for the laws of equilibrium, and the laws themselves, worked out again from amounts, atoms and the functions of each species. */
import fc from "fast-check";
import { GAS_CONSTANT } from "../../src/core/constants";
import { oxygenUptake } from "../../src/core/equilibrium/oxygen";
import { systemOf, type System } from "../../src/core/equilibrium/system";
import type { Candidate, Equilibrium, Reactant } from "../../src/core/equilibrium/types";
import { candidatesOf, jointRange } from "../core/equilibrium/candidates";

/** What the feeds are made of. */
const pools = [
  candidatesOf("nasa-2002", "C H O N Ar", "gases"),
  candidatesOf("nasa-2002", "C H O N Ar", "all phases"),
  candidatesOf("nasa-2002", "C H O N S He", "all phases"),
  candidatesOf("nasa-2002", "C H O N S F Cl Br I Ne", "all phases"),
  candidatesOf("gri-1999", "C H O N Ar", "gases"),
];

export interface Problem {
  readonly list: readonly Candidate[];
  readonly system: System;
  readonly feed: readonly Reactant[];
  readonly temperature: number;
  readonly pressure: number;
}

const systems = new Map<string, { list: readonly Candidate[]; system: System }>();

/** All candidates of a pool that hold nothing but these elements. */
function systemFor(pool: number, elements: ReadonlySet<string>): { list: readonly Candidate[]; system: System } {
  const key = `${pool}: ${[...elements].sort().join(" ")}`;
  let found = systems.get(key);
  if (found === undefined) {
    const list = pools[pool]!.filter(({ counts }) => [...counts.keys()].every((element) => elements.has(element)));
    systems.set(key, (found = { list, system: systemOf(list) }));
  }
  return found;
}

/** A place between 0 and 1, every part alike (doubles drawn by their bits would nearly all be near 0), and both ends. */
export const place = fc.oneof(
  { weight: 40, arbitrary: fc.nat(1_000_000).map((part) => part / 1e6) },
  { weight: 1, arbitrary: fc.constantFrom(0, 1) },
);

/** Whole, shared out, and down to 1e-12 of the rest. */
const amount = fc.oneof(
  fc.constantFrom(1, 2, 0.5, 3.76, 7.52),
  place.map((part) => 0.001 + 2 * part),
  fc.integer({ min: 1, max: 12 }).map((power) => 10 ** -power),
);
/** One to four species of a pool; one in three is a fuel with exactly the oxygen it needs. Cold ones more often, 1 Pa to 1 GPa. */
export const problem: fc.Arbitrary<Problem> = fc
  .record({
    pool: fc.nat(pools.length - 1),
    species: fc.array(fc.record({ index: fc.nat(), amount }), { minLength: 1, maxLength: 4 }),
    stoichiometric: fc.nat(2).map((one) => one === 0),
    place,
    pressure: place.map((part) => 10 ** (9 * part)),
  })
  .map(({ pool, species, stoichiometric, place, pressure }) => {
    const all = pools[pool]!;
    const feed: Reactant[] = species.map(({ index, amount }) => ({ ...all[index % all.length]!, amount }));
    const uptake = stoichiometric ? oxygenUptake(feed[0]!) : 0;
    if (uptake > 0) feed.splice(1, 0, { ...all.find(({ name }) => name === "O2")!, amount: feed[0]!.amount * uptake });
    const { list, system } = systemFor(pool, new Set(feed.flatMap(({ counts }) => [...counts.keys()])));
    const { from, to } = jointRange(list);
    const one = { list, system, feed, temperature: Math.min(to, from + (to - from) * place * place), pressure };
    return { ...one, [fc.toStringMethod]: () => written(one) };
  });

/** `1 CH4 + 2 O2 at 300 K and 1e5 Pa`, every digit: what a failed case prints. */
export function written({ feed, temperature, pressure }: Problem): string {
  return `${feed.map(({ amount, name }) => `${amount} ${name}`).join(" + ")} at ${temperature} K and ${pressure} Pa`;
}

/** Atoms of an element in amounts of substances, mol. */
const atomsOf = (element: string, parts: readonly { counts: ReadonlyMap<string, number> }[], amounts: ArrayLike<number>): number =>
  parts.reduce((sum, { counts }, j) => sum + (counts.get(element) ?? 0) * amounts[j]!, 0);

/** The largest difference of an element between feed and equilibrium, relative to what was put in. */
export function elementDifference(list: readonly Candidate[], feed: readonly Reactant[], amounts: ArrayLike<number>): number {
  const elements = new Set(list.flatMap(({ counts }) => [...counts.keys()]));
  const put = feed.map((each) => each.amount);
  return Math.max(
    ...[...elements].map((element) => {
      const before = atomsOf(element, feed, put);
      const after = atomsOf(element, list, amounts);
      return before === 0 ? after : Math.abs(after - before) / before;
    }),
  );
}

/**
 * ln of the activity of every species that its standard potential and the elements' would give, against the one it has:
 * ln Q − ln K of its formation from a set of independent species that are there. `present` for species that are there (0 at equilibrium);
 * `absent` for condensed ones that are not (at most 0, or they would form).
 */
export function massAction(list: readonly Candidate[], state: Equilibrium): { present: number; absent: number } {
  const { temperature, volume, amounts, logAmounts } = state;
  const gas = Math.log((GAS_CONSTANT * temperature) / volume);
  const isGas = list.map(({ capacity }) => capacity.phase === "g");
  const there = list.map((_, j) => (isGas[j] ? logAmounts[j]! > -Infinity : amounts[j]! > 0));
  // μ/RT = g/RT + ln a, each species with the R of its fit; ln a of a gas is ln(p/p°), of a condensed phase 0.
  const potentials = list.map(({ capacity, fitGasConstant }, j) => {
    const g = (capacity.enthalpy(temperature) / temperature - capacity.entropy(temperature)) / fitGasConstant;
    return isGas[j] ? g + logAmounts[j]! + gas - Math.log(capacity.standardPressure) : g;
  });
  const elements = [...new Set(list.flatMap(({ counts }) => [...counts.keys()]))];
  const rows = list.map(({ counts }, j) => [...elements.map((element) => counts.get(element) ?? 0), potentials[j]!]);
  const basis = independentRows(rows.filter((_, j) => there[j]));
  let present = 0;
  let absent = 0;
  for (const [j, row] of rows.entries()) {
    const left = reduced(row, basis);
    if (!left.slice(0, -1).every((count) => Math.abs(count) < 1e-9)) continue;
    if (there[j]) present = Math.max(present, Math.abs(left.at(-1)!));
    else if (!isGas[j] && !Number.isNaN(left.at(-1)!)) absent = Math.max(absent, -left.at(-1)!);
  }
  return { present, absent };
}

interface Pivot {
  readonly place: number;
  readonly row: readonly number[];
}

/** Rows of atoms in echelon form; the last entry, a potential, goes with them and is no pivot. */
function independentRows(rows: readonly (readonly number[])[]): Pivot[] {
  const basis: Pivot[] = [];
  for (const row of rows) {
    const left = reduced(row, basis);
    const place = left.slice(0, -1).findIndex((count) => Math.abs(count) > 1e-9);
    if (place >= 0) basis.push({ place, row: left.map((entry) => entry / left[place]!) });
  }
  return basis;
}

function reduced(row: readonly number[], basis: readonly Pivot[]): number[] {
  return basis.reduce((left, { place, row: pivot }) => {
    const factor = left[place]!;
    return factor === 0 ? left : left.map((entry, i) => entry - factor * pivot[i]!);
  }, row as number[]);
}
