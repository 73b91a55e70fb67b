import { REFERENCE_TEMPERATURE } from "../constants";
import type { SpeciesFit } from "../species/types";
import { CONSTANT_TERM, entropyAt, entropyRow, integralAt, integralRow, type LaurentInterval, type PrintedInterval } from "./laurent";

/**
 * Tables of gases often begin at 300 K while formation values belong to 298.15 K. Up to this distance outside the range, K, the value
 * at 298.15 K fixes the zero, with the Cp of the near end held over the gap; farther away the fit has no zero.
 */
export const NEAR_ENOUGH = 2;

export interface Anchored {
  readonly intervals: readonly LaurentInterval[];
  readonly onFormationScale: boolean;
  readonly hasEntropy: boolean;
}

/**
 * Supplies the integration constants a source does not print. H is then fixed by the formation enthalpy at 298.15 K, or, where that is
 * not known either, counted from 298.15 K (from the lower limit if 298.15 K lies outside the range); S by the entropy at 298.15 K.
 * Across the joints the missing H and S are continuous.
 */
export function anchored(printed: readonly PrintedInterval[], fit: SpeciesFit): Anchored {
  const enthalpyPrinted = printed.every((interval) => interval.enthalpyConstant !== null);
  const entropyPrinted = printed.every((interval) => interval.entropyConstant !== null);
  const joined = joinedUp(printed, enthalpyPrinted, entropyPrinted);
  const reach = referenceReach(joined);
  const enthalpyKnown = fit.formationEnthalpy !== null && reach !== undefined;
  const entropyKnown = fit.entropy298 !== null && reach !== undefined;
  const start = reach ?? { temperature: joined[0]!.from, interval: joined[0]! };
  const enthalpyShift = enthalpyPrinted ? 0 : (enthalpyKnown ? fit.formationEnthalpy! : 0) - enthalpyAtReference(start);
  const entropyShift = entropyPrinted ? 0 : entropyKnown ? fit.entropy298! - entropyAtReference(start) : NaN;
  const intervals = joined.map((interval) => ({
    ...interval,
    enthalpyConstant: interval.enthalpyConstant + enthalpyShift,
    entropyConstant: interval.entropyConstant + entropyShift,
  }));
  return {
    intervals,
    onFormationScale: (fit.onFormationScale ?? true) && (enthalpyPrinted || enthalpyKnown),
    hasEntropy: entropyPrinted || entropyKnown,
  };
}

/** Fills unprinted constants so that H and S run through the joints without a step, beginning at 0 in the first interval. */
function joinedUp(printed: readonly PrintedInterval[], enthalpyPrinted: boolean, entropyPrinted: boolean): LaurentInterval[] {
  const joined: LaurentInterval[] = [];
  for (const { from, to, cp, enthalpyConstant, entropyConstant } of printed) {
    const bare: LaurentInterval = {
      from,
      to,
      cp,
      enthalpyConstant: enthalpyPrinted ? enthalpyConstant! : 0,
      entropyConstant: entropyPrinted ? entropyConstant! : 0,
    };
    const before = joined[joined.length - 1];
    if (before === undefined) joined.push(bare);
    else
      joined.push({
        ...bare,
        enthalpyConstant: enthalpyPrinted ? bare.enthalpyConstant : enthalpyOf(before, from) - enthalpyOf(bare, from),
        entropyConstant: entropyPrinted ? bare.entropyConstant : entropyOf(before, from) - entropyOf(bare, from),
      });
  }
  return joined;
}

interface Reach {
  /** 298.15 K, or the end of the range next to it, K. */
  readonly temperature: number;
  readonly interval: LaurentInterval;
}

/** The interval that holds 298.15 K, or begins or ends near enough to it. */
function referenceReach(intervals: readonly LaurentInterval[]): Reach | undefined {
  const t = REFERENCE_TEMPERATURE;
  const holding = intervals.find((interval) => t >= interval.from && t <= interval.to);
  if (holding !== undefined) return { temperature: t, interval: holding };
  const first = intervals[0]!;
  if (t < first.from && first.from - t <= NEAR_ENOUGH) return { temperature: first.from, interval: first };
  const last = intervals[intervals.length - 1]!;
  if (t > last.to && t - last.to <= NEAR_ENOUGH) return { temperature: last.to, interval: last };
  return undefined;
}

function enthalpyAtReference({ temperature, interval }: Reach): number {
  const gap = endsNear(temperature) ? REFERENCE_TEMPERATURE - temperature : 0;
  return enthalpyOf(interval, temperature) + cpOf(interval, temperature) * gap;
}

function entropyAtReference({ temperature, interval }: Reach): number {
  const held = endsNear(temperature) ? cpOf(interval, temperature) * Math.log(REFERENCE_TEMPERATURE / temperature) : 0;
  return entropyOf(interval, temperature) + held;
}

function endsNear(temperature: number): boolean {
  return Math.abs(temperature - REFERENCE_TEMPERATURE) <= NEAR_ENOUGH;
}

function enthalpyOf(interval: LaurentInterval, temperature: number): number {
  return integralAt(Float64Array.from(integralRow(interval, 0)), 0, temperature);
}

function entropyOf(interval: LaurentInterval, temperature: number): number {
  return entropyAt(Float64Array.from(entropyRow(interval)), 0, temperature);
}

function cpOf(interval: LaurentInterval, temperature: number): number {
  return interval.cp.reduce((sum, coefficient, k) => sum + coefficient * temperature ** (k - CONSTANT_TERM), 0);
}
