/**
 * The readings of calorimeter runs in cells: times one column for all runs or one for each, temperatures one column for each run,
 * firing and end one cell for all or a row with one for each. Trailing blanks end a run. Everything leaves this file in min and °C.
 */
import { gridOf, type Grid } from "../core/calorimeter/rise/grid";
import { endOf } from "../core/calorimeter/rise/end";
import { requireAscending, requireNoMistyped } from "../core/calorimeter/rise/readings";
import { printed, Refusal, refuse } from "../core/refusal";
import { dimensionOf, intervalFromBase, intervalToBase, parseUnit, requireDimension, type Unit } from "../core/units";
import { readText } from "./arguments";
import { shapeOf } from "./broadcast";
import { Block, Cell, CellError, isLeftOut, isTextLeftOut, plain } from "./cell";
import { Measured, readMeasured, TEMPERATURE_CELSIUS } from "./laboratory";
import { singleCell } from "./lists";

const TIME: Measured = { name: "Time", unit: "min", example: '"30 s"' };
const FIRING: Measured = { name: "Firing time", unit: "min", example: '"5 min"' };
const END: Measured = { name: "End of the main period", unit: "min", example: '"15 min"' };

/** Shortest step of readings in min, and the latest time of a record of clock times in days. */
const SHORTEST_STEP = 0.005;
const ONE_DAY = 1;
/** Plain times without a unit are seconds if no two readings are closer than this, or if the record is longer, in min. */
const LONG_STEP = 5;
const LONG_RECORD = 180;

/** One run, ready for the core. */
export interface RiseRun {
  readonly grid: Grid;
  readonly temperatures: Float64Array;
  readonly endGiven: boolean;
}

/** Readings of one column: its numbers up to the last cell that is not blank. */
interface Column {
  readonly values: Float64Array;
  readonly count: number;
}

export class RiseRuns {
  readonly count: number;
  private readonly unit: Unit | undefined;
  private readonly numbers: Numbers;
  private sharedTimes: Column | undefined;
  private lastGrid: Grid | undefined;

  /** Refuses blocks whose shapes do not belong together. */
  constructor(
    private readonly times: Block,
    private readonly temperatures: Block,
    private readonly fire: Block,
    private readonly end: Block | undefined,
    timeUnit: Block | undefined,
  ) {
    requireColumns(times, "times");
    requireColumns(temperatures, "temperatures");
    this.count = shapeOf(temperatures).columns;
    const { columns } = shapeOf(times);
    if (columns !== 1 && columns !== this.count)
      refuse(`There are ${columns} columns of times and ${this.count} of temperatures; give one column of times, or one for each run`);
    requireRow(fire, this.count, "Firing times");
    if (!isLeftOut(end)) requireRow(end!, this.count, "Ends of the main period");
    this.unit = readTimeUnit(timeUnit);
    this.numbers = numbersOf(temperatures);
  }

  /** A run by its column. Refuses what its cells cannot mean; throws an error cell among them. */
  read(run: number): RiseRun {
    const temperatures = this.temperaturesOf(run);
    const times = this.timesOf(run);
    if (temperatures.count > times.count) refuse(`Row ${times.count + 1} of the readings holds a temperature but no time`);
    const fire = readTime(oneOf(this.fire, run), FIRING, this.unit);
    requireNoMistyped(temperatures.values, temperatures.count);
    const endCell = isLeftOut(this.end) ? null : oneOf(this.end!, run);
    const end = endCell === null ? endOf(times.values, temperatures.values, temperatures.count, fire) : readTime(endCell, END, this.unit);
    return {
      grid: this.gridOf(times.values, temperatures.count, fire, end),
      temperatures: temperatures.values,
      endGiven: endCell !== null,
    };
  }

  /** Runs with the same times share their grid. */
  private gridOf(times: Float64Array, count: number, fire: number, end: number): Grid {
    const last = this.lastGrid;
    if (last && last.times === times && last.count === count && last.fire === fire && last.end === end) return last;
    return (this.lastGrid = gridOf(times, count, fire, end));
  }

  private temperaturesOf(run: number): Column {
    const { values, rows, irregular } = this.numbers;
    if (irregular[run] === 0) return { values: values.subarray(run * rows, (run + 1) * rows), count: rows };
    return columnOf(this.temperatures, run, (cell) => readMeasured(cell, TEMPERATURE_CELSIUS));
  }

  private timesOf(run: number): Column {
    if (shapeOf(this.times).columns > 1) return this.timesIn(run);
    return (this.sharedTimes ??= this.timesIn(0));
  }

  private timesIn(column: number): Column {
    const times = columnOf(this.times, column, (cell) => readTime(cell, TIME, this.unit));
    requireAscending(times.values, times.count);
    const isPlain = this.times.every((row) => typeof row[column] !== "string");
    if (isPlain && (this.unit === undefined || this.unit.scale === parseUnit("min").scale)) requireNoClock(times);
    if (isPlain && this.unit === undefined) requireNoSeconds(times);
    return times;
  }
}

