import type { Capacity } from "./capacity";
import { type Segment, segmentsOf, solveInSegment } from "./segments";

/** A span runs over no more than this ratio of temperatures, so that bins of equal energy are narrow beside T everywhere. */
const WIDEST_SPAN = 4;
/** Bins of equal energy in a span. */
const BINS = 128;
/** Places for them: one more, which is never filled, for the upper end of the span itself. */
const PLACES = BINS + 1;
/** A quintic through six points of the bin, at f = 0, 0.2 … 1. */
const POINTS = 6;
/** Where a bin is compared with Newton's method, between its points. */
const PROOFS = [0.07, 0.31, 0.5, 0.92];
/** A bin that misses Newton's temperature by more than this, K, is not used. */
const LARGEST_MISS = 1e-10;

/** A part of a segment with bins of its own. */
interface Span {
  readonly segment: Segment;
  /** Energies at its ends, J/mol. */
  readonly low: number;
  readonly high: number;
  /** From here on a later segment has the same energies, J/mol; infinity if none has. */
  readonly ambiguousFrom: number;
}

/** Numbers of a span in `spanNumbers`: low, bins per energy, ambiguousFrom, lowest and highest temperature. */
const SPAN_NUMBERS = 5;

/**
 * T as a function of U for one capacity: in narrow bins of equal energy a quintic through temperatures found by Newton's method, each bin
 * compared with Newton's method between its points and not used if it misses by more than 1e-10 K. Looking a temperature up is then as cheap
 * as evaluating a heat capacity. A bin is worked out when it is first asked for, and does not depend on what was asked before.
 */
export class InverseTable {
  readonly segments: readonly Segment[];
  private readonly spans: readonly Span[];
  /** Highest energy of each span, and infinity. */
  private readonly highs: Float64Array;
  private readonly spanNumbers: Float64Array;
  /** Six coefficients of f⁰ … f⁵ for each bin of each span; NaN where not worked out or not used. */
  private readonly coefficients: Float64Array;
  private readonly workedOut: Uint8Array;

  constructor(private readonly capacity: Capacity) {
    this.segments = segmentsOf(capacity);
    this.spans = this.segments.flatMap((segment, k) => spansOf(capacity, segment, lowestAfter(this.segments, k)));
    this.highs = Float64Array.from([...this.spans.map((span) => span.high), Infinity]);
    this.spanNumbers = Float64Array.from(
      this.spans.flatMap(({ low, high, ambiguousFrom, segment }) => [low, BINS / (high - low), ambiguousFrom, segment.from, segment.to]),
    );
    this.coefficients = new Float64Array(this.spans.length * PLACES * POINTS).fill(NaN);
    this.workedOut = new Uint8Array(this.spans.length * PLACES);
  }

  /**
   * Temperature, K, of an energy, J/mol; NaN where there is no entry: outside the range, in a step, in a bin that is not used, and, if
   * `chooses`, where more than one temperature has the energy. If not, the lowest of them.
   */
  temperature(energy: number, chooses: boolean): number {
    const highs = this.highs;
    let k = 0;
    while (energy > highs[k]!) k++;
    const numbers = this.spanNumbers;
    const at = k * SPAN_NUMBERS;
    const place = (energy - numbers[at]!) * numbers[at + 1]!;
    if (!(place >= 0) || (chooses && energy >= numbers[at + 2]!)) return NaN;
    const inSpan = place | 0;
    const bin = k * PLACES + inSpan;
    const t = quintic(this.coefficients, bin * POINTS, place - inSpan);
    if (t >= numbers[at + 3]! && t <= numbers[at + 4]!) return t;
    return this.rareTemperature(k, inSpan, place - inSpan);
  }

  /** A bin not worked out yet, a bin without an entry, or a temperature that rounding carries beyond its segment. */
  private rareTemperature(k: number, inSpan: number, f: number): number {
    const { segment } = this.spans[k]!;
    const bin = k * PLACES + inSpan;
    if (inSpan < BINS && this.workedOut[bin] === 0) this.workOut(this.spans[k]!, inSpan, bin);
    return Math.min(Math.max(quintic(this.coefficients, bin * POINTS, f), segment.from), segment.to);
  }

  private workOut(span: Span, inSpan: number, bin: number): void {
    const solve = (f: number, start?: number) => {
      const energy = Math.min(span.low + ((inSpan + f) / BINS) * (span.high - span.low), span.high);
      return solveInSegment(this.capacity, span.segment, energy, start);
    };
    const temperatures: number[] = [];
    for (let point = 0; point < POINTS; point++) temperatures.push(solve(point / (POINTS - 1), temperatures[point - 1]));
    const at = bin * POINTS;
    this.coefficients.set(throughPoints(temperatures), at);
    const misses = PROOFS.some((f) => !(Math.abs(quintic(this.coefficients, at, f) - solve(f, temperatures[0])) <= LARGEST_MISS));
    if (misses) this.coefficients.fill(NaN, at, at + POINTS);
    this.workedOut[bin] = 1;
  }
}

/** Lowest energy of all later segments: above it an energy of this segment has more than one temperature. */
function lowestAfter(segments: readonly Segment[], k: number): number {
  return segments.slice(k + 1).reduce((lowest, segment) => Math.min(lowest, segment.low), Infinity);
}

function spansOf(capacity: Capacity, segment: Segment, ambiguousFrom: number): Span[] {
  const count = Math.max(1, Math.ceil(Math.log(segment.to / segment.from) / Math.log(WIDEST_SPAN) - 1e-9));
  const ratio = (segment.to / segment.from) ** (1 / count);
  const inner = Array.from({ length: count - 1 }, (_, k) => capacity.energy(segment.from * ratio ** (k + 1)));
  const limits = [segment.low, ...inner, segment.high];
  return limits.slice(1).map((high, k) => ({ segment, low: limits[k]!, high, ambiguousFrom }));
}

/** Coefficients of the quintic through values at f = 0, 0.2 … 1: divided differences, then multiplied out. */
function throughPoints(values: readonly number[]): number[] {
  const differences = [...values];
  const step = 1 / (POINTS - 1);
  for (let order = 1; order < POINTS; order++)
    for (let k = POINTS - 1; k >= order; k--) differences[k] = (differences[k]! - differences[k - 1]!) / (order * step);
  const coefficients = new Array<number>(POINTS).fill(0);
  for (let k = POINTS - 1; k >= 0; k--) {
    for (let power = POINTS - 1; power > 0; power--) coefficients[power] = coefficients[power - 1]! - k * step * coefficients[power]!;
    coefficients[0] = differences[k]! - k * step * coefficients[0]!;
  }
  return coefficients;
}

function quintic(c: Float64Array, at: number, f: number): number {
  return ((((c[at + 5]! * f + c[at + 4]!) * f + c[at + 3]!) * f + c[at + 2]!) * f + c[at + 1]!) * f + c[at]!;
}

const tables = new WeakMap<Capacity, InverseTable>();
let lastCapacity: Capacity | undefined;
let lastTable: InverseTable | undefined;

/** The table of a capacity, made on first use. A column of cells asks for one capacity again and again: the last is at hand. */
export function inverseTableOf(capacity: Capacity): InverseTable {
  if (capacity === lastCapacity) return lastTable!;
  let table = tables.get(capacity);
  if (table === undefined) {
    table = new InverseTable(capacity);
    tables.set(capacity, table);
  }
  lastCapacity = capacity;
  lastTable = table;
  return table;
}
