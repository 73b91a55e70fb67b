/** The worksheet layer: a column against copying its cells, and a single call whose texts have been met before. */
import { registry } from "../../src/functions";
import type { Goal } from "./goals";
import { COUNT, rising } from "./subjects";
import { compare } from "./timing";

type Rows = number[][];

/** Cell by cell into new rows: what any function that gives a column must do at least. */
function copyCells(block: Rows): Rows {
  const copy: Rows = new Array(block.length);
  for (let row = 0; row < block.length; row++) {
    const source = block[row]!;
    const target: number[] = new Array(source.length);
    for (let column = 0; column < source.length; column++) target[column] = source[column]!;
    copy[row] = target;
  }
  return copy;
}

export function worksheetGoals(): Goal[] {
  const cvAt = registry.get("CV.AT");
  if (!cvAt) throw new Error("CV.AT is not registered");
  const number = (block: unknown[][]): number => {
    const cell = block[0]![0];
    if (typeof cell !== "number") throw new Error(`CV.AT gave ${JSON.stringify(cell)}`);
    return cell;
  };
  return [...rangeGoals(cvAt, number), ...scalarGoals(cvAt, number)];
}

type Call = (...blocks: unknown[][][]) => unknown[][];

function rangeGoals(cvAt: Call, number: (block: unknown[][]) => number): Goal[] {
  const temperatures = Array.from(rising(), (t) => [t]);
  const column = compare({
    copy: () => number(copyCells(temperatures)),
    plain: () => number(cvAt([["N2"]], temperatures)),
    unit: () => number(cvAt([["air"]], temperatures, [["kJ/(kg K)"]])),
  });
  const square = Array.from({ length: COUNT / 100 }, (_, row) => temperatures.slice(row * 100, row * 100 + 100).map(([t]) => t!));
  const wide = compare({ copy: () => number(copyCells(square)), plain: () => number(cvAt([["N2"]], square)) });
  return [
    { what: "CV.AT over a column of 100,000 cells, against copying them", measured: column.plain / column.copy, unit: "×", atMost: 2.5 },
    { what: "the same for air by mass", measured: column.unit / column.copy, unit: "×", atMost: 2.5 },
    {
      what: "CV.AT over 1,000 × 100 cells, against copying them",
      measured: wide.plain / wide.copy,
      unit: "×",
      note: "no goal: the copy of long rows is nearly free",
    },
  ];
}

function scalarGoals(cvAt: Call, number: (block: unknown[][]) => number): Goal[] {
  const calls = 1000;
  const celsius = Array.from({ length: calls }, (_, i) => `${i + 20} °C`);
  const repeat = (call: (i: number) => unknown[][]) => () => {
    let sum = 0;
    for (let i = 0; i < calls; i++) sum += number(call(i));
    return sum;
  };
  const times = compare({
    plain: repeat((i) => cvAt([["N2"]], [[300 + i]])),
    unit: repeat((i) => cvAt([["N2"]], [[300 + i]], [["kJ/(kg K)"]], [["nasa-2002"]])),
    text: repeat((i) => cvAt([["N2"]], [[celsius[i]!]], [["kJ/(kg K)"]], [["nasa-2002"]])),
  });
  const microseconds = (milliseconds: number) => (milliseconds * 1000) / calls;
  return [
    { what: 'one call CV.AT("N2", 300)', measured: microseconds(times.plain), unit: "µs", atMost: 0.3 },
    { what: 'one call CV.AT("N2", 300, "kJ/(kg K)", "nasa-2002")', measured: microseconds(times.unit), unit: "µs", atMost: 0.3 },
    { what: 'one call CV.AT("N2", "25 °C", "kJ/(kg K)", "nasa-2002")', measured: microseconds(times.text), unit: "µs", atMost: 0.3 },
  ];
}
