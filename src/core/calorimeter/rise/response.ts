/**
 * How fast the heat reaches the thermometer: the 63 % time, from firing to the moment at which 1 − 1/e of the way from one temperature to
 * another is done. Between two readings the logarithm of what is left is taken as linear, which is exact for an exponential release
 * however coarse the readings are.
 */
const LEFT = Math.exp(-1);

/**
 * The 63 % time, min, of the readings `from` to `to` (both included), on the way from `start` at firing to `top`, °C;
 * undefined if they do not get there.
 */
export function responseTime(
  times: Float64Array,
  temperatures: Float64Array,
  [from, to]: readonly [number, number],
  fire: number,
  [start, top]: readonly [number, number],
): number | undefined {
  let time = fire;
  let left = 1;
  for (let k = from; k <= to; k++) {
    const here = (top - temperatures[k]!) / (top - start);
    if (here <= LEFT) return time + share(left, here) * (times[k]! - time) - fire;
    time = times[k]!;
    left = here;
  }
  return undefined;
}

/** How far between two readings 1/e is left. At the top nothing is left, and has no logarithm: then linear. */
function share(before: number, here: number): number {
  return here > 0 ? (1 + Math.log(before)) / Math.log(before / here) : (before - LEFT) / (before - here);
}
