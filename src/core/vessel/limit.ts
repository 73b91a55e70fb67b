/**
 * The absolute pressure that a vessel may have, and the temperature at which its contents reach it.
 *
 * A limit is one number, or the points of a certificate (K, Pa) joined by straight lines; outside its points a curve says nothing.
 * The temperature at the limit is the lowest root of p(T) − p_limit(T) at or above a start. The pressure of a sealed amount rises with
 * temperature and is continuous, so between the points of the curve and the kinks of the contents one change of sign is one root; where
 * the curve rises too, the stretch is looked through in steps.
 */
import { root } from "../numeric/root";
import { printed, Refusal, refuse, refuseRange } from "../refusal";
import type { Content, PressureLimit } from "./types";

/** One point of a curve: K and Pa. */
export interface LimitPoint {
  readonly temperature: number;
  readonly pressure: number;
}

/** The same limit, Pa, at every temperature. Refuses what is not above 0 Pa. */
export function constantLimit(pressure: number): PressureLimit {
  requirePressure(pressure);
  return { from: 0, to: Infinity, knots: [], at: () => pressure };
}

/** Straight lines between points. Refuses fewer than two points, temperatures that do not rise, and pressures not above 0 Pa. */
export function curveLimit(points: readonly LimitPoint[]): PressureLimit {
  if (points.length < 2) refuse(`A limit that depends on temperature needs 2 points or more, not ${points.length}`);
  for (const [index, { temperature, pressure }] of points.entries()) {
    requirePressure(pressure);
    const before = points[index - 1]?.temperature ?? 0;
    if (temperature > before && temperature < Infinity) continue;
    if (index === 0) refuseRange(`The limit begins at ${printed(temperature)} K, which is not a temperature above 0 K`);
    refuse(`The temperatures of the limit must rise from point to point: ${printed(temperature)} K follows ${printed(before)} K`);
  }
  const knots = points.map(({ temperature }) => temperature);
  return { from: knots[0]!, to: knots[knots.length - 1]!, knots, at: (temperature) => between(points, temperature) };
}

function requirePressure(pressure: number): void {
  if (!(pressure > 0 && pressure < Infinity)) refuseRange(`A limit of ${printed(pressure)} Pa is not a pressure above 0 Pa`);
}

function between(points: readonly LimitPoint[], temperature: number): number {
  const above = points.findIndex((point) => temperature <= point.temperature);
  if (above < 0) return NaN;
  const high = points[above]!;
  if (temperature === high.temperature) return high.pressure;
  const low = points[above - 1];
  if (low === undefined) return NaN;
  const share = (temperature - low.temperature) / (high.temperature - low.temperature);
  return low.pressure + share * (high.pressure - low.pressure);
}

/** Where the contents reach the limit. `already`: they are at or above it at the start. */
export type LimitReached =
  | { readonly kind: "reached" | "already"; readonly temperature: number; readonly pressure: number }
  | {
      readonly kind: "never";
      /** The highest temperature looked at, K. */
      readonly to: number;
      /** What ends the search there: `the upper limit of nasa-2002 for N2`, or the sentence with which the contents refuse more. */
      readonly because: string;
    };

/**
 * The lowest temperature at or above `from`, K, at which the pressure of the contents reaches the limit.
 * Refuses a start outside the limit's curve, and what the contents refuse at the start. Where the contents have no state further up, the
 * search ends at the last temperature that has one, within 1e-6 K, and the answer holds the reason.
 */
export function limitReached(content: Content, limit: PressureLimit, from: number): LimitReached {
  requireInside(limit, from);
  const start = content.at(from).pressure;
  if (start >= limit.at(from)) return { kind: "already", temperature: from, pressure: start };
  let low = from;
  for (const high of stops(content, limit, from)) {
    const found = inStretch(content, limit, low, high);
    if (found) return found;
    low = high;
  }
  return {
    kind: "never",
    to: low,
    because: limit.to < content.to ? "the end of the limit's curve" : `the upper limit of ${content.toLabel}`,
  };
}

/** Refuses a temperature, K, at which a limit says nothing: "Temperature 700 K is outside 293.15 K to 673.15 K, …". */
export function requireInside(limit: PressureLimit, temperature: number): void {
  if (temperature >= limit.from && temperature <= limit.to) return;
  refuseRange(
    `Temperature ${printed(temperature)} K is outside ${printed(limit.from)} K to ${printed(limit.to)} K, where the limit of the vessel is given`,
  );
}

/** A stretch on which a limit rises is looked through in so many steps. */
const STEPS = 16;

/** Rising temperatures above `from`: knots and kinks, the end of what is known, and steps between where the limit rises. */
function stops(content: Content, limit: PressureLimit, from: number): number[] {
  const end = Math.min(content.to, limit.to);
  const corners = [...new Set([...limit.knots, ...content.kinks, end])].filter((each) => each > from && each <= end).sort((a, b) => a - b);
  return corners.flatMap((high, index) => {
    const low = corners[index - 1] ?? from;
    if (!(limit.at(high) > limit.at(low))) return [high];
    return Array.from({ length: STEPS }, (_, step) => (step === STEPS - 1 ? high : low + ((step + 1) / STEPS) * (high - low)));
  });
}

/** What a search meets where the contents have no state. */
class Stateless {
  constructor(
    readonly temperature: number,
    readonly refusal: Refusal,
  ) {}
}

/** Pressure less limit, Pa; throws Stateless. */
function excessAt(content: Content, limit: PressureLimit, temperature: number): number {
  let pressure: number;
  try {
    pressure = content.at(temperature).pressure;
  } catch (thrown) {
    throw thrown instanceof Refusal ? new Stateless(temperature, thrown) : thrown;
  }
  return pressure - limit.at(temperature);
}

/** Looks between a temperature that is below the limit and a higher one; undefined if the higher one is below it too. */
function inStretch(content: Content, limit: PressureLimit, low: number, high: number): LimitReached | undefined {
  const excess = (temperature: number) => excessAt(content, limit, temperature);
  try {
    if (excess(high) < 0) return undefined;
    const temperature = root(excess, low, high, { what: "The temperature at the limit", unit: " K" });
    return { kind: "reached", temperature, pressure: limit.at(temperature) };
  } catch (thrown) {
    if (!(thrown instanceof Stateless)) throw thrown;
    return upToLastState(content, limit, low, thrown);
  }
}

/** Two temperatures nearer than this, K, are one where states end. */
const NEAR = 1e-6;

function upToLastState(content: Content, limit: PressureLimit, low: number, end: Stateless): LimitReached {
  let last = low;
  let beyond = end;
  while (beyond.temperature - last > NEAR) {
    const middle = (last + beyond.temperature) / 2;
    try {
      excessAt(content, limit, middle);
      last = middle;
    } catch (thrown) {
      if (!(thrown instanceof Stateless)) throw thrown;
      beyond = thrown;
    }
  }
  const never: LimitReached = { kind: "never", to: last, because: beyond.refusal.message };
  return last > low ? (inStretch(content, limit, low, last) ?? never) : never;
}
