/**
 * A series of runs of one quantity, such as the energy equivalents of a calibration: scatter, outlier, trends, and the distance from a
 * reference.
 *
 *   relative standard deviation 100 s/x̄, relative range 100 (max − min)/x̄, Grubbs' test, slope against the order of the runs and
 *   against the temperature rise with its t test, 100 (x̄ − reference)/reference
 *
 * Values in one unit, usually J/K; rises in K; relative numbers in per cent. The limits come from the laboratory's standard.
 */
import { refuse, refuseRange, printed } from "../refusal";
import { grubbsCritical, grubbsStatistic } from "../statistics/grubbs";
import { straightLine, type Line } from "../statistics/line";
import { extremes, sampleOf, type Sample } from "../statistics/sample";
import { significance, type Significance } from "../statistics/significance";

/** One run of a series. */
export interface Run {
  /** Its number in the laboratory's list, from 1. */
  readonly number: number;
  readonly value: number;
  /** Corrected temperature rise, K. */
  readonly rise?: number;
}

export interface SeriesLimits {
  /** Highest relative standard deviation, per cent. */
  readonly relativeDeviation: number;
  /** Fewest runs of a complete series. */
  readonly leastRuns: number;
  /** Largest distance of the mean from a reference, per cent. */
  readonly referenceDeviation: number;
  /** Levels of Grubbs' test, such as 0.05 and 0.01. */
  readonly stragglerLevel: number;
  readonly outlierLevel: number;
  /** A slope whose p is below this is taken for a trend. */
  readonly trendLevel: number;
}

export interface OutlierTest {
  readonly run: Run;
  readonly statistic: number;
  readonly straggler: number;
  readonly outlier: number;
}

/** A line through the values. `test` is absent where the values lie on the line exactly. */
export interface Trend extends Line {
  readonly test?: Significance;
  readonly isTrend: boolean;
}

export interface ReferenceTest {
  readonly reference: number;
  readonly difference: number;
  readonly percent: number;
  /** Absent where the values do not scatter. */
  readonly test?: Significance;
}

export interface Series extends Sample {
  readonly runs: readonly Run[];
  readonly relativeDeviation: number;
  readonly relativeRange: number;
  /** Absent below three runs, and where all values are equal. */
  readonly outlier?: OutlierTest;
  /** Absent below three runs. */
  readonly order?: Trend;
  /** Absent below three runs, without rises, and where all rises are equal. */
  readonly rise?: Trend;
  /** Lowest and highest rise, K. */
  readonly rises?: readonly [number, number];
  readonly reference?: ReferenceTest;
}

/** Statistics of two or more runs. Refuses fewer, values or a reference that are not above zero, and rises given for some runs only. */
export function seriesOf(runs: readonly Run[], limits: SeriesLimits, reference?: number): Series {
  if (runs.length < 2) refuse(`A series needs at least 2 runs, not ${runs.length}`);
  for (const { number, value } of runs) requirePositive(value, `The value of run ${number}`);
  const values = runs.map(({ value }) => value);
  const sample = sampleOf(values);
  const isEqual = sample.deviation <= ROUNDING * sample.mean;
  const [least, largest] = extremes(values);
  const rises = risesOf(runs);
  return {
    ...sample,
    runs,
    relativeDeviation: (100 * sample.deviation) / sample.mean,
    relativeRange: (100 * (largest - least)) / sample.mean,
    outlier: runs.length < 3 || isEqual ? undefined : outlierTest(runs, limits),
    order: trendOf(
      runs.map(({ number }) => number),
      values,
      limits,
      isEqual,
    ),
    rise: rises && trendOf(rises, values, limits, isEqual),
    rises: rises && extremes(rises),
    reference: reference === undefined ? undefined : referenceTest(sample, reference),
  };
}

/** Values closer than this, relative, differ by the rounding of their computation only. */
const ROUNDING = 1e-14;

function requirePositive(value: number, name: string): void {
  if (!(value > 0 && value < Infinity)) refuseRange(`${name}, ${printed(value)}, is not above 0`);
}

function risesOf(runs: readonly Run[]): readonly number[] | undefined {
  const rises = runs.flatMap(({ rise }) => (rise === undefined ? [] : [rise]));
  if (rises.length === 0) return undefined;
  const missing = runs.find(({ rise }) => rise === undefined);
  if (missing) refuse(`Run ${missing.number} has a value but no rise: give the rise of every run, or none`);
  return rises;
}

function outlierTest(runs: readonly Run[], { stragglerLevel, outlierLevel }: SeriesLimits): OutlierTest {
  const { index, statistic } = grubbsStatistic(runs.map(({ value }) => value));
  const critical = (level: number) => grubbsCritical(runs.length, level);
  return { run: runs[index]!, statistic, straggler: critical(stragglerLevel), outlier: critical(outlierLevel) };
}

function trendOf(x: readonly number[], y: readonly number[], { trendLevel }: SeriesLimits, isEqual: boolean): Trend | undefined {
  if (x.length < 3 || x.every((value) => value === x[0])) return undefined;
  const line = straightLine(x, y);
  if (isEqual) return { ...line, isTrend: false };
  const isExact = line.residual <= ROUNDING * Math.abs(y[0]!);
  const test = isExact ? undefined : significance(line.slope, line.slopeError, line.degrees);
  return { ...line, test, isTrend: test === undefined || test.p < trendLevel };
}

function referenceTest({ mean, deviationOfMean, count }: Sample, reference: number): ReferenceTest {
  requirePositive(reference, "The reference value");
  const difference = mean - reference;
  return { reference, difference, percent: (100 * difference) / reference, test: significance(difference, deviationOfMean, count - 1) };
}
