/**
 * The special functions behind the statistical ones: gamma, error function, incomplete gamma and beta, and the search for a quantile.
 * Accurate to a few units in the last place over the range a worksheet meets; written here because the general-purpose libraries at
 * hand keep seven to ten digits only. The spreadsheet engine's missing functions are built on them too.
 *
 * Sources: error function, W. J. Cody, Math. Comp. 23 (1969) 631 (rational approximations); gamma, C. Lanczos' series with g = 607/128
 * (P. Godfrey's coefficients); densities without cancellation, C. Loader, "Fast and accurate computation of binomial probabilities" (2000);
 * continued fractions by the modified Lentz method.
 */
const halfLog2Pi = 0.9189385332046727; // ln √(2π)
const epsilon = 2 ** -53;
const tiny = 1e-300;

// prettier-ignore
const lanczos = [
  0.99999999999999709182, 57.156235665862923517, -59.597960355475491248, 14.136097974741747174, -0.49191381609762019978,
  0.33994649984811888699e-4, 0.46523628927048575665e-4, -0.98374475304879564677e-4, 0.15808870322491248884e-3, -0.21026444172410488319e-3,
  0.21743961811521264320e-3, -0.16431810653676389022e-3, 0.84418223983852743293e-4, -0.26190838401581408670e-4, 0.36899182659531622704e-5,
];
const erfSmall = {
  top: [1.85777706184603153e-1, 3.1611237438705656, 1.13864154151050156e2, 3.77485237685302021e2, 3.20937758913846947e3],
  bottom: [1, 2.36012909523441209e1, 2.44024637934444173e2, 1.28261652607737228e3, 2.84423683343917062e3],
};
const erfcMiddle = {
  top: [2.15311535474403846e-8, 5.64188496988670089e-1, 8.88314979438837594, 6.61191906371416295e1, 2.98635138197400131e2, 8.81952221241769090e2, 1.71204761263407058e3, 2.05107837782607147e3, 1.23033935479799725e3],
  bottom: [1, 1.57449261107098347e1, 1.17693950891312499e2, 5.37181101862009858e2, 1.62138957456669019e3, 3.29079923573345963e3, 4.36261909014324716e3, 3.43936767414372164e3, 1.23033935480374942e3],
}; // prettier-ignore
const erfcLarge = {
  top: [1.63153871373020978e-2, 3.05326634961232344e-1, 3.60344899949804439e-1, 1.25781726111229246e-1, 1.60837851487422766e-2, 6.58749161529837803e-4],
  bottom: [1, 2.56852019228982242, 1.87295284992346725, 5.27905102951428412e-1, 6.05183413124413191e-2, 2.33520497626869185e-3],
}; // prettier-ignore

/** Factorial of a whole number, exact as long as a double holds it; beyond 170 it is infinite. */
export function factorial(n: number): number {
  let product = 1;
  for (let factor = 2; factor <= n; factor++) product *= factor;
  return product;
}

/** Γ(x); NaN at the poles 0, −1, −2 … */
export function gamma(x: number): number {
  if (Number.isInteger(x)) return x > 0 ? factorial(x - 1) : NaN;
  if (x < 0.5) return Math.PI / (Math.sin(Math.PI * x) * gamma(1 - x));
  const base = x - 0.5 + 607 / 128;
  // The power is taken in two halves, or it overflows before the exponential brings it back.
  const half = base ** ((x - 0.5) / 2);
  return Math.sqrt(2 * Math.PI) * lanczosSum(x - 1) * half * Math.exp(-base) * half;
}

/** ln Γ(x) for x > 0. */
export function logGamma(x: number): number {
  if (x === 1 || x === 2) return 0;
  if (x < 0.5) return Math.log(Math.PI / Math.sin(Math.PI * x)) - logGamma(1 - x);
  if (x < 20) return Math.log(gamma(x));
  return (x - 0.5) * Math.log(x) - x + halfLog2Pi + stirlingError(x);
}

function lanczosSum(z: number): number {
  let sum = lanczos[0]!;
  for (let k = 1; k < lanczos.length; k++) sum += lanczos[k]! / (z + k);
  return sum;
}

