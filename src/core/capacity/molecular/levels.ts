/**
 * Contribution of a motion to the dimensionless functions, all from its partition function q:
 *
 *   heat    (1/R) dU/dT = variance of the energy / (kT)²
 *   energy  U/RT, from the lowest level
 *   entropy S/R = ln q + U/RT
 */
export interface Contribution {
  readonly heat: number;
  readonly energy: number;
  readonly entropy: number;
}

/** Beyond this many kT above the lowest level a level weighs less than 1e-26 and is left out. */
const NEGLIGIBLE = 60;

/** Energies of levels, K (energy over k), lowest first and counted from it; and their degeneracies. */
export interface Levels {
  readonly energies: readonly number[];
  readonly degeneracies: readonly number[];
}

/** Levels from (energy, degeneracy) pairs in any order and from any zero. */
export function levelsOf(pairs: readonly (readonly [energy: number, degeneracy: number])[]): Levels {
  const sorted = [...pairs].sort((a, b) => a[0] - b[0]);
  const lowest = sorted[0]?.[0] ?? 0;
  return { energies: sorted.map(([energy]) => energy - lowest), degeneracies: sorted.map(([, degeneracy]) => degeneracy) };
}

/** Sum over levels at a temperature, K. The lowest level has energy 0, so no exponential overflows. */
export function overLevels(levels: Levels, temperature: number): Contribution {
  let sum = 0;
  let first = 0;
  let second = 0;
  for (let i = 0; i < levels.energies.length; i++) {
    const x = levels.energies[i]! / temperature;
    if (x > NEGLIGIBLE) break;
    const weight = levels.degeneracies[i]! * Math.exp(-x);
    sum += weight;
    first += weight * x;
    second += weight * x * x;
  }
  const energy = first / sum;
  return { heat: centralMoment(levels, temperature, energy, sum, second), energy, entropy: Math.log(sum) + energy };
}

/** Variance of E/kT, summed about the mean: the difference of the moments would lose its digits when one level rules. */
function centralMoment(levels: Levels, temperature: number, mean: number, sum: number, second: number): number {
  if (second === 0) return 0;
  let variance = 0;
  for (let i = 0; i < levels.energies.length; i++) {
    const x = levels.energies[i]! / temperature;
    if (x > NEGLIGIBLE) break;
    variance += levels.degeneracies[i]! * Math.exp(-x) * (x - mean) ** 2;
  }
  return variance / sum;
}

/**
 * Harmonic oscillator, x = hν/kT, energy counted from its zero-point level:
 * heat = x² eˣ/(eˣ − 1)², energy = x/(eˣ − 1), entropy = energy − ln(1 − e⁻ˣ).
 */
export function oscillator(energy: number, temperature: number): Contribution {
  const x = energy / temperature;
  const decay = Math.exp(-x);
  const gap = -Math.expm1(-x);
  const mean = (x * decay) / gap;
  return { heat: (x * x * decay) / (gap * gap), energy: mean, entropy: mean - Math.log(gap) };
}
