/**
 * The minimal reactions of an equation that can be balanced in more than one way: the solutions x ≥ 0 of A x = 0 whose species do not
 * include all species of another solution. Every balanced form of the equation is a sum of them with factors that are not negative.
 * Farkas' algorithm: the rows of A are met one after the other; of the vectors kept so far, those that a row makes positive are added to
 * those that it makes negative so that the row gives 0, and of the sums only the minimal ones are kept.
 */
import { withoutDivisor } from "../numeric/null-space";

type Vector = readonly bigint[];

/** An equation that needs more sums than this on the way is not one that a list would help. */
const MOST = 800;

/** All minimal solutions, in the smallest whole numbers; none if there is no solution but 0; undefined if too many sums are needed. */
export function minimalSolutions(rows: readonly Vector[], columns: number): readonly Vector[] | undefined {
  const unit = (column: number) => Array.from({ length: columns }, (_, k) => (k === column ? 1n : 0n));
  let kept: Vector[] = Array.from({ length: columns }, (_, column) => unit(column));
  for (const row of rows) {
    const valued = kept.map((vector) => ({ vector, value: product(row, vector) }));
    const above = valued.filter(({ value }) => value > 0n);
    const below = valued.filter(({ value }) => value < 0n);
    const level = valued.filter(({ value }) => value === 0n);
    if (above.length * below.length + level.length > MOST) return undefined;
    const sums = above.flatMap((one) => below.map((other) => levelled(one.vector, -other.value, other.vector, one.value)));
    kept = minimalOnly([...level.map(({ vector }) => vector), ...sums]);
  }
  return kept;
}

function product(row: Vector, vector: Vector): bigint {
  return vector.reduce((sum, value, k) => sum + value * row[k]!, 0n);
}

function levelled(one: Vector, times: bigint, other: Vector, timesOther: bigint): Vector {
  return withoutDivisor(one.map((value, k) => value * times + other[k]! * timesOther));
}

/** Without the vectors whose species include all those of another; of several with the same species the first stays. */
function minimalOnly(vectors: readonly Vector[]): Vector[] {
  const includes = (larger: Vector, smaller: Vector) => smaller.every((value, k) => value === 0n || larger[k] !== 0n);
  return vectors.filter((vector, i) =>
    vectors.every((other, j) => i === j || !includes(vector, other) || (includes(other, vector) && i < j)),
  );
}