/** erf(x). */
export function erf(x: number): number {
  if (Math.abs(x) <= 0.46875) return (x * horner(erfSmall.top, x * x)) / horner(erfSmall.bottom, x * x);
  return x > 0 ? 1 - erfc(x) : erfc(-x) - 1;
}

/** erfc(x) = 1 − erf(x), without loss in the tail. */
export function erfc(x: number): number {
  if (x < 0.46875) return x < -0.46875 ? 2 - erfc(-x) : 1 - erf(x);
  if (x <= 4) return (expOfMinusSquare(x) * horner(erfcMiddle.top, x)) / horner(erfcMiddle.bottom, x);
  const inverse = 1 / (x * x);
  const correction = (inverse * horner(erfcLarge.top, inverse)) / horner(erfcLarge.bottom, inverse);
  return (expOfMinusSquare(x) * (1 / Math.sqrt(Math.PI) - correction)) / x;
}

/** exp(−x²): the square is split so that its rounding does not cost digits. */
function expOfMinusSquare(x: number): number {
  const high = Math.trunc(x * 16) / 16;
  return Math.exp(-high * high) * Math.exp(-(x - high) * (x + high));
}

function horner(coefficients: readonly number[], x: number): number {
  return coefficients.reduce((sum, coefficient) => sum * x + coefficient, 0);
}

/** ln n! less Stirling's formula. */
function stirlingError(n: number): number {
  if (n <= 15) return Math.log(gamma(n + 1)) - (n + 0.5) * Math.log(n) + n - halfLog2Pi;
  const square = n * n;
  return (1 / 12 - (1 / 360 - (1 / 1260 - (1 / 1680 - 1 / 1188 / square) / square) / square) / square) / n;
}

/** x ln(x/m) + m − x, small when x is near m. */
function deviance(x: number, m: number): number {
  if (Math.abs(x - m) >= 0.1 * (x + m)) return x * Math.log(x / m) + m - x;
  const v = (x - m) / (x + m);
  let sum = (x - m) * v;
  let term = 2 * x * v;
  for (let k = 1; k < 1000; k++) {
    term *= v * v;
    const next = sum + term / (2 * k + 1);
    if (next === sum) return next;
    sum = next;
  }
  return sum;
}

/** mˣ e⁻ᵐ / Γ(x + 1). */
export function poissonTerm(x: number, m: number): number {
  if (m === 0) return x === 0 ? 1 : 0;
  if (x === 0) return Math.exp(-m);
  if (x < 1) return Math.exp(x * Math.log(m) - m) / gamma(x + 1);
  return Math.exp(-stirlingError(x) - deviance(x, m)) / Math.sqrt(2 * Math.PI * x);
}

/** Γ(n + 1)/(Γ(x + 1) Γ(n − x + 1)) pˣ qⁿ⁻ˣ. */
export function binomialTerm(x: number, n: number, p: number, q: number): number {
  if (p === 0) return x === 0 ? 1 : 0;
  if (q === 0) return x === n ? 1 : 0;
  if (x === 0) return Math.exp(n * (p < 0.5 ? Math.log1p(-p) : Math.log(q)));
  if (x === n) return Math.exp(n * (q < 0.5 ? Math.log1p(-q) : Math.log(p)));
  const rest = n - x;
  const exponent = stirlingError(n) - stirlingError(x) - stirlingError(rest) - deviance(x, n * p) - deviance(rest, n * q);
  return Math.exp(exponent) * Math.sqrt(n / (2 * Math.PI * x * rest));
}

/** Regularised incomplete gamma: the share below x (`lower`) and above it. */
export function incompleteGamma(a: number, x: number): { lower: number; upper: number } {
  if (x <= 0) return { lower: 0, upper: 1 };
  if (x === Infinity) return { lower: 1, upper: 0 };
  const term = poissonTerm(a, x);
  if (x < a + 1) {
    const lower = term * gammaSeries(a, x);
    return { lower, upper: 1 - lower };
  }
  const upper = a * term * lentz((k) => (k === 0 ? [1, x + 1 - a] : [-k * (k - a), x + 2 * k + 1 - a]));
  return { lower: 1 - upper, upper };
}

