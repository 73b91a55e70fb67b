/**
 * Runs of a calorimeter that obeys Newton's law with one body, dt/dτ = G (t∞ − t), and releases its heat as 1 − e^(−s/τr) from firing on:
 *   before firing  t = t∞ − (t∞ − t_i) e^(−G s),  s = τ − τi
 *   after firing   t = t∞ + (t_i − t∞) e^(−G s) + ΔT/(1 − G τr) (e^(−G s) − e^(−s/τr))
 * ΔT is the true adiabatic rise. Here too: a jacket that follows, with one stirring drift g.
 */
export interface Model {
  readonly convergence: number;
  readonly constant: number;
  /** Temperature at firing. */
  readonly start: number;
  readonly fire: number;
  readonly rise: number;
  readonly release: number;
}

/** The run of the printed example: the fore-period starts at 22.6 °C, five minutes before firing. */
export const EXAMPLE: Model = {
  convergence: 25.5,
  constant: 0.002,
  start: 25.5 - 2.9 * Math.exp(-0.002 * 5),
  fire: 5,
  rise: 2.5,
  release: 0.9,
};

export function temperatureAt({ convergence, constant, start, fire, rise, release }: Model, time: number): number {
  const s = time - fire;
  const bare = convergence + (start - convergence) * Math.exp(-constant * s);
  return s <= 0 ? bare : bare + (rise / (1 - constant * release)) * (Math.exp(-constant * s) - Math.exp(-s / release));
}

export function adiabaticAt({ start, fire, rise, release }: Model, drift: number, time: number): number {
  const s = time - fire;
  return start + drift * s + (s <= 0 ? 0 : rise * (1 - Math.exp(-s / release)));
}

/** 0, step, 2 step … up to and including `last`. */
export function evenTimes(step: number, last: number): Float64Array {
  return Float64Array.from({ length: Math.round(last / step) + 1 }, (_, k) => k * step);
}

/** A generator of uniform and normal numbers that gives the same ones every time (32-bit xorshift-multiply, Box-Muller). */
export class Generator {
  constructor(private state: number) {}

  uniform(from = 0, to = 1): number {
    this.state = (this.state + 0x6d2b79f5) | 0;
    let t = Math.imul(this.state ^ (this.state >>> 15), 1 | this.state);
    t = (t + Math.imul(t ^ (t >>> 7), 61 | t)) ^ t;
    return from + ((to - from) * ((t ^ (t >>> 14)) >>> 0)) / 2 ** 32;
  }

  normal(): number {
    return Math.sqrt(-2 * Math.log(1 - this.uniform())) * Math.cos(2 * Math.PI * this.uniform());
  }

  oneOf<Item>(items: readonly Item[]): Item {
    return items[Math.floor(this.uniform() * items.length)]!;
  }
}

/** A reading to four decimals, as an instrument gives it. */
export function rounded(value: number): number {
  return Math.round(value * 10000) / 10000;
}
