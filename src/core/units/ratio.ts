/** An exact ratio of integers as floating-point numbers. */

const largest = BigInt(Number.MAX_SAFE_INTEGER);

/** Decimal digits kept beyond those of a double before the one rounding. */
const guard = 40;

export interface Ratio {
  /** numerator / denominator, correctly rounded. */
  readonly scale: number;
  readonly numerator: number;
  readonly denominator: number;
}

/** The ratio as a pair of exact integers if both fit in a double, else as its rounded value over one. */
export function toRatio(numerator: bigint, denominator: bigint): Ratio {
  if (numerator <= largest && denominator <= largest) {
    return { scale: Number(numerator) / Number(denominator), numerator: Number(numerator), denominator: Number(denominator) };
  }
  const shift = guard + denominator.toString().length - numerator.toString().length;
  const digits = shift >= 0 ? (numerator * 10n ** BigInt(shift)) / denominator : numerator / (denominator * 10n ** BigInt(-shift));
  const scale = Number(`${digits}e${-shift}`);
  return { scale, numerator: scale, denominator: 1 };
}
