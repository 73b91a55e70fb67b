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
  let beforeLast: number[] = [];
  let last = Array.from({ length: b.length + 1 }, (_, j) => j);
  for (let i = 1; i <= a.length; i++) {
    const row = [i];
    for (let j = 1; j <= b.length; j++) {
      let best = Math.min(last[j]! + 1, row[j - 1]! + 1, last[j - 1]! + substitution(a[i - 1]!, b[j - 1]!));
      const swapped = i > 1 && j > 1 && a[i - 1] === b[j - 2] && a[i - 2] === b[j - 1];
      if (swapped) best = Math.min(best, beforeLast[j - 2]! + 1);
      row.push(best);
    }
    if (Math.min(...row) > limit) return limit + 1;
    beforeLast = last;
    last = row;
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
 * first character, then the order of the candidates.
 */
export function nearest<T>(text: string, candidates: readonly Candidate<T>[], count = 3): readonly Candidate<T>[] {
  const ranked = candidates.map((candidate, order) => ({
    candidate,
    order,
    distance: editDistance(text, candidate.text, Math.max(3, text.length / 2)),
    shared: shared(text, candidate.text),
    start: candidate.text[0] === text[0] ? 0 : 1,
  }));
  ranked.sort((a, b) => a.distance - b.distance || b.shared - a.shared || a.start - b.start || a.order - b.order);
  const chosen = new Map<T, Candidate<T>>();
  for (const { candidate } of ranked) {
    if (chosen.size === count) break;
    if (!chosen.has(candidate.thing)) chosen.set(candidate.thing, candidate);
  }
  return [...chosen.values()];
}
