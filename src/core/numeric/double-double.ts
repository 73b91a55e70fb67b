/**
 * Arithmetic with some 32 digits: a number is the unevaluated sum of two doubles, the second below half a unit in the last place of the
 * first (Dekker, Numerische Mathematik 18 (1971) 224). Many times slower than a double; for sums in which nearly everything cancels.
 */
export type DoubleDouble = readonly [high: number, low: number];

/** 2²⁷ + 1 cuts a double into two halves whose products are exact. */
const SPLITTER = 134217729;

/** a + b exactly. */
function twoSum(a: number, b: number): DoubleDouble {
  const sum = a + b;
  const part = sum - a;
  return [sum, a - (sum - part) + (b - part)];
}

/** a × b exactly, for sizes between 1e-140 and 1e140. */
function twoProduct(a: number, b: number): DoubleDouble {
  const product = a * b;
  const aCut = SPLITTER * a;
  const aHigh = aCut - (aCut - a);
  const aLow = a - aHigh;
  const bCut = SPLITTER * b;
  const bHigh = bCut - (bCut - b);
  const bLow = b - bHigh;
  return [product, aLow * bLow - (product - aHigh * bHigh - aLow * bHigh - aHigh * bLow)];
}

/** The pair as a proper double-double; |high| ≥ |low| is taken for granted. */
function normal(high: number, low: number): DoubleDouble {
  const sum = high + low;
  return [sum, low - (sum - high)];
}

export function add(a: DoubleDouble, b: DoubleDouble): DoubleDouble {
  const [high, low] = twoSum(a[0], b[0]);
  return normal(high, low + a[1] + b[1]);
}

export function addDouble(a: DoubleDouble, b: number): DoubleDouble {
  const [high, low] = twoSum(a[0], b);
  return normal(high, low + a[1]);
}

export function multiply(a: DoubleDouble, b: DoubleDouble): DoubleDouble {
  const [high, low] = twoProduct(a[0], b[0]);
  return normal(high, low + a[0] * b[1] + a[1] * b[0]);
}

export function timesDouble(a: DoubleDouble, b: number): DoubleDouble {
  const [high, low] = twoProduct(a[0], b);
  return normal(high, low + a[1] * b);
}

/** 1/x of a double. */
export function reciprocal(x: number): DoubleDouble {
  const quotient = 1 / x;
  const [high, low] = twoProduct(quotient, x);
  return normal(quotient, (1 - high - low) / x);
}

/** Halvings of the argument of the exponential, undone by squaring, and terms of its series: with |x| below 100 what is left out is below 1e-32. */
const HALVINGS = 12;
const SERIES = 14;

/** eˣ of a double, |x| < 100. */
export function exponential(x: number): DoubleDouble {
  const small = x / 2 ** HALVINGS;
  let sum: DoubleDouble = [1, 0];
  for (let k = SERIES; k > 0; k--) sum = addDouble(multiply(timesDouble(sum, small), reciprocal(k)), 1);
  for (let k = 0; k < HALVINGS; k++) sum = multiply(sum, sum);
  return sum;
}

/** ln x of a positive double: the double logarithm y, and what it misses, x e⁻ʸ − 1. */
export function logarithm(x: number): DoubleDouble {
  const y = Math.log(x);
  const ratio = timesDouble(exponential(-y), x);
  return normal(y, ratio[0] - 1 + ratio[1]);
}
