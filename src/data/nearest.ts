/**
 * The nearest things to a text the library does not hold, for the sentence of the refusal.
 * Distance: smallest number of insertions, deletions, substitutions and swaps of neighbours (optimal string alignment);
 * one digit for another counts half, because a wrong count is the likeliest slip in a formula.
 */

function substitution(a: string, b: string): number {
  if (a === b) return 0;
  return isDigit(a) && isDigit(b) ? 0.5 : 1;
}

function isDigit(character: string): boolean {
  return character >= "0" && character <= "9";
}

/** Edit distance between two texts; stops early with a value above `limit` when it cannot be smaller. */
export function editDistance(a: string, b: string, limit = Infinity): number {
  if (Math.abs(a.length - b.length) > limit) return limit + 1;
  const width = b.length + 1;
  let [beforeLast, last, row] = [new Float64Array(width), new Float64Array(width), new Float64Array(width)];
  for (let j = 0; j < width; j++) last[j] = j;
  for (let i = 1; i <= a.length; i++) {
    row[0] = i;
    let smallest = i;
    for (let j = 1; j < width; j++) {
      let best = Math.min(last[j]! + 1, row[j - 1]! + 1, last[j - 1]! + substitution(a[i - 1]!, b[j - 1]!));
      const swapped = i > 1 && j > 1 && a[i - 1] === b[j - 2] && a[i - 2] === b[j - 1];
      if (swapped) best = Math.min(best, beforeLast[j - 2]! + 1);
      row[j] = best;
      smallest = Math.min(smallest, best);
    }
    if (smallest > limit) return limit + 1;
    [beforeLast, last, row] = [last, row, beforeLast];
  }
  return last[b.length]!;
}

/** Letters and digits two texts share in order: the longest common subsequence. Breaks ties of the distance. */
function shared(a: string, b: string): number {
  let last = new Array<number>(b.length + 1).fill(0);
  for (const character of a) {
    const row = [0];
    for (let j = 1; j <= b.length; j++) row.push(character === b[j - 1] ? last[j - 1]! + 1 : Math.max(last[j]!, row[j - 1]!));
    last = row;
  }
  return last[b.length]!;
}

/** A text the library knows and the thing it stands for. */
export interface Candidate<T> {
  readonly text: string;
  readonly thing: T;
}

/**
 * Up to `count` different things whose texts are nearest to `text`, nearest first. Ties: more shared characters, then the same
 * first character, then the order of the candidates. The distance allowed grows until enough are found, so a slip costs little.
 */
export function nearest<T>(text: string, candidates: readonly Candidate<T>[], count = 3): readonly Candidate<T>[] {
  const wanted = Math.min(count, new Set(candidates.map(({ thing }) => thing)).size);
  let chosen = within(text, candidates, count, 1);
  for (let limit = 2; chosen.length < wanted; limit *= 2) chosen = within(text, candidates, count, limit);
  return chosen;
}

/** The nearest things at no more than `limit` from the text. What shares characters is counted only among those that can be chosen. */
function within<T>(text: string, candidates: readonly Candidate<T>[], count: number, limit: number): readonly Candidate<T>[] {
  const near = candidates
    .map((candidate, order) => ({ candidate, order, distance: editDistance(text, candidate.text, limit) }))
    .filter(({ distance }) => distance <= limit)
    .sort((a, b) => a.distance - b.distance);
  const farthest = firstOfEach(near, count).slice(-1)[0]?.distance ?? 0;
  const ranked = near
    .filter(({ distance }) => distance <= farthest)
    .map((found) => ({ ...found, shared: shared(text, found.candidate.text), start: found.candidate.text[0] === text[0] ? 0 : 1 }))
    .sort((a, b) => a.distance - b.distance || b.shared - a.shared || a.start - b.start || a.order - b.order);
  return firstOfEach(ranked, count).map(({ candidate }) => candidate);
}

/** The first candidate of each of the first `count` different things. */
function firstOfEach<T, F extends { readonly candidate: Candidate<T> }>(found: readonly F[], count: number): readonly F[] {
  const chosen = new Map<T, F>();
  for (const one of found) {
    if (chosen.size === count) break;
    if (!chosen.has(one.candidate.thing)) chosen.set(one.candidate.thing, one);
  }
  return [...chosen.values()];
}
