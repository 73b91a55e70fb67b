/** Corrected rises of many runs in one call, against the bare sums over the same cells. */
import { riseCells, riseReportCells } from "../../src/functions/rise";
import type { Goal } from "./goals";
import { compare } from "./timing";

const RUNS = 1000;
const READINGS = 60;
const FIRE = 10;
const END = 30;

type Rows = number[][];

/** Readings of 30 s, one run in each column: no two runs alike. */
function record(runs: number): { times: Rows; temperatures: Rows } {
  const times = Array.from({ length: READINGS }, (_, row) => [row / 2]);
  const temperatures = times.map(([time]) =>
    Array.from({ length: runs }, (_, run) => {
      const s = time! - FIRE / 2;
      const drift = 22.6 + 0.005 * s + run / 10000;
      return s <= 0 ? drift : drift + (2 + run / 2000) * (1 - Math.exp(-s / 0.9)) - 0.004 * s;
    }),
  );
  return { times, temperatures };
}

/** Per run the two regressions, the trapezoids and the formula, straight from the block; nothing is checked. */
function bareSums(times: Rows, temperatures: Rows, runs: number): Rows {
  const row: number[] = new Array(runs);
  for (let run = 0; run < runs; run++) row[run] = bareRise(times, temperatures, run);
  return [row];
}

function bareRise(times: Rows, temperatures: Rows, run: number): number {
  const fore = bareLine(times, temperatures, run, 0, FIRE);
  const after = bareLine(times, temperatures, run, END, READINGS - 1);
  let integral = 0;
  for (let k = FIRE; k < END; k++)
    integral += ((temperatures[k]![run]! + temperatures[k + 1]![run]!) * (times[k + 1]![0]! - times[k]![0]!)) / 2;
  const duration = times[END]![0]! - times[FIRE]![0]!;
  const constant = (fore.slope - after.slope) / (after.mean - fore.mean);
  const exchange = duration * (after.slope + constant * (after.mean - integral / duration));
  return temperatures[END]![run]! - temperatures[FIRE]![run]! - exchange;
}

function bareLine(times: Rows, temperatures: Rows, run: number, from: number, to: number): { slope: number; mean: number } {
  let [x, y, xx, xy] = [0, 0, 0, 0];
  for (let k = from; k <= to; k++) {
    const [time, temperature] = [times[k]![0]!, temperatures[k]![run]!];
    x += time;
    y += temperature;
    xx += time * time;
    xy += time * temperature;
  }
  const count = to - from + 1;
  return { slope: (count * xy - x * y) / (count * xx - x * x), mean: y / count };
}

export function riseGoals(): Goal[] {
  const { times, temperatures } = record(RUNS);
  const small = record(20);
  const number = (block: unknown[][]): number => {
    const [cell, last] = [block[0]![0], block[block.length - 1]![block[0]!.length - 1]];
    if (last === undefined || (typeof cell !== "number" && typeof cell !== "string"))
      throw new Error(`the rise is ${JSON.stringify(cell)}`);
    return typeof cell === "number" ? cell : 0;
  };
  const fire = [[FIRE / 2]];
  const end = [[END / 2]];
  const many = compare({
    bare: () => number(bareSums(times, temperatures, RUNS)),
    cells: () => number(riseCells(times, temperatures, fire, end)),
  });
  const one = compare({
    given: () =>
      number(
        riseCells(
          times,
          temperatures.map((row) => [row[0]]),
          fire,
          end,
        ),
      ),
    found: () =>
      number(
        riseCells(
          times,
          temperatures.map((row) => [row[0]]),
          fire,
        ),
      ),
    report: () => number(riseReportCells(small.times, small.temperatures, fire, end)),
  });
  return [
    { what: "CAL.RISE of 1,000 runs of 60 readings, against the bare sums", measured: many.cells / many.bare, unit: "×", atMost: 3 },
    { what: "the same, for each run", measured: (many.cells * 1000) / RUNS, unit: "µs" },
    { what: "one run of 60 readings, end given", measured: one.given * 1000, unit: "µs" },
    { what: "one run of 60 readings, end found", measured: one.found * 1000, unit: "µs" },
    { what: "CAL.RISE.REPORT of 20 runs, for each run", measured: (one.report * 1000) / 20, unit: "µs" },
  ];
}
