import { numError, type Declarations } from "./declare";
import { betaDistribution, chiSquared, fisherF, gammaDistribution, normal, studentT, whole } from "../../core/statistics/distributions";
import {
  binomialTerm,
  incompleteBeta,
  incompleteGamma,
  poissonTerm,
  quantile,
  upperQuantile,
  type Distribution,
} from "../../core/statistics/special";

type Of = (...parameters: number[]) => Distribution;

/** The distributions, under their present names and those of Excel 2007. */
export function registerDistributions(declare: Declarations): void {
  const cumulative = (names: string, parameters: string, of: Of) => {
    for (const name of names.split(" "))
      declare.numbers(name, `x, ${parameters}, cumulative`, (x, ...rest) => shareOrDensity(of(...rest.slice(0, -1)), x, rest.at(-1)));
  };
  const lower = (names: string, parameters: string, of: Of) => {
    for (const name of names.split(" "))
      declare.numbers(name, `probability, ${parameters}`, (p, ...rest) => quantile(of(...rest), inside(p)));
  };
  const upper = (names: string, parameters: string, of: Of) => {
    for (const name of names.split(" ")) declare.numbers(name, `x, ${parameters}`, (x, ...rest) => of(...rest).upper(notNegative(x)));
  };
  const inverseUpper = (names: string, parameters: string, of: Of) => {
    for (const name of names.split(" "))
      declare.numbers(name, `probability, ${parameters}`, (p, ...rest) => upperQuantile(of(...rest), inside(p)));
  };
  registerNormal(declare);
  registerStudent(declare);
  cumulative("CHISQ.DIST", "degrees", chiSquared);
  lower("CHISQ.INV", "degrees", chiSquared);
  upper("CHISQ.DIST.RT CHIDIST", "degrees", chiSquared);
  inverseUpper("CHISQ.INV.RT CHIINV", "degrees", chiSquared);
  cumulative("F.DIST", "degrees_1, degrees_2", fisherF);
  lower("F.INV", "degrees_1, degrees_2", fisherF);
  upper("F.DIST.RT FDIST", "degrees_1, degrees_2", fisherF);
  inverseUpper("F.INV.RT FINV", "degrees_1, degrees_2", fisherF);
  cumulative("GAMMA.DIST GAMMADIST", "shape, scale", gammaDistribution);
  lower("GAMMA.INV GAMMAINV", "shape, scale", gammaDistribution);
  registerBeta(declare);
  registerContinuous(declare);
  registerCounting(declare);
}

function registerNormal(declare: Declarations): void {
  const standard = normal(0, 1);
  const z = (p: number) => (inside(p) === 0.5 ? 0 : quantile(standard, p));
  const dist = (x: number, mean: number, deviation: number, cumulative: number) => shareOrDensity(normal(mean, deviation), x, cumulative);
  const inverse = (p: number, mean: number, deviation: number) => (deviation > 0 ? mean + deviation * z(p) : NaN);
  for (const name of ["NORM.DIST", "NORMDIST"]) declare.numbers(name, "x, mean, standard_deviation, cumulative", dist);
  for (const name of ["NORM.INV", "NORMINV"]) declare.numbers(name, "probability, mean, standard_deviation", inverse);
  declare.numbers("NORM.S.DIST", "z, cumulative", (x, share) => shareOrDensity(standard, x, share));
  declare.numbers("NORMSDIST", "z", standard.lower);
  for (const name of ["NORM.S.INV", "NORMSINV"]) declare.numbers(name, "probability", z);
  declare.numbers("PHI", "z", standard.density);
  declare.numbers("GAUSS", "z", (x) => incompleteGamma(0.5, (x * x) / 2).lower * (Math.sign(x) / 2));
  for (const name of ["LOGNORM.INV", "LOGINV"])
    declare.numbers(name, "probability, mean, standard_deviation", (p, m, s) => Math.exp(inverse(p, m, s)));
  declare.numbers("LOGNORM.DIST", "x, mean, standard_deviation, cumulative", (x, m, s, share) =>
    x > 0 ? (share ? normal(m, s).lower(Math.log(x)) : normal(m, s).density(Math.log(x)) / x) : NaN,
  );
  declare.numbers("LOGNORMDIST", "x, mean, standard_deviation", (x, m, s) => (x > 0 ? normal(m, s).lower(Math.log(x)) : NaN));
  for (const name of ["CONFIDENCE.NORM", "CONFIDENCE"]) {
    declare.numbers(name, "alpha, standard_deviation, size", (alpha, s, n) =>
      s > 0 ? (upperQuantile(standard, inside(alpha) / 2) * s) / Math.sqrt(whole(n, 1)) : NaN,
    );
  }
}

