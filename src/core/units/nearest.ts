/** Names near a misspelt one, for a refusal. */

/** Names longer than this get no suggestions: they are not misspelt units, and comparing them would cost more than it tells. */
const longest = 16;

/** Up to three candidates within two slips (one for names of up to three letters), the nearest first; case counts as half a slip. */
export function nearest(name: string, candidates: Iterable<string>): string[] {
  if (name.length > longest) return [];
  const reach = name.length <= 3 ? 1 : 2;
  const found: { candidate: string; slips: number }[] = [];
  for (const candidate of candidates) {
    if (Math.abs(candidate.length - name.length) > reach) continue;
    const slips = distance(name, candidate);
    if (slips <= reach) found.push({ candidate, slips });
  }
  return found
    .sort((a, b) => a.slips - b.slips)
    .slice(0, 3)
    .map(({ candidate }) => candidate);
}

/** Edit distance (insert, delete, replace, exchange of neighbours), where a letter in the wrong case counts a half. */
function distance(a: string, b: string): number {
  let before: number[] = [];
  let row = Array.from({ length: b.length + 1 }, (_, j) => j);
  for (let i = 1; i <= a.length; i++) {
    const next = [i];
    for (let j = 1; j <= b.length; j++) {
      const exchanged = i > 1 && j > 1 && a[i - 1] === b[j - 2] && a[i - 2] === b[j - 1] ? before[j - 2]! + 1 : Infinity;
      next[j] = Math.min(row[j]! + 1, next[j - 1]! + 1, row[j - 1]! + replacement(a.charAt(i - 1), b.charAt(j - 1)), exchanged);
    }
    before = row;
    row = next;
  }
  return row[b.length]!;
}

function replacement(a: string, b: string): number {
  if (a === b) return 0;
  return a.toLowerCase() === b.toLowerCase() ? 0.5 : 1;
}
