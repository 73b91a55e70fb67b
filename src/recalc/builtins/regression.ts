import { FunctionError, numbersOf, rowsOf, tableOf, type Declarations, type Reader } from "./declare";
import type { EngineArgument, EngineValue } from "../library";
import { dot, leastSquares, sumOfSquares } from "./least-squares";
import { first } from "./samples";

/**
 * LINEST, LOGEST, TREND and GROWTH by Householder reflections. The engine inverts the matrix of squares, which costs twice the digits:
 * a cubic in temperature has few left after that.
 */
export function registerRegression(declare: Declarations): void {
  declare.tables("LINEST", "known_y, [known_x], [constant], [statistics]", (read, y, x, constant, statistics) =>
    described(fit(read, y, x, constant), flag(statistics, read, false)),
  );
  declare.tables("LOGEST", "known_y, [known_x], [constant], [statistics]", (read, y, x, constant, statistics) =>
    described(fit(read, y, x, constant, Math.log), flag(statistics, read, false), Math.exp),
  );
  declare.tables("TREND", "known_y, [known_x], [new_x], [constant]", (read, y, x, fresh, constant) =>
    predicted(fit(read, y, x, constant), fresh ?? x, y, read),
  );
  declare.tables("GROWTH", "known_y, [known_x], [new_x], [constant]", (read, y, x, fresh, constant) =>
    predicted(fit(read, y, x, constant, Math.log), fresh ?? x, y, read, Math.exp),
  );
  const straight = (name: string, parameters: string, of: (line: Line, at: number) => number) =>
    declare.tables(name, parameters, (read, ...args) => {
      const [y, x] = args.slice(-2);
      return of(line(numberPairs(y, x)), args.length === 3 ? read.number(first(args[0])) : 0);
    });
  straight("SLOPE", "known_y, known_x", ({ slope }) => slope);
  straight("INTERCEPT", "known_y, known_x", ({ slope, meanX, meanY }) => meanY - slope * meanX);
  for (const name of ["FORECAST", "FORECAST.LINEAR"])
    straight(name, "x, known_y, known_x", ({ slope, meanX, meanY }, at) => meanY + slope * (at - meanX));
}

interface Line {
  readonly slope: number;
  readonly meanX: number;
  readonly meanY: number;
}

function line(points: readonly [number, number][]): Line {
  const meanY = mean(points.map(([y]) => y));
  const meanX = mean(points.map(([, x]) => x));
  const squares = points.reduce((sum, [, x]) => sum + (x - meanX) ** 2, 0);
  if (points.length < 2 || squares === 0) throw new FunctionError("#DIV/0!", "The line needs two different values of x");
  return { slope: points.reduce((sum, [y, x]) => sum + (x - meanX) * (y - meanY), 0) / squares, meanX, meanY };
}

function numberPairs(y: EngineArgument, x: EngineArgument): [number, number][] {
  const [left, right] = [rowsOf(y).flat(), rowsOf(x).flat()];
  if (left.length !== right.length) throw new FunctionError("#N/A", `There are ${left.length} values of y and ${right.length} of x`);
  return left.flatMap(({ value }, index): [number, number][] => {
    const other = right[index]!.value;
    return typeof value === "number" && typeof other === "number" ? [[value, other]] : [];
  });
}

interface Fit {
  /** One for each variable, then the constant. */
  readonly coefficients: readonly number[];
  readonly errors: readonly number[];
  readonly constant: boolean;
  readonly residual: number;
  readonly explained: number;
  readonly degrees: number;
}

function fit(
  read: Reader,
  known: EngineArgument,
  x: EngineArgument,
  constantGiven: EngineArgument,
  change: (y: number) => number = (y) => y,
): Fit {
  const y = numbersOf(known, read).map((value) => change(value));
  const constant = flag(constantGiven, read, true);
  const variables = x === undefined ? [y.map((_, index) => index + 1)] : variablesOf(x, rowsOf(known).length, y.length);
  if (variables.some((column) => column.length !== y.length))
    throw new FunctionError("#REF!", `There are ${y.length} values of y and ${variables[0]?.length ?? 0} of x`);
  return constant ? withConstant(variables, y) : { ...withoutConstant(variables, y), constant };
}

function withoutConstant(variables: readonly (readonly number[])[], y: readonly number[]) {
  const { coefficients, residual, unit, rank } = leastSquares(variables, y);
  // One variable needs no reflection, and gives the same digits as SLOPE.
  if (variables.length === 1 && rank === 1) coefficients[0] = dot(variables[0]!, y) / sumOfSquares(variables[0]!);
  const degrees = y.length - rank;
  const scale = degrees > 0 ? Math.sqrt(residual / degrees) : 0;
  const errors = variables.map((_, column) => scale * Math.hypot(...unit.map((row) => row[column]!)));
  return { coefficients, errors, residual, explained: sumOfSquares(y) - residual, degrees, scale, unit };
}