function registerStudent(declare: Declarations): void {
  const t = (p: number, degrees: number) => (inside(p) === 0.5 ? 0 * whole(degrees, 1) : quantile(studentT(degrees), p));
  const twoSided = (p: number, degrees: number) => (p === 1 ? 0 * whole(degrees, 1) : upperQuantile(studentT(degrees), inside(p) / 2));
  declare.numbers("T.DIST", "x, degrees, cumulative", (x, degrees, share) => shareOrDensity(studentT(degrees), x, share));
  declare.numbers("T.DIST.RT", "x, degrees", (x, degrees) => studentT(degrees).upper(x));
  declare.numbers("T.DIST.2T", "x, degrees", (x, degrees) => 2 * studentT(degrees).upper(notNegative(x)));
  declare.numbers("TDIST", "x, degrees, tails", (x, degrees, tails) =>
    tails === 1 || tails === 2 ? tails * studentT(degrees).upper(notNegative(x)) : NaN,
  );
  declare.numbers("T.INV", "probability, degrees", t);
  for (const name of ["T.INV.2T", "TINV"]) declare.numbers(name, "probability, degrees", twoSided);
  declare.numbers("CONFIDENCE.T", "alpha, standard_deviation, size", (alpha, s, n) =>
    s > 0 ? (twoSided(inside(alpha), whole(n, 1) - 1) * s) / Math.sqrt(whole(n, 1)) : NaN,
  );
}

function registerBeta(declare: Declarations): void {
  declare.numbers("BETA.DIST", "x, alpha, beta, cumulative, [from], [to]", (x, a, b, share, from = 0, to = 1) =>
    x >= from && x <= to ? shareOrDensity(betaDistribution(a, b, from, to), x, share) : NaN,
  );
  declare.numbers("BETADIST", "x, alpha, beta, [from], [to]", (x, a, b, from = 0, to = 1) =>
    x >= from && x <= to ? betaDistribution(a, b, from, to).lower(x) : NaN,
  );
  for (const name of ["BETA.INV", "BETAINV"])
    declare.numbers(name, "probability, alpha, beta, [from], [to]", (p, a, b, from = 0, to = 1) =>
      quantile(betaDistribution(a, b, from, to), inside(p)),
    );
}

function registerContinuous(declare: Declarations): void {
  for (const name of ["EXPON.DIST", "EXPONDIST"]) {
    declare.numbers(name, "x, lambda, cumulative", (x, rate, share) =>
      x >= 0 && rate > 0 ? (share ? -Math.expm1(-rate * x) : rate * Math.exp(-rate * x)) : NaN,
    );
  }
  for (const name of ["WEIBULL.DIST", "WEIBULL"]) {
    declare.numbers(name, "x, alpha, beta, cumulative", (x, a, b, share) => {
      if (!(x >= 0 && a > 0 && b > 0)) return NaN;
      const power = (x / b) ** a;
      return share ? -Math.expm1(-power) : (a / b) * (x / b) ** (a - 1) * Math.exp(-power);
    });
  }
  declare.numbers("FISHER", "x", Math.atanh);
  declare.numbers("FISHERINV", "y", Math.tanh);
  declare.numbers("STANDARDIZE", "x, mean, standard_deviation", (x, mean, deviation) => (deviation > 0 ? (x - mean) / deviation : NaN));
}