function gammaSeries(a: number, x: number): number {
  let sum = 1;
  let term = 1;
  for (let k = 1; term > epsilon * sum; k++) {
    term *= x / (a + k);
    sum += term;
  }
  return sum;
}

/** Regularised incomplete beta: the share of Beta(a, b) below x and above it. y = 1 − x is given apart so that no digits are lost. */
export function incompleteBeta(a: number, b: number, x: number, y: number = 1 - x): { lower: number; upper: number } {
  if (x <= 0) return { lower: 0, upper: 1 };
  if (y <= 0) return { lower: 1, upper: 0 };
  if (x > (a + 1) / (a + b + 2)) {
    const { lower, upper } = incompleteBeta(b, a, y, x);
    return { lower: upper, upper: lower };
  }
  const lower = binomialTerm(a, a + b, x, y) * (b / (a + b)) * lentz((k) => betaFraction(a, b, x, k));
  return { lower, upper: 1 - lower };
}

function betaFraction(a: number, b: number, x: number, k: number): [number, number] {
  if (k === 0) return [1, 1];
  const m = k >> 1;
  if (k % 2 === 0) return [(m * (b - m) * x) / ((a + k - 1) * (a + k)), 1];
  return [(-(a + m) * (a + b + m) * x) / ((a + k - 1) * (a + k)), 1];
}

/** The continued fraction a₀/(b₀ + a₁/(b₁ + …)). */
function lentz(step: (k: number) => [number, number]): number {
  let value = tiny;
  let c = tiny;
  let d = 0;
  for (let k = 0; k < 100000; k++) {
    const [a, b] = step(k);
    d = 1 / nonZero(b + a * d);
    c = nonZero(b + a / c);
    const change = c * d;
    value *= change;
    if (Math.abs(change - 1) <= 2 * epsilon) return value;
  }
  return NaN;
}

function nonZero(value: number): number {
  return Math.abs(value) < tiny ? tiny : value;
}

/** A distribution, for its quantiles. */
export interface Distribution {
  readonly support: readonly [number, number];
  readonly lower: (x: number) => number;
  readonly upper: (x: number) => number;
  readonly density: (x: number) => number;
}

/** x with a share p below it, sought on the smaller tail so that small shares keep their digits. */
export function quantile(distribution: Distribution, p: number): number {
  return p <= 0.5 ? lowerQuantile(distribution, p) : upperQuantile(distribution, 1 - p);
}

/** x with a share p above it. */
export function upperQuantile({ support: [from, to], lower, upper, density }: Distribution, p: number): number {
  return -lowerQuantile({ support: [-to, -from], lower: (x) => upper(-x), upper: (x) => lower(-x), density: (x) => density(-x) }, p);
}

function lowerQuantile({ support, lower, density }: Distribution, p: number): number {
  if (!(p > 0 && p < 1)) return p === 0 ? support[0] : p === 1 ? support[1] : NaN;
  let [from, to] = bracket(support, lower, p);
  let x = from + (to - from) / 2;
  for (let step = 0; step < 300; step++) {
    const share = lower(x);
    if (share < p) from = x;
    else to = x;
    // Newton on the logarithm of the share, which is close to a straight line in the tail.
    const newton = x - (share * Math.log(share / p) || 0) / density(x);
    const next = newton > from && newton < to ? newton : from + (to - from) / 2;
    if (Math.abs(next - x) <= 2 * epsilon * Math.abs(x) || next === from || next === to) return next;
    x = next;
  }
  return x;
}

function bracket([from, to]: readonly [number, number], lower: (x: number) => number, p: number): [number, number] {
  let low = Number.isFinite(from) ? from : -1;
  let high = Number.isFinite(to) ? to : Math.max(1, low + 1);
  if (!Number.isFinite(to)) while (lower(high) < p) high = high > 0 ? high * 2 : high / 2 + 1;
  if (!Number.isFinite(from)) while (lower(low) > p) low = low * 2;
  return [low, high];
}
