import { FunctionError, numError, type Declarations } from "./declare";
import { erf, erfc, factorial, gamma, logGamma } from "../../core/statistics/special";

/** Arithmetic and counting that the engine lacks. */
export function registerArithmetic(declare: Declarations): void {
  declare.numbers("SIGN", "number", Math.sign);
  // Under this name because LOG10 reads as a cell; the translator writes it.
  declare.numbers("LOG_10", "number", (x) => Math.log10(x > 0 ? x : numError(`The logarithm of ${x} does not exist`)));
  declare.numbers("RADIANS", "angle", (degrees) => (degrees * Math.PI) / 180);
  declare.numbers("SQRTPI", "number", (x) => Math.sqrt(x * Math.PI));
  declare.numbers("QUOTIENT", "numerator, denominator", (a, b) => (b === 0 ? divisionByZero() : Math.trunc(a / b)));
  declare.numbers("EVEN", "number", (x) => Math.sign(x) * 2 * Math.ceil(Math.abs(x) / 2));
  declare.numbers("FACT", "number", (x) => factorial(count(x)));
  declare.numbers("FACTDOUBLE", "number", (x) => (x > -2 && x < 0 ? 1 : doubleFactorial(count(x))));
  declare.numbers("COMBIN", "number, chosen", (n, k) => combinations(count(n), count(k)));
  declare.numbers("COMBINA", "number, chosen", (n, k) =>
    count(n) === 0 && count(k) === 0 ? 1 : combinations(count(n) + count(k) - 1, count(k)),
  );
  declare.numbers("PERMUT", "number, chosen", (n, k) => falling(count(n), count(k)));
  declare.numbers("PERMUTATIONA", "number, chosen", (n, k) => count(n) ** count(k));
  declare.numbers("GESTEP", "number, [step]", (x, step = 0) => (x >= step ? 1 : 0));
  declare.numbers("GAMMA", "number", gamma);
  for (const name of ["GAMMALN", "GAMMALN.PRECISE"]) declare.numbers(name, "number", (x) => (x > 0 ? logGamma(x) : NaN));
  declare.numbers("ERF", "lower, [upper]", (from, to) => (to === undefined ? erf(from) : erf(to) - erf(from)));
  declare.numbers("ERF.PRECISE", "number", erf);
  for (const name of ["ERFC", "ERFC.PRECISE"]) declare.numbers(name, "number", erfc);
  declare.samples("SUMSQ", "value…", (values) => values.reduce((sum, value) => sum + value * value, 0));
  declare.samples("GCD", "value…", (values) => values.map(count).reduce(greatestDivisor, 0));
  declare.samples("LCM", "value…", (values) =>
    values.map(count).reduce((a, b) => (a === 0 || b === 0 ? 0 : (a / greatestDivisor(a, b)) * b), 1),
  );
  declare.samples("MULTINOMIAL", "value…", multinomial);
  declare.tables("SERIESSUM", "x, first_power, step, coefficients", (read, x, first, step, coefficients) => {
    const [base, power, by] = [x, first, step].map((argument) => read.number(argument)) as [number, number, number];
    const factors = (Array.isArray(coefficients) ? coefficients : [[coefficients]]) as never[][];
    const flat = factors[0]!.flatMap((_, row) => factors.map((column) => read.number(column[row])));
    return flat.reduce((sum, factor, index) => sum + factor * base ** (power + index * by), 0);
  });
}

/** A whole number that is not negative; the fraction is cut off. */
function count(value: number): number {
  return value >= 0 ? Math.trunc(value) : numError(`${value} is negative`);
}

function divisionByZero(): never {
  throw new FunctionError("#DIV/0!", "The divisor is 0");
}

function doubleFactorial(n: number): number {
  let product = 1;
  for (let factor = n; factor > 1; factor -= 2) product *= factor;
  return product;
}

/** Exact as long as a double holds it: every partial product is itself a number of combinations. */
function combinations(n: number, k: number): number {
  if (k > n) return numError(`${k} cannot be chosen from ${n}`);
  let exact = 1n;
  const chosen = Math.min(k, n - k);
  if (chosen > 2000) return Math.exp(logGamma(n + 1) - logGamma(k + 1) - logGamma(n - k + 1));
  for (let i = 1; i <= chosen; i++) exact = (exact * BigInt(n - chosen + i)) / BigInt(i);
  return Number(exact);
}

function falling(n: number, k: number): number {
  if (k > n) return numError(`${k} cannot be chosen from ${n}`);
  let product = 1;
  for (let i = 0; i < k; i++) product *= n - i;
  return product;
}

function greatestDivisor(a: number, b: number): number {
  while (b !== 0) [a, b] = [b, a % b];
  return a;
}

function multinomial(values: readonly number[]): number {
  let total = 0;
  let product = 1;
  for (const value of values) {
    total += count(value);
    product *= combinations(total, count(value));
  }
  return product;
}
