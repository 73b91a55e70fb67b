import { cellsOf, FunctionError, numbersOf, numError, rowsOf, tableOf, type Declarations, type Reader } from "./declare";
import { chiSquared, fisherF, normal, studentT } from "../../core/statistics/distributions";
import type { EngineArgument } from "../library";

/** Statistics of samples that the engine lacks. */
export function registerSamples(declare: Declarations): void {
  declare.samples("GEOMEAN", "value…", (values) =>
    Math.exp(mean(values.map((value) => (value > 0 ? Math.log(value) : numError(`${value} is not positive`))))),
  );
  declare.samples(
    "HARMEAN",
    "value…",
    (values) => 1 / mean(values.map((value) => (value > 0 ? 1 / value : numError(`${value} is not positive`)))),
  );
  declare.samples("DEVSQ", "value…", (values) => central(values, 2));
  declare.samples(
    "SKEW",
    "value…",
    (values) => (central(values, 3) / deviation(values, 3) ** 3) * (values.length / ((values.length - 1) * (values.length - 2))),
  );
  declare.samples("SKEW.P", "value…", (values) => central(values, 3) / values.length / spread(values, 3) ** 3);
  declare.samples("KURT", "value…", kurtosis);
  for (const name of ["MODE.SNGL", "MODE"]) declare.samples(name, "value…", (values) => modes(values)[0]!);
  declare.tables("MODE.MULT", "value…", (read, ...args) =>
    tableOf(modes(args.flatMap((argument) => numbersOf(argument, read))).map((value) => [{ value }])),
  );
  registerRanks(declare);
  registerTests(declare);
}

function registerRanks(declare: Declarations): void {
  const rank = (name: string, of: (before: number, equal: number) => number) =>
    declare.tables(name, "number, list, [ascending]", (read, number, list, ascending) => {
      const x = read.number(first(number));
      const up = ascending !== undefined && read.number(first(ascending)) !== 0;
      const values = numbersOf(list, read);
      const equal = values.filter((value) => value === x).length;
      if (equal === 0) throw new FunctionError("#N/A", `${x} is not in the list`);
      return of(values.filter((value) => (up ? value < x : value > x)).length, equal);
    });
  rank("RANK.EQ", (before) => before + 1);
  rank("RANK.AVG", (before, equal) => before + (equal + 1) / 2);
  const percentRank = (name: string, of: (below: number, count: number) => number) =>
    declare.tables(name, "list, x, [digits]", (read, list, x, digits) => {
      const scale = 10 ** (digits === undefined ? 3 : Math.trunc(read.number(first(digits))));
      const share = rankShare(
        numbersOf(list, read).sort((a, b) => a - b),
        read.number(first(x)),
        of,
      );
      return Math.floor(Number((share * scale).toPrecision(15))) / scale;
    });
  for (const name of ["PERCENTRANK.INC", "PERCENTRANK"]) percentRank(name, (below, count) => below / (count - 1));
  percentRank("PERCENTRANK.EXC", (below, count) => (below + 1) / (count + 1));
  declare.tables("TRIMMEAN", "list, share", (read, list, share) => {
    const values = numbersOf(list, read).sort((a, b) => a - b);
    const part = read.number(first(share));
    if (!(part >= 0 && part < 1)) numError(`${part} is not a share from 0 to below 1`);
    const cut = Math.floor((values.length * part) / 2);
    return mean(values.slice(cut, values.length - cut));
  });
}

/** Position of x among sorted values, by straight line between two of them. */
function rankShare(sorted: readonly number[], x: number, of: (below: number, count: number) => number): number {
  const below = sorted.filter((value) => value < x).length;
  if (sorted.length === 0) return numError("The list is empty");
  if (sorted.includes(x)) return sorted.length === 1 ? 1 : of(below, sorted.length);
  if (below === 0 || below === sorted.length) throw new FunctionError("#N/A", `${x} lies outside the list`);
  const [low, high] = [sorted[below - 1]!, sorted[below]!];
  const lowRank = of(sorted.filter((value) => value < low).length, sorted.length);
  return lowRank + ((of(below, sorted.length) - lowRank) * (x - low)) / (high - low);
}