/** About the means, where the columns are as small as they can be; the constant follows from them. */
function withConstant(variables: readonly (readonly number[])[], y: readonly number[]): Fit {
  const means = variables.map(mean);
  const meanY = mean(y);
  const centred = variables.map((column, index) => column.map((value) => value - means[index]!));
  const { coefficients, errors, residual, explained, degrees, unit } = withoutConstant(
    centred,
    y.map((value) => value - meanY),
  );
  const left = degrees - 1;
  const ratio = left > 0 ? Math.sqrt(degrees / left) : 0;
  const scale = left > 0 ? Math.sqrt(residual / left) : 0;
  const constantError =
    scale * Math.hypot(1 / Math.sqrt(y.length), ...unit.map((row) => row.reduce((sum, value, index) => sum + value * means[index]!, 0)));
  const intercept = coefficients.reduce((rest, coefficient, index) => rest - coefficient * means[index]!, meanY);
  return {
    coefficients: [...coefficients, intercept],
    errors: [...errors.map((error) => error * ratio), constantError],
    constant: true,
    residual,
    explained,
    degrees: left,
  };
}

function mean(values: readonly number[]): number {
  return values.reduce((sum, value) => sum + value, 0) / values.length;
}

/** The variables as columns, whether they stand side by side or one above the other. */
function variablesOf(x: EngineArgument, rowsOfY: number, count: number): number[][] {
  const rows = rowsOf(x).map((row) => row.map(({ value }) => (typeof value === "number" ? value : notNumber(value))));
  if (rows.length * (rows[0]?.length ?? 0) === count) return [rows.flat()];
  return rowsOfY === 1 ? rows : rows[0]!.map((_, column) => rows.map((row) => row[column]!));
}

function notNumber(value: unknown): never {
  throw new FunctionError("#VALUE!", `${String(value ?? "a blank cell")} is not a number`);
}

/** Coefficients from the last variable to the first, then the constant; below them, if asked, what Excel lists. */
function described(model: Fit, statistics: boolean, back: (value: number) => number = (value) => value): EngineValue[][] {
  const { coefficients, errors, constant, residual, explained, degrees } = model;
  const variables = constant ? coefficients.slice(0, -1) : coefficients;
  const last = constant ? coefficients.at(-1)! : 0;
  const cell = (value: number): EngineValue => (Number.isFinite(value) ? { value } : { value: "#NUM!" });
  const rows: EngineValue[][] = [
    [...variables]
      .reverse()
      .concat(last)
      .map((value) => cell(back(value))),
  ];
  if (statistics) {
    const none: EngineValue = { value: "#N/A" };
    const lastError = constant ? cell(errors.at(-1)!) : none;
    const pad = (cells: EngineValue[]) => [...cells, ...Array.from({ length: variables.length - 1 }, () => none)];
    rows.push([...[...(constant ? errors.slice(0, -1) : errors)].reverse().map(cell), lastError]);
    const used = coefficients.length - (constant ? 1 : 0);
    rows.push(pad([cell(explained / (explained + residual)), cell(Math.sqrt(residual / degrees))]));
    rows.push(pad([cell(explained / used / (residual / degrees)), cell(degrees)]));
    rows.push(pad([cell(explained), cell(residual)]));
  }
  return tableOf(rows);
}

function predicted(
  { coefficients, constant }: Fit,
  fresh: EngineArgument,
  known: EngineArgument,
  read: Reader,
  back: (value: number) => number = (value) => value,
): EngineValue[][] {
  const used = constant ? coefficients.length - 1 : coefficients.length;
  const last = constant ? coefficients.at(-1)! : 0;
  const shape = rowsOf(fresh ?? known);
  const value = (variables: readonly number[]): EngineValue => ({
    value: back(variables.reduce((sum, variable, index) => sum + variable * coefficients[index]!, last)),
  });
  if (fresh === undefined)
    return tableOf(
      inShape(
        shape,
        numbersOf(known, read).map((_, index) => value([index + 1])),
      ),
    );
  const numbers = shape.map((row) => row.map((cell) => read.number(cell)));
  if (used === 1) return tableOf(numbers.map((row) => row.map((x) => value([x]))));
  return tableOf(
    rowsOf(known).length === 1
      ? [numbers[0]!.map((_, column) => value(numbers.map((row) => row[column]!)))]
      : numbers.map((row) => [value(row)]),
  );
}

function inShape(shape: readonly (readonly unknown[])[], values: readonly EngineValue[]): EngineValue[][] {
  const width = shape[0]?.length ?? 0;
  return shape.map((row, at) => row.map((_, column) => values[at * width + column]!));
}

function flag(argument: EngineArgument, read: Reader, otherwise: boolean): boolean {
  if (argument === undefined) return otherwise;
  const { value } = first(argument) as EngineValue;
  return typeof value === "boolean" ? value : read.number(first(argument)) !== 0;
}
