/** Linear programming: programmes of textbooks, degenerate and infeasible ones, and all vertices tried one by one. */
import fc from "fast-check";
import { leastCost, type Vertex } from "../../../src/core/numeric/simplex";

const solve = (rows: readonly (readonly number[])[], b: readonly number[], cost: readonly number[]): Vertex | undefined =>
  leastCost(Float64Array.from(rows.flat()), Float64Array.from(b), Float64Array.from(cost));

const valueOf = ({ x }: Vertex, cost: readonly number[]) => cost.reduce((sum, each, j) => sum + each * x[j]!, 0);

test("3x + 5y at most, with x ≤ 4, 2y ≤ 12, 3x + 2y ≤ 18: 36 at (2, 6)", () => {
  const vertex = solve(
    [
      [1, 0, 1, 0, 0],
      [0, 2, 0, 1, 0],
      [3, 2, 0, 0, 1],
    ],
    [4, 12, 18],
    [-3, -5, 0, 0, 0],
  )!;
  [2, 6, 2, 0, 0].forEach((each, j) => expect(vertex.x[j]).toBeCloseTo(each, 12));
  expect([...vertex.basis].sort()).toEqual([0, 1, 2]);
});

test("a programme that circles with the steepest column alone comes to its end (Beale 1955): −1/20", () => {
  const cost = [-3 / 4, 150, -1 / 50, 6, 0, 0, 0];
  const vertex = solve(
    [
      [1 / 4, -60, -1 / 25, 9, 1, 0, 0],
      [1 / 2, -90, -1 / 50, 3, 0, 1, 0],
      [0, 0, 1, 0, 0, 0, 1],
    ],
    [0, 0, 1],
    cost,
  )!;
  expect(valueOf(vertex, cost)).toBeCloseTo(-1 / 20, 12);
});

test("what cannot be has no vertex: x + y = 1 and x + y = 2; x = 1 and 2x = 1", () => {
  expect(
    solve(
      [
        [1, 1],
        [1, 1],
      ],
      [1, 2],
      [1, 1],
    ),
  ).toBeUndefined();
  expect(solve([[1], [2]], [1, 1], [0])).toBeUndefined();
});

test("a row that says what the others say has no variable of its own in the basis", () => {
  const vertex = solve(
    [
      [1, 1, 0],
      [2, 2, 0],
      [0, 1, 1],
    ],
    [1, 2, 1],
    [0, 1, 0],
  )!;
  expect(vertex.basis).toHaveLength(2);
  expect([...vertex.x]).toEqual([1, 0, 1]);
});

test("a right-hand side of nothing but zeros is a vertex of zeros", () => {
  expect([...solve([[1, 2, 1]], [0], [-1, -1, 3])!.x]).toEqual([0, 0, 0]);
});

/** Every choice of `size` of `count` columns. */
function* choices(count: number, size: number, from = 0): Generator<number[]> {
  if (size === 0) yield [];
  for (let first = from; size > 0 && first <= count - size; first++)
    for (const rest of choices(count, size - 1, first + 1)) yield [first, ...rest];
}

/** Solution of a small square system by elimination with the largest pivot; undefined if singular. */
function squareSolution(columns: readonly (readonly number[])[], b: readonly number[]): number[] | undefined {
  const rows = b.map((right, i) => [...columns.map((column) => column[i]!), right]);
  for (let k = 0; k < b.length; k++) {
    const pivot = rows.slice(k).reduce((best, row) => (Math.abs(row[k]!) > Math.abs(best[k]!) ? row : best));
    if (Math.abs(pivot[k]!) < 1e-9) return undefined;
    rows.splice(rows.indexOf(pivot), 1);
    rows.splice(k, 0, pivot);
    for (const row of rows) {
      const factor = row === pivot ? 0 : row[k]! / pivot[k]!;
      if (factor !== 0) pivot.forEach((each, i) => (row[i] = row[i]! - factor * each));
    }
  }
  return rows.map((row, k) => row[b.length]! / row[k]!);
}

/** The least cost over all vertices of a problem whose rows are independent; Infinity if there is none. */
function leastOverVertices(rows: readonly (readonly number[])[], b: readonly number[], cost: readonly number[]): number {
  let least = Infinity;
  for (const choice of choices(cost.length, b.length)) {
    const x = squareSolution(
      choice.map((j) => rows.map((row) => row[j]!)),
      b,
    );
    if (x?.every((each) => each > -1e-9))
      least = Math.min(
        least,
        choice.reduce((sum, j, k) => sum + cost[j]! * x[k]!, 0),
      );
  }
  return least;
}

/** Atoms in species: whole numbers from 0; the first columns are single atoms, so that rows are independent and something is feasible. */
const problem = fc.integer({ min: 1, max: 4 }).chain((size) =>
  fc.record({
    right: fc.array(fc.constantFrom(0, 1, 2, 0.5, 1e-6), { minLength: size, maxLength: size }),
    species: fc.array(fc.array(fc.nat(4), { minLength: size, maxLength: size }), { minLength: 1, maxLength: 7 - size }),
    cost: fc.array(fc.integer({ min: -20, max: 20 }), { minLength: 7, maxLength: 7 }),
  }),
);

test("no vertex of any small problem costs less", () =>
  fc.assert(
    fc.property(problem, ({ right, species, cost }) => {
      const single = right.map((_, i) => right.map((__, k) => (i === k ? 1 : 0)));
      const columns = [...single, ...species.filter((column) => column.some((each) => each > 0))];
      const rows = right.map((_, i) => columns.map((column) => column[i]!));
      const costs = columns.map((_, j) => cost[j]!);
      const vertex = solve(rows, right, costs)!;
      rows.forEach((row, i) => expect(valueOf(vertex, row)).toBeCloseTo(right[i]!, 11));
      expect(vertex.x.every((each) => each >= 0)).toBe(true);
      expect(Math.abs(valueOf(vertex, costs) - leastOverVertices(rows, right, costs))).toBeLessThan(1e-9);
    }),
    { numRuns: 1000 },
  ));