function registerCounting(declare: Declarations): void {
  const upTo = (k: number, n: number, p: number) => (k >= n ? 1 : incompleteBeta(k + 1, n - k, p, 1 - p).upper);
  for (const name of ["BINOM.DIST", "BINOMDIST"]) {
    declare.numbers(name, "successes, trials, probability, cumulative", (successes, trials, p, share) => {
      const [k, n] = [whole(successes, 0), whole(trials, 0)];
      return k <= n && p >= 0 && p <= 1 ? (share ? upTo(k, n, p) : binomialTerm(k, n, p, 1 - p)) : NaN;
    });
  }
  for (const name of ["BINOM.INV", "CRITBINOM"])
    declare.numbers(name, "trials, probability, alpha", (trials, p, alpha) => smallestCount(whole(trials, 0), p, inside(alpha), upTo));
  for (const name of ["POISSON.DIST", "POISSON"]) {
    declare.numbers(name, "x, mean, cumulative", (x, mean, share) =>
      mean >= 0 ? (share ? incompleteGamma(whole(x, 0) + 1, mean).upper : poissonTerm(whole(x, 0), mean)) : NaN,
    );
  }
  declare.numbers("NEGBINOM.DIST", "failures, successes, probability, cumulative", (failures, successes, p, share) => {
    const [f, s] = [whole(failures, 0), whole(successes, 1)];
    return share ? incompleteBeta(s, f + 1, p, 1 - p).lower : (binomialTerm(s, s + f, p, 1 - p) * s) / (s + f);
  });
  declare.numbers("HYPGEOMDIST", "successes, size, population_successes, population", (k, n, marked, all) =>
    hypergeometric(whole(k, 0), whole(n, 1), whole(marked, 0), whole(all, 1), 0),
  );
  declare.numbers("NEGBINOMDIST", "failures, successes, probability", (failures, successes, p) => {
    const [f, s] = [whole(failures, 0), whole(successes, 1)];
    return (binomialTerm(s, s + f, p, 1 - p) * s) / (s + f);
  });
  declare.numbers("HYPGEOM.DIST", "successes, size, population_successes, population, cumulative", (k, n, marked, all, share) =>
    hypergeometric(whole(k, 0), whole(n, 1), whole(marked, 0), whole(all, 1), share),
  );
}

function smallestCount(n: number, p: number, alpha: number, upTo: (k: number, n: number, p: number) => number): number {
  for (let k = 0; k <= n; k++) if (upTo(k, n, p) >= alpha) return k;
  return NaN;
}

/** As a ratio of binomial terms, which keeps its digits for large populations. */
function hypergeometric(k: number, n: number, marked: number, all: number, cumulative: number): number {
  if (!(n <= all && marked <= all && k <= Math.min(n, marked))) return NaN;
  const p = n / all;
  const term = (x: number) =>
    n - x > all - marked
      ? 0
      : (binomialTerm(x, marked, p, 1 - p) * binomialTerm(n - x, all - marked, p, 1 - p)) / binomialTerm(n, all, p, 1 - p);
  if (!cumulative) return term(k);
  let sum = 0;
  for (let x = 0; x <= k; x++) sum += term(x);
  return sum;
}

function shareOrDensity(distribution: Distribution, x: number, cumulative: number | undefined): number {
  const [from] = distribution.support;
  if (x < from) return NaN;
  return cumulative ? distribution.lower(x) : distribution.density(x);
}

function inside(p: number): number {
  return p > 0 && p < 1 ? p : numError(`${p} is not a probability between 0 and 1`);
}

function notNegative(x: number): number {
  return x >= 0 ? x : numError(`${x} is negative`);
}
