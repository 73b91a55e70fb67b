/**
 * The power and exponential terms of the residual Helmholtz energy, n δ^d τ^t exp(−δ^c) (IAPWS R6-95(2018), eq. 6, terms 1 to 51).
 *
 * Terms of equal c and d differ in τ alone: their Σ n τ^t, Σ n t τ^t and Σ n t(t − 1) τ^t are formed once for a temperature. With x = δ^c, a
 * derivative with δ turns d into d − cx, the second d(d − 1) into d(d − 1) − 2cdx + cx(1 − c) + c²x²: what holds c is done once for each c.
 */
import type { Derivatives } from "./derivatives";
import { Powers } from "./powers";

/** Beyond this δ^c the exponential is below 1e-65, and so is every term it multiplies against the others. */
const GONE = 150;

/** Terms of one c: the pairs from `from` to before `to`. */
interface Group {
  readonly c: number;
  readonly from: number;
  readonly to: number;
}

export class PowerTerms {
  private readonly powers: Powers;
  /** By term: coefficient, exponent t, and where its τ^t and its pair of c and d stand. */
  private readonly n: Float64Array;
  private readonly t: Float64Array;
  private readonly place: Int32Array;
  private readonly pairOf: Int32Array;
  /** By pair: exponent d, and the sums over τ. */
  private readonly d: Int32Array;
  private readonly sum: Float64Array;
  private readonly sumT: Float64Array;
  private readonly sumTT: Float64Array;
  private readonly groups: readonly Group[];
  private readonly deltas: Float64Array;

  constructor(terms: readonly (readonly number[])[]) {
    const sorted = [...(terms as readonly (readonly [number, number, number, number])[])].sort(([c1, d1], [c2, d2]) => c1 - c2 || d1 - d2);
    const pairs = sorted.filter(([c, d], k) => k === 0 || c !== sorted[k - 1]![0] || d !== sorted[k - 1]![1]);
    const exponents = [...new Set(sorted.map(([, , t]) => t))];
    this.powers = new Powers(exponents);
    this.n = Float64Array.from(sorted, ([, , , n]) => n);
    this.t = Float64Array.from(sorted, ([, , t]) => t);
    this.place = Int32Array.from(sorted, ([, , t]) => exponents.indexOf(t));
    this.pairOf = Int32Array.from(sorted, ([c, d]) => pairs.findIndex((pair) => pair[0] === c && pair[1] === d));
    this.d = Int32Array.from(pairs, ([, d]) => d);
    [this.sum, this.sumT, this.sumTT] = [0, 1, 2].map(() => new Float64Array(pairs.length)) as [Float64Array, Float64Array, Float64Array];
    this.groups = [...new Set(pairs.map(([c]) => c))].map((c) => {
      const from = pairs.findIndex((pair) => pair[0] === c);
      return { c, from, to: from + pairs.filter((pair) => pair[0] === c).length };
    });
    this.deltas = new Float64Array(1 + Math.max(...pairs.map(([c, d]) => Math.max(c, d))));
  }

  /** Forms the sums for a τ. */
  turnTo(tau: number): void {
    const { n, t, place, pairOf, sum, sumT, sumTT } = this;
    const powers = this.powers.of(tau);
    sum.fill(0);
    sumT.fill(0);
    sumTT.fill(0);
    for (let k = 0; k < n.length; k++) {
      const pair = pairOf[k]!;
      const exponent = t[k]!;
      const term = n[k]! * powers[place[k]!]!;
      sum[pair]! += term;
      sumT[pair]! += exponent * term;
      sumTT[pair]! += exponent * (exponent - 1) * term;
    }
  }

  /** Adds all terms at a δ, for the τ turned to last. */
  add(into: Derivatives, delta: number): void {
    const { deltas, groups } = this;
    deltas[0] = 1;
    for (let k = 1; k < deltas.length; k++) deltas[k] = deltas[k - 1]! * delta;
    for (const group of groups) if (group.c === 0 || deltas[group.c]! < GONE) this.addGroup(into, group);
  }

  private addGroup(into: Derivatives, { c, from, to }: Group): void {
    const { d, deltas, sum, sumT, sumTT } = this;
    let phi = 0;
    let first = 0;
    let second = 0;
    let t = 0;
    let tt = 0;
    let dt = 0;
    for (let pair = from; pair < to; pair++) {
      const exponent = d[pair]!;
      const power = deltas[exponent]!;
      const value = power * sum[pair]!;
      const slope = power * sumT[pair]!;
      phi += value;
      first += exponent * value;
      second += exponent * (exponent - 1) * value;
      t += slope;
      tt += power * sumTT[pair]!;
      dt += exponent * slope;
    }
    const x = c === 0 ? 0 : deltas[c]!;
    const decay = c === 0 ? 1 : Math.exp(-x);
    const cx = c * x;
    into.phi += decay * phi;
    into.d += decay * (first - cx * phi);
    into.dd += decay * (second - 2 * cx * first + cx * (1 - c + cx) * phi);
    into.t += decay * t;
    into.tt += decay * tt;
    into.dt += decay * (dt - cx * t);
  }
}
