/**
 * Ratios measured in one run: the candidates take turns, so that whatever else the machine does falls on all of them alike,
 * and each is judged by the median of its turns.
 */

/** Work whose result is folded into `sink`, so that the compiler cannot leave it out. */
export type Work = () => number;

const TURNS = 75;
const WARM_UP_MS = 300;
/** Shorter than the time slices of the system: on a busy machine most turns are still undisturbed, and the median is one of those. */
const TURN_MS = 2;

let sink = 0;

/** Milliseconds of one call of each candidate, by name. */
export function compare<Name extends string>(candidates: Readonly<Record<Name, Work>>, turns = TURNS): Record<Name, number> {
  const names = Object.keys(candidates) as Name[];
  const calls = Object.fromEntries(names.map((name) => [name, warmUp(candidates[name])])) as Record<Name, number>;
  const samples = Object.fromEntries(names.map((name) => [name, [] as number[]])) as Record<Name, number[]>;
  for (let turn = 0; turn < turns; turn++) {
    // The order changes with every turn: no candidate always runs in the wake of the same other one.
    for (let k = 0; k < names.length; k++) {
      const name = names[(k + turn) % names.length]!;
      samples[name].push(time(candidates[name], calls[name]));
    }
  }
  return Object.fromEntries(names.map((name) => [name, median(samples[name])])) as Record<Name, number>;
}

/** Runs until the compiler has had its chance; gives the calls that fill one turn. */
function warmUp(work: Work): number {
  const start = performance.now();
  let calls = 0;
  while (performance.now() - start < WARM_UP_MS || calls < 3) {
    sink += work();
    calls++;
  }
  return Math.max(1, Math.round((calls * TURN_MS) / (performance.now() - start)));
}

function time(work: Work, calls: number): number {
  const start = performance.now();
  for (let i = 0; i < calls; i++) sink += work();
  return (performance.now() - start) / calls;
}

export function median(values: readonly number[]): number {
  const sorted = [...values].sort((a, b) => a - b);
  const middle = sorted.length >> 1;
  return sorted.length % 2 === 1 ? sorted[middle]! : (sorted[middle - 1]! + sorted[middle]!) / 2;
}

/** What all work added up to. Printed, so that it is used. */
export function sunk(): number {
  return sink;
}

/** Sum of a few places of an array: enough to need the whole array, and nothing beside the work itself. */
export function touched(values: ArrayLike<number>): number {
  return values[0]! + values[values.length >> 1]! + values[values.length - 1]!;
}
