import { binomialTerm, erfc, incompleteBeta, incompleteGamma, poissonTerm, type Distribution } from "./special";

/** Normal, Student's t, chi-squared, gamma, beta and F distributions. A parameter outside its range gives NaN. */

export function normal(mean: number, deviation: number): Distribution {
  const z = (x: number) => (x - mean) / deviation;
  return {
    support: deviation > 0 ? [-Infinity, Infinity] : [NaN, NaN],
    lower: (x) => holds(deviation > 0) * (erfc(-z(x) / Math.SQRT2) / 2),
    upper: (x) => holds(deviation > 0) * (erfc(z(x) / Math.SQRT2) / 2),
    density: (x) => holds(deviation > 0) * (Math.exp((-z(x) * z(x)) / 2) / (deviation * Math.sqrt(2 * Math.PI))),
  };
}

/** Student's t; `fractional` keeps the fraction of the degrees of freedom, as Welch's test needs. */
export function studentT(degrees: number, fractional = false): Distribution {
  const n = fractional ? degrees : whole(degrees, 1);
  const tail = (t: number) => {
    const square = t * t;
    const { lower } = incompleteBeta(n / 2, 0.5, n / (n + square), square / (n + square));
    return lower / 2;
  };
  return {
    support: [-Infinity, Infinity],
    lower: (t) => (t < 0 ? tail(t) : 1 - tail(t)),
    upper: (t) => (t > 0 ? tail(t) : 1 - tail(t)),
    density: (t) => Math.exp(logGammaRatio(n) - ((n + 1) / 2) * Math.log1p((t * t) / n)) / Math.sqrt(n * Math.PI),
  };
}

/** ln Γ((n + 1)/2) − ln Γ(n/2), by the series in 1/n where the difference of logarithms would lose digits. */
function logGammaRatio(n: number): number {
  const x = n / 2;
  let shift = 0;
  let at = x;
  while (at < 20) {
    shift += Math.log1p(0.5 / at);
    at++;
  }
  const inverse = 1 / at;
  const series = 0.5 * Math.log(at) - inverse / 8 + inverse ** 3 / 192 - inverse ** 5 / 640 + (17 * inverse ** 7) / 14336;
  return series - shift;
}

export function chiSquared(degrees: number): Distribution {
  return gammaDistribution(whole(degrees, 1) / 2, 2);
}

export function gammaDistribution(shape: number, scale: number): Distribution {
  const valid = () => holds(shape > 0 && scale > 0);
  return {
    support: [0, Infinity],
    lower: (x) => valid() * incompleteGamma(shape, x / scale).lower,
    upper: (x) => valid() * incompleteGamma(shape, x / scale).upper,
    density: (x) => {
      const z = x / scale;
      if (z === 0) return valid() * (shape === 1 ? 1 / scale : shape < 1 ? NaN : 0);
      return valid() * (shape >= 1 ? poissonTerm(shape - 1, z) / scale : (poissonTerm(shape, z) * shape) / z / scale);
    },
  };
}

export function betaDistribution(a: number, b: number, from: number, to: number): Distribution {
  const valid = () => holds(a > 0 && b > 0 && from < to);
  const share = (x: number) => incompleteBeta(a, b, (x - from) / (to - from), (to - x) / (to - from));
  return {
    support: [from, to],
    lower: (x) => valid() * share(x).lower,
    upper: (x) => valid() * share(x).upper,
    density: (x) => {
      const p = (x - from) / (to - from);
      const q = (to - x) / (to - from);
      return (valid() * (binomialTerm(a, a + b, p, q) * a * b)) / ((a + b) * p * q * (to - from));
    },
  };
}

export function fisherF(first: number, second: number): Distribution {
  const a = whole(first, 1) / 2;
  const b = whole(second, 1) / 2;
  const share = (x: number) => incompleteBeta(a, b, (a * x) / (a * x + b), b / (a * x + b));
  return {
    support: [0, Infinity],
    lower: (x) => share(x).lower,
    upper: (x) => share(x).upper,
    density: (x) => {
      const p = (a * x) / (a * x + b);
      const q = b / (a * x + b);
      return x === 0 ? (a < 1 ? Infinity : a === 1 ? 1 : 0) : (binomialTerm(a, a + b, p, q) * a * b) / (a + b) / x;
    },
  };
}

/** A number of degrees of freedom or of trials: whole, its fraction cut off. */
export function whole(value: number, least: number): number {
  const cut = Math.trunc(value);
  return cut >= least ? cut : NaN;
}

/** 1 if a condition holds, else NaN, which spreads through the product. */
function holds(condition: boolean): number {
  return condition ? 1 : NaN;
}
