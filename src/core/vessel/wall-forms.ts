/**
 * Specific heat capacity c of a wall material, J/(kg K), in the forms in which it is published, and its integral from the lower limit,
 * J/kg. t is the temperature on the scale of the form, K or °C:
 *   polynomial   c = Σ a_i t^n_i, n_i ≥ 0                integral Σ a_i t^(n_i+1)/(n_i+1)
 *   piecewise    polynomials, or c = a + b/(t − p)       a t + b ln|t − p|
 *   table        straight lines between points           trapezoids
 *   constant     c = a at every temperature              a t
 *   log10        log10 c = Σ a_i (log10 t)^i             by quadrature between fixed nodes, to 1e-12
 * At a joint the piece that begins there is used, as EN 1993-1-2 prints the limits of its pieces.
 */
import { CELSIUS_ZERO } from "../constants";
import { gaussLegendre, integrate } from "../numeric/gauss-legendre";
import { refuse } from "../refusal";

/** A polynomial, or constant + numerator/(t − pole), between two temperatures on the scale of the form. */
export interface WallFormPiece {
  readonly from: number;
  readonly to: number;
  readonly exponents?: readonly number[];
  readonly coefficients?: readonly number[];
  readonly constant?: number;
  readonly numerator?: number;
  readonly pole?: number;
}

/** A published heat capacity, J/(kg K), as printed; the parts that its form needs. */
export interface WallForm {
  readonly form: string;
  readonly temperature: "K" | "degC";
  readonly from?: number;
  readonly to?: number;
  readonly exponents?: readonly number[];
  readonly coefficients?: readonly number[];
  readonly points?: readonly (readonly number[])[];
  readonly pieces?: readonly WallFormPiece[];
  /** Form `constant`. */
  readonly value?: number;
}

/** A piece of c with its integral from its own lower end, on the scale of the form. */
interface Piece {
  readonly from: number;
  readonly to: number;
  value(t: number): number;
  integral(t: number): number;
}

/** Specific heat capacity and the heat of one kilogram from the lower limit, by temperature in K; NaN outside [from, to]. */
export interface SpecificHeat {
  readonly from: number;
  readonly to: number;
  /** Where the capacity jumps or bends, K. */
  readonly joints: readonly number[];
  capacity(temperature: number): number;
  heat(temperature: number): number;
}

/** The specific heat capacity of a form. Refuses a form that has no figures of its own. */
export function specificHeatOf(form: WallForm): SpecificHeat {
  if (form.form === "constant") return constant(form.value!);
  const zero = form.temperature === "degC" ? CELSIUS_ZERO : 0;
  const smooth = form.form === "log10";
  return ofPieces(piecesOf(form), zero, smooth);
}

function constant(value: number): SpecificHeat {
  return { from: 0, to: Infinity, joints: [], capacity: () => value, heat: (temperature) => value * temperature };
}

function piecesOf(form: WallForm): readonly Piece[] {
  switch (form.form) {
    case "polynomial":
      return [polynomial({ from: form.from!, to: form.to!, exponents: form.exponents, coefficients: form.coefficients })];
    case "piecewise":
      return form.pieces!.map((piece) => (piece.coefficients ? polynomial(piece) : withPole(piece)));
    case "table":
      return form.points!.slice(1).map((point, i) => straight(form.points![i]!, point));
    case "log10":
      return logarithmic(form.from!, form.to!, form.coefficients!);
    default:
      return refuse(`"${form.form}" is not a form of a wall's heat capacity; the forms are polynomial, piecewise, table, constant, log10`);
  }
}

function polynomial({ from, to, exponents, coefficients }: WallFormPiece): Piece {
  const sum = (of: (coefficient: number, exponent: number) => number) =>
    coefficients!.reduce((total, coefficient, i) => total + of(coefficient, exponents![i]!), 0);
  return {
    from,
    to,
    value: (t) => sum((a, n) => a * t ** n),
    integral: (t) => sum((a, n) => (a * (t ** (n + 1) - from ** (n + 1))) / (n + 1)),
  };
}

function withPole({ from, to, constant: a, numerator: b, pole: p }: WallFormPiece): Piece {
  return {
    from,
    to,
    value: (t) => a! + b! / (t - p!),
    integral: (t) => a! * (t - from) + b! * Math.log((t - p!) / (from - p!)),
  };
}

function straight([from, first]: readonly number[], [to, last]: readonly number[]): Piece {
  const value = (t: number) => first! + ((last! - first!) * (t - from!)) / (to! - from!);
  return { from: from!, to: to!, value, integral: (t) => ((t - from!) * (first! + value(t))) / 2 };
}

/** Nodes in even steps of log t; between them the integral is exact to rounding. */
const NODES = 32;
const POINTS = gaussLegendre(20);

function logarithmic(from: number, to: number, coefficients: readonly number[]): readonly Piece[] {
  const value = (t: number) => {
    const x = Math.log10(t);
    return 10 ** coefficients.reduceRight((sum, a) => sum * x + a, 0);
  };
  const nodes = Array.from({ length: NODES + 1 }, (_, k) => (k === NODES ? to : from * (to / from) ** (k / NODES)));
  return nodes.slice(1).map((end, k) => {
    const start = nodes[k]!;
    return { from: start, to: end, value, integral: (t) => integrate(value, start, t, POINTS) };
  });
}

/** Pieces end to end; the heat before each is added up once. */
function ofPieces(pieces: readonly Piece[], zero: number, smooth: boolean): SpecificHeat {
  const before = [0];
  for (const piece of pieces) before.push(before[before.length - 1]! + piece.integral(piece.to));
  const [from, to] = [pieces[0]!.from + zero, pieces[pieces.length - 1]!.to + zero];
  const inner = pieces.slice(1).map((piece) => piece.from + zero);
  const at = (temperature: number) => inner.findIndex((joint) => temperature < joint);
  const indexOf = (temperature: number) => (at(temperature) < 0 ? pieces.length - 1 : at(temperature));
  const inside = (temperature: number) => temperature >= from && temperature <= to;
  return {
    from,
    to,
    joints: smooth ? [] : inner,
    capacity: (temperature) => (inside(temperature) ? pieces[indexOf(temperature)]!.value(temperature - zero) : NaN),
    heat: (temperature) => {
      if (!inside(temperature)) return NaN;
      const index = indexOf(temperature);
      return before[index]! + pieces[index]!.integral(temperature - zero);
    },
  };
}