function registerTests(declare: Declarations): void {
  const several = (names: string, parameters: string, compute: (read: Reader, ...args: EngineArgument[]) => number) => {
    for (const name of names.split(" ")) declare.tables(name, parameters, (read, ...args) => compute(read, ...args));
  };
  several("T.TEST TTEST", "first, second, tails, kind", (read, a, b, tails, kind) => {
    const [sides, type] = [read.number(first(tails)), read.number(first(kind))];
    if ((sides !== 1 && sides !== 2) || ![1, 2, 3].includes(type)) numError("Tails are 1 or 2, the kind is 1, 2 or 3");
    const { t, degrees } = type === 1 ? paired(pairs(a, b)) : unpaired(numbersOf(a, read), numbersOf(b, read), type === 2);
    return sides * tTail(Math.abs(t), degrees);
  });
  several("F.TEST FTEST", "first, second", (read, a, b) => {
    const [x, y] = [numbersOf(a, read), numbersOf(b, read)];
    const ratio = variance(x) / variance(y);
    const { lower, upper } = fisherF(x.length - 1, y.length - 1);
    return 2 * Math.min(lower(ratio), upper(ratio));
  });
  several("Z.TEST ZTEST", "list, x, [sigma]", (read, list, x, sigma) => {
    const values = numbersOf(list, read);
    const s = sigma === undefined ? deviation(values, 2) : read.number(first(sigma));
    return normal(0, 1).upper((mean(values) - read.number(first(x))) / (s / Math.sqrt(values.length)));
  });
  several("CHISQ.TEST CHITEST", "observed, expected", (_read, observed, expected) => {
    const rows = rowsOf(observed).length;
    const columns = rowsOf(observed)[0]?.length ?? 0;
    const sum = pairs(observed, expected).reduce((total, [seen, wanted]) => total + (seen - wanted) ** 2 / wanted, 0);
    return chiSquared(rows > 1 && columns > 1 ? (rows - 1) * (columns - 1) : rows * columns - 1).upper(sum);
  });
  several("PROB", "values, shares, lower, [upper]", (read, values, shares, lower, upper) => {
    const from = read.number(first(lower));
    const to = upper === undefined ? from : read.number(first(upper));
    const known = pairs(values, shares);
    const total = known.reduce((sum, [, share]) => sum + share, 0);
    if (Math.abs(total - 1) > 1e-9 || known.some(([, share]) => share < 0 || share > 1))
      numError(`The shares add up to ${total}, not to 1`);
    return known.reduce((sum, [value, share]) => (value >= from && value <= to ? sum + share : sum), 0);
  });
}

function paired(differences: readonly [number, number][]): { t: number; degrees: number } {
  const values = differences.map(([a, b]) => a - b);
  return { t: mean(values) / (deviation(values, 2) / Math.sqrt(values.length)), degrees: values.length - 1 };
}

function unpaired(a: readonly number[], b: readonly number[], equalVariances: boolean): { t: number; degrees: number } {
  const [m, n] = [a.length, b.length];
  const difference = mean(a) - mean(b);
  if (equalVariances) {
    const pooled = (central(a, 2) + central(b, 2)) / (m + n - 2);
    return { t: difference / Math.sqrt(pooled * (1 / m + 1 / n)), degrees: m + n - 2 };
  }
  const [u, v] = [variance(a) / m, variance(b) / n];
  return { t: difference / Math.sqrt(u + v), degrees: (u + v) ** 2 / (u ** 2 / (m - 1) + v ** 2 / (n - 1)) };
}

/** The degrees of freedom of Welch's test are no whole number. */
function tTail(t: number, degrees: number): number {
  return studentT(degrees, true).upper(t);
}

/** Numbers that stand in the same place of two tables; places where either is no number are passed over. */
function pairs(a: EngineArgument, b: EngineArgument): [number, number][] {
  const [left, right] = [cellsOf(a), cellsOf(b)];
  if (left.length !== right.length) throw new FunctionError("#N/A", `The two ranges hold ${left.length} and ${right.length} cells`);
  return left.flatMap(({ value }, index): [number, number][] => {
    const other = right[index]!.value;
    return typeof value === "number" && typeof other === "number" ? [[value, other]] : [];
  });
}

export function first(argument: EngineArgument): EngineArgument {
  return cellsOf(argument)[0];
}

function mean(values: readonly number[]): number {
  if (values.length === 0) throw new FunctionError("#NUM!", "There are no numbers");
  return values.reduce((sum, value) => sum + value, 0) / values.length;
}

function central(values: readonly number[], power: number): number {
  const middle = mean(values);
  return values.reduce((sum, value) => sum + (value - middle) ** power, 0);
}

function variance(values: readonly number[]): number {
  return values.length > 1 ? central(values, 2) / (values.length - 1) : divisionByZero("A sample needs two values or more");
}

function deviation(values: readonly number[], least: number): number {
  return values.length >= least ? Math.sqrt(variance(values)) : divisionByZero(`The sample has fewer than ${least} values`);
}

function spread(values: readonly number[], least: number): number {
  return values.length >= least
    ? Math.sqrt(central(values, 2) / values.length)
    : divisionByZero(`The sample has fewer than ${least} values`);
}

function kurtosis(values: readonly number[]): number {
  const n = values.length;
  const ratio = central(values, 4) / deviation(values, 4) ** 4;
  return (n * (n + 1) * ratio) / ((n - 1) * (n - 2) * (n - 3)) - (3 * (n - 1) ** 2) / ((n - 2) * (n - 3));
}

/** The values met most often, in the order in which they are first met. */
function modes(values: readonly number[]): number[] {
  const counts = new Map<number, number>();
  for (const value of values) counts.set(value, (counts.get(value) ?? 0) + 1);
  const most = Math.max(0, ...counts.values());
  if (most < 2) throw new FunctionError("#N/A", "No value is met twice");
  return [...counts].filter(([, times]) => times === most).map(([value]) => value);
}

function divisionByZero(message: string): never {
  throw new FunctionError("#DIV/0!", message);
}