interface Numbers {
  /** Run after run. */
  readonly values: Float64Array;
  readonly rows: number;
  /** 1 for a run that holds anything but finite numbers. */
  readonly irregular: Uint8Array;
}

/** All cells at once, row by row as they lie in memory: most blocks are numbers only. */
function numbersOf(block: Block): Numbers {
  const { rows, columns } = shapeOf(block);
  const values = new Float64Array(rows * columns);
  const irregular = new Uint8Array(columns);
  for (let row = 0; row < rows; row++) {
    const cells = block[row]!;
    for (let column = 0, at = row; column < columns; column++, at += rows) {
      const cell = cells[column];
      // x − x is 0 for finite numbers only.
      if (typeof cell === "number" && cell - cell === 0) values[at] = cell;
      else irregular[column] = 1;
    }
  }
  return { values, rows, irregular };
}

function columnOf(block: Block, column: number, read: (cell: Cell) => number): Column {
  const cells = block.map((row) => plain(row[column]));
  let count = cells.length;
  while (count > 0 && cells[count - 1] === null) count--;
  const error = cells.find((cell) => cell instanceof CellError);
  if (error !== undefined) throw error;
  const values = new Float64Array(count);
  for (let row = 0; row < count; row++) values[row] = inRow(row, () => read(cells[row]!));
  return { values, count };
}

function inRow(row: number, read: () => number): number {
  try {
    return read();
  } catch (thrown) {
    throw thrown instanceof Refusal ? new Refusal(thrown.kind, `Row ${row + 1} of the readings: ${thrown.message}`) : thrown;
  }
}

/** A time in min: a plain number is in the time unit. */
function readTime(cell: Cell | undefined, measured: Measured, unit: Unit | undefined): number {
  if (cell instanceof CellError) throw cell;
  if (typeof cell !== "number" || unit === undefined) return readMeasured(cell, measured);
  return intervalFromBase(intervalToBase(cell, unit), parseUnit("min"));
}

function readTimeUnit(block: Block | undefined): Unit | undefined {
  if (isTextLeftOut(block)) return undefined;
  const text = readText(singleCell(block, "time unit"), "time unit");
  if (text === undefined) return undefined;
  const unit = parseUnit(text);
  requireDimension(unit, dimensionOf("min"), `Time unit "${text}"`);
  return unit;
}

function oneOf(block: Block, run: number): Cell {
  const row = block[0]!;
  return plain(row.length === 1 ? row[0] : row[run]);
}

function requireColumns(block: Block | undefined, name: string): void {
  if (isLeftOut(block)) refuse(`The ${name} are missing: give a column of readings`);
  const { rows, columns } = shapeOf(block!);
  if (rows === 1 && columns > 1) refuse(`The ${name} are one row of ${columns} cells; readings stand in a column, one column for each run`);
}

function requireRow(block: Block | undefined, runs: number, name: string): void {
  if (isLeftOut(block)) refuse(`${name} are missing: give the time of firing in min, or a text such as "5 min"`);
  const { rows, columns } = shapeOf(block!);
  if (rows === 1 && (columns === 1 || columns === runs)) return;
  const wanted = runs === 1 ? "give one cell" : `give one cell, or one row with a cell for each of the ${runs} runs`;
  refuse(`${name} are ${rows} ${rows === 1 ? "row" : "rows"} × ${columns} ${columns === 1 ? "column" : "columns"}; ${wanted}`);
}

/** Clock cells count in days: a record in days has steps that no record in minutes has. */
function requireNoClock({ values, count }: Column): void {
  if (count < 2) return;
  const step = smallestStep(values, count);
  const why =
    values[count - 1]! < ONE_DAY
      ? "all are below 1"
      : step < SHORTEST_STEP
        ? `their smallest step is ${Number(step.toPrecision(3))}`
        : undefined;
  if (why !== undefined)
    refuse(`These look like clock times: multiply by 1440, or say the time unit, such as "s" or "d" (as minutes, ${why})`);
}

/** Readings every 15 s or more would be hours of minutes; a run lasts about half an hour. */
function requireNoSeconds({ values, count }: Column): void {
  if (count < 2) return;
  const length = values[count - 1]! - values[0]!;
  if (smallestStep(values, count) < LONG_STEP && length <= LONG_RECORD) return;
  refuse(`These look like seconds: say the time unit "s"; as minutes the record would last ${printed(length)} min`);
}

function smallestStep(values: Float64Array, count: number): number {
  let step = Infinity;
  for (let k = 1; k < count; k++) step = Math.min(step, values[k]! - values[k - 1]!);
  return step;
}
