import fc from "fast-check";
import { areaOf } from "../../src/book/formula";
import { FormulaGraph, type GraphNode } from "../../src/recalc/graph";

function node(fills: string, ...reads: string[]): GraphNode {
  return { fills: areaOf(fills, "S"), reads: reads.map((range) => areaOf(range, "S")) };
}

const sure = () => false;

describe("the walk through a workbook", () => {
  it("puts every formula after what it reads", () => {
    const { order } = new FormulaGraph([
      node("A1", "A2:A3"),
      node("A2", "A3"),
      node("A3", "Z9"),
      node("B1:B3", "A1"),
      node("C1", "B3"),
    ]).walk(sure);
    expect(order).toEqual([2, 1, 0, 3, 4]);
  });

  it("follows a chain as long as a sheet without a deep stack", () => {
    const length = 300000;
    const chain = Array.from({ length }, (_, i) => node(`A${i + 1}`, `A${i + 2}`));
    const { order } = new FormulaGraph(chain).walk(sure);
    expect(order[0]).toBe(length - 1);
    expect(order.at(-1)).toBe(0);
  });

  it("finds the members of a circle, and what hangs on it", () => {
    const walk = new FormulaGraph([
      node("A1", "B1"),
      node("B1", "C1"),
      node("C1", "A1"),
      node("D1", "A1"),
      node("E1", "F1"),
      node("F1", "Z1"),
    ]).walk(sure);
    expect(walk.circular).toEqual([true, true, true, false, false, false]);
    expect(walk.unreliable).toEqual([true, true, true, true, false, false]);
  });

  it("sees a formula that reads itself, alone or in a range", () => {
    const walk = new FormulaGraph([node("A1", "A1"), node("B5", "B1:B9"), node("C1", "C2:C9")]).walk(sure);
    expect(walk.circular).toEqual([true, true, false]);
  });

  it("carries doubt to all that reads a doubtful formula, across ranges and spilled cells", () => {
    const nodes = [node("A1:A5"), node("B1", "A5"), node("C1", "B1:B3"), node("D1", "C2"), node("E1", "A6")];
    expect(new FormulaGraph(nodes).walk((formula) => formula === 0).unreliable).toEqual([true, true, true, false, false]);
  });

  it("agrees with the definition on graphs drawn at random", () => {
    const size = 12;
    const edges = fc.array(fc.tuple(fc.nat(size - 1), fc.nat(size - 1)), { maxLength: 25 });
    fc.assert(
      fc.property(edges, fc.nat(size - 1), (pairs, doubtful) => {
        const nodes = Array.from({ length: size }, (_, i) =>
          node(`A${i + 1}`, ...pairs.filter(([from]) => from === i).map(([, to]) => `A${to + 1}`)),
        );
        const reach = closure(size, pairs);
        const { order, unreliable } = new FormulaGraph(nodes).walk((formula) => formula === doubtful);
        expect([...order].sort((a, b) => a - b)).toEqual(nodes.map((_, i) => i));
        for (let i = 0; i < size; i++) {
          const bad = (j: number) => j === doubtful || reach[j]![j]!;
          expect(unreliable[i]).toBe(bad(i) || nodes.some((_, j) => reach[i]![j]! && bad(j)));
          // Circles have no order, and are not calculated.
          for (let j = 0; j < size; j++) if (reach[i]![j]! && !unreliable[i]) expect(order.indexOf(j)).toBeLessThan(order.indexOf(i));
        }
      }),
    );
  });
});

/** Which formula reads which, however far away. */
function closure(size: number, pairs: readonly [number, number][]): boolean[][] {
  const reach = Array.from({ length: size }, () => new Array<boolean>(size).fill(false));
  for (const [from, to] of pairs) reach[from]![to] = true;
  for (let k = 0; k < size; k++)
    for (let i = 0; i < size; i++) for (let j = 0; j < size; j++) reach[i]![j] ||= reach[i]![k]! && reach[k]![j]!;
  return reach;
}
