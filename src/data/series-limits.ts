/** Limits for a series of calibration runs, each with the key of its source. */
import table from "./series-limits.json";

/** Highest relative standard deviation in one standard, per cent, and the runs it is meant for. */
export interface RelativeDeviationLimit {
  readonly id: string;
  readonly title: string;
  readonly runs: number;
  readonly percent: number;
  readonly source: string;
  readonly fromMemory: boolean;
  readonly isDefault?: boolean;
}

export const relativeDeviationLimits: readonly RelativeDeviationLimit[] = table.relativeDeviation;

/** The one that holds where the user gives no limit. */
export const defaultRelativeDeviation: RelativeDeviationLimit = relativeDeviationLimits.find(({ isDefault }) => isDefault)!;

/** The other limits; per cent, and levels of tests as fractions. */
export const { relativeRange, referenceDeviation, rises, outlier, trend } = table;
