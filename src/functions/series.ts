/** The table of a series of runs: scatter, outlier, trends, distance from a reference, and the verdict. */
import { seriesOf, type Series, type SeriesLimits, type Trend } from "../core/calorimeter/series";
import { findingsOf, verdictOf } from "../core/calorimeter/series-findings";
import { refuse } from "../core/refusal";
import * as limits from "../data/series-limits";
import { Block, isLeftOut } from "./cell";
import { type Kind, readLimit, readRuns, readValue } from "./series-reading";
import { listOf, singleCell } from "./lists";
import { line, Line, Report, tableOf } from "./table";

const NOT_ASKED = "not asked";

/** The body of CAL.SERIES: `equivalents` and `rises` are lists, the other two single values. The table always has the same lines. */
export function seriesCells(equivalents: Block, limitPercent?: Block, rises?: Block, reference?: Block): Block {
  return tableOf([() => report(equivalents, limitPercent, rises, reference)]);
}

function report(equivalents: Block, limitPercent?: Block, rises?: Block, reference?: Block): Report {
  const values = listOf(equivalents, "equivalents");
  if (values.length === 0) refuse("The equivalents are missing: give them as one row or one column");
  const { runs, kind } = readRuns(values, isLeftOut(rises) ? undefined : listOf(rises, "rises"));
  const limitCell = singleCell(limitPercent, "limit");
  const referenceCell = singleCell(reference, "reference");
  const asked = seriesLimits(limitCell === null ? limits.defaultRelativeDeviation.percent : readLimit(limitCell));
  const series = seriesOf(runs, asked, referenceCell === null ? undefined : readValue(referenceCell, kind, "The reference value"));
  const findings = findingsOf(series, asked);
  return {
    lines: [
      ...scatterLines(series, kind, limitCell === null ? defaultLimitNote() : `limit ${asked.relativeDeviation} %, as given`),
      ...outlierLines(series, kind),
      ...orderLines(series, kind),
      ...riseLines(series, kind),
      ...referenceLines(series, kind),
      line("verdict", verdictOf(series, findings), "", "the gravest finding first"),
    ],
    warnings: findings.map(({ sentence }) => sentence),
  };
}

function seriesLimits(relativeDeviation: number): SeriesLimits {
  return {
    relativeDeviation,
    leastRuns: limits.defaultRelativeDeviation.runs,
    referenceDeviation: limits.referenceDeviation.percent,
    stragglerLevel: limits.outlier.stragglerLevel,
    outlierLevel: limits.outlier.outlierLevel,
    trendLevel: limits.trend.level,
  };
}

function defaultLimitNote(): string {
  const { percent, title, runs } = limits.defaultRelativeDeviation;
  return `limit ${percent} % (${title}, ${runs} or more runs; from memory)`;
}

function scatterLines(series: Series, { unit = "" }: Kind, limitNote: string): Line[] {
  const plain = unit === "" ? "in the unit of the values" : "";
  const { percent, runs } = limits.relativeRange;
  return [
    line("number of runs", series.count, "", "blank cells are not counted"),
    line("mean", series.mean, unit, plain),
    line("standard deviation", series.deviation, unit, "of a single run, with n - 1"),
    line("relative standard deviation", series.relativeDeviation, "%", limitNote),
    line("standard deviation of the mean", series.deviationOfMean, unit, "standard deviation over the root of the number of runs"),
    line(
      "relative range",
      series.relativeRange,
      "%",
      `(highest - lowest)/mean; common practice ${percent} % for ${runs} runs (from memory)`,
    ),
  ];
}

function outlierLines(series: Series, { unit = "" }: Kind): Line[] {
  const { outlier: test } = series;
  const missing = series.count < 3 ? "needs 3 runs" : "all values are equal";
  const levels = [limits.outlier.stragglerLevel, limits.outlier.outlierLevel].map((level) => `${100 * level} %`);
  return [
    line("Grubbs' statistic", test?.statistic ?? missing, "", "largest distance from the mean over the standard deviation"),
    line(`critical value, ${levels[0]}`, test?.straggler ?? missing, "", "a straggler lies above; both sides together"),
    line(`critical value, ${levels[1]}`, test?.outlier ?? missing, "", "an outlier lies above; both sides together"),
    line("farthest run", test?.run.number ?? missing, "", "its place in the list"),
    line("value of the farthest run", test?.run.value ?? missing, unit),
  ];
}

function orderLines(series: Series, kind: Kind): Line[] {
  return trendLines(series, series.order, { label: "order", per: "run", missing: "needs 3 runs" }, kind);
}

function riseLines(series: Series, kind: Kind): Line[] {
  const { rises } = series;
  const missing = !rises ? NOT_ASKED : series.count < 3 ? "needs 3 runs" : "all rises are equal";
  const [low, high] = limits.rises.percent;
  return [
    ...trendLines(series, series.rise, { label: "rise", per: "K", missing }, kind),
    line("lowest rise", rises?.[0] ?? NOT_ASKED, "K", `rises of samples should lie within ${low} to ${high} % of these (from memory)`),
    line("highest rise", rises?.[1] ?? NOT_ASKED, "K"),
  ];
}

interface TrendWords {
  readonly label: string;
  readonly per: string;
  readonly missing: string;
}

function trendLines(series: Series, trend: Trend | undefined, { label, per, missing }: TrendWords, { unit = "" }: Kind): Line[] {
  const untested = trend ? (trend.isTrend ? "no scatter about the line" : "all values are equal") : missing;
  return [
    line(`slope with the ${label}`, trend?.slope ?? missing, `${unit} per ${per}`.trim(), "straight line by least squares"),
    line(`t of the slope with the ${label}`, trend?.test?.t ?? untested, "", `${series.count - 2} degrees of freedom`),
    line(`p of the slope with the ${label}`, trend?.test?.p ?? untested, "", `both sides; a trend below ${limits.trend.level}`),
  ];
}

function referenceLines({ reference, count }: Series, { unit = "" }: Kind): Line[] {
  const untested = reference ? "all values are equal" : NOT_ASKED;
  return [
    line(
      "deviation from the reference",
      reference?.percent ?? NOT_ASKED,
      "%",
      `limit ${limits.referenceDeviation.percent} % for a check of an earlier mean (from memory)`,
    ),
    line("difference from the reference", reference?.difference ?? NOT_ASKED, unit, "mean - reference"),
    line("t of the difference", reference?.test?.t ?? untested, "", `${count - 1} degrees of freedom; the reference is taken as exact`),
    line("p of the difference", reference?.test?.p ?? untested, "", "both sides"),
  ];
}
