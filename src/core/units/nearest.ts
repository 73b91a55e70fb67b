/** Names near a misspelt one, for a refusal. */

/** Names longer than this get no suggestions: they are not misspelt units, and comparing them would cost more than it tells. */
const longest = 16;

/** Three rows of the distance table, used again for every pair: refusals may come by the million. */
const rows: [number[], number[], number[]] = [[], [], []];

/** Up to three candidates within two slips (one for names of up to three letters), the nearest first; case counts as a tenth of a slip. */
export function nearest(name: string, candidates: Iterable<string>): string[] {
  if (name.length > longest) return [];
  const reach = name.length <= 3 ? 1 : 2;
  const found: { candidate: string; slips: number }[] = [];
  for (const candidate of candidates) {
    if (Math.abs(candidate.length - name.length) > reach) continue;
    const slips = distance(name, candidate, reach);
    if (slips <= reach) found.push({ candidate, slips });
  }
  return found
    .sort((a, b) => a.slips - b.slips)
    .slice(0, 3)
    .map(({ candidate }) => candidate);
}

/**
 * Edit distance (insert, delete, replace, exchange of neighbours), where a letter in the wrong case counts a tenth.
 * Infinity as soon as it is sure to go beyond the reach.
 */
function distance(a: string, b: string, reach: number): number {
  let [before, row, next] = rows;
  for (let j = 0; j <= b.length; j++) row[j] = j;
  for (let i = 1; i <= a.length; i++) {
    let least = (next[0] = i);
    for (let j = 1; j <= b.length; j++) {
      const exchanged = i > 1 && j > 1 && a[i - 1] === b[j - 2] && a[i - 2] === b[j - 1] ? before[j - 2]! + 1 : Infinity;
      const steps = Math.min(row[j]! + 1, next[j - 1]! + 1, row[j - 1]! + replacement(a.charAt(i - 1), b.charAt(j - 1)), exchanged);
      next[j] = steps;
      least = Math.min(least, steps);
    }
    if (least > reach) return Infinity;
    [before, row, next] = [row, next, before];
  }
  return row[b.length]!;
}

function replacement(a: string, b: string): number {
  if (a === b) return 0;
  return a.toLowerCase() === b.toLowerCase() ? 0.1 : 1;
}
