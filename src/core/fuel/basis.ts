/**
 * One value of a fuel on four bases: ad (as analysed, air-dried), d (dry), ar (as received), daf (dry, ash-free).
 *
 *   x_ad = x_d (100 − M_ad)/100     x_ar = x_d (100 − M_ar)/100     x_daf = x_d · 100/(100 − A_d)
 *
 * with M the moisture of the sample on that basis and A_d the ash of the dry sample, all in per cent by mass. A mass balance: no constants.
 * It holds for what the dry substance brings (gross value, C, N, S, ash). It does not hold for moisture itself, for net values, nor for
 * hydrogen and oxygen that include those of the moisture: these go through dry.ts first.
 */
import { printed, refuse, refuseRange } from "../refusal";

/** As analysed, dry, as received, dry and ash-free. */
export type Basis = "ad" | "d" | "ar" | "daf";

/** Per cent by mass. Only those on the way from one basis to the other are looked at. */
export interface BasisFigures {
  readonly moistureAsAnalysed?: number | undefined;
  readonly moistureAsReceived?: number | undefined;
  readonly ashDry?: number | undefined;
}

/** A value on a basis as a share of the dry value: numerator over denominator, so that 0 in either can be told. */
interface Share {
  readonly numerator: number;
  readonly denominator: number;
  /** What the figure is called, for the sentence that refuses 100 %. */
  readonly figure: string;
}

const MOISTURE_AD = "moisture as analysed";
const MOISTURE_AR = "moisture as received";
const ASH_D = "ash of the dry sample";

/**
 * The value on another basis, in its own unit. Refuses a negative value, a figure of the way that is missing or outside 0 to 100 %,
 * and 100 % where it would divide. The same basis gives the value itself and needs no figure.
 */
export function toBasis(value: number, from: Basis, to: Basis, figures: BasisFigures): number {
  if (!(value >= 0)) refuseRange(`Value ${printed(value)} is negative; a content or a gross value is 0 or more`);
  if (from === to) return value;
  const way = `from ${from} to ${to}`;
  const [start, end] = [shareOf(from, figures, way), shareOf(to, figures, way)];
  for (const [divisor, figure] of [
    [start.numerator, start.figure],
    [end.denominator, end.figure],
  ] as const) {
    if (divisor === 0) refuseRange(`The ${figure} is 100 %: nothing remains that a value could be referred to, ${way}`);
  }
  const [numerator, denominator] = [end.numerator * start.denominator, end.denominator * start.numerator];
  // No moisture and no ash change nothing, to the last bit.
  return numerator === denominator ? value : (value * numerator) / denominator;
}

function shareOf(basis: Basis, figures: BasisFigures, way: string): Share {
  if (basis === "d") return { numerator: 1, denominator: 1, figure: "" };
  if (basis === "ad") return { numerator: rest(figures.moistureAsAnalysed, MOISTURE_AD, way), denominator: 100, figure: MOISTURE_AD };
  if (basis === "ar") return { numerator: rest(figures.moistureAsReceived, MOISTURE_AR, way), denominator: 100, figure: MOISTURE_AR };
  return { numerator: 100, denominator: rest(figures.ashDry, ASH_D, way), figure: ASH_D };
}

/** What remains of 100 % beside the figure. */
function rest(percent: number | undefined, figure: string, way: string): number {
  if (percent === undefined) return refuse(`The ${figure} is missing: the way ${way} needs it, in per cent`);
  if (!(percent >= 0 && percent <= 100)) refuseRange(`The ${figure}, ${printed(percent)} %, is not between 0 % and 100 %`);
  return 100 - percent;
}
