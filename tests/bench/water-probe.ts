/**
 * The 56 terms of IAPWS-95 written down plainly, to measure the library against: one loop over each kind of term, powers of δ and τ from tables
 * of products, one exponential for each
 * power of δ in it, φ and its first and second derivatives as the release prints them, and from these the same twelve properties.
 */
import { iapws95 } from "../../src/data/iapws95";

const { criticalTemperature, criticalDensity, gasConstant, ideal } = iapws95;
const columns = (rows: readonly (readonly number[])[]) => rows[0]!.map((_, k) => Float64Array.from(rows, (row) => row[k]!));
const [c, d, t, n] = columns(iapws95.power) as [Float64Array, Float64Array, Float64Array, Float64Array];
const gaussian = columns(iapws95.gaussian);
const critical = columns(iapws95.critical);
const oscillators = columns(ideal.oscillators);

const deltas = new Float64Array(16);
const taus = new Float64Array(51);
const decays = new Float64Array(7);

/** Twelve properties of one phase. */
export function probe(temperature: number, density: number): Record<string, number> {
  const delta = density / criticalDensity;
  const tau = criticalTemperature / temperature;
  let p0 = Math.log(delta) + ideal.constant + ideal.linear * tau + ideal.logarithm * Math.log(tau);
  let p0t = ideal.linear + ideal.logarithm / tau;
  let p0tt = -ideal.logarithm / (tau * tau);
  for (let i = 0; i < oscillators[0]!.length; i++) {
    const m = oscillators[0]![i]!;
    const g = oscillators[1]![i]!;
    const e = Math.exp(-g * tau);
    p0 += m * Math.log(1 - e);
    p0t += m * g * (1 / (1 - e) - 1);
    p0tt -= (m * g * g * e) / ((1 - e) * (1 - e));
  }
  deltas[0] = taus[0] = 1;
  for (let i = 1; i < 16; i++) deltas[i] = deltas[i - 1]! * delta;
  for (let i = 1; i < 51; i++) taus[i] = taus[i - 1]! * tau;
  decays[0] = 1;
  for (let i = 1; i < 7; i++) decays[i] = Math.exp(-deltas[i]!);
  let phi = 0;
  let fd = 0;
  let fdd = 0;
  let ft = 0;
  let ftt = 0;
  let fdt = 0;
  for (let i = 0; i < n.length; i++) {
    const ci = c[i]!;
    const di = d[i]!;
    const ti = t[i]!;
    const power = Number.isInteger(ti) ? taus[ti]! : tau ** ti;
    const x = ci === 0 ? 0 : deltas[ci]!;
    const value = n[i]! * deltas[di]! * power * decays[ci]!;
    const u = di - ci * x;
    phi += value;
    fd += (value * u) / delta;
    fdd += (value * (u * (u - 1) - ci * ci * x)) / (delta * delta);
    ft += (value * ti) / tau;
    ftt += (value * ti * (ti - 1)) / (tau * tau);
    fdt += (value * u * ti) / (delta * tau);
  }
  for (let i = 0; i < gaussian[0]!.length; i++) {
    const di = gaussian[0]![i]!;
    const ti = gaussian[1]![i]!;
    const ni = gaussian[2]![i]!;
    const al = gaussian[3]![i]!;
    const be = gaussian[4]![i]!;
    const ga = gaussian[5]![i]!;
    const ep = gaussian[6]![i]!;
    const value = ni * delta ** di * tau ** ti * Math.exp(-al * (delta - ep) ** 2 - be * (tau - ga) ** 2);
    const u = di / delta - 2 * al * (delta - ep);
    const w = ti / tau - 2 * be * (tau - ga);
    phi += value;
    fd += value * u;
    fdd += value * (u * u - di / (delta * delta) - 2 * al);
    ft += value * w;
    ftt += value * (w * w - ti / (tau * tau) - 2 * be);
    fdt += value * u * w;
  }
  for (let i = 0; i < critical[0]!.length; i++) {
    const a = critical[0]![i]!;
    const b = critical[1]![i]!;
    const B = critical[2]![i]!;
    const ni = critical[3]![i]!;
    const C = critical[4]![i]!;
    const D = critical[5]![i]!;
    const A = critical[6]![i]!;
    const be = critical[7]![i]!;
    const y = delta - 1;
    const z = tau - 1;
    const x = y * y;
    const psi = Math.exp(-C * x - D * z * z);
    const e = 1 / (2 * be);
    const theta = 1 - tau + A * x ** e;
    const far = theta * theta + B * x ** a;
    const farD = y * (A * theta * (2 / be) * x ** (e - 1) + 2 * B * a * x ** (a - 1));
    const farDD =
      farD / y +
      x *
        (4 * B * a * (a - 1) * x ** (a - 2) + 2 * A * A * (1 / be) ** 2 * x ** (2 * e - 2) + A * theta * (4 / be) * (e - 1) * x ** (e - 2));
    const p = far ** b;
    const q = b * far ** (b - 1);
    const r = b * (b - 1) * far ** (b - 2);
    const pD = q * farD;
    const pT = -2 * theta * q;
    const pDD = q * farDD + r * farD * farD;
    const pTT = 2 * q + 4 * theta * theta * r;
    const pDT = -A * (2 / be) * q * y * x ** (e - 1) - 2 * theta * r * farD;
    const psiD = -2 * C * y * psi;
    const psiT = -2 * D * z * psi;
    const psiDD = (4 * C * C * x - 2 * C) * psi;
    const psiTT = (4 * D * D * z * z - 2 * D) * psi;
    const psiDT = 4 * C * D * y * z * psi;
    phi += ni * p * delta * psi;
    fd += ni * (p * (psi + delta * psiD) + pD * delta * psi);
    fdd += ni * (p * (2 * psiD + delta * psiDD) + 2 * pD * (psi + delta * psiD) + pDD * delta * psi);
    ft += ni * delta * (pT * psi + p * psiT);
    ftt += ni * delta * (pTT * psi + 2 * pT * psiT + p * psiTT);
    fdt += ni * (p * (psiT + delta * psiDT) + delta * pD * psiT + pT * (psi + delta * psiD) + pDT * delta * psi);
  }
  const rt = gasConstant * temperature;
  const pressureByDensity = rt * (1 + 2 * delta * fd + delta * delta * fdd);
  const pressureByTemperature = density * gasConstant * (1 + delta * fd - delta * tau * fdt);
  const cv = -gasConstant * tau * tau * (p0tt + ftt);
  const cp = cv + (temperature * (pressureByTemperature / density) ** 2) / pressureByDensity;
  return {
    temperature,
    density,
    pressure: density * rt * (1 + delta * fd),
    energy: rt * tau * (p0t + ft),
    enthalpy: rt * (1 + tau * (p0t + ft) + delta * fd),
    entropy: gasConstant * (tau * (p0t + ft) - p0 - phi),
    gibbs: rt * (1 + p0 + phi + delta * fd),
    cv,
    cp,
    soundSpeed: Math.sqrt((cp / cv) * pressureByDensity),
    pressureByDensity,
    pressureByTemperature,
  };
}
