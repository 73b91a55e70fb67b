/**
 * Sum with the rounding errors of the additions collected and added at the end (Neumaier, Zeitschrift für Angewandte Mathematik und
 * Mechanik 54 (1974) 39): the error does not grow with the number of terms. Empty gives 0.
 */
export function compensatedSum(values: Iterable<number>): number {
  let sum = 0;
  let lost = 0;
  for (const value of values) {
    const next = sum + value;
    lost += Math.abs(sum) >= Math.abs(value) ? sum - next + value : value - next + sum;
    sum = next;
  }
  return sum + lost;
}
