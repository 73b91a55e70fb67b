/**
 * What a series of runs says, in order of gravity: far from the reference, an outlier, too much scatter, too few runs; then what the
 * user of the mean must know: a dependence on the rise, a drift with the order of the runs, a straggler. No run is ever left out here:
 * a deviating run is a reason to look for its cause.
 */
import { printed } from "../refusal";
import { isAbove, printedAbove } from "../statistics/above";
import type { Series, SeriesLimits, Trend } from "./series";

export interface Finding {
  /** Stands in the way of accepting the mean. */
  readonly isGrave: boolean;
  /** For the verdict, without full stop. */
  readonly brief: string;
  /** A sentence with what to do. */
  readonly sentence: string;
}

/** The findings of a series, the gravest first; empty if there is nothing to say against it. */
export function findingsOf(series: Series, limits: SeriesLimits): readonly Finding[] {
  return [
    ...farFromReference(series, limits),
    ...outlying(series, limits),
    ...scattered(series, limits),
    ...tooFew(series, limits),
    ...onRise(series),
    ...onOrder(series),
    ...straggling(series, limits),
  ];
}

/** The verdict in words. */
export function verdictOf(series: Series, findings: readonly Finding[]): string {
  const words = findings.map(({ brief }) => brief);
  return (findings.some(({ isGrave }) => isGrave) ? words : [`accept: mean of ${series.count} runs`, ...words]).join("; ");
}

function farFromReference({ reference }: Series, { referenceDeviation }: SeriesLimits): Finding[] {
  if (!reference || !isAbove(Math.abs(reference.percent), referenceDeviation)) return [];
  const distance = printedAbove(Math.abs(reference.percent), referenceDeviation);
  const brief = `the mean lies ${distance} % ${reference.percent < 0 ? "below" : "above"} the reference value`;
  return [grave(brief, `${capital(brief)}, more than ${referenceDeviation} %: find the cause before any value is used`)];
}

function outlying({ outlier }: Series, { outlierLevel }: SeriesLimits): Finding[] {
  if (!outlier || !(outlier.statistic > outlier.outlier)) return [];
  const test = `Grubbs, ${printed(100 * outlierLevel)} %`;
  const { number, value } = outlier.run;
  return [
    grave(
      `check run ${number} (${test}): look for the cause`,
      `Run ${number}, ${printed(value)}, is an outlier (${test}): look for the cause; without one make a further run, and if the series still fails discard all of it (common practice, from memory)`,
    ),
  ];
}

function scattered({ relativeDeviation: found }: Series, { relativeDeviation: limit }: SeriesLimits): Finding[] {
  if (!isAbove(found, limit)) return [];
  const words = `the relative standard deviation ${printedAbove(found, limit)} % is above the limit ${limit} %`;
  return [
    grave(
      `repeat: ${words}`,
      `${capital(words)}: look for the cause; make a further run, and if the series still fails discard all of it (common practice, from memory)`,
    ),
  ];
}

function tooFew({ count }: Series, { leastRuns }: SeriesLimits): Finding[] {
  if (count >= leastRuns) return [];
  return [grave(`make more runs: ${count} of at least ${leastRuns}`, `The series has ${count} runs; it needs at least ${leastRuns}`)];
}

function onRise({ rise, rises }: Series): Finding[] {
  if (!rise?.isTrend || !rises) return [];
  const brief = `the value depends on the rise (${tOf(rise)}): use it only within ${printed(rises[0])} K to ${printed(rises[1])} K`;
  return [mild(brief, `${capital(brief)}, or as a line in the rise`)];
}

function onOrder({ order }: Series): Finding[] {
  if (!order?.isTrend) return [];
  const brief = `the values drift with the order of the runs (${tOf(order)}): look for the cause`;
  // A drift that one series in a hundred would show by chance is no mean to accept.
  const isCertain = order.test === undefined || order.test.p < CERTAIN;
  return [(isCertain ? grave : mild)(brief, capital(brief))];
}

/** Level below which a drift stands in the way of accepting the mean. */
const CERTAIN = 0.01;

function straggling({ outlier }: Series, { stragglerLevel }: SeriesLimits): Finding[] {
  if (!outlier || !(outlier.statistic > outlier.straggler) || outlier.statistic > outlier.outlier) return [];
  const brief = `run ${outlier.run.number} is a straggler (Grubbs, ${printed(100 * stragglerLevel)} %)`;
  return [mild(brief, `${capital(brief)}: it stays in the series; look for a cause`)];
}

function tOf({ test }: Trend): string {
  return test ? `t = ${Number(test.t.toPrecision(2))}` : "without scatter";
}

function grave(brief: string, sentence: string): Finding {
  return { isGrave: true, brief, sentence };
}

function mild(brief: string, sentence: string): Finding {
  return { isGrave: false, brief, sentence };
}

function capital(text: string): string {
  return text.charAt(0).toUpperCase() + text.slice(1);
}
