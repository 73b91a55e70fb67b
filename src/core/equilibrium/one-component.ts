/**
 * The balance of one component alone, the others held: ln of what it is made into = ln of what it is made from, which is nearly a straight
 * line in y_k = ln n of its member of the basis, however far away the balance is.
 */
import type { Basis } from "./basis";

const STEPS = 60;
/** The change is found to this. */
const NEAR = 0.1;

/**
 * The change of y_k that balances component k, the other y held: root of a rising function, to a tenth.
 * `gases`: those that can form; `logs`: ln n of all gases.
 */
export function balancingShift(basis: Basis, k: number, gases: Int32Array, logs: Float64Array): number {
  let low = -Infinity;
  let high = Infinity;
  let shift = 0;
  for (let step = 0; step < STEPS; step++) {
    const [value, slope] = balanceAt(basis, k, gases, logs, shift);
    if (value > 0) high = shift;
    else low = shift;
    const next = shift - value / slope;
    const moved = next > low && next < high ? next : low > -Infinity && high < Infinity ? (low + high) / 2 : next;
    if (Math.abs(moved - shift) < NEAR) return moved;
    shift = moved;
  }
  return shift;
}

/** ln(made) − ln(taken) of the component with its y shifted, and the slope. */
function balanceAt(
  { members, shares, totals }: Basis,
  k: number,
  gases: Int32Array,
  logs: Float64Array,
  shift: number,
): [value: number, slope: number] {
  const size = members.length;
  const [made, taken] = [new LogSum(), new LogSum()];
  const total = totals[k]!;
  if (total !== 0) (total > 0 ? taken : made).add(Math.log(Math.abs(total)), 0);
  for (const j of gases) {
    const share = shares[j * size + k]!;
    if (share !== 0) (share > 0 ? made : taken).add(Math.log(Math.abs(share)) + logs[j]! + share * shift, share);
  }
  return [made.value - taken.value, made.slope - taken.slope];
}

/** ln Σ eˣ and its slope Σ s eˣ / Σ eˣ, about its largest term so that nothing overflows. */
class LogSum {
  private largest = -Infinity;
  private sum = 0;
  private weighted = 0;

  add(log: number, share: number): void {
    if (log > this.largest) {
      const shrink = this.largest === -Infinity ? 0 : Math.exp(this.largest - log);
      this.sum *= shrink;
      this.weighted *= shrink;
      this.largest = log;
    }
    const part = Math.exp(log - this.largest);
    this.sum += part;
    this.weighted += share * part;
  }

  get value(): number {
    return this.largest + Math.log(this.sum);
  }

  get slope(): number {
    return this.sum === 0 ? 0 : this.weighted / this.sum;
  }
}
